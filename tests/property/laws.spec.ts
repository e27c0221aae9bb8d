import { isDeepStrictEqual } from 'node:util';
import type {
  CheckResult,
  EvaluationRequest,
  MakersChartKind,
  ProcedureId,
  ReadingId,
  ReasonCode,
} from '@chargewright/engine';
import { evaluateCheck, PROCEDURES, readRequest } from '@chargewright/engine';
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
  it('a system fit for the test of which nothing was read is not judged, unless what was recorded shuts the test', () => {
    fc.assert(
      fc.property(fitSystem, (drives) => {
        const { overall, criteria } = evaluate(withoutReadings(inchPound(drives)));
        const shut = criteria.some(({ required, finding }) => required && finding === 'not-verifiable');
        expect(overall.finding).toBe(shut ? 'not-verifiable' : 'not-judged');
        for (const { criterion, finding } of criteria) {
          if (finding === 'not-verifiable') expect(['conditions', 'instruments']).toContain(criterion);
        }
      }),
      { ...RUNS, numRuns: 3000 },
    );
  });

  it('where the decision is guarded a wider ± never turns another finding into within', () => {
    let compared = 0;
    const guarded = fc
      .tuple(statedSystem, fc.constantFrom(...GUARDED))
      .map(([drives, procedure]) => inchPound({ ...drives, procedure }));
    const request = fc.tuple(guarded, mutations).map(([whole, changes]) => mutated(whole, changes));
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

  it('where the rule decides alone a wider ± changes no finding, but near a dash and where readings become impossible', () => {
    let [compared, doubtful] = [0, 0];
    const simple = fc
      .tuple(statedSystem, fc.constantFrom(...SIMPLE))
      .map(([drives, procedure]) => inchPound({ ...drives, procedure }));
    fc.assert(
      fc.property(simple, widening, (asked, wider) => {
        const [before, after] = [evaluate(asked), evaluate(widened(asked, wider))];
        if ([before, after].some(dependsOnUncertainty)) {
          doubtful++;
          expectNotPromoted('overall', before.overall.finding, after.overall.finding);
          return;
        }
        compared++;
        expect(findingsOf(after, before)).toEqual(findingsOf(before, after));
        for (const { finding, reason, criterion } of before.criteria)
          if (finding === 'too-close-to-call' && reason === null) expect.fail(`${criterion} is too close to call`);
      }),
      RUNS,
    );
    expect(compared).toBeGreaterThan(RUNS.numRuns / 2);
    expect(doubtful).toBeGreaterThan(RUNS.numRuns / 20);
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
        const spare = spareReadings(request);
        const dropped = spare[k % spare.length]!;
        const readings = Object.fromEntries(Object.entries(request.readings).filter(([id]) => id !== dropped));
        const [before, after] = [evaluate(request), evaluate({ ...request, readings })];
        before.criteria.forEach(({ criterion, required, finding }) => {
          const then = after.criteria.find((each) => each.criterion === criterion);
          if (criterion === 'conditions' || criterion === 'airflow') return;
          if (!required || finding === 'not-judged' || then?.finding !== 'not-judged') return;
          expect.fail(`${criterion} without ${dropped}: ${finding}, then not judged`);
        });
      }),
      RUNS,
    );
  });
});

/** What a saturation curve may be off by, carried through sums, in K; a probability follows it. */
const SLACK = 1e-8;

/** Readings no criterion of the charge rests on (where the procedure gates on them, the conditions and the airflow do); with a relative humidity the return dry bulb is one, so it is not listed. */
const SPARE = {
  orifice: ['supplyDryBulb', 'liquidPressure', 'liquidLineTemperature', 'airflow', 'writtenEvaporatingTemperature'],
  valve: ['returnDryBulb', 'returnWetBulb', 'returnRelativeHumidity', 'supplyDryBulb', 'outdoorDryBulb', 'airflow'],
} as const satisfies Record<string, readonly ReadingId[]>;

/** What a maker's table is entered with, and what it is held against. */
const WANTED_BY_TABLE: Readonly<Record<MakersChartKind, readonly ReadingId[]>> = {
  superheat: ['outdoorDryBulb', 'returnDryBulb', 'returnWetBulb', 'returnRelativeHumidity'],
  subcooling: ['outdoorDryBulb'],
  'liquid-line-approach': ['outdoorDryBulb', 'liquidLineTemperature'],
  'suction-line-temperature': ['outdoorDryBulb'],
  'liquid-pressure': ['liquidPressure', 'liquidLineTemperature'],
  'heating-discharge-pressure': ['outdoorDryBulb', 'returnDryBulb'],
  'heating-discharge-temperature': ['outdoorDryBulb', 'returnDryBulb'],
};

function spareReadings({ setup }: EvaluationRequest): readonly ReadingId[] {
  const charts = [setup.makersChart, ...(setup.makersCharts ?? [])].filter((chart) => chart !== undefined);
  const wanted = charts.flatMap(({ kind }) => WANTED_BY_TABLE[kind]);
  return SPARE[setup.meteringDevice === 'fixed-orifice' ? 'orifice' : 'valve'].filter((id) => !wanted.includes(id));
}

const decidedBy = (type: 'simple' | 'guarded'): readonly ProcedureId[] =>
  PROCEDURES.filter(({ decision }) => decision.type === type).map(({ id }) => id);
const SIMPLE = decidedBy('simple');
const GUARDED = decidedBy('guarded');

/** What the uncertainty may decide under every procedure: whether a target exists, and whether readings can be at all. */
const DOUBTS: readonly string[] = [
  'target-may-not-exist',
  'no-target-here',
  'outside-range',
  'saturation-impossible',
  'ports-swapped',
] satisfies readonly ReasonCode[];

const dependsOnUncertainty = ({ criteria }: CheckResult): boolean =>
  criteria.some(({ reason }) => reason !== null && DOUBTS.includes(reason.code));

/** Each finding, and what the rule says wherever there is a number before and after. */
function findingsOf(
  { criteria }: CheckResult,
  other: CheckResult,
): readonly (readonly [string, string, string | null])[] {
  return criteria.map(({ criterion, finding, byRule }, k) => [
    criterion,
    finding,
    other.criteria[k]?.byRule == null ? null : byRule,
  ]);
}

function expectNotPromoted(what: string, before: string, after: string): void {
  if (after === 'within' && before !== 'within') expect.fail(`${what}: ${before}, then within`);
}
