/**
 * Desired temperature drop across the indoor coil, whole °F, as one air-conditioner maker prints it. Rows: entering dry bulb; columns: its wet bulb.
 * Standing: read in one stored copy: installation instructions 507994-01 (11/2019), figure 18; the row at 80 °F steps oddly at 64 and 65 °F wet bulb.
 * Its own rule: within ±3 °F needs no change. Shown beside the split table for comparison, never the default.
 */
import type { Chart } from '../chart';

export const SPLIT_CHART: Chart = {
  id: 'split-chart',
  standing: 'read',
  source: "Maker's temperature-drop chart (installation instructions 507994-01, 11/2019, figure 18)",
  roundingF: 0.5,
  rowsF: [70, 72, 74, 76, 78, 80],
  columnsF: [57, 58, 59, 60, 61, 62, 63, 64, 65, 66, 67, 68, 69, 70],
  // prettier-ignore
  cellsF: [
    [19, 19, 18, 18, 17, 17, 16, 15, 15, 14, 13, 12, 11, 10],
    [20, 20, 19, 18, 17, 17, 16, 15, 15, 14, 13, 12, 11, 10],
    [21, 21, 21, 20, 19, 19, 18, 17, 16, 16, 15, 14, 13, 12],
    [22, 22, 22, 21, 21, 20, 19, 19, 18, 17, 16, 15, 14, 13],
    [23, 23, 23, 22, 22, 21, 21, 20, 19, 18, 17, 16, 15, 14],
    [24, 24, 24, 23, 23, 22, 22, 22, 20, 19, 18, 17, 16, 15],
  ],
};
