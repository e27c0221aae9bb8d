import {
  airflowPageWords,
  airflowWords,
  checkPageWords,
  looseChecksWords,
  offlineWords,
  readingWords,
  worksheetWords,
} from '@chargewright/wording';
import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { accessibilityFaults } from './harness/axe';
import { sidewaysOverflow, smallTargets } from './harness/layout';
import { browserSuite } from './harness/suite';

const suite = browserSuite();

const TARGETS =
  'main a, main button, main summary, main select, main input[type=text], main textarea, main label:has(input[type=radio])';

/** The page as a person finds her way on it: by labels and roles only. */
class AirflowPage {
  constructor(readonly page: Page) {}

  async open(): Promise<void> {
    await this.page.goto('/airflow');
    await this.page.getByRole('heading', { name: airflowPageWords.title, exact: true }).waitFor();
    await this.page.getByText(worksheetWords.loading).waitFor({ state: 'detached' });
  }

  field(label: string, nth = 0) {
    return this.page.getByRole('textbox', { name: new RegExp(`^${label}`) }).nth(nth);
  }

  async type(values: Readonly<Record<string, string>>): Promise<void> {
    for (const [label, text] of Object.entries(values)) {
      await this.field(label).fill(text);
      await this.field(label).press('Tab');
    }
  }

  async choose(label: string): Promise<void> {
    await this.page.getByRole('radio', { name: new RegExp(`^${label}`) }).click({ force: true });
  }

  button(name: string) {
    return this.page.getByRole('button', { name, exact: true });
  }
}

/** 238 V × 41.5 A over 25.2 °F at 650 ft. */
async function byElectricHeat(airflow: AirflowPage): Promise<void> {
  await airflow.choose(airflowWords.methods['temperature-rise-electric'].label);
  await airflow.type({
    Volts: '238',
    Amps: '41.5',
    'Return air': '70.2',
    'Supply air': '95.4',
    Elevation: '650',
    'Nominal capacity': '3',
  });
}

describe('a technician in the attic', () => {
  it('finds the airflow by the electric heat, sees what it rests on, and takes it into the check', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await check.setUp('R-410A', 'fixed-orifice');
    const airflow = new AirflowPage(page);
    await airflow.open();
    await page.getByText(worksheetWords.forCheck('R-410A · Fixed orifice')).waitFor();
    await byElectricHeat(airflow);
    await page.getByText('1267 cfm', { exact: true }).waitFor();
    await page.getByText('± 128 cfm').first().waitFor();
    await page.getByText('422 cfm/ton').waitFor();
    // asked plainly: without an answer it does not go into the check
    await page.getByText(airflowPageWords.result.saySpeed).waitFor();
    expect(await airflow.button(airflowPageWords.result.use).count()).toBe(0);
    await airflow.choose(airflowPageWords.speed.answers.yes);
    await airflow.button(worksheetWords.showMath).first().click();
    await page.getByText('= 238.0 V × 41.5 A').waitFor();

    await airflow.button(airflowPageWords.result.use).click();
    await check.reading('returnDryBulb').waitFor();
    await page.getByText(checkPageWords.readings.moreReadings).click();
    expect(await airflow.field(readingWords.airflow.label).inputValue()).toBe('1267');
    await page.getByText(checkPageWords.readings.workedOut('128 cfm')).waitFor();
    await page.waitForTimeout(1000);
    await page.reload();
    await check.reading('returnDryBulb').waitFor();
    await page.getByText(checkPageWords.readings.moreReadings).click();
    expect(await airflow.field(readingWords.airflow.label).inputValue()).toBe('1267');
    await page.getByText(checkPageWords.readings.workedOut('128 cfm')).waitFor();
  });

  it('is told when the blower did not run at its cooling speed, and cannot use that airflow', async () => {
    const { page } = await suite.newPhone();
    const airflow = new AirflowPage(page);
    await airflow.open();
    await byElectricHeat(airflow);
    await airflow.choose(airflowPageWords.speed.answers.no);
    await page.getByText(airflowWords.reasons['other-blower-speed']).first().waitFor();
    await page.getByText('1267 cfm', { exact: true }).waitFor();
    expect(await airflow.button(airflowPageWords.result.use).count()).toBe(0);
    await page.getByText(airflowPageWords.capacity.needsAirflow).waitFor();
  });

  it('pastes the maker’s fan table and reads the airflow from the static pressures', async () => {
    const { page } = await suite.newPhone();
    const airflow = new AirflowPage(page);
    await airflow.open();
    await airflow.choose(airflowWords.methods['static-pressure'].label);
    await airflow.type({ 'Return static': '-0.25', 'Supply static': '0.25', 'Air through': '70', Elevation: '0' });
    const { table } = airflowPageWords;
    await page.getByText(table.paste).click();
    await page
      .getByRole('textbox', { name: new RegExp(`^${table.pasteBox}`) })
      .fill('ESP\tcfm\n0.3\t1300\n0.5\t1200\n0.7\t1080\n0.9\t–');
    await airflow.button(table.takeOver).click();
    await page.getByText(table.taken(4)).waitFor();
    await page
      .getByText(/^119[789] cfm$/)
      .first()
      .waitFor();
    await airflow.type({ 'Supply static': '0.55' });
    await page.getByText(airflowWords.reasons.dash).first().waitFor();
    // a cell that is no number is named, and nothing is lost
    await airflow.field(`${table.airflow}, ${table.row(1)}`).fill('high');
    await page.getByText(checkPageWords.readings.notANumber).waitFor();
    expect(await airflow.field(`${table.airflow}, ${table.row(2)}`).inputValue()).toBe('1200');
  });

  it('sees the capacity from the check’s own air readings', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await check.setUp('R-410A', 'fixed-orifice');
    await check.read({ returnDryBulb: '80', returnWetBulb: '67', supplyDryBulb: '58' });
    const airflow = new AirflowPage(page);
    await airflow.open();
    await byElectricHeat(airflow);
    await airflow.choose(airflowPageWords.speed.answers.yes);
    expect(await airflow.field(readingWords.returnWetBulb.label).inputValue()).toBe('67');
    await page.getByText('Not entered yet: supply wet bulb.').waitFor();
    await airflow.type({ [readingWords.supplyWetBulb.label]: '57' });
    await page.getByText(airflowPageWords.capacity.total, { exact: true }).waitFor();
    await page
      .getByText(/3\d{4} Btu\/h/)
      .first()
      .waitFor();
  });
});

describe('what was typed', () => {
  it('survives a reload, goes with its check, and can be emptied and put back', async () => {
    const { page, check } = await suite.newPhone();
    const airflow = new AirflowPage(page);
    await airflow.open();
    await byElectricHeat(airflow);
    await page.waitForTimeout(1000);
    await page.reload();
    await page.getByText('1267 cfm', { exact: true }).waitFor();
    expect(await airflow.field('Amps').inputValue()).toBe('41.5');
    await airflow.button(worksheetWords.startOver).click();
    await page.getByText(worksheetWords.emptied).waitFor();
    expect(await airflow.field('Amps').count()).toBe(0);
    await airflow.button(worksheetWords.undo).click();
    expect(await airflow.field('Amps').inputValue()).toBe('41.5');

    await check.open();
    await check.setUp('R-22', 'txv');
    await check.button(looseChecksWords.newCheck).filter({ visible: true }).click();
    await page.waitForTimeout(1000);
    await airflow.open();
    expect(await airflow.field('Amps').count()).toBe(0);
  });
});

describe('without a network', () => {
  it('the page opens and finds the airflow, though it was never open before', async () => {
    const phone = await suite.newPhone();
    const { page, check } = phone;
    await check.open();
    await page.getByText(offlineWords.ready).waitFor({ timeout: 30_000 });
    await suite.server().stop();
    phone.expectOffline(true);
    const airflow = new AirflowPage(page);
    await airflow.open();
    await byElectricHeat(airflow);
    await page.getByText('1267 cfm', { exact: true }).waitFor();
    await suite.server().restart();
  });
});

describe('everybody', () => {
  const STATES: readonly (readonly [name: string, (airflow: AirflowPage) => Promise<void>])[] = [
    ['nothing chosen', (airflow) => airflow.open()],
    ['electric heat', byElectricHeat],
    [
      'the math open',
      async (airflow) => {
        await airflow.choose(airflowPageWords.speed.answers.yes);
        await airflow.button(worksheetWords.showMath).first().click();
      },
    ],
    ['an entry that cannot be', (airflow) => airflow.type({ Elevation: '99000', Amps: 'many' })],
    ['gas heat', (airflow) => airflow.choose(airflowWords.methods['temperature-rise-gas'].label)],
    ['measured', (airflow) => airflow.choose(airflowWords.methods.measured.label)],
    [
      'the fan table',
      async (airflow) => {
        await airflow.choose(airflowWords.methods['static-pressure'].label);
        await airflow.page.getByText(airflowPageWords.table.paste).click();
      },
    ],
  ];

  it('can use it: no violation that axe-core finds, light and dark, controls of 48 px', async () => {
    const { page } = await suite.newPhone();
    const airflow = new AirflowPage(page);
    const faults: string[] = [];
    for (const [name, reach] of STATES) {
      await reach(airflow);
      for (const fault of await accessibilityFaults(page)) faults.push(`${name}: ${fault}`);
      await page.emulateMedia({ colorScheme: 'dark' });
      for (const fault of await accessibilityFaults(page, ['color-contrast'])) faults.push(`${name}, dark: ${fault}`);
      await page.emulateMedia({ colorScheme: 'light' });
      for (const target of await smallTargets(page, TARGETS)) faults.push(`${name}: ${target}`);
    }
    expect(faults.join('\n')).toBe('');
  });

  it('reads it on the narrowest phone without scrolling sideways', async () => {
    const { page } = await suite.newPhone({ viewport: { width: 320, height: 640 } });
    const airflow = new AirflowPage(page);
    const wide: string[] = [];
    for (const [name, reach] of STATES) {
      await reach(airflow);
      const overflow = await sidewaysOverflow(page);
      if (overflow > 0) wide.push(`${name}: ${overflow} px too wide`);
    }
    expect(wide).toEqual([]);
  });
});
