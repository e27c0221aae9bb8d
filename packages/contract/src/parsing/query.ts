import { LENGTH_UNITS } from '@chargewright/engine';
import type { Amount, LengthUnit } from '@chargewright/engine';
import * as z from 'zod';
import { isRecord } from './structure-fault';
import type { StructureFault } from './structure-fault';

/** A decimal number as JSON writes it, and with a leading plus or point. `Number` alone would also take an empty text and hexadecimals. */
const DECIMAL = /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i;

/** Query parameters of these names as numbers, where they read as one; everything else is left for the schema to refuse. */
export function withNumbers(query: unknown, names: readonly string[]): unknown {
  if (!isRecord(query)) return query;
  const numbers = Object.entries(query).map(([name, given]) =>
    typeof given === 'string' && names.includes(name) && DECIMAL.test(given.trim())
      ? [name, Number(given)]
      : [name, given],
  );
  return Object.fromEntries(numbers);
}

/** The optional pair that states where a gauge or a wet bulb is read; left out: sea level. */
export const elevationParameters = {
  elevation: z.exactOptional(z.number().meta({ description: 'Left out: sea level.' })),
  elevationUnit: z.exactOptional(z.enum(LENGTH_UNITS).meta({ description: 'Required with elevation.' })),
};

export interface ElevationParameters {
  readonly elevation?: number;
  readonly elevationUnit?: LengthUnit;
}

/** Which of the pair is missing; `faulty` names parameters that already have a fault of their own. */
export function elevationFaults(query: ElevationParameters, faulty: ReadonlySet<string>): readonly StructureFault[] {
  const { elevation, elevationUnit } = query;
  if (elevation !== undefined && elevationUnit === undefined && !faulty.has('elevationUnit')) {
    return [fault('missing', 'elevationUnit')];
  }
  if (elevation === undefined && elevationUnit !== undefined && !faulty.has('elevation')) {
    return [fault('missing', 'elevation')];
  }
  return [];
}

export const elevationOf = ({ elevation, elevationUnit }: ElevationParameters): Amount<LengthUnit> | undefined =>
  elevation === undefined || elevationUnit === undefined ? undefined : { value: elevation, unit: elevationUnit };

/** Faults of parameters of which exactly one has to be given; `given` are the names present in the query, faulty or not. */
export function exactlyOneOf(names: readonly string[], given: readonly string[]): readonly StructureFault[] {
  const [first = ''] = names;
  if (given.length === 0) return [fault('give-one-of', first, names)];
  return given.slice(1).map((name) => fault('give-only-one-of', name, names));
}

/** The same where exactly two have to be given; `names` has the two most usual first. */
export function exactlyTwoOf(names: readonly string[], given: readonly string[]): readonly StructureFault[] {
  if (given.length === 0) return names.slice(0, 2).map((name) => fault('give-two-of', name, names));
  const others = names.filter((name) => !given.includes(name));
  if (given.length === 1) return exactlyOneOf(others, []);
  return given.slice(2).map((name) => fault('give-only-two-of', name, names));
}

/** A fault of one query parameter. */
export const fault = (kind: StructureFault['kind'], name: string, allowed?: readonly string[]): StructureFault => ({
  kind,
  path: name,
  part: name,
  ...(allowed === undefined ? {} : { allowed }),
});
