/** Airflow before charge, per edition: every cell of the table, and its limits. */
import { describe, expect, it } from 'vitest';
import type { ReasonCode } from '../codes';
import type { ProcedureId } from '../procedure-ids';
import type { EvaluationRequest } from '../request';
import { provedFor2019 } from '../testing/exact-systems';
import type { Changes, ReadingChanges } from '../testing/healthy-systems';
import { cautionCodes, criterionOf, evaluate, valveRequest } from '../testing/healthy-systems';

const threeTons = { nominalCapacity: { value: 3, unit: 'ton' } } as const;

const of2008 = (changes: Changes, procedure: ProcedureId = 'cec-ra3.2-2008-installer'): EvaluationRequest =>
  valveRequest({ procedure, ...changes, setup: { ...threeTons, ...changes.setup } });
const of2019 = (changes: Changes): EvaluationRequest =>
  valveRequest(provedFor2019('cec-ra3.2-2019-installer', changes));

/** Target split 16.9 °F at 76 °F and 66 °F wet bulb. */
const split = (deltaF: number) => ({ supplyDryBulb: 76 - deltaF }) as const;
const NO_SPLIT = { supplyDryBulb: null } as const;

const gateOf = (request: EvaluationRequest): ReasonCode | null => {
  const result = evaluate(request);
  const { finding, reason } = criterionOf(result, 'subcooling');
  expect(finding).toBe(reason === null ? 'within' : 'not-verifiable');
  expect(result.overall.finding).toBe(reason === null ? 'within' : 'not-verifiable');
  return reason?.code ?? null;
};

describe('2008: split or measured airflow', () => {
  it.each<[string, ReadingChanges, ReasonCode | null]>([
    ['nothing', NO_SPLIT, 'airflow-not-proven'],
    ['split within', split(16.9), null],
    ['split at its upper limit', split(19.9), null],
    ['split just above', split(19.91), 'split-above'],
    ['split below', split(10), null],
    ['measured above 300 cfm/ton', { ...NO_SPLIT, airflow: 901 }, null],
    ['measured at 300 cfm/ton, which is not over it', { ...NO_SPLIT, airflow: 900 }, 'airflow-too-low'],
    ['measured below', { ...NO_SPLIT, airflow: 850 }, 'airflow-too-low'],
    ['measured enough, split above: either suffices', { ...split(24), airflow: 1000 }, null],
    ['measured low, split within: either suffices', { ...split(16.9), airflow: 800 }, null],
    ['measured low, split below: either suffices', { ...split(10), airflow: 800 }, null],
    ['both fail', { ...split(24), airflow: 800 }, 'airflow-too-low'],
  ])('%s', (_, readings, reason) => {
    expect(gateOf(of2008({ readings }))).toBe(reason);
  });

  it('the rater’s split reaches a degree further', () => {
    expect(gateOf(of2008({ readings: split(20.9) }, 'cec-ra3.2-2008-rater'))).toBeNull();
    expect(gateOf(of2008({ readings: split(20.91) }, 'cec-ra3.2-2008-rater'))).toBe('split-above');
  });

  it.each([
    ['alteration', { alteration: true }],
    ['small-duct high-velocity system', { highVelocity: true }],
    ['a duct table', { airflowPath: 'duct-table' }],
    ['the best that can be done', { airflowPath: 'best-possible', alteration: true }],
    ['a design of 900 cfm', { designAirflow: { value: 900, unit: 'cfm' } }],
  ] as const)('knows no allowance for: %s', (_, setup) => {
    expect(gateOf(of2008({ setup, readings: { ...NO_SPLIT, airflow: 899 } }))).toBe('airflow-too-low');
    expect(gateOf(of2008({ setup, readings: NO_SPLIT }))).toBe('airflow-not-proven');
  });

  it('a split below asks for a second measurement, one above is the gate itself', () => {
    expect(cautionCodes(evaluate(of2008({ readings: split(10) })))).toContain('split-below');
    const above = cautionCodes(evaluate(of2008({ readings: split(24) })));
    expect(above).not.toContain('split-above');
    expect(cautionCodes(evaluate(of2008({ readings: split(16.9) }))).join()).not.toMatch(/split/);
  });

  it('a split whose limit lies inside its uncertainty carries a caution', () => {
    expect(cautionCodes(evaluate(of2008({ readings: split(19.5) })))).toContain('near-limit');
    expect(cautionCodes(evaluate(of2008({ readings: split(16.9) })))).not.toContain('near-limit');
  });

  it('the airflow is required where it is the proof or nothing is', () => {
    const requiredOf = (readings: ReadingChanges) =>
      evaluate(of2008({ readings })).criteria.find(({ criterion }) => criterion === 'airflow')?.required;
    expect(requiredOf({ ...NO_SPLIT, airflow: 1000 })).toBe(true);
    expect(requiredOf({ ...split(16.9), airflow: 800 })).toBe(false);
    expect(requiredOf(NO_SPLIT)).toBe(true);
    expect(requiredOf(split(16.9))).toBeUndefined();
  });
});

describe('2019: measured airflow', () => {
  const unmeasured = { airflow: null } as const;

  it.each<[string, Changes, ReasonCode | null]>([
    ['nothing', { readings: { ...unmeasured, ...NO_SPLIT } }, 'airflow-not-proven'],
    ['split within is no evidence', { readings: { ...unmeasured, ...split(16.9) } }, 'airflow-not-proven'],
    ['split above is no gate', { readings: { ...split(24) } }, null],
    ['split below is no gate', { readings: { ...split(10) } }, null],
    ['350 cfm/ton', { readings: { airflow: 1050 } }, null],
    ['below 350 cfm/ton', { readings: { airflow: 1049.9 } }, 'airflow-too-low'],
    ['below, split within: the split does not help', { readings: { airflow: 900 } }, 'airflow-too-low'],
    ['alteration at 300 cfm/ton', { setup: { alteration: true }, readings: { airflow: 900 } }, null],
    ['alteration below', { setup: { alteration: true }, readings: { airflow: 899.9 } }, 'airflow-too-low'],
    ['high velocity at 250 cfm/ton', { setup: { highVelocity: true }, readings: { airflow: 750 } }, null],
    ['high velocity below', { setup: { highVelocity: true }, readings: { airflow: 749.9 } }, 'airflow-too-low'],
    [
      'both at once: the lower limit',
      { setup: { highVelocity: true, alteration: true }, readings: { airflow: 750 } },
      null,
    ],
    [
      'a design does not count',
      { setup: { designAirflow: { value: 900, unit: 'cfm' } }, readings: { airflow: 900 } },
      'airflow-too-low',
    ],
    ['no capacity to hold it against', { setup: { nominalCapacity: null } }, 'airflow-not-proven'],
    ['the duct table in place of a measurement', { setup: { airflowPath: 'duct-table' }, readings: unmeasured }, null],
    [
      'the duct table does not outweigh a low measurement',
      { setup: { airflowPath: 'duct-table' }, readings: { airflow: 900 } },
      'airflow-too-low',
    ],
    [
      'the best that can be done, in an alteration',
      { setup: { airflowPath: 'best-possible', alteration: true }, readings: { airflow: 700 } },
      null,
    ],
    [
      'the best that can be done, unmeasured',
      { setup: { airflowPath: 'best-possible', alteration: true }, readings: unmeasured },
      null,
    ],
    [
      'the best that can be done, in a new system',
      { setup: { airflowPath: 'best-possible' }, readings: { airflow: 900 } },
      'airflow-too-low',
    ],
  ])('%s', (_, changes, reason) => {
    expect(gateOf(of2019(changes))).toBe(reason);
  });

  it.each([
    [24, 'split-above'],
    [10, 'split-below'],
  ])('a split of %d °F is a caution', (deltaF, caution) => {
    expect(cautionCodes(evaluate(of2019({ readings: split(deltaF) })))).toContain(caution);
    expect(cautionCodes(evaluate(of2019({ readings: split(16.9) })))).not.toContain(caution);
  });

  it('is required, and unproved says so itself', () => {
    expect(criterionOf(evaluate(of2019({})), 'airflow')).toMatchObject({ required: true, finding: 'within' });
    expect(criterionOf(evaluate(of2019({ readings: unmeasured })), 'airflow')).toMatchObject({
      required: true,
      finding: 'not-judged',
      reason: { code: 'airflow-not-proven' },
    });
    const path = of2019({ setup: { airflowPath: 'duct-table' }, readings: unmeasured });
    expect(evaluate(path).criteria.map(({ criterion }) => criterion)).not.toContain('airflow');
    const best = of2019({ setup: { airflowPath: 'best-possible', alteration: true }, readings: { airflow: 700 } });
    expect(criterionOf(evaluate(best), 'airflow')).toMatchObject({ required: false, finding: 'below' });
  });

  it('unproved is said once: by the gate, not by a caution as well', () => {
    const cautions = cautionCodes(evaluate(of2019({ readings: { ...unmeasured, ...NO_SPLIT } })));
    expect(cautions).not.toContain('airflow-not-proven');
  });

  it('too old a measurement is taken again, the gate says why', () => {
    const airflow = { value: 1100, unit: 'cfm', ageSeconds: 601 } as const;
    const { criteria, overall } = evaluate(of2019({ readings: { airflow } }));
    expect(criteria.find(({ criterion }) => criterion === 'airflow')?.reason?.code).toBe('stale');
    expect(overall.nextStep).toMatchObject({
      code: 'take-readings-again',
      figures: { readings: { value: ['airflow'] } },
    });
  });
});

it('general rules give no caution about a split and list no airflow that was not measured', () => {
  for (const deltaF of [10, 24]) {
    expect(cautionCodes(evaluate(valveRequest({ readings: split(deltaF) }))).join()).not.toMatch(/split/);
  }
  const setup = { airflowPath: 'duct-table', alteration: true } as const;
  const result = evaluate(valveRequest({ setup, readings: NO_SPLIT }));
  expect(cautionCodes(result)).toContain('airflow-not-proven');
  expect(result.criteria.map(({ criterion }) => criterion)).not.toContain('airflow');
});
