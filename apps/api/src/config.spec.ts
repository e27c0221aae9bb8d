import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { ConfigError, readConfig } from './config';

describe('settings', () => {
  it('have defaults that need nothing', () => {
    expect(readConfig({})).toEqual({
      host: '127.0.0.1',
      port: 4000,
      dataDir: 'data',
      migrationsDir: 'apps/api/drizzle',
      webRoot: 'dist/web',
      publicUrl: undefined,
      trustProxy: false,
      tls: undefined,
      secure: false,
      logLevel: 'info',
    });
  });

  it('that are empty count as left out', () => {
    expect(readConfig({ PORT: '', TLS_CERT: '', DATA_DIR: '' })).toEqual(readConfig({}));
  });

  it.each([
    ['false', false],
    ['true', true],
    ['2', 2],
    ['loopback, 10.0.0.0/8', 'loopback, 10.0.0.0/8'],
  ])('take %s for the proxies to trust', (text, trustProxy) => {
    expect(readConfig({ TRUST_PROXY: text }).trustProxy).toEqual(trustProxy);
  });

  it('know HTTPS of a proxy by the public address', () => {
    expect(readConfig({ PUBLIC_URL: 'https://shop.example' }).secure).toBe(true);
    expect(readConfig({ PUBLIC_URL: 'http://shop.example' }).secure).toBe(false);
  });

  it('read certificate and key', () => {
    const folder = mkdtempSync(path.join(tmpdir(), 'tls-'));
    const cert = path.join(folder, 'cert.pem');
    const key = path.join(folder, 'key.pem');
    writeFileSync(cert, 'certificate');
    writeFileSync(key, 'key');
    const { tls, secure } = readConfig({ TLS_CERT: cert, TLS_KEY: key });
    expect(String(tls?.cert)).toBe('certificate');
    expect(String(tls?.key)).toBe('key');
    expect(secure).toBe(true);
    rmSync(folder, { recursive: true });
  });

  it.each([
    [{ PORT: 'http' }, /^PORT .*0 to 65535/],
    [{ PORT: '65536' }, /^PORT /],
    [{ PORT: '80.5' }, /^PORT /],
    [{ PUBLIC_URL: 'shop.example' }, /^PUBLIC_URL .*http/],
    [{ PUBLIC_URL: 'ftp://shop.example' }, /^PUBLIC_URL .*http/],
    [{ LOG_LEVEL: 'loud' }, /^LOG_LEVEL .*warn/],
    [{ TLS_CERT: 'a' }, /^TLS_CERT and TLS_KEY .*together/],
    [{ TLS_CERT: '/no/such', TLS_KEY: '/no/such' }, /^TLS_CERT: cannot read/],
  ])('that cannot be used are named in one line: %j', (env, message) => {
    expect(() => readConfig(env)).toThrow(ConfigError);
    expect(() => readConfig(env)).toThrow(message);
    expect(() => readConfig(env)).not.toThrow(/\n/);
  });
});
