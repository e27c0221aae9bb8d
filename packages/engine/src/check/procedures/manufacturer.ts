/**
 * This maker's data and nothing else: targets, limits and ± as entered for the unit. Where the maker's ± is not entered the one of the general rules
 * stands in, marked; nothing else of them is a target or a limit. Version 1.
 */
import type { Procedure } from '../procedure';
import { asGeneralRules } from '../procedure';
import { GENERAL_RULES } from './general-rules';

const { superheat, subcooling, temperatureSplit, superheatWindow, makersMethods, airflow, conditions } = GENERAL_RULES;

export const MANUFACTURER: Procedure = {
  id: 'manufacturer',
  version: 1,
  packaged: true,
  assumes: 'nothing',
  decision: GENERAL_RULES.decision,
  superheat: {
    toleranceK: asGeneralRules(superheat.toleranceK),
    floorK: superheat.floorK && asGeneralRules(superheat.floorK),
    enteredTarget: true,
    makersTable: true,
    chart: null,
  },
  subcooling: { ...subcooling, toleranceK: asGeneralRules(subcooling.toleranceK) },
  temperatureSplit: { ...temperatureSplit, judged: false },
  makersMethods: makersMethods && {
    liquidLineApproachK: asGeneralRules(makersMethods.liquidLineApproachK),
    suctionLineTemperatureK: asGeneralRules(makersMethods.suctionLineTemperatureK),
    heatingDischargeTemperatureK: asGeneralRules(makersMethods.heatingDischargeTemperatureK),
    pressureAsSaturationK: asGeneralRules(makersMethods.pressureAsSaturationK),
  },
  superheatWindow: { ...superheatWindow, makersRange: 'only' },
  airflow: {
    ...airflow,
    leastM3PerSPerW: null,
    leastDesignFraction: airflow.leastDesignFraction && asGeneralRules(airflow.leastDesignFraction),
    gates: ['measured-low'],
    splitCounts: false,
  },
  conditions: { ...conditions, leastOutdoorK: null, leastReturnK: null },
  instruments: GENERAL_RULES.instruments,
  mostReadingAgeSeconds: GENERAL_RULES.mostReadingAgeSeconds,
  mostProbabilityOfNoTarget: GENERAL_RULES.mostProbabilityOfNoTarget,
};
