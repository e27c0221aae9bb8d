import { listSources } from '@chargewright/engine/sources';
import type { SourceEntry } from '@chargewright/engine/sources';
import { describe, expect, it } from 'vitest';
import { editionText, sourceName, sourceText, sourceValue } from './source-lines';

const { entries } = listSources();
const named = (id: string): SourceEntry => entries.find((entry) => entry.id.startsWith(id))!;

describe('the list of sources in words', () => {
  it('names every entry, no two of a group alike where nothing else tells them apart', () => {
    const seen = new Set<string>();
    for (const entry of entries) {
      const name = sourceName(entry);
      expect(name, entry.id).toMatch(/^[A-Z±]/);
      expect(`${name} ${sourceText(entry)}`, entry.id).not.toMatch(/undefined|NaN|\[object/);
      const whole = [
        entry.group,
        name,
        entry.figure?.printed,
        entry.standing,
        ...entry.citations.map(({ text }) => text),
      ].join('|');
      expect(seen, whole).not.toContain(whole);
      seen.add(whole);
    }
  });

  it('shows a figure in the units chosen, with its ±', () => {
    const reading = named('readings:returnDryBulb').figure!;
    expect(sourceValue(reading, 'F-psi')).toBe('±1 °F');
    expect(sourceValue(reading, 'C-kPa')).toBe('±0.56 °C');
    const outdoor = named('procedure-figure:conditions.leastOutdoorK').figure!;
    expect(sourceValue(outdoor, 'F-psi')).toBe('55 °F');
    expect(sourceValue(outdoor, 'C-bar')).toBe('12.78 °C');
    expect(sourceValue(named('figure:deepestVacuum').figure!, 'C-kPa')).toBe('500 microns');
  });

  it('never rounds a figure to nothing', () => {
    for (const { id, figure } of entries) {
      // the freezing point of water is 0 °C
      if (figure === null || figure.kind === 'temperatureK') continue;
      for (const system of ['F-psi', 'C-kPa', 'C-bar'] as const) {
        expect(Number.parseFloat(sourceValue(figure, system).replace(/[±−]/g, '')), `${id} ${system}`).not.toBe(0);
      }
    }
  });

  it('prints formulas and signs', () => {
    expect(sourceText(named('formula:superheat'))).toBe('T_suction − T_dew');
    expect(sourceText(named('signs:restriction:read'))).toBe('subcooling up');
    expect(sourceText(named('signs:low-charge'))).toContain('superheat with a valve little changed or up');
  });

  it('says the edition, or that a publication states none', () => {
    const edition = (id: string) => editionText(named(id).citations[0]!, named(id).standing);
    expect(edition('target:split-table')).toBe('edition 2008');
    expect(edition('target:finer-table')).toBe('edition not stated');
    expect(edition('figure:coilsAlike')).toBe('');
  });
});
