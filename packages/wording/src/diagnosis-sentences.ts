/** A diagnosis as sentences. The last argument is the language; English when left out. */
import type { Cause, DiagnosisNote, Evidence, Measurement } from '@chargewright/engine';
import { diagnosisTexts } from './english/diagnosis';
import { names } from './english/names';
import type { Language } from './language';
import { messageText } from './message-texts';
import type { UnitSystem } from './unit-system';

type Saying<Section extends keyof Language> = Pick<Language, Section>;
const english: Saying<'diagnosis'> = { diagnosis: diagnosisTexts };

export const causeText = (cause: Cause, language: Saying<'diagnosis'> = english): string =>
  language.diagnosis.causes[cause];

export const measurementText = (measurement: Measurement, language: Saying<'diagnosis'> = english): string =>
  language.diagnosis.measurements[measurement];

export const diagnosisNoteText = (note: DiagnosisNote, language: Saying<'diagnosis'> = english): string =>
  language.diagnosis.notes[note];

export const evidenceText = (
  evidence: Evidence,
  system: UnitSystem,
  language: Saying<'diagnosis' | 'names'> = { ...english, names },
): string => messageText(language.diagnosis.evidence, evidence, { system, names: language.names });
