/**
 * Weigh-in: the charge this installation requires against the one that was put in, with the vacuum before it and, for a flammable refrigerant, the
 * label's maximum. Maker's rule; judged as the CEC certificates of installation (2019) do, with what scale and rate cannot tell beside it.
 */
import { derive } from '../../derivation/derive';
import type { Quantity } from '../../derivation/quantity';
import { bareValue, isKnown, leaf, missing } from '../../derivation/quantity';
import type { DerivationStep } from '../../derivation/steps';
import { derivationSteps } from '../../derivation/steps';
import type { RefrigerantId } from '../../refrigerants/catalogue';
import { chargeAfterAdjustment, chargeDifference, requiredAdjustment, requiredCharge } from './charge-formulas';
import type { Correction } from './corrections';
import { CORRECTIONS } from './corrections';
import type { LineSetKind } from './data/line-rates';
import { WEIGH_IN_FIGURES } from './data/weigh-in-figures';
import type { Scale, WeighInDecision, WeightJudgement } from './judge-weight';
import { isCoarse, judgeWeight } from './judge-weight';
import type { LabelOutcome } from './label-maximum';
import { judgeLabelMaximum } from './label-maximum';
import type { LineAdjustment, LineSetInput, LineWorking } from './line-adjustment';
import { lineAdjustmentOf } from './line-adjustment';
import type { LineRate } from './line-rate';
import type { VacuumOutcome, VacuumRecord } from './vacuum';
import { judgeVacuum } from './vacuum';
import type { WeighInPermission } from './weigh-in-permission';
import { judgePermission, promisesToReturn } from './weigh-in-permission';
import type { WeighInCaution, WeighInFinding, WeighInInputId, WeighInReason } from './weigh-in-codes';

export interface WeighInInput {
  readonly refrigerant: RefrigerantId;
  readonly kind: LineSetKind;
  /** `adjustment`: the factory charge was kept, `actualKg` is what was put in beyond it (negative: recovered); `total`: into an evacuated system. */
  readonly method: 'adjustment' | 'total';
  readonly factoryChargeKg?: number;
  readonly line: LineSetInput;
  /** By the maker, signed, kg. Nothing is assumed for what was not entered. */
  readonly corrections?: Readonly<Partial<Record<Correction, number>>>;
  readonly actualKg?: number;
  readonly scale?: Partial<Scale>;
  readonly vacuum?: VacuumRecord;
  readonly labelMaximumKg?: number;
  readonly decision: WeighInDecision;
  /** Whether a vacuum nobody recorded shuts the weigh-in or only cautions. */
  readonly vacuumRecord: 'required' | 'advised';
  /** Left out: whoever weighs in may. */
  readonly permission?: WeighInPermission;
}

export interface WeighInResult {
  readonly method: WeighInInput['method'];
  /** `null`: there is none for this refrigerant, size and system. */
  readonly rate: LineRate | null;
  /** Of the line the factory charge covers; the same as `rate` for one diameter. */
  readonly includedRate: LineRate | null;
  readonly working: LineWorking | null;
  readonly lineAdjustment: Quantity;
  readonly requiredAdjustment: Quantity;
  readonly requiredTotal: Quantity;
  readonly actualTotal: Quantity;
  /** What is compared: by the method, adjustments or totals. */
  readonly required: Quantity;
  readonly actual: Quantity;
  readonly difference: Quantity;
  /** `null` without a number on both sides. */
  readonly weight: WeightJudgement | null;
  readonly scale: Scale;
  readonly vacuum: VacuumOutcome;
  readonly label: LabelOutcome;
  readonly finding: WeighInFinding;
  readonly reason: WeighInReason | null;
  readonly cautions: readonly WeighInCaution[];
  readonly steps: readonly DerivationStep[];
}

/** Judges a weigh-in. Never throws for what cannot be: the reason is in the result. A number that is not finite is a caller's bug. */
export function evaluateWeighIn(input: WeighInInput): WeighInResult {
  const { refrigerant, method, vacuum } = input;
  const scale = scaleOf(input);
  const line = lineAdjustmentOf(input);
  const adjustment = withCorrections(line.adjustment, input.corrections ?? {});
  const factoryKg = entered('factoryCharge', input.factoryChargeKg);
  const requiredTotal = derive(requiredCharge, { factoryKg, adjustmentKg: adjustment });
  const actual = weighed(input.actualKg, scale);
  const actualTotal = method === 'total' ? actual : derive(chargeAfterAdjustment, { factoryKg, putInKg: actual });
  const required = method === 'total' ? requiredTotal : adjustment;
  const difference = derive(chargeDifference, { actualKg: actual, requiredKg: required });
  const totals = { refrigerant, totals: [requiredTotal, actualTotal] };
  const outcomes = {
    vacuum: judgeVacuum(vacuum),
    label: judgeLabelMaximum(
      input.labelMaximumKg === undefined ? totals : { ...totals, labelMaximumKg: input.labelMaximumKg },
    ),
  };
  const weight =
    isKnown(required) && isKnown(actual) && isKnown(difference)
      ? judgeWeight({ required, actual, difference, scale, decision: input.decision })
      : null;
  const permitted = judgePermission(input.permission ?? EVERYBODY_MAY);
  const outdoor = permitted.state === 'outdoor-missing' ? [missing(OUTDOOR)] : [];
  const reason =
    hazard(outcomes) ??
    (permitted.state === 'shut' ? permitted.reason : null) ??
    absence(line, [requiredTotal, required, actual, ...outdoor]) ??
    vacuumGate(input, outcomes.vacuum);
  return {
    method,
    rate: line.rate,
    includedRate: line.includedRate,
    working: line.working,
    lineAdjustment: line.adjustment,
    requiredAdjustment: adjustment,
    requiredTotal,
    actualTotal,
    required,
    actual,
    difference,
    weight,
    scale,
    ...outcomes,
    finding: findingOf(weight, reason),
    reason,
    cautions: cautionsOf(input, { line, scale, adjustment, ...outcomes }),
    steps: derivationSteps([requiredTotal, difference, actualTotal].filter(isKnown)),
  };
}

const EVERYBODY_MAY: WeighInPermission = { role: 'performs', testable: true };
const OUTDOOR: WeighInInputId = 'outdoorDryBulb';

/** Said first, whatever else is missing: more than the label allows, and nothing goes into a system that does not hold its vacuum. */
function hazard({ label, vacuum }: Outcomes): WeighInReason | null {
  if (label === 'above') return { code: 'above-label-maximum' };
  return vacuum === 'fails' ? { code: 'vacuum-failed' } : null;
}

interface Outcomes {
  readonly vacuum: VacuumOutcome;
  readonly label: LabelOutcome;
}

const entered = (id: WeighInInputId, value: number | undefined): Quantity =>
  value === undefined ? missing(id) : leaf({ id, kind: 'massKg', value, origin: 'entered' });

function scaleOf({ scale = {} }: WeighInInput): Scale {
  const assumed = WEIGH_IN_FIGURES.assumedScaleKg.value;
  return { resolutionKg: scale.resolutionKg ?? assumed, limitKg: scale.limitKg ?? assumed };
}

function weighed(actualKg: number | undefined, { resolutionKg, limitKg }: Scale): Quantity {
  if (actualKg === undefined) return missing('actualCharge');
  return leaf({
    id: 'actualCharge',
    kind: 'massKg',
    value: actualKg,
    origin: 'reading',
    parts: [
      { key: 'scale', u: limitKg / Math.sqrt(3), shape: 'rectangular' },
      { key: 'resolution:actualCharge', u: resolutionKg / 2 / Math.sqrt(3), shape: 'rectangular' },
    ],
  });
}

function withCorrections(line: Quantity, corrections: Readonly<Partial<Record<Correction, number>>>): Quantity {
  const names = CORRECTIONS.filter((name) => corrections[name] !== undefined);
  if (names.length === 0) return line;
  const terms = names.map((name) => [
    name,
    leaf({ id: `${name}Correction`, kind: 'massKg', value: corrections[name] ?? 0, origin: 'entered' }),
  ]);
  return derive(requiredAdjustment(names), { line, ...Object.fromEntries(terms) } as Record<
    Correction | 'line',
    Quantity
  >);
}

function absence(line: LineAdjustment, quantities: readonly Quantity[]): WeighInReason | null {
  if (line.reason !== null) return { code: line.reason };
  const inputs = [...new Set(quantities.flatMap((q) => (q.state === 'missing' ? q.inputs : [])))];
  // the leaves of this file have no other ids
  if (inputs.length > 0) return { code: 'inputs-missing', inputs: inputs as WeighInInputId[] };
  return quantities.every(isKnown) ? null : { code: 'outside-range' };
}

function vacuumGate({ vacuumRecord }: WeighInInput, vacuum: VacuumOutcome): WeighInReason | null {
  if (vacuumRecord === 'advised' || vacuum === 'passes') return null;
  return { code: vacuum === 'not-proven' ? 'vacuum-not-proven' : 'vacuum-not-recorded' };
}

const GATES: readonly WeighInReason['code'][] = [
  'above-label-maximum',
  'vacuum-failed',
  'vacuum-not-proven',
  'vacuum-not-recorded',
  'weigh-in-not-permitted',
  'too-warm-to-observe',
];

function findingOf(weight: WeightJudgement | null, reason: WeighInReason | null): WeighInFinding {
  if (reason === null) return weight?.finding ?? 'not-judged';
  return GATES.includes(reason.code) ? 'not-verifiable' : 'not-judged';
}

function cautionsOf(
  { scale: stated, vacuumRecord, permission = EVERYBODY_MAY }: WeighInInput,
  found: Outcomes & { readonly line: LineAdjustment; readonly scale: Scale; readonly adjustment: Quantity },
): readonly WeighInCaution[] {
  const { line, scale, adjustment, vacuum, label } = found;
  const origins = [line.rate?.origin, line.includedRate?.origin];
  const adjustmentKg = bareValue(adjustment) ?? 0;
  const holds: Readonly<Record<WeighInCaution, boolean>> = {
    'rate-not-this-makers': origins.includes('r410a-makers'),
    'rate-by-density': origins.includes('liquid-density'),
    'scale-assumed': stated?.resolutionKg === undefined || stated.limitKg === undefined,
    'scale-coarse': isCoarse(scale),
    'adjustment-unusual': Math.abs(adjustmentKg) > WEIGH_IN_FIGURES.mostAdjustmentKg.value,
    'vacuum-not-recorded': vacuumRecord === 'advised' && vacuum === 'not-recorded',
    'vacuum-not-proven': vacuumRecord === 'advised' && vacuum === 'not-proven',
    'label-maximum-not-recorded': label === 'not-recorded',
    'near-label-maximum': label === 'near',
    'promise-to-return': promisesToReturn(permission),
    'observe-only': permission.role === 'observes',
  };
  return (Object.keys(holds) as WeighInCaution[]).filter((caution) => holds[caution]);
}
