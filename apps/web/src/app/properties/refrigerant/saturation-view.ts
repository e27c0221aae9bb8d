/** What the page shows of a refrigerant at a typed pressure or temperature. Only the engine computes; here its numbers become lines of text. */
import {
  attempt,
  bubblePressurePa,
  bubbleTemperatureK,
  dewPressurePa,
  dewTemperatureK,
  isGaugeUnit,
  pressureToPa,
  refrigerantFacts,
  saturationRange,
  temperatureToK,
  type PressureUnit,
  type RefrigerantId,
  type TemperatureUnit,
} from '@chargewright/engine';
import {
  formatGauge,
  formatValue,
  lookUpFaultText,
  propertiesWords,
  saturationPressureFault,
  saturationTemperatureFault,
  type UnitSystem,
} from '@chargewright/wording';
import type { TypedValue } from '../../loose-checks/check-draft';
import { readNumber, unitAmong } from '../typed-number';

export type SaturationSide = 'pressure' | 'temperature';

export const PRESSURE_FIELD_UNITS: Readonly<Record<UnitSystem, readonly [PressureUnit, ...PressureUnit[]]>> = {
  'F-psi': ['psig', 'psia', 'inHgVac'],
  'C-kPa': ['kPag', 'kPaa'],
  'C-bar': ['barg', 'bara'],
};
export const TEMPERATURE_FIELD_UNITS: Readonly<Record<UnitSystem, readonly [TemperatureUnit]>> = {
  'F-psi': ['degF'],
  'C-kPa': ['degC'],
  'C-bar': ['degC'],
};
const PRESSURE_UNITS = Object.values(PRESSURE_FIELD_UNITS).flat();
const TEMPERATURE_UNITS = Object.values(TEMPERATURE_FIELD_UNITS).flat();

export interface SaturationQuestion {
  readonly refrigerant: RefrigerantId;
  readonly side: SaturationSide;
  readonly typed: TypedValue | undefined;
  /** Absolute; null while the place is not known. */
  readonly atmospherePa: number | null;
  readonly system: UnitSystem;
}

export interface SaturationLine {
  readonly name: string;
  readonly value: string;
  /** Beside the value: the absolute pressure. */
  readonly more: string;
  readonly use: string;
}

export interface SaturationView {
  /** What is wrong with the typed field; empty when nothing is. */
  readonly complaint: string;
  /** What was looked up, said back. */
  readonly at: string;
  readonly lines: readonly SaturationLine[];
  /** Under the other field. */
  readonly workedOut: string;
  /** Where the table is centred; null without an answer. */
  readonly temperatureK: number | null;
}

const words = propertiesWords.saturation;
const NOTHING: SaturationView = { complaint: '', at: '', lines: [], workedOut: '', temperatureK: null };
const complaintOnly = (complaint: string): SaturationView => ({ ...NOTHING, complaint });

export function saturationView(question: SaturationQuestion): SaturationView {
  const { value, complaint } = readNumber(question.typed);
  if (complaint !== '') return complaintOnly(complaint);
  if (value === undefined) return NOTHING;
  return question.side === 'pressure' ? atPressure(question, value) : atTemperature(question, value);
}

/** Null outside the curves; anything else that is refused was said before. */
const onCurve = (compute: () => number): number | null => {
  const result = attempt(compute);
  return result.ok ? result.value : null;
};

function atPressure(question: SaturationQuestion, value: number): SaturationView {
  const { refrigerant, atmospherePa, system } = question;
  const unit = unitAmong(PRESSURE_UNITS, question.typed?.unit);
  if (unit === undefined) return NOTHING;
  if (atmospherePa === null && isGaugeUnit(unit)) return complaintOnly(propertiesWords.place.unknown);
  const pressurePa = pressureToPa(value, unit, atmospherePa ?? 0);
  const fault = saturationPressureFault(refrigerant, pressurePa);
  if (fault !== null) return complaintOnly(lookUpFaultText(fault, system));
  const bubbleK = onCurve(() => bubbleTemperatureK({ refrigerant, pressurePa }));
  const dewK = onCurve(() => dewTemperatureK({ refrigerant, pressurePa }));
  if (bubbleK === null && dewK === null) return complaintOnly(outsideText(refrigerant, system));
  const text = (kelvin: number | null) =>
    kelvin === null ? words.partly : formatValue('temperatureK', kelvin, system);
  const absolute = formatValue('pressurePa', pressurePa, system);
  const at =
    atmospherePa === null ? words.at(absolute, '') : words.at(formatGauge(pressurePa, atmospherePa, system), absolute);
  const temperatureK = dewK ?? bubbleK;
  if (isPure(refrigerant)) {
    const line = { name: words.point, value: text(dewK), more: '', use: words.pointUse };
    const lines = [line, { name: words.glide, value: words.noGlide, more: '', use: '' }];
    return { complaint: '', at, lines, workedOut: words.workedOut(text(dewK)), temperatureK };
  }
  const glide = bubbleK === null || dewK === null ? null : formatValue('differenceK', dewK - bubbleK, system);
  return {
    complaint: '',
    at,
    lines: [
      { name: words.bubble, value: text(bubbleK), more: '', use: words.bubbleUse },
      { name: words.dew, value: text(dewK), more: '', use: words.dewUse },
      ...(glide === null ? [] : [{ name: words.glide, value: glide, more: '', use: '' }]),
    ],
    workedOut: words.workedOutBoth(text(bubbleK), text(dewK)),
    temperatureK,
  };
}

function atTemperature(question: SaturationQuestion, value: number): SaturationView {
  const { refrigerant, atmospherePa, system } = question;
  const unit = unitAmong(TEMPERATURE_UNITS, question.typed?.unit);
  if (unit === undefined) return NOTHING;
  const temperatureK = temperatureToK(value, unit);
  const fault = saturationTemperatureFault(refrigerant, temperatureK);
  if (fault !== null) return complaintOnly(lookUpFaultText(fault, system));
  const bubblePa = onCurve(() => bubblePressurePa({ refrigerant, temperatureK }));
  const dewPa = onCurve(() => dewPressurePa({ refrigerant, temperatureK }));
  if (bubblePa === null || dewPa === null) return complaintOnly(outsideText(refrigerant, system));
  const at = words.at(formatValue('temperatureK', temperatureK, system), '');
  const line = (name: string, pressurePa: number, use: string): SaturationLine => {
    const absolute = formatValue('pressurePa', pressurePa, system);
    return atmospherePa === null
      ? { name, value: absolute, more: '', use }
      : { name, value: formatGauge(pressurePa, atmospherePa, system), more: absolute, use };
  };
  if (isPure(refrigerant)) {
    const only = line(words.pointPressure, dewPa, words.pointUse);
    return { complaint: '', at, lines: [only], workedOut: words.workedOut(only.value), temperatureK };
  }
  const bubble = line(words.bubblePressure, bubblePa, words.bubbleUse);
  const dew = line(words.dewPressure, dewPa, words.dewUse);
  const workedOut = words.workedOutBoth(bubble.value, dew.value);
  return { complaint: '', at, lines: [bubble, dew], workedOut, temperatureK };
}

export const isPure = (refrigerant: RefrigerantId): boolean => refrigerantFacts(refrigerant).kind === 'pure';

function outsideText(refrigerant: RefrigerantId, system: UnitSystem): string {
  const { minTemperatureK, maxTemperatureK } = saturationRange(refrigerant);
  const [low, high] = [minTemperatureK, maxTemperatureK].map((kelvin) => formatValue('temperatureK', kelvin, system));
  return words.outside(low ?? '', high ?? '');
}
