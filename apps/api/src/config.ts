import { readFileSync } from 'node:fs';
import * as z from 'zod';

/** Every setting of the server, from the environment once at the start. */
export interface Config {
  readonly host: string;
  readonly port: number;
  readonly dataDir: string;
  /** Folder of the migrations of the records. */
  readonly migrationsDir: string;
  /** Folder of the built page; the server answers without it too. */
  readonly webRoot: string;
  /** Address in links of mails and reports; never taken from a request's Host header. */
  readonly publicUrl: string | undefined;
  /** Which proxies may say who the client is: Express's `trust proxy`. */
  readonly trustProxy: boolean | number | string;
  readonly tls: { readonly cert: Buffer; readonly key: Buffer } | undefined;
  /** Browsers reach the server by HTTPS, its own or a proxy's. */
  readonly secure: boolean;
  readonly logLevel: string;
}

/** A setting that cannot be used; the message is one line for the person who starts the server. */
export class ConfigError extends Error {
  override readonly name = 'ConfigError';
}

const LOG_LEVELS = ['trace', 'debug', 'info', 'warn', 'error', 'silent'] as const;

const environment = z
  .object({
    HOST: z.string().default('127.0.0.1'),
    PORT: z.coerce.number('has to be a whole number from 0 to 65535').int().min(0).max(65_535).default(4000),
    DATA_DIR: z.string().default('data'),
    MIGRATIONS_DIR: z.string().default('apps/api/drizzle'),
    WEB_ROOT: z.string().default('dist/web'),
    PUBLIC_URL: z.url({ protocol: /^https?$/, error: 'has to be an http or https address' }).optional(),
    TRUST_PROXY: z.string().default('false').transform(trustProxy),
    TLS_CERT: z.string().optional(),
    TLS_KEY: z.string().optional(),
    LOG_LEVEL: z.enum(LOG_LEVELS, `has to be one of ${LOG_LEVELS.join(', ')}`).default('info'),
  })
  .refine((env) => (env.TLS_CERT === undefined) === (env.TLS_KEY === undefined), {
    path: ['TLS_CERT'],
    error: 'and TLS_KEY have to be given together: the files of the certificate and of its key',
  });

/** `true`, `false`, the number of proxies in front, or their addresses as Express understands them. */
function trustProxy(text: string): boolean | number | string {
  if (text === 'true' || text === 'false') return text === 'true';
  return /^\d+$/.test(text) ? Number(text) : text;
}

/** Reads the settings. Throws `ConfigError` that names each one that cannot be used. */
export function readConfig(env: Readonly<Record<string, string | undefined>>): Config {
  // an empty variable is how a shell or a service file leaves a setting out
  const given = Object.fromEntries(Object.entries(env).filter(([, value]) => value !== undefined && value !== ''));
  const parsed = environment.safeParse(given);
  if (!parsed.success) {
    throw new ConfigError(parsed.error.issues.map(({ path, message }) => `${path.join('.')} ${message}`).join('; '));
  }
  const { HOST, PORT, DATA_DIR, MIGRATIONS_DIR, WEB_ROOT, PUBLIC_URL, TRUST_PROXY, TLS_CERT, TLS_KEY, LOG_LEVEL } =
    parsed.data;
  const tls =
    TLS_CERT === undefined || TLS_KEY === undefined
      ? undefined
      : { cert: readSetting('TLS_CERT', TLS_CERT), key: readSetting('TLS_KEY', TLS_KEY) };
  return {
    host: HOST,
    port: PORT,
    dataDir: DATA_DIR,
    migrationsDir: MIGRATIONS_DIR,
    webRoot: WEB_ROOT,
    publicUrl: PUBLIC_URL,
    trustProxy: TRUST_PROXY,
    tls,
    secure: tls !== undefined || (PUBLIC_URL?.startsWith('https:') ?? false),
    logLevel: LOG_LEVEL,
  };
}

function readSetting(name: string, file: string): Buffer {
  try {
    return readFileSync(file);
  } catch (error) {
    // a file that is not there or not readable is a setting to correct, not a crash
    throw new ConfigError(`${name}: cannot read ${file} (${(error as NodeJS.ErrnoException).code ?? 'unknown'})`);
  }
}
