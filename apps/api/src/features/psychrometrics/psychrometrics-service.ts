import type { ProblemError } from '@chargewright/contract/problem';
import { readPsychrometricsQuery } from '@chargewright/contract/psychrometrics';
import type { PsychrometricsAnswer, PsychrometricsQuery } from '@chargewright/contract/psychrometrics';
import {
  attempt,
  moistAirEnthalpyBtuPerLb,
  moistAirFromDryBulbAndDewPoint,
  moistAirFromDryBulbAndRelativeHumidity,
  moistAirFromDryBulbAndWetBulb,
  temperatureFromK,
  temperatureToK,
} from '@chargewright/engine';
import type { MoistAir } from '@chargewright/engine';
import { presentValue } from '@chargewright/wording';
import type { UnitSystem } from '@chargewright/wording';
import { atmosphereAt } from '../../http/atmosphere';
import { HttpProblem } from '../../http/http-problem';
import { structureErrors } from '../../http/structure-errors';
import { airError } from './air-fault';

/** Where the other parameters are sound: the humidity alone can then be at fault. */
const ORDINARY_PRESSURE_PA = 101_325;
const ORDINARY_DRY_BULB_K = temperatureToK(20, 'degC');

/** Every property of the air a query describes. Throws `HttpProblem` `invalid-input` for a faulty query and for air that cannot be. */
export function lookUpMoistAir(rawQuery: unknown): PsychrometricsAnswer {
  const read = readPsychrometricsQuery(rawQuery);
  if (!read.ok) throw new HttpProblem('invalid-input', { errors: structureErrors(read.faults) });
  const { query } = read;
  const system: UnitSystem = query.unit === 'degF' ? 'F-psi' : 'C-kPa';
  const atmosphere = atmosphereAt(query.elevation, system);
  const air = attempt(() => moistAir(query, atmosphere.ok ? atmosphere.pressurePa : ORDINARY_PRESSURE_PA));
  if (atmosphere.ok && air.ok) return moistAirAnswer(air.value, query, system);
  const errors = [
    ...(atmosphere.ok ? [] : atmosphere.errors),
    ...(air.ok ? [] : [airError(query, air.error, system)]),
    ...humidityErrors(query, system),
  ];
  throw new HttpProblem('invalid-input', { errors: errors.filter(isFirstOfItsPath) });
}

/** The engine stops at the first refusal: a faulty dry bulb would hide a faulty relative humidity. */
function humidityErrors(query: PsychrometricsQuery, system: UnitSystem): readonly ProblemError[] {
  if (query.humidity.by !== 'relativeHumidity') return [];
  const dryBulb = temperatureFromK(ORDINARY_DRY_BULB_K, query.unit);
  const air = attempt(() => moistAir({ ...query, dryBulb }, ORDINARY_PRESSURE_PA));
  return air.ok ? [] : [airError(query, air.error, system)];
}

const isFirstOfItsPath = ({ path }: ProblemError, at: number, errors: readonly ProblemError[]): boolean =>
  errors.findIndex((error) => error.path === path) === at;

function moistAir({ dryBulb, unit, humidity }: PsychrometricsQuery, pressurePa: number): MoistAir {
  const dryBulbK = temperatureToK(dryBulb, unit);
  switch (humidity.by) {
    case 'wetBulb':
      return moistAirFromDryBulbAndWetBulb({ dryBulbK, wetBulbK: temperatureToK(humidity.value, unit), pressurePa });
    case 'dewPoint':
      return moistAirFromDryBulbAndDewPoint({ dryBulbK, dewPointK: temperatureToK(humidity.value, unit), pressurePa });
    case 'relativeHumidity':
      return moistAirFromDryBulbAndRelativeHumidity({
        dryBulbK,
        relativeHumidityRatio: humidity.value / 100,
        pressurePa,
      });
  }
}

function moistAirAnswer(air: MoistAir, query: PsychrometricsQuery, system: UnitSystem): PsychrometricsAnswer {
  const { dryBulbK, wetBulbK, dewPointK, humidityRatio } = air;
  const answer: PsychrometricsAnswer = {
    dryBulb: presentValue('temperatureK', dryBulbK, system),
    wetBulb: presentValue('temperatureK', wetBulbK, system),
    wetBulbSurface: air.wetBulbSurface,
    dewPoint: dewPointK === null ? null : presentValue('temperatureK', dewPointK, system),
    relativeHumidity: presentValue('fraction', air.relativeHumidityRatio, system),
    humidityRatio: presentValue('humidityRatio', humidityRatio, system),
    vaporPressure: presentValue('pressurePa', air.vapourPressurePa, system),
    enthalpy: enthalpyAmount(air, system),
    specificVolume: presentValue('specificVolumeM3PerKg', air.specificVolumeM3PerKg, system),
    atmosphere: presentValue('pressurePa', air.pressurePa, system),
  };
  return { ...answer, ...asGiven(query) };
}

/** What was given is said back to the last digit, where the answer has its unit. */
function asGiven({ dryBulb, unit, humidity }: PsychrometricsQuery): Partial<PsychrometricsAnswer> {
  const relativeHumidity = { value: humidity.value, unit: '%' } as const;
  const byHumidity = humidity.by === 'relativeHumidity' ? { relativeHumidity } : {};
  if (unit === 'K') return byHumidity;
  const temperature = { value: humidity.value, unit };
  return {
    dryBulb: { value: dryBulb, unit },
    ...(humidity.by === 'relativeHumidity' ? byHumidity : { [humidity.by]: temperature }),
  };
}

/** The inch-pound datum needs the state, not only the SI enthalpy. */
const enthalpyAmount = ({ dryBulbK, humidityRatio, enthalpyJPerKg }: MoistAir, system: UnitSystem) =>
  system === 'F-psi'
    ? ({ value: moistAirEnthalpyBtuPerLb(temperatureFromK(dryBulbK, 'degF'), humidityRatio), unit: 'Btu/lb' } as const)
    : presentValue('enthalpyJPerKg', enthalpyJPerKg, system);
