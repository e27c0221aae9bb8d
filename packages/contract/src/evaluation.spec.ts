import {
  LENGTH_UNITS,
  MASS_UNITS,
  POWER_UNITS,
  PREFLIGHT_ITEMS,
  READING_DIMENSIONS,
  READING_IDS,
} from '@chargewright/engine';
import type { Dimension, EvaluationRequest } from '@chargewright/engine';
import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import * as z from 'zod';
import { evaluationRequest, readEvaluationRequest } from './evaluation';

const EXAMPLE = {
  procedure: 'general-rules',
  setup: {
    refrigerant: 'R-410A',
    meteringDevice: 'fixed-orifice',
    elevation: { value: 650, unit: 'ft' },
    superheatRange: { low: 4, high: 25, unit: 'deltaF' },
  },
  visit: { runningMinutes: 22, lowestReturnDryBulb: { value: 74, unit: 'degF' }, preflight: { panelsOn: 'ok' } },
  readings: {
    returnDryBulb: { value: 78, unit: 'degF' },
    returnWetBulb: { value: 65, unit: 'degF', plusMinus: { value: 1, unit: 'deltaF', kind: 'limit' }, ageSeconds: 40 },
    suctionPressure: { value: 118, unit: 'psig' },
  },
} as const;

/** Where the units of each quantity end: from the contract's list of units, not from the code. */
const UNITS: Readonly<Record<Dimension, { readonly units: readonly string[]; readonly plusMinus: readonly string[] }>> =
  {
    temperature: { units: ['degF', 'degC', 'K'], plusMinus: ['deltaF', 'deltaC'] },
    pressure: {
      units: ['psig', 'psia', 'kPag', 'kPaa', 'barg', 'bara', 'inHgVac'],
      plusMinus: ['psi', 'kPa', 'bar'],
    },
    humidity: { units: ['%'], plusMinus: ['%'] },
    airflow: { units: ['cfm', 'm3/h', 'L/s'], plusMinus: ['cfm', 'm3/h', 'L/s', '%'] },
    staticPressure: { units: ['inH2O', 'Pa'], plusMinus: ['inH2O', 'Pa'] },
    current: { units: ['A'], plusMinus: ['A'] },
    voltage: { units: ['V'], plusMinus: ['V'] },
  };
const EVERY_UNIT = [
  ...new Set(Object.values(UNITS).flatMap(({ units, plusMinus }) => [...units, ...plusMinus])),
  ...LENGTH_UNITS,
  ...MASS_UNITS,
  ...POWER_UNITS,
];

const faultsOf = (body: unknown) => {
  const read = readEvaluationRequest(body);
  return read.ok ? [] : read.faults;
};
const faultPaths = (body: unknown) => faultsOf(body).map(({ path, kind }) => `${path} ${kind}`);

/** Every field that the schema knows, as a dotted path with an object for what holds it. */
function knownPaths(schema: unknown, path: readonly string[] = []): readonly (readonly string[])[] {
  const inner = schema instanceof z.ZodExactOptional || schema instanceof z.ZodDefault ? schema.unwrap() : schema;
  const own = path.length === 0 ? [] : [path];
  if (!(inner instanceof z.ZodObject)) return own;
  return [...own, ...Object.entries(inner.shape).flatMap(([key, field]) => knownPaths(field, [...path, key]))];
}

const nest = (path: readonly string[], value: unknown): unknown =>
  path.reduceRight((inner, key) => ({ [key]: inner }), value);

describe('reading a request', () => {
  it('takes the request of the contract as the engine takes it', () => {
    const read = readEvaluationRequest(EXAMPLE);
    // the engine's type: a drift of the two does not compile
    const request: EvaluationRequest | undefined = read.ok ? read.request : undefined;
    expect(request).toEqual(EXAMPLE);
  });

  it('requires refrigerant and metering device only, also when there is no setup', () => {
    expect(faultPaths({})).toEqual(['setup.refrigerant missing', 'setup.meteringDevice missing']);
    expect(readEvaluationRequest({ setup: { refrigerant: 'R-32', meteringDevice: 'txv' } })).toMatchObject({
      ok: true,
      request: { readings: {} },
    });
  });

  it('ignores what it does not know', () => {
    const body = { ...EXAMPLE, note: null, setup: { ...EXAMPLE.setup, colour: 'grey' } };
    expect(readEvaluationRequest(body)).toEqual({ ok: true, request: EXAMPLE });
  });

  it('tells every fault at once, an amount at its own path', () => {
    const body = {
      procedure: 7,
      setup: {
        refrigerant: 410,
        meteringDevice: 'piston',
        elevation: 650,
        targetSubcooling: { value: 10, unit: 'degF' },
      },
      visit: { preflight: { panelsOn: 'yes' }, iceSeen: 'no', earlier: { readings: {} } },
      readings: {
        returnDryBulb: { value: '78', unit: 'psig' },
        returnWetBulb: {
          value: 65,
          unit: 'degF',
          plusMinus: { value: 1, unit: 'degF' },
          instrumentId: 'x'.repeat(101),
        },
        suctionPressure: { unit: 'psig' },
        liquidPressure: null,
      },
    };
    expect(faultPaths(body).sort()).toEqual(
      [
        'procedure wrong-type',
        'setup.refrigerant wrong-type',
        'setup.meteringDevice unknown-value',
        'setup.elevation wrong-type',
        'setup.targetSubcooling temperature-unit-on-difference',
        'visit.preflight.panelsOn unknown-value',
        'visit.iceSeen wrong-type',
        'visit.earlier.minutesAgo missing',
        'readings.returnDryBulb wrong-type',
        'readings.returnDryBulb wrong-unit',
        'readings.returnWetBulb.plusMinus temperature-unit-on-difference',
        'readings.returnWetBulb.instrumentId too-long',
        'readings.suctionPressure missing',
        'readings.liquidPressure null',
      ].sort(),
    );
  });

  it('keeps the rest of a request in which a key has no value', () => {
    const body = { ...EXAMPLE, visit: undefined, readings: { ...EXAMPLE.readings, outdoorDryBulb: undefined } };
    expect(readEvaluationRequest(body)).toMatchObject({ rest: { setup: EXAMPLE.setup, readings: EXAMPLE.readings } });
  });

  it('keeps what parsed, so that the cross-checks can look at it', () => {
    const body = {
      setup: { refrigerant: 'R-410A', meteringDevice: 'piston' },
      visit: { earlier: { minutesAgo: 'ten', readings: { returnDryBulb: { value: 70, unit: 'degF' } } } },
      readings: {
        returnDryBulb: { value: 78, unit: 'degF' },
        returnWetBulb: { value: 81, unit: 'degF', plusMinus: { value: 1, unit: 'degF' } },
        outdoorDryBulb: { value: 95, unit: 'psig' },
      },
    };
    expect(readEvaluationRequest(body)).toMatchObject({
      ok: false,
      rest: {
        setup: { refrigerant: 'R-410A' },
        visit: {},
        readings: { returnDryBulb: { value: 78, unit: 'degF' }, returnWetBulb: { value: 81, unit: 'degF' } },
      },
    });
  });

  it.each([null, 7, 'text', true, [EXAMPLE]])('refuses a body that is no object: %j', (body) => {
    expect(faultsOf(body)).toMatchObject([{ path: '', part: '' }]);
  });

  it('refuses numbers that JSON can write and a double cannot hold', () => {
    expect(
      faultPaths(JSON.parse('{"setup":{"refrigerant":"R-32","meteringDevice":"txv"},"visit":{"hoursOff":1e999}}')),
    ).toEqual(['visit.hoursOff wrong-type']);
  });
});

describe('a maker’s table', () => {
  const CHART = {
    kind: 'superheat',
    rows: { unit: 'degF', values: [75, 85] },
    columns: { unit: 'degF', values: [60, 66] },
    unit: 'deltaF',
    cells: [
      [12, 21],
      [null, 15],
    ],
    tolerance: { value: 4, unit: 'deltaF' },
    leastOutdoor: { value: 55, unit: 'degF' },
  };
  const setup = { refrigerant: 'R-32', meteringDevice: 'txv' };

  it('is taken as the engine takes it, alone or among several, dashes and all', () => {
    for (const charts of [{ makersChart: CHART }, { makersCharts: [CHART, { ...CHART, kind: 'subcooling' }] }]) {
      const read = readEvaluationRequest({ setup: { ...setup, ...charts } });
      expect(read).toEqual({ ok: true, request: { setup: { ...setup, ...charts }, readings: {} } });
    }
  });

  it('tells every fault of its shape at once, down to the cell', () => {
    const chart = {
      kind: 'by-feel',
      rows: { unit: 'F', values: [75, '85'] },
      columns: null,
      unit: 'deltaF',
      cells: [[12, true], 15],
      tolerance: { value: 4, unit: 'degF' },
    };
    expect(faultPaths({ setup: { ...setup, makersChart: chart } }).sort()).toEqual([
      'setup.makersChart.cells.0.1 wrong-type',
      'setup.makersChart.cells.1 wrong-type',
      'setup.makersChart.columns null',
      'setup.makersChart.kind unknown-value',
      'setup.makersChart.rows wrong-unit',
      'setup.makersChart.rows.values.1 wrong-type',
      'setup.makersChart.tolerance temperature-unit-on-difference',
    ]);
    expect(faultPaths({ setup: { ...setup, makersChart: { kind: 'superheat', cells: [[1]] } } })).toEqual([
      'setup.makersChart.unit missing',
    ]);
    expect(faultPaths({ setup: { ...setup, makersCharts: CHART } })).toEqual(['setup.makersCharts wrong-type']);
  });

  it('that is faulty leaves its place to the others, so that their values are looked at too', () => {
    const faulty = { ...CHART, cells: 'none' };
    const read = readEvaluationRequest({ setup: { ...setup, makersCharts: [faulty, CHART, null] } });
    expect(read).toMatchObject({
      ok: false,
      rest: { setup: { ...setup, makersCharts: [undefined, CHART, undefined] } },
    });
  });
});

describe('null', () => {
  const paths = knownPaths(evaluationRequest);

  it('is looked for in every field there is', () => {
    expect(paths.length).toBeGreaterThan(2 * READING_IDS.length + PREFLIGHT_ITEMS.length);
  });

  it.each(paths.map((path) => [path.join('.'), path] as const))('is a fault at %s', (_name, path) => {
    const nulls = faultsOf(nest(path, null)).filter(({ kind }) => kind === 'null');
    expect(nulls.map(({ part }) => part)).toEqual([path.join('.')]);
  });
});

describe.each(READING_IDS)('%s', (id) => {
  const { units, plusMinus } = UNITS[READING_DIMENSIONS[id]];
  const accepted = (reading: unknown) => readEvaluationRequest({ ...EXAMPLE, readings: { [id]: reading } }).ok;

  it('takes the units of its quantity and no other', () => {
    expect(EVERY_UNIT.filter((unit) => accepted({ value: 1, unit }))).toEqual(
      EVERY_UNIT.filter((unit) => units.includes(unit)),
    );
  });

  it('takes a ± in units of a difference and no other', () => {
    const takes = (unit: string) => accepted({ value: 1, unit: units[0], plusMinus: { value: 1, unit } });
    expect(EVERY_UNIT.filter(takes)).toEqual(EVERY_UNIT.filter((unit) => plusMinus.includes(unit)));
  });
});

it('reads any JSON without throwing, and what it keeps of it has no fault', () => {
  const amounts = fc.record({
    value: fc.oneof(fc.double(), fc.jsonValue()),
    unit: fc.constantFrom(...EVERY_UNIT, 'x', null),
  });
  const fields = (names: readonly string[]) =>
    fc.dictionary(fc.constantFrom(...names), fc.oneof(amounts, fc.jsonValue()));
  const body = fc.record(
    {
      procedure: fc.jsonValue(),
      setup: fields([
        'refrigerant',
        'meteringDevice',
        'elevation',
        'lineSet',
        'superheatRange',
        'chargeMode',
        'makersChart',
      ]),
      visit: fields(['runningMinutes', 'earlier', 'preflight', 'addedBefore', 'iceSeen']),
      readings: fields(READING_IDS),
    },
    { requiredKeys: [] },
  );
  fc.assert(
    fc.property(fc.oneof(body, fc.jsonValue()), (value) => {
      const read = readEvaluationRequest(value);
      if (read.ok) return;
      expect(read.faults.length).toBeGreaterThan(0);
      const again = readEvaluationRequest({ ...read.rest, setup: { ...read.rest.setup } });
      const left = again.ok ? [] : again.faults;
      const required = ['setup.refrigerant', 'setup.meteringDevice'];
      expect(left.filter(({ path, kind }) => kind !== 'missing' || !required.includes(path))).toEqual([]);
    }),
    { numRuns: 2_000 },
  );
});

it('never asks zod to generate code, which a strict content security policy reports', () => {
  expect(z.config().jitless).toBe(true);
});
