/**
 * What a plausible system is drawn from, in the trade's °F: the state of the cycle, the house and the weather, and which of it was recorded.
 * Most draws are usual, so that every finding is met; the rest reach past every limit of judgement.
 */
import fc from 'fast-check';
import type { ProcedureId, RefrigerantId } from '@chargewright/engine';
import {
  AIRFLOW_PATHS,
  BULB_STATES,
  COMMON_REFRIGERANT_IDS,
  HIGH_SIDE_PORTS,
  LEAK_SEARCHES,
  METERING_DEVICES,
  MODES,
  PREFLIGHT_ITEMS,
  PREFLIGHT_STATES,
  PROCEDURES,
  READING_IDS,
  REFRIGERANT_IDS,
  STAGES,
  SYSTEM_KINDS,
  VALVE_MOVES,
} from '@chargewright/engine';
import { between, mixed } from './draws';
import type { DrawnChart } from './makers-charts';
import { anyChart } from './makers-charts';

const oneOf = <T>(values: readonly T[]): fc.Arbitrary<T> => fc.constantFrom(...values);

/** Present in `percent` of a hundred draws. */
const sometimes = <T>(percent: number, arbitrary: fc.Arbitrary<T>): fc.Arbitrary<T | undefined> =>
  mixed<T | undefined>([percent, arbitrary], [100 - percent, fc.constant(undefined)]);

const usual = <T>(common: fc.Arbitrary<T>, wide: fc.Arbitrary<T>): fc.Arbitrary<T> => mixed([6, common], [1, wide]);

const defaulted = <T>(common: T, others: readonly T[]): fc.Arbitrary<T | undefined> =>
  mixed<T | undefined>([20, fc.constant(common)], [2, fc.constant(undefined)], [1, oneOf(others)]);

export type HumidityBy = 'wet-bulb' | 'humidity' | 'both' | 'contradicting' | 'damp-wick' | 'nothing';
export type Written = 'right' | 'other-column' | 'far';
/** Outdoor coil over the air, indoor coil over the outdoor one, and saturation over the outdoor coil of the standing system. */
export interface Standing {
  readonly outdoorCoilOverAirF: number;
  readonly coilsApartF: number;
  readonly excessF: number;
  readonly shutIn: boolean | undefined;
}
export type Earlier = 'steady' | 'moved' | 'falling' | 'drifting';
export type Accuracy = 'assumed' | 'stated' | 'tight' | 'poor' | 'coverage-2' | 'exact';

const refrigerant: fc.Arbitrary<RefrigerantId> = mixed<RefrigerantId>(
  [3, oneOf<RefrigerantId>(['R-410A', 'R-22'])],
  [2, oneOf<RefrigerantId>(COMMON_REFRIGERANT_IDS)],
  [2, oneOf<RefrigerantId>(REFRIGERANT_IDS)],
);

/** Groups of readings that people leave out together. */
const leftOut = usual(
  fc.constant<readonly (typeof READING_IDS)[number][]>([]),
  fc.oneof(
    fc.constantFrom<readonly (typeof READING_IDS)[number][]>(
      ['supplyDryBulb'],
      ['liquidPressure', 'liquidLineTemperature'],
      ['suctionPressure', 'suctionLineTemperature'],
      ['outdoorDryBulb'],
      ['returnDryBulb', 'supplyDryBulb'],
      ['suctionLineTemperature'],
      ['liquidLineTemperature'],
    ),
    fc.constant([...READING_IDS]),
  ),
);

const preflight = fc.dictionary(
  oneOf(PREFLIGHT_ITEMS),
  mixed([12, oneOf(['ok'] as const)], [1, oneOf(PREFLIGHT_STATES)]),
  {
    maxKeys: 4,
    noNullPrototype: true,
  },
);

const standing: fc.Arbitrary<Standing> = fc.record({
  outdoorCoilOverAirF: between(-1, 1),
  coilsApartF: mixed([2, between(-2.5, 2.5)], [1, between(-20, 5)]),
  excessF: mixed([2, between(-1, 1)], [2, between(3.5, 15)], [1, between(-15, 15)]),
  shutIn: oneOf([true, false, undefined]),
});

/** Every drive by name; a scenario replaces some of them to reach what chance alone would not. */
export const DRIVES = {
  procedure: mixed<ProcedureId | undefined>([6, fc.constant(undefined)], [5, oneOf(PROCEDURES.map(({ id }) => id))]),
  refrigerant,
  meteringDevice: mixed([2, oneOf(['fixed-orifice'] as const)], [2, oneOf(METERING_DEVICES)]),
  mode: defaulted('cooling', MODES),
  kind: defaulted('split', SYSTEM_KINDS),
  stage: defaulted('full', STAGES),
  highSidePort: defaulted('liquid', HIGH_SIDE_PORTS),
  elevationM: sometimes(75, usual(between(0, 1800), between(-450, 5480))),
  /** Local pressure less the standard atmosphere of the elevation. */
  weatherPa: sometimes(15, between(-5900, 5900)),

  evaporatingF: usual(between(36, 48), between(18, 66)),
  outdoorF: mixed([6, between(76, 106)], [2, between(55, 70)], [1, between(45, 125)]),
  condensingOverAirF: usual(between(12, 28), between(-6, 60)),
  returnF: usual(between(73, 79), between(62, 98)),
  relativeHumidity: usual(between(0.42, 0.68), between(0.04, 1)),
  /** Of the target where there is one, else of a usual value. */
  superheatMarginF: mixed([4, between(-2.5, 2.5)], [3, between(-9, 9)], [1, between(-30, 40)]),
  subcoolingMarginF: mixed([4, between(-1.5, 1.5)], [3, between(-6, 6)], [1, between(-16, 20)]),
  splitMarginF: mixed([5, between(-1.2, 1.2)], [2, between(-5, 5)], [1, between(-14, 14)]),
  dischargeLineF: sometimes(10, usual(between(140, 210), between(226, 260))),

  targetSuperheatF: sometimes(12, between(5, 25)),
  targetSubcoolingF: sometimes(75, between(6, 16)),
  targetSubcoolingPort: sometimes(6, oneOf(['liquid', 'discharge'] as const)),
  superheatRangeF: sometimes(10, fc.tuple(between(2, 8), between(9, 30))),
  nominalCapacityTon: sometimes(60, between(1.5, 5)),
  designAirflowPerTon: sometimes(10, between(330, 450)),
  airflowPerTon: sometimes(15, usual(between(380, 460), between(200, 380))),
  alteration: sometimes(10, fc.boolean()),
  highVelocity: sometimes(6, fc.boolean()),
  airflowPath: sometimes(8, oneOf(AIRFLOW_PATHS)),
  factoryChargeLb: sometimes(40, between(4, 14)),
  maxHighPressurePsi: sometimes(10, between(300, 650)),
  chargeMode: sometimes(6, fc.boolean()),
  liftFt: sometimes(15, between(-30, 60)),
  lineLengthFt: sometimes(15, between(5, 120)),
  mostLineLengthFt: sometimes(15, between(30, 80)),
  makersCharts: sometimes<readonly DrawnChart[]>(
    14,
    fc.uniqueArray(anyChart, { minLength: 1, maxLength: 3, selector: ({ kind }) => kind }),
  ),
  /** Of the hot gas in heating, absolute; below every critical pressure. */
  heatingDischargePsi: between(240, 395),

  humidityBy: mixed<HumidityBy>(
    [10, fc.constant('wet-bulb')],
    [4, oneOf(['humidity', 'both'] as const)],
    [1, oneOf(['contradicting', 'damp-wick', 'nothing'] as const)],
  ),
  leftOut,
  /** Sets `dischargePressure` at a discharge port; wrongly the liquid one when false. */
  rightHighSide: mixed([5, fc.constant(true)], [1, fc.constant(false)]),
  writtenEvaporating: sometimes(12, oneOf<Written>(['right', 'other-column', 'far'])),
  writtenCondensing: sometimes(12, oneOf<Written>(['right', 'other-column', 'far'])),
  electrical: sometimes(15, between(4, 20)),
  /** Of the current that was measured. */
  expectedCurrentShare: sometimes(60, between(0.7, 1.4)),
  wetBulbBeforeF: sometimes(10, usual(between(-0.9, 0.9), between(-4, 4))),
  drierDropF: sometimes(10, mixed([2, between(-1, 1.5)], [1, between(1.5, 4.5)], [2, between(4.5, 20)])),
  standing: sometimes(10, standing),
  bulb: sometimes(10, oneOf(BULB_STATES)),
  valve: sometimes(5, oneOf(VALVE_MOVES)),
  staticPressureInH2O: sometimes(5, between(-1, 1)),

  accuracy: mixed<Accuracy>([6, fc.constant('assumed')], [4, oneOf(['tight', 'poor', 'coverage-2', 'exact'] as const)]),
  oneInstrument: fc.boolean(),
  resolutionF: sometimes(20, oneOf([0.1, 0.5, 1])),
  ageSeconds: sometimes(40, usual(between(0, 590), between(601, 4000))),

  runningMinutes: mixed<number | undefined>([15, between(15, 90)], [1, between(0, 15)], [1, oneOf([undefined, 0])]),
  lowestReturnF: sometimes(40, usual(between(70.5, 78), between(60, 78))),
  instrumentsCheckedDaysAgo: sometimes(70, between(0, 500)),
  preflight: sometimes(80, preflight),
  leakSearch: sometimes(70, oneOf(LEAK_SEARCHES)),
  addedThisVisitLb: sometimes(30, between(0, 2)),
  earlierAdditions: sometimes(20, fc.integer({ min: 0, max: 3 })),
  commissioning: sometimes(15, fc.boolean()),
  hoursOff: sometimes(15, between(0, 24)),
  headRaised: sometimes(8, fc.boolean()),
  iceSeen: sometimes(8, fc.boolean()),
  earlier: sometimes(20, oneOf<Earlier>(['steady', 'moved', 'falling', 'drifting'])),
  earlierMinutesAgo: between(1, 20),
} satisfies Record<string, fc.Arbitrary<unknown>>;

type Drawn<T> = { readonly [Name in keyof T]: T[Name] extends fc.Arbitrary<infer Value> ? Value : never };
export type Drives = Drawn<typeof DRIVES>;
export type Overrides = { readonly [Name in keyof Drives]?: fc.Arbitrary<Drives[Name]> };

export const drivesWith = (overrides: Overrides): fc.Arbitrary<Drives> => fc.record({ ...DRIVES, ...overrides });
