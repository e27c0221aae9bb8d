import { looseChecksWords } from '@chargewright/wording';
import { describe, expect, it } from 'vitest';
import { browserSuite } from './harness/suite';

const suite = browserSuite();

describe('the checks on this phone', () => {
  it('say what to do first when there are none', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await check.toTheList();
    await page.getByText(looseChecksWords.empty).waitFor();
  });

  it('are listed with the latest first, opened, and a new one is started beside them', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await check.setUp('R-22', 'fixed-orifice');
    await check.read({ suctionPressure: '68.5' });
    await check.toTheList();
    await check.button(looseChecksWords.newCheck).click();
    await check.setUp('R-32', 'txv');
    await check.read({ outdoorDryBulb: '91' });
    await check.toTheList();
    const names = page.getByRole('listitem').getByRole('strong');
    expect(await names.allInnerTexts()).toEqual(['R-32 · TXV', 'R-22 · Fixed orifice']);
    await page.getByRole('button', { name: /^R-22 · Fixed orifice/ }).click();
    await check.reading('suctionPressure').waitFor();
    expect(await check.reading('suctionPressure').inputValue()).toBe('68.5');
  });

  it('are deleted with undo, also with the keyboard, and what was deleted stays away after a reload', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await check.setUp('R-22', 'fixed-orifice');
    await check.read({ suctionPressure: '68.5' });
    await check.toTheList();
    const deleteIt = check.button(looseChecksWords.deleteCheck('R-22 · Fixed orifice'));
    await deleteIt.press('Enter');
    await page.getByText(looseChecksWords.deleted).waitFor();
    expect(await page.getByRole('listitem').count()).toBe(0);
    // The focus is on Undo.
    await page.keyboard.press('Enter');
    await page.getByRole('button', { name: /^R-22 · Fixed orifice/ }).click();
    await check.reading('suctionPressure').waitFor();
    expect(await check.reading('suctionPressure').inputValue()).toBe('68.5');

    await check.toTheList();
    await deleteIt.click();
    await page.getByText(looseChecksWords.deleted).waitFor();
    await page.waitForTimeout(500);
    await page.reload();
    await page.getByText(looseChecksWords.empty).waitFor();
    await check.open();
    expect(await check.refrigerant('R-22').isChecked()).toBe(false);
  });
});
