import { describe, expect, it } from 'vitest';
import { differenceFromK, temperatureToK } from '../units';
import { compareSplitTargets, compareTargets, SPLIT_COMPARISON_IDS, TARGET_COMPARISON_IDS } from './target-comparison';

const at = (outdoorF: number, wetBulbF: number) =>
  compareTargets({ outdoorK: temperatureToK(outdoorF, 'degF'), wetBulbK: temperatureToK(wetBulbF, 'degF') });
/** Targets in °F, or the reasons of the refusals. */
const saying = (outdoorF: number, wetBulbF: number): readonly (number | string)[] =>
  at(outdoorF, wetBulbF).map(({ target }) =>
    target.ok ? Math.round(differenceFromK(target.value, 'deltaF') * 1e6) / 1e6 : target.error.details.reason,
  );

describe('targets side by side', () => {
  it.each([
    ['all print one', 85, 66, [15, 15, 15.5, 16.5]],
    ['copies A and B differ', 115, 76, [24, 23, 22.9, 16.5]],
    ['between the rows', 87.5, 67, [15.75, 15.75, 15.95, 16.75]],
    ['the finer table alone has a dash, and the formula is refused', 80, 58, [5, 5, 'dash', 'dash']],
    ['a dash of all: the formula would say 7', 100, 62.25, ['dash', 'dash', 'dash', 'dash']],
    ['only copy A goes below 55 °F', 45, 60, [27, 'outside-chart', 'outside-chart', 'outside-chart']],
    ['hotter than all', 116, 74, Array.from({ length: 4 }, () => 'outside-chart')],
  ])('%s', (_, outdoorF, wetBulbF, expected) => {
    expect(saying(outdoorF, wetBulbF)).toEqual(expected);
  });

  it('each say where they are from: two read, one from memory, one without a source', () => {
    const compared = at(85, 66);
    expect(compared.map(({ id }) => id)).toEqual([...TARGET_COMPARISON_IDS]);
    expect(compared.map(({ standing }) => standing)).toEqual(['read', 'read', 'memory', 'practice']);
    expect(compared.at(-1)?.source).toBe('Common practice, no source');
    expect(compared[2]?.source).toContain('from memory');
    expect(new Set(compared.map(({ source }) => source)).size).toBe(4);
  });
});

describe('target splits side by side', () => {
  const splits = (dryBulbF: number, wetBulbF: number) =>
    compareSplitTargets({ dryBulbK: temperatureToK(dryBulbF, 'degF'), wetBulbK: temperatureToK(wetBulbF, 'degF') });
  const print = ({ target }: ReturnType<typeof splits>[number]): number | string =>
    target.ok ? Math.round(differenceFromK(target.value, 'deltaF') * 1e6) / 1e6 : String(target.error.details.reason);

  // the table's cells are from memory, the chart's printed in figure 18 of the maker's instructions
  it.each([
    [76, 63, 19.2, 19],
    [80, 67, 18.3, 18],
    [75, 62, 19.3, 19.5],
    [82, 67, 19.3, 'outside-chart'],
  ])('at %i °F and %i °F wet bulb', (dryBulbF, wetBulbF, table, chart) => {
    expect(splits(dryBulbF, wetBulbF).map(print)).toEqual([table, chart]);
  });

  it('say which was read and which is from memory', () => {
    const compared = splits(76, 63);
    expect(compared.map(({ id }) => id)).toEqual([...SPLIT_COMPARISON_IDS]);
    expect(compared.map(({ standing }) => standing)).toEqual(['memory', 'read']);
  });
});
