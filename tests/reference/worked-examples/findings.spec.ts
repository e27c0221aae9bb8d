/** Every worked example comes out as its key says, and its key says what the published rules say of the figures worked on paper. */
import type { CheckResult, Diagnosis, EvaluationRequest } from '@chargewright/engine';
import { differenceFromK } from '@chargewright/engine';
import {
  workCheck,
  WORKED_EXAMPLES,
  type CheckExample,
  type CheckKey,
  type WorkedFigureId,
} from '@chargewright/engine/training';
import { describe, expect, it } from 'vitest';
import { onPaper, requestOf } from './paper';

const CHECKS = WORKED_EXAMPLES.filter((example): example is CheckExample => example.kind === 'check');

function expectKey(result: CheckResult, { causes }: Diagnosis, key: Partial<CheckKey>): void {
  expect(result.overall.finding).toBe(key.overall);
  expect(result.overall.nextStep.code).toBe(key.nextStep);
  if (key.stops) expect(result.overall.stops.map(({ code }) => code)).toEqual(key.stops);
  const criterion = result.criteria.find((each) => each.criterion === key.criterion);
  if (key.byRule !== undefined) expect(criterion?.byRule).toBe(key.byRule);
  if (key.reason !== undefined && key.criterion) expect(criterion?.reason?.code ?? null).toBe(key.reason);
  if (key.causes) expect(causes.map(({ cause }) => cause)).toEqual(key.causes);
  const cautions = result.overall.cautions.map(({ code }) => code);
  for (const caution of key.cautions ?? []) expect(cautions).toContain(caution);
}

/**
 * The rules as they were read: superheat ±5 °F and never under 5 °F itself (makers' chart, copy A, installation manual 506374-01, p. 20), subcooling
 * ±3 °F (federal new-homes checklist, rev. 07, items 1.2.11 and 1.2.12). The floor is not in the 2008 rules (RA3.2, ±5 °F).
 */
function byRuleOnPaper(example: CheckExample, criterion: CheckKey['criterion'], of?: string): 'passes' | 'fails' {
  const value = (what: WorkedFigureId) => onPaper(example, { what, ...(of && { of }) });
  const floor = requestOf(example, of).procedure === undefined ? 5 : 0;
  const passes =
    criterion === 'superheat'
      ? Math.abs(value('superheatDeviation')) <= 5 && value('superheat') >= floor
      : Math.abs(value('subcoolingDeviation')) <= 3;
  return passes ? 'passes' : 'fails';
}

const hasTarget = ({ byRule }: Partial<CheckKey>): boolean => byRule !== undefined && byRule !== null;

describe.each(CHECKS)('$id', (example) => {
  const { result, diagnosis, slips } = workCheck(example);

  it('comes out as its key says', () => {
    expectKey(result, diagnosis, example.key);
  });

  it('passes or fails as the printed rule says of the figures on paper', () => {
    const { criterion, byRule } = example.key;
    expect(['superheat', 'subcooling']).toContain(criterion);
    if (hasTarget(example.key)) expect(byRuleOnPaper(example, criterion)).toBe(byRule);
  });

  it('takes no reading that the person who works it on the page could not type', () => {
    for (const { setup, visit, readings } of [example, ...example.slips].map(({ request }) => request)) {
      for (const reading of Object.values(readings)) {
        expect(Object.keys(reading).sort()).toEqual(['resolution', 'unit', 'value']);
      }
      expect(visit?.earlier).toBeUndefined();
      expect(setup.elevation).toBeDefined();
    }
  });

  it.each(slips)(
    'with the slip $slip.id comes out otherwise, as its key says',
    ({ slip, result: slipped, diagnosis: found }) => {
      expectKey(slipped, found, slip.key);
      const { criterion, byRule } = slip.key;
      if (criterion && hasTarget(slip.key)) expect(byRuleOnPaper(example, criterion, slip.id)).toBe(byRule);
      expect(outcome(slipped, slip)).not.toEqual(outcome(result, { request: example.request }));
    },
  );
});

/** What a person would take away from a check: the finding, what to do, and whether the rule was met. */
const outcome = ({ overall, criteria }: CheckResult, { request }: { readonly request: EvaluationRequest }) => [
  overall.finding,
  overall.nextStep.code,
  request.procedure,
  criteria.map(({ criterion, byRule }) => [criterion, byRule]),
];

it('the deciding deviation of each example has the side its finding says', () => {
  for (const example of CHECKS) {
    const { overall, criterion } = example.key;
    if (overall !== 'above' && overall !== 'below') continue;
    const { result } = workCheck(example);
    const { deviation } = result.criteria.find((each) => each.criterion === criterion)!;
    const sign = Math.sign(differenceFromK(deviation!.value, 'deltaF'));
    expect(sign, example.id).toBe(overall === 'above' ? 1 : -1);
  }
});
