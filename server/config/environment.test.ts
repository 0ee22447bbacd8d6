import { describe, expect, it } from 'vitest';
import { ConfigError, readConfig } from './environment';

describe('the settings', () => {
  it('have defaults for all', () => {
    expect(readConfig({})).toMatchObject({
      port: 4780,
      host: '127.0.0.1',
      baseUrl: 'http://127.0.0.1:4780',
      secureCookie: false,
      trustProxy: 0,
      demo: true,
      rateLimit: 10,
    });
    expect(readConfig({ PORT: '', MILLPOND_SMTP_URL: '' }).port).toBe(4780);
  });

  it('make the cookie secure when people come over https, or in production', () => {
    expect(readConfig({ MILLPOND_BASE_URL: 'https://pond.example/' })).toMatchObject({
      baseUrl: 'https://pond.example',
      secureCookie: true,
    });
    expect(readConfig({ NODE_ENV: 'production' }).secureCookie).toBe(true);
    const plain = { NODE_ENV: 'production', MILLPOND_BASE_URL: 'http://pond.example' };
    expect(readConfig(plain).secureCookie).toBe(false);
  });

  it('take proxies as a number or as addresses', () => {
    expect(readConfig({ MILLPOND_TRUST_PROXY: '1' }).trustProxy).toBe(1);
    expect(readConfig({ MILLPOND_TRUST_PROXY: 'loopback, 10.0.0.0/8' }).trustProxy).toEqual([
      'loopback',
      '10.0.0.0/8',
    ]);
  });

  it.each([
    ['PORT', '80 80'],
    ['PORT', '70000'],
    ['MILLPOND_BASE_URL', 'pond.example'],
    ['MILLPOND_BASE_URL', 'javascript:alert(1)'],
    ['MILLPOND_SECRET', 'short'],
    ['MILLPOND_SMTP_URL', 'http://mail.example'],
    ['MILLPOND_RATE_LIMIT', '-1'],
    ['MILLPOND_TRUST_PROXY', '!'],
    ['MILLPOND_LOG_LEVEL', 'loud'],
  ])('name the one that is wrong: %s=%s', (name, value) => {
    expect(() => readConfig({ [name]: value })).toThrow(ConfigError);
    expect(() => readConfig({ [name]: value })).toThrow(new RegExp(`^${name}: `));
  });
});
