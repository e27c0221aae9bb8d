/**
 * How much refrigerant a length of line takes: the maker's rate; for R-410A what several makers print; for another refrigerant of a ducted system
 * that rate by the ratio of the liquid densities at 100 °F.
 *
 * Why the ratio, and not area × density: the printed rates hold 15 to 50 % more than the liquid in the bore, because the suction line's vapour and the
 * maker's margin are inside; the ratio keeps that share, the bore alone would leave every line set short. What does not follow the liquid is in its ±20 %.
 */
import { derive } from '../../derivation/derive';
import type { Formula } from '../../derivation/formula';
import { formula } from '../../derivation/formula';
import type { Quantity } from '../../derivation/quantity';
import { bareValue, leaf, missing } from '../../derivation/quantity';
import type { RefrigerantId } from '../../refrigerants/catalogue';
import type { FigureStanding } from '../sourced-figure';
import { R410A_LINE_RATES } from './data/line-rates';
import type { LineSetKind, LiquidLineSize, PrintedLineRate } from './data/line-rates';
import { WEIGH_IN_FIGURES } from './data/weigh-in-figures';
import { LIQUID_DENSITY_AT_100F } from './generated/liquid-density';

export type LineRateOrigin = 'maker' | 'r410a-makers' | 'liquid-density';

export interface LineRate {
  /** kg/m; missing where neither a rate nor a size was entered. */
  readonly rate: Quantity;
  readonly origin: LineRateOrigin;
  readonly standing: FigureStanding | 'entered';
  readonly source: string;
}

const FACTOR_SOURCE =
  "Several makers' R-410A rate × ratio of the liquid densities at 100 °F (published equations of state): computed, not this maker's";

/** Rate of another refrigerant in kg/m from the printed one of R-410A. `id` keeps the installed and the included line apart. */
export const lineRateByDensity = (
  id: 'lineRate' | 'includedLineRate',
): Formula<'r410aKgPerM' | 'density' | 'r410aDensity'> =>
  formula({
    id,
    gives: 'chargeRateKgPerM',
    text: 'r_410A × rho / rho_410A',
    symbols: { r410aKgPerM: 'r_410A', density: 'rho', r410aDensity: 'rho_410A' },
    source: FACTOR_SOURCE,
    of: ({ r410aKgPerM, density, r410aDensity }) => (r410aKgPerM * density) / r410aDensity,
  });

export interface LineRateInput {
  readonly id: 'lineRate' | 'includedLineRate';
  readonly refrigerant: RefrigerantId;
  readonly kind: LineSetKind;
  readonly size?: LiquidLineSize | 'other';
  readonly makersRateKgPerM?: number;
}

/** The rate and where it comes from, or `null`: only the maker's rate will do. */
export function lineRateOf({ id, refrigerant, kind, size, makersRateKgPerM }: LineRateInput): LineRate | null {
  if (makersRateKgPerM !== undefined) {
    const rate = leaf({ id, kind: 'chargeRateKgPerM', value: makersRateKgPerM, origin: 'entered' });
    return { rate, origin: 'maker', standing: 'entered', source: "The maker's rate, as entered" };
  }
  if (size === undefined) {
    const lacking = missing(id === 'lineRate' ? 'liquidLineSize' : 'includedLiquidLineSize');
    return { rate: lacking, origin: 'maker', standing: 'entered', source: "The maker's rate, as entered" };
  }
  const printed = size === 'other' ? undefined : R410A_LINE_RATES[kind][size];
  if (printed === undefined) return null;
  if (refrigerant === 'R-410A') {
    return {
      rate: printedRate(id, printed),
      origin: 'r410a-makers',
      standing: printed.standing,
      source: printed.source,
    };
  }
  const density = LIQUID_DENSITY_AT_100F[refrigerant];
  // the small pipe of a ductless system carries two phases: its rate does not go with the liquid's density
  if (kind === 'ductless' || density === null) return null;
  const rate = byDensity(id, printed, density);
  return { rate, origin: 'liquid-density', standing: 'computed', source: FACTOR_SOURCE };
}

const printedRate = (id: string, { value, limit }: PrintedLineRate): Quantity =>
  leaf({
    id,
    kind: 'chargeRateKgPerM',
    value,
    origin: 'constant',
    // one maker's rate stands to another's alike for all sizes
    parts: [{ key: 'line-rate', u: limit / Math.sqrt(3), shape: 'rectangular' }],
  });

function byDensity(id: LineRateInput['id'], printed: PrintedLineRate, density: number): Quantity {
  const from = {
    r410aKgPerM: printedRate('r410aLineRate', printed),
    density: densityLeaf('liquidDensity', density),
    r410aDensity: densityLeaf('r410aLiquidDensity', LIQUID_DENSITY_AT_100F['R-410A'] ?? Number.NaN),
  };
  const rate = bareValue(derive(lineRateByDensity(id), from)) ?? 0;
  const u = (WEIGH_IN_FIGURES.rateByDensityFraction.value * rate) / Math.sqrt(3);
  return derive(lineRateByDensity(id), from, [{ key: 'line-rate-by-density', u, shape: 'rectangular' }]);
}

const densityLeaf = (id: string, value: number): Quantity =>
  leaf({ id, kind: 'densityKgPerM3', value, origin: 'constant' });
