/** What cannot be of a saturated refrigerant: the code with its figures, for `lookUpFaultText`. */
import { refrigerantFacts } from '@chargewright/engine';
import type { RefrigerantId } from '@chargewright/engine';
import type { LookUpMessage } from './api-texts';

/** Null for an absolute pressure (Pa) that may be one of saturation. */
export function saturationPressureFault(id: RefrigerantId, pressurePa: number): LookUpMessage | null {
  if (pressurePa <= 0) return { code: 'not-above-vacuum', figures: {} };
  const { criticalPressurePa } = refrigerantFacts(id);
  if (pressurePa <= criticalPressurePa) return null;
  const figures = {
    actual: { kind: 'pressurePa', value: pressurePa },
    critical: { kind: 'pressurePa', value: criticalPressurePa },
  } as const;
  return { code: 'above-critical-pressure', figures };
}

/** Null for a temperature (K) that may be one of saturation. */
export function saturationTemperatureFault(id: RefrigerantId, temperatureK: number): LookUpMessage | null {
  const actual = { kind: 'temperatureK', value: temperatureK } as const;
  if (temperatureK < 0) return { code: 'below-absolute-zero', figures: { actual } };
  const { criticalTemperatureK } = refrigerantFacts(id);
  if (temperatureK <= criticalTemperatureK) return null;
  const critical = { kind: 'temperatureK', value: criticalTemperatureK } as const;
  return { code: 'above-critical-temperature', figures: { actual, critical } };
}
