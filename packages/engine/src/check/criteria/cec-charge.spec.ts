/** What the California procedures make of superheat, subcooling, conditions and instruments. */
import { describe, expect, it } from 'vitest';
import { differenceFromK } from '../../units';
import type { CriterionId, Finding, ReasonCode } from '../codes';
import type { EvaluationRequest } from '../request';
import { exactOrifice, exactValve, provedFor2019 } from '../testing/exact-systems';
import type { Changes } from '../testing/healthy-systems';
import { cautionCodes, criterionOf, evaluate, withPlusMinus } from '../testing/healthy-systems';

type Role = 'installer' | 'rater';

const of2008 = (role: Role, changes: Changes = {}): Changes => ({ procedure: `cec-ra3.2-2008-${role}`, ...changes });
const of2019 = (role: Role, changes: Changes = {}): Changes => provedFor2019(`cec-ra3.2-2019-${role}`, changes);
const EDITIONS = { 2008: of2008, 2019: of2019 } as const;

const judged = (request: EvaluationRequest, id: CriterionId): readonly [Finding, ReasonCode | null] => {
  const { finding, reason } = criterionOf(evaluate(request), id);
  return [finding, reason?.code ?? null];
};

/** The finer table has 15.5 °F at 85 °F outdoors and 66 °F wet bulb. */
const TARGET_F = 15.5;

describe.each([
  [2008, 'installer', 5],
  [2008, 'rater', 6],
  [2019, 'installer', 5],
  [2019, 'rater', 8],
] as const)('superheat by the rules of %d, %s: ±%d °F', (edition, role, toleranceF) => {
  const request = (superheatF: number, changes: Changes = {}) =>
    exactOrifice(superheatF, EDITIONS[edition](role, changes));

  it('has its target from the finer table', () => {
    const { target, targetSource, required } = criterionOf(evaluate(request(TARGET_F)), 'superheat');
    expect(differenceFromK(target!.value, 'deltaF')).toBeCloseTo(TARGET_F, 9);
    expect([targetSource, required]).toEqual(['finer-table', true]);
  });

  it.each([
    [toleranceF, 'within'],
    [toleranceF + 0.0001, 'above'],
    [-toleranceF, 'within'],
    [-toleranceF - 0.0001, 'below'],
  ] as const)('%d °F off target is %s, whatever the instruments', (offF, finding) => {
    for (const half of [0.01, 1, 5]) {
      const asked = withPlusMinus(request(TARGET_F + offF), { temperatureF: half, pressurePsi: half });
      const found = criterionOf(evaluate(asked), 'superheat');
      expect([found.finding, found.onlyJust], `±${half}`).toEqual([finding, true]);
    }
  });

  it('well inside or outside is more than only just', () => {
    for (const offF of [0, toleranceF + 6, -toleranceF - 4]) {
      const asked = withPlusMinus(request(TARGET_F + offF), { temperatureF: 0.5, pressurePsi: 0.5 });
      expect(criterionOf(evaluate(asked), 'superheat').onlyJust, String(offF)).toBe(false);
    }
  });

  it('has no floor under its tolerance; the stop for liquid stands beside it', () => {
    const readings = { outdoorDryBulb: 95, returnWetBulb: 65, suctionPressure: null, suctionLineTemperature: null };
    const tolerance = criterionOf(evaluate(request(8, { readings })), 'superheat').tolerance;
    expect(differenceFromK(tolerance!.low!, 'deltaF')).toBeCloseTo(-toleranceF, 9);
    expect(tolerance!.floored).toBe(false);
  });

  it.each([
    ['a dash', { outdoorDryBulb: 100, returnWetBulb: 64 }],
    ['drier than the table', { returnWetBulb: 49 }],
  ])('has no target at %s', (_, readings) => {
    const setup = { nominalCapacity: { value: 3, unit: 'ton' } } as const;
    const measured = { setup, readings: { airflow: 1100, ...readings } };
    expect(judged(request(12, measured), 'superheat')).toEqual(['not-verifiable', 'no-target-here']);
  });
});

describe('an entered target superheat', () => {
  const setup = { targetSuperheat: { value: 9, unit: 'deltaF' } } as const;

  it('is taken in 2019, not in 2008', () => {
    const source = (changes: Changes) => criterionOf(evaluate(exactOrifice(12, changes)), 'superheat').targetSource;
    expect(source(of2019('installer', { setup }))).toBe('entered');
    expect(source(of2008('installer', { setup }))).toBe('finer-table');
  });
});

describe.each([
  [2008, 'installer', 3],
  [2008, 'rater', 4],
  [2019, 'installer', 3],
  [2019, 'rater', 6],
] as const)('subcooling by the rules of %d, %s: ±%d °F', (edition, role, toleranceF) => {
  it.each([
    [toleranceF, 'within'],
    [toleranceF + 0.0001, 'above'],
    [-toleranceF, 'within'],
    [-toleranceF - 0.0001, 'below'],
  ] as const)('%d °F off a nameplate of 10 is %s', (offF, finding) => {
    expect(judged(exactValve(10 + offF, 12, EDITIONS[edition](role)), 'subcooling')).toEqual([finding, null]);
  });
});

describe('the measured subcooling itself', () => {
  const setup = { targetSubcooling: { value: 6, unit: 'deltaF' } } as const;
  const at = (subcoolingF: number, changes: Changes) => judged(exactValve(subcoolingF, 12, changes), 'subcooling')[0];

  it('must reach 2 °F for the rater of 2019, though the target would allow less', () => {
    expect(at(2, of2019('rater', { setup }))).toBe('within');
    expect(at(1.9999, of2019('rater', { setup }))).toBe('below');
    const { tolerance } = criterionOf(evaluate(exactValve(6, 12, of2019('rater', { setup }))), 'subcooling');
    expect(differenceFromK(tolerance!.low!, 'deltaF')).toBeCloseTo(-4, 9);
    expect(tolerance!.floored).toBe(true);
  });

  it('need not for the others', () => {
    const low = { targetSubcooling: { value: 4.5, unit: 'deltaF' } } as const;
    for (const changes of [of2019('installer', { setup: low }), of2008('installer', { setup: low })]) {
      expect(at(1.6, changes)).toBe('within');
    }
    expect(at(1.6, of2008('rater', { setup: low }))).toBe('within');
  });
});

describe('the superheat window of a valve', () => {
  const windowOf = (superheatF: number, changes: Changes) =>
    judged(exactValve(10, superheatF, changes), 'superheat-window')[0];

  it.each([
    [2008, 'installer', 4, 25],
    [2008, 'rater', 3, 26],
    [2019, 'installer', 4, 25],
    [2019, 'rater', 3, 26],
  ] as const)('%d %s: %d to %d °F, ends included', (edition, role, low, high) => {
    const changes = EDITIONS[edition](role);
    expect([low, high].map((end) => windowOf(end, changes))).toEqual(['within', 'within']);
    expect([low - 0.0001, high + 0.0001].map((end) => windowOf(end, changes))).toEqual(['below', 'above']);
  });

  it('of 2019 is held together with the maker’s range: the narrower end counts', () => {
    const setup = { superheatRange: { low: 2, high: 14, unit: 'deltaF' } } as const;
    const changes = of2019('installer', { setup });
    expect([3.9, 4, 14, 14.1].map((each) => windowOf(each, changes))).toEqual(['below', 'within', 'within', 'above']);
    const { targetSource } = criterionOf(evaluate(exactValve(10, 12, changes)), 'superheat-window');
    expect(targetSource).toBe('window-and-range');
  });

  it('of 2008 gives way to the maker’s range', () => {
    const setup = { superheatRange: { low: 2, high: 14, unit: 'deltaF' } } as const;
    const changes = of2008('installer', { setup });
    expect([1.9, 2, 14, 14.1].map((each) => windowOf(each, changes))).toEqual(['below', 'within', 'within', 'above']);
  });

  it('that contradicts the maker’s range lets nothing pass', () => {
    const setup = { superheatRange: { low: 26, high: 30, unit: 'deltaF' } } as const;
    for (const superheatF of [12, 25.5, 28]) {
      expect(windowOf(superheatF, of2019('installer', { setup }))).not.toBe('within');
    }
  });
});

describe.each([2008, 2019] as const)('conditions by the rules of %d', (edition) => {
  const request = (visit: Changes['visit'], readings: Changes['readings'] = {}) =>
    exactValve(10, 12, EDITIONS[edition]('installer', { visit: visit ?? {}, readings }));
  const ready = { preflight: { panelsOn: 'ok', accessHole: 'ok' } } as const;

  it.each([
    ['running time', { ...ready, runningMinutes: null }],
    ['lowest return air', { ...ready, lowestReturnDryBulb: null }],
    ['pre-flight', { preflight: null }],
  ])('the %s unrecorded shuts the test', (_, visit) => {
    expect(judged(request(visit), 'subcooling')).toEqual(['not-verifiable', 'conditions-not-recorded']);
    expect(criterionOf(evaluate(request(visit)), 'conditions')).toMatchObject({
      required: true,
      finding: 'not-judged',
      reason: { code: 'conditions-not-recorded' },
    });
    expect(evaluate(request(visit)).overall.finding).toBe('not-verifiable');
  });

  it('the outdoor air unread shuts it too, though a valve does not need it', () => {
    expect(judged(request(ready, { outdoorDryBulb: null }), 'subcooling')[1]).toBe('conditions-not-recorded');
  });

  it('recorded and met they are within, and required', () => {
    expect(criterionOf(evaluate(request(ready)), 'conditions')).toMatchObject({ required: true, finding: 'within' });
    expect(evaluate(request(ready)).overall.finding).toBe('within');
  });
});

describe('by the rules of 2019', () => {
  const preflight = (accessHole?: 'ok' | 'not-ok' | 'not-checked') =>
    of2019('installer', { visit: { preflight: { panelsOn: 'ok', ...(accessHole && { accessHole }) } } });

  it.each([
    ['ok', null, 'within'],
    ['not-ok', 'access-hole-missing', 'not-verifiable'],
    ['not-checked', 'access-hole-missing', 'not-judged'],
    [undefined, 'access-hole-missing', 'not-judged'],
  ] as const)('the access hole %s: %s', (state, reason, conditions) => {
    const result = evaluate(exactValve(10, 12, preflight(state)));
    expect(criterionOf(result, 'subcooling').reason?.code ?? null).toBe(reason);
    expect(criterionOf(result, 'conditions').finding).toBe(conditions);
    expect(result.overall.finding).toBe(reason === null ? 'within' : 'not-verifiable');
  });

  it.each([
    [31, null, 'within'],
    [31.01, 'instruments-old', 'not-verifiable'],
    [null, 'instruments-not-recorded', 'not-judged'],
  ] as const)('instruments checked %s days ago: %s', (instrumentsCheckedDaysAgo, reason, finding) => {
    const visit = { instrumentsCheckedDaysAgo, preflight: { accessHole: 'ok' } } as const;
    const result = evaluate(exactValve(10, 12, of2019('rater', { visit })));
    expect(criterionOf(result, 'subcooling').reason?.code ?? null).toBe(reason);
    expect(criterionOf(result, 'instruments')).toMatchObject({ required: true, finding });
    expect(result.overall.finding).toBe(reason === null ? 'within' : 'not-verifiable');
  });

  it('in 2008 old instruments are a caution', () => {
    const request = exactValve(10, 12, of2008('installer', { visit: { instrumentsCheckedDaysAgo: 32 } }));
    expect(evaluate(request).overall.finding).toBe('within');
    expect(cautionCodes(evaluate(request))).toContain('instruments-old');
    expect(criterionOf(evaluate(request), 'instruments').required).toBe(false);
  });

  const setup = { targetSuperheat: { value: 15, unit: 'deltaF' }, nominalCapacity: { value: 3, unit: 'ton' } } as const;
  const hot = {
    returnDryBulb: 84,
    returnWetBulb: 74,
    liquidPressure: null,
    liquidLineTemperature: null,
    airflow: 1300,
  } as const;

  it('superheat is not tested above 115 °F outdoors', () => {
    const at = (outdoorDryBulb: number, changes: (role: Role, more: Changes) => Changes = of2019) =>
      judged(exactOrifice(15, changes('installer', { setup, readings: { ...hot, outdoorDryBulb } })), 'superheat');
    expect(at(115)).toEqual(['within', null]);
    expect(at(115.01)).toEqual(['not-verifiable', 'outdoor-too-hot']);
    // the limit is of the edition; the table of 2008 ends there by itself
    expect(at(115.01, of2008)).toEqual(['not-verifiable', 'no-target-here']);
  });

  it('near 115 °F there is a caution, on either side', () => {
    for (const outdoorDryBulb of [114.5, 115.5]) {
      const result = evaluate(exactOrifice(15, of2019('installer', { setup, readings: { ...hot, outdoorDryBulb } })));
      expect(cautionCodes(result)).toContain('near-limit');
    }
    const readings = { ...hot, outdoorDryBulb: 114.5 };
    expect(cautionCodes(evaluate(exactValve(10, 12, of2019('installer', { readings }))))).not.toContain('near-limit');
  });

  it('subcooling has no upper limit of the outdoor air', () => {
    const readings = { outdoorDryBulb: 118, liquidPressure: 480, liquidLineTemperature: 120 } as const;
    const { reason } = criterionOf(evaluate(exactValve(10, 12, of2019('installer', { readings }))), 'subcooling');
    expect(reason).toBeNull();
  });
});

describe('packaged units', () => {
  it('are in the scope of 2019, not of 2008', () => {
    const setup = { kind: 'packaged' } as const;
    expect(judged(exactValve(10, 12, of2008('rater', { setup })), 'subcooling')).toEqual([
      'not-verifiable',
      'not-in-scope',
    ]);
    expect(judged(exactValve(10, 12, of2019('rater', { setup })), 'subcooling')).toEqual(['within', null]);
  });
});

it('a probability that no target exists takes the finding here too', () => {
  const readings = { outdoorDryBulb: 95, returnWetBulb: 64 } as const;
  const beside = exactOrifice(8, of2008('installer', { readings }));
  expect(judged(beside, 'superheat')).toEqual(['not-verifiable', 'target-may-not-exist']);
  const exact = withPlusMinus(beside, { temperatureF: 0.001, pressurePsi: 0.001 });
  expect(judged(exact, 'superheat')[1]).toBe('target-may-not-exist');
  const inside = exactOrifice(8, of2008('installer', { readings: { ...readings, returnWetBulb: 67 } }));
  expect(judged(inside, 'superheat')).toEqual(['within', null]);
});

it('a finding taken by a gate is not called only just, and keeps its line by the rule', () => {
  const visit = { runningMinutes: 5 } as const;
  const shut = criterionOf(evaluate(exactOrifice(TARGET_F + 5, of2008('installer', { visit }))), 'superheat');
  expect(shut).toMatchObject({ finding: 'not-verifiable', byRule: 'passes', onlyJust: false });
  expect(shut.probabilityWithin).toBeGreaterThan(0.3);
});
