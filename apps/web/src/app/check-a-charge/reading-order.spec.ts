import type { CheckDraft, DraftSetup } from '../loose-checks/check-draft';
import { humidityShown, readingSections } from './reading-order';

const draft = (setup: DraftSetup, edits: CheckDraft['edits'] = {}): CheckDraft => ({
  id: 'check',
  createdAt: '2026-12-01T12:00:00Z',
  updatedAt: '2026-12-01T12:00:00Z',
  setup,
  visit: { preflight: {} },
  typed: {},
  readings: {},
  edits,
});

const asked = (setup: DraftSetup, edits?: CheckDraft['edits']) =>
  readingSections(draft(setup, edits), false)
    .filter(({ id }) => id !== 'more')
    .flatMap(({ fields }) => fields);

describe('readingSections', () => {
  it('asks the suction pair first and the wet bulb late on a fixed orifice', () => {
    expect(asked({ meteringDevice: 'fixed-orifice' })).toEqual([
      'reading:suctionPressure',
      'reading:suctionLineTemperature',
      'reading:outdoorDryBulb',
      'reading:liquidPressure',
      'reading:liquidLineTemperature',
      'reading:returnDryBulb',
      'reading:returnWetBulb',
      'reading:supplyDryBulb',
    ]);
  });

  it.each(['txv', 'eev'] as const)('asks the liquid pair and the nameplate target first on a %s', (meteringDevice) => {
    expect(asked({ meteringDevice })).toEqual([
      'reading:liquidPressure',
      'reading:liquidLineTemperature',
      'typed:targetSubcooling',
      'reading:outdoorDryBulb',
      'reading:suctionPressure',
      'reading:suctionLineTemperature',
      'reading:returnDryBulb',
      'reading:returnWetBulb',
      'reading:supplyDryBulb',
    ]);
  });

  it('asks the pressure of the port there is', () => {
    expect(asked({ meteringDevice: 'txv', highSidePort: 'discharge' })).toContain('reading:dischargePressure');
    expect(asked({ meteringDevice: 'txv', highSidePort: 'discharge' })).not.toContain('reading:liquidPressure');
    expect(asked({ meteringDevice: 'fixed-orifice', highSidePort: 'none' })).not.toContain('reading:liquidPressure');
  });

  it('keeps a value in sight that the changed setup no longer asks', () => {
    const sections = readingSections(
      draft(
        { meteringDevice: 'txv', highSidePort: 'discharge' },
        { 'reading:liquidPressure': { text: '395', unit: 'psig', editedAt: '' } },
      ),
      false,
    );
    expect(sections.find(({ id }) => id === 'more')?.fields).toContain('reading:liquidPressure');
  });
});

describe('humidityShown', () => {
  const typed = draft({}, { 'reading:returnRelativeHumidity': { text: '50', unit: '%', editedAt: '' } });

  it('follows the choice, and without one what was typed', () => {
    expect(humidityShown(draft({}), undefined)).toBe(false);
    expect(humidityShown(typed, undefined)).toBe(true);
    expect(humidityShown(typed, false)).toBe(false);
    expect(humidityShown(draft({}), true)).toBe(true);
  });
});
