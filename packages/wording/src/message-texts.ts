import type { AssumedField, Figure, MakersChartKind, PreflightItem, ReadingId } from '@chargewright/engine';
import { differenceToK, massToKg, powerToW, temperatureToK } from '@chargewright/engine';
import { formatNumber, formatShort, formatValue } from './format-value';
import { type TargetRangeWords, targetRangeWords } from './target-range-words';
import type { UnitSystem } from './unit-system';

/** Fixed amounts of the trade inside sentences, stated in the units of their source and printed in the reader's. */
export interface Say {
  degF(value: number): string;
  deltaF(value: number): string;
  ozPerTon(value: number): string;
}

export const sayIn = (system: UnitSystem): Say => ({
  degF: (value) => formatShort('temperatureK', temperatureToK(value, 'degF'), system),
  deltaF: (value) => formatShort('differenceK', differenceToK(value, 'deltaF'), system),
  ozPerTon: (value) =>
    system === 'F-psi'
      ? `${value} oz per ton`
      : `${formatNumber((massToKg(value, 'oz') / powerToW(1, 'ton')) * 1e6, 0)} g per kW`,
});

type Sentence<Names> = string | ((figures: Names, say: Say) => string);

/** A sentence for every code of a catalogue of the engine; a code without one, or a figure it does not have, does not compile. */
export type MessageTexts<Names> = {
  readonly [Code in keyof Names]: [Names[Code]] extends [never]
    ? Sentence<Readonly<Record<never, string>>>
    : (figures: Readonly<Record<Names[Code] & string, string>>, say: Say) => string;
};

/** Names of things inside a sentence, and how a language strings them together. */
export interface FigureNames {
  readonly reading: Readonly<Record<ReadingId, { readonly name: string }>>;
  readonly preflight: Readonly<Record<PreflightItem, { readonly name: string }>>;
  readonly setup: Readonly<Record<AssumedField, { readonly name: string }>>;
  readonly makersChart: Readonly<Record<MakersChartKind, { readonly name: string }>>;
  /** "at 64 °F wet bulb from 55 to 95 °F outdoors". */
  targetRange(range: TargetRangeWords): string;
  list(names: readonly string[]): string;
}

export interface Message {
  readonly code: string;
  readonly figures: Readonly<Record<string, Figure>>;
}

/** How a message is printed: `formatValue` for what was measured, `formatStated` for what a person typed. */
export type Print = typeof formatValue;

function figureText(figure: Figure, system: UnitSystem, names: FigureNames, print: Print): string {
  if (figure.kind === 'readings') return names.list(figure.value.map((id) => names.reading[id].name));
  if (figure.kind === 'preflight') return names.list(figure.value.map((id) => names.preflight[id].name));
  if (figure.kind === 'setup') return names.list(figure.value.map((id) => names.setup[id].name));
  if (figure.kind === 'makersCharts') return names.list(figure.value.map((id) => names.makersChart[id].name));
  if (figure.kind === 'targetRanges') {
    return targetRangeWords(figure.value, system)
      .map((range) => names.targetRange(range))
      .join('; ');
  }
  return print(figure.kind, figure.value, system);
}

type AnySentence = string | ((figures: Readonly<Record<string, string>>, say: Say) => string);

export interface MessageContext {
  readonly system: UnitSystem;
  readonly names: FigureNames;
  readonly print?: Print;
  /** Figures that do not come from the engine, such as the name of a field. */
  readonly extra?: Readonly<Record<string, string>>;
}

/** `MessageTexts` promises that the code is there and takes these figures; the lookup by a code of unknown kind cannot repeat the promise. */
export function messageText(texts: object, message: Message, context: MessageContext): string {
  const { system, names, print = formatValue, extra } = context;
  const sentence = (texts as Readonly<Record<string, AnySentence>>)[message.code];
  if (sentence === undefined) throw new RangeError(`no sentence for the code ${message.code}`);
  if (typeof sentence === 'string') return sentence;
  const figures = Object.entries(message.figures).map(([name, figure]): [string, string] => [
    name,
    figureText(figure, system, names, print),
  ]);
  return sentence({ ...Object.fromEntries(figures), ...extra }, sayIn(system));
}
