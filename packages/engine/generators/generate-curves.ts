/**
 * Writes the generated files of `src/refrigerants/generated/` from the tables in `reference-tables/`: `npm run generate:curves`.
 * The same tables give the same bytes; a spec in tests/reference/refrigerants/ compares.
 */
import { writeFileSync } from 'node:fs';
import { pathToFileURL } from 'node:url';
import { referenceTableSource } from './reference-table-source';
import { renderCurves, renderModels } from './render-refrigerants';

export const GENERATED = new URL('../src/refrigerants/generated/', import.meta.url);

/** Text of each generated file by its name. */
export function generateCurves(): ReadonlyMap<string, string> {
  const source = referenceTableSource();
  return new Map([
    ['saturation-curves.ts', renderCurves(source)],
    ['refrigerant-models.ts', renderModels(source)],
  ]);
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) {
  for (const [name, text] of generateCurves()) writeFileSync(new URL(name, GENERATED), text);
}
