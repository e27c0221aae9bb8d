/** For specs: the healthy systems evaporating at 40 °F and condensing at 105 °F to the last digit, so that a deviation is what its readings say. */
import { bubblePressurePa, dewPressurePa } from '../../refrigerants/saturation';
import { PA_PER_PSI, temperatureToK } from '../../units';
import type { EvaluationRequest, ReadingInput } from '../request';
import type { Changes } from './healthy-systems';
import { orificeRequest, valveRequest } from './healthy-systems';

const at = (refrigerant: 'R-22' | 'R-410A', degF: number) => ({
  refrigerant,
  temperatureK: temperatureToK(degF, 'degF'),
});
const psia = (pa: number): ReadingInput => ({ value: pa / PA_PER_PSI, unit: 'psia' });

export const exactOrifice = (superheatF: number, changes: Changes = {}): EvaluationRequest =>
  orificeRequest({
    ...changes,
    readings: {
      suctionPressure: psia(dewPressurePa(at('R-22', 40))),
      suctionLineTemperature: 40 + superheatF,
      liquidPressure: psia(bubblePressurePa(at('R-22', 105))),
      ...changes.readings,
    },
  });

export const exactValve = (subcoolingF: number, superheatF = 12, changes: Changes = {}): EvaluationRequest =>
  valveRequest({
    ...changes,
    readings: {
      suctionPressure: psia(dewPressurePa(at('R-410A', 40))),
      suctionLineTemperature: 40 + superheatF,
      liquidPressure: psia(bubblePressurePa(at('R-410A', 105))),
      liquidLineTemperature: 105 - subcoolingF,
      ...changes.readings,
    },
  });

/** All that the certificates of 2019 ask for besides the charge; `changes` win. */
export const provedFor2019 = (
  procedure: 'cec-ra3.2-2019-installer' | 'cec-ra3.2-2019-rater',
  changes: Changes = {},
): Changes => ({
  procedure,
  setup: { nominalCapacity: { value: 3, unit: 'ton' }, ...changes.setup },
  visit: { preflight: { panelsOn: 'ok', accessHole: 'ok' }, ...changes.visit },
  readings: { airflow: 1100, ...changes.readings },
});
