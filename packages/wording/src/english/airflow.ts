/** Airflow and capacity: why there is no number, what to keep in mind, and the choices. */
import type {
  AirflowCaution,
  AirflowMethod,
  AirflowReason,
  CapacityCaution,
  CapacityReason,
} from '@chargewright/engine';
import type { ChoiceWords } from './setup';

type Sentences<Code extends string> = Readonly<Record<Code, string>>;

const OUTSIDE_RANGE = 'An entry lies outside the range of the formula that needs it. Look at it once more.';

/** `inputs-missing` is said with the names of what is missing. */
const missing = (inputs: string): string => `Not entered yet: ${inputs}.`;

const reasons: Sentences<Exclude<AirflowReason['code'], 'inputs-missing'>> = {
  'other-blower-speed':
    'The blower did not run at its cooling speed, so this airflow says nothing about cooling. Set it to the cooling speed (fan on) and read again.',
  'no-temperature-rise':
    'The supply air is not warmer than the return air. Is the heat on? Are the two probes exchanged?',
  dash: 'The maker’s table prints no airflow at this static pressure. The duct or the filter holds too much: look there first.',
  'outside-table': 'This static pressure lies outside the maker’s table. Nothing is guessed beyond it.',
  'table-not-usable': 'The maker’s table cannot be used as it is entered.',
  'outside-range': OUTSIDE_RANGE,
};

const cautions: Sentences<AirflowCaution> = {
  'blower-speed-unknown':
    'It is not stated that the blower ran at its cooling speed. Until then this airflow proves nothing about cooling.',
  'elevation-assumed': 'Sea level is assumed. Enter the elevation: thin air carries less heat.',
  'humidity-assumed': 'No humidity was read: that of an ordinary house is allowed for. It hardly matters here.',
  'afue-for-steady-state':
    'AFUE stands in for the steady-state efficiency, which is usually a little higher. Use the output over input of the nameplate where it has one.',
  'supply-static-not-above-room':
    'The supply side reads no higher than the room. Check hoses and probe tips: are the two sides exchanged?',
  'fan-table-rises': 'The table has an airflow that rises with the static pressure. Compare it with the print.',
};

const capacityReasons: Sentences<Exclude<CapacityReason['code'], 'inputs-missing'>> = {
  'outside-range': OUTSIDE_RANGE,
};

const capacityCautions: Sentences<CapacityCaution> = {
  'elevation-assumed': 'Sea level is assumed. Enter the elevation: thin air carries less heat.',
  'supply-wetter-than-return':
    'The supply air holds more water than the return air, which no coil does. Probes exchanged or wetted, or outdoor air drawn in?',
  'no-cooling': 'The supply air is not cooler than the return air.',
};

const method = (label: string, hint: string): ChoiceWords => ({ label, hint });

const methods: Readonly<Record<AirflowMethod, ChoiceWords>> = {
  measured: method('Measured', 'Flow grid, hood or another instrument shows it.'),
  'temperature-rise-electric': method('Electric heat', 'Volts, amps and the temperature rise.'),
  'temperature-rise-gas': method('Gas heat', 'Clock the gas meter, and the temperature rise.'),
  'static-pressure': method('Static pressure', 'With the maker’s fan table.'),
};

export const airflowWords = { missing, reasons, cautions, capacityReasons, capacityCautions, methods };
