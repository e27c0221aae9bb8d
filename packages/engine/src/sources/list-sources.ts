/** Everything the engine judges and computes by, walked from the data that does it: no figure is written down here. */
import { ASSUMED_LIMITS } from '../check/assumed-uncertainty';
import type { UsedReadingId } from '../check/assumed-uncertainty';
import { PROCEDURES } from '../check/procedure-catalogue';
import { MOST_HIGH_SIDE_GAUGE_PA } from '../check/stops';
import type { QuantityKind } from '../derivation/quantity';
import { COLUMNS, FAULT_PATTERN_SOURCES, FAULT_PATTERNS } from '../diagnosis/fault-patterns';
import type { FaultPattern } from '../diagnosis/fault-patterns';
import { ASSUMED_FIELD_LIMITS } from '../methods/airflow/field-readings';
import type { FieldReadingId } from '../methods/airflow/field-readings';
import { MAKERS_CHART_FACTS, MAKERS_CHART_KINDS } from '../methods/makers-chart/kinds';
import type { SourcedFigure } from '../methods/sourced-figure';
import { compareSplitTargets, compareTargets } from '../methods/target-comparison';
import type { ComparedTarget } from '../methods/target-comparison';
import { R410A_LINE_RATES } from '../methods/weigh-in/data/line-rates';
import type { LineSetKind, LiquidLineSize } from '../methods/weigh-in/data/line-rates';
import { SATURATION_LIMITS } from '../psychrometrics/saturation-pressure';
import { REFRIGERANT_IDS, refrigerantFacts } from '../refrigerants/catalogue';
import type { RefrigerantId } from '../refrigerants/catalogue';
import { PRINTED_TABLES, PRINTED_TABLES_STANDING } from '../refrigerants/data/printed-tables';
import { SAFETY_CLASS_SOURCE, SAFETY_CLASS_STANDING } from '../refrigerants/data/safety-classes';
import { MODEL_LIMIT_BASIS, MODEL_LIMIT_F } from '../refrigerants/model-limit';
import { refrigerantModel } from '../refrigerants/refrigerant-model';
import { STANDARD_ATMOSPHERE } from '../training/worked-examples/sources';
import { differenceToK } from '../units';
import { citation } from './citation';
import { NAMED_FIGURES } from './named-figures';
import type { NamedFigureId } from './named-figures';
import { procedureEntries, procedureSummaries } from './procedure-figures';
import type { ProcedureSummary } from './procedure-figures';
import { SOURCE_GROUPS } from './source-entry';
import type { EquationId, OtherTableId, SourceEntry, SourceFigure, SourcePlace } from './source-entry';
import { SOURCE_FORMULAS } from './source-formulas';
import type { SourceFormulaId } from './source-formulas';

export interface SourceList {
  readonly procedures: readonly ProcedureSummary[];
  readonly entries: readonly SourceEntry[];
}

/** The whole list, group by group. */
export function listSources(): SourceList {
  const entries = [
    ...procedureEntries(),
    ...tables(),
    ...formulas(),
    ...equations(),
    ...namedFigures(),
    ...highSideLimits(),
    ...makersMethods(),
    ...lineRates(),
    ...assumedLimits(),
    ...modelLimits(),
    ...faultPatterns(),
    ...refrigerants(),
  ];
  return {
    procedures: procedureSummaries(entries),
    entries: SOURCE_GROUPS.flatMap((group) => entries.filter((entry) => entry.group === group)),
  };
}

const asFigure = ({ value, printed }: SourcedFigure, kind: QuantityKind | null): SourceFigure => ({
  kind,
  value,
  printed,
});

/** An entry of one citation that belongs to no procedure. */
const entry = (
  { standing, source }: { readonly standing: SourceEntry['standing']; readonly source: string },
  rest: Pick<SourceEntry, 'id' | 'group' | 'subject' | 'places'> & Partial<SourceEntry>,
): SourceEntry => ({ figure: null, procedures: [], standing, citations: [citation(source)], ...rest });

const entriesOf = <Key extends string, Value>(record: Readonly<Partial<Record<Key, Value>>>) =>
  Object.entries(record) as [Key, Value][];

function tables(): readonly SourceEntry[] {
  // the position is of no matter: every table answers with its source, a refusal too
  const targets = [
    ...compareTargets({ wetBulbK: 290, outdoorK: 305 }),
    ...compareSplitTargets({ dryBulbK: 298, wetBulbK: 290 }),
  ];
  return [
    ...targets.map((target) =>
      entry(target, {
        id: `target:${target.id}`,
        group: 'tables',
        subject: { type: 'target', id: target.id },
        procedures: judgedBy(target),
        places: ['check'],
      }),
    ),
    ...PRINTED_TABLES.map(({ id, refrigerant, how, source }) =>
      entry(
        { standing: PRINTED_TABLES_STANDING, source },
        {
          id: `printed-table:${id}`,
          group: 'tables',
          subject: { type: 'printed-table', refrigerant, how },
          places: ['refrigerant'],
        },
      ),
    ),
    table('safety-classes', { standing: SAFETY_CLASS_STANDING, source: SAFETY_CLASS_SOURCE }, ['check', 'refrigerant']),
    table('liquid-densities', { standing: 'computed', source: SOURCE_FORMULAS.lineRateByDensity.formula.source }, [
      'weigh-in',
    ]),
  ];
}

const table = (id: OtherTableId, basis: Parameters<typeof entry>[0], places: readonly SourcePlace[]): SourceEntry =>
  entry(basis, { id: `table:${id}`, group: 'tables', subject: { type: 'table', id }, places });

/** Procedures that take their target from this table. Each takes that of the split from the one table of splits. */
const judgedBy = ({ id }: ComparedTarget): SourceEntry['procedures'] =>
  PROCEDURES.filter(({ superheat }) => superheat.chart === id || id === 'split-table').map((procedure) => procedure.id);

const formulas = (): readonly SourceEntry[] =>
  entriesOf<SourceFormulaId, (typeof SOURCE_FORMULAS)[SourceFormulaId]>(SOURCE_FORMULAS).map(
    ([id, { formula, standing, places }]) =>
      entry(
        { standing, source: formula.source },
        { id: `formula:${id}`, group: 'formulas', subject: { type: 'formula', id, text: formula.text }, places },
      ),
  );

const equations = (): readonly SourceEntry[] => [
  equation('saturation-of-water', { standing: 'memory', source: SATURATION_LIMITS.source }, ['check', 'moist-air']),
  equation('standard-atmosphere', { standing: 'memory', source: STANDARD_ATMOSPHERE }, [
    'check',
    'airflow',
    'moist-air',
  ]),
];

const equation = (id: EquationId, basis: Parameters<typeof entry>[0], places: readonly SourcePlace[]): SourceEntry =>
  entry(basis, { id: `equation:${id}`, group: 'formulas', subject: { type: 'equation', id }, places });

const namedFigures = (): readonly SourceEntry[] =>
  entriesOf<NamedFigureId, (typeof NAMED_FIGURES)[NamedFigureId]>(NAMED_FIGURES).map(
    ([id, { figure, kind, group, places }]) =>
      entry(figure, {
        id: `figure:${id}`,
        group,
        subject: { type: 'figure', id },
        figure: asFigure(figure, kind),
        places,
      }),
  );

function highSideLimits(): readonly SourceEntry[] {
  const limits = entriesOf<RefrigerantId, SourcedFigure>(MOST_HIGH_SIDE_GAUGE_PA);
  return [...new Set(limits.map(([, figure]) => figure))].map((figure) =>
    entry(figure, {
      id: `high-side:${figure.printed}`,
      group: 'limits',
      subject: { type: 'high-side', refrigerants: limits.filter(([, each]) => each === figure).map(([id]) => id) },
      figure: asFigure(figure, 'gaugePressurePa'),
      places: ['check'],
    }),
  );
}

const makersMethods = (): readonly SourceEntry[] =>
  MAKERS_CHART_KINDS.flatMap((kind) => {
    const { leastOutdoorK } = MAKERS_CHART_FACTS[kind];
    if (leastOutdoorK === null) return [];
    return [
      entry(leastOutdoorK, {
        id: `makers-method:${kind}`,
        group: 'limits',
        subject: { type: 'makers-method', kind },
        figure: asFigure(leastOutdoorK, 'temperatureK'),
        places: ['check', 'makers-data'],
      }),
    ];
  });

const lineRates = (): readonly SourceEntry[] =>
  entriesOf<LineSetKind, Readonly<Partial<Record<LiquidLineSize, SourcedFigure>>>>(R410A_LINE_RATES).flatMap(
    ([lineSet, rates]) =>
      entriesOf<LiquidLineSize, SourcedFigure>(rates).map(([size, rate]) =>
        entry(rate, {
          id: `line-rate:${lineSet}:${size}`,
          group: 'weigh-in',
          subject: { type: 'line-rate', lineSet, size },
          figure: asFigure(rate, 'chargeRateKgPerM'),
          places: ['weigh-in'],
        }),
      ),
  );

/** What the ± of a reading is, where it is not a part of the reading. */
const KIND_OF_LIMIT: Readonly<Record<keyof typeof ASSUMED_LIMITS | FieldReadingId, QuantityKind>> = {
  returnDryBulb: 'differenceK',
  returnWetBulb: 'differenceK',
  returnWetBulbBefore: 'differenceK',
  supplyDryBulb: 'differenceK',
  supplyWetBulb: 'differenceK',
  outdoorDryBulb: 'differenceK',
  suctionLineTemperature: 'differenceK',
  liquidLineTemperature: 'differenceK',
  dischargeLineTemperature: 'differenceK',
  drierInletTemperature: 'differenceK',
  drierOutletTemperature: 'differenceK',
  standingOutdoorCoilTemperature: 'differenceK',
  standingIndoorCoilTemperature: 'differenceK',
  suctionPressure: 'pressureDifferencePa',
  liquidPressure: 'pressureDifferencePa',
  dischargePressure: 'pressureDifferencePa',
  standingPressure: 'pressureDifferencePa',
  returnRelativeHumidity: 'fraction',
  supplyRelativeHumidity: 'fraction',
  airflow: 'fraction',
  compressorCurrent: 'fraction',
  lineVoltage: 'fraction',
  heaterCurrent: 'fraction',
  blowerHeat: 'fraction',
  dialVolume: 'fraction',
  gasRevolution: 'durationS',
  gasHeatingValue: 'fraction',
  furnaceEfficiency: 'fraction',
  returnStaticPressure: 'staticPressurePa',
  supplyStaticPressure: 'staticPressurePa',
};

/** Readings with the same ± for the same reason are one entry. */
function assumedLimits(): readonly SourceEntry[] {
  const found = new Map<string, { readonly first: SourceEntry; readonly ids: (UsedReadingId | FieldReadingId)[] }>();
  const add = (id: keyof typeof KIND_OF_LIMIT, limit: SourcedFigure, place: SourcePlace): void => {
    const first = entry(limit, {
      id: `readings:${id}`,
      group: 'uncertainties',
      subject: { type: 'readings', ids: [] },
      figure: asFigure(limit, KIND_OF_LIMIT[id]),
      places: [place],
    });
    const key = JSON.stringify({ ...first, id: '' });
    const known = found.get(key);
    if (known === undefined) found.set(key, { first, ids: [id] });
    else known.ids.push(id);
  };
  for (const [id, limit] of entriesOf<keyof typeof ASSUMED_LIMITS, SourcedFigure>(ASSUMED_LIMITS))
    add(id, limit, 'check');
  for (const [id, limit] of entriesOf<FieldReadingId, SourcedFigure>(ASSUMED_FIELD_LIMITS)) add(id, limit, 'airflow');
  return [...found.values()].map(({ first, ids }) => ({ ...first, subject: { type: 'readings', ids } }));
}

const modelLimits = (): readonly SourceEntry[] =>
  entriesOf<keyof typeof MODEL_LIMIT_F, number>(MODEL_LIMIT_F).map(([grade, limitF]) =>
    entry(MODEL_LIMIT_BASIS, {
      id: `model-limit:${grade}`,
      group: 'uncertainties',
      subject: { type: 'model-limit', grade },
      figure: { kind: 'differenceK', value: differenceToK(limitF, 'deltaF'), printed: `±${limitF} °F` },
      places: ['check', 'refrigerant'],
    }),
  );

/** One entry for each standing that a fault's cells have. */
const faultPatterns = (): readonly SourceEntry[] =>
  FAULT_PATTERNS.flatMap((pattern) =>
    entriesOf<keyof typeof FAULT_PATTERN_SOURCES, string>(FAULT_PATTERN_SOURCES).flatMap(([standing, source]) => {
      const signs = signsOf(pattern, standing);
      if (signs.length === 0) return [];
      const id = `signs:${pattern.cause}:${standing}`;
      const subject = { type: 'signs', cause: pattern.cause, signs } as const;
      return [entry({ standing, source }, { id, group: 'causes', subject, places: ['check'] })];
    }),
  );

const signsOf = ({ cells }: FaultPattern, standing: keyof typeof FAULT_PATTERN_SOURCES) =>
  COLUMNS.flatMap((column) => {
    const cell = cells[column];
    return cell?.standing === standing ? [{ column, changes: cell.changes }] : [];
  });

const refrigerants = (): readonly SourceEntry[] =>
  REFRIGERANT_IDS.map((refrigerant) => {
    const { kind, grade } = refrigerantFacts(refrigerant);
    return {
      id: `refrigerant:${refrigerant}`,
      group: 'refrigerants',
      subject: { type: 'refrigerant', refrigerant, grade: kind === 'pure' ? kind : grade },
      figure: null,
      standing: 'computed',
      citations: refrigerantModel(refrigerant).citations.map(citation),
      procedures: [],
      places: ['check', 'refrigerant'],
    };
  });
