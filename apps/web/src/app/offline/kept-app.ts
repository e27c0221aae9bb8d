interface Manifest {
  readonly assetGroups: readonly { readonly urls: readonly string[] }[];
}

/** What is needed of the browser, so that a test can stand in for it. */
export interface KeptAppPorts {
  readonly fetch: (url: string, init: RequestInit) => Promise<Response>;
  readonly isCached: (url: string) => Promise<boolean>;
}

/** What Angular's worker answers when it reaches no network. */
const NO_NETWORK = 504;

/**
 * Whether every file of the app lies in the phone's cache. Angular's worker says that it is there, not that it has fetched everything, and
 * "ready to work without a network" must not be said a file too early.
 *
 * The request goes through the worker on purpose: by it the worker comes to know a page that was loaded before it, keeps that page to its
 * own version of the app and tells it of newer ones.
 */
export async function isAppKept({ fetch, isCached }: KeptAppPorts): Promise<boolean> {
  const response = await fetch('ngsw.json', { cache: 'no-store' });
  // The worker answered in place of the network: then this page, too, came out of its cache.
  if (response.status === NO_NETWORK) return true;
  if (!response.ok) return false;
  const manifest = (await response.json()) as Manifest;
  const urls = manifest.assetGroups.flatMap((group) => group.urls);
  const cached = await Promise.all(urls.map(isCached));
  return urls.length > 0 && cached.every(Boolean);
}
