/** Units a maker's table is printed in. */
import type { DifferenceUnit, PressureUnit, TemperatureUnit } from '../../units';

/** What an axis or the cells of a table measure. */
export type ChartDimension = 'temperature' | 'difference' | 'pressure';

type ChartTemperatureUnit = Exclude<TemperatureUnit, 'K'>;
type ChartDifferenceUnit = Exclude<DifferenceUnit, 'K'>;
/** Without the vacuum scale, which counts downwards. */
type ChartPressureUnit = Exclude<PressureUnit, 'inHgVac'>;
export type ChartUnit = ChartTemperatureUnit | ChartDifferenceUnit | ChartPressureUnit;

/** The units a table may be printed in, and the usual one beside each way of reading the other instruments. */
export const CHART_UNITS: Readonly<
  Record<
    ChartDimension,
    { readonly units: readonly ChartUnit[]; readonly usual: Readonly<Record<'F-psi' | 'C-kPa' | 'C-bar', ChartUnit>> }
  >
> = {
  temperature: { units: ['degF', 'degC'], usual: { 'F-psi': 'degF', 'C-kPa': 'degC', 'C-bar': 'degC' } },
  difference: { units: ['deltaF', 'deltaC'], usual: { 'F-psi': 'deltaF', 'C-kPa': 'deltaC', 'C-bar': 'deltaC' } },
  pressure: {
    units: ['psig', 'psia', 'kPag', 'kPaa', 'barg', 'bara'],
    usual: { 'F-psi': 'psig', 'C-kPa': 'kPag', 'C-bar': 'barg' },
  },
};

export const dimensionOfChartUnit = (unit: ChartUnit): ChartDimension =>
  (Object.keys(CHART_UNITS) as ChartDimension[]).find((dimension) => CHART_UNITS[dimension].units.includes(unit))!;
