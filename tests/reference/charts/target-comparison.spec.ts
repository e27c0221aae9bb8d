/** The short formula beside the finer table, against the figures that were worked out cell by cell; each file keeps its provenance. */
import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { compareTargets } from '../../../packages/engine/src/methods/target-comparison';
import { differenceFromK, temperatureToK } from '../../../packages/engine/src/units';

/** Formula less table, in °F; a dash of the table says so, with what the formula gives where that is 5 or more. */
interface Cell {
  readonly outdoorF: number;
  readonly wetBulbF: number;
  readonly text: string;
}

function cells(): readonly Cell[] {
  const text = readFileSync(new URL('target-superheat-formula-check.csv', import.meta.url), 'utf8');
  const [header = '', ...lines] = text.split('\n').filter((line) => line !== '' && !line.startsWith('#'));
  const columns = header
    .split(',')
    .slice(1)
    .map((column) => Number(column.replace('wb', '')));
  return lines.flatMap((line) => {
    const [row, ...differences] = line.split(',');
    return differences.map((each, c) => ({ outdoorF: Number(row), wetBulbF: columns[c]!, text: each }));
  });
}

const CELLS = cells();
const targetsAt = ({ outdoorF, wetBulbF }: Omit<Cell, 'text'>) =>
  compareTargets({ outdoorK: temperatureToK(outdoorF, 'degF'), wetBulbK: temperatureToK(wetBulbF, 'degF') });
const valueF = (target: ReturnType<typeof compareTargets>[number]['target']): number =>
  target.ok ? differenceFromK(target.value, 'deltaF') : Number.NaN;

describe('the short formula', () => {
  it('differs from the finer table by what the file says, in each of 1,054 cells', () => {
    const printed = CELLS.filter(({ text }) => /^[+-]\d/.test(text));
    expect(printed).toHaveLength(1054);
    for (const cell of printed) {
      const [, , finer, formula] = targetsAt(cell);
      const difference = valueF(formula!.target) - valueF(finer!.target);
      // the file rounds to a tenth
      expect(Math.abs(difference - Number(cell.text)), `${cell.outdoorF}/${cell.wetBulbF}`).toBeLessThan(0.0501);
    }
  });

  it('is refused in every dash, also where it would give 5 °F or more', () => {
    const dashes = CELLS.filter(({ text }) => text.startsWith('d:') || text === '-');
    expect(dashes).toHaveLength(61 * 27 - 1054);
    expect(dashes.filter(({ text }) => text.startsWith('d:'))).toHaveLength(67);
    for (const cell of dashes) {
      const [, , finer, formula] = targetsAt(cell);
      for (const { target } of [finer!, formula!]) {
        expect(target.ok, `${cell.outdoorF}/${cell.wetBulbF}`).toBe(false);
        if (!target.ok) expect(target.error.details.reason).toBe('dash');
      }
    }
  });

  it('is off by 6.4 °F where it is furthest off', () => {
    const [, , finer, formula] = targetsAt({ outdoorF: 115, wetBulbF: 76 });
    expect(valueF(formula!.target)).toBeCloseTo(16.5, 9);
    expect(valueF(finer!.target)).toBeCloseTo(22.9, 9);
  });
});
