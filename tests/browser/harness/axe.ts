import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import type { AxeResults, RunOptions } from 'axe-core';
import type { Page } from 'playwright-core';

const AXE = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

/** Every violation axe-core finds, one line each with the elements; empty when there is none. `only`: just these rules. */
export async function accessibilityFaults(page: Page, only?: readonly string[]): Promise<string[]> {
  // As a script element it would break the page's security policy.
  if (!(await page.evaluate(() => 'axe' in globalThis))) await page.evaluate(AXE);
  const options: RunOptions = { resultTypes: ['violations'], ...(only && { runOnly: [...only] }) };
  const { violations } = await page.evaluate(
    (how) => (globalThis as unknown as { axe: { run(how: RunOptions): Promise<AxeResults> } }).axe.run(how),
    options,
  );
  return violations.map(({ id, help, nodes }) => {
    const elements = nodes.map(({ target, failureSummary }) => `  ${target.join(' ')}\n  ${failureSummary}`);
    return `${id}: ${help}\n${elements.join('\n')}`;
  });
}
