/** Reads a request whose faulty entries are named and left out, so that one fault does not hold up the rest. */
import type { FieldFault } from '@chargewright/engine';

type Read<Input> =
  { readonly ok: true; readonly input: Input } | { readonly ok: false; readonly faults: readonly FieldFault[] };

export interface Leniently<Input> {
  /** Null where nothing was left to read. */
  readonly input: Input | null;
  readonly faults: readonly FieldFault[];
}

/** Parts of a request that stand without one of their entries; of a fan table nothing stands without a row. */
const LOOSE_PARTS: ReadonlySet<string> = new Set(['line', 'corrections', 'scale', 'vacuum']);

type Part = Readonly<Record<string, unknown>>;

function without(request: Part, path: string): Part {
  const [name = '', entry = ''] = path.split('.');
  const { [name]: part, ...others } = request;
  if (!LOOSE_PARTS.has(name)) return others;
  const { [entry]: _, ...kept } = part as Part;
  return { ...others, [name]: kept };
}

export function readLeniently<Request extends object, Input>(
  request: Request,
  read: (request: Request) => Read<Input>,
): Leniently<Input> {
  const faults: FieldFault[] = [];
  let rest = request;
  for (;;) {
    const answer = read(rest);
    if (answer.ok) return { input: answer.input, faults };
    faults.push(...answer.faults);
    // fields are only left out, and the required ones have no fault
    const next = answer.faults.reduce<Part>((left, { path }) => without(left, path), rest as Part) as Request;
    // a fault of what cannot be left out
    if (JSON.stringify(next) === JSON.stringify(rest)) return { input: null, faults };
    rest = next;
  }
}
