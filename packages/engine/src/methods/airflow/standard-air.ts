/**
 * Standard air: the flow of air of a stated density that carries the same mass of dry air. The definition here is 0.075 lb/ft³ exactly, 1.201 kg/m³,
 * the one behind "cfm" in fan tables and in the constants 1.08 (= 60 × 0.075 × 0.24) and 4.5 (= 60 × 0.075); AMCA 210 and ASHRAE 51 name it, from memory.
 * The SI edition of the Handbook takes 1.204 kg/m³ (dry air at 20 °C and 101.325 kPa), 0.2 % more, from memory.
 */
import { leaf } from '../../derivation/quantity';
import { formula } from '../../derivation/formula';
import { lengthToM, massToKg } from '../../units';
import type { SourcedFigure } from '../sourced-figure';

/** kg/m³. */
export const STANDARD_AIR_DENSITY: SourcedFigure = {
  value: massToKg(0.075, 'lb') / lengthToM(1, 'ft') ** 3,
  printed: '0.075 lb/ft³',
  standing: 'memory',
  source: 'ANSI/AMCA 210, ANSI/ASHRAE 51, definition of standard air',
};

export const standardAirDensity = leaf({
  id: 'standardAirDensity',
  kind: 'densityKgPerM3',
  value: STANDARD_AIR_DENSITY.value,
  origin: 'constant',
});

/** Flow of standard air in m³/s that carries the dry air of a mass flow in kg/s. */
export const standardAirflow = formula({
  id: 'standardAirflow',
  gives: 'flowM3PerS',
  text: 'm / rho_standard',
  symbols: { dryAirMassFlowKgPerS: 'm', standardDensityKgPerM3: 'rho_standard' },
  source: `Definition of standard air: ${STANDARD_AIR_DENSITY.printed} (${STANDARD_AIR_DENSITY.source}), from memory`,
  of: ({ dryAirMassFlowKgPerS, standardDensityKgPerM3 }) => dryAirMassFlowKgPerS / standardDensityKgPerM3,
});
