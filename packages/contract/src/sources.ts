/** `GET /api/v1/sources`: on what every figure, table and formula stands. */
import { PROCEDURE_IDS } from '@chargewright/engine';
import { SOURCE_GROUPS, SOURCE_PLACES, SOURCE_STANDINGS } from '@chargewright/engine/sources';
import * as z from 'zod';
import { answerAmount, orNull } from './amounts/answer-amounts';
import { object } from './parsing/object';

const standing = z.enum(SOURCE_STANDINGS).meta({
  description:
    'read: in the publication; memory: written down from memory of it; practice: common practice, no source; choice: ours, open to better evidence; computed: from the publications named; definition: needs no source; entered: as good as the paper it is taken from.',
});

const citation = object({
  text: z.string(),
  edition: z
    .string()
    .nullable()
    .meta({ description: 'Year, month and year or revision, as stated; null where none is.' }),
}).meta({ id: 'Citation' });

const sourceEntry = object({
  id: z.string().meta({ description: 'Unique in the list.' }),
  group: z.enum(SOURCE_GROUPS),
  name: z.string().meta({ description: 'English, for people.' }),
  text: z.string().nullable().meta({ description: 'A formula as on paper, or the signs of a fault.' }),
  figure: orNull(answerAmount).meta({ description: 'In SI units; null where there is none to convert.' }),
  printed: z.string().nullable().meta({ description: 'The figure as its source prints it.' }),
  standing,
  citations: z.array(citation),
  usedBy: object({
    procedures: z.array(z.enum(PROCEDURE_IDS)).meta({ description: 'Empty: not a matter of the rules chosen.' }),
    pages: z.array(z.enum(SOURCE_PLACES)),
  }),
}).meta({ id: 'SourceEntry' });

const sourceProcedure = object({
  id: z.enum(PROCEDURE_IDS),
  version: z.int(),
  name: z.string(),
  standings: z
    .array(object({ standing, count: z.int() }))
    .meta({ description: 'How many of its figures and orders stand on what.' }),
}).meta({ id: 'SourceProcedure' });

export const sourcesAnswer = object({
  engineVersion: z.string(),
  procedures: z.array(sourceProcedure),
  entries: z.array(sourceEntry),
}).meta({ id: 'SourcesAnswer' });
export type SourcesAnswer = z.infer<typeof sourcesAnswer>;
