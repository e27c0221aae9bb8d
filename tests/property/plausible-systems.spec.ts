import type { CheckResult, EvaluationRequest } from '@chargewright/engine';
import { crossCheck, evaluateCheck, readRequest } from '@chargewright/engine';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { Coverage } from './coverage';
import { findNotFinite } from './find-not-finite';
import { mutated, mutations } from './mutations';
import { plausibleSystem } from './plausible-system';
import { requestOfSystem } from './request-of-system';
import { anySystem } from './scenarios';

const SYSTEMS = 100_000;
const SEED = 20_261_201;
const LEAST = 20;

const request: fc.Arbitrary<EvaluationRequest> = fc
  .tuple(anySystem, fc.constantFrom('inch-pound' as const, 'metric' as const), mutations)
  .map(([drives, units, changes]) => mutated(requestOfSystem(plausibleSystem(drives), units), changes));

describe('100,000 plausible systems, as they are and mutated', () => {
  it(`are judged without a throw, a NaN or an infinity, and meet every code ${LEAST} times`, () => {
    const coverage = new Coverage();
    fc.assert(
      fc.property(request, (asked) => {
        const read = readRequest(asked);
        if (!read.ok) {
          expect(crossCheck(asked)).toEqual(read.faults);
          expectSound(read.faults);
          coverage.addFaults(read.faults);
          return;
        }
        const result = evaluateCheck(read.input);
        expectSound(result);
        expectOneNextStep(result);
        coverage.addResult(result);
      }),
      { numRuns: SYSTEMS, seed: SEED },
    );
    console.log(`codes met, rarest first: ${coverage.report()}`);
    expect(coverage.rarerThan(LEAST)).toEqual([]);
  });
});

function expectSound(answer: unknown): void {
  const found = findNotFinite(answer);
  if (found !== null) expect.fail(`${found} is not finite`);
}

function expectOneNextStep({ overall }: CheckResult): void {
  const { code, notYet } = overall.nextStep;
  if (typeof code !== 'string' || code.length === 0) expect.fail('no next step');
  if (notYet.length > 2 || new Set(notYet).size !== notYet.length) expect.fail(`not yet: ${notYet.join(', ')}`);
}
