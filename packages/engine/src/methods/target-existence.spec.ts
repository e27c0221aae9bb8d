import { describe, expect, it } from 'vitest';
import { EngineError } from '../errors';
import { differenceToK, temperatureToK } from '../units';
import type { Chart } from './chart';
import { chartValueK } from './chart';
import { SPLIT_TABLE } from './data/split-table';
import { SUPERHEAT_CHART_A } from './data/superheat-chart-a';
import { probabilityOfNoTarget } from './target-existence';

interface At {
  readonly row: number;
  readonly rowU: number;
  readonly column: number;
  readonly columnU: number;
}

const inKelvin = ({ row, rowU, column, columnU }: At) => ({
  rowK: temperatureToK(row, 'degF'),
  rowUK: differenceToK(rowU, 'deltaF'),
  columnK: temperatureToK(column, 'degF'),
  columnUK: differenceToK(columnU, 'deltaF'),
});

/** mulberry32: a small seeded generator, good enough to draw points. */
function uniforms(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let t = Math.imul(state ^ (state >>> 15), 1 | state);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

const DRAWS = 40_000;

/** The part of normal draws at which the chart itself refuses: the definition, by brute force. */
function drawnProbability(chart: Chart, at: ReturnType<typeof inKelvin>): number {
  const next = uniforms(1234);
  let none = 0;
  for (let i = 0; i < DRAWS; i++) {
    const radius = Math.sqrt(-2 * Math.log(1 - next()));
    const angle = 2 * Math.PI * next();
    try {
      chartValueK(chart, {
        rowK: at.rowK + at.rowUK * radius * Math.cos(angle),
        columnK: at.columnK + at.columnUK * radius * Math.sin(angle),
      });
    } catch (error) {
      if (!(error instanceof EngineError)) throw error;
      none++;
    }
  }
  return none / DRAWS;
}

describe('the probability that a chart has no target', () => {
  it.each<[string, Chart, At]>([
    ['on a printed cell beside a dash', SUPERHEAT_CHART_A, { row: 95, rowU: 0.58, column: 64, columnU: 0.58 }],
    ['inside a triangle', SUPERHEAT_CHART_A, { row: 82, rowU: 1.2, column: 61.5, columnU: 0.8 }],
    ['a row below the dashes', SUPERHEAT_CHART_A, { row: 90, rowU: 2, column: 64, columnU: 1 }],
    ['with poor instruments', SUPERHEAT_CHART_A, { row: 92, rowU: 6, column: 65, columnU: 4 }],
    ['with a poor thermometer outdoors only', SUPERHEAT_CHART_A, { row: 100, rowU: 9, column: 68, columnU: 0.1 }],
    ['at the warm edge', SUPERHEAT_CHART_A, { row: 114, rowU: 1, column: 74, columnU: 0.6 }],
    ['at a corner of the chart', SUPERHEAT_CHART_A, { row: 41, rowU: 1, column: 50.5, columnU: 0.7 }],
    ['at the dry edge of the split table', SPLIT_TABLE, { row: 79, rowU: 0.6, column: 55.5, columnU: 0.6 }],
    ['at the warm edge of the split table', SPLIT_TABLE, { row: 83.5, rowU: 0.6, column: 66, columnU: 0.6 }],
  ])('agrees with %i draws %s'.replace('%i', String(DRAWS)), (_, chart, at) => {
    const computed = probabilityOfNoTarget(chart, inKelvin(at));
    expect(computed).toBeGreaterThan(0.01);
    expect(computed).toBeLessThan(0.99);
    expect(Math.abs(computed - drawnProbability(chart, inKelvin(at)))).toBeLessThan(0.01);
  });

  it('is a half on a straight edge: 115 °F is the last row', () => {
    expect(
      probabilityOfNoTarget(SUPERHEAT_CHART_A, inKelvin({ row: 115, rowU: 1, column: 73, columnU: 0.1 })),
    ).toBeCloseTo(0.5, 6);
  });

  it('is zero far from every dash and edge', () => {
    expect(probabilityOfNoTarget(SUPERHEAT_CHART_A, inKelvin({ row: 80, rowU: 1, column: 70, columnU: 1 }))).toBe(0);
  });

  it('is zero where the conditions are known exactly: a target stands there, else it would not have been asked', () => {
    expect(probabilityOfNoTarget(SUPERHEAT_CHART_A, inKelvin({ row: 95, rowU: 0, column: 64, columnU: 0 }))).toBe(0);
  });

  it('takes one coordinate exactly and the other not', () => {
    // along the row of 95 °F the dashes end at 64 °F wet bulb
    const at = inKelvin({ row: 95, rowU: 0, column: 64.5, columnU: 0.5 });
    expect(probabilityOfNoTarget(SUPERHEAT_CHART_A, at)).toBeCloseTo(0.1587, 3);
  });

  it('never falls as the instruments get poorer', () => {
    let before = 0;
    for (const u of [0.1, 0.3, 0.5, 1, 2, 4, 8]) {
      const at = inKelvin({ row: 93, rowU: u, column: 65, columnU: u });
      const now = probabilityOfNoTarget(SUPERHEAT_CHART_A, at);
      expect(now).toBeGreaterThanOrEqual(before);
      before = now;
    }
    expect(before).toBeGreaterThan(0.4);
  });
});
