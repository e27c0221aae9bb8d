/** What a technician is told, case by case: the review of the next-step table. Every row is reached, each by a system with a name. */
import { describe, expect, it } from 'vitest';
import { bubblePressurePa, dewPressurePa } from '../../refrigerants/saturation';
import { PA_PER_PSI, temperatureFromK, temperatureToK } from '../../units';
import { airflowEvidence, judgeAirflow, judgeSplit, splitEvidence, splitTarget } from '../criteria/air';
import { chargeMethod } from '../charge-method';
import { chargeTarget } from '../criteria/charge-target';
import type { NextStepCode, NotYetCode } from '../codes';
import { deriveQuantities } from '../derived-quantities';
import { unfitReason } from '../fit-for-test';
import type { EvaluationRequest, MakersChartInput, ReadingInput } from '../request';
import { impossibleReadings } from '../saturation-plausibility';
import type { Changes, ReadingChanges } from '../testing/healthy-systems';
import { evaluate, inputOf, orificeRequest, valveRequest, withPlusMinus } from '../testing/healthy-systems';
import type { Facts } from './facts';
import { gatherFacts } from './facts';
import type { NextStepRow } from './next-step-table';
import { findRow, NEXT_STEP_TABLE } from './next-step-table';

type Case = readonly [name: string, request: EvaluationRequest, step: NextStepCode, ...notYet: NotYetCode[]];

const orifice = orificeRequest;
const valve = valveRequest;

/** Superheat 15, target 15 and subcooling 10 °F on the healthy orifice; 12, 4…25 and 9.6 on the healthy valve. */
const superheat = (deltaF: number): ReadingChanges => ({ suctionLineTemperature: 40 + deltaF });
const valveSuperheat = (deltaF: number): ReadingChanges => ({ suctionLineTemperature: 39.84 + deltaF });
const subcooling = (deltaF: number): ReadingChanges => ({ liquidLineTemperature: 105 - deltaF });
const valveSubcooling = (deltaF: number): ReadingChanges => ({ liquidLineTemperature: 104.6 - deltaF });
const SPLIT_ABOVE = { supplyDryBulb: 52 } as const;
const HOT = { dischargeLineTemperature: 240 } as const;
const icy = (refrigerant: 'R-22' | 'R-410A', superheatF = 15): ReadingChanges => ({
  suctionPressure: {
    value: dewPressurePa({ refrigerant, temperatureK: temperatureToK(26, 'degF') }) / PA_PER_PSI,
    unit: 'psia',
  },
  suctionLineTemperature: 26 + superheatF,
});
const lowAirflow = { setup: { nominalCapacity: { value: 3, unit: 'ton' } }, readings: { airflow: 800 } } as const;
const target = (deltaF: number) => ({ targetSuperheat: { value: deltaF, unit: 'deltaF' } }) as const;
const old = (id: 'returnWetBulb' | 'liquidPressure', request: EvaluationRequest): ReadingInput => ({
  ...request.readings[id]!,
  ageSeconds: 900,
});
const LOW_ORIFICE = { ...superheat(25), ...subcooling(3) };
const LOW_VALVE = valveSubcooling(3.6);
const charged = { factoryCharge: { value: 6, unit: 'lb' } } as const;
const added = (lb: number) => ({ leakSearch: 'none-found', addedThisVisit: { value: lb, unit: 'lb' } }) as const;

/** Everything the certificates of 2019 ask for. */
const CEC_2019 = {
  procedure: 'cec-ra3.2-2019-installer',
  setup: { nominalCapacity: { value: 3, unit: 'ton' } },
  visit: { preflight: { panelsOn: 'ok', accessHole: 'ok' } },
  readings: { airflow: 1100 },
} as const;
const NO_LIQUID_PAIR = { liquidPressure: null, liquidLineTemperature: null } as const;

const FIT: readonly Case[] = [
  ['heating', valve({ setup: { mode: 'heating' } }), 'cooling-season-or-weigh-in', 'move-no-refrigerant'],
  [
    'heating with a hot discharge line',
    valve({ setup: { mode: 'heating' }, readings: HOT }),
    'cooling-season-or-weigh-in',
    'shut-down',
    'move-no-refrigerant',
  ],
  ['mini-split', valve({ setup: { kind: 'mini-split' } }), 'weigh-in', 'move-no-refrigerant'],
  [
    'multi-split with a frozen coil',
    valve({ setup: { kind: 'multi-split' }, readings: icy('R-410A') }),
    'weigh-in',
    'shut-down',
    'move-no-refrigerant',
  ],
  ['part stage', valve({ setup: { stage: 'part' } }), 'bring-to-full-stage', 'move-no-refrigerant'],
  [
    'part stage with a frozen coil',
    valve({ setup: { stage: 'part' }, readings: icy('R-410A') }),
    'bring-to-full-stage',
    'shut-down',
    'move-no-refrigerant',
  ],
  [
    'inverter not in its charge mode',
    valve({ setup: { chargeMode: false } }),
    'bring-to-charge-mode',
    'move-no-refrigerant',
  ],
  [
    'inverter not in its charge mode, hot discharge',
    valve({ setup: { chargeMode: false }, readings: HOT }),
    'bring-to-charge-mode',
    'shut-down',
    'move-no-refrigerant',
  ],
  [
    'packaged, under rules for split systems',
    valve({ procedure: 'cec-ra3.2-2008-installer', setup: { kind: 'packaged' } }),
    'choose-other-rules',
    'move-no-refrigerant',
  ],
  [
    'packaged, under rules for split systems, hot discharge',
    valve({ procedure: 'cec-ra3.2-2008-rater', setup: { kind: 'packaged' }, readings: HOT }),
    'choose-other-rules',
    'shut-down',
    'move-no-refrigerant',
  ],
  ['panels off', valve({ visit: { preflight: { panelsOn: 'not-ok' } } }), 'mend-before-test', 'move-no-refrigerant'],
  [
    'wet condenser and a head too high',
    valve({ visit: { preflight: { condenserDryAndClean: 'not-ok' } }, readings: { liquidPressure: 565 } }),
    'mend-before-test',
    'shut-down',
    'move-no-refrigerant',
  ],
  [
    'packaged, port not stated',
    valve({ setup: { kind: 'packaged', highSidePort: null } }),
    'state-the-port',
    'move-no-refrigerant',
  ],
  [
    'packaged, port not stated, hot discharge',
    valve({ setup: { kind: 'packaged', highSidePort: null }, readings: HOT }),
    'state-the-port',
    'shut-down',
    'move-no-refrigerant',
  ],
];

const IMPOSSIBLE: readonly Case[] = [
  ['hoses swapped', valve({ readings: { suctionPressure: 340, liquidPressure: 118 } }), 'check-hoses', 'add-nothing'],
  [
    'hoses swapped, hot discharge',
    valve({ readings: { suctionPressure: 340, liquidPressure: 118, ...HOT } }),
    'check-hoses',
    'shut-down',
    'add-nothing',
  ],
  [
    'condensing below the outdoor air',
    orifice({ readings: { liquidPressure: 150, liquidLineTemperature: 75 } }),
    'check-refrigerant-and-probes',
    'add-nothing',
  ],
  [
    'superheat far below zero, hot discharge',
    valve({ readings: { ...valveSuperheat(-6), ...HOT } }),
    'check-refrigerant-and-probes',
    'shut-down',
    'add-nothing',
  ],
];

const STOPS: readonly Case[] = [
  [
    'under the floor at a target of 6',
    orifice({ setup: target(6), readings: superheat(4) }),
    'come-back-at-higher-target',
    'add-nothing',
    'recover-nothing',
  ],
  [
    'under the floor in a dash',
    orifice({ readings: { ...superheat(4), outdoorDryBulb: 100, returnWetBulb: 60 } }),
    'come-back-at-higher-target',
    'add-nothing',
    'recover-nothing',
  ],
  [
    'liquid at the compressor at a target of 7',
    orifice({ setup: target(7), readings: superheat(1) }),
    'come-back-at-higher-target',
    'shut-down',
    'move-no-refrigerant',
  ],
  [
    'under the floor, split above',
    orifice({ readings: { ...superheat(4), ...SPLIT_ABOVE } }),
    'reread-wet-bulb-then-airflow',
    'add-nothing',
  ],
  [
    'liquid at the compressor, airflow measured low',
    orifice({ ...lowAirflow, readings: { ...lowAirflow.readings, ...superheat(1) } }),
    'reread-wet-bulb-then-airflow',
    'shut-down',
    'add-nothing',
  ],
  [
    'under the floor, subcooling high',
    orifice({ readings: { ...superheat(4), ...subcooling(16) } }),
    'check-overcharge-or-air',
    'add-nothing',
  ],
  [
    'liquid at the compressor, subcooling high',
    orifice({ readings: { ...superheat(1), ...subcooling(16) } }),
    'check-overcharge-or-air',
    'shut-down',
    'add-nothing',
  ],
  [
    'liquid back from a valve, subcooling above',
    valve({ readings: { ...valveSuperheat(1), ...valveSubcooling(15) } }),
    'check-overcharge-or-air',
    'shut-down',
    'add-nothing',
  ],
  [
    'liquid back from a valve, no target, subcooling high',
    valve({ setup: { targetSubcooling: null }, readings: { ...valveSuperheat(1), ...valveSubcooling(16) } }),
    'check-overcharge-or-air',
    'shut-down',
    'add-nothing',
  ],
  ['under the floor, nothing else wrong', orifice({ readings: superheat(4) }), 'check-metering', 'add-nothing'],
  [
    'liquid back from a valve, subcooling within',
    valve({ readings: valveSuperheat(1) }),
    'check-metering',
    'shut-down',
    'add-nothing',
  ],
  [
    'frozen, split above',
    orifice({ readings: { ...icy('R-22'), ...SPLIT_ABOVE } }),
    'thaw-then-airflow',
    'add-nothing',
  ],
  [
    'frozen, airflow measured low',
    valve({ ...lowAirflow, readings: { ...lowAirflow.readings, ...icy('R-410A') } }),
    'thaw-then-airflow',
    'add-nothing',
  ],
  [
    'frozen, subcooling 3',
    orifice({ readings: { ...icy('R-22', 25), ...subcooling(3) } }),
    'thaw-then-leak-search',
    'add-nothing',
  ],
  [
    'frozen, subcooling 12 and superheat high',
    orifice({ readings: { ...icy('R-22', 30), ...subcooling(12) } }),
    'thaw-then-drier-drop',
    'add-nothing',
  ],
  [
    'frozen, subcooling 6',
    orifice({ readings: { ...icy('R-22'), ...subcooling(6) } }),
    'thaw-then-diagnose',
    'add-nothing',
  ],
  [
    'frozen, subcooling 12 and superheat usual',
    valve({ readings: { ...icy('R-410A', 10), ...valveSubcooling(12) } }),
    'thaw-then-diagnose',
    'add-nothing',
  ],
  [
    'ice seen at 31 °F',
    valve({ visit: { iceSeen: true }, readings: { suctionPressure: 98, suctionLineTemperature: 43 } }),
    'thaw-then-diagnose',
    'add-nothing',
  ],
  [
    'head too high',
    valve({ readings: { liquidPressure: 565, liquidLineTemperature: 120, outdoorDryBulb: 100 } }),
    'shut-down-high-pressure',
    'shut-down',
    'add-nothing',
  ],
  [
    'frozen, split above, no airflow measured where the split is no proof',
    orifice({ ...CEC_2019, readings: { ...icy('R-22'), ...SPLIT_ABOVE, airflow: null } }),
    'thaw-then-airflow',
    'add-nothing',
  ],
  ['hot discharge line', valve({ readings: HOT }), 'shut-down-hot-discharge', 'shut-down'],
];

const CONDITIONS: readonly Case[] = [
  ['five minutes of running', orifice({ visit: { runningMinutes: 5 } }), 'run-longer', 'do-not-judge-yet'],
  [
    'cold outdoors',
    valve({ readings: { outdoorDryBulb: 50, liquidPressure: 260, liquidLineTemperature: 78 } }),
    'wait-for-warmer-weather',
    'move-no-refrigerant',
  ],
  [
    'cool house',
    valve({ visit: { lowestReturnDryBulb: { value: 68, unit: 'degF' } } }),
    'warm-the-house',
    'move-no-refrigerant',
  ],
  [
    'too hot for a superheat test',
    orifice({ ...CEC_2019, readings: { outdoorDryBulb: 116, returnWetBulb: 74, ...NO_LIQUID_PAIR } }),
    'wait-for-cooler-weather',
    'move-no-refrigerant',
  ],
  [
    'a dash of the chart',
    orifice({ readings: { outdoorDryBulb: 100, returnWetBulb: 60 } }),
    'reach-a-target',
    'move-no-refrigerant',
  ],
  [
    'beside a dash',
    orifice({ readings: { outdoorDryBulb: 95, returnWetBulb: 64.2 } }),
    'reach-a-target',
    'move-no-refrigerant',
  ],
];

const LACKING: readonly Case[] = [
  ['no wet bulb', orifice({ readings: { returnWetBulb: null } }), 'take-readings'],
  ['no liquid line', valve({ readings: { liquidLineTemperature: null } }), 'take-readings'],
  [
    'an old wet bulb',
    orifice({ readings: { returnWetBulb: old('returnWetBulb', orifice()) } }),
    'take-readings-again',
    'move-no-refrigerant',
  ],
  [
    'an old liquid pressure',
    valve({ readings: { liquidPressure: old('liquidPressure', valve()) } }),
    'take-readings-again',
    'move-no-refrigerant',
  ],
  ['no nameplate target', valve({ setup: { targetSubcooling: null } }), 'find-nameplate-target', 'move-no-refrigerant'],
  [
    'a target for another port',
    valve({ setup: { targetSubcoolingPort: 'discharge' } }),
    'find-target-for-this-port',
    'move-no-refrigerant',
  ],
  [
    'packaged orifice without its maker’s target',
    orifice({ setup: { kind: 'packaged' } }),
    'find-nameplate-target',
    'move-no-refrigerant',
  ],
  [
    'by the maker’s data alone, the stage not stated',
    valve({ procedure: 'manufacturer', setup: { stage: null } }),
    'state-the-setup',
    'move-no-refrigerant',
  ],
  [
    'by the maker’s data alone, an orifice without a target',
    orifice({ procedure: 'manufacturer' }),
    'find-nameplate-target',
    'move-no-refrigerant',
  ],
  [
    'a liquid pressure at a discharge port',
    valve({ setup: { highSidePort: 'discharge', targetSubcoolingPort: 'discharge' } }),
    'read-discharge-pressure',
    'move-no-refrigerant',
  ],
  [
    'a suction port only',
    valve({ setup: { highSidePort: 'none' }, readings: { liquidPressure: null } }),
    'find-suction-line-table',
    'move-no-refrigerant',
  ],
  [
    'a suction pressure below the curve',
    orifice({ readings: { suctionPressure: { value: 25, unit: 'inHgVac' } } }),
    'check-refrigerant-and-probes',
    'move-no-refrigerant',
  ],
  [
    'the lowest return air not recorded, where the rules gate on it',
    valve({ ...CEC_2019, visit: { ...CEC_2019.visit, lowestReturnDryBulb: null } }),
    'record-conditions',
    'move-no-refrigerant',
  ],
  [
    'no access hole, where it is part of the test',
    valve({ ...CEC_2019, visit: { preflight: { panelsOn: 'ok' } } }),
    'make-access-hole',
    'move-no-refrigerant',
  ],
  [
    'instruments checked 32 days ago, where the rules gate on it',
    valve({ ...CEC_2019, visit: { ...CEC_2019.visit, instrumentsCheckedDaysAgo: 32 } }),
    'check-instruments',
    'move-no-refrigerant',
  ],
  [
    'instruments not recorded, where the rules gate on it',
    valve({ ...CEC_2019, visit: { ...CEC_2019.visit, instrumentsCheckedDaysAgo: null } }),
    'check-instruments',
    'move-no-refrigerant',
  ],
  [
    'the running time not recorded',
    valve({ visit: { runningMinutes: null } }),
    'record-conditions',
    'move-no-refrigerant',
  ],
];

const AIRFLOW: readonly Case[] = [
  [
    'airflow not proved, where the rules want it measured',
    valve({ ...CEC_2019, readings: { airflow: null } }),
    'measure-airflow',
    'move-no-refrigerant',
  ],
  [
    'airflow not proved and the split above: the measurement comes first',
    orifice({ ...CEC_2019, readings: { airflow: null, ...SPLIT_ABOVE } }),
    'measure-airflow',
    'move-no-refrigerant',
  ],
  [
    'neither split nor airflow, where either would do',
    valve({ procedure: 'cec-ra3.2-2008-installer', readings: { supplyDryBulb: null } }),
    'measure-airflow',
    'move-no-refrigerant',
  ],
  [
    'airflow measured at 290 cfm/ton of an alteration',
    valve({ ...CEC_2019, setup: { ...CEC_2019.setup, alteration: true }, readings: { airflow: 870 } }),
    'raise-airflow',
    'move-no-refrigerant',
  ],
  ['airflow measured low', valve(lowAirflow), 'raise-airflow', 'move-no-refrigerant'],
  ['split above', valve({ readings: SPLIT_ABOVE }), 'reread-wet-bulb-then-airflow', 'move-no-refrigerant'],
  [
    'orifice, superheat below, split above',
    orifice({ readings: { ...SPLIT_ABOVE, ...superheat(8) } }),
    'reread-wet-bulb-then-airflow',
    'move-no-refrigerant',
  ],
  [
    'orifice, superheat above, split above',
    orifice({ readings: { ...SPLIT_ABOVE, ...superheat(25) } }),
    'suspect-probes',
    'move-no-refrigerant',
  ],
  [
    'valve, superheat above its window, split above',
    valve({ readings: { ...SPLIT_ABOVE, ...valveSuperheat(32) } }),
    'reread-wet-bulb-then-airflow',
    'move-no-refrigerant',
  ],
];

const QUALITY: readonly Case[] = [
  [
    'written saturation far off',
    valve({ readings: { writtenEvaporatingTemperature: 50 } }),
    'confirm-refrigerant',
    'move-no-refrigerant',
  ],
  ['a dry wick in the supply', orifice({ readings: { supplyWetBulb: 59.1 } }), 'wet-the-wick', 'move-no-refrigerant'],
  [
    'liquid line colder than the air',
    valve({ readings: { liquidLineTemperature: 82 } }),
    'place-liquid-probe-again',
    'move-no-refrigerant',
  ],
  [
    'a house still warm',
    orifice({ readings: { returnDryBulb: 82, returnWetBulb: 68, supplyDryBulb: 63.5 } }),
    'read-twice',
    'move-no-refrigerant',
  ],
];

const TOO_CLOSE: readonly Case[] = [
  [
    'orifice at its upper limit',
    orifice({ readings: superheat(20) }),
    'settle-with-another-reading',
    'move-no-refrigerant',
  ],
  [
    'valve at its lower limit',
    valve({ readings: valveSubcooling(7) }),
    'settle-with-another-reading',
    'move-no-refrigerant',
  ],
  [
    'instruments that can never settle it',
    withPlusMinus(valve(), { temperatureF: 5, pressurePsi: 10 }),
    'settle-with-better-instrument',
    'move-no-refrigerant',
  ],
];

const ORIFICE: readonly Case[] = [
  [
    'superheat above, liquid pair unread',
    orifice({ readings: { ...superheat(25), liquidPressure: null } }),
    'read-liquid-pair',
    'add-nothing',
  ],
  ['low charge, no leak search yet', orifice({ readings: LOW_ORIFICE }), 'leak-first', 'add-nothing'],
  [
    'low charge, leak search not done',
    orifice({ visit: { leakSearch: 'not-done' }, readings: LOW_ORIFICE }),
    'leak-first',
    'add-nothing',
  ],
  [
    'low charge, leak found',
    orifice({ visit: { leakSearch: 'found' }, readings: LOW_ORIFICE }),
    'mend-recover-weigh-in',
    'add-nothing',
  ],
  ['low charge, none found', orifice({ visit: { leakSearch: 'none-found' }, readings: LOW_ORIFICE }), 'add-in-steps'],
  [
    'low charge, 9 % added already',
    orifice({ setup: charged, visit: added(0.54), readings: LOW_ORIFICE }),
    'add-in-steps',
  ],
  [
    'low charge, 10 % added already',
    orifice({ setup: charged, visit: added(0.6), readings: LOW_ORIFICE }),
    'recover-and-weigh-in',
    'add-nothing',
  ],
  [
    'low charge, topped up on an earlier visit',
    orifice({ visit: { leakSearch: 'none-found', additionsOnEarlierVisits: 1 }, readings: LOW_ORIFICE }),
    'locate-mend-weigh-in',
    'add-nothing',
  ],
  [
    'low charge, an amount added before',
    orifice({ visit: { leakSearch: 'none-found', addedBefore: { value: 8, unit: 'oz' } }, readings: LOW_ORIFICE }),
    'locate-mend-weigh-in',
    'add-nothing',
  ],
  [
    'low charge against its own subcooling target',
    orifice({ setup: { targetSubcooling: { value: 17, unit: 'deltaF' } }, readings: superheat(25) }),
    'leak-first',
    'add-nothing',
  ],
  [
    'superheat above, subcooling unclear',
    orifice({ readings: { ...superheat(25), ...subcooling(6.5) } }),
    'measure-drier-drop',
    'add-nothing',
  ],
  [
    'superheat above, no high-side port',
    orifice({ setup: { highSidePort: 'none' }, readings: { ...superheat(25), liquidPressure: null } }),
    'measure-drier-drop',
    'add-nothing',
  ],
  ['superheat above, subcooling 10', orifice({ readings: superheat(25) }), 'find-restriction', 'move-no-refrigerant'],
  [
    'superheat above, subcooling right against its target',
    orifice({
      setup: { targetSubcooling: { value: 6, unit: 'deltaF' } },
      readings: { ...superheat(25), ...subcooling(6) },
    }),
    'find-restriction',
    'move-no-refrigerant',
  ],
  [
    'superheat below, subcooling high',
    orifice({ readings: { ...superheat(8), ...subcooling(16) } }),
    'air-test-then-recover',
    'add-nothing',
    'recover-nothing',
  ],
  [
    'superheat below, subcooling 10',
    orifice({ readings: superheat(8) }),
    'check-orifice-compressor-condenser',
    'move-no-refrigerant',
  ],
  [
    'superheat below, subcooling low',
    orifice({ readings: { ...superheat(8), ...subcooling(3) } }),
    'check-orifice-compressor-condenser',
    'move-no-refrigerant',
  ],
  [
    'cool weather, superheat below',
    orifice({ readings: { outdoorDryBulb: 62 } }),
    'cool-weather-hold',
    'move-no-refrigerant',
  ],
  [
    'cool weather with the head raised: the chart goes by the air',
    orifice({ visit: { headRaised: true }, readings: { outdoorDryBulb: 62 } }),
    'cool-weather-hold',
    'move-no-refrigerant',
  ],
];

const VALVE: readonly Case[] = [
  [
    'low charge by the maker’s data alone, superheat unread',
    valve({ procedure: 'manufacturer', readings: { ...LOW_VALVE, suctionLineTemperature: null } }),
    'read-suction-pair',
    'move-no-refrigerant',
  ],
  ['low charge in the window', valve({ readings: LOW_VALVE }), 'leak-first', 'add-nothing'],
  [
    'low charge above the window',
    valve({ readings: { ...LOW_VALVE, ...valveSuperheat(32) } }),
    'leak-first',
    'add-nothing',
  ],
  [
    'low charge, leak found',
    valve({ visit: { leakSearch: 'found' }, readings: LOW_VALVE }),
    'mend-recover-weigh-in',
    'add-nothing',
  ],
  [
    'low charge, leak found on a new line set',
    valve({ visit: { leakSearch: 'found', commissioning: true }, readings: LOW_VALVE }),
    'mend-recover-weigh-in',
    'add-nothing',
  ],
  [
    'low charge, topped up twice before',
    valve({ visit: { additionsOnEarlierVisits: 2 }, readings: LOW_VALVE }),
    'locate-mend-weigh-in',
    'add-nothing',
  ],
  [
    'low charge, 12 % added already',
    valve({ setup: charged, visit: added(0.72), readings: LOW_VALVE }),
    'recover-and-weigh-in',
    'add-nothing',
  ],
  ['low charge, none found', valve({ visit: { leakSearch: 'none-found' }, readings: LOW_VALVE }), 'add-in-steps'],
  [
    'a new line set, charge not complete',
    valve({ visit: { commissioning: true }, readings: LOW_VALVE }),
    'add-in-steps',
  ],
  [
    'subcooling and superheat below',
    valve({ readings: { ...LOW_VALVE, ...valveSuperheat(2) } }),
    'check-bulb-and-valve',
    'move-no-refrigerant',
  ],
  [
    'subcooling within, superheat above',
    valve({ readings: valveSuperheat(32) }),
    'check-bulb-screen-drier',
    'move-no-refrigerant',
  ],
  [
    'subcooling within, superheat below',
    valve({ readings: valveSuperheat(2) }),
    'check-bulb-and-airflow',
    'move-no-refrigerant',
  ],
  [
    'both above',
    valve({ readings: { ...valveSubcooling(16), ...valveSuperheat(32) } }),
    'find-restriction-recover-nothing',
    'add-nothing',
    'recover-nothing',
  ],
  [
    'subcooling above, superheat below',
    valve({ readings: { ...valveSubcooling(16), ...valveSuperheat(2) } }),
    'check-bulb-then-recover',
    'add-nothing',
    'recover-nothing',
  ],
  [
    'subcooling above, condensing 25 °F over the air',
    valve({ readings: { ...valveSubcooling(16), outdoorDryBulb: 80 } }),
    'air-test-then-recover',
    'add-nothing',
    'recover-nothing',
  ],
  [
    'subcooling above, condensing 19 °F over the air',
    valve({ readings: valveSubcooling(16) }),
    'recover-in-steps',
    'add-nothing',
  ],
  [
    'R-22: subcooling above, condensing 25 °F over the air is usual',
    valve({
      setup: { refrigerant: 'R-22' },
      readings: { suctionPressure: 68.5, liquidPressure: 210.8, ...subcooling(16), outdoorDryBulb: 80 },
    }),
    'recover-in-steps',
    'add-nothing',
  ],
  [
    'R-22: subcooling above, condensing 31 °F over the air',
    valve({
      setup: { refrigerant: 'R-22' },
      readings: { suctionPressure: 68.5, liquidPressure: 210.8, ...subcooling(16), outdoorDryBulb: 74 },
    }),
    'air-test-then-recover',
    'add-nothing',
    'recover-nothing',
  ],
  [
    'cool weather, subcooling below',
    valve({ readings: { outdoorDryBulb: 62, liquidPressure: 300, liquidLineTemperature: 91 } }),
    'cool-weather-hold',
    'move-no-refrigerant',
  ],
  [
    'cool weather, too little head',
    valve({ readings: { outdoorDryBulb: 60, liquidPressure: 270, liquidLineTemperature: 85 } }),
    'raise-head',
    'move-no-refrigerant',
  ],
  [
    'cool weather, head raised by the maker’s method',
    valve({
      visit: { headRaised: true },
      readings: { outdoorDryBulb: 62, liquidPressure: 300, liquidLineTemperature: 91 },
    }),
    'leak-first',
    'add-nothing',
  ],
  [
    'cool weather, head raised, still too little',
    valve({
      visit: { headRaised: true },
      readings: { outdoorDryBulb: 60, liquidPressure: 270, liquidLineTemperature: 85 },
    }),
    'raise-head',
    'move-no-refrigerant',
  ],
];

const SMALL_DROP = { drierInletTemperature: 96, drierOutletTemperature: 95.5 } as const;
const DROP = { drierInletTemperature: 96, drierOutletTemperature: 88 } as const;
/** Saturation of the standing system over its outdoor coil at 85 °F. */
const standing = (refrigerant: 'R-22' | 'R-410A', excessF: number): ReadingChanges => ({
  standingOutdoorCoilTemperature: 85,
  standingPressure: {
    value: bubblePressurePa({ refrigerant, temperatureK: temperatureToK(85 + excessF, 'degF') }) / PA_PER_PSI,
    unit: 'psia',
  },
});
const SHUT_IN = { tests: { liquidShutIn: true } } as const;
const BULB_RIGHT = { tests: { bulb: 'right' } } as const;
const STARVED_UNCLEAR = { ...superheat(25), ...subcooling(6.5) } as const;

/** A separating test is recorded: what it shows leads on. */
const TESTED: readonly Case[] = [
  [
    'a drop over the drier',
    orifice({ readings: { ...STARVED_UNCLEAR, ...DROP } }),
    'find-restriction',
    'move-no-refrigerant',
  ],
  ['a drop over the drier of a healthy valve', valve({ readings: DROP }), 'find-restriction', 'move-no-refrigerant'],
  [
    'a drop that these clamps cannot tell',
    orifice({ readings: { ...STARVED_UNCLEAR, drierInletTemperature: 96, drierOutletTemperature: 92.8 } }),
    'measure-drier-drop',
    'add-nothing',
  ],
  ['no drop over the drier', orifice({ readings: { ...STARVED_UNCLEAR, ...SMALL_DROP } }), 'leak-first', 'add-nothing'],
  [
    'no drop over the drier, leak found',
    orifice({ visit: { leakSearch: 'found' }, readings: { ...STARVED_UNCLEAR, ...SMALL_DROP } }),
    'mend-recover-weigh-in',
    'add-nothing',
  ],
  [
    'no drop over the drier, none found',
    orifice({ visit: { leakSearch: 'none-found' }, readings: { ...STARVED_UNCLEAR, ...SMALL_DROP } }),
    'add-in-steps',
  ],
  [
    'no drop over the drier, topped up on an earlier visit',
    orifice({ visit: { additionsOnEarlierVisits: 1 }, readings: { ...STARVED_UNCLEAR, ...SMALL_DROP } }),
    'locate-mend-weigh-in',
    'add-nothing',
  ],
  [
    'no drop over the drier, 10 % added already',
    orifice({ setup: charged, visit: added(0.6), readings: { ...STARVED_UNCLEAR, ...SMALL_DROP } }),
    'recover-and-weigh-in',
    'add-nothing',
  ],
  [
    'liquid enough and no drop over the drier',
    orifice({ readings: { ...superheat(25), ...SMALL_DROP } }),
    'check-orifice',
    'move-no-refrigerant',
  ],
  [
    'valve starves, no drop over the drier',
    valve({ readings: { ...valveSuperheat(32), ...SMALL_DROP } }),
    'check-bulb-and-screen',
    'move-no-refrigerant',
  ],
  [
    'valve starves, bulb right',
    valve({ visit: BULB_RIGHT, readings: valveSuperheat(32) }),
    'measure-drier-drop',
    'move-no-refrigerant',
  ],
  [
    'valve starves, bulb right and no drop over the drier',
    valve({ visit: BULB_RIGHT, readings: { ...valveSuperheat(32), ...SMALL_DROP } }),
    'check-valve',
    'move-no-refrigerant',
  ],
  [
    'both above, no drop over the drier',
    valve({ readings: { ...valveSubcooling(16), ...valveSuperheat(32), ...SMALL_DROP } }),
    'check-bulb-and-screen',
    'add-nothing',
    'recover-nothing',
  ],
  [
    'both above, bulb right',
    valve({ visit: BULB_RIGHT, readings: { ...valveSubcooling(16), ...valveSuperheat(32) } }),
    'measure-drier-drop',
    'add-nothing',
    'recover-nothing',
  ],
  [
    'both above, bulb right and no drop over the drier',
    valve({ visit: BULB_RIGHT, readings: { ...valveSubcooling(16), ...valveSuperheat(32), ...SMALL_DROP } }),
    'check-valve',
    'add-nothing',
    'recover-nothing',
  ],
  [
    'valve floods, bulb right',
    valve({ visit: BULB_RIGHT, readings: valveSuperheat(2) }),
    'check-valve',
    'move-no-refrigerant',
  ],
  [
    'valve floods, subcooling below, bulb right',
    valve({ visit: BULB_RIGHT, readings: { ...LOW_VALVE, ...valveSuperheat(2) } }),
    'check-valve',
    'move-no-refrigerant',
  ],
  [
    'valve floods, subcooling above, bulb right',
    valve({ visit: BULB_RIGHT, readings: { ...valveSubcooling(16), ...valveSuperheat(2) } }),
    'recover-in-steps',
    'add-nothing',
  ],
  ['a loose bulb', valve({ visit: { tests: { bulb: 'loose' } } }), 'mend-bulb', 'move-no-refrigerant'],
  [
    'a bulb that lost its charge',
    valve({ visit: { tests: { bulb: 'charge-lost' } }, readings: valveSuperheat(32) }),
    'mend-bulb',
    'move-no-refrigerant',
  ],
  ['an orifice has no bulb', orifice({ visit: { tests: { bulb: 'loose' } } }), 'record'],
  [
    'air found in a valve’s system',
    valve({ visit: SHUT_IN, readings: { ...valveSubcooling(16), outdoorDryBulb: 80, ...standing('R-410A', 8) } }),
    'recover-air-weigh-in',
    'add-nothing',
  ],
  [
    'no air in a valve’s system',
    valve({ visit: SHUT_IN, readings: { ...valveSubcooling(16), outdoorDryBulb: 80, ...standing('R-410A', 0) } }),
    'recover-in-steps',
    'add-nothing',
  ],
  [
    'an air test that does not count: the liquid was free, the indoor coil is unread',
    valve({ readings: { ...valveSubcooling(16), outdoorDryBulb: 80, ...standing('R-410A', 8) } }),
    'air-test-then-recover',
    'add-nothing',
    'recover-nothing',
  ],
  [
    'both coils alike: the air test counts',
    valve({
      readings: {
        ...valveSubcooling(16),
        outdoorDryBulb: 80,
        ...standing('R-410A', 8),
        standingIndoorCoilTemperature: 83,
      },
    }),
    'recover-air-weigh-in',
    'add-nothing',
  ],
  [
    'standing pressure under saturation',
    valve({ visit: SHUT_IN, readings: { ...valveSubcooling(16), ...standing('R-410A', -20) } }),
    'check-refrigerant-and-probes',
    'move-no-refrigerant',
  ],
  [
    'no air in an orifice’s system',
    orifice({ visit: SHUT_IN, readings: { ...superheat(8), ...subcooling(16), ...standing('R-22', 0) } }),
    'recover-in-steps',
    'add-nothing',
  ],
  [
    'air found behind a high head',
    orifice({ visit: SHUT_IN, readings: { liquidPressure: 300, ...standing('R-22', 12) } }),
    'recover-air-weigh-in',
    'shut-down',
    'add-nothing',
  ],
  [
    'air found, superheat about zero',
    orifice({ visit: SHUT_IN, readings: { ...superheat(1), ...standing('R-22', 12) } }),
    'recover-air-weigh-in',
    'shut-down',
    'add-nothing',
  ],
  [
    'air found, superheat under the floor',
    orifice({ visit: SHUT_IN, readings: { ...superheat(4), ...standing('R-22', 12) } }),
    'recover-air-weigh-in',
    'add-nothing',
  ],
  [
    'wet bulb moved while outdoors',
    orifice({ readings: { returnWetBulbBefore: 68 } }),
    'bracket-wet-bulb-again',
    'move-no-refrigerant',
  ],
];

const WITHIN: readonly Case[] = [
  ['healthy orifice', orifice(), 'record'],
  ['healthy valve', valve(), 'record'],
  ['healthy valve under the rules of 2019', valve(CEC_2019), 'record'],
  [
    'an alteration after every remedy, still short of air, under the rules of 2019',
    valve({
      ...CEC_2019,
      setup: { ...CEC_2019.setup, alteration: true, airflowPath: 'best-possible' },
      readings: { airflow: 870 },
    }),
    'record',
  ],
  [
    'healthy valve in cool weather',
    valve({ readings: { outdoorDryBulb: 65, liquidPressure: 300, liquidLineTemperature: 86.5 } }),
    'record',
  ],
  [
    'valve within by the maker’s data alone, superheat unread',
    valve({ procedure: 'manufacturer', readings: { suctionLineTemperature: null } }),
    'read-suction-pair',
  ],
  ['valve within by the maker’s data alone', valve({ procedure: 'manufacturer' }), 'record'],
  ['orifice within, airflow unseen', orifice({ readings: { supplyDryBulb: null } }), 'read-supply-or-airflow'],
  [
    'orifice within, airflow measured',
    orifice({ ...lowAirflow, readings: { supplyDryBulb: null, airflow: 1200 } }),
    'record',
  ],
  ['valve within, airflow unseen', valve({ readings: { supplyDryBulb: null } }), 'record'],
];

/** R-22, 10 °F of subcooling all along: the pressure of 10 °F more than the liquid line. */
const CURVE: MakersChartInput = {
  kind: 'liquid-pressure',
  rows: { unit: 'degF', values: [80, 90, 100, 110] },
  unit: 'psig',
  cells: [[168.4], [195.9], [226.3], [259.9]],
};
const SUBCOOLING_TABLE: MakersChartInput = {
  kind: 'subcooling',
  rows: { unit: 'degF', values: [65, 80, 95, 110] },
  unit: 'deltaF',
  cells: [[12], [11], [10], [9]],
};
/** 330 psig at 47 °F outdoors and 70 °F indoors. */
const HEATING_TABLE: MakersChartInput = {
  kind: 'heating-discharge-pressure',
  rows: { unit: 'degF', values: [27, 37, 47, 57] },
  columns: { unit: 'degF', values: [65, 75] },
  unit: 'psig',
  cells: [
    [270, 290],
    [295, 315],
    [320, 340],
    [345, 365],
  ],
};
const packaged = (visit: NonNullable<Changes['visit']> = {}, readings: ReadingChanges = {}): EvaluationRequest =>
  orifice({ setup: { kind: 'packaged', makersChart: CURVE }, visit, readings });
const heating = (dischargePressure: number | null, changes: Changes = {}): EvaluationRequest =>
  valve({
    ...changes,
    setup: { mode: 'heating', makersChart: HEATING_TABLE },
    readings: { outdoorDryBulb: 47, returnDryBulb: 70, dischargePressure, ...changes.readings },
  });
const LOW_CURVE = { liquidPressure: 190 } as const;
const HIGH_CURVE = { liquidPressure: 235 } as const;
const NO_AIR = {
  standingPressure: 146,
  standingOutdoorCoilTemperature: 82,
  standingIndoorCoilTemperature: 81,
} as const;

const MAKERS: readonly Case[] = [
  ['packaged, on the maker’s curve', packaged(), 'record'],
  ['packaged, below it', packaged({}, LOW_CURVE), 'leak-first', 'add-nothing'],
  [
    'packaged, below it, leak found',
    packaged({ leakSearch: 'found' }, LOW_CURVE),
    'mend-recover-weigh-in',
    'add-nothing',
  ],
  [
    'packaged, below it again',
    packaged({ leakSearch: 'none-found', additionsOnEarlierVisits: 1 }, LOW_CURVE),
    'locate-mend-weigh-in',
    'add-nothing',
  ],
  ['packaged, below it, no leak found', packaged({ leakSearch: 'none-found' }, LOW_CURVE), 'add-in-steps'],
  [
    'packaged, below it, steps used up',
    orifice({
      setup: { kind: 'packaged', makersChart: CURVE, ...charged },
      visit: added(0.7),
      readings: LOW_CURVE,
    }),
    'recover-and-weigh-in',
    'add-nothing',
  ],
  ['packaged, above it', packaged({}, HIGH_CURVE), 'air-test-then-recover', 'add-nothing', 'recover-nothing'],
  ['packaged, above it, no air', packaged({}, { ...HIGH_CURVE, ...NO_AIR }), 'recover-in-steps', 'add-nothing'],
  [
    'packaged valve, below the curve',
    valve({
      setup: {
        kind: 'packaged',
        targetSubcooling: null,
        makersChart: { kind: 'liquid-line-approach', unit: 'deltaF', cells: [[4]] },
      },
    }),
    'leak-first',
    'add-nothing',
  ],
  [
    'a table for the other port',
    valve({ setup: { targetSubcooling: null, makersChart: { ...SUBCOOLING_TABLE, port: 'discharge' } } }),
    'find-target-for-this-port',
    'move-no-refrigerant',
  ],
  [
    'colder than the table goes',
    valve({ setup: { targetSubcooling: null, makersChart: SUBCOOLING_TABLE }, readings: { outdoorDryBulb: 62 } }),
    'reach-a-target',
    'move-no-refrigerant',
  ],
  [
    'a house warmer than the maker allows',
    valve({
      setup: {
        targetSubcooling: null,
        makersChart: { ...SUBCOOLING_TABLE, mostReturn: { value: 75, unit: 'degF' } },
      },
    }),
    'cool-the-house',
    'move-no-refrigerant',
  ],
  ['heating, on the maker’s table', heating(330), 'record-heating'],
  ['heating, below it', heating(290), 'weigh-in-after-heating', 'move-no-refrigerant'],
  ['heating, above it', heating(370), 'weigh-in-after-heating', 'move-no-refrigerant'],
  ['heating, nothing read', heating(null), 'take-readings'],
  [
    'heating, colder than the table goes',
    heating(290, { readings: { outdoorDryBulb: 20 } }),
    'reach-a-target',
    'move-no-refrigerant',
  ],
];

const GROUPS = {
  FIT,
  IMPOSSIBLE,
  STOPS,
  CONDITIONS,
  LACKING,
  AIRFLOW,
  QUALITY,
  TESTED,
  TOO_CLOSE,
  ORIFICE,
  VALVE,
  MAKERS,
  WITHIN,
};
const CASES: readonly Case[] = Object.values(GROUPS).flat();

describe.each(Object.entries(GROUPS))('%s', (_, cases) => {
  it.each(cases.map(([name, request, step, ...notYet]) => ({ name, request, step, notYet })))(
    '$name: $step',
    ({ request, step, notYet }) => {
      const { nextStep } = evaluate(request).overall;
      expect([nextStep.code, ...nextStep.notYet]).toEqual([step, ...notYet]);
    },
  );
});

function factsOf(request: EvaluationRequest): Facts {
  const input = inputOf(request);
  const { criteria, overall } = evaluate(request);
  const derived = deriveQuantities(input.setup, input.readings);
  const unfit = unfitReason(input);
  const targetSplit = splitTarget(input, derived);
  const split = splitEvidence(input, derived, {
    split: judgeSplit(input, derived, targetSplit, unfit),
    target: targetSplit,
  });
  const method = chargeMethod(input);
  return gatherFacts({
    input,
    derived,
    criteria,
    method,
    target: method && chargeTarget(input, derived, method),
    unfit,
    impossible: impossibleReadings(input, derived)?.reason ?? null,
    stops: overall.stops,
    cautions: overall.cautions,
    airflow: airflowEvidence(input, { airflow: judgeAirflow(input), split }),
    split,
    overall: overall.finding,
  });
}

describe('a limit that shuts the test', () => {
  const figuresOf = (request: EvaluationRequest) => {
    const { code, figures } = evaluate(request).overall.nextStep;
    return { code, ...figures };
  };
  const stated = (limits: Partial<MakersChartInput>, outdoorDryBulb = 80) =>
    valve({
      setup: { targetSubcooling: null, makersChart: { ...SUBCOOLING_TABLE, ...limits } },
      readings: { outdoorDryBulb },
    });
  const at = (degF: number) => ({
    kind: 'temperatureK',
    value: expect.closeTo(temperatureToK(degF, 'degF'), 9) as number,
  });

  it('is said in the next step: the maker’s where he states one, else the procedure’s', () => {
    const cold = { outdoorDryBulb: 50, liquidPressure: 260, liquidLineTemperature: 78 };
    expect(figuresOf(valve({ readings: cold }))).toEqual({ code: 'wait-for-warmer-weather', least: at(55) });
    expect(figuresOf(stated({ leastOutdoor: { value: 85, unit: 'degF' } }))).toEqual({
      code: 'wait-for-warmer-weather',
      least: at(85),
    });
    expect(figuresOf(stated({ mostOutdoor: { value: 75, unit: 'degF' } }))).toEqual({
      code: 'wait-for-cooler-weather',
      most: at(75),
    });
    expect(figuresOf(stated({ mostReturn: { value: 75, unit: 'degF' } }))).toEqual({
      code: 'cool-the-house',
      most: at(75),
    });
    expect(figuresOf(stated({ leastReturn: { value: 90, unit: 'degF' } }))).toEqual({
      code: 'warm-the-house',
      least: at(90),
    });
  });
});

describe('what would make it verifiable', () => {
  const degF = (kelvin: number) => Math.round(temperatureFromK(kelvin, 'degF') * 100) / 100;
  const rangesOf = (request: EvaluationRequest) => {
    const { figures } = evaluate(request).overall.nextStep;
    const ranges = 'ranges' in figures && figures.ranges.kind === 'targetRanges' ? figures.ranges.value : null;
    return ranges?.map(({ along, lowK, highK, presentK, at }) => [
      along,
      degF(lowK),
      degF(highK),
      degF(presentK),
      ...(at === null ? [] : [at.condition, degF(at.valueK)]),
    ]);
  };

  it('is how hot it may be at this wet bulb, and how humid it has to be in this heat: chart A', () => {
    // 64 °F: printed from 40 to 95 °F, the test begins at 55; 100 °F: printed from 66 to 76 °F
    expect(rangesOf(orifice({ readings: { outdoorDryBulb: 100, returnWetBulb: 64 } }))).toEqual([
      ['outdoorDryBulb', 55, 95, 100, 'returnWetBulb', 64],
      ['returnWetBulb', 66, 76, 64, 'outdoorDryBulb', 100],
    ]);
  });

  it('is what is left where the other condition is beyond the chart', () => {
    // 49 °F stands before its first column
    expect(rangesOf(orifice({ readings: { outdoorDryBulb: 80, returnWetBulb: 49 } }))).toEqual([
      ['returnWetBulb', 58, 76, 49, 'outdoorDryBulb', 80],
    ]);
  });

  it('is where the target is 8 °F or more when liquid comes back near the floor', () => {
    const near = orifice({ readings: { ...superheat(4), outdoorDryBulb: 95, returnWetBulb: 64 } });
    // column 64: 9 at 90 °F, 6 at 95 °F; row 95: 6 at 64 °F, 10 at 66 °F
    expect(rangesOf(near)).toEqual([
      ['outdoorDryBulb', 55, 91.67, 95, 'returnWetBulb', 64],
      ['returnWetBulb', 65, 76, 64, 'outdoorDryBulb', 95],
    ]);
    expect(evaluate(near).overall.nextStep.figures).toMatchObject({
      least: { kind: 'differenceK', value: expect.closeTo(8 / 1.8, 9) as number },
    });
  });

  it('is the range of the maker’s table, or nothing where a number was entered', () => {
    const beyond = {
      setup: { targetSubcooling: null, makersChart: SUBCOOLING_TABLE },
      readings: { outdoorDryBulb: 62 },
    };
    expect(rangesOf(valve(beyond))).toEqual([['outdoorDryBulb', 65, 110, 62]]);
    expect(rangesOf(orifice({ setup: target(7), readings: superheat(1) }))).toEqual([]);
  });
});

describe('the cases', () => {
  it('are at least sixty, with names of their own in each group', () => {
    expect(CASES.length).toBeGreaterThanOrEqual(60);
    for (const cases of Object.values(GROUPS)) expect(new Set(cases.map(([name]) => name)).size).toBe(cases.length);
  });

  it('reach every row of the table', () => {
    const reached = new Set<NextStepRow>(CASES.map(([, request]) => findRow(factsOf(request))));
    expect(NEXT_STEP_TABLE.filter((row) => !reached.has(row))).toEqual([]);
  });
});
