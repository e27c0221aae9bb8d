import type { ProblemError } from '@chargewright/contract/problem';
import type { AirQuantity, PsychrometricsQuery } from '@chargewright/contract/psychrometrics';
import { MOIST_AIR_READINGS } from '@chargewright/engine';
import type { EngineError, MoistAirReading } from '@chargewright/engine';
import { airRefusal } from '@chargewright/wording';
import type { UnitSystem } from '@chargewright/wording';

/** What the engine calls a parameter of the query. */
export const READING_OF: Readonly<Record<AirQuantity, MoistAirReading>> = {
  dryBulb: 'dryBulbK',
  wetBulb: 'wetBulbK',
  relativeHumidity: 'relativeHumidityRatio',
  dewPoint: 'dewPointK',
  humidityRatio: 'humidityRatio',
  enthalpy: 'enthalpyJPerKg',
};

/** Why the air of a query cannot be, from the engine's refusal; the refusal itself if it is none of the query's. */
export function airError({ given }: PsychrometricsQuery, refusal: EngineError, system: UnitSystem): ProblemError {
  const readings = given.map(({ by }) => READING_OF[by]);
  const [first, second] = MOIST_AIR_READINGS.filter((reading) => readings.includes(reading));
  if (first === undefined || second === undefined) throw refusal;
  const fault = airRefusal(refusal, { pair: [first, second], system });
  const path = given.find(({ by }) => READING_OF[by] === fault?.at)?.by;
  if (fault === null || path === undefined) throw refusal;
  return { path, message: fault.text };
}
