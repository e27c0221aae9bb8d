import { describe, expect, it } from 'vitest';
import { isNewerRow, storedRow, type StoredRow } from './stored-check';

const ID = '01900000-0000-7000-8000-000000000001';
const CHECK_ID = '01900000-0000-7000-8000-000000000002';
const TIME = '2026-06-01T12:00:00.000Z';

const reading = {
  id: ID,
  kind: 'reading',
  schema: 1,
  body: {
    id: ID,
    checkId: CHECK_ID,
    quantity: 'returnWetBulb',
    text: '64,50',
    unit: 'degF',
    place: 'return',
    takenAt: TIME,
    source: 'typed',
  },
} satisfies StoredRow;
const edit = {
  id: ID,
  kind: 'edit',
  schema: 1,
  body: { checkId: CHECK_ID, field: 'typed:elevation', text: '-', unit: 'ft', editedAt: TIME },
} satisfies StoredRow;
const check = {
  id: CHECK_ID,
  kind: 'check',
  schema: 1,
  body: {
    createdAt: TIME,
    openedAt: TIME,
    updatedAt: TIME,
    setup: { refrigerant: 'R-410A', meteringDevice: 'txv' },
    visit: {
      preflight: { panelsOn: 'ok' },
      runningSince: TIME,
      tests: { liquidShutIn: true, bulb: 'loose', valve: 'steady' },
      firstSet: { takenAt: TIME, readings: { returnWetBulb: { text: '64,5', unit: 'degF' } } },
    },
    typed: { elevation: { text: '650', unit: 'ft' }, superheatLow: { text: '6', unit: 'deltaF' } },
    retired: [ID],
    readingCount: 1,
  },
} satisfies StoredRow;

const worksheet = {
  id: ID,
  kind: 'worksheet',
  schema: 2,
  body: {
    checkId: CHECK_ID,
    page: 'airflow',
    updatedAt: TIME,
    typed: { heaterCurrent: { text: '41,5', unit: 'A' } },
    choices: { method: 'static-pressure' },
    rows: [
      ['0.3', '1300'],
      ['0.5', '–'],
    ],
  },
} satisfies StoredRow;

const isGood = (row: unknown) => storedRow.safeParse(row).success;
const withBody = (row: { body: object }, change: object) => ({ ...row, body: { ...row.body, ...change } });

describe('a stored row', () => {
  it.each([reading, edit, check, worksheet])('of kind $kind is read as it was written', (row) => {
    expect(storedRow.parse(structuredClone(row))).toEqual(row);
  });

  it('may say what the target subcooling holds for and how an inverter runs', () => {
    const setup = { refrigerant: 'R-32', targetSubcoolingPort: 'discharge', chargeMode: 'off' };
    const row = withBody(check, { setup });
    expect(storedRow.parse(structuredClone(row))).toEqual(row);
  });

  it('of a reading that was worked out says how, and its ±', () => {
    const workedOut = { method: 'temperature-rise-gas', plusMinus: 68.5 };
    const row = withBody(reading, { quantity: 'airflow', unit: 'cfm', workedOut });
    expect(storedRow.parse(structuredClone(row))).toEqual(row);
    for (const wrong of [{ ...workedOut, plusMinus: -1 }, { ...workedOut, method: 'by feel' }, 68.5]) {
      expect(isGood(withBody(reading, { workedOut: wrong }))).toBe(false);
    }
  });

  it('keeps any text that was typed, not only numbers', () => {
    expect(isGood(withBody(reading, { text: 'about 64?' }))).toBe(true);
    expect(isGood(withBody(edit, { text: '' }))).toBe(true);
  });

  it.each([
    ['no body', { ...reading, body: undefined }],
    ['an id that is no UUIDv7', { ...reading, id: 'b0a1f0b2-3c4d-4e5f-8a9b-0c1d2e3f4a5b' }],
    ['an unknown kind', { ...reading, kind: 'note' }],
    ['an unknown quantity', withBody(reading, { quantity: 'shoeSize' })],
    ['a number in place of a text', withBody(reading, { text: 64.5 })],
    ['a time that is none', withBody(reading, { takenAt: 'yesterday' })],
    ['an endless text', withBody(reading, { text: '6'.repeat(201) })],
    ['an unknown field', withBody(edit, { field: 'reading:elevation' })],
    ['an unknown metering device', withBody(check, { setup: { meteringDevice: 'tap' } })],
    ['an unknown state of a bulb', withBody(check, { visit: { preflight: {}, tests: { bulb: 'gone' } } })],
    ['an unknown charge mode', withBody(check, { setup: { chargeMode: true } })],
    ['a target for no port', withBody(check, { setup: { targetSubcoolingPort: 'none' } })],
    ['a missing pre-flight', withBody(check, { visit: {} })],
    ['another version', { ...check, schema: 2 }],
    ['the version of another kind', { ...worksheet, schema: 1 }],
    ['a sheet of no page', withBody(worksheet, { page: 'attic' })],
    ['a number in place of a chosen text', withBody(worksheet, { choices: { method: 1 } })],
    ['an endless table', withBody(worksheet, { rows: Array(101).fill(['1', '2']) })],
    [
      'endless fields',
      withBody(worksheet, { choices: Object.fromEntries(Array.from({ length: 101 }, (_, n) => [n, ''])) }),
    ],
  ])('with %s is refused', (_, row) => {
    expect(isGood(row)).toBe(false);
  });
});

describe('a row of a newer version', () => {
  it('is known by the schema of its kind, and not touched', () => {
    expect(isNewerRow({ ...check, schema: 2 })).toBe(true);
    expect(isNewerRow({ kind: 'photo', schema: 2 })).toBe(true);
    expect(isNewerRow({ ...worksheet, schema: 3 })).toBe(true);
    for (const row of [check, worksheet, { kind: 'photo', schema: 1 }, null, 'row', {}]) {
      expect(isNewerRow(row)).toBe(false);
    }
  });
});
