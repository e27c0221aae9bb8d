import { type MeteringDevice, type ReadingId } from '@chargewright/engine';
import { checkPageWords, looseChecksWords, readingWords, setupWords } from '@chargewright/wording';
import type { Locator, Page } from 'playwright-core';

export type Readings = Readonly<Partial<Record<ReadingId, string>>>;

/** A fixed orifice whose superheat lies 9.5 °F above its target: the example of the page, typed by hand. */
export const HIGH_SUPERHEAT: Readings = {
  suctionPressure: '116.5',
  suctionLineTemperature: '57.3',
  outdoorDryBulb: '92',
  liquidPressure: '342',
  liquidLineTemperature: '101.5',
  returnDryBulb: '78.2',
  supplyDryBulb: '57.6',
  returnWetBulb: '64.5',
};

/** The page Check a charge as a person finds her way on it: by labels and roles only. */
export class CheckPage {
  readonly page: Page;

  constructor(page: Page) {
    this.page = page;
  }

  async open(): Promise<void> {
    await this.page.goto('/');
    await this.page.getByRole('main').waitFor();
    await this.page.getByText(checkPageWords.shell.loading).waitFor({ state: 'detached' });
  }

  button(name: string): Locator {
    return this.page.getByRole('button', { name, exact: true });
  }

  field(label: string): Locator {
    return this.page.getByRole('textbox', { name: label, exact: true });
  }

  reading(id: ReadingId): Locator {
    return this.field(readingWords[id].label);
  }

  refrigerant(id: string): Locator {
    return this.page.getByRole('radio', { name: id, exact: true });
  }

  meteringDevice(device: MeteringDevice): Locator {
    const { label, hint } = setupWords.meteringDevice.options[device];
    return this.page.getByRole('radio', { name: `${label} ${hint}`, exact: true });
  }

  /** Chooses what has to be chosen, and goes to the readings. */
  async setUp(refrigerant: string, device: MeteringDevice): Promise<void> {
    await this.refrigerant(refrigerant).click({ force: true });
    await this.meteringDevice(device).click({ force: true });
    await this.goToReadings();
  }

  async goToReadings(): Promise<void> {
    const done = this.button(checkPageWords.setup.done);
    if ((await done.count()) > 0) await done.filter({ visible: true }).click();
    await this.reading('returnDryBulb').waitFor();
  }

  async type(label: string, text: string): Promise<void> {
    await this.field(label).fill(text);
    await this.field(label).press('Tab');
  }

  async read(readings: Readings): Promise<void> {
    for (const [id, text] of Object.entries(readings)) await this.type(readingWords[id as ReadingId].label, text);
  }

  async setElevation(feet: string): Promise<void> {
    await this.button(checkPageWords.setup.changeLabel).click();
    await this.type(setupWords.numbers.elevation.label, feet);
    await this.goToReadings();
  }

  async setRunningMinutes(minutes: string): Promise<void> {
    await this.page.getByText(checkPageWords.visit.earlier).click();
    await this.field(checkPageWords.visit.setMinutes).fill(minutes);
    await this.field(checkPageWords.visit.setMinutes).press('Enter');
  }

  /** Judged fit for the test: everything looked at, the system running long enough. */
  async recordConditions(): Promise<void> {
    await this.setRunningMinutes('22');
    await this.page.getByText(checkPageWords.preflight.title).click();
    for (const group of await this.page
      .getByRole('group')
      .filter({ has: this.page.getByRole('radio', { name: checkPageWords.preflight.states.ok, exact: true }) })
      .all()) {
      const ok = group.getByRole('radio', { name: checkPageWords.preflight.states.ok, exact: true });
      if ((await ok.count()) === 1) await ok.check({ force: true });
    }
  }

  /** The finding as it is said to screen readers, once it is there. */
  announced(headline: string): Locator {
    return this.page.getByRole('status').filter({ hasText: checkPageWords.result.announce(headline) });
  }

  async fillWithExample(): Promise<void> {
    await this.button(checkPageWords.example.button).click();
    await this.reading('suctionPressure').waitFor();
  }

  async toTheList(): Promise<void> {
    await this.page.getByRole('link', { name: new RegExp(`^${looseChecksWords.open}`) }).click();
    await this.page.getByRole('heading', { name: looseChecksWords.title }).waitFor();
  }

  /** What assistive technology reads of a criterion's card. */
  async card(name: string): Promise<string> {
    const cards = this.page
      .locator('app-criterion-card')
      .filter({ has: this.page.getByRole('heading', { name: new RegExp(`^${name}`) }) });
    return cards.first().innerText();
  }
}

/** Presses Tab until the control has the focus, as somebody without a mouse does. */
export async function tabTo(page: Page, control: Locator, most = 80): Promise<void> {
  for (let pressed = 0; pressed < most; pressed += 1) {
    const focused = await control
      .evaluate((element) => element === element.ownerDocument.activeElement)
      .catch(() => false);
    if (focused) return;
    await page.keyboard.press('Tab');
  }
  throw new Error(`Not reached by ${most} tabs: ${control.toString()}`);
}
