/** The pages of the worked examples, and the names of what stands on their keys. */
import type { SlipId, StandingTest, WeighInPart, WorkedFigureId, WorkedStanding } from '@chargewright/engine/training';

/** What is read or set up otherwise, and what would come of it. */
const slips: Readonly<Record<SlipId, { readonly name: string; readonly what: string }>> = {
  'wick-dried-out': {
    name: 'wick dried out',
    what: 'With a wick that has dried out, so that the wet bulb reads too high',
  },
  'judged-as-orifice': { name: 'judged as an orifice', what: 'Judged by superheat, as if it had a fixed orifice' },
  'without-liquid-pair': { name: 'liquid side unread', what: 'With the liquid side not read' },
  'rule-without-floor': {
    name: 'rules of 2008',
    what: 'By the California rules of 2008, whose superheat has no floor: by that rule it passes, and the stop stays',
  },
  'without-supply-air': { name: 'supply air unread', what: 'With the supply air not read' },
  'liquid-line-warm': { name: 'liquid line warmer', what: 'With a liquid line as warm as a low charge leaves it' },
  'gauge-at-sea-level': { name: 'sea-level chart', what: 'By the chart for sea level' },
  'scale-of-r410a': { name: 'scale of R-410A', what: 'On the scale of R-410A' },
  'cooler-liquid-line': {
    name: 'liquid line cooler',
    what: 'With a second reading of the liquid line, somewhat cooler',
  },
};

const standingTests: Readonly<Record<StandingTest['id'], string>> = {
  'no-air': 'first standing pressure',
  air: 'second standing pressure',
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
  standingBubblePressure: 'Bubble pressure of the coils',
  standingExcess: 'Standing pressure, as a temperature, above the coils',
  humidityRatio: 'Humidity ratio',
  relativeHumidity: 'Relative humidity',
  dewPoint: 'Dew point',
  enthalpy: 'Enthalpy',
  specificVolume: 'Specific volume',
  lineCharge: 'Charge of the line',
};

/** What a number is held against. */
const against: Readonly<Record<WorkedStanding, (source: string) => string>> = {
  read: (source) => `Printed: ${source}`,
  memory: (source) => `Table: ${source}`,
  practice: (source) => `Rule of thumb: ${source}`,
  choice: (source) => `Choice: ${source}`,
  computed: (source) => `Computed: ${source}`,
  'by-hand': () => 'By hand, from the numbers here',
};

/** Steps of a derivation that no other page shows. */
const steps: Readonly<Record<string, string>> = {
  humidityRatio: 'Humidity ratio',
  relativeHumidity: 'Relative humidity',
  dewPoint: 'Dew point',
  enthalpy: 'Enthalpy',
  specificVolume: 'Specific volume',
  lineAdjustment: 'Charge of the line beyond',
  requiredCharge: 'Charge required in all',
  chargeDifference: 'Put in, less required',
  chargeAfterAdjustment: 'Charge now in the system',
};

export const workedExampleWords = {
  list: {
    title: 'Worked examples',
    intro:
      'Readings as on paper, with questions. The key to each has the math, the finding and where every number comes from.',
    own: 'The readings are our own numbers, chosen so that the lesson happens. No real system stands behind them.',
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
    openAir: 'Open in Properties',
    openWeighIn: 'Open in Weigh in',
    openNote: 'Starts a new check with these readings, marked as an example. Your own checks stay as they are.',
    print: 'Print this page',
  },
  key: {
    title: (example: string) => `Key: ${example}`,
    toTheExample: 'Back to the example',
    answers: 'Answers',
    math: 'The math',
    mathOf: (what: string) => `The math, ${what}`,
    finding: 'Finding',
    nextStep: 'Next step',
    otherwise: 'Done otherwise',
    point: 'What stays',
    figures: 'Where the numbers come from',
    figure: 'Number',
    print: 'Checked against',
    here: 'Here',
    source: 'Source',
    ofWhich: (figure: string, which: string) => `${figure}, ${which}`,
    misprint: 'a misprint',
    ownNumbers: (readings: string) => `Our own numbers: ${readings}.`,
    ownReadings: 'all readings and what is given of the system',
    ownWeighIn: 'factory charge, installed length, vacuum and scale',
    noneOwn: 'None of the numbers given here is our own.',
    tables:
      'A printed table and our curves of the refrigerant may differ by a few tenths of a degree. Both are right within what is known.',
    showsAir: (which: string) => `The ${which} shows air in the system.`,
    showsNoAir: (which: string) => `The ${which} shows no air.`,
    printedSumWouldBe: 'The printed sum, weighed in',
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
    standingTest: (which: string) => `Stopped, ${which}`,
    standing: (pressure: string, temperature: string) => `${pressure}, both coils at ${temperature}`,
    factoryCharge: 'Factory charge',
    includedLength: 'Line included in it',
    extraLength: 'Line beyond that',
    rate: 'Rate of this line',
    printedSums: 'Sums the manual prints',
    putIn: 'Put in beyond the factory charge',
  },
  slips,
  standingTests,
  lines,
  figures,
  steps,
  against,
};
