/** The compressor's current against the one expected, as recorded on the visit. */
import { derive } from '../derivation/derive';
import type { Quantity } from '../derivation/quantity';
import { isKnown, leaf, missing } from '../derivation/quantity';
import { possibleChanges } from '../diagnosis/read-symptoms';
import { CURRENT_BAND } from '../diagnosis/usual-bands';
import { currentOffExpected } from '../methods/air-to-refrigerant';
import type { CheckInput } from './input';

export interface CurrentTest {
  readonly finding: 'unmeasured' | 'unclear' | 'low' | 'as-expected' | 'high';
  /** Current less the expected one, over the expected one. */
  readonly offExpected: Quantity;
}

export function currentTest({ setup, readings }: CheckInput): CurrentTest {
  const value = setup.expectedCompressorCurrentA;
  const offExpected = derive(currentOffExpected, {
    currentA: readings.compressorCurrent?.quantity ?? missing('compressorCurrent'),
    expectedA:
      value === undefined
        ? missing()
        : leaf({ id: 'expectedCompressorCurrent', kind: 'currentA', value, origin: 'entered' }),
  });
  if (!isKnown(offExpected)) return { finding: 'unmeasured', offExpected };
  const { low, high } = CURRENT_BAND;
  const band = { low: low.value, high: high.value, inside: ['little'] as const, insideFrom: low.value };
  const possible = possibleChanges(offExpected, band);
  if (possible.length > 1) return { finding: 'unclear', offExpected };
  return { finding: FINDINGS[possible[0] ?? 'little'], offExpected };
}

const FINDINGS = { down: 'low', little: 'as-expected', up: 'high' } as const;
