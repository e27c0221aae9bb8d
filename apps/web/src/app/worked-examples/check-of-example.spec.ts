import { evaluateCheck, readRequest, type CheckResult, type EvaluationRequest } from '@chargewright/engine';
import { WORKED_EXAMPLES, type CheckExample } from '@chargewright/engine/training';
import { requestFromDraft } from '../check-a-charge/request-from-draft';
import { applyCommand, draftOf } from '../loose-checks/check-draft-reducer';
import { checkOfExample } from './check-of-example';

const NOW = Date.UTC(2026, 11, 1, 12);
const CHECKS = WORKED_EXAMPLES.filter((example): example is CheckExample => example.kind === 'check');

const judged = (request: EvaluationRequest | null): CheckResult => {
  const read = request && readRequest(request);
  if (!read?.ok) throw new Error('the check cannot be read');
  return evaluateCheck(read.input);
};

/** As the page does it: the example fills a check, and the check is asked about. */
const opened = (example: CheckExample): CheckResult => {
  const filled = checkOfExample(example, NOW);
  const at = new Date(NOW).toISOString();
  const readingIds = Object.keys(filled.readings).map((_, index) => `reading-${index}`);
  const state = applyCommand(undefined, { do: 'fill', checkId: 'check', at, example: filled, readingIds });
  const { request, problems, faults } = requestFromDraft(draftOf(state), NOW);
  expect([...problems.keys()]).toEqual([]);
  expect(faults).toEqual([]);
  return judged(request);
};

describe('an example opened in Check a charge', () => {
  for (const example of CHECKS) {
    it(`${example.id} comes out as its key says`, () => {
      const { overall, criteria } = opened(example);
      const { key } = example;
      expect(overall.finding).toBe(key.overall);
      expect(overall.nextStep.code).toBe(key.nextStep);
      expect(overall.stops.map(({ code }) => code)).toEqual(key.stops);
      expect(criteria.find(({ criterion }) => criterion === key.criterion)?.byRule).toBe(key.byRule);
    });
  }

  it('shows what the instruments showed, in the units of the example', () => {
    const [orifice, metric] = CHECKS.map((example) => checkOfExample(example, NOW));
    expect(orifice?.readings.suctionPressure).toEqual({ text: '76.0', unit: 'psig' });
    expect(metric?.readings.liquidPressure).toEqual({ text: '2377', unit: 'kPag' });
    expect(metric?.typed?.targetSubcooling).toEqual({ text: '5.5', unit: 'deltaC' });
    expect(orifice?.visit?.runningSince).toBe('2026-12-01T11:40:00.000Z');
  });
});
