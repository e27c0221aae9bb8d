import { looseChecksWords, setupWords } from '@chargewright/wording';
import type { CheckSummary } from './check-draft';

/** "R-410A · Fixed orifice" */
export function checkName({ refrigerant, meteringDevice }: CheckSummary): string {
  const metering = meteringDevice && setupWords.meteringDevice.options[meteringDevice].label;
  return [refrigerant ?? looseChecksWords.unnamed, metering].filter((part) => part !== undefined).join(' · ');
}
