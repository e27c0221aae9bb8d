import { networkInterfaces } from 'node:os';
import path from 'node:path';
import { ROOT } from './paths.mjs';
import { LaunchError } from './say.mjs';

const LOOPBACK = new Set(['127.0.0.1', '::1', 'localhost']);
const EVERYWHERE = new Set(['0.0.0.0', '::']);

/** The settings of the server, from the environment; ends with one line if they cannot be used. */
export function readSettings(env = process.env, root = ROOT) {
  const port = Number(env.PORT || 4000);
  if (!Number.isInteger(port) || port < 1 || port > 65_535) {
    throw new LaunchError(`PORT is "${env.PORT}", but has to be a whole number from 1 to 65535.`);
  }
  if (Boolean(env.TLS_CERT) !== Boolean(env.TLS_KEY)) {
    throw new LaunchError(
      'TLS_CERT and TLS_KEY have to be given together: the files of the certificate and of its key.',
    );
  }
  return {
    port,
    host: env.HOST || '127.0.0.1',
    secure: Boolean(env.TLS_CERT),
    publicUrl: env.PUBLIC_URL || null,
    dataFolder: path.resolve(root, env.DATA_DIR || 'data'),
    webFolder: path.join(root, 'dist/web'),
  };
}

const url = ({ secure, port }, host) =>
  `${secure ? 'https' : 'http'}://${host.includes(':') ? `[${host}]` : host}:${port}/`;

/** The address at which this computer itself reaches the server. */
export const ownAddress = (settings) => url(settings, EVERYWHERE.has(settings.host) ? '127.0.0.1' : settings.host);

/** All addresses a browser can use: the server's own, and this computer's in its networks if it listens everywhere. */
export function addresses(settings, interfaces = networkInterfaces()) {
  if (!EVERYWHERE.has(settings.host)) return [url(settings, settings.host)];
  const outside = Object.values(interfaces)
    .flat()
    .filter(({ family, internal }) => family === 'IPv4' && !internal);
  return [ownAddress(settings), ...outside.map(({ address }) => url(settings, address))];
}

const FEATURES = 'offline use, installing, camera, Bluetooth and wake lock';
const HOW_TO_SECURE = 'HOST=0.0.0.0 TLS_CERT=<certificate file> TLS_KEY=<key file> npm start';

/** One line: which features of a phone the address allows (they need a secure context: HTTPS or this computer). */
export function featureLine({ secure, host, publicUrl }) {
  if (publicUrl?.startsWith('https:')) return `Secure context at ${publicUrl} (HTTPS): ${FEATURES} work there.`;
  if (secure && !LOOPBACK.has(host)) {
    return `Secure context (HTTPS): ${FEATURES} work, on a phone that trusts the certificate.`;
  }
  if (LOOPBACK.has(host)) {
    return `Secure context on this computer: ${FEATURES} work. For a phone: ${HOW_TO_SECURE}`;
  }
  return `Not a secure context except on this computer: ${FEATURES} need HTTPS. Set it by ${HOW_TO_SECURE}`;
}
