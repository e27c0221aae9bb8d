import { describe, expect, it } from 'vitest';
import { EngineError } from '../errors';
import { derive } from './derive';
import { formula } from './formula';
import type { ErrorPart, Known } from './quantity';
import { isKnown, leaf } from './quantity';
import { replay } from './replay';
import { derivationSteps } from './steps';

const reading = (id: string, value: number, key: string, u: number): Known =>
  leaf({ id, kind: 'temperatureK', value, origin: 'reading', parts: [{ key, u, shape: 'normal' }] });

const sum = (id: string) =>
  formula({
    id,
    gives: 'temperatureK',
    text: 'a + b',
    symbols: { aK: 'a', bK: 'b' },
    source: 'Definition',
    of: ({ aK, bK }) => aK + bK,
  });

function known(quantity: ReturnType<typeof derive>): Known {
  if (!isKnown(quantity)) throw new Error('not known');
  return quantity;
}

const model: ErrorPart = { key: 'model', u: 0.5, shape: 'rectangular' };
const a = reading('a', 1, 'thermometer', 0.1);
const b = reading('b', 2, 'thermometer', 0.2);
const inner = known(derive(sum('inner'), { aK: a, bK: b }, [model]));
const outer = known(derive(sum('outer'), { aK: inner, bK: a }));

describe('replay', () => {
  it('with no error gives the value again', () => {
    expect(replay(outer, () => 0)).toBe(outer.value);
    expect(outer.value).toBe(4);
  });

  it('computes the whole chain again with other errors, each source the same wherever it enters', () => {
    const asked: string[] = [];
    const drawn = replay(outer, ({ key }) => {
      asked.push(key);
      return key === 'model' ? -1 : 2;
    });
    // a is 1.2 both times, b is 2.4, the model 0.5 low
    expect(drawn).toBeCloseTo(1.2 + 2.4 - 0.5 + 1.2, 12);
    expect(asked.sort()).toEqual(['model', 'thermometer', 'thermometer', 'thermometer']);
  });

  it('throws the refusal of a formula at a draw', () => {
    const bounded = formula({
      id: 'bounded',
      gives: 'differenceK',
      text: 'f(x)',
      symbols: { x: 'x' },
      source: 'Test',
      of: ({ x }) => {
        if (x > 1) throw new EngineError('out-of-range', { quantity: 'x', value: x, reason: 'dash' });
        return x;
      },
    });
    const result = known(derive(bounded, { x: a }));
    expect(replay(result, () => -1)).toBeCloseTo(0.9, 12);
    expect(() => replay(result, () => 1)).toThrow(EngineError);
  });
});

describe('derivation steps', () => {
  it('come inputs first, each once, without the leaves', () => {
    const steps = derivationSteps([outer, inner, a]);
    expect(steps.map(({ id }) => id)).toEqual(['inner', 'outer']);
    expect(steps.map(({ result }) => result.value)).toEqual([3, 4]);
  });
});
