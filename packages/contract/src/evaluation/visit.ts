import { BULB_STATES, LEAK_SEARCHES, PREFLIGHT_ITEMS, PREFLIGHT_STATES, VALVE_MOVES } from '@chargewright/engine';
import type { PreflightItem, TestObservations, VisitInput } from '@chargewright/engine';
import * as z from 'zod';
import { object } from '../parsing/object';
import { mass, temperature } from '../amounts/amounts';
import { readings } from './readings';

const preflight = object(
  Object.fromEntries(PREFLIGHT_ITEMS.map((item) => [item, z.exactOptional(z.enum(PREFLIGHT_STATES))])) as Record<
    PreflightItem,
    z.ZodExactOptional<z.ZodEnum<{ ok: 'ok'; 'not-ok': 'not-ok'; 'not-checked': 'not-checked' }>>
  >,
);

const tests = object({
  liquidShutIn: z.exactOptional(
    z.boolean().meta({ description: 'For the standing pressure the liquid was shut into the outdoor coil.' }),
  ),
  bulb: z.exactOptional(z.enum(BULB_STATES)),
  valve: z.exactOptional(z.enum(VALVE_MOVES).meta({ description: 'Whether superheat holds still or swings.' })),
} satisfies Record<keyof TestObservations, z.ZodType>).meta({
  description: 'What was done and seen in the separating tests; what was measured in them are readings.',
});

export const visit = object({
  runningMinutes: z.exactOptional(z.number().meta({ description: 'Since the start or the last adjustment.' })),
  lowestReturnDryBulb: z.exactOptional(temperature),
  instrumentsCheckedDaysAgo: z.exactOptional(z.number()),
  preflight: z.exactOptional(preflight),
  leakSearch: z.exactOptional(z.enum(LEAK_SEARCHES)),
  addedThisVisit: z.exactOptional(mass),
  addedBefore: z.exactOptional(mass),
  additionsOnEarlierVisits: z.exactOptional(z.number()),
  commissioning: z.exactOptional(z.boolean()),
  hoursOff: z.exactOptional(z.number()),
  headRaised: z.exactOptional(z.boolean()),
  iceSeen: z.exactOptional(z.boolean()),
  tests: z.exactOptional(tests),
  earlier: z.exactOptional(object({ minutesAgo: z.number(), readings })),
} satisfies Record<keyof VisitInput, z.ZodType>).meta({ id: 'Visit' });
