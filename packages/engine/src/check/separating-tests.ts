/** The separating tests as they were recorded on the visit. */
import type { Quantity } from '../derivation/quantity';
import { missing } from '../derivation/quantity';
import type { AirTest, DrierTest } from '../methods/separating-tests';
import { testAir, testDrier } from '../methods/separating-tests';
import type { UsedReadingId } from './assumed-uncertainty';
import type { CheckInput, CheckReadings } from './input';

const reading = (readings: CheckReadings, id: UsedReadingId): Quantity => readings[id]?.quantity ?? missing(id);

export const drierTest = ({ readings }: CheckInput): DrierTest =>
  testDrier({
    inletK: reading(readings, 'drierInletTemperature'),
    outletK: reading(readings, 'drierOutletTemperature'),
  });

export const airTest = ({ setup, readings, visit }: CheckInput): AirTest =>
  testAir({
    refrigerant: setup.refrigerant,
    pressurePa: reading(readings, 'standingPressure'),
    outdoorCoilK: reading(readings, 'standingOutdoorCoilTemperature'),
    indoorCoilK: reading(readings, 'standingIndoorCoilTemperature'),
    liquidShutIn: visit.tests.liquidShutIn ?? false,
  });
