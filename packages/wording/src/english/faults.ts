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
  'axis-missing': (f) => `${f.field}: missing. This kind of table has values down and across.`,
  'axis-not-used': (f) => `${f.field}: this table has one value a row. Leave the columns out.`,
  'axis-too-short': (f) => `${f.field}: give at least ${f.least} values.`,
  'axis-not-ascending': (f) =>
    `${f.field}: value ${f.place} is not above the one before it. Type them from low to high.`,
  'table-too-large': (f) => `${f.field}: at most ${f.most} values.`,
  'wrong-number-of-rows': (f) => `${f.field}: lines of numbers: ${f.given}, rows: ${f.wanted}. They must be as many.`,
  'wrong-length-of-row': (f) =>
    `${f.field}: numbers in row ${f.row}: ${f.given}, columns: ${f.wanted}. They must be as many.`,
  'no-cell-printed': (f) => `${f.field}: nothing but dashes. Type at least one number.`,
  'port-does-not-fit': (f) => `${f.field}: this kind of table does not hold at that port.`,
  'too-many-tables': (f) => `${f.field}: at most ${f.most} tables.`,
  'table-given-twice': (f) => `${f.field}: there is another table of this kind for this port.`,
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
    makersChart: { name: 'maker’s table' },
    makersCharts: { name: 'maker’s table' },
  },
  parts: {
    unit: 'unit',
    plusMinus: 'plus or minus',
    ageSeconds: 'age',
    resolution: 'resolution',
    instrumentId: 'instrument',
    rows: 'rows',
    columns: 'columns',
    cells: 'cells',
    port: 'port',
    tolerance: 'tolerance',
    leastOutdoor: 'least outdoor temperature',
    mostOutdoor: 'most outdoor temperature',
    leastReturn: 'least return temperature',
    mostReturn: 'most return temperature',
  },
  earlier: (name) => `earlier ${name}`,
  partOf: (name, part) => `${name}, ${part}`,
  numbered: (name, number) => `${name} ${number}`,
  placed: (part, [first, second]) =>
    second === undefined ? `${part}, value ${first}` : `row ${first}, cell ${second}`,
};

export const faultWords: FaultWords = { faults, naming };
