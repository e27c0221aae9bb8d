import { describe, expect, it } from 'vitest';
import { addresses, featureLine, ownAddress, readSettings } from '../../apps/launch/settings.mjs';

const ROOT = '/repository';
const settings = (env) => readSettings(env, ROOT);

it('listens on this computer, port 4000, with its data in the repository, unless told otherwise', () => {
  expect(settings({})).toEqual({
    port: 4000,
    host: '127.0.0.1',
    secure: false,
    publicUrl: null,
    dataFolder: '/repository/data',
    webFolder: '/repository/dist/web',
  });
  expect(settings({ PORT: '4001', HOST: '0.0.0.0', DATA_DIR: '/srv/data' })).toMatchObject({
    port: 4001,
    host: '0.0.0.0',
    dataFolder: '/srv/data',
  });
});

it.each(['0', '65536', '4000.5', 'four', '-1'])('refuses the port "%s" in one line', (PORT) => {
  expect(() => settings({ PORT })).toThrow(/^PORT is "[^\n]*$/);
});

it('refuses a certificate without its key', () => {
  expect(() => settings({ TLS_CERT: 'cert.pem' })).toThrow('TLS_CERT and TLS_KEY');
  expect(settings({ TLS_CERT: 'cert.pem', TLS_KEY: 'key.pem' }).secure).toBe(true);
});

const interfaces = {
  lo: [{ address: '127.0.0.1', family: 'IPv4', internal: true }],
  eth0: [
    { address: '192.168.1.20', family: 'IPv4', internal: false },
    { address: 'fe80::1', family: 'IPv6', internal: false },
  ],
};

it('prints every address when it listens everywhere', () => {
  const everywhere = settings({ HOST: '0.0.0.0' });
  expect(addresses(everywhere, interfaces)).toEqual(['http://127.0.0.1:4000/', 'http://192.168.1.20:4000/']);
  expect(ownAddress(everywhere)).toBe('http://127.0.0.1:4000/');
});

it('prints the one address it listens on', () => {
  expect(addresses(settings({}), interfaces)).toEqual(['http://127.0.0.1:4000/']);
  expect(addresses(settings({ HOST: '::1' }), interfaces)).toEqual(['http://[::1]:4000/']);
});

describe('the features of an address', () => {
  const tls = { TLS_CERT: 'cert.pem', TLS_KEY: 'key.pem' };

  it.each([{}, { HOST: 'localhost' }, { HOST: '::1' }, tls])('work on this computer: %o', (env) => {
    expect(featureLine(settings(env))).toMatch(/^Secure context on this computer: offline use[^\n]* work\./);
  });

  it('work over HTTPS elsewhere', () => {
    expect(featureLine(settings({ HOST: '0.0.0.0', ...tls }))).toMatch(/^Secure context \(HTTPS\): offline use/);
  });

  it('work at a public address with HTTPS, which a proxy before the server gives', () => {
    const line = featureLine(settings({ PUBLIC_URL: 'https://checks.example' }));
    expect(line).toMatch(/^Secure context at https:\/\/checks\.example \(HTTPS\): offline use[^\n]* work there\.$/);
  });

  it('need HTTPS elsewhere, and how to set it is said', () => {
    const line = featureLine(settings({ HOST: '0.0.0.0' }));
    expect(line).toMatch(/^Not a secure context[^\n]* Bluetooth[^\n]* need HTTPS/);
    expect(line).toContain('TLS_CERT=');
    expect(line).toContain('TLS_KEY=');
  });
});
