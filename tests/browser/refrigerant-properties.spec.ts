/// <reference lib="dom" />
import { offlineWords, pageMenuWords, propertiesWords, safetyWords } from '@chargewright/wording';
import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { accessibilityFaults } from './harness/axe';
import { tabTo } from './harness/check-page';
import { sidewaysOverflow, smallTargets } from './harness/layout';
import { DESKTOP, PHONE } from './harness/phone';
import { browserSuite } from './harness/suite';

const suite = browserSuite();
const words = propertiesWords.saturation;

const TARGETS =
  'main a, main button, main summary, main select, main input[type=text], main label:has(input[type=radio])';

const field = (page: Page, name: string) => page.getByRole('textbox', { name, exact: true });
const result = (page: Page) =>
  page.locator('section', { has: page.getByRole('heading', { name: words.result, exact: true }) });
const choose = (page: Page, refrigerant: string) =>
  page.getByRole('radio', { name: refrigerant, exact: true }).click({ force: true });

async function lookUp(page: Page, refrigerant: string): Promise<void> {
  await page.goto(`/properties?refrigerant=${encodeURIComponent(refrigerant)}`);
  await field(page, words.pressure).waitFor();
}

describe('saturation of a refrigerant', () => {
  it('is found by the menu, asked for by pressure and by temperature, and kept over a reload', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await page.getByRole('button', { name: pageMenuWords.open }).click();
    await page.getByRole('link', { name: pageMenuWords.properties.name }).click();
    await page.getByText(words.chooseFirst).waitFor();
    await choose(page, 'R-410A');
    await result(page).getByText(words.typeFirst).waitFor();

    await field(page, words.pressure).fill('118');
    await result(page).getByText('At 118.0 psig (132.7 psia)').waitFor();
    expect(await result(page).innerText()).toMatch(
      /Bubble point[^]*39\.\d °F[^]*Dew point[^]*39\.\d °F[^]*Glide[^]*0\.\d °F/,
    );

    await field(page, words.temperature).fill('40');
    await page.getByText(/worked out: bubble .* psig, dew .* psig/).waitFor();
    expect(await field(page, words.pressure).inputValue()).toBe('');
    expect(await result(page).innerText()).toMatch(/118\.\d psig\s+133\.\d psia/);

    await page.reload();
    await result(page).getByText('At 40.0 °F').waitFor();
    expect(await field(page, words.temperature).inputValue()).toBe('40');
    expect(new URL(page.url()).searchParams.get('refrigerant')).toBe('R-410A');
  });

  it('counts from the air at the elevation, and says what cannot be without losing it', async () => {
    const { page } = await suite.newPhone();
    await lookUp(page, 'R-22');
    await field(page, words.pressure).fill('68.6');
    await result(page).getByText('40.0 °F').waitFor();
    await page.getByText(propertiesWords.place.title).click();
    await field(page, 'Elevation').fill('52800');
    await page.getByText(/Elevation lies between/).waitFor();
    await page.getByText(propertiesWords.place.unknown).first().waitFor();
    await field(page, 'Elevation').fill('5280');
    await result(page).getByText('38.2 °F').waitFor();
    await field(page, words.pressure).fill('9000');
    await page
      .getByText(/is above the critical pressure/)
      .first()
      .waitFor();
    expect(await field(page, words.pressure).inputValue()).toBe('9000');
  });

  it('is shown in °C and kPa or bar, while what was typed keeps its unit', async () => {
    const { page } = await suite.newPhone();
    await lookUp(page, 'R-134a');
    await field(page, words.pressure).fill('57.8');
    await result(page).getByText('60.3 °F').waitFor();
    const units = page.locator('app-units-choice select');
    await units.selectOption('C-kPa');
    await result(page).getByText('15.7 °C').waitFor();
    expect(await result(page).innerText()).toContain('399 kPag');
    expect(await field(page, words.pressure).inputValue()).toBe('57.8');
    await units.selectOption('C-bar');
    await result(page).getByText('At 3.99 barg (5.00 bara)').waitFor();
  });

  it('says how sure it is: printed charts beside it, estimated and doubtful models marked, what burns', async () => {
    const { page } = await suite.newPhone();
    await lookUp(page, 'R-407C');
    await page.getByText(/Largest −1\.1\d °F at/).waitFor();
    await page.getByText(propertiesWords.printed.showRows).click();
    expect(await page.getByRole('row').count()).toBeGreaterThan(46);

    await lookUp(page, 'R-424A');
    await page.getByText(propertiesWords.facts.grades.C).first().waitFor();
    await page.getByText(propertiesWords.printed.none).waitFor();
    await lookUp(page, 'R-502');
    await page.getByText(propertiesWords.facts.doubtful).first().waitFor();
    await lookUp(page, 'R-290');
    await page.getByText(safetyWords.flammable).waitFor();
  });
});

describe('the card of a refrigerant', () => {
  it.each(['F-psi', 'C-bar'])('fills one page of paper, and nothing else is on it, in %s', async (system) => {
    const { page } = await suite.newPhone({ viewport: DESKTOP, colorScheme: 'dark' });
    await lookUp(page, 'R-454B');
    await page.locator('app-units-choice select').selectOption(system);
    await page.emulateMedia({ media: 'print' });
    const seen = await page.evaluate(() => document.body.innerText);
    expect(seen).toContain(propertiesWords.card.title('R-454B'));
    expect(seen).toContain('A2L');
    expect(seen).toContain(system === 'F-psi' ? 'Bubble psig' : 'Bubble barg');
    for (const hidden of [propertiesWords.title, words.note, propertiesWords.card.print]) {
      expect(seen.split('\n')).not.toContain(hidden);
    }
    for (const format of ['Letter', 'A4'] as const) {
      const pdf = await page.pdf({ format, margin: { top: '10mm', bottom: '10mm', left: '10mm', right: '10mm' } });
      expect(pdf.toString('latin1').match(/\/Type\s*\/Page[^s]/g), format).toHaveLength(1);
    }
  });

  it('is shown on the screen, too', async () => {
    const { page } = await suite.newPhone();
    await lookUp(page, 'R-22');
    expect(await page.getByRole('heading', { name: propertiesWords.card.title('R-22') }).count()).toBe(1);
    await page.getByRole('button', { name: propertiesWords.card.show }).click();
    await page.getByText(propertiesWords.card.pure).waitFor();
    expect(await sidewaysOverflow(page)).toBe(0);
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
    await page.goto('/properties');
    await page.getByText(words.chooseFirst).waitFor();
    await look('nothing chosen');
    await choose(page, 'R-407C');
    await field(page, words.pressure).fill('a lot');
    await look('not a number');
    await field(page, words.pressure).fill('200');
    await page.getByText(propertiesWords.printed.showRows).click();
    await page.getByRole('button', { name: propertiesWords.card.show }).click();
    await page.getByText(propertiesWords.place.title).click();
    await look('everything open');
    expect(faults.join('\n')).toBe('');
  });
});

it('can be done with the keyboard alone', async () => {
  const { page } = await suite.newPhone({ viewport: DESKTOP });
  await page.goto('/properties');
  await tabTo(page, page.getByRole('radio', { name: 'R-410A', exact: true }));
  await page.keyboard.press('Space');
  await field(page, words.pressure).waitFor();
  await tabTo(page, field(page, words.temperature));
  await page.keyboard.type('100');
  await result(page).getByText('At 100.0 °F').waitFor();
});

it('works without a network once the app is kept', async () => {
  const phone = await suite.newPhone();
  const { page, check } = phone;
  await check.open();
  await page.getByText(offlineWords.ready).waitFor({ timeout: 30_000 });
  await suite.server().stop();
  phone.expectOffline(true);
  await lookUp(page, 'R-22');
  await field(page, words.temperature).fill('40');
  await result(page).getByText('68.6 psig').waitFor();
  await suite.server().restart();
});
