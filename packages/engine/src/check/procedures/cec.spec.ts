/** Every figure of the California procedures, as judgement and the publications print it. */
import { describe, expect, it } from 'vitest';
import { differenceFromK, flowFromM3PerS, powerFromW, temperatureFromK } from '../../units';
import type { Procedure, Rule } from '../procedure';
import { CEC_2008_INSTALLER, CEC_2008_RATER } from './cec-2008';
import { CEC_2019_INSTALLER, CEC_2019_RATER } from './cec-2019';

const deltaF = (rule: Rule | null): number | null => rule && differenceFromK(rule.value, 'deltaF');
const degF = (rule: Rule | null): number | null => rule && temperatureFromK(rule.value, 'degF');
const cfmPerTon = (rule: Rule | null): number | null =>
  rule && flowFromM3PerS(rule.value / powerFromW(1, 'ton'), 'cfm');

interface Row {
  readonly figure: string;
  readonly of: (procedure: Procedure) => number | null;
  /** 2008 installer, 2008 rater, 2019 installer, 2019 rater. */
  readonly printed: readonly [number | null, number | null, number | null, number | null];
}

const all = (figure: number | null): Row['printed'] => [figure, figure, figure, figure];

const ROWS: readonly Row[] = [
  { figure: 'superheat ±', of: ({ superheat }) => deltaF(superheat.toleranceK), printed: [5, 6, 5, 8] },
  { figure: 'superheat floor', of: ({ superheat }) => deltaF(superheat.floorK), printed: all(null) },
  { figure: 'subcooling ±', of: ({ subcooling }) => deltaF(subcooling.toleranceK), printed: [3, 4, 3, 6] },
  { figure: 'subcooling at least', of: ({ subcooling }) => deltaF(subcooling.leastK), printed: [null, null, null, 2] },
  { figure: 'split ±', of: ({ temperatureSplit }) => deltaF(temperatureSplit.toleranceK), printed: [3, 4, 3, 3] },
  { figure: 'window from', of: ({ superheatWindow }) => deltaF(superheatWindow.lowK), printed: [4, 3, 4, 3] },
  { figure: 'window to', of: ({ superheatWindow }) => deltaF(superheatWindow.highK), printed: [25, 26, 25, 26] },
  { figure: 'cfm/ton', of: ({ airflow }) => cfmPerTon(airflow.leastM3PerSPerW), printed: [300, 300, 350, 350] },
  {
    figure: 'cfm/ton of an alteration',
    of: ({ airflow }) => cfmPerTon(airflow.leastOfAlterationM3PerSPerW),
    printed: [null, null, 300, 300],
  },
  {
    figure: 'cfm/ton of a high-velocity system',
    of: ({ airflow }) => cfmPerTon(airflow.leastOfHighVelocityM3PerSPerW),
    printed: [null, null, 250, 250],
  },
  { figure: 'outdoors at least', of: ({ conditions }) => degF(conditions.leastOutdoorK), printed: all(55) },
  {
    figure: 'outdoors at most for superheat',
    of: ({ conditions }) => degF(conditions.mostOutdoorForSuperheatK),
    printed: [null, null, 115, 115],
  },
  { figure: 'return at least', of: ({ conditions }) => degF(conditions.leastReturnK), printed: all(70) },
  { figure: 'cool below', of: ({ conditions }) => degF(conditions.coolBelowK), printed: all(70) },
  { figure: 'minutes', of: ({ conditions }) => conditions.leastRunningMinutes.value, printed: all(15) },
  { figure: 'days', of: ({ instruments }) => instruments.mostDays.value, printed: all(31) },
  { figure: 'age', of: ({ mostReadingAgeSeconds }) => mostReadingAgeSeconds.value, printed: all(600) },
  { figure: 'certainty', of: ({ decision }) => decision.clearFrom.value, printed: all(0.8) },
  { figure: 'no target', of: ({ mostProbabilityOfNoTarget }) => mostProbabilityOfNoTarget.value, printed: all(0.2) },
];

const PROCEDURES = [CEC_2008_INSTALLER, CEC_2008_RATER, CEC_2019_INSTALLER, CEC_2019_RATER] as const;

describe.each(PROCEDURES.map((procedure, k) => ({ id: procedure.id, procedure, k })))('$id', ({ procedure, k }) => {
  it.each(ROWS)('$figure', ({ of, printed }) => {
    const figure = printed[k]!;
    if (figure === null) expect(of(procedure)).toBeNull();
    else expect(of(procedure)).toBeCloseTo(figure, 9);
  });

  it('decides by the rule, with targets of the finer table', () => {
    expect(procedure.decision.type).toBe('simple');
    expect(procedure.superheat.chart).toBe('finer-table');
    expect(procedure.conditions.unrecorded).toBe('gate');
  });
});

describe('what the editions differ in', () => {
  it.each([
    ['a limit of airflow that is enough itself', false, true, ({ airflow }: Procedure) => airflow.limitPasses],
    ['the split as evidence', true, false, ({ airflow }: Procedure) => airflow.splitCounts],
    ['either evidence', true, false, ({ airflow }: Procedure) => airflow.eitherSuffices],
    ['an entered target superheat', false, true, ({ superheat }: Procedure) => superheat.enteredTarget],
    ['packaged units', false, true, ({ packaged }: Procedure) => packaged],
    ['the access hole', false, true, ({ conditions }: Procedure) => conditions.accessHole],
    ['instruments as a gate', false, true, ({ instruments }: Procedure) => instruments.beyond === 'gate'],
    ['window and range both', false, true, ({ superheatWindow }: Procedure) => superheatWindow.makersRange === 'also'],
  ] as const)('%s: %s in 2008, %s in 2019', (_, in2008, in2019, has) => {
    expect(PROCEDURES.map((procedure) => has(procedure))).toEqual([in2008, in2008, in2019, in2019]);
  });

  it('figures that were not read stand as from memory', () => {
    expect(CEC_2008_RATER.subcooling.toleranceK.standing).toBe('memory');
    expect(CEC_2008_INSTALLER.subcooling.toleranceK.standing).toBe('read');
    expect(CEC_2008_INSTALLER.instruments.mostDays.standing).toBe('memory');
    expect(CEC_2019_INSTALLER.instruments.mostDays.standing).toBe('read');
  });
});
