import { describe, expect, it } from 'vitest';
import { CAUSES } from './diagnosis-codes';
import type { Cause, Evidence } from './diagnosis-codes';
import { compare, diagnose } from './diagnose';
import type { Change, Column, FaultPattern } from './fault-patterns';
import { COLUMNS, FAULT_PATTERNS } from './fault-patterns';
import type { Symptom } from './read-symptoms';

/**
 * The table as the trade writes it (common practice; the subcooling of a restriction read in a trade article). Rises, falls, little change; "slightly"
 * and "until wide open" may be little as well. The last column is ours: it follows from head and subcooling, or is the makers' charging rule.
 */
const PRINTED: Readonly<Record<Cause, readonly string[]>> = {
  //               suction  head          piston  TXV          subcooling  split   amps  approach
  'low-charge': ['↓', '↓', '↑', '≈ then ↑', '↓', '↓', '↓', '↑'],
  overcharge: ['↑', '↑', '↓', '≈', '↑', '≈/↓', '↑', '↓'],
  restriction: ['↓', '≈/↓', '↑', '↑', '↑', '↓', '↓', '↓'],
  'air-in-system': ['≈/↑', '↑', '≈', '≈', '↑', '≈', '↑', '–'],
  'low-airflow': ['↓', '↓ slightly', '↓', '≈/↓', '≈/↑', '↑', '↓', '–'],
  'condenser-air': ['↑', '↑', '↓', '≈', '↓/≈', '↓', '↑', '↑'],
  compressor: ['↑', '↓', '↓', '≈', '≈/↓', '↓', '↓', '–'],
  'valve-closed': ['↓', '↓', '–', '↑↑', '↑', '↓', '↓', '↓'],
  'valve-open': ['↑', '↑ slightly', '–', '↓↓', '↓', '↓', '↑', '↑'],
};
const PRINTED_COLUMNS: readonly Column[] = [
  'suction',
  'head',
  'superheatOrifice',
  'superheatValve',
  'subcooling',
  'split',
  'current',
  'approach',
];
const CHANGES: readonly Change[] = ['up', 'little', 'down'];

const changesOf = (printed: string): ReadonlySet<Change> =>
  new Set([
    ...(printed.includes('↑') ? (['up'] as const) : []),
    ...(printed.includes('↓') ? (['down'] as const) : []),
    ...(/≈|slightly/.test(printed) ? (['little'] as const) : []),
  ]);

const cells = FAULT_PATTERNS.flatMap((pattern) => COLUMNS.map((column) => ({ pattern, column, cause: pattern.cause })));

describe('the fault table', () => {
  it('lists every cause once, in the order in which they are listed', () => {
    expect(FAULT_PATTERNS.map(({ cause }) => cause)).toEqual(CAUSES);
    expect([...COLUMNS].sort()).toEqual([...PRINTED_COLUMNS].sort());
  });

  it.each(cells)('is the printed one at $cause, $column', ({ pattern, column }) => {
    const printed = changesOf(PRINTED[pattern.cause][PRINTED_COLUMNS.indexOf(column)]!);
    expect(new Set(pattern.cells[column]?.changes)).toEqual(printed);
  });

  it('has one cell that was read', () => {
    const read = cells.filter(({ pattern, column }) => pattern.cells[column]?.standing === 'read');
    expect(read.map(({ cause, column }) => `${cause} ${column}`)).toEqual(['restriction subcooling']);
  });
});

const EVIDENCE: Evidence = { code: 'bulb-loose', figures: {} };
const showing = (column: Column, ...possible: readonly Change[]): Symptom => ({
  column,
  possible,
  evidence: possible.length === 3 ? null : EVIDENCE,
});

const listed = (symptoms: readonly Symptom[], metering: 'orifice' | 'valve'): readonly Cause[] =>
  diagnose({
    metering,
    symptoms,
    shown: [],
    isSubcoolingHigh: false,
    subcoolingDoubts: [],
    open: new Set(),
  }).causes.map(({ cause }) => cause);

const meteringOf = ({ metering }: FaultPattern, column: Column): 'orifice' | 'valve' =>
  metering === 'valve' || column === 'superheatValve' ? 'valve' : 'orifice';

describe.each(cells)('$cause, $column', ({ pattern, column, cause }) => {
  const cell = pattern.cells[column];

  it.each(CHANGES)('and a clear %s', (change) => {
    const isListed = listed([showing(column, change)], meteringOf(pattern, column)).includes(cause);
    // alone it lists a cause that always moves this reading this way
    expect(isListed).toBe(change !== 'little' && cell?.changes.length === 1 && cell.changes.includes(change));
  });

  it('and a reading that leaves everything possible: neither for nor against', () => {
    expect(cell && compare(showing(column, ...CHANGES), cell)).not.toBe('contradicts');
    expect(listed([showing(column, ...CHANGES)], meteringOf(pattern, column))).toEqual([]);
  });

  it('contradicts a clear move the other way, and its target only where the sign is a leading one', () => {
    if (cell === null) return;
    for (const change of CHANGES) {
      const verdict = compare(showing(column, change), cell);
      if (cell.changes.includes(change)) expect(verdict).toBe('fits');
      else expect(verdict).toBe(change === 'little' && !cell.leading ? 'silent' : 'contradicts');
    }
  });
});

describe('what is listed', () => {
  it('is nothing where nothing has moved', () => {
    for (const metering of ['orifice', 'valve'] as const)
      expect(
        listed(
          COLUMNS.map((column) => showing(column, 'little')),
          metering,
        ),
      ).toEqual([]);
  });

  it('never has a valve’s fault on an orifice', () => {
    for (const column of COLUMNS)
      for (const change of CHANGES)
        for (const cause of listed([showing(column, change)], 'orifice')) expect(cause).not.toMatch(/^valve-/);
  });

  it('stands in the order of the table, whatever the order of the readings', () => {
    const symptoms = [showing('superheatOrifice', 'down'), showing('suction', 'up'), showing('split', 'down')];
    const forwards = listed(symptoms, 'orifice');
    expect(forwards.length).toBeGreaterThan(1);
    expect(listed([...symptoms].reverse(), 'orifice')).toEqual(forwards);
    expect([...forwards].sort((a, b) => CAUSES.indexOf(a) - CAUSES.indexOf(b))).toEqual(forwards);
  });
});
