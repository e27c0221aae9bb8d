import { describe, expect, it } from 'vitest';
import { EngineError } from '../errors';
import { derive } from './derive';
import { formula } from './formula';
import type { ErrorPart, Known, Quantity } from './quantity';
import { bareValue, covariance, expandedUncertainty, isKnown, leaf, missing } from './quantity';

const reading = (id: string, value: number, ...parts: ErrorPart[]): Known =>
  leaf({ id, kind: 'temperatureK', value, origin: 'reading', parts });
const part = (key: string, u: number): ErrorPart => ({ key, u, shape: 'normal' });

const difference = formula({
  id: 'difference',
  gives: 'differenceK',
  text: 'a − b',
  symbols: { aK: 'a', bK: 'b' },
  source: 'Definition',
  of: ({ aK, bK }) => aK - bK,
});
const mean = formula({
  id: 'mean',
  gives: 'temperatureK',
  text: '(a + b) / 2',
  symbols: { aK: 'a', bK: 'b' },
  source: 'Definition',
  of: ({ aK, bK }) => (aK + bK) / 2,
});
const one = (of: (x: number) => number) =>
  formula({ id: 'one', gives: 'differenceK', text: 'f(x)', symbols: { x: 'x' }, source: 'Test', of: ({ x }) => of(x) });

const refuse = (reason: string, value: number): EngineError =>
  new EngineError('out-of-range', { quantity: 'x', value, reason });

function known(quantity: Quantity): Known {
  if (!isKnown(quantity)) throw new Error(`not known: ${JSON.stringify(quantity)}`);
  return quantity;
}

describe('value and uncertainty', () => {
  it('adds independent uncertainties in quadrature: 3 and 4 make 5', () => {
    const result = known(
      derive(difference, { aK: reading('a', 300, part('a', 3)), bK: reading('b', 290, part('b', 4)) }),
    );
    expect(result.value).toBe(10);
    expect(result.u).toBeCloseTo(5, 12);
    expect(expandedUncertainty(result)).toBeCloseTo(10, 12);
    expect(result.contributions.get('a')).toBeCloseTo(3, 12);
    expect(result.contributions.get('b')).toBeCloseTo(-4, 12);
  });

  it('adds the formula’s own errors: 2, 3 and 6 make 7', () => {
    const from = { aK: reading('a', 300, part('a', 2)), bK: reading('b', 290, part('b', 3)) };
    expect(known(derive(difference, from, [part('model', 6)])).u).toBeCloseTo(7, 12);
  });

  it('weighs by the slope: half of 3 and half of 4 make 2.5', () => {
    const result = known(derive(mean, { aK: reading('a', 300, part('a', 3)), bK: reading('b', 290, part('b', 4)) }));
    expect(result.value).toBe(295);
    expect(result.u).toBeCloseTo(2.5, 12);
  });

  it('adds the parts of one reading in quadrature: instrument 0.4 and display 0.3 make 0.5', () => {
    expect(reading('a', 300, part('instrument', 0.4), part('display', 0.3)).u).toBeCloseTo(0.5, 12);
  });

  it('is exact about exact inputs', () => {
    const result = known(derive(difference, { aK: reading('a', 300), bK: reading('b', 290) }));
    expect(result.u).toBe(0);
    expect(result.contributions.size).toBe(0);
  });

  it('carries what it was derived from', () => {
    const from = { aK: reading('a', 300, part('a', 1)), bK: reading('b', 290) };
    expect(known(derive(difference, from, [part('model', 1)])).step).toEqual({
      type: 'derived',
      formula: difference,
      from,
      parts: [part('model', 1)],
    });
  });
});

describe('correlation', () => {
  it('cancels an error that enters twice: one thermometer for both sides of a difference', () => {
    const both = { aK: reading('a', 300, part('thermometer', 1)), bK: reading('b', 290, part('thermometer', 1)) };
    expect(known(derive(difference, both)).u).toBeCloseTo(0, 12);
    expect(known(derive(mean, both)).u).toBeCloseTo(1, 12);
  });

  it('follows a reading along two ways: a − (a + b)/2 has the slopes ½ and −½', () => {
    const aK = reading('a', 300, part('a', 3));
    const result = known(derive(difference, { aK, bK: derive(mean, { aK, bK: reading('b', 290, part('b', 4)) }) }));
    expect(result.contributions.get('a')).toBeCloseTo(1.5, 10);
    expect(result.contributions.get('b')).toBeCloseTo(-2, 10);
    expect(result.u).toBeCloseTo(2.5, 10);
  });

  it('gives the covariance of two results: a − b and (a + b)/2 with u 3 and 4 have ½·9 − ½·16 = −3.5', () => {
    const from = { aK: reading('a', 300, part('a', 3)), bK: reading('b', 290, part('b', 4)) };
    const [d, m] = [known(derive(difference, from)), known(derive(mean, from))];
    expect(covariance(d, m)).toBeCloseTo(-3.5, 10);
    expect(covariance(d, d)).toBeCloseTo(d.u ** 2, 10);
  });

  it('finds none between results without a common error', () => {
    expect(covariance(reading('a', 1, part('a', 3)), reading('b', 1, part('b', 4)))).toBe(0);
  });
});

describe('slopes', () => {
  it('are secants over ± u, so that a kink counts as far as the reading reaches it', () => {
    // slope 0 below 10 and 2 above: over 10 ± 1 the secant is (2 − 0)/2
    const kinked = one((x) => Math.max(0, 2 * (x - 10)));
    expect(known(derive(kinked, { x: reading('x', 10, part('x', 1)) })).u).toBeCloseTo(1, 12);
    // from 9.5 the upper side reaches half a step past the kink: (1 − 0)/2 of a slope, times 1
    expect(known(derive(kinked, { x: reading('x', 9.5, part('x', 1)) })).u).toBeCloseTo(0.5, 12);
    expect(known(derive(kinked, { x: reading('x', 8, part('x', 1)) })).u).toBe(0);
  });

  it('of a square are those of the tangent, since the secant is symmetric', () => {
    expect(
      known(
        derive(
          one((x) => x * x),
          { x: reading('x', 5, part('x', 0.5)) },
        ),
      ).u,
    ).toBeCloseTo(5, 10);
  });

  it('do not measure rounding where u is tiny', () => {
    const result = known(
      derive(
        one((x) => 3 * x),
        { x: reading('x', 300, part('x', 1e-13)) },
      ),
    );
    expect(result.u).toBeCloseTo(3e-13, 17);
  });

  it('tell how far a kink takes the mean off the value: by the mean of |x|, 0.80 u normal and 0.87 u rectangular', () => {
    // at a kink from slope 0 to 2 the mean of f is E|x|: half of the bend of 2
    const kinked = one((x) => Math.max(0, 2 * (x - 10)));
    const at = (value: number, u: number) => known(derive(kinked, { x: reading('x', value, part('x', u)) }));
    for (const exact of [Math.sqrt(2 / Math.PI), Math.sqrt(3) / 2]) {
      expect(Math.abs(at(10, 1).meanShift - exact)).toBeLessThan(0.04);
    }
    expect(at(10, 0.5).meanShift).toBeCloseTo(at(10, 1).meanShift / 2, 12);
    expect(at(12, 1).meanShift).toBeCloseTo(0, 12);
    expect(
      known(
        derive(
          one((x) => -3 * x),
          { x: at(10, 1) },
        ),
      ).meanShift,
    ).toBeCloseTo(-3 * at(10, 1).meanShift, 9);
  });

  it.each([
    ['above', (x: number) => x > 10.5, 4],
    ['below', (x: number) => x < 9.5, 6],
  ])('come from the other side alone where the side %s is refused', (_, isRefused, slope) => {
    // slope 4 below 10 and 6 above
    const bent = one((x) => {
      if (isRefused(x)) throw refuse('dash', x);
      return x < 10 ? 4 * (x - 10) : 6 * (x - 10);
    });
    const result = known(derive(bent, { x: reading('x', 10, part('x', 1)) }));
    expect(result.value).toBe(0);
    expect(result.u).toBeCloseTo(slope, 12);
  });

  it('with both sides refused refuse the result, and keep its bare value for the gates', () => {
    const lonely = one((x) => {
      if (x !== 10) throw refuse(x > 10 ? 'dash' : 'outside-chart', x);
      return 7;
    });
    const result = derive(lonely, { x: reading('x', 10, part('x', 1)) });
    expect(result).toMatchObject({ state: 'refused', error: { details: { reason: 'dash', value: 11 } }, value: 7 });
    expect(bareValue(result)).toBe(7);
    expect(isKnown(derive(lonely, { x: reading('x', 10) }))).toBe(true);
  });
});

describe('what is missing or refused', () => {
  const aK = reading('a', 300, part('a', 1));

  it('lists every missing input once, also those behind other results', () => {
    const bK = derive(mean, { aK: missing('c'), bK: missing('d') });
    expect(derive(difference, { aK: missing('c'), bK })).toEqual({ state: 'missing', inputs: ['c', 'd'] });
  });

  it('says missing before refused: what was not read can be read', () => {
    const refused: Quantity = { state: 'refused', error: refuse('outside-curve', 1) };
    expect(derive(difference, { aK: refused, bK: missing('b') })).toEqual({ state: 'missing', inputs: ['b'] });
  });

  it('passes a refused input on as it is', () => {
    const refused: Quantity = { state: 'refused', error: refuse('outside-curve', 1) };
    expect(derive(difference, { aK, bK: refused })).toBe(refused);
    expect(bareValue(refused)).toBeUndefined();
  });

  it('computes the bare value through an input that has only that', () => {
    const error = refuse('dash', 1);
    expect(derive(difference, { aK, bK: { state: 'refused', error, value: 290 } })).toEqual({
      state: 'refused',
      error,
      value: 10,
    });
  });

  it('turns the refusal of its own formula into a refused result', () => {
    const error = refuse('outside-curve', 300);
    const result = derive(
      one(() => {
        throw error;
      }),
      { x: aK },
    );
    expect(result).toEqual({ state: 'refused', error });
  });

  it('lets a bug through: an error of another kind, a result or an input that is not finite', () => {
    const bug = one(() => {
      throw new TypeError('bug');
    });
    expect(() => derive(bug, { x: aK })).toThrow(TypeError);
    expect(() =>
      derive(
        one(() => Number.NaN),
        { x: aK },
      ),
    ).toThrow(RangeError);
    const bugBeside = one((x) => {
      if (x !== 300) throw new TypeError('bug');
      return 1;
    });
    expect(() => derive(bugBeside, { x: aK })).toThrow(TypeError);
    expect(() => reading('a', Number.NaN)).toThrow(RangeError);
    expect(() => reading('a', Infinity)).toThrow(RangeError);
  });
});
