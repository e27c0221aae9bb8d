/** Which rules and tables gave a result: the package's version and a hash of every table it is judged by, of the procedures and of the next steps. */
import { SPLIT_TABLE } from '../methods/data/split-table';
import { SUPERHEAT_CHART_A } from '../methods/data/superheat-chart-a';
import { SUPERHEAT_TABLE_FINER } from '../methods/data/superheat-table-finer';
import { INPUT_HASH } from '../refrigerants/generated/saturation-curves';
import { NEXT_STEP_TABLE } from './next-step/next-step-table';
import { PROCEDURES } from './procedure-catalogue';

const VERSION = '0.1.0';

/** 32-bit FNV-1a (Fowler, Noll, Vo; RFC 9923): names a set of tables, guards against nothing. */
function fnv1a(text: string): string {
  let hash = 0x811c9dc5;
  for (let i = 0; i < text.length; i++) {
    hash ^= text.charCodeAt(i);
    hash = Math.imul(hash, 0x01000193);
  }
  return (hash >>> 0).toString(16).padStart(8, '0');
}

/** `0.1.0+1a2b3c4d`: the package's version and a hash of the data. */
export const versionOf = (data: readonly unknown[]): string => `${VERSION}+${fnv1a(JSON.stringify(data))}`;

let version: string | undefined;

/** `0.1.0+1a2b3c4d`: two results with the same version came from the same rules and tables. Computed once, when first asked for. */
export function engineVersion(): string {
  const data = [INPUT_HASH, SUPERHEAT_CHART_A, SUPERHEAT_TABLE_FINER, SPLIT_TABLE, PROCEDURES, NEXT_STEP_TABLE];
  version ??= versionOf(data);
  return version;
}
