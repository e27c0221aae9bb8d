import pino from 'pino';
import { createApp } from './app';
import { ConfigError, readConfig } from './config';
import { DataError } from './db/open-database';
import { openRecords } from './db/records';
import { openSessions } from './features/sign-in/sessions';
import { signInWaits } from './features/sign-in/sign-in-waits';
import { LIMITS } from './http/limits';
import { ListenError, closeServer, createServer, listen } from './server';

const ONE_DAY_MS = 24 * 60 * 60_000;

async function main(): Promise<void> {
  const config = readConfig(process.env);
  const logger = pino({ level: config.logLevel, base: null });
  const records = openRecords(config);
  const sessions = openSessions(records, config);
  const isReady = () => records.isReadable();
  const app = createApp({ ...config, logger, limits: LIMITS, records, sessions, waits: signInWaits(), isReady });
  const sweep = () => {
    sessions.sweep().catch((error: unknown) => logger.error({ err: error }, 'expired sessions were not removed'));
  };
  sweep();
  // does not keep the process alive
  setInterval(sweep, ONE_DAY_MS).unref();
  const server = createServer(app, config.tls);
  let ending = false;
  const end = (): void => {
    if (ending) return;
    ending = true;
    void closeServer(server).then(async () => {
      await records.close();
      logger.info('stopped');
      process.exit(0);
    });
  };
  process.on('SIGTERM', end).on('SIGINT', end);
  try {
    const port = await listen(server, config);
    logger.info({ host: config.host, port, tls: config.tls !== undefined }, 'listening');
  } catch (error) {
    // the port or address is for the person to change; the data was opened already
    await records.close();
    throw error;
  }
}

main().catch((error: unknown) => {
  // what the person who starts the server can mend is one line; anything else is a bug with its stack
  const known = [ConfigError, DataError, ListenError].some((kind) => error instanceof kind);
  console.error(known ? (error as Error).message : error);
  process.exitCode = 1;
});
