/** Laws of the diagnosis over plausible systems: total, never surer with poorer instruments, never low charge against a high subcooling. */
import type { CheckInput, Diagnosis, EvaluationRequest, Evidence } from '@chargewright/engine';
import {
  airTest,
  CAUSES,
  diagnoseCheck,
  DIAGNOSIS_NOTES,
  drierTest,
  evaluateCheck,
  MEASUREMENTS,
  readRequest,
} from '@chargewright/engine';
import { diagnosisTexts } from '../../packages/wording/src/english/diagnosis';
import { deriveQuantities } from '../../packages/engine/src/check/derived-quantities';
import { symptomReadings } from '../../packages/engine/src/check/symptom-readings';
import type { Symptom } from '../../packages/engine/src/diagnosis/read-symptoms';
import { readSymptoms } from '../../packages/engine/src/diagnosis/read-symptoms';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { findNotFinite } from './find-not-finite';
import { mutated, mutations } from './mutations';
import { plausibleSystem } from './plausible-system';
import { requestOfSystem } from './request-of-system';
import { anySystem, statedSystem } from './scenarios';
import { widened, widening } from './widening';

const SYSTEMS = 30_000;
const SEED = 20_261_204;
const LEAST = 5;
/** Needs two faults that pull the current opposite ways, and the current known. */
const SELDOM: ReadonlySet<string> = new Set(['evidence current-as-expected']);

const any: fc.Arbitrary<EvaluationRequest> = fc
  .tuple(anySystem, mutations)
  .map(([drives, changes]) => mutated(requestOfSystem(plausibleSystem(drives), 'inch-pound'), changes));

const diagnosed = (input: CheckInput): Diagnosis => diagnoseCheck(input, evaluateCheck(input));

/** Never said for a cause: they refute it, and a refuted cause is not listed; or they leave it open. */
const UNSAID: ReadonlySet<string> = new Set<Evidence['code']>(['no-drier-drop', 'no-air', 'airflow-enough']);

const HIGH: ReadonlySet<string> = new Set<Evidence['code']>(['subcooling-above-target', 'subcooling-high']);

describe('the diagnosis', () => {
  it(`of ${SYSTEMS} systems never throws, keeps to its order and its rules, and meets every code`, () => {
    const met = new Map<string, number>();
    const meet = (list: string, code: string) => met.set(`${list} ${code}`, (met.get(`${list} ${code}`) ?? 0) + 1);
    fc.assert(
      fc.property(any, (request) => {
        const read = readRequest(request);
        if (!read.ok) return;
        const { causes, notes } = diagnosed(read.input);
        const notFinite = findNotFinite({ causes, notes });
        if (notFinite !== null) expect.fail(`${notFinite} is not finite`);
        const at = causes.map(({ cause }) => CAUSES.indexOf(cause));
        for (let k = 1; k < at.length; k++) if (at[k]! <= at[k - 1]!) expect.fail(`order: ${at.join(', ')}`);
        if (causes.length === 0 && notes.length === 0) expect.fail('no cause, and no word why');
        if (new Set(notes).size !== notes.length) expect.fail(`notes: ${notes.join(', ')}`);
        for (const note of notes) meet('note', note);
        for (const { cause, fits, doesNotFit, nextMeasurement } of causes) {
          meet('cause', cause);
          if (fits.length === 0) expect.fail(`${cause} fits nothing`);
          for (const { code } of [...fits, ...doesNotFit]) meet('evidence', code);
          if (nextMeasurement !== null) meet('measurement', nextMeasurement);
        }
      }),
      { numRuns: SYSTEMS, seed: SEED },
    );
    const wanted = [
      ...CAUSES.map((code) => `cause ${code}`),
      ...DIAGNOSIS_NOTES.map((code) => `note ${code}`),
      ...MEASUREMENTS.map((code) => `measurement ${code}`),
      ...Object.keys(diagnosisTexts.evidence)
        .filter((code) => !UNSAID.has(code))
        .map((code) => `evidence ${code}`),
    ];
    const isRare = (code: string) => (met.get(code) ?? 0) < (SELDOM.has(code) ? 1 : LEAST);
    const rare = wanted.filter(isRare).map((code) => `${code}: ${met.get(code) ?? 0}`);
    expect(rare).toEqual([]);
    for (const code of UNSAID) expect(met.has(`evidence ${code}`), code).toBe(false);
  });

  it('offers low charge against a high subcooling only with what puts it in doubt', () => {
    let offered = 0;
    fc.assert(
      fc.property(anySystem, (drives) => {
        const read = readRequest(requestOfSystem(plausibleSystem(drives), 'inch-pound'));
        if (!read.ok) return;
        const { causes } = diagnosed(read.input);
        const isHigh = causes.some(({ fits, doesNotFit }) =>
          [...fits, ...doesNotFit].some(({ code }) => HIGH.has(code)),
        );
        const lowCharge = causes.find(({ cause }) => cause === 'low-charge');
        if (!isHigh || lowCharge === undefined) return;
        offered++;
        const found = airTest(read.input).finding === 'found';
        if (!found) expect(['state-port', 'confirm-refrigerant', 'air-test']).toContain(lowCharge.nextMeasurement);
        if (!found) expect(lowCharge.doesNotFit.some(({ code }) => HIGH.has(code))).toBe(true);
      }),
      { numRuns: 20_000, seed: SEED },
    );
    expect(offered).toBeGreaterThan(20);
  });

  it('is never surer with a wider ±: what a reading leaves possible only grows, and no test finds more', () => {
    let compared = 0;
    fc.assert(
      fc.property(statedSystem, widening, (drives, wider) => {
        const request = requestOfSystem(plausibleSystem(drives), 'inch-pound');
        const [read, readWider] = [readRequest(request), readRequest(widened(request, wider))];
        if (!read.ok || !readWider.ok) return;
        const [before, after] = [symptomsOf(read.input), symptomsOf(readWider.input)];
        for (const { column, possible } of before) {
          const then = after.find((each) => each.column === column);
          // a derivation may be refused at the wider ±; that is not surer
          if (then === undefined) continue;
          compared++;
          for (const change of possible)
            if (!then.possible.includes(change)) expect.fail(`${column}: no longer ${change}`);
        }
        for (const test of [drierTest, airTest]) {
          const finding: string = test(read.input).finding;
          const later: string = test(readWider.input).finding;
          if (later !== finding && later !== 'unclear') expect.fail(`${finding}, then ${later}`);
        }
      }),
      { numRuns: 10_000, seed: SEED },
    );
    expect(compared).toBeGreaterThan(20_000);
  });

  it('says the same in °C and bar', () => {
    fc.assert(
      fc.property(anySystem, (drives) => {
        const system = plausibleSystem(drives);
        const [a, b] = (['inch-pound', 'metric'] as const).map((units) => {
          const read = readRequest(requestOfSystem(system, units));
          return read.ok ? codesOf(diagnosed(read.input)) : null;
        });
        expect(b).toEqual(a);
      }),
      { numRuns: 5000, seed: SEED },
    );
  });
});

function symptomsOf(input: CheckInput): readonly Symptom[] {
  const derived = deriveQuantities(input.setup, input.readings);
  return readSymptoms(symptomReadings(input, derived, evaluateCheck(input)));
}

const codesOf = ({ causes, notes }: Diagnosis) => ({
  notes,
  causes: causes.map(({ cause, fits, doesNotFit, nextMeasurement }) => ({
    cause,
    nextMeasurement,
    fits: fits.map(({ code }) => code),
    doesNotFit: doesNotFit.map(({ code }) => code),
  })),
});
