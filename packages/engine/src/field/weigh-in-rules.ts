/**
 * What each set of rules asks of a weigh-in, as data: who may do it, how warm it may be, and whether the vacuum has to be on record.
 * Whether equality alone decides or the scale's uncertainty as well is the procedure's own decision.
 */
import type { ProcedureId } from '../check/procedure-ids';
import type { SourcedFigure } from '../methods/sourced-figure';
import type { WeighInRole } from '../methods/weigh-in/weigh-in-permission';
import { temperatureToK } from '../units';

export interface WeighInRules {
  readonly role: WeighInRole;
  /** K: watching does not count at this outdoor temperature or above where a standard method could test the system. */
  readonly observesBelow: SourcedFigure | null;
  /** K: below this weighing in stands in for a test, and the installer promises to come back. */
  readonly promisesBelow: SourcedFigure | null;
  readonly vacuumRecord: 'required' | 'advised';
  readonly standing: SourcedFigure['standing'];
  readonly source: string;
}

const RA_2008 = 'CEC Reference Residential Appendices (2008), RA3.2';
const FORMS_2019 = 'CEC certificates of installation and verification (2019), weigh-in procedure of RA3.2.3';

const degF = (value: number, source: string): SourcedFigure => ({
  value: temperatureToK(value, 'degF'),
  printed: `${value} °F`,
  standing: 'read',
  source,
});

const CEC_2008_INSTALLER: WeighInRules = {
  role: 'performs',
  observesBelow: null,
  promisesBelow: null,
  vacuumRecord: 'advised',
  standing: 'read',
  source: RA_2008,
};

const CEC_2019_INSTALLER: WeighInRules = {
  role: 'performs',
  observesBelow: null,
  promisesBelow: degF(55, FORMS_2019),
  vacuumRecord: 'required',
  standing: 'read',
  source: FORMS_2019,
};

export const WEIGH_IN_RULES: Readonly<Record<ProcedureId, WeighInRules>> = {
  'general-rules': {
    role: 'performs',
    observesBelow: null,
    promisesBelow: null,
    vacuumRecord: 'advised',
    standing: 'practice',
    source: 'Common practice, no source',
  },
  manufacturer: {
    role: 'performs',
    observesBelow: null,
    promisesBelow: null,
    vacuumRecord: 'advised',
    standing: 'practice',
    source: 'Common practice, no source',
  },
  'cec-ra3.2-2008-installer': CEC_2008_INSTALLER,
  'cec-ra3.2-2008-rater': { ...CEC_2008_INSTALLER, role: 'never' },
  'cec-ra3.2-2019-installer': CEC_2019_INSTALLER,
  'cec-ra3.2-2019-rater': {
    ...CEC_2019_INSTALLER,
    role: 'observes',
    observesBelow: degF(55, FORMS_2019),
    promisesBelow: null,
  },
};
