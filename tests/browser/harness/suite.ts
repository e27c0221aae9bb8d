import { afterAll, afterEach, beforeAll, expect } from 'vitest';
import { CheckPage } from './check-page';
import { closeBrowser, newPhone, type Phone, type PhoneOptions } from './phone';
import { type RunningServer, startServer } from './server';

/** A server for the tests of one file; every phone is looked at for what a page must never do, and put away, after its test. */
export function browserSuite() {
  const phones: Phone[] = [];
  let running: RunningServer | undefined;
  const server = () => {
    if (!running) throw new Error('the server runs only while a test does');
    return running;
  };

  beforeAll(async () => {
    running = await startServer();
  });

  afterEach(async () => {
    const faults = phones.flatMap((phone) => phone.faults);
    for (const phone of phones.splice(0)) await phone.close();
    expect(faults, 'requests to other origins, errors on the console, breaches of the security policy').toEqual([]);
  });

  afterAll(async () => {
    await closeBrowser();
    await running?.stop();
  });

  return {
    server,
    async newPhone(options: PhoneOptions = {}): Promise<Phone & { readonly check: CheckPage }> {
      const phone = await newPhone(server().origin, options);
      phones.push(phone);
      return { ...phone, check: new CheckPage(phone.page) };
    },
  };
}
