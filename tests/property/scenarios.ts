/** Corners that chance alone would hardly reach: several rare things at once, drawn more often than they happen. */
import type { MakersChartKind } from '@chargewright/engine';
import fc from 'fast-check';
import type { Drives, Overrides } from './drives';
import { between, mixed } from './draws';
import { drivesWith } from './drives';
import type { DrawnChart } from './makers-charts';
import { chartOf } from './makers-charts';

const always = <T>(value: T): fc.Arbitrary<T> => fc.constant(value);

/** Nothing in the way of a judgement. */
const CLEAR: Overrides = {
  mode: always('cooling' as const),
  kind: always('split' as const),
  stage: always('full' as const),
  highSidePort: always('liquid' as const),
  chargeMode: always(undefined),
  evaporatingF: between(38, 46),
  outdoorF: between(78, 100),
  condensingOverAirF: between(12, 18),
  returnF: between(74, 79),
  relativeHumidity: between(0.45, 0.6),
  splitMarginF: between(-1, 1),
  dischargeLineF: always(undefined),
  airflowPerTon: always(undefined),
  maxHighPressurePsi: always(undefined),
  humidityBy: always('wet-bulb' as const),
  leftOut: always([]),
  writtenEvaporating: always(undefined),
  writtenCondensing: always(undefined),
  accuracy: always('tight' as const),
  ageSeconds: always(undefined),
  runningMinutes: always(22),
  lowestReturnF: always(undefined),
  preflight: always({ panelsOn: 'ok' } as const),
  targetSubcoolingPort: always(undefined),
  superheatRangeF: always(undefined),
  makersCharts: always(undefined),
  earlier: always(undefined),
  wetBulbBeforeF: always(undefined),
  drierDropF: always(undefined),
  standing: always(undefined),
  bulb: always(undefined),
};

/** All that the certificates of 2019 ask for. */
const PROVED: Overrides = {
  procedure: fc.constantFrom('cec-ra3.2-2019-installer' as const, 'cec-ra3.2-2019-rater' as const),
  instrumentsCheckedDaysAgo: between(0, 31),
  lowestReturnF: between(70.5, 74),
  preflight: always({ panelsOn: 'ok', accessHole: 'ok' } as const),
  nominalCapacityTon: between(2, 4),
  airflowPerTon: between(360, 450),
  designAirflowPerTon: always(undefined),
};

const VALVE: Overrides = { ...CLEAR, meteringDevice: always('txv' as const), targetSubcoolingF: between(9, 12) };
const ORIFICE: Overrides = {
  ...CLEAR,
  meteringDevice: always('fixed-orifice' as const),
  targetSuperheatF: always(undefined),
};

const BY_MAKER: Overrides = { procedure: always('manufacturer' as const), elevationM: between(0, 1800) };

const HEATING_KINDS = ['heating-discharge-pressure', 'heating-discharge-temperature'] as const;

const HEATING: Overrides = {
  procedure: always(undefined),
  mode: always('heating' as const),
  outdoorF: between(52, 66),
  returnF: between(67, 78),
  runningMinutes: between(16, 60),
};

/** One maker's table without dashes and slips, `changes` apart. */
const tables = (
  kind: fc.Arbitrary<MakersChartKind>,
  changes: { readonly [Name in keyof DrawnChart]?: fc.Arbitrary<DrawnChart[Name]> },
): fc.Arbitrary<readonly DrawnChart[]> =>
  fc
    .tuple(chartOf(kind), fc.record({ ...changes }))
    .map(([chart, changed]) => [{ ...chart, ...PLAIN, ...(changed as Partial<DrawnChart>) }]);

const PLAIN = {
  isFigure: false,
  dashes: 'none',
  port: undefined,
  leastOutdoorF: undefined,
  mostOutdoorF: undefined,
  leastReturnF: undefined,
  mostReturnF: undefined,
  slip: false,
} as const satisfies Partial<DrawnChart>;

const SCENARIOS: readonly Overrides[] = [
  // steps of one visit used up
  {
    ...VALVE,
    subcoolingMarginF: between(-8, -5),
    leakSearch: always('none-found' as const),
    factoryChargeLb: between(4, 8),
    addedThisVisitLb: between(0.9, 2),
    earlierAdditions: always(undefined),
    commissioning: always(undefined),
  },
  // superheat alone, high
  {
    ...ORIFICE,
    superheatMarginF: between(8, 12),
    leftOut: always(['liquidPressure', 'liquidLineTemperature'] as const),
  },
  // the liquid pressure read at a discharge port
  { ...VALVE, highSidePort: always('discharge' as const), rightHighSide: always(false) },
  // a valve that floods, short of charge and overcharged
  { ...VALVE, superheatMarginF: between(-9.6, -8.9), subcoolingMarginF: between(-8, -5) },
  { ...VALVE, superheatMarginF: between(-9.6, -8.9), subcoolingMarginF: between(5, 9) },
  // a valve that starves, overcharged; and one short of charge again after earlier visits
  { ...VALVE, superheatMarginF: between(16, 22), subcoolingMarginF: between(5, 9) },
  { ...VALVE, subcoolingMarginF: between(-8, -5), commissioning: always(undefined), earlierAdditions: always(2) },
  // an orifice that starves with an unclear subcooling
  {
    ...ORIFICE,
    superheatMarginF: between(8, 12),
    targetSubcoolingF: always(undefined),
    subcoolingMarginF: between(-4.6, -2.4),
  },
  // the same with a separating test made: nothing over the drier, then a valve that starves or floods with its bulb in order
  { ...ORIFICE, superheatMarginF: between(8, 12), subcoolingMarginF: between(2, 8), drierDropF: between(-0.5, 0.5) },
  { ...VALVE, superheatMarginF: between(16, 22), subcoolingMarginF: between(-1, 1), drierDropF: between(-0.5, 0.5) },
  {
    ...VALVE,
    superheatMarginF: between(-9.6, -8.9),
    subcoolingMarginF: between(-8, 1),
    bulb: always('right' as const),
  },
  // the certificates of 2019 complete, and short of one thing each
  { ...VALVE, ...PROVED },
  { ...ORIFICE, ...PROVED },
  { ...VALVE, ...PROVED, splitMarginF: fc.oneof(between(-9, -5), between(5, 9)) },
  { ...VALVE, ...PROVED, preflight: always({ panelsOn: 'ok' } as const) },
  { ...VALVE, ...PROVED, instrumentsCheckedDaysAgo: between(32, 90) },
  { ...VALVE, ...PROVED, airflowPerTon: always(undefined), airflowPath: always(undefined) },
  { ...ORIFICE, ...PROVED, outdoorF: between(115.5, 122), targetSuperheatF: between(8, 20) },
  // rules for split systems on a packaged unit
  {
    ...VALVE,
    procedure: fc.constantFrom('cec-ra3.2-2008-installer' as const, 'cec-ra3.2-2008-rater' as const),
    kind: always('packaged' as const),
  },
  // a maker's heating table, met and missed
  { ...CLEAR, ...HEATING, makersCharts: tables(fc.constantFrom(...HEATING_KINDS), {}) },
  { ...CLEAR, ...HEATING, makersCharts: tables(fc.constantFrom(...HEATING_KINDS), { offset: between(-30, 30) }) },
  // a house warmer than the maker allows
  {
    ...VALVE,
    targetSubcoolingF: always(undefined),
    makersCharts: tables(always('subcooling' as const), { mostReturnF: between(68, 73) }),
  },
  // a packaged unit by the maker's curve, short of charge and overcharged
  {
    ...ORIFICE,
    kind: always('packaged' as const),
    makersCharts: tables(always('liquid-pressure' as const), { offset: fc.oneof(between(-9, -5), between(5, 9)) }),
  },
  // a valve by its maker's data alone: nothing left open, its superheat unread, and unusual
  { ...VALVE, ...BY_MAKER },
  { ...VALVE, ...BY_MAKER, leftOut: always(['suctionPressure', 'suctionLineTemperature'] as const) },
  { ...VALVE, ...BY_MAKER, superheatMarginF: between(16, 22), subcoolingMarginF: between(-8, 8) },
  // a packaged unit whose port nobody stated
  { ...CLEAR, kind: always('packaged' as const), highSidePort: always(undefined) },
];

const systems = (further: Overrides): fc.Arbitrary<Drives> =>
  mixed(
    [100, drivesWith(further)],
    ...SCENARIOS.map((overrides) => [1, drivesWith({ ...overrides, ...further })] as const),
  );

export const anySystem = systems({});

/** Every reading with a stated ±, which can be multiplied. */
export const statedSystem = systems({
  accuracy: fc.constantFrom('stated' as const, 'tight' as const, 'poor' as const, 'coverage-2' as const),
});

/** Fit for the test by its setup and pre-flight. */
export const fitSystem = drivesWith({
  mode: fc.constantFrom('cooling' as const, undefined),
  kind: fc.constantFrom('split' as const, undefined),
  stage: fc.constantFrom('full' as const, 'unknown' as const, undefined),
  chargeMode: fc.constantFrom(true, undefined),
  preflight: fc.constantFrom(undefined, {}, { panelsOn: 'ok', filterAndCoil: 'not-ok' } as const),
});
