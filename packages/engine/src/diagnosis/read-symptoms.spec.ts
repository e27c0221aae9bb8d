import { describe, expect, it } from 'vitest';
import type { Known } from '../derivation/quantity';
import { leaf, missing } from '../derivation/quantity';
import { differenceToK, flowToM3PerS, powerToW } from '../units';
import type { Change, Column } from './fault-patterns';
import type { SymptomReadings } from './read-symptoms';
import { possibleChanges, readSymptoms } from './read-symptoms';

const measured = (valueF: number, uF = 0): Known =>
  leaf({
    id: 'measured',
    kind: 'differenceK',
    value: differenceToK(valueF, 'deltaF'),
    origin: 'reading',
    parts: uF === 0 ? [] : [{ key: 'measured', u: differenceToK(uF, 'deltaF'), shape: 'normal' }],
  });
const fraction = (value: number, u = 0): Known =>
  leaf({
    id: 'current',
    kind: 'fraction',
    value,
    origin: 'reading',
    parts: u === 0 ? [] : [{ key: 'current', u, shape: 'normal' }],
  });
const k = (deltaF: number): number => differenceToK(deltaF, 'deltaF');
const ANY = ['down', 'little', 'up'];

const NOTHING: SymptomReadings = {
  metering: 'orifice',
  refrigerant: 'R-22',
  port: 'liquid',
  superheat: null,
  subcooling: null,
  subcoolingLevels: null,
  split: null,
  returnOverEvaporating: missing('returnDryBulb'),
  airflowPerCapacity: null,
  condensingOverAir: missing('liquidPressure'),
  liquidLineApproach: missing('liquidLineTemperature'),
  currentOffExpected: missing('compressorCurrent'),
};
const read = (readings: Partial<SymptomReadings>, column: Column): readonly Change[] | undefined =>
  readSymptoms({ ...NOTHING, ...readings }).find((symptom) => symptom.column === column)?.possible;
const perTon = (cfm: number): number => flowToM3PerS(cfm, 'cfm') / powerToW(1, 'ton');

describe('how a difference is called', () => {
  const band = { low: k(-5), high: k(5), inside: ['little'] as const, insideFrom: k(-5) };

  it.each([
    [-6, 'down'],
    [-5, 'little'],
    [0, 'little'],
    [5, 'little'],
    [6, 'up'],
  ] as const)('%d °F of an exact instrument, limits ±5: %s', (deltaF, change) => {
    expect(possibleChanges(measured(deltaF), band)).toEqual([change]);
  });

  // one standard uncertainty is 1 °F: 0.80 is reached 0.842 beyond a limit, and 0.842 inside it
  it.each([
    [5.8, ANY],
    [5.9, ['up']],
    [4.2, ANY],
    [4.1, ['little']],
    [-5.9, ['down']],
    [-5.8, ANY],
  ])('%d °F ± 1 °F: %j', (deltaF, possible) => {
    expect(possibleChanges(measured(deltaF, 1), band)).toEqual(possible);
  });

  it('takes the mean that a kink shifts into account, either way', () => {
    const at = (meanShift: number): Known => ({ ...measured(6.2, 1), meanShift: k(meanShift) });
    expect(possibleChanges(at(0), band)).toEqual(['up']);
    expect(possibleChanges(at(-0.5), band)).toEqual(ANY);
    expect(possibleChanges({ ...measured(5.5, 1), meanShift: k(2) }, band)).toEqual(ANY);
  });

  it('is never clearer with a wider ±', () => {
    for (let deltaF = -12; deltaF <= 12; deltaF += 0.25) {
      let before: readonly Change[] = possibleChanges(measured(deltaF), band);
      for (const u of [0.1, 0.5, 1, 2, 4, 8, 100]) {
        const now = possibleChanges(measured(deltaF, u), band);
        for (const change of before) expect(now, `${deltaF} ± ${u}`).toContain(change);
        before = now;
      }
      expect(before).toEqual(ANY);
    }
  });
});

describe('what is usual for many systems is a sign outside its band, and says nothing inside', () => {
  it.each([
    [24, 'up'],
    [26, null],
    [44, null],
    [46, 'down'],
  ] as const)('return air %d °F over evaporating: suction %s', (deltaF, change) => {
    expect(read({ returnOverEvaporating: measured(deltaF) }, 'suction')).toEqual(change === null ? ANY : [change]);
  });

  it('the evaporator works nearer to the air where the airflow is known to be full', () => {
    const at = (airflowPerCapacity: number) =>
      read({ returnOverEvaporating: measured(42), airflowPerCapacity }, 'suction');
    expect(at(perTon(400))).toEqual(['down']);
    expect(at(perTon(399))).toEqual(ANY);
  });

  it.each([
    ['R-22', 'liquid', 9, 'down'],
    ['R-22', 'liquid', 11, null],
    ['R-22', 'liquid', 29, null],
    ['R-22', 'liquid', 31, 'up'],
    ['R-410A', 'liquid', 24, null],
    ['R-410A', 'liquid', 26, 'up'],
    ['R-410A', 'discharge', 27, null],
    ['R-410A', 'discharge', 29, 'up'],
  ] as const)('%s at the %s port, condensing %d °F over the air: head %s', (refrigerant, port, deltaF, change) => {
    const possible = read({ refrigerant, port, condensingOverAir: measured(deltaF) }, 'head');
    expect(possible).toEqual(change === null ? ANY : [change]);
  });

  it.each([
    [2, 'down'],
    [8, null],
    [13, 'up'],
  ] as const)('liquid line %d °F over the air, without a high-side gauge: approach %s', (deltaF, change) => {
    expect(read({ liquidLineApproach: measured(deltaF) }, 'approach')).toEqual(change === null ? ANY : [change]);
  });

  it('the approach is left out where head and subcooling hold the same readings', () => {
    expect(read({ liquidLineApproach: measured(2), condensingOverAir: measured(20) }, 'approach')).toBeUndefined();
  });
});

describe('what has a target', () => {
  const held = (value: number) => ({ measured: measured(value), low: k(-3), high: k(3) });

  it('is a column of its own for each metering device', () => {
    expect(read({ superheat: held(4) }, 'superheatOrifice')).toEqual(['up']);
    expect(read({ metering: 'valve', superheat: held(-4) }, 'superheatValve')).toEqual(['down']);
    expect(read({ split: held(0) }, 'split')).toEqual(['little']);
  });

  it.each([
    [4, ['down']],
    [6, ANY],
    [9, ['little', 'up']],
    [14, ['little', 'up']],
    [15, ['up']],
  ])('subcooling of %d °F without one: %j', (value, possible) => {
    const subcoolingLevels = { measured: measured(value), lowBelowK: k(5), clearFromK: k(8), highAboveK: k(14) };
    expect(read({ subcoolingLevels }, 'subcooling')).toEqual(possible);
    // a target outranks the levels
    expect(read({ subcoolingLevels, subcooling: held(-4) }, 'subcooling')).toEqual(['down']);
  });

  it.each([
    [-0.11, 'down'],
    [0.09, 'little'],
    [0.11, 'up'],
  ] as const)('a current %d off the expected one', (off, change) => {
    expect(read({ currentOffExpected: fraction(off) }, 'current')).toEqual([change]);
  });

  it('what was not read is no symptom', () => {
    expect(readSymptoms(NOTHING)).toEqual([]);
  });
});
