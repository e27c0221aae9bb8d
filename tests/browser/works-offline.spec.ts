/// <reference lib="dom" />
import { offlineWords } from '@chargewright/wording';
import { cpSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { createHash } from 'node:crypto';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { CheckPage, HIGH_SUPERHEAT } from './harness/check-page';
import { newPhone } from './harness/phone';
import { startServer, WEB_ROOT } from './harness/server';
import { browserSuite } from './harness/suite';

const suite = browserSuite();

describe('without a network', () => {
  it('the page opens again after the first visit, and a check is judged on it', async () => {
    const phone = await suite.newPhone({ alone: true });
    const { page, context, check } = phone;
    await check.open();
    await page.getByText(offlineWords.ready).waitFor({ timeout: 30_000 });
    await suite.server().stop();
    phone.expectOffline(true);
    await page.reload();
    await check.setUp('R-410A', 'fixed-orifice');
    await check.read(HIGH_SUPERHEAT);
    await page
      .getByText(/^Superheat is .* above target$/)
      .first()
      .waitFor();

    // A page that was never open, and parts that were never loaded.
    const fresh = new CheckPage(await context.newPage());
    await fresh.open();
    expect(await fresh.reading('suctionPressure').inputValue()).toBe(HIGH_SUPERHEAT.suctionPressure);
    await fresh.toTheList();
    await fresh.page.getByRole('button', { name: /^R-410A · Fixed orifice/ }).waitFor();

    await context.setOffline(true);
    await page.getByText(offlineWords.offline).waitFor();
    await context.setOffline(false);
    await suite.server().restart();
  });

  it('the API is not answered out of the app’s cache', async () => {
    const { page, check } = await suite.newPhone({ alone: true });
    await check.open();
    await page.getByText(offlineWords.ready).waitFor({ timeout: 30_000 });
    const response = await page.goto('/healthz');
    expect(response?.headers()['content-type']).not.toContain('text/html');
    expect(
      await page.evaluate(async () => (await fetch('/api/v1/refrigerants')).headers.get('content-type')),
    ).toContain('json');
  });
});

describe('a newer version', () => {
  const root = mkdtempSync(path.join(tmpdir(), 'chargewright-web-'));
  afterAll(() => rmSync(root, { recursive: true, force: true }));

  /** As a new build does it: another page, its hash in the worker's manifest. */
  function publish(mark: string): void {
    const page = readFileSync(path.join(root, 'index.html'), 'utf8').replace('</body>', `<!-- ${mark} --></body>`);
    writeFileSync(path.join(root, 'index.html'), page);
    const manifest = JSON.parse(readFileSync(path.join(root, 'ngsw.json'), 'utf8')) as {
      timestamp: number;
      hashTable: Record<string, string>;
    };
    manifest.timestamp += 1;
    manifest.hashTable['/index.html'] = createHash('sha1').update(page).digest('hex');
    writeFileSync(path.join(root, 'ngsw.json'), JSON.stringify(manifest));
  }

  it('waits until nobody types, is offered quietly, and takes over with everything typed', async () => {
    cpSync(WEB_ROOT, root, { recursive: true });
    const server = await startServer(root);
    const phone = await newPhone(server.origin);
    const { page } = phone;
    const check = new CheckPage(page);
    await check.open();
    await page.getByText(offlineWords.ready).waitFor({ timeout: 30_000 });
    await check.setUp('R-410A', 'fixed-orifice');
    await check.reading('suctionPressure').pressSequentially('116.5');

    publish('second build');
    await page.evaluate(() =>
      navigator.serviceWorker.controller?.postMessage({ action: 'CHECK_FOR_UPDATES', nonce: 1 }),
    );
    const offer = page.getByText(offlineWords.updateAvailable);
    await page.waitForTimeout(2000);
    expect(await offer.count()).toBe(0);
    await check.reading('suctionPressure').blur();
    await offer.waitFor();
    expect(await page.content()).not.toContain('second build');
    await check.button(offlineWords.updateNow).click();
    await expect.poll(() => page.content().catch(() => '')).toContain('second build');
    await check.reading('suctionPressure').waitFor();
    expect(await check.reading('suctionPressure').inputValue()).toBe('116.5');
    expect(phone.faults).toEqual([]);
    await phone.close();
    await server.stop();
  });
});
