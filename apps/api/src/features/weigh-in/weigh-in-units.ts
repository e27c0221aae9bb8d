import type { WeighInRequest } from '@chargewright/engine';
import type { UnitSystem } from '@chargewright/wording';

const METRIC: readonly string[] = ['m', 'g/m', 'kg', 'g', 'degC', 'K'];

/** The units a weigh-in is answered in: those of the first length, rate, charge or temperature given. */
export function weighInUnits(request: Partial<WeighInRequest>): UnitSystem {
  const { line = {}, factoryCharge, actualCharge, labelMaximum, outdoorDryBulb } = request;
  const first =
    line.installedLength ??
    line.includedLength ??
    line.makersRate ??
    factoryCharge ??
    actualCharge ??
    labelMaximum ??
    outdoorDryBulb;
  return first !== undefined && METRIC.includes(first.unit) ? 'C-kPa' : 'F-psi';
}
