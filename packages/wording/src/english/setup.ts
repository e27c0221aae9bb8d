/** The setup and the visit: labels, choices and short explanations. */
import type {
  AirflowPath,
  HighSidePort,
  LeakSearch,
  MeteringDevice,
  Mode,
  PreflightItem,
  Stage,
  SystemKind,
} from '@chargewright/engine';

export interface ChoiceWords {
  readonly label: string;
  readonly hint: string;
}

export interface SetupFieldWords<Option extends string> extends ChoiceWords {
  /** Inside a sentence. */
  readonly name: string;
  readonly options: Readonly<Record<Option, ChoiceWords>>;
}

const option = (label: string, hint = ''): ChoiceWords => ({ label, hint });
const field = (label: string, name: string, hint = '') => ({ label, name, hint });

const meteringDevice: SetupFieldWords<MeteringDevice> = {
  ...field('Metering device', 'metering device', 'At the indoor coil. It decides the method.'),
  options: {
    'fixed-orifice': option('Fixed orifice', 'Piston or capillary tube: judged by superheat.'),
    txv: option('TXV', 'Valve with a bulb on the suction line: judged by subcooling.'),
    eev: option('EEV', 'Electronic valve: judged by subcooling.'),
  },
};

const mode: SetupFieldWords<Mode> = {
  ...field('Mode', 'mode', 'Charge is judged in cooling.'),
  options: { cooling: option('Cooling'), heating: option('Heating', 'No cooling target holds in heating.') },
};

const kind: SetupFieldWords<SystemKind> = {
  ...field('Kind', 'kind of system'),
  options: {
    split: option('Split', 'Outdoor unit and one ducted indoor coil.'),
    packaged: option('Packaged', 'All in one cabinet. Say which high-side port it has.'),
    'mini-split': option('Mini-split', 'Ductless, metered outdoors: weigh the charge in.'),
    'multi-split': option('Multi-split', 'Several heads, metered outdoors: weigh the charge in.'),
  },
};

const stage: SetupFieldWords<Stage> = {
  ...field('Stage', 'stage', 'Targets hold at full stage only.'),
  options: { full: option('Full stage'), part: option('Part stage'), unknown: option('Not known') },
};

const highSidePort: SetupFieldWords<HighSidePort> = {
  ...field('High-side port', 'high-side port', 'Where the high-side gauge connects.'),
  options: {
    liquid: option('Liquid line', 'The small, warm pipe after the outdoor coil.'),
    discharge: option('Discharge line', 'The hot pipe before the outdoor coil.'),
    none: option('None', 'Only a suction port.'),
  },
};

const targetSubcoolingPort: SetupFieldWords<Exclude<HighSidePort, 'none'>> = {
  ...field(
    'The target holds at the',
    'port of the target subcooling',
    'As the nameplate or the maker’s chart says. The two ports differ by the pressure drop of the outdoor coil.',
  ),
  options: { liquid: option('Liquid line'), discharge: option('Discharge line') },
};

/** Not a code of the engine, which only asks whether an inverter is in its charge mode. */
const chargeMode: SetupFieldWords<'on' | 'off' | 'no-inverter'> = {
  ...field('Inverter in its charge mode', 'charge mode', 'Out of it, its speed moves the readings.'),
  options: { on: option('Yes'), off: option('No'), 'no-inverter': option('Not an inverter') },
};

const leakSearch: SetupFieldWords<LeakSearch> = {
  ...field('Leak search', 'leak search', 'On this visit, before any refrigerant is added.'),
  options: {
    'not-done': option('Not done'),
    'none-found': option('Done, none found'),
    found: option('Leak found'),
  },
};

const airflowPath: SetupFieldWords<AirflowPath> = {
  ...field('Instead of measured airflow', 'way in place of measured airflow', 'Where the rules permit one.'),
  options: {
    'duct-table': option('Ducts by the table', 'Return duct and filter grille sized by the table of the rules.'),
    'best-possible': option('Best that can be done', 'Alterations only: every listed remedy has been tried.'),
  },
};

/** Not a code of the engine, which takes measured airflow where no path is named. */
const airflowProof: SetupFieldWords<AirflowPath | 'measured'> = {
  ...field('Airflow is shown by', 'proof of the airflow', 'Whatever the way, with the filter in place.'),
  options: { measured: option('Measuring it'), ...airflowPath.options },
};

/** Numbers of the setup and the visit, by their names in the contract. */
const numbers = {
  elevation: field('Elevation', 'elevation', 'Of the site. Gauge pressures count from the air around you.'),
  stationPressure: field('Barometer', 'barometer reading', 'Absolute, at the site, not corrected to sea level.'),
  targetSubcooling: field('Target subcooling', 'target subcooling', 'From the nameplate or the maker’s chart.'),
  targetSuperheat: field(
    'Target superheat',
    'target superheat',
    'From this maker’s chart at today’s conditions. Empty: the printed makers’ chart is used where the rules allow it.',
  ),
  superheatRange: field('Superheat range', 'superheat range', 'The maker’s range for the valve.'),
  superheatLow: field('Least superheat', 'least superheat', 'The maker’s range for the valve; it takes both ends.'),
  superheatHigh: field('Most superheat', 'most superheat', 'The maker’s range for the valve; it takes both ends.'),
  nominalCapacity: field('Nominal capacity', 'nominal capacity', 'From the model number or the nameplate.'),
  designAirflow: field('Design airflow', 'design airflow', 'From the design or the maker’s data.'),
  expectedCompressorCurrent: field(
    'Expected current',
    'expected compressor current',
    'From the maker’s table at these conditions, or from this unit when it was right.',
  ),
  factoryCharge: field('Factory charge', 'factory charge', 'From the nameplate.'),
  maxHighPressure: field('Highest pressure allowed', 'highest pressure allowed', 'High side, from the nameplate.'),
  lowestReturnDryBulb: field('Lowest return air', 'lowest return air', 'The coolest return air during this test.'),
  instrumentsCheckedDaysAgo: field(
    'Instruments checked',
    'days since the instruments were checked',
    'Days since gauges and thermometers were held against a reference.',
  ),
  runningMinutes: field('Running for', 'running time', 'Since the start or the last adjustment.'),
  addedThisVisit: field('Added on this visit', 'amount added on this visit', 'All steps together.'),
  addedBefore: field('Added before', 'amount added before'),
  additionsOnEarlierVisits: field(
    'Topped up before',
    'number of earlier additions',
    'How many times on earlier visits, by the record or the owner.',
  ),
  hoursOff: field('Off for', 'hours the system was off', 'Before this start.'),
  lift: field('Lift', 'lift of the line set', 'How far the pipes climb between the two coils.'),
  length: field('Line length', 'length of the line set'),
  lineLength: field('Line length', 'length of the line set', 'Liquid line, one way.'),
  mostLength: field('Longest line allowed', 'longest line allowed'),
  mostLineLength: field('Longest line allowed', 'longest line allowed', 'By the maker, without further measures.'),
  included: field('Length in the factory charge', 'line length covered by the factory charge'),
};

const preflight: Readonly<Record<PreflightItem, ChoiceWords & { readonly name: string }>> = {
  filterAndCoil: field('Filter and indoor coil clean', 'filter or indoor coil', 'Low airflow looks like wrong charge.'),
  panelsOn: field('Panels on', 'panels', 'A missing panel changes the airflow.'),
  fullStage: field('Full stage', 'stage', 'All stages called.'),
  economizerShut: field('Economizer shut', 'economizer', 'No outdoor air mixed into the return.'),
  gaugeZeroed: field('Gauges zeroed', 'gauge zero', 'In the open air, before connecting.'),
  condenserDryAndClean: field('Outdoor coil dry and clean', 'outdoor coil', 'No rain, no hose water, no lint.'),
  fanSteady: field('Outdoor fan steady', 'outdoor fan', 'It does not cycle or change speed.'),
  accessHole: field('Access hole at the coil', 'access hole', 'The return air is read beside the coil.'),
};

export const setupWords = {
  refrigerant: field('Refrigerant', 'refrigerant', 'From the nameplate. Look for a retrofit label too.'),
  procedure: field('Rules', 'procedure', 'General rules, not those of one maker.'),
  alteration: field('Alteration', 'alteration', 'An older system that was altered: some rules ask less airflow of it.'),
  highVelocity: field('Small-duct, high velocity', 'small-duct high-velocity system'),
  airflowPath,
  airflowProof,
  meteringDevice,
  mode,
  kind,
  stage,
  highSidePort,
  targetSubcoolingPort,
  chargeMode,
  leakSearch,
  numbers,
  preflight,
};

/** "a, b and c" */
export const listWords = (names: readonly string[]): string =>
  names.length < 2 ? (names[0] ?? '') : `${names.slice(0, -1).join(', ')} and ${names.at(-1)}`;
