/** The rules a check can be judged by, by name. */
export const PROCEDURE_IDS = [
  'general-rules',
  'manufacturer',
  'cec-ra3.2-2008-installer',
  'cec-ra3.2-2008-rater',
  'cec-ra3.2-2019-installer',
  'cec-ra3.2-2019-rater',
] as const;
export type ProcedureId = (typeof PROCEDURE_IDS)[number];
