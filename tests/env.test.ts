import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { FAKE_PURGE_URL, readEnv } from '@/lib/env';

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

  it('stands in for hosted services only where none is named', () => {
    expect(readEnv({}).LEADLINE_PURGE_URL).toBeUndefined();
    expect(readEnv({ LEADLINE_FAKES: '1' }).LEADLINE_PURGE_URL).toBe(FAKE_PURGE_URL);
    const real = { LEADLINE_BUCKET_KEY: 'k', LEADLINE_BUCKET_SECRET: 's', LEADLINE_BUCKET: 'b' };
    for (const [name, given] of Object.entries({
      LEADLINE_PURGE_URL: { LEADLINE_PURGE_URL: 'https://cache.example/purge' },
      LEADLINE_PURGE_TOKEN: { LEADLINE_PURGE_TOKEN: 'secret' },
      LEADLINE_BUCKET: { ...real, LEADLINE_BUCKET_ENDPOINT: 'https://objects.example' },
    })) {
      expect(() => readEnv({ ...given, LEADLINE_FAKES: '1' })).toThrow(
        `LEADLINE_FAKES stands in for hosted services, so ${name} must not be set beside it`,
      );
      expect(readEnv(given).LEADLINE_FAKES).toBe(false);
    }
    const fake = { ...real, LEADLINE_BUCKET_ENDPOINT: 'https://objects.leadline.invalid' };
    expect(readEnv({ ...fake, LEADLINE_FAKES: '1' }).LEADLINE_BUCKET).toBe('b');
  });

  it('needs the keys of a bucket beside its name', () => {
    expect(() => readEnv({ LEADLINE_BUCKET: 'b', LEADLINE_BUCKET_KEY: 'k' })).toThrow(
      'LEADLINE_BUCKET needs LEADLINE_BUCKET_KEY and LEADLINE_BUCKET_SECRET beside it',
    );
  });

  it('names every setting it cannot use', () => {
    const bad = { PORT: '0', LEADLINE_ORIGIN: 'ftp://courier.example', DEMO_PASSWORD: 'too short' };
    expect(() => readEnv(bad)).toThrow(
      /^The environment is not usable: PORT .+; LEADLINE_ORIGIN .+; DEMO_PASSWORD/,
    );
  });
});
