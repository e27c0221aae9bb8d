/**
 * By what the charge of this system is judged: one criterion decides, the first of those that have a target here. A fixed orifice goes by superheat and
 * a valve by subcooling; without a target for that, by the maker's other methods (judged beside it where more than one is given).
 */
import type { MakersChartKind } from '../methods/makers-chart/kinds';
import { MAKERS_CHART_FACTS } from '../methods/makers-chart/kinds';
import type { CheckInput, CheckMakersChart, CheckSetup } from './input';
import { isFixedOrifice } from './input';

export interface ChargeMethod {
  readonly kind: MakersChartKind;
  /** The maker's table behind the target; `null`: the target is entered as a number, printed in a general chart, or missing. */
  readonly chart: CheckMakersChart | null;
}

type MethodInput = Pick<CheckInput, 'procedure' | 'setup'>;

const OTHER_COOLING_METHODS = ['liquid-line-approach', 'liquid-pressure', 'suction-line-temperature'] as const;
const HEATING_METHODS = ['heating-discharge-pressure', 'heating-discharge-temperature'] as const;
export type OtherMethod = (typeof OTHER_COOLING_METHODS)[number] | (typeof HEATING_METHODS)[number];

/** Whether a table holds for the port that the high side is read at; tables of the suction side, of pipes and of heating hold anyway. */
const holdsAtPort = ({ table, port }: CheckMakersChart, { highSidePort }: CheckSetup): boolean =>
  MAKERS_CHART_FACTS[table.kind].ports.length === 1 || port === highSidePort;

export const isForOtherPort = (chart: CheckMakersChart, setup: CheckSetup): boolean => !holdsAtPort(chart, setup);

/** Whether the rules take a target from a maker's table of this kind. */
export function takesTable({ superheat, makersMethods }: MethodInput['procedure'], kind: MakersChartKind): boolean {
  if (kind === 'superheat') return superheat.makersTable;
  return kind === 'subcooling' || makersMethods !== null;
}

/** The maker's table of a kind that gives a target here, or `null`. */
export const usableChart = ({ procedure, setup }: MethodInput, kind: MakersChartKind): CheckMakersChart | null =>
  takesTable(procedure, kind)
    ? (setup.makersCharts.find((chart) => chart.table.kind === kind && holdsAtPort(chart, setup)) ?? null)
    : null;

/** The methods beside superheat and subcooling that have a target in this mode, the deciding one first where none of those two has. */
export const otherMethods = (input: MethodInput): readonly (ChargeMethod & { readonly kind: OtherMethod })[] =>
  (input.setup.mode === 'heating' ? HEATING_METHODS : OTHER_COOLING_METHODS).flatMap((kind) => {
    const chart = usableChart(input, kind);
    return chart === null ? [] : [{ kind, chart }];
  });

/** The criterion that decides. In heating only a maker's heating table can: `null` without one. */
export function chargeMethod(input: MethodInput): ChargeMethod | null {
  const [other] = otherMethods(input);
  if (input.setup.mode === 'heating') return other ?? null;
  const own = ownMethod(input);
  return hasTarget(input, own) || other === undefined ? own : other;
}

/** Superheat of a fixed orifice, subcooling of a valve, with the maker's table where no number was entered. */
export function ownMethod(input: MethodInput): ChargeMethod {
  const kind = isFixedOrifice(input.setup) ? 'superheat' : 'subcooling';
  return { kind, chart: isEntered(input, kind) ? null : usableChart(input, kind) };
}

/** A number entered as the target, which the procedure takes and which holds at this port. */
export function isEntered({ procedure, setup }: MethodInput, kind: 'superheat' | 'subcooling'): boolean {
  return kind === 'superheat'
    ? setup.targetSuperheat !== undefined && procedure.superheat.enteredTarget
    : setup.targetSubcooling !== undefined && setup.targetSubcoolingPort === setup.highSidePort;
}

function hasTarget(input: MethodInput, { kind, chart }: ChargeMethod): boolean {
  if (chart !== null || isEntered(input, kind === 'superheat' ? 'superheat' : 'subcooling')) return true;
  return kind === 'superheat' && printedChart(input) !== null;
}

/** The general chart of the procedure, which is for split systems: a packaged unit needs its maker's own. */
export const printedChart = ({ procedure, setup }: MethodInput) =>
  setup.kind === 'packaged' ? null : procedure.superheat.chart;

/** Whether there is a target of the high side, but for the other port than the one that is read. */
export function hasTargetForOtherPort({ procedure, setup }: MethodInput): boolean {
  if (setup.targetSubcooling !== undefined && setup.targetSubcoolingPort !== setup.highSidePort) return true;
  return setup.makersCharts.some((chart) => takesTable(procedure, chart.table.kind) && isForOtherPort(chart, setup));
}
