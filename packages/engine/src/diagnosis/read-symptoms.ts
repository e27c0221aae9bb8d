/** From measured differences to changes against the healthy system, each only as far as the uncertainty lets it be told. */
import type { Known, Quantity } from '../derivation/quantity';
import { expandedUncertainty, isKnown } from '../derivation/quantity';
import { CLEAR_FROM } from '../methods/separating-tests';
import { probabilityBetween } from '../numerics/normal-distribution';
import type { RefrigerantId } from '../refrigerants/catalogue';
import type { Evidence, EvidenceCode } from './diagnosis-codes';
import type { Change, Column } from './fault-patterns';
import type { UsualBand } from './usual-bands';
import { APPROACH_BAND, condensingOverAirBand, CURRENT_BAND, returnOverEvaporatingBand } from './usual-bands';

/** A measured value, or its deviation from a target, and the limits inside which it is as it should be. */
export interface Held {
  readonly measured: Known;
  readonly low: number;
  readonly high: number;
}

export interface SymptomReadings {
  readonly metering: 'orifice' | 'valve';
  readonly refrigerant: RefrigerantId;
  readonly port: 'liquid' | 'discharge';
  /** Deviation from the target of an orifice; the superheat itself in the window of a valve. */
  readonly superheat: Held | null;
  readonly subcooling: Held | null;
  /** Where there is no target: low below the first, usual between the two others, high above the last. */
  readonly subcoolingLevels: {
    readonly measured: Known;
    readonly lowBelowK: number;
    readonly clearFromK: number;
    readonly highAboveK: number;
  } | null;
  readonly split: Held | null;
  readonly returnOverEvaporating: Quantity;
  readonly airflowPerCapacity: number | null;
  readonly condensingOverAir: Quantity;
  readonly liquidLineApproach: Quantity;
  readonly currentOffExpected: Quantity;
}

export interface Symptom {
  readonly column: Column;
  /** Every change that the reading leaves possible. */
  readonly possible: readonly Change[];
  /** `null` while every change is possible. */
  readonly evidence: Evidence | null;
}

const ANY: readonly Change[] = ['down', 'little', 'up'];
/** Rounding of the conversions. */
const SLACK = 1e-9;

interface Band {
  readonly low: number;
  readonly high: number;
  /** What a value clearly inside leaves possible, and from where it counts as inside. */
  readonly inside: readonly Change[];
  readonly insideFrom: number;
}

/** Clear only at the guarded probability (JCGM 106:2012), with and without the shift that a kink of a chart gives the mean. */
export function possibleChanges({ value, u, meanShift }: Known, band: Band): readonly Change[] {
  const isSure = (from: number, to: number): boolean =>
    Math.min(probabilityBetween(value, u, from, to), probabilityBetween(value + meanShift, u, from, to)) >= CLEAR_FROM;
  if (isSure(-Infinity, band.low - SLACK)) return ['down'];
  if (isSure(band.high + SLACK, Infinity)) return ['up'];
  return isSure(band.insideFrom - SLACK, band.high + SLACK) ? band.inside : ANY;
}

/** Against a target of this very system: inside means that little has changed. */
const ofTarget = ({ low, high }: Held): Band => ({ low, high, inside: ['little'], insideFrom: low });

/** Against what many systems show: inside says nothing. */
const ofUsual = ({ low, high }: UsualBand): Band => ({
  low: low.value,
  high: high.value,
  inside: ANY,
  insideFrom: low.value,
});

/** Every symptom that can be read, in the order of the table's columns. */
export function readSymptoms(readings: SymptomReadings): readonly Symptom[] {
  const { refrigerant, port } = readings;
  const found: (Symptom | null)[] = [
    suction(readings),
    usual('head', readings.condensingOverAir, condensingOverAirBand(refrigerant, port), ['head-low', 'head-high']),
    superheat(readings),
    subcooling(readings),
    held('split', readings.split, ['split-below', 'split-on-target', 'split-above'], 'deviation'),
    current(readings.currentOffExpected),
    // the approach is head less subcooling: it counts only where these cannot be had
    isKnown(readings.condensingOverAir)
      ? null
      : usual('approach', readings.liquidLineApproach, APPROACH_BAND, ['approach-narrow', 'approach-wide']),
  ];
  return found.filter((symptom) => symptom !== null);
}

/** The wider the evaporating temperature lies under the return air, the lower is the suction pressure. */
function suction({ returnOverEvaporating, airflowPerCapacity }: SymptomReadings): Symptom | null {
  const band = returnOverEvaporatingBand(airflowPerCapacity);
  const mirrored = usual('suction', returnOverEvaporating, band, ['suction-high', 'suction-low']);
  return mirrored && { ...mirrored, possible: ANY.filter((change) => mirrored.possible.includes(OPPOSITE[change])) };
}

const OPPOSITE = { up: 'down', little: 'little', down: 'up' } as const satisfies Record<Change, Change>;

function superheat({ metering, superheat: read }: SymptomReadings): Symptom | null {
  return metering === 'orifice'
    ? held(
        'superheatOrifice',
        read,
        ['superheat-below-target', 'superheat-on-target', 'superheat-above-target'],
        'deviation',
      )
    : held(
        'superheatValve',
        read,
        ['superheat-below-window', 'superheat-in-window', 'superheat-above-window'],
        'superheat',
      );
}

function subcooling({ subcooling: read, subcoolingLevels }: SymptomReadings): Symptom | null {
  if (read !== null || subcoolingLevels === null) {
    const codes = ['subcooling-below-target', 'subcooling-on-target', 'subcooling-above-target'] as const;
    return held('subcooling', read, codes, 'deviation');
  }
  const { measured, lowBelowK, clearFromK, highAboveK } = subcoolingLevels;
  const band: Band = { low: lowBelowK, high: highAboveK, inside: ['little', 'up'], insideFrom: clearFromK };
  return symptom('subcooling', measured, possibleChanges(measured, band), {
    codes: ['subcooling-low', 'subcooling-not-low', 'subcooling-high'],
    figure: 'subcooling',
  });
}

function current(offExpected: Quantity): Symptom | null {
  if (!isKnown(offExpected)) return null;
  const { low, high } = CURRENT_BAND;
  const read = { measured: offExpected, low: low.value, high: high.value };
  return held('current', read, ['current-low', 'current-as-expected', 'current-high'], 'deviation');
}

function held(column: Column, read: Held | null, codes: CodesBySide, figure: string): Symptom | null {
  return read && symptom(column, read.measured, possibleChanges(read.measured, ofTarget(read)), { codes, figure });
}

function usual(
  column: Column,
  measured: Quantity,
  band: UsualBand,
  [low, high]: readonly [below: EvidenceCode, above: EvidenceCode],
): Symptom | null {
  if (!isKnown(measured)) return null;
  const possible = possibleChanges(measured, ofUsual(band));
  return symptom(column, measured, possible, { codes: [low, low, high], figure: 'difference' });
}

type CodesBySide = readonly [below: EvidenceCode, inside: EvidenceCode, above: EvidenceCode];

function symptom(
  column: Column,
  measured: Known,
  possible: readonly Change[],
  { codes: [below, inside, above], figure }: { readonly codes: CodesBySide; readonly figure: string },
): Symptom {
  const code = possible.includes('little') ? inside : possible.includes('down') ? below : above;
  return { column, possible, evidence: possible === ANY ? null : measuredEvidence(code, figure, measured) };
}

/** A measured figure with its expanded uncertainty. */
export const measuredEvidence = (code: EvidenceCode, figure: string, { kind, value, ...rest }: Known): Evidence =>
  // which figures belong to a code is held by the sentences, which name them
  ({
    code,
    figures: {
      [figure]: { kind, value },
      uncertainty: { kind, value: expandedUncertainty({ kind, value, ...rest }) },
    },
  }) as Evidence;
