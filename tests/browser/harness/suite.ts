import { afterAll, afterEach, beforeAll, expect } from 'vitest';
import { CheckPage } from './check-page';
import { closeBrowser, isTouched, newPhone, type Phone, type PhoneOptions } from './phone';
import { type RunningServer, startServer } from './server';

export interface SuitePhoneOptions extends PhoneOptions {
  /** The test changes what wiping does not undo, or needs a browser that never loaded anything. */
  readonly alone?: boolean;
}

/** What a page cannot change; phones alike in it are wiped and handed out again. */
const kindOf = ({ viewport, deviceScaleFactor = 1 }: PhoneOptions) =>
  `${deviceScaleFactor} ${viewport === undefined || isTouched(viewport)}`;

/** A server for the tests of one file; every phone is looked at for what a page must never do, and put away, after its test. */
export function browserSuite() {
  const phones: (readonly [phone: Phone, kind: string | undefined])[] = [];
  const idle = new Map<string, Phone>();
  let running: RunningServer | undefined;
  const server = () => {
    if (!running) throw new Error('the server runs only while a test does');
    return running;
  };

  beforeAll(async () => {
    running = await startServer();
  });

  afterEach(async () => {
    const faults = phones.flatMap(([phone]) => phone.faults);
    for (const [phone, kind] of phones.splice(0)) {
      if (kind === undefined || phone.faults.length > 0 || idle.has(kind)) await phone.close();
      else idle.set(kind, phone);
    }
    expect(faults, 'requests to other origins, errors on the console, breaches of the security policy').toEqual([]);
  });

  afterAll(async () => {
    await closeBrowser();
    await running?.stop();
  });

  return {
    server,
    async newPhone({ alone = false, ...options }: SuitePhoneOptions = {}): Promise<
      Phone & { readonly check: CheckPage }
    > {
      const kind = alone ? undefined : kindOf(options);
      const used = kind === undefined ? undefined : idle.get(kind);
      if (kind !== undefined) idle.delete(kind);
      const phone = (await used?.wiped(options)) ?? (await newPhone(server().origin, options));
      phones.push([phone, kind]);
      return { ...phone, check: new CheckPage(phone.page) };
    },
  };
}
