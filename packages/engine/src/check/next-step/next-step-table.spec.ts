import { describe, expect, it } from 'vitest';
import { NOT_YET_CODES } from '../codes';
import type { Facts } from './facts';
import { findRow, NEXT_STEP_TABLE } from './next-step-table';

/** Every value of every fact; the compiler holds it complete. */
const VALUES = {
  unfit: [
    'none',
    'heating-mode',
    'metered-outdoors',
    'not-in-scope',
    'part-stage',
    'not-in-charge-mode',
    'not-ready',
    'port-not-stated',
  ],
  impossible: ['none', 'ports-swapped', 'saturation-impossible'],
  stop: ['none', 'liquid-return', 'freezing', 'high-pressure', 'hot-discharge'],
  shutDown: ['yes', 'no'],
  condition: ['open', 'running-time', 'return-too-cool', 'return-too-warm', 'outdoor-too-cold', 'outdoor-too-hot'],
  record: ['open', 'conditions', 'access-hole', 'instruments'],
  airflowProof: ['enough', 'wanted'],
  runningTime: ['recorded', 'unrecorded'],
  lacking: [
    'none',
    'setup',
    'readings',
    'stale',
    'nameplate-target',
    'target-port',
    'port',
    'outside-tables',
    'suction-line-table',
  ],
  superheatTarget: ['clear', 'near-floor', 'none-here', 'not-used'],
  metering: ['orifice', 'valve'],
  method: ['own', 'makers', 'heating'],
  makersTarget: ['clear', 'none-here'],
  charge: ['unknown', 'low', 'within', 'high'],
  airflow: [
    'measured-low',
    'measured-enough',
    'permitted-path',
    'split-above',
    'split-within',
    'split-too-close',
    'split-below',
    'nothing',
  ],
  airSeen: ['yes', 'no'],
  quality: ['good', 'wrong-refrigerant', 'dry-wick', 'wet-bulb-moved', 'liquid-colder-than-air', 'pull-down'],
  overall: ['stop', 'not-verifiable', 'not-judged', 'above', 'below', 'too-close-to-call', 'within'],
  settling: ['possible', 'impossible'],
  superheat: ['unknown', 'within', 'above', 'below'],
  subcooling: ['unknown', 'within', 'above', 'below'],
  subcoolingLevel: ['unread', 'unreadable', 'low', 'unclear', 'clear', 'high'],
  weather: ['warm', 'cool', 'low-head'],
  leak: ['search', 'found', 'add', 'locate', 'recover'],
  head: ['usual', 'high'],
  drier: ['open', 'small', 'drop'],
  air: ['open', 'none', 'found', 'below'],
  bulb: ['open', 'right', 'wrong'],
} as const satisfies { readonly [Name in keyof Facts]: readonly Facts[Name][] };

type Overall = Facts['overall'];

/** The facts that decide once a finding is out; all else as on a healthy visit. */
const judged = (facts: Partial<Facts> & Pick<Facts, 'overall' | 'metering'>): Facts => ({
  unfit: 'none',
  impossible: 'none',
  stop: 'none',
  shutDown: 'no',
  condition: 'open',
  record: 'open',
  airflowProof: 'enough',
  runningTime: 'recorded',
  lacking: 'none',
  superheatTarget: facts.metering === 'orifice' ? 'clear' : 'not-used',
  method: 'own',
  makersTarget: 'clear',
  charge: 'unknown',
  airflow: 'split-within',
  airSeen: 'yes',
  quality: 'good',
  settling: 'possible',
  superheat: 'within',
  subcooling: 'within',
  subcoolingLevel: 'clear',
  weather: 'warm',
  leak: 'search',
  head: 'usual',
  drier: 'open',
  air: 'open',
  bulb: 'open',
  ...facts,
});

/** All combinations of some facts. */
function combinations<Name extends keyof Facts>(...names: readonly Name[]): readonly Partial<Facts>[] {
  return names.reduce<readonly Partial<Facts>[]>(
    (found, name) => found.flatMap((facts) => VALUES[name].map((value) => ({ ...facts, [name]: value }))),
    [{}],
  );
}

describe('the next-step table', () => {
  it('has at most two things not to do yet in a row, none twice', () => {
    for (const { notYet, step } of NEXT_STEP_TABLE) {
      expect(notYet.length, step).toBeLessThanOrEqual(2);
      expect(new Set(notYet).size).toBe(notYet.length);
      for (const code of notYet) expect(NOT_YET_CODES).toContain(code);
    }
  });

  it('has only conditions whose values exist', () => {
    for (const { when } of NEXT_STEP_TABLE) {
      for (const [name, values] of Object.entries(when)) {
        expect(values.length).toBeGreaterThan(0);
        for (const value of values) expect(VALUES[name as keyof Facts]).toContain(value);
      }
    }
  });

  it('has a row for whatever shuts a check out', () => {
    const shut = [
      ...VALUES.unfit.map((unfit) => ({ unfit })),
      ...VALUES.impossible.map((impossible) => ({ impossible })),
      ...VALUES.stop.map((stop) => ({ stop })),
      ...VALUES.condition.map((condition) => ({ condition })),
      ...VALUES.lacking.map((lacking) => ({ lacking })),
      ...VALUES.record.map((record) => ({ record })),
      { airflowProof: 'wanted' } as const,
      { superheatTarget: 'none-here' } as const,
      { airflow: 'measured-low' } as const,
      { airflow: 'split-above' } as const,
    ].filter((facts) => !['none', 'open'].includes(Object.values(facts)[0]!));
    for (const facts of shut)
      for (const other of combinations('metering', 'shutDown', 'subcooling', 'subcoolingLevel', 'superheat'))
        expect(() => findRow(judged({ metering: 'valve', ...other, overall: 'not-judged', ...facts }))).not.toThrow();
  });

  it('has a row for every finding of an orifice', () => {
    const others = [
      ...combinations('subcooling', 'subcoolingLevel', 'weather', 'leak', 'airSeen', 'settling'),
      ...combinations('subcoolingLevel', 'leak', 'drier', 'air', 'bulb'),
      ...combinations('superheatTarget', 'airflow', 'quality'),
    ];
    for (const overall of ['above', 'below', 'too-close-to-call', 'within'] as const)
      for (const other of others)
        expect(() => findRow(judged({ ...other, metering: 'orifice', overall }))).not.toThrow();
  });

  it('has a row for every finding of a valve: outside means that one of its two criteria is, by the rule', () => {
    const others = [
      ...combinations('superheat', 'subcooling', 'weather', 'leak', 'head', 'settling'),
      ...combinations('superheat', 'subcooling', 'head', 'drier', 'air', 'bulb'),
    ];
    const possible = ({ superheat, subcooling }: Partial<Facts>, overall: Overall): boolean => {
      const sides = [superheat, subcooling];
      return (
        !sides.includes('unknown') && (overall === 'above' || overall === 'below' ? sides.includes(overall) : true)
      );
    };
    for (const overall of ['above', 'below', 'too-close-to-call', 'within'] as const)
      for (const other of others)
        if (possible(other, overall))
          expect(() => findRow(judged({ ...other, metering: 'valve', overall }))).not.toThrow();
  });

  it('asks for the superheat of a valve that is judged without it, before any refrigerant is moved', () => {
    for (const overall of ['above', 'below', 'within'] as const)
      for (const other of combinations('subcooling', 'weather', 'leak', 'head', 'bulb', 'drier')) {
        const facts = judged({ ...other, metering: 'valve', overall, superheat: 'unknown' });
        const { step, notYet } = findRow(facts);
        if (facts.weather === 'warm' && facts.drier !== 'drop' && facts.bulb !== 'wrong')
          expect(step).toBe('read-suction-pair');
        if (overall !== 'within') expect(notYet).toEqual(['move-no-refrigerant']);
      }
  });

  it('names the combination that no row answers', () => {
    expect(() => findRow(judged({ metering: 'valve', overall: 'not-judged' }))).toThrow(/no next step for/);
  });

  it('never lets anything be added, nor recovered, while a leak search is due or the weather is cool', () => {
    for (const other of combinations('superheat', 'subcooling', 'subcoolingLevel', 'head', 'metering')) {
      const due = { ...other, overall: 'below', metering: other.metering!, superheat: 'below' } as const;
      expect(findRow(judged({ ...due, subcooling: 'below', leak: 'search' })).step).not.toBe('add-in-steps');
      for (const weather of ['cool', 'low-head'] as const)
        expect(findRow(judged({ ...due, weather })).notYet).toEqual(['move-no-refrigerant']);
    }
  });
});
