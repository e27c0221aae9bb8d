import type { ChebyshevSeries } from '../numerics/chebyshev';

/**
 * How the critical pressure is known: the constant of the published equation of state, or the bubble curve's last three points
 * (0.98 to 0.99 Tc) continued by a parabola of ln p to the model's critical temperature, to four digits. The same continuation on the
 * pure fluids meets their published value within 0.1 %, for four of them within 0.4 %; for a wide blend it is less sure (R-407C: 1 % above
 * the pseudo-pure equation's constant).
 */
export type CriticalPressureOrigin = 'equation-of-state' | 'bubble-curve-extrapolated';

/** A: published equation of state, every pair of a blend with a fitted departure function; B: every pair fitted; C: at least one pair estimated. */
export type ModelGrade = 'A' | 'B' | 'C';

/**
 * Bubble and dew curve of one refrigerant. The series give T·ln(p/Pa) in kelvin against s = √(1 − T/Tc), the two quantities of
 * Wagner's vapour-pressure equation (Cryogenics 13 (1973) 470): 8 terms on average where ln p against T needs 12 for the same 0.001 K.
 */
export interface SaturationModel {
  readonly kind: 'pure' | 'blend';
  readonly grade: ModelGrade;
  readonly criticalTemperatureK: number;
  readonly criticalPressurePa: number;
  readonly criticalPressureOrigin: CriticalPressureOrigin;
  /** Both curves are valid from here … */
  readonly minTemperatureK: number;
  /** … to here; between this and the critical point nothing is answered. */
  readonly maxTemperatureK: number;
  readonly bubble: ChebyshevSeries;
  /** Left out for a pure fluid: its bubble curve is its dew curve. */
  readonly dew?: ChebyshevSeries;
}

/** One state of a source table, kept beside the coefficients so that a stale or damaged file is noticed without the tables. */
export interface SaturationCheckPoint {
  readonly temperatureK: number;
  readonly bubblePressurePa: number;
  readonly dewPressurePa: number;
}
