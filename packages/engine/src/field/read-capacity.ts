/** From the request for a capacity to SI quantities with their uncertainty. */
import type { Quantity } from '../derivation/quantity';
import type { AirPlace } from '../methods/airflow/air-properties';
import type { AirReading, CapacityInput } from '../methods/capacity/evaluate-capacity';
import type { FieldFault } from './field-codes';
import { FieldFaults } from './field-faults';
import type { CapacityRequest } from './field-request';
import { present } from '../check/present';
import { airReading, checkAir, nominalCapacityOf, siteOf } from './read-air';
import type { Site } from './read-air';

export type ReadCapacityRequest =
  { readonly ok: true; readonly input: CapacityInput } | { readonly ok: false; readonly faults: readonly FieldFault[] };

/** Every fault of the values; fields whose shape was at fault are left out. Total. */
export function crossCheckCapacity(request: CapacityRequest): readonly FieldFault[] {
  const faults = new FieldFaults();
  checkAir(faults, request);
  faults.positive('nominalCapacity', request.nominalCapacity);
  return faults.list;
}

/** Reads a request of the right shape; answers every fault of its values at once. Total. */
export function readCapacityRequest(request: CapacityRequest): ReadCapacityRequest {
  const faults = crossCheckCapacity(request);
  if (faults.length > 0) return { ok: false, faults };
  const site = siteOf(request);
  return {
    ok: true,
    input: {
      ...site,
      airflow: airReading('airflow', request, site),
      airflowIn: request.airflowIn ?? 'return',
      returnAir: airAt('return', request, site),
      supplyAir: airAt('supply', request, site),
      ...present('condensate', request.condensate),
      ...present('nominalCapacity', nominalCapacityOf(request.nominalCapacity)),
    },
  };
}

function airAt(place: AirPlace, request: CapacityRequest, site: Site): AirReading {
  const given = (id: `${AirPlace}WetBulb` | `${AirPlace}RelativeHumidity`): Quantity | undefined =>
    request[id] && airReading(id, request, site);
  return {
    dryBulb: airReading(`${place}DryBulb`, request, site),
    ...present('wetBulb', given(`${place}WetBulb`)),
    ...present('relativeHumidity', given(`${place}RelativeHumidity`)),
  };
}
