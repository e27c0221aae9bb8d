import { isClear, placePair, rulerGeometry, type RulerValues } from './ruler-geometry';

const values: RulerValues = {
  scale: { low: 0, high: 40 },
  band: { low: 5, high: 15 },
  target: 10,
  actual: { value: 20, plusMinus: 10 },
};

// 424 px leaves 400 px of axis: 10 px for each unit.
const at = (change: Partial<RulerValues> = {}) => rulerGeometry({ ...values, ...change }, 424);

describe('rulerGeometry', () => {
  it('lays value, whisker, target and band on one scale', () => {
    expect(at()).toEqual({
      axis: { from: 12, to: 412 },
      band: {
        from: 62,
        to: 162,
        limits: [
          { x: 62, side: 'low' },
          { x: 162, side: 'high' },
        ],
      },
      target: 112,
      mark: { x: 212, offScale: null },
      whisker: { from: 112, to: 312, caps: [112, 312] },
    });
  });

  it('keeps the scale and puts an arrow at its end for a value beyond it', () => {
    const beyond = at({ actual: { value: 57, plusMinus: 2 } });
    expect(beyond.mark).toEqual({ x: 412, offScale: 'high' });
    expect(beyond.whisker).toBeNull();
    expect(beyond.band).toEqual(at().band);
    expect(at({ actual: { value: -30, plusMinus: 2 } }).mark).toEqual({ x: 12, offScale: 'low' });
  });

  it('cuts a whisker at the end of the scale, without a cap there', () => {
    expect(at({ actual: { value: 39, plusMinus: 2 } }).whisker).toEqual({ from: 382, to: 412, caps: [382] });
  });

  it('draws a band without a limit up to the end of the scale, and marks only the limit there is', () => {
    expect(at({ band: { low: 5, high: null } }).band).toEqual({ from: 62, to: 412, limits: [{ x: 62, side: 'low' }] });
  });

  it('leaves out what is not known', () => {
    expect(at({ band: null, target: null, actual: null })).toEqual({
      axis: { from: 12, to: 412 },
      band: null,
      target: null,
      mark: null,
      whisker: null,
    });
  });
});

describe('placePair', () => {
  const label = (x: number, text = '18.3 °F') => ({ x, text, fontPx: 10 });
  const at = (first: number, second: number, width = 400) =>
    placePair(label(first), label(second), width).map(({ x }) => x);

  it('leaves labels with room where they belong', () => {
    expect(at(100, 200)).toEqual([100, 200]);
  });

  it('moves the second aside, to the side it stands on', () => {
    expect(at(100, 110)).toEqual([100, 150]);
    expect(at(100, 90)).toEqual([100, 50]);
  });

  it('moves the first only when the second is at the end of the drawing', () => {
    expect(at(60, 50)).toEqual([71, 21]);
    expect(at(350, 360)).toEqual([329, 379]);
  });

  it('keeps labels inside the drawing', () => {
    expect(at(398, 200)).toEqual([379, 200]);
    expect(at(0, 200)).toEqual([21, 200]);
  });
});

describe('isClear', () => {
  it('says whether a label touches its neighbours', () => {
    const label = { x: 100, text: '18.3 °F', fontPx: 10 };
    expect(isClear(label, [{ ...label, x: 150 }])).toBe(true);
    expect(isClear(label, [{ ...label, x: 140 }])).toBe(false);
  });
});
