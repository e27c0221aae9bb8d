/**
 * What a healthy system usually shows where it has no target of its own. A value outside its band is a sign; one inside is no proof that nothing has
 * changed, since the band is that of many systems.
 */
import type { FigureStanding, SourcedFigure } from '../methods/sourced-figure';
import type { RefrigerantId } from '../refrigerants/catalogue';
import { differenceToK, flowToM3PerS, powerToW } from '../units';

const PRACTICE = 'Common practice, no source';
const CHOICE = 'Our choice, open to better evidence';

const difference = (value: number, standing: FigureStanding, source: string): SourcedFigure => ({
  value: differenceToK(value, 'deltaF'),
  printed: `${value} °F`,
  standing,
  source,
});

export interface UsualBand {
  readonly low: SourcedFigure;
  readonly high: SourcedFigure;
}

/** Airflow per capacity, m³/s per W, from which the lower of the two upper ends holds. */
export const FULL_AIRFLOW: SourcedFigure = {
  value: flowToM3PerS(400, 'cfm') / powerToW(1, 'ton'),
  printed: '400 cfm/ton',
  standing: 'read',
  source: 'Trade teaching page on airflow and evaporators',
};

const LEAST_RETURN_OVER_EVAPORATING = difference(
  25,
  'choice',
  'High-efficiency coils run nearer 30 °F (trade article, read); 5 °F less, as around the usual 35',
);

/** Return dry bulb less evaporating temperature: 35 ± 5 °F at 400 cfm/ton, about 40 at 350; an airflow that is not known may be either. */
export const returnOverEvaporatingBand = (airflowPerCapacity: number | null): UsualBand => ({
  low: LEAST_RETURN_OVER_EVAPORATING,
  high:
    airflowPerCapacity !== null && airflowPerCapacity >= FULL_AIRFLOW.value
      ? difference(40, 'read', '35 ± 5 °F at 400 cfm/ton: trade teaching page')
      : difference(45, 'read', 'About 40 °F at 350 cfm/ton, ± 5: trade teaching page'),
});

/** Of systems made to condense nearer to the air. */
export const NEWER_REFRIGERANTS: readonly RefrigerantId[] = ['R-410A', 'R-32', 'R-454B'];
/** Drop through the outdoor coil, which a discharge port has on top. */
const COIL_DROP_K = differenceToK(3, 'deltaF');

/** Condensing over outdoor air: 15 to 25 °F newer, about 30 older. The low end allows for large outdoor coils. */
export function condensingOverAirBand(refrigerant: RefrigerantId, port: 'liquid' | 'discharge'): UsualBand {
  const high = difference(NEWER_REFRIGERANTS.includes(refrigerant) ? 25 : 30, 'practice', PRACTICE);
  return {
    low: difference(10, 'choice', CHOICE),
    high: port === 'liquid' ? high : { ...high, value: high.value + COIL_DROP_K, standing: 'choice', source: CHOICE },
  };
}

/** Liquid line over outdoor air. */
export const APPROACH_BAND: UsualBand = {
  low: difference(3, 'practice', PRACTICE),
  high: difference(12, 'practice', PRACTICE),
};

/** Compressor current off the one expected at these conditions. */
export const CURRENT_BAND: UsualBand = {
  low: { value: -0.1, printed: '−10 %', standing: 'choice', source: CHOICE },
  high: { value: 0.1, printed: '10 %', standing: 'choice', source: CHOICE },
};
