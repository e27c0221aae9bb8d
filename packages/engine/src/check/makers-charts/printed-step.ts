import type { MakersChartInput } from '../request';

/** Decimals that a number is written with. */
function decimalsOf(value: number): number {
  const [digits = '', exponent = '0'] = String(value).split('e');
  return Math.max(0, (digits.split('.')[1] ?? '').length - Number(exponent));
}

/** Smallest step the cells are printed in: as stated, else one of their last digit; whole numbers are printed to one. */
export function printedStep({ resolution, cells }: Pick<MakersChartInput, 'resolution' | 'cells'>): number {
  if (resolution !== undefined) return resolution;
  let decimals = 0;
  for (const row of cells) for (const cell of row) if (cell !== null) decimals = Math.max(decimals, decimalsOf(cell));
  return 10 ** -decimals;
}
