/** The pages of the worked examples, and the names of what stands on their keys. */
import type { SlipId, WeighInPart, WorkedFigureId, WorkedStanding } from '@chargewright/engine/training';
import { separatingTestWords } from './separating-tests';

/** What is read or set up otherwise, and what would come of it. */
const slips: Readonly<Record<SlipId, { readonly name: string; readonly what: string }>> = {
  'wick-dried-out': { name: 'wick dried out', what: 'The wick has dried out, so the wet bulb reads too high.' },
  'judged-as-orifice': { name: 'judged as an orifice', what: 'Judged by superheat, as if it had a fixed orifice.' },
  'without-liquid-pair': { name: 'liquid side unread', what: 'The liquid side is not read.' },
  'rule-without-floor': {
    name: 'rules of 2008',
    what: 'By the California rules of 2008, whose superheat has no floor, the number passes. The stop stays.',
  },
  'without-supply-air': {
    name: 'supply air unread',
    what: 'The supply air is not read, so the cause stays in the dark.',
  },
  'liquid-line-warm': { name: 'liquid line warmer', what: 'The liquid line is as warm as a low charge leaves it.' },
  'gauge-at-sea-level': { name: 'sea-level chart', what: 'By the chart for sea level.' },
  'scale-of-r410a': { name: 'scale of R-410A', what: 'On the scale of R-410A.' },
  'cooler-liquid-line': { name: 'liquid line cooler', what: 'A second reading of the liquid line is somewhat cooler.' },
  'standing-as-printed': { name: 'first one, stopped', what: 'The first one, stopped.' },
  'standing-too-high': { name: 'second one, stopped', what: 'The second one, stopped.' },
};

const lines: Readonly<Record<WeighInPart['id'], string>> = {
  'thin-line': '5/16 in. line',
  'thick-line': '3/8 in. line',
};

const figures: Readonly<Record<WorkedFigureId, string>> = {
  evaporatingDewTemperature: 'Evaporating, dew point',
  evaporatingBubbleTemperature: 'Evaporating, bubble point',
  condensingBubbleTemperature: 'Condensing, bubble point',
  condensingDewTemperature: 'Condensing, dew point',
  superheat: 'Superheat',
  superheatFromBubble: 'Superheat by the wrong column',
  subcooling: 'Subcooling',
  subcoolingFromDew: 'Subcooling by the wrong column',
  temperatureSplit: 'Temperature split',
  condensingOverAmbient: 'Condensing over outdoor air',
  targetSuperheat: 'Target superheat',
  targetTemperatureSplit: 'Target split',
  superheatDeviation: 'Superheat off target',
  subcoolingDeviation: 'Subcooling off target',
  splitDeviation: 'Split off target',
  shortFormula: 'Short formula',
  atmosphere: 'Pressure of the air',
  standingBubblePressure: 'Bubble pressure at the coils’ temperature',
  standingExcess: 'Saturation over the coils’ temperature',
  humidityRatio: 'Humidity ratio',
  relativeHumidity: 'Relative humidity',
  dewPoint: 'Dew point',
  enthalpy: 'Enthalpy',
  specificVolume: 'Specific volume',
  lineCharge: 'Charge of the line',
};

/** What a number is held against. */
const against: Readonly<Record<WorkedStanding, (source: string) => string>> = {
  read: (source) => `printed: ${source}`,
  memory: (source) => `table: ${source}`,
  practice: (source) => `rule of thumb: ${source}`,
  choice: (source) => `choice: ${source}`,
  computed: (source) => `computed: ${source}`,
  'by-hand': () => 'by hand',
};

/** Steps of a derivation that no other page shows. */
const steps: Readonly<Record<string, string>> = {
  humidityRatio: 'Humidity ratio',
  relativeHumidity: 'Relative humidity',
  dewPoint: 'Dew point',
  enthalpy: 'Enthalpy',
  specificVolume: 'Specific volume',
};

export const workedExampleWords = {
  list: {
    title: 'Worked examples',
    intro:
      'Readings as on paper, with questions. The key to each has the math, the finding and where every number comes from.',
    air: 'Moist air',
    weighIn: 'Weigh-in',
  },
  example: {
    number: (number: number, of: number) => `Example ${number} of ${of}`,
    unknownTitle: 'No such example',
    unknown: 'There is no worked example at this address.',
    toTheList: 'All worked examples',
    given: 'Given',
    system: 'The system',
    readings: 'Readings',
    questions: 'Questions',
    showKey: 'Show the key',
    openCheck: 'Open in Check a charge',
    workIt: { 'moist-air': 'Work it in Moist air', 'weigh-in': 'Work it in Weigh in' },
    openNote: 'Starts a new check with these readings, marked as an example. Your own checks stay as they are.',
    print: 'Print this page',
    own: {
      check: 'The readings are our own numbers, chosen so that the lesson happens. No real system stands behind them.',
      'moist-air': 'Given as the Handbook gives it.',
      'weigh-in':
        'Lengths beyond, rates and printed sums are the manual’s. Factory charge and included length are our own numbers.',
    },
  },
  key: {
    title: (example: string) => `Key: ${example}`,
    toTheExample: 'Back to the example',
    answers: 'Answers',
    math: 'The math',
    mathOf: (what: string) => `The math, ${what}`,
    finding: 'Finding',
    causes: separatingTestWords.causesTitle,
    nextStep: 'Next step',
    otherwise: 'What if',
    point: 'What stays',
    figures: 'Other numbers of this example',
    figure: 'Number',
    print: 'Checked against',
    here: 'Here',
    source: 'Source',
    checked: (printed: string, against: string) => `${printed} · ${against}`,
    ofWhich: (figure: string, which: string) => `${figure}, ${which}`,
    misprint: 'a misprint',
    tables:
      'A printed table and our curves of the refrigerant may differ by a few tenths of a degree. Both are right within what is known.',
    printedSumWeighedIn: (line: string, sum: string) => `The ${line}, with ${sum} weighed in.`,
    offRequired: (difference: string) => `${difference} off what is required.`,
  },
  given: {
    refrigerant: 'Refrigerant',
    meteringDevice: 'Metering device',
    running: 'Running for',
    minutes: (minutes: number) => `${minutes} min`,
    ice: 'Ice on the coil or the suction line',
    seen: 'seen',
    pressure: 'Pressure of the air',
    dryBulb: 'Dry bulb',
    wetBulb: 'Wet bulb',
    factoryCharge: 'Factory charge',
    includedLength: 'Line included in it',
    extraLength: 'Line beyond that',
    rate: 'Rate of this line',
    printedSums: 'Sums the manual prints',
    putIn: 'Put in beyond the factory charge',
  },
  slips,
  lines,
  figures,
  steps,
  against,
};
