/** The maker's methods beside superheat and subcooling: a table says what the system should show at these conditions. */
import { derive } from '../../derivation/derive';
import type { Known, Quantity } from '../../derivation/quantity';
import { isKnown, missing } from '../../derivation/quantity';
import { liquidLineApproach } from '../../methods/air-to-refrigerant';
import { siteGaugePressure } from '../../methods/cycle-points';
import { bubblePressurePa, bubbleTemperatureK } from '../../refrigerants/saturation';
import { attempt } from '../../result';
import type { ChargeMethod, OtherMethod } from '../charge-method';
import { highSideReading } from '../derived-quantities';
import { unfitPortReason } from '../fit-for-test';
import type { CheckInput } from '../input';
import type { CriterionResult, Tolerance } from '../result';
import type { ChargeJudgement } from './charge';
import { negativeDifference } from './charge';
import { chargeTarget } from './charge-target';
import { judgeCriterion, unjudged } from './criterion';
import { halfWidth, sourceOf, symmetric } from './tolerance';

type MakersMethod = ChargeMethod & { readonly kind: OtherMethod };

export function judgeMakersMethod(judgement: ChargeJudgement, own: MakersMethod): CriterionResult {
  const { input, derived, unfit, unstated, method, gates } = judgement;
  const { procedure, setup } = input;
  const { kind } = own;
  const required = method.kind === kind;
  const actual = actualOf(input, kind);
  if (unfit !== null) return unjudged(kind, required, 'not-verifiable', unfit, actual);
  if (unstated !== null) return unjudged(kind, required, 'not-judged', unstated, actual);
  const unfitPort = kind === 'liquid-pressure' ? unfitPortReason(input) : null;
  if (unfitPort?.code === 'liquid-reading-at-discharge-port') {
    return unjudged(kind, required, 'not-verifiable', unfitPort, actual);
  }
  const target = chargeTarget(input, derived, own);
  const isPressure = kind === 'liquid-pressure' || kind === 'heating-discharge-pressure';
  const shown = isPressure ? onSiteGauge(input, target.quantity, `${kind}-target`) : target.quantity;
  return judgeCriterion({
    criterion: kind,
    required,
    actual,
    target: shown,
    targetSource: target.source,
    tolerance: () => toleranceOf(input, own, target.quantity),
    decision: procedure.decision,
    probabilityOfNoTarget: target.probabilityOfNoTarget,
    mostProbabilityOfNoTarget: procedure.mostProbabilityOfNoTarget.value,
    gates: gates(own),
    neverWithin: setup.mode === 'cooling' ? negativeDifference(derived) : null,
  });
}

/** What the system shows of what the table prints; pressures as a gauge shows them at this site, since that is what a person compares. */
function actualOf(input: CheckInput, kind: OtherMethod): Quantity {
  const { readings, setup } = input;
  const read = (id: keyof typeof readings): Quantity => readings[id]?.quantity ?? missing(id);
  switch (kind) {
    case 'liquid-line-approach':
      return derive(liquidLineApproach, {
        liquidLineK: read('liquidLineTemperature'),
        outdoorK: read('outdoorDryBulb'),
      });
    case 'suction-line-temperature':
      return read('suctionLineTemperature');
    case 'liquid-pressure':
      return onSiteGauge(input, read(highSideReading(setup)), kind);
    case 'heating-discharge-pressure':
      return onSiteGauge(input, read('dischargePressure'), kind);
    case 'heating-discharge-temperature':
      return read('dischargeLineTemperature');
  }
}

const onSiteGauge = ({ setup }: CheckInput, pressurePa: Quantity, name: string): Quantity =>
  derive(siteGaugePressure(name), { pressurePa, atmospherePa: setup.atmosphere });

/** `null` where the refrigerant's curve does not reach, so that a pressure cannot be told as a temperature. */
function toleranceOf(
  { procedure, setup }: CheckInput,
  { kind, chart }: MakersMethod,
  target: Quantity,
): Tolerance | null {
  const rules = procedure.makersMethods;
  if (rules === null) return null;
  switch (kind) {
    case 'liquid-line-approach':
      return symmetric(halfWidth(chart, rules.liquidLineApproachK));
    case 'suction-line-temperature':
      return symmetric(halfWidth(chart, rules.suctionLineTemperatureK));
    case 'heating-discharge-temperature':
      return symmetric(halfWidth(chart, rules.heatingDischargeTemperatureK));
    case 'liquid-pressure':
    case 'heating-discharge-pressure': {
      const rule = rules.pressureAsSaturationK;
      if (chart?.tolerance !== undefined) return symmetric(halfWidth(chart, rule));
      return isKnown(target)
        ? asSaturation(setup.refrigerant, target, { halfK: rule.value, source: sourceOf(rule) })
        : null;
    }
  }
}

/** The pressures that stand for a saturation temperature so much lower and higher. */
function asSaturation(
  refrigerant: CheckInput['setup']['refrigerant'],
  target: Known,
  { halfK, source }: { readonly halfK: number; readonly source: Tolerance['source'] },
): Tolerance | null {
  const limits = attempt(() => {
    const temperatureK = bubbleTemperatureK({ refrigerant, pressurePa: target.value });
    const at = (shiftK: number) => bubblePressurePa({ refrigerant, temperatureK: temperatureK + shiftK });
    return { low: at(-halfK) - target.value, high: at(halfK) - target.value };
  });
  return limits.ok ? { ...limits.value, floored: false, source } : null;
}
