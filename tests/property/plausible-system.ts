/** A system made forwards, in SI: the readings follow from the state that was drawn, by the engine's own curves. */
import type { HighSidePort, ReadingId, RefrigerantId } from '@chargewright/engine';
import {
  bubblePressurePa,
  dewPressurePa,
  bubbleTemperatureK,
  dewTemperatureK,
  differenceToK,
  flowToM3PerS,
  moistAirFromDryBulbAndRelativeHumidity,
  pressureDifferenceToPa,
  pressureToPa,
  READING_DIMENSIONS,
  saturationRange,
  standardAtmospherePressurePa,
  temperatureToK,
} from '@chargewright/engine';
import { chartValueK } from '../../packages/engine/src/methods/chart';
import { SPLIT_TABLE } from '../../packages/engine/src/methods/data/split-table';
import { SUPERHEAT_CHART_A } from '../../packages/engine/src/methods/data/superheat-chart-a';
import { SUPERHEAT_TABLE_FINER } from '../../packages/engine/src/methods/data/superheat-table-finer';
import { attempt } from '../../packages/engine/src/result';
import type { Drives } from './drives';
import type { ChartSite } from './makers-charts';

export interface SiReading {
  /** K, absolute Pa, fraction, m³/s, Pa, A or V by the quantity. */
  readonly value: number;
  readonly plusMinus?: { readonly half: number; readonly kind: 'limit' | 'k2' };
  readonly resolution?: number;
  readonly ageSeconds?: number;
  readonly instrumentId?: string;
}
export type SiReadings = Partial<Record<ReadingId, SiReading>>;

/** The drives that a request takes over as they are, and the readings that they gave. */
export interface PlausibleSystem {
  readonly drives: Drives;
  readonly atmospherePa: number;
  readonly readings: SiReadings;
  readonly earlierReadings: SiReadings | undefined;
  readonly targetSuperheatK: number | undefined;
  readonly targetSubcoolingK: number | undefined;
  readonly chartSite: ChartSite;
}

const kelvin = (fahrenheit: number): number => temperatureToK(fahrenheit, 'degF');
const difference = (fahrenheit: number): number => differenceToK(fahrenheit, 'deltaF');

const USUAL_SUPERHEAT_K = difference(12);
const USUAL_SUBCOOLING_K = difference(10);
const USUAL_SPLIT_K = difference(19);
const USUAL_HOT_GAS_F = 155;

export function plausibleSystem(drives: Drives): PlausibleSystem {
  const standardPa = standardAtmospherePressurePa(drives.elevationM ?? 0);
  const atmospherePa = Math.min(Math.max(standardPa + (drives.weatherPa ?? 0), 50_100), 109_900);
  const targetSuperheatK = mapped(drives.targetSuperheatF, difference);
  const targetSubcoolingK = mapped(drives.targetSubcoolingF, difference);
  const { wetBulbK } = moistAirFromDryBulbAndRelativeHumidity({
    dryBulbK: kelvin(drives.returnF),
    relativeHumidityRatio: drives.relativeHumidity,
    pressurePa: atmospherePa,
  });
  const readings = readingsOf(drives, { targetSuperheatK, targetSubcoolingK, wetBulbK });
  return {
    drives,
    atmospherePa,
    readings,
    earlierReadings: drives.earlier && earlierReadings(readings, drives),
    targetSuperheatK,
    targetSubcoolingK,
    chartSite: { readings, wetBulbK, ...differencesOf(readings, drives.refrigerant) },
  };
}

/** What gauges and clamps show as superheat and subcooling, where both are there and on the curve. */
function differencesOf(
  { suctionPressure, suctionLineTemperature, liquidLineTemperature, ...rest }: SiReadings,
  refrigerant: RefrigerantId,
): Pick<ChartSite, 'superheatK' | 'subcoolingK'> {
  const high = rest.liquidPressure ?? rest.dischargePressure;
  const dew = suctionPressure && attempt(() => dewTemperatureK({ refrigerant, pressurePa: suctionPressure.value }));
  const bubble = high && attempt(() => bubbleTemperatureK({ refrigerant, pressurePa: high.value }));
  return {
    superheatK: dew?.ok && suctionLineTemperature ? suctionLineTemperature.value - dew.value : undefined,
    subcoolingK: bubble?.ok && liquidLineTemperature ? bubble.value - liquidLineTemperature.value : undefined,
  };
}

interface Site {
  readonly wetBulbK: number;
  readonly targetSuperheatK: number | undefined;
  readonly targetSubcoolingK: number | undefined;
}

function readingsOf(drives: Drives, site: Site): SiReadings {
  const values: Partial<Record<ReadingId, number>> = {
    ...airSide(drives, site.wetBulbK),
    ...refrigerantSide(drives, site),
    ...otherReadings(drives),
    ...testReadings(drives, site.wetBulbK),
  };
  for (const id of drives.leftOut) delete values[id];
  const readings: SiReadings = {};
  for (const [id, value] of Object.entries(values) as [ReadingId, number][]) {
    readings[id] = { value, ...accuracyOf(id, drives) };
  }
  return readings;
}

/** Return and supply air, with the humidity in the form that was read. */
function airSide(drives: Drives, wetBulbK: number): Partial<Record<ReadingId, number>> {
  const returnK = kelvin(drives.returnF);
  const { relativeHumidity, humidityBy } = drives;
  const target = attempt(() => chartValueK(SPLIT_TABLE, { rowK: returnK, columnK: wetBulbK }));
  const supplyK = returnK - (target.ok ? target.value : USUAL_SPLIT_K) - difference(drives.splitMarginF);
  const air = { returnDryBulb: returnK, supplyDryBulb: supplyK, outdoorDryBulb: kelvin(drives.outdoorF) };
  switch (humidityBy) {
    case 'wet-bulb':
      return { ...air, returnWetBulb: wetBulbK, supplyWetBulb: Math.min(wetBulbK, supplyK - 0.7) };
    case 'humidity':
      return { ...air, returnRelativeHumidity: relativeHumidity, supplyRelativeHumidity: 0.9 };
    case 'both':
      return { ...air, returnWetBulb: wetBulbK, returnRelativeHumidity: relativeHumidity };
    case 'contradicting':
      return { ...air, returnWetBulb: wetBulbK, returnRelativeHumidity: 1 - relativeHumidity };
    case 'damp-wick':
      return { ...air, returnWetBulb: returnK - 0.01 * relativeHumidity };
    case 'nothing':
      return air;
  }
}

function otherReadings(drives: Drives): Partial<Record<ReadingId, number>> {
  const { airflowPerTon, electrical, staticPressureInH2O, dischargeLineF, heatingDischargePsi } = drives;
  const heating = drives.mode === 'heating';
  const ton = drives.nominalCapacityTon ?? 3;
  return defined({
    airflow: mapped(airflowPerTon, (perTon) => flowToM3PerS(perTon * ton, 'cfm')),
    compressorCurrent: electrical,
    lineVoltage: mapped(electrical, (current) => 245 - current),
    returnStaticPressure: staticPressureInH2O,
    supplyStaticPressure: mapped(staticPressureInH2O, (inches) => -inches),
    dischargeLineTemperature: mapped(dischargeLineF ?? (heating ? USUAL_HOT_GAS_F : undefined), kelvin),
    dischargePressure: heating ? pressureToPa(heatingDischargePsi, 'psia', 0) : undefined,
  });
}

/** What the separating tests measure. */
function testReadings(drives: Drives, wetBulbK: number): Partial<Record<ReadingId, number>> {
  const { refrigerant, wetBulbBeforeF, drierDropF, standing } = drives;
  const outdoorK = kelvin(drives.outdoorF);
  const outdoorCoilK = standing && outdoorK + difference(standing.outdoorCoilOverAirF);
  const drierInletK = outdoorK + difference(8);
  return defined({
    returnWetBulbBefore: mapped(wetBulbBeforeF, (before) => wetBulbK + difference(before)),
    drierInletTemperature: mapped(drierDropF, () => drierInletK),
    drierOutletTemperature: mapped(drierDropF, (drop) => drierInletK - difference(drop)),
    standingPressure: mapped(standing, ({ excessF }) =>
      bubblePressurePa({
        refrigerant,
        temperatureK: onCurve(refrigerant, (outdoorCoilK ?? outdoorK) + difference(excessF)),
      }),
    ),
    standingOutdoorCoilTemperature: outdoorCoilK,
    standingIndoorCoilTemperature: mapped(standing, ({ coilsApartF }) =>
      outdoorCoilK === undefined ? outdoorK : outdoorCoilK + difference(coilsApartF),
    ),
  });
}

function refrigerantSide(
  drives: Drives,
  { targetSuperheatK, targetSubcoolingK, wetBulbK }: Site,
): Partial<Record<ReadingId, number>> {
  const { refrigerant, highSidePort, rightHighSide } = drives;
  const outdoorK = kelvin(drives.outdoorF);
  const evaporatingK = onCurve(refrigerant, kelvin(drives.evaporatingF));
  const condensingK = onCurve(refrigerant, outdoorK + difference(drives.condensingOverAirF));
  const suctionPa = dewPressurePa({ refrigerant, temperatureK: evaporatingK });
  const highPa = bubblePressurePa({ refrigerant, temperatureK: condensingK });
  const superheatK =
    wantedSuperheatK(drives, targetSuperheatK, { wetBulbK, outdoorK }) + difference(drives.superheatMarginF);
  const subcoolingK = (targetSubcoolingK ?? USUAL_SUBCOOLING_K) + difference(drives.subcoolingMarginF);
  return defined({
    suctionPressure: suctionPa,
    suctionLineTemperature: evaporatingK + superheatK,
    [highSideId(highSidePort, rightHighSide)]: highPa,
    liquidLineTemperature: condensingK - subcoolingK,
    writtenEvaporatingTemperature: writtenK(drives.writtenEvaporating, {
      right: evaporatingK,
      other: attempt(() => bubbleTemperatureK({ refrigerant, pressurePa: suctionPa })),
    }),
    writtenCondensingTemperature: writtenK(drives.writtenCondensing, {
      right: condensingK,
      other: attempt(() => dewTemperatureK({ refrigerant, pressurePa: highPa })),
    }),
  });
}

const highSideId = (port: HighSidePort | undefined, right: boolean): ReadingId =>
  port === 'discharge' && right ? 'dischargePressure' : 'liquidPressure';

/** What the superheat of a good charge would be: entered, from the procedure's chart, or a valve's usual one. */
function wantedSuperheatK(
  { meteringDevice, procedure }: Drives,
  entered: number | undefined,
  { wetBulbK, outdoorK }: { wetBulbK: number; outdoorK: number },
): number {
  if (meteringDevice !== 'fixed-orifice') return USUAL_SUPERHEAT_K;
  if (entered !== undefined) return entered;
  const chart = procedure?.startsWith('cec') ? SUPERHEAT_TABLE_FINER : SUPERHEAT_CHART_A;
  const target = attempt(() => chartValueK(chart, { rowK: outdoorK, columnK: wetBulbK }));
  return target.ok ? target.value : USUAL_SUPERHEAT_K;
}

function writtenK(
  how: Drives['writtenEvaporating'],
  { right, other }: { right: number; other: ReturnType<typeof attempt<number>> },
): number | undefined {
  switch (how) {
    case undefined:
      return undefined;
    case 'right':
      return right + 0.2;
    case 'other-column':
      return (other.ok ? other.value : right) + 0.1;
    case 'far':
      return right + 6;
  }
}

/** A temperature at which the refrigerant has both pressures; some boil too low or too high for the weather that was drawn. */
function onCurve(refrigerant: RefrigerantId, temperatureK: number): number {
  const { minTemperatureK, maxTemperatureK } = saturationRange(refrigerant);
  return Math.min(Math.max(temperatureK, minTemperatureK + 1), maxTemperatureK - 1);
}

const HALF_WIDTHS: Readonly<Record<string, number>> = {
  temperature: difference(1),
  pressure: pressureDifferenceToPa(3, 'psi'),
  humidity: 0.03,
  airflow: flowToM3PerS(60, 'cfm'),
};

const SHARE = { stated: 1, tight: 0.25, poor: 2.5, 'coverage-2': 1, exact: 0, assumed: NaN } as const;

function accuracyOf(id: ReadingId, drives: Drives): Omit<SiReading, 'value'> {
  const dimension = READING_DIMENSIONS[id];
  const half = (HALF_WIDTHS[dimension] ?? 0) * SHARE[drives.accuracy];
  const air = id === 'returnDryBulb' || id === 'supplyDryBulb';
  return defined({
    plusMinus:
      Number.isNaN(half) || HALF_WIDTHS[dimension] === undefined
        ? undefined
        : ({ half, kind: drives.accuracy === 'coverage-2' ? 'k2' : 'limit' } as const),
    resolution: dimension === 'temperature' ? mapped(drives.resolutionF, difference) : undefined,
    ageSeconds: id === 'returnDryBulb' || id === 'suctionPressure' ? drives.ageSeconds : undefined,
    instrumentId: drives.oneInstrument && air ? 'probe-1' : undefined,
  });
}

/** The same readings some minutes before: alike, with moved air, or with the suction pressure still falling. */
function earlierReadings(readings: SiReadings, { earlier }: Drives): SiReadings {
  const before: SiReadings = { ...readings };
  const shift = (id: ReadingId, change: (value: number) => number): void => {
    const reading = before[id];
    if (reading !== undefined) before[id] = { ...reading, value: change(reading.value) };
  };
  if (earlier === 'moved') shift('returnDryBulb', (value) => value + difference(1.7));
  if (earlier === 'falling') shift('suctionPressure', (value) => 1.1 * value);
  if (earlier === 'drifting') shift('suctionPressure', (value) => 1.02 * value);
  return before;
}

export const mapped = <T, R>(value: T | undefined, change: (value: T) => R): R | undefined =>
  value === undefined ? undefined : change(value);

type Defined<T> = { [Key in keyof T]?: Exclude<T[Key], undefined> };

/** Leaves out what is `undefined`. */
export function defined<T extends object>(values: T): Defined<T> {
  return Object.fromEntries(Object.entries(values).filter(([, value]) => value !== undefined)) as Defined<T>;
}
