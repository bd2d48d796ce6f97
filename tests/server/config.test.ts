import { describe, expect, it } from 'vitest';
import { ConfigError, readConfig } from '~/server/config';

const whole = {
  DIPWRIGHT_DATABASE_HOST: '127.0.0.1',
  DIPWRIGHT_DATABASE_NAME: 'dipwright',
  DIPWRIGHT_DATABASE_USER: 'dipwright',
  DIPWRIGHT_DATABASE_PASSWORD: 'a generated one',
};

function faultsOf(env: Record<string, string>): readonly string[] {
  try {
    readConfig(env);
  } catch (error) {
    if (error instanceof ConfigError) return error.faults;
    throw error;
  }
  return [];
}

describe('readConfig', () => {
  it('needs the database and nothing else', () => {
    const config = readConfig(whole);
    expect(config.mode).toBe('production');
    expect(config.http).toMatchObject({
      host: '127.0.0.1',
      port: 4321,
      origin: 'http://127.0.0.1:4321',
      trustedProxies: 0,
      tls: false,
    });
    expect(config.http.allowedHosts).toEqual(['127.0.0.1:4321', 'localhost:4321']);
  });

  it.each(['production', 'development', 'test'])(
    'has no default for a secret, in %s either',
    (mode) => {
      const faults = faultsOf({ ...whole, DIPWRIGHT_MODE: mode, DIPWRIGHT_DATABASE_PASSWORD: '' });
      expect(faults).toEqual(['DIPWRIGHT_DATABASE_PASSWORD is missing']);
    },
  );

  it('names every fault at once, and no value', () => {
    const faults = faultsOf({
      DIPWRIGHT_PORT: '70000',
      DIPWRIGHT_ORIGIN: 'dipwright.example',
      DIPWRIGHT_ALLOWED_HOSTS: 'a b',
      DIPWRIGHT_TRUSTED_PROXIES: '-1',
      DIPWRIGHT_DATABASE_PASSWORD: 'hidden-value',
      DIPWRIGHT_DATABASE_NAME: 'no spaces; DROP',
    });
    expect(faults).toHaveLength(7);
    const text = new ConfigError(faults).message;
    for (const name of [
      'PORT',
      'ORIGIN',
      'ALLOWED_HOSTS',
      'TRUSTED_PROXIES',
      'DATABASE_HOST',
      'DATABASE_NAME',
      'DATABASE_USER',
    ]) {
      expect(text).toContain(`DIPWRIGHT_${name} `);
    }
    expect(text).not.toMatch(/hidden-value|DROP|70000/);
  });

  it('takes TLS from the origin, and answers under its name and the listed ones only', () => {
    const { http } = readConfig({
      ...whole,
      DIPWRIGHT_ORIGIN: 'https://tanks.tarnside.example',
      DIPWRIGHT_ALLOWED_HOSTS: 'WWW.tarnside.example, tarnside.example:8443',
    });
    expect(http.tls).toBe(true);
    expect(http.allowedHosts).toEqual([
      'tanks.tarnside.example',
      'www.tarnside.example',
      'tarnside.example:8443',
    ]);
  });

  it('refuses an origin with a path', () => {
    expect(faultsOf({ ...whole, DIPWRIGHT_ORIGIN: 'https://tarnside.example/app' })).toHaveLength(
      1,
    );
  });
});
