/** What is to be known about the maker's tables of a unit: those that cannot be used with this system and why, and those with odd figures. */
import { MAKERS_CHART_FACTS } from '../../methods/makers-chart/kinds';
import { isForOtherPort, takesTable } from '../charge-method';
import type { Caution, CautionCode } from '../codes';
import type { CheckInput, CheckMakersChart } from '../input';
import { isFixedOrifice } from '../input';

type ChartCautionCode = Extract<CautionCode, `makers-chart-${string}`>;

export function makersChartCautions(input: CheckInput): readonly Caution[] {
  const { setup, procedure } = input;
  // a table for the other mode waits for it
  const charts = setup.makersCharts.filter(({ table }) => MAKERS_CHART_FACTS[table.kind].mode === setup.mode);
  const byTheseRules = charts.filter(({ table }) => takesTable(procedure, table.kind));
  return [
    ...about(
      'makers-chart-not-by-these-rules',
      charts.filter((chart) => !byTheseRules.includes(chart)),
    ),
    ...about(
      'makers-chart-for-orifice',
      byTheseRules.filter(({ table }) => table.kind === 'superheat' && !isFixedOrifice(setup)),
    ),
    ...about(
      'makers-chart-for-other-port',
      byTheseRules.filter((chart) => isForOtherPort(chart, setup)),
    ),
    ...about(
      'makers-chart-odd',
      charts.filter(({ oddities }) => oddities > 0),
    ),
  ];
}

const about = (code: ChartCautionCode, charts: readonly CheckMakersChart[]): readonly Caution[] =>
  charts.length === 0
    ? []
    : [{ code, figures: { charts: { kind: 'makersCharts', value: charts.map(({ table }) => table.kind) } } }];
