/** The kinds of checked figures an example is written down with. */
import type { Chart } from '../../methods/chart';
import { DEFINITION, EQUATIONS_OF_STATE } from './sources';
import type { CheckedFigure } from './worked-example';

type Printed = Omit<CheckedFigure, 'standing' | 'source'>;

/** Rounding of the way through kelvin, in °F. */
const THROUGH_KELVIN = 1e-6;

export const read = (source: string, figure: Printed): CheckedFigure => ({ ...figure, standing: 'read', source });

/** From the equations of state, where no print was found. */
export const modelled = (figure: Printed): CheckedFigure => ({
  ...figure,
  standing: 'computed',
  source: EQUATIONS_OF_STATE,
});

/** A difference of figures and readings above it, in °F. */
export const difference = (figure: Omit<Printed, 'unit'>): CheckedFigure => ({
  ...figure,
  unit: 'deltaF',
  standing: 'by-hand',
  source: DEFINITION,
});

/** A difference of two readings, which nothing but rounding can change. */
export const exactDifference = (figure: Omit<Printed, 'unit' | 'within'>): CheckedFigure =>
  difference({ ...figure, within: THROUGH_KELVIN });

/** A printed cell. */
export const cellOf = (chart: Chart, figure: Omit<Printed, 'unit' | 'within'>): CheckedFigure => ({
  ...figure,
  unit: 'deltaF',
  standing: chart.standing,
  source: chart.source,
  within: THROUGH_KELVIN,
});
