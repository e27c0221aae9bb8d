/**
 * Which causes account for what was read. A cause is listed when at least one clear sign is its own and no clear reading contradicts it; a separating test
 * that decides a cause lists it whatever the readings say. Where no single cause accounts for all clear signs, pairs of causes that do are listed, each
 * with what does not fit. Causes stand in the order of the table: nothing is ranked, scored or counted for the person.
 */
import type { Cause, CauseFinding, Diagnosis, DiagnosisNote, Evidence, Measurement } from './diagnosis-codes';
import type { Cell, Column, FaultPattern } from './fault-patterns';
import { FAULT_PATTERNS } from './fault-patterns';
import { nextMeasurement } from './measurements';
import type { Symptom } from './read-symptoms';
import type { Shown } from './shown-by-tests';

export interface DiagnosisInput {
  readonly metering: 'orifice' | 'valve';
  readonly symptoms: readonly Symptom[];
  readonly shown: readonly Shown[];
  /** By the bare value, so that a poorer instrument does not offer what a better one rules out. */
  readonly isSubcoolingHigh: boolean;
  /** The port, the refrigerant or the purity of the charge is in doubt, so that a high subcooling may not be one: what would clear it up. */
  readonly subcoolingDoubts: readonly Measurement[];
  /** Measurements that could still be made. */
  readonly open: ReadonlySet<Measurement>;
}

/** With air in the system these readings show the air. */
const SHOW_THE_AIR: readonly Column[] = ['head', 'subcooling', 'approach'];

interface Weighed {
  readonly pattern: FaultPattern;
  readonly fits: readonly Evidence[];
  readonly doesNotFit: readonly Evidence[];
  /** Clear signs that are this cause's own: it always moves them this way. */
  readonly own: readonly Column[];
  /** Clear signs that the cause would explain. */
  readonly explains: readonly Column[];
  readonly contradictedBy: readonly Column[];
  /** Leading signs that are not there: the reading is on its target, or moved the other way. */
  readonly lacks: readonly { readonly column: Column; readonly isOnTarget: boolean }[];
  readonly isDecided: boolean;
  readonly isRefuted: boolean;
}

export function diagnose(input: DiagnosisInput): Diagnosis {
  const { symptoms } = input;
  const airFound = isAirFound(input);
  const counts = ({ column }: Symptom): boolean => !airFound || !SHOW_THE_AIR.includes(column);
  const signs = symptoms.filter((symptom) => isSign(symptom) && counts(symptom)).map(({ column }) => column);
  const candidates = FAULT_PATTERNS.filter(({ metering }) => metering === 'any' || metering === input.metering)
    .map((pattern) => weigh(pattern, input, pattern.cause === 'air-in-system' ? () => true : counts))
    .filter(({ isRefuted, pattern }) => !isRefuted && mayBeOffered(pattern.cause, input));

  const alone = candidates.filter((weighed) => isListedAlone(weighed, input));
  const explained = alone.some(({ contradictedBy, isDecided, explains }) =>
    isDecided ? signs.every((column) => explains.includes(column)) : contradictedBy.length === 0,
  );
  const together = signs.length > 0 && !explained ? inPairs(candidates, signs) : [];
  const listed = candidates.filter((weighed) => alone.includes(weighed) || together.includes(weighed));
  const causes = listed.map(({ pattern }) => pattern.cause);
  return {
    causes: listed.map((weighed) => finding(weighed, causes, input)),
    notes: notesOn({ symptoms, signs, explained, isAny: listed.length > 0 }),
  };
}

/** A rise or a fall; a value clearly on its target is none. */
const isSign = ({ possible }: Symptom): boolean => possible.length === 1 && possible[0] !== 'little';

const isAirFound = ({ shown }: DiagnosisInput): boolean =>
  shown.some(({ cause, what }) => cause === 'air-in-system' && what === 'decides');

/** Low charge is not offered against a high subcooling, unless that is in doubt. */
const mayBeOffered = (cause: Cause, input: DiagnosisInput): boolean =>
  cause !== 'low-charge' || !input.isSubcoolingHigh || input.subcoolingDoubts.length > 0 || isAirFound(input);

const isDoubted = (cause: Cause, { isSubcoolingHigh }: DiagnosisInput): boolean =>
  cause === 'low-charge' && isSubcoolingHigh;

function weigh(
  pattern: FaultPattern,
  { symptoms, shown }: DiagnosisInput,
  counts: (symptom: Symptom) => boolean,
): Weighed {
  const fits: Evidence[] = [];
  const doesNotFit: Evidence[] = [];
  const own: Column[] = [];
  const explains: Column[] = [];
  const contradictedBy: Column[] = [];
  const lacks: { column: Column; isOnTarget: boolean }[] = [];
  for (const symptom of symptoms.filter(counts)) {
    const { column, evidence } = symptom;
    const cell = pattern.cells[column];
    if (cell === null || evidence === null) continue;
    const verdict = compare(symptom, cell);
    if (verdict === 'fits') {
      fits.push(evidence);
      if (isSign(symptom)) explains.push(column);
      if (isSign(symptom) && cell.changes.length === 1) own.push(column);
    } else if (verdict === 'contradicts') {
      doesNotFit.push(evidence);
      contradictedBy.push(column);
      if (cell.leading) lacks.push({ column, isOnTarget: symptom.possible.includes('little') });
    }
  }
  const ofCause = shown.filter(({ cause }) => cause === pattern.cause);
  for (const { what, evidence } of ofCause) (what === 'refutes' ? doesNotFit : fits).push(evidence);
  return {
    pattern,
    fits,
    doesNotFit,
    own,
    explains,
    contradictedBy,
    lacks,
    isDecided: ofCause.some(({ what }) => what === 'decides'),
    isRefuted: ofCause.some(({ what }) => what === 'refutes'),
  };
}

/** A reading on its target contradicts only a fault's leading sign: a small fault need not show in every other. */
export function compare({ possible }: Pick<Symptom, 'possible'>, cell: Cell): 'fits' | 'contradicts' | 'silent' {
  if (possible.some((change) => cell.changes.includes(change))) return possible.length === 1 ? 'fits' : 'silent';
  return possible.includes('little') && !cell.leading ? 'silent' : 'contradicts';
}

function isListedAlone({ pattern, own, contradictedBy, isDecided }: Weighed, input: DiagnosisInput): boolean {
  if (isDecided) return true;
  if (own.length === 0) return false;
  return contradictedBy.every((column) => isDoubted(pattern.cause, input) && SHOW_THE_AIR.includes(column));
}

/**
 * Causes that, two together, explain every clear sign, each at least one that the other does not. A leading sign may be lacking only where the other
 * cause hides it, by moving the same reading the other way.
 */
function inPairs(candidates: readonly Weighed[], signs: readonly Column[]): readonly Weighed[] {
  const found = new Set<Weighed>();
  candidates.forEach((one, k) => {
    for (const other of candidates.slice(k + 1)) {
      const explained = signs.every((column) => one.explains.includes(column) || other.explains.includes(column));
      if (explained && adds(one, other) && adds(other, one)) found.add(one).add(other);
    }
  });
  return [...found];
}

const adds = (one: Weighed, other: Weighed): boolean =>
  one.own.some((column) => !other.explains.includes(column)) &&
  one.lacks.every(({ column, isOnTarget }) => isOnTarget && areOpposed(one.pattern, other.pattern, column));

const areOpposed = (one: FaultPattern, other: FaultPattern, column: Column): boolean => {
  const [mine, others] = [one.cells[column]?.changes ?? [], other.cells[column]?.changes ?? []];
  return (mine.includes('up') && others.includes('down')) || (mine.includes('down') && others.includes('up'));
};

function finding(
  { pattern: { cause }, fits, doesNotFit }: Weighed,
  listed: readonly Cause[],
  input: DiagnosisInput,
): CauseFinding {
  const doubt = isDoubted(cause, input) ? input.subcoolingDoubts[0] : undefined;
  return { cause, fits, doesNotFit, nextMeasurement: doubt ?? nextMeasurement(cause, listed, input.open) };
}

/** Columns that have a target of their own: without one of them little can be said. */
const TARGETED: readonly Column[] = ['superheatOrifice', 'superheatValve', 'subcooling', 'split'];

function notesOn({
  symptoms,
  signs,
  explained,
  isAny,
}: {
  readonly symptoms: readonly Symptom[];
  readonly signs: readonly Column[];
  readonly explained: boolean;
  readonly isAny: boolean;
}): readonly DiagnosisNote[] {
  if (signs.length > 0) {
    if (!explained) return [isAny ? 'no-single-cause' : 'no-pattern'];
    return signs.length === 1 ? ['one-sign'] : [];
  }
  if (isAny) return [];
  const targeted = symptoms.filter(({ column }) => TARGETED.includes(column));
  if (targeted.length === 0) return ['too-little-read'];
  return targeted.every(({ evidence }) => evidence !== null) ? ['nothing-outside'] : ['unclear'];
}
