/** What could cause a finding: causes, what speaks for and against them, and what would tell them apart. */
import type { Cause, DiagnosisNote, EvidenceFigures, Measurement } from '@chargewright/engine';
import type { MessageTexts } from '../message-texts';

export interface DiagnosisTexts {
  readonly causes: Readonly<Record<Cause, string>>;
  readonly evidence: MessageTexts<EvidenceFigures>;
  readonly measurements: Readonly<Record<Measurement, string>>;
  readonly notes: Readonly<Record<DiagnosisNote, string>>;
}

/** The side is said in words. */
const size = (text: string): string => text.replace('−', '');

const causes: DiagnosisTexts['causes'] = {
  'low-charge': 'Too little refrigerant',
  overcharge: 'Too much refrigerant',
  restriction: 'A restriction in the liquid line, drier or orifice',
  'air-in-system': 'Air or another gas in the system',
  'low-airflow': 'Too little air over the indoor coil',
  'condenser-air': 'Dirty outdoor coil, or too little air over it',
  compressor: 'A compressor that pumps poorly',
  'valve-closed': 'Valve stuck closed, or its bulb has lost its charge',
  'valve-open': 'Valve stuck open, or its bulb is loose',
};

const evidence: DiagnosisTexts['evidence'] = {
  'superheat-above-target': (f) => `Superheat is ${size(f.deviation)} ± ${f.uncertainty} above its target.`,
  'superheat-below-target': (f) => `Superheat is ${size(f.deviation)} ± ${f.uncertainty} below its target.`,
  'superheat-on-target': (f) => `Superheat is within its band (${f.deviation} off target, ± ${f.uncertainty}).`,
  'superheat-above-window': (f) => `Superheat of ${f.superheat} ± ${f.uncertainty} is above the valve’s window.`,
  'superheat-below-window': (f) => `Superheat of ${f.superheat} ± ${f.uncertainty} is below the valve’s window.`,
  'superheat-in-window': (f) => `Superheat of ${f.superheat} ± ${f.uncertainty} is inside the valve’s window.`,
  'subcooling-above-target': (f) => `Subcooling is ${size(f.deviation)} ± ${f.uncertainty} above its target.`,
  'subcooling-below-target': (f) => `Subcooling is ${size(f.deviation)} ± ${f.uncertainty} below its target.`,
  'subcooling-on-target': (f) => `Subcooling is within its band (${f.deviation} off target, ± ${f.uncertainty}).`,
  'subcooling-high': (f) => `Subcooling of ${f.subcooling} ± ${f.uncertainty} is high for most units.`,
  'subcooling-low': (f) => `Subcooling of ${f.subcooling} ± ${f.uncertainty} is low for most units.`,
  'subcooling-not-low': (f) => `Subcooling of ${f.subcooling} ± ${f.uncertainty} is not low.`,
  'split-above': (f) => `The temperature split is ${size(f.deviation)} ± ${f.uncertainty} above its target.`,
  'split-below': (f) => `The temperature split is ${size(f.deviation)} ± ${f.uncertainty} below its target.`,
  'split-on-target': (f) => `The temperature split is within its band (${f.deviation} off target, ± ${f.uncertainty}).`,
  'suction-low': (f) => `Suction is low: evaporating ${f.difference} ± ${f.uncertainty} below the return air.`,
  'suction-high': (f) => `Suction is high: evaporating only ${f.difference} ± ${f.uncertainty} below the return air.`,
  'head-high': (f) => `Head is high: condensing ${f.difference} ± ${f.uncertainty} above the outdoor air.`,
  'head-low': (f) => `Head is low: condensing only ${f.difference} ± ${f.uncertainty} above the outdoor air.`,
  'approach-wide': (f) =>
    `The liquid line is ${f.difference} ± ${f.uncertainty} above the outdoor air: more than usual.`,
  'approach-narrow': (f) =>
    `The liquid line is only ${f.difference} ± ${f.uncertainty} above the outdoor air: less than usual.`,
  'current-high': (f) => `The compressor draws ${size(f.deviation)} ± ${f.uncertainty} more than expected.`,
  'current-low': (f) => `The compressor draws ${size(f.deviation)} ± ${f.uncertainty} less than expected.`,
  'current-as-expected': (f) => `The compressor draws what is expected (${f.deviation} off, ± ${f.uncertainty}).`,
  'drier-drop': (f) => `The line cools by ${f.difference} ± ${f.uncertainty} over the drier.`,
  'no-drier-drop': (f) => `There is no drop over the drier (${f.difference} ± ${f.uncertainty}).`,
  'air-found': (f) => `The standing pressure is ${f.difference} ± ${f.uncertainty} above saturation.`,
  'no-air': (f) => `The standing pressure fits saturation (${f.difference} ± ${f.uncertainty}).`,
  'airflow-low': (f) => `The measured airflow of ${f.airflow} is under ${f.least}.`,
  'airflow-enough': (f) => `The measured airflow of ${f.airflow} is enough (at least ${f.least}).`,
  'filter-or-coil-dirty': 'Filter or indoor coil is not clean.',
  'bulb-loose': 'The valve’s bulb is loose, misplaced or not wrapped.',
  'bulb-charge-lost': 'Warming the valve’s bulb moves nothing.',
  'valve-hunting': 'Superheat swings: the valve hunts.',
};

const measurements: DiagnosisTexts['measurements'] = {
  'state-port': 'Say which high-side port the gauge is on: at another port this subcooling may not be one.',
  'confirm-refrigerant':
    'Confirm the refrigerant by nameplate and retrofit label: with another one this subcooling may not be one.',
  'liquid-pair': 'Read the liquid pressure and the liquid line.',
  'supply-and-wet-bulb': 'Read supply dry bulb, return dry bulb and return wet bulb.',
  airflow: 'Measure the airflow over the indoor coil.',
  'drier-drop': 'Measure the temperature before and after the filter-drier.',
  'air-test': 'Make the air test: the standing pressure against the temperature of the coil.',
  'bulb-and-hunting': 'Look at the valve’s bulb, and whether superheat swings.',
  'compressor-current': 'Measure the compressor’s current, against what the maker expects at these conditions.',
  'condenser-look': 'Look at the outdoor coil and its fan: dirt, bent fins, hot air drawn in again.',
  'orifice-look': 'Look at the orifice: size, seat, dirt. Recover before the line is opened.',
  'leak-search': 'Search for the leak.',
};

const notes: DiagnosisTexts['notes'] = {
  unfit: 'No causes are looked for: this system, as it runs, is not fit for the test.',
  'impossible-readings': 'No causes are looked for: these readings cannot belong together.',
  'outside-conditions': 'No causes are looked for: in these conditions the usual patterns do not hold.',
  'not-steady': 'No causes are looked for yet: the system has run for less than 10 minutes.',
  'too-little-read': 'Too little is read to look for a cause.',
  'nothing-outside': 'Nothing that was read is clearly off.',
  unclear:
    'Nothing that was read is clear enough to point to a cause. A second careful set, or better instruments, would tell.',
  'no-single-cause':
    'No single cause accounts for all of this. Check the probes first. Then think of two faults at once: they can add up, hide each other, or do more together than alone.',
  'no-pattern': 'What is clearly off fits no known pattern. Check the probes and the setup first.',
  'one-sign': 'Only one sign is clear, and several causes can share it.',
  frozen: 'Read on ice, this serves the diagnosis only, never the charge.',
  'pull-down': 'The house is still cooling down: read a second time in 5 minutes.',
  'refrigerant-in-doubt':
    'The standing pressure is below saturation: no liquid is left, or this is another refrigerant. Confirm it before anything else.',
  'subcooling-apparent': 'With air in the system, head and subcooling show the air and not the charge.',
  hunting: 'The valve hunts: take the mean superheat of several swings.',
};

export const diagnosisTexts: DiagnosisTexts = { causes, evidence, measurements, notes };
