import { leaf, temperatureToK, type DerivationStep, type Known } from '@chargewright/engine';
import { describe, expect, it } from 'vitest';
import { derivationLines, substitute } from './derivation-lines';

const reading = (id: string, kind: Known['kind'], value: number): Known => leaf({ id, kind, value, origin: 'reading' });

function step(
  id: string,
  text: string,
  inputs: Readonly<Record<string, { symbol: string; known: Known }>>,
  result: Pick<Known, 'kind' | 'value'>,
): DerivationStep {
  const entries = Object.entries(inputs);
  const derived = {
    type: 'derived',
    formula: {
      id,
      gives: result.kind,
      text,
      symbols: Object.fromEntries(entries.map(([name, { symbol }]) => [name, symbol])),
      source: 'A handbook',
      of: () => result.value,
    },
    from: Object.fromEntries(entries.map(([name, { known }]) => [name, known])),
    parts: [],
  } as const;
  return {
    id,
    step: derived,
    result: { ...reading(id, result.kind, result.value), step: derived },
  };
}

describe('substitute', () => {
  it('replaces whole symbols, the longest first, each once', () => {
    const values = new Map([
      ['T', 'T_dew'],
      ['T_dew', '39.0 °F'],
      ['W', '0.0101'],
    ]);
    expect(substitute('T − T_dew', values)).toBe('T_dew − 39.0 °F');
    expect(substitute('RH(T_dewpoint, W, Wx)', values)).toBe('RH(T_dewpoint, 0.0101, Wx)');
  });

  it('takes symbols with signs of regular expressions literally', () => {
    expect(substitute('p* + q', new Map([['p*', '3']]))).toBe('3 + q');
  });

  it('leaves a formula without inputs as it is', () => {
    expect(substitute('42', new Map())).toBe('42');
  });
});

describe('derivationLines', () => {
  const superheat = step(
    'superheat',
    'T_suction − T_dew',
    {
      suctionLineK: {
        symbol: 'T_suction',
        known: reading('suctionLineTemperature', 'temperatureK', temperatureToK(57.3, 'degF')),
      },
      dewPointK: { symbol: 'T_dew', known: reading('dew', 'temperatureK', temperatureToK(-3, 'degF')) },
    },
    { kind: 'differenceK', value: (60.3 * 5) / 9 },
  );

  it('writes a step as on paper', () => {
    const [line] = derivationLines([superheat], 'F-psi');
    expect(line).toMatchObject({
      id: 'superheat',
      name: 'Superheat',
      formula: 'T_suction − T_dew',
      substitution: '57.3 °F − (−3.0 °F)',
      unit: 'deltaF',
      result: '60.3 °F',
      source: 'A handbook',
    });
    expect(line?.value).toBeCloseTo(60.3, 9);
  });

  it('follows the unit system', () => {
    expect(derivationLines([superheat], 'C-bar')[0]).toMatchObject({
      substitution: '14.1 °C − (−19.4 °C)',
      unit: 'deltaC',
      result: '33.5 °C',
    });
  });

  it('calls a gauge pressure gauge and an absolute one absolute', () => {
    const absolute = step(
      'suctionPressureAbsolute',
      'p_gauge + p_atmosphere',
      {
        gaugePa: { symbol: 'p_gauge', known: reading('suctionPressure', 'pressurePa', 803_239.2) },
        atmospherePa: { symbol: 'p_atmosphere', known: reading('atmosphere', 'pressurePa', 98_951) },
      },
      { kind: 'pressurePa', value: 902_190.2 },
    );
    const inPsi = derivationLines([absolute], 'F-psi')[0];
    expect(inPsi?.name).toBe('Suction pressure, absolute');
    expect(inPsi?.substitution).toBe('116.5 psig + 14.4 psia');
    expect(derivationLines([absolute], 'C-bar')[0]?.substitution).toBe('8.03 barg + 0.99 bara');
    expect(derivationLines([absolute], 'C-kPa')[0]?.substitution).toBe('803 kPag + 99 kPaa');
  });
});
