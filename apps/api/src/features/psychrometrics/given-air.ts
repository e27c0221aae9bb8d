import type { PsychrometricsQuery } from '@chargewright/contract/psychrometrics';
import { moistAirFromInchPoundEnthalpy, moistAirFromPair, temperatureToK } from '@chargewright/engine';
import type { InchPoundEnthalpyPair, MoistAir, MoistAirPair } from '@chargewright/engine';

type Readings = Readonly<Record<string, number>>;

/** The air a query describes, at an air pressure. Throws `EngineError` for air that cannot be. */
export function givenAir(query: PsychrometricsQuery, pressurePa: number): MoistAir {
  const [first, second] = query.given;
  const readings: Readings = { ...reading(first, query), ...reading(second, query) };
  // exactly two of the engine's readings, by the contract: which two is for the engine to accept or refuse
  return 'enthalpyBtuPerLb' in readings
    ? moistAirFromInchPoundEnthalpy({ pressurePa, ...(readings as unknown as InchPoundEnthalpyPair) })
    : moistAirFromPair({ pressurePa, ...(readings as unknown as MoistAirPair) });
}

function reading(
  { by, value }: PsychrometricsQuery['given'][number],
  { unit, enthalpyUnit }: PsychrometricsQuery,
): Readings {
  switch (by) {
    case 'dryBulb':
      return { dryBulbK: temperatureToK(value, unit) };
    case 'wetBulb':
      return { wetBulbK: temperatureToK(value, unit) };
    case 'dewPoint':
      return { dewPointK: temperatureToK(value, unit) };
    case 'relativeHumidity':
      return { relativeHumidityRatio: value / 100 };
    case 'humidityRatio':
      return { humidityRatio: value };
    case 'enthalpy':
      return enthalpyUnit === 'Btu/lb' ? { enthalpyBtuPerLb: value } : { enthalpyJPerKg: value * 1e3 };
  }
}
