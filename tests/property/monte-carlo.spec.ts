/**
 * First-order uncertainties with secant slopes (JCGM 100:2008) against the Monte Carlo method (JCGM 101:2008) on the same derivations. The airflow
 * criterion is left out: its one error is rectangular, and the normal distribution that stands for it is off by up to 0.057 in probability.
 */
import type { CheckResult, CriterionResult, Known } from '@chargewright/engine';
import { evaluateCheck, readRequest } from '@chargewright/engine';
import { describe, expect, it } from 'vitest';
import type { RepresentativeCheck } from './representative-checks';
import { REPRESENTATIVE_CHECKS } from './representative-checks';
import { simulate, standardDeviation } from './simulate';

const DRAWS = 20_000;
const SEED = 20_261_203;
const MOST_RELATIVE = { smooth: 0.05, kink: 0.15, dash: 0.05 } as const;
const MOST_PROBABILITY = 0.03;

const numeric = ({ criteria }: CheckResult): readonly CriterionResult[] =>
  criteria.filter(({ probabilityWithin }) => probabilityWithin !== null);

function namedQuantities(result: CheckResult): readonly (readonly [string, Known])[] {
  const { superheat, subcooling, temperatureSplit, returnWetBulb } = result.derived;
  const ofCriteria = result.criteria.flatMap(({ criterion, target, deviation }) => [
    [`target of ${criterion}`, target] as const,
    [`deviation of ${criterion}`, deviation] as const,
  ]);
  const all = [...Object.entries({ superheat, subcooling, temperatureSplit, returnWetBulb }), ...ofCriteria] as const;
  // a target entered by hand is exact
  return all.flatMap(([name, quantity]) => (quantity != null && quantity.u > 0 ? [[name, quantity] as const] : []));
}

function judge({ request }: RepresentativeCheck): CheckResult {
  const read = readRequest(request);
  if (!read.ok) throw new Error(`refused: ${JSON.stringify(read.faults)}`);
  return evaluateCheck(read.input);
}

describe.each(REPRESENTATIVE_CHECKS)('$name', (check) => {
  const result = judge(check);

  it('has the standard uncertainties of the simulation', () => {
    const named = namedQuantities(result);
    const simulated = simulate(
      named.map(([, quantity]) => quantity),
      { draws: DRAWS, seed: SEED },
    );
    const compared = named.filter(([name, { u }], i) => {
      const values = simulated[i]!.filter((value) => value !== null);
      // beside a dash a target has no distribution of its own: its probability is compared below
      if (check.at === 'dash' && values.length < DRAWS) return false;
      expect(values, name).toHaveLength(DRAWS);
      const relative = u / standardDeviation(values) - 1;
      expect(Math.abs(relative), `${name}: ${relative}`).toBeLessThanOrEqual(MOST_RELATIVE[check.at]);
      return true;
    });
    expect(compared.map(([name]) => name)).toEqual(
      expect.arrayContaining(['superheat', 'subcooling', 'temperatureSplit']),
    );
  });

  it('has the conformance probabilities of the simulation, a refused chart counting as not within', () => {
    const criteria = numeric(result);
    expect(criteria).toHaveLength(3);
    for (const { criterion, deviation, actual, tolerance, probabilityWithin } of criteria) {
      const [draws = []] = simulate([(deviation ?? actual)!], { draws: DRAWS, seed: SEED });
      const low = tolerance?.low ?? -Infinity;
      const high = tolerance?.high ?? Infinity;
      const inside = draws.filter((value) => value !== null && value >= low && value <= high).length / DRAWS;
      const difference = probabilityWithin! - inside;
      expect(Math.abs(difference), `${criterion}: ${probabilityWithin} against ${inside}`).toBeLessThanOrEqual(
        MOST_PROBABILITY,
      );
    }
  });
});

it('the checks near a dash do meet refusals of the chart', () => {
  for (const check of REPRESENTATIVE_CHECKS.filter(({ at }) => at === 'dash')) {
    const { deviation } = judge(check).criteria.find(({ criterion }) => criterion === 'superheat')!;
    const [draws = []] = simulate([deviation!], { draws: DRAWS, seed: SEED });
    expect(draws.filter((value) => value === null).length).toBeGreaterThan(DRAWS / 50);
  }
});
