/** Targets a reading is held against, and deviations from them. */
import type { ErrorPart } from '../derivation/quantity';
import type { Formula } from '../derivation/formula';
import { formula } from '../derivation/formula';
import { differenceToK } from '../units';
import type { Chart } from './chart';
import { chartValueK } from './chart';
import { SPLIT_TABLE } from './data/split-table';

/** The chart is printed in whole or tenth degrees: half of the last digit as a limit. */
export const chartRounding = (chart: Chart): ErrorPart => ({
  key: `rounding:${chart.id}`,
  u: differenceToK(chart.roundingF, 'deltaF') / Math.sqrt(3),
  shape: 'rectangular',
});

/** Target superheat of a fixed-orifice system from a printed chart of outdoor air by indoor wet bulb. */
export const targetSuperheat = (chart: Chart): Formula<'wetBulbK' | 'outdoorK'> =>
  formula({
    id: 'targetSuperheat',
    gives: 'differenceK',
    text: 'chart(T_wb, T_outdoor)',
    symbols: { wetBulbK: 'T_wb', outdoorK: 'T_outdoor' },
    source: chart.source,
    of: ({ wetBulbK, outdoorK }) => chartValueK(chart, { rowK: outdoorK, columnK: wetBulbK }),
  });

/** Target temperature split at about the rated airflow and charge. */
export const targetTemperatureSplit = formula({
  id: 'targetTemperatureSplit',
  gives: 'differenceK',
  text: 'table(T_return, T_wb)',
  symbols: { returnDryBulbK: 'T_return', wetBulbK: 'T_wb' },
  source: SPLIT_TABLE.source,
  of: ({ returnDryBulbK, wetBulbK }) => chartValueK(SPLIT_TABLE, { rowK: returnDryBulbK, columnK: wetBulbK }),
});

export type DeviationFormula = Formula<'actual' | 'target'>;

/** Actual less target. */
export const deviation = (
  criterion: string,
  gives: 'differenceK' | 'flowM3PerS' | 'pressureDifferencePa',
): DeviationFormula =>
  formula({
    id: `${criterion}Deviation`,
    gives,
    text: 'actual − target',
    symbols: { actual: 'actual', target: 'target' },
    source: 'Definition',
    of: ({ actual, target }) => actual - target,
  });
