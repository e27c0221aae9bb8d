import {
  checkPageWords,
  fieldInputWords,
  setupWords,
  weighInPageWords,
  weighInWords,
  worksheetWords,
} from '@chargewright/wording';
import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { accessibilityFaults } from './harness/axe';
import { sidewaysOverflow, smallTargets } from './harness/layout';
import { browserSuite } from './harness/suite';

const suite = browserSuite();
const words = weighInPageWords;
const TARGETS =
  'main a, main button, main summary, main select, main input[type=text], main label:has(input[type=radio])';

const field = (page: Page, label: string) => page.getByRole('textbox', { name: new RegExp(`^${label}`) }).first();

async function type(page: Page, values: Readonly<Record<string, string>>): Promise<void> {
  for (const [label, text] of Object.entries(values)) {
    await field(page, label).fill(text);
    await field(page, label).press('Tab');
  }
}

const choose = (page: Page, label: string) =>
  page.getByRole('radio', { name: new RegExp(`^${label.replaceAll('/', '\\/')}`) }).click({ force: true });

/** 90 oz from the factory for 15 ft; 45 ft are installed: 30 ft × 0.60 oz/ft = 18 oz more, 108 oz in all. */
async function weighTheWhole(page: Page, weighed: string): Promise<void> {
  await choose(page, words.method.options.total.label);
  await choose(page, words.size.inches('3/8'));
  await type(page, {
    [fieldInputWords.includedLength.label]: '15',
    [fieldInputWords.makersRate.label]: '0.60',
    [fieldInputWords.deepest.label]: '350',
    [fieldInputWords.rise.label]: '120',
    [fieldInputWords.isolatedMinutes.label]: '5',
    [fieldInputWords.actualCharge.label]: weighed,
  });
}

/** From a check that was set up, by its own way to this page. */
async function comeFromACheck() {
  const phone = await suite.newPhone();
  const { page, check } = phone;
  await check.open();
  await check.setUp('R-410A', 'txv');
  await check.button(checkPageWords.setup.changeLabel).click();
  await page.getByText(checkPageWords.setup.more, { exact: true }).click();
  await type(page, { [setupWords.numbers.factoryCharge.label]: '90', [setupWords.numbers.lineLength.label]: '45' });
  await page.getByRole('radio', { name: setupWords.mode.options.heating.label }).click({ force: true });
  await check.button(checkPageWords.setup.done).filter({ visible: true }).click();
  await check.button(checkPageWords.result.placeButton['weigh-in']).filter({ visible: true }).click();
  await page.getByRole('heading', { name: words.title, exact: true }).waitFor();
  return phone;
}

describe('a technician with a scale', () => {
  it('comes from a check in heating, finds what it knows, and sees the sum as on paper', async () => {
    const { page } = await comeFromACheck();
    await page.getByText(words.refrigerant('R-410A')).waitFor();
    expect(await field(page, fieldInputWords.installedLength.label).inputValue()).toBe('45');
    expect(await field(page, setupWords.numbers.factoryCharge.label).inputValue()).toBe('90');
    await choose(page, words.kind.options.ducted.label);
    await weighTheWhole(page, '108');
    await page.getByText('45 ft − 15 ft = 30 ft').waitFor();
    await page.getByText(/30 ft × 0\.60 oz\/ft = 18(\.0)? oz/).waitFor();
    await page.getByRole('heading', { name: worksheetWords.result }).waitFor();
    await page.getByText(weighInWords.headlines.within).first().waitFor();

    await page.waitForTimeout(1000);
    await page.reload();
    await page.getByText(weighInWords.headlines.within).first().waitFor();
    expect(await field(page, fieldInputWords.actualCharge.label).inputValue()).toBe('108');
  });

  it('is told by how much it is too little, and that a missed vacuum comes first', async () => {
    const { page } = await comeFromACheck();
    await choose(page, words.kind.options.ducted.label);
    await weighTheWhole(page, '92');
    await page.getByText(weighInWords.headlines.below('1 lb 0 oz')).first().waitFor();
    await page
      .getByText(/108(\.0)? oz/)
      .first()
      .waitFor();
    await type(page, { [fieldInputWords.rise.label]: '900' });
    await page.getByText(weighInWords.headlines.vacuumFails).first().waitFor();
  });

  it('can use the page: no violation that axe-core finds, light and dark, 48 px, nothing sideways', async () => {
    const { page } = await comeFromACheck();
    await choose(page, words.kind.options.ducted.label);
    await weighTheWhole(page, '108');
    await page.getByText(words.corrections).click();
    expect(await accessibilityFaults(page)).toEqual([]);
    await page.emulateMedia({ colorScheme: 'dark' });
    expect(await accessibilityFaults(page, ['color-contrast'])).toEqual([]);
    expect(await smallTargets(page, TARGETS)).toEqual([]);
    expect(await sidewaysOverflow(page)).toBe(0);
  });
});
