/**
 * Everything a language says. `english/` is the first and the reference; another one implements this type in a folder of its own and is passed as the
 * last argument. A code of the engine without a sentence does not compile.
 */
import type {
  CautionFigures,
  CriterionId,
  FaultFigures,
  NextStepFigures,
  NotYetCode,
  OverallFinding,
  ReasonFigures,
  StopCode,
  StopFigures,
} from '@chargewright/engine';
import type { CriterionParts } from './criterion-parts';
import type { AirFigures } from './english/moist-air';
import type { airflowWords } from './english/airflow';
import type { airflowPageWords } from './english/airflow-page';
import type { checkPageWords } from './english/check-page';
import type { fieldFaultTexts } from './english/field-faults';
import type { fieldInputWords } from './english/field-inputs';
import type { DiagnosisTexts } from './english/diagnosis';
import type { fieldSafetyWords } from './english/field-safety';
import type { separatingTestWords } from './english/separating-tests';
import type { looseChecksWords } from './english/loose-checks';
import type { makersChartWords } from './english/makers-charts';
import type { offlineWords } from './english/offline';
import type { pageMenuWords } from './english/page-menu';
import type { glanceWords } from './english/glance';
import type { makersDataWords } from './english/makers-data-page';
import type { ownerWords } from './english/owner';
import type { targetComparisonWords } from './english/target-comparison';
import type { moistAirWords } from './english/moist-air-page';
import type { propertiesWords } from './english/properties';
import type { readingHelp } from './english/reading-help';
import type { procedureWords } from './english/procedures';
import type { readingWords } from './english/readings';
import type { safetyWords } from './english/safety';
import type { setupWords } from './english/setup';
import type { sourcesWords } from './english/sources';
import type { weighInWords } from './english/weigh-in';
import type { weighInPageWords } from './english/weigh-in-page';
import type { workedExampleStories } from './english/worked-example-stories';
import type { workedExampleWords } from './english/worked-examples';
import type { worksheetWords } from './english/worksheets';
import type { FigureNames, MessageTexts, Say } from './message-texts';
import type { StructureFaultKind } from './structure-fault';

export interface FieldNaming {
  readonly fields: Readonly<Record<string, { readonly name: string } | undefined>>;
  readonly parts: Readonly<Record<string, string>>;
  earlier(name: string): string;
  partOf(name: string, part: string): string;
  /** One of several of the same name, counted from 1. */
  numbered(name: string, number: number): string;
  /** A place within a part: one number along an axis, row and column of a cell, counted from 1. */
  placed(part: string, places: readonly number[]): string;
}

export interface NextStepWords {
  readonly notYet: Readonly<Record<NotYetCode, string>>;
  readonly steps: {
    readonly [Code in keyof NextStepFigures]: readonly [
      step: MessageTexts<NextStepFigures>[Code],
      why: string | ((say: Say) => string),
    ];
  };
}

export interface FindingPhrases {
  readonly criteria: Readonly<Record<CriterionId, string>>;
  readonly words: Readonly<Record<OverallFinding, string>>;
  readonly wordsOf: Readonly<Partial<Record<CriterionId, Partial<Record<OverallFinding, string>>>>>;
  readonly overall: Readonly<Record<OverallFinding, string>>;
  readonly stops: Readonly<Record<StopCode, string>>;
  headline(parts: CriterionParts): string;
  detail(parts: CriterionParts, reason: string, say: Say): string;
  ruler(parts: CriterionParts): string;
  stepName(id: string): string;
}

/** `field` is the name of the faulty field, `counterpart` that of the field it contradicts. */
export type FaultTexts = {
  readonly [Code in keyof FaultFigures]: (
    figures: Readonly<Record<(FaultFigures[Code] & string) | 'field' | 'counterpart', string>>,
  ) => string;
};

export interface FaultWords {
  readonly faults: FaultTexts;
  readonly naming: FieldNaming;
}

/** Only the API says these. */
export interface StructureFaultWords {
  readonly structure: Readonly<
    Record<StructureFaultKind, (f: { readonly field: string; readonly allowed: string }) => string>
  >;
  alternatives(allowed: readonly string[]): string;
}

export interface Language {
  readonly names: FigureNames;
  readonly reasons: MessageTexts<ReasonFigures>;
  readonly stops: MessageTexts<StopFigures>;
  readonly cautions: MessageTexts<CautionFigures>;
  readonly nextSteps: NextStepWords;
  readonly findings: FindingPhrases;
  readonly faults: FaultWords;
  readonly structureFaults: StructureFaultWords;
  readonly air: MessageTexts<AirFigures>;
  readonly fieldFaults: { readonly texts: typeof fieldFaultTexts; readonly naming: FieldNaming };
  readonly fieldInputs: typeof fieldInputWords;
  readonly airflow: typeof airflowWords;
  readonly weighIn: typeof weighInWords;
  readonly diagnosis: DiagnosisTexts;
  readonly fieldSafety: typeof fieldSafetyWords;
  readonly worksheets: typeof worksheetWords;
  readonly airflowPage: typeof airflowPageWords;
  readonly separatingTests: typeof separatingTestWords;
  readonly weighInPage: typeof weighInPageWords;
  readonly readings: typeof readingWords;
  readonly readingHelp: typeof readingHelp;
  readonly setup: typeof setupWords;
  readonly procedures: typeof procedureWords;
  readonly makersCharts: typeof makersChartWords;
  readonly properties: typeof propertiesWords;
  readonly moistAir: typeof moistAirWords;
  readonly safety: typeof safetyWords;
  readonly checkPage: typeof checkPageWords;
  readonly looseChecks: typeof looseChecksWords;
  readonly offline: typeof offlineWords;
  readonly pageMenu: typeof pageMenuWords;
  readonly glance: typeof glanceWords;
  readonly makersData: typeof makersDataWords;
  readonly owner: typeof ownerWords;
  readonly targetComparison: typeof targetComparisonWords;
  readonly sources: typeof sourcesWords;
  readonly workedExamples: typeof workedExampleWords;
  readonly workedExampleStories: typeof workedExampleStories;
}
