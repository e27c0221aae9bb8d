/**
 * An independent library of the same equations as oracle (psychrolib, MIT, its version 2.5.0; a devDependency, CommonJS). It is trusted where its wet
 * bulb is above 1 °C (near 0 °C its own round trip is off by 0.7 K) and where saturation at the dry bulb is below half the total pressure
 * (it does not refuse vapour above the total). It bisects the wet bulb until the bracket is 0.001 K wide and answers its middle.
 */
import { createRequire } from 'node:module';
import fc from 'fast-check';

interface Psychrolib {
  readonly SI: number;
  SetUnitSystem(system: number): void;
  GetTWetBulbFromRelHum(dryBulbC: number, relativeHumidity: number, pressurePa: number): number;
  GetTDewPointFromVapPres(dryBulbC: number, vapourPressurePa: number): number;
  GetRelHumFromTWetBulb(dryBulbC: number, wetBulbC: number, pressurePa: number): number;
  GetHumRatioFromTWetBulb(dryBulbC: number, wetBulbC: number, pressurePa: number): number;
  GetHumRatioFromRelHum(dryBulbC: number, relativeHumidity: number, pressurePa: number): number;
  GetMoistAirEnthalpy(dryBulbC: number, humidityRatio: number): number;
  GetMoistAirVolume(dryBulbC: number, humidityRatio: number, pressurePa: number): number;
  GetSatVapPres(temperatureC: number): number;
}

export const oracle = createRequire(import.meta.url)('psychrolib') as Psychrolib;
oracle.SetUnitSystem(oracle.SI);

export interface OracleState {
  readonly dryBulbC: number;
  readonly relativeHumidityRatio: number;
  readonly pressurePa: number;
}

const between = (low: number, high: number) =>
  fc.integer({ min: 0, max: 1_000_000 }).map((k) => low + ((high - low) * k) / 1_000_000);

/** Seeded states; about a tenth lies outside the region where the oracle is trusted and is dropped. */
export function oracleStates(atLeast: number): OracleState[] {
  const any = fc.record({
    dryBulbC: between(1, 81),
    relativeHumidityRatio: between(0.01, 1),
    pressurePa: between(50e3, 110e3),
  });
  const states = fc.sample(any, { numRuns: 2 * atLeast, seed: 20_261_201 }).filter(isTrusted);
  if (states.length < atLeast) throw new Error(`only ${states.length} states in the trustworthy region`);
  return states;
}

function isTrusted({ dryBulbC, relativeHumidityRatio, pressurePa }: OracleState): boolean {
  if (oracle.GetSatVapPres(dryBulbC) >= 0.5 * pressurePa) return false;
  return oracle.GetTWetBulbFromRelHum(dryBulbC, relativeHumidityRatio, pressurePa) > 1;
}
