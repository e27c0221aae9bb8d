/** Figures a weigh-in is judged by, in SI. */
import { massToKg } from '../../../units';
import { micronsToPa } from '../../../units/vacuum';
import type { SourcedFigure } from '../../sourced-figure';

const CEC_2019 = 'CEC certificates of installation (2019), weigh-in procedure of RA3.2.3';

export const WEIGH_IN_FIGURES = {
  deepestVacuumPa: { value: micronsToPa(500), printed: '500 microns', standing: 'read', source: CEC_2019 },
  mostRisePa: { value: micronsToPa(300), printed: '300 microns', standing: 'read', source: CEC_2019 },
  isolatedMinutes: { value: 5, printed: '5 min', standing: 'read', source: CEC_2019 },
  /** Adjustments the form accepts; beyond, a length or a unit is probably wrong. */
  mostAdjustmentKg: { value: massToKg(200, 'oz'), printed: '200 oz', standing: 'read', source: CEC_2019 },
  /** ± wanted of a field scale. */
  wantedScaleKg: {
    value: massToKg(1, 'oz'),
    printed: '±1 oz',
    standing: 'read',
    source: "A maker's installation manual (field scale)",
  },
  /** ± and step taken where nothing is said of the scale. */
  assumedScaleKg: {
    value: massToKg(0.5, 'oz'),
    printed: '±0.5 oz',
    standing: 'practice',
    source: 'Common practice, no source',
  },
  /** ± of a rate by liquid density, as a fraction (limit): the suction line's vapour does not follow the liquid. */
  rateByDensityFraction: {
    value: 0.2,
    printed: '±20 %',
    standing: 'choice',
    source: 'Our choice, open to better evidence',
  },
} as const satisfies Readonly<Record<string, SourcedFigure>>;
