/** The screenshots of the README, from the built page on the built server: `npm run screenshots` after `npm run build`. */
import path from 'node:path';
import { checkPageWords } from '@chargewright/wording';
import { CheckPage, HIGH_SUPERHEAT } from './harness/check-page';
import { closeBrowser, DESKTOP, newPhone, PHONE, type PhoneOptions } from './harness/phone';
import { startServer } from './harness/server';

const FOLDER = path.join(import.meta.dirname, 'screenshots');

/** A fixed orifice, everything stated and recorded, its superheat above the target. */
async function reachFinding(check: CheckPage): Promise<void> {
  await check.open();
  await check.refrigerant('R-410A').click({ force: true });
  await check.meteringDevice('fixed-orifice').click({ force: true });
  await check.button(checkPageWords.setup.confirmAssumed).click();
  await check.goToReadings();
  await check.setElevation('650');
  await check.read(HIGH_SUPERHEAT);
  await check.recordConditions();
  await check.page.getByText(checkPageWords.preflight.title).click();
  await check.announced('Superheat is 9.5 °F above target').waitFor();
}

async function photograph(origin: string, file: string, options: PhoneOptions, from: string): Promise<void> {
  const phone = await newPhone(origin, options);
  const check = new CheckPage(phone.page);
  await reachFinding(check);
  await phone.page
    .getByText(from)
    .first()
    .evaluate((element) => {
      (element.ownerDocument.activeElement as HTMLElement | null)?.blur();
      element.scrollIntoView({ block: 'start' });
    });
  await phone.page.screenshot({ path: path.join(FOLDER, file), scale: 'device' });
  await phone.close();
}

const server = await startServer();
try {
  await photograph(
    server.origin,
    'check-a-charge-phone.png',
    { viewport: PHONE, deviceScaleFactor: 1.5 },
    checkPageWords.sections.outdoors,
  );
  await photograph(server.origin, 'check-a-charge-desktop.png', { viewport: DESKTOP }, checkPageWords.shell.product);
} finally {
  await closeBrowser();
  await server.stop();
}
