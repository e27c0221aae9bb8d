import type { Amount, ReadingId, ReadingInput } from '@chargewright/engine';
import type { CheckExample } from '@chargewright/engine/training';
import type { ExampleCheck } from '../loose-checks/check-command';
import type { TypedField } from '@chargewright/contract/typed-fields';
import type { TypedValue } from '../loose-checks/check-draft';

const MS_PER_MINUTE = 60_000;

const typed = ({ value, unit }: Amount<string>, decimals?: number): TypedValue => ({
  text: decimals === undefined ? String(value) : value.toFixed(decimals),
  unit,
});

/** As the instrument shows it: 76 psig on a gauge that shows tenths is "76.0". */
const reading = (input: ReadingInput): TypedValue =>
  typed(input, Math.max(0, Math.round(-Math.log10(input.resolution ?? 1))));

/** The example as Check a charge keeps it: what a person would have typed, in the units of the example, just now. */
export function checkOfExample({ request }: Pick<CheckExample, 'request'>, nowMs: number): ExampleCheck {
  const { procedure, setup, visit = {}, readings } = request;
  const { refrigerant, meteringDevice, mode, kind, stage, highSidePort } = setup;
  const { elevation, targetSubcooling, targetSuperheat } = setup;
  const numbers: Partial<Record<TypedField, Amount<string> | undefined>> = {
    elevation,
    targetSubcooling,
    targetSuperheat,
    lowestReturnDryBulb: visit.lowestReturnDryBulb,
  };
  return {
    setup: {
      refrigerant,
      meteringDevice,
      ...(mode && { mode }),
      ...(kind && { kind }),
      ...(stage && { stage }),
      ...(highSidePort && { highSidePort }),
      ...(procedure && { procedure: procedure as NonNullable<ExampleCheck['setup']['procedure']> }),
    },
    visit: {
      ...(visit.runningMinutes !== undefined && {
        runningSince: new Date(nowMs - visit.runningMinutes * MS_PER_MINUTE).toISOString(),
      }),
      ...(visit.preflight && { preflight: visit.preflight }),
      ...(visit.iceSeen !== undefined && { iceSeen: visit.iceSeen }),
    },
    typed: Object.fromEntries(
      Object.entries(numbers).flatMap(([field, amount]) => (amount ? [[field, typed(amount)]] : [])),
    ),
    readings: Object.fromEntries(
      (Object.entries(readings) as [ReadingId, ReadingInput][]).map(([id, each]) => [id, reading(each)]),
    ),
  };
}
