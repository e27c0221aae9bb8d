import type { Finding } from '@chargewright/engine';

export type RulerMark = 'diamond' | 'circle' | 'hollow' | 'dash';

/** Shape carries the finding; colour only supports it. */
const MARKS: Readonly<Record<Finding, RulerMark>> = {
  above: 'diamond',
  below: 'diamond',
  within: 'circle',
  'too-close-to-call': 'hollow',
  'not-verifiable': 'dash',
  'not-judged': 'dash',
};

export const markOf = (finding: Finding): RulerMark => MARKS[finding];
