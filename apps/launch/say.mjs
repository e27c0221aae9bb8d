/** A failure whose message is meant for the person at the terminal: printed as it is, without a stack. */
export class LaunchError extends Error {
  constructor(message, { log = '' } = {}) {
    super(message);
    this.name = 'LaunchError';
    this.log = log;
  }
}

export function say(line = '') {
  process.stdout.write(`${line}\n`);
}

/** Prints a failure: first the log of the step that failed, then the one line that says what to do. */
export function sayFailure(error) {
  if (!(error instanceof LaunchError)) {
    say(error instanceof Error ? error.stack : String(error));
    return;
  }
  if (error.log !== '') say(error.log);
  say(error.message);
}

export const seconds = (milliseconds) => `${(milliseconds / 1000).toFixed(1)} s`;

const STILL_WORKING_MS = 30_000;

/** Runs a long step, announcing it with its usual duration, and saying every half minute that it goes on. */
export async function step(title, usually, work) {
  const start = performance.now();
  say(`${title} (usually ${usually}) …`);
  const reminder = setInterval(() => say(`  still working, ${seconds(performance.now() - start)}`), STILL_WORKING_MS);
  try {
    const result = await work();
    say(`  done in ${seconds(performance.now() - start)}`);
    return result;
  } finally {
    clearInterval(reminder);
  }
}
