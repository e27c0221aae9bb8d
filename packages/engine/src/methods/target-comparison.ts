/**
 * One target by several sources side by side: how far they agree. No check is judged by this.
 */
import type { Result } from '../result';
import { attempt } from '../result';
import type { Chart } from './chart';
import { chartValueK } from './chart';
import { SPLIT_CHART } from './data/split-chart';
import { SPLIT_TABLE } from './data/split-table';
import { SUPERHEAT_CHART_A } from './data/superheat-chart-a';
import { SUPERHEAT_CHART_B } from './data/superheat-chart-b';
import { SUPERHEAT_TABLE_FINER } from './data/superheat-table-finer';
import { shortFormulaK } from './short-formula';

export const TARGET_COMPARISON_IDS = ['makers-chart-a', 'makers-chart-b', 'finer-table', 'short-formula'] as const;
export const SPLIT_COMPARISON_IDS = ['split-table', 'split-chart'] as const;
export type TargetComparisonId = (typeof TARGET_COMPARISON_IDS)[number] | (typeof SPLIT_COMPARISON_IDS)[number];

export interface ComparedTarget {
  readonly id: TargetComparisonId;
  /** `read` in the source, from `memory`, or common `practice` without a source. */
  readonly standing: 'read' | 'memory' | 'practice';
  readonly source: string;
  /** Target in K, or why the source has none: reason `dash` or `outside-chart`. */
  readonly target: Result<number>;
}

export interface TargetConditions {
  /** Wet bulb of the return air. */
  readonly wetBulbK: number;
  /** Dry bulb of the air entering the outdoor coil. */
  readonly outdoorK: number;
}

/**
 * Target superheat of a fixed orifice at these conditions by each source, in the order of `TARGET_COMPARISON_IDS`. The short formula
 * (3·WB − 80 − DB)/2 in °F knows no dash of its own: where the finer table has no value it is refused with the table's refusal. Total for finite
 * temperatures.
 */
export const compareTargets = (at: TargetConditions): readonly ComparedTarget[] => [
  fromChart('makers-chart-a', SUPERHEAT_CHART_A, positionOf(at)),
  fromChart('makers-chart-b', SUPERHEAT_CHART_B, positionOf(at)),
  fromChart('finer-table', SUPERHEAT_TABLE_FINER, positionOf(at)),
  {
    id: 'short-formula',
    standing: 'practice',
    source: 'Common practice, no source',
    target: attempt(() => {
      chartValueK(SUPERHEAT_TABLE_FINER, positionOf(at));
      return shortFormulaK(at);
    }),
  },
];

export interface SplitConditions {
  /** Dry and wet bulb of the return air. */
  readonly dryBulbK: number;
  readonly wetBulbK: number;
}

/** Target temperature split at these conditions by each source, in the order of `SPLIT_COMPARISON_IDS`. Total for finite temperatures. */
export const compareSplitTargets = ({ dryBulbK, wetBulbK }: SplitConditions): readonly ComparedTarget[] => [
  fromChart('split-table', SPLIT_TABLE, { rowK: dryBulbK, columnK: wetBulbK }),
  fromChart('split-chart', SPLIT_CHART, { rowK: dryBulbK, columnK: wetBulbK }),
];

type Position = Parameters<typeof chartValueK>[1];

const positionOf = ({ wetBulbK, outdoorK }: TargetConditions): Position => ({ rowK: outdoorK, columnK: wetBulbK });

const fromChart = (id: TargetComparisonId, chart: Chart, at: Position): ComparedTarget => ({
  id,
  standing: chart.standing,
  source: chart.source,
  target: attempt(() => chartValueK(chart, at)),
});
