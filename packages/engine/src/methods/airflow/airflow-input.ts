/** What each airflow method needs, in SI. A quantity nobody read is `missing(…)`; the result then says which. */
import type { Quantity } from '../../derivation/quantity';
import type { AirPlace } from './air-properties';
import type { FanTable } from './fan-table';

export interface AnyMethod {
  /** Station pressure, absolute. */
  readonly atmosphere: Quantity;
  /** Nobody stated the site: the atmosphere is that of sea level. */
  readonly elevationAssumed?: boolean;
  /** Left out: 0.006 ± 0.006 is taken. */
  readonly humidityRatio?: Quantity;
  /** Was the blower at the speed it runs at in cooling? `no`: the airflow is shown for that speed and does not count. */
  readonly atCoolingSpeed: 'yes' | 'no' | 'unknown';
  readonly nominalCapacity?: Quantity;
}

export interface MeasuredAirflow extends AnyMethod {
  readonly method: 'measured';
  /** m³/s as the instrument shows it, with the instrument's uncertainty. */
  readonly measured: Quantity;
  /** `standard`: the instrument shows standard air already. */
  readonly shows: AirPlace | 'standard';
  /** Dry bulb where it was measured. */
  readonly dryBulb: Quantity;
}

interface TemperatureRise extends AnyMethod {
  readonly returnDryBulb: Quantity;
  /** Past the heater, out of its sight. */
  readonly supplyDryBulb: Quantity;
  /** Heat of the blower, W, where it is not inside the measured heat already. */
  readonly blowerHeat?: Quantity;
  /** Where the actual airflow is stated. A blower before the heater moves return air: that volume is the one it moves in cooling too (practice). */
  readonly statedAt: AirPlace;
}

export interface ElectricTemperatureRise extends TemperatureRise {
  readonly method: 'temperature-rise-electric';
  readonly voltage: Quantity;
  readonly current: Quantity;
}

export interface GasTemperatureRise extends TemperatureRise {
  readonly method: 'temperature-rise-gas';
  /** m³ of one revolution of the dial. */
  readonly dialVolume: Quantity;
  /** s of one revolution. */
  readonly revolution: Quantity;
  /** J/m³ of the gas as the meter counts it. */
  readonly heatingValue: Quantity;
  readonly efficiency: Quantity;
  readonly efficiencyIs: 'steady-state' | 'afue';
}

export interface StaticPressureAirflow extends AnyMethod {
  readonly method: 'static-pressure';
  /** Pa against the room, with the sign as written down. */
  readonly returnStatic: Quantity;
  readonly supplyStatic: Quantity;
  /** For the tap the blower ran at. */
  readonly table?: FanTable;
  /** Dry bulb of the air through the blower; with the elevation it brings the static pressure to the table's standard air. */
  readonly dryBulb: Quantity;
  readonly place: AirPlace;
}

export type AirflowInput = MeasuredAirflow | ElectricTemperatureRise | GasTemperatureRise | StaticPressureAirflow;
