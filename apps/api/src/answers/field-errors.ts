import type { ProblemError, StructureFault } from '@chargewright/contract/problem';
import type { FieldFault } from '@chargewright/engine';
import { fieldFaultText, fieldStructureFaultText } from '@chargewright/wording';
import type { UnitSystem } from '@chargewright/wording';
import { structureErrors } from '../http/structure-errors';

/** Faults of the values of an airflow, a capacity or a weigh-in as the API answers them. */
export const fieldValueErrors = (faults: readonly FieldFault[], system: UnitSystem): readonly ProblemError[] =>
  faults.map((fault) => ({ path: fault.path, message: fieldFaultText(fault, system) }));

/** Faults of their shape. */
export const fieldStructureErrors = (faults: readonly StructureFault[]): readonly ProblemError[] =>
  structureErrors(faults, (fault) => fieldStructureFaultText(fault));
