import { describe, expect, it } from 'vitest';
import { isAppKept } from './kept-app';

const manifest = { assetGroups: [{ urls: ['/index.html', '/main.js'] }, { urls: ['/icons/icon.svg'] }] };
const answering =
  (body: unknown, status = 200) =>
  () =>
    Promise.resolve(new Response(JSON.stringify(body), { status }));
const holding =
  (...urls: string[]) =>
  (url: string) =>
    Promise.resolve(urls.includes(url));

describe('isAppKept', () => {
  it('is true when every file of the manifest is in the cache', async () => {
    const isCached = holding('/index.html', '/main.js', '/icons/icon.svg');
    expect(await isAppKept({ fetch: answering(manifest), isCached })).toBe(true);
  });

  it('is false when one file is missing', async () => {
    expect(await isAppKept({ fetch: answering(manifest), isCached: holding('/index.html', '/main.js') })).toBe(false);
  });

  it('is true when the worker answers in place of the network', async () => {
    expect(await isAppKept({ fetch: answering('', 504), isCached: holding() })).toBe(true);
  });

  it('is false without a manifest, or with an empty one', async () => {
    expect(await isAppKept({ fetch: answering(manifest, 500), isCached: () => Promise.resolve(true) })).toBe(false);
    expect(await isAppKept({ fetch: answering({ assetGroups: [] }), isCached: () => Promise.resolve(true) })).toBe(
      false,
    );
  });
});
