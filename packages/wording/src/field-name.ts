import type { FieldNaming } from './language';

const sentenceCase = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

const isPlace = (segment: string | undefined): boolean => /^\d+$/.test(segment ?? '');

/** A part of a field, with the place in it where the path leads further. */
function partName(below: readonly string[], { parts, placed }: FieldNaming): string | undefined {
  const at = below.findIndex((segment) => Object.hasOwn(parts, segment));
  const part = parts[below[at] ?? ''];
  const places = below.slice(at + 1).filter(isPlace);
  return part === undefined || places.length === 0
    ? part
    : placed(
        part,
        places.map((place) => Number(place) + 1),
      );
}

/** The name of a field by its dotted path, to begin a sentence with; an unknown field is quoted as it is. */
export function fieldName(path: string, naming: FieldNaming): string {
  const { fields, earlier, partOf, numbered } = naming;
  const segments = path.split('.');
  const at = segments.findLastIndex((segment) => Object.hasOwn(fields, segment));
  const known = fields[segments[at] ?? '']?.name;
  if (known === undefined) return `“${path}”`;
  const below = segments.slice(at + 1);
  const part = partName(below, naming);
  const own = isPlace(below[0]) ? numbered(known, Number(below[0]) + 1) : known;
  const name = segments.slice(0, at).includes('earlier') ? earlier(own) : own;
  return sentenceCase(part === undefined ? name : partOf(name, part));
}
