/** What airflow, capacity and weigh-in ask for: labels, names inside a sentence, and where to find each. Common practice. */
import { readingWords } from './readings';
import { setupWords } from './setup';

export interface InputWords {
  /** Beside the field. */
  readonly label: string;
  /** Inside a sentence. */
  readonly name: string;
  /** Where it is found or how it is taken. */
  readonly hint: string;
}

const input = (label: string, name: string, hint = ''): InputWords => ({ label, name, hint });

/** By the names of the contract; the last part of a dotted path. */
export const fieldInputWords = {
  method: input('Method', 'method'),
  atCoolingSpeed: input(
    'Did the blower run at its cooling speed?',
    'blower speed',
    'An airflow counts only at the speed the blower has in cooling. Many furnaces heat at another.',
  ),
  airflowIn: input('The instrument shows', 'air the airflow is stated in'),
  statedAt: input('Air through the blower', 'place of the blower'),
  airflow: input('Airflow', 'airflow', 'As the instrument shows it: flow grid, hood, anemometer traverse.'),
  airflowPlusMinus: input('Its accuracy', 'accuracy of the airflow', 'The instrument’s ±. Empty: ±7 %.'),
  measuredAir: input('Its temperature', 'dry bulb of the measured air', 'Dry bulb where it was measured.'),
  airHumidity: input('Its humidity', 'humidity of the air', 'It changes the result by less than 1 %.'),
  riseReturn: input('Return air', 'return dry bulb', 'While heating, beside the blower, away from radiation.'),
  riseSupply: input(
    'Supply air',
    'supply dry bulb',
    'While heating, past the heater and out of its sight, the mean of several points.',
  ),
  lineVoltage: input('Volts', 'voltage at the heater', 'At the heater while it runs.'),
  heaterCurrent: input('Amps', 'heater current', 'Around one conductor of the heater’s supply, all stages on.'),
  blowerHeat: input(
    'Blower, watts',
    'heat of the blower',
    'Only where its amps are not in those above. Its motor heats the air too.',
  ),
  dialVolume: input('Size of the test dial', 'size of the test dial', 'Printed on the dial: one turn.'),
  gasRevolution: input('Seconds for one turn', 'time of one turn', 'All other gas appliances off. Time several turns.'),
  gasHeatingValue: input(
    'Heating value of the gas',
    'heating value of the gas',
    'From the gas supplier, for this elevation and pressure.',
  ),
  furnaceEfficiency: input('Efficiency', 'efficiency of the furnace', 'From the nameplate: output over input.'),
  efficiencyIs: input('This efficiency is', 'kind of efficiency'),
  returnStaticPressure: input(
    'Return static',
    'return static pressure',
    'Between filter and blower, against the room. The sign does not matter.',
  ),
  supplyStaticPressure: input(
    'Supply static',
    'supply static pressure',
    'Between blower and coil, against the room. Never drill where the coil is.',
  ),
  blowerAir: input('Air through the blower', 'dry bulb of the air through the blower', 'Return air beside the blower.'),
  fanTable: input('The maker’s fan table', 'fan table'),
  staticPressure: input('Static pressure', 'static pressure of the fan table'),
  rows: input('Rows', 'rows of the fan table'),
  source: input('From', 'source of the fan table', 'Document and page.'),
  blowerTap: input('Blower at', 'blower tap', 'The speed tap or setting the table is for.'),
  condensate: input('Condensate', 'condensate'),

  kind: input('Line set of a', 'kind of system'),
  line: input('Line set', 'line set'),
  installedLength: input('Installed length', 'installed length', 'One way, from the outdoor to the indoor unit.'),
  liquidLineSize: input('Liquid line, outside', 'size of the liquid line', 'The small pipe, outside diameter.'),
  makersRate: input(
    'The maker’s rate',
    'maker’s rate',
    'Refrigerant for each foot or meter beyond the included length, from the manual.',
  ),
  includedLength: input('Included length', 'included length', 'Line set the factory charge covers, from the manual.'),
  includedLiquidLineSize: input(
    'Included size',
    'size of the included liquid line',
    'Only where the factory charge is meant for another diameter than the installed one.',
  ),
  makersIncludedRate: input('The maker’s rate for it', 'maker’s rate of the included line'),
  shorterLine: input(
    'The line is shorter than included',
    'rule for a shorter line',
    'Most makers subtract at the same rate; some leave the factory charge. Follow this maker.',
  ),
  corrections: input('Corrections', 'corrections'),
  coil: input('For the indoor coil', 'correction for the coil', 'Only if the maker gives one. It may be negative.'),
  drier: input('For a field drier', 'correction for the drier', 'Only if the maker gives one.'),
  other: input('Other', 'other correction', 'By the maker.'),
  actualCharge: input('Weighed in', 'weighed-in charge'),
  scale: input('Scale', 'scale'),
  scaleStep: input('Scale shows steps of', 'step of the scale', 'Empty: 0.5 oz (14 g) is taken.'),
  scalePlusMinus: input('Scale is good to ±', 'accuracy of the scale', 'Empty: ±0.5 oz (14 g) is taken.'),
  vacuum: input('Vacuum', 'vacuum'),
  deepest: input('Deepest vacuum', 'deepest vacuum', 'At the micron gauge, away from the pump.'),
  rise: input('Rise after the pump is shut off', 'rise of the vacuum', 'Valve shut, pump off.'),
  isolatedMinutes: input('Isolated for', 'minutes isolated', 'At least 5.'),
  labelMaximum: input('Most the label allows', 'most the label allows', 'Of the whole charge, for this room.'),
} as const satisfies Readonly<Record<string, InputWords>>;

export type FieldInputId = keyof typeof fieldInputWords;

/** What an input, a reading or a number of the setup is called inside a sentence. */
export function fieldInputName(id: string): string {
  const names: Readonly<Record<string, { readonly name: string } | undefined>> = {
    ...setupWords.numbers,
    ...readingWords,
    ...fieldInputWords,
  };
  return names[id]?.name ?? id;
}
