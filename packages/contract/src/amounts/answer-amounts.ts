import * as z from 'zod';
import { object } from '../parsing/object';

/** Units that answers use, besides those of the request. */
export const ANSWER_UNITS = [
  'degF',
  'degC',
  'deltaF',
  'deltaC',
  'psig',
  'psia',
  'kPag',
  'kPaa',
  'barg',
  'bara',
  'psi',
  'kPa',
  'bar',
  '%',
  '1',
  'Btu/lb',
  'kJ/kg',
  'ft3/lb',
  'm3/kg',
  'cfm',
  'L/s',
  'ton',
  'kW',
  'oz',
  'g',
  'ft',
  'm',
  'min',
  'd',
  'V',
  'A',
  'W',
  'Btu/h',
  's',
  'ft3',
  'm3',
  'Btu/ft3',
  'MJ/m3',
  'inH2O',
  'Pa',
  'lb/ft3',
  'kg/m3',
  'Btu/(lb·°F)',
  'kJ/(kg·K)',
  'lb/h',
  'kg/s',
  'cfm/ton',
  'L/s/kW',
  'oz/ft',
  'g/m',
] as const;
export type AnswerUnit = (typeof ANSWER_UNITS)[number];

const unit = z.enum(ANSWER_UNITS);

/** A computed number, unrounded. */
export const answerAmount = object({ value: z.number(), unit }).meta({ id: 'Amount' });

export const uncertainAmount = object({
  value: z.number(),
  unit,
  plusMinus: z.number().meta({ description: 'Expanded uncertainty, coverage factor k = 2, in the same unit.' }),
}).meta({ id: 'UncertainAmount' });

export const toleranceAmount = object({
  low: z.number().nullable(),
  high: z.number().nullable(),
  unit,
}).meta({
  id: 'Tolerance',
  description:
    'Limits of the deviation, or of the actual value where there is no target (superheat-window); both inclusive, null on a side without a limit.',
});

/** zod's `nullable()` of a named schema; as a union it comes out right in every generator of JSON Schema. */
export const orNull = <Schema extends z.ZodType>(schema: Schema) => z.union([schema, z.null()]);

export const codedText = object({
  code: z.string(),
  text: z.string().meta({ description: 'English, for people; programs use the code.' }),
}).meta({ id: 'CodedText' });

/** One step of a derivation, as on paper. */
export const derivationLine = object({
  id: z.string(),
  name: z.string(),
  formula: z.string(),
  substitution: z.string(),
  value: z.number(),
  unit,
  result: z.string().meta({ description: 'The value as printed.' }),
  source: z.string(),
}).meta({ id: 'DerivationLine' });
