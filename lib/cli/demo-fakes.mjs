// @ts-check
import { existsSync } from 'node:fs';
import { join } from 'node:path';

const SET_ALREADY = ['LEADLINE_FAKES', 'LEADLINE_PURGE_URL', 'LEADLINE_PURGE_TOKEN', 'LEADLINE_BUCKET'];

/**
 * A demo has no hosted services, so they are stood in for; a desk of one's own, or one that names a service, never
 * gets them unasked. What the shell says goes before a file .env.
 * @param {string[]} args
 * @param {Record<string, string | undefined>} [env]
 * @returns {{ LEADLINE_FAKES?: '1' }}
 */
export function demoFakes(args, env = settings()) {
  const data = env.LEADLINE_DATA || '.data';
  const isDemo = existsSync(join(data, 'leadline.db'))
    ? existsSync(join(data, 'accounts.json'))
    : !args.includes('--empty');
  return isDemo && SET_ALREADY.every((name) => !env[name]) ? { LEADLINE_FAKES: '1' } : {};
}

function settings() {
  if (existsSync('.env')) process.loadEnvFile('.env');
  return process.env;
}
