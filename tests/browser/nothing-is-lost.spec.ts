/// <reference lib="dom" />
import { checkPageWords, looseChecksWords } from '@chargewright/wording';
import { afterAll, describe, expect, it } from 'vitest';
import { CheckPage } from './harness/check-page';
import { MortalPhone } from './harness/phone';
import { putRow, rowsOf } from './harness/stored-rows';
import { browserSuite } from './harness/suite';

const suite = browserSuite();
const ONE_SECOND = 1000;

describe('what was typed', () => {
  it('survives a reload, committed or not', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await check.setUp('R-22', 'txv');
    await check.read({ suctionPressure: '68.50' });
    await check.reading('outdoorDryBulb').pressSequentially('91,');
    await page.waitForTimeout(ONE_SECOND);
    await page.reload();
    await check.reading('suctionPressure').waitFor();
    expect(await check.reading('suctionPressure').inputValue()).toBe('68.50');
    expect(await check.reading('outdoorDryBulb').inputValue()).toBe('91,');
    await page.getByText('R-22 · TXV').waitFor();
  });

  it('survives the way to the list and back', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await check.setUp('R-22', 'txv');
    await check.reading('suctionPressure').pressSequentially('68.5');
    await check.toTheList();
    await page.goBack();
    expect(await check.reading('suctionPressure').inputValue()).toBe('68.5');
  });

  it('survives leaving for another address and coming back with the phone’s key', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await check.setUp('R-22', 'txv');
    await check.reading('suctionPressure').pressSequentially('68.5');
    await page.goto('/api/v1/refrigerants');
    await page.goBack();
    await check.reading('suctionPressure').waitFor();
    expect(await check.reading('suctionPressure').inputValue()).toBe('68.5');
  });

  it('is kept from tab to tab: two tabs on one check add to it and overwrite nothing', async () => {
    const { page, context, check } = await suite.newPhone();
    await check.open();
    await check.setUp('R-22', 'txv');
    await page.waitForTimeout(ONE_SECOND);
    const other = new CheckPage(await context.newPage());
    await other.open();
    await other.read({ suctionPressure: '68.5' });
    await check.read({ outdoorDryBulb: '91' });
    await expect.poll(() => check.reading('suctionPressure').inputValue()).toBe('68.5');
    await expect.poll(() => other.reading('outdoorDryBulb').inputValue()).toBe('91');
    await page.reload();
    await check.reading('suctionPressure').waitFor();
    expect(await check.reading('suctionPressure').inputValue()).toBe('68.5');
    expect(await check.reading('outdoorDryBulb').inputValue()).toBe('91');
  });
});

describe('an empty battery', () => {
  let phone: MortalPhone | undefined;
  afterAll(() => phone?.discard());

  it('takes nothing that was typed a second before', async () => {
    phone = new MortalPhone(suite.server().origin);
    const before = await phone.switchOn();
    const check = new CheckPage(before.page);
    await check.open();
    await check.setUp('R-410A', 'fixed-orifice');
    await check.read({ suctionPressure: '116.5' });
    await check.reading('suctionLineTemperature').pressSequentially('57.3');
    await before.page.waitForTimeout(ONE_SECOND);
    phone.kill();
    await before.context.close().catch(() => undefined);

    const after = await phone.switchOn();
    const again = new CheckPage(after.page);
    await again.open();
    expect(await again.reading('suctionPressure').inputValue()).toBe('116.5');
    expect(await again.reading('suctionLineTemperature').inputValue()).toBe('57.3');
    expect([...before.faults, ...after.faults]).toEqual([]);
    await after.close();
  });
});

describe('a damaged entry in the phone’s store', () => {
  it('is put aside and told; the check goes on with what is sound', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await check.setUp('R-22', 'txv');
    await check.read({ suctionPressure: '68.5' });
    await page.waitForTimeout(ONE_SECOND);
    await putRow(page, { id: 'torn', kind: 'reading', schema: 1, body: { checkId: 7 } });
    await page.reload();
    await page.getByText(looseChecksWords.setAside(1)).waitFor();
    expect(await check.reading('suctionPressure').inputValue()).toBe('68.5');
    expect(await rowsOf(page, 'quarantine')).toHaveLength(1);
    await check.read({ outdoorDryBulb: '91' });
    await page.getByText(checkPageWords.result.title, { exact: true }).first().waitFor();
  });

  it('that is the check itself leaves its readings', async () => {
    const { page, check } = await suite.newPhone();
    await check.open();
    await check.setUp('R-22', 'txv');
    await check.read({ suctionPressure: '68.5' });
    await page.waitForTimeout(ONE_SECOND);
    const row = (await rowsOf(page, 'rows')).find(({ kind }) => kind === 'check');
    await putRow(page, { ...row, body: null });
    await page.reload();
    await page.getByText(looseChecksWords.setAside(1)).waitFor();
    await check.setUp('R-22', 'txv');
    expect(await check.reading('suctionPressure').inputValue()).toBe('68.5');
  });
});

describe('a phone that stores nothing', () => {
  it('says so, and judges all the same', async () => {
    const { page, context, check } = await suite.newPhone({ alone: true });
    await context.addInitScript(() => {
      IDBFactory.prototype.open = () => {
        throw new DOMException('denied', 'SecurityError');
      };
    });
    await check.open();
    await page.getByText(looseChecksWords.memoryOnly).waitFor();
    await check.fillWithExample();
    await check.announced('Superheat is 9.5 °F above target').waitFor();
  });
});
