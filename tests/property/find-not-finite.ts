/** Path of the first number of a value that is NaN or infinite, or `null`. Follows objects, arrays and maps; each object once. */
export function findNotFinite(value: unknown): string | null {
  const seen = new Set<object>();
  const search = (at: unknown, path: string): string | null => {
    if (typeof at === 'number') return Number.isFinite(at) ? null : path;
    if (typeof at !== 'object' || at === null || seen.has(at)) return null;
    seen.add(at);
    const entries: Iterable<readonly [unknown, unknown]> = at instanceof Map ? at : Object.entries(at);
    for (const [key, entry] of entries) {
      const found = search(entry, `${path}.${String(key)}`);
      if (found !== null) return found;
    }
    return null;
  };
  return search(value, 'result');
}
