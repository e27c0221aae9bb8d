/**
 * `npm run bench [-- --date 2026-12-01]`: measures, prints and writes RESULTS.md. Ratios are taken within one run; the plain times are those of the
 * machine named in the file, under whatever else it was doing.
 */
import { writeFileSync } from 'node:fs';
import { cpus, loadavg, totalmem } from 'node:os';
import { parseArgs } from 'node:util';
import { format, resolveConfig } from 'prettier';
import { compiledEngineBenches } from './compiled';
import type { BenchRow } from './engine-benches';
import { engineSize } from './engine-size';
import { navigation } from './navigation';

const RESULTS = new URL('./RESULTS.md', import.meta.url);

const { values } = parseArgs({ options: { date: { type: 'string' } } });
const date = values.date ?? new Date().toISOString().slice(0, 10);

const load = loadavg()[0]!.toFixed(1);
const rows: readonly BenchRow[] = [...(await compiledEngineBenches())(), await engineSize(), await navigation()];

const verdict = (met: boolean | null): string => (met === null ? '' : met ? 'yes' : '**no**');
const processors = cpus();
const text = `# Results of \`npm run bench\`

Measured ${date} on ${processors.length} cores (${processors[0]?.model.trim() ?? 'unknown'}), ${(totalmem() / 2 ** 30).toFixed(0)} GiB of memory, Node ${process.versions.node}; load average at the start ${load}. Times are processor time, medians of rounds in which the contenders take turns; ratios are medians of the rounds' own ratios.

| what | measured | beside it | goal | met |
|---|---|---|---|---|
${rows.map(({ what, measured, comparedWith, goal, met }) => `| ${what} | ${measured} | ${comparedWith} | ${goal} | ${verdict(met)} |`).join('\n')}
`;

const path = RESULTS.pathname;
writeFileSync(path, await format(text, { ...(await resolveConfig(path)), parser: 'markdown' }));
for (const { what, measured, comparedWith, goal, met } of rows) {
  console.log([what, measured, comparedWith, goal, verdict(met)].filter((part) => part !== '').join(' · '));
}
if (rows.some(({ met }) => met === false)) process.exitCode = 1;
