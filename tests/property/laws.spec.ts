import { isDeepStrictEqual } from 'node:util';
import type { CheckResult, EvaluationRequest, ReadingId } from '@chargewright/engine';
import { evaluateCheck, readRequest } from '@chargewright/engine';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { digest, findDifference } from './digest';
import type { Drives } from './drives';
import { mutated, mutations, withoutReadings } from './mutations';
import { plausibleSystem } from './plausible-system';
import { requestOfSystem } from './request-of-system';
import { anySystem, fitSystem, statedSystem } from './scenarios';
import { widened, widening } from './widening';

const RUNS = { numRuns: 10_000, seed: 20_261_202 };

const inchPound = (drives: Drives): EvaluationRequest => requestOfSystem(plausibleSystem(drives), 'inch-pound');

function evaluate(request: EvaluationRequest): CheckResult {
  const read = readRequest(request);
  if (!read.ok) throw new Error(`refused: ${read.faults.map(({ path, code }) => `${path} ${code}`).join(', ')}`);
  return evaluateCheck(read.input);
}

describe('laws of judging', () => {
  it('a system fit for the test of which nothing was read is not judged', () => {
    fc.assert(
      fc.property(fitSystem, (drives) => {
        expect(evaluate(withoutReadings(inchPound(drives))).overall.finding).toBe('not-judged');
      }),
      { ...RUNS, numRuns: 3000 },
    );
  });

  it('a wider ± never turns another finding into within', () => {
    let compared = 0;
    const request = fc.tuple(statedSystem.map(inchPound), mutations).map(([whole, changes]) => mutated(whole, changes));
    fc.assert(
      fc.property(request, widening, (asked, wider) => {
        const [read, readWider] = [readRequest(asked), readRequest(widened(asked, wider))];
        if (!read.ok || !readWider.ok) return;
        const [before, after] = [evaluateCheck(read.input), evaluateCheck(readWider.input)];
        compared++;
        expectNotPromoted('overall', before.overall.finding, after.overall.finding);
        before.criteria.forEach(({ criterion, required, finding }, k) => {
          if (required) expectNotPromoted(criterion, finding, after.criteria[k]!.finding);
        });
      }),
      RUNS,
    );
    expect(compared).toBeGreaterThan(RUNS.numRuns / 2);
  });

  it('°F and psi say the same as °C and bar', () => {
    fc.assert(
      fc.property(anySystem, (drives) => {
        const system = plausibleSystem(drives);
        const [a, b] = [requestOfSystem(system, 'inch-pound'), requestOfSystem(system, 'metric')].map(evaluate);
        const difference = findDifference(digest(a!), digest(b!), SLACK);
        if (difference !== null) expect.fail(difference);
      }),
      RUNS,
    );
  });

  it('the same request, in whatever order its readings stand, gets the same answer and is left as it was', () => {
    fc.assert(
      fc.property(anySystem.map(inchPound), (request) => {
        const copy = structuredClone(request);
        const first = digest(evaluate(request));
        const reversed = Object.fromEntries(Object.entries(request.readings).reverse());
        const again = digest(evaluate({ ...request, readings: reversed }));
        if (!isDeepStrictEqual(first, again)) expect.fail(findDifference(first, again, 0) ?? 'keys differ');
        if (!isDeepStrictEqual(copy, request)) expect.fail('the request was changed');
      }),
      { ...RUNS, numRuns: 3000 },
    );
  });

  it('only a missing required reading holds a check up', () => {
    fc.assert(
      fc.property(anySystem.map(inchPound), fc.nat(), (request, k) => {
        const spare = SPARE[request.setup.meteringDevice === 'fixed-orifice' ? 'orifice' : 'valve'];
        const dropped = spare[k % spare.length]!;
        const readings = Object.fromEntries(Object.entries(request.readings).filter(([id]) => id !== dropped));
        const [before, after] = [evaluate(request), evaluate({ ...request, readings })];
        before.criteria.forEach(({ criterion, required, finding }, j) => {
          if (!required || finding === 'not-judged' || after.criteria[j]!.finding !== 'not-judged') return;
          expect.fail(`${criterion} without ${dropped}: ${finding}, then not judged`);
        });
      }),
      RUNS,
    );
  });
});

/** What a saturation curve may be off by, carried through sums, in K; a probability follows it. */
const SLACK = 1e-8;

/** Readings no required criterion rests on; with a relative humidity the return dry bulb is one, so it is not listed. */
const SPARE = {
  orifice: ['supplyDryBulb', 'liquidPressure', 'liquidLineTemperature', 'airflow', 'writtenEvaporatingTemperature'],
  valve: ['returnDryBulb', 'returnWetBulb', 'returnRelativeHumidity', 'supplyDryBulb', 'outdoorDryBulb', 'airflow'],
} as const satisfies Record<string, readonly ReadingId[]>;

function expectNotPromoted(what: string, before: string, after: string): void {
  if (after === 'within' && before !== 'within') expect.fail(`${what}: ${before}, then within`);
}
