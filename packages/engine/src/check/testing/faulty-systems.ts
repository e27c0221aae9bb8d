/** For specs: a system said by what a technician sees of its cycle, in °F; whatever is left out is as on the healthy systems. */
import { bubblePressurePa, dewPressurePa } from '../../refrigerants/saturation';
import { PA_PER_PSI, temperatureToK } from '../../units';
import type { EvaluationRequest, ReadingInput } from '../request';
import type { Changes, ReadingChanges } from './healthy-systems';
import { orificeRequest, valveRequest } from './healthy-systems';

export interface Cycle {
  readonly evaporatingF?: number;
  readonly condensingF?: number;
  readonly outdoorF?: number;
  readonly superheatF?: number;
  readonly subcoolingF?: number;
  readonly splitF?: number;
}

/** Return air 76 °F, wet bulb 66 °F: the target split is 16.9 °F, and at 85 °F outdoors the target superheat of an orifice 15 °F. */
const RETURN_F = 76;

export const orificeSystem = (cycle: Cycle, changes: Changes = {}): EvaluationRequest =>
  orificeRequest({ ...changes, readings: { ...readings('R-22', { superheatF: 15, ...cycle }), ...changes.readings } });

export const valveSystem = (cycle: Cycle, changes: Changes = {}): EvaluationRequest =>
  valveRequest({ ...changes, readings: { ...readings('R-410A', { superheatF: 12, ...cycle }), ...changes.readings } });

function readings(refrigerant: 'R-22' | 'R-410A', cycle: Cycle & { readonly superheatF: number }): ReadingChanges {
  const { evaporatingF = 40, condensingF = 105, outdoorF = 85, superheatF, subcoolingF = 10, splitF = 16.9 } = cycle;
  const at = (degF: number) => ({ refrigerant, temperatureK: temperatureToK(degF, 'degF') });
  return {
    outdoorDryBulb: outdoorF,
    supplyDryBulb: RETURN_F - splitF,
    suctionPressure: psia(dewPressurePa(at(evaporatingF))),
    suctionLineTemperature: evaporatingF + superheatF,
    liquidPressure: psia(bubblePressurePa(at(condensingF))),
    liquidLineTemperature: condensingF - subcoolingF,
  };
}

const psia = (pa: number): ReadingInput => ({ value: pa / PA_PER_PSI, unit: 'psia' });
