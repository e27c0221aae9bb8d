/** Why two readings give no moist air, from the engine's refusal: which of them to look at, and the sentence. */
import { DRY_BULB_LIMITS, humidityRatioFromKgPerKg, REFUSED_MOIST_AIR_PAIRS } from '@chargewright/engine';
import type { EngineError, HumidityRatioUnit, MoistAirReading } from '@chargewright/engine';
import { airTexts } from './english/moist-air';
import type { AirFigures } from './english/moist-air';
import { names } from './english/names';
import { formatStatedAmount } from './format-amount';
import { formatStated } from './format-value';
import type { Language } from './language';
import { messageText } from './message-texts';
import type { UnitSystem } from './unit-system';

type AirCode = keyof AirFigures;

/** The two readings given, in the order of `MOIST_AIR_READINGS`, and the units they were given in. */
export interface AirGiven {
  readonly pair: readonly [MoistAirReading, MoistAirReading];
  readonly system: UnitSystem;
  readonly humidityRatioUnit?: HumidityRatioUnit;
}

export interface AirRefusal {
  /** The reading at fault; the second where both are. */
  readonly at: MoistAirReading;
  readonly text: string;
}

/** Null for a refusal that is none of the readings', such as one of the air pressure. */
export function airRefusal(
  refusal: EngineError,
  given: AirGiven,
  language: Pick<Language, 'air' | 'names'> = { air: airTexts, names },
): AirRefusal | null {
  const code = codeOf(refusal, given);
  if (code === null) return null;
  const context = { system: given.system, names: language.names, extra: figures(code, refusal, given) };
  return { at: readingAtFault(refusal, given), text: messageText(language.air, { code, figures: {} }, context) };
}

/** The reading a refusal names; an inch-pound enthalpy is the enthalpy. */
const readingOf = ({ details }: EngineError): string =>
  details.quantity === 'enthalpyBtuPerLb' ? 'enthalpyJPerKg' : details.quantity;

function readingAtFault(refusal: EngineError, { pair }: AirGiven): MoistAirReading {
  const named = readingOf(refusal);
  return pair.find((reading) => reading === named) ?? pair[1];
}

/** Why a pair determines no air, whatever its values; empty for one that does. */
export function refusedPairText(
  pair: readonly MoistAirReading[],
  language: Pick<Language, 'air' | 'names'> = { air: airTexts, names },
): string {
  const refused = REFUSED_MOIST_AIR_PAIRS.find(({ pair: each }) => each.every((reading) => pair.includes(reading)));
  if (refused === undefined) return '';
  const code = refused.reason === 'near-parallel-pair' ? 'wet-bulb-and-enthalpy' : 'dew-point-and-humidity-ratio';
  return messageText(language.air, { code, figures: {} }, { system: 'F-psi', names: language.names });
}

const OUTSIDE: Readonly<Partial<Record<string, AirCode>>> = {
  dryBulbK: 'dry-bulb-outside-range',
  wetBulbK: 'wet-bulb-outside-range',
  dewPointK: 'dew-point-outside-range',
  relativeHumidityRatio: 'humidity-takes-dry-bulb-out-of-range',
  humidityRatio: 'humidity-ratio-outside-range',
  enthalpyJPerKg: 'enthalpy-outside-range',
};

function codeOf(refusal: EngineError, { pair }: AirGiven): AirCode | null {
  const named = readingOf(refusal);
  switch (refusal.details.reason) {
    case 'outside-moist-air-range':
      if (named === 'dryBulbK' && pair[0] !== 'dryBulbK') return 'dry-bulb-comes-out-of-range';
      return OUTSIDE[named] ?? null;
    case 'outside-0-to-1':
      return 'humidity-outside-range';
    case 'outside-saturation-equation':
      return named === 'dewPointK' ? 'dew-point-too-low' : null;
    case 'wet-bulb-above-dry-bulb':
    case 'wet-bulb-too-low':
    case 'dew-point-above-dry-bulb':
    case 'dew-point-above-wet-bulb':
      return refusal.details.reason;
    case 'above-saturation':
      if (named === 'enthalpyJPerKg') return 'enthalpy-above-saturation';
      return pair[0] === 'wetBulbK' ? 'more-than-wet-bulb-holds' : 'more-than-dry-bulb-holds';
    case 'below-dry-air':
      return 'enthalpy-below-dry-air';
    case 'below-saturation':
      return 'enthalpy-below-saturation';
    case 'vapour-pressure-not-below-total':
      return 'water-boils';
    case 'near-parallel-pair':
      return 'wet-bulb-and-enthalpy';
    case 'dependent-pair':
      return pair[0] === 'dewPointK' ? 'dew-point-and-humidity-ratio' : 'dry-air-by-both';
    default:
      return null;
  }
}

/** Each sentence takes of these what it says. */
function figures(
  code: AirCode,
  { details }: EngineError,
  { system, humidityRatioUnit = systemUnit(system) }: AirGiven,
): Readonly<Record<AirFigures[AirCode], string>> {
  const { quantity, value, min = -Infinity, max = Infinity } = details;
  const say = (amount: number, of: string = quantity): string => {
    if (of === 'humidityRatio') {
      return formatStatedAmount(humidityRatioFromKgPerKg(amount, humidityRatioUnit), humidityRatioUnit);
    }
    if (of === 'enthalpyBtuPerLb') return formatStatedAmount(amount, 'Btu/lb');
    if (of === 'enthalpyJPerKg') return formatStatedAmount(amount / 1e3, 'kJ/kg');
    const kind = of === 'relativeHumidityRatio' ? 'fraction' : 'temperatureK';
    return formatStated(kind, amount, system);
  };
  const limits = code === 'humidity-takes-dry-bulb-out-of-range' ? DRY_BULB_LIMITS : ({ quantity, min, max } as const);
  return {
    actual: say(value),
    least: say(limits.min, limits.quantity),
    most: say(limits.max, limits.quantity),
    // where a temperature is above another, that one is its limit
    dryBulb: say(max),
    wetBulb: say(max),
  };
}

const systemUnit = (system: UnitSystem): HumidityRatioUnit => (system === 'F-psi' ? 'lb/lb' : 'kg/kg');
