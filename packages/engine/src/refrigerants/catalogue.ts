/**
 * What a list of refrigerants shows. Composition and publications are heavier and rarely shown: `refrigerant-model.ts`.
 * Designations are those of ANSI/ASHRAE Standard 34.
 */
import { SAFETY_CLASSES, SAFETY_CLASS_STANDING } from './data/safety-classes';
import type { SafetyClass } from './data/safety-classes';
import { SATURATION_MODELS } from './generated/saturation-curves';
import type { RefrigerantId } from './generated/saturation-curves';
import type { CriticalPressureOrigin, ModelGrade } from './saturation-model';

export { REFRIGERANT_IDS } from './generated/saturation-curves';
export type { RefrigerantId };

/** The eight asked for first on a residential call; the choice is common practice, no source. */
export const COMMON_REFRIGERANT_IDS = [
  'R-410A',
  'R-22',
  'R-454B',
  'R-32',
  'R-407C',
  'R-134a',
  'R-290',
  'R-404A',
] as const satisfies readonly RefrigerantId[];

export interface RefrigerantFacts {
  readonly id: RefrigerantId;
  readonly kind: 'pure' | 'blend';
  /** C means that at least one pair of the blend is estimated: say so wherever it is used. */
  readonly grade: ModelGrade;
  /** An azeotrope whose well-known boiling point the model misses; `refrigerantModel` says by how much. */
  readonly doubtful: boolean;
  readonly safetyClass: SafetyClass;
  readonly safetyClassStanding: typeof SAFETY_CLASS_STANDING;
  /** Of the model, which for a blend is not the printed figure of any table. */
  readonly criticalTemperatureK: number;
  readonly criticalPressurePa: number;
  readonly criticalPressureOrigin: CriticalPressureOrigin;
}

/** True for a designation that this engine has curves for, written exactly as in `REFRIGERANT_IDS`. */
export function isRefrigerantId(text: string): text is RefrigerantId {
  return Object.hasOwn(SATURATION_MODELS, text);
}

/** Facts of one refrigerant. `refrigerantFacts('R-410A').safetyClass` is `'A1'`. */
export function refrigerantFacts(id: RefrigerantId): RefrigerantFacts {
  const { kind, grade, criticalTemperatureK, criticalPressurePa, criticalPressureOrigin } = SATURATION_MODELS[id];
  return {
    id,
    kind,
    grade,
    doubtful: id === 'R-500' || id === 'R-502',
    safetyClass: SAFETY_CLASSES[id],
    safetyClassStanding: SAFETY_CLASS_STANDING,
    criticalTemperatureK,
    criticalPressurePa,
    criticalPressureOrigin,
  };
}
