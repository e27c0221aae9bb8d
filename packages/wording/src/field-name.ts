import type { FieldNaming } from './language';

const sentenceCase = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

/** The name of a field by its dotted path, to begin a sentence with; an unknown field is quoted as it is. */
export function fieldName(path: string, { fields, parts, earlier, partOf }: FieldNaming): string {
  const segments = path.split('.');
  const at = segments.findLastIndex((segment) => Object.hasOwn(fields, segment));
  const known = fields[segments[at] ?? '']?.name;
  if (known === undefined) return `“${path}”`;
  const part = segments
    .slice(at + 1)
    .map((segment) => parts[segment])
    .find((name) => name !== undefined);
  const name = segments.slice(0, at).includes('earlier') ? earlier(known) : known;
  return sentenceCase(part === undefined ? name : partOf(name, part));
}
