import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import * as engine from './index';
import * as airToRefrigerant from './methods/air-to-refrigerant';
import * as airSide from './methods/air-side';
import { FIELD_READING_IDS } from './methods/airflow/field-readings';
import * as cyclePoints from './methods/cycle-points';
import { SUPERHEAT_CHART_A } from './methods/data/superheat-chart-a';
import * as separatingTests from './methods/separating-tests';
import * as targets from './methods/targets';
import * as sources from './sources/index';
import * as training from './training/index';

const text = readFileSync(new URL('../NOMENCLATURE.md', import.meta.url), 'utf8');

interface Row {
  readonly section: string;
  readonly names: readonly string[];
  readonly cells: readonly string[];
}

const ticked = (cell: string): readonly string[] => [...cell.matchAll(/`([^`]+)`/g)].map(([, name]) => name!);

function rows(): readonly Row[] {
  const found: Row[] = [];
  let section = '';
  for (const line of text.split('\n')) {
    if (line.startsWith('## ')) section = line.slice(3);
    if (!line.startsWith('| `')) continue;
    const cells = line
      .split('|')
      .slice(1, -1)
      .map((cell) => cell.trim());
    found.push({ section, names: ticked(cells[0]!), cells });
  }
  return found;
}

const ROWS = rows();
const named = (inSection: (section: string) => boolean): readonly string[] =>
  ROWS.filter(({ section }) => inSection(section)).flatMap(({ names }) => names);

describe('NOMENCLATURE.md', () => {
  it('lists every function and constant that the engine exports, and none that it does not', () => {
    const exported = Object.keys(engine).sort();
    expect(exported.length).toBeGreaterThan(50);
    expect([...named((section) => section.startsWith('Exports'))].sort()).toEqual(exported);
  });

  it('lists what the door of teaching exports', () => {
    const listed = named((section) => section.startsWith('Teaching'));
    expect([...listed].sort()).toEqual(Object.keys(training).sort());
  });

  it('lists what the door of the sources exports', () => {
    const listed = named((section) => section.startsWith('Sources'));
    expect([...listed].sort()).toEqual(Object.keys(sources).sort());
  });

  it('lists every reading and every derived quantity', () => {
    const quantities = named((section) => section === 'Quantities');
    for (const id of [...engine.READING_IDS, ...engine.DERIVED_IDS, ...FIELD_READING_IDS]) {
      expect(quantities).toContain(id);
    }
    expect(new Set(quantities).size).toBe(quantities.length);
  });

  it('lists every symbol that a formula shows', () => {
    const formulas = [
      ...Object.values(airSide),
      ...Object.values(targets),
      ...Object.values(cyclePoints),
      ...Object.values(separatingTests),
      ...Object.values(airToRefrigerant),
      separatingTests.standingSaturation('R-22'),
      cyclePoints.absolutePressure('suctionPressure'),
      cyclePoints.evaporatingDewTemperature('R-22'),
      targets.targetSuperheat(SUPERHEAT_CHART_A),
      targets.deviation('superheat', 'differenceK'),
    ].filter((value) => typeof value === 'object' && 'symbols' in value);
    const shown = new Set(formulas.flatMap(({ symbols }) => Object.values<string>(symbols)));
    expect(shown.size).toBeGreaterThan(10);
    const listed = new Set(ROWS.flatMap(({ cells }) => ticked(cells[3]!)));
    for (const symbol of shown) expect(listed, symbol).toContain(symbol);
  });

  it('says for each name what it means, and gives a quantity its unit', () => {
    for (const { section, names, cells } of ROWS) {
      expect(cells, names.join()).toHaveLength(4);
      expect(cells[1], names.join()).not.toBe('');
      if (/Quantities|quantities|constants/.test(section)) expect(cells[2], names.join()).not.toBe('');
    }
  });
});
