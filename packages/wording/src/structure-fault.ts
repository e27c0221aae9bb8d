/** What is wrong with the shape of a request, before any value is looked at. The API makes these from its schema's issues. */
export type StructureFaultKind =
  'missing' | 'wrong-type' | 'null' | 'unknown-value' | 'wrong-unit' | 'temperature-unit-on-difference' | 'too-long';

export interface StructureFault {
  readonly kind: StructureFaultKind;
  /** Dotted path, e.g. `readings.returnWetBulb`. */
  readonly field: string;
  /** What would be right: names of units or values, or of a type. */
  readonly allowed?: readonly string[];
}
