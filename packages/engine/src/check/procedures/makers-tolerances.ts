/** ± of a maker's methods where the maker states none. */
import { differenceRule } from '../procedure';
import type { MakersTolerances } from '../procedure';

const PRACTICE = 'Common practice, no source';
const CHOICE = 'Our choice, open to better evidence';

export const MAKERS_TOLERANCES: MakersTolerances = {
  liquidLineApproachK: differenceRule(3, 'deltaF', ['choice', CHOICE]),
  suctionLineTemperatureK: differenceRule(3, 'deltaF', ['practice', PRACTICE]),
  heatingDischargeTemperatureK: differenceRule(5, 'deltaF', ['choice', CHOICE]),
  // as near as a subcooling has to be
  pressureAsSaturationK: differenceRule(3, 'deltaF', ['choice', CHOICE]),
};
