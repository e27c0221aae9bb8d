import { PROCEDURE_IDS } from '@chargewright/engine';
import type { SourceEntry, SourcePlace, SourceStanding } from '@chargewright/engine/sources';
import {
  editionText,
  procedureWords,
  sourceName,
  sourcesWords,
  sourceText,
  sourceValue,
  type UnitSystem,
} from '@chargewright/wording';

const PATHS: Readonly<Record<SourcePlace, string>> = {
  check: '/',
  'makers-data': '/makers-data',
  airflow: '/airflow',
  'weigh-in': '/weigh-in',
  refrigerant: '/properties/refrigerant',
  'moist-air': '/properties/air',
  examples: '/examples',
};

/** An entry of the list as it is shown. */
export interface SourceRow {
  readonly id: string;
  readonly group: SourceEntry['group'];
  readonly standing: SourceStanding;
  readonly name: string;
  readonly text: string;
  readonly isFormula: boolean;
  readonly value: string;
  /** As the source prints it, where that reads otherwise. */
  readonly printed: string;
  readonly citations: readonly { readonly text: string; readonly edition: string }[];
  readonly procedures: string;
  readonly places: readonly { readonly path: string; readonly name: string }[];
}

export function sourceRow(entry: SourceEntry, system: UnitSystem): SourceRow {
  const { id, group, standing, figure, citations, procedures, places, subject } = entry;
  const value = figure === null ? '' : sourceValue(figure, system);
  return {
    id,
    group,
    standing,
    name: sourceName(entry),
    text: sourceText(entry),
    isFormula: subject.type === 'formula',
    value,
    printed: figure === null || figure.printed === value ? '' : figure.printed,
    citations: citations.map((citation) => ({ text: citation.text, edition: editionText(citation, standing) })),
    procedures:
      procedures.length === PROCEDURE_IDS.length
        ? sourcesWords.everyProcedure
        : procedures.map((procedure) => procedureWords[procedure].short).join(' · '),
    places: places.map((place) => ({ path: PATHS[place], name: sourcesWords.places[place] })),
  };
}

const plain = (text: string): string => text.toLowerCase().replace(/[‘’]/g, "'");

/** Rows that stand on what is asked for and have every word that is searched for, in the name, the source, the edition or the rules. */
export function findRows(
  rows: readonly SourceRow[],
  { search, standing }: { readonly search: string; readonly standing: SourceStanding | 'all' },
): readonly SourceRow[] {
  const words = plain(search)
    .split(/\s+/)
    .filter((word) => word !== '');
  return rows.filter((row) => {
    if (standing !== 'all' && row.standing !== standing) return false;
    const cited = row.citations.flatMap(({ text, edition }) => [text, edition]);
    const text = plain([row.name, row.text, row.value, row.printed, row.procedures, ...cited].join(' '));
    return words.every((word) => text.includes(word));
  });
}
