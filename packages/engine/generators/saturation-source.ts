/** Where saturation states come from. The reference tables implement it now; an equation of state can replace that one file. */
export interface SaturationSource {
  /** SHA-256 over everything the source reads: changes exactly when the curves may. */
  readonly inputHash: string;
  readonly refrigerants: readonly SourceRefrigerant[];
}

export interface SourceRefrigerant {
  /** ASHRAE 34 designation, `R-410A`. */
  readonly id: string;
  readonly kind: 'pure' | 'blend';
  readonly grade: 'A' | 'B' | 'C';
  readonly criticalTemperatureK: number;
  /** Of the equation of state; unknown for a blend. */
  readonly criticalPressurePa?: number;
  readonly composition: readonly (readonly [id: string, massPercent: number])[];
  readonly estimatedPairs: readonly (readonly [string, string])[];
  /** Key of each publication and its full text. */
  readonly citations: readonly (readonly [key: string, text: string])[];
  /** By rising temperature. */
  readonly states: readonly SaturationState[];
}

export interface SaturationState {
  readonly temperatureK: number;
  readonly bubblePressurePa: number;
  readonly dewPressurePa: number;
}
