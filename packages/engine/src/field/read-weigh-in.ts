/** From the request for a weigh-in to SI. */
import { DEFAULT_PROCEDURE, findProcedure } from '../check/procedure-catalogue';
import type { Amount } from '../check/request';
import type { RefrigerantId } from '../refrigerants/catalogue';
import { isRefrigerantId } from '../refrigerants/catalogue';
import type { Correction } from '../methods/weigh-in/corrections';
import { CORRECTIONS } from '../methods/weigh-in/corrections';
import type { WeighInInput } from '../methods/weigh-in/evaluate-weigh-in';
import type { LineSetInput } from '../methods/weigh-in/line-adjustment';
import type { WeighInPermission } from '../methods/weigh-in/weigh-in-permission';
import type { LengthUnit, MassUnit } from '../units';
import { lengthToM, lineRateToKgPerM, massToKg, temperatureToK, vacuumToPa } from '../units';
import type { FieldFault } from './field-codes';
import { FieldFaults } from './field-faults';
import type { LineSetRequest, StatedAmount, WeighInRequest } from './field-request';
import { present } from '../check/present';
import { WEIGH_IN_RULES } from './weigh-in-rules';

export type ReadWeighInRequest =
  { readonly ok: true; readonly input: WeighInInput } | { readonly ok: false; readonly faults: readonly FieldFault[] };

/** Every fault of the values; fields whose shape was at fault are left out. Total. */
export function crossCheckWeighIn(request: Partial<WeighInRequest>): readonly FieldFault[] {
  const faults = new FieldFaults();
  const { refrigerant, procedure, line = {}, corrections = {}, scale = {}, vacuum = {} } = request;
  if (refrigerant !== undefined && !isRefrigerantId(refrigerant)) {
    faults.add('refrigerant', { code: 'unknown-refrigerant', figures: {} });
  }
  if (procedure !== undefined && findProcedure(procedure) === undefined) {
    faults.add('procedure', { code: 'unknown-procedure', figures: {} });
  }
  if (request.outdoorDryBulb !== undefined) faults.temperature('outdoorDryBulb', request.outdoorDryBulb);
  faults.positive('factoryCharge', request.factoryCharge);
  faults.notNegativeStated('line.installedLength', line.installedLength);
  faults.notNegative('line.includedLength', line.includedLength?.value);
  faults.positive('line.makersRate', line.makersRate);
  faults.positive('line.makersIncludedRate', line.makersIncludedRate);
  for (const name of CORRECTIONS) faults.signed(`corrections.${name}`, corrections[name]);
  checkActual(faults, request);
  if (scale.resolution !== undefined && faults.finite('scale.resolution', scale.resolution.value)) {
    if (!(scale.resolution.value > 0)) {
      faults.add('scale.resolution', { code: 'scale-step-not-above-zero', figures: {} });
    }
  }
  faults.notNegative('scale.plusMinus', scale.plusMinus?.value);
  faults.notNegative('vacuum.deepest', vacuum.deepest?.value);
  faults.notNegative('vacuum.rise', vacuum.rise?.value);
  faults.notNegative('vacuum.isolatedMinutes', vacuum.isolatedMinutes);
  faults.positive('labelMaximum', request.labelMaximum);
  return faults.list;
}

/** An adjustment may have been recovered; a whole charge cannot be less than nothing. */
function checkActual(faults: FieldFaults, { method, actualCharge }: Partial<WeighInRequest>): void {
  if (method === 'total') faults.notNegative('actualCharge', actualCharge?.value);
  else faults.signed('actualCharge', actualCharge);
}

/** Reads a request of the right shape; answers every fault of its values at once. Total. */
export function readWeighInRequest(request: WeighInRequest): ReadWeighInRequest {
  const faults = crossCheckWeighIn(request);
  return faults.length > 0 ? { ok: false, faults } : { ok: true, input: weighInInput(request) };
}

function weighInInput(request: WeighInRequest): WeighInInput {
  const { line = {}, scale = {}, vacuum } = request;
  const procedure = findProcedure(request.procedure ?? DEFAULT_PROCEDURE.id) ?? DEFAULT_PROCEDURE;
  return {
    // crossCheckWeighIn has refused any other id
    refrigerant: request.refrigerant as RefrigerantId,
    kind: request.kind,
    method: request.method,
    decision: procedure.decision.type,
    vacuumRecord: WEIGH_IN_RULES[procedure.id].vacuumRecord,
    permission: permissionOf(request, procedure.id),
    ...present('factoryChargeKg', inKg(request.factoryCharge)),
    line: lineInput(line),
    corrections: correctionsOf(request),
    ...present('actualKg', inKg(request.actualCharge)),
    scale: {
      ...present('resolutionKg', inKg(scale.resolution)),
      ...present('limitKg', inKg(scale.plusMinus)),
    },
    vacuum: {
      ...present('deepestPa', vacuum?.deepest && vacuumToPa(vacuum.deepest.value, vacuum.deepest.unit)),
      ...present('risePa', vacuum?.rise && vacuumToPa(vacuum.rise.value, vacuum.rise.unit)),
      ...present('isolatedMinutes', vacuum?.isolatedMinutes),
    },
    ...present('labelMaximumKg', inKg(request.labelMaximum)),
  };
}

function permissionOf({ outdoorDryBulb, kind }: WeighInRequest, id: keyof typeof WEIGH_IN_RULES): WeighInPermission {
  const { role, observesBelow, promisesBelow } = WEIGH_IN_RULES[id];
  return {
    role,
    ...present('observesBelowK', observesBelow?.value),
    ...present('promisesBelowK', promisesBelow?.value),
    ...present('outdoorK', outdoorDryBulb && temperatureToK(outdoorDryBulb.value, outdoorDryBulb.unit)),
    // a ductless system meters outdoors: no standard method tests it, however warm it is
    testable: kind === 'ducted',
  };
}

const inKg = (amount: Amount<MassUnit> | undefined): number | undefined =>
  amount && massToKg(amount.value, amount.unit);

function correctionsOf({ corrections = {} }: WeighInRequest): Readonly<Partial<Record<Correction, number>>> {
  return Object.fromEntries(
    CORRECTIONS.flatMap((name) => {
      const kg = inKg(corrections[name]);
      return kg === undefined ? [] : [[name, kg]];
    }),
  );
}

function lineInput(line: LineSetRequest): LineSetInput {
  const { installedLength, includedLength, makersRate, makersIncludedRate } = line;
  return {
    ...present('installedLengthM', installedLength && lengthToM(installedLength.value, installedLength.unit)),
    ...present('lengthLimitM', installedLength && lengthLimit(installedLength)),
    ...present('size', line.liquidLineSize),
    ...present('makersRateKgPerM', makersRate && lineRateToKgPerM(makersRate.value, makersRate.unit)),
    ...present('includedLengthM', includedLength && lengthToM(includedLength.value, includedLength.unit)),
    ...present('includedSize', line.includedLiquidLineSize),
    ...present(
      'makersIncludedRateKgPerM',
      makersIncludedRate && lineRateToKgPerM(makersIncludedRate.value, makersIncludedRate.unit),
    ),
    ...present('shorterLine', line.shorterLine),
  };
}

/** ± as a limit; one stated for k = 2 becomes the limit with the same standard uncertainty. */
function lengthLimit({ value, unit, plusMinus }: StatedAmount<LengthUnit>): number | undefined {
  if (plusMinus === undefined) return undefined;
  const half =
    plusMinus.unit === '%'
      ? (plusMinus.value / 100) * lengthToM(value, unit)
      : lengthToM(plusMinus.value, plusMinus.unit);
  return plusMinus.kind === 'k2' ? (half / 2) * Math.sqrt(3) : half;
}
