import type { Procedure } from './procedure';
import { GENERAL_RULES } from './procedures/general-rules';

/** Every published procedure, the newest version of each. */
export const PROCEDURES: readonly Procedure[] = [GENERAL_RULES];

export const DEFAULT_PROCEDURE = GENERAL_RULES;

export const findProcedure = (id: string): Procedure | undefined => PROCEDURES.find((procedure) => procedure.id === id);
