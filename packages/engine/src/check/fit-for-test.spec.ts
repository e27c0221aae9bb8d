import { describe, expect, it } from 'vitest';
import type { Changes } from './testing/healthy-systems';
import { criterionOf, evaluate, inputOf, orificeRequest, valveRequest } from './testing/healthy-systems';
import { unfitPortReason, unfitReason } from './fit-for-test';
import type { CriterionId, Finding, ReasonCode } from './codes';
import type { EvaluationRequest, PreflightItem } from './request';

const target = { value: 10, unit: 'deltaF' } as const;

interface Row {
  readonly name: string;
  readonly device: 'orifice' | 'valve';
  readonly changes: Changes;
  readonly found: Readonly<Partial<Record<CriterionId, readonly [Finding, ReasonCode | null]>>>;
}

const request = (device: Row['device'], changes: Changes) =>
  device === 'orifice' ? orificeRequest(changes) : valveRequest(changes);

const bothUnfit = (reason: ReasonCode): Row['found'] => ({
  subcooling: ['not-verifiable', reason],
  'superheat-window': ['not-verifiable', reason],
});

const ROWS: readonly Row[] = [
  { name: 'split, fixed orifice: superheat', device: 'orifice', changes: {}, found: { superheat: ['within', null] } },
  {
    name: 'split, valve at the coil, liquid port: subcooling and window',
    device: 'valve',
    changes: {},
    found: { subcooling: ['within', null], 'superheat-window': ['within', null] },
  },
  {
    name: 'an electronic valve is a valve',
    device: 'valve',
    changes: { setup: { meteringDevice: 'eev' } },
    found: { subcooling: ['within', null], 'superheat-window': ['within', null] },
  },
  {
    name: 'only a discharge port, target given for that port: subcooling at it',
    device: 'valve',
    changes: {
      setup: { highSidePort: 'discharge', targetSubcoolingPort: 'discharge' },
      readings: { liquidPressure: null, dischargePressure: 340 },
    },
    found: { subcooling: ['within', null], 'superheat-window': ['within', null] },
  },
  {
    name: 'only a discharge port, target given for the liquid port: not judged',
    device: 'valve',
    changes: { setup: { highSidePort: 'discharge' }, readings: { liquidPressure: null, dischargePressure: 340 } },
    found: { subcooling: ['not-judged', 'target-for-other-port'], 'superheat-window': ['within', null] },
  },
  {
    name: 'a liquid port, target given for the discharge port: not judged',
    device: 'valve',
    changes: { setup: { targetSubcoolingPort: 'discharge' } },
    found: { subcooling: ['not-judged', 'target-for-other-port'], 'superheat-window': ['within', null] },
  },
  {
    name: 'only a discharge port, no target: not judged',
    device: 'valve',
    changes: {
      setup: { highSidePort: 'discharge', targetSubcooling: null },
      readings: { liquidPressure: null, dischargePressure: 340 },
    },
    found: { subcooling: ['not-judged', 'target-missing'], 'superheat-window': ['within', null] },
  },
  {
    name: 'a liquid pressure at a discharge port is refused',
    device: 'valve',
    changes: { setup: { highSidePort: 'discharge', targetSubcoolingPort: 'discharge' } },
    found: { subcooling: ['not-verifiable', 'liquid-reading-at-discharge-port'], 'superheat-window': ['within', null] },
  },
  {
    name: 'a discharge port outranks the packaged row',
    device: 'valve',
    changes: {
      setup: { kind: 'packaged', highSidePort: 'discharge' },
      readings: { liquidPressure: null, dischargePressure: 340 },
    },
    found: { subcooling: ['not-judged', 'target-for-other-port'] },
  },
  {
    name: 'a discharge port does not touch superheat on a fixed orifice',
    device: 'orifice',
    changes: { setup: { highSidePort: 'discharge' }, readings: { liquidPressure: null } },
    found: { superheat: ['within', null] },
  },
  {
    name: 'only a suction port, fixed orifice: superheat',
    device: 'orifice',
    changes: { setup: { highSidePort: 'none' }, readings: { liquidPressure: null } },
    found: { superheat: ['within', null], subcooling: ['not-judged', 'suction-port-only'] },
  },
  {
    name: 'only a suction port, valve: not judged',
    device: 'valve',
    changes: { setup: { highSidePort: 'none' }, readings: { liquidPressure: null } },
    found: { subcooling: ['not-judged', 'suction-port-only'], 'superheat-window': ['within', null] },
  },
  {
    name: 'packaged, the port not stated: not verifiable',
    device: 'valve',
    changes: { setup: { kind: 'packaged', highSidePort: null } },
    found: bothUnfit('port-not-stated'),
  },
  {
    name: 'packaged with stated port and maker’s target: as split',
    device: 'valve',
    changes: { setup: { kind: 'packaged' } },
    found: { subcooling: ['within', null], 'superheat-window': ['within', null] },
  },
  {
    name: 'packaged fixed orifice without maker’s target: the printed chart is not its own',
    device: 'orifice',
    changes: { setup: { kind: 'packaged' } },
    found: { superheat: ['not-judged', 'target-missing'] },
  },
  {
    name: 'packaged fixed orifice with maker’s target: superheat',
    device: 'orifice',
    changes: { setup: { kind: 'packaged', targetSuperheat: { value: 15, unit: 'deltaF' } } },
    found: { superheat: ['within', null] },
  },
  {
    name: 'mini-split',
    device: 'valve',
    changes: { setup: { kind: 'mini-split' } },
    found: bothUnfit('metered-outdoors'),
  },
  {
    name: 'multi-split',
    device: 'valve',
    changes: { setup: { kind: 'multi-split' } },
    found: bothUnfit('metered-outdoors'),
  },
  { name: 'part stage', device: 'valve', changes: { setup: { stage: 'part' } }, found: bothUnfit('part-stage') },
  {
    name: 'inverter not in its charge mode',
    device: 'valve',
    changes: { setup: { chargeMode: false } },
    found: bothUnfit('not-in-charge-mode'),
  },
  {
    name: 'inverter in its charge mode',
    device: 'valve',
    changes: { setup: { chargeMode: true } },
    found: { subcooling: ['within', null] },
  },
  {
    name: 'heating, whatever the target',
    device: 'valve',
    changes: { setup: { mode: 'heating' } },
    found: { ...bothUnfit('heating-mode'), conditions: ['not-verifiable', 'heating-mode'] },
  },
  {
    name: 'heating on a fixed orifice, though a target was entered',
    device: 'orifice',
    changes: { setup: { mode: 'heating', targetSuperheat: target } },
    found: { superheat: ['not-verifiable', 'heating-mode'] },
  },
  {
    name: 'an unknown stage is assumed full',
    device: 'valve',
    changes: { setup: { stage: 'unknown' } },
    found: { subcooling: ['within', null] },
  },
  ...(['panelsOn', 'fullStage', 'economizerShut', 'condenserDryAndClean', 'fanSteady'] as const).map(
    (item: PreflightItem): Row => ({
      name: `${item} not ok: not verifiable until mended`,
      device: 'valve',
      changes: { visit: { preflight: { [item]: 'not-ok' } } },
      found: bothUnfit('not-ready'),
    }),
  ),
  ...(['filterAndCoil', 'gaugeZeroed', 'accessHole'] as const).map((item: PreflightItem): Row => ({
    name: `${item} not ok: judged, with a caution at most`,
    device: 'valve',
    changes: { visit: { preflight: { [item]: 'not-ok' } } },
    found: { subcooling: ['within', null] },
  })),
];

describe('the table of systems fit for the test', () => {
  it.each(ROWS)('$name', ({ device, changes, found }) => {
    const result = evaluate(request(device, changes));
    for (const [id, [finding, reason]] of Object.entries(found) as [CriterionId, [Finding, ReasonCode | null]][]) {
      const criterion = criterionOf(result, id);
      expect([criterion.finding, criterion.reason?.code ?? null], id).toEqual([finding, reason]);
    }
  });

  it('in heating gives no cooling target, nor a split', () => {
    const result = evaluate(orificeRequest({ setup: { mode: 'heating' } }));
    expect(result.criteria.map(({ target: value }) => value)).toEqual(result.criteria.map(() => null));
    expect(result.criteria.map(({ criterion }) => criterion)).not.toContain('temperature-split');
  });

  it('names all that must be mended', () => {
    const preflight = {
      panelsOn: 'not-ok',
      fanSteady: 'not-ok',
      fullStage: 'ok',
      economizerShut: 'not-checked',
    } as const;
    expect(unfitReason(inputOf(valveRequest({ visit: { preflight } })))).toEqual({
      code: 'not-ready',
      figures: { items: { kind: 'preflight', value: ['panelsOn', 'fanSteady'] } },
    });
  });

  it('takes the discharge pressure where both were typed at a discharge port', () => {
    const changes: Changes = {
      setup: { highSidePort: 'discharge', targetSubcoolingPort: 'discharge' },
      readings: { dischargePressure: 345 },
    };
    expect(unfitPortReason(inputOf(valveRequest(changes)))).toBeNull();
  });

  it('has one criterion that decides a fixed orifice and two that decide a valve', () => {
    const decisive = (request: EvaluationRequest) =>
      evaluate(request).criteria.flatMap(({ criterion, required }) => (required ? [criterion] : []));
    expect(decisive(orificeRequest())).toEqual(['superheat']);
    expect(decisive(orificeRequest({ setup: { mode: 'heating' } }))).toEqual(['superheat']);
    expect(decisive(valveRequest())).toEqual(['subcooling', 'superheat-window']);
  });
});
