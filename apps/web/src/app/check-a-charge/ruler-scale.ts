/** The fixed scale of each criterion's ruler, in the engine's units, and the values laid on it. */
import {
  differenceToK,
  expandedUncertainty,
  pressureDifferenceToPa,
  type CriterionId,
  type CriterionResult,
} from '@chargewright/engine';
import type { RulerScale, RulerValues } from './ruler-geometry';

const scaleF = (low: number, high: number): RulerScale => ({
  low: differenceToK(low, 'deltaF'),
  high: differenceToK(high, 'deltaF'),
});

/** Wide enough for the targets printed for each method (trade/trade-practice.md 3), narrow enough that ±3 °F is seen. */
const SCALES: Readonly<Partial<Record<CriterionId, RulerScale>>> = {
  superheat: scaleF(0, 40),
  'superheat-window': scaleF(0, 40),
  subcooling: scaleF(0, 25),
  'liquid-line-approach': scaleF(0, 30),
  'temperature-split': scaleF(5, 35),
};

/** Temperatures and pressures by a maker's table lie anywhere: so much to either side of the target is drawn. */
const AROUND_TARGET: Readonly<Partial<Record<CriterionId, number>>> = {
  'suction-line-temperature': differenceToK(15, 'deltaF'),
  'heating-discharge-temperature': differenceToK(30, 'deltaF'),
  'liquid-pressure': pressureDifferenceToPa(60, 'psi'),
  'heating-discharge-pressure': pressureDifferenceToPa(60, 'psi'),
};

/** Airflow has no scale of its own: it depends on the size of the unit, which is not typed and retyped like a reading. */
const AIRFLOW_SPAN = { low: 0.5, high: 1.5 } as const;

function scaleOf({ criterion, target }: CriterionResult): RulerScale | null {
  const scale = SCALES[criterion];
  if (scale) return scale;
  if (target === null) return null;
  const around = AROUND_TARGET[criterion];
  if (around !== undefined) return { low: target.value - around, high: target.value + around };
  if (criterion !== 'airflow') return null;
  return { low: target.value * AIRFLOW_SPAN.low, high: target.value * AIRFLOW_SPAN.high };
}

/** Limits of a tolerance count from the target, or from zero for a window without one. */
const originOf = ({ actual, target, deviation }: CriterionResult): number =>
  target?.value ?? (actual !== null && deviation !== null ? actual.value - deviation.value : 0);

/** What the ruler of a criterion shows; null when there is nothing to lay on a scale. */
export function rulerValues(result: CriterionResult): RulerValues | null {
  const { actual, target, tolerance } = result;
  const scale = scaleOf(result);
  if (scale === null || (actual === null && target === null)) return null;
  const origin = originOf(result);
  const at = (limit: number | null): number | null => (limit === null ? null : origin + limit);
  return {
    scale,
    band: tolerance && { low: at(tolerance.low), high: at(tolerance.high) },
    target: target?.value ?? null,
    actual: actual && { value: actual.value, plusMinus: expandedUncertainty(actual) },
  };
}
