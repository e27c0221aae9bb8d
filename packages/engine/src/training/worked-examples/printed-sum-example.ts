/** A maker's printed example of a line set whose sums are wrong. Lengths and rates are its own; factory charge, vacuum and scale are our numbers. */
import { lengthToM, massToKg } from '../../units';
import { lineRateToKgPerM } from '../../units/line-rate';
import { micronsToPa } from '../../units/vacuum';
import type { WeighInInput } from '../../methods/weigh-in/evaluate-weigh-in';
import type { LiquidLineSize } from '../../methods/weigh-in/data/line-rates';
import { read } from './figures';
import { DEFINITION, MAKERS_LINE_EXAMPLE } from './sources';
import type { CheckedFigure, WeighInExample, WeighInPart } from './worked-example';

const oz = (value: number): number => massToKg(value, 'oz');
const INCLUDED_FT = 15;

interface PrintedLine {
  readonly id: WeighInPart['id'];
  readonly size: LiquidLineSize;
  readonly extraFt: number;
  readonly ozPerFt: number;
  readonly sumOz: number;
  readonly misprintsOz: readonly number[];
}

const LINES: readonly PrintedLine[] = [
  { id: 'thin-line', size: '5/16', extraFt: 45, ozPerFt: 0.4, sumOz: 18, misprintsOz: [9, 4.5] },
  { id: 'thick-line', size: '3/8', extraFt: 25, ozPerFt: 0.6, sumOz: 15, misprintsOz: [13.5] },
];

const inputOf = ({ size, extraFt, ozPerFt, sumOz }: PrintedLine): WeighInInput => ({
  refrigerant: 'R-410A',
  kind: 'ducted',
  method: 'adjustment',
  factoryChargeKg: oz(96),
  line: {
    installedLengthM: lengthToM(INCLUDED_FT + extraFt, 'ft'),
    includedLengthM: lengthToM(INCLUDED_FT, 'ft'),
    size,
    makersRateKgPerM: lineRateToKgPerM(ozPerFt, 'oz/ft'),
  },
  actualKg: oz(sumOz),
  scale: { resolutionKg: oz(0.5), limitKg: oz(0.5) },
  vacuum: { deepestPa: micronsToPa(420), risePa: micronsToPa(180), isolatedMinutes: 5 },
  decision: 'guarded',
  vacuumRecord: 'required',
});

const figuresOf = ({ id, sumOz, misprintsOz }: PrintedLine): readonly CheckedFigure[] => {
  const line = { what: 'lineCharge', of: id, unit: 'oz' } as const;
  return [
    ...misprintsOz.map((value) => read(MAKERS_LINE_EXAMPLE, { ...line, value, within: 0.05, misprint: true })),
    { ...line, value: sumOz, standing: 'by-hand', source: DEFINITION, within: 1e-6 },
  ];
};

export const PRINTED_SUM: WeighInExample = {
  id: 'printed-sum',
  kind: 'weigh-in',
  figures: LINES.flatMap(figuresOf),
  parts: LINES.map((line) => ({
    id: line.id,
    input: inputOf(line),
    finding: 'within',
    misprintsKg: line.misprintsOz.map(oz),
    misprintFinding: 'below',
  })),
};
