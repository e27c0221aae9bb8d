import type { ProblemError } from '@chargewright/contract/problem';
import { readPsychrometricsQuery } from '@chargewright/contract/psychrometrics';
import type { AirQuantity, PsychrometricsAnswer, PsychrometricsQuery } from '@chargewright/contract/psychrometrics';
import {
  attempt,
  moistAirEnthalpyBtuPerLb,
  moistAirFromDryBulbAndRelativeHumidity,
  temperatureFromK,
  temperatureToK,
} from '@chargewright/engine';
import type { EnthalpyUnit, MoistAir } from '@chargewright/engine';
import { presentValue } from '@chargewright/wording';
import type { UnitSystem } from '@chargewright/wording';
import { atmosphereAt } from '../../http/atmosphere';
import { HttpProblem } from '../../http/http-problem';
import { structureErrors } from '../../http/structure-errors';
import { airError } from './air-fault';
import { givenAir } from './given-air';

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
  const air = attempt(() => givenAir(query, atmosphere.ok ? atmosphere.pressurePa : ORDINARY_PRESSURE_PA));
  if (atmosphere.ok && air.ok) return moistAirAnswer(air.value, query, system);
  const errors = [
    ...(atmosphere.ok ? [] : atmosphere.errors),
    ...(air.ok ? [] : [airError(query, air.error, system)]),
    ...humidityErrors(query, system),
  ];
  throw new HttpProblem('invalid-input', { errors: errors.filter(isFirstOfItsPath) });
}

/** The engine stops at the first refusal: another faulty reading would hide a faulty relative humidity. */
function humidityErrors(query: PsychrometricsQuery, system: UnitSystem): readonly ProblemError[] {
  const humidity = query.given.find(({ by }) => by === 'relativeHumidity');
  if (humidity === undefined) return [];
  const air = attempt(() =>
    moistAirFromDryBulbAndRelativeHumidity({
      dryBulbK: ORDINARY_DRY_BULB_K,
      relativeHumidityRatio: humidity.value / 100,
      pressurePa: ORDINARY_PRESSURE_PA,
    }),
  );
  return air.ok ? [] : [airError(query, air.error, system)];
}

const isFirstOfItsPath = ({ path }: ProblemError, at: number, errors: readonly ProblemError[]): boolean =>
  errors.findIndex((error) => error.path === path) === at;

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
    enthalpy: enthalpyAmount(air, query.enthalpyUnit),
    specificVolume: presentValue('specificVolumeM3PerKg', air.specificVolumeM3PerKg, system),
    atmosphere: presentValue('pressurePa', air.pressurePa, system),
  };
  return { ...answer, ...asGiven(query) };
}

/** What was given is said back to the last digit, where the answer has its unit. */
function asGiven(query: PsychrometricsQuery): Partial<PsychrometricsAnswer> {
  const amounts = query.given.map(({ by, value }) => [by, { value, unit: unitOf(by, query) }] as const);
  return Object.fromEntries(amounts.filter(([, { unit }]) => unit !== 'K'));
}

function unitOf(by: AirQuantity, { unit, enthalpyUnit }: PsychrometricsQuery) {
  switch (by) {
    case 'dryBulb':
    case 'wetBulb':
    case 'dewPoint':
      return unit;
    case 'relativeHumidity':
      return '%';
    case 'humidityRatio':
      return '1';
    case 'enthalpy':
      return enthalpyUnit;
  }
}

/** The inch-pound datum needs the state, not only the SI enthalpy. */
const enthalpyAmount = ({ dryBulbK, humidityRatio, enthalpyJPerKg }: MoistAir, unit: EnthalpyUnit) =>
  unit === 'Btu/lb'
    ? { value: moistAirEnthalpyBtuPerLb(temperatureFromK(dryBulbK, 'degF'), humidityRatio), unit }
    : { value: enthalpyJPerKg / 1e3, unit };
