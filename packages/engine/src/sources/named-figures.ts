/** Figures that belong to no single procedure, with what they are and where they are met. */
import { ATMOSPHERE_FIGURES } from '../check/atmosphere';
import { NEXT_STEP_FIGURES } from '../check/next-step/facts';
import { PULL_DOWN_FIGURES } from '../check/pull-down';
import { STOP_FIGURES } from '../check/stops';
import type { QuantityKind } from '../derivation/quantity';
import {
  APPROACH_BAND,
  condensingOverAirBand,
  CURRENT_BAND,
  FULL_AIRFLOW,
  returnOverEvaporatingBand,
} from '../diagnosis/usual-bands';
import { SINGLE_POINT_LIMIT } from '../methods/air-side';
import { FAN_TABLE_LIMIT } from '../methods/airflow/fan-table';
import { STANDARD_AIR_DENSITY } from '../methods/airflow/standard-air';
import { TEST_FIGURES } from '../methods/separating-tests';
import type { SourcedFigure } from '../methods/sourced-figure';
import { WEIGH_IN_FIGURES } from '../methods/weigh-in/data/weigh-in-figures';
import type { SourceGroup, SourcePlace } from './source-entry';

interface NamedFigure {
  readonly figure: SourcedFigure;
  readonly kind: QuantityKind | null;
  readonly group: SourceGroup;
  readonly places: readonly SourcePlace[];
}

const inGroup =
  (group: SourceGroup, ...places: readonly SourcePlace[]) =>
  (figure: SourcedFigure, kind: QuantityKind | null): NamedFigure => ({ figure, kind, group, places });

const limit = inGroup('limits', 'check');
const usual = inGroup('causes', 'check');
const weighIn = inGroup('weigh-in', 'weigh-in');
const plusMinus = inGroup('uncertainties', 'check');

const newer = condensingOverAirBand('R-410A', 'liquid');
const older = condensingOverAirBand('R-22', 'liquid');
const newerAtDischarge = condensingOverAirBand('R-410A', 'discharge');
const olderAtDischarge = condensingOverAirBand('R-22', 'discharge');
const atFullAirflow = returnOverEvaporatingBand(FULL_AIRFLOW.value);
const atUnknownAirflow = returnOverEvaporatingBand(null);

export const NAMED_FIGURES = {
  freezingStop: limit(STOP_FIGURES.freezingStopK, 'temperatureK'),
  freezing: limit(STOP_FIGURES.freezingK, 'temperatureK'),
  suctionFall: limit(STOP_FIGURES.fallPa, 'pressureDifferencePa'),
  superheatFloor: limit(STOP_FIGURES.floorK, 'differenceK'),
  mostCondensingOverAir: limit(STOP_FIGURES.mostCondensingOverAirK, 'differenceK'),
  mostDischarge: limit(STOP_FIGURES.mostDischargeK, 'temperatureK'),
  warmReturn: limit(PULL_DOWN_FIGURES.warmReturnK, 'temperatureK'),
  longOff: limit(PULL_DOWN_FIGURES.longOffHours, null),
  humidHouse: limit(PULL_DOWN_FIGURES.humid, 'fraction'),
  setsApart: limit(PULL_DOWN_FIGURES.leastMinutesApart, 'minutes'),
  steadyWetBulb: limit(PULL_DOWN_FIGURES.steadyWetBulbK, 'differenceK'),
  steady: limit(PULL_DOWN_FIGURES.steadyK, 'differenceK'),
  mostWeather: limit(ATMOSPHERE_FIGURES.mostWeatherPa, 'pressureDifferencePa'),
  nearFloorTarget: limit(NEXT_STEP_FIGURES.nearFloorTargetK, 'differenceK'),
  clearTarget: limit(NEXT_STEP_FIGURES.clearTargetK, 'differenceK'),
  mostAdded: limit(NEXT_STEP_FIGURES.mostAddedFraction, 'fraction'),
  highHead: limit(NEXT_STEP_FIGURES.highHeadK, 'differenceK'),
  highHeadOlder: limit(NEXT_STEP_FIGURES.highHeadOlderK, 'differenceK'),
  clearFrom: usual(TEST_FIGURES.clearFrom, 'fraction'),
  mostDrierDrop: usual(TEST_FIGURES.mostDrierDropK, 'differenceK'),
  mostStandingExcess: usual(TEST_FIGURES.mostStandingExcessK, 'differenceK'),
  coilsAlike: usual(TEST_FIGURES.coilsAlikeK, 'differenceK'),
  sameWetBulb: usual(TEST_FIGURES.sameWetBulbK, 'differenceK'),
  fullAirflow: usual(FULL_AIRFLOW, 'flowPerCapacityM3PerSPerW'),
  leastReturnOverEvaporating: usual(atFullAirflow.low, 'differenceK'),
  mostReturnOverEvaporating: usual(atFullAirflow.high, 'differenceK'),
  mostReturnOverEvaporatingUnknown: usual(atUnknownAirflow.high, 'differenceK'),
  leastCondensingOverAir: usual(newer.low, 'differenceK'),
  usualCondensingOverAir: usual(newer.high, 'differenceK'),
  usualCondensingOverAirOlder: usual(older.high, 'differenceK'),
  usualCondensingAtDischarge: usual(newerAtDischarge.high, 'differenceK'),
  usualCondensingAtDischargeOlder: usual(olderAtDischarge.high, 'differenceK'),
  leastApproach: usual(APPROACH_BAND.low, 'differenceK'),
  mostApproach: usual(APPROACH_BAND.high, 'differenceK'),
  leastCurrent: usual(CURRENT_BAND.low, 'fraction'),
  mostCurrent: usual(CURRENT_BAND.high, 'fraction'),
  deepestVacuum: weighIn(WEIGH_IN_FIGURES.deepestVacuumPa, null),
  mostVacuumRise: weighIn(WEIGH_IN_FIGURES.mostRisePa, null),
  isolated: weighIn(WEIGH_IN_FIGURES.isolatedMinutes, 'minutes'),
  mostAdjustment: weighIn(WEIGH_IN_FIGURES.mostAdjustmentKg, 'massKg'),
  wantedScale: weighIn(WEIGH_IN_FIGURES.wantedScaleKg, 'massKg'),
  assumedScale: weighIn(WEIGH_IN_FIGURES.assumedScaleKg, 'massKg'),
  rateByDensity: weighIn(WEIGH_IN_FIGURES.rateByDensityFraction, 'fraction'),
  singlePoint: inGroup('uncertainties', 'check', 'airflow')(SINGLE_POINT_LIMIT, 'differenceK'),
  weather: plusMinus(ATMOSPHERE_FIGURES.weatherPa, 'pressureDifferencePa'),
  barometer: plusMinus(ATMOSPHERE_FIGURES.barometerPa, 'pressureDifferencePa'),
  fanTable: inGroup('uncertainties', 'airflow')(FAN_TABLE_LIMIT, 'fraction'),
  standardAir: inGroup('formulas', 'airflow')(STANDARD_AIR_DENSITY, 'densityKgPerM3'),
} as const satisfies Readonly<Record<string, NamedFigure>>;
export type NamedFigureId = keyof typeof NAMED_FIGURES;
