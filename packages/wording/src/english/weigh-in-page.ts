/** The page Weigh in. */
import type { Correction, LineSetRequest, WeighInRequest } from '@chargewright/engine';
import type { ChoiceWords } from './setup';

const option = (label: string, hint = ''): ChoiceWords => ({ label, hint });

export const weighInPageWords = {
  title: 'Weigh in',
  pageTitle: 'Weigh in · Chargewright',
  intro: 'The charge by the scale: what the nameplate says, corrected for the line set that is installed.',
  refrigerant: (id: string) => `Refrigerant: ${id}`,
  refrigerantMissing: 'Choose the refrigerant',
  kind: {
    title: 'Kind of system',
    options: {
      ducted: option('Ducted split', 'The liquid is metered at the indoor coil.'),
      ductless: option('Ductless', 'Mini-split or multi-split, metered outdoors: makers print about half the rate.'),
    } satisfies Readonly<Record<WeighInRequest['kind'], ChoiceWords>>,
  },
  method: {
    title: 'How is it charged?',
    options: {
      adjustment: option('Adjustment', 'The factory charge stays; only the line set is added or taken off.'),
      total: option('Whole charge', 'Into an evacuated system.'),
    } satisfies Readonly<Record<WeighInRequest['method'], ChoiceWords>>,
  },
  nameplate: 'From the nameplate and the manual',
  line: 'The line set that is installed',
  size: { title: 'Liquid line, outside diameter', inches: (size: string) => `${size} in.`, other: 'Other' },
  includedSize: {
    title: 'The factory charge is meant for',
    note: 'Only where the manual names another diameter.',
    same: 'The same',
  },
  shorter: {
    title: 'The line is shorter than included. This maker:',
    options: {
      subtract: 'subtracts at the same rate',
      keep: 'keeps the factory charge',
    } satisfies Readonly<Record<NonNullable<LineSetRequest['shorterLine']>, string>>,
  },
  rate: {
    printed: (rate: string) => `No maker’s rate typed: ${rate} is what several makers print for R-410A.`,
    byDensity: (rate: string, refrigerant: string) =>
      `No maker’s rate typed: ${rate} for ${refrigerant}, from the R-410A rate by the density of the liquid, ±20 %. The R-410A rate itself is never taken for another refrigerant.`,
    none: 'There is no printed rate for this refrigerant, size and kind: type the maker’s.',
  },
  corrections: 'Corrections by the maker',
  correctionNames: { coil: 'coil', drier: 'drier', other: 'other' } satisfies Readonly<Record<Correction, string>>,
  vacuum: 'Vacuum before the charge',
  weighed: 'On the scale',
  scale: 'About the scale',
  ounces: 'and ounces',
  rules: {
    title: 'Judged by',
    attest:
      'The certificate also asks: nitrogen flowed while brazing, and the maker’s coil correction was used where there is one.',
  },
  result: {
    sum: 'The sum',
    rule: {
      passes: (required: string, actual: string) =>
        `By the rule it passes: required ${required}, weighed in ${actual}.`,
      fails: (required: string, actual: string) => `By the rule it fails: required ${required}, weighed in ${actual}.`,
    },
    vacuum: 'Vacuum',
    label: 'Against the label',
    next: 'Next step',
    choose: 'Choose refrigerant, kind and how it is charged.',
  },
};
