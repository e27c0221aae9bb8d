/**
 * Superheat charging chart for fixed-orifice systems, whole °F, as two installation manuals of one air-conditioner maker print it (copy A).
 * Rows: outdoor dry bulb; columns: wet bulb of the air entering the indoor coil; `null` is a printed dash: do not charge by superheat there.
 * Standing: read. Source: outdoor-unit manual 506374-01 (03/2010), p. 20, and a 13/14-SEER unit manual, p. 26: identical; both say ±5 °F and
 * never under 5 °F at the suction service port. Not specific to a refrigerant: the same chart is printed for R-22 and R-410A equipment.
 */
import type { Chart } from '../chart';

export const SUPERHEAT_CHART_A: Chart = {
  id: 'makers-chart-a',
  standing: 'read',
  source: "Makers' superheat chart, copy A (installation manual 506374-01, 03/2010, p. 20)",
  roundingF: 0.5,
  rowsF: [40, 45, 50, 55, 60, 65, 70, 75, 80, 85, 90, 95, 100, 105, 110, 115],
  columnsF: [50, 52, 54, 56, 58, 60, 62, 64, 66, 68, 70, 72, 74, 76],
  // prettier-ignore
  cellsF: [
    [15, 18, 20, 23, 26, 29, 32, 34, 38, 41, 43, 46, 48, 51],
    [13, 16, 18, 21, 24, 27, 30, 33, 36, 39, 41, 44, 46, 49],
    [11, 14, 16, 19, 22, 25, 28, 31, 34, 37, 39, 42, 44, 47],
    [9, 12, 14, 17, 20, 23, 27, 30, 33, 36, 38, 40, 42, 44],
    [7, 10, 12, 15, 18, 21, 24, 27, 30, 33, 35, 38, 40, 43],
    [null, 6, 10, 13, 16, 19, 21, 24, 27, 30, 33, 36, 38, 41],
    [null, null, 7, 10, 13, 16, 19, 21, 24, 27, 30, 33, 36, 39],
    [null, null, null, 6, 9, 12, 15, 18, 21, 24, 28, 31, 34, 37],
    [null, null, null, null, 5, 8, 12, 15, 18, 21, 25, 28, 31, 35],
    [null, null, null, null, null, null, 8, 11, 15, 19, 22, 26, 30, 33],
    [null, null, null, null, null, null, 5, 9, 13, 16, 20, 24, 27, 31],
    [null, null, null, null, null, null, null, 6, 10, 14, 18, 22, 25, 29],
    [null, null, null, null, null, null, null, null, 8, 12, 16, 21, 24, 28],
    [null, null, null, null, null, null, null, null, 5, 9, 13, 17, 22, 26],
    [null, null, null, null, null, null, null, null, null, 6, 11, 15, 20, 25],
    [null, null, null, null, null, null, null, null, null, null, 8, 14, 18, 24],
  ],
};
