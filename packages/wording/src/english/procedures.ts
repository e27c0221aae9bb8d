/** The rules a check can be judged by: their names, and what is to be known about their figures. */
import type { ProcedureId } from '@chargewright/engine';

export interface ProcedureWords {
  readonly name: string;
  /** Where there is little room. */
  readonly short: string;
  /** What they are, and which of their figures were not read in the source. */
  readonly note: string;
}

const TABLES = 'Its tables of target superheat and temperature split are from memory, not read in the print.';

export const procedureWords: Readonly<Record<ProcedureId, ProcedureWords>> = {
  'general-rules': {
    name: 'General rules, not this maker’s',
    short: 'General rules',
    note: 'What a careful practitioner holds a system to without the maker’s own data. The table of temperature split is from memory, not read in the print.',
  },
  manufacturer: {
    name: 'This maker’s data',
    short: 'Maker’s data',
    note: 'For a unit whose nameplate, chart or manual is at hand. Targets, limits and ± as entered for it; nothing is taken as usual, so kind, mode, stage, port and elevation must be stated. Where the maker’s ± is not entered, that of the general rules stands in and is marked. The table of temperature split, which is from memory, judges nothing here.',
  },
  'cec-ra3.2-2008-installer': {
    name: 'California RA3.2 (2008), installer',
    short: 'RA3.2 2008, installer',
    note: `California Energy Commission, Reference Residential Appendices, 2008; split systems only. ${TABLES}`,
  },
  'cec-ra3.2-2008-rater': {
    name: 'California RA3.2 (2008), rater',
    short: 'RA3.2 2008, rater',
    note: `The same for the independent rater, with wider tolerances; that of subcooling is from memory too. ${TABLES}`,
  },
  'cec-ra3.2-2019-installer': {
    name: 'California RA3.2 (2019), installer',
    short: 'RA3.2 2019, installer',
    note: `California Energy Commission, as the certificates of 2019 compute it: airflow measured, instruments checked within a month. ${TABLES}`,
  },
  'cec-ra3.2-2019-rater': {
    name: 'California RA3.2 (2019), rater',
    short: 'RA3.2 2019, rater',
    note: `The same for the independent rater: wider tolerances, and a measured subcooling of its own. ${TABLES}`,
  },
};
