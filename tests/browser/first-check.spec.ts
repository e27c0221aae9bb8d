import { checkPageWords, loadReadingHelp, looseChecksWords, readingWords, setupWords } from '@chargewright/wording';
import { describe, expect, it } from 'vitest';
import { HIGH_SUPERHEAT, tabTo } from './harness/check-page';
import { browserSuite } from './harness/suite';

const suite = browserSuite();

describe('somebody who was never here', () => {
  it('reaches a finding for a fixed orifice with the keyboard alone', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await tabTo(page, check.refrigerant('R-410A'));
    await page.keyboard.press('Space');
    await tabTo(page, check.meteringDevice('fixed-orifice'));
    await page.keyboard.press('Space');
    await tabTo(
      page,
      check.button(checkPageWords.setup.done).or(check.reading('suctionPressure')).filter({ visible: true }).first(),
    );
    if ((await check.button(checkPageWords.setup.done).filter({ visible: true }).count()) > 0)
      await page.keyboard.press('Enter');
    await tabTo(page, check.reading('suctionPressure'));
    // Enter leads from reading to reading, in the order in which they are asked.
    for (const id of [
      'suctionPressure',
      'suctionLineTemperature',
      'outdoorDryBulb',
      'liquidPressure',
      'liquidLineTemperature',
      'returnDryBulb',
      'returnWetBulb',
      'supplyDryBulb',
    ] as const) {
      expect(await check.reading(id).evaluate((input) => input === input.ownerDocument.activeElement), id).toBe(true);
      await page.keyboard.type(HIGH_SUPERHEAT[id] ?? '');
      await page.keyboard.press('Enter');
    }
    await check.page
      .getByText(/^Superheat is .* above target$/)
      .first()
      .waitFor();
    expect(await check.card('Superheat')).toContain('above target');
  });

  it('reaches a finding for a TXV: subcooling against the nameplate', async () => {
    const { check } = await suite.newPhone();
    await check.open();
    await check.setUp('R-410A', 'txv');
    await check.type(setupWords.numbers.targetSubcooling.label, '10');
    await check.read({ ...HIGH_SUPERHEAT, liquidPressure: '400', liquidLineTemperature: '98' });
    await check.page
      .getByText(/^Subcooling is .* above target$/)
      .first()
      .waitFor();
    expect(await check.card('Subcooling')).toMatch(/Target 10(\.0)? °F/);
  });

  it('sees at once what a finding looks like, by an example that says what it is', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await check.fillWithExample();
    await check.announced('Superheat is 9.5 °F above target').waitFor();
    await page.getByText(checkPageWords.example.note).waitFor();
    expect(await page.getByText(checkPageWords.readings.example).count()).toBeGreaterThanOrEqual(8);
    await check.button(checkPageWords.example.clear).click();
    await check.refrigerant('R-410A').waitFor();
    expect(await check.refrigerant('R-410A').isChecked()).toBe(false);
    await check.button(looseChecksWords.undo).click();
    await check.announced('Superheat is 9.5 °F above target').waitFor();
  });

  it('is told before any reading that a mini-split cannot be judged by readings', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await check.refrigerant('R-32').click({ force: true });
    await check.meteringDevice('eev').click({ force: true });
    await page
      .getByRole('radio', { name: setupWords.kind.options['mini-split'].label, exact: true })
      .click({ force: true });
    await check.goToReadings();
    await page
      .getByText(/^Weigh the charge in, or use the maker’s test mode/)
      .first()
      .waitFor();
    expect(await check.button(checkPageWords.result.nextReading).count()).toBe(0);
  });

  it('states which port a target holds for, where the gauge is at the discharge port', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await check.refrigerant('R-410A').click({ force: true });
    await check.meteringDevice('txv').click({ force: true });
    const discharge = page.getByRole('radio', { name: setupWords.highSidePort.options.discharge.label, exact: true });
    await discharge.first().click({ force: true });
    await check.goToReadings();
    await check.type(setupWords.numbers.targetSubcooling.label, '10');
    const { liquidPressure: _, ...readings } = HIGH_SUPERHEAT;
    await check.read({ ...readings, dischargePressure: '400', liquidLineTemperature: '98' });
    await page
      .getByText(/The target holds for another high-side port/)
      .first()
      .waitFor();
    await check.button(checkPageWords.result.placeButton.readings).click();
    await page.locator('input[name="targetSubcoolingPort"]:focus').waitFor({ state: 'attached' });
    await page.keyboard.press('ArrowRight');
    await page
      .getByText(/^Subcooling is .* above target$/)
      .first()
      .waitFor();
  });

  it('is told at each reading where and how to take it, and the usual mistake', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await check.setUp('R-22', 'fixed-orifice');
    const { label, place } = readingWords.returnWetBulb;
    const { how, mistake } = (await loadReadingHelp()).returnWetBulb;
    await page.getByRole('button', { name: new RegExp(checkPageWords.readings.howToLabel(label)) }).click();
    for (const text of [place, how, mistake]) await page.getByText(text, { exact: true }).last().waitFor();
  });

  it('sees how the number came about', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await check.fillWithExample();
    await check.button(checkPageWords.result.showMathOf('Superheat')).click();
    await page.getByText('57.3 °F − 39.0 °F').filter({ visible: true }).first().waitFor();
  });
});

describe('what is typed', () => {
  it('stays as typed when the units are switched there and back; results follow the units', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await check.setUp('R-410A', 'fixed-orifice');
    await check.read({ ...HIGH_SUPERHEAT, returnWetBulb: '64.50' });
    const units = page.getByLabel(checkPageWords.units.choose);
    await units.selectOption('C-kPa');
    await page
      .getByText(/^Superheat is .* °C above target$/)
      .first()
      .waitFor();
    expect(await check.reading('returnWetBulb').inputValue()).toBe('64.50');
    await units.selectOption('F-psi');
    await page
      .getByText(/^Superheat is .* °F above target$/)
      .first()
      .waitFor();
    expect(await check.reading('returnWetBulb').inputValue()).toBe('64.50');
    expect(await check.reading('suctionPressure').inputValue()).toBe('116.5');
  });

  it('may have a decimal comma', async () => {
    const { check } = await suite.newPhone();
    await check.open();
    await check.setUp('R-410A', 'fixed-orifice');
    await check.read(HIGH_SUPERHEAT);
    await check.page
      .getByText(/^Superheat is .* above target$/)
      .first()
      .waitFor();
    const withPoint = await check.card('Superheat');
    await check.read({ suctionLineTemperature: '57,3', returnWetBulb: '64,5' });
    expect(await check.reading('suctionLineTemperature').inputValue()).toBe('57,3');
    expect(await check.card('Superheat')).toBe(withPoint);
  });

  it('is answered beside its field when it cannot be, and stays; the others are judged on', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await check.setUp('R-410A', 'fixed-orifice');
    await check.read({ ...HIGH_SUPERHEAT, supplyDryBulb: 'about 58', returnWetBulb: '81' });
    const describedBy = async (id: 'supplyDryBulb' | 'returnWetBulb') => {
      const ids = (await check.reading(id).getAttribute('aria-describedby')) ?? '';
      const texts = await Promise.all(
        ids
          .split(' ')
          .filter(Boolean)
          .map((each) => page.locator(`[id="${each}"]`).allInnerTexts()),
      );
      return texts.flat().join(' ');
    };
    expect(await check.reading('supplyDryBulb').inputValue()).toBe('about 58');
    expect(await check.reading('supplyDryBulb').getAttribute('aria-invalid')).toBe('true');
    expect(await describedBy('supplyDryBulb')).toContain(checkPageWords.readings.notANumber);
    expect(await check.reading('returnWetBulb').inputValue()).toBe('81');
    expect(await describedBy('returnWetBulb')).toContain('Return wet bulb 81 °F is above return dry bulb 78.2 °F');
    expect(await check.card('Superheat')).toContain('18.');
    await check.read({ supplyDryBulb: '58', returnWetBulb: '64.5' });
    await expect.poll(() => page.locator('[aria-invalid="true"]').count()).toBe(0);
  });

  it('may be relative humidity in place of wet bulb', async () => {
    const { check } = await suite.newPhone();
    await check.open();
    await check.setUp('R-410A', 'fixed-orifice');
    await check.button(checkPageWords.readings.useHumidity).click();
    const { returnWetBulb: _, ...readings } = HIGH_SUPERHEAT;
    await check.read({ ...readings, returnRelativeHumidity: '47' });
    await check.page
      .getByText(/^Superheat is .* above target$/)
      .first()
      .waitFor();
  });
});
