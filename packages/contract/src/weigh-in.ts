/** `POST /api/v1/weigh-in`: required against weighed-in charge, with the whole sum. */
import {
  INSTALLED_LINE_SIZES,
  LENGTH_UNITS,
  LINE_RATE_UNITS,
  LINE_SET_KINDS,
  PROCEDURES,
  SHORTER_LINE_RULES,
  VACUUM_UNITS,
  WEIGH_IN_METHODS,
} from '@chargewright/engine';
import type { LabelOutcome, LineSetRequest, VacuumOutcome, WeighInFinding, WeighInRequest } from '@chargewright/engine';
import * as z from 'zod';
import { amount, length, mass, temperature } from './amounts/amounts';
import { answerAmount, codedText, derivationLine, orNull, uncertainAmount } from './amounts/answer-amounts';
import { LONGEST_TEXT, stated } from './evaluation/readings';
import { object } from './parsing/object';
import { parseByField } from './parsing/parse-by-field';
import type { StructureFault } from './parsing/structure-fault';

const size = z.enum(INSTALLED_LINE_SIZES).meta({ description: 'Outside diameter in inches.' });
const rate = amount(LINE_RATE_UNITS).meta({ id: 'LineRate' });
const vacuumPressure = amount(VACUUM_UNITS).meta({ id: 'Vacuum', description: 'Absolute.' });

const line = object({
  installedLength: z.exactOptional(stated(LENGTH_UNITS, [...LENGTH_UNITS, '%']).meta({ description: 'One way.' })),
  liquidLineSize: z.exactOptional(size),
  makersRate: z.exactOptional(
    rate.meta({
      description: 'Left out: the printed R-410A rates, for another refrigerant in proportion to its liquid density.',
    }),
  ),
  includedLength: z.exactOptional(length.meta({ description: 'What the factory charge covers.' })),
  includedLiquidLineSize: z.exactOptional(size),
  makersIncludedRate: z.exactOptional(rate),
  shorterLine: z.exactOptional(
    z.enum(SHORTER_LINE_RULES).meta({ description: 'What this maker does with a line shorter than included.' }),
  ),
} satisfies Record<keyof LineSetRequest, z.ZodType>);

const required = {
  refrigerant: z
    .string()
    .max(LONGEST_TEXT)
    .meta({ description: 'ASHRAE 34 designation as in GET /api/v1/refrigerants.', examples: ['R-410A'] }),
  kind: z
    .enum(LINE_SET_KINDS)
    .meta({ description: 'Makers of ductless systems, metered outdoors, print other rates.' }),
  method: z.enum(WEIGH_IN_METHODS).meta({
    description: 'adjustment: the factory charge was kept; total: into an evacuated system.',
  }),
};

const optional = {
  procedure: z.exactOptional(
    z
      .string()
      .max(LONGEST_TEXT)
      .meta({ description: `One of ${PROCEDURES.map(({ id }) => id).join(', ')}. Left out: general-rules.` }),
  ),
  outdoorDryBulb: z.exactOptional(temperature),
  factoryCharge: z.exactOptional(mass),
  line: z.exactOptional(line),
  corrections: z.exactOptional(
    object({ coil: z.exactOptional(mass), drier: z.exactOptional(mass), other: z.exactOptional(mass) }).meta({
      description: 'By the maker; may be negative.',
    }),
  ),
  actualCharge: z.exactOptional(
    mass.meta({ description: 'Put in: beyond the factory charge (negative: recovered), or altogether.' }),
  ),
  scale: z.exactOptional(object({ resolution: z.exactOptional(mass), plusMinus: z.exactOptional(mass) })),
  vacuum: z.exactOptional(
    object({
      deepest: z.exactOptional(vacuumPressure),
      rise: z.exactOptional(vacuumPressure),
      isolatedMinutes: z.exactOptional(z.number()),
    }),
  ),
  labelMaximum: z.exactOptional(mass.meta({ description: 'Of the whole charge.' })),
};

const everyField = { ...required, ...optional } satisfies Record<keyof WeighInRequest, z.ZodType>;

export const weighInRequest = object(everyField).meta({ id: 'WeighInRequest' });

const weighInRest = object({
  refrigerant: z.exactOptional(required.refrigerant),
  kind: z.exactOptional(required.kind),
  method: z.exactOptional(required.method),
  ...optional,
});

const FINDINGS = [
  'within',
  'above',
  'below',
  'too-close-to-call',
  'not-verifiable',
  'not-judged',
] as const satisfies readonly WeighInFinding[];
const VACUUM_OUTCOMES = ['passes', 'fails', 'not-proven', 'not-recorded'] as const satisfies readonly VacuumOutcome[];
const LABEL_OUTCOMES = [
  'within',
  'near',
  'above',
  'not-recorded',
  'not-applicable',
] as const satisfies readonly LabelOutcome[];

const lineRateAnswer = object({
  rate: orNull(uncertainAmount),
  origin: z.enum(['maker', 'r410a-makers', 'liquid-density']),
  source: z.string(),
}).meta({ id: 'LineRateAnswer' });

export const weighInAnswer = object({
  engineVersion: z.string(),
  procedure: object({ id: z.string(), version: z.number().int() }),
  rate: orNull(lineRateAnswer),
  includedRate: orNull(lineRateAnswer),
  lineAdjustment: orNull(uncertainAmount),
  requiredAdjustment: orNull(uncertainAmount),
  requiredTotal: orNull(uncertainAmount),
  actualTotal: orNull(uncertainAmount),
  required: orNull(uncertainAmount).meta({ description: 'What is compared: adjustments or totals, by the method.' }),
  actual: orNull(uncertainAmount),
  difference: orNull(uncertainAmount),
  rounded: orNull(object({ required: answerAmount, actual: answerAmount })).meta({
    description: 'To the step of the scale: what the rule compares.',
  }),
  byRule: orNull(z.enum(['passes', 'fails'])),
  scale: object({ resolution: answerAmount, plusMinus: answerAmount }),
  vacuum: z.enum(VACUUM_OUTCOMES),
  label: z.enum(LABEL_OUTCOMES),
  finding: z.enum(FINDINGS),
  reason: orNull(codedText),
  missing: z.array(z.string()).meta({ description: 'What is missing, by the names of the request.' }),
  headline: z.string(),
  next: z.string(),
  sum: z
    .array(object({ about: z.string(), text: z.string() }))
    .meta({ description: 'The sum, line by line, as a person writes it on paper.' }),
  cautions: z.array(codedText),
  derivation: z.array(derivationLine),
}).meta({ id: 'WeighInAnswer', description: 'In oz and ft or in g and m, by the units given. Numbers are unrounded.' });
export type WeighInAnswer = z.infer<typeof weighInAnswer>;

export type ParsedWeighInRequest =
  | { readonly ok: true; readonly request: WeighInRequest }
  | { readonly ok: false; readonly faults: readonly StructureFault[]; readonly rest: Partial<WeighInRequest> };

/** Reads the body of a request: its shape, all faults at once. Whether the values can be is the engine's to say. */
export function parseWeighInRequest(body: unknown): ParsedWeighInRequest {
  const { whole, rest, faults } = parseByField<WeighInRequest, Partial<WeighInRequest>>(
    weighInRequest,
    weighInRest,
    body,
  );
  return whole === undefined ? { ok: false, faults, rest } : { ok: true, request: whole };
}
