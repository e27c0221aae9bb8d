/** The card of causes and the guides of the separating tests. Common practice; the maker's instructions come first. */
import type { AirFinding, BulbState, CurrentTest, DrierFinding, ValveMove } from '@chargewright/engine';

export type TestId = 'drier' | 'air' | 'bulb' | 'current' | 'wetBulb';

export interface TestGuide {
  readonly name: string;
  /** What it tells apart. */
  readonly purpose: string;
  readonly steps: readonly string[];
  readonly safety: readonly string[];
}

const ENERGIZED = 'Panels off near a live contactor only while this needs it; back on before anything is read.';

const guides: Readonly<Record<TestId, TestGuide>> = {
  drier: {
    name: 'Drop over the drier',
    purpose: 'Tells a restriction from low charge and from a valve that starves.',
    steps: [
      'Let the system run. Clamp on clean pipe close before the filter-drier, wrap it, wait until it stands still.',
      'Read it, then the same clamp close after the drier.',
      'No drier, or no drop: follow the liquid line the same way, wherever it could be squeezed or blocked.',
    ],
    safety: ['Keep off the discharge line: it burns skin.'],
  },
  air: {
    name: 'Air test',
    purpose: 'Tells air or another gas in the system from too much refrigerant.',
    steps: [
      'If the maker permits it: shut the liquid valve while the system runs, until the refrigerant stands in the outdoor coil, then stop it. Never past the low-pressure cut-out, never into a vacuum.',
      'If not: leave the valves open. Then it counts only with both coils at one temperature.',
      'Compressor off, outdoor fan on. Wait until pressure and coil no longer change: 10 to 15 minutes.',
      'Read the standing pressure and the temperature on a bend of the outdoor coil.',
    ],
    safety: [
      'Lock out and test dead before a lead is taken off the compressor; the fan alone is switched on again.',
      'Open every valve again before the compressor runs.',
    ],
  },
  bulb: {
    name: 'Bulb and hunting',
    purpose: 'Tells a loose or dead bulb from a valve that sticks.',
    steps: [
      'Bulb: tight on clean pipe, at the place the maker shows, wrapped.',
      'Warm it in the hand: superheat must fall within a minute or two. Then let it cool again.',
      'Watch superheat for five minutes: does it hold still, or swing up and down?',
    ],
    safety: ['Fans can start by themselves: keep hands and sleeves away.'],
  },
  current: {
    name: 'Compressor current',
    purpose: 'Tells a compressor that pumps poorly from the rest.',
    steps: [
      'Clamp one conductor of the compressor, running at full stage.',
      'Take what the maker expects at these conditions, or what this unit drew when it was right. The nameplate’s rated current is neither.',
    ],
    safety: ['Capacitors keep their charge. Test dead before touching terminals.', ENERGIZED],
  },
  wetBulb: {
    name: 'Wet bulb before and after',
    purpose: 'For one person alone: shows that the indoor air held still while you read outdoors.',
    steps: [
      'Wet the wick and read the return wet bulb before you go outdoors: that is the one here.',
      'Read outdoors, come back, and read the return wet bulb again with the same instrument.',
    ],
    safety: ['Phone in the pocket on the ladder.'],
  },
};

const bulbs: Readonly<Record<BulbState, { readonly label: string; readonly hint: string }>> = {
  right: { label: 'In order', hint: 'Tight, at its place, wrapped, and it answers to warmth.' },
  loose: { label: 'Loose', hint: 'Or misplaced, or not wrapped.' },
  'charge-lost': { label: 'No answer', hint: 'Warming it moves nothing: its charge is lost.' },
};

const valves: Readonly<Record<ValveMove, { readonly label: string; readonly hint: string }>> = {
  steady: { label: 'Holds still', hint: '' },
  hunting: { label: 'Swings', hint: 'Up and down within a minute or so.' },
};

/** A measured value, its ±, and the limit it is held against. */
type Outcome = (value: string, plusMinus: string, limit: string) => string;

const NEAR = (value: string, plusMinus: string, limit: string): string =>
  `${value} ± ${plusMinus}: too near to ${limit} to call.`;

const drierOutcomes: Readonly<Record<Exclude<DrierFinding, 'unmeasured'>, Outcome>> = {
  unclear: (value, plusMinus, limit) => `${NEAR(value, plusMinus, limit)} Read again, with one clamp for both places.`,
  small: (value, plusMinus, limit) => `${value} ± ${plusMinus}, less than about ${limit}: no restriction here.`,
  drop: (value, plusMinus, limit) => `${value} ± ${plusMinus}, more than about ${limit}: a restriction.`,
};

const airOutcomes: Readonly<Record<Exclude<AirFinding, 'untested'>, Outcome>> = {
  'not-valid': (_value, _plusMinus, limit) =>
    `This does not count yet: with the liquid free to move, both coils must be within ${limit} of each other, or the colder one hides the air.`,
  unclear: (value, plusMinus, limit) => `${NEAR(value, plusMinus, limit)} Let it stand longer and read again.`,
  none: (value, plusMinus) => `${value} ± ${plusMinus} over saturation: no air.`,
  found: (value, plusMinus) => `${value} ± ${plusMinus} over saturation: air in the system.`,
  below: (value, plusMinus) =>
    `${value} ± ${plusMinus} against saturation: below it. No liquid is left, or this is another refrigerant.`,
};

const currentOutcomes: Readonly<Record<Exclude<CurrentTest['finding'], 'unmeasured'>, Outcome>> = {
  unclear: (value, plusMinus, limit) => NEAR(value, plusMinus, limit),
  low: (value, plusMinus) => `${value} ± ${plusMinus} against the expected: low.`,
  'as-expected': (value, plusMinus) => `${value} ± ${plusMinus} against the expected: as it should be.`,
  high: (value, plusMinus) => `${value} ± ${plusMinus} against the expected: high.`,
};

export const separatingTestWords = {
  causesTitle: 'What could cause this',
  causesNote: 'Causes to check, always in this order: the order says nothing about likelihood.',
  fits: 'Fits',
  doesNotFit: 'Does not fit',
  measureNext: 'Measure next',
  goThere: 'Go there',
  goThereFor: (measurement: string) => `Go there: ${measurement}`,
  testsTitle: 'Tests that tell causes apart',
  testsNote: 'What you record here counts at once. After an adjustment it is asked again.',
  steps: 'How',
  safety: 'Mind',
  guides,
  liquidShutIn: 'The liquid is shut into the outdoor coil',
  bulbLegend: 'The bulb',
  bulbs,
  valveLegend: 'Superheat',
  valves,
  unmade: 'not made',
  made: 'recorded',
  drierOutcomes,
  airOutcomes,
  currentOutcomes,
  wetBulbMean: (value: string, plusMinus: string) => `The mean counts: ${value} ± ${plusMinus}.`,
  wetBulbMoved: (limit: string) => `More than ${limit} apart: take both again. Until then the later one counts.`,
  wetBulbWaits: 'Now read outdoors, then the return wet bulb once more.',
};
