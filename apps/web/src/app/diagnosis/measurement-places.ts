/** Where on the page a measurement that the diagnosis asks for is taken down. */
import type { Measurement } from '@chargewright/engine';
import type { StepPlace } from '../check-a-charge/next-step-place';

const field = (...ids: readonly string[]): StepPlace => ({
  view: 'readings',
  control: ids.map((id) => `#reading-${id}`).join(', '),
});
const choice = (view: StepPlace['view'], name: string): StepPlace => ({ view, control: `input[name="${name}"]` });

/** `null`: nothing is taken down for it. */
export const MEASUREMENT_PLACES: Readonly<Record<Measurement, StepPlace | null>> = {
  'state-port': choice('setup', 'highSidePort'),
  'confirm-refrigerant': choice('setup', 'refrigerant'),
  'liquid-pair': field('liquidPressure', 'dischargePressure', 'liquidLineTemperature'),
  'supply-and-wet-bulb': field('supplyDryBulb'),
  airflow: field('airflow'),
  'drier-drop': field('drierInletTemperature'),
  'air-test': field('standingPressure'),
  'bulb-and-hunting': choice('readings', 'bulb'),
  'compressor-current': field('compressorCurrent'),
  'condenser-look': choice('readings', 'preflight-condenserDryAndClean'),
  'orifice-look': null,
  'leak-search': choice('readings', 'leakSearch'),
};
