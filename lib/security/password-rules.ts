import 'server-only';

export const MIN_PASSWORD = 15;
export const MAX_PASSWORD = 256;

/** Words that the commonest long passwords are made of; a password of nothing else is refused. */
const COMMON = [
  'password',
  'passwort',
  'passw0rd',
  'qwertyuiop',
  'qwerty',
  'asdfghjkl',
  'zxcvbnm',
  '1q2w3e4r5t',
  'letmein',
  'welcome',
  'iloveyou',
  'administrator',
  'admin',
  'monkey',
  'dragon',
  'football',
  'baseball',
  'sunshine',
  'princess',
  'superman',
  'trustno1',
  'changeme',
  'secret',
  'master',
  'login',
  'hello',
  'abc',
  'test',
  'user',
  'newsroom',
  'leadline',
  'correcthorsebatterystaple',
  'default',
  'access',
  'please',
  'summer',
  'winter',
  'spring',
  'autumn',
  'editor',
  'reporter',
  'the',
  'my',
  'is',
  'this',
  'and',
].sort((a, b) => b.length - a.length);

/**
 * Why a password is refused, or null. At least 15 characters, no composition rules, a blocklist
 * (NIST SP 800-63B-4, section 3.1.1.2).
 */
export function passwordProblem(password: string, personal: readonly string[] = []): string | null {
  const plain = password.normalize('NFC');
  const length = [...plain].length;
  if (length < MIN_PASSWORD)
    return `Use at least ${MIN_PASSWORD} characters; a few unrelated words are easiest.`;
  if (length > MAX_PASSWORD) return `Use at most ${MAX_PASSWORD} characters.`;
  if (
    isGuessable(
      plain.toLowerCase(),
      personal.map((word) => word.toLowerCase()),
    )
  )
    return 'This password is one of the first that would be tried. Choose unrelated words.';
  return null;
}

function isGuessable(lower: string, personal: string[]): boolean {
  if (new Set(lower).size < 5) return true;
  let rest = lower.replace(/[^\p{L}\p{N}]/gu, '');
  const words = [
    ...personal.flatMap((word) => word.split(/[^\p{L}\p{N}]+/u)).filter((w) => w.length > 2),
    ...COMMON,
  ];
  for (const word of words) rest = rest.split(word).join('');
  rest = rest.replace(/\d+/g, '');
  return rest.length < 4;
}
