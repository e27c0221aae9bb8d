import { glanceWords, ownerWords, targetComparisonWords } from '@chargewright/wording';
import { describe, expect, it } from 'vitest';
import { accessibilityFaults } from './harness/axe';
import { HIGH_SUPERHEAT } from './harness/check-page';
import { browserSuite } from './harness/suite';

const suite = browserSuite();

const judged = async () => {
  const phone = await suite.newPhone();
  await phone.check.open();
  await phone.check.setUp('R-410A', 'fixed-orifice');
  await phone.check.read(HIGH_SUPERHEAT);
  await phone.page
    .getByText(/^Superheat is .* above target$/)
    .first()
    .waitFor();
  return phone;
};

describe('somebody with a finding', () => {
  it('reads one number at arm’s length, pages to the next, and is back where she was', async () => {
    const { page, check } = await judged();
    const open = check.button(glanceWords.openLabel).filter({ visible: true }).first();
    await open.click();
    const glance = page.getByRole('dialog', { name: glanceWords.openLabel });
    await glance.waitFor();
    const number = glance.locator('.number');
    expect(await number.innerText()).toMatch(/^\d\d\.\d\s*°F$/);
    const { fontSize, fits } = await number.evaluate((element) => ({
      fontSize: Number.parseFloat(getComputedStyle(element).fontSize),
      fits: element.scrollWidth <= element.ownerDocument.documentElement.clientWidth,
    }));
    expect(fontSize).toBeGreaterThan(100);
    expect(fits).toBe(true);
    expect(await accessibilityFaults(page)).toEqual([]);
    await glance.getByText('Superheat', { exact: true }).waitFor();
    await check.button(glanceWords.next).click();
    await glance.getByText('Subcooling', { exact: true }).waitFor();
    await page.keyboard.press('Escape');
    await glance.waitFor({ state: 'detached' });
    await open.click();
    await check.button(glanceWords.close).click();
    await glance.waitFor({ state: 'detached' });
  });

  it('hands the owner a few plain sentences at once', async () => {
    const { page, check } = await judged();
    await page.context().grantPermissions(['clipboard-read', 'clipboard-write']);
    await check.button(ownerWords.open).click();
    const text = page.getByText(/^Your cooling system was checked on/);
    expect(await text.innerText()).toMatch(/needs attention\. Superheat is .* above target: .*certify capacity/);
    await check.button(ownerWords.copy).click();
    await page.getByText(ownerWords.copied).waitFor();
    expect(await page.evaluate(() => navigator.clipboard.readText())).toBe(await text.innerText());
  });

  it('compares the sources of the target at her own conditions', async () => {
    const { page, check } = await judged();
    const card = page.locator('app-criterion-card').filter({ has: page.getByRole('heading', { name: /^Superheat/ }) });
    await card.getByRole('button', { name: targetComparisonWords.show }).click();
    const table = card.getByRole('table');
    await expect.poll(() => table.getByRole('row').count()).toBe(5);
    const chartA = table.getByRole('row').filter({ hasText: targetComparisonWords.names['makers-chart-a'] });
    expect(await chartA.innerText()).toMatch(new RegExp(`${targetComparisonWords.used}[^]*8\\.8 °F`));
    expect(await accessibilityFaults(page)).toEqual([]);
    // 100 °F outdoors at 60 °F wet bulb: a dash everywhere, and no formula fills it
    await check.read({ outdoorDryBulb: '100', returnWetBulb: '60' });
    await table.getByText(targetComparisonWords.formulaRefused).waitFor();
    expect(await table.getByText(targetComparisonWords.dash).count()).toBe(3);
  });
});
