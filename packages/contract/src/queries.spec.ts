import { describe, expect, it } from 'vitest';
import { AIR_QUANTITIES, readPsychrometricsQuery } from './psychrometrics';
import { readSaturationQuery } from './refrigerant';

const faultPaths = (read: ReturnType<typeof readSaturationQuery> | ReturnType<typeof readPsychrometricsQuery>) =>
  read.ok ? [] : read.faults.map(({ path, kind }) => `${path} ${kind}`);

describe('the query of a saturation look-up', () => {
  it('takes a pressure, and where the gauge is read', () => {
    expect(readSaturationQuery({ pressure: '118', unit: 'psig', elevation: '5280', elevationUnit: 'ft' })).toEqual({
      ok: true,
      query: { pressure: { value: 118, unit: 'psig' }, elevation: { value: 5280, unit: 'ft' } },
    });
  });

  it('takes a temperature', () => {
    expect(readSaturationQuery({ temperature: '-4.5e1', unit: 'degC' })).toEqual({
      ok: true,
      query: { temperature: { value: -45, unit: 'degC' } },
    });
  });

  it.each([
    [{}, ['unit missing', 'pressure give-one-of']],
    [{ unit: 'psig' }, ['pressure give-one-of']],
    [{ pressure: '1', temperature: '2', unit: 'psig' }, ['temperature give-only-one-of']],
    [{ pressure: '118', unit: 'degF' }, ['unit wrong-unit']],
    [{ temperature: '40', unit: 'psig' }, ['unit wrong-unit']],
    [{ pressure: 'high', unit: 'furlong' }, ['pressure wrong-type', 'unit wrong-unit']],
    [{ pressure: ['1', '2'], unit: 'psig' }, ['pressure wrong-type']],
    [{ pressure: '118', unit: 'psig', elevation: '5280' }, ['elevationUnit missing']],
    [{ pressure: '118', unit: 'psig', elevationUnit: 'ft' }, ['elevation missing']],
    [
      { pressure: '', unit: 'psig', elevation: 'up', elevationUnit: 'mile' },
      ['pressure wrong-type', 'elevation wrong-type', 'elevationUnit unknown-value'],
    ],
  ])('tells every fault of %j', (query, faults) => {
    expect(faultPaths(readSaturationQuery(query)).sort()).toEqual([...faults].sort());
  });

  it.each(['', ' ', '0x10', '1_000', 'Infinity', 'NaN', '1e999', '62,5', '--1', '1e'])(
    'takes %j for no number',
    (text) => {
      expect(faultPaths(readSaturationQuery({ pressure: text, unit: 'psig' }))).toEqual(['pressure wrong-type']);
    },
  );

  it.each([
    ['+7', 7],
    ['.5', 0.5],
    ['5.', 5],
    ['1E2', 100],
    [' 7 ', 7],
  ])('takes %j for a number', (text, value) => {
    expect(readSaturationQuery({ pressure: text, unit: 'psig' })).toMatchObject({ query: { pressure: { value } } });
  });
});

describe('the query of a moist-air look-up', () => {
  it.each(['wetBulb', 'relativeHumidity', 'dewPoint', 'humidityRatio', 'enthalpy'])(
    'takes the dry bulb and %s',
    (by) => {
      expect(readPsychrometricsQuery({ [by]: '60', dryBulb: '80', unit: 'degF' })).toEqual({
        ok: true,
        query: {
          given: [
            { by: 'dryBulb', value: 80 },
            { by, value: 60 },
          ],
          unit: 'degF',
          enthalpyUnit: 'Btu/lb',
        },
      });
    },
  );

  it('takes any two, also those that determine no air: the engine says why', () => {
    for (const one of AIR_QUANTITIES) {
      for (const other of AIR_QUANTITIES) {
        if (one === other) continue;
        expect(readPsychrometricsQuery({ [one]: '1', [other]: '2', unit: 'K' }).ok).toBe(true);
      }
    }
  });

  it('counts an enthalpy in Btu/lb with °F and in kJ/kg with the others, unless it says otherwise', () => {
    const unitOf = (query: Record<string, string>) => {
      const read = readPsychrometricsQuery({ enthalpy: '30', wetBulb: '60', ...query });
      return read.ok ? read.query.enthalpyUnit : null;
    };
    expect(unitOf({ unit: 'degC' })).toBe('kJ/kg');
    expect(unitOf({ unit: 'K' })).toBe('kJ/kg');
    expect(unitOf({ unit: 'degF', enthalpyUnit: 'kJ/kg' })).toBe('kJ/kg');
  });

  it.each([
    [{}, ['dryBulb give-two-of', 'unit missing', 'wetBulb give-two-of']],
    [{ dryBulb: '80', unit: 'degF' }, ['wetBulb give-one-of']],
    [{ enthalpy: '30', unit: 'degF' }, ['dryBulb give-one-of']],
    [{ dryBulb: '80', wetBulb: '67', dewPoint: '60', unit: 'degF' }, ['dewPoint give-only-two-of']],
    [
      { dryBulb: '80', wetBulb: '67', dewPoint: '60', enthalpy: '30', unit: 'degF' },
      ['dewPoint give-only-two-of', 'enthalpy give-only-two-of'],
    ],
    [
      { dryBulb: 'warm', wetBulb: 'wet', unit: 'deltaF' },
      ['dryBulb wrong-type', 'wetBulb wrong-type', 'unit wrong-unit'],
    ],
    [
      { dryBulb: '80', humidityRatio: 'some', unit: 'degF', enthalpyUnit: 'kcal' },
      ['enthalpyUnit unknown-value', 'humidityRatio wrong-type'],
    ],
    [{ dryBulb: '80', wetBulb: '67', unit: 'degF', elevation: '1' }, ['elevationUnit missing']],
  ])('tells every fault of %j', (query, faults) => {
    expect(faultPaths(readPsychrometricsQuery(query)).sort()).toEqual([...faults].sort());
  });
});
