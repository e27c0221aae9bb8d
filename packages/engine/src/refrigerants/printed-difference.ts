/** How far the printed pressure-temperature tables lie from the curves: charts differ from the models by up to 1.2 °F, which is a fact about them. */
import { PA_PER_PSI, pressureToPa, temperatureToK } from '../units';
import { PRINTED_TABLES } from './data/printed-tables';
import type { PrintedTable } from './data/printed-tables';
import type { RefrigerantId } from './generated/saturation-curves';
import { bubbleTemperatureK, dewTemperatureK } from './saturation';

export interface PrintedPoint {
  readonly point: 'bubble' | 'dew';
  readonly temperatureK: number;
  /** Absolute. */
  readonly pressurePa: number;
  /** What the curve gives at the printed pressure, less the printed temperature. */
  readonly differenceK: number;
}

export interface PrintedComparison {
  readonly table: PrintedTable;
  readonly points: readonly PrintedPoint[];
  readonly largest: PrintedPoint;
  readonly meanAbsoluteK: number;
}

/** What the gauge pressures of the tables count from. */
const PRINTED_ATMOSPHERE_PA = 14.696 * PA_PER_PSI;

function pointsOf({ refrigerant, rows }: PrintedTable): readonly PrintedPoint[] {
  const compare = (point: 'bubble' | 'dew', degF: number, psig: number): PrintedPoint => {
    const temperatureK = temperatureToK(degF, 'degF');
    const pressurePa = pressureToPa(psig, 'psig', PRINTED_ATMOSPHERE_PA);
    const inverse = point === 'bubble' ? bubbleTemperatureK : dewTemperatureK;
    return { point, temperatureK, pressurePa, differenceK: inverse({ refrigerant, pressurePa }) - temperatureK };
  };
  return rows.flatMap(([degF, psig, dewPsig]) => [
    compare('bubble', degF, psig),
    ...(dewPsig === undefined ? [] : [compare('dew', degF, dewPsig)]),
  ]);
}

/**
 * Every printed table of a refrigerant against its curves; empty where none was found. A table with one column is compared with the bubble point.
 * Example: `printedComparisons('R-22')[0].largest.differenceK` is a few hundredths of a kelvin.
 */
export function printedComparisons(refrigerant: RefrigerantId): readonly PrintedComparison[] {
  return PRINTED_TABLES.filter((table) => table.refrigerant === refrigerant).map((table) => {
    const points = pointsOf(table);
    const largest = points.reduce((most, each) =>
      Math.abs(each.differenceK) > Math.abs(most.differenceK) ? each : most,
    );
    const sum = points.reduce((total, { differenceK }) => total + Math.abs(differenceK), 0);
    return { table, points, largest, meanAbsoluteK: sum / points.length };
  });
}
