import type { DerivationStep, Known } from '@chargewright/engine';
import { findingPhrases } from './english/findings';
import { formatValue } from './format-value';
import type { Language } from './language';
import type { Print } from './message-texts';
import { presentValue, type ContractUnit } from './present-value';
import type { UnitSystem } from './unit-system';

export interface DerivationLine {
  readonly id: string;
  /** What the step gives. */
  readonly name: string;
  readonly formula: string;
  /** The formula with each symbol replaced by its value. */
  readonly substitution: string;
  /** Unrounded, in `unit`. */
  readonly value: number;
  readonly unit: ContractUnit;
  /** The value as printed. */
  readonly result: string;
  readonly source: string;
}

const escaped = (text: string): string => text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');

/** A gauge pressure is the one pressure of a formula that is not absolute; its input is named for it. */
const isGauge = (name: string): boolean => /gaugePa$/i.test(name);

/** A negative number after an operator is put in brackets, as on paper. */
const shown = (name: string, input: Known, system: UnitSystem, print: Print): string => {
  const text = isGauge(name)
    ? `${print('pressureDifferencePa', input.value, system)}g`
    : print(input.kind, input.value, system);
  return text.startsWith('−') ? `(${text})` : text;
};

/**
 * Replaces whole symbols only and in one pass, the longest first: `T` inside `T_dew` stays, and a value once put in is not read again.
 */
export function substitute(text: string, values: ReadonlyMap<string, string>): string {
  if (values.size === 0) return text;
  const symbols = [...values.keys()].sort((a, b) => b.length - a.length).map(escaped);
  const whole = new RegExp(`(?<![\\p{L}\\p{N}_])(?:${symbols.join('|')})(?![\\p{L}\\p{N}_])`, 'gu');
  return text.replace(whole, (symbol) => values.get(symbol) ?? symbol);
}

/** The derivation as a person would write it on paper, a line a step. */
export const derivationLines = (
  steps: readonly DerivationStep[],
  system: UnitSystem,
  language: Pick<Language, 'findings'> = { findings: findingPhrases },
  print: Print = formatValue,
): readonly DerivationLine[] =>
  steps.map(({ id, result, step }) => {
    const { text, symbols, source } = step.formula;
    const values = new Map<string, string>();
    for (const [name, input] of Object.entries(step.from))
      values.set(symbols[name] ?? name, shown(name, input, system, print));
    return {
      id,
      name: language.findings.stepName(id),
      formula: text,
      substitution: substitute(text, values),
      ...presentValue(result.kind, result.value, system),
      result: print(result.kind, result.value, system),
      source,
    };
  });
