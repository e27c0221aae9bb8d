/// <reference lib="dom" />
import type { MoistAirReading } from '@chargewright/engine';
import { airTexts, moistAirWords, propertiesWords } from '@chargewright/wording';
import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { accessibilityFaults } from './harness/axe';
import { tabTo } from './harness/check-page';
import { sidewaysOverflow, smallTargets } from './harness/layout';
import { DESKTOP, PHONE } from './harness/phone';
import { browserSuite } from './harness/suite';

const suite = browserSuite();
const { readings, choose } = moistAirWords;

const TARGETS = 'main a, main button, main summary, main select, main input[type=text]';

const field = (page: Page, reading: MoistAirReading) =>
  page.getByRole('textbox', { name: readings[reading], exact: true });
const chooser = (page: Page, which: 'first' | 'second') =>
  page.getByRole('combobox', { name: choose[which], exact: true });
const result = (page: Page) =>
  page.locator('section', { has: page.getByRole('heading', { name: moistAirWords.result, exact: true }) });
const chart = (page: Page) => page.getByRole('img', { name: /^Psychrometric chart at/ });

async function open(page: Page): Promise<void> {
  await page.goto('/properties/air');
  await chooser(page, 'first').waitFor();
}

describe('moist air', () => {
  it('is found from the page of properties, settled by two readings, and kept over a reload', async () => {
    const { page } = await suite.newPhone();
    await page.goto('/properties');
    await page.getByRole('link', { name: propertiesWords.air, exact: true }).click();
    await field(page, 'dryBulbK').fill('80');
    await result(page).getByText(moistAirWords.typeFirst).waitFor();
    await field(page, 'wetBulbK').fill('67');
    await result(page).getByText('51.1 %').waitFor();
    const text = await result(page).innerText();
    for (const figure of ['60.3 °F', '78.2 gr/lb', '0.0112 lb/lb', '31.4 Btu/lb', '13.85 ft³/lb']) {
      expect(text).toContain(figure);
    }
    await page.reload();
    await result(page).getByText('51.1 %').waitFor();
    expect(await field(page, 'wetBulbK').inputValue()).toBe('67');
  });

  it('is settled by other pairs as well, and a pair that settles nothing is explained', async () => {
    const { page } = await suite.newPhone();
    await open(page);
    await chooser(page, 'second').selectOption('enthalpyJPerKg');
    await field(page, 'dryBulbK').fill('80');
    await field(page, 'enthalpyJPerKg').fill('31.45');
    await result(page).getByText('67.0 °F').waitFor();

    await chooser(page, 'first').selectOption('wetBulbK');
    await page.getByText(String(airTexts['wet-bulb-and-enthalpy'])).waitFor();
    await result(page).getByText(moistAirWords.noAnswer).waitFor();
    expect(await chart(page).count()).toBe(0);

    await chooser(page, 'second').selectOption('dewPointK');
    await field(page, 'wetBulbK').fill('60');
    await field(page, 'dewPointK').fill('61');
    await page.getByText('Dew point 61 °F is above wet bulb 60 °F').waitFor();
    // what was typed for the dry bulb came through all of this
    await chooser(page, 'first').selectOption('dryBulbK');
    expect(await field(page, 'dryBulbK').inputValue()).toBe('80');
    await result(page).getByText('61.0 °F').waitFor();
  });

  it('has a chart that moves with the air and with the elevation, a text for who does not see it, and a table', async () => {
    const { page } = await suite.newPhone();
    await open(page);
    await page.locator('app-units-choice select').selectOption('C-kPa');
    await field(page, 'dryBulbK').fill('26');
    await field(page, 'wetBulbK').fill('18');
    await chart(page).waitFor();
    expect(await chart(page).getAttribute('aria-label')).toMatch(
      /^Psychrometric chart at an air pressure of 101 kPaa\. .* The air is marked at dry bulb 26\.0 °C and humidity ratio 9\.\d g\/kg\.$/,
    );
    const saturation = () => page.locator('path.saturation').getAttribute('d');
    const atSea = await saturation();
    await page.getByText(propertiesWords.place.title).click();
    await page.getByRole('textbox', { name: 'Elevation', exact: true }).fill('1600');
    await page.getByText(moistAirWords.chart.at('84 kPaa')).waitFor();
    expect(await saturation()).not.toBe(atSea);
    await page.getByText(moistAirWords.chart.table).click();
    await page.getByRole('table', { name: /^Humidity ratio, g\/kg/ }).waitFor();
    expect(
      await page
        .getByRole('table', { name: /^Wet bulb, °C/ })
        .getByRole('row')
        .count(),
    ).toBe(12);
    expect(await sidewaysOverflow(page)).toBe(0);
  });

  it('is drawn to the width there is', async () => {
    const { page } = await suite.newPhone({ viewport: DESKTOP });
    await open(page);
    await field(page, 'dryBulbK').fill('80');
    await field(page, 'wetBulbK').fill('67');
    await chart(page).waitFor();
    await expect.poll(() => page.locator('path.humidity').count()).toBe(9);
    await page.setViewportSize(PHONE);
    await expect.poll(() => page.locator('path.humidity').count()).toBe(4);
    const letters = await page
      .locator('svg text')
      .first()
      .evaluate((text) => text.getBoundingClientRect().height);
    expect(letters).toBeGreaterThan(12);
  });

  it('is printed on one page, figures and chart, without the fields', async () => {
    const { page } = await suite.newPhone({ colorScheme: 'dark' });
    await open(page);
    await field(page, 'dryBulbK').fill('80');
    await field(page, 'wetBulbK').fill('67');
    await chart(page).waitFor();
    await page.emulateMedia({ media: 'print' });
    const seen = await page.evaluate(() => document.body.innerText);
    expect(seen).toContain('31.4 Btu/lb');
    expect(seen).not.toContain(moistAirWords.note);
    expect(seen).not.toContain(moistAirWords.chart.table);
    expect(await chart(page).isVisible()).toBe(true);
    const pdf = await page.pdf({ format: 'Letter' });
    expect(pdf.toString('latin1').match(/\/Type\s*\/Page[^s]/g)).toHaveLength(1);
  });

  it('can be asked with the keyboard alone', async () => {
    const { page } = await suite.newPhone({ viewport: DESKTOP });
    await open(page);
    await tabTo(page, field(page, 'dryBulbK'));
    await page.keyboard.type('80');
    await tabTo(page, chooser(page, 'second'));
    await page.keyboard.press('End');
    await field(page, 'enthalpyJPerKg').waitFor();
    await tabTo(page, field(page, 'enthalpyJPerKg'));
    await page.keyboard.type('31.45');
    await result(page).getByText('67.0 °F').waitFor();
  });
});

describe.each([
  ['on a phone', PHONE],
  ['on a desk', DESKTOP],
])('everybody can use it %s', (_, viewport) => {
  it('no accessibility fault, no sideways scrolling, nothing smaller than a thumb', async () => {
    const { page } = await suite.newPhone({ viewport });
    const faults: string[] = [];
    const look = async (state: string) => {
      for (const colorScheme of ['light', 'dark'] as const) {
        await page.emulateMedia({ colorScheme });
        for (const fault of await accessibilityFaults(page)) faults.push(`${state}, ${colorScheme}: ${fault}`);
      }
      for (const target of await smallTargets(page, TARGETS)) faults.push(`${state}: ${target}`);
      const overflow = await sidewaysOverflow(page);
      if (overflow > 0) faults.push(`${state}: ${overflow} px too wide`);
    };
    await open(page);
    await look('empty');
    await field(page, 'dryBulbK').fill('80');
    await field(page, 'wetBulbK').fill('81');
    await look('a contradiction');
    await field(page, 'wetBulbK').fill('67');
    await chart(page).waitFor();
    await page.getByText(moistAirWords.chart.table).click();
    await page.getByText(propertiesWords.place.title).click();
    await look('everything open');
    await chooser(page, 'second').selectOption('enthalpyJPerKg');
    await chooser(page, 'first').selectOption('wetBulbK');
    await look('a refused pair');
    expect(faults.join('\n')).toBe('');
  });
});
