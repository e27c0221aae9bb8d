/** Cautions: beside a result, never instead of it. */
import type { CautionFigures } from '@chargewright/engine';
import type { MessageTexts } from '../message-texts';

const UNUSUAL = 'Look at the reading and its place once more.';

export const cautionTexts: MessageTexts<CautionFigures> = {
  'saturation-impossible':
    'Add nothing. These readings cannot belong together: check the refrigerant (nameplate and retrofit label), gauge zero, ports and clamps.',
  'ports-swapped': (f) =>
    `Suction reads ${f.suction}, the high side ${f.liquid}. Check for swapped hoses, or a compressor that is not running.`,
  'freeze-risk': (f) =>
    `The coil evaporates at ${f.evaporating}: it can freeze. Watch for ice and for falling pressure.`,
  'wrong-refrigerant': (f) =>
    `You wrote ${f.written}, computed is ${f.computed}. Confirm the refrigerant by nameplate and retrofit label.`,
  'wrong-column': (f) =>
    `You wrote ${f.written}, computed is ${f.computed}. It looks like the other column: dew is for superheat, bubble for subcooling.`,
  flash: (f) =>
    `Subcooling reads ${f.subcooling}: it is about zero. It is below target; how much is not known while vapor runs in the liquid line.`,
  'dry-wick': (f) => `Check the ${f.readings}: as wet as this air reads, the wick may be dry or the sensor wet.`,
  'wet-bulb-moved': (f) =>
    `The wet bulb moved from ${f.before} to ${f.after} while you read outdoors: the later one is used. Take both again.`,
  'humidity-contradiction': (f) =>
    `Wet bulb ${f.measured} and relative humidity contradict each other (the humidity gives ${f.fromHumidity}). The wet bulb is used.`,
  'liquid-colder-than-air': (f) =>
    `The liquid line at ${f.liquid} is colder than the outdoor air at ${f.outdoor}. Look at both places: shade, clean metal, tight clamp.`,
  'pull-down': (_, say) =>
    `The house is still cooling down and the targets move. Take two sets of readings 5 minutes apart that agree: wet bulb within ${say.deltaF(0.5)}, return within ${say.deltaF(1)}, superheat and subcooling within ${say.deltaF(1)}.`,
  'cool-weather': (f) =>
    `It is ${f.outdoor} outdoors: cool for judging the charge. If a result is outside its band, move no refrigerant on it.`,
  'low-head': (f) =>
    `Only ${f.difference} between high and low side (at least ${f.least}): the valve may not be fed fully.`,
  'makers-chart-not-by-these-rules': (f) =>
    `Entered but not judged by: ${f.charts}. These rules take their target elsewhere; the general rules or the maker’s take it from here.`,
  'makers-chart-for-orifice': (f) =>
    `Entered but not judged by: ${f.charts}. It is for a fixed orifice, and this system has a valve. Look at the metering device once more.`,
  'makers-chart-for-other-port': (f) =>
    `Entered but not judged by: ${f.charts}. It holds for another high-side port than the one that is read.`,
  'makers-chart-odd': (f) => `Some figures look odd: ${f.charts}. Compare what was typed with the print.`,
  'line-set-too-long': (f) =>
    `The line set is ${f.length} long; the maker’s limit is ${f.most}. Follow the maker’s rules for long lines: charge, oil, pipe size.`,
  'long-lines': (f) => `The line set lifts ${f.lift}. Follow the maker’s rules for long lines: charge, oil, pipe size.`,
  'elevation-assumed': 'Sea level is assumed. Enter the elevation: gauge pressures count from the air around you.',
  'gauge-not-zeroed': 'The gauges are not known to be zeroed. Zero them in the open air.',
  'instruments-old': (f) => `The instruments were last checked ${f.days} ago. Hold them against a reference.`,
  'airflow-not-proven': 'Nothing shows the airflow yet. Read the supply dry bulb, or measure the airflow.',
  'split-above':
    'The temperature split is above its band: re-read the wet bulb; a dry wick looks exactly like low airflow.',
  'split-below':
    'The temperature split is below its band: measure the supply air again at several places of the duct. If it stays low, the capacity is probably low; that alone does not say why.',
  'setup-assumed': (f) => `Assumed, because not stated: ${f.fields}.`,
  'conditions-not-recorded':
    'Running time, lowest return air or the look-over are not recorded. The result holds only if the system was ready.',
  'faults-may-hide':
    'On a fixed orifice low charge and low airflow can hide each other. The liquid pressure and liquid line would tell.',
  'model-grade': 'The properties of this refrigerant are known less closely; the ± allows for it.',
  'model-doubtful':
    'The properties of this refrigerant are estimated. Compare with the maker’s pressure–temperature chart before acting.',
  flammable:
    'This refrigerant burns. Ventilate, keep ignition sources away, use tools listed for it, leave the leak sensor in service. Total charge and room size by the unit’s label.',
  'near-limit': (f) => `${f.actual} lies so near the limit of ${f.limit} that the instrument cannot tell the side.`,
  'filter-or-coil-dirty': 'Filter or coil is not clean: clean it before trusting a result.',
  'unusual-reading': (f) => `Unusual: ${f.readings} ${f.actual}. ${UNUSUAL}`,
  'unusual-evaporating': (f) => `Evaporating at ${f.actual} is unusual. ${UNUSUAL}`,
  'unusual-condensing': (f) => `Condensing ${f.actual} over the outdoor air is unusual. ${UNUSUAL}`,
  'unusual-liquid-line': (f) =>
    `A liquid line at ${f.actual} is warmer than the condensing temperature: unusual. ${UNUSUAL}`,
  'unusual-subcooling': (f) => `Subcooling of ${f.actual} is unusual. ${UNUSUAL}`,
  'unusual-superheat': (f) =>
    `Superheat of ${f.actual} is unusual for a valve. It is not judged without the maker’s range: look the range up.`,
};
