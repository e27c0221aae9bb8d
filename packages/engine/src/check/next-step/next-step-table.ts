/**
 * The next step, as data: the first row whose conditions all hold gives the one thing to do and at most two things not to do yet.
 * Order: fit for the test, impossible readings, stops, conditions, what is missing or stale, airflow, data quality, too close, outside, within.
 * Reviewed against the fault patterns of the trade (common practice; see each procedure's sources).
 */
import type { NextStepCode, NotYetCode } from '../codes';
import type { Facts } from './facts';

/** Every named fact must have one of the values listed. */
export type Conditions = { readonly [Name in keyof Facts]?: readonly Facts[Name][] };

export interface NextStepRow {
  readonly when: Conditions;
  readonly step: NextStepCode;
  readonly notYet: readonly NotYetCode[];
}

const MOVE_NOTHING = ['move-no-refrigerant'] as const;
const ADD_NOTHING = ['add-nothing'] as const;
const ADD_AND_RECOVER_NOTHING = ['add-nothing', 'recover-nothing'] as const;

/** Whatever keeps the system from being judged, a stop still holds: the step stays what it is, and that it must not run on is said first. */
const shutDownFirst = (rows: readonly NextStepRow[]): readonly NextStepRow[] =>
  rows.flatMap((row) => [
    { ...row, when: { ...row.when, shutDown: ['yes'] }, notYet: ['shut-down', ...row.notYet] },
    row,
  ]);

const fit: readonly NextStepRow[] = [
  { when: { unfit: ['heating-mode'] }, step: 'cooling-season-or-weigh-in', notYet: MOVE_NOTHING },
  { when: { unfit: ['metered-outdoors'] }, step: 'weigh-in', notYet: MOVE_NOTHING },
  { when: { unfit: ['not-in-scope'] }, step: 'choose-other-rules', notYet: MOVE_NOTHING },
  { when: { unfit: ['part-stage'] }, step: 'bring-to-full-stage', notYet: MOVE_NOTHING },
  { when: { unfit: ['not-in-charge-mode'] }, step: 'bring-to-charge-mode', notYet: MOVE_NOTHING },
  { when: { unfit: ['not-ready'] }, step: 'mend-before-test', notYet: MOVE_NOTHING },
  { when: { unfit: ['port-not-stated'] }, step: 'state-the-port', notYet: MOVE_NOTHING },
];

const impossible: readonly NextStepRow[] = [
  { when: { impossible: ['ports-swapped'] }, step: 'check-hoses', notYet: ADD_NOTHING },
  { when: { impossible: ['saturation-impossible'] }, step: 'check-refrigerant-and-probes', notYet: ADD_NOTHING },
];

/** Liquid return: the first cause that fits; where the superheat is no more than its uncertainty the compressor goes off as well. */
const liquidReturnCauses: readonly (Pick<NextStepRow, 'step' | 'when'> & { readonly recover: boolean })[] = [
  { when: { superheatTarget: ['none-here', 'near-floor'] }, step: 'come-back-at-higher-target', recover: false },
  { when: { airflow: ['split-above', 'measured-low'] }, step: 'reread-wet-bulb-then-airflow', recover: true },
  { when: { air: ['found'] }, step: 'recover-air-weigh-in', recover: true },
  { when: { metering: ['orifice'], subcoolingLevel: ['high'] }, step: 'check-overcharge-or-air', recover: true },
  { when: { metering: ['valve'], subcooling: ['above'] }, step: 'check-overcharge-or-air', recover: true },
  {
    when: { metering: ['valve'], subcooling: ['unknown'], subcoolingLevel: ['high'] },
    step: 'check-overcharge-or-air',
    recover: true,
  },
  { when: {}, step: 'check-metering', recover: true },
];

/** On a valve liquid return is only ever a superheat of about zero; the floor is that of an orifice. */
const underTheFloor = liquidReturnCauses.filter(({ when }) => !when.metering?.includes('valve'));

const stops: readonly NextStepRow[] = [
  ...liquidReturnCauses.map(({ when, step, recover }): NextStepRow => ({
    when: { stop: ['liquid-return'], shutDown: ['yes'], ...when },
    step,
    notYet: ['shut-down', recover ? 'add-nothing' : 'move-no-refrigerant'],
  })),
  ...underTheFloor.map(({ when, step, recover }): NextStepRow => ({
    when: { stop: ['liquid-return'], ...when },
    step,
    notYet: recover ? ADD_NOTHING : ['add-nothing', 'recover-nothing'],
  })),
  {
    when: { stop: ['freezing'], airflow: ['split-above', 'measured-low'] },
    step: 'thaw-then-airflow',
    notYet: ADD_NOTHING,
  },
  { when: { stop: ['freezing'], subcoolingLevel: ['low'] }, step: 'thaw-then-leak-search', notYet: ADD_NOTHING },
  {
    when: { stop: ['freezing'], subcoolingLevel: ['clear', 'high'], superheat: ['above'] },
    step: 'thaw-then-drier-drop',
    notYet: ADD_NOTHING,
  },
  { when: { stop: ['freezing'] }, step: 'thaw-then-diagnose', notYet: ADD_NOTHING },
  {
    when: { stop: ['high-pressure'], air: ['found'] },
    step: 'recover-air-weigh-in',
    notYet: ['shut-down', 'add-nothing'],
  },
  { when: { stop: ['high-pressure'] }, step: 'shut-down-high-pressure', notYet: ['shut-down', 'add-nothing'] },
  { when: { stop: ['hot-discharge'] }, step: 'shut-down-hot-discharge', notYet: ['shut-down'] },
];

const conditions: readonly NextStepRow[] = [
  { when: { lacking: ['setup'] }, step: 'state-the-setup', notYet: MOVE_NOTHING },
  { when: { condition: ['running-time'] }, step: 'run-longer', notYet: ['do-not-judge-yet'] },
  { when: { condition: ['outdoor-too-cold'] }, step: 'wait-for-warmer-weather', notYet: MOVE_NOTHING },
  { when: { condition: ['outdoor-too-hot'] }, step: 'wait-for-cooler-weather', notYet: MOVE_NOTHING },
  { when: { condition: ['return-too-cool'] }, step: 'warm-the-house', notYet: MOVE_NOTHING },
  { when: { condition: ['return-too-warm'] }, step: 'cool-the-house', notYet: MOVE_NOTHING },
  { when: { makersTarget: ['none-here'] }, step: 'reach-a-target', notYet: MOVE_NOTHING },
  { when: { superheatTarget: ['none-here'] }, step: 'reach-a-target', notYet: MOVE_NOTHING },
];

const lacking: readonly NextStepRow[] = [
  { when: { lacking: ['readings'] }, step: 'take-readings', notYet: [] },
  { when: { lacking: ['stale'] }, step: 'take-readings-again', notYet: MOVE_NOTHING },
  { when: { lacking: ['target-port'] }, step: 'find-target-for-this-port', notYet: MOVE_NOTHING },
  { when: { lacking: ['nameplate-target'] }, step: 'find-nameplate-target', notYet: MOVE_NOTHING },
  { when: { lacking: ['port'] }, step: 'read-discharge-pressure', notYet: MOVE_NOTHING },
  { when: { lacking: ['suction-line-table'] }, step: 'find-suction-line-table', notYet: MOVE_NOTHING },
  { when: { lacking: ['outside-tables'] }, step: 'check-refrigerant-and-probes', notYet: MOVE_NOTHING },
  { when: { record: ['conditions'] }, step: 'record-conditions', notYet: MOVE_NOTHING },
  { when: { record: ['access-hole'] }, step: 'make-access-hole', notYet: MOVE_NOTHING },
  { when: { record: ['instruments'] }, step: 'check-instruments', notYet: MOVE_NOTHING },
  { when: { runningTime: ['unrecorded'] }, step: 'record-conditions', notYet: MOVE_NOTHING },
];

const airflow: readonly NextStepRow[] = [
  { when: { airflow: ['measured-low'] }, step: 'raise-airflow', notYet: MOVE_NOTHING },
  { when: { airflowProof: ['wanted'] }, step: 'measure-airflow', notYet: MOVE_NOTHING },
  {
    when: { airflow: ['split-above'], metering: ['orifice'], superheat: ['above'] },
    step: 'suspect-probes',
    notYet: MOVE_NOTHING,
  },
  { when: { airflow: ['split-above'] }, step: 'reread-wet-bulb-then-airflow', notYet: MOVE_NOTHING },
];

const quality: readonly NextStepRow[] = [
  { when: { quality: ['wrong-refrigerant'] }, step: 'confirm-refrigerant', notYet: MOVE_NOTHING },
  { when: { quality: ['dry-wick'] }, step: 'wet-the-wick', notYet: MOVE_NOTHING },
  { when: { quality: ['wet-bulb-moved'] }, step: 'bracket-wet-bulb-again', notYet: MOVE_NOTHING },
  { when: { quality: ['liquid-colder-than-air'] }, step: 'place-liquid-probe-again', notYet: MOVE_NOTHING },
  { when: { quality: ['pull-down'] }, step: 'read-twice', notYet: MOVE_NOTHING },
];

/** What a separating test has shown outweighs the pattern of the readings. A loose bulb is mended before anything read at the valve counts. */
const shown: readonly NextStepRow[] = [
  { when: { air: ['found'] }, step: 'recover-air-weigh-in', notYet: ADD_NOTHING },
  { when: { air: ['below'] }, step: 'check-refrigerant-and-probes', notYet: MOVE_NOTHING },
  { when: { metering: ['valve'], bulb: ['wrong'] }, step: 'mend-bulb', notYet: MOVE_NOTHING },
  { when: { drier: ['drop'] }, step: 'find-restriction', notYet: MOVE_NOTHING },
];

const tooClose: readonly NextStepRow[] = [
  {
    when: { overall: ['too-close-to-call'], settling: ['impossible'] },
    step: 'settle-with-better-instrument',
    notYet: MOVE_NOTHING,
  },
  { when: { overall: ['too-close-to-call'] }, step: 'settle-with-another-reading', notYet: MOVE_NOTHING },
];

/** Adding comes after a search for the leak, in small steps, and only so often. */
const lowCharge = (when: Conditions): readonly NextStepRow[] => [
  { when: { ...when, leak: ['search'] }, step: 'leak-first', notYet: ADD_NOTHING },
  { when: { ...when, leak: ['found'] }, step: 'mend-recover-weigh-in', notYet: ADD_NOTHING },
  { when: { ...when, leak: ['locate'] }, step: 'locate-mend-weigh-in', notYet: ADD_NOTHING },
  { when: { ...when, leak: ['recover'] }, step: 'recover-and-weigh-in', notYet: ADD_NOTHING },
  { when: { ...when, leak: ['add'] }, step: 'add-in-steps', notYet: [] },
];

/** No steps of refrigerant in heating: the low side is not where it is in cooling, and the charge is finished in the cooling season. */
const heating: readonly NextStepRow[] = [
  { when: { method: ['heating'], overall: ['above', 'below'] }, step: 'weigh-in-after-heating', notYet: MOVE_NOTHING },
  { when: { method: ['heating'], overall: ['within'] }, step: 'record-heating', notYet: [] },
];

const outside: readonly NextStepRow[] = [
  { when: { overall: ['above', 'below'], weather: ['low-head'] }, step: 'raise-head', notYet: MOVE_NOTHING },
  { when: { overall: ['above', 'below'], weather: ['cool'] }, step: 'cool-weather-hold', notYet: MOVE_NOTHING },
];

/** An orifice that is judged by the maker's curve: how full it is, is known before its superheat is looked at. */
const orificeByMakersMethod: readonly NextStepRow[] = [
  ...lowCharge({ method: ['makers'], charge: ['low'] }),
  { when: { method: ['makers'], charge: ['high'], air: ['none'] }, step: 'recover-in-steps', notYet: ADD_NOTHING },
  { when: { method: ['makers'] }, step: 'air-test-then-recover', notYet: ADD_AND_RECOVER_NOTHING },
];

const orifice: readonly NextStepRow[] = [
  { when: { overall: ['above'], subcoolingLevel: ['unread'] }, step: 'read-liquid-pair', notYet: ADD_NOTHING },
  ...lowCharge({ overall: ['above'], subcoolingLevel: ['low'] }),
  ...lowCharge({ overall: ['above'], subcoolingLevel: ['unclear', 'unreadable'], drier: ['small'] }),
  {
    when: { overall: ['above'], subcoolingLevel: ['unclear', 'unreadable'] },
    step: 'measure-drier-drop',
    notYet: ADD_NOTHING,
  },
  { when: { overall: ['above'], drier: ['small'] }, step: 'check-orifice', notYet: MOVE_NOTHING },
  { when: { overall: ['above'] }, step: 'find-restriction', notYet: MOVE_NOTHING },
  {
    when: { overall: ['below'], subcoolingLevel: ['high'], air: ['none'] },
    step: 'recover-in-steps',
    notYet: ADD_NOTHING,
  },
  {
    when: { overall: ['below'], subcoolingLevel: ['high'] },
    step: 'air-test-then-recover',
    notYet: ADD_AND_RECOVER_NOTHING,
  },
  { when: { overall: ['below'] }, step: 'check-orifice-compressor-condenser', notYet: MOVE_NOTHING },
];

/** The valve's own part: which of bulb, screen and drier is looked at next, until all that is outside the valve is known to be right. */
function starvedOrFlooded(when: Conditions, step: NextStepCode, notYet: NextStepRow['notYet']): readonly NextStepRow[] {
  const starved = when.superheat?.includes('above') ?? false;
  const narrowed: readonly NextStepRow[] = starved
    ? [
        { when: { ...when, bulb: ['right'], drier: ['small'] }, step: 'check-valve', notYet },
        { when: { ...when, drier: ['small'] }, step: 'check-bulb-and-screen', notYet },
        { when: { ...when, bulb: ['right'] }, step: 'measure-drier-drop', notYet },
      ]
    : [{ when: { ...when, bulb: ['right'] }, step: 'check-valve', notYet }];
  return [...narrowed, { when, step, notYet }];
}

const valve: readonly NextStepRow[] = [
  { when: { superheat: ['unknown'] }, step: 'read-suction-pair', notYet: MOVE_NOTHING },
  ...starvedOrFlooded({ subcooling: ['below'], superheat: ['below'] }, 'check-bulb-and-valve', MOVE_NOTHING),
  ...lowCharge({ subcooling: ['below'] }),
  ...starvedOrFlooded({ subcooling: ['within'], superheat: ['above'] }, 'check-bulb-screen-drier', MOVE_NOTHING),
  ...starvedOrFlooded({ subcooling: ['within'], superheat: ['below'] }, 'check-bulb-and-airflow', MOVE_NOTHING),
  ...starvedOrFlooded(
    { subcooling: ['above'], superheat: ['above'] },
    'find-restriction-recover-nothing',
    ADD_AND_RECOVER_NOTHING,
  ),
  {
    when: { subcooling: ['above'], superheat: ['below'], bulb: ['open'] },
    step: 'check-bulb-then-recover',
    notYet: ADD_AND_RECOVER_NOTHING,
  },
  {
    when: { subcooling: ['above'], head: ['high'], air: ['open'] },
    step: 'air-test-then-recover',
    notYet: ADD_AND_RECOVER_NOTHING,
  },
  { when: { subcooling: ['above'] }, step: 'recover-in-steps', notYet: ADD_NOTHING },
];

const forMetering = (metering: Facts['metering'], rows: readonly NextStepRow[]): readonly NextStepRow[] =>
  rows.map(({ when, ...rest }) => ({ ...rest, when: { overall: ['above', 'below'], ...when, metering: [metering] } }));

const within: readonly NextStepRow[] = [
  {
    when: { overall: ['within'], metering: ['orifice'], airSeen: ['no'] },
    step: 'read-supply-or-airflow',
    notYet: [],
  },
  { when: { overall: ['within'], metering: ['valve'], superheat: ['unknown'] }, step: 'read-suction-pair', notYet: [] },
  { when: { overall: ['within'] }, step: 'record', notYet: [] },
];

export const NEXT_STEP_TABLE: readonly NextStepRow[] = [
  ...shutDownFirst([...fit, ...impossible]),
  ...stops,
  ...conditions,
  ...lacking,
  ...airflow,
  ...quality,
  ...shown,
  ...tooClose,
  ...heating,
  ...outside,
  ...forMetering('orifice', orificeByMakersMethod),
  ...forMetering('orifice', orifice),
  ...forMetering('valve', valve),
  ...within,
];

/** The first row that holds. The table is meant to have one for every reachable combination: none is a defect, and throws. */
export function findRow(facts: Facts): NextStepRow {
  const row = NEXT_STEP_TABLE.find(({ when }) => holds(when, facts));
  if (row === undefined) throw new RangeError(`no next step for ${JSON.stringify(facts)}`);
  return row;
}

const holds = (when: Conditions, facts: Facts): boolean =>
  (Object.keys(when) as (keyof Facts)[]).every((name) => (when[name] as readonly unknown[]).includes(facts[name]));
