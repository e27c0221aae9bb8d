import type { ProblemError, StructureFault } from '@chargewright/contract/problem';
import { isParameterFault, parameterFaultText, structureFaultText, typeNames } from '@chargewright/wording';

/** Faults of a request's shape as the API answers them. */
export const structureErrors = (
  faults: readonly StructureFault[],
  say: typeof structureFaultText = structureFaultText,
): readonly ProblemError[] => faults.map((fault) => ({ path: fault.path, message: structureMessage(fault, say) }));

function structureMessage(
  { kind, path, part, expected, allowed = [] }: StructureFault,
  say: typeof structureFaultText,
): string {
  if (isParameterFault(kind)) return parameterFaultText(kind, allowed);
  const right = expected === undefined ? allowed : [typeNames[expected]];
  // what is wrong with an amount's unit names it in the sentence; that it is not there does not
  const field = kind === 'missing' || kind === 'null' ? part : path;
  return say({ kind, field: field === '' ? 'body' : field, allowed: right });
}
