/**
 * A maker's fan table: airflow against external static pressure for one blower tap, as entered from the unit's sheet. Straight between two printed
 * rows; nothing beyond the first and the last, and nothing beside a dash.
 */
import type { ErrorPart } from '../../derivation/quantity';
import type { Formula } from '../../derivation/formula';
import { formula } from '../../derivation/formula';
import { EngineError } from '../../errors';
import { LEAST_WEIGHT } from '../grid';
import type { SourcedFigure } from '../sourced-figure';

export interface FanTableRow {
  readonly staticPa: number;
  /** `null` is a dash. */
  readonly airflowM3PerS: number | null;
}

export interface FanTable {
  /** Document and page, as the person states them; empty: not stated. */
  readonly source: string;
  /** Speed tap or setting the rows are for; empty: not stated. */
  readonly blowerTap: string;
  readonly rows: readonly FanTableRow[];
}

export const FAN_TABLE_FAULTS = [
  'too-few-rows',
  'not-finite',
  'statics-not-ascending',
  'airflow-not-above-zero',
] as const;
export type FanTableFault = (typeof FAN_TABLE_FAULTS)[number];

/** What makes a table unusable, each fault once; none: `[]`. */
export function fanTableFaults({ rows }: FanTable): readonly FanTableFault[] {
  const statics = rows.map(({ staticPa }) => staticPa);
  const airflows = rows.flatMap(({ airflowM3PerS }) => (airflowM3PerS === null ? [] : [airflowM3PerS]));
  const found: Readonly<Record<FanTableFault, boolean>> = {
    'too-few-rows': airflows.length < 2,
    'not-finite': ![...statics, ...airflows].every(Number.isFinite),
    'statics-not-ascending': statics.some((pa, k) => k > 0 && pa <= statics[k - 1]!),
    'airflow-not-above-zero': airflows.some((flow) => flow <= 0),
  };
  return FAN_TABLE_FAULTS.filter((fault) => found[fault]);
}

/** Pairs of neighbouring printed rows between which the airflow rises with the static pressure: possible for a few motors, more often a slip of the pen. */
export function risingAirflow({ rows }: FanTable): boolean {
  const airflows = rows.flatMap(({ airflowM3PerS }) => (airflowM3PerS === null ? [] : [airflowM3PerS]));
  return airflows.some((flow, k) => k > 0 && flow > airflows[k - 1]!);
}

/**
 * Airflow in m³/s at an external static pressure in Pa. Throws `EngineError`: `inconsistent-inputs`, reason `table-not-usable`, for a table with
 * faults; `out-of-range`, reason `outside-table` beyond its rows, `dash` where no airflow is printed.
 */
export function fanTableAirflowM3PerS(table: FanTable, externalStaticPa: number): number {
  const { rows, source } = table;
  const refuse = (reason: string): EngineError =>
    new EngineError(reason === 'table-not-usable' ? 'inconsistent-inputs' : 'out-of-range', {
      quantity: 'externalStaticPa',
      value: externalStaticPa,
      reason,
      source,
    });
  if (fanTableFaults(table).length > 0) throw refuse('table-not-usable');
  const step = rows.at(-1)!.staticPa - rows[0]!.staticPa;
  const slack = LEAST_WEIGHT * step;
  if (!(externalStaticPa >= rows[0]!.staticPa - slack && externalStaticPa <= rows.at(-1)!.staticPa + slack)) {
    throw refuse('outside-table');
  }
  let k = 0;
  while (k < rows.length - 2 && externalStaticPa >= rows[k + 1]!.staticPa) k++;
  const [low, high] = [rows[k]!, rows[k + 1]!];
  const fraction = Math.min(Math.max((externalStaticPa - low.staticPa) / (high.staticPa - low.staticPa), 0), 1);
  const weighted = [
    [low.airflowM3PerS, 1 - fraction],
    [high.airflowM3PerS, fraction],
  ] as const;
  let sum = 0;
  for (const [airflow, weight] of weighted) {
    // 0.5 in. w.c. comes back from Pa a rounding off: a dash counts only above this weight
    if (weight <= LEAST_WEIGHT) continue;
    if (airflow === null) throw refuse('dash');
    sum += weight * airflow;
  }
  return sum;
}

/** ± of a fan table as a fraction of its airflow (limit): the unit's own coil, filter and motor against the maker's. */
export const FAN_TABLE_LIMIT: SourcedFigure = {
  value: 0.05,
  printed: '±5 %',
  standing: 'choice',
  source: 'Our choice, open to better evidence',
};

/** The table's own error at an airflow. */
export const fanTableError = (airflowM3PerS: number): ErrorPart => ({
  key: 'fan-table',
  u: (FAN_TABLE_LIMIT.value * airflowM3PerS) / Math.sqrt(3),
  shape: 'rectangular',
});

/** Return and supply static pressure are read against the room, one below it and one above: their sizes add, whichever sign was written down. */
export const totalExternalStatic = formula({
  id: 'totalExternalStatic',
  gives: 'staticPressurePa',
  text: 'abs(P_return) + abs(P_supply)',
  symbols: { returnStaticPa: 'P_return', supplyStaticPa: 'P_supply' },
  source: 'Definition of total external static pressure; common practice, no source',
  of: ({ returnStaticPa, supplyStaticPa }) => Math.abs(returnStaticPa) + Math.abs(supplyStaticPa),
});

/**
 * The static pressure the blower would meet in standard air at the same volume flow, for which fan tables are printed: pressure goes with density.
 * Air of humidity ratio W and specific volume v (m³ per kg of dry air) has the density (1 + W) / v.
 */
export const staticInStandardAir = formula({
  id: 'staticInStandardAir',
  gives: 'staticPressurePa',
  text: 'P_external × rho_standard × v / (1 + W)',
  symbols: {
    externalStaticPa: 'P_external',
    standardDensityKgPerM3: 'rho_standard',
    specificVolumeM3PerKg: 'v',
    humidityRatio: 'W',
  },
  source:
    'Fan law at constant volume flow: pressure is proportional to density; from memory of the ASHRAE and AMCA fan laws',
  of: ({ externalStaticPa, standardDensityKgPerM3, specificVolumeM3PerKg, humidityRatio }) =>
    (externalStaticPa * standardDensityKgPerM3 * specificVolumeM3PerKg) / (1 + humidityRatio),
});

const citation = ({ source, blowerTap }: FanTable): string =>
  `Maker's fan table${blowerTap === '' ? '' : `, blower at ${blowerTap}`}${source === '' ? '' : `: ${source}`}`;

/** Airflow of a blower by its maker's table. */
export const fanTableAirflow = (table: FanTable): Formula<'externalStaticPa'> =>
  formula({
    id: 'fanTableAirflow',
    gives: 'flowM3PerS',
    text: 'table(P)',
    symbols: { externalStaticPa: 'P' },
    source: citation(table),
    of: ({ externalStaticPa }) => fanTableAirflowM3PerS(table, externalStaticPa),
  });
