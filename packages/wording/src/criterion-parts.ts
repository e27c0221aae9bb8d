import {
  expandedUncertainty,
  type CriterionId,
  type CriterionResult,
  type DerivedStep,
  type Finding,
  type Known,
  type QuantityKind,
  type ReadingId,
  type TargetSource,
  type ToleranceSource,
} from '@chargewright/engine';
import { formatBare, formatProbability, formatShort, formatValue } from './format-value';
import type { UnitSystem } from './unit-system';

/** A criterion's result with every number printed: what a language makes its sentences of. */
export interface CriterionParts {
  readonly criterion: CriterionId;
  readonly finding: Finding;
  /** "18.3 °F" */
  readonly actual: string | null;
  /** "18.3", for where the unit stands once */
  readonly actualBare: string | null;
  /** Expanded uncertainty, "1.8 °F". */
  readonly plusMinus: string | null;
  readonly target: string | null;
  readonly targetBare: string | null;
  readonly targetSource: TargetSource | null;
  /** Conditions at which the target was looked up, by the name of the formula's input. */
  readonly conditions: Readonly<Record<string, string>>;
  /** Size of the deviation; the sign is `side`. */
  readonly deviation: string | null;
  readonly side: 'above' | 'on' | 'below';
  /** Ends of the band on the scale of the actual value; `null` on a side without an end. */
  readonly low: string | null;
  readonly high: string | null;
  readonly lowBare: string | null;
  readonly highBare: string | null;
  readonly floored: boolean;
  readonly toleranceSource: ToleranceSource | null;
  readonly byRule: 'passes' | 'fails' | null;
  readonly probabilityWithin: string | null;
  readonly probabilityOutside: string | null;
  /** The rule decided, without much certainty. */
  readonly onlyJust: boolean;
  /** Readings that are missing, when that is the reason. */
  readonly missing: readonly ReadingId[];
}

const conditionsOf = (target: Known | null, system: UnitSystem): Readonly<Record<string, string>> =>
  target === null || target.step.type === 'leaf'
    ? {}
    : Object.fromEntries(
        Object.entries(lookUpOf(target.step).from).map(([name, input]) => [
          name,
          formatShort(input.kind, input.value, system),
        ]),
      );

/** The step that looked the target up: a pressure is shown as a gauge has it, one step further on. */
function lookUpOf(step: DerivedStep): DerivedStep {
  const before = step.from['pressurePa']?.step;
  return before?.type === 'derived' ? before : step;
}

const missingOf = ({ reason }: CriterionResult): readonly ReadingId[] =>
  reason?.code === 'readings-missing' && reason.figures.readings.kind === 'readings'
    ? reason.figures.readings.value
    : [];

function bandOf(result: CriterionResult, kind: QuantityKind, system: UnitSystem) {
  // a window has no target: its tolerance holds the value itself
  const from = result.target?.value ?? 0;
  const { low = null, high = null } = result.tolerance ?? {};
  const at = (limit: number | null, print: typeof formatShort) =>
    limit === null ? null : print(kind, from + limit, system);
  return {
    low: at(low, formatShort),
    high: at(high, formatShort),
    lowBare: at(low, formatBare),
    highBare: at(high, formatBare),
    floored: result.tolerance?.floored ?? false,
    toleranceSource: result.tolerance?.source ?? null,
  };
}

function sideOf(deviation: Known | null, printed: string | null): CriterionParts['side'] {
  if (deviation === null || printed === null || Number.parseFloat(printed) === 0) return 'on';
  return deviation.value > 0 ? 'above' : 'below';
}

export function criterionParts(result: CriterionResult, system: UnitSystem): CriterionParts {
  const { criterion, finding, actual, target, targetSource, deviation, byRule, probabilityWithin } = result;
  const kind = (actual ?? target ?? deviation)?.kind ?? 'differenceK';
  const size = deviation && formatValue(deviation.kind, Math.abs(deviation.value), system);
  return {
    criterion,
    finding,
    actual: actual && formatValue(actual.kind, actual.value, system),
    actualBare: actual && formatBare(actual.kind, actual.value, system),
    plusMinus: actual && formatValue(uncertaintyKind(actual.kind), expandedUncertainty(actual), system),
    target: target && formatShort(target.kind, target.value, system),
    targetBare: target && formatBare(target.kind, target.value, system),
    targetSource,
    conditions: conditionsOf(target, system),
    deviation: size,
    side: sideOf(deviation, size),
    ...bandOf(result, kind, system),
    byRule,
    probabilityWithin: probabilityWithin === null ? null : formatProbability(probabilityWithin),
    probabilityOutside: probabilityWithin === null ? null : formatProbability(1 - probabilityWithin),
    onlyJust: result.onlyJust,
    missing: missingOf(result),
  };
}

/** The ± of a temperature is a difference, that of a pressure a pressure difference. */
export const uncertaintyKind = (kind: QuantityKind): QuantityKind => {
  if (kind === 'temperatureK') return 'differenceK';
  return kind === 'pressurePa' || kind === 'gaugePressurePa' ? 'pressureDifferencePa' : kind;
};
