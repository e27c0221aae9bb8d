/** The sum of a weigh-in, line by line, as a person writes it on paper. Every number is the engine's. */
import { CORRECTIONS, isKnown } from '@chargewright/engine';
import type { Correction, Known, Quantity, WeighInResult } from '@chargewright/engine';
import { weighInWords } from './english/weigh-in';
import { formatMass, formatMassBoth, formatMassPlain } from './format-mass';
import { formatTrimmed, unitLabel } from './format-value';
import type { Language } from './language';
import { presentValue } from './present-value';
import type { UnitSystem } from './unit-system';

export interface SumLine {
  readonly about: string;
  readonly text: string;
}

/** A length as it was measured, a rate with at least the two decimals makers print. */
function print({ kind, value }: Known, system: UnitSystem): string {
  const shown = presentValue(kind, value, system);
  const unit = unitLabel(shown.unit);
  if (kind === 'massKg') return formatMassPlain(value, system);
  if (kind !== 'chargeRateKgPerM') return `${formatTrimmed(shown.value, 1)} ${unit}`;
  const text = formatTrimmed(shown.value, 3);
  const decimals = text.split('.')[1]?.length ?? 0;
  return `${system === 'F-psi' && decimals < 2 ? shown.value.toFixed(2) : text} ${unit}`;
}

type Words = Language['weighIn']['sum'];

/** What could be computed; a line whose numbers are missing is left out. */
export function weighInSum(
  result: WeighInResult,
  system: UnitSystem,
  language: Pick<Language, 'weighIn'> = { weighIn: weighInWords },
): readonly SumLine[] {
  const words = language.weighIn.sum;
  return [
    ...rateLines(result, system, words),
    ...lineSetLines(result, system, words),
    ...correctionLines(result, system, words),
    ...totalLines(result, system, words),
    ...differenceLines(result, system, words),
  ];
}

/** "0.60 oz/ft (R-410A) × 56.4 ÷ 61.7 lb/ft³ = 0.549 oz/ft" */
function rateLines({ rate, includedRate }: WeighInResult, system: UnitSystem, words: Words): readonly SumLine[] {
  const rates = new Set(
    [rate, includedRate].filter((each) => each?.origin === 'liquid-density').map((each) => each?.rate),
  );
  return [...rates].flatMap((each) => {
    if (!isKnown(each) || each.step.type !== 'derived') return [];
    const { r410aKgPerM, density, r410aDensity } = each.step.from;
    if (!r410aKgPerM || !density || !r410aDensity) return [];
    const own = presentValue(density.kind, density.value, system);
    const other = presentValue(r410aDensity.kind, r410aDensity.value, system);
    const densities = `${formatTrimmed(own.value, 1)} ÷ ${formatTrimmed(other.value, 1)} ${unitLabel(own.unit)}`;
    return [
      { about: words.rate, text: `${print(r410aKgPerM, system)} (R-410A) × ${densities} = ${print(each, system)}` },
    ];
  });
}

function lineSetLines(result: WeighInResult, system: UnitSystem, words: Words): readonly SumLine[] {
  const { working, rate, includedRate, lineAdjustment } = result;
  const installed = working?.installed;
  const included = working?.included;
  if (!working || !isKnown(installed) || !isKnown(included) || !isKnown(rate?.rate) || !isKnown(includedRate?.rate)) {
    return [];
  }
  const show = (quantity: Known): string => print(quantity, system);
  if (working.sizes === 'two') {
    const { installedCharge, includedCharge } = working;
    if (!isKnown(installedCharge) || !isKnown(includedCharge)) return [];
    return [
      { about: words.installed, text: `${show(installed)} × ${show(rate.rate)} = ${show(installedCharge)}` },
      { about: words.included, text: `${show(included)} × ${show(includedRate.rate)} = ${show(includedCharge)}` },
      ...(isKnown(lineAdjustment)
        ? [
            {
              about: words.line,
              text: `${show(installedCharge)} − ${show(includedCharge)} = ${ending(result, system, words)}`,
            },
          ]
        : []),
    ];
  }
  const { extra } = working;
  if (!isKnown(extra)) return [];
  const difference = `${show(installed)} − ${show(included)} = ${show(extra)}`;
  if (!isKnown(lineAdjustment)) return [{ about: words.line, text: difference }];
  return [{ about: words.line, text: `${difference} × ${show(rate.rate)} = ${ending(result, system, words)}` }];
}

/** A maker who keeps the factory charge gives zero where the sum would be negative: the line says so. */
function ending({ lineAdjustment, working }: WeighInResult, system: UnitSystem, words: Words): string {
  if (!isKnown(lineAdjustment)) return '';
  const text = print(lineAdjustment, system);
  return isKept(working, lineAdjustment) ? `${text} (${words.keeps})` : text;
}

function isKept(working: WeighInResult['working'], { value }: Known): boolean {
  if (value !== 0 || working === null) return false;
  if (working.sizes === 'one') return isKnown(working.extra) && working.extra.value < 0;
  const { installedCharge, includedCharge } = working;
  return isKnown(installedCharge) && isKnown(includedCharge) && installedCharge.value < includedCharge.value;
}

const signed = (kg: number, system: UnitSystem): string =>
  `${kg < 0 ? '−' : '+'} ${formatMassPlain(Math.abs(kg), system)}`;

/** "18 oz − 4 oz (coil) + 6 oz (drier) = 20 oz" */
function correctionLines(
  { requiredAdjustment, lineAdjustment }: WeighInResult,
  system: UnitSystem,
  words: Words,
): readonly SumLine[] {
  if (!isKnown(requiredAdjustment) || !isKnown(lineAdjustment) || requiredAdjustment === lineAdjustment) return [];
  const from: Readonly<Record<string, Known>> =
    requiredAdjustment.step.type === 'derived' ? requiredAdjustment.step.from : {};
  const terms = CORRECTIONS.flatMap((name: Correction) => {
    const term = from[name];
    return term ? [`${signed(term.value, system)} (${words.terms[name]})`] : [];
  });
  const text = [print(lineAdjustment, system), ...terms].join(' ');
  return [{ about: words.adjustment, text: `${text} = ${formatMassPlain(requiredAdjustment.value, system)}` }];
}

const inputOf = (quantity: Quantity, name: string): Known | undefined =>
  isKnown(quantity) && quantity.step.type === 'derived' ? quantity.step.from[name] : undefined;

/** "6 lb 0 oz (factory) + 18 oz = 7 lb 2 oz (114 oz)" */
function totalLines(
  { requiredTotal, requiredAdjustment }: WeighInResult,
  system: UnitSystem,
  words: Words,
): readonly SumLine[] {
  const factory = inputOf(requiredTotal, 'factoryKg');
  if (!isKnown(requiredTotal) || !isKnown(requiredAdjustment) || !factory) return [];
  const text = `${formatMass(factory.value, system)} (${words.factory}) ${signed(requiredAdjustment.value, system)}`;
  return [{ about: words.total, text: `${text} = ${formatMassBoth(requiredTotal.value, system)}` }];
}

function differenceLines(
  { difference, actual, required, actualTotal }: WeighInResult,
  system: UnitSystem,
  words: Words,
): readonly SumLine[] {
  if (!isKnown(difference) || !isKnown(actual) || !isKnown(required)) return [];
  const text = `${formatMass(actual.value, system)} − ${formatMass(required.value, system)} = ${formatMass(difference.value, system)}`;
  const factory = inputOf(actualTotal, 'factoryKg');
  const now =
    isKnown(actualTotal) && factory
      ? [
          {
            about: words.actual,
            text: `${formatMass(factory.value, system)} (${words.factory}) ${signed(actual.value, system)} = ${formatMassBoth(actualTotal.value, system)}`,
          },
        ]
      : [];
  return [{ about: words.difference, text }, ...now];
}
