import {
  checkPageWords,
  makersChartWords,
  makersDataWords,
  procedureWords,
  readingWords,
  setupWords,
} from '@chargewright/wording';
import { describe, expect, it } from 'vitest';
import { accessibilityFaults } from './harness/axe';
import { HIGH_SUPERHEAT } from './harness/check-page';
import { browserSuite } from './harness/suite';

const suite = browserSuite();
const words = makersDataWords;

/** A table of our own: 20 °F everywhere, but a dash at the hot and dry corner. */
const TABLE = ['Outdoor\t57\t63\t67', '85\t20\t20\t20', '95\t20\t20\t20', '105\t\t20\t20'].join('\n');

const atTheTables = async () => {
  const phone = await suite.newPhone();
  await phone.check.open();
  await phone.check.setUp('R-410A', 'fixed-orifice');
  await phone.check.read(HIGH_SUPERHEAT);
  await phone.check.button(checkPageWords.setup.changeLabel).click();
  await phone.page.getByText(checkPageWords.setup.more, { exact: true }).click();
  await phone.page.getByRole('link', { name: checkPageWords.setup.makersDataLink(0) }).click();
  await phone.page.getByRole('heading', { name: words.pageTitle }).waitFor();
  return phone;
};

describe('somebody with the maker’s table in his hand', () => {
  it('pastes it, sees its picture, and is judged by it', async () => {
    const { page, check } = await atTheTables();
    await page.getByRole('button', { name: makersChartWords.kinds.superheat.label }).click();
    await page.getByText(words.paste, { exact: true }).click();
    await page.getByRole('textbox', { name: words.pasteHint }).fill(TABLE);
    await check.button(words.pasteRead).click();
    await page.getByText(words.pasted(3, 3)).waitFor();
    await page.getByText(words.complete).waitFor();
    await page.getByRole('img', { name: words.previewText(makersChartWords.kinds.superheat.label, 3, 3, 1) }).waitFor();
    expect(await accessibilityFaults(page)).toEqual([]);
    await check.button(words.done).click();
    await page.getByRole('link', { name: words.back }).click();
    await check.goToReadings();
    // 18.3 °F read, 20 °F by this maker
    await page
      .getByText(/^Superheat is within its band, 1\.\d °F below target$/)
      .first()
      .waitFor();
    await page.reload();
    await page
      .getByText(/^Superheat is within its band/)
      .first()
      .waitFor();
  });

  it('chooses this maker’s data as the rules: nothing is assumed, then the table is asked for and judged by', async () => {
    const { page, check } = await atTheTables();
    await page.getByRole('link', { name: words.back }).click();
    await check.button(checkPageWords.setup.changeLabel).click();
    await page.getByText(checkPageWords.setup.more, { exact: true }).click();
    await page.getByRole('radio', { name: procedureWords.manufacturer.name }).click({ force: true });
    await check.goToReadings();
    await page
      .getByText(/^State this first: mode, kind of system, stage, high-side port and elevation\.$/)
      .first()
      .waitFor();
    await check.button(checkPageWords.result.placeButton.setup).filter({ visible: true }).click();
    await check.button(checkPageWords.setup.confirmAssumed).click();
    await check.type(setupWords.numbers.elevation.label, '650');
    await check.goToReadings();
    await page
      .getByText(/^Find this unit’s target on the nameplate/)
      .first()
      .waitFor();
    await check.button(checkPageWords.result.placeButton['makers-data']).filter({ visible: true }).click();
    await page.getByRole('button', { name: makersChartWords.kinds.superheat.label }).click();
    await page.getByText(words.paste, { exact: true }).click();
    await page.getByRole('textbox', { name: words.pasteHint }).fill(TABLE);
    await check.button(words.pasteRead).click();
    await page.getByText(words.complete).waitFor();
    await page.getByText(words.conditions, { exact: true }).click();
    await check.type(words.leastReturn, '80');
    await check.button(words.done).click();
    await page.getByRole('link', { name: words.back }).click();
    await check.goToReadings();
    // the return air is at 78.2 °F
    await page
      .getByText(/the test needs at least 80\.0 °F/)
      .first()
      .waitFor();
    await check.type(readingWords.returnDryBulb.label, '80.4');
    await page
      .getByText(/^Superheat is within its band, 1\.\d °F below target$/)
      .first()
      .waitFor();
    await page
      .getByText(/with the ± of the general rules: the maker’s was not entered/)
      .first()
      .waitFor();
    expect(await accessibilityFaults(page)).toEqual([]);
  });

  it('types it row by row with a dash key, is told what is odd, takes it away and brings it back', async () => {
    const { page, check } = await atTheTables();
    await page.getByRole('button', { name: makersChartWords.kinds.superheat.label }).click();
    await page.getByText(words.unfinished(8)).waitFor();
    const type = async (id: string, text: string) => {
      await page.locator(`#${id}`).fill(text);
      await page.locator(`#${id}`).press('Enter');
    };
    await type('column-0', '57');
    await type('column-1', '67');
    await type('row-head', '85');
    await type('cell-0', '10');
    await type('cell-1', '20');
    await page.getByText(words.rowNumber(2, 2)).waitFor();
    await page.locator('#row-head').fill('80');
    await check.button(words.dashLabel('Return wet bulb 57')).click();
    await type('cell-1', '21');
    // 80 after 85: refused in words, nothing lost
    await page
      .getByText(/not above the one before it/)
      .first()
      .waitFor();
    await page.locator('#row-head').fill('95');
    await page.getByText(words.complete).waitFor();
    await check.button(words.done).click();
    const name = makersChartWords.kinds.superheat.label;
    await check.button(words.removeLabel(name)).click();
    await page.getByText(words.none).waitFor();
    await check.button(words.undo).click();
    await page.getByText(words.complete).waitFor();
    await page.reload();
    await check.button(words.editLabel(name)).click();
    expect(await page.locator('#cell-1').inputValue()).toBe('20');
    const sideways = await page.evaluate(
      () => document.documentElement.scrollWidth > document.documentElement.clientWidth,
    );
    expect(sideways).toBe(false);
  });
});
