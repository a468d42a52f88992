import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { readEnv } from '@/lib/env';

describe('the environment', () => {
  it('needs nothing', () => {
    expect(readEnv({})).toMatchObject({
      PORT: 3000,
      LEADLINE_DATA: join(process.cwd(), '.data'),
      LEADLINE_ORIGIN: 'http://localhost:3000',
      LEADLINE_TRUST_PROXY: [],
    });
  });

  it('takes an empty setting as none', () => {
    expect(readEnv({ PORT: '', LEADLINE_ORIGIN: '', DEMO_PASSWORD: '' })).toEqual(readEnv({}));
  });

  it('derives the address from the port unless one is given', () => {
    expect(readEnv({ PORT: '4010' }).LEADLINE_ORIGIN).toBe('http://localhost:4010');
    const given = readEnv({ LEADLINE_ORIGIN: 'https://polls.courier.example/desk/' });
    expect(given.LEADLINE_ORIGIN).toBe('https://polls.courier.example');
  });

  it('lists the proxies it may believe', () => {
    const { LEADLINE_TRUST_PROXY } = readEnv({ LEADLINE_TRUST_PROXY: '192.0.2.7, 10.0.0.0/8,' });
    expect(LEADLINE_TRUST_PROXY).toEqual(['192.0.2.7', '10.0.0.0/8']);
  });

  it('names every setting it cannot use', () => {
    const bad = { PORT: '0', LEADLINE_ORIGIN: 'ftp://courier.example', DEMO_PASSWORD: 'too short' };
    expect(() => readEnv(bad)).toThrow(
      /^The environment is not usable: PORT .+; LEADLINE_ORIGIN .+; DEMO_PASSWORD/,
    );
  });
});
