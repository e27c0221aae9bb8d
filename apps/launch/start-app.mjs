import { ensureBuilt } from './build.mjs';
import { ensureInstalled } from './install.mjs';
import { stopWithTools } from './run.mjs';
import { sayFailure } from './say.mjs';
import { requireFreePort, serve } from './serve.mjs';
import { readSettings } from './settings.mjs';

/** `npm start`: installs and builds what has changed, then serves app and API until told to end. */
export async function start() {
  try {
    const settings = readSettings();
    await requireFreePort(settings);
    const endPreparing = stopWithTools();
    await ensureInstalled();
    await ensureBuilt();
    endPreparing();
    process.exitCode = await serve(settings);
  } catch (error) {
    sayFailure(error);
    process.exitCode = 1;
  }
}
