/**
 * Printed pressure-temperature tables of saturated refrigerants: what a technician with the chart of a manual or a textbook reads. A copy of the read rows
 * of tests/reference/refrigerants/saturation-tables.csv, held equal to them by a test there. °F and psi gauge above 14.696 psia, printed so or converted;
 * makers' names are left out on purpose. All read in stored copies. Public web lists with gross errors were not taken up.
 */
import type { RefrigerantId } from '../generated/saturation-curves';

export interface PrintedTable {
  readonly id: string;
  readonly refrigerant: RefrigerantId;
  readonly source: string;
  /** Its rows: `printed` as they stand there, `converted` from other units, `derived` from a line temperature and a subcooling. */
  readonly how: 'printed' | 'converted' | 'derived';
  /** One column for both points, as is right for a pure fluid and near enough for R-410A; the bubble column alone; or both. */
  readonly columns: 'one' | 'bubble' | 'both';
  /** [°F, psig, psig of the dew column where that row has one of its own]. */
  readonly rows: readonly (readonly [degF: number, psig: number, dewPsig?: number])[];
}

export const PRINTED_TABLES_STANDING = 'read';

export const PRINTED_TABLES: readonly PrintedTable[] = [
  {
    id: 'S1',
    refrigerant: 'R-410A',
    source:
      'outdoor-unit installation manual, document 506083-01 (03/2008), Table 5, HFC-410A temperature-pressure. A second manual (document 48478A006, Table 5) and a third (506253-01, 09/2012) print the same column.',
    how: 'printed',
    columns: 'one',
    // prettier-ignore
    rows: [
      [32, 100.8], [33, 102.9], [34, 105], [35, 107.1], [36, 109.2], [37, 111.4], [38, 113.6], [39, 115.8], [40, 118],
      [41, 120.3], [42, 122.6], [48, 137.1], [49, 139.6], [50, 142.2], [51, 144.8], [52, 147.4], [53, 150.1],
      [54, 152.8], [55, 155.5], [56, 158.2], [57, 161], [58, 163.9], [63, 178.5], [64, 181.6], [65, 184.3], [66, 187.7],
      [67, 190.9], [68, 194.1], [69, 197.3], [70, 200.6], [71, 203.9], [72, 207.2], [73, 210.6], [79, 231.6],
      [80, 235.3], [81, 239], [82, 242.7], [83, 246.5], [84, 250.3], [85, 254.1], [86, 258], [87, 262], [88, 266],
      [89, 270], [94, 290.8], [95, 295.1], [96, 299.4], [97, 303.8], [98, 308.2], [99, 312.7], [100, 317.2],
      [101, 321.8], [102, 326.4], [103, 331], [110, 365], [111, 370], [112, 375.1], [113, 380.2], [114, 385.4],
      [115, 390.7], [116, 396], [117, 401.3], [118, 406.7], [119, 412.2], [125, 445.9], [126, 451.8], [127, 457.6],
      [128, 463.5], [129, 469.5], [130, 475.6], [131, 481.6], [132, 487.8], [133, 494], [134, 500.2], [141, 545.6],
      [142, 552.3], [143, 559.1], [144, 565.9], [145, 572.8], [146, 579.8], [147, 586.8], [148, 593.8], [149, 601],
      [150, 608.1],
    ],
  },
  {
    id: 'S2',
    refrigerant: 'R-410A',
    source:
      'technical support manual 421 04 6300 01, p. 6, R-410A charging chart: liquid pressure against required liquid-line temperature.',
    how: 'derived',
    columns: 'bubble',
    // prettier-ignore
    rows: [
      [84, 251], [86, 259], [88, 266], [90, 274], [92, 283], [94, 291], [96, 299], [98, 308], [100, 317], [102, 326],
      [104, 335], [106, 345], [110, 364], [112, 374], [114, 384], [116, 395], [118, 406], [120, 416], [122, 427],
      [124, 439], [126, 450], [128, 462], [130, 474],
    ],
  },
  {
    id: 'S3',
    refrigerant: 'R-410A',
    source: "installer's guide 18-AC79D1-8-EN, R-410A subcooling charging chart.",
    how: 'derived',
    columns: 'bubble',
    // prettier-ignore
    rows: [
      [63, 179], [68, 195], [73, 211], [78, 229], [83, 247], [88, 267], [93, 287], [98, 309], [103, 331], [108, 355],
      [113, 381], [118, 407], [123, 435], [128, 464], [133, 495],
    ],
  },
  {
    id: 'S4',
    refrigerant: 'R-410A',
    source:
      'indoor-unit service manual, p. 223, saturated liquid / saturated gas pressure against degC. Values are MPa gauge (decided by comparison with the equation of state; the page does not say).',
    how: 'converted',
    columns: 'both',
    // prettier-ignore
    rows: [
      [-22, 25, 24.9], [-20.2, 26.6, 26.5], [-18.4, 28.3, 28.2], [-16.6, 30.1, 30], [-14.8, 31.9, 31.8], [-13, 33.8],
      [-4, 44], [5, 55.8], [14, 69.3], [23, 84.7], [32, 102.2], [41, 121.9], [50, 144], [59, 168.8],
      [64.4, 184.9, 184.2], [71.6, 208.1, 207.3], [78.8, 233.2, 232.2], [86, 260.5, 259.3], [93.2, 289.8, 288.6],
      [100.4, 321.4, 320.2], [107.6, 355.5, 354.2], [114.8, 392, 390.6], [122, 431.3, 429.7], [129.2, 473.3, 471.8],
      [136.4, 518.1, 516.6], [143.6, 565.9, 564.6], [149, 603.9, 602.6],
    ],
  },
  {
    id: 'S5',
    refrigerant: 'R-22',
    source: 'heat-pump dimensions and installation guide, Table 5 (R-22), zero-superheat row.',
    how: 'printed',
    columns: 'one',
    // prettier-ignore
    rows: [
      [35, 61.5], [37, 64.2], [39, 67.1], [41, 70], [43, 73], [45, 76], [47, 79.2], [49, 82.4], [51, 85.7],
    ],
  },
  {
    id: 'S6',
    refrigerant: 'R-22',
    source: 'chiller installation manual IOMM ACZ1-2, Table 13, R-22 saturated temperatures.',
    how: 'printed',
    columns: 'one',
    // prettier-ignore
    rows: [
      [0, 24], [12, 34.7], [24, 47.6], [36, 62.8], [48, 80.8], [60, 101.6], [72, 126.2], [84, 153.8], [96, 185.2],
      [108, 220.6], [120, 260.5], [132, 305.2], [144, 355.1], [160, 430.4],
    ],
  },
  {
    id: 'S7',
    refrigerant: 'R-22',
    source: 'Moran & Shapiro, Fundamentals of Engineering Thermodynamics, Table A-7 (R-22, SI).',
    how: 'converted',
    columns: 'one',
    // prettier-ignore
    rows: [
      [-40, 0.6], [-22, 9.1], [-4, 20.9], [14, 36.8], [32, 57.5], [35.6, 62.4],
    ],
  },
  {
    id: 'S8',
    refrigerant: 'R-134a',
    source:
      'Multimedia Engineering Thermodynamics (university e-book), Appendix, refrigerant-134a tables, printed saturation temperatures.',
    how: 'converted',
    columns: 'one',
    // prettier-ignore
    rows: [
      [-34.73, -6], [-29.71, -4.7], [-15.57, -0.2], [-14.25, 0.3], [-2.48, 5.3], [-1.84, 5.6], [9.09, 11.4],
      [13.84, 14.3], [15.38, 15.3], [22.33, 20.1], [29.04, 25.3], [40.27, 35.3],
    ],
  },
  {
    id: 'S9',
    refrigerant: 'R-134a',
    source: "Mechanical Engineers' Handbook, vol. 4, Thermophysical Properties of Fluids, Table 14, saturated R-134a.",
    how: 'converted',
    columns: 'one',
    // prettier-ignore
    rows: [
      [47.9, 43.3], [60.2, 57.8], [70.8, 72.3], [88.4, 101.3], [102.9, 130.3], [115.4, 159.3],
    ],
  },
  {
    id: 'S10',
    refrigerant: 'R-407C',
    source:
      "computer-room cooling unit user manuals (two of one maker), chapter on R407C, table 'for subcooling only' = bubble line. The dew table of the same manuals could not be opened.",
    how: 'printed',
    columns: 'bubble',
    // prettier-ignore
    rows: [
      [36, 73], [37, 74], [38, 76], [39, 77], [40, 79], [41, 81], [42, 82], [43, 84], [44, 86], [45, 87], [46, 89],
      [47, 91], [48, 93], [49, 95], [50, 96], [51, 98], [59, 114], [60, 116], [61, 118], [62, 120], [63, 123],
      [64, 125], [65, 127], [66, 129], [67, 131], [68, 134], [69, 136], [70, 138], [72, 143], [74, 148], [76, 153],
      [94, 203], [96, 209], [98, 216], [100, 222], [102, 229], [104, 236], [106, 242], [108, 249], [110, 257],
      [112, 264], [114, 271], [116, 279], [118, 287], [120, 294], [122, 302],
    ],
  },
  {
    id: 'S11',
    refrigerant: 'R-32',
    source:
      "'Characteristics of R32 refrigerant on the saturation line', Appendix 9 of an online refrigerants reference.",
    how: 'converted',
    columns: 'one',
    // prettier-ignore
    rows: [
      [-58, 1.3], [-49, 5.8], [-40, 11.1], [-31, 17.5], [-22, 25], [-13, 33.9], [-4, 44.2], [5, 56.1], [14, 69.9],
      [23, 85.6], [32, 103.4], [41, 123.5], [50, 146], [59, 171.3], [68, 199.4], [77, 230.5], [86, 265], [95, 303],
      [104, 344.7], [113, 390.6], [122, 440.8],
    ],
  },
];
