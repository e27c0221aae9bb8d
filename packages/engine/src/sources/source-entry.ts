/** What the list of sources says of one figure, table or formula. */
import type { UsedReadingId } from '../check/assumed-uncertainty';
import type { ProcedureId } from '../check/procedure-ids';
import type { QuantityKind } from '../derivation/quantity';
import type { Cause } from '../diagnosis/diagnosis-codes';
import type { Change, Column } from '../diagnosis/fault-patterns';
import type { FieldReadingId } from '../methods/airflow/field-readings';
import type { MakersChartKind } from '../methods/makers-chart/kinds';
import type { FigureStanding } from '../methods/sourced-figure';
import type { TargetComparisonId } from '../methods/target-comparison';
import type { LineSetKind, LiquidLineSize } from '../methods/weigh-in/data/line-rates';
import type { RefrigerantId } from '../refrigerants/catalogue';
import type { PrintedTable } from '../refrigerants/data/printed-tables';
import type { ModelGrade } from '../refrigerants/saturation-model';
import type { NamedFigureId } from './named-figures';
import type { ProcedureFigureId } from './procedure-figures';
import type { SourceFormulaId } from './source-formulas';

/**
 * Besides those of a figure: a `definition` needs no source, since the words say it already; what was `entered` is as good as the paper it was taken from.
 */
export type SourceStanding = FigureStanding | 'definition' | 'entered';

export const SOURCE_STANDINGS = [
  'read',
  'memory',
  'practice',
  'choice',
  'computed',
  'definition',
  'entered',
] as const satisfies readonly SourceStanding[];

export const SOURCE_GROUPS = [
  'procedures',
  'tables',
  'formulas',
  'limits',
  'weigh-in',
  'uncertainties',
  'causes',
  'refrigerants',
] as const;
export type SourceGroup = (typeof SOURCE_GROUPS)[number];

/** Where a person meets the entry. */
export const SOURCE_PLACES = [
  'check',
  'makers-data',
  'airflow',
  'weigh-in',
  'refrigerant',
  'moist-air',
  'examples',
] as const;
export type SourcePlace = (typeof SOURCE_PLACES)[number];

export interface Sign {
  readonly column: Column;
  readonly changes: readonly Change[];
}

/** Tables that are not a comparison's and not printed for one refrigerant. */
export type OtherTableId = 'safety-classes' | 'liquid-densities';
/** Equations that formulas rest on without being steps of a derivation. */
export type EquationId = 'saturation-of-water' | 'standard-atmosphere';
/** What procedures order beside their figures. */
export type OrderId = 'airflow-evidence' | 'weigh-in' | 'weigh-in-watched-below' | 'weigh-in-promised-below';

/** What an entry is about; `packages/wording` makes its name. */
export type SourceSubject =
  | { readonly type: 'procedure-figure'; readonly id: ProcedureFigureId }
  | { readonly type: 'order'; readonly id: OrderId }
  | { readonly type: 'figure'; readonly id: NamedFigureId }
  | { readonly type: 'readings'; readonly ids: readonly (UsedReadingId | FieldReadingId)[] }
  | { readonly type: 'high-side'; readonly refrigerants: readonly RefrigerantId[] }
  | { readonly type: 'model-limit'; readonly grade: ModelGrade | 'pure' }
  | { readonly type: 'line-rate'; readonly lineSet: LineSetKind; readonly size: LiquidLineSize }
  | { readonly type: 'makers-method'; readonly kind: MakersChartKind }
  | { readonly type: 'formula'; readonly id: SourceFormulaId; readonly text: string }
  | { readonly type: 'target'; readonly id: TargetComparisonId }
  | { readonly type: 'table'; readonly id: OtherTableId }
  | { readonly type: 'equation'; readonly id: EquationId }
  | { readonly type: 'printed-table'; readonly refrigerant: RefrigerantId; readonly how: PrintedTable['how'] }
  | { readonly type: 'signs'; readonly cause: Cause; readonly signs: readonly Sign[] }
  | { readonly type: 'refrigerant'; readonly refrigerant: RefrigerantId; readonly grade: ModelGrade | 'pure' };

export interface SourceFigure {
  /** `null`: no quantity a unit system converts; as printed. */
  readonly kind: QuantityKind | null;
  /** SI, as the kind says. */
  readonly value: number;
  readonly printed: string;
}

export interface Citation {
  readonly text: string;
  /** Year, month and year or revision, as the citation states it; `null`: it states none, or there is no publication. */
  readonly edition: string | null;
}

export interface SourceEntry {
  /** Unique in the list. */
  readonly id: string;
  readonly group: SourceGroup;
  readonly subject: SourceSubject;
  readonly figure: SourceFigure | null;
  readonly standing: SourceStanding;
  readonly citations: readonly Citation[];
  /** Rules it is a part of; empty: not a matter of the rules chosen. */
  readonly procedures: readonly ProcedureId[];
  readonly places: readonly SourcePlace[];
}
