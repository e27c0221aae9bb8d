import { createHash } from 'node:crypto';
import { readFileSync, readdirSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import type { SaturationSource, SaturationState, SourceRefrigerant } from './saturation-source';

const TABLES = new URL('./reference-tables/', import.meta.url);

/** Header lines without their `#`, and the cells of every row under its column names. */
interface Table {
  readonly header: readonly string[];
  readonly rows: readonly Readonly<Record<string, string>>[];
}

function parseTable(text: string): Table {
  const lines = text.split('\n').filter((line) => line !== '');
  const header = lines.filter((line) => line.startsWith('#')).map((line) => line.slice(1).trim());
  const [names = '', ...body] = lines.filter((line) => !line.startsWith('#'));
  const columns = names.split(',');
  const rows = body.map((line) => {
    const cells = line.split(',');
    if (cells.length !== columns.length)
      throw new Error(`row with ${cells.length} of ${columns.length} cells: ${line}`);
    return Object.fromEntries(columns.map((column, k) => [column, cells[k]!]));
  });
  return { header, rows };
}

function cell(row: Readonly<Record<string, string>>, column: string): string {
  const text = row[column];
  if (text === undefined) throw new Error(`no column ${column}`);
  return text;
}

function number(row: Readonly<Record<string, string>>, column: string): number {
  const value = Number(cell(row, column));
  if (!Number.isFinite(value)) throw new Error(`${column} is not a number: ${cell(row, column)}`);
  return value;
}

/** `R1234ze(E)` is `R-1234ze(E)`. */
function designation(name: string): string {
  return name.replace(/^R/, 'R-');
}

function grade(text: string): 'A' | 'B' | 'C' {
  if (text !== 'A' && text !== 'B' && text !== 'C') throw new Error(`grade ${text}`);
  return text;
}

function state(row: Readonly<Record<string, string>>): SaturationState {
  return {
    temperatureK: number(row, 'T_K'),
    bubblePressurePa: number(row, 'p_bubble_Pa'),
    dewPressurePa: number(row, 'p_dew_Pa'),
  };
}

/** `composition by mass, percent: R32 50, R125 50`; a pure fluid has no such line. */
function composition(header: readonly string[], id: string): SourceRefrigerant['composition'] {
  const prefix = 'composition by mass, percent: ';
  const line = header.find((entry) => entry.startsWith(prefix));
  if (line === undefined) return [[id, 100]];
  return line
    .slice(prefix.length)
    .split(', ')
    .map((part) => {
      const [name = '', percent = ''] = part.split(' ');
      return [designation(name), Number(percent)] as const;
    });
}

/** `pair R125/R601a: ESTIMATED, NOT FITTED (…)`. */
function estimatedPairs(header: readonly string[]): SourceRefrigerant['estimatedPairs'] {
  return header.flatMap((line) => {
    const match = /^pair (\S+)\/(\S+): ESTIMATED/.exec(line);
    return match === null ? [] : [[designation(match[1]!), designation(match[2]!)] as const];
  });
}

/** `citation Lemmon-JPCRD-2005: Eric W. Lemmon; …`. */
function citations(header: readonly string[]): SourceRefrigerant['citations'] {
  return header.flatMap((line) => {
    const match = /^citation (\S+): (.+)$/.exec(line);
    return match === null ? [] : [[match[1]!, match[2]!] as const];
  });
}

/** The committed tables, with the rows near the critical point joined on. */
export function referenceTableSource(): SaturationSource {
  const names = readdirSync(fileURLToPath(TABLES)).sort();
  const texts = new Map(names.map((name) => [name, readFileSync(new URL(encodeURIComponent(name), TABLES), 'utf8')]));
  const table = (name: string): Table => {
    const text = texts.get(name);
    if (text === undefined) throw new Error(`no table ${name}`);
    return parseTable(text);
  };
  const hash = createHash('sha256');
  for (const [name, text] of texts) hash.update(`${name}\n${text}`);

  const nearCritical = table('near-critical-all.csv').rows;
  const critical = new Map(table('critical-points.csv').rows.map((row) => [cell(row, 'refrigerant'), row]));
  const refrigerants = table('index.csv').rows.map((row): SourceRefrigerant => {
    const file = cell(row, 'file');
    const name = cell(row, 'refrigerant');
    const pure = cell(row, 'model') === 'pure';
    const { header, rows } = table(file);
    const key = /^saturation-(.+)\.csv$/.exec(file)![1]!;
    const upper = nearCritical.filter((entry) => entry['refrigerant'] === key);
    const id = designation(name);
    return {
      id,
      kind: pure ? 'pure' : 'blend',
      grade: grade(cell(row, 'grade')),
      criticalTemperatureK: number(row, 'Tc_model_K'),
      ...(pure ? { criticalPressurePa: number(critical.get(name)!, 'p_Pa') } : {}),
      composition: composition(header, id),
      estimatedPairs: estimatedPairs(header),
      citations: citations(header),
      states: [...rows, ...upper].map(state).sort((a, b) => a.temperatureK - b.temperatureK),
    };
  });
  return {
    inputHash: hash.digest('hex'),
    refrigerants: refrigerants.sort(
      (a, b) => designationNumber(a.id) - designationNumber(b.id) || (a.id < b.id ? -1 : 1),
    ),
  };
}

function designationNumber(id: string): number {
  return Number(/\d+/.exec(id)![0]);
}
