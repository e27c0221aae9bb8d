/// <reference lib="dom" />
import { listSources } from '@chargewright/engine/sources';
import {
  checkPageWords,
  offlineWords,
  pageMenuWords,
  propertiesWords,
  sourcesWords as words,
} from '@chargewright/wording';
import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { accessibilityFaults } from './harness/axe';
import { sidewaysOverflow, smallTargets } from './harness/layout';
import { DESKTOP, PHONE } from './harness/phone';
import { browserSuite } from './harness/suite';

const suite = browserSuite();

const { entries } = listSources();
const heading = (page: Page, level: number, name: string) => page.getByRole('heading', { level, name, exact: true });
const search = (page: Page) => page.getByRole('textbox', { name: new RegExp(`^${words.search}`) });
const standing = (page: Page) => page.getByRole('combobox', { name: words.standing });
const open = (page: Page, group: string) =>
  page
    .locator('summary')
    .filter({ has: heading(page, 2, group) })
    .click();

describe('a person who asks what a figure rests on', () => {
  it('comes from the menu, opens the rules, and reads a figure with its source, edition and standing in the own units', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await check.button(pageMenuWords.open).click();
    await page.getByRole('link', { name: new RegExp(`^${pageMenuWords.sources.name}`) }).click();
    await heading(page, 1, words.title).waitFor();
    expect(await page.title()).toBe(`${words.title} · ${checkPageWords.shell.product}`);
    expect(await page.getByRole('status').innerText()).toBe(words.found(entries.length, entries.length));

    await open(page, words.groups.procedures);
    const rater = page
      .getByRole('listitem')
      .filter({ hasText: words.names.procedureFigures['superheat.toleranceK'] })
      .filter({ hasText: '8 °F' });
    for (const text of ['2019', words.standings.read, 'RA3.2 2019, rater'])
      await rater.getByText(text).first().waitFor();
    await page.getByLabel(checkPageWords.units.choose).selectOption('C-bar');
    await rater.getByText('4.44 °C').waitFor();
    await rater.getByText(words.printed('8 °F')).waitFor();
    await rater.getByRole('link', { name: words.places.check }).click();
    await check.button(checkPageWords.example.button).waitFor();
  });

  it('finds by a word and by what it stands on, and sees the whole list again', async () => {
    const { page } = await suite.newPhone();
    await page.goto('/sources');
    await standing(page).selectOption('memory');
    const fromMemory = entries.filter((entry) => entry.standing === 'memory').length;
    await page.getByText(words.found(fromMemory, entries.length), { exact: true }).waitFor();
    await search(page).fill('finer TABLE');
    await page.getByText(words.found(1, entries.length), { exact: true }).waitFor();
    await page.getByText(words.noEdition).waitFor();
    await search(page).fill('no such thing');
    await page.getByText(words.nothing).waitFor();
    await page.getByRole('button', { name: words.clear }).click();
    await page.getByText(words.found(entries.length, entries.length), { exact: true }).waitFor();
    expect(await search(page).inputValue()).toBe('');
  });

  it('comes from a refrigerant, also without a network', async () => {
    const phone = await suite.newPhone();
    const { page, context, check } = phone;
    await check.open();
    await page.getByText(offlineWords.ready).waitFor({ timeout: 30_000 });
    phone.expectOffline(true);
    await context.setOffline(true);
    await page.goto('/properties/refrigerant');
    await check.refrigerant('R-32').click({ force: true });
    await page.getByRole('link', { name: propertiesWords.facts.sources }).click();
    await heading(page, 1, words.title).waitFor();
    expect(await search(page).inputValue()).toBe('R-32');
    await page.getByText(words.names.refrigerant('R-32', words.names.pure), { exact: true }).waitFor();
  });
});

it.each([
  ['phone', PHONE],
  ['desktop', DESKTOP],
])(
  'on a %s is without a violation that axe-core finds, light and dark, folded and found, and never too wide',
  async (_, viewport) => {
    const { page } = await suite.newPhone({ viewport });
    const faults: string[] = [];
    await page.goto('/sources');
    await heading(page, 1, words.title).waitFor();
    for (const state of ['folded', 'found'] as const) {
      if (state === 'found') await standing(page).selectOption('memory');
      for (const fault of await accessibilityFaults(page)) faults.push(`${state}: ${fault}`);
      await page.emulateMedia({ colorScheme: 'dark' });
      for (const fault of await accessibilityFaults(page, ['color-contrast'])) faults.push(`${state}, dark: ${fault}`);
      await page.emulateMedia({ colorScheme: 'light' });
      for (const target of await smallTargets(page, 'main a, main button, main summary, main input, main select'))
        faults.push(`${state}: ${target}`);
      await page.setViewportSize({ width: 320, height: 640 });
      const overflow = await sidewaysOverflow(page);
      if (overflow > 0) faults.push(`${state}: ${overflow} px too wide at 320`);
      await page.setViewportSize(viewport);
    }
    expect(faults.join('\n')).toBe('');
    await standing(page).selectOption('all');
    await page.emulateMedia({ media: 'print' });
    const printed = await page.locator('main').evaluate((main) => main.getBoundingClientRect().height);
    expect(printed, 'the folded list is whole on paper').toBeGreaterThan(5000);
  },
);
