import { readdirSync, readFileSync } from 'node:fs';
import { beforeAll, describe, expect, it } from 'vitest';
import type { SourcedFigure } from '../methods/sourced-figure';
import { REFRIGERANT_IDS } from '../refrigerants/catalogue';
import { PROCEDURES } from '../check/procedure-catalogue';
import { citation } from './citation';
import { listSources } from './list-sources';
import { SOURCE_GROUPS, SOURCE_STANDINGS } from './source-entry';
import type { SourceEntry } from './source-entry';
import { SOURCE_FORMULAS } from './source-formulas';

const { entries, procedures } = listSources();

const SRC = new URL('..', import.meta.url);
const files = readdirSync(SRC, { recursive: true, encoding: 'utf8' }).filter(
  (file) => /\.ts$/.test(file) && !/\.spec\.ts$|^sources\/|testing\/|index\.ts$/.test(file),
);

/** Every object inside a value that states where it is from. */
function sourced(value: unknown, seen = new Set<object>()): readonly Partial<SourcedFigure>[] {
  if (typeof value !== 'object' || value === null || seen.has(value)) return [];
  seen.add(value);
  const inner = Object.values(value).flatMap((each) => sourced(each, seen));
  return 'source' in value && typeof value.source === 'string' ? [value as Partial<SourcedFigure>, ...inner] : inner;
}

describe('the list of sources', () => {
  const exported: (readonly [file: string, name: string, value: unknown])[] = [];
  beforeAll(async () => {
    for (const file of files) {
      const values = (await import(new URL(file, SRC).href)) as Readonly<Record<string, unknown>>;
      for (const [name, value] of Object.entries(values)) exported.push([file, name, value]);
    }
  });

  const listed = (source: string, standing?: string, printed?: string): boolean =>
    entries.some(
      (entry) =>
        entry.citations.some(({ text }) => text === source) &&
        (standing === undefined || entry.standing === standing) &&
        (printed === undefined || entry.figure?.printed === printed),
    );

  it('has every figure, table and equation that an export of the engine states a source for', () => {
    // worked examples state what their printed answers were read in: their own pages show it
    const judged = exported.filter(([file]) => !file.startsWith('training/'));
    const found = judged.flatMap(([file, name, value]) => sourced(value).map((each) => ({ file, name, each })));
    expect(found.length).toBeGreaterThan(250);
    const missing = found.filter(({ each }) => !listed(each.source ?? '', each.standing, each.printed));
    expect(missing.map(({ file, name, each }) => `${file} ${name}: ${each.printed ?? ''} ${each.source}`)).toEqual([]);
  });

  it('has every formula of the engine by the name it is exported under', () => {
    const inText = files.flatMap((file) => {
      const text = readFileSync(new URL(file, SRC), 'utf8');
      return text.split(/^export /m).flatMap((declaration) => {
        const [, name] = /^(?:const|function) (\w+)/.exec(declaration) ?? [];
        // what a formula is said to be in the head of its declaration, or the call that makes it
        const head = declaration.split(/=>|\{\n/)[0] ?? '';
        const makes = /\bformula(?:<\w+>)?\(\{/.test(declaration) || /\): \w*Formula\b/.test(head);
        return name !== undefined && makes && name !== 'formula' ? [name] : [];
      });
    });
    expect(Object.keys(SOURCE_FORMULAS).sort()).toEqual(inText.sort());
  });

  it('has every figure of every procedure, with who uses it', () => {
    const rule = (id: string, procedure: string): SourceEntry | undefined =>
      entries.find(
        ({ subject, procedures: of }) => 'id' in subject && subject.id === id && of.some((each) => each === procedure),
      );
    expect(rule('superheat.toleranceK', 'cec-ra3.2-2019-rater')?.figure?.printed).toBe('8 °F');
    expect(rule('subcooling.toleranceK', 'cec-ra3.2-2008-rater')?.standing).toBe('memory');
    for (const { id } of PROCEDURES) expect(rule('conditions.leastRunningMinutes', id), id).toBeDefined();
    expect(procedures.map(({ id }) => id)).toEqual(PROCEDURES.map(({ id }) => id));
    // 23 figures, the airflow before the charge, the weigh-in, the table of splits and that of superheat
    expect(procedures[0]!.standings.reduce((sum, { count }) => sum + count, 0)).toBe(27);
  });

  it('has every refrigerant with the publications of its equation of state', () => {
    const curves = entries.filter(({ group }) => group === 'refrigerants');
    expect(curves).toHaveLength(REFRIGERANT_IDS.length);
    for (const { id, citations } of curves) expect(citations.length, id).toBeGreaterThan(0);
  });

  it('names every entry once, in the order of the groups', () => {
    expect(new Set(entries.map(({ id }) => id)).size).toBe(entries.length);
    const groups = entries.map(({ group }) => SOURCE_GROUPS.indexOf(group));
    expect(groups).toEqual([...groups].sort((a, b) => a - b));
    for (const group of SOURCE_GROUPS)
      expect(
        entries.some((entry) => entry.group === group),
        group,
      ).toBe(true);
  });

  it('says of each what it stands on and where it is met', () => {
    for (const { id, standing, citations, places } of entries) {
      expect(SOURCE_STANDINGS, id).toContain(standing);
      expect(places.length, id).toBeGreaterThan(0);
      for (const { text } of citations) expect(text, id).toMatch(/^.{6,}/);
    }
  });

  it('never calls read or defined what its citation says is from memory', () => {
    for (const { id, standing, citations } of entries) {
      const fromMemory = citations.some(({ text }) => /from memory$|from memory of/.test(text));
      if (fromMemory) expect(standing, id).toBe('memory');
      if (citations.some(({ text }) => /^Common practice, no source$/.test(text)))
        expect(standing, id).toBe('practice');
    }
  });
});

describe('citation', () => {
  it.each([
    ['CEC Reference Residential Appendices (2008), RA3.2', '2008'],
    ["Makers' superheat chart, copy A (installation manual 506374-01, 03/2010, p. 20)", '03/2010'],
    ['outdoor-unit installation manual, document 506083-01 (03/2008), Table 5', '03/2008'],
    ['Installation manual 506374-01, 03/2010; checklist for raters, rev. 07', '03/2010, rev. 07'],
    ['Author (2016, submitted). Title. J. 2016, 1-9. doi:10.1021/j.2012.02.012', '2016'],
    ['ANSI/ASHRAE Standard 34, from memory', null],
    ['Ian H. Bell (2025). Modeling Mixtures. doi:10.1021/acs.jced.4c00699', '2025'],
    ['technical support manual 421 04 6300 01, p. 6', null],
    ['Our choice, open to better evidence', null],
  ])('%s is of %s', (text, edition) => {
    expect(citation(text)).toEqual({ text, edition });
  });
});
