import { describe, expect, it } from 'vitest';
import { bubblePressurePa, dewPressurePa } from '../refrigerants/saturation';
import { PA_PER_PSI, temperatureToK } from '../units';
import type { ReadingInput } from './request';
import type { Changes, ReadingChanges } from './testing/healthy-systems';
import {
  cautionCodes,
  criterionOf,
  evaluate,
  orificeRequest,
  stopCodes,
  valveRequest,
} from './testing/healthy-systems';

const at = (degF: number) => ({ refrigerant: 'R-410A', temperatureK: temperatureToK(degF, 'degF') }) as const;
const psia = (pa: number): ReadingInput => ({ value: pa / PA_PER_PSI, unit: 'psia' });

const judged = (changes: Changes) => {
  const result = evaluate(valveRequest(changes));
  const { finding, reason } = criterionOf(result, 'subcooling');
  return { result, finding, reason: reason?.code ?? null, nextStep: result.overall.nextStep };
};

describe('ports-swapped', () => {
  it.each([
    [340, 118, false],
    [118, 340, true],
    [200, 200, true],
    // ±2 and ±4 psi as limits: U of the difference is 2·√(2² + 4²)/√3 = 5.16 psi, and the atmosphere’s twice
    [200, 190, false],
    [200, 196, true],
  ])('with %d psig liquid and %d psig suction: %s', (liquidPressure, suctionPressure, swapped) => {
    const readings = { liquidPressure, suctionPressure, suctionLineTemperature: 120 };
    const { result, finding, reason, nextStep } = judged({ readings });
    expect(cautionCodes(result).includes('ports-swapped')).toBe(swapped);
    if (!swapped) return;
    expect([finding, reason, nextStep.code]).toEqual(['not-verifiable', 'ports-swapped', 'check-hoses']);
    expect(nextStep.notYet).toEqual(['add-nothing']);
  });

  it('looks at the discharge pressure where there is a discharge port only', () => {
    const setup = { highSidePort: 'discharge', targetSubcoolingPort: 'discharge' } as const;
    const readings = { liquidPressure: null, dischargePressure: 110 };
    expect(judged({ setup, readings }).reason).toBe('ports-swapped');
  });

  it('is normal in heating, and cannot be told at a suction port alone', () => {
    const readings = { suctionPressure: 350, liquidPressure: 340, suctionLineTemperature: 150 };
    expect(judged({ setup: { mode: 'heating' }, readings }).reason).toBe('heating-mode');
    expect(cautionCodes(judged({ setup: { mode: 'heating' }, readings }).result)).not.toContain('ports-swapped');
    expect(cautionCodes(judged({ setup: { highSidePort: 'none' }, readings }).result)).not.toContain('ports-swapped');
  });
});

describe('saturation-impossible', () => {
  it.each<[string, ReadingChanges, boolean]>([
    ['superheat below −U', { suctionLineTemperature: 36 }, true],
    ['superheat below zero inside U', { suctionLineTemperature: 39.6 }, false],
    ['subcooling below −U', { liquidLineTemperature: 108 }, true],
    ['subcooling below zero inside U', { liquidLineTemperature: 105.2 }, false],
    [
      'condensing at the outdoor air',
      { liquidPressure: psia(bubblePressurePa(at(85))), liquidLineTemperature: 80 },
      true,
    ],
    [
      'condensing just above the outdoor air',
      { liquidPressure: psia(bubblePressurePa(at(85.01))), liquidLineTemperature: 80 },
      false,
    ],
    [
      'evaporating at the return air',
      { suctionPressure: psia(dewPressurePa(at(76))), suctionLineTemperature: 88 },
      true,
    ],
    [
      'evaporating just below the return air',
      { suctionPressure: psia(dewPressurePa(at(75.99))), suctionLineTemperature: 88 },
      false,
    ],
  ])('%s: %#', (_, readings, impossible) => {
    const { result, finding, reason, nextStep } = judged({ readings });
    expect(cautionCodes(result)[0] === 'saturation-impossible').toBe(impossible);
    if (!impossible) return;
    expect([finding, reason]).toEqual(['not-verifiable', 'saturation-impossible']);
    expect(nextStep).toMatchObject({ code: 'check-refrigerant-and-probes', notYet: ['add-nothing'] });
  });

  it('comes before the stops, and a superheat far below zero is not liquid return', () => {
    const readings = { suctionLineTemperature: 36, dischargeLineTemperature: 240 };
    const { result, nextStep } = judged({ readings });
    expect(stopCodes(result)).toEqual(['hot-discharge']);
    expect(result.overall.finding).toBe('stop');
    expect(nextStep).toMatchObject({ code: 'check-refrigerant-and-probes', notYet: ['shut-down', 'add-nothing'] });
  });

  it('is not made possible by a poorer gauge', () => {
    const pressure = psia(bubblePressurePa(at(80)));
    for (const half of [0.1, 4, 40, 200, 1000]) {
      const liquidPressure = { ...pressure, plusMinus: { value: half, unit: 'psi' } } as const;
      const changes: Changes = { setup: { refrigerant: 'R-410A' }, readings: { suctionPressure: 118, liquidPressure } };
      expect(criterionOf(evaluate(orificeRequest(changes)), 'superheat').finding, `±${half}`).toBe('not-verifiable');
    }
  });
});

describe('a negative subcooling', () => {
  it('never lets a criterion be within, though the readings may be possible', () => {
    const changes = { readings: { liquidLineTemperature: 105.3 } };
    const valve = evaluate(valveRequest(changes));
    expect(criterionOf(valve, 'superheat-window')).toMatchObject({
      byRule: 'passes',
      finding: 'too-close-to-call',
      reason: { code: 'flash' },
    });
    expect(criterionOf(valve, 'subcooling').finding).toBe('below');
    expect(cautionCodes(valve)).toContain('flash');
    const orifice = evaluate(orificeRequest({ readings: { liquidLineTemperature: 105.5 } }));
    expect(criterionOf(orifice, 'superheat')).toMatchObject({
      finding: 'too-close-to-call',
      reason: { code: 'flash' },
    });
    expect(orifice.overall.finding).toBe('too-close-to-call');
  });
});
