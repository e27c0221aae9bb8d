/** What cannot be, said beside the field. No blame: two facts, or what would be right. */
import type { FaultWords } from '../language';
import { readingWords } from './readings';
import { setupWords } from './setup';

const faults: FaultWords['faults'] = {
  'unknown-refrigerant': () => 'This refrigerant is not in the list. Use its number, as in “R-410A”.',
  'unknown-procedure': () => 'There is no procedure of this name.',
  'not-a-finite-number': (f) => `${f.field} is not a number.`,
  'wrong-unit': (f) => `${f.field} is not measured in this unit.`,
  'below-absolute-zero': (f) => `${f.field} ${f.actual} is below absolute zero.`,
  'wet-bulb-above-dry-bulb': (f) => `${f.field} ${f.wetBulb} is above ${f.counterpart} ${f.dryBulb}`,
  'above-critical-pressure': (f) =>
    `${f.field} ${f.actual} is above the critical pressure ${f.critical}: there is no liquid any more.`,
  'not-above-vacuum': (f) => `${f.field} is not above a perfect vacuum.`,
  'humidity-outside-range': (f) => `${f.field} lies between 0 and 100 %.`,
  'elevation-outside-range': (f) => `Elevation lies between ${f.least} and ${f.most}.`,
  'barometer-outside-range': (f) => `Barometer lies between ${f.least} and ${f.most}.`,
  'barometer-contradicts-elevation': (f) =>
    `Barometer ${f.stated} contradicts the elevation, where about ${f.expected} is usual. Give the pressure at the site, not corrected to sea level.`,
  'gauge-unit-on-absolute': (f) => `${f.field} is an absolute pressure: give it in psia, kPaa or bara.`,
  'must-be-positive': (f) => `${f.field} must be more than zero.`,
  'must-not-be-negative': (f) => `${f.field} must not be less than zero.`,
  'low-above-high': (f) => `${f.field}: the low end is above the high end.`,
};

const {
  numbers,
  preflight,
  alteration,
  highVelocity,
  airflowPath,
  meteringDevice,
  mode,
  kind,
  stage,
  highSidePort,
  leakSearch,
  refrigerant,
  procedure,
} = setupWords;

const naming: FaultWords['naming'] = {
  fields: {
    ...readingWords,
    ...numbers,
    ...preflight,
    alteration,
    highVelocity,
    airflowPath,
    meteringDevice,
    mode,
    kind,
    stage,
    highSidePort,
    leakSearch,
    refrigerant,
    procedure,
    liquidShutIn: { name: 'liquid shut in' },
    bulb: { name: 'bulb' },
    valve: { name: 'valve' },
  },
  parts: {
    unit: 'unit',
    plusMinus: 'plus or minus',
    ageSeconds: 'age',
    resolution: 'resolution',
    instrumentId: 'instrument',
  },
  earlier: (name) => `earlier ${name}`,
  partOf: (name, part) => `${name}, ${part}`,
};

export const faultWords: FaultWords = { faults, naming };
