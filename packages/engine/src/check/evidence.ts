/** What a derivation rests on: which readings, and whether any of them is too old to count. */
import type { Known, Quantity } from '../derivation/quantity';
import type { EngineError } from '../errors';
import type { CheckInput } from './input';
import type { Reason } from './codes';
import type { ReadingId } from './readings';
import { READING_IDS } from './readings';

const isReadingId = (id: string): id is ReadingId => (READING_IDS as readonly string[]).includes(id);

/** The readings at the leaves of some derivations. */
export function readingsBehind(quantities: readonly Known[]): ReadonlySet<ReadingId> {
  const found = new Set<ReadingId>();
  const visit = ({ step }: Known): void => {
    if (step.type === 'derived') Object.values(step.from).forEach(visit);
    else if (isReadingId(step.id)) found.add(step.id);
  };
  quantities.forEach(visit);
  return found;
}

/** The readings behind the quantities that are older than the procedure allows, as a reason, or `null`. A reading from before is meant to be old. */
export function staleReason({ procedure, readings }: CheckInput, quantities: readonly Known[]): Reason | null {
  const most = procedure.mostReadingAgeSeconds.value;
  const stale = [...readingsBehind(quantities)].filter((id) => {
    if (id === 'returnWetBulbBefore') return false;
    const age = readings[id as keyof typeof readings]?.ageSeconds;
    return age !== undefined && age > most;
  });
  return stale.length === 0 ? null : { code: 'stale', figures: { readings: { kind: 'readings', value: stale } } };
}

/** Why a quantity is not there: which readings are missing, or which table or curve refuses it. */
export function absenceReason(quantity: Exclude<Quantity, Known>): Reason {
  if (quantity.state === 'missing') {
    const inputs = quantity.inputs.filter(isReadingId);
    return inputs.length === 0
      ? { code: 'target-missing', figures: {} }
      : { code: 'readings-missing', figures: { readings: { kind: 'readings', value: inputs } } };
  }
  return refusalReason(quantity.error);
}

function refusalReason({ details }: EngineError): Reason {
  switch (details.reason) {
    case 'dash':
    case 'outside-chart':
      return { code: 'no-target-here', figures: {} };
    case 'outside-curve':
    case 'above-critical':
      return { code: 'outside-curve', figures: {} };
    default:
      return { code: 'outside-range', figures: {} };
  }
}
