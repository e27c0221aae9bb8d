import { AIRFLOW_PATHS, HIGH_SIDE_PORTS, METERING_DEVICES, MODES, STAGES, SYSTEM_KINDS } from '@chargewright/engine';
import type { SetupInput } from '@chargewright/engine';
import * as z from 'zod';
import { object } from '../parsing/object';
import { current, DIFFERENCE_UNITS_GIVEN, difference, flow, length, mass, power, pressure } from '../amounts/amounts';
import { makersChart } from './makers-chart';
import { LONGEST_TEXT } from './readings';

const required = {
  refrigerant: z
    .string()
    .max(LONGEST_TEXT)
    .meta({ description: 'ASHRAE 34 designation as in GET /api/v1/refrigerants.', examples: ['R-410A'] }),
  meteringDevice: z.enum(METERING_DEVICES),
};

const lineSet = object({
  length: z.exactOptional(length),
  mostLength: z.exactOptional(length.meta({ description: 'The longest the maker allows without further measures.' })),
  lift: z.exactOptional(length),
  /** Length that the factory charge allows for. */
  included: z.exactOptional(length),
});

const optional = {
  mode: z.exactOptional(z.enum(MODES).meta({ description: 'Left out: cooling.' })),
  kind: z.exactOptional(z.enum(SYSTEM_KINDS).meta({ description: 'Left out: split.' })),
  stage: z.exactOptional(z.enum(STAGES).meta({ description: 'Left out: full.' })),
  highSidePort: z.exactOptional(z.enum(HIGH_SIDE_PORTS).meta({ description: 'Left out: liquid.' })),
  elevation: z.exactOptional(length),
  stationPressure: z.exactOptional(pressure),
  targetSuperheat: z.exactOptional(difference),
  targetSubcooling: z.exactOptional(difference),
  targetSubcoolingPort: z.exactOptional(z.enum(['liquid', 'discharge'])),
  superheatRange: z.exactOptional(object({ low: z.number(), high: z.number(), unit: z.enum(DIFFERENCE_UNITS_GIVEN) })),
  nominalCapacity: z.exactOptional(power),
  designAirflow: z.exactOptional(flow),
  alteration: z.exactOptional(z.boolean().meta({ description: 'An alteration of an older system. Left out: no.' })),
  highVelocity: z.exactOptional(z.boolean().meta({ description: 'A small-duct high-velocity system. Left out: no.' })),
  airflowPath: z.exactOptional(
    z.enum(AIRFLOW_PATHS).meta({ description: 'A way that some procedures permit in place of measured airflow.' }),
  ),
  factoryCharge: z.exactOptional(mass),
  expectedCompressorCurrent: z.exactOptional(
    current.meta({ description: 'By the maker’s data at these conditions, or of this unit when it was right.' }),
  ),
  maxHighPressure: z.exactOptional(pressure),
  chargeMode: z.exactOptional(z.boolean()),
  makersChart: z.exactOptional(makersChart),
  makersCharts: z.exactOptional(
    z
      .array(makersChart)
      .meta({ description: 'Several tables, in place of makersChart or beside it; one of a kind and port.' }),
  ),
  lineSet: z.exactOptional(lineSet),
};

// Both directions: a field the engine does not know, or one that is forgotten here, does not compile.
const everyField = { ...required, ...optional } satisfies Record<keyof SetupInput, z.ZodType>;

export const setup = object(everyField).meta({ id: 'Setup' });

/** What parsed of a setup; the two required fields may be among the faulty ones. */
export const setupRest = object({
  refrigerant: z.exactOptional(required.refrigerant),
  meteringDevice: z.exactOptional(required.meteringDevice),
  ...optional,
  // a faulty table leaves its place, so that the paths of the others stay
  makersCharts: z.exactOptional(z.array(z.union([makersChart, z.undefined()]))),
});
