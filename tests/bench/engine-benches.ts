/** What the engine's speed is measured on: the same states for us and for what we are compared with. */
import type { EvaluationRequest } from '@chargewright/engine';
import {
  dewTemperatureK,
  diagnoseCheck,
  evaluateCheck,
  readRequest,
  REFRIGERANT_IDS,
  saturationRange,
} from '@chargewright/engine';
import { dewPointKFromVapourPressure } from '../../packages/engine/src/psychrometrics/dew-point';
import { FREEZING_K } from '../../packages/engine/src/psychrometrics/psychrometric-equation';
import { waterVapourSaturationPressurePa } from '../../packages/engine/src/psychrometrics/saturation-pressure';
import { wetBulbKFromRelativeHumidity } from '../../packages/engine/src/psychrometrics/wet-bulb';
import { oracle, oracleStates } from '../reference/psychrometrics/oracle';
import { timePerCall } from './time-per-call';

/** One line of the results. */
export interface BenchRow {
  readonly what: string;
  readonly measured: string;
  readonly comparedWith: string;
  readonly goal: string;
  readonly met: boolean | null;
}

const STATES = 1000;
const LEAST_RATIO = 10;
const MOST_SATURATION_NS = 150;
const MOST_EVALUATION_US = 200;

const duration = (ns: number): string => (ns < 1000 ? `${ns.toPrecision(3)} ns` : `${(ns / 1000).toPrecision(3)} µs`);

/** The example of the interface: an R-410A system with a fixed orifice and every usual reading. */
export const EXAMPLE: EvaluationRequest = {
  procedure: 'general-rules',
  setup: {
    refrigerant: 'R-410A',
    meteringDevice: 'fixed-orifice',
    mode: 'cooling',
    kind: 'split',
    stage: 'full',
    highSidePort: 'liquid',
    elevation: { value: 650, unit: 'ft' },
    targetSubcooling: { value: 10, unit: 'deltaF' },
    nominalCapacity: { value: 3, unit: 'ton' },
  },
  visit: {
    runningMinutes: 22,
    lowestReturnDryBulb: { value: 74, unit: 'degF' },
    instrumentsCheckedDaysAgo: 12,
    preflight: { filterAndCoil: 'ok', panelsOn: 'ok', gaugeZeroed: 'not-checked' },
  },
  readings: {
    returnDryBulb: { value: 78, unit: 'degF' },
    returnWetBulb: {
      value: 65,
      unit: 'degF',
      plusMinus: { value: 1, unit: 'deltaF', kind: 'limit' },
      ageSeconds: 40,
    },
    supplyDryBulb: { value: 58.4, unit: 'degF' },
    outdoorDryBulb: { value: 95, unit: 'degF' },
    suctionPressure: { value: 118, unit: 'psig' },
    suctionLineTemperature: { value: 52, unit: 'degF' },
    liquidPressure: { value: 395, unit: 'psig' },
    liquidLineTemperature: { value: 106, unit: 'degF' },
  },
};

/** The whole check first, as a page meets it: what runs before teaches the optimiser other habits. */
export const engineBenches = (): readonly BenchRow[] => [...evaluation(), saturation(), ...moistAir()];

function sumOver<T>(items: readonly T[], of: (item: T) => number): () => number {
  return () => {
    let sum = 0;
    for (const item of items) sum += of(item);
    return sum;
  };
}

function moistAir(): readonly BenchRow[] {
  const states = oracleStates(STATES)
    .slice(0, STATES)
    .map(({ dryBulbC, relativeHumidityRatio, pressurePa }) => {
      const dryBulbK = dryBulbC + FREEZING_K;
      const vapourPressurePa = relativeHumidityRatio * waterVapourSaturationPressurePa(dryBulbK);
      return { dryBulbC, dryBulbK, relativeHumidityRatio, pressurePa, vapourPressurePa };
    });
  const against = (what: string, accuracy: string, ours: () => number, theirs: () => number): BenchRow => {
    const [own, other] = timePerCall([
      { name: 'ours', run: ours, calls: STATES },
      { name: 'psychrolib', run: theirs, calls: STATES },
    ]);
    const ratio = other!.timesTheFirst;
    return {
      what,
      measured: duration(own!.ns),
      comparedWith: `psychrolib 1.1.1, ${accuracy}: ${duration(other!.ns)}, ${ratio.toPrecision(3)} times as long`,
      goal: `≥ ${LEAST_RATIO} times`,
      met: ratio >= LEAST_RATIO,
    };
  };
  return [
    against(
      'wet bulb from dry bulb and relative humidity, to 1e-9 K',
      'to 0.001 K',
      sumOver(states, wetBulbKFromRelativeHumidity),
      sumOver(states, (s) => oracle.GetTWetBulbFromRelHum(s.dryBulbC, s.relativeHumidityRatio, s.pressurePa)),
    ),
    against(
      'dew point from vapour pressure, to 1e-9 K',
      'to 0.001 K',
      sumOver(states, (s) => dewPointKFromVapourPressure(s.vapourPressurePa)),
      sumOver(states, (s) => oracle.GetTDewPointFromVapPres(s.dryBulbC, s.vapourPressurePa)),
    ),
  ];
}

/** Dew points of every refrigerant at pressures spread over its curve, beside as many exponentials. */
function saturation(): BenchRow {
  const queries = REFRIGERANT_IDS.flatMap((refrigerant) => {
    const { minDewPressurePa: low, maxDewPressurePa: high } = saturationRange(refrigerant);
    return Array.from({ length: 16 }, (_, k) => ({ refrigerant, pressurePa: low * (high / low) ** ((k + 0.5) / 16) }));
  });
  const exponents = queries.map(({ pressurePa }) => -1 / pressurePa);
  const [exp, own] = timePerCall([
    { name: 'Math.exp', run: sumOver(exponents, Math.exp), calls: exponents.length },
    { name: 'ours', run: sumOver(queries, dewTemperatureK), calls: queries.length },
  ]);
  return {
    what: `saturation temperature from pressure, ${REFRIGERANT_IDS.length} refrigerants in turn`,
    measured: duration(own!.ns),
    comparedWith: `Math.exp: ${duration(exp!.ns)}, ours ${own!.timesTheFirst.toPrecision(3)} times as long`,
    goal: `≤ ${MOST_SATURATION_NS} ns`,
    met: own!.ns <= MOST_SATURATION_NS,
  };
}

function readExample(request: EvaluationRequest) {
  const read = readRequest(request);
  if (!read.ok) throw new Error('the example was refused');
  return read.input;
}

/** Everything that a check can ask of the engine at once: a maker's table with a dash, and the causes. */
const WITH_MAKERS_TABLE: EvaluationRequest = {
  ...EXAMPLE,
  setup: {
    ...EXAMPLE.setup,
    makersChart: {
      kind: 'superheat',
      rows: { unit: 'degF', values: [75, 85, 95, 105, 115] },
      columns: { unit: 'degF', values: [57, 62, 67, 72] },
      unit: 'deltaF',
      cells: [
        [9, 17, 24, 31],
        [6, 13, 21, 29],
        [null, 10, 18, 26],
        [null, 7, 15, 23],
        [null, null, 11, 20],
      ],
    },
  },
};

function evaluation(): readonly BenchRow[] {
  const input = readExample(EXAMPLE);
  const withTable = readExample(WITH_MAKERS_TABLE);
  const [judging, whole, reading] = timePerCall([
    { name: 'evaluateCheck', run: () => evaluateCheck(input).criteria.length, calls: 1 },
    {
      name: 'evaluateCheck and diagnoseCheck',
      run: () => diagnoseCheck(withTable, evaluateCheck(withTable)).causes.length,
      calls: 1,
    },
    { name: 'readRequest', run: () => Number(readRequest(EXAMPLE).ok), calls: 1 },
  ]);
  const judgement = (what: string, ns: number): BenchRow => ({
    what,
    measured: duration(ns),
    comparedWith: '',
    goal: `≤ ${MOST_EVALUATION_US} µs`,
    met: ns <= 1000 * MOST_EVALUATION_US,
  });
  return [
    judgement('`evaluateCheck` of the example of the interface', judging!.ns),
    judgement('the same by a maker’s table, with its causes (`diagnoseCheck`)', whole!.ns),
    {
      what: '`readRequest` of the example',
      measured: duration(reading!.ns),
      comparedWith: `evaluateCheck: ${(1 / reading!.timesTheFirst).toPrecision(3)} times as long`,
      goal: '',
      met: null,
    },
  ];
}
