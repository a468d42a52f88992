import { resolve } from 'node:path';
import { z } from 'zod';
import manifest from '@/package.json';

export const appVersion = manifest.version;

const blankIsAbsent = (value: unknown) => (value === '' ? undefined : value);
const portNumber = z.coerce.number().int().min(1).max(65535);

const optionalText = z.preprocess(blankIsAbsent, z.string().optional());
const optionalAddress = z.preprocess(
  blankIsAbsent,
  z.url({ protocol: /^https?$/, error: 'must be an address such as https://cache.example/purge' }).optional(),
);

/** Where the stand-in of a cache listens; no real host can have this name. */
export const FAKE_PURGE_URL = 'https://cache.leadline.invalid/purge';

const isFake = (address: string | undefined) =>
  address !== undefined && new URL(address).hostname.endsWith('.invalid');

/** Settings that lead to a real hosted service. */
function realAmong(given: {
  LEADLINE_PURGE_URL?: string;
  LEADLINE_PURGE_TOKEN?: string;
  LEADLINE_BUCKET?: string;
  LEADLINE_BUCKET_ENDPOINT?: string;
}): string[] {
  const { LEADLINE_PURGE_URL: purge, LEADLINE_BUCKET_ENDPOINT: endpoint } = given;
  return [
    ...(purge !== undefined && !isFake(purge) ? ['LEADLINE_PURGE_URL'] : []),
    ...(given.LEADLINE_PURGE_TOKEN !== undefined && !isFake(purge) ? ['LEADLINE_PURGE_TOKEN'] : []),
    ...(given.LEADLINE_BUCKET !== undefined && !isFake(endpoint) ? ['LEADLINE_BUCKET'] : []),
  ];
}

const schema = z
  .object({
    PORT: z.preprocess(blankIsAbsent, portNumber.default(3000)),
    LEADLINE_HOST: z.preprocess(blankIsAbsent, z.string().optional()),
    LEADLINE_DATA: z.preprocess(blankIsAbsent, z.string().default('.data')),
    LEADLINE_ORIGIN: z.preprocess(
      blankIsAbsent,
      z.url({ protocol: /^https?$/, error: 'must be an address such as https://polls.example' }).optional(),
    ),
    LEADLINE_TRUST_PROXY: z.preprocess(blankIsAbsent, z.string().default('')),
    LEADLINE_ZONE: z.preprocess(
      blankIsAbsent,
      z.string().refine(isZone, 'must be an IANA time zone such as Etc/UTC').default('Etc/UTC'),
    ),
    DEMO_PASSWORD: z.preprocess(
      blankIsAbsent,
      z.string().min(15, 'must have at least 15 characters').optional(),
    ),
    LEADLINE_PURGE_URL: optionalAddress,
    LEADLINE_PURGE_TOKEN: optionalText,
    LEADLINE_BUCKET: optionalText,
    LEADLINE_BUCKET_ENDPOINT: optionalAddress,
    LEADLINE_BUCKET_REGION: z.preprocess(blankIsAbsent, z.string().default('us-east-1')),
    LEADLINE_BUCKET_KEY: optionalText,
    LEADLINE_BUCKET_SECRET: optionalText,
    LEADLINE_FAKES: z.preprocess(
      blankIsAbsent,
      z
        .enum(['0', '1'], 'must be 0 or 1')
        .default('0')
        .transform((flag) => flag === '1'),
    ),
  })
  .superRefine((given, context) => {
    const refuse = (name: string, message: string) =>
      context.addIssue({ code: 'custom', path: [name], message });
    if (given.LEADLINE_BUCKET && !(given.LEADLINE_BUCKET_KEY && given.LEADLINE_BUCKET_SECRET))
      refuse('LEADLINE_BUCKET', 'needs LEADLINE_BUCKET_KEY and LEADLINE_BUCKET_SECRET beside it');
    if (given.LEADLINE_FAKES)
      for (const name of realAmong(given))
        refuse('LEADLINE_FAKES', `stands in for hosted services, so ${name} must not be set beside it`);
  })
  .transform((given) => ({
    ...given,
    LEADLINE_DATA: resolve(given.LEADLINE_DATA),
    LEADLINE_ORIGIN: new URL(given.LEADLINE_ORIGIN ?? `http://localhost:${given.PORT}`).origin,
    LEADLINE_TRUST_PROXY: given.LEADLINE_TRUST_PROXY.split(',')
      .map((part) => part.trim())
      .filter(Boolean),
    LEADLINE_PURGE_URL: given.LEADLINE_PURGE_URL ?? (given.LEADLINE_FAKES ? FAKE_PURGE_URL : undefined),
  }));

/**
 * The settings of this process. LEADLINE_DATA is absolute; LEADLINE_ORIGIN is the only source of absolute
 * addresses, the Host header never is; no LEADLINE_HOST means every address of the machine.
 */
export type Env = z.output<typeof schema>;

/** @throws Error `The environment is not usable: NAME message` */
export function readEnv(source: Record<string, string | undefined> = process.env): Env {
  const parsed = schema.safeParse(source);
  if (parsed.success) return parsed.data;
  const problems = parsed.error.issues.map((issue) => `${issue.path.join('.')} ${issue.message}`);
  throw new Error(`The environment is not usable: ${problems.join('; ')}`);
}

function isZone(zone: string): boolean {
  try {
    return Boolean(new Intl.DateTimeFormat('en', { timeZone: zone }));
  } catch {
    return false;
  }
}
