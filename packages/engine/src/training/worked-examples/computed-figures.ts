/** What the engine finds for a checked figure of an example, in the unit of its print. */
import type { UsedReadingId } from '../../check/assumed-uncertainty';
import type { CriterionId } from '../../check/codes';
import { airTest } from '../../check/separating-tests';
import type { Quantity } from '../../derivation/quantity';
import { bareValue } from '../../derivation/quantity';
import { shortFormulaK } from '../../methods/short-formula';
import { bubblePressurePa } from '../../refrigerants/saturation';
import { differenceFromK, massFromKg, pressureFromPa, specificVolumeToFt3PerLb, temperatureFromK } from '../../units';
import { standardAtmospherePressurePa } from '../../psychrometrics/standard-atmosphere';
import type { JudgedRequest } from './judged-request';
import type { CheckedFigure, WorkedFigureUnit } from './worked-example';

export interface WorkedFigure {
  readonly figure: CheckedFigure;
  /** In the unit of the figure; `null` where there is no answer. */
  readonly computed: number | null;
}

/** SI to the unit of a print. A gauge pressure is one at sea level; an enthalpy has no factor and is not here. */
export function inUnit(si: number, unit: Exclude<WorkedFigureUnit, 'Btu/lb'>): number {
  switch (unit) {
    case 'degF':
    case 'degC':
      return temperatureFromK(si, unit);
    case 'deltaF':
    case 'deltaC':
      return differenceFromK(si, unit);
    case 'psia':
    case 'psig':
      return pressureFromPa(si, unit, standardAtmospherePressurePa(0));
    case '%':
      return 100 * si;
    case '1':
      return si;
    case 'ft3/lb':
      return specificVolumeToFt3PerLb(si);
    case 'oz':
      return massFromKg(si, unit);
  }
}

/** Figures of a check, from the request they are `of`. */
export function checkFigureSi({ what }: CheckedFigure, judged: JudgedRequest): number | null {
  const { input, derived, result } = judged;
  const reading = (id: UsedReadingId): number | undefined => input.readings[id]?.quantity.value;
  const criterion = (id: CriterionId) => result.criteria.find((each) => each.criterion === id);
  const bare = (quantity: Quantity): number | null => bareValue(quantity) ?? null;
  switch (what) {
    case 'evaporatingDewTemperature':
    case 'evaporatingBubbleTemperature':
    case 'condensingBubbleTemperature':
    case 'condensingDewTemperature':
    case 'superheat':
    case 'subcooling':
    case 'temperatureSplit':
    case 'condensingOverAmbient':
      return bare(derived[what]);
    case 'superheatFromBubble':
      return less(reading('suctionLineTemperature'), bareValue(derived.evaporatingBubbleTemperature));
    case 'subcoolingFromDew':
      return less(bareValue(derived.condensingDewTemperature), reading('liquidLineTemperature'));
    case 'targetSuperheat':
      return criterion('superheat')?.target?.value ?? null;
    case 'targetTemperatureSplit':
      return criterion('temperature-split')?.target?.value ?? null;
    case 'superheatDeviation':
      return criterion('superheat')?.deviation?.value ?? null;
    case 'subcoolingDeviation':
      return criterion('subcooling')?.deviation?.value ?? null;
    case 'splitDeviation':
      return criterion('temperature-split')?.deviation?.value ?? null;
    case 'shortFormula': {
      const [wetBulbK, outdoorK] = [bareValue(derived.returnWetBulb), reading('outdoorDryBulb')];
      return wetBulbK === undefined || outdoorK === undefined ? null : shortFormulaK({ wetBulbK, outdoorK });
    }
    case 'atmosphere':
      return input.setup.atmosphere.value;
    case 'standingBubblePressure': {
      const { refrigerant } = input.setup;
      const temperatureK = reading('standingOutdoorCoilTemperature');
      return temperatureK === undefined ? null : bubblePressurePa({ refrigerant, temperatureK });
    }
    case 'standingExcess':
      return bare(airTest(input).excess);
    case 'humidityRatio':
    case 'relativeHumidity':
    case 'dewPoint':
    case 'enthalpy':
    case 'specificVolume':
    case 'lineCharge':
      // of other kinds of example
      return null;
  }
}

const less = (a: number | undefined, b: number | undefined): number | null =>
  a === undefined || b === undefined ? null : a - b;
