/** What each example is to teach, as a contrast that can be counted: with the usual slip another conclusion comes out. */
import type { CheckResult, ReadingId } from '@chargewright/engine';
import { expandedUncertainty, isKnown } from '@chargewright/engine';
import {
  findWorkedExample,
  workCheck,
  workMoistAir,
  workWeighIn,
  type CheckExample,
  type MoistAirExample,
  type SlipId,
  type WeighInExample,
  type WorkedExampleId,
} from '@chargewright/engine/training';
import { evaluate } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { oracle } from '../psychrometrics/oracle';
import { finerSuperheatTable, onPaper, splitTable, superheatChart, temperatureByTable } from './paper';

const example = <Kind extends CheckExample | MoistAirExample | WeighInExample>(
  id: WorkedExampleId,
  kind: Kind['kind'],
): Kind => {
  const found = findWorkedExample(id);
  if (found?.kind !== kind) throw new Error(`no example ${id} of the kind ${kind}`);
  return found as Kind;
};
const check = (id: WorkedExampleId): CheckExample => example<CheckExample>(id, 'check');
const slipOf = (id: WorkedExampleId, slip: SlipId): CheckResult =>
  workCheck(check(id)).slips.find((each) => each.slip.id === slip)!.result;
const criterionOf = ({ criteria }: CheckResult, id: string) => criteria.find(({ criterion }) => criterion === id);

describe('moist air of the Handbook', () => {
  const given = example<MoistAirExample>('handbook-moist-air', 'moist-air');
  const computed = (what: string): number =>
    workMoistAir(given).figures.find(({ figure }) => figure.what === what)!.computed!;
  const celsius = (fahrenheit: number) => (fahrenheit - 32) / 1.8;
  const pressurePa = 14.696 * 6894.757293168;
  const [db, wb] = [celsius(given.given.dryBulbF), celsius(given.given.wetBulbF)];

  it('agrees with an independent library of the same equations far closer than with the chart', () => {
    const humidityRatio = oracle.GetHumRatioFromTWetBulb(db, wb, pressurePa);
    expect(computed('humidityRatio') / humidityRatio).toBeCloseTo(1, 3);
    expect(computed('relativeHumidity') / 100).toBeCloseTo(oracle.GetRelHumFromTWetBulb(db, wb, pressurePa), 4);
    // ft³/lb and Btu/lb by hand: 16.018463 lb/ft³ in a kg/m³, and h = 0.240 t + W (1061 + 0.444 t), eq. 30 in inch-pound units
    expect(computed('specificVolume')).toBeCloseTo(
      oracle.GetMoistAirVolume(db, humidityRatio, pressurePa) * 16.018463,
      2,
    );
    expect(computed('enthalpy')).toBeCloseTo(
      evaluate('0.240 * t + W * (1061 + 0.444 * t)', { t: 100, W: humidityRatio }) as number,
      2,
    );
  });

  it('has its dew point where vapour of this humidity ratio saturates', () => {
    const vapourPa = evaluate('p * W / (0.621945 + W)', { p: pressurePa, W: computed('humidityRatio') }) as number;
    expect(computed('dewPoint')).toBeCloseTo(1.8 * oracle.GetTDewPointFromVapPres(db, vapourPa) + 32, 1);
  });

  it('shows its steps in the order of paper', () => {
    expect(workMoistAir(given).steps.map(({ id }) => id)).toEqual([
      'humidityRatio',
      'relativeHumidity',
      'dewPoint',
      'enthalpy',
      'specificVolume',
    ]);
  });
});

describe('low airflow on a fixed orifice', () => {
  const low = check('low-airflow-floods');

  it('stays inside ±5 °F and under the floor of 5 °F at once', () => {
    expect(Math.abs(onPaper(low, { what: 'superheatDeviation' }))).toBeLessThanOrEqual(5);
    expect(onPaper(low, { what: 'superheat' })).toBeLessThan(5);
    expect(workCheck(low).result.overall.stops.map(({ code }) => code)).toEqual(['liquid-return']);
    expect(criterionOf(slipOf('low-airflow-floods', 'rule-without-floor'), 'superheat')?.byRule).toBe('passes');
  });

  it('is seen by the split alone, which lies more than 3 °F above its target', () => {
    expect(onPaper(low, { what: 'splitDeviation' })).toBeGreaterThan(3);
    expect(slipOf('low-airflow-floods', 'without-supply-air').overall.nextStep.code).toBe('check-metering');
  });
});

describe('a valve short of refrigerant', () => {
  it('passes by the superheat chart of another method, and by its own window, and fails by subcooling', () => {
    const hidden = check('valve-hides-low-charge');
    expect(Math.abs(onPaper(hidden, { what: 'superheatDeviation', of: 'judged-as-orifice' }))).toBeLessThanOrEqual(5);
    expect(slipOf('valve-hides-low-charge', 'judged-as-orifice').overall.finding).toBe('within');
    expect(criterionOf(workCheck(hidden).result, 'superheat-window')?.finding).toBe('within');
    expect(onPaper(hidden, { what: 'subcoolingDeviation' })).toBeLessThan(-3);
  });
});

describe('undercharge in plain sight', () => {
  it('has every sign of it: suction low, superheat high, subcooling and split low', () => {
    const low = check('undercharge-low-split');
    const healthy = check('healthy-orifice');
    const values = (which: CheckExample) =>
      (['evaporatingDewTemperature', 'superheatDeviation', 'subcooling', 'splitDeviation'] as const).map((what) =>
        onPaper(which, { what }),
      );
    const signs = values(low).map((value, k) => Math.sign(value - values(healthy)[k]!));
    expect(signs).toEqual([-1, 1, -1, -1]);
  });
});

describe('a restriction with ice', () => {
  it('freezes like a low charge; the subcooling before it sends to the drier instead of the leak', () => {
    const ice = check('restriction-with-ice');
    expect(onPaper(ice, { what: 'evaporatingDewTemperature' })).toBeLessThanOrEqual(28);
    expect(onPaper(ice, { what: 'subcooling' })).toBeGreaterThanOrEqual(8);
    expect(onPaper(ice, { what: 'subcooling', of: 'liquid-line-warm' })).toBeLessThan(5);
    expect(slipOf('restriction-with-ice', 'liquid-line-warm').overall.nextStep.code).toBe('thaw-then-leak-search');
    expect(workCheck(ice).result.overall.nextStep.notYet).toContain('add-nothing');
  });
});

describe('overcharge or air', () => {
  const either = check('overcharge-or-air');

  it('are told apart by the standing pressure, and by nothing that was read while it ran', () => {
    const { result } = workCheck(either);
    expect(result.overall.nextStep.notYet).toEqual(['add-nothing', 'recover-nothing']);
    const ran = Object.keys(either.request.readings).sort();
    for (const { request } of either.slips) {
      expect(Object.keys(request.readings).sort()).toEqual(
        [...ran, 'standingIndoorCoilTemperature', 'standingOutdoorCoilTemperature', 'standingPressure'].sort(),
      );
      for (const id of ran) expect(request.readings).toHaveProperty(id, either.request.readings[id as ReadingId]);
    }
    expect(slipOf('overcharge-or-air', 'standing-as-printed').overall.nextStep.code).toBe('recover-in-steps');
    expect(slipOf('overcharge-or-air', 'standing-too-high').overall.nextStep.code).toBe('recover-air-weigh-in');
  });

  it('show air from 3 °F of excess on, by the printed table', () => {
    const excess = (of: SlipId) => onPaper(either, { what: 'standingExcess', of });
    expect(excess('standing-as-printed')).toBeLessThan(3);
    expect(excess('standing-too-high')).toBeGreaterThan(3);
  });
});

describe('the short formula in a dash', () => {
  const dash = check('formula-in-a-dash');

  it('gives 6 °F where all three printed tables have a dash', () => {
    expect(onPaper(dash, { what: 'shortFormula' })).toBe(6);
    expect(superheatChart(100, 64, 'A')).toBeNull();
    expect(superheatChart(100, 64, 'B')).toBeNull();
    expect(finerSuperheatTable(100, 64)).toBeNull();
  });

  it('would send for refrigerant: the superheat lies more than 5 °F above the number it gives', () => {
    expect(onPaper(dash, { what: 'superheat' }) - onPaper(dash, { what: 'shortFormula' })).toBeGreaterThan(5);
    const { result } = workCheck(dash);
    expect(criterionOf(result, 'superheat')?.target).toBeNull();
    expect(result.overall.nextStep.notYet).toEqual(['move-no-refrigerant']);
  });
});

describe('a mile high', () => {
  it('the sea-level table moves the superheat by almost 2 °F, over the limit of ±5 °F and back', () => {
    const high = check('sea-level-chart');
    const here = onPaper(high, { what: 'superheatDeviation' });
    const atSeaLevel = onPaper(high, { what: 'superheatDeviation', of: 'gauge-at-sea-level' });
    expect(here).toBeGreaterThan(5);
    expect(atSeaLevel).toBeLessThan(5);
    expect(here - atSeaLevel).toBeGreaterThan(1.7);
    expect([
      workCheck(high).result.overall.finding,
      slipOf('sea-level-chart', 'gauge-at-sea-level').overall.finding,
    ]).toEqual(['above', 'within']);
  });
});

describe('the wrong column', () => {
  it('of R-454B turns a subcooling that fails into one that passes', () => {
    const wrong = check('wrong-column');
    expect(Math.abs(onPaper(wrong, { what: 'subcoolingDeviation' }))).toBeGreaterThan(3);
    expect(Math.abs(onPaper(wrong, { what: 'subcoolingFromDew' }) - 10)).toBeLessThanOrEqual(3);
  });

  it('of R-407C turns a superheat that passes into one that fails', () => {
    const wrong = check('wide-glide-wrong-column');
    expect(Math.abs(onPaper(wrong, { what: 'superheatDeviation' }))).toBeLessThanOrEqual(5);
    expect(
      onPaper(wrong, { what: 'superheatFromBubble' }) - onPaper(wrong, { what: 'targetSuperheat' }),
    ).toBeGreaterThan(5);
  });

  it('stands written on the paper, where the engine finds it', () => {
    for (const id of ['wrong-column', 'wide-glide-wrong-column'] as const) {
      expect(workCheck(check(id)).result.overall.cautions.map(({ code }) => code)).toContain('wrong-column');
    }
  });
});

describe('the wrong scale', () => {
  it('turns a subcooling that passes into one that fails, and the written saturation gives it away', () => {
    const wrong = check('wrong-scale');
    expect(Math.abs(onPaper(wrong, { what: 'subcoolingDeviation' }))).toBeLessThanOrEqual(3);
    expect(onPaper(wrong, { what: 'subcoolingDeviation', of: 'scale-of-r410a' })).toBeLessThan(-3);
    const written = [
      wrong.request.readings.writtenCondensingTemperature,
      wrong.request.readings.writtenEvaporatingTemperature,
    ];
    expect(Math.abs(written[0]!.value - temperatureByTable('R-410A', 'high', 'bubble', 348.6))).toBeLessThan(0.1);
    expect(Math.abs(written[1]!.value - temperatureByTable('R-410A', 'suction', 'dew', 107.5))).toBeLessThan(0.1);
  });
});

describe('too close to call', () => {
  it('passes by the rule, and the limit lies inside its uncertainty', () => {
    const { result } = workCheck(check('too-close-to-call'));
    const subcooling = criterionOf(result, 'subcooling')!;
    const { deviation, tolerance, probabilityWithin } = subcooling;
    if (!isKnown(deviation) || tolerance?.low == null) throw new Error('no deviation');
    expect(subcooling.byRule).toBe('passes');
    expect(Math.abs(deviation.value - tolerance.low)).toBeLessThan(expandedUncertainty(deviation));
    expect(probabilityWithin).toBeGreaterThan(0.2);
    expect(probabilityWithin).toBeLessThan(0.8);
  });
});

describe('a dry house', () => {
  it('has a split of 24 °F that a fixed 20 ± 3 °F would call low airflow, and the table calls right', () => {
    const dry = check('dry-house');
    const split = onPaper(dry, { what: 'temperatureSplit' });
    expect(split - 20).toBeGreaterThan(3);
    expect(Math.abs(split - splitTable(80, 57)!)).toBeLessThanOrEqual(3);
    expect(split - splitTable(80, 64)!).toBeGreaterThan(3);
    expect(workCheck(dry).result.overall.finding).toBe('within');
  });
});

describe('the printed sum', () => {
  const { parts } = workWeighIn(example<WeighInExample>('printed-sum', 'weigh-in'));

  // the maker's own lengths and rates, and the sums it printed
  it.each([
    ['thin-line', '45 * 0.40', [9, 4.5]],
    ['thick-line', '25 * 0.60', [13.5]],
  ] as const)('of the %s: %s is not %j oz', (id, sum, printed) => {
    const { part, result, misprinted } = parts.find((each) => each.part.id === id)!;
    const right = evaluate(sum) as number;
    const ozOf = (kg: number) => kg / 0.028349523125;
    if (!isKnown(result.lineAdjustment)) throw new Error('no sum');
    expect(ozOf(result.lineAdjustment.value)).toBeCloseTo(right, 9);
    expect(result.finding).toBe(part.finding);
    expect(part.misprintsKg.map(ozOf)).toEqual(printed.map((oz) => expect.closeTo(oz, 9)));
    for (const oz of printed) expect(oz).toBeLessThan(right);
    expect(misprinted.map(({ finding }) => finding)).toEqual(printed.map(() => part.misprintFinding));
  });
});
