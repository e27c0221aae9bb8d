/**
 * How long a sign-in has to wait after failed ones: by account and address together, so that nobody else can shut a person out, with a slow cap over all
 * of them against guessing from many addresses. Kept in memory: a restart forgives.
 */
export interface SignInWaits {
  /** Whole seconds before the next attempt; 0 where it may be made now. */
  secondsToWait(key: string): number;
  failed(key: string): void;
  /** Takes back the failure that was counted beforehand, and those before it. */
  succeeded(key: string): void;
}

/** Typing mistakes that cost nothing. */
const FREE_FAILURES = 4;
const FIRST_WAIT_MS = 1_000;
const LONGEST_WAIT_MS = 15 * 60_000;
/** After this long without an attempt the count starts again. */
const FORGET_AFTER_MS = 60 * 60_000;
/** Far more than people who mistype at one time, in all shops of a server. */
const MOST_FAILURES_PER_MINUTE = 300;
const MOST_KEYS = 50_000;

interface Failures {
  readonly count: number;
  readonly lastAt: number;
}

export function signInWaits(now: () => number = Date.now): SignInWaits {
  const failuresOf = new Map<string, Failures>();
  let minute = { begins: 0, failures: 0 };

  const current = (key: string): Failures | undefined => {
    const failures = failuresOf.get(key);
    return failures !== undefined && now() - failures.lastAt < FORGET_AFTER_MS ? failures : undefined;
  };
  const thisMinute = () => {
    if (now() - minute.begins >= 60_000) minute = { begins: now(), failures: 0 };
    return minute;
  };

  return {
    secondsToWait(key) {
      const { begins, failures: ofAll } = thisMinute();
      const cap = ofAll >= MOST_FAILURES_PER_MINUTE ? begins + 60_000 - now() : 0;
      const failures = current(key);
      const own = failures === undefined ? 0 : failures.lastAt + waitAfter(failures.count) - now();
      return Math.ceil(Math.max(own, cap, 0) / 1_000);
    },
    failed(key) {
      thisMinute().failures += 1;
      const count = (current(key)?.count ?? 0) + 1;
      // the latest at the end, so that the oldest is the first to be forgotten
      failuresOf.delete(key);
      failuresOf.set(key, { count, lastAt: now() });
      if (failuresOf.size > MOST_KEYS) failuresOf.delete(failuresOf.keys().next().value!);
    },
    succeeded(key) {
      const ofAll = thisMinute();
      ofAll.failures = Math.max(ofAll.failures - 1, 0);
      failuresOf.delete(key);
    },
  };
}

function waitAfter(count: number): number {
  if (count <= FREE_FAILURES) return 0;
  return Math.min(FIRST_WAIT_MS * 2 ** (count - FREE_FAILURES - 1), LONGEST_WAIT_MS);
}
