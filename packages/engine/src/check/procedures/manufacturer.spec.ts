/** Judged by this maker's data alone: what is a target, a limit and a ± here, and what is not judged where it is not entered. */
import { describe, expect, it } from 'vitest';
import { differenceFromK } from '../../units';
import type { CriterionId, Finding, ReasonCode } from '../codes';
import { diagnoseCheck } from '../diagnose-check';
import type { EvaluationRequest, MakersChartInput } from '../request';
import { exactOrifice, exactValve } from '../testing/exact-systems';
import type { Changes } from '../testing/healthy-systems';
import { cautionCodes, criterionOf, evaluate, inputOf, orificeRequest, stopCodes } from '../testing/healthy-systems';
import { GENERAL_RULES } from './general-rules';
import { MANUFACTURER } from './manufacturer';

const deltaF = (value: number) => ({ value, unit: 'deltaF' }) as const;
const degF = (value: number) => ({ value, unit: 'degF' }) as const;
const orifice = (superheatF: number, changes: Changes = {}): EvaluationRequest =>
  exactOrifice(superheatF, { procedure: 'manufacturer', ...changes });
const valve = (subcoolingF: number, superheatF = 12, changes: Changes = {}): EvaluationRequest =>
  exactValve(subcoolingF, superheatF, { procedure: 'manufacturer', ...changes });

type Found = readonly [Finding, ReasonCode | null];
const foundOf = (request: EvaluationRequest, id: CriterionId): Found => {
  const { finding, reason } = criterionOf(evaluate(request), id);
  return [finding, reason?.code ?? null];
};
const required = (request: EvaluationRequest): readonly CriterionId[] =>
  evaluate(request).criteria.flatMap((each) => (each.required ? [each.criterion] : []));
const nextStep = (request: EvaluationRequest): string => evaluate(request).overall.nextStep.code;
const bandF = (request: EvaluationRequest, id: CriterionId): readonly [number, number] => {
  const { low, high } = criterionOf(evaluate(request), id).tolerance!;
  return [differenceFromK(low!, 'deltaF'), differenceFromK(high!, 'deltaF')];
};

/** 18 °F at 85 °F outdoors and 66 °F wet bulb, where the printed chart says 15; a dash where it is hot and dry. */
const SUPERHEAT: MakersChartInput = {
  kind: 'superheat',
  rows: { unit: 'degF', values: [45, 85, 95, 105] },
  columns: { unit: 'degF', values: [62, 66, 70] },
  unit: 'deltaF',
  cells: [
    [18, 24, 30],
    [11, 18, 25],
    [null, 12, 20],
    [null, null, 15],
  ],
};
/** 6 °F at 85 °F outdoors and 66 °F wet bulb: near the floor of the general rules. */
const LOW_SUPERHEAT: MakersChartInput = { kind: 'superheat', unit: 'deltaF', cells: [[6]] };
const CURVE: MakersChartInput = {
  kind: 'liquid-pressure',
  rows: { unit: 'degF', values: [85, 95, 105] },
  unit: 'psig',
  cells: [[168], [210.8], [243]],
};
const HEATING: MakersChartInput = {
  kind: 'heating-discharge-pressure',
  rows: { unit: 'degF', values: [37, 47, 57] },
  columns: { unit: 'degF', values: [65, 75] },
  unit: 'psig',
  cells: [
    [295, 315],
    [320, 340],
    [345, 365],
  ],
};
const by = (makersChart: MakersChartInput, more: Changes['setup'] = {}): Changes => ({
  setup: { makersChart, ...more },
});

describe('a fixed orifice by its maker’s data', () => {
  it('without a target is not judged, whatever the printed chart says, and is asked for it', () => {
    expect(foundOf(orifice(15), 'superheat')).toEqual(['not-judged', 'target-missing']);
    expect(evaluate(orifice(15)).overall).toMatchObject({
      finding: 'not-judged',
      nextStep: { code: 'find-nameplate-target', notYet: ['move-no-refrigerant'] },
    });
  });

  it('is judged by the maker’s table, with the ± of the general rules as long as his is not entered', () => {
    expect(criterionOf(evaluate(orifice(18, by(SUPERHEAT))), 'superheat')).toMatchObject({
      finding: 'within',
      required: true,
      targetSource: 'makers-data',
      tolerance: { source: 'general-rules', floored: false },
    });
    const own = { ...SUPERHEAT, tolerance: deltaF(2) };
    expect(criterionOf(evaluate(orifice(18, by(own))), 'superheat').tolerance!.source).toBe('makers-data');
    const band = bandF(orifice(18, by(own)), 'superheat');
    expect(band[0]).toBeCloseTo(-2, 9);
    expect(band[1]).toBeCloseTo(2, 9);
  });

  it('keeps the floor of the general rules only with their ±', () => {
    expect(bandF(orifice(6, by(LOW_SUPERHEAT)), 'superheat')[0]).toBeCloseTo(-1, 9);
    expect(bandF(orifice(6, by({ ...LOW_SUPERHEAT, tolerance: deltaF(3) })), 'superheat')[0]).toBeCloseTo(-3, 9);
    expect(stopCodes(evaluate(orifice(4, by({ ...LOW_SUPERHEAT, tolerance: deltaF(3) }))))).toEqual(['liquid-return']);
  });

  it('takes a target from the nameplate', () => {
    const { targetSource, finding } = criterionOf(
      evaluate(orifice(20, { setup: { targetSuperheat: deltaF(20) } })),
      'superheat',
    );
    expect([targetSource, finding]).toEqual(['entered', 'within']);
  });

  it('has no target at a dash', () => {
    const request = orifice(15, { ...by(SUPERHEAT), readings: { outdoorDryBulb: 104, returnWetBulb: 63 } });
    expect(foundOf(request, 'superheat')).toEqual(['not-verifiable', 'no-target-here']);
    expect(nextStep(request)).toBe('reach-a-target');
  });

  it('in a packaged unit is judged by its curve', () => {
    const request = orifice(15, by(CURVE, { kind: 'packaged' }));
    expect(criterionOf(evaluate(request), 'liquid-pressure')).toMatchObject({
      finding: 'within',
      required: true,
      tolerance: { source: 'general-rules' },
    });
  });
});

describe.each(['txv', 'eev'] as const)('a valve (%s) by its maker’s data', (meteringDevice) => {
  const of = (subcoolingF: number, superheatF = 12, changes: Changes = {}): EvaluationRequest =>
    valve(subcoolingF, superheatF, { ...changes, setup: { meteringDevice, ...changes.setup } });

  it('is judged by the subcooling of the nameplate; its superheat is shown', () => {
    expect(required(of(10))).toEqual(['subcooling']);
    expect(foundOf(of(10), 'superheat-window')).toEqual(['not-judged', 'superheat-range-missing']);
    expect(criterionOf(evaluate(of(10)), 'superheat-window').actual!.value).toBeCloseTo(12 / 1.8, 6);
    expect(criterionOf(evaluate(of(10)), 'subcooling')).toMatchObject({
      targetSource: 'entered',
      tolerance: { source: 'general-rules' },
    });
    expect(evaluate(of(10)).overall).toMatchObject({ finding: 'within', nextStep: { code: 'record' } });
  });

  it('is judged by the maker’s range as well where it is entered', () => {
    const range = { setup: { superheatRange: { low: 8, high: 14, unit: 'deltaF' } } } as const;
    expect(required(of(10, 12, range))).toEqual(['subcooling', 'superheat-window']);
    expect(criterionOf(evaluate(of(10, 18, range)), 'superheat-window')).toMatchObject({
      targetSource: 'entered-range',
      finding: 'above',
      tolerance: { source: 'makers-data' },
    });
    expect(nextStep(of(10, 18, range))).toBe('check-bulb-screen-drier');
  });

  it('without a target is not judged', () => {
    const none = of(10, 12, { setup: { targetSubcooling: null } });
    expect(foundOf(none, 'subcooling')).toEqual(['not-judged', 'target-missing']);
    expect(nextStep(none)).toBe('find-nameplate-target');
  });

  it('is told of a superheat that is unusual, and low charge from a valve that floods', () => {
    expect(cautionCodes(evaluate(of(10, 30)))).toContain('unusual-superheat');
    expect(cautionCodes(evaluate(of(10)))).not.toContain('unusual-superheat');
    expect(nextStep(of(4))).toBe('leak-first');
    expect(nextStep(of(4, 3))).toBe('check-bulb-and-valve');
    expect(nextStep(of(16, 30))).toBe('find-restriction-recover-nothing');
  });
});

describe('what is not stated', () => {
  it.each(['mode', 'kind', 'stage', 'highSidePort', 'elevation'] as const)('%s is asked for, not assumed', (field) => {
    const request = valve(10, 12, { setup: { [field]: null } });
    const fields = { kind: 'setup', value: [field] };
    const { criteria, overall } = evaluate(request);
    for (const id of ['subcooling', 'superheat-window'] as const)
      expect(criteria.find(({ criterion }) => criterion === id)).toMatchObject({
        finding: 'not-judged',
        reason: { code: 'setup-not-stated', figures: { fields } },
      });
    expect(overall).toMatchObject({
      finding: 'not-judged',
      nextStep: { code: 'state-the-setup', figures: { fields } },
    });
    expect(cautionCodes(evaluate(request))).not.toContain('setup-assumed');
  });

  it('is named all together, an unknown stage too', () => {
    const request = valve(10, 12, { setup: { stage: 'unknown', kind: null, elevation: null } });
    expect(evaluate(request).overall.nextStep).toMatchObject({
      figures: { fields: { value: ['kind', 'stage', 'elevation'] } },
    });
  });

  it('does not hold up a stop', () => {
    const request = orifice(3, { setup: { stage: null } });
    expect(stopCodes(evaluate(request))).toEqual(['liquid-return']);
    expect(evaluate(request).overall.finding).toBe('stop');
  });

  it('is of no account where the system is unfit for the test', () => {
    expect(nextStep(valve(10, 12, { setup: { kind: 'mini-split', stage: null } }))).toBe('weigh-in');
  });
});

describe('limits', () => {
  const cold = { outdoorDryBulb: 50 } as const;
  const limited = { ...SUPERHEAT, leastOutdoor: degF(40), leastReturn: degF(65) };

  it('are the maker’s: where he states none there is none, and the conditions are not called fit', () => {
    expect(foundOf(orifice(20, { ...by(SUPERHEAT), readings: cold }), 'superheat')[0]).not.toBe('not-verifiable');
    expect(foundOf(orifice(18, by(SUPERHEAT)), 'conditions')).toEqual(['not-judged', 'makers-limits-missing']);
    expect(foundOf(orifice(18, by(limited)), 'conditions')).toEqual(['within', null]);
  });

  it('shut the test where he states them', () => {
    const hot = { ...SUPERHEAT, mostOutdoor: degF(80) };
    const warm = { ...SUPERHEAT, leastReturn: degF(80) };
    expect(foundOf(orifice(18, by(hot)), 'superheat')).toEqual(['not-verifiable', 'outdoor-too-hot']);
    expect(foundOf(orifice(18, by(warm)), 'superheat')).toEqual(['not-verifiable', 'return-too-cool']);
    const colder = { ...limited, leastOutdoor: degF(60) };
    expect(foundOf(orifice(18, { ...by(colder), readings: cold }), 'conditions')[1]).toBe('outdoor-too-cold');
  });

  it('of the maker end the hold of cool weather; without one nothing is moved in it', () => {
    const cool = { readings: { outdoorDryBulb: 62, liquidLineTemperature: 102 } };
    expect(nextStep(orifice(45, { ...by(SUPERHEAT), ...cool }))).toBe('cool-weather-hold');
    expect(nextStep(orifice(45, { ...by(limited), ...cool }))).toBe('leak-first');
  });

  it('of the running time hold as ever', () => {
    expect(nextStep(valve(10, 12, { visit: { runningMinutes: 5 } }))).toBe('run-longer');
    expect(nextStep(valve(10, 12, { visit: { runningMinutes: null } }))).toBe('record-conditions');
  });
});

describe('airflow', () => {
  const measured = (cfm: number, setup: Changes['setup'] = {}): EvaluationRequest =>
    valve(10, 12, { setup: { nominalCapacity: { value: 3, unit: 'ton' }, ...setup }, readings: { airflow: cfm } });
  const designAirflow = { value: 1200, unit: 'cfm' } as const;

  it('is held to the design, never to so much a ton', () => {
    expect(foundOf(measured(700), 'airflow')).toEqual(['not-judged', 'design-airflow-missing']);
    expect(evaluate(measured(700)).overall.finding).toBe('within');
    const low = measured(900, { designAirflow });
    expect(criterionOf(evaluate(low), 'airflow')).toMatchObject({
      finding: 'below',
      targetSource: 'design-airflow',
      tolerance: { source: 'general-rules' },
    });
    expect(foundOf(low, 'subcooling')).toEqual(['not-verifiable', 'airflow-too-low']);
    expect(nextStep(low)).toBe('raise-airflow');
    expect(nextStep(measured(1150, { designAirflow }))).toBe('record');
  });

  it('is not judged by the split of the published table, which still serves the search for a cause', () => {
    const above = (superheatF: number) => orifice(superheatF, { ...by(SUPERHEAT), readings: { supplyDryBulb: 50 } });
    const split = criterionOf(evaluate(above(18)), 'temperature-split');
    expect([split.finding, split.reason?.code, split.target]).toEqual(['not-judged', 'split-not-by-these-rules', null]);
    expect(split.actual).not.toBeNull();
    expect(evaluate(above(18)).overall.nextStep.code).toBe('record');
    expect(nextStep(above(3))).toBe('reread-wet-bulb-then-airflow');
    const causes = diagnoseCheck(inputOf(above(28)), evaluate(above(28))).causes.flatMap(({ fits, doesNotFit }) =>
      [...fits, ...doesNotFit].map(({ code }) => code),
    );
    expect(causes.some((code) => code.startsWith('split'))).toBe(true);
    const unread = orifice(18, { ...by(SUPERHEAT), readings: { supplyDryBulb: null } });
    expect(foundOf(unread, 'temperature-split')).toEqual(['not-judged', 'readings-missing']);
  });
});

describe('other systems', () => {
  it('in heating are judged by the maker’s heating table, whose port need not be stated', () => {
    const heating = valve(10, 12, {
      setup: { mode: 'heating', makersChart: HEATING, highSidePort: null },
      readings: { outdoorDryBulb: 47, returnDryBulb: 70, dischargePressure: 330 },
    });
    expect(criterionOf(evaluate(heating), HEATING.kind)).toMatchObject({
      finding: 'within',
      tolerance: { source: 'general-rules' },
    });
    const without = valve(10, 12, { setup: { mode: 'heating' } });
    expect([evaluate(without).overall.finding, nextStep(without)]).toEqual([
      'not-verifiable',
      'cooling-season-or-weigh-in',
    ]);
  });

  it.each(['mini-split', 'multi-split'] as const)('%s: weigh in, whatever the nameplate says', (kind) => {
    const { overall } = evaluate(valve(10, 12, { setup: { kind } }));
    expect([overall.finding, overall.nextStep.code]).toEqual(['not-verifiable', 'weigh-in']);
  });
});

describe('its figures', () => {
  it('decide with the guard of the general rules, and mark what is theirs', () => {
    expect(MANUFACTURER.decision).toEqual(GENERAL_RULES.decision);
    expect(MANUFACTURER.superheat.toleranceK).toEqual({
      ...GENERAL_RULES.superheat.toleranceK,
      takenFrom: 'general-rules',
    });
    expect(MANUFACTURER.subcooling.toleranceK.takenFrom).toBe('general-rules');
    expect(Object.values(MANUFACTURER.makersMethods!).map(({ takenFrom }) => takenFrom as unknown)).toEqual(
      Array(4).fill('general-rules'),
    );
  });

  it('hold no chart, no window, no limit of weather and no airflow by size', () => {
    const { superheat, superheatWindow, conditions, airflow } = MANUFACTURER;
    expect([superheat.chart, conditions.leastOutdoorK, conditions.leastReturnK, airflow.leastM3PerSPerW]).toEqual(
      Array(4).fill(null),
    );
    expect([superheatWindow.makersRange, airflow.splitCounts]).toEqual(['only', false]);
    expect(evaluate(orificeRequest({ procedure: 'manufacturer' })).procedure).toEqual({
      id: 'manufacturer',
      version: 1,
    });
  });
});
