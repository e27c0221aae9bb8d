/** The weigh-in: how it came out, why not, what to keep in mind, what next. What is removed is recovered, never vented. */
import type { LabelOutcome, VacuumOutcome, WeighInCaution, WeighInFinding, WeighInReason } from '@chargewright/engine';

type Sentences<Code extends string> = Readonly<Record<Code, string>>;

const CYLINDER = 'into a proper recovery cylinder (on the scale, at most 80 % full), never into the air';
const AS_LIQUID = 'liquid throttled into the suction side, cylinder on the scale. Gloves and closed glasses.';

const reasons: Sentences<Exclude<WeighInReason['code'], 'inputs-missing'>> = {
  'rate-needed':
    'There is no printed rate for this refrigerant, size and kind of system. Take the maker’s rate from the installation manual.',
  'shorter-line-rule-needed':
    'The installed line is shorter than the factory charge covers. Say what this maker does: subtract, or keep the factory charge.',
  'outside-range': 'A length, rate or charge cannot be as it is entered. Look at it once more.',
  'vacuum-failed': 'The vacuum did not pass: no refrigerant goes in before it does.',
  'vacuum-not-proven': 'The vacuum is not proven: it was not isolated for long enough, or rose over a longer time.',
  'vacuum-not-recorded':
    'These rules want the vacuum on record: at most 500 microns, and at most 300 more in 5 minutes isolated.',
  'above-label-maximum': 'The whole charge is above the most this unit’s label allows for this room.',
  'weigh-in-not-permitted':
    'By these rules a rater may not use a weigh-in. Come back when the system can be tested by its readings.',
  'too-warm-to-observe':
    'By these rules a rater may watch a weigh-in only below 55 °F (13 °C) outdoors, where the system could be tested by its readings. Test it by its readings.',
};

const cautions: Sentences<WeighInCaution> = {
  'rate-not-this-makers':
    'The rate is what several makers print for R-410A, not this maker’s. The installation manual outranks it.',
  'rate-by-density':
    'There is no printed rate for this refrigerant. The R-410A rate is taken in proportion to the density of the liquid, ±20 %. Find the maker’s rate.',
  'scale-assumed': 'The scale is not described: steps and accuracy of 0.5 oz (14 g) are taken.',
  'scale-coarse': 'This scale is coarser than 1 oz (28 g): too coarse to call the charge within.',
  'adjustment-unusual': 'An adjustment of more than 200 oz (5.7 kg) is unusual. Look at lengths and units once more.',
  'vacuum-not-recorded': 'The vacuum is not recorded. At most 500 microns, and at most 300 more in 5 minutes isolated.',
  'vacuum-not-proven': 'The vacuum is not proven yet: isolate it for 5 minutes or more.',
  'label-maximum-not-recorded': 'This refrigerant burns: enter the most the unit’s label allows for this room.',
  'near-label-maximum': 'The charge lies so near the label’s maximum that the scale cannot tell the side.',
  'promise-to-return':
    'Weighed in because it is cold: the installer promises to come back and correct the charge if a later test fails.',
  'observe-only': 'By these rules the rater watches the installer weigh in, and does not do it.',
};

const findings: Sentences<WeighInFinding> = {
  within: 'within',
  above: 'too much',
  below: 'too little',
  'too-close-to-call': 'too close to call',
  'not-verifiable': 'not verifiable',
  'not-judged': 'not judged yet',
};

const vacuum: Sentences<VacuumOutcome> = {
  passes: 'passes',
  fails: 'does not pass',
  'not-proven': 'not proven',
  'not-recorded': 'not recorded',
};

const label: Sentences<LabelOutcome> = {
  within: 'below the label’s maximum',
  near: 'at the label’s maximum, as near as the scale can tell',
  above: 'above the label’s maximum',
  'not-recorded': 'label’s maximum not entered',
  'not-applicable': 'no maximum to hold',
};

const headlines = {
  within: 'The charge weighed in is what this installation takes',
  above: (much: string) => `Too much, by ${much}`,
  below: (much: string) => `Too little, by ${much}`,
  tooClose: (much: string, side: 'above' | 'below') =>
    `Too close to call: ${much} ${side === 'above' ? 'over' : 'under'}`,
  putIn: (much: string) => `Put in ${much}`,
  recover: (much: string) => `Recover ${much}`,
  nothing: 'Nothing to add for the line set',
  whole: (much: string) => `Weigh in ${much} altogether`,
  notJudged: 'Not judged yet',
  notVerifiable: 'Cannot be verified',
  aboveLabel: 'Stop: more than the label allows',
  vacuumFails: 'No refrigerant yet: the vacuum did not pass',
};

const next = {
  within: 'Caps on, look for leaks at the ports, write the new charge on the unit’s label and into the record.',
  above: (much: string) => `Recover ${much} ${CYLINDER}. Then weigh again.`,
  below: (much: string) => `Add ${much}, ${AS_LIQUID} Then weigh again.`,
  tooClose: 'The scale or the rate cannot tell. A finer scale, the maker’s own rate or a measured length settles it.',
  putIn: (much: string) => `Add ${much} to the factory charge: ${AS_LIQUID} Then enter what the scale says.`,
  recover: (much: string) => `Recover ${much} ${CYLINDER}. Then enter what the scale says, as a negative number.`,
  nothing: 'Leave the factory charge as it is, and enter 0 as weighed in.',
  whole: (much: string) =>
    `Into the evacuated system goes ${much}: liquid into the liquid side while it is off; what does not go in by itself, throttled into the suction side while it runs. Then enter what the scale says.`,
  vacuum:
    'Find the leak or the water: test with dry nitrogen through a regulator, never oxygen or air. Evacuate again to 500 microns or less; isolated, at most 300 more in 5 minutes.',
  vacuumUnproven: 'Shut the valve, stop the pump and watch the micron gauge for 5 minutes.',
  label: `Put nothing more in. What is over is recovered ${CYLINDER}. Look at unit, room and line length with the maker’s manual.`,
  rules: 'The weights stand in the record. They prove nothing by these rules.',
  enter: 'Enter what is missing.',
};

/** What each line of the sum is about. */
const sum = {
  rate: 'Rate by liquid density',
  line: 'Line set',
  installed: 'Installed line',
  included: 'Included line',
  adjustment: 'With corrections',
  total: 'Whole charge',
  actual: 'Whole charge now',
  difference: 'Weighed in less required',
  factory: 'factory',
  keeps: 'shorter, and this maker keeps the factory charge',
  terms: { coil: 'coil', drier: 'drier', other: 'other' },
};

export const weighInWords = {
  missing: (inputs: string) => `Not entered yet: ${inputs}.`,
  reasons,
  cautions,
  findings,
  vacuum,
  label,
  headlines,
  next,
  sum,
};
