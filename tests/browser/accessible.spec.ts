import { checkPageWords, looseChecksWords, offlineWords, setupWords } from '@chargewright/wording';
import { describe, expect, it } from 'vitest';
import { accessibilityFaults } from './harness/axe';
import type { CheckPage } from './harness/check-page';
import { sidewaysOverflow, smallTargets } from './harness/layout';
import { DESKTOP, PHONE, type Phone } from './harness/phone';
import { browserSuite } from './harness/suite';

const suite = browserSuite();

/** Everything a thumb in a glove has to hit; radio buttons and boxes to tick are hit by their labels. */
const TARGETS = [
  'header a, header select, app-result-sheet button, app-update-bar button',
  'main a, main button, main summary, main select, main input[type=text]',
  'main label:has(input[type=radio], input[type=checkbox])',
].join();

type Visit = (phone: Phone & { readonly check: CheckPage }) => Promise<void>;

/** The states of the page, each reached from the one before. */
const STATES: readonly (readonly [name: string, Visit])[] = [
  ['nothing entered', ({ check }) => check.open()],
  [
    'no checks listed',
    async ({ page, check }) => {
      await check.toTheList();
      await page.getByText(looseChecksWords.empty).waitFor();
    },
  ],
  [
    'set up',
    async ({ page, check }) => {
      await page.goBack();
      await check.setUp('R-410A', 'fixed-orifice');
    },
  ],
  ['some readings', ({ check }) => check.read({ suctionPressure: '116.5', suctionLineTemperature: '57.3' })],
  ['typing', ({ check }) => check.reading('outdoorDryBulb').pressSequentially('92')],
  [
    'outside the band, by the example',
    async ({ check }) => {
      await check.reading('outdoorDryBulb').blur();
      await check.button(looseChecksWords.newCheck).click();
      await check.fillWithExample();
      await check.announced('Superheat is 9.5 °F above target').waitFor();
    },
  ],
  ['the math open', ({ check }) => check.button(checkPageWords.result.showMathOf('Superheat')).click()],
  [
    'where and how, open',
    ({ page }) =>
      page.getByRole('button', { name: new RegExp(checkPageWords.readings.howToLabel('Return wet bulb')) }).click(),
  ],
  ['before you read, open', ({ page }) => page.getByText(checkPageWords.preflight.title).click()],
  [
    'within the band',
    async ({ page, check }) => {
      await check.read({ suctionLineTemperature: '48' });
      await page
        .getByText(/^Superheat .*within/)
        .first()
        .waitFor();
    },
  ],
  [
    'stop',
    async ({ page, check }) => {
      await check.read({ suctionLineTemperature: '38' });
      await page.getByText(checkPageWords.result.stops, { exact: true }).first().waitFor();
    },
  ],
  [
    'entries that cannot be',
    async ({ page, check }) => {
      await check.read({ suctionLineTemperature: '57.3', returnWetBulb: '81', supplyDryBulb: 'about 58' });
      await page.getByText('is above return dry bulb').first().waitFor();
    },
  ],
  [
    'asked again after an adjustment',
    async ({ check }) => {
      await check.button(checkPageWords.visit.restart).click();
      await check.button(checkPageWords.visit.restart).click();
      await check.button(looseChecksWords.undo).waitFor();
    },
  ],
  ['the setup opened again', ({ check }) => check.button(checkPageWords.setup.changeLabel).click()],
  [
    'the port of the target asked',
    async ({ page, check }) => {
      await check.meteringDevice('txv').click({ force: true });
      await page
        .getByRole('radio', { name: setupWords.highSidePort.options.discharge.label, exact: true })
        .first()
        .click({ force: true });
      await page.getByText(setupWords.targetSubcoolingPort.label).waitFor();
      await page.getByText(checkPageWords.setup.more).click();
    },
  ],
  [
    'no network',
    async ({ page, context, check }) => {
      await check.goToReadings();
      await context.setOffline(true);
      await page.getByText(offlineWords.offline).waitFor();
    },
  ],
  [
    'checks listed',
    async ({ page, context, check }) => {
      await context.setOffline(false);
      await check.toTheList();
      await page.getByRole('listitem').first().waitFor();
    },
  ],
  [
    'a check deleted',
    async ({ page }) => {
      await page
        .getByRole('button', { name: /^Delete R-410A/ })
        .first()
        .click();
      await page.getByText(looseChecksWords.deleted).waitFor();
    },
  ],
];

describe.each([
  ['phone', PHONE],
  ['desktop', DESKTOP],
])('on a %s of %o', (_, viewport) => {
  it('every state is without a violation that axe-core finds, light and dark, and its controls are 48 px or more', async () => {
    const phone = await suite.newPhone({ viewport });
    const { page } = phone;
    const faults: string[] = [];
    for (const [name, reach] of STATES) {
      await reach(phone);
      for (const fault of await accessibilityFaults(page)) faults.push(`${name}: ${fault}`);
      // Only colours change in the dark.
      await page.emulateMedia({ colorScheme: 'dark' });
      for (const fault of await accessibilityFaults(page, ['color-contrast'])) faults.push(`${name}, dark: ${fault}`);
      await page.emulateMedia({ colorScheme: 'light' });
      for (const target of await smallTargets(page, TARGETS)) faults.push(`${name}: ${target}`);
    }
    expect(faults.join('\n')).toBe('');
  });
});

describe.each([
  ['320 px wide', { width: 320, height: 640 }, 1],
  // Zoomed to 200 %, a window of 1280 × 800 has half as many CSS pixels.
  ['at 200 % zoom', { width: 640, height: 400 }, 2],
])('%s', (_, viewport, deviceScaleFactor) => {
  it('nothing has to be scrolled sideways in any state', async () => {
    const phone = await suite.newPhone({ viewport, deviceScaleFactor });
    const wide: string[] = [];
    for (const [name, reach] of STATES) {
      await reach(phone);
      const overflow = await sidewaysOverflow(phone.page);
      if (overflow > 0) wide.push(`${name}: ${overflow} px too wide`);
    }
    expect(wide).toEqual([]);
  });
});
