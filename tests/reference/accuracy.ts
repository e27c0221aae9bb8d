/**
 * `npm run accuracy [-- --write]`: the accuracy table, from the rows that the accuracy tests gate on, grouped to be read. Each row belongs to one
 * group, or this program throws. `--write` puts the table into the README between its markers.
 */
import { readFileSync, writeFileSync } from 'node:fs';
import { parseArgs } from 'node:util';
import { format, resolveConfig } from 'prettier';
import { measurePsychrometrics } from './psychrometrics/measure';
import type { AccuracyRow } from './refrigerants/measure';
import { measureRefrigerants } from './refrigerants/measure';

interface Group {
  readonly quantity: string;
  readonly against: string;
  readonly holds: (row: AccuracyRow) => boolean;
}

/** Rows by the start of their quantity and of their source. */
const rows =
  (quantity: string | RegExp, source: string | RegExp) =>
  (row: AccuracyRow): boolean =>
    matches(row.quantity, quantity) && matches(row.source, source);

const matches = (text: string, pattern: string | RegExp): boolean =>
  typeof pattern === 'string' ? text.startsWith(pattern) : pattern.test(text);

const chart = (refrigerant: string, against: string): Group => ({
  quantity: `saturation temperature, ${refrigerant}`,
  against,
  holds: (row) => row.quantity === `saturation temperature, ${refrigerant}`,
});

const CURVES = 'saturation temperature, bubble and dew';
const HANDBOOK = 'ASHRAE Fundamentals 2017 ch. 1';
const SAME_EQUATIONS = 'computed from the same equations';
const LIBRARY = 'open psychrometric library';
const REAL_GAS = 'real-gas model RP-1485';

const GROUPS: readonly Group[] = [
  {
    quantity: 'saturation temperature of 67 refrigerants, bubble and dew, −50 °C to 0.99 Tc',
    against: 'published equations of state',
    holds: rows(CURVES, 'equations of state'),
  },
  {
    quantity: 'normal boiling temperature, bubble and dew',
    against: 'the same equations by an independent solver',
    holds: rows('normal boiling', ''),
  },
  chart('R-410A', 'four printed charts'),
  chart('R-22', 'three printed charts'),
  chart('R-134a', 'two printed tables'),
  chart('R-407C', 'one printed chart, bubble'),
  chart('R-32', 'one printed table'),
  {
    quantity: 'saturation temperature of eight refrigerants',
    against: 'a computed table, kept to 0.1 psi',
    holds: rows('saturation temperature', 'trade table E1'),
  },
  {
    quantity: 'saturation pressure of water, −20 to 150 °C',
    against: `${HANDBOOK}, Table 3`,
    holds: rows('saturation pressure, −20', HANDBOOK),
  },
  {
    quantity: 'saturation pressure of ice, −60 °C',
    against: `${HANDBOOK}, Table 3, three digits`,
    holds: rows('saturation pressure, −60', HANDBOOK),
  },
  {
    quantity: 'saturation pressure of water, 5 to 150 °C',
    against: 'IAPWS-95',
    holds: rows('saturation pressure', 'IAPWS'),
  },
  {
    quantity: 'humidity ratio at saturation, −50 to 85 °C',
    against: `${HANDBOOK}, Table 2`,
    holds: rows('humidity ratio', HANDBOOK),
  },
  {
    quantity: 'enthalpy of saturated air, enthalpy and volume of dry air',
    against: `${HANDBOOK}, Table 2`,
    holds: rows(/^(enthalpy|dry air)/, HANDBOOK),
  },
  {
    quantity: 'dry bulb of saturated air, −50 to 85 °C',
    against: `${HANDBOOK}, Table 2, read backwards`,
    holds: rows('dry bulb', HANDBOOK),
  },
  {
    quantity: 'standard atmosphere, −1000 to 16,000 ft',
    against: `${HANDBOOK}, Table 1 and eq. 3`,
    holds: rows('standard atmosphere', HANDBOOK),
  },
  {
    quantity: 'worked example, from every pair of its readings',
    against: `${HANDBOOK}, Example 1`,
    holds: rows('worked example', HANDBOOK),
  },
  { quantity: 'wet bulb', against: REAL_GAS, holds: rows('wet bulb', REAL_GAS) },
  { quantity: 'dew point', against: REAL_GAS, holds: rows('dew point', REAL_GAS) },
  {
    quantity: 'humidity ratio, specific volume',
    against: REAL_GAS,
    holds: rows(/^(humidity ratio|specific volume)/, REAL_GAS),
  },
  { quantity: 'relative humidity from four pairs', against: REAL_GAS, holds: rows('relative humidity', REAL_GAS) },
  { quantity: 'dry bulb from eight pairs', against: REAL_GAS, holds: rows('dry bulb', REAL_GAS) },
  {
    quantity: 'six properties of room air',
    against: 'the same equations by another program, half the last digit allowed',
    holds: rows('', SAME_EQUATIONS),
  },
  { quantity: 'wet bulb', against: `${LIBRARY}, which bisects to 0.001 K`, holds: rows('wet bulb', LIBRARY) },
  { quantity: 'dew point', against: LIBRARY, holds: rows('dew point', LIBRARY) },
  {
    quantity: 'humidity ratio, enthalpy, specific volume, dry bulb from five pairs',
    against: `${LIBRARY}, rounding and the last step of a solver allowed`,
    holds: rows(/^(humidity ratio|enthalpy|specific volume|dry bulb)/, LIBRARY),
  },
];

type Line = Pick<AccuracyRow, 'n' | 'mean' | 'max' | 'unit' | 'limit'>;

/** Rows of one unit keep it, temperatures come in K where they are mixed; other mixtures are counted in parts of what each may err. */
function merged(members: readonly AccuracyRow[]): Line {
  const units = new Set(members.map(({ unit }) => unit));
  if (units.size === 1) return summed(members);
  if ([...units].every((unit) => unit === 'K' || unit === '°F')) {
    return summed(members.map((row) => (row.unit === '°F' ? scaled(row, 5 / 9, 'K') : row)));
  }
  return summed(members.map((row) => scaled(row, 1 / row.limit, 'of the allowed')));
}

const scaled = ({ n, mean, max, limit }: AccuracyRow, factor: number, unit: string): Line => ({
  n,
  mean: factor * mean,
  max: factor * max,
  unit,
  limit: factor * limit,
});

/** The largest difference, and the limit that holds for it. */
function summed(lines: readonly Line[]): Line {
  const n = lines.reduce((sum, line) => sum + line.n, 0);
  const mean = lines.reduce((sum, line) => sum + line.n * line.mean, 0) / n;
  const worst = lines.reduce((largest, line) => (line.max > largest.max ? line : largest));
  return { ...worst, n, mean };
}

function accuracyTable(): string {
  const measured = [...measureRefrigerants(), ...measurePsychrometrics()];
  for (const row of measured) {
    const homes = GROUPS.filter(({ holds }) => holds(row)).length;
    if (homes !== 1) throw new Error(`${row.quantity}, ${row.source}: in ${homes} groups`);
  }
  const lines = GROUPS.map(({ quantity, against, holds }) => {
    const { n, mean, max, unit, limit } = merged(measured.filter(holds));
    const figures = [mean, max, limit].map((value) => String(Number(value.toPrecision(3))));
    return `| ${[quantity, against, n, ...figures, unit].join(' | ')} |`;
  });
  return [
    '| quantity | against | points | mean difference | largest | allowed | unit |',
    '|---|---|--:|--:|--:|--:|---|',
    ...lines,
  ].join('\n');
}

const README = new URL('../../README.md', import.meta.url);
const [START, END] = ['<!-- accuracy:start -->', '<!-- accuracy:end -->'];

const { values } = parseArgs({ options: { write: { type: 'boolean', default: false } } });
const table = await format(accuracyTable(), { ...(await resolveConfig(README.pathname)), parser: 'markdown' });
console.log(table);
if (values.write) {
  const text = readFileSync(README, 'utf8');
  const [start, end] = [text.indexOf(START), text.indexOf(END)];
  if (start === -1 || end < start) throw new Error(`README.md lacks ${START} and ${END}`);
  writeFileSync(README, `${text.slice(0, start + START.length)}\n\n${table}\n${text.slice(end)}`);
}
