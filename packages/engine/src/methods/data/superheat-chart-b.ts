/**
 * Superheat charging chart for fixed-orifice systems as another maker prints it (copy B), whole °F; rows outdoor dry bulb, columns indoor wet bulb.
 * Standing: read. Source: heat-pump dimensions and installation guide, R-22, table 4; its °C version (start-up manual, table 6 SI) agrees row by row
 * but for one misprint. Differs from copy A in 12 shared cells, never by more than 1 °F. Shown beside copy A for comparison, never the default.
 */
import type { Chart } from '../chart';

export const SUPERHEAT_CHART_B: Chart = {
  id: 'makers-chart-b',
  standing: 'read',
  source: "Makers' superheat chart, copy B (heat-pump installation guide, R-22, table 4)",
  roundingF: 0.5,
  rowsF: [55, 60, 65, 70, 75, 80, 85, 90, 95, 100, 105, 110, 115],
  columnsF: [50, 52, 54, 56, 58, 60, 62, 64, 66, 68, 70, 72, 74, 76],
  // prettier-ignore
  cellsF: [
    [9, 12, 14, 17, 20, 23, 26, 29, 32, 35, 37, 40, 42, 45],
    [7, 10, 12, 15, 18, 21, 24, 27, 30, 33, 35, 38, 40, 43],
    [null, 6, 10, 13, 16, 19, 21, 24, 27, 30, 33, 36, 38, 41],
    [null, null, 7, 10, 13, 16, 19, 21, 24, 27, 30, 33, 36, 39],
    [null, null, null, 6, 9, 12, 15, 18, 21, 24, 28, 31, 34, 37],
    [null, null, null, null, 5, 8, 12, 15, 18, 21, 26, 28, 31, 35],
    [null, null, null, null, null, null, 8, 11, 15, 19, 22, 26, 30, 33],
    [null, null, null, null, null, null, 5, 9, 13, 16, 20, 24, 27, 31],
    [null, null, null, null, null, null, null, 6, 10, 14, 18, 22, 25, 29],
    [null, null, null, null, null, null, null, null, 8, 12, 15, 20, 23, 27],
    [null, null, null, null, null, null, null, null, 5, 9, 13, 17, 22, 26],
    [null, null, null, null, null, null, null, null, null, 6, 11, 15, 20, 25],
    [null, null, null, null, null, null, null, null, null, null, 8, 14, 18, 23],
  ],
};
