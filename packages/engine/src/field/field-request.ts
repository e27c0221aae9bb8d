/**
 * What airflow, capacity and weigh-in are given, as a person or an API client states it: numbers with the units they were read in. The shapes are the
 * contract of `POST /api/v1/airflow`, `/capacity` and `/weigh-in`; `read-….ts` turn them into SI quantities and name every fault.
 */
import type { Amount, ReadingInput, TemperatureAmount } from '../check/request';
import type { AtmosphereInput } from '../check/atmosphere';
import type { ReadingId } from '../check/readings';
import type { AirPlace } from '../methods/airflow/air-properties';
import type { AirflowMethod } from '../methods/airflow/airflow-codes';
import type { ShorterLineRule } from '../methods/weigh-in/charge-formulas';
import type { LineSetKind, LiquidLineSize } from '../methods/weigh-in/data/line-rates';
import type {
  FlowUnit,
  HeatingValueUnit,
  LengthUnit,
  LineRateUnit,
  MassUnit,
  PowerUnit,
  StaticPressureUnit,
  VacuumUnit,
  VolumeUnit,
} from '../units';

export const COOLING_SPEED_ANSWERS = ['yes', 'no', 'unknown'] as const;
export type CoolingSpeedAnswer = (typeof COOLING_SPEED_ANSWERS)[number];
export const AIR_PLACES = ['return', 'supply'] as const satisfies readonly AirPlace[];
export const AIR_STATED_IN = [...AIR_PLACES, 'standard'] as const;
export type AirStatedIn = (typeof AIR_STATED_IN)[number];
export const EFFICIENCY_KINDS = ['steady-state', 'afue'] as const;
export const HEAT_UNITS = ['W', 'kW', 'Btu/h'] as const;
export type HeatUnit = (typeof HEAT_UNITS)[number];
export const CONDENSATE_RULES = ['neglected', 'counted'] as const;
export const LINE_SET_KINDS = ['ducted', 'ductless'] as const satisfies readonly LineSetKind[];
export const INSTALLED_LINE_SIZES = ['1/4', '5/16', '3/8', '1/2', 'other'] as const satisfies readonly (
  LiquidLineSize | 'other'
)[];
export const WEIGH_IN_METHODS = ['adjustment', 'total'] as const;
export const SHORTER_LINE_RULES = ['subtract', 'keep'] as const satisfies readonly ShorterLineRule[];

/** A figure with its ±: `limit` is the maker's (rectangular; the default), `k2` an expanded uncertainty (normal). */
export interface StatedAmount<Unit extends string, PlusMinusUnit extends string = Unit | '%'> extends Amount<Unit> {
  readonly plusMinus?: Amount<PlusMinusUnit> & { readonly kind?: 'limit' | 'k2' };
  /** Smallest step the instrument shows, in the unit of the figure. */
  readonly resolution?: number;
  readonly instrumentId?: string;
}

export interface FanTableInput {
  /** Document and page. */
  readonly source?: string;
  /** Speed tap or setting the rows are for. */
  readonly blowerTap?: string;
  readonly staticPressureUnit: StaticPressureUnit;
  readonly airflowUnit: FlowUnit;
  /** Static pressure ascending; `null` is a dash. */
  readonly rows: readonly { readonly staticPressure: number; readonly airflow: number | null }[];
}

/** Readings of a check that airflow and capacity use under the same names. */
export const AIR_READINGS = [
  'returnDryBulb',
  'returnWetBulb',
  'returnRelativeHumidity',
  'supplyDryBulb',
  'supplyWetBulb',
  'supplyRelativeHumidity',
  'airflow',
] as const satisfies readonly ReadingId[];
export type AirReadingId = (typeof AIR_READINGS)[number];
type AirReadings = Readonly<Partial<Record<AirReadingId, ReadingInput>>>;

export interface AirflowRequest extends AirReadings, AtmosphereInput {
  readonly method: AirflowMethod;
  /** Left out: unknown. */
  readonly atCoolingSpeed?: CoolingSpeedAnswer;
  readonly nominalCapacity?: Amount<PowerUnit>;
  /** What the instrument of a measured airflow shows. Left out: the air at the return. */
  readonly airflowIn?: AirStatedIn;
  /** Where the blower stands, whose volume is stated. Left out: in the return air, before the heater. */
  readonly statedAt?: AirPlace;
  readonly lineVoltage?: ReadingInput;
  readonly heaterCurrent?: ReadingInput;
  readonly blowerHeat?: StatedAmount<HeatUnit>;
  readonly dialVolume?: StatedAmount<VolumeUnit>;
  readonly gasRevolution?: StatedAmount<'s', 's' | '%'>;
  readonly gasHeatingValue?: StatedAmount<HeatingValueUnit>;
  /** Its ± in points of percent. */
  readonly furnaceEfficiency?: StatedAmount<'%', '%'>;
  /** Left out: steady-state. */
  readonly efficiencyIs?: (typeof EFFICIENCY_KINDS)[number];
  readonly returnStaticPressure?: ReadingInput;
  readonly supplyStaticPressure?: ReadingInput;
  readonly fanTable?: FanTableInput;
}

export interface CapacityRequest extends AirReadings, AtmosphereInput {
  /** The air in which the airflow is stated. Left out: at the return. */
  readonly airflowIn?: AirStatedIn;
  readonly nominalCapacity?: Amount<PowerUnit>;
  /** Left out: neglected. */
  readonly condensate?: (typeof CONDENSATE_RULES)[number];
}

export interface LineSetRequest {
  /** One way. */
  readonly installedLength?: StatedAmount<LengthUnit>;
  readonly liquidLineSize?: (typeof INSTALLED_LINE_SIZES)[number];
  readonly makersRate?: Amount<LineRateUnit>;
  readonly includedLength?: Amount<LengthUnit>;
  /** Where it is of another diameter than the one installed. */
  readonly includedLiquidLineSize?: (typeof INSTALLED_LINE_SIZES)[number];
  readonly makersIncludedRate?: Amount<LineRateUnit>;
  readonly shorterLine?: ShorterLineRule;
}

export interface WeighInRequest {
  readonly refrigerant: string;
  readonly kind: LineSetKind;
  readonly method: (typeof WEIGH_IN_METHODS)[number];
  /** Left out: general rules. */
  readonly procedure?: string;
  readonly outdoorDryBulb?: TemperatureAmount;
  readonly factoryCharge?: Amount<MassUnit>;
  readonly line?: LineSetRequest;
  /** By the maker, signed. */
  readonly corrections?: {
    readonly coil?: Amount<MassUnit>;
    readonly drier?: Amount<MassUnit>;
    readonly other?: Amount<MassUnit>;
  };
  /** Put in: beyond the factory charge (negative: recovered) for an adjustment, altogether for a total. */
  readonly actualCharge?: Amount<MassUnit>;
  readonly scale?: { readonly resolution?: Amount<MassUnit>; readonly plusMinus?: Amount<MassUnit> };
  readonly vacuum?: {
    readonly deepest?: Amount<VacuumUnit>;
    readonly rise?: Amount<VacuumUnit>;
    readonly isolatedMinutes?: number;
  };
  /** Of the whole charge, from the unit's label. */
  readonly labelMaximum?: Amount<MassUnit>;
}
