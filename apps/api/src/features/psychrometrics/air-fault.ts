import type { ProblemError } from '@chargewright/contract/problem';
import type { PsychrometricsQuery } from '@chargewright/contract/psychrometrics';
import { temperatureToK } from '@chargewright/engine';
import type { EngineError } from '@chargewright/engine';
import { lookUpFaultText } from '@chargewright/wording';
import type { LookUpMessage, UnitSystem } from '@chargewright/wording';

interface AirFault {
  /** The parameter at fault. */
  readonly path: string;
  readonly message: LookUpMessage;
}

/** Why the air of a query cannot be, from the engine's refusal; the refusal itself if it is none of the query's. */
export function airError(query: PsychrometricsQuery, refusal: EngineError, system: UnitSystem): ProblemError {
  const fault = airFault(query, refusal);
  if (fault === null) throw refusal;
  return { path: fault.path, message: lookUpFaultText(fault.message, system) };
}

function airFault(
  { dryBulb: dryBulbGiven, unit, humidity }: PsychrometricsQuery,
  refusal: EngineError,
): AirFault | null {
  const { quantity, reason, value, min = -Infinity, max = Infinity } = refusal.details;
  const temperature = (kelvin: number) => ({ kind: 'temperatureK', value: kelvin }) as const;
  const actual = temperature(value);
  const dryBulb = temperature(temperatureToK(dryBulbGiven, unit));
  const least = temperature(min);
  switch (reason) {
    case 'outside-moist-air-range': {
      if (quantity !== 'dryBulbK') return null;
      const figures = { actual, least, most: temperature(max) };
      return { path: 'dryBulb', message: { code: 'dry-bulb-outside-range', figures } };
    }
    case 'outside-0-to-1':
      return { path: humidity.by, message: { code: 'humidity-outside-range', figures: {} } };
    case 'wet-bulb-above-dry-bulb':
      return { path: humidity.by, message: { code: 'wet-bulb-above-dry-bulb', figures: { actual, dryBulb } } };
    case 'wet-bulb-too-low':
      return { path: humidity.by, message: { code: 'wet-bulb-too-low', figures: { actual, least } } };
    case 'dew-point-above-dry-bulb':
      return { path: humidity.by, message: { code: 'dew-point-above-dry-bulb', figures: { actual, dryBulb } } };
    case 'outside-saturation-equation':
      return { path: humidity.by, message: { code: 'dew-point-too-low', figures: { actual, least } } };
    case 'vapour-pressure-not-below-total':
      return { path: humidity.by, message: { code: 'water-boils', figures: {} } };
    default:
      return null;
  }
}
