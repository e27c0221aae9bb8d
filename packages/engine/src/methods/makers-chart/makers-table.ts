/** A maker's table as entered for one unit, ready to be asked: the grid in its printed units, and how it becomes a target. */
import { derive } from '../../derivation/derive';
import type { Formula } from '../../derivation/formula';
import { formula } from '../../derivation/formula';
import type { ErrorPart, Known, Quantity, QuantityKind } from '../../derivation/quantity';
import { isKnown, leaf } from '../../derivation/quantity';
import { EngineError } from '../../errors';
import type { Grid } from '../grid';
import { gridValue } from '../grid';
import type { Normal } from '../target-existence';
import { probabilityOfNoValue } from '../target-existence';
import type { ChartDimension, ChartUnit } from './chart-units';
import type { ChartCondition, MakersChartKind } from './kinds';
import { MAKERS_CHART_FACTS } from './kinds';
import { printedFromSi, printedStepToSi, printedToSi } from './printed-values';

/** One printed figure that holds at all conditions, in SI. */
export interface MakersFigure {
  readonly kind: MakersChartKind;
  readonly valueSi: number;
}

export interface MakersGrid {
  readonly kind: MakersChartKind;
  /** In the printed units. A table of one condition has its one column twice, at 0 and 1: it is the same at every column. */
  readonly grid: Grid;
  readonly rowUnit: ChartUnit;
  readonly columnUnit: ChartUnit | null;
  readonly cellUnit: ChartUnit;
  /** Smallest printed step of the cells, in their unit. */
  readonly resolution: number;
}

export type MakersTable = MakersFigure | MakersGrid;

export const isGrid = (table: MakersTable): table is MakersGrid => 'grid' in table;

/** The columns that stand for none. */
export const ONE_COLUMN = [0, 1] as const;

const KIND_OF_CELLS: Readonly<Record<ChartDimension, QuantityKind>> = {
  temperature: 'temperatureK',
  difference: 'differenceK',
  pressure: 'pressurePa',
};

export const kindOfTarget = (kind: MakersChartKind): QuantityKind => KIND_OF_CELLS[MAKERS_CHART_FACTS[kind].cells];

const INPUTS: Readonly<Record<ChartCondition, { readonly name: string; readonly symbol: string }>> = {
  outdoorDryBulb: { name: 'outdoorK', symbol: 'T_outdoor' },
  returnWetBulb: { name: 'wetBulbK', symbol: 'T_wb' },
  returnDryBulb: { name: 'returnDryBulbK', symbol: 'T_return' },
  suctionPressure: { name: 'suctionPa', symbol: 'p_suction' },
  liquidLineTemperature: { name: 'liquidLineK', symbol: 'T_liquid' },
};

const FORMULA_IDS: Readonly<Record<MakersChartKind, string>> = {
  superheat: 'targetSuperheat',
  subcooling: 'targetSubcooling',
  'liquid-line-approach': 'targetLiquidLineApproach',
  'suction-line-temperature': 'targetSuctionLineTemperature',
  'liquid-pressure': 'targetLiquidPressure',
  'heating-discharge-pressure': 'targetHeatingDischargePressure',
  'heating-discharge-temperature': 'targetHeatingDischargeTemperature',
};

const SOURCE = 'The maker’s table as entered';

/** Target from a maker's table at the conditions it is entered with. */
export function makersTargetFormula(table: MakersGrid): Formula {
  const { rows, columns } = MAKERS_CHART_FACTS[table.kind];
  const row = INPUTS[rows];
  const column = columns === null ? null : INPUTS[columns];
  const inputs = column === null ? [row] : [row, column];
  return formula<string>({
    id: FORMULA_IDS[table.kind],
    gives: kindOfTarget(table.kind),
    text: `maker(${inputs.map(({ symbol }) => symbol).join(', ')})`,
    symbols: Object.fromEntries(inputs.map(({ name, symbol }) => [name, symbol])),
    source: SOURCE,
    of: (at) => makersGridValue(table, at[row.name]!, column === null ? null : at[column.name]!),
  });
}

/** SI value of a table at SI conditions. Throws `EngineError` `out-of-range`: reason `outside-chart` beyond its rows or columns, `dash` where no value stands. */
function makersGridValue(table: MakersGrid, rowSi: number, columnSi: number | null): number {
  const value = gridValue(table.grid, printedFromSi(rowSi, table.rowUnit), printedColumn(table, columnSi));
  if (typeof value === 'number') return printedToSi(value, table.cellUnit);
  throw new EngineError('out-of-range', {
    quantity: FORMULA_IDS[table.kind],
    value: value === 'outside-columns' && columnSi !== null ? columnSi : rowSi,
    reason: value === 'dash' ? 'dash' : 'outside-chart',
    source: SOURCE,
  });
}

const printedColumn = ({ columnUnit }: MakersGrid, columnSi: number | null): number =>
  columnUnit === null || columnSi === null ? ONE_COLUMN[0] : printedFromSi(columnSi, columnUnit);

export interface MakersTarget {
  readonly quantity: Quantity;
  /** How probable it is that the table has no value at the true conditions. */
  readonly probabilityOfNoTarget: number;
}

/** Target at the conditions that the readings give. A figure that holds at all conditions is taken as it stands, like an entered target. */
export function makersTarget(table: MakersTable, conditions: (of: ChartCondition) => Quantity): MakersTarget {
  const { kind } = table;
  if (!isGrid(table)) {
    const quantity = leaf({
      id: FORMULA_IDS[kind],
      kind: kindOfTarget(kind),
      value: table.valueSi,
      origin: 'entered',
    });
    return { quantity, probabilityOfNoTarget: 0 };
  }
  const { rows, columns } = MAKERS_CHART_FACTS[kind];
  const row = conditions(rows);
  const column = columns === null ? null : conditions(columns);
  const from = { [INPUTS[rows].name]: row, ...(columns !== null && { [INPUTS[columns].name]: conditions(columns) }) };
  const quantity = derive(makersTargetFormula(table), from, [roundingOf(table)]);
  const probabilityOfNoTarget =
    isKnown(quantity) && isKnown(row) && (column === null || isKnown(column))
      ? probabilityOfNoValue(table.grid, printedNormal(row, table.rowUnit), normalColumn(table, column))
      : 0;
  return { quantity, probabilityOfNoTarget };
}

/** Half of the last printed digit, as a limit. */
const roundingOf = ({ kind, resolution, cellUnit }: MakersGrid): ErrorPart => ({
  key: `rounding:maker:${kind}`,
  u: printedStepToSi(resolution / 2, cellUnit) / Math.sqrt(3),
  shape: 'rectangular',
});

const printedNormal = ({ value, u }: Known, unit: ChartUnit): Normal => ({
  mean: printedFromSi(value, unit),
  u: u / printedStepToSi(1, unit),
});

/** Half way between the two columns that are one, a table of one condition is as far from a dash of its own row as it can be. */
const normalColumn = ({ columnUnit }: MakersGrid, column: Known | null): Normal =>
  columnUnit === null || column === null ? { mean: 0.5, u: 0 } : printedNormal(column, columnUnit);
