import { describe, expect, it } from 'vitest';
import { standardAtmospherePressurePa } from '../psychrometrics/standard-atmosphere';
import { siteAtmosphere } from './site-atmosphere';

const codes = (input: Parameters<typeof siteAtmosphere>[0]) =>
  siteAtmosphere(input).faults.map(({ path, code }) => `${path} ${code}`);

describe('the air pressure of a look-up', () => {
  it('is the barometer’s, else that of the elevation, else of the sea', () => {
    expect(siteAtmosphere({}).pressurePa).toBe(101_325);
    expect(siteAtmosphere({ elevation: { value: 1500, unit: 'm' } }).pressurePa).toBe(
      standardAtmospherePressurePa(1500),
    );
    const both = { elevation: { value: 1500, unit: 'm' }, stationPressure: { value: 84, unit: 'kPaa' } } as const;
    expect(siteAtmosphere(both).pressurePa).toBe(84_000);
  });

  it('stays open while it cannot be, with the fault at its field', () => {
    const high = { value: 30_000, unit: 'ft' } as const;
    expect(siteAtmosphere({ elevation: high }).pressurePa).toBeNull();
    expect(codes({ elevation: high })).toEqual(['elevation elevation-outside-range']);
    expect(codes({ stationPressure: { value: 29, unit: 'psig' } })).toEqual(['stationPressure gauge-unit-on-absolute']);
    expect(codes({ stationPressure: { value: 300, unit: 'kPaa' } })).toEqual([
      'stationPressure barometer-outside-range',
    ]);
    // sea-level corrected, at a mile up
    expect(codes({ elevation: { value: 5280, unit: 'ft' }, stationPressure: { value: 14.7, unit: 'psia' } })).toEqual([
      'stationPressure barometer-contradicts-elevation',
    ]);
  });
});
