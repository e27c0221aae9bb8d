/**
 * R-410A in a foot of line set by the outside diameter of the liquid line, as makers print it; the suction line's vapour is inside (a 3/8 in. line
 * alone holds 0.52 oz/ft of liquid at 100 °F, 0.60 is printed). Read in the installation manuals of two or three makers of ducted split systems;
 * ductless systems meter outdoors, their small pipe carries two phases, and their makers print about half. Rates of R-410A, of no other refrigerant.
 */
import { lineRateToKgPerM } from '../../../units/line-rate';
import type { SourcedFigure } from '../../sourced-figure';

export const LIQUID_LINE_SIZES = ['1/4', '5/16', '3/8', '1/2'] as const;
/** Outside diameter, inches. */
export type LiquidLineSize = (typeof LIQUID_LINE_SIZES)[number];

export type LineSetKind = 'ducted' | 'ductless';

export interface PrintedLineRate extends SourcedFigure {
  /** ± between makers, as a limit, in the unit of `value`. */
  readonly limit: number;
}

const MAKERS = 'Installation manuals of several makers, R-410A';

/** Where makers print one figure, its spread is that of the two figures printed for 1/4 in., 5 %: our choice. */
const SPREAD = 0.05;

const printed = (ozPerFt: number, limitOzPerFt: number, text: string): PrintedLineRate => ({
  value: lineRateToKgPerM(ozPerFt, 'oz/ft'),
  limit: lineRateToKgPerM(limitOzPerFt, 'oz/ft'),
  printed: text,
  standing: 'read',
  source: MAKERS,
});

const agreed = (ozPerFt: number, text: string): PrintedLineRate => printed(ozPerFt, SPREAD * ozPerFt, text);

export const R410A_LINE_RATES: Readonly<
  Record<LineSetKind, Readonly<Partial<Record<LiquidLineSize, PrintedLineRate>>>>
> = {
  ducted: {
    '1/4': printed(0.285, 0.015, '0.27 and 0.30 oz/ft'),
    '5/16': agreed(0.4, '0.40 oz/ft'),
    '3/8': agreed(0.6, '0.60 oz/ft'),
    '1/2': agreed(1.2, '1.2 oz/ft'),
  },
  ductless: {
    '1/4': agreed(0.16, '0.16 oz/ft (15 g/m)'),
    '3/8': agreed(0.32, '0.32 oz/ft (30 g/m)'),
  },
};
