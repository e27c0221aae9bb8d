/** What could cause it, system by system: the review of the fault table and of the rule by which causes are listed. */
import { describe, expect, it } from 'vitest';
import type { Cause, Diagnosis, DiagnosisNote, Measurement } from '../diagnosis/diagnosis-codes';
import { bubblePressurePa } from '../refrigerants/saturation';
import { PA_PER_PSI, temperatureToK } from '../units';
import { diagnoseCheck } from './diagnose-check';
import { evaluateCheck } from './evaluate-check';
import type { EvaluationRequest, ReadingInput } from './request';
import { orificeSystem, valveSystem } from './testing/faulty-systems';
import type { ReadingChanges } from './testing/healthy-systems';
import { inputOf, withPlusMinus } from './testing/healthy-systems';

function diagnosisOf(request: EvaluationRequest): Diagnosis {
  const input = inputOf(request);
  return diagnoseCheck(input, evaluateCheck(input));
}

interface Expected {
  readonly causes: Readonly<Partial<Record<Cause, Measurement | null>>>;
  readonly notes?: readonly DiagnosisNote[];
}
type Case = readonly [name: string, request: EvaluationRequest, expected: Expected];

const NO_LIQUID_PAIR = { liquidPressure: null, liquidLineTemperature: null } as const;
const ASSUMED_PORT = { highSidePort: null } as const;
const standing = (refrigerant: 'R-22' | 'R-410A', excessF: number): ReadingChanges => ({
  standingOutdoorCoilTemperature: 85,
  standingPressure: {
    value: bubblePressurePa({ refrigerant, temperatureK: temperatureToK(85 + excessF, 'degF') }) / PA_PER_PSI,
    unit: 'psia',
  } satisfies ReadingInput,
});
const SHUT_IN = { tests: { liquidShutIn: true } } as const;
const DROP = { drierInletTemperature: 96, drierOutletTemperature: 88 } as const;
const SMALL_DROP = { drierInletTemperature: 96, drierOutletTemperature: 95.5 } as const;
const CURRENT = (amps: number) =>
  ({
    setup: { expectedCompressorCurrent: { value: 12, unit: 'A' } },
    readings: { compressorCurrent: amps },
  }) as const;

const UNDERCHARGED_ORIFICE = { evaporatingF: 29.3, condensingF: 93, superheatF: 30, subcoolingF: 2, splitF: 11 };
const RESTRICTED_ORIFICE = { evaporatingF: 29.3, condensingF: 101, superheatF: 32, subcoolingF: 18, splitF: 11 };
const STARVED_VALVE = { evaporatingF: 29, condensingF: 100, superheatF: 34, subcoolingF: 17, splitF: 10 };
const DIRTY_CONDENSER = { evaporatingF: 44, condensingF: 124, superheatF: 7, splitF: 12 };
const HIGH_HEAD_VALVE = { condensingF: 118, subcoolingF: 18 };

const SINGLE_FAULTS: readonly Case[] = [
  ['undercharge, orifice', orificeSystem(UNDERCHARGED_ORIFICE), { causes: { 'low-charge': 'leak-search' } }],
  [
    'undercharge, orifice, after a search for the leak',
    orificeSystem(UNDERCHARGED_ORIFICE, { visit: { leakSearch: 'none-found' } }),
    { causes: { 'low-charge': null } },
  ],
  [
    'undercharge, valve: superheat is held, subcooling shows it',
    valveSystem({ subcoolingF: 3 }),
    { causes: { 'low-charge': 'leak-search' }, notes: ['one-sign'] },
  ],
  [
    'undercharge, valve wide open',
    valveSystem({ evaporatingF: 29, condensingF: 96, superheatF: 33, subcoolingF: 2, splitF: 11 }),
    { causes: { 'low-charge': 'leak-search' } },
  ],
  ['restriction, orifice', orificeSystem(RESTRICTED_ORIFICE), { causes: { restriction: 'drier-drop' } }],
  [
    'restriction, valve: the valve itself looks alike',
    valveSystem(STARVED_VALVE),
    { causes: { restriction: 'drier-drop', 'valve-closed': 'bulb-and-hunting' } },
  ],
  [
    'air in the system, valve: overcharge looks alike',
    valveSystem(HIGH_HEAD_VALVE),
    { causes: { overcharge: 'air-test', 'air-in-system': 'air-test' } },
  ],
  [
    'overcharge, orifice',
    orificeSystem({ evaporatingF: 46, condensingF: 122, superheatF: 7, subcoolingF: 22, splitF: 15 }),
    { causes: { overcharge: null } },
  ],
  [
    'low airflow, orifice',
    orificeSystem({ evaporatingF: 29, condensingF: 98, superheatF: 7, splitF: 24 }),
    { causes: { 'low-airflow': 'airflow' } },
  ],
  [
    'low airflow, valve',
    valveSystem({ evaporatingF: 29, condensingF: 98, splitF: 24 }),
    { causes: { 'low-airflow': 'airflow' } },
  ],
  [
    'dirty condenser, orifice with a target for its subcooling',
    orificeSystem(DIRTY_CONDENSER, { setup: { targetSubcooling: { value: 10, unit: 'deltaF' } } }),
    { causes: { 'condenser-air': 'condenser-look' } },
  ],
  [
    'dirty condenser, orifice without: what is usual for others may be an overcharge here',
    orificeSystem(DIRTY_CONDENSER),
    { causes: { overcharge: 'condenser-look', 'condenser-air': 'condenser-look' } },
  ],
  [
    'dirty condenser, valve: air in the system looks alike until subcooling falls',
    valveSystem({ condensingF: 118 }),
    { causes: { 'air-in-system': 'air-test', 'condenser-air': 'condenser-look' }, notes: ['one-sign'] },
  ],
  [
    'dirty condenser, valve, subcooling low',
    valveSystem({ condensingF: 118, subcoolingF: 4 }),
    { causes: { 'condenser-air': 'condenser-look' } },
  ],
  [
    'compressor that pumps poorly, orifice',
    orificeSystem({ evaporatingF: 54, condensingF: 92, superheatF: 7, subcoolingF: 4, splitF: 10 }),
    { causes: { compressor: 'compressor-current' } },
  ],
  [
    'compressor that pumps poorly, valve, its current known',
    valveSystem({ evaporatingF: 54, condensingF: 92, splitF: 10 }, CURRENT(9)),
    { causes: { compressor: null } },
  ],
  [
    'valve stuck closed: no drop over the drier',
    valveSystem(STARVED_VALVE, { readings: SMALL_DROP }),
    { causes: { 'valve-closed': 'bulb-and-hunting' } },
  ],
  [
    'valve stuck open',
    valveSystem({ evaporatingF: 54, superheatF: 1.5, subcoolingF: 3, splitF: 12 }),
    { causes: { 'valve-open': 'bulb-and-hunting' } },
  ],
];

const TESTED: readonly Case[] = [
  [
    'a drop over the drier leaves the restriction alone with what looks like it',
    valveSystem(STARVED_VALVE, { readings: DROP }),
    { causes: { restriction: 'bulb-and-hunting', 'valve-closed': 'bulb-and-hunting' } },
  ],
  [
    'a drop over the drier of a system that looks right',
    valveSystem({}, { readings: DROP }),
    { causes: { restriction: null } },
  ],
  [
    'no drop over the drier: the orifice itself',
    orificeSystem(RESTRICTED_ORIFICE, { readings: SMALL_DROP }),
    { causes: { restriction: 'orifice-look' } },
  ],
  [
    'no air: overcharge remains',
    valveSystem(HIGH_HEAD_VALVE, { visit: SHUT_IN, readings: standing('R-410A', 0) }),
    { causes: { overcharge: null } },
  ],
  [
    'air found: the subcooling is apparent and shows no overcharge',
    valveSystem(HIGH_HEAD_VALVE, { visit: SHUT_IN, readings: standing('R-410A', 12) }),
    { causes: { 'air-in-system': null }, notes: ['subcooling-apparent'] },
  ],
  [
    'an air test that does not count is still open',
    valveSystem(HIGH_HEAD_VALVE, { readings: standing('R-410A', 12) }),
    { causes: { overcharge: 'air-test', 'air-in-system': 'air-test' } },
  ],
  [
    'a loose bulb counts although the superheat is in the window',
    valveSystem({}, { visit: { tests: { bulb: 'loose' } } }),
    { causes: { 'valve-open': null } },
  ],
  [
    'a bulb that lost its charge',
    valveSystem(STARVED_VALVE, { visit: { tests: { bulb: 'charge-lost' } }, readings: SMALL_DROP }),
    { causes: { 'valve-closed': null } },
  ],
  [
    'a valve that hunts is said to',
    valveSystem({ superheatF: 1.5 }, { visit: { tests: { valve: 'hunting' } } }),
    { causes: { 'valve-open': 'bulb-and-hunting' }, notes: ['one-sign', 'hunting'] },
  ],
  [
    'measured airflow enough: the split above is not low airflow',
    orificeSystem(
      { evaporatingF: 29, superheatF: 7, splitF: 24 },
      { setup: { nominalCapacity: { value: 3, unit: 'ton' } }, readings: { airflow: 1250 } },
    ),
    { causes: {}, notes: ['no-pattern'] },
  ],
  [
    'measured airflow low',
    orificeSystem({}, { setup: { nominalCapacity: { value: 3, unit: 'ton' } }, readings: { airflow: 800 } }),
    { causes: { 'low-airflow': null } },
  ],
  [
    'a standing pressure under saturation puts the refrigerant in doubt',
    valveSystem({ subcoolingF: 3 }, { visit: SHUT_IN, readings: standing('R-410A', -20) }),
    { causes: { 'low-charge': 'leak-search' }, notes: ['one-sign', 'refrigerant-in-doubt'] },
  ],
];

const SEVERAL_FAULTS: readonly Case[] = [
  [
    'low charge and low airflow, orifice',
    orificeSystem({ evaporatingF: 26, condensingF: 96, superheatF: 25, subcoolingF: 2, splitF: 23 }),
    { causes: { 'low-charge': 'leak-search', 'low-airflow': 'airflow' }, notes: ['no-single-cause', 'frozen'] },
  ],
  [
    'overcharge and an open valve',
    valveSystem({ superheatF: 1.5, subcoolingF: 18 }),
    {
      causes: { overcharge: 'air-test', 'air-in-system': 'air-test', 'valve-open': 'bulb-and-hunting' },
      notes: ['no-single-cause'],
    },
  ],
  [
    'a drop over the drier that does not explain the low subcooling',
    valveSystem({ subcoolingF: 3 }, { readings: DROP }),
    { causes: { 'low-charge': 'leak-search', restriction: null }, notes: ['one-sign'] },
  ],
  [
    'low charge and low airflow that hide each other behind a superheat on its target',
    orificeSystem({ condensingF: 96, subcoolingF: 2, splitF: 23 }),
    { causes: { 'low-charge': 'leak-search', 'low-airflow': 'airflow' }, notes: ['no-single-cause'] },
  ],
  [
    'a split above with a high suction: low airflow and what raises the suction',
    valveSystem({ evaporatingF: 56, splitF: 25 }),
    {
      causes: { 'low-airflow': 'airflow', 'condenser-air': 'condenser-look', compressor: 'compressor-current' },
      notes: ['no-single-cause'],
    },
  ],
  [
    'superheat far above with a split above: what starves a valve, and low airflow',
    valveSystem({ superheatF: 34, splitF: 25 }, { readings: NO_LIQUID_PAIR }),
    {
      causes: { restriction: 'liquid-pair', 'low-airflow': 'airflow', 'valve-closed': 'bulb-and-hunting' },
      notes: ['no-single-cause'],
    },
  ],
];

const HIGH_SUBCOOLING: readonly Case[] = [
  [
    'low charge is not offered against a high subcooling',
    orificeSystem({ superheatF: 30, subcoolingF: 18 }),
    { causes: { restriction: 'drier-drop' } },
  ],
  [
    'unless the port is only assumed',
    orificeSystem({ superheatF: 30, subcoolingF: 18 }, { setup: ASSUMED_PORT }),
    { causes: { 'low-charge': 'state-port', restriction: 'drier-drop' } },
  ],
  [
    'or the refrigerant is in doubt',
    orificeSystem({ superheatF: 30, subcoolingF: 18 }, { readings: { writtenCondensingTemperature: 90 } }),
    { causes: { 'low-charge': 'confirm-refrigerant', restriction: 'drier-drop' } },
  ],
  [
    'or the head is that of air',
    orificeSystem({ superheatF: 30, subcoolingF: 24, condensingF: 122 }),
    {
      causes: {
        'low-charge': 'air-test',
        restriction: 'drier-drop',
        'air-in-system': 'air-test',
        'condenser-air': 'condenser-look',
      },
      notes: ['no-single-cause'],
    },
  ],
];

const NOTHING: readonly Case[] = [
  ['healthy orifice', orificeSystem({}), { causes: {}, notes: ['nothing-outside'] }],
  ['healthy valve', valveSystem({}), { causes: {}, notes: ['nothing-outside'] }],
  [
    'too close to call',
    orificeSystem({ superheatF: 20.2, subcoolingF: 5.2, splitF: 14 }),
    { causes: {}, notes: ['unclear'] },
  ],
  [
    'instruments too poor for anything',
    withPlusMinus(valveSystem({ superheatF: 30 }), { temperatureF: 30, pressurePsi: 60 }),
    { causes: {}, notes: ['unclear'] },
  ],
  [
    'nothing read',
    orificeSystem(
      {},
      {
        readings: {
          ...NO_LIQUID_PAIR,
          suctionPressure: null,
          suctionLineTemperature: null,
          supplyDryBulb: null,
        },
      },
    ),
    { causes: {}, notes: ['too-little-read'] },
  ],
  ['heating', valveSystem({ subcoolingF: 3 }, { setup: { mode: 'heating' } }), { causes: {}, notes: ['unfit'] }],
  ['mini-split', valveSystem({ subcoolingF: 3 }, { setup: { kind: 'mini-split' } }), { causes: {}, notes: ['unfit'] }],
  ['part stage', valveSystem({ subcoolingF: 3 }, { setup: { stage: 'part' } }), { causes: {}, notes: ['unfit'] }],
  [
    'hoses swapped',
    valveSystem({}, { readings: { suctionPressure: 340, liquidPressure: 118 } }),
    { causes: {}, notes: ['impossible-readings'] },
  ],
  [
    'just started',
    valveSystem({ subcoolingF: 3 }, { visit: { runningMinutes: 9 } }),
    { causes: {}, notes: ['not-steady'] },
  ],
  [
    'at minute 10 after thawing it is read for the diagnosis',
    valveSystem({ subcoolingF: 3 }, { visit: { runningMinutes: 10 } }),
    { causes: { 'low-charge': 'leak-search' }, notes: ['one-sign'] },
  ],
  [
    'too cold outdoors, whatever the running time',
    valveSystem({ outdoorF: 50, condensingF: 70, subcoolingF: 3 }, { visit: { runningMinutes: 12 } }),
    { causes: {}, notes: ['outside-conditions'] },
  ],
];

const PARTLY_READ: readonly Case[] = [
  [
    'superheat above and nothing else: all that starve an orifice',
    orificeSystem({ superheatF: 30 }, { readings: { ...NO_LIQUID_PAIR, supplyDryBulb: null } }),
    { causes: { 'low-charge': 'liquid-pair', restriction: 'liquid-pair' }, notes: ['one-sign'] },
  ],
  [
    'superheat below and nothing else: all that flood it',
    orificeSystem({ superheatF: 7 }, { readings: { ...NO_LIQUID_PAIR, supplyDryBulb: null } }),
    {
      causes: {
        overcharge: 'liquid-pair',
        'low-airflow': 'supply-and-wet-bulb',
        'condenser-air': 'condenser-look',
        compressor: 'compressor-current',
      },
      notes: ['one-sign'],
    },
  ],
  [
    'superheat above, subcooling 6.5: between the levels it says nothing',
    orificeSystem({ superheatF: 30, subcoolingF: 6.5 }),
    { causes: { 'low-charge': 'drier-drop', restriction: 'drier-drop' }, notes: ['one-sign'] },
  ],
  [
    'superheat above, subcooling 11 without a target: not low, so no low charge',
    orificeSystem({ superheatF: 30, subcoolingF: 11 }),
    { causes: { restriction: 'drier-drop' }, notes: ['one-sign'] },
  ],
  [
    'no high-side port: the approach stands in for the head and the subcooling',
    valveSystem(
      { superheatF: 33 },
      {
        setup: { highSidePort: 'none', targetSubcooling: null },
        readings: { liquidPressure: null, liquidLineTemperature: 86 },
      },
    ),
    { causes: { restriction: 'drier-drop', 'valve-closed': 'bulb-and-hunting' } },
  ],
  [
    'head raised on purpose is no sign',
    valveSystem({ condensingF: 118 }, { visit: { headRaised: true } }),
    { causes: {}, notes: ['nothing-outside'] },
  ],
  [
    'a dirty filter fits low airflow, and is no sign by itself',
    orificeSystem({}, { visit: { preflight: { filterAndCoil: 'not-ok' } } }),
    { causes: {}, notes: ['nothing-outside'] },
  ],
  [
    'a frozen coil still tells its cause',
    orificeSystem({ ...UNDERCHARGED_ORIFICE, evaporatingF: 24 }),
    { causes: { 'low-charge': 'leak-search' }, notes: ['frozen'] },
  ],
  [
    'a house still warm: the readings may move yet',
    valveSystem({ subcoolingF: 3 }, { readings: { returnDryBulb: 82, returnWetBulb: 68, supplyDryBulb: 63.5 } }),
    { causes: { 'low-charge': 'leak-search' }, notes: ['one-sign', 'pull-down'] },
  ],
];

const GROUPS = { SINGLE_FAULTS, TESTED, SEVERAL_FAULTS, HIGH_SUBCOOLING, NOTHING, PARTLY_READ };

describe.each(Object.entries(GROUPS))('%s', (_, cases) => {
  it.each(cases.map(([name, request, expected]) => ({ name, request, expected })))('$name', ({ request, expected }) => {
    const { causes, notes } = diagnosisOf(request);
    expect(Object.fromEntries(causes.map(({ cause, nextMeasurement }) => [cause, nextMeasurement]))).toEqual(
      expected.causes,
    );
    expect(notes).toEqual(expected.notes ?? []);
  });
});

describe('what is said for and against a cause', () => {
  const found = (request: EvaluationRequest, cause: Cause) => {
    const finding = diagnosisOf(request).causes.find((each) => each.cause === cause);
    if (finding === undefined) throw new Error(`${cause} is not listed`);
    return finding;
  };
  const codes = (evidence: readonly { readonly code: string }[]) => evidence.map(({ code }) => code);

  it('has every clear reading, with its uncertainty', () => {
    const { fits, doesNotFit } = found(orificeSystem(UNDERCHARGED_ORIFICE), 'low-charge');
    expect(codes(fits)).toEqual(['suction-low', 'head-low', 'superheat-above-target', 'subcooling-low', 'split-below']);
    expect(doesNotFit).toEqual([]);
    const superheat = fits.find(({ code }) => code === 'superheat-above-target');
    expect(superheat?.figures).toMatchObject({
      deviation: { kind: 'differenceK', value: expect.closeTo((15 * 5) / 9, 4) as number },
    });
    const { uncertainty } = (superheat?.figures ?? {}) as Record<string, { value: number }>;
    // two pipes' and a gauge's ±, the chart's rounding, the air's: about 2 °F
    expect(uncertainty?.value).toBeGreaterThan(0.8);
    expect(uncertainty?.value).toBeLessThan(2);
  });

  it('says which sign a cause leaves open where two together are needed', () => {
    const request = orificeSystem({ evaporatingF: 29, condensingF: 96, superheatF: 25, subcoolingF: 2, splitF: 23 });
    const lowCharge = found(request, 'low-charge');
    expect(codes(lowCharge.doesNotFit)).toEqual(['split-above']);
    expect(codes(found(request, 'low-airflow').fits)).toContain('split-above');
    expect(codes(found(request, 'low-airflow').doesNotFit)).toEqual(['superheat-above-target', 'subcooling-low']);
  });

  it('has what the tests have shown', () => {
    const drier = found(valveSystem(STARVED_VALVE, { readings: DROP }), 'restriction');
    expect(drier.fits.at(-1)).toMatchObject({
      code: 'drier-drop',
      figures: { difference: { kind: 'differenceK', value: expect.closeTo((8 * 5) / 9, 9) as number } },
    });
    const lowAirflow = { setup: { nominalCapacity: { value: 3, unit: 'ton' } }, readings: { airflow: 800 } } as const;
    expect(codes(found(orificeSystem({}, lowAirflow), 'low-airflow').fits)).toEqual(['airflow-low']);
    const dirty = { visit: { preflight: { filterAndCoil: 'not-ok' } } } as const;
    expect(codes(found(orificeSystem({ superheatF: 7, splitF: 24 }, dirty), 'low-airflow').fits)).toEqual([
      'superheat-below-target',
      'split-above',
      'filter-or-coil-dirty',
    ]);
  });

  it('shows a decided cause with what does not fit it', () => {
    const { fits, doesNotFit } = found(
      valveSystem({ superheatF: 34 }, { visit: { tests: { bulb: 'loose' } } }),
      'valve-open',
    );
    expect(codes(fits)).toEqual(['bulb-loose']);
    expect(codes(doesNotFit)).toEqual(['superheat-above-window']);
  });

  it('says a high subcooling against a low charge that is offered in doubt', () => {
    const { doesNotFit } = found(
      orificeSystem({ superheatF: 30, subcoolingF: 18 }, { setup: ASSUMED_PORT }),
      'low-charge',
    );
    expect(codes(doesNotFit)).toEqual(['subcooling-high']);
  });
});
