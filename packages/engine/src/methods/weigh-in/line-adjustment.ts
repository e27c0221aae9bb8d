/** Refrigerant for the line set: installed against included length, by the maker's rule for a shorter line. */
import { derive } from '../../derivation/derive';
import type { Quantity } from '../../derivation/quantity';
import { bareValue, leaf, missing } from '../../derivation/quantity';
import type { RefrigerantId } from '../../refrigerants/catalogue';
import type { ShorterLineRule } from './charge-formulas';
import { extraLength, lineAdjustment, lineAdjustmentOfTwoSizes, lineCharge } from './charge-formulas';
import type { LineSetKind, LiquidLineSize } from './data/line-rates';
import type { LineRate } from './line-rate';
import { lineRateOf } from './line-rate';
import type { WeighInReason } from './weigh-in-codes';

export interface LineSetInput {
  /** One way, as the maker counts it. */
  readonly installedLengthM?: number;
  /** ± of the installed length, as a limit; left out: taken as measured exactly. */
  readonly lengthLimitM?: number;
  readonly size?: LiquidLineSize | 'other';
  readonly makersRateKgPerM?: number;
  /** The length the factory charge covers … */
  readonly includedLengthM?: number;
  /** … where it is of another diameter than the one installed. */
  readonly includedSize?: LiquidLineSize | 'other';
  readonly makersIncludedRateKgPerM?: number;
  readonly shorterLine?: ShorterLineRule;
}

/** Two products of lengths and rates that are equal on paper. */
const ROUNDING_KG = 1e-9;

/** The numbers between lengths and adjustment, as a person writes them down on the way. */
export type LineWorking =
  | { readonly sizes: 'one'; readonly installed: Quantity; readonly included: Quantity; readonly extra: Quantity }
  | {
      readonly sizes: 'two';
      readonly installed: Quantity;
      readonly included: Quantity;
      readonly installedCharge: Quantity;
      readonly includedCharge: Quantity;
    };

export interface LineAdjustment {
  /** `null`: there is none for this refrigerant, size and system. */
  readonly rate: LineRate | null;
  /** Of the line the factory charge covers; the same as `rate` for one diameter. */
  readonly includedRate: LineRate | null;
  readonly adjustment: Quantity;
  /** `null` without a rate. */
  readonly working: LineWorking | null;
  readonly reason: Extract<WeighInReason['code'], 'rate-needed' | 'shorter-line-rule-needed'> | null;
}

/** What the installed line takes beyond the one the factory charge covers, or why that cannot be said. */
export function lineAdjustmentOf(input: {
  readonly refrigerant: RefrigerantId;
  readonly kind: LineSetKind;
  readonly line: LineSetInput;
}): LineAdjustment {
  const { refrigerant, kind, line } = input;
  const { size, makersRateKgPerM, includedSize, makersIncludedRateKgPerM, shorterLine } = line;
  const rateInput = { refrigerant, kind };
  const rate = lineRateOf({
    ...rateInput,
    id: 'lineRate',
    ...(size === undefined ? {} : { size }),
    ...(makersRateKgPerM === undefined ? {} : { makersRateKgPerM }),
  });
  const sizesDiffer = size !== undefined && includedSize !== undefined && includedSize !== size;
  const twoSizes = sizesDiffer || makersIncludedRateKgPerM !== undefined;
  const includedRate = twoSizes
    ? lineRateOf({
        ...rateInput,
        id: 'includedLineRate',
        ...(includedSize === undefined ? {} : { size: includedSize }),
        ...(makersIncludedRateKgPerM === undefined ? {} : { makersRateKgPerM: makersIncludedRateKgPerM }),
      })
    : rate;
  const rates = { rate, includedRate };
  if (rate === null || includedRate === null) {
    return { ...rates, working: null, adjustment: missing(), reason: 'rate-needed' };
  }
  const lengths = { installedM: installedLength(line), includedM: includedLength(line), rateKgPerM: rate.rate };
  const known = { ...rates, working: workingOf(lengths, twoSizes ? includedRate : null) };
  const by = (rule: ShorterLineRule): Quantity =>
    twoSizes
      ? derive(lineAdjustmentOfTwoSizes(rule), { ...lengths, includedRateKgPerM: includedRate.rate })
      : derive(lineAdjustment(rule), lengths);
  const subtracted = by('subtract');
  if (shorterLine === 'keep') return { ...known, adjustment: by('keep'), reason: null };
  const isShorter = (bareValue(subtracted) ?? 0) < -ROUNDING_KG;
  if (isShorter && shorterLine === undefined)
    return { ...known, adjustment: missing(), reason: 'shorter-line-rule-needed' };
  return { ...known, adjustment: subtracted, reason: null };
}

function workingOf(
  { installedM, includedM, rateKgPerM }: Readonly<Record<'installedM' | 'includedM' | 'rateKgPerM', Quantity>>,
  otherRate: LineRate | null,
): LineWorking {
  const lengths = { installed: installedM, included: includedM };
  if (otherRate === null) return { sizes: 'one', ...lengths, extra: derive(extraLength, { installedM, includedM }) };
  return {
    sizes: 'two',
    ...lengths,
    installedCharge: derive(lineCharge('installed'), { lengthM: installedM, rateKgPerM }),
    includedCharge: derive(lineCharge('included'), { lengthM: includedM, rateKgPerM: otherRate.rate }),
  };
}

function installedLength({ installedLengthM, lengthLimitM = 0 }: LineSetInput): Quantity {
  if (installedLengthM === undefined) return missing('installedLength');
  const u = lengthLimitM / Math.sqrt(3);
  return leaf({
    id: 'installedLength',
    kind: 'lengthM',
    value: installedLengthM,
    origin: 'entered',
    parts: u > 0 ? [{ key: 'reading:installedLength', u, shape: 'rectangular' }] : [],
  });
}

const includedLength = ({ includedLengthM }: LineSetInput): Quantity =>
  includedLengthM === undefined
    ? missing('includedLength')
    : leaf({ id: 'includedLength', kind: 'lengthM', value: includedLengthM, origin: 'entered' });
