/** A check with invented readings: a fixed orifice somewhat short of refrigerant, so that a first-time user sees a finding and a next step. */
import {
  pressureDifferenceFromPa,
  pressureAsReadToPa,
  temperatureFromK,
  temperatureToK,
  type ReadingId,
} from '@chargewright/engine';
import { formatNumber, type UnitSystem } from '@chargewright/wording';
import type { ExampleCheck } from '../loose-checks/check-command';
import type { TypedValue } from '../loose-checks/check-draft';

const TEMPERATURES_F = {
  suctionLineTemperature: 57.3,
  outdoorDryBulb: 92,
  liquidLineTemperature: 101.5,
  returnDryBulb: 78.2,
  returnWetBulb: 64.5,
  supplyDryBulb: 57.6,
} as const satisfies Partial<Record<ReadingId, number>>;

const PRESSURES_PSIG = { suctionPressure: 116.5, liquidPressure: 342 } as const satisfies Partial<
  Record<ReadingId, number>
>;

const RUNNING_MINUTES = 22;

const temperature = (valueF: number, system: UnitSystem): TypedValue =>
  system === 'F-psi'
    ? { text: valueF.toFixed(1), unit: 'degF' }
    : { text: formatNumber(temperatureFromK(temperatureToK(valueF, 'degF'), 'degC'), 1), unit: 'degC' };

function pressure(valuePsig: number, system: UnitSystem): TypedValue {
  const pa = pressureAsReadToPa(valuePsig, 'psig');
  switch (system) {
    case 'F-psi':
      return { text: valuePsig.toFixed(1), unit: 'psig' };
    case 'C-kPa':
      return { text: pressureDifferenceFromPa(pa, 'kPa').toFixed(0), unit: 'kPag' };
    case 'C-bar':
      return { text: pressureDifferenceFromPa(pa, 'bar').toFixed(2), unit: 'barg' };
  }
}

const mapValues = <Key extends string>(
  values: Readonly<Record<Key, number>>,
  of: (value: number) => TypedValue,
): Readonly<Record<Key, TypedValue>> =>
  Object.fromEntries(Object.entries<number>(values).map(([key, value]) => [key, of(value)])) as Record<Key, TypedValue>;

/** The example as instruments in this unit system would show it, its system started a while ago. */
export const exampleCheck = (system: UnitSystem, nowMs: number): ExampleCheck => ({
  setup: {
    refrigerant: 'R-410A',
    meteringDevice: 'fixed-orifice',
    mode: 'cooling',
    kind: 'split',
    stage: 'full',
    highSidePort: 'liquid',
  },
  visit: {
    runningSince: new Date(nowMs - RUNNING_MINUTES * 60_000).toISOString(),
    preflight: { filterAndCoil: 'ok', panelsOn: 'ok', fullStage: 'ok', gaugeZeroed: 'ok' },
  },
  typed: { elevation: system === 'F-psi' ? { text: '650', unit: 'ft' } : { text: '200', unit: 'm' } },
  readings: {
    ...mapValues(TEMPERATURES_F, (value) => temperature(value, system)),
    ...mapValues(PRESSURES_PSIG, (value) => pressure(value, system)),
  },
});
