/** What the weigh-in page asks for, and the request it makes of what was typed. */
import {
  INSTALLED_LINE_SIZES,
  LINE_SET_KINDS,
  ouncesOfPoundsAndOunces,
  PROCEDURE_IDS,
  SHORTER_LINE_RULES,
  WEIGH_IN_METHODS,
  WEIGH_IN_RULES,
} from '@chargewright/engine';
import type { Amount, LineSetRequest, MassUnit, ProcedureId, WeighInRequest } from '@chargewright/engine';
import type { TypedField } from '@chargewright/contract/typed-fields';
import { fieldInputWords, readingWords, setupWords, weighInPageWords, type InputWords } from '@chargewright/wording';
import { readingKey, typedKey, valueIn } from '../check-a-charge/field-key';
import type { CheckDraft, TypedValue } from '../loose-checks/check-draft';
import {
  amountsOf,
  entryOf,
  valueOf,
  type FilledSheet,
  type SheetDimension,
  type SheetField,
} from '../worksheets/sheet-fields';

type InputKey = keyof typeof fieldInputWords;
type More = Partial<Pick<SheetField, 'path' | 'optional' | 'signed'>>;

const field = (key: InputKey, dimension: SheetDimension, more: More = {}): SheetField => ({
  key,
  words: fieldInputWords[key],
  dimension,
  path: key,
  ...more,
});

export interface WeighInChoices {
  readonly refrigerant: string | undefined;
  readonly kind: WeighInRequest['kind'] | undefined;
  readonly method: WeighInRequest['method'] | undefined;
  readonly procedure: ProcedureId;
  readonly liquidLineSize: LineSetRequest['liquidLineSize'];
  readonly includedLiquidLineSize: LineSetRequest['liquidLineSize'];
  readonly shorterLine: LineSetRequest['shorterLine'];
}

const oneOf = <Value extends string>(values: readonly Value[], chosen: string | undefined): Value | undefined =>
  values.find((value) => value === chosen);

/** A mini-split and a multi-split meter outdoors; a packaged unit has no line set. */
function kindOfCheck({ kind }: CheckDraft['setup']): WeighInRequest['kind'] | undefined {
  if (kind === 'mini-split' || kind === 'multi-split') return 'ductless';
  return kind === 'split' ? 'ducted' : undefined;
}

/** What was chosen here, else what the check says. */
export function weighInChoices({ sheet: { choices } }: FilledSheet, { setup }: CheckDraft): WeighInChoices {
  return {
    refrigerant: choices['refrigerant'] ?? setup.refrigerant,
    kind: oneOf(LINE_SET_KINDS, choices['kind']) ?? kindOfCheck(setup),
    method: oneOf(WEIGH_IN_METHODS, choices['method']),
    procedure: oneOf(PROCEDURE_IDS, choices['procedure']) ?? setup.procedure ?? 'general-rules',
    liquidLineSize: oneOf(INSTALLED_LINE_SIZES, choices['liquidLineSize']),
    includedLiquidLineSize: oneOf(INSTALLED_LINE_SIZES, choices['includedLiquidLineSize']),
    shorterLine: oneOf(SHORTER_LINE_RULES, choices['shorterLine']),
  };
}

/** What the open check knows: shown here until something else is typed. */
export function knownOfCheck(draft: CheckDraft): Readonly<Record<string, TypedValue>> {
  const from: readonly (readonly [key: string, value: TypedValue | undefined])[] = [
    ...(
      [
        ['factoryCharge', 'factoryCharge'],
        ['installedLength', 'lineLength'],
      ] as const satisfies readonly (readonly [string, TypedField])[]
    ).map(([key, typed]) => [key, valueIn(draft, typedKey(typed))] as const),
    ['outdoorDryBulb', valueIn(draft, readingKey('outdoorDryBulb'))],
  ];
  return Object.fromEntries(
    from.flatMap(([key, value]) =>
      value && value.text.trim() !== '' ? [[key, { text: value.text, unit: value.unit }]] : [],
    ),
  );
}

const OUNCES: InputWords = { label: weighInPageWords.ounces, name: weighInPageWords.ounces, hint: '' };

/** Pounds have their ounces in a field of their own, as nameplates print them. */
function withOunces(mass: SheetField, filled: FilledSheet): readonly SheetField[] {
  if (valueOf(filled, mass.key)?.unit !== 'lb') return [mass];
  return [
    mass,
    { key: ouncesOf(mass.key), words: OUNCES, dimension: 'ounces', path: `${mass.path}.ounces`, optional: true },
  ];
}

const ouncesOf = (key: string): string => `${key}Ounces`;

const FACTORY: SheetField = {
  key: 'factoryCharge',
  words: setupWords.numbers.factoryCharge,
  dimension: 'mass',
  path: 'factoryCharge',
};
const INSTALLED = field('installedLength', 'length', { path: 'line.installedLength' });
const INCLUDED = field('includedLength', 'length', { path: 'line.includedLength' });
const RATE = field('makersRate', 'rate', { path: 'line.makersRate', optional: true });
const INCLUDED_RATE = field('makersIncludedRate', 'rate', { path: 'line.makersIncludedRate', optional: true });
const LABEL = field('labelMaximum', 'mass', { optional: true });
const CORRECTION_FIELDS = (['coil', 'drier', 'other'] as const).map((name) =>
  field(name, 'mass', { path: `corrections.${name}`, signed: true, optional: true }),
);
const VACUUM_FIELDS: readonly SheetField[] = [
  field('deepest', 'vacuum', { path: 'vacuum.deepest' }),
  field('rise', 'vacuum', { path: 'vacuum.rise' }),
  field('isolatedMinutes', 'minutes', { path: 'vacuum.isolatedMinutes' }),
];
const SCALE_FIELDS: readonly SheetField[] = [
  field('scaleStep', 'mass', { path: 'scale.resolution', optional: true }),
  field('scalePlusMinus', 'mass', { path: 'scale.plusMinus', optional: true }),
];
const OUTDOOR: SheetField = {
  key: 'outdoorDryBulb',
  words: { ...readingWords.outdoorDryBulb, hint: readingWords.outdoorDryBulb.place },
  dimension: 'temperature',
  path: 'outdoorDryBulb',
};

const WEIGHED_HINTS = fieldInputWords.actualCharge;

export interface WeighInFields {
  readonly nameplate: readonly SheetField[];
  readonly line: readonly SheetField[];
  readonly includedRate: readonly SheetField[];
  readonly corrections: readonly SheetField[];
  readonly vacuum: readonly SheetField[];
  readonly weighed: readonly SheetField[];
  readonly scale: readonly SheetField[];
  readonly outdoor: readonly SheetField[];
}

const hasOtherSize = ({ liquidLineSize, includedLiquidLineSize }: WeighInChoices): boolean =>
  includedLiquidLineSize !== undefined && includedLiquidLineSize !== liquidLineSize;

/** The fields by their part of the page. The outdoor air is asked for where the rules look at it. */
export function weighInFields(filled: FilledSheet, choices: WeighInChoices): WeighInFields {
  const { observesBelow, promisesBelow } = WEIGH_IN_RULES[choices.procedure];
  const actual: SheetField = {
    key: 'actualCharge',
    words: WEIGHED_HINTS,
    dimension: 'mass',
    path: 'actualCharge',
    signed: choices.method === 'adjustment',
  };
  return {
    nameplate: [...withOunces(FACTORY, filled), INCLUDED, ...withOunces(LABEL, filled)],
    line: [INSTALLED, RATE],
    includedRate: hasOtherSize(choices) ? [INCLUDED_RATE] : [],
    corrections: CORRECTION_FIELDS,
    vacuum: VACUUM_FIELDS,
    weighed: withOunces(actual, filled),
    scale: SCALE_FIELDS,
    outdoor: observesBelow !== null || promisesBelow !== null ? [OUTDOOR] : [],
  };
}

/** Pounds and ounces as one amount. */
function massOf(filled: FilledSheet, key: string): Amount<MassUnit> | undefined {
  const main = entryOf(filled, { key, dimension: 'mass' });
  if (!main) return undefined;
  const ounces = main.unit === 'lb' ? entryOf(filled, { key: ouncesOf(key), dimension: 'ounces' }) : undefined;
  if (!ounces) return { value: main.value, unit: main.unit as MassUnit };
  return { value: ouncesOfPoundsAndOunces(main.value, ounces.value), unit: 'oz' };
}

const pick = (
  amounts: ReturnType<typeof amountsOf>,
  group: string,
): Readonly<Record<string, ReturnType<typeof amountsOf>[string]>> =>
  Object.fromEntries(
    Object.entries(amounts).flatMap(([path, amount]) =>
      path.startsWith(`${group}.`) ? [[path.slice(group.length + 1), amount]] : [],
    ),
  );

/** The request of the sheet, or null until refrigerant, kind and method are chosen. */
export function weighInRequest(filled: FilledSheet, choices: WeighInChoices): WeighInRequest | null {
  const { refrigerant, kind, method, procedure, liquidLineSize, includedLiquidLineSize, shorterLine } = choices;
  if (refrigerant === undefined || kind === undefined || method === undefined) return null;
  const fields = weighInFields(filled, choices);
  const amounts = amountsOf(filled, [
    ...fields.line,
    ...fields.includedRate,
    INCLUDED,
    ...fields.corrections,
    ...VACUUM_FIELDS,
    ...fields.scale,
    ...fields.outdoor,
  ]);
  const { isolatedMinutes, ...vacuum } = pick(amounts, 'vacuum');
  const factoryCharge = massOf(filled, 'factoryCharge');
  const actualCharge = massOf(filled, 'actualCharge');
  const labelMaximum = massOf(filled, 'labelMaximum');
  return {
    refrigerant,
    kind,
    method,
    procedure,
    line: {
      ...pick(amounts, 'line'),
      ...(liquidLineSize && { liquidLineSize }),
      ...(includedLiquidLineSize && hasOtherSize(choices) && { includedLiquidLineSize }),
      ...(shorterLine && { shorterLine }),
    },
    corrections: pick(amounts, 'corrections'),
    scale: pick(amounts, 'scale'),
    vacuum: { ...vacuum, ...(isolatedMinutes && { isolatedMinutes: isolatedMinutes.value }) },
    ...(amounts['outdoorDryBulb'] && { outdoorDryBulb: amounts['outdoorDryBulb'] }),
    ...(factoryCharge && { factoryCharge }),
    ...(actualCharge && { actualCharge }),
    ...(labelMaximum && { labelMaximum }),
  };
}
