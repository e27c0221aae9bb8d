/** Whether a weigh-in counts at all by the rules a check is judged by: who does it, and how warm it is. */
import type { WeighInReason } from './weigh-in-codes';

/** Part of the person who judges: does it, watches the installer do it, or is not allowed to use it. */
export type WeighInRole = 'performs' | 'observes' | 'never';

export interface WeighInPermission {
  readonly role: WeighInRole;
  /** Watching does not count at this outdoor temperature or above, where the system could be tested by its readings. */
  readonly observesBelowK?: number;
  /** Below this outdoor temperature weighing in stands in for a test, and whoever does it promises to come back. */
  readonly promisesBelowK?: number;
  readonly outdoorK?: number;
  /** A standard method (superheat, subcooling) could test this system on a warm day. */
  readonly testable: boolean;
}

/** Rounding of the conversions. */
const SLACK_K = 1e-9;

export type PermissionGate =
  | { readonly state: 'open' }
  | { readonly state: 'outdoor-missing' }
  | { readonly state: 'shut'; readonly reason: WeighInReason };

/** Limits as CEC 2019 codes them: at 55 °F or above it is refused. */
export function judgePermission(permission: WeighInPermission): PermissionGate {
  const { role, observesBelowK, outdoorK, testable } = permission;
  if (role === 'never') return { state: 'shut', reason: { code: 'weigh-in-not-permitted' } };
  if (role === 'performs' || observesBelowK === undefined || !testable) return { state: 'open' };
  if (outdoorK === undefined) return { state: 'outdoor-missing' };
  return outdoorK >= observesBelowK - SLACK_K
    ? { state: 'shut', reason: { code: 'too-warm-to-observe' } }
    : { state: 'open' };
}

/** Somebody who weighs in only for the cold has more to do when it is warm. */
export const promisesToReturn = ({ promisesBelowK, outdoorK, testable, role }: WeighInPermission): boolean =>
  role === 'performs' &&
  testable &&
  promisesBelowK !== undefined &&
  outdoorK !== undefined &&
  outdoorK < promisesBelowK - SLACK_K;
