import type { SourcesAnswer } from '@chargewright/contract/sources';
import { engineVersion } from '@chargewright/engine';
import { listSources } from '@chargewright/engine/sources';
import type { SourceEntry, SourceFigure } from '@chargewright/engine/sources';
import { presentValue, procedureWords, sourceName, sourceText } from '@chargewright/wording';

/** The whole list, in SI units. */
export function sourcesList(): SourcesAnswer {
  const { procedures, entries } = listSources();
  return {
    engineVersion: engineVersion(),
    procedures: procedures.map(({ id, version, standings }) => ({
      id,
      version,
      name: procedureWords[id].name,
      standings: [...standings],
    })),
    entries: entries.map(answerEntry),
  };
}

function answerEntry(entry: SourceEntry): SourcesAnswer['entries'][number] {
  const { id, group, figure, standing, citations, procedures, places } = entry;
  return {
    id,
    group,
    name: sourceName(entry),
    text: sourceText(entry) || null,
    figure: figure && amountOf(figure),
    printed: figure && figure.printed,
    standing,
    citations: [...citations],
    usedBy: { procedures: [...procedures], pages: [...places] },
  };
}

const amountOf = ({ kind, value }: SourceFigure): SourcesAnswer['entries'][number]['figure'] =>
  kind && presentValue(kind, value, 'C-kPa');
