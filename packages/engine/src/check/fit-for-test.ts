/**
 * Whether this system, as it runs now, can be judged by superheat or subcooling at all; decided before any stop or target. Rules: common practice
 * and the scope of CEC Reference Residential Appendices, RA3.2 (2008, 2019); a mini-split meters outdoors, its small pipe is two-phase.
 */
import { chargeMethod, hasTargetForOtherPort, isEntered, usableChart } from './charge-method';
import type { AssumedField, Reason } from './codes';
import type { CheckInput, CheckSetup, CheckVisit } from './input';
import type { PreflightItem } from './request';

/** Items that make the test invalid until mended; a dirty filter or an unzeroed gauge only warns. */
const MENDED_FIRST: readonly PreflightItem[] = [
  'panelsOn',
  'fullStage',
  'economizerShut',
  'condenserDryAndClean',
  'fanSteady',
];

/** Why no charge criterion can be judged, or `null` when the system is fit for the test. */
export function unfitReason(input: CheckInput): Reason | null {
  const { procedure, setup, visit } = input;
  const heating = setup.mode === 'heating';
  if (heating && chargeMethod(input) === null) return { code: 'heating-mode', figures: {} };
  if (setup.kind === 'mini-split' || setup.kind === 'multi-split') return { code: 'metered-outdoors', figures: {} };
  if (setup.kind === 'packaged' && !procedure.packaged) return { code: 'not-in-scope', figures: {} };
  if (setup.stage === 'part') return { code: 'part-stage', figures: {} };
  if (setup.chargeMode === false) return { code: 'not-in-charge-mode', figures: {} };
  const items = unreadyItems(visit);
  if (items.length > 0) return { code: 'not-ready', figures: { items: { kind: 'preflight', value: items } } };
  // a packaged unit has no usual port to assume; in heating no liquid port is read
  if (!heating && setup.kind === 'packaged' && setup.assumed.includes('highSidePort'))
    return { code: 'port-not-stated', figures: {} };
  return null;
}

const unreadyItems = (visit: CheckVisit): readonly PreflightItem[] =>
  MENDED_FIRST.filter((item) => visit.preflight[item] === 'not-ok');

/** What was not stated, where the procedure assumes nothing; `null` when there is nothing to ask. */
export function unstatedReason({ procedure, setup }: CheckInput): Reason | null {
  if (procedure.assumes === 'the-usual') return null;
  const fields = unstatedFields(setup);
  return fields.length === 0
    ? null
    : { code: 'setup-not-stated', figures: { fields: { kind: 'setup', value: fields } } };
}

/** In heating the high side is read at the discharge, whatever port is used in cooling. */
function unstatedFields({ assumed, elevationAssumed, mode }: CheckSetup): readonly AssumedField[] {
  const wanted = assumed.filter((field) => field !== 'highSidePort' || mode === 'cooling');
  return elevationAssumed ? [...wanted, 'elevation'] : wanted;
}

/** Why subcooling cannot be judged at this port, or `null`. The suction side is not affected. */
export function unfitPortReason(input: CheckInput): Reason | null {
  const { setup, readings } = input;
  if (setup.highSidePort === 'none') return { code: 'suction-port-only', figures: {} };
  if (
    setup.highSidePort === 'discharge' &&
    readings.liquidPressure !== undefined &&
    readings.dischargePressure === undefined
  ) {
    return { code: 'liquid-reading-at-discharge-port', figures: {} };
  }
  const hasTarget = isEntered(input, 'subcooling') || usableChart(input, 'subcooling') !== null;
  if (!hasTarget && hasTargetForOtherPort(input)) {
    return { code: 'target-for-other-port', figures: {} };
  }
  return null;
}
