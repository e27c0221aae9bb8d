/** A plausible system as a person states it, in °F and psi or in °C and bar. The two say the same, up to the last digit of a conversion. */
import type {
  Amount,
  EvaluationRequest,
  PlusMinus,
  ReadingId,
  ReadingInput,
  ReadingUnit,
  ReadingsInput,
  SetupInput,
  VisitInput,
} from '@chargewright/engine';
import {
  differenceFromK,
  flowFromM3PerS,
  flowToM3PerS,
  lengthFromM,
  lengthToM,
  massFromKg,
  massToKg,
  powerFromW,
  powerToW,
  pressureDifferenceFromPa,
  pressureDifferenceToPa,
  pressureFromPa,
  READING_DIMENSIONS,
  temperatureFromK,
  temperatureToK,
} from '@chargewright/engine';
import type { ChartSite } from './makers-charts';
import { makersChartInput } from './makers-charts';
import type { PlausibleSystem, SiReading, SiReadings } from './plausible-system';
import { defined, mapped } from './plausible-system';

export type UnitSystem = 'inch-pound' | 'metric';

const UNITS = {
  'inch-pound': {
    temperature: 'degF',
    difference: 'deltaF',
    pressure: 'psig',
    pressureDifference: 'psi',
    flow: 'cfm',
    length: 'ft',
    power: 'ton',
    mass: 'lb',
    absolute: 'psia',
  },
  metric: {
    temperature: 'degC',
    difference: 'deltaC',
    pressure: 'barg',
    pressureDifference: 'bar',
    flow: 'm3/h',
    length: 'm',
    power: 'kW',
    mass: 'kg',
    absolute: 'kPaa',
  },
} as const;

export function requestOfSystem(system: PlausibleSystem, unitSystem: UnitSystem): EvaluationRequest {
  const { readings, earlierReadings, drives } = system;
  const toReadings = (si: SiReadings) => readingsIn(si, unitSystem, system.atmospherePa);
  return {
    ...defined({ procedure: drives.procedure }),
    setup: setupIn(system, unitSystem),
    visit: {
      ...visitIn(system, unitSystem),
      ...(earlierReadings && {
        earlier: { minutesAgo: drives.earlierMinutesAgo, readings: toReadings(earlierReadings) },
      }),
    },
    readings: toReadings(readings),
  };
}

function setupIn({ drives, ...system }: PlausibleSystem, unitSystem: UnitSystem): SetupInput {
  const unit = UNITS[unitSystem];
  const difference = (valueK: number) => ({ value: differenceFromK(valueK, unit.difference), unit: unit.difference });
  const kelvinRange = ([low, high]: readonly [number, number]) => ({
    low: differenceFromK((low * 5) / 9, unit.difference),
    high: differenceFromK((high * 5) / 9, unit.difference),
    unit: unit.difference,
  });
  const flow = (cfm: number) => ({ value: flowFromM3PerS(flowToM3PerS(cfm, 'cfm'), unit.flow), unit: unit.flow });
  const length = (feet: number) => ({ value: lengthFromM(lengthToM(feet, 'ft'), unit.length), unit: unit.length });
  const tons = drives.nominalCapacityTon;
  return {
    refrigerant: drives.refrigerant,
    meteringDevice: drives.meteringDevice,
    ...defined({
      mode: drives.mode,
      kind: drives.kind,
      stage: drives.stage,
      highSidePort: drives.highSidePort,
      elevation: mapped(drives.elevationM, (metres) => ({
        value: lengthFromM(metres, unit.length),
        unit: unit.length,
      })),
      stationPressure: mapped(drives.weatherPa, () => ({
        value: pressureFromPa(system.atmospherePa, unit.absolute, 0),
        unit: unit.absolute,
      })),
      targetSuperheat: mapped(system.targetSuperheatK, difference),
      targetSubcooling: mapped(system.targetSubcoolingK, difference),
      targetSubcoolingPort: drives.targetSubcoolingPort,
      superheatRange: mapped(drives.superheatRangeF, kelvinRange),
      nominalCapacity: mapped(tons, (value) => ({
        value: powerFromW(powerToW(value, 'ton'), unit.power),
        unit: unit.power,
      })),
      designAirflow: mapped(drives.designAirflowPerTon, (perTon) => flow(perTon * (tons ?? 3))),
      alteration: drives.alteration,
      highVelocity: drives.highVelocity,
      airflowPath: drives.airflowPath,
      factoryCharge: mapped(drives.factoryChargeLb, (pounds) => mass(pounds, unitSystem)),
      expectedCompressorCurrent: mapped(drives.electrical, (measured) =>
        drives.expectedCurrentShare === undefined
          ? undefined
          : { value: drives.expectedCurrentShare * measured, unit: 'A' as const },
      ),
      maxHighPressure: mapped(drives.maxHighPressurePsi, (psi) => ({
        value: pressureDifferenceFromPa(pressureDifferenceToPa(psi, 'psi'), unit.pressureDifference),
        unit: unit.pressure,
      })),
      chargeMode: drives.chargeMode,
      ...chartsIn(drives.makersCharts, system.chartSite, unitSystem),
      lineSet: defined({
        lift: mapped(drives.liftFt, length),
        length: mapped(drives.lineLengthFt, length),
        mostLength: mapped(drives.mostLineLengthFt, length),
      }),
    }),
  };
}

/** One table in the field for one, several in the field for several. */
function chartsIn(
  drawn: PlausibleSystem['drives']['makersCharts'],
  site: ChartSite,
  unitSystem: UnitSystem,
): Pick<SetupInput, 'makersChart' | 'makersCharts'> {
  const charts = (drawn ?? []).map((chart) => makersChartInput(chart, site, unitSystem));
  const [only] = charts;
  return charts.length === 1 && only !== undefined
    ? { makersChart: only }
    : defined({ makersCharts: mapped(drawn, () => charts) });
}

function visitIn({ drives }: PlausibleSystem, unitSystem: UnitSystem): VisitInput {
  const { temperature } = UNITS[unitSystem];
  return defined({
    runningMinutes: drives.runningMinutes,
    lowestReturnDryBulb: mapped(drives.lowestReturnF, (value) => ({
      value: temperatureFromK(temperatureToK(value, 'degF'), temperature),
      unit: temperature,
    })),
    instrumentsCheckedDaysAgo: drives.instrumentsCheckedDaysAgo,
    preflight: drives.preflight,
    leakSearch: drives.leakSearch,
    addedThisVisit: mapped(drives.addedThisVisitLb, (pounds) => mass(pounds, unitSystem)),
    additionsOnEarlierVisits: drives.earlierAdditions,
    commissioning: drives.commissioning,
    hoursOff: drives.hoursOff,
    headRaised: drives.headRaised,
    iceSeen: drives.iceSeen,
    tests: defined({ liquidShutIn: drives.standing?.shutIn, bulb: drives.bulb, valve: drives.valve }),
  });
}

function mass(pounds: number, unitSystem: UnitSystem): Amount<'lb' | 'kg'> {
  const { mass: unit } = UNITS[unitSystem];
  return { value: massFromKg(massToKg(pounds, 'lb'), unit), unit };
}

function readingsIn(readings: SiReadings, unitSystem: UnitSystem, atmospherePa: number): ReadingsInput {
  const entries = Object.entries(readings) as [ReadingId, SiReading][];
  return Object.fromEntries(entries.map(([id, reading]) => [id, readingIn(id, reading, unitSystem, atmospherePa)]));
}

function readingIn(id: ReadingId, reading: SiReading, unitSystem: UnitSystem, atmospherePa: number): ReadingInput {
  const { value, unit } = amountIn(id, reading.value, unitSystem, atmospherePa);
  const { plusMinus, ageSeconds, instrumentId, resolution } = reading;
  return {
    value,
    unit,
    ...defined({
      plusMinus: mapped(plusMinus, ({ half, kind }) => ({ ...halfWidthIn(id, half, unitSystem), kind })),
      resolution: mapped(resolution, (step) => differenceFromK(step, UNITS[unitSystem].difference)),
      ageSeconds,
      instrumentId,
    }),
  };
}

function amountIn(id: ReadingId, si: number, unitSystem: UnitSystem, atmospherePa: number): Amount<ReadingUnit> {
  const { temperature, pressure, flow } = UNITS[unitSystem];
  switch (READING_DIMENSIONS[id]) {
    case 'temperature':
      return { value: temperatureFromK(si, temperature), unit: temperature };
    case 'pressure':
      return { value: pressureFromPa(si, pressure, atmospherePa), unit: pressure };
    case 'humidity':
      return { value: 100 * si, unit: '%' };
    case 'airflow':
      return { value: flowFromM3PerS(si, flow), unit: flow };
    case 'staticPressure':
      return { value: si, unit: 'inH2O' };
    case 'current':
      return { value: si, unit: 'A' };
    case 'voltage':
      return { value: si, unit: 'V' };
  }
}

function halfWidthIn(id: ReadingId, half: number, unitSystem: UnitSystem): Omit<PlusMinus, 'kind'> {
  const { difference, pressureDifference, flow } = UNITS[unitSystem];
  switch (READING_DIMENSIONS[id]) {
    case 'temperature':
      return { value: differenceFromK(half, difference), unit: difference };
    case 'pressure':
      return { value: pressureDifferenceFromPa(half, pressureDifference), unit: pressureDifference };
    case 'humidity':
      return { value: 100 * half, unit: '%' };
    case 'airflow':
      return { value: flowFromM3PerS(half, flow), unit: flow };
    case 'staticPressure':
    case 'current':
    case 'voltage':
      throw new RangeError(`no ± of ${id} is drawn`);
  }
}
