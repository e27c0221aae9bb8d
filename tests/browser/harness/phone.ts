import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { type Browser, type BrowserContext, chromium, type Page } from 'playwright-core';

export const PHONE = { width: 390, height: 844 };
export const DESKTOP = { width: 1280, height: 800 };

// Playwright then tells of the requests that the service worker makes, too.
process.env['PW_EXPERIMENTAL_SERVICE_WORKER_NETWORK_EVENTS'] = '1';

const LAUNCH = {
  executablePath: process.env['CHROMIUM_PATH'] ?? '/usr/bin/chromium',
  args: [
    '--no-sandbox',
    '--disable-gpu',
    '--disable-background-networking',
    '--disable-component-update',
    '--disable-sync',
    '--no-first-run',
  ],
};

export interface PhoneOptions {
  readonly viewport?: { readonly width: number; readonly height: number };
  readonly colorScheme?: 'light' | 'dark';
  readonly deviceScaleFactor?: number;
}

export const isTouched = ({ width }: { readonly width: number }): boolean => width < 600;

const contextOptions = ({ viewport = PHONE, colorScheme = 'light', deviceScaleFactor = 1 }: PhoneOptions) => ({
  viewport: { ...viewport },
  colorScheme,
  deviceScaleFactor,
  locale: 'en-US',
  hasTouch: isTouched(viewport),
  reducedMotion: 'reduce' as const,
});

/** What a page must never do: leave its origin, break its own security policy, or fail unseen. */
class Watch {
  readonly faults: string[] = [];
  /** Set while the server is stopped on purpose: then requests fail, and the browser says so on the console. */
  offline = false;

  constructor(context: BrowserContext, origin: string) {
    context.on('request', (request) => {
      const url = request.url();
      if (!url.startsWith(`${origin}/`) && !/^(data|blob):/.test(url)) this.faults.push(`request to ${url}`);
    });
    context.on('console', (message) => {
      if (message.type() !== 'error') return;
      if (this.offline && /ERR_CONNECTION_REFUSED|ERR_FAILED|504|Failed to fetch|failed to fetch/i.test(message.text()))
        return;
      this.faults.push(`console: ${message.text()} ${message.location().url}`);
    });
    context.on('weberror', (error) => this.faults.push(`uncaught: ${error.error().stack ?? error.error().message}`));
  }
}

/** A browser context and one page in it, with everything it must not do noted in `faults`. */
export interface Phone {
  readonly page: Page;
  readonly context: BrowserContext;
  readonly faults: readonly string[];
  expectOffline(offline: boolean): void;
  /** The same phone with an empty store, no worker and one new page, much sooner there than another phone. */
  wiped(options: PhoneOptions): Promise<Phone>;
  close(): Promise<void>;
}

let shared: Promise<Browser> | undefined;
const browser = () => (shared ??= chromium.launch(LAUNCH));

export async function closeBrowser(): Promise<void> {
  const running = await shared;
  shared = undefined;
  await running?.close();
}

/** A phone that was never on the page: no store, no worker. */
export async function newPhone(origin: string, options: PhoneOptions = {}): Promise<Phone> {
  const context = await (await browser()).newContext({ ...contextOptions(options), baseURL: origin });
  return watched(context, origin);
}

async function watched(context: BrowserContext, origin: string): Promise<Phone> {
  return phoneOf(context, origin, new Watch(context, origin), context.pages()[0] ?? (await context.newPage()));
}

function phoneOf(context: BrowserContext, origin: string, watch: Watch, page: Page): Phone {
  page.setDefaultTimeout(10_000);
  return {
    page,
    context,
    faults: watch.faults,
    expectOffline: (offline) => {
      watch.offline = offline;
    },
    wiped: async ({ viewport = PHONE, colorScheme = 'light' }) => {
      const next = await context.newPage();
      for (const old of context.pages()) if (old !== next) await old.close();
      await context.setOffline(false);
      const session = await context.newCDPSession(next);
      await session.send('Storage.clearDataForOrigin', { origin, storageTypes: 'all' });
      await session.detach();
      await next.setViewportSize({ ...viewport });
      await next.emulateMedia({ colorScheme });
      watch.offline = false;
      return phoneOf(context, origin, watch, next);
    },
    close: () => context.close(),
  };
}

/** A phone whose browser can be killed without a chance to say goodbye, and started again with what it had stored. */
export class MortalPhone {
  readonly #profile = mkdtempSync(path.join(tmpdir(), 'chargewright-profile-'));
  readonly #origin: string;
  #process: number | undefined;

  constructor(origin: string) {
    this.#origin = origin;
  }

  async switchOn(): Promise<Phone> {
    const context = await chromium.launchPersistentContext(this.#profile, {
      ...LAUNCH,
      ...contextOptions({}),
      baseURL: this.#origin,
    });
    const session = await context.browser()?.newBrowserCDPSession();
    const { processInfo } = (await session?.send('SystemInfo.getProcessInfo')) ?? { processInfo: [] };
    this.#process = processInfo.find(({ type }) => type === 'browser')?.id;
    return watched(context, this.#origin);
  }

  /** As an empty battery does it: no event reaches the page. */
  kill(): void {
    if (this.#process === undefined) throw new Error('the phone is not on');
    process.kill(this.#process, 'SIGKILL');
    this.#process = undefined;
  }

  discard(): void {
    rmSync(this.#profile, { recursive: true, force: true, maxRetries: 5, retryDelay: 200 });
  }
}
