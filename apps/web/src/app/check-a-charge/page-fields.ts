/** Which numbers the page asks for, and what it says over them. */
import type { TypedField } from '@chargewright/contract/typed-fields';
import { checkPageWords, safetyWords } from '@chargewright/wording';
import type { DraftSetup } from '../loose-checks/check-draft';
import type { SectionId } from './reading-order';

const SETUP_MORE: readonly TypedField[] = [
  'nominalCapacity',
  'factoryCharge',
  'designAirflow',
  'maxHighPressure',
  'targetSuperheat',
  'stationPressure',
  'lineLength',
  'mostLineLength',
  'lift',
];
const VALVE_MORE: readonly TypedField[] = ['superheatLow', 'superheatHigh'];
export const VISIT_FIELDS: readonly TypedField[] = [
  'lowestReturnDryBulb',
  'instrumentsCheckedDaysAgo',
  'hoursOff',
  'addedThisVisit',
  'additionsOnEarlierVisits',
];

const hasValve = ({ meteringDevice }: DraftSetup): boolean => meteringDevice === 'txv' || meteringDevice === 'eev';

export const setupFields = (setup: DraftSetup): readonly TypedField[] =>
  hasValve(setup) ? ['elevation', 'targetSubcooling'] : ['elevation'];

export const setupMoreFields = (setup: DraftSetup): readonly TypedField[] =>
  hasValve(setup) ? [...SETUP_MORE, ...VALVE_MORE] : SETUP_MORE;

export const sectionWords: Readonly<Record<SectionId, { title: string; note: string; safety: string }>> = {
  outdoors: {
    title: checkPageWords.sections.outdoors,
    note: checkPageWords.sections.outdoorsNote,
    safety: safetyWords.hoses,
  },
  indoors: {
    title: checkPageWords.sections.indoors,
    note: checkPageWords.sections.indoorsNote,
    safety: safetyWords.climbing,
  },
  more: { title: checkPageWords.readings.moreReadings, note: '', safety: safetyWords.discharge },
};
