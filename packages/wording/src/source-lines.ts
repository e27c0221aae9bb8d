/** The list of sources as a person reads it: names, figures in the unit system chosen, editions. */
import type { Citation, SourceEntry, SourceFigure, SourceStanding } from '@chargewright/engine/sources';
import { diagnosisTexts } from './english/diagnosis';
import { fieldInputName } from './english/field-inputs';
import { makersChartWords } from './english/makers-charts';
import { propertiesWords } from './english/properties';
import { listWords } from './english/setup';
import { sourcesWords } from './english/sources';
import { formatStated } from './format-value';
import type { Language } from './language';
import type { UnitSystem } from './unit-system';

const english: Pick<Language, 'sources' | 'diagnosis' | 'makersCharts' | 'properties'> = {
  sources: sourcesWords,
  diagnosis: diagnosisTexts,
  makersCharts: makersChartWords,
  properties: propertiesWords,
};

/** What an entry is about. */
export function sourceName({ subject }: SourceEntry, language = english): string {
  const { names } = language.sources;
  const gradeName = (grade: string): string => (grade === 'pure' ? names.pure : names.grade(grade));
  switch (subject.type) {
    case 'procedure-figure':
      return names.procedureFigures[subject.id];
    case 'order':
      return names.orders[subject.id];
    case 'figure':
      return names.figures[subject.id];
    case 'readings':
      return names.plusMinus(listWords(subject.ids.map(fieldInputName)));
    case 'high-side':
      return names.highSide(listWords(subject.refrigerants));
    case 'model-limit':
      return names.modelLimit(gradeName(subject.grade));
    case 'line-rate':
      return names.lineRate(subject.size, names.lineSets[subject.lineSet]);
    case 'makers-method':
      return names.makersMethod(language.makersCharts.kinds[subject.kind].name);
    case 'formula':
      return names.formulas[subject.id];
    case 'equation':
      return names.equations[subject.id];
    case 'target':
      return names.targets[subject.id];
    case 'table':
      return names.tables[subject.id];
    case 'printed-table':
      return names.printedTable(subject.refrigerant, language.properties.printed.how[subject.how]);
    case 'signs':
      return names.signs(language.diagnosis.causes[subject.cause]);
    case 'refrigerant':
      return names.refrigerant(subject.refrigerant, gradeName(subject.grade));
  }
}

/** What stands there beside a figure: a formula as on paper, or the signs of a fault; empty where there is neither. */
export function sourceText({ subject }: SourceEntry, language = english): string {
  const { names } = language.sources;
  if (subject.type === 'formula') return subject.text;
  if (subject.type !== 'signs') return '';
  return subject.signs
    .map(({ column, changes }) =>
      names.sign(names.columns[column], changes.map((change) => names.changes[change]).join(names.or)),
    )
    .join(', ');
}

/** "±2.8 °C" of a figure printed as "±5 °F"; a figure that no unit system converts, as printed. */
export function sourceValue({ kind, value, printed }: SourceFigure, system: UnitSystem): string {
  if (kind === null) return printed;
  return `${printed.startsWith('±') ? '±' : ''}${formatStated(kind, value, system)}`;
}

/** The edition, that a publication states none, or nothing where there is no publication. */
export function editionText(
  { edition }: Citation,
  standing: SourceStanding,
  language: Pick<Language, 'sources'> = english,
): string {
  if (edition !== null) return language.sources.edition(edition);
  return standing === 'read' || standing === 'memory' ? language.sources.noEdition : '';
}
