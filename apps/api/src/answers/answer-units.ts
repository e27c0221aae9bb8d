import { READING_DIMENSIONS, READING_IDS } from '@chargewright/engine';
import type { PressureUnit, ReadingsInput, TemperatureAmount, VisitInput } from '@chargewright/engine';
import type { UnitSystem } from '@chargewright/wording';

const ofTemperature = (unit: string): UnitSystem => (unit === 'degF' ? 'F-psi' : 'C-kPa');

const INCH_POUND_PRESSURES: readonly PressureUnit[] = ['psig', 'psia', 'inHgVac'];

/**
 * The units a request is answered in: those of the return dry bulb, without it of the first temperature given (in the order of the contract),
 * without any of the first pressure, else °F and psi.
 */
export function answerUnits(request: { readonly readings: ReadingsInput; readonly visit?: VisitInput }): UnitSystem {
  const { readings, visit } = request;
  const given = READING_IDS.filter((id) => readings[id] !== undefined);
  const unitOf = (dimension: string) => {
    const first = given.find((id) => READING_DIMENSIONS[id] === dimension);
    return first === undefined ? undefined : readings[first]?.unit;
  };
  const lowest: TemperatureAmount | undefined = visit?.lowestReturnDryBulb;
  const temperatureUnit = readings.returnDryBulb?.unit ?? unitOf('temperature') ?? lowest?.unit;
  if (temperatureUnit !== undefined) return ofTemperature(temperatureUnit);
  const pressureUnit = unitOf('pressure');
  if (pressureUnit === undefined) return 'F-psi';
  return (INCH_POUND_PRESSURES as readonly string[]).includes(pressureUnit) ? 'F-psi' : 'C-kPa';
}
