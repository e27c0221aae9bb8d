import type { CheckMakersChart } from '../input';
import type { Rule } from '../procedure';
import type { Tolerance, ToleranceSource } from '../result';

interface HalfWidth {
  readonly half: number;
  readonly source: ToleranceSource;
}

/** The maker's ± where it was entered with the table, else the procedure's. */
export const halfWidth = (chart: CheckMakersChart | null, rule: Rule): HalfWidth =>
  chart?.tolerance === undefined
    ? { half: rule.value, source: sourceOf(rule) }
    : { half: chart.tolerance, source: 'makers-data' };

export const sourceOf = ({ standing, takenFrom }: Rule): ToleranceSource =>
  takenFrom ?? (standing === 'choice' ? 'choice' : 'procedure');

export const symmetric = ({ half, source }: HalfWidth): Tolerance => ({
  low: -half,
  high: half,
  floored: false,
  source,
});

/** The measured value itself must not pass under the floor, whatever the target allows; a floor that only stands in ends where the maker states a ±. */
export function floored({ half, source }: HalfWidth, target: number, floor: Rule | null): Tolerance {
  const holds = floor !== null && !(floor.takenFrom !== undefined && source === 'makers-data');
  const least = holds ? Math.max(floor.value - target, -half) : -half;
  return { low: least, high: half, floored: least > -half, source };
}
