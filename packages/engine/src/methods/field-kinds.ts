import type { QuantityKind } from '../derivation/quantity';

/** Kinds of the field methods that `QuantityKind` does not list yet. */
export type FieldKind =
  | 'voltageV'
  | 'currentA'
  | 'electricPowerW'
  | 'heatRateW'
  | 'durationS'
  | 'gasVolumeM3'
  | 'heatingValueJPerM3'
  | 'staticPressurePa'
  | 'densityKgPerM3'
  | 'specificHeatJPerKgK'
  | 'enthalpyDifferenceJPerKg'
  | 'massFlowKgPerS'
  | 'flowPerCapacityM3PerSPerW'
  | 'chargeRateKgPerM';

/** The kind under its true name: a screen that does not know it yet fails where it stands, instead of showing a number in the wrong unit. */
export const fieldKind = (kind: FieldKind): QuantityKind => kind as string as QuantityKind;
