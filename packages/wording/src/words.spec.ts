import { PREFLIGHT_ITEMS, PROCEDURES, READING_IDS } from '@chargewright/engine';
import { describe, expect, it } from 'vitest';
import { airflowWords } from './english/airflow';
import { airflowPageWords } from './english/airflow-page';
import { checkPageWords } from './english/check-page';
import { fieldInputWords } from './english/field-inputs';
import { fieldSafetyWords } from './english/field-safety';
import { looseChecksWords } from './english/loose-checks';
import { glanceWords } from './english/glance';
import { makersChartWords } from './english/makers-charts';
import { makersDataWords } from './english/makers-data-page';
import { offlineWords } from './english/offline';
import { targetComparisonWords } from './english/target-comparison';
import { pageMenuWords } from './english/page-menu';
import { moistAirWords } from './english/moist-air-page';
import { propertiesWords } from './english/properties';
import { readingHelp } from './english/reading-help';
import { procedureWords } from './english/procedures';
import { readingWords } from './english/readings';
import { separatingTestWords } from './english/separating-tests';
import { safetyWords } from './english/safety';
import { listWords, setupWords } from './english/setup';
import { sourcesWords } from './english/sources';
import { weighInWords } from './english/weigh-in';
import { weighInPageWords } from './english/weigh-in-page';
import { workedExampleStories } from './english/worked-example-stories';
import { workedExampleWords } from './english/worked-examples';
import { worksheetWords } from './english/worksheets';

/** Every text of a tree of words; those that take figures get 2 and then 8. */
function textsOf(words: unknown, path: string): readonly (readonly [string, string])[] {
  if (typeof words === 'string') return [[path, words]];
  if (typeof words === 'function') {
    const say = words as (...figures: readonly unknown[]) => string;
    // the unit toggle answers only for a unit system
    return [[path, say(path.startsWith('checkPage.units') ? 'F-psi' : 2, 8, 8, 8)]];
  }
  return Object.entries(words as object).flatMap(([key, value]) => textsOf(value, `${path}.${key}`));
}

const roots = Object.entries({
  checkPage: checkPageWords,
  looseChecks: looseChecksWords,
  offline: offlineWords,
  pageMenu: pageMenuWords,
  glance: glanceWords,
  makersData: makersDataWords,
  targetComparison: targetComparisonWords,
  readings: readingWords,
  readingHelp,
  safety: safetyWords,
  separatingTests: separatingTestWords,
  setup: setupWords,
  procedures: procedureWords,
  fieldInputs: fieldInputWords,
  airflow: airflowWords,
  weighIn: weighInWords,
  fieldSafety: fieldSafetyWords,
  worksheets: worksheetWords,
  airflowPage: airflowPageWords,
  weighInPage: weighInPageWords,
  makersCharts: makersChartWords,
  properties: propertiesWords,
  workedExamples: workedExampleWords,
  workedExampleStories: workedExampleStories('F-psi'),
  moistAir: moistAirWords,
  sources: sourcesWords,
});

describe('words of the page', () => {
  it.each(roots)('%s can be printed in the font of the page', (root, words) => {
    for (const [path, text] of textsOf(words, root)) {
      expect(text, path).not.toMatch(/undefined|NaN|\[object|\s\s/);
      expect(text, path).toMatch(/^[\u0020-\u007e\u00a0-\u00ff\u2000-\u206f\u20ac\u2122\u2212]*$/);
      if (!path.endsWith('.hint')) expect(text, path).not.toBe('');
    }
  });

  it('say how, where, and what goes wrong at each reading', () => {
    for (const id of READING_IDS) {
      const { label, name, place } = readingWords[id];
      const { how, mistake } = readingHelp[id];
      for (const text of [how, mistake]) expect(text, id).toMatch(/^[A-Z].+\.$/);
      expect(label).toMatch(/^[A-Z]/);
      expect(place).toMatch(/^[a-z]/);
      expect(name).toMatch(/^[a-z]/);
    }
  });

  it('name each item of the look-over', () => {
    for (const item of PREFLIGHT_ITEMS) expect(setupWords.preflight[item].label).toBeTruthy();
  });

  it('say of every procedure whose tables were not read that they are from memory', () => {
    const shorts = PROCEDURES.map(({ id, superheat }) => {
      const { name, short, note } = procedureWords[id];
      for (const text of [name, note]) expect(text, id).toMatch(/^[A-Z]/);
      expect(short.length, id).toBeLessThanOrEqual(name.length);
      expect(note, id).toMatch(superheat.chart === 'finer-table' ? /tables .+ from memory/ : /from memory/);
      return short;
    });
    expect(new Set(shorts).size).toBe(PROCEDURES.length);
    expect(Object.keys(procedureWords).sort()).toEqual(PROCEDURES.map(({ id }) => id).sort());
  });

  it('count in the singular too', () => {
    expect(checkPageWords.readings.typedAgo(0)).toBe('typed just now');
    expect(checkPageWords.readings.typedAgo(1)).toBe('typed 1 min ago');
    expect(looseChecksWords.readings(1)).toBe('1 reading');
    expect(looseChecksWords.setAside(1)).toContain('One stored entry');
    expect(checkPageWords.result.needsMending(1)).toContain('One entry needs');
  });
});

describe('listWords', () => {
  it('strings names together', () => {
    expect(listWords([])).toBe('');
    expect(listWords(['a'])).toBe('a');
    expect(listWords(['a', 'b'])).toBe('a and b');
    expect(listWords(['a', 'b', 'c'])).toBe('a, b and c');
  });
});
