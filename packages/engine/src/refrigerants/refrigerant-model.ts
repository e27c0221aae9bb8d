/** Composition of a refrigerant and the publications its curves rest on: for the API and the pages about sources, not for the phone's first page. */
import { CITATIONS, REFRIGERANT_MODELS } from './generated/refrigerant-models';
import type { RefrigerantId } from './generated/saturation-curves';

export interface RefrigerantComponent {
  readonly id: RefrigerantId;
  /** Nominal, of the designation. */
  readonly massFraction: number;
}

export interface RefrigerantModel {
  readonly id: RefrigerantId;
  /** One component with fraction 1 for a pure fluid; the fractions sum to 1. */
  readonly composition: readonly RefrigerantComponent[];
  /** Pairs whose mixing parameters are estimated from an analogue, not fitted to measurements; empty unless the grade is C. */
  readonly estimatedPairs: readonly (readonly [RefrigerantId, RefrigerantId])[];
  /** Publications of the equations of state and of the fitted pairs. */
  readonly citations: readonly string[];
  /** Only for a refrigerant marked doubtful. */
  readonly doubt?: string;
}

/** Normal boiling points of ANSI/ASHRAE Standard 34's table are from memory; they rest on older models and are rounded. */
const DOUBTS: Readonly<Partial<Record<RefrigerantId, string>>> = {
  'R-500': 'bubble point at 101325 Pa is 0.4 K below the ASHRAE 34 figure of -33.6 °C (from memory)',
  'R-502': 'bubble point at 101325 Pa is 0.5 K above the ASHRAE 34 figure of -45.3 °C (from memory)',
};

/** Composition and sources of one refrigerant. */
export function refrigerantModel(id: RefrigerantId): RefrigerantModel {
  const { composition, estimatedPairs, citations } = REFRIGERANT_MODELS[id];
  const doubt = DOUBTS[id];
  return {
    id,
    composition: composition.map(([component, massPercent]) => ({ id: component, massFraction: massPercent / 100 })),
    estimatedPairs,
    citations: citations.map((key) => CITATIONS[key]),
    ...(doubt === undefined ? {} : { doubt }),
  };
}
