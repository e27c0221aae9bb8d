import { storedRow, type StoredRow } from '@chargewright/contract/stored-check';
import { READING_IDS } from '@chargewright/engine';
import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { CheckCommand, CheckState } from './check-command';
import { TYPED_FIELDS } from '@chargewright/contract/typed-fields';
import type { FieldKey } from './check-draft';
import { applyCommand, draftOf, isEmpty, summaryOf } from './check-draft-reducer';
import { rowChanges, stateFromRows } from './check-rows';

/** Deterministic ids and times: one of each per step, ids in the order of their steps. */
const idAt = (step: number, lane = 0) =>
  `0190${step.toString(16).padStart(4, '0')}-0000-7000-8${lane.toString(16).padStart(3, '0')}-000000000000`;
const CHECK = '0189ffff-0000-7000-8000-000000000009';
const timeAt = (step: number) => new Date(Date.UTC(2026, 5, 1, 12, 0, step)).toISOString();

const fieldArbitrary = fc.oneof(
  fc.constantFrom(...READING_IDS.map((id) => `reading:${id}` as const)),
  fc.constantFrom(...TYPED_FIELDS.map((field) => `typed:${field}` as const)),
);
const valueArbitrary = fc.record({
  text: fc.oneof(fc.constantFrom('', ' ', '64.5', '64,50', '-3', 'abc'), fc.string({ maxLength: 12 })),
  unit: fc.constantFrom('degF', 'degC', 'psig', '%', ''),
});

type Step = (step: number) => CheckCommand;
const told = (step: number) => ({ checkId: CHECK, at: timeAt(step) });

const stepArbitrary: fc.Arbitrary<Step> = fc.oneof(
  {
    weight: 6,
    arbitrary: fc
      .tuple(fieldArbitrary, valueArbitrary)
      .map(([field, value]): Step => (n) => ({ ...told(n), do: 'type', field, value, editId: idAt(n) })),
  },
  {
    weight: 6,
    arbitrary: fieldArbitrary.map((field): Step => (n) => ({ ...told(n), do: 'commit', field, readingId: idAt(n) })),
  },
  {
    weight: 1,
    arbitrary: fc
      .constantFrom('R-410A', 'R-22')
      .map((refrigerant): Step => (n) => ({ ...told(n), do: 'choose', setup: { refrigerant } })),
  },
  {
    weight: 1,
    arbitrary: fc
      .constantFrom('txv', 'fixed-orifice')
      .map((meteringDevice): Step => (n) => ({ ...told(n), do: 'choose', setup: { meteringDevice } })),
  },
  {
    weight: 1,
    arbitrary: fc
      .constantFrom('ok', 'not-ok')
      .map((panelsOn): Step => (n) => ({ ...told(n), do: 'visit', patch: { preflight: { panelsOn } } })),
  },
  {
    weight: 1,
    arbitrary: fc.constant<Step>((n) => ({
      ...told(n),
      do: 'bring',
      value: { text: '1184', unit: 'cfm' },
      workedOut: { method: 'static-pressure', plusMinus: 60.5 },
      readingId: idAt(n),
    })),
  },
  { weight: 1, arbitrary: fc.constant<Step>((n) => ({ ...told(n), do: 'keep-first-set' })) },
  { weight: 1, arbitrary: fc.constant<Step>((n) => ({ ...told(n), do: 'forget-first-set' })) },
  { weight: 1, arbitrary: fc.constant<Step>((n) => ({ ...told(n), do: 'visit', patch: { runningSince: timeAt(n) } })) },
  {
    weight: 1,
    arbitrary: fc.constant<Step>((n) => ({
      ...told(n),
      do: 'fill',
      example: {
        setup: { refrigerant: 'R-32' },
        readings: { suctionPressure: { text: '118', unit: 'psig' }, outdoorDryBulb: { text: '95', unit: 'degF' } },
      },
      readingIds: [idAt(n, 1), idAt(n, 2)],
    })),
  },
  {
    weight: 1,
    arbitrary: fc
      .constantFrom('open', 'retake', 'remove', 'restore')
      .map((deed): Step => (n) => ({ ...told(n), do: deed })),
  },
  {
    weight: 1,
    arbitrary: fc.constantFrom(undefined, timeAt(0)).map((runningSince): Step => (n) => ({
      ...told(n),
      do: 'take-back-retake',
      retired: [],
      runningSince,
      tests: undefined,
    })),
  },
);
const commandsArbitrary = fc
  .array(stepArbitrary, { minLength: 1, maxLength: 60 })
  .map((steps) => steps.map((step, n) => step(n)));

/** A store of rows that refuses what an append-only store must not see. */
class Rows {
  readonly rows = new Map<string, StoredRow>();

  write(before: CheckState | undefined, after: CheckState): void {
    const { puts, deletes } = rowChanges(before, after);
    for (const row of puts) {
      const old = this.rows.get(row.id);
      if (old?.kind === 'reading') expect(row).toEqual(old);
      this.rows.set(row.id, storedRow.parse(structuredClone(row)));
    }
    for (const id of deletes) {
      expect(this.rows.get(id)?.kind).toBe('edit');
      this.rows.delete(id);
    }
  }

  read(): CheckState | undefined {
    return stateFromRows(
      CHECK,
      [...this.rows.values()].sort((a, b) => (a.id < b.id ? -1 : 1)),
    );
  }
}

const play = (commands: readonly CheckCommand[]) => {
  const [first, ...others] = commands;
  if (!first) throw new Error('at least one command');
  return others.reduce(applyCommand, applyCommand(undefined, first));
};
const typing = (field: FieldKey, text: string, n: number): CheckCommand => ({
  ...told(n),
  do: 'type',
  field,
  value: { text, unit: 'degF' },
  editId: idAt(n),
});
const committing = (field: FieldKey, n: number): CheckCommand => ({
  ...told(n),
  do: 'commit',
  field,
  readingId: idAt(n),
});

describe('a check and its rows', () => {
  it('gives the same draft from rows as in memory, after any commands, reloaded at any time', () => {
    fc.assert(
      fc.property(commandsArbitrary, fc.infiniteStream(fc.boolean()), (commands, reloads) => {
        const store = new Rows();
        let state: CheckState | undefined;
        for (const command of commands) {
          const before: CheckState | undefined = reloads.next().value ? store.read() : state;
          const after = applyCommand(before, command);
          store.write(before, after);
          state = after;
          const reloaded = store.read();
          if (!reloaded) throw new Error('the check is not in its rows');
          expect(draftOf(reloaded)).toEqual(draftOf(after));
          expect(reloaded.deletedAt).toEqual(after.deletedAt);
          expect(summaryOf(reloaded)).toEqual(summaryOf(after));
          expect(isEmpty(reloaded)).toBe(isEmpty(after));
        }
      }),
      { numRuns: 500 },
    );
  });

  it('never loses the last text typed into a field: it stands as edit or as committed value until something takes its place', () => {
    fc.assert(
      fc.property(commandsArbitrary, (commands) => {
        const expected = new Map<FieldKey, string>();
        for (const command of commands) {
          if (command.do === 'type') expected.set(command.field, command.value.text);
          // an airflow brought from its page takes the place of the one typed
          if (command.do === 'bring') expected.set('reading:airflow', command.value.text);
          if (['fill', 'keep-first-set', 'retake', 'take-back-retake'].includes(command.do)) {
            for (const field of [...expected.keys()]) if (field.startsWith('reading:')) expected.delete(field);
          }
        }
        const { edits, readings, typed } = draftOf(play(commands));
        for (const [field, text] of expected) {
          const name = field.slice(field.indexOf(':') + 1);
          const committed = { ...readings, ...typed } as Record<string, { text: string } | undefined>;
          const shown = edits[field]?.text ?? committed[name]?.text ?? '';
          expect(shown.trim() === '' ? '' : shown).toBe(text.trim() === '' ? '' : text);
        }
      }),
      { numRuns: 500 },
    );
  });
});

describe('a first set', () => {
  it('keeps what was read, asks it all again with the clock running on, and can be forgotten', () => {
    const FIELD = 'reading:returnWetBulb' as const;
    const kept = play([typing(FIELD, '66.0', 1), committing(FIELD, 2), { ...told(3), do: 'keep-first-set' }]);
    expect(draftOf(kept).readings).toEqual({});
    expect(kept.visit.firstSet).toEqual({
      takenAt: timeAt(3),
      readings: { returnWetBulb: { text: '66.0', unit: 'degF' } },
    });
    expect(kept.readings).toHaveLength(1);
    expect(applyCommand(kept, { ...told(4), do: 'forget-first-set' }).visit).toEqual({ preflight: {} });
  });
});

describe('a separating test', () => {
  const WET_BULB = 'reading:returnWetBulb' as const;
  const DRIER = 'reading:drierInletTemperature' as const;
  const SEEN = { bulb: 'loose', liquidShutIn: true } as const;
  const made = play([
    typing(WET_BULB, '66', 1),
    committing(WET_BULB, 2),
    typing(DRIER, '96', 3),
    committing(DRIER, 4),
    { ...told(5), do: 'visit', patch: { tests: SEEN } },
  ]);

  it('need not be made twice for a second set of readings', () => {
    const { readings, visit } = draftOf(applyCommand(made, { ...told(6), do: 'keep-first-set' }));
    expect(Object.keys(readings)).toEqual(['drierInletTemperature']);
    expect(visit.tests).toEqual(SEEN);
  });

  it('is void after an adjustment, and stands again when that is taken back', () => {
    const adjusted = applyCommand(made, { ...told(6), do: 'retake' });
    expect(draftOf(adjusted).readings).toEqual({});
    expect(draftOf(adjusted).visit.tests).toBeUndefined();
    const { retired, visit } = made;
    const undone = applyCommand(adjusted, {
      ...told(7),
      do: 'take-back-retake',
      retired,
      runningSince: undefined,
      tests: visit.tests,
    });
    expect(Object.keys(draftOf(undone).readings)).toEqual(['returnWetBulb', 'drierInletTemperature']);
    expect(draftOf(undone).visit.tests).toEqual(SEEN);
  });
});

describe('readings', () => {
  const FIELD = 'reading:outdoorDryBulb';

  it('are corrected by a new reading that names the old one', () => {
    const { readings } = play([
      typing(FIELD, '95', 1),
      committing(FIELD, 2),
      typing(FIELD, '92', 3),
      committing(FIELD, 4),
    ]);
    expect(readings.map(({ text, supersedes }) => ({ text, supersedes }))).toEqual([
      { text: '95', supersedes: undefined },
      { text: '92', supersedes: idAt(2) },
    ]);
    expect(readings[1]).toMatchObject({ place: 'outdoor-unit', takenAt: timeAt(3), source: 'typed', checkId: CHECK });
  });

  it('are taken away by a blank text and can be given again', () => {
    const commands = [typing(FIELD, '95', 1), committing(FIELD, 2), typing(FIELD, ' ', 3), committing(FIELD, 4)];
    expect(draftOf(play(commands)).readings).toEqual({});
    const again = play([...commands, typing(FIELD, '90', 5), committing(FIELD, 6)]);
    expect(draftOf(again).readings.outdoorDryBulb?.text).toBe('90');
    expect(again.readings).toHaveLength(3);
  });

  it('that were never there are not taken away by a blank text', () => {
    expect(play([typing(FIELD, '', 1), committing(FIELD, 2)]).readings).toEqual([]);
  });

  it('typed again with the same text are new readings: they are fresher', () => {
    const state = play([typing(FIELD, '95', 1), committing(FIELD, 2), typing(FIELD, '95', 3), committing(FIELD, 4)]);
    expect(draftOf(state).readings.outdoorDryBulb?.takenAt).toBe(timeAt(3));
  });

  it('are as old as their last keystroke, however late they are committed', () => {
    const left = play([typing(FIELD, '9', 1), typing(FIELD, '95', 2)]);
    expect(draftOf(left).edits[FIELD]?.editedAt).toBe(timeAt(2));
    const committed = applyCommand(left, committing(FIELD, 3000));
    expect(draftOf(committed).readings.outdoorDryBulb?.takenAt).toBe(timeAt(2));
  });

  it('are asked again after an adjustment and stay in the history', () => {
    const state = play([typing(FIELD, '95', 1), committing(FIELD, 2), { ...told(3), do: 'retake' }]);
    expect(draftOf(state).readings).toEqual({});
    expect(state.readings).toHaveLength(1);
    const again = play([
      typing(FIELD, '95', 1),
      committing(FIELD, 2),
      { ...told(3), do: 'retake' },
      typing(FIELD, '94', 4),
      committing(FIELD, 5),
    ]);
    expect(draftOf(again).readings.outdoorDryBulb?.text).toBe('94');
    expect(again.readings[1]?.supersedes).toBeUndefined();
  });

  it('stand again, with the clock, when the adjustment is taken back; what was read since stays', () => {
    const SUCTION = 'reading:suctionPressure';
    const runningSince = timeAt(0);
    const before = play([
      typing(FIELD, '95', 1),
      committing(FIELD, 2),
      typing(SUCTION, '118', 3),
      committing(SUCTION, 4),
    ]);
    const after = [
      { ...told(5), do: 'retake' },
      { ...told(6), do: 'visit', patch: { runningSince: timeAt(6) } },
      typing(FIELD, '94', 7),
      committing(FIELD, 8),
      { ...told(9), do: 'take-back-retake', retired: before.retired, runningSince, tests: before.visit.tests },
    ] as const satisfies readonly CheckCommand[];
    const { readings, visit } = draftOf(after.reduce<CheckState>(applyCommand, before));
    expect(readings.suctionPressure?.text).toBe('118');
    expect(readings.outdoorDryBulb?.text).toBe('94');
    expect(visit.runningSince).toBe(runningSince);
  });

  it('survive the loss of the row of their check', () => {
    const store = new Rows();
    let state: CheckState | undefined;
    for (const command of [typing(FIELD, '95', 1), committing(FIELD, 2), typing('typed:elevation', '650', 3)]) {
      const after = applyCommand(state, command);
      store.write(state, after);
      state = after;
    }
    store.rows.delete(CHECK);
    const draft = draftOf(store.read() as CheckState);
    expect(draft.readings.outdoorDryBulb?.text).toBe('95');
    expect(draft.edits['typed:elevation']?.text).toBe('650');
  });
});

describe('an airflow that was worked out', () => {
  const FLOW = 'reading:airflow';
  const bringing = (n: number): CheckCommand => ({
    ...told(n),
    do: 'bring',
    value: { text: '1184', unit: 'cfm' },
    workedOut: { method: 'temperature-rise-electric', plusMinus: 68 },
    readingId: idAt(n),
  });

  it('stands with its ± in place of the one before, and of what is being typed', () => {
    const state = play([typing(FLOW, '1100', 1), committing(FLOW, 2), typing(FLOW, '12', 3), bringing(4)]);
    const { readings, edits } = draftOf(state);
    expect(readings.airflow).toMatchObject({
      text: '1184',
      unit: 'cfm',
      place: 'air-handler',
      takenAt: timeAt(4),
      workedOut: { method: 'temperature-rise-electric', plusMinus: 68 },
      supersedes: idAt(2),
    });
    expect(edits).toEqual({});
  });

  it('gives way to one that is typed: the ± was not of that', () => {
    const { airflow } = draftOf(play([bringing(1), typing(FLOW, '1250', 2), committing(FLOW, 3)])).readings;
    expect(airflow?.text).toBe('1250');
    expect(airflow).not.toHaveProperty('workedOut');
  });
});

describe('a removed check', () => {
  it('comes back as it was', () => {
    const before = [typing('reading:airflow', '1200', 1)];
    const state = play([...before, { ...told(2), do: 'remove' }]);
    expect(state.deletedAt).toBe(timeAt(2));
    expect(draftOf(play([...before, { ...told(2), do: 'remove' }, { ...told(1), do: 'restore' }]))).toEqual(
      draftOf(play(before)),
    );
  });

  it('comes back when something is typed into it, as another tab may do', () => {
    const state = play([{ ...told(1), do: 'remove' }, typing('reading:airflow', '1200', 2)]);
    expect(state.deletedAt).toBeUndefined();
  });
});
