import { differenceToK, temperatureFromK } from '../units';

/**
 * Target superheat of a fixed orifice in K by the short formula (3·WB − 80 − DB)/2 in °F, at any finite temperatures: it knows no dash, so look for
 * one in a chart first. Common practice, no source.
 */
export function shortFormulaK({
  wetBulbK,
  outdoorK,
}: {
  readonly wetBulbK: number;
  readonly outdoorK: number;
}): number {
  const wetBulbF = temperatureFromK(wetBulbK, 'degF');
  const outdoorF = temperatureFromK(outdoorK, 'degF');
  return differenceToK((3 * wetBulbF - 80 - outdoorF) / 2, 'deltaF');
}
