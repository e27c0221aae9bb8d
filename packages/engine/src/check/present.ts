/** An optional property is left out, not set to `undefined`. */
export function present<Key extends string, Value>(
  key: Key,
  value: Value | undefined,
): Readonly<Partial<Record<Key, Value>>> {
  return (value === undefined ? {} : { [key]: value }) as Partial<Record<Key, Value>>;
}
