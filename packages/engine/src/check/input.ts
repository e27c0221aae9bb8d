/** A check in SI, ready to be judged: what `readRequest` makes of a request. */
import type { Known } from '../derivation/quantity';
import type { RefrigerantId } from '../refrigerants/catalogue';
import type { ChartPort } from '../methods/makers-chart/kinds';
import type { MakersTable } from '../methods/makers-chart/makers-table';
import type { UsedReadingId } from './assumed-uncertainty';
import type { SetupField } from './codes';
import type { Procedure } from './procedure';
import type {
  AirflowPath,
  HighSidePort,
  LeakSearch,
  MeteringDevice,
  Mode,
  PreflightItem,
  PreflightState,
  Stage,
  SystemKind,
  TestObservations,
} from './request';

export interface CheckReading {
  /** K, absolute Pa, fraction or m³/s by the quantity. */
  readonly quantity: Known;
  readonly ageSeconds?: number;
  /** Smallest step shown, in the SI unit of the quantity; 0 when not known. */
  readonly resolution: number;
}

export type CheckReadings = Readonly<Partial<Record<UsedReadingId, CheckReading>>>;

export interface CheckSetup {
  readonly refrigerant: RefrigerantId;
  readonly meteringDevice: MeteringDevice;
  readonly mode: Mode;
  readonly kind: SystemKind;
  readonly stage: Stage;
  readonly highSidePort: HighSidePort;
  /** What was left out and taken by default, or is not known. */
  readonly assumed: readonly SetupField[];
  readonly atmosphere: Known;
  readonly elevationAssumed: boolean;
  readonly targetSuperheat?: Known;
  readonly targetSubcooling?: Known;
  readonly targetSubcoolingPort: Exclude<HighSidePort, 'none'>;
  readonly superheatRange?: { readonly lowK: number; readonly highK: number };
  readonly nominalCapacityW?: number;
  readonly designAirflowM3PerS?: number;
  readonly alteration: boolean;
  readonly highVelocity: boolean;
  readonly airflowPath?: AirflowPath;
  readonly factoryChargeKg?: number;
  readonly expectedCompressorCurrentA?: number;
  /** Absolute. */
  readonly maxHighPressurePa?: number;
  readonly chargeMode?: boolean;
  readonly liftM?: number;
  readonly lineLengthM?: number;
  readonly mostLineLengthM?: number;
  readonly makersCharts: readonly CheckMakersChart[];
}

/** A maker's table with what the maker says beside it. */
export interface CheckMakersChart {
  readonly table: MakersTable;
  readonly port: ChartPort;
  /** The maker's ± as half a width: K, or Pa for a table of pressures. */
  readonly tolerance?: number;
  readonly leastOutdoorK?: number;
  readonly mostOutdoorK?: number;
  readonly leastReturnK?: number;
  readonly mostReturnK?: number;
  /** How many of its figures look odd. */
  readonly oddities: number;
}

export interface CheckVisit {
  readonly runningMinutes?: number;
  readonly lowestReturn?: Known;
  readonly instrumentsCheckedDaysAgo?: number;
  readonly preflight: Readonly<Partial<Record<PreflightItem, PreflightState>>>;
  readonly leakSearch?: LeakSearch;
  readonly addedThisVisitKg: number;
  readonly additionsOnEarlierVisits: number;
  readonly commissioning: boolean;
  readonly hoursOff: number;
  readonly headRaised: boolean;
  readonly iceSeen: boolean;
  readonly tests: TestObservations;
  readonly earlier?: { readonly minutesAgo: number; readonly readings: CheckReadings };
}

export interface CheckInput {
  readonly procedure: Procedure;
  readonly setup: CheckSetup;
  readonly visit: CheckVisit;
  readonly readings: CheckReadings;
}

export const isFixedOrifice = (setup: CheckSetup): boolean => setup.meteringDevice === 'fixed-orifice';
