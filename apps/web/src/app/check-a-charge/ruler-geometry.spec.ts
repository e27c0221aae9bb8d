import { placeLabels, rulerGeometry, type RulerValues } from './ruler-geometry';

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

describe('placeLabels', () => {
  const label = (x: number, text = '18.3 °F') => ({ x, text, fontPx: 10 });

  it('leaves labels with room where they belong', () => {
    expect(placeLabels([label(100), label(200)], 400).map(({ x }) => x)).toEqual([100, 200]);
  });

  it('moves a later label aside, to the side it stands on', () => {
    const [first, second] = placeLabels([label(100), label(110)], 400);
    expect(first?.x).toBe(100);
    expect(second?.x).toBe(150);
    expect(placeLabels([label(100), label(90)], 400)[1]?.x).toBe(50);
  });

  it('keeps a label inside the drawing', () => {
    expect(placeLabels([label(398)], 400)[0]?.x).toBe(379);
    expect(placeLabels([label(0)], 400)[0]?.x).toBe(21);
  });

  it('leaves out a label that would have to leave its mark', () => {
    expect(placeLabels([label(100), { ...label(110), fixed: true }], 400)).toHaveLength(1);
    expect(placeLabels([label(100), { ...label(200), fixed: true }], 400)).toHaveLength(2);
  });

  it('leaves out a label that finds no room', () => {
    expect(placeLabels([label(30), label(30)], 60)).toHaveLength(1);
  });
});
