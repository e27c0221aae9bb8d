import { readSaturationQuery } from '@chargewright/contract/refrigerant';
import type {
  SaturationByPressure,
  SaturationByTemperature,
  SaturationQuery,
} from '@chargewright/contract/refrigerant';
import type { ProblemError } from '@chargewright/contract/problem';
import {
  attempt,
  bubblePressurePa,
  bubbleTemperatureK,
  dewPressurePa,
  dewTemperatureK,
  isGaugeUnit,
  isRefrigerantId,
  pressureFromPa,
  pressureToPa,
  refrigerantFacts,
  temperatureToK,
} from '@chargewright/engine';
import type { Amount, PressureUnit, RefrigerantId, Result, TemperatureUnit } from '@chargewright/engine';
import {
  lookUpFaultText,
  presentValue,
  saturationPressureFault,
  saturationTemperatureFault,
} from '@chargewright/wording';
import type { LookUpMessage, UnitSystem } from '@chargewright/wording';
import { atmosphereAt } from '../../http/atmosphere';
import { HttpProblem } from '../../http/http-problem';
import { structureErrors } from '../../http/structure-errors';

/**
 * Bubble and dew point of a refrigerant at a pressure or a temperature. Throws `HttpProblem`: `unknown-refrigerant`; `invalid-input` for a
 * faulty query, a pressure not above vacuum, and beyond the critical point. Where the curves have no answer the numbers are null.
 */
export function lookUpSaturation(id: string, rawQuery: unknown): SaturationByPressure | SaturationByTemperature {
  if (!isRefrigerantId(id)) throw new HttpProblem('unknown-refrigerant');
  const read = readSaturationQuery(rawQuery);
  if (!read.ok) throw new HttpProblem('invalid-input', { errors: structureErrors(read.faults) });
  const { query } = read;
  return 'pressure' in query ? byPressure(id, query, query.pressure) : byTemperature(id, query, query.temperature);
}

function byPressure(id: RefrigerantId, query: SaturationQuery, pressure: Amount<PressureUnit>): SaturationByPressure {
  const { value, unit } = pressure;
  const system: UnitSystem = unit === 'psig' || unit === 'psia' ? 'F-psi' : 'C-kPa';
  const atmosphere = atmosphereAt(query.elevation, system);
  // an absolute pressure can be judged without the atmosphere
  const pressurePa =
    atmosphere.ok || !isGaugeUnit(unit) ? pressureToPa(value, unit, atmosphere.ok ? atmosphere.pressurePa : 0) : null;
  const errors = [
    ...(atmosphere.ok ? [] : atmosphere.errors),
    ...(pressurePa === null ? [] : said('pressure', saturationPressureFault(id, pressurePa), system)),
  ];
  if (errors.length > 0 || !atmosphere.ok || pressurePa === null) throw new HttpProblem('invalid-input', { errors });
  const at = { refrigerant: id, pressurePa };
  const bubble = onCurve(() => bubbleTemperatureK(at));
  const dew = onCurve(() => dewTemperatureK(at));
  return {
    ...common(id, atmosphere.pressurePa, system),
    bubbleTemperature: bubble === null ? null : presentValue('temperatureK', bubble, system),
    dewTemperature: dew === null ? null : presentValue('temperatureK', dew, system),
    glide: bubble === null || dew === null ? null : presentValue('differenceK', dew - bubble, system),
    reason: bubble === null || dew === null ? 'outside-curve' : null,
  };
}

function byTemperature(
  id: RefrigerantId,
  query: SaturationQuery,
  temperature: Amount<TemperatureUnit>,
): SaturationByTemperature {
  const system: UnitSystem = temperature.unit === 'degF' ? 'F-psi' : 'C-kPa';
  const atmosphere = atmosphereAt(query.elevation, system);
  const temperatureK = temperatureToK(temperature.value, temperature.unit);
  const errors = [
    ...(atmosphere.ok ? [] : atmosphere.errors),
    ...said('temperature', saturationTemperatureFault(id, temperatureK), system),
  ];
  if (errors.length > 0 || !atmosphere.ok) throw new HttpProblem('invalid-input', { errors });
  const at = { refrigerant: id, temperatureK };
  const bubble = onCurve(() => bubblePressurePa(at));
  const dew = onCurve(() => dewPressurePa(at));
  return {
    ...common(id, atmosphere.pressurePa, system),
    bubblePressure: bubble === null ? null : gaugeAndAbsolute(bubble, atmosphere.pressurePa, system),
    dewPressure: dew === null ? null : gaugeAndAbsolute(dew, atmosphere.pressurePa, system),
    reason: bubble === null || dew === null ? 'outside-curve' : null,
  };
}

const common = (id: RefrigerantId, atmospherePa: number, system: UnitSystem) => ({
  refrigerant: id,
  modelGrade: refrigerantFacts(id).grade,
  atmosphere: presentValue('pressurePa', atmospherePa, system),
});

const said = (path: string, message: LookUpMessage | null, system: UnitSystem): readonly ProblemError[] =>
  message === null ? [] : [{ path, message: lookUpFaultText(message, system) }];

/** What cannot be was refused before; what is left of refusals is the two ends of a curve. */
function onCurve(compute: () => number): number | null {
  const result: Result<number> = attempt(compute);
  if (result.ok) return result.value;
  if (result.error.details.reason === 'outside-curve') return null;
  throw result.error;
}

const gaugeAndAbsolute = (pressurePa: number, atmospherePa: number, system: UnitSystem) => {
  const [gauge, absolute] = system === 'F-psi' ? (['psig', 'psia'] as const) : (['kPag', 'kPaa'] as const);
  return {
    gauge: { value: pressureFromPa(pressurePa, gauge, atmospherePa), unit: gauge },
    absolute: { value: pressureFromPa(pressurePa, absolute, atmospherePa), unit: absolute },
  };
};
