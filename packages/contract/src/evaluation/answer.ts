import { CAUSES, CRITERION_IDS, DERIVED_IDS, FINDINGS } from '@chargewright/engine';
import type { DerivedId, TargetSource, ToleranceSource } from '@chargewright/engine';
import * as z from 'zod';
import { object } from '../parsing/object';
import { codedText, derivationLine, orNull, toleranceAmount, uncertainAmount } from '../amounts/answer-amounts';

const TARGET_SOURCES = [
  'entered',
  'makers-chart-a',
  'finer-table',
  'makers-data',
  'split-table',
  'procedure-window',
  'entered-range',
  'window-and-range',
  'design-airflow',
  'airflow-per-capacity',
] as const satisfies readonly TargetSource[];

const TOLERANCE_SOURCES = [
  'procedure',
  'makers-data',
  'general-rules',
  'choice',
] as const satisfies readonly ToleranceSource[];

const criterion = object({
  criterion: z.enum(CRITERION_IDS),
  required: z.boolean().meta({ description: 'Whether the overall finding waits for this criterion.' }),
  actual: orNull(uncertainAmount),
  target: orNull(uncertainAmount),
  targetSource: orNull(z.enum(TARGET_SOURCES)),
  deviation: orNull(uncertainAmount),
  tolerance: orNull(toleranceAmount),
  toleranceSource: orNull(
    z.enum(TOLERANCE_SOURCES).meta({
      description:
        'Whose the tolerance is: the procedure’s, the maker’s as entered, that of the general rules until it is entered, or our choice.',
    }),
  ),
  byRule: orNull(z.enum(['passes', 'fails'])),
  probabilityWithin: z
    .number()
    .nullable()
    .meta({ description: 'Probability that the true deviation lies inside the tolerance (JCGM 106:2012).' }),
  onlyJust: z.boolean().meta({
    description: 'The finding is by the rule alone, and less certain than the procedure calls clear.',
  }),
  finding: z.enum(FINDINGS),
  reason: z.string().nullable().meta({ description: 'Code of why it is not-verifiable or not-judged.' }),
  reasonText: z.string().nullable(),
}).meta({ id: 'Criterion' });

const nextStep = object({
  code: z.string(),
  text: z.string(),
  notYet: z.array(codedText).meta({ description: 'What must not be done before.' }),
}).meta({ id: 'NextStep' });

const diagnosis = object({
  cause: z.enum(CAUSES),
  text: z.string(),
  fits: z.array(codedText),
  doesNotFit: z.array(codedText),
  nextMeasurement: orNull(codedText),
}).meta({ id: 'Diagnosis', description: 'A cause to check. Their order is fixed and says nothing about likelihood.' });

export const evaluationAnswer = object({
  engineVersion: z.string(),
  procedure: object({ id: z.string(), version: z.number().int() }),
  derived: object(
    Object.fromEntries(DERIVED_IDS.map((id) => [id, z.exactOptional(uncertainAmount)])) as Record<
      DerivedId,
      z.ZodExactOptional<typeof uncertainAmount>
    >,
  ).meta({ description: 'Only what could be computed.' }),
  criteria: z.array(criterion),
  overall: object({
    finding: z.enum([...FINDINGS, 'stop']),
    nextStep,
    stops: z.array(codedText),
    cautions: z.array(codedText),
  }),
  diagnosis: z.array(diagnosis),
  diagnosisNotes: z
    .array(codedText)
    .meta({ description: 'What there is to say besides the causes, or why none is listed.' }),
  derivation: z.array(derivationLine),
}).meta({
  id: 'EvaluationAnswer',
  description:
    'In the unit system of returnDryBulb, or without it of the first temperature given. Numbers are unrounded.',
});
