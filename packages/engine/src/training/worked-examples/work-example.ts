/** An example worked by the engine: what the key page shows, and what the acceptance tests hold against print and key. */
import type { CheckResult } from '../../check/result';
import { bareValue } from '../../derivation/quantity';
import type { DerivationStep } from '../../derivation/steps';
import type { Diagnosis } from '../../diagnosis/diagnosis-codes';
import type { WeighInResult } from '../../methods/weigh-in/evaluate-weigh-in';
import { evaluateWeighIn } from '../../methods/weigh-in/evaluate-weigh-in';
import { moistAirEnthalpyBtuPerLb } from '../../units';
import type { WorkedFigure } from './computed-figures';
import { checkFigureSi, inUnit } from './computed-figures';
import { judgeRequest } from './judged-request';
import { moistAirSteps } from './moist-air-steps';
import type { CheckedFigure, CheckExample, MoistAirExample, Slip, WeighInExample, WeighInPart } from './worked-example';

export interface WorkedCheck {
  readonly result: CheckResult;
  readonly diagnosis: Diagnosis;
  readonly slips: readonly { readonly slip: Slip; readonly result: CheckResult; readonly diagnosis: Diagnosis }[];
  readonly figures: readonly WorkedFigure[];
}

export function workCheck(example: CheckExample): WorkedCheck {
  const own = judgeRequest(example.request);
  const slips = example.slips.map((slip) => ({ slip, judged: judgeRequest(slip.request) }));
  return {
    result: own.result,
    diagnosis: own.diagnosis,
    slips: slips.map(({ slip, judged: { result, diagnosis } }) => ({ slip, result, diagnosis })),
    figures: example.figures.map((figure) => {
      const judged = slips.find(({ slip }) => slip.id === figure.of)?.judged ?? own;
      return workedFigure(figure, checkFigureSi(figure, judged));
    }),
  };
}

export interface WorkedMoistAir {
  readonly steps: readonly DerivationStep[];
  readonly figures: readonly WorkedFigure[];
}

export function workMoistAir(example: MoistAirExample): WorkedMoistAir {
  const { results, steps } = moistAirSteps(example);
  const si = ({ what }: CheckedFigure): number | null => {
    const quantity = results[what];
    return quantity === undefined ? null : (bareValue(quantity) ?? null);
  };
  return {
    steps,
    figures: example.figures.map((figure) => {
      if (figure.unit !== 'Btu/lb') return workedFigure(figure, si(figure));
      // the inch-pound enthalpy counts from another zero, so it is worked out by its own equation
      const humidityRatio = si({ ...figure, what: 'humidityRatio' });
      const computed = humidityRatio === null ? null : moistAirEnthalpyBtuPerLb(example.given.dryBulbF, humidityRatio);
      return { figure, computed };
    }),
  };
}

export interface WorkedWeighIn {
  readonly parts: readonly {
    readonly part: WeighInPart;
    readonly result: WeighInResult;
    /** What comes out where a misprinted sum is weighed in, in their order. */
    readonly misprinted: readonly WeighInResult[];
  }[];
  readonly figures: readonly WorkedFigure[];
}

export function workWeighIn(example: WeighInExample): WorkedWeighIn {
  const parts = example.parts.map((part) => ({
    part,
    result: evaluateWeighIn(part.input),
    misprinted: part.misprintsKg.map((actualKg) => evaluateWeighIn({ ...part.input, actualKg })),
  }));
  return {
    parts,
    figures: example.figures.map((figure) => {
      const line = parts.find(({ part }) => part.id === figure.of)?.result.lineAdjustment;
      return workedFigure(figure, line === undefined ? null : (bareValue(line) ?? null));
    }),
  };
}

function workedFigure(figure: CheckedFigure, si: number | null): WorkedFigure {
  const { unit } = figure;
  return { figure, computed: si === null || unit === 'Btu/lb' ? null : inUnit(si, unit) };
}
