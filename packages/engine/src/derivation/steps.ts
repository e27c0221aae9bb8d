import type { DerivedStep, Known } from './quantity';

export interface DerivationStep {
  readonly id: string;
  readonly result: Known;
  readonly step: DerivedStep;
}

/** The derived steps behind some results, inputs before what uses them, each formula id once: the order a person would write them on paper. */
export function derivationSteps(results: readonly Known[]): readonly DerivationStep[] {
  const steps = new Map<string, DerivationStep>();
  const visit = (result: Known): void => {
    const { step } = result;
    if (step.type === 'leaf' || steps.has(step.formula.id)) return;
    for (const input of Object.values(step.from)) visit(input);
    steps.set(step.formula.id, { id: step.formula.id, result, step });
  };
  results.forEach(visit);
  return [...steps.values()];
}
