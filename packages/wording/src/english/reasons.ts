/** Why a criterion is not verifiable or not judged. */
import type { ReasonFigures } from '@chargewright/engine';
import type { MessageTexts } from '../message-texts';

export const reasonTexts: MessageTexts<ReasonFigures> = {
  'readings-missing': (f) => `Not read yet: ${f.readings}.`,
  'target-missing': 'There is no target yet: take it from the nameplate or the maker’s data.',
  'capacity-missing': 'The nominal capacity is missing: without it there is no least airflow.',
  'setup-not-stated': (f) => `By the maker’s data nothing is assumed. State first: ${f.fields}.`,
  'superheat-range-missing':
    'The maker’s superheat range for this valve is not entered: superheat is shown, not judged. Look in the manual.',
  'design-airflow-missing': 'The design airflow is not entered: take it from the maker’s blower data.',
  'makers-limits-missing':
    'The maker’s limits for outdoor and return air are not entered: they stand beside his table or in the manual.',
  'split-not-by-these-rules': 'The published split table is not this maker’s: these rules do not judge by it.',
  'conditions-not-recorded': 'Running time, lowest return air or the look-over before reading are not recorded.',
  'instruments-not-recorded': 'It is not recorded when the instruments were last checked.',
  'target-for-other-port': 'The target holds for another high-side port than the one this pressure was read at.',
  'suction-port-only': 'There is only a suction port: without a liquid pressure there is no subcooling.',
  'outside-curve': 'The pressure lies outside the range this refrigerant’s properties are known for.',
  'outside-range': 'A reading lies outside the range of the formula that needs it.',
  'instruments-old': (f) => `The instruments were checked ${f.days} ago: too long for these rules.`,
  'heating-mode': 'In heating no cooling target holds.',
  'metered-outdoors':
    'This kind meters the liquid outdoors: the small pipe carries liquid and vapor, so subcooling cannot be read there.',
  'not-in-scope': 'These rules do not cover packaged units.',
  'part-stage': 'The system is not known to run at full stage: targets hold at full stage only.',
  'not-in-charge-mode': 'The inverter is not in its charge mode: its speed moves the readings, not the charge.',
  'port-not-stated': 'It is not stated which high-side port this unit has.',
  'liquid-reading-at-discharge-port':
    'The unit has a discharge port only: this pressure is not a liquid pressure. Type it as discharge pressure.',
  'not-ready': (f) => `Not ready for the test: ${f.items}.`,
  'running-time': (f) => `The system has run ${f.minutes}; it takes ${f.least}.`,
  'return-too-cool': (f) => `The return air was down to ${f.actual}; the test needs at least ${f.least}.`,
  'return-too-warm': (f) => `The return air is at ${f.actual}; the maker allows the test up to ${f.most}.`,
  'outdoor-too-cold': (f) => `It is ${f.actual} outdoors; the test needs at least ${f.least}.`,
  'outdoor-too-hot': (f) => `It is ${f.actual} outdoors; the test is allowed up to ${f.most}.`,
  'access-hole-missing':
    'An access hole beside the coil for the air sensors is part of this test: it is not recorded as there.',
  stale: (f) => `Too old to count: ${f.readings}.`,
  'ports-swapped': 'Suction reads as high as the high side: hoses swapped, or the compressor is not running.',
  'saturation-impossible': 'These readings cannot belong together in a running system.',
  'no-target-here': 'There is no target for these conditions: the chart prints a dash or does not reach them.',
  'target-may-not-exist': (f) =>
    `These conditions lie so near a dash of the chart that there may be no target (${f.probability} likely).`,
  'airflow-too-low': 'The airflow is too low: raise it first, the charge is judged after.',
  'airflow-not-proven':
    'These rules want the airflow proved before the charge is judged, and nothing counts as proof yet.',
  'split-above': 'The split is above its band: re-read the wet bulb, then look at the airflow, then judge the charge.',
  freezing: 'The coil is freezing: no charge is judged on ice.',
  flash:
    'Subcooling reads below zero: it is about zero, with vapor in the liquid line. Nothing is called within on that.',
};
