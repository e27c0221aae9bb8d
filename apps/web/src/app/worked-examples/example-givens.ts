import type { WorkedExample } from '@chargewright/engine/training';
import {
  airRows,
  furtherRows,
  lineRows,
  readingRows,
  systemRows,
  workedExampleWords,
  type GivenRow,
  type UnitSystem,
} from '@chargewright/wording';

export interface GivensBlock {
  readonly caption: string;
  readonly rows: readonly GivenRow[];
}

const { example: words, lines } = workedExampleWords;

/** What is given, in the blocks it stands in on paper. */
export function givensOf(example: WorkedExample, system: UnitSystem): readonly GivensBlock[] {
  switch (example.kind) {
    case 'check':
      return [
        { caption: words.system, rows: systemRows(example, system) },
        { caption: words.readings, rows: readingRows(example, system) },
        ...furtherRows(example, system).map(({ name, rows }) => ({ caption: name, rows })),
      ];
    case 'moist-air':
      return [{ caption: words.readings, rows: airRows(example, system) }];
    case 'weigh-in':
      return example.parts.map((part) => ({ caption: capital(lines[part.id]), rows: lineRows(part, system) }));
  }
}

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
