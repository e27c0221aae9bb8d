/**
 * California Energy Commission, RA3.2 as the data forms of the 2019 certificates of installation and verification code it (CF2R and CF3R, MCH-23 airflow,
 * 25a superheat, 25b subcooling), for the installer and for the independent rater. Version 1. The target superheat table is from memory.
 */
import { flowToM3PerS, powerToW } from '../../units';
import type { Procedure, Rule } from '../procedure';
import { differenceRule, plainRule, temperatureRule } from '../procedure';

const FORMS_2019 = 'CEC certificates of installation and verification (2019), RA3.2';
const RA_2008 = 'CEC Reference Residential Appendices (2008), RA3.2';
const CHOICE = 'Our choice, open to better evidence';
const PRACTICE = 'Common practice, no source';

const cfmPerTon = (value: number): Rule =>
  plainRule(flowToM3PerS(value, 'cfm') / powerToW(1, 'ton'), `${value} cfm/ton`, ['read', FORMS_2019]);

export const CEC_2019_INSTALLER: Procedure = {
  id: 'cec-ra3.2-2019-installer',
  version: 1,
  packaged: true,
  assumes: 'the-usual',
  decision: { type: 'simple', clearFrom: plainRule(0.8, '0.80', ['choice', CHOICE]) },
  superheat: {
    toleranceK: differenceRule(5, 'deltaF', ['read', FORMS_2019]),
    floorK: null,
    enteredTarget: true,
    makersTable: false,
    chart: 'finer-table',
  },
  subcooling: {
    toleranceK: differenceRule(3, 'deltaF', ['read', FORMS_2019]),
    leastK: null,
    lowBelowK: differenceRule(5, 'deltaF', ['choice', CHOICE]),
    clearFromK: differenceRule(8, 'deltaF', ['choice', CHOICE]),
    highAboveK: differenceRule(14, 'deltaF', ['choice', CHOICE]),
  },
  // the 2019 forms no longer offer the split as a test of airflow; it is shown with the tolerance of 2008
  temperatureSplit: { toleranceK: differenceRule(3, 'deltaF', ['read', RA_2008]), judged: true },
  makersMethods: null,
  superheatWindow: {
    lowK: differenceRule(4, 'deltaF', ['read', FORMS_2019]),
    highK: differenceRule(25, 'deltaF', ['read', FORMS_2019]),
    makersRange: 'also',
  },
  airflow: {
    leastM3PerSPerW: cfmPerTon(350),
    leastOfAlterationM3PerSPerW: cfmPerTon(300),
    leastOfHighVelocityM3PerSPerW: cfmPerTon(250),
    leastDesignFraction: null,
    limitPasses: true,
    evidenceBasis: ['read', FORMS_2019],
    gates: ['measured-low', 'nothing'],
    splitCounts: false,
    splitCautions: ['split-above', 'split-below'],
    eitherSuffices: false,
    permittedPaths: [
      { path: 'duct-table', alterationOnly: false, despiteLowMeasurement: false },
      { path: 'best-possible', alterationOnly: true, despiteLowMeasurement: true },
    ],
  },
  conditions: {
    leastOutdoorK: temperatureRule(55, 'degF', ['read', FORMS_2019]),
    mostOutdoorForSuperheatK: temperatureRule(115, 'degF', ['read', FORMS_2019]),
    coolBelowK: temperatureRule(70, 'degF', ['choice', CHOICE]),
    leastReturnK: temperatureRule(70, 'degF', ['read', FORMS_2019]),
    leastRunningMinutes: plainRule(15, '15 min', ['read', RA_2008]),
    unrecorded: 'gate',
    accessHole: true,
  },
  instruments: { mostDays: plainRule(31, 'one month (31 days)', ['read', FORMS_2019]), beyond: 'gate' },
  mostReadingAgeSeconds: plainRule(600, '10 min', ['practice', PRACTICE]),
  mostProbabilityOfNoTarget: plainRule(0.2, '0.20', ['choice', CHOICE]),
};

export const CEC_2019_RATER: Procedure = {
  ...CEC_2019_INSTALLER,
  id: 'cec-ra3.2-2019-rater',
  superheat: { ...CEC_2019_INSTALLER.superheat, toleranceK: differenceRule(8, 'deltaF', ['read', FORMS_2019]) },
  subcooling: {
    ...CEC_2019_INSTALLER.subcooling,
    toleranceK: differenceRule(6, 'deltaF', ['read', FORMS_2019]),
    leastK: differenceRule(2, 'deltaF', ['read', FORMS_2019]),
  },
  superheatWindow: {
    lowK: differenceRule(3, 'deltaF', ['read', FORMS_2019]),
    highK: differenceRule(26, 'deltaF', ['read', FORMS_2019]),
    makersRange: 'also',
  },
};
