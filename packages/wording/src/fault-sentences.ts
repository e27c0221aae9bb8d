/** What cannot be, as sentences. In a file of its own: a page says these before anything is judged. */
import type { Fault } from '@chargewright/engine';
import { faultWords } from './english/faults';
import { names } from './english/names';
import { structureFaultWords } from './english/structure-faults';
import { fieldName } from './field-name';
import { formatStated } from './format-value';
import type { Language } from './language';
import { messageText } from './message-texts';
import type { StructureFault } from './structure-fault';
import type { UnitSystem } from './unit-system';

type Saying<Section extends keyof Language> = Pick<Language, Section>;

export function faultText(
  fault: Fault,
  system: UnitSystem,
  language: Saying<'faults' | 'names'> = { faults: faultWords, names },
): string {
  const { faults, naming } = language.faults;
  const field = fieldName(fault.path, naming);
  const counterpart = fieldName(fault.path.replace('WetBulb', 'DryBulb'), naming);
  const extra = { field, counterpart: counterpart.charAt(0).toLowerCase() + counterpart.slice(1) };
  return messageText(faults, fault, { system, names: language.names, print: formatStated, extra });
}

export function structureFaultText(
  { kind, field, allowed = [] }: StructureFault,
  language: Saying<'faults' | 'structureFaults'> = { faults: faultWords, structureFaults: structureFaultWords },
): string {
  const { structure, alternatives } = language.structureFaults;
  return structure[kind]({ field: fieldName(field, language.faults.naming), allowed: alternatives(allowed) });
}
