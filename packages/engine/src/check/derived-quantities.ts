/** Everything the readings of a check give, each derived once: the criteria, stops and cautions all look here. */
import { derive } from '../derivation/derive';
import type { Quantity } from '../derivation/quantity';
import { missing } from '../derivation/quantity';
import {
  returnEnthalpy,
  returnHumidityRatio,
  returnRelativeHumidity,
  returnWetBulbFromHumidity,
  SINGLE_POINT_SAMPLING,
  temperatureSplit,
} from '../methods/air-side';
import {
  condensingBubbleTemperature,
  condensingOverAmbient,
  evaporatingDewTemperature,
  meanEvaporatingTemperature,
  saturationModelError,
  subcooling,
  superheat,
} from '../methods/cycle-points';
import type { UsedReadingId } from './assumed-uncertainty';
import { bracketWetBulb } from '../methods/separating-tests';
import type { CheckReadings, CheckSetup } from './input';

export interface DerivedQuantities {
  readonly evaporatingDewTemperature: Quantity;
  readonly evaporatingBubbleTemperature: Quantity;
  readonly meanEvaporatingTemperature: Quantity;
  readonly condensingBubbleTemperature: Quantity;
  readonly condensingDewTemperature: Quantity;
  readonly superheat: Quantity;
  readonly subcooling: Quantity;
  readonly temperatureSplit: Quantity;
  readonly condensingOverAmbient: Quantity;
  /** Measured, once or before and after; else from dry bulb and relative humidity. */
  readonly returnWetBulb: Quantity;
  /** From relative humidity, whether or not a wet bulb was measured too. */
  readonly returnWetBulbFromHumidity: Quantity;
  readonly returnHumidityRatio: Quantity;
  readonly returnRelativeHumidity: Quantity;
  readonly returnEnthalpy: Quantity;
}

/** The reading of the high side that the port gives: a discharge port has no liquid pressure. */
export const highSideReading = (setup: CheckSetup): 'liquidPressure' | 'dischargePressure' =>
  setup.highSidePort === 'discharge' ? 'dischargePressure' : 'liquidPressure';

export function deriveQuantities(setup: CheckSetup, readings: CheckReadings): DerivedQuantities {
  const { refrigerant, atmosphere } = setup;
  const read = (id: UsedReadingId): Quantity => readings[id]?.quantity ?? missing(id);
  const dewError = [saturationModelError(refrigerant, 'dew')];
  const bubbleError = [saturationModelError(refrigerant, 'bubble')];
  const suction = { pressurePa: read('suctionPressure') };
  const highSide = {
    pressurePa: setup.highSidePort === 'none' ? missing('liquidPressure') : read(highSideReading(setup)),
  };
  const dewPointK = derive(evaporatingDewTemperature(refrigerant), suction, dewError);
  const bubblePointK = derive(condensingBubbleTemperature(refrigerant), highSide, bubbleError);

  const dryBulbK = read('returnDryBulb');
  const fromHumidity = derive(returnWetBulbFromHumidity, {
    dryBulbK,
    relativeHumidityRatio: read('returnRelativeHumidity'),
    pressurePa: atmosphere,
  });
  const wetBulbK = measuredWetBulb(readings) ?? withoutWetBulb(fromHumidity, readings);
  const humidityRatio = derive(returnHumidityRatio, { dryBulbK, wetBulbK, pressurePa: atmosphere });

  return {
    evaporatingDewTemperature: dewPointK,
    evaporatingBubbleTemperature: derive(condensingBubbleTemperature(refrigerant), suction, bubbleError),
    meanEvaporatingTemperature: derive(meanEvaporatingTemperature(refrigerant), suction, dewError),
    condensingBubbleTemperature: bubblePointK,
    condensingDewTemperature: derive(evaporatingDewTemperature(refrigerant), highSide, dewError),
    superheat: derive(superheat, { suctionLineK: read('suctionLineTemperature'), dewPointK }),
    subcooling: derive(subcooling, { bubblePointK, liquidLineK: read('liquidLineTemperature') }),
    temperatureSplit: derive(temperatureSplit, { returnDryBulbK: dryBulbK, supplyDryBulbK: read('supplyDryBulb') }, [
      SINGLE_POINT_SAMPLING,
    ]),
    condensingOverAmbient: derive(condensingOverAmbient, { bubblePointK, outdoorK: read('outdoorDryBulb') }),
    returnWetBulb: wetBulbK,
    returnWetBulbFromHumidity: fromHumidity,
    returnHumidityRatio: humidityRatio,
    returnRelativeHumidity: derive(returnRelativeHumidity, { dryBulbK, humidityRatio, pressurePa: atmosphere }),
    returnEnthalpy: derive(returnEnthalpy, { dryBulbK, humidityRatio }),
  };
}

/** As read, or the mean of the readings before and after those outdoors; where the two disagree, the later stands. */
function measuredWetBulb({ returnWetBulb, returnWetBulbBefore }: CheckReadings): Quantity | undefined {
  const afterK = returnWetBulb?.quantity;
  const beforeK = returnWetBulbBefore?.quantity;
  if (afterK === undefined || beforeK === undefined) return afterK;
  return bracketWetBulb({ beforeK, afterK }) ?? afterK;
}

/** Without a humidity reading the wet bulb itself is what to ask for, not the pair that could stand in for it. */
function withoutWetBulb(fromHumidity: Quantity, readings: CheckReadings): Quantity {
  return readings.returnRelativeHumidity === undefined ? missing('returnWetBulb') : fromHumidity;
}
