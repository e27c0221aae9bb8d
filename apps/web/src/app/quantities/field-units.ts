/** Which units a field can hold, and which one an empty field starts with. What was typed keeps the unit it was typed in. */
import { READING_DIMENSIONS, type Dimension, type ReadingId } from '@chargewright/engine';
import type { UnitSystem } from '@chargewright/wording';
import type { TypedField } from '@chargewright/contract/typed-fields';
import type { FieldKey } from '../loose-checks/check-draft';

type FieldDimension =
  Dimension | 'difference' | 'elevation' | 'barometer' | 'length' | 'power' | 'mass' | 'days' | 'hours' | 'count';

const TYPED_DIMENSIONS: Readonly<Record<TypedField, FieldDimension>> = {
  elevation: 'elevation',
  stationPressure: 'barometer',
  targetSubcooling: 'difference',
  targetSuperheat: 'difference',
  superheatLow: 'difference',
  superheatHigh: 'difference',
  nominalCapacity: 'power',
  designAirflow: 'airflow',
  factoryCharge: 'mass',
  maxHighPressure: 'pressure',
  expectedCompressorCurrent: 'current',
  lineLength: 'length',
  mostLineLength: 'length',
  lift: 'length',
  lowestReturnDryBulb: 'temperature',
  instrumentsCheckedDaysAgo: 'days',
  hoursOff: 'hours',
  addedThisVisit: 'mass',
  additionsOnEarlierVisits: 'count',
};

type Units = readonly [string, ...string[]];

const INCH_POUND: Readonly<Record<FieldDimension, Units>> = {
  temperature: ['degF'],
  difference: ['deltaF'],
  pressure: ['psig'],
  humidity: ['%'],
  airflow: ['cfm'],
  staticPressure: ['inH2O'],
  current: ['A'],
  voltage: ['V'],
  elevation: ['ft'],
  barometer: ['psia'],
  length: ['ft'],
  power: ['ton', 'Btu/h'],
  mass: ['oz', 'lb'],
  days: ['days'],
  hours: ['h'],
  count: ['times'],
};

const METRIC: Readonly<Record<FieldDimension, Units>> = {
  ...INCH_POUND,
  temperature: ['degC'],
  difference: ['deltaC'],
  pressure: ['kPag'],
  airflow: ['m3/h', 'L/s'],
  staticPressure: ['Pa'],
  elevation: ['m'],
  barometer: ['kPaa'],
  length: ['m'],
  power: ['kW'],
  mass: ['kg', 'g'],
};

const UNITS: Readonly<Record<UnitSystem, Readonly<Record<FieldDimension, Units>>>> = {
  'F-psi': INCH_POUND,
  'C-kPa': METRIC,
  'C-bar': { ...METRIC, pressure: ['barg'], barometer: ['bara'] },
};

const CAN_BE_NEGATIVE: ReadonlySet<FieldDimension> = new Set(['temperature', 'elevation']);

const dimensionOf = (key: FieldKey): FieldDimension => {
  const name = key.slice(key.indexOf(':') + 1);
  return key.startsWith('reading:') ? READING_DIMENSIONS[name as ReadingId] : TYPED_DIMENSIONS[name as TypedField];
};

/** Units offered for a field in a unit system; the first is the one an empty field has. */
export const unitsOf = (key: FieldKey, system: UnitSystem): Units => UNITS[system][dimensionOf(key)];

/** Whether a stored unit belongs to the field in some unit system; a damaged entry is named instead of misread. */
export const isUnitOf = (key: FieldKey, unit: string): boolean =>
  Object.values(UNITS).some((units) => units[dimensionOf(key)].includes(unit));

/** The unit system that a typed unit belongs to, so that an answer to it speaks as the person did; `fallback` where it tells none. */
export function systemOfUnit(key: FieldKey, unit: string, fallback: UnitSystem): UnitSystem {
  if (unitsOf(key, fallback).includes(unit)) return fallback;
  const systems = Object.keys(UNITS) as UnitSystem[];
  return systems.find((system) => unitsOf(key, system).includes(unit)) ?? fallback;
}

/** Whether a value below zero can be meant, so that the field needs a ± key. A suction line can be in a vacuum. */
export const canBeNegative = (key: FieldKey): boolean =>
  key === 'reading:suctionPressure' || CAN_BE_NEGATIVE.has(dimensionOf(key));
