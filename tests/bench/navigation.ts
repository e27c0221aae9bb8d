/// <reference lib="dom" />
/** From opening the installed page, everything cached, to the finding of the check that was open last, on a slow phone. */
import { existsSync } from 'node:fs';
import path from 'node:path';
import { offlineWords } from '@chargewright/wording';
import type { Page } from 'playwright-core';
import { CheckPage } from '../browser/harness/check-page';
import { closeBrowser, newPhone } from '../browser/harness/phone';
import { startServer, WEB_ROOT } from '../browser/harness/server';
import type { BenchRow } from './engine-benches';
import { median } from './time-per-call';

const SLOWDOWN = 4;
const ROUNDS = 9;
const MOST_MS = 1500;
/** Of the example's check; the sentence of its finding. */
const FINDING = 'Superheat is 9.5 °F above target';

const WHAT = `from cached navigation to a finding, CPU slowed ${SLOWDOWN} times`;

export async function navigation(): Promise<BenchRow> {
  if (!existsSync(path.join(WEB_ROOT, 'index.html'))) {
    console.log('No build in dist: "npm run build" first, then the navigation is measured too.');
    return { what: WHAT, measured: 'not measured: no build', comparedWith: '', goal: `≤ ${MOST_MS} ms`, met: null };
  }
  const server = await startServer();
  try {
    const phone = await newPhone(server.origin);
    await prepare(phone.page);
    const times = [];
    for (let k = 0; k < ROUNDS; k++) times.push(await timeToFinding(phone.page));
    await phone.close();
    const middle = median(times);
    const [fastest, slowest] = [Math.min(...times), Math.max(...times)];
    return {
      what: WHAT,
      measured: `${middle.toFixed(0)} ms`,
      comparedWith: `median of ${ROUNDS}, ${fastest.toFixed(0)} to ${slowest.toFixed(0)} ms`,
      goal: `≤ ${MOST_MS} ms`,
      met: middle <= MOST_MS,
    };
  } finally {
    await closeBrowser();
    await server.stop();
  }
}

/** Installs the worker, keeps a check with a finding on the phone, and slows the processor down. */
async function prepare(page: Page): Promise<void> {
  const check = new CheckPage(page);
  await check.open();
  await page.getByText(offlineWords.ready).waitFor({ timeout: 60_000 });
  await check.fillWithExample();
  await page.getByText(FINDING).first().waitFor();
  // once it is read out, it has long been stored
  await check.announced(FINDING).waitFor();
  await page.addInitScript((finding) => {
    // functions without names: tsx would mark named ones by a helper that the page does not have
    new MutationObserver((_, observer) => {
      if (!document.body?.textContent?.includes(finding)) return;
      observer.disconnect();
      requestAnimationFrame(() => performance.mark('finding'));
    }).observe(document, { childList: true, subtree: true, characterData: true });
  }, FINDING);
  const session = await page.context().newCDPSession(page);
  await session.send('Emulation.setCPUThrottlingRate', { rate: SLOWDOWN });
}

/** Milliseconds from the start of the navigation to the frame that shows the finding. */
async function timeToFinding(page: Page): Promise<number> {
  await page.goto('/', { waitUntil: 'commit' });
  await page.waitForFunction(() => performance.getEntriesByName('finding').length > 0, undefined, { timeout: 60_000 });
  const { fromWorker, at } = await page.evaluate(() => ({
    fromWorker: navigator.serviceWorker.controller !== null,
    at: performance.getEntriesByName('finding')[0]!.startTime,
  }));
  if (!fromWorker) throw new Error('the page did not come from the worker');
  return at;
}
