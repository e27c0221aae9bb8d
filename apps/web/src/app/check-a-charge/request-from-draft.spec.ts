import type { CheckDraft, DraftReading } from '../loose-checks/check-draft';
import type { ReadingId } from '@chargewright/engine';
import { requestFromDraft, withoutPaths } from './request-from-draft';

const NOW = Date.parse('2026-12-01T12:00:00Z');
const ago = (seconds: number) => new Date(NOW - seconds * 1000).toISOString();

const reading = (quantity: ReadingId, text: string, unit: string, takenAt = ago(60)): DraftReading => ({
  id: quantity,
  checkId: 'check',
  quantity,
  text,
  unit,
  place: '',
  takenAt,
  source: 'typed',
});

const draft = (change: Partial<CheckDraft> = {}): CheckDraft => ({
  id: 'check',
  createdAt: ago(3600),
  updatedAt: ago(0),
  setup: { refrigerant: 'R-410A', meteringDevice: 'fixed-orifice' },
  visit: { preflight: {} },
  typed: {},
  readings: {},
  edits: {},
  ...change,
});

describe('requestFromDraft', () => {
  it('asks nothing before refrigerant and metering device are chosen', () => {
    expect(requestFromDraft(draft({ setup: { refrigerant: 'R-410A' } }), NOW).request).toBeNull();
  });

  it('states what was chosen and leaves what was not to the engine', () => {
    const { request } = requestFromDraft(draft(), NOW);
    expect(request?.setup).toEqual({ refrigerant: 'R-410A', meteringDevice: 'fixed-orifice' });
    expect(request?.readings).toEqual({});
    expect(request?.visit).toEqual({ preflight: {} });
  });

  it('gives an airflow from the airflow page its ±, and no age: blower and ducts stay as they are', () => {
    const brought: DraftReading = {
      ...reading('airflow', '1184', 'cfm', ago(4000)),
      workedOut: { method: 'static-pressure', plusMinus: 62.5 },
    };
    const airflowOf = (change: Partial<CheckDraft>) => requestFromDraft(draft(change), NOW).request?.readings.airflow;
    expect(airflowOf({ readings: { airflow: brought } })).toEqual({
      value: 1184,
      unit: 'cfm',
      resolution: 1,
      plusMinus: { value: 62.5, unit: 'cfm', kind: 'k2' },
    });
    // what is typed over it is another reading
    const edits = { 'reading:airflow': { text: '1250', unit: 'cfm', editedAt: ago(5) } } as const;
    expect(airflowOf({ readings: { airflow: brought }, edits })).toEqual({
      value: 1250,
      unit: 'cfm',
      resolution: 1,
      ageSeconds: 5,
    });
  });

  it('says which port the target holds for at a discharge port with a valve, and nowhere else', () => {
    const asked = { refrigerant: 'R-410A', meteringDevice: 'txv', targetSubcoolingPort: 'discharge' } as const;
    const portOf = (setup: CheckDraft['setup']) =>
      requestFromDraft(draft({ setup }), NOW).request?.setup.targetSubcoolingPort;
    expect(portOf({ ...asked, highSidePort: 'discharge' })).toBe('discharge');
    expect(portOf({ ...asked, highSidePort: 'liquid' })).toBeUndefined();
    expect(portOf({ ...asked, highSidePort: 'discharge', meteringDevice: 'fixed-orifice' })).toBeUndefined();
  });

  it('names the rules that were chosen, and leaves the general ones to the engine', () => {
    const procedureOf = (procedure?: CheckDraft['setup']['procedure']) => {
      const system = { refrigerant: 'R-22', meteringDevice: 'txv' } as const;
      return requestFromDraft(draft({ setup: { ...system, ...(procedure && { procedure }) } }), NOW).request;
    };
    expect(procedureOf('cec-ra3.2-2019-rater')?.procedure).toBe('cec-ra3.2-2019-rater');
    expect(procedureOf('cec-ra3.2-2019-rater')?.setup).toEqual(procedureOf()?.setup);
    expect(procedureOf()).not.toHaveProperty('procedure');
  });

  it('says of an inverter whether it is in its charge mode, and nothing of another unit', () => {
    const modeOf = (chargeMode: CheckDraft['setup']['chargeMode'] & string, mode: 'cooling' | 'heating' = 'cooling') =>
      requestFromDraft(draft({ setup: { refrigerant: 'R-32', meteringDevice: 'eev', mode, chargeMode } }), NOW).request
        ?.setup.chargeMode;
    expect(modeOf('on')).toBe(true);
    expect(modeOf('off')).toBe(false);
    expect(modeOf('no-inverter')).toBeUndefined();
    expect(modeOf('off', 'heating')).toBeUndefined();
  });

  it('says how the airflow is shown under the certificates of 2019, and nowhere else', () => {
    const setupOf = (procedure: CheckDraft['setup']['procedure'] & string, airflowPath: 'duct-table' | 'measured') =>
      requestFromDraft(
        draft({ setup: { refrigerant: 'R-22', meteringDevice: 'txv', procedure, airflowPath, alteration: true } }),
        NOW,
      ).request?.setup;
    expect(setupOf('cec-ra3.2-2019-rater', 'duct-table')).toMatchObject({
      airflowPath: 'duct-table',
      alteration: true,
    });
    expect(setupOf('cec-ra3.2-2019-rater', 'measured')).not.toHaveProperty('airflowPath');
    expect(setupOf('general-rules', 'duct-table')).not.toHaveProperty('airflowPath');
  });

  it('makes a range of its two ends, and nothing of one', () => {
    const asked = (typed: CheckDraft['typed']) => requestFromDraft(draft({ typed }), NOW);
    const low = { text: '6', unit: 'deltaF' };
    expect(asked({ superheatLow: low }).request?.setup).not.toHaveProperty('superheatRange');
    expect(
      asked({ superheatLow: low, superheatHigh: { text: '14', unit: 'deltaF' } }).request?.setup.superheatRange,
    ).toEqual({ low: 6, high: 14, unit: 'deltaF' });
    const mixed = asked({ superheatLow: low, superheatHigh: { text: '8', unit: 'deltaC' } });
    expect(mixed.request?.setup).not.toHaveProperty('superheatRange');
    expect(mixed.faults).toEqual([{ code: 'wrong-unit', figures: {}, path: 'setup.superheatRange.high' }]);
  });

  it('puts the line set, the hours off and the earlier additions where the engine looks for them', () => {
    const { request } = requestFromDraft(
      draft({
        typed: {
          lineLength: { text: '45', unit: 'ft' },
          mostLineLength: { text: '50', unit: 'ft' },
          lift: { text: '12', unit: 'ft' },
          stationPressure: { text: '14.2', unit: 'psia' },
          hoursOff: { text: '5', unit: 'h' },
          additionsOnEarlierVisits: { text: '1', unit: 'times' },
        },
      }),
      NOW,
    );
    expect(request?.setup.lineSet).toEqual({
      length: { value: 45, unit: 'ft' },
      mostLength: { value: 50, unit: 'ft' },
      lift: { value: 12, unit: 'ft' },
    });
    expect(request?.setup.stationPressure).toEqual({ value: 14.2, unit: 'psia' });
    expect(request?.visit).toMatchObject({ hoursOff: 5, additionsOnEarlierVisits: 1 });
  });

  it('holds the second set against the first, as far apart as they were read', () => {
    const firstSet = { takenAt: ago(480), readings: { returnWetBulb: { text: '66.0', unit: 'degF' } } };
    const visit = { preflight: {}, firstSet };
    const second = { returnWetBulb: reading('returnWetBulb', '65.8', 'degF', ago(120)) };
    const earlier = (readings: CheckDraft['readings']) =>
      requestFromDraft(draft({ visit, readings }), NOW).request?.visit?.earlier;
    expect(earlier(second)).toMatchObject({ minutesAgo: 6, readings: { returnWetBulb: { value: 66, unit: 'degF' } } });
    expect(earlier({})?.minutesAgo).toBe(8);
  });

  it('gives a reading its number, unit, age, and the step its decimals tell', () => {
    const { request } = requestFromDraft(
      draft({ readings: { returnWetBulb: reading('returnWetBulb', '64,50', 'degF', ago(90)) } }),
      NOW,
    );
    expect(request?.readings.returnWetBulb).toEqual({ value: 64.5, unit: 'degF', resolution: 0.01, ageSeconds: 90 });
  });

  it('takes what is being typed in place of what was committed, as old as its last keystroke', () => {
    const { request } = requestFromDraft(
      draft({
        readings: { suctionPressure: reading('suctionPressure', '116', 'psig', ago(900)) },
        edits: { 'reading:suctionPressure': { text: '8', unit: 'barg', editedAt: ago(700) } },
      }),
      NOW,
    );
    expect(request?.readings.suctionPressure).toEqual({ value: 8, unit: 'barg', resolution: 1, ageSeconds: 700 });
  });

  it('leaves out a reading that is being deleted', () => {
    const { request } = requestFromDraft(
      draft({
        readings: { suctionPressure: reading('suctionPressure', '116', 'psig') },
        edits: { 'reading:suctionPressure': { text: ' ', unit: 'psig', editedAt: ago(0) } },
      }),
      NOW,
    );
    expect(request?.readings).toEqual({});
  });

  it('names what is not a number and leaves it out', () => {
    const read = requestFromDraft(
      draft({ edits: { 'reading:outdoorDryBulb': { text: '9x', unit: 'degF', editedAt: ago(0) } } }),
      NOW,
    );
    expect(read.problems.get('reading:outdoorDryBulb')).toBe('not-a-number');
    expect(read.request?.readings).toEqual({});
  });

  it('names a stored unit that is not one of the field, instead of misreading it', () => {
    const read = requestFromDraft(
      draft({ readings: { outdoorDryBulb: reading('outdoorDryBulb', '92', 'psig') } }),
      NOW,
    );
    expect(read.faults).toEqual([{ code: 'wrong-unit', figures: {}, path: 'readings.outdoorDryBulb' }]);
    expect(read.request?.readings).toEqual({});
  });

  it('sorts typed numbers into setup and visit', () => {
    const { request } = requestFromDraft(
      draft({
        typed: {
          elevation: { text: '650', unit: 'ft' },
          targetSubcooling: { text: '10', unit: 'deltaF' },
          lowestReturnDryBulb: { text: '74', unit: 'degF' },
          instrumentsCheckedDaysAgo: { text: '12', unit: 'days' },
        },
        visit: { preflight: { panelsOn: 'ok' }, runningSince: ago(22 * 60), iceSeen: false },
      }),
      NOW,
    );
    expect(request?.setup).toMatchObject({
      elevation: { value: 650, unit: 'ft' },
      targetSubcooling: { value: 10, unit: 'deltaF' },
    });
    expect(request?.visit).toEqual({
      preflight: { panelsOn: 'ok' },
      iceSeen: false,
      runningMinutes: 22,
      lowestReturnDryBulb: { value: 74, unit: 'degF' },
      instrumentsCheckedDaysAgo: 12,
    });
  });

  it('takes a time that lies ahead of the page clock as now, and an unreadable one as not recorded', () => {
    const ahead = requestFromDraft(draft({ visit: { preflight: {}, runningSince: ago(-5) } }), NOW);
    expect(ahead.request?.visit?.runningMinutes).toBe(0);
    const damaged = requestFromDraft(draft({ visit: { preflight: {}, runningSince: 'yesterday' } }), NOW);
    expect(damaged.request?.visit).toEqual({ preflight: {} });
  });
});

describe('withoutPaths', () => {
  it('takes single entries out of each part', () => {
    const request = {
      setup: {
        refrigerant: 'R-410A',
        meteringDevice: 'txv',
        elevation: { value: 1e6, unit: 'ft' },
      },
      visit: { runningMinutes: 22 },
      readings: { returnDryBulb: { value: 78, unit: 'degF' }, returnWetBulb: { value: 81, unit: 'degF' } },
    } as const;
    expect(withoutPaths(request, new Set(['readings.returnWetBulb', 'setup.elevation']))).toEqual({
      setup: { refrigerant: 'R-410A', meteringDevice: 'txv' },
      visit: { runningMinutes: 22 },
      readings: { returnDryBulb: { value: 78, unit: 'degF' } },
    });
  });
});
