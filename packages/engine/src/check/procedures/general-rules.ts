/** General rules, not those of one maker: what a careful practitioner holds a system to when the maker's own data are not at hand. Version 1. */
import { flowToM3PerS, powerToW } from '../../units';
import type { Procedure } from '../procedure';
import { differenceRule, plainRule, temperatureRule } from '../procedure';
import { MAKERS_TOLERANCES } from './makers-tolerances';

const NEW_HOMES_CHECKLIST =
  'Federal new-homes program, HVAC system checklist for raters, rev. 07, items 1.2.11 and 1.2.12';
const CEC_2008 = 'CEC Reference Residential Appendices (2008), RA3.2';
const CEC_2019 = 'CEC certificates of verification (2019), RA3.2';
const CHART_A = "Makers' superheat chart, copy A (installation manual 506374-01, 03/2010, p. 20)";
const CHOICE = 'Our choice, open to better evidence';
const PRACTICE = 'Common practice, no source';

export const GENERAL_RULES: Procedure = {
  id: 'general-rules',
  version: 1,
  packaged: true,
  assumes: 'the-usual',
  decision: { type: 'guarded', clearFrom: plainRule(0.8, '0.80', ['choice', CHOICE]) },
  superheat: {
    toleranceK: differenceRule(5, 'deltaF', ['read', `${CHART_A}; ${NEW_HOMES_CHECKLIST}`]),
    floorK: differenceRule(5, 'deltaF', ['read', CHART_A]),
    enteredTarget: true,
    makersTable: true,
    chart: 'makers-chart-a',
  },
  subcooling: {
    toleranceK: differenceRule(3, 'deltaF', ['read', NEW_HOMES_CHECKLIST]),
    leastK: null,
    lowBelowK: differenceRule(5, 'deltaF', ['choice', CHOICE]),
    clearFromK: differenceRule(8, 'deltaF', ['choice', CHOICE]),
    highAboveK: differenceRule(14, 'deltaF', ['choice', CHOICE]),
  },
  temperatureSplit: { toleranceK: differenceRule(3, 'deltaF', ['read', CEC_2008]), judged: true },
  makersMethods: MAKERS_TOLERANCES,
  superheatWindow: {
    lowK: differenceRule(4, 'deltaF', ['read', CEC_2008]),
    highK: differenceRule(25, 'deltaF', ['read', CEC_2008]),
    makersRange: 'replaces',
  },
  airflow: {
    leastM3PerSPerW: plainRule(flowToM3PerS(350, 'cfm') / powerToW(1, 'ton'), '350 cfm/ton', ['read', CEC_2019]),
    leastOfAlterationM3PerSPerW: null,
    leastOfHighVelocityM3PerSPerW: null,
    leastDesignFraction: plainRule(0.85, '−15 % of design', ['memory', 'ANSI/ACCA 5 QI']),
    limitPasses: true,
    evidenceBasis: ['choice', CHOICE],
    gates: ['measured-low', 'split-above'],
    splitCounts: true,
    splitCautions: [],
    eitherSuffices: false,
    permittedPaths: [],
  },
  conditions: {
    leastOutdoorK: temperatureRule(55, 'degF', ['read', CEC_2008]),
    mostOutdoorForSuperheatK: null,
    coolBelowK: temperatureRule(70, 'degF', ['choice', CHOICE]),
    leastReturnK: temperatureRule(70, 'degF', ['read', CEC_2019]),
    leastRunningMinutes: plainRule(15, '15 min', ['read', CEC_2008]),
    unrecorded: 'caution',
    accessHole: false,
  },
  instruments: { mostDays: plainRule(365, '12 months', ['choice', CHOICE]), beyond: 'caution' },
  mostReadingAgeSeconds: plainRule(600, '10 min', ['practice', PRACTICE]),
  mostProbabilityOfNoTarget: plainRule(0.2, '0.20', ['choice', CHOICE]),
};
