import {
  CHART_PORTS,
  CHART_UNITS,
  MAKERS_CHART_FACTS,
  MAKERS_CHART_KINDS,
  PRESSURE_DIFFERENCE_UNITS,
} from '@chargewright/engine';
import type { ChartDimension, MakersChartInput, MakersChartKind } from '@chargewright/engine';
import * as z from 'zod';
import { amount, DIFFERENCE_UNITS_GIVEN, temperature } from '../amounts/amounts';
import { object } from '../parsing/object';

const units = (Object.keys(CHART_UNITS) as ChartDimension[]).flatMap((dimension) => CHART_UNITS[dimension].units);

const axis = object({
  unit: z.enum(units),
  values: z.array(z.number()).meta({ description: 'Ascending; at least two, at most 40.' }),
}).meta({ id: 'ChartAxis' });

/** "superheat: rows outdoorDryBulb, columns returnWetBulb, cells a difference; port suction." */
function kindInWords(kind: MakersChartKind): string {
  const { rows, columns, cells, ports, leastOutdoorK } = MAKERS_CHART_FACTS[kind];
  const across = columns === null ? '' : `, columns ${columns}`;
  const limit =
    leastOutdoorK === null ? '' : `; from ${leastOutdoorK.printed} outdoors unless leastOutdoor says otherwise`;
  return `${kind}: rows ${rows}${across}, cells a ${cells}; port ${ports.join(' or ')}${limit}.`;
}

export const makersChart = object({
  kind: z.enum(MAKERS_CHART_KINDS).meta({ description: MAKERS_CHART_KINDS.map(kindInWords).join(' ') }),
  rows: z.exactOptional(axis),
  columns: z.exactOptional(axis),
  unit: z.enum(units).meta({ description: 'Of the cells. Gauge pressures of a table count from sea level.' }),
  cells: z.array(z.array(z.number().nullable())).meta({
    description:
      'One list for each row, one number for each column; null is a printed dash. Without rows: the one figure that always holds.',
  }),
  port: z.exactOptional(
    z.enum(CHART_PORTS).meta({ description: 'The service port it holds for. Left out: the first of its kind.' }),
  ),
  resolution: z.exactOptional(
    z.number().meta({ description: 'Smallest step the cells are printed in. Left out: from their decimals.' }),
  ),
  tolerance: z.exactOptional(
    amount([...DIFFERENCE_UNITS_GIVEN, ...PRESSURE_DIFFERENCE_UNITS]).meta({
      description: 'The maker’s ±. Left out: that of the procedure.',
    }),
  ),
  leastOutdoor: z.exactOptional(temperature),
  mostOutdoor: z.exactOptional(temperature),
  leastReturn: z.exactOptional(temperature),
  mostReturn: z.exactOptional(temperature),
} satisfies Record<keyof MakersChartInput, z.ZodType>).meta({
  id: 'MakersChart',
  description: 'A table that the maker prints for this unit.',
});
