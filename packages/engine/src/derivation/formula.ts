import type { QuantityKind } from './quantity';

/**
 * One definition of a derived number: what it computes, how it is written on paper, and where it was published.
 * `text` uses the `symbols` of the inputs; replacing each by its value prints the substitution.
 */
export interface Formula<Name extends string = string> {
  readonly id: string;
  readonly gives: QuantityKind;
  readonly text: string;
  readonly symbols: Readonly<Record<Name, string>>;
  readonly source: string;
  /** SI in, SI out. Throws `EngineError` where it has no answer. */
  of(inputs: Readonly<Record<Name, number>>): number;
}

/** Identity that fixes the input names of a formula from its `symbols`. */
export const formula = <Name extends string>(definition: Formula<Name>): Formula<Name> => definition;
