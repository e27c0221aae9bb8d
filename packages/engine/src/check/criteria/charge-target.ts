/** Targets of the charge: entered, from the maker's table, or from the procedure's printed chart. */
import { derive } from '../../derivation/derive';
import type { Quantity } from '../../derivation/quantity';
import { isKnown, missing } from '../../derivation/quantity';
import type { Chart } from '../../methods/chart';
import { SUPERHEAT_CHART_A } from '../../methods/data/superheat-chart-a';
import { SUPERHEAT_TABLE_FINER } from '../../methods/data/superheat-table-finer';
import type { ChartCondition } from '../../methods/makers-chart/kinds';
import { makersTarget } from '../../methods/makers-chart/makers-table';
import { probabilityOfNoTarget } from '../../methods/target-existence';
import { chartRounding, targetSuperheat } from '../../methods/targets';
import type { ChargeMethod } from '../charge-method';
import { isEntered, printedChart } from '../charge-method';
import type { DerivedQuantities } from '../derived-quantities';
import type { CheckInput } from '../input';
import type { SuperheatChartId } from '../procedure';

export interface ChargeTarget {
  readonly quantity: Quantity;
  readonly source: 'entered' | 'makers-data' | SuperheatChartId;
  readonly probabilityOfNoTarget: number;
}

export const SUPERHEAT_CHARTS: Readonly<Record<SuperheatChartId, Chart>> = {
  'makers-chart-a': SUPERHEAT_CHART_A,
  'finer-table': SUPERHEAT_TABLE_FINER,
};

const entered = (quantity: Quantity): ChargeTarget => ({ quantity, source: 'entered', probabilityOfNoTarget: 0 });

/** What a table of a maker is entered with: readings, and the wet bulb however it was found. */
export const chartCondition =
  ({ readings }: CheckInput, { returnWetBulb }: DerivedQuantities) =>
  (condition: ChartCondition): Quantity =>
    condition === 'returnWetBulb' ? returnWetBulb : (readings[condition]?.quantity ?? missing(condition));

export function chargeTarget(input: CheckInput, derived: DerivedQuantities, method: ChargeMethod): ChargeTarget {
  const { setup } = input;
  const { kind, chart } = method;
  if (chart !== null) return { ...makersTarget(chart.table, chartCondition(input, derived)), source: 'makers-data' };
  if (kind === 'subcooling') return entered(isEntered(input, kind) ? setup.targetSubcooling! : missing());
  if (kind !== 'superheat') return entered(missing());
  if (isEntered(input, kind)) return entered(setup.targetSuperheat!);
  const id = printedChart(input);
  return id === null ? entered(missing()) : printedTarget(id, input, derived);
}

function printedTarget(id: SuperheatChartId, { readings }: CheckInput, derived: DerivedQuantities): ChargeTarget {
  const chart = SUPERHEAT_CHARTS[id];
  const outdoorK: Quantity = readings.outdoorDryBulb?.quantity ?? missing('outdoorDryBulb');
  const wetBulbK = derived.returnWetBulb;
  const quantity = derive(targetSuperheat(chart), { wetBulbK, outdoorK }, [chartRounding(chart)]);
  const probability =
    isKnown(quantity) && isKnown(outdoorK) && isKnown(wetBulbK)
      ? probabilityOfNoTarget(chart, {
          rowK: outdoorK.value,
          rowUK: outdoorK.u,
          columnK: wetBulbK.value,
          columnUK: wetBulbK.u,
        })
      : 0;
  return { quantity, source: id, probabilityOfNoTarget: probability };
}
