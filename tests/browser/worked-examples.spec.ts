/// <reference lib="dom" />
import { findWorkedExample, workCheck, WORKED_EXAMPLES } from '@chargewright/engine/training';
import {
  checkPageWords,
  looseChecksWords,
  offlineWords,
  overallHeadline,
  readingWords,
  workedExampleStories,
  workedExampleWords,
} from '@chargewright/wording';
import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { accessibilityFaults } from './harness/axe';
import { sidewaysOverflow, smallTargets } from './harness/layout';
import { DESKTOP, PHONE } from './harness/phone';
import { browserSuite } from './harness/suite';

const suite = browserSuite();

const STORIES = workedExampleStories('F-psi');
const { list, example: words, key: keyWords } = workedExampleWords;

const heading = (page: Page, name: string) => page.getByRole('heading', { level: 1, name, exact: true });
const link = (page: Page, name: string) => page.getByRole('link', { name, exact: true });

/** As wide as A4 and as high as Letter: what fits on it fits on both. */
const SHEET = { width: '210mm', height: '279mm' };

/** Pages of paper in a PDF: each page is an object of the type Page. */
const pagesOf = (pdf: Buffer): number => pdf.toString('latin1').match(/\/Type\s*\/Page\b/g)?.length ?? 0;

describe('a person who learns', () => {
  it('finds all worked examples, and works one from the givens to the key', async () => {
    const { page } = await suite.newPhone();
    await page.goto('/examples');
    await heading(page, list.title).waitFor();
    const names = await page.getByRole('listitem').getByRole('link').allInnerTexts();
    expect(names.map((text) => text.split('\n')[0])).toEqual(WORKED_EXAMPLES.map(({ id }) => STORIES[id].title));
    const { title, questions, answers, point } = STORIES['valve-hides-low-charge'];

    await page.getByRole('link', { name: new RegExp(`^${title}`) }).click();
    await heading(page, title).waitFor();
    expect(await page.title()).toBe(`${title} · ${checkPageWords.shell.product}`);
    const given = page.getByRole('row', { name: /^Liquid pressure/ });
    expect((await given.innerText()).replace(/\s+/g, ' ')).toBe('Liquid pressure 321.8 psig 2219 kPag');
    for (const question of questions) await page.getByText(question, { exact: true }).waitFor();
    // What is to be found is not given away.
    for (const answer of answers) expect(await page.getByText(answer, { exact: true }).count()).toBe(0);

    await link(page, words.showKey).click();
    await heading(page, keyWords.title(title)).waitFor();
    for (const text of [...answers, point]) await page.getByText(text, { exact: true }).waitFor();
    await page.getByText('Subcooling is 6.3 °F below target.', { exact: true }).waitFor();
    await page.getByText(/^101 °F · printed: R-410A temperature-pressure table/).waitFor();
    await link(page, keyWords.toTheExample).click();
    await heading(page, title).waitFor();
  });

  it('opens an example in Check a charge beside the own check, and gets the finding of the key', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await check.setUp('R-22', 'fixed-orifice');
    await check.read({ suctionPressure: '68.5' });

    await page.goto('/examples/wide-glide-wrong-column');
    await check.button(words.openCheck).click();
    await page.getByText(checkPageWords.example.note).waitFor();
    const example = findWorkedExample('wide-glide-wrong-column');
    if (example?.kind !== 'check') throw new Error('no such check');
    const { result } = workCheck(example);
    expect(result.overall.finding).toBe(example.key.overall);
    await check.announced(overallHeadline(result, 'F-psi')).waitFor();
    expect(await check.reading('suctionPressure').inputValue()).toBe('63.2');

    await check.toTheList();
    expect(await page.getByRole('listitem').getByRole('strong').allInnerTexts()).toEqual([
      'R-407C · Fixed orifice',
      'R-22 · Fixed orifice',
    ]);
    await page.getByRole('button', { name: /^R-22 · Fixed orifice/ }).click();
    await check.reading('suctionPressure').waitFor();
    expect(await check.reading('suctionPressure').inputValue()).toBe('68.5');
    expect(await page.getByText(checkPageWords.example.note).count()).toBe(0);
  });

  it('reads the givens in the units of the example, with the own ones beside', async () => {
    const { page } = await suite.newPhone();
    await page.goto('/examples/healthy-orifice');
    await page.getByLabel(checkPageWords.units.choose).selectOption('C-bar');
    const given = page.getByRole('row', { name: new RegExp(`^${readingWords.suctionPressure.label}`) });
    await given.getByText('5.24 barg').waitFor();
    expect(await given.innerText()).toContain('76.0 psig');
    await page.goto('/examples/healthy-orifice/key');
    await page.getByText('= 7.8 °C', { exact: true }).first().waitFor();
  });

  it('is told of an address without an example, and led to the others', async () => {
    const { page } = await suite.newPhone();
    await page.goto('/examples/no-such-thing/key');
    await heading(page, words.unknownTitle).waitFor();
    await link(page, words.toTheList).click();
    await heading(page, list.title).waitFor();
  });

  it('has the examples without a network, after one visit to the first page', async () => {
    const phone = await suite.newPhone();
    const { page, context, check } = phone;
    await check.open();
    await page.getByText(offlineWords.ready).waitFor({ timeout: 30_000 });
    phone.expectOffline(true);
    await context.setOffline(true);
    await page.goto('/examples');
    await page.getByRole('link', { name: new RegExp(`^${STORIES['printed-sum'].title}`) }).click();
    await heading(page, STORIES['printed-sum'].title).waitFor();
    await link(page, words.showKey).click();
    await page.getByText(keyWords.misprint).first().waitFor();
  });
});

describe('a teacher who prints', () => {
  const addresses = { example: '', key: '/key' } as const;

  it.each(['example', 'key'] as const)('gets every %s on one sheet of paper, A4 or Letter', async (which) => {
    const { page } = await suite.newPhone({ viewport: DESKTOP });
    const tooLong: string[] = [];
    for (const { id } of WORKED_EXAMPLES) {
      await page.goto(`/examples/${id}${addresses[which]}`);
      await page.getByRole('heading', { level: 1 }).waitFor();
      const pages = pagesOf(await page.pdf(SHEET));
      if (pages !== 1) tooLong.push(`${id} takes ${pages} sheets`);
    }
    expect(tooLong).toEqual([]);
  });

  it('has no buttons and no frame on the paper, and no answer on the sheet of the questions', async () => {
    const { page } = await suite.newPhone({ viewport: DESKTOP });
    await page.goto('/examples/undercharge-low-split');
    await page.getByText(words.questions, { exact: true }).waitFor();
    await page.emulateMedia({ media: 'print' });
    expect(await page.locator('header').first().isVisible()).toBe(false);
    for (const name of [words.showKey, words.openCheck, words.print, words.toTheList]) {
      expect(await page.getByText(name, { exact: true }).isVisible(), name).toBe(false);
    }
    expect(await page.getByText(STORIES['undercharge-low-split'].point).count()).toBe(0);
  });
});

describe.each([
  ['phone', PHONE],
  ['desktop', DESKTOP],
])('on a %s of %o', (_, viewport) => {
  it('list, examples and keys of every kind are without a violation that axe-core finds, light and dark, with controls of 48 px', async () => {
    const { page } = await suite.newPhone({ viewport });
    const faults: string[] = [];
    const kinds = ['low-airflow-floods', 'handbook-moist-air', 'printed-sum', 'overcharge-or-air'];
    for (const address of ['/examples', ...kinds.flatMap((id) => [`/examples/${id}`, `/examples/${id}/key`])]) {
      await page.goto(address);
      await page.getByRole('heading', { level: 1 }).waitFor();
      for (const fault of await accessibilityFaults(page)) faults.push(`${address}: ${fault}`);
      await page.emulateMedia({ colorScheme: 'dark' });
      for (const fault of await accessibilityFaults(page, ['color-contrast'])) faults.push(`${address} dark: ${fault}`);
      await page.emulateMedia({ colorScheme: 'light' });
      for (const target of await smallTargets(page, 'main a, main button')) faults.push(`${address}: ${target}`);
      const overflow = await sidewaysOverflow(page);
      if (overflow > 0) faults.push(`${address}: ${overflow} px too wide`);
    }
    expect(faults.join('\n')).toBe('');
  });
});

it('the list of checks still opens from the example that was opened', async () => {
  const { page, check } = await suite.newPhone();
  await page.goto('/examples/dry-house');
  await check.button(words.openCheck).click();
  await page.getByText(checkPageWords.example.note).waitFor();
  await check.button(checkPageWords.example.clear).click();
  await page.getByText(checkPageWords.example.cleared).waitFor();
  await check.toTheList();
  await page.getByText(looseChecksWords.empty).waitFor();
});
