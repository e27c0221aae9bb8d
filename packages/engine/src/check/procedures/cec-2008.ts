/**
 * California Energy Commission, Reference Residential Appendices (2008), RA3.2: verification of charge, for the installer and for the independent
 * rater. Version 1. Its two tables are known from memory only; what was read and what was not stands beside each figure.
 */
import { flowToM3PerS, powerToW } from '../../units';
import type { Procedure } from '../procedure';
import { differenceRule, plainRule, temperatureRule } from '../procedure';

const RA_2008 = 'CEC Reference Residential Appendices (2008), RA3.2';
const FORMS_2019 = 'CEC certificates of verification (2019), RA3.2';
const CHOICE = 'Our choice, open to better evidence';
const PRACTICE = 'Common practice, no source';

export const CEC_2008_INSTALLER: Procedure = {
  id: 'cec-ra3.2-2008-installer',
  version: 1,
  packaged: false,
  assumes: 'the-usual',
  decision: { type: 'simple', clearFrom: plainRule(0.8, '0.80', ['choice', CHOICE]) },
  superheat: {
    toleranceK: differenceRule(5, 'deltaF', ['read', RA_2008]),
    floorK: null,
    enteredTarget: false,
    makersTable: false,
    chart: 'finer-table',
  },
  subcooling: {
    toleranceK: differenceRule(3, 'deltaF', ['read', RA_2008]),
    leastK: null,
    lowBelowK: differenceRule(5, 'deltaF', ['choice', CHOICE]),
    clearFromK: differenceRule(8, 'deltaF', ['choice', CHOICE]),
    highAboveK: differenceRule(14, 'deltaF', ['choice', CHOICE]),
  },
  temperatureSplit: { toleranceK: differenceRule(3, 'deltaF', ['read', RA_2008]), judged: true },
  makersMethods: null,
  superheatWindow: {
    lowK: differenceRule(4, 'deltaF', ['read', RA_2008]),
    highK: differenceRule(25, 'deltaF', ['read', RA_2008]),
    makersRange: 'replaces',
  },
  airflow: {
    leastM3PerSPerW: plainRule(flowToM3PerS(300, 'cfm') / powerToW(1, 'ton'), 'over 300 cfm/ton', ['read', RA_2008]),
    leastOfAlterationM3PerSPerW: null,
    leastOfHighVelocityM3PerSPerW: null,
    leastDesignFraction: null,
    limitPasses: false,
    evidenceBasis: ['read', RA_2008],
    gates: ['measured-low', 'split-above', 'nothing'],
    splitCounts: true,
    splitCautions: ['split-below'],
    eitherSuffices: true,
    permittedPaths: [],
  },
  conditions: {
    leastOutdoorK: temperatureRule(55, 'degF', ['read', RA_2008]),
    mostOutdoorForSuperheatK: null,
    coolBelowK: temperatureRule(70, 'degF', ['choice', CHOICE]),
    leastReturnK: temperatureRule(70, 'degF', ['read', FORMS_2019]),
    leastRunningMinutes: plainRule(15, '15 min', ['read', RA_2008]),
    unrecorded: 'gate',
    accessHole: false,
  },
  instruments: { mostDays: plainRule(31, '31 days', ['memory', RA_2008]), beyond: 'caution' },
  mostReadingAgeSeconds: plainRule(600, '10 min', ['practice', PRACTICE]),
  mostProbabilityOfNoTarget: plainRule(0.2, '0.20', ['choice', CHOICE]),
};

export const CEC_2008_RATER: Procedure = {
  ...CEC_2008_INSTALLER,
  id: 'cec-ra3.2-2008-rater',
  superheat: { ...CEC_2008_INSTALLER.superheat, toleranceK: differenceRule(6, 'deltaF', ['read', RA_2008]) },
  subcooling: { ...CEC_2008_INSTALLER.subcooling, toleranceK: differenceRule(4, 'deltaF', ['memory', RA_2008]) },
  temperatureSplit: { toleranceK: differenceRule(4, 'deltaF', ['read', RA_2008]), judged: true },
  superheatWindow: {
    lowK: differenceRule(3, 'deltaF', ['read', RA_2008]),
    highK: differenceRule(26, 'deltaF', ['read', RA_2008]),
    makersRange: 'replaces',
  },
};
