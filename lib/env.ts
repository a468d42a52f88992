import { resolve } from 'node:path';
import { z } from 'zod';
import manifest from '@/package.json';

export const appVersion = manifest.version;

const blankIsAbsent = (value: unknown) => (value === '' ? undefined : value);
const portNumber = z.coerce.number().int().min(1).max(65535);

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
  })
  .transform((given) => ({
    ...given,
    LEADLINE_DATA: resolve(given.LEADLINE_DATA),
    LEADLINE_ORIGIN: new URL(given.LEADLINE_ORIGIN ?? `http://localhost:${given.PORT}`).origin,
    LEADLINE_TRUST_PROXY: given.LEADLINE_TRUST_PROXY.split(',')
      .map((part) => part.trim())
      .filter(Boolean),
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
