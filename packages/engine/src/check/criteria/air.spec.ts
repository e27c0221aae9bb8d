import { describe, expect, it } from 'vitest';
import { differenceToK } from '../../units';
import type { Finding, NextStepCode, ReasonCode } from '../codes';
import { deriveQuantities } from '../derived-quantities';
import type { EvaluationRequest } from '../request';
import type { Changes } from '../testing/healthy-systems';
import { criterionOf, evaluate, inputOf, orificeRequest, valveRequest } from '../testing/healthy-systems';
import type { AirflowEvidence } from '../procedure';
import { GENERAL_RULES } from '../procedures/general-rules';
import { airflowEvidence, airflowGate, judgeAirflow, judgeSplit, splitEvidence, splitTarget } from './air';

function evidenceOf(request: EvaluationRequest): AirflowEvidence {
  const input = inputOf(request);
  const derived = deriveQuantities(input.setup, input.readings);
  const target = splitTarget(input, derived);
  const split = judgeSplit(input, derived, target, null);
  return airflowEvidence(input, {
    airflow: judgeAirflow(input),
    split: splitEvidence(input, derived, { split, target }),
  });
}

/** Target 16.9 °F at 76 °F and 66 °F wet bulb. */
const split = (deltaF: number, changes: Changes = {}): Changes => ({
  ...changes,
  readings: { ...changes.readings, supplyDryBulb: 76 - deltaF },
});
const threeTons = { nominalCapacity: { value: 3, unit: 'ton' } } as const;
const design = { designAirflow: { value: 1200, unit: 'cfm' } } as const;
const measured = (airflow: number, setup: Changes['setup'] = threeTons): Changes => ({ setup, readings: { airflow } });

describe('the airflow table', () => {
  it.each<[string, Changes, AirflowEvidence, ReasonCode | null]>([
    ['measured below 350 cfm/ton', measured(1049.9), 'measured-low', 'airflow-too-low'],
    ['measured at 350 cfm/ton', measured(1050), 'measured-enough', null],
    ['measured below the design less 15 %', measured(1019.9, design), 'measured-low', 'airflow-too-low'],
    ['measured at the design less 15 %', measured(1020, design), 'measured-enough', null],
    ['the design outranks the tons', measured(1030, { ...threeTons, ...design }), 'measured-enough', null],
    ['split above its band', split(24), 'split-above', 'split-above'],
    ['split within', split(16.9), 'split-within', null],
    ['split too close to its lower limit', split(14), 'split-too-close', null],
    ['split too close to its upper limit, inside', split(19.5), 'split-too-close', null],
    ['split too close to its upper limit, outside', split(20.3), 'split-above', 'split-above'],
    ['split below', split(10), 'split-below', null],
    ['nothing: no supply air', { readings: { supplyDryBulb: null } }, 'nothing', null],
    ['nothing: no wet bulb', { readings: { returnWetBulb: null } }, 'nothing', null],
    [
      'nothing: a dash of the table',
      { readings: { returnDryBulb: 82, returnWetBulb: 55, supplyDryBulb: 50 } },
      'nothing',
      null,
    ],
    ['nothing: too short a run', split(24, { visit: { runningMinutes: 5 } }), 'nothing', null],
    ['nothing: measured without tons or design', { readings: { airflow: 900, supplyDryBulb: null } }, 'nothing', null],
    ['a measured airflow outranks a split above', split(24, measured(1100)), 'measured-enough', null],
    ['a measured airflow outranks a split within', split(16.9, measured(900)), 'measured-low', 'airflow-too-low'],
    ['without tons the split speaks', split(24, { readings: { airflow: 1100 } }), 'split-above', 'split-above'],
  ])('%s', (_, changes, evidence, reason) => {
    const request = valveRequest(changes);
    expect(evidenceOf(request)).toBe(evidence);
    expect(airflowGate(GENERAL_RULES, evidence)?.code ?? null).toBe(reason);
    const { finding, reason: found } = criterionOf(evaluate(request), 'subcooling');
    if (reason !== null) expect([finding, found?.code]).toEqual(['not-verifiable', reason]);
    else expect(found?.code ?? '').not.toMatch(/airflow|split/);
  });

  it.each<[string, EvaluationRequest]>([
    ['airflow', valveRequest(measured(900))],
    ['split', valveRequest(split(24))],
  ])('a reading too old does not gate: %s', (id, request) => {
    const reading = id === 'airflow' ? 'airflow' : 'supplyDryBulb';
    const old = { ...request.readings[reading]!, ageSeconds: 601 };
    const stale = { ...request, readings: { ...request.readings, [reading]: old } };
    expect(evidenceOf(request)).not.toBe(evidenceOf(stale));
    expect(airflowGate(GENERAL_RULES, evidenceOf(stale))).toBeNull();
  });
});

describe('a gate', () => {
  it('leaves the by-rule line and the probability, and takes the finding', () => {
    const open = criterionOf(evaluate(valveRequest()), 'subcooling');
    const shut = criterionOf(evaluate(valveRequest(split(24))), 'subcooling');
    expect({
      ...shut,
      finding: open.finding,
      reason: open.reason,
      actual: null,
      target: null,
      deviation: null,
    }).toEqual({
      ...open,
      actual: null,
      target: null,
      deviation: null,
    });
    expect(shut.byRule).toBe('passes');
    expect(shut.probabilityWithin).toBeGreaterThan(0.99);
  });

  it('is not opened by a poorer instrument: near a dash, past the table’s edge, with a useless thermometer', () => {
    // 78 °F and 53 °F wet bulb print 24.7, the cell beside it is a dash
    for (const half of [0.1, 1, 3, 10, 30, 100]) {
      const returnWetBulb = { value: 53, unit: 'degF', plusMinus: { value: half, unit: 'deltaF' } } as const;
      const request = valveRequest({ readings: { returnDryBulb: 78, returnWetBulb, supplyDryBulb: 49 } });
      expect(evidenceOf(request), `±${half}`).toBe('split-above');
      expect(evaluate(request).overall.finding, `±${half}`).not.toBe('within');
    }
  });

  it('is not opened by a poor humidity either', () => {
    for (const half of [3, 20, 200]) {
      const returnRelativeHumidity = { value: 50, unit: '%', plusMinus: { value: half, unit: '%' } } as const;
      const request = valveRequest({ readings: { returnWetBulb: null, returnRelativeHumidity, supplyDryBulb: 50 } });
      expect(evidenceOf(request), `±${half} %`).toBe('split-above');
    }
  });
});

describe('the split criterion', () => {
  it.each<[string, Changes, Finding, ReasonCode | null]>([
    ['within', split(16.9), 'within', null],
    ['above', split(24), 'above', null],
    ['below', split(10), 'below', null],
    ['too close', split(19.9), 'too-close-to-call', null],
    ['no supply air', { readings: { supplyDryBulb: null } }, 'not-judged', 'readings-missing'],
    [
      'a dash',
      { readings: { returnDryBulb: 82, returnWetBulb: 55, supplyDryBulb: 60 } },
      'not-verifiable',
      'no-target-here',
    ],
    ['beyond the table', { readings: { returnDryBulb: 85, supplyDryBulb: 65 } }, 'not-verifiable', 'no-target-here'],
    [
      'beside a dash',
      { readings: { returnDryBulb: 79, returnWetBulb: 55, supplyDryBulb: 54 } },
      'not-verifiable',
      'target-may-not-exist',
    ],
    ['a short run', { visit: { runningMinutes: 3 } }, 'not-verifiable', 'running-time'],
  ])('%s', (_, changes, finding, reason) => {
    const criterion = criterionOf(evaluate(valveRequest(changes)), 'temperature-split');
    expect([criterion.finding, criterion.reason?.code ?? null]).toEqual([finding, reason]);
    expect(criterion.required).toBe(false);
  });

  it('has ± 3 °F to either side, and its target from the table', () => {
    const criterion = criterionOf(evaluate(valveRequest()), 'temperature-split');
    expect(criterion.targetSource).toBe('split-table');
    expect(criterion.target!.value * 1.8).toBeCloseTo(16.9, 9);
    expect(criterion.tolerance).toEqual({
      low: differenceToK(-3, 'deltaF'),
      high: differenceToK(3, 'deltaF'),
      floored: false,
      source: 'procedure',
    });
    for (const [deltaF, byRule] of [
      [19.9, 'passes'],
      [19.9001, 'fails'],
      [13.9, 'passes'],
      [13.8999, 'fails'],
    ] as const) {
      expect(criterionOf(evaluate(valveRequest(split(deltaF))), 'temperature-split').byRule, String(deltaF)).toBe(
        byRule,
      );
    }
  });
});

describe('the airflow criterion', () => {
  it('is there only where airflow was measured, and needs tons or a design', () => {
    expect(evaluate(valveRequest()).criteria.map(({ criterion }) => criterion)).not.toContain('airflow');
    expect(criterionOf(evaluate(valveRequest({ readings: { airflow: 1200 } })), 'airflow')).toMatchObject({
      finding: 'not-judged',
      reason: { code: 'capacity-missing' },
      required: false,
    });
  });

  it.each<[number, Finding]>([
    [1200, 'within'],
    [1060, 'too-close-to-call'],
    [1040, 'too-close-to-call'],
    [950, 'below'],
    [3000, 'within'],
  ])('%d cfm for three tons is %s', (airflow, finding) => {
    const criterion = criterionOf(evaluate(valveRequest(measured(airflow))), 'airflow');
    expect(criterion.finding).toBe(finding);
    expect(criterion.targetSource).toBe('airflow-per-capacity');
    expect(criterion.tolerance).toEqual({ low: 0, high: null, floored: false, source: 'procedure' });
  });
});

it('split above together with superheat above on a fixed orifice points to the probes', () => {
  const step = (changes: Changes): NextStepCode => evaluate(orificeRequest(changes)).overall.nextStep.code;
  expect(step(split(24, { readings: { suctionLineTemperature: 65 } }))).toBe('suspect-probes');
  expect(step(split(24))).toBe('reread-wet-bulb-then-airflow');
});
