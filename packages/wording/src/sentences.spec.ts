import type {
  Cause,
  Caution,
  DiagnosisNote,
  Evidence,
  Fault,
  FaultFigures,
  Figure,
  Measurement,
  NextStep,
  NextStepCode,
  NotYetCode,
  Reason,
  Stop,
  StopCode,
} from '@chargewright/engine';
import { CAUSES, DIAGNOSIS_NOTES, MEASUREMENTS, NOT_YET_CODES, temperatureToK } from '@chargewright/engine';
import { describe, expect, it } from 'vitest';
import { causeText, diagnosisNoteText, evidenceText, measurementText } from './diagnosis-sentences';
import { cautionTexts } from './english/cautions';
import { diagnosisTexts } from './english/diagnosis';
import { faultWords } from './english/faults';
import { nextStepWords } from './english/next-steps';
import { reasonTexts } from './english/reasons';
import { stopTexts } from './english/stops';
import { cautionText, nextStepLines, nextStepText, notYetText, reasonText, stopText } from './sentences';
import { faultText, structureFaultText } from './fault-sentences';
import type { StructureFaultKind } from './structure-fault';
import { UNIT_SYSTEMS, type UnitSystem } from './unit-system';

const temperature = (degF: number): Figure => ({ kind: 'temperatureK', value: temperatureToK(degF, 'degF') });
const difference = (deltaF: number): Figure => ({ kind: 'differenceK', value: (deltaF * 5) / 9 });

/** One value for every figure a message can carry; a sentence that asks for another prints "undefined" and fails. */
const FIGURES: Readonly<Record<string, Figure>> = {
  readings: { kind: 'readings', value: ['returnWetBulb', 'outdoorDryBulb'] },
  items: { kind: 'preflight', value: ['panelsOn', 'economizerShut'] },
  fields: { kind: 'setup', value: ['mode', 'stage', 'highSidePort'] },
  days: { kind: 'days', value: 400 },
  minutes: { kind: 'minutes', value: 5 },
  probability: { kind: 'fraction', value: 0.3 },
  actual: temperature(52),
  least: temperature(55),
  most: temperature(99),
  limit: temperature(55),
  critical: { kind: 'pressurePa', value: 4_901_200 },
  superheat: difference(1),
  deviation: difference(-6.4),
  airflow: { kind: 'flowM3PerS', value: 0.4 },
  uncertainty: difference(1.8),
  subcooling: difference(-0.5),
  difference: { kind: 'pressureDifferencePa', value: 1e6 },
  evaporating: temperature(27),
  condensing: temperature(150),
  discharge: temperature(230),
  before: temperature(64),
  after: temperature(67),
  written: temperature(45),
  computed: temperature(40),
  suction: { kind: 'pressurePa', value: 1e6 },
  liquid: temperature(80),
  outdoor: temperature(92),
  lift: { kind: 'lengthM', value: 9 },
  length: { kind: 'lengthM', value: 20 },
  measured: temperature(64),
  fromHumidity: temperature(60),
  wetBulb: temperature(81),
  dryBulb: temperature(78),
  stated: { kind: 'pressurePa', value: 101_325 },
  expected: { kind: 'pressurePa', value: 84_556 },
  place: { kind: 'count', value: 3 },
  row: { kind: 'count', value: 2 },
  given: { kind: 'count', value: 5 },
  wanted: { kind: 'count', value: 6 },
  ranges: {
    kind: 'targetRanges',
    value: [
      {
        along: 'outdoorDryBulb',
        lowK: temperatureToK(55, 'degF'),
        highK: temperatureToK(95.4, 'degF'),
        presentK: temperatureToK(100, 'degF'),
        at: { condition: 'returnWetBulb', valueK: temperatureToK(64, 'degF') },
      },
    ],
  },
  charts: { kind: 'makersCharts', value: ['superheat', 'liquid-pressure'] },
};

const message = <Message>(code: string, more: object = {}): Message =>
  ({ code, figures: FIGURES, ...more }) as unknown as Message;

type Say = (code: string, system: UnitSystem) => string;
const catalogues: readonly (readonly [string, readonly string[], Say])[] = [
  ['reason', Object.keys(reasonTexts), (code, system) => reasonText(message<Reason>(code), system)],
  ['stop', Object.keys(stopTexts), (code, system) => stopText(message<Stop>(code), system)],
  ['caution', Object.keys(cautionTexts), (code, system) => cautionText(message<Caution>(code), system)],
  ['evidence', Object.keys(diagnosisTexts.evidence), (code, system) => evidenceText(message<Evidence>(code), system)],
  ['cause', CAUSES, (code) => causeText(code as Cause)],
  ['measurement', MEASUREMENTS, (code) => measurementText(code as Measurement)],
  ['diagnosis note', DIAGNOSIS_NOTES, (code) => diagnosisNoteText(code as DiagnosisNote)],
  [
    'next step',
    Object.keys(nextStepWords.steps),
    (code, system) => nextStepText(message<NextStep>(code, { notYet: ['add-nothing', 'recover-nothing'] }), system),
  ],
  [
    'fault',
    Object.keys(faultWords.faults),
    (code, system) => faultText(message<Fault>(code, { path: 'readings.returnWetBulb' }), system),
  ],
];

/** The glyphs of the font the page loads: the latin subset of Noto Sans. */
const LATIN = /^[\u0020-\u007e\u00a0-\u00ff\u2000-\u206f\u20ac\u2122\u2191\u2193\u2212\u2215]+$/;
const BROKEN = /undefined|NaN|null|\[object|\s\s|\s[.,;]|\.\.|Infinity/;

describe.each(catalogues)('every %s', (_, codes, say) => {
  it('is a whole sentence in every unit system', () => {
    expect(codes.length).toBeGreaterThan(3);
    for (const code of codes) {
      for (const system of UNIT_SYSTEMS) {
        const text = say(code, system);
        expect(text, code).toMatch(LATIN);
        expect(text, code).not.toMatch(BROKEN);
        expect(text, code).toMatch(/^[A-Z0-9−“]/);
        expect(text.length, code).toBeGreaterThan(15);
      }
    }
  });

  it('prints no unit of another system', () => {
    // this one lists the units that a field takes
    for (const code of codes.filter((each) => each !== 'gauge-unit-on-absolute')) {
      expect(say(code, 'F-psi')).not.toMatch(/°C|kPa\b|\bbar/);
      expect(say(code, 'C-bar')).not.toMatch(/°F|psi\b/);
    }
  });
});

describe('figures', () => {
  it('are strung together', () => {
    expect(reasonText(message<Reason>('stale'), 'F-psi')).toBe(
      'Too old to count: return wet bulb and outdoor air temperature.',
    );
    expect(cautionText(message<Caution>('setup-assumed'), 'F-psi')).toBe(
      'Assumed, because not stated: mode, stage and high-side port.',
    );
    expect(reasonText(message<Reason>('not-ready'), 'F-psi')).toBe('Not ready for the test: panels and economizer.');
  });

  it('say the same in °F and °C', () => {
    expect(stopText(message<Stop>('hot-discharge'), 'F-psi')).toContain('230.0 °F');
    expect(stopText(message<Stop>('hot-discharge'), 'C-bar')).toContain('110.0 °C');
    const drop = (system: UnitSystem) => nextStepText(message<NextStep>('measure-drier-drop', { notYet: [] }), system);
    expect(drop('F-psi')).toContain('about 3 °F');
    expect(drop('C-kPa')).toContain('about 1.7 °C');
  });

  it('say a side in words, never with a minus as well', () => {
    const below = (code: Evidence['code']) => evidenceText(message<Evidence>(code), 'F-psi');
    expect(below('superheat-below-target')).toBe('Superheat is 6.4 °F ± 1.8 °F below its target.');
    expect(below('subcooling-on-target')).toBe('Subcooling is within its band (−6.4 °F off target, ± 1.8 °F).');
  });

  it('of a code without a sentence are refused', () => {
    expect(() => cautionText(message<Caution>('not-a-code'), 'F-psi')).toThrow(RangeError);
  });
});

const stepText = (code: NextStepCode, system: UnitSystem = 'F-psi', notYet: readonly NotYetCode[] = []) =>
  nextStepText(message<NextStep>(code, { notYet }), system);

describe('next steps', () => {
  it('begin with what not to do', () => {
    const lines = nextStepLines(message<NextStep>('read-liquid-pair', { notYet: ['add-nothing'] }), 'F-psi');
    expect(lines).toEqual({
      notYet: ['Don’t add refrigerant yet.'],
      step: 'Read the liquid pressure and the liquid line next.',
      why: 'They tell low charge from a restriction.',
    });
    expect(stepText('read-liquid-pair', 'F-psi', ['add-nothing'])).toMatch(/^Don’t add refrigerant yet\. Read /);
  });

  it('that add say how much, where, and what then', () => {
    const text = stepText('add-in-steps');
    for (const part of [
      '5 % of the factory charge',
      '2 oz per ton',
      'throttled into the suction side',
      'run 15 minutes',
      'take every reading again',
      '10 % of the factory charge',
    ]) {
      expect(text).toContain(part);
    }
    expect(stepText('add-in-steps', 'C-bar')).toContain('16 g per kW');
  });

  it('that take refrigerant out recover it into a proper cylinder', () => {
    const recovering = Object.keys(nextStepWords.steps)
      .map((code) => stepText(code as NextStepCode))
      .filter((text) => /\b(recover in small|weigh in the nameplate|Recover in small)/.test(text));
    expect(recovering.length).toBeGreaterThanOrEqual(8);
    for (const text of recovering) expect(text).toContain('into a proper recovery cylinder');
  });

  it('never say to bleed, vent or blow off', () => {
    for (const [, codes, say] of catalogues) {
      for (const code of codes) expect(say(code, 'F-psi')).not.toMatch(/\b(bleed|vent|blow) /i);
    }
  });

  it('that shut down or open a unit say to lock it out', () => {
    const codes: readonly NextStepCode[] = ['shut-down-high-pressure', 'shut-down-hot-discharge', 'mend-before-test'];
    for (const code of codes) expect(stepText(code)).toContain('Lock out');
    const stops: readonly StopCode[] = ['high-pressure', 'hot-discharge'];
    for (const code of stops) expect(stopText(message<Stop>(code), 'F-psi')).toContain('lock out');
  });

  it('have a word for everything not to do yet', () => {
    for (const code of NOT_YET_CODES) expect(notYetText(code)).toMatch(/^Don’t .+\.$/);
  });
});

describe('stops', () => {
  it('tell what to do before what happened', () => {
    const first = Object.fromEntries(
      Object.keys(stopTexts).map((code) => [code, stopText(message<Stop>(code), 'F-psi').split('.')[0]]),
    );
    expect(first).toEqual({
      'liquid-return': 'Add nothing',
      freezing: 'Compressor off, blower on',
      'high-pressure': 'Shut it down at the thermostat; lock out and test dead before opening a panel',
      'hot-discharge': 'Shut it down at the thermostat; lock out and test dead before opening a panel',
    });
  });
});

const fault = (code: keyof FaultFigures, path: string, system: UnitSystem = 'F-psi') =>
  faultText(message<Fault>(code, { path }), system);

describe('faults', () => {
  it('set two readings against each other as they were stated', () => {
    expect(fault('wet-bulb-above-dry-bulb', 'readings.returnWetBulb')).toBe(
      'Return wet bulb 81 °F is above return dry bulb 78 °F',
    );
    expect(fault('wet-bulb-above-dry-bulb', 'readings.supplyWetBulb', 'C-bar')).toBe(
      'Supply wet bulb 27.22 °C is above supply dry bulb 25.56 °C',
    );
  });

  it('name the field by its path', () => {
    expect(fault('not-a-finite-number', 'setup.lineSet.lift')).toBe('Lift of the line set is not a number.');
    expect(fault('must-be-positive', 'setup.nominalCapacity')).toBe('Nominal capacity must be more than zero.');
    expect(fault('wrong-unit', 'readings.airflow.plusMinus')).toBe(
      'Airflow, plus or minus is not measured in this unit.',
    );
    expect(fault('not-a-finite-number', 'visit.earlier.readings.returnDryBulb')).toBe(
      'Earlier return dry bulb is not a number.',
    );
    expect(fault('not-a-finite-number', 'setup.constructor')).toBe('“setup.constructor” is not a number.');
  });

  it('name a table by its number, and the place in it', () => {
    const say = (path: string) => fault('not-a-finite-number', path);
    expect(say('setup.makersChart.cells.2.0')).toBe('Maker’s table, row 3, cell 1 is not a number.');
    expect(say('setup.makersCharts.1.rows.values.4')).toBe('Maker’s table 2, rows, value 5 is not a number.');
    expect(say('setup.makersCharts.0.leastOutdoor')).toBe(
      'Maker’s table 1, least outdoor temperature is not a number.',
    );
    expect(fault('wrong-length-of-row', 'setup.makersChart.cells')).toBe(
      'Maker’s table, cells: numbers in row 2: 5, columns: 6. They must be as many.',
    );
    expect(fault('axis-not-ascending', 'setup.makersChart.rows')).toBe(
      'Maker’s table, rows: value 3 is not above the one before it. Type them from low to high.',
    );
  });

  it('of the shape have a sentence too', () => {
    const say = (kind: StructureFaultKind, field: string, allowed?: readonly string[]) =>
      structureFaultText({ kind, field, ...(allowed && { allowed }) });
    expect(say('missing', 'setup.refrigerant')).toBe('Refrigerant is missing.');
    expect(say('null', 'readings.returnDryBulb')).toBe('Return dry bulb is null: leave it out when it is not known.');
    expect(say('unknown-value', 'setup.meteringDevice', ['fixed-orifice', 'txv', 'eev'])).toBe(
      'Metering device has an unknown value: give fixed-orifice, txv or eev.',
    );
    expect(say('wrong-type', 'visit.runningMinutes')).toBe('Running time has the wrong type.');
    expect(say('wrong-unit', 'readings.suctionPressure.unit', ['psig'])).toBe(
      'Suction pressure, unit has a unit that does not fit: give psig.',
    );
    expect(say('temperature-unit-on-difference', 'setup.targetSubcooling.unit')).toContain('deltaF or deltaC');
    expect(say('too-long', 'readings')).toBe('“readings” is too long.');
  });
});
