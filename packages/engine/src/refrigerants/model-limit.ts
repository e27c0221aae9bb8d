import { differenceToK } from '../units';
import { refrigerantFacts } from './catalogue';
import type { RefrigerantId } from './catalogue';

/** ± of the property model as a limit in °F, by the model's grade. */
export const MODEL_LIMIT_F = { pure: 0.25, A: 0.8, B: 1.2, C: 2 } as const;

export const MODEL_LIMIT_BASIS = {
  standing: 'choice',
  source: 'Our choice, from the differences between printed charts and models',
} as const;

/** ± of a saturation temperature (K) from the property model alone, as a limit. R-410A, a blend of grade A: 0.44 K. */
export function saturationModelLimitK(refrigerant: RefrigerantId): number {
  const { kind, grade } = refrigerantFacts(refrigerant);
  return differenceToK(MODEL_LIMIT_F[kind === 'pure' ? 'pure' : grade], 'deltaF');
}
