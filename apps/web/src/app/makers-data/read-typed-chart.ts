/** A maker's table as it was typed, as the engine takes it: texts until all of it can be read. Pure. */
import type { ChartAxisInput, MakersChartInput, TemperatureAmount } from '@chargewright/engine';
import type { ChartLimit, TypedAxis, TypedChart, TypedValue } from '../loose-checks/check-draft';
import { parseNumber } from '../quantities/parse-number';
import { isDash } from '../quantities/printed-dash';

const numberIn = (text: string): number | undefined => {
  const parsed = parseNumber(text);
  return parsed.state === 'number' ? parsed.number.value : undefined;
};

export type ChartReading =
  | { readonly state: 'complete'; readonly chart: MakersChartInput }
  /** How many places are neither a number nor a dash. */
  | { readonly state: 'unfinished'; readonly open: number };

const axisOf = (axis: TypedAxis): ChartAxisInput => ({
  unit: axis.unit,
  values: axis.values.map((text) => numberIn(text) ?? Number.NaN),
});

const isOpen = (text: string): boolean => !isDash(text) && numberIn(text) === undefined;

const resolutionOf = (chart: TypedChart): number | undefined => {
  const steps = chart.cells.flat().flatMap((text) => {
    const parsed = parseNumber(text);
    return parsed.state === 'number' ? [parsed.number.resolution] : [];
  });
  return steps.length === 0 ? undefined : Math.min(...steps);
};

/** As the engine takes it, once every place holds a number or a dash. */
export function readTypedChart(chart: TypedChart): ChartReading {
  const axes = [...(chart.rows?.values ?? []), ...(chart.columns?.values ?? [])];
  const open =
    axes.filter((text) => numberIn(text) === undefined).length +
    chart.cells.flat().filter((text) => isOpen(text)).length;
  if (open > 0) return { state: 'unfinished', open };
  const resolution = resolutionOf(chart);
  return {
    state: 'complete',
    chart: {
      kind: chart.kind,
      ...(chart.rows && { rows: axisOf(chart.rows) }),
      ...(chart.columns && { columns: axisOf(chart.columns) }),
      unit: chart.unit,
      cells: chart.cells.map((line) => line.map((text) => numberIn(text) ?? null)),
      ...(chart.port && { port: chart.port }),
      ...(resolution !== undefined && { resolution }),
      ...amount('tolerance', chart.tolerance),
      ...amount('leastOutdoor', chart.leastOutdoor),
      ...amount('mostOutdoor', chart.mostOutdoor),
      ...amount('leastReturn', chart.leastReturn),
      ...amount('mostReturn', chart.mostReturn),
    },
  };
}

type AmountField = 'tolerance' | ChartLimit;

/** A text that is no number is left out: the field beside it says so. */
function amount(name: AmountField, typed: TypedValue | undefined): Partial<Pick<MakersChartInput, AmountField>> {
  const value = typed && numberIn(typed.text);
  return value === undefined ? {} : { [name]: { value, unit: typed?.unit as TemperatureAmount['unit'] } };
}
