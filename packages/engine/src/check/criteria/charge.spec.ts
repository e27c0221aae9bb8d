import { describe, expect, it } from 'vitest';
import { differenceFromK } from '../../units';
import type { CriterionId, Finding, ReasonCode } from '../codes';
import type { EvaluationRequest } from '../request';
import { exactOrifice, exactValve } from '../testing/exact-systems';
import type { Changes, ReadingChanges } from '../testing/healthy-systems';
import { criterionOf, evaluate, orificeRequest, withPlusMinus } from '../testing/healthy-systems';

const orifice = exactOrifice;
const valve = exactValve;
const precise = (request: EvaluationRequest): EvaluationRequest =>
  withPlusMinus(request, { temperatureF: 0.1, pressurePsi: 0.2 });

const foundOf = (request: EvaluationRequest, id: CriterionId) => {
  const criterion = criterionOf(evaluate(request), id);
  return {
    ...criterion,
    found: [criterion.finding, criterion.reason?.code ?? null] as [Finding, ReasonCode | null],
  };
};
const limitsF = (request: EvaluationRequest, id: CriterionId): [number, number] => {
  const { low, high } = criterionOf(evaluate(request), id).tolerance!;
  return [differenceFromK(low!, 'deltaF'), differenceFromK(high!, 'deltaF')];
};

describe('superheat of a fixed orifice', () => {
  it('has its target from chart A: 15 °F at 85 °F outdoors and 66 °F wet bulb, ± 5', () => {
    const { target, targetSource, required } = foundOf(orifice(15), 'superheat');
    expect(differenceFromK(target!.value, 'deltaF')).toBeCloseTo(15, 9);
    expect([targetSource, required]).toEqual(['makers-chart-a', true]);
    expect(limitsF(orifice(15), 'superheat')).toEqual([-5, 5]);
  });

  it.each<[number, Finding]>([
    [15, 'within'],
    [19, 'within'],
    [20, 'too-close-to-call'],
    [21, 'above'],
    [11, 'within'],
    [10, 'too-close-to-call'],
    [9, 'below'],
    [40, 'above'],
  ])('%d °F, read well, is %s', (superheatF, finding) => {
    expect(foundOf(precise(orifice(superheatF)), 'superheat').found).toEqual([finding, null]);
  });

  it.each([
    [20, 'passes'],
    [20.0001, 'fails'],
    [10, 'passes'],
    [9.9999, 'fails'],
  ])('%d °F %s by the rule, whatever the instruments', (superheatF, byRule) => {
    expect(foundOf(orifice(superheatF), 'superheat').byRule).toBe(byRule);
    expect(foundOf(precise(orifice(superheatF)), 'superheat').byRule).toBe(byRule);
  });

  it('takes an entered target before the chart, and then needs neither wet bulb nor outdoor air for it', () => {
    const targetSuperheat = { value: 12, unit: 'deltaF' } as const;
    const request = orifice(12, { setup: { targetSuperheat }, readings: { returnWetBulb: null } });
    expect(foundOf(request, 'superheat')).toMatchObject({ targetSource: 'entered', finding: 'within' });
  });

  it.each([
    [15, -5],
    [10, -5],
    [9.9, -4.9],
    [8, -3],
    [6, -1],
    [5, 0],
  ])('with a target of %d °F reaches down to a deviation of %d °F: never under 5 °F of superheat', (target, low) => {
    const targetSuperheat = { value: target, unit: 'deltaF' } as const;
    const request = orifice(target, { setup: { targetSuperheat } });
    expect(limitsF(request, 'superheat')[0]).toBeCloseTo(low, 9);
    expect(limitsF(request, 'superheat')[1]).toBeCloseTo(5, 9);
    if (target !== 10) expect(criterionOf(evaluate(request), 'superheat').tolerance!.floored).toBe(low > -5);
  });

  it('at a target of 6 °F: 5 °F pass and 4.99 do not', () => {
    const request = (superheatF: number) =>
      orifice(superheatF, { setup: { targetSuperheat: { value: 6, unit: 'deltaF' } } });
    expect(foundOf(request(5), 'superheat').byRule).toBe('passes');
    expect(foundOf(request(4.99), 'superheat').byRule).toBe('fails');
  });

  it.each<[string, ReadingChanges, [Finding, ReasonCode | null]]>([
    ['no wet bulb', { returnWetBulb: null }, ['not-judged', 'readings-missing']],
    ['no outdoor air', { outdoorDryBulb: null }, ['not-judged', 'readings-missing']],
    ['no suction pressure', { suctionPressure: null }, ['not-judged', 'readings-missing']],
    ['no suction line', { suctionLineTemperature: null }, ['not-judged', 'readings-missing']],
    ['a dash', { outdoorDryBulb: 100, returnWetBulb: 60 }, ['not-verifiable', 'no-target-here']],
    [
      'above the chart',
      { outdoorDryBulb: 116, returnWetBulb: 74, liquidPressure: null, supplyDryBulb: null },
      ['not-verifiable', 'no-target-here'],
    ],
    ['drier than the chart', { returnWetBulb: 49 }, ['not-verifiable', 'no-target-here']],
    ['beside a dash', { outdoorDryBulb: 95, returnWetBulb: 64.2 }, ['not-verifiable', 'target-may-not-exist']],
    ['below the curve', { suctionPressure: { value: 25, unit: 'inHgVac' } }, ['not-judged', 'outside-curve']],
  ])('%s', (_, readings, found) => {
    expect(foundOf(orifice(15, { readings }), 'superheat').found).toEqual(found);
  });

  it('beside a dash keeps the target’s value', () => {
    const { target } = foundOf(orifice(15, { readings: { outdoorDryBulb: 95, returnWetBulb: 64.2 } }), 'superheat');
    expect(differenceFromK(target!.value, 'deltaF')).toBeCloseTo(6.4, 6);
  });

  it('names all the readings it waits for, those of the target too', () => {
    const readings = { suctionPressure: null, suctionLineTemperature: null, returnWetBulb: null, outdoorDryBulb: null };
    const { reason } = foundOf(orificeRequest({ readings }), 'superheat');
    expect(reason?.figures).toEqual({
      readings: {
        kind: 'readings',
        value: ['suctionLineTemperature', 'suctionPressure', 'returnWetBulb', 'outdoorDryBulb'],
      },
    });
  });

  it('says what is missing before any gate: a short run, a cold day, impossible readings', () => {
    const changes: Changes = {
      visit: { runningMinutes: 2 },
      readings: { outdoorDryBulb: 40, returnWetBulb: null, liquidLineTemperature: 130 },
    };
    expect(foundOf(orifice(15, changes), 'superheat').found).toEqual(['not-judged', 'readings-missing']);
  });

  it('takes the wet bulb from relative humidity', () => {
    // 76 °F and 59.33 % are a wet bulb of 66 °F
    const readings = { returnWetBulb: null, returnRelativeHumidity: 59.33382661996071 };
    const { target, found } = foundOf(orifice(15, { readings }), 'superheat');
    expect(differenceFromK(target!.value, 'deltaF')).toBeCloseTo(15, 6);
    expect(found).toEqual(['within', null]);
  });

  it('judges subcooling beside it where a target was entered, without waiting for it', () => {
    const setup = { targetSubcooling: { value: 10, unit: 'deltaF' } } as const;
    expect(foundOf(orifice(15, { setup }), 'subcooling')).toMatchObject({ finding: 'within', required: false });
    expect(foundOf(orifice(15), 'subcooling')).toMatchObject({ finding: 'not-judged', required: false });
    expect(evaluate(orifice(15)).overall.finding).toBe('within');
  });
});

describe('subcooling of a valve', () => {
  it.each<[number, Finding]>([
    [10, 'within'],
    [12, 'within'],
    [13, 'too-close-to-call'],
    [14, 'above'],
    [8, 'within'],
    [7, 'too-close-to-call'],
    [6, 'below'],
  ])('%d °F, read well, against a nameplate of 10 is %s', (subcoolingF, finding) => {
    expect(foundOf(precise(valve(subcoolingF)), 'subcooling').found).toEqual([finding, null]);
  });

  it('has ± 3 °F, limits included', () => {
    for (const [deltaF, byRule] of [
      [13, 'passes'],
      [13.0001, 'fails'],
      [7, 'passes'],
      [6.9999, 'fails'],
    ] as const)
      expect(foundOf(valve(deltaF), 'subcooling').byRule, String(deltaF)).toBe(byRule);
  });

  it.each<[string, Changes, [Finding, ReasonCode | null]]>([
    ['no target', { setup: { targetSubcooling: null } }, ['not-judged', 'target-missing']],
    ['no liquid pressure', { readings: { liquidPressure: null } }, ['not-judged', 'readings-missing']],
    ['no liquid line', { readings: { liquidLineTemperature: null } }, ['not-judged', 'readings-missing']],
    [
      'neither a target nor the readings: readings first',
      { setup: { targetSubcooling: null }, readings: { liquidLineTemperature: null } },
      ['not-judged', 'readings-missing'],
    ],
    ['above the curve', { readings: { liquidPressure: 690 } }, ['not-judged', 'outside-curve']],
    ['a short run', { visit: { runningMinutes: 10 } }, ['not-verifiable', 'running-time']],
  ])('%s', (_, changes, found) => {
    expect(foundOf(valve(10, 12, changes), 'subcooling').found).toEqual(found);
  });

  it('without a target is never judged, however usual it is', () => {
    for (const deltaF of [2, 8, 11, 14, 25]) {
      expect(foundOf(valve(deltaF, 12, { setup: { targetSubcooling: null } }), 'subcooling').byRule).toBeNull();
    }
  });

  it('without a wet bulb is judged', () => {
    expect(evaluate(valve(10, 12, { readings: { returnWetBulb: null } })).overall.finding).toBe('within');
  });
});

describe('the superheat window of a valve', () => {
  it.each<[number, Finding, 'passes' | 'fails']>([
    [4, 'too-close-to-call', 'passes'],
    [3.9999, 'too-close-to-call', 'fails'],
    [6, 'within', 'passes'],
    [24, 'within', 'passes'],
    [25, 'too-close-to-call', 'passes'],
    [25.0001, 'too-close-to-call', 'fails'],
    [27, 'above', 'fails'],
    [2, 'below', 'fails'],
  ])('%d °F, read well, is %s and %s by the rule', (superheatF, finding, byRule) => {
    expect(foundOf(precise(valve(10, superheatF)), 'superheat-window')).toMatchObject({
      finding,
      byRule,
      required: true,
    });
  });

  it('holds the superheat itself against 4 and 25 °F, without a target', () => {
    const { target, deviation, targetSource, actual } = foundOf(valve(10), 'superheat-window');
    expect([target, deviation, targetSource]).toEqual([null, null, 'procedure-window']);
    expect(differenceFromK(actual!.value, 'deltaF')).toBeCloseTo(12, 6);
    const limits = limitsF(valve(10), 'superheat-window');
    expect(limits[0]).toBeCloseTo(4, 9);
    expect(limits[1]).toBeCloseTo(25, 9);
  });

  it('is the maker’s range where one was entered', () => {
    const setup = { superheatRange: { low: 8, high: 14, unit: 'deltaF' } } as const;
    expect(foundOf(precise(valve(10, 12, { setup })), 'superheat-window')).toMatchObject({
      targetSource: 'entered-range',
      finding: 'within',
    });
    expect(foundOf(precise(valve(10, 18, { setup })), 'superheat-window').finding).toBe('above');
  });

  it('waits for the suction pair', () => {
    expect(foundOf(valve(10, 12, { readings: { suctionPressure: null } }), 'superheat-window').found).toEqual([
      'not-judged',
      'readings-missing',
    ]);
  });
});

describe('age', () => {
  it.each([
    [600, null],
    [601, 'stale'],
  ])('a required reading of %d seconds: %s', (ageSeconds, reason) => {
    for (const id of ['suctionPressure', 'suctionLineTemperature', 'returnWetBulb', 'outdoorDryBulb'] as const) {
      const request = orifice(15);
      const readings = { ...request.readings, [id]: { ...request.readings[id]!, ageSeconds } };
      expect(foundOf({ ...request, readings }, 'superheat').reason?.code ?? null, id).toBe(reason);
    }
  });

  it('names what is too old, and only what the criterion rests on', () => {
    const request = valve(10);
    const old = (id: 'liquidPressure' | 'suctionPressure') => ({ ...request.readings[id]!, ageSeconds: 1000 });
    const result = evaluate({ ...request, readings: { ...request.readings, liquidPressure: old('liquidPressure') } });
    expect(criterionOf(result, 'subcooling').reason).toEqual({
      code: 'stale',
      figures: { readings: { kind: 'readings', value: ['liquidPressure'] } },
    });
    expect(criterionOf(result, 'superheat-window').reason).toBeNull();
    expect(result.overall.nextStep).toMatchObject({
      code: 'take-readings-again',
      figures: { readings: { value: ['liquidPressure'] } },
    });
  });
});
