/** The sources of a target side by side, for those who want to know how far they agree. */
import type { Standing, TargetComparisonId } from '@chargewright/engine';

const names: Readonly<Record<TargetComparisonId, string>> = {
  'makers-chart-a': 'Makers’ chart, copy A',
  'makers-chart-b': 'Makers’ chart, copy B',
  'finer-table': 'Finer table',
  'short-formula': 'Rule of thumb: (3 × wet bulb − 80 − outdoor) ÷ 2, in °F',
  'split-table': 'Split table',
  'split-chart': 'Maker’s split chart',
};

const standings: Readonly<Record<Standing, string>> = {
  read: 'read in the print',
  memory: 'from memory',
  practice: 'common practice',
  choice: 'our choice',
};

export const targetComparisonWords = {
  show: 'Compare the sources of the target',
  hide: 'Hide the comparison',
  caption: 'Target by each source at these conditions. The check is judged by one of them only.',
  source: 'Source',
  target: 'Target',
  standing: 'Standing',
  names,
  standings,
  used: 'judged by',
  dash: 'none: a dash',
  outside: 'none: outside its range',
  formulaRefused: 'refused where the table has a dash',
};
