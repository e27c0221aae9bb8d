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

export const sourceOf = ({ standing }: Rule): ToleranceSource => (standing === 'choice' ? 'choice' : 'procedure');

export const symmetric = ({ half, source }: HalfWidth): Tolerance => ({
  low: -half,
  high: half,
  floored: false,
  source,
});

/** The measured value itself must not pass under the floor, whatever the target allows. */
export function floored({ half, source }: HalfWidth, target: number, floor: Rule | null): Tolerance {
  const least = floor === null ? -half : Math.max(floor.value - target, -half);
  return { low: least, high: half, floored: least > -half, source };
}
