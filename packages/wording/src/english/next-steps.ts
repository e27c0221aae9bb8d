/** The one thing to do next, and why. What adds or removes refrigerant always says how. */
import type { Say } from '../message-texts';
import type { NextStepWords } from '../language';

const notYet: NextStepWords['notYet'] = {
  'add-nothing': 'Don’t add refrigerant yet.',
  'recover-nothing': 'Don’t recover refrigerant yet.',
  'move-no-refrigerant': 'Don’t add or recover refrigerant yet.',
  'shut-down': 'Don’t let it run on: shut it down.',
  'do-not-judge-yet': 'Don’t judge the charge yet.',
};

const THEN_READ = 'then run 15 minutes and take every reading again';
const CYLINDER = 'into a proper recovery cylinder (on the scale, at most 80 % full), never into the air';
const LOCK_OUT = 'Lock out and test dead before opening a panel.';
const WEIGH_IN = `recover ${CYLINDER}, evacuate, weigh in the nameplate charge corrected for the line set`;
/** No flame while refrigerant is in the pipe: recovering comes before mending. */
const MEND = `Recover ${CYLINDER}; only then mend, no flame before. Test with dry nitrogen through a regulator, never oxygen or air. Evacuate, weigh in the nameplate charge corrected for the line set.`;
const THAW =
  'Compressor off, blower on, until coil and line are free of ice; watch the drain pan, thaw water can come through the ceiling.';
const AFTER_THAW = 'Readings at minutes 10 to 15 after thawing serve the diagnosis only, never the charge.';
const BULB = 'bulb tight on clean pipe, at the right place, wrapped, its charge not lost';

/** The ranges of a chart, where it has any that one condition alone can reach; a sentence of its own, as the first serves as a title. */
const where = (ranges: string): string => (ranges === '' ? '' : ` That is ${ranges}.`);
const each = (say: Say): string => `Each at most 5 % of the factory charge (not known: at most ${say.ozPerTon(2)})`;
const add = (say: Say): string =>
  `Add in small steps. ${each(say)}, liquid throttled into the suction side, ${THEN_READ}. Gloves and closed glasses.`;
const recover = (say: Say): string =>
  `in small steps ${CYLINDER}. ${each(say)}, ${THEN_READ}. Gloves and closed glasses.`;
const drierDrop = (say: Say): string =>
  `Measure the temperature before and after the filter-drier and along the liquid line. A drop of more than about ${say.deltaF(3)} is a restriction.`;
const airTest = (say: Say): string =>
  `Test for air in the system first. Compressor off, outdoor fan on. It counts only with the liquid shut into the outdoor coil (if the maker permits it, not past the low cut-out) or with both coils within ${say.deltaF(3)} of each other. Air is present when the standing pressure is more than ${say.deltaF(3)} above saturation at the coil’s temperature: then ${WEIGH_IN}. No air: recover ${recover(say)}`;

/** What to do, its first sentence a title, and why. */
const steps: NextStepWords['steps'] = {
  'cooling-season-or-weigh-in': [
    `Weigh the charge in, or come back in the cooling season. To weigh in: ${WEIGH_IN}. A heating table of the maker may be used instead.`,
    'In heating the pipes change roles: the vapor line is hot gas, so no low-side hose on it.',
  ],
  'weigh-in': [
    `Weigh the charge in, or use the maker’s test mode. To weigh in: ${WEIGH_IN}.`,
    'The liquid is metered outdoors: subcooling cannot be read at this unit.',
  ],
  'choose-other-rules': [
    'Choose other rules for this unit: the maker’s, or the general ones.',
    'The rules chosen are for split systems.',
  ],
  'bring-to-full-stage': [`Bring the system to full stage, ${THEN_READ}.`, 'Targets hold at full stage only.'],
  'bring-to-charge-mode': [
    `Put the inverter into the maker’s charge mode, ${THEN_READ}.`,
    'Outside its charge mode the inverter’s speed moves the readings, not the charge.',
  ],
  'state-the-port': [
    'State which high-side port this unit has. The liquid line is the warm pipe after the outdoor coil, the discharge line the hot one before it: it burns.',
    'The two pressures differ by the drop through the outdoor coil.',
  ],
  'state-the-setup': [
    (f) => `State this first: ${f.fields}. Look at the unit and its nameplate; where you do not know, find out.`,
    'These rules go by the maker’s data alone: nothing is taken as usual.',
  ],
  'read-discharge-pressure': [
    'Type the high-side pressure as discharge pressure. Judge it only against a target made for that port.',
    'This unit has a discharge port only.',
  ],
  'mend-before-test': [
    (f) => `Put this right first: ${f.items}. Lock out before reaching in, ${THEN_READ}.`,
    'As it is, the readings do not show the charge.',
  ],
  'find-suction-line-table': [
    'Find the maker’s suction-line table for this unit, or weigh the charge in.',
    'The valve holds superheat whatever the charge, and there is no port for subcooling.',
  ],
  'check-hoses': [
    'Check the hoses and whether the compressor runs. Low side on the large pipe, high side on the small one.',
    'In cooling, suction is always below the high side.',
  ],
  'check-refrigerant-and-probes': [
    'Check refrigerant, gauge zero, ports and clamps. Compare nameplate and retrofit label with the setup. If the pressure of the standing system does not match its temperature, the refrigerant may be mixed: stop, it is recovered as contaminated.',
    'These readings do not fit a running system with this refrigerant.',
  ],
  'thaw-then-airflow': [
    `Thaw the coil, then look at the airflow. ${THAW} Then re-read the wet bulb; look at filter, coil, blower, registers and ducts. ${AFTER_THAW}`,
    'Ice with a split above its band points to too little air over the coil.',
  ],
  'thaw-then-leak-search': [
    `Thaw the coil, then search for a leak. ${THAW} ${AFTER_THAW}`,
    'Ice with low subcooling points to low charge.',
  ],
  'thaw-then-drier-drop': [
    (_, say) => `Thaw the coil, then look for a restriction. ${THAW} ${drierDrop(say)} ${AFTER_THAW}`,
    'Ice with good subcooling and high superheat: liquid is held back on its way.',
  ],
  'thaw-then-diagnose': [
    `Thaw the coil, then read everything once for the diagnosis. ${THAW} ${AFTER_THAW}`,
    'What freezes the coil is not clear from the readings so far.',
  ],
  'shut-down-high-pressure': [
    `Shut the system down and find what drives the head up. ${LOCK_OUT} Outdoor coil and fan first, then air in the system, then overcharge.`,
    'The high side is above what the system should carry.',
  ],
  'shut-down-hot-discharge': [
    `Shut the system down and find what heats the discharge line. ${LOCK_OUT} Let the pipe cool. Then low charge, high head, a restriction.`,
    'Oil and valves do not last at this temperature.',
  ],
  'come-back-at-higher-target': [
    (f) => `Come back when the target superheat is ${f.least} or more.${where(f.ranges)} Recover nothing today.`,
    'At these conditions even a right charge runs near the floor: it cannot be told apart.',
  ],
  'reread-wet-bulb-then-airflow': [
    'Wet the wick and read the return wet bulb again. If the split stays above its band: filter, coil, blower speed, registers, ducts.',
    'A drying wick looks exactly like low airflow.',
  ],
  'check-overcharge-or-air': [
    (_, say) => airTest(say),
    'Superheat is gone and subcooling is high; air in the system looks like overcharge.',
  ],
  'check-metering': [
    `Check the metering device. Orifice: right size, seated, clean. Valve: ${BULB}.`,
    'Liquid comes back, but the other readings do not show overcharge.',
  ],
  'run-longer': [
    (f) => `Let it run ${f.minutes} more, then read. Probes stay on meanwhile.`,
    'Readings settle only after a while of steady running.',
  ],
  'warm-the-house': [
    (f) =>
      `Bring the return air to at least ${f.least}. Heating may warm the house first if the occupant agrees; mind people and animals. Then cool 15 minutes and read.`,
    'The targets do not reach down to air this cool.',
  ],
  'cool-the-house': [
    (f) => `Let the system cool the house to ${f.most} or less first, then read.`,
    'The return air is warmer than the maker allows for this table.',
  ],
  'wait-for-warmer-weather': [
    (f) => `Come back when it is at least ${f.least} outdoors, or weigh the charge in.`,
    'In the cold the pressures do not show the charge.',
  ],
  'wait-for-cooler-weather': [
    (f) => `Come back when it is ${f.most} outdoors or less; early morning is coolest.`,
    'In hotter air the test is not allowed.',
  ],
  'check-instruments': [
    'Hold gauges and thermometers against a reference, and record the day.',
    'These rules count only instruments that were checked within a month.',
  ],
  'make-access-hole': [
    'Make the access hole beside the coil, read the air there, and record it. Cut nowhere near the coil, its wiring or its drain; close the hole after the test.',
    'These rules want the air read in the plenum beside the coil, not at a grille.',
  ],
  'reach-a-target': [
    (f) =>
      `Wait for conditions that have a target, or come back.${where(f.ranges)} Heating may warm the house if the occupant agrees; mind people and animals.`,
    'The chart prints none here, or its edge is too near to be sure.',
  ],
  'record-conditions': [
    'Record the running time, the lowest return air and the look-over before reading.',
    'A result counts only for a system that was ready.',
  ],
  'take-readings': [(f) => `Read next: ${f.readings}.`, 'Without this the charge cannot be judged.'],
  'take-readings-again': [
    (f) => `Read again: ${f.readings}.`,
    'Too old: the house and the weather have moved on, and the target with them.',
  ],
  'find-nameplate-target': [
    'Find this unit’s target on the nameplate or in the maker’s data, and enter it.',
    (say) =>
      `No target is right for every unit; subcooling of ${say.deltaF(8)} to ${say.deltaF(14)} is common, and never a limit.`,
  ],
  'find-target-for-this-port': [
    'Find the maker’s target for the port you read at, or say which port the target holds for.',
    'Liquid and discharge port differ by the pressure drop of the outdoor coil.',
  ],
  'raise-airflow': [
    `Raise the airflow first: filter, coil, blower speed, registers, ducts, ${THEN_READ}. With gas appliances in the house make sure no flue back-drafts.`,
    'At low airflow a charge reads wrong; adjusting it would hide the cause.',
  ],
  'measure-airflow': [
    'Prove the airflow first: measure it over the coil with the filter in place (flow grid, fan flowmeter or capture hood), and enter the nominal capacity. Some rules take a temperature split within its band instead: then read return and supply air and the wet bulb.',
    'These rules judge no charge before the airflow is known to be enough.',
  ],
  'suspect-probes': [
    'Check the probes before anything else. Wet the wick, warm or cool the clamps in your hand to see them answer, clamp again on clean metal.',
    'Split and superheat both above do not belong together.',
  ],
  'confirm-refrigerant': [
    'Confirm the refrigerant by nameplate and retrofit label, then correct the setup or the writing.',
    'What you wrote differs from what this refrigerant does at that pressure.',
  ],
  'wet-the-wick': [
    'Wet the wick with clean water and read again in moving air, until it stops falling.',
    'A dry wick moves the target.',
  ],
  'bracket-wet-bulb-again': [
    (_, say) =>
      `Read the wet bulb before and after the readings outdoors once more. Within ${say.deltaF(1)} their mean counts.`,
    'It moved from one to the other, and the target with it.',
  ],
  'place-liquid-probe-again': [
    'Place the liquid-line probe again: clean metal near the valve, tight, wrapped, in the shade.',
    'The liquid line cannot be colder than the air that cools it.',
  ],
  'read-twice': [
    (_, say) =>
      `Take a second set of readings 5 minutes later. They count when wet bulb agrees within ${say.deltaF(0.5)}, return air within ${say.deltaF(1)}, superheat and subcooling within ${say.deltaF(1)}.`,
    'The house is still cooling down, and the target moves with it.',
  ],
  'recover-air-weigh-in': [
    `Weigh the charge in anew. First ${WEIGH_IN}. What was recovered holds air: it is not put back.`,
    'The standing pressure shows air in the system: nothing read with it tells the charge.',
  ],
  'mend-bulb': [
    `Put the valve’s bulb right: tight on clean pipe, at the right place, wrapped, ${THEN_READ}. If its charge is lost, the power head is replaced.`,
    'With a bulb that does not feel the pipe no reading at this valve counts.',
  ],
  'settle-with-another-reading': [
    'Take the readings once more with care: steady system, fresh wick, clamps on clean metal and wrapped.',
    'The result lies too near the edge of its band for these readings.',
  ],
  'settle-with-better-instrument': [
    'Use a better instrument, or state the ± of the one you have. Another reading with this one cannot settle it.',
    'With this ± no reading could ever be sure enough.',
  ],
  'cool-weather-hold': [
    (_, say) =>
      `Move no refrigerant on this reading. Raise the head by the maker’s method, weigh the charge in, or come back above ${say.degF(70)}.`,
    'In cool weather a reading outside its band is no proof of wrong charge.',
  ],
  'raise-head': [
    `Raise the head pressure by the maker’s method, ${THEN_READ}.`,
    'The valve has too little pressure to feed the coil.',
  ],
  'leak-first': [
    'Search for a leak before anything is added: joints, coil, valve cores, caps. Then record what you found: a leak or none.',
    'Refrigerant is not used up: what is missing went somewhere.',
  ],
  'mend-recover-weigh-in': [
    `Recover, mend the leak, evacuate and weigh in. ${MEND}`,
    'A charge with a known leak is not topped up.',
  ],
  'add-in-steps': [
    (_, say) => `${add(say)} All steps together at most 10 % of the factory charge; beyond that recover and weigh in.`,
    'The readings point to too little refrigerant.',
  ],
  'locate-mend-weigh-in': [
    `Don’t top up again: locate the leak, mend it, weigh in. ${MEND}`,
    'It was topped up on an earlier visit and is low again.',
  ],
  'recover-and-weigh-in': [
    `Weigh the charge in: ${WEIGH_IN}.`,
    'So much has been added that the amount inside is no longer known.',
  ],
  'measure-drier-drop': [(_, say) => drierDrop(say), 'It tells a restriction from what looks like one.'],
  'find-restriction': [
    (_, say) =>
      `Look for a restriction; leave the refrigerant as it is. ${drierDrop(say)} Then the metering device: size, dirt.`,
    'There is liquid enough, but too little of it gets through.',
  ],
  'air-test-then-recover': [(_, say) => airTest(say), 'Air in the system looks like overcharge.'],
  'recover-in-steps': [(_, say) => `Recover ${recover(say)}`, 'The readings point to too much refrigerant.'],
  'check-orifice': [
    'Check the orifice: size, seat, dirt. Recover before the line is opened.',
    'There is liquid enough and no drop on its way: the orifice holds it back.',
  ],
  'check-orifice-compressor-condenser': [
    'Check the orifice, the compressor and the air over the outdoor coil; leave the refrigerant as it is. Orifice size and seat; compressor current and pressures; a clean coil and a fan at speed.',
    'Superheat is low without the high subcooling of an overcharge.',
  ],
  'check-bulb-and-valve': [
    `Check the valve and its bulb; leave the refrigerant as it is. The ${BULB}.`,
    'The valve lets too much through; the charge is not the cause.',
  ],
  'check-valve': [
    'Check the valve itself: setting, screen, equalizer line, a stuck needle. Recover before the line is opened.',
    'Its bulb is right; the valve is not.',
  ],
  'check-bulb-and-screen': [
    `Check the valve’s bulb and its screen; leave the refrigerant as it is. The ${BULB}.`,
    'There is no drop before the valve: the valve starves the coil.',
  ],
  'check-bulb-screen-drier': [
    (_, say) =>
      `Check the valve’s bulb, its screen and the drier; leave the refrigerant as it is. The ${BULB}. ${drierDrop(say)}`,
    'Subcooling is right, so the charge is; the coil is starved on the way.',
  ],
  'check-bulb-and-airflow': [
    `Check the valve’s bulb, then the airflow; leave the refrigerant as it is. The ${BULB}. Then filter, coil, blower.`,
    'Subcooling is right, so the charge is; the coil is fed more than the air can boil off.',
  ],
  'find-restriction-recover-nothing': [
    (_, say) => `Look for a restriction; recover nothing. ${drierDrop(say)} Then the valve’s screen and bulb.`,
    'Both high: liquid backs up before something that holds it back.',
  ],
  'check-bulb-then-recover': [
    (_, say) => `Check the valve and its bulb first. The ${BULB}. If they are right: recover ${recover(say)}`,
    'An open valve and too much refrigerant go together here; the valve comes first.',
  ],
  'read-supply-or-airflow': [
    'Read the supply dry bulb, or measure the airflow.',
    'On a fixed orifice low charge and low airflow can hide each other.',
  ],
  'read-liquid-pair': [
    'Read the liquid pressure and the liquid line next.',
    'They tell low charge from a restriction.',
  ],
  'read-suction-pair': [
    'Read the suction pressure and the suction line next.',
    'Superheat tells a low charge from a valve that floods or starves.',
  ],
  'weigh-in-after-heating': [
    `Weigh the charge in; leave it as it is until then. Search for a leak first. To weigh in: ${WEIGH_IN}. Check it again in the cooling season.`,
    'By the maker’s heating table the charge is not right; in steps it is only set in cooling.',
  ],
  'record-heating': [
    'Record it, then close up; check the charge again in the cooling season. Hoses off with the least loss: the vapor line is hot gas now. Caps on, ports checked for leaks.',
    'The maker’s heating table agrees with the charge; only the cooling season shows it closely.',
  ],
  record: [
    'Record it, then close up: hoses off with the least loss, caps on, ports checked for leaks, label updated.',
    'The charge is within its band at these conditions.',
  ],
};

export const nextStepWords: NextStepWords = { notYet, steps };
