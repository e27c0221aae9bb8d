import type { Procedure } from './procedure';
import { CEC_2008_INSTALLER, CEC_2008_RATER } from './procedures/cec-2008';
import { CEC_2019_INSTALLER, CEC_2019_RATER } from './procedures/cec-2019';
import { GENERAL_RULES } from './procedures/general-rules';
import { MANUFACTURER } from './procedures/manufacturer';

/** Every published procedure, the newest version of each. */
export const PROCEDURES: readonly Procedure[] = [
  GENERAL_RULES,
  MANUFACTURER,
  CEC_2008_INSTALLER,
  CEC_2008_RATER,
  CEC_2019_INSTALLER,
  CEC_2019_RATER,
];

export const DEFAULT_PROCEDURE = GENERAL_RULES;

export const findProcedure = (id: string): Procedure | undefined => PROCEDURES.find((procedure) => procedure.id === id);
