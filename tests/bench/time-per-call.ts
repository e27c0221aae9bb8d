/**
 * Time per call of some functions, in turns within one run, so that a busy machine slows all of them alike. Measured is the processor's time of
 * this process, not the clock on the wall: waiting for other programs is not counted, collecting garbage is.
 */

export interface Contender {
  readonly name: string;
  /** Runs the function `calls` times in all and gives something that depends on every result. */
  readonly run: () => number;
  readonly calls: number;
}

const ROUNDS = 41;
const WARM_UP_MS = 1500;
const ROUND_MS = 15;

let sink = 0;

function nanosecondsOf(run: () => number, times: number): number {
  const start = process.cpuUsage();
  for (let k = 0; k < times; k++) sink += run();
  const { user, system } = process.cpuUsage(start);
  return 1000 * (user + system);
}

/** Repetitions that fill a round, after the optimiser has seen the function. */
function repetitions(run: () => number): number {
  let done = 0;
  const start = performance.now();
  while (performance.now() - start < WARM_UP_MS) {
    sink += run();
    done++;
  }
  return Math.max(1, Math.round((done * ROUND_MS) / (performance.now() - start)));
}

export const median = (values: readonly number[]): number => {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.floor(sorted.length / 2)]!;
};

/** Median nanoseconds per call of each contender, and of each round's ratio to the first one. */
export function timePerCall(contenders: readonly Contender[]): readonly { ns: number; timesTheFirst: number }[] {
  const plans = contenders.map(({ run, calls }) => ({ run, calls, times: repetitions(run) }));
  const rounds = Array.from({ length: ROUNDS }, () =>
    plans.map(({ run, calls, times }) => nanosecondsOf(run, times) / (times * calls)),
  );
  // the sum is looked at, so that no call can be dropped
  if (Number.isNaN(sink)) throw new Error('a result was not a number');
  return plans.map((_, i) => ({
    ns: median(rounds.map((round) => round[i]!)),
    timesTheFirst: median(rounds.map((round) => round[i]! / round[0]!)),
  }));
}
