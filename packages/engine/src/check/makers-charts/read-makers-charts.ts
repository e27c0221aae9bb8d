/** A maker's tables, from the shape a person or a client states them in to the grids the engine asks. */
import { printedToSi } from '../../methods/makers-chart/printed-values';
import { MAKERS_CHART_FACTS } from '../../methods/makers-chart/kinds';
import type { MakersTable } from '../../methods/makers-chart/makers-table';
import { ONE_COLUMN } from '../../methods/makers-chart/makers-table';
import { differenceToK, pressureDifferenceToPa, temperatureToK } from '../../units';
import type { CheckMakersChart } from '../input';
import { present } from '../present';
import type { MakersChartInput, SetupInput, TemperatureAmount } from '../request';
import { chartsWithPaths } from './chart-faults';
import { plausibilityOfMakersChart } from './plausibility';
import { printedStep } from './printed-step';

export const readMakersCharts = (setup: SetupInput): readonly CheckMakersChart[] =>
  chartsWithPaths(setup).map(([, chart]) => readMakersChart(chart));

function readMakersChart(chart: MakersChartInput): CheckMakersChart {
  const { tolerance } = chart;
  return {
    table: tableOf(chart),
    port: chart.port ?? MAKERS_CHART_FACTS[chart.kind].ports[0],
    ...present('tolerance', tolerance && halfWidth(tolerance)),
    ...present('leastOutdoorK', kelvin(chart.leastOutdoor)),
    ...present('mostOutdoorK', kelvin(chart.mostOutdoor)),
    ...present('leastReturnK', kelvin(chart.leastReturn)),
    ...present('mostReturnK', kelvin(chart.mostReturn)),
    oddities: plausibilityOfMakersChart(chart).length,
  };
}

function tableOf(chart: MakersChartInput): MakersTable {
  const { kind, rows, columns, cells, unit } = chart;
  if (rows === undefined) return { kind, valueSi: printedToSi(cells[0]![0]!, unit) };
  const grid =
    columns === undefined
      ? { rows: rows.values, columns: ONE_COLUMN, cells: cells.map(([cell = null]) => [cell, cell]) }
      : { rows: rows.values, columns: columns.values, cells };
  return {
    kind,
    grid,
    rowUnit: rows.unit,
    columnUnit: columns?.unit ?? null,
    cellUnit: unit,
    resolution: printedStep(chart),
  };
}

function halfWidth({ value, unit }: NonNullable<MakersChartInput['tolerance']>): number {
  switch (unit) {
    case 'deltaF':
    case 'deltaC':
      return differenceToK(value, unit);
    case 'psi':
    case 'kPa':
    case 'bar':
      return pressureDifferenceToPa(value, unit);
  }
}

const kelvin = (amount: TemperatureAmount | undefined): number | undefined =>
  amount && temperatureToK(amount.value, amount.unit);
