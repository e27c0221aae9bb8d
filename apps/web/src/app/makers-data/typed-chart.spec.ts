import type { TypedChart } from '../loose-checks/check-draft';
import { parsePaste } from './parse-paste';
import { DASH, isDash } from '../quantities/printed-dash';
import { readTypedChart } from './read-typed-chart';
import { emptyChart, withAxisValue, withCell, withColumn, withoutColumn, withoutRow, withRow } from './typed-chart';

const SUPERHEAT: TypedChart = {
  kind: 'superheat',
  rows: { unit: 'degF', values: ['85', '95'] },
  columns: { unit: 'degF', values: ['57', '67'] },
  unit: 'deltaF',
  cells: [
    ['8', '21'],
    [DASH, '12,5'],
  ],
};

describe('a typed table', () => {
  it('is read once every place holds a number or a dash', () => {
    expect(readTypedChart(SUPERHEAT)).toEqual({
      state: 'complete',
      chart: {
        kind: 'superheat',
        rows: { unit: 'degF', values: [85, 95] },
        columns: { unit: 'degF', values: [57, 67] },
        unit: 'deltaF',
        cells: [
          [8, 21],
          [null, 12.5],
        ],
        resolution: 0.1,
      },
    });
  });

  it('counts what is still open, and is not guessed', () => {
    expect(readTypedChart(withCell(SUPERHEAT, 0, 1, ''))).toEqual({ state: 'unfinished', open: 1 });
    expect(readTypedChart(withCell(SUPERHEAT, 0, 1, '12,345'))).toEqual({ state: 'unfinished', open: 1 });
    expect(readTypedChart(withAxisValue(SUPERHEAT, 'rows', 0, DASH))).toEqual({ state: 'unfinished', open: 1 });
    expect(readTypedChart(emptyChart('superheat', 'F-psi'))).toEqual({ state: 'unfinished', open: 8 });
  });

  it.each(['-', '–', '—', '−', ' – '])('takes %s for a dash', (text) => expect(isDash(text)).toBe(true));

  it('grows and shrinks without losing what stands', () => {
    const larger = withColumn(withRow(SUPERHEAT));
    expect(larger.cells.map(({ length }) => length)).toEqual([3, 3, 3]);
    expect(withoutColumn(withoutRow(larger, 2), 2)).toEqual(SUPERHEAT);
  });

  it('starts in the units the person works in', () => {
    expect(emptyChart('suction-line-temperature', 'C-bar')).toMatchObject({
      rows: { unit: 'barg' },
      columns: { unit: 'degC' },
      unit: 'degC',
    });
    expect(emptyChart('subcooling', 'F-psi')).not.toHaveProperty('columns');
  });

  it('leaves out limits that are no numbers', () => {
    const reading = readTypedChart({
      ...SUPERHEAT,
      tolerance: { text: '3', unit: 'deltaF' },
      leastOutdoor: { text: 'x', unit: 'degF' },
      leastReturn: { text: '70', unit: 'degF' },
      mostReturn: { text: '27', unit: 'degC' },
    });
    expect(reading).toMatchObject({
      chart: {
        tolerance: { value: 3, unit: 'deltaF' },
        leastReturn: { value: 70, unit: 'degF' },
        mostReturn: { value: 27, unit: 'degC' },
      },
    });
    expect(reading.state === 'complete' && reading.chart).not.toHaveProperty('leastOutdoor');
  });
});

describe('a pasted table', () => {
  const table = (text: string, twoWays = true) => {
    const parsed = parsePaste(text, twoWays);
    return parsed.state === 'table' ? parsed.table : parsed;
  };
  const two = {
    rows: ['85', '95'],
    columns: ['57', '67'],
    cells: [
      ['8', '21'],
      [DASH, '12'],
    ],
  };

  it.each([
    ['tabs, as a spreadsheet copies', '\t57\t67\n85\t8\t21\n95\t–\t12'],
    ['tabs with a word in the corner and a title above', 'Superheat\n\nOutdoor\t57\t67\r\n85\t8\t21\r\n95\t\t12\r\n'],
    ['semicolons', ';57;67\n85;8;21\n95;;12'],
    ['commas', ', 57, 67\n85, 8, 21\n95, -, 12'],
    ['spaces', '57 67\n85 8 21\n95 - 12'],
  ])('with %s', (_, text) => expect(table(text)).toEqual(two));

  it('keeps decimal commas where they cannot part cells', () => {
    expect(table(';57;67\n85;8,5;21\n95;;12,0')).toMatchObject({
      cells: [
        ['8,5', '21'],
        [DASH, '12,0'],
      ],
    });
  });

  it.each([
    ['standing', '75\t10\n85\t11\n95\t-'],
    ['lying', 'Outdoor\t75\t85\t95\nSubcooling\t10\t11\t-'],
  ])('of one condition, %s', (_, text) =>
    expect(table(text, false)).toEqual({ rows: ['75', '85', '95'], columns: null, cells: [['10'], ['11'], [DASH]] }),
  );

  it.each([
    ['empty', ' ', undefined],
    ['no-table', '12', undefined],
    ['no-table', 'hello\nworld', undefined],
    ['ragged', '\t57\t67\n85\t8\t21\t9\n95\t1\t2', '85'],
    ['not-a-number', '\t57\t67\n85\t8\t2l\n95\t1\t2', '2l'],
    ['not-a-number', '\t57\t67\n85\t8\t21\nhot\t1\t2', 'hot'],
    ['too-large', `\t57\t67\n${Array.from({ length: 41 }, (_, n) => `${n}\t1\t2`).join('\n')}`, undefined],
  ])('says what is wrong: %s', (problem, text, place) =>
    expect(table(text)).toEqual({ state: 'problem', problem, ...(place !== undefined && { place }) }),
  );
});
