/** How a criterion came out, in sentences a customer could read. */
import type { CriterionId, TargetSource, ToleranceSource } from '@chargewright/engine';
import type { CriterionParts } from '../criterion-parts';
import type { FindingPhrases } from '../language';
import type { Say } from '../message-texts';
import { readingWords } from './readings';
import { listWords } from './setup';

const criterionNames: FindingPhrases['criteria'] = {
  superheat: 'Superheat',
  subcooling: 'Subcooling',
  'liquid-line-approach': 'Liquid line over outdoor air',
  'suction-line-temperature': 'Suction line',
  'liquid-pressure': 'Liquid pressure',
  'heating-discharge-pressure': 'Discharge pressure in heating',
  'heating-discharge-temperature': 'Discharge line in heating',
  'temperature-split': 'Temperature split',
  'superheat-window': 'Superheat window',
  airflow: 'Airflow',
  conditions: 'Conditions',
  instruments: 'Instruments',
  'weigh-in': 'Weigh-in',
};

const findingWords: FindingPhrases['words'] = {
  within: 'within',
  above: 'above target',
  below: 'below target',
  'too-close-to-call': 'too close to call',
  'not-verifiable': 'not verifiable today',
  'not-judged': 'not judged',
  stop: 'stop',
};

/** Where `findingWords` would say target of something that has none. */
const findingWordsOf: FindingPhrases['wordsOf'] = {
  'superheat-window': { above: 'above the window', below: 'below the window' },
  airflow: { below: 'too low' },
  conditions: { within: 'fit', above: 'not fit', below: 'not fit' },
  instruments: { within: 'in date', above: 'out of date', below: 'out of date' },
};

const overallHeadlines: FindingPhrases['overall'] = {
  within: 'The charge is within its band',
  above: 'Outside its band',
  below: 'Outside its band',
  'too-close-to-call': 'Too close to call',
  'not-verifiable': 'Cannot be verified today',
  'not-judged': 'Not judged yet',
  stop: 'Stop',
};

const stopHeadlines: FindingPhrases['stops'] = {
  'liquid-return': 'Stop: liquid may be reaching the compressor',
  freezing: 'Stop: the coil is freezing',
  'high-pressure': 'Stop: the high side is too high',
  'hot-discharge': 'Stop: the discharge line is too hot',
};

const SOURCES: Readonly<Record<TargetSource, string>> = {
  entered: 'as entered',
  'makers-chart-a': 'from the makers’ chart',
  'finer-table': 'from the published table, from memory,',
  'makers-data': 'from the maker’s table as entered',
  'split-table': 'from the published split table (see sources)',
  'procedure-window': 'by these rules',
  'entered-range': 'by the maker’s range as entered',
  'window-and-range': 'by these rules and the maker’s range together',
  'design-airflow': 'from the design airflow',
  'airflow-per-capacity': 'from the nominal capacity',
};

/** Whose the width of the band is, where it is not simply that of the rules. */
const TOLERANCES: Readonly<Record<ToleranceSource, string>> = {
  procedure: '',
  'makers-data': ', with the maker’s ±',
  'general-rules': ', with the ± of the general rules: the maker’s was not entered',
  choice: ', with a ± of our choice: the maker’s was not entered',
};

/** How an input of a target's formula is named beside its value. */
const CONDITIONS: Readonly<Record<string, string>> = {
  wetBulbK: 'wet bulb',
  outdoorK: 'outdoors',
  returnDryBulbK: 'return',
  suctionPa: 'suction',
  liquidLineK: 'liquid line',
};

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

const range = ({ lowBare, low, high }: CriterionParts): string => {
  if (low !== null && high !== null) return `${lowBare} to ${high}`;
  if (low !== null) return `at least ${low}`;
  return high === null ? '' : `at most ${high}`;
};

const offTarget = ({ deviation, side }: CriterionParts): string =>
  side === 'on' || deviation === null ? 'on target' : `${deviation} ${side} target`;

const subject = ({ criterion }: CriterionParts): string =>
  criterion === 'superheat-window' ? criterionNames.superheat : criterionNames[criterion];

/** Criteria that hold a number against a target. */
function measuredHeadline(parts: CriterionParts): string {
  const { criterion, finding, actual } = parts;
  const name = subject(parts);
  if (actual === null) return `${name} is ${findingWordsOf[criterion]?.[finding] ?? findingWords[finding]}`;
  if (criterion === 'superheat-window') {
    return finding === 'within'
      ? `${name} is inside the window of ${range(parts)}`
      : `${name} ${actual} is ${finding} the window of ${range(parts)}`;
  }
  if (criterion === 'airflow') {
    if (finding === 'within') return 'Airflow is enough';
    return finding === 'below'
      ? `Airflow ${actual} is too low: ${range(parts)}`
      : `Airflow ${actual} is above its band`;
  }
  if (finding === 'within') return `${name} is within its band, ${offTarget(parts)}`;
  // a floor can be missed on the far side of the target
  return parts.side === finding ? `${name} is ${offTarget(parts)}` : `${name} is ${finding} its band`;
}

const PLAIN_HEADLINES: Readonly<Partial<Record<CriterionId, readonly [within: string, outside: string]>>> = {
  conditions: ['Conditions allow the test', 'Conditions do not allow the test'],
  instruments: ['The instruments are in date', 'The instruments are out of date'],
  'weigh-in': ['The weighed-in charge is within its band', 'The weighed-in charge is outside its band'],
};

function headline(parts: CriterionParts): string {
  const { criterion, finding, missing } = parts;
  switch (finding) {
    case 'within':
    case 'above':
    case 'below': {
      const plain = PLAIN_HEADLINES[criterion];
      return plain ? plain[finding === 'within' ? 0 : 1] : measuredHeadline(parts);
    }
    case 'too-close-to-call':
      return `${criterionNames[criterion]}: too close to call`;
    case 'not-verifiable':
      return `${criterionNames[criterion]}: not verifiable today`;
    case 'not-judged':
      return missing.length === 0
        ? `${criterionNames[criterion]}: not judged`
        : `${criterionNames[criterion]} needs ${listWords(missing.map((id) => `the ${readingWords[id].name}`))}`;
  }
}

function targetText(parts: CriterionParts): string {
  const { criterion, target, targetSource, toleranceSource, conditions } = parts;
  const source = targetSource === null ? '' : ` ${SOURCES[targetSource]}`;
  const width = toleranceSource === null ? '' : TOLERANCES[toleranceSource];
  if (criterion === 'superheat-window' || criterion === 'airflow') {
    const band = range(parts);
    return band === '' ? '' : `${capital(band)}${source}${toleranceSource === 'general-rules' ? width : ''}`;
  }
  if (target === null) return '';
  const at = Object.entries(conditions).flatMap(([name, value]) =>
    CONDITIONS[name] ? [`${value} ${CONDITIONS[name]}`] : [],
  );
  return `Target ${target}${source}${at.length === 0 ? '' : ` at ${at.join(', ')}`}${width}`;
}

/** With "only just" goes what would settle it. */
function certaintyText({ finding, probabilityWithin, probabilityOutside, onlyJust }: CriterionParts): string {
  if (probabilityWithin === null) return '';
  const sure =
    finding === 'above' || finding === 'below'
      ? `${probabilityOutside} sure it is ${finding} the band`
      : `${probabilityWithin} sure it is inside the band`;
  return onlyJust ? `only just: ${sure}; a better instrument or a careful second reading would settle it` : sure;
}

const ruleText = ({ criterion, byRule, finding }: CriterionParts): string => {
  if (
    byRule === null ||
    PLAIN_HEADLINES[criterion] !== undefined ||
    finding === 'within' ||
    finding === 'above' ||
    finding === 'below'
  )
    return '';
  return byRule === 'passes' ? 'by the rule it passes' : 'by the rule it fails';
};

const guidance = ({ criterion, target, actual, finding }: CriterionParts, say: Say): string =>
  criterion === 'subcooling' && finding === 'not-judged' && target === null && actual !== null
    ? `${say.deltaF(8)} to ${say.deltaF(14)} is common on nameplates: guidance, never a limit.`
    : '';

/** A number without a finding. */
const soFar = ({ finding, actual, plusMinus }: CriterionParts): string =>
  finding === 'not-judged' && actual !== null ? `So far ${actual} ± ${plusMinus}.` : '';

/** The reason first, then target and certainty. */
function detail(parts: CriterionParts, reason: string, say: Say): string {
  const facts = [targetText(parts), certaintyText(parts), ruleText(parts)].filter((text) => text !== '').join(' · ');
  // the headline has named missing readings already
  const because = parts.missing.length === 0 ? reason : '';
  return [because, soFar(parts), guidance(parts, say), facts].filter((text) => text !== '').join(' ');
}

/** The tolerance ruler in words. */
function ruler(parts: CriterionParts): string {
  const { actualBare, plusMinus, targetBare, lowBare, highBare, floored } = parts;
  const target = targetBare === null ? '' : `, target ${targetBare}`;
  const low = lowBare === null ? '' : `${lowBare}${floored ? ' (floor)' : ''}`;
  const band = [low, highBare ?? ''];
  const tolerance =
    lowBare !== null && highBare !== null ? band.join(' to ') : low ? `at least ${low}` : `at most ${highBare}`;
  const limits = lowBare === null && highBare === null ? '' : `, tolerance ${tolerance}`;
  const value = actualBare === null ? 'not known yet' : `${actualBare} plus or minus ${plusMinus}`;
  return `${subject(parts)} ${value}${target}${limits}`;
}

const STEP_NAMES: Readonly<Record<string, string>> = {
  evaporatingDewTemperature: 'Evaporating, dew point',
  condensingBubbleTemperature: 'Condensing, bubble point',
  meanEvaporatingTemperature: 'Evaporating, mean',
  superheat: 'Superheat',
  subcooling: 'Subcooling',
  temperatureSplit: 'Temperature split',
  condensingOverAmbient: 'Condensing over outdoor air',
  returnWetBulb: 'Return wet bulb',
  returnDewPoint: 'Return dew point',
  returnHumidityRatio: 'Return humidity ratio',
  returnRelativeHumidity: 'Return relative humidity',
  returnEnthalpy: 'Return enthalpy',
  targetSuperheat: 'Target superheat',
  targetTemperatureSplit: 'Target split',
  liquidLineApproach: 'Liquid line over outdoor air',
  targetSubcooling: 'Target subcooling',
  targetLiquidLineApproach: 'Target of liquid line over outdoor air',
  targetSuctionLineTemperature: 'Target suction line',
  targetLiquidPressure: 'Target liquid pressure, absolute',
  targetHeatingDischargePressure: 'Target discharge pressure, absolute',
  targetHeatingDischargeTemperature: 'Target discharge line',
};

/** What a step of the derivation gives. */
function stepName(id: string): string {
  const known = STEP_NAMES[id];
  if (known !== undefined) return known;
  const [, reading] = /^(?:\w+:)?(\w+)Absolute$/.exec(id) ?? [];
  const words =
    reading === undefined ? undefined : (readingWords as Readonly<Record<string, { label: string }>>)[reading];
  if (words !== undefined) return `${words.label}, absolute`;
  const nameOf = (criterion: string): string =>
    (criterionNames as Readonly<Record<string, string>>)[criterion] ?? criterion;
  const [, measured, target] = /^([\w-]+?)(-target)?Gauge$/.exec(id) ?? [];
  if (measured !== undefined)
    return `${nameOf(measured)}, ${target === undefined ? 'on the gauge' : 'target on the gauge'}`;
  const [, criterion] = /^([\w-]+)Deviation$/.exec(id) ?? [];
  return criterion === undefined ? id : `${nameOf(criterion)} off target`;
}

export const findingPhrases: FindingPhrases = {
  criteria: criterionNames,
  words: findingWords,
  wordsOf: findingWordsOf,
  overall: overallHeadlines,
  stops: stopHeadlines,
  headline,
  detail,
  ruler,
  stepName,
};
