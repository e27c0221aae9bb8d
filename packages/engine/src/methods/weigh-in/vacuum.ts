/** The vacuum before the charge: deep enough, and holding. */
import { WEIGH_IN_FIGURES } from './data/weigh-in-figures';

export interface VacuumRecord {
  /** Deepest pressure reached, absolute Pa; in microns on the gauge. */
  readonly deepestPa?: number;
  /** Rise after the pump was valved off, Pa. */
  readonly risePa?: number;
  readonly isolatedMinutes?: number;
}

/** `not-proven`: neither passed nor failed, because it was not isolated for as long as the rule says. */
export type VacuumOutcome = 'passes' | 'fails' | 'not-proven' | 'not-recorded';

/** Relative rounding of a limit that was typed in microns. */
const SLACK = 1e-9;

/**
 * At or below 500 microns, and then a rise of at most 300 in 5 minutes; limits inclusive. More than 300 in a longer time proves nothing either way; more
 * than 300 in a shorter time fails already.
 */
export function judgeVacuum(record: VacuumRecord = {}): VacuumOutcome {
  const { deepestPa, risePa, isolatedMinutes } = record;
  const { deepestVacuumPa, mostRisePa, isolatedMinutes: rule } = WEIGH_IN_FIGURES;
  if (deepestPa !== undefined && deepestPa > deepestVacuumPa.value * (1 + SLACK)) return 'fails';
  const rises = risePa !== undefined && risePa > mostRisePa.value * (1 + SLACK);
  if (rises && isolatedMinutes !== undefined && isolatedMinutes <= rule.value) return 'fails';
  if (deepestPa === undefined || risePa === undefined || isolatedMinutes === undefined) return 'not-recorded';
  return rises || isolatedMinutes < rule.value ? 'not-proven' : 'passes';
}
