import type { Caution, NextStep } from '@chargewright/engine';
import { describe, expect, it } from 'vitest';
import { airflowWords } from './english/airflow';
import { airflowPageWords } from './english/airflow-page';
import { cautionTexts } from './english/cautions';
import { checkPageWords } from './english/check-page';
import { diagnosisTexts } from './english/diagnosis';
import { faultWords } from './english/faults';
import { fieldFaultNaming, fieldFaultTexts } from './english/field-faults';
import { fieldInputWords } from './english/field-inputs';
import { fieldSafetyWords } from './english/field-safety';
import { findingPhrases } from './english/findings';
import { looseChecksWords } from './english/loose-checks';
import { airTexts } from './english/moist-air';
import { names } from './english/names';
import { nextStepWords } from './english/next-steps';
import { glanceWords } from './english/glance';
import { makersChartWords } from './english/makers-charts';
import { makersDataWords } from './english/makers-data-page';
import { offlineWords } from './english/offline';
import { ownerWords } from './english/owner';
import { targetComparisonWords } from './english/target-comparison';
import { pageMenuWords } from './english/page-menu';
import { moistAirWords } from './english/moist-air-page';
import { propertiesWords } from './english/properties';
import { readingHelp } from './english/reading-help';
import { procedureWords } from './english/procedures';
import { readingWords } from './english/readings';
import { reasonTexts } from './english/reasons';
import { separatingTestWords } from './english/separating-tests';
import { safetyWords } from './english/safety';
import { setupWords } from './english/setup';
import { sourcesWords } from './english/sources';
import { stopTexts } from './english/stops';
import { structureFaultWords } from './english/structure-faults';
import { weighInWords } from './english/weigh-in';
import { weighInPageWords } from './english/weigh-in-page';
import { workedExampleStories } from './english/worked-example-stories';
import { workedExampleWords } from './english/worked-examples';
import { worksheetWords } from './english/worksheets';
import type { Language } from './language';
import { cautionText, nextStepText } from './sentences';

/** That this compiles is the first test: English has every section of a language. */
const english: Language = {
  names,
  reasons: reasonTexts,
  stops: stopTexts,
  cautions: cautionTexts,
  nextSteps: nextStepWords,
  findings: findingPhrases,
  faults: faultWords,
  structureFaults: structureFaultWords,
  air: airTexts,
  fieldFaults: { texts: fieldFaultTexts, naming: fieldFaultNaming },
  fieldInputs: fieldInputWords,
  airflow: airflowWords,
  weighIn: weighInWords,
  diagnosis: diagnosisTexts,
  fieldSafety: fieldSafetyWords,
  worksheets: worksheetWords,
  airflowPage: airflowPageWords,
  separatingTests: separatingTestWords,
  weighInPage: weighInPageWords,
  readings: readingWords,
  readingHelp,
  setup: setupWords,
  procedures: procedureWords,
  makersCharts: makersChartWords,
  properties: propertiesWords,
  moistAir: moistAirWords,
  safety: safetyWords,
  checkPage: checkPageWords,
  looseChecks: looseChecksWords,
  offline: offlineWords,
  pageMenu: pageMenuWords,
  glance: glanceWords,
  makersData: makersDataWords,
  owner: ownerWords,
  targetComparison: targetComparisonWords,
  sources: sourcesWords,
  workedExamples: workedExampleWords,
  workedExampleStories,
};

describe('a language', () => {
  const spanish: Language = {
    ...english,
    cautions: { ...cautionTexts, 'long-lines': (f) => `La línea sube ${f.lift}.` },
    nextSteps: {
      ...nextStepWords,
      notYet: { ...nextStepWords.notYet, 'add-nothing': 'Todavía no agregue refrigerante.' },
    },
  };

  it('is passed as the last argument', () => {
    const caution: Caution = { code: 'long-lines', figures: { lift: { kind: 'lengthM', value: 9 } } };
    expect(cautionText(caution, 'C-bar', spanish)).toBe('La línea sube 9 m.');
    const step: NextStep = { code: 'read-liquid-pair', figures: {}, notYet: ['add-nothing'] };
    expect(nextStepText(step, 'C-bar', spanish)).toMatch(/^Todavía no agregue refrigerante\. /);
  });

  it('is English when left out', () => {
    const caution: Caution = { code: 'pull-down', figures: {} };
    expect(cautionText(caution, 'F-psi')).toBe(cautionText(caution, 'F-psi', english));
  });
});
