/** Stops outrank every finding: what to do at once, then what to look at. */
import type { StopFigures } from '@chargewright/engine';
import type { MessageTexts } from '../message-texts';

const SHUT_DOWN = 'Shut it down at the thermostat; lock out and test dead before opening a panel.';

export const stopTexts: MessageTexts<StopFigures> = {
  'liquid-return': (f) =>
    `Add nothing. Superheat is ${f.superheat} ± ${f.uncertainty}: liquid may be reaching the compressor, and that destroys it. If superheat is no more than ${f.uncertainty}, shut the system down.`,
  freezing: (f) =>
    `Compressor off, blower on. The coil evaporates at ${f.evaporating}: it is freezing. Watch the drain pan, thaw water can come through the ceiling. No charge is judged on ice.`,
  'high-pressure': (f) =>
    `${SHUT_DOWN} The high side is too high, at ${f.condensing}. Look at the air over the outdoor coil, air in the system, overcharge.`,
  'hot-discharge': (f) =>
    `${SHUT_DOWN} The discharge line is at ${f.discharge}: too hot for the compressor’s oil, and it burns skin. Look for low charge, high head, a restriction.`,
};
