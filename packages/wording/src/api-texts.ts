/** Sentences of the API alone. */
import type { MessageOf } from '@chargewright/engine';
import { lookUpTexts, parameterTexts } from './english/api';
import type { LookUpFigures } from './english/api';
import { structureFaultWords } from './english/structure-faults';
import { names } from './english/names';
import { formatStated } from './format-value';
import { messageText } from './message-texts';
import type { UnitSystem } from './unit-system';

export type LookUpMessage = MessageOf<LookUpFigures>;

/** What cannot be in a look-up, said with the figures as they were stated. */
export const lookUpFaultText = (message: LookUpMessage, system: UnitSystem): string =>
  messageText(lookUpTexts, message, { system, names, print: formatStated });

type ParameterFault = keyof typeof parameterTexts;

export const isParameterFault = (kind: string): kind is ParameterFault => Object.hasOwn(parameterTexts, kind);

/** Which of several query parameters to give. */
export const parameterFaultText = (kind: ParameterFault, parameters: readonly string[]): string =>
  parameterTexts[kind](structureFaultWords.alternatives(parameters));
