import { readFileSync } from 'node:fs';
import path from 'node:path';
import { gzipSync } from 'node:zlib';
import { WEB_ROOT } from './server';

const read = (file: string) => readFileSync(path.join(WEB_ROOT, file));

/** Files are compressed by the server, except those that are compressed in themselves. */
export const downloadBytes = (file: string, body: Buffer = read(file)): number =>
  /\.(woff2|png)$/.test(file) ? body.length : gzipSync(body, { level: 9 }).length;

const matches = (text: string, pattern: RegExp): string[] => [...text.matchAll(pattern)].map((match) => match[1] ?? '');

/** Files that `index.html` asks for, and everything these import at once; not what they load later. */
export function staticGraph(): string[] {
  const html = read('index.html').toString();
  const waiting = [
    ...matches(html, /<script[^>]+src="([^"]+)"/g),
    ...matches(html, /<link[^>]+rel="(?:modulepreload|stylesheet)"[^>]+href="([^"]+)"/g),
    ...matches(html, /<link[^>]+href="([^"]+)"[^>]+rel="(?:modulepreload|stylesheet)"/g),
  ];
  const found = new Set(['index.html']);
  for (let file = waiting.pop(); file !== undefined; file = waiting.pop()) {
    if (found.has(file)) continue;
    found.add(file);
    if (file.endsWith('.js'))
      waiting.push(...matches(read(file).toString(), /(?:\bfrom|\bimport)\s*"\.\/([^"]+\.js)"/g));
  }
  return [...found];
}

export const textOf = (files: readonly string[]): string =>
  files
    .filter((file) => file.endsWith('.js'))
    .map((file) => read(file).toString())
    .join('\n');
