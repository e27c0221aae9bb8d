/** The sum of a weigh-in, as a person writes it. */
import type { Formula } from '../../derivation/formula';
import { formula } from '../../derivation/formula';
import { EngineError } from '../../errors';
import { assertPositive } from '../airflow/assert-positive';
import type { Correction } from './corrections';

const MAKERS_RULE = "Maker's rule: factory charge + (installed − included length) × rate + corrections";

function assertNotNegative(value: number, quantity: string): void {
  if (value >= 0) return;
  throw new EngineError('out-of-range', { quantity, value, min: 0, reason: 'negative-or-not-finite' });
}

/** Less line than the factory charge covers: this maker subtracts at the same rate, or leaves the factory charge as it is. */
export type ShorterLineRule = 'subtract' | 'keep';

type LineFormula = Formula<'installedM' | 'includedM' | 'rateKgPerM'>;

/** Charge in kg for the line beyond, or short of, the length the factory charge covers, by one rate in kg/m. Negative lengths, a rate not above zero: refused. */
export const lineAdjustment = (shorter: ShorterLineRule): LineFormula => {
  const difference = '(L − L_included) × r';
  return formula({
    id: 'lineAdjustment',
    gives: 'massKg',
    text: shorter === 'keep' ? `max(${difference}, 0)` : difference,
    symbols: { installedM: 'L', includedM: 'L_included', rateKgPerM: 'r' },
    source: MAKERS_RULE,
    of: ({ installedM, includedM, rateKgPerM }) => {
      assertNotNegative(installedM, 'installedLengthM');
      assertNotNegative(includedM, 'includedLengthM');
      assertPositive(rateKgPerM, 'rateKgPerM');
      const kg = (installedM - includedM) * rateKgPerM;
      return shorter === 'keep' ? Math.max(kg, 0) : kg;
    },
  });
};

/** As `lineAdjustment`, where the installed liquid line has another diameter than the one the factory charge covers. */
export const lineAdjustmentOfTwoSizes = (
  shorter: ShorterLineRule,
): Formula<'installedM' | 'includedM' | 'rateKgPerM' | 'includedRateKgPerM'> => {
  const difference = 'L × r − L_included × r_included';
  return formula({
    id: 'lineAdjustment',
    gives: 'massKg',
    text: shorter === 'keep' ? `max(${difference}, 0)` : difference,
    symbols: { installedM: 'L', rateKgPerM: 'r', includedM: 'L_included', includedRateKgPerM: 'r_included' },
    source: MAKERS_RULE,
    of: ({ installedM, includedM, rateKgPerM, includedRateKgPerM }) => {
      assertNotNegative(installedM, 'installedLengthM');
      assertNotNegative(includedM, 'includedLengthM');
      assertPositive(rateKgPerM, 'rateKgPerM');
      assertPositive(includedRateKgPerM, 'includedRateKgPerM');
      const kg = installedM * rateKgPerM - includedM * includedRateKgPerM;
      return shorter === 'keep' ? Math.max(kg, 0) : kg;
    },
  });
};

/** Line in m beyond the length the factory charge covers; short of it, negative. */
export const extraLength = formula({
  id: 'extraLength',
  gives: 'lengthM',
  text: 'L − L_included',
  symbols: { installedM: 'L', includedM: 'L_included' },
  source: MAKERS_RULE,
  of: ({ installedM, includedM }) => {
    assertNotNegative(installedM, 'installedLengthM');
    assertNotNegative(includedM, 'includedLengthM');
    return installedM - includedM;
  },
});

/** Charge in kg of a length by its rate in kg/m. */
export const lineCharge = (line: 'installed' | 'included'): Formula<'lengthM' | 'rateKgPerM'> => {
  const low = line === 'included' ? '_included' : '';
  return formula({
    id: `${line}LineCharge`,
    gives: 'massKg',
    text: `L${low} × r${low}`,
    symbols: { lengthM: `L${low}`, rateKgPerM: `r${low}` },
    source: MAKERS_RULE,
    of: ({ lengthM, rateKgPerM }) => {
      assertNotNegative(lengthM, `${line}LengthM`);
      assertPositive(rateKgPerM, 'rateKgPerM');
      return lengthM * rateKgPerM;
    },
  });
};

/** Adjustment in kg of the line and of what else the maker corrects for: one term for each that was entered. */
export const requiredAdjustment = (entered: readonly Correction[]): Formula<Correction | 'line'> =>
  formula({
    id: 'requiredAdjustment',
    gives: 'massKg',
    text: ['m_line', ...entered.map((name) => `m_${name}`)].join(' + '),
    // only what was entered is asked for
    symbols: Object.fromEntries(['line', ...entered].map((name) => [name, `m_${name}`])) as Record<
      Correction | 'line',
      string
    >,
    source: MAKERS_RULE,
    of: (x) => entered.reduce((sum, name) => sum + x[name], x.line),
  });

/** Whole charge in kg. A sum that is not above zero: `EngineError` `out-of-range`, reason `not-above-zero`. */
export const requiredCharge = formula({
  id: 'requiredCharge',
  gives: 'massKg',
  text: 'm_factory + m_adjustment',
  symbols: { factoryKg: 'm_factory', adjustmentKg: 'm_adjustment' },
  source: MAKERS_RULE,
  of: ({ factoryKg, adjustmentKg }) => {
    assertPositive(factoryKg, 'factoryChargeKg');
    const sum = factoryKg + adjustmentKg;
    assertPositive(sum, 'requiredChargeKg');
    return sum;
  },
});

/** Whole charge in kg after the factory charge was kept and an amount put in (negative: recovered). */
export const chargeAfterAdjustment = formula({
  id: 'chargeAfterAdjustment',
  gives: 'massKg',
  text: 'm_factory + m_put_in',
  symbols: { factoryKg: 'm_factory', putInKg: 'm_put_in' },
  source: 'Definition',
  of: ({ factoryKg, putInKg }) => factoryKg + putInKg,
});

/** Actual less required. */
export const chargeDifference = formula({
  id: 'chargeDifference',
  gives: 'massKg',
  text: 'm_actual − m_required',
  symbols: { actualKg: 'm_actual', requiredKg: 'm_required' },
  source: 'CEC certificates of installation (2019), weigh-in: required and actual are held against each other',
  of: ({ actualKg, requiredKg }) => actualKg - requiredKg,
});
