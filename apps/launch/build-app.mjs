import { ensureBuilt } from './build.mjs';
import { stopWithTools } from './run.mjs';
import { sayFailure } from './say.mjs';

stopWithTools();
try {
  await ensureBuilt();
} catch (error) {
  sayFailure(error);
  process.exitCode = 1;
}
