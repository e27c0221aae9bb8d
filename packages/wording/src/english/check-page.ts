/** The page Check a charge and the frame around it. English is the reference: another language implements the same shape. */
import type { PreflightState } from '@chargewright/engine';
import type { UnitSystem } from '../unit-system';

const units: Readonly<Record<UnitSystem, string>> = { 'F-psi': '°F · psi', 'C-kPa': '°C · kPa', 'C-bar': '°C · bar' };
const states: Readonly<Record<PreflightState, string>> = { ok: 'OK', 'not-ok': 'Not OK', 'not-checked': 'Not checked' };

export const checkPageWords = {
  shell: {
    product: 'Chargewright',
    pageTitle: 'Check a charge · Chargewright',
    page: 'Check a charge',
    skip: 'Skip to the readings',
    home: 'Chargewright, check a charge',
    cancel: 'Cancel',
    toTheCheck: 'Go to Check a charge',
    loading: 'Opening your check',
  },
  units: {
    button: (system: UnitSystem) => units[system],
    choose: 'Show results in',
  },
  setup: {
    title: 'Set up the system',
    intro: 'What the nameplate says, before any reading.',
    change: 'Change',
    changeLabel: 'Change the setup',
    done: 'Go to the readings',
    otherRefrigerants: 'All others',
    estimated: 'estimated properties',
    more: 'More from the nameplate',
    makersData: 'Maker’s data',
    makersDataLink: (tables: number) =>
      tables === 0
        ? 'Maker’s data: type off a table'
        : `Maker’s data: ${tables === 1 ? '1 table' : `${tables} tables`}`,
    moreNote: 'Each of these makes the answer sharper. None is needed to start.',
    missingBoth: 'Choose the refrigerant and the metering device to start.',
    missingRefrigerant: 'Choose the refrigerant. It stands on the nameplate; look for a retrofit label too.',
    missingMetering: 'Choose the metering device of the indoor coil.',
    plateEmpty: 'No system set up yet',
    burns: (safetyClass: string) => `${safetyClass}: burns`,
    seaLevel: 'sea level assumed',
    system: 'The system',
    assumed: 'assumed',
    assumedFields: (fields: string) => `Assumed: ${fields}`,
    unstatedFields: (fields: string) => `Not stated yet: ${fields}`,
    assumedNote: 'Assumed until you say so. Tap what is right.',
    confirmAssumed: 'All as assumed',
    search: 'Search by number',
    noneFound: 'No refrigerant with this number is known here.',
  },
  sections: {
    outdoors: 'Outdoors, at the unit',
    outdoorsNote: 'shaded probe, clean pipe',
    indoors: 'Indoors, beside the coil',
    indoorsNote: 'return and supply plenum',
    visit: 'This visit',
  },
  visit: {
    start: 'System is running: start the clock',
    restart: 'Adjusted just now',
    restartLabel: 'Restart the clock after an adjustment',
    minutes: (minutes: number) => `${minutes} min`,
    runningFor: (minutes: number) => `Running ${minutes} ${minutes === 1 ? 'minute' : 'minutes'}`,
    toGo: (minutes: number) => `${minutes} min until the readings count`,
    soon: '12 minutes. Set the probes and get ready to read.',
    counts: 'Running. Readings count.',
    ready: '15 minutes. Readings count from now on.',
    adjustedNote:
      'After an adjustment wait 15 minutes, then take every reading again. Earlier readings stay in the record.',
    adjustedDone: 'Clock restarted. Every reading is asked again.',
    earlier: 'Running longer already? Set the minutes.',
    setMinutes: 'Minutes running',
    set: 'Set',
    confirmRestart: 'Restart the clock and ask every reading again?',
    iceSeen: 'Ice or frost on the coil or the suction line',
    commissioning: 'New installation: the line-set charge is still to be added',
    headRaised: 'Head pressure raised on purpose, by the maker’s method',
    keepFirstSet: 'Keep these as the first set, read all again',
    firstSetNote: (minutes: number) =>
      `First set kept ${minutes < 1 ? 'just now' : `${minutes} min ago`}. The second counts from 5 min on.`,
    forgetFirstSet: 'Forget the first set',
  },
  preflight: {
    title: 'Before you read',
    note: 'One tap each. Skip what you have not looked at.',
    states,
    progress: (done: number, all: number) => `${done} of ${all} looked at`,
  },
  readings: {
    /** Age of a typed reading in whole minutes. */
    typedAgo: (minutes: number) => (minutes < 1 ? 'typed just now' : `typed ${minutes} min ago`),
    staleAgo: (minutes: number) => `typed ${minutes} min ago · too old, read it again`,
    example: 'example value',
    /** Brought from the airflow page, with its ±. */
    workedOut: (plusMinus: string) => `from the Airflow page, ± ${plusMinus}`,
    editing: 'typing',
    useHumidity: 'Use relative humidity instead',
    useWetBulb: 'Use wet bulb instead',
    sign: 'Change the sign, plus or minus',
    signKey: '±',
    unitOf: (reading: string) => `Unit of ${reading}`,
    howToLabel: (reading: string) => `Where and how to read ${reading}`,
    place: 'Where',
    how: 'How',
    mistake: 'Usual mistake',
    optional: 'optional',
    moreReadings: 'More readings',
    notANumber: 'This is not a number yet. It stays as you typed it.',
    thousandsMark: 'Thousands or decimals? Type it without a mark between the thousands.',
    tooLong: 'That is longer than any reading. It stays as you typed it.',
  },
  example: {
    button: 'Fill with an example',
    note: 'An example is loaded. These are not your readings.',
    clear: 'Clear the example',
    cleared: 'The example is cleared.',
  },
  result: {
    title: 'Result',
    showMath: 'Show the math',
    hideMath: 'Hide the math',
    showMathOf: (criterion: string) => `Show the math of ${criterion}`,
    hideMathOf: (criterion: string) => `Hide the math of ${criterion}`,
    nextReading: 'Next reading',
    /** Leads to where the next step is done. */
    placeButton: {
      setup: 'Go to the setup',
      readings: 'Record it now',
      airflow: 'Find the airflow',
      'weigh-in': 'Weigh in',
      'makers-data': 'Enter the maker’s table',
    },
    nextReadingLabel: (reading: string) => `Next reading: ${reading}`,
    nextStep: 'Next step',
    stops: 'Stop',
    cautions: 'Keep in mind',
    noSetup: 'Set up the system to start.',
    noReadings: 'Take the first reading.',
    noReadingsNote: 'The result grows with each reading. New to this? Fill in an example first.',
    needsMending: (count: number) =>
      count === 1 ? 'One entry needs mending before it counts.' : `${count} entries need mending before they count.`,
    loading: 'Getting ready to judge',
    notLoaded:
      'The part that works out the result could not be fetched. Your readings are kept; it is tried again with your next reading.',
    failed: 'This result could not be worked out. Your readings are kept.',
    sources: 'Sources',
    announce: (headline: string) => `Result: ${headline}`,
  },
  ruler: {
    target: (value: string) => `target ${value}`,
    floor: (value: string) => `${value} floor`,
    plusMinus: (value: string) => `± ${value}`,
  },
  math: {
    empty: 'No number could be worked out yet.',
  },
};
