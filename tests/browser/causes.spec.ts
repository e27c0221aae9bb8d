import { causeText, measurementText, readingWords, separatingTestWords } from '@chargewright/wording';
import { describe, expect, it } from 'vitest';
import { accessibilityFaults } from './harness/axe';
import { sidewaysOverflow, smallTargets } from './harness/layout';
import { browserSuite } from './harness/suite';

const suite = browserSuite();
const words = separatingTestWords;
/** Boxes to tick and choices are hit by their labels. */
const TARGETS = ['button', 'summary', 'input[type=text]', 'label:has(input)']
  .flatMap((each) => [`app-diagnosis-card ${each}`, `app-separating-tests ${each}`])
  .join();

describe('somebody who wants to know why', () => {
  it('sees the causes that fit, what speaks for them, and is led to what would tell', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await check.fillWithExample();
    const cause = page.getByRole('article', { name: causeText('low-charge'), exact: true });
    await cause.waitFor();
    expect(await page.locator('app-diagnosis-card article').count()).toBe(1);
    expect(await cause.innerText()).toMatch(/Fits: Superheat is 9\.5 °F ± [\d.]+ °F above its target/);
    await check.button(words.goThereFor(measurementText('leak-search'))).click();
    const radio = page.locator('input[name="leakSearch"]').first();
    await expect.poll(() => radio.evaluate((each) => each === each.ownerDocument.activeElement)).toBe(true);
  });

  it('measures the drop over the drier, and the result and the next step follow, also after a reload', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await check.fillWithExample();
    const guide = page.locator('app-separating-tests details').filter({ hasText: words.guides.drier.name });
    await guide.locator('summary').click();
    await check.type(readingWords.drierInletTemperature.label, '100');
    await check.type(readingWords.drierOutletTemperature.label, '91');
    const shown = async () => {
      await page
        .getByText(/^9\.0 °F ± [\d.]+ °F, more than about 3 °F: a restriction\.$/)
        .waitFor({ state: 'attached' });
      await page.getByRole('article', { name: causeText('restriction'), exact: true }).waitFor();
      expect(await page.locator('app-next-step-note').innerText()).toContain('Look for a restriction');
    };
    await shown();
    expect(await accessibilityFaults(page)).toEqual([]);
    expect(await sidewaysOverflow(page)).toBe(0);
    expect(await smallTargets(page, TARGETS)).toEqual([]);
    // stored within a second of the last key
    await page.waitForTimeout(1500);
    await page.reload();
    await shown();
  });
});
