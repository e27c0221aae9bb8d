/**
 * What a check is given, as a person or an API client states it: numbers with the units they were read in. The shape is the public contract of
 * `POST /api/v1/evaluations`; `read-request.ts` turns it into SI quantities and names every fault.
 */
import type {
  DifferenceUnit,
  FlowUnit,
  LengthUnit,
  MassUnit,
  PowerUnit,
  PressureDifferenceUnit,
  PressureUnit,
  StaticPressureUnit,
  TemperatureUnit,
} from '../units';
import type { ChartUnit } from '../methods/makers-chart/chart-units';
import type { ChartPort, MakersChartKind } from '../methods/makers-chart/kinds';
import type { ReadingId } from './readings';

export const METERING_DEVICES = ['fixed-orifice', 'txv', 'eev'] as const;
export type MeteringDevice = (typeof METERING_DEVICES)[number];
export const MODES = ['cooling', 'heating'] as const;
export type Mode = (typeof MODES)[number];
export const SYSTEM_KINDS = ['split', 'packaged', 'mini-split', 'multi-split'] as const;
export type SystemKind = (typeof SYSTEM_KINDS)[number];
export const STAGES = ['full', 'part', 'unknown'] as const;
export type Stage = (typeof STAGES)[number];
export const HIGH_SIDE_PORTS = ['liquid', 'discharge', 'none'] as const;
export type HighSidePort = (typeof HIGH_SIDE_PORTS)[number];
export const AIRFLOW_PATHS = ['duct-table', 'best-possible'] as const;
export type AirflowPath = (typeof AIRFLOW_PATHS)[number];
export const PREFLIGHT_ITEMS = [
  'filterAndCoil',
  'panelsOn',
  'fullStage',
  'economizerShut',
  'gaugeZeroed',
  'condenserDryAndClean',
  'fanSteady',
  'accessHole',
] as const;
export type PreflightItem = (typeof PREFLIGHT_ITEMS)[number];
export const PREFLIGHT_STATES = ['ok', 'not-ok', 'not-checked'] as const;
export type PreflightState = (typeof PREFLIGHT_STATES)[number];
export const LEAK_SEARCHES = ['none-found', 'found', 'not-done'] as const;
export type LeakSearch = (typeof LEAK_SEARCHES)[number];
/** `loose`: not tight on clean pipe, at the wrong place, or not wrapped. `charge-lost`: warming it in the hand moves nothing. */
export const BULB_STATES = ['right', 'loose', 'charge-lost'] as const;
export type BulbState = (typeof BULB_STATES)[number];
/** `hunting`: superheat swings with a period of a minute or so. */
export const VALVE_MOVES = ['steady', 'hunting'] as const;
export type ValveMove = (typeof VALVE_MOVES)[number];

export interface Amount<Unit extends string> {
  readonly value: number;
  readonly unit: Unit;
}

export type TemperatureAmount = Amount<TemperatureUnit>;
/** A temperature difference; kelvin is left to temperatures, so that a slip of scale is caught. */
export type DifferenceAmount = Amount<Exclude<DifferenceUnit, 'K'>>;

export type ReadingUnit = TemperatureUnit | PressureUnit | FlowUnit | StaticPressureUnit | '%' | 'A' | 'V';
export type PlusMinusUnit =
  Exclude<DifferenceUnit, 'K'> | PressureDifferenceUnit | FlowUnit | StaticPressureUnit | '%' | 'A' | 'V';

export interface PlusMinus extends Amount<PlusMinusUnit> {
  /** `limit`: the maker's ±, rectangular (the default); `k2`: an expanded uncertainty, normal. */
  readonly kind?: 'limit' | 'k2';
}

export interface ReadingInput extends Amount<ReadingUnit> {
  readonly plusMinus?: PlusMinus;
  readonly ageSeconds?: number;
  /** Readings of one quantity kind by one instrument share its error. */
  readonly instrumentId?: string;
  /** Smallest step the instrument shows, in the unit of the reading. */
  readonly resolution?: number;
}

export type ReadingsInput = Readonly<Partial<Record<ReadingId, ReadingInput>>>;

export interface ChartAxisInput {
  readonly unit: ChartUnit;
  /** Ascending. */
  readonly values: readonly number[];
}

/**
 * A table that the maker prints for this unit; `MAKERS_CHART_FACTS` says what the rows, columns and cells of each kind are. Gauge pressures count
 * from sea level, as printed tables do.
 */
export interface MakersChartInput {
  readonly kind: MakersChartKind;
  /** Left out: one figure that holds at all conditions, the one cell. */
  readonly rows?: ChartAxisInput;
  /** Only where the kind has a second condition. */
  readonly columns?: ChartAxisInput;
  /** Of the cells. */
  readonly unit: ChartUnit;
  /** One list for each row; `null` is a dash: no target there. */
  readonly cells: readonly (readonly (number | null)[])[];
  /** The service port it holds for; left out, the usual one of the kind. */
  readonly port?: ChartPort;
  /** Smallest step the cells are printed in, in their unit; left out, from their decimals. */
  readonly resolution?: number;
  /** The maker's ±; left out, that of the procedure. */
  readonly tolerance?: Amount<Exclude<DifferenceUnit, 'K'> | PressureDifferenceUnit>;
  /** Weather and house that the maker allows for this table. */
  readonly leastOutdoor?: TemperatureAmount;
  readonly mostOutdoor?: TemperatureAmount;
  readonly leastReturn?: TemperatureAmount;
  readonly mostReturn?: TemperatureAmount;
}

export interface SetupInput {
  readonly refrigerant: string;
  readonly meteringDevice: MeteringDevice;
  readonly mode?: Mode;
  readonly kind?: SystemKind;
  readonly stage?: Stage;
  readonly highSidePort?: HighSidePort;
  readonly elevation?: Amount<LengthUnit>;
  /** Local (station) pressure, absolute; takes the place of the elevation. */
  readonly stationPressure?: Amount<PressureUnit>;
  readonly targetSuperheat?: DifferenceAmount;
  readonly targetSubcooling?: DifferenceAmount;
  readonly targetSubcoolingPort?: Exclude<HighSidePort, 'none'>;
  /** The maker's superheat range for the valve, in place of the procedure's window. */
  readonly superheatRange?: {
    readonly low: number;
    readonly high: number;
    readonly unit: Exclude<DifferenceUnit, 'K'>;
  };
  readonly nominalCapacity?: Amount<PowerUnit>;
  readonly designAirflow?: Amount<FlowUnit>;
  /** The system is an alteration of an older one, or a small-duct high-velocity one: some procedures ask less airflow of it. */
  readonly alteration?: boolean;
  readonly highVelocity?: boolean;
  /** A way that some procedures permit in place of measuring the airflow. */
  readonly airflowPath?: AirflowPath;
  readonly factoryCharge?: Amount<MassUnit>;
  /** What the compressor draws at these conditions by the maker's data, or drew when this unit was right. */
  readonly expectedCompressorCurrent?: Amount<'A'>;
  readonly maxHighPressure?: Amount<PressureUnit>;
  /** Whether an inverter runs in the maker's charge mode; leave out for a single-speed unit. */
  readonly chargeMode?: boolean;
  /** What the maker prints for this unit: one table, or several. */
  readonly makersChart?: MakersChartInput;
  readonly makersCharts?: readonly MakersChartInput[];
  readonly lineSet?: {
    readonly length?: Amount<LengthUnit>;
    /** The longest the maker allows without further measures. */
    readonly mostLength?: Amount<LengthUnit>;
    readonly lift?: Amount<LengthUnit>;
    readonly included?: Amount<LengthUnit>;
  };
}

/** What was done and seen in the separating tests; what was measured in them are readings. */
export interface TestObservations {
  /** For the standing pressure the liquid was shut into the outdoor coil. */
  readonly liquidShutIn?: boolean;
  readonly bulb?: BulbState;
  readonly valve?: ValveMove;
}

export interface VisitInput {
  readonly runningMinutes?: number;
  readonly lowestReturnDryBulb?: TemperatureAmount;
  readonly instrumentsCheckedDaysAgo?: number;
  readonly preflight?: Readonly<Partial<Record<PreflightItem, PreflightState>>>;
  readonly leakSearch?: LeakSearch;
  readonly addedThisVisit?: Amount<MassUnit>;
  readonly addedBefore?: Amount<MassUnit>;
  readonly additionsOnEarlierVisits?: number;
  readonly commissioning?: boolean;
  readonly hoursOff?: number;
  readonly headRaised?: boolean;
  readonly iceSeen?: boolean;
  readonly tests?: TestObservations;
  readonly earlier?: { readonly minutesAgo: number; readonly readings: ReadingsInput };
}

export interface EvaluationRequest {
  readonly procedure?: string;
  readonly setup: SetupInput;
  readonly visit?: VisitInput;
  readonly readings: ReadingsInput;
}
