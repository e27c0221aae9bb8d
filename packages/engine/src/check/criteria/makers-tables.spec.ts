/** What is judged by the maker's tables: targets, tolerances, limits, ports, and which of several methods decides. */
import { describe, expect, it } from 'vitest';
import { bubblePressurePa } from '../../refrigerants/saturation';
import { differenceFromK, PA_PER_PSI, pressureDifferenceFromPa, temperatureFromK, temperatureToK } from '../../units';
import type { CriterionId, Finding, ReasonCode } from '../codes';
import type { EvaluationRequest, MakersChartInput } from '../request';
import { exactOrifice, exactValve } from '../testing/exact-systems';
import type { Changes } from '../testing/healthy-systems';
import { cautionCodes, criterionOf, evaluate, valveRequest, withPlusMinus } from '../testing/healthy-systems';

/** 18 °F at 85 °F outdoors and 66 °F wet bulb, where the printed chart says 15. */
const SUPERHEAT: MakersChartInput = {
  kind: 'superheat',
  rows: { unit: 'degF', values: [75, 85, 95, 105] },
  columns: { unit: 'degF', values: [62, 66, 70] },
  unit: 'deltaF',
  cells: [
    [18, 24, 30],
    [11, 18, 25],
    [null, 12, 20],
    [null, null, 15],
  ],
};
/** 11 °F at 85 °F outdoors. */
const SUBCOOLING: MakersChartInput = {
  kind: 'subcooling',
  rows: { unit: 'degF', values: [65, 75, 95, 115] },
  unit: 'deltaF',
  cells: [[13], [12], [10], [8]],
};
/** 10 °F on the healthy system: liquid line 95 °F, outdoors 85. */
const APPROACH: MakersChartInput = { kind: 'liquid-line-approach', unit: 'deltaF', cells: [[10]] };
/** 340 psig at 95 °F of liquid line. */
const CURVE: MakersChartInput = {
  kind: 'liquid-pressure',
  rows: { unit: 'degF', values: [85, 95, 105] },
  unit: 'psig',
  cells: [[293], [340], [392]],
};
/** 52 °F at 118 psig and 85 °F outdoors. */
const SUCTION_LINE: MakersChartInput = {
  kind: 'suction-line-temperature',
  rows: { unit: 'psig', values: [108, 118, 128] },
  columns: { unit: 'degF', values: [75, 85, 95] },
  unit: 'degF',
  cells: [
    [50, 48, 46],
    [54, 52, 50],
    [58, 56, 54],
  ],
};
const HEATING_PRESSURE: MakersChartInput = {
  kind: 'heating-discharge-pressure',
  rows: { unit: 'degF', values: [37, 47, 57] },
  columns: { unit: 'degF', values: [65, 75] },
  unit: 'psig',
  cells: [
    [295, 315],
    [320, 340],
    [345, 365],
  ],
};
const HEATING_TEMPERATURE: MakersChartInput = {
  ...HEATING_PRESSURE,
  kind: 'heating-discharge-temperature',
  unit: 'degF',
  cells: [
    [150, 154],
    [146, 150],
    [142, 146],
  ],
};

const deltaF = (value: number) => ({ value, unit: 'deltaF' }) as const;
const degF = (value: number) => ({ value, unit: 'degF' }) as const;
const precise = (request: EvaluationRequest): EvaluationRequest =>
  withPlusMinus(request, { temperatureF: 0.1, pressurePsi: 0.2 });

type Found = readonly [Finding, ReasonCode | null];
const foundOf = (request: EvaluationRequest, id: CriterionId): Found => {
  const { finding, reason } = criterionOf(evaluate(request), id);
  return [finding, reason?.code ?? null];
};
const required = (request: EvaluationRequest): readonly CriterionId[] =>
  evaluate(request).criteria.flatMap((each) => (each.required ? [each.criterion] : []));

const orificeBy = (makersChart: MakersChartInput, superheatF = 18, changes: Changes = {}): EvaluationRequest =>
  exactOrifice(superheatF, { ...changes, setup: { makersChart, ...changes.setup } });
const valveBy = (makersChart: MakersChartInput, changes: Changes = {}): EvaluationRequest =>
  valveRequest({ ...changes, setup: { targetSubcooling: null, makersChart, ...changes.setup } });
const heatingBy = (makersChart: MakersChartInput, changes: Changes = {}): EvaluationRequest =>
  valveRequest({
    ...changes,
    setup: { mode: 'heating', makersChart, ...changes.setup },
    readings: {
      outdoorDryBulb: 47,
      returnDryBulb: 70,
      dischargePressure: 330,
      dischargeLineTemperature: 148,
      ...changes.readings,
    },
  });

describe('a table of target superheat', () => {
  it('gives the target in place of the printed chart, and says so', () => {
    const { target, targetSource, tolerance, finding } = criterionOf(evaluate(orificeBy(SUPERHEAT)), 'superheat');
    expect(differenceFromK(target!.value, 'deltaF')).toBeCloseTo(18, 9);
    expect([targetSource, tolerance?.source, finding]).toEqual(['makers-data', 'procedure', 'within']);
  });

  it('stands behind a number that was entered', () => {
    const request = orificeBy(SUPERHEAT, 12, { setup: { targetSuperheat: deltaF(12) } });
    expect(criterionOf(evaluate(request), 'superheat')).toMatchObject({ targetSource: 'entered', finding: 'within' });
  });

  it('is interpolated as printed charts are, with its dashes honoured', () => {
    const at = (outdoorDryBulb: number, returnWetBulb: number) => {
      const request = precise(
        orificeBy(SUPERHEAT, 18, {
          readings: { outdoorDryBulb, returnWetBulb, liquidPressure: null, supplyDryBulb: null },
        }),
      );
      const { target, reason } = criterionOf(evaluate(request), 'superheat');
      return target === null ? reason?.code : Math.round(differenceFromK(target.value, 'deltaF') * 1e6) / 1e6;
    };
    expect(at(80, 68)).toBe((24 + 30 + 18 + 25) / 4);
    // the plane of 11, 18 and 12, and the other half of the cell
    expect(at(87, 65)).toBeCloseTo(18 + 0.25 * (11 - 18) + 0.2 * (12 - 18), 6);
    expect(at(93, 63)).toBe('no-target-here');
    expect(at(106, 70)).toBe('no-target-here');
    expect(at(85, 61)).toBe('no-target-here');
  });

  it('counts its rounding: half of a whole degree, or of a tenth where it is printed in tenths', () => {
    const uOf = (chart: MakersChartInput) =>
      criterionOf(evaluate(precise(orificeBy(chart))), 'superheat').target!.contributions.get(
        'rounding:maker:superheat',
      );
    expect(differenceFromK(uOf(SUPERHEAT)!, 'deltaF')).toBeCloseTo(0.5 / Math.sqrt(3), 12);
    const tenths = {
      ...SUPERHEAT,
      cells: SUPERHEAT.cells.map((row) => row.map((cell) => (cell === 12 ? 12.5 : cell))),
    };
    expect(differenceFromK(uOf(tenths)!, 'deltaF')).toBeCloseTo(0.05 / Math.sqrt(3), 12);
    expect(differenceFromK(uOf({ ...SUPERHEAT, resolution: 0.5 })!, 'deltaF')).toBeCloseTo(0.25 / Math.sqrt(3), 12);
  });

  it('makes a target doubtful beside its dash', () => {
    const request = orificeBy(SUPERHEAT, 12, { readings: { outdoorDryBulb: 95, returnWetBulb: 66.2 } });
    expect(foundOf(request, 'superheat')).toEqual(['not-verifiable', 'target-may-not-exist']);
  });

  it('has the maker’s ± where one was entered, and the floor of the procedure under it', () => {
    const { tolerance } = criterionOf(evaluate(orificeBy({ ...SUPERHEAT, tolerance: deltaF(2) })), 'superheat');
    expect(differenceFromK(tolerance!.high!, 'deltaF')).toBeCloseTo(2, 9);
    expect(tolerance).toMatchObject({ floored: false, source: 'makers-data' });
    const one: MakersChartInput = { kind: 'superheat', unit: 'deltaF', cells: [[6]], tolerance: deltaF(3) };
    const low = criterionOf(evaluate(orificeBy(one, 6)), 'superheat').tolerance!;
    expect([differenceFromK(low.low!, 'deltaF'), low.floored]).toEqual([expect.closeTo(-1, 9), true]);
  });

  it('in °C says the same', () => {
    const celsius = (f: number) => ((f - 32) * 5) / 9;
    const metric: MakersChartInput = {
      ...SUPERHEAT,
      rows: { unit: 'degC', values: SUPERHEAT.rows!.values.map(celsius) },
      columns: { unit: 'degC', values: SUPERHEAT.columns!.values.map(celsius) },
      unit: 'deltaC',
      cells: SUPERHEAT.cells.map((row) => row.map((cell) => (cell === null ? null : (cell * 5) / 9))),
    };
    const readings = { outdoorDryBulb: 88, returnWetBulb: 67 };
    const [a, b] = [SUPERHEAT, metric].map(
      (chart) => criterionOf(evaluate(orificeBy(chart, 18, { readings })), 'superheat').target!.value,
    );
    expect(a).toBeCloseTo(b!, 9);
  });

  it('judges a packaged unit, for which no general chart is printed', () => {
    const kind = 'packaged';
    expect(foundOf(orificeBy(SUPERHEAT, 18, { setup: { kind } }), 'superheat')).toEqual(['within', null]);
    expect(foundOf(exactOrifice(18, { setup: { kind } }), 'superheat')).toEqual(['not-judged', 'target-missing']);
  });

  it('is for an orifice: on a valve a caution says that it is not used', () => {
    const result = evaluate(valveBy(SUPERHEAT, { setup: { targetSubcooling: deltaF(10) } }));
    expect(cautionCodes(result)).toContain('makers-chart-for-orifice');
    expect(result.overall.finding).toBe('within');
  });

  it.each(['cec-ra3.2-2008-rater', 'cec-ra3.2-2019-installer'] as const)(
    'is not used under %s, and a caution says so',
    (procedure) => {
      const result = evaluate(orificeBy(SUPERHEAT, 18, { procedure }));
      expect(criterionOf(result, 'superheat').targetSource).not.toBe('makers-data');
      expect(cautionCodes(result)).toContain('makers-chart-not-by-these-rules');
    },
  );
});

describe('a table of target subcooling', () => {
  it('gives the target by outdoor air', () => {
    const { target, targetSource, finding } = criterionOf(evaluate(valveBy(SUBCOOLING)), 'subcooling');
    expect(differenceFromK(target!.value, 'deltaF')).toBeCloseTo(11, 9);
    expect([targetSource, finding]).toEqual(['makers-data', 'within']);
  });

  it('waits for the outdoor air, which an entered number does not', () => {
    const readings = { outdoorDryBulb: null };
    expect(foundOf(valveBy(SUBCOOLING, { readings }), 'subcooling')).toEqual(['not-judged', 'readings-missing']);
    expect(foundOf(valveRequest({ readings }), 'subcooling')).toEqual(['within', null]);
    expect(foundOf(valveBy({ ...APPROACH, kind: 'subcooling' }, { readings }), 'subcooling')).toEqual(['within', null]);
  });

  it('has no target beyond its rows, and says that one may not exist near their end', () => {
    const at = (outdoorDryBulb: number) => foundOf(valveBy(SUBCOOLING, { readings: { outdoorDryBulb } }), 'subcooling');
    expect(at(64.9)).toEqual(['not-verifiable', 'no-target-here']);
    expect(at(65.1)).toEqual(['not-verifiable', 'target-may-not-exist']);
    expect(at(67)).not.toContain('target-may-not-exist');
  });

  it('is taken under every procedure: the target of subcooling is the maker’s', () => {
    const result = evaluate(valveBy(SUBCOOLING, { procedure: 'cec-ra3.2-2008-rater' }));
    expect(criterionOf(result, 'subcooling').targetSource).toBe('makers-data');
    expect(cautionCodes(result)).not.toContain('makers-chart-not-by-these-rules');
  });

  it('holds for its port only', () => {
    const forDischarge: MakersChartInput = { ...SUBCOOLING, port: 'discharge' };
    const other = evaluate(valveBy(forDischarge));
    expect(foundOf(valveBy(forDischarge), 'subcooling')).toEqual(['not-judged', 'target-for-other-port']);
    expect(other.overall.nextStep.code).toBe('find-target-for-this-port');
    expect(cautionCodes(other)).toContain('makers-chart-for-other-port');
    const read = valveBy(forDischarge, {
      setup: { highSidePort: 'discharge' },
      readings: { dischargePressure: 345, liquidPressure: null },
    });
    expect(foundOf(read, 'subcooling')).toEqual(['within', null]);
  });

  it('stands in where the number that was entered is for another port', () => {
    const setup = { targetSubcooling: deltaF(20), targetSubcoolingPort: 'discharge' } as const;
    expect(criterionOf(evaluate(valveBy(SUBCOOLING, { setup })), 'subcooling').targetSource).toBe('makers-data');
  });

  it('needs 55 °F outdoors unless the maker says otherwise', () => {
    const cold: MakersChartInput = { ...SUBCOOLING, rows: { unit: 'degF', values: [40, 75, 95, 115] } };
    const readings = { outdoorDryBulb: 50, liquidLineTemperature: 94 };
    expect(foundOf(valveBy(cold, { readings }), 'subcooling')).toEqual(['not-verifiable', 'outdoor-too-cold']);
    const allowed = { ...cold, leastOutdoor: degF(45) };
    expect(foundOf(valveBy(allowed, { readings }), 'subcooling')).toEqual(['within', null]);
    // cool weather stays what it is: nothing is moved on such a reading
    expect(cautionCodes(evaluate(valveBy(allowed, { readings })))).toContain('cool-weather');
  });

  it.each<[string, Partial<MakersChartInput>, Changes['readings'], ReasonCode]>([
    ['colder than the maker allows', { leastOutdoor: degF(86) }, {}, 'outdoor-too-cold'],
    ['hotter', { mostOutdoor: degF(84) }, {}, 'outdoor-too-hot'],
    ['a house too cool', { leastReturn: degF(77) }, {}, 'return-too-cool'],
    ['a house too warm', { mostReturn: degF(75) }, {}, 'return-too-warm'],
  ])('%s is not verifiable, with the maker’s limit', (_, limits, readings, reason) => {
    const criterion = criterionOf(
      evaluate(valveBy({ ...SUBCOOLING, ...limits }, { readings: readings ?? {} })),
      'subcooling',
    );
    expect([criterion.finding, criterion.reason?.code]).toEqual(['not-verifiable', reason]);
    const [limit] = Object.values(limits) as unknown as readonly [{ readonly value: number }];
    const figures = criterion.reason!.figures as Readonly<Record<string, { value: number }>>;
    expect(temperatureFromK((figures['least'] ?? figures['most'])!.value, 'degF')).toBeCloseTo(limit.value, 9);
  });

  it('lets a house be cooler than the procedure wants where the maker does', () => {
    const readings = { returnDryBulb: 68, returnWetBulb: null, supplyDryBulb: null };
    const visit = { lowestReturnDryBulb: null };
    expect(foundOf(valveBy(SUBCOOLING, { readings, visit }), 'subcooling')[1]).toBe('return-too-cool');
    const allowed = { ...SUBCOOLING, leastReturn: degF(65) };
    expect(foundOf(valveBy(allowed, { readings, visit }), 'subcooling')).toEqual(['within', null]);
  });
});

describe('the maker’s other methods', () => {
  it.each<[string, MakersChartInput, CriterionId, number, string]>([
    ['liquid line over outdoor air', APPROACH, 'liquid-line-approach', 10, 'choice'],
    ['suction line', SUCTION_LINE, 'suction-line-temperature', 52, 'procedure'],
  ])('%s is judged against the table', (_, chart, id, target, source) => {
    const criterion = criterionOf(evaluate(valveBy(chart)), id);
    const value = criterion.target!.kind === 'temperatureK' ? temperatureFromK : differenceFromK;
    expect(
      value(criterion.target!.value, (criterion.target!.kind === 'temperatureK' ? 'degF' : 'deltaF') as never),
    ).toBeCloseTo(target, 6);
    expect(criterion).toMatchObject({ required: true, finding: 'within', targetSource: 'makers-data' });
    expect([differenceFromK(criterion.tolerance!.high!, 'deltaF'), criterion.tolerance!.source]).toEqual([
      expect.closeTo(3, 9),
      source,
    ]);
  });

  it('liquid pressure is held against the curve as a gauge shows it, within what 3 °F of saturation make', () => {
    const criterion = criterionOf(evaluate(valveBy(CURVE)), 'liquid-pressure');
    expect(criterion.actual!.kind).toBe('gaugePressurePa');
    expect(criterion.actual!.value / PA_PER_PSI).toBeCloseTo(340, 6);
    expect(criterion.target!.value / PA_PER_PSI).toBeCloseTo(340, 6);
    expect(criterion).toMatchObject({ finding: 'within', deviation: { kind: 'pressureDifferencePa' } });
    const { low, high, source } = criterion.tolerance!;
    const targetPa = 340 * PA_PER_PSI + 101_325;
    const bubbleF = (shift: number): number => {
      let [from, to] = [temperatureToK(60, 'degF'), temperatureToK(150, 'degF')];
      for (let k = 0; k < 60; k++) {
        const middle = 0.5 * (from + to);
        if (bubblePressurePa({ refrigerant: 'R-410A', temperatureK: middle }) < targetPa + shift) from = middle;
        else to = middle;
      }
      return temperatureFromK(from, 'degF');
    };
    expect(bubbleF(high!) - bubbleF(0)).toBeCloseTo(3, 6);
    expect(bubbleF(0) - bubbleF(low!)).toBeCloseTo(3, 6);
    expect(source).toBe('choice');
    expect(evaluate(valveBy(CURVE)).overall.finding).toBe('within');
  });

  it('a printed gauge pressure counts from sea level, and is shown as the gauge at the site has it', () => {
    // at 5,000 ft the air weighs 17.26 psi less 5.03: the same absolute pressure shows more on the gauge
    const high = valveBy(CURVE, { setup: { elevation: { value: 5000, unit: 'ft' } } });
    const { target } = criterionOf(evaluate(high), 'liquid-pressure');
    expect(target!.value / PA_PER_PSI).toBeCloseTo(340 + (101_325 - 84_307) / PA_PER_PSI, 1);
  });

  it('takes the maker’s ± of a pressure', () => {
    const { tolerance } = criterionOf(
      evaluate(valveBy({ ...CURVE, tolerance: { value: 4, unit: 'psi' } })),
      'liquid-pressure',
    );
    expect([tolerance!.low, tolerance!.high].map((each) => pressureDifferenceFromPa(each!, 'psi'))).toEqual([
      expect.closeTo(-4, 9),
      expect.closeTo(4, 9),
    ]);
    expect(tolerance!.source).toBe('makers-data');
  });

  it.each<[string, MakersChartInput, Changes['readings'], CriterionId, Finding, 'low' | 'high']>([
    ['a liquid line too warm', APPROACH, { liquidLineTemperature: 101 }, 'liquid-line-approach', 'above', 'low'],
    ['a liquid line too cool', APPROACH, { liquidLineTemperature: 89 }, 'liquid-line-approach', 'below', 'high'],
    ['a pressure below the curve', CURVE, { liquidPressure: 310 }, 'liquid-pressure', 'below', 'low'],
    ['a pressure above the curve', CURVE, { liquidPressure: 370 }, 'liquid-pressure', 'above', 'high'],
    [
      'a suction line too warm',
      SUCTION_LINE,
      { suctionLineTemperature: 60 },
      'suction-line-temperature',
      'above',
      'low',
    ],
    [
      'a suction line too cool',
      SUCTION_LINE,
      { suctionLineTemperature: 46 },
      'suction-line-temperature',
      'below',
      'high',
    ],
  ])('%s: %s', (_, chart, readings, id, finding, charge) => {
    const result = evaluate(precise(valveBy(chart, { readings: readings ?? {} })));
    expect(criterionOf(result, id).finding).toBe(finding);
    const step = result.overall.nextStep.code;
    if (charge === 'low') expect(step).toBe('leak-first');
    else expect(['recover-in-steps', 'air-test-then-recover']).toContain(step);
  });

  it('the approach needs 65 °F outdoors unless the maker says otherwise', () => {
    const readings = { outdoorDryBulb: 60, liquidLineTemperature: 70, liquidPressure: 250 };
    expect(foundOf(valveBy(APPROACH, { readings }), 'liquid-line-approach')[1]).toBe('outdoor-too-cold');
    const allowed = valveBy({ ...APPROACH, leastOutdoor: degF(58) }, { readings });
    expect(foundOf(allowed, 'liquid-line-approach')[1]).toBeNull();
  });

  it('a suction port only: the suction-line table judges a valve, without it nothing does', () => {
    const changes: Changes = {
      setup: { highSidePort: 'none' },
      readings: { liquidPressure: null, liquidLineTemperature: null },
    };
    expect(required(valveBy(SUCTION_LINE, changes))).toEqual(['superheat-window', 'suction-line-temperature']);
    expect(evaluate(valveBy(SUCTION_LINE, changes)).overall.finding).toBe('within');
    expect(evaluate(valveRequest(changes)).overall.nextStep.code).toBe('find-suction-line-table');
  });

  it('a liquid pressure at a discharge port is not held against the curve', () => {
    const request = valveBy({ ...CURVE, port: 'discharge' }, { setup: { highSidePort: 'discharge' } });
    expect(foundOf(request, 'liquid-pressure')).toEqual(['not-verifiable', 'liquid-reading-at-discharge-port']);
  });

  it('a curve of the other port is no target', () => {
    const request = valveBy({ ...CURVE, port: 'discharge' });
    expect(required(request)).toEqual(['subcooling', 'superheat-window']);
    expect(foundOf(request, 'subcooling')).toEqual(['not-judged', 'target-for-other-port']);
  });

  it('under the Californian rules none of them is judged', () => {
    for (const chart of [APPROACH, CURVE, SUCTION_LINE]) {
      const result = evaluate(valveBy(chart, { procedure: 'cec-ra3.2-2019-rater' }));
      expect(result.criteria.map(({ criterion }) => criterion)).not.toContain(chart.kind);
      expect(cautionCodes(result)).toContain('makers-chart-not-by-these-rules');
    }
  });
});

describe('which method decides', () => {
  const all = { makersCharts: [SUCTION_LINE, CURVE, APPROACH] };
  it.each<[string, EvaluationRequest, readonly CriterionId[]]>([
    ['a nameplate subcooling', valveRequest({ setup: all }), ['subcooling', 'superheat-window']],
    ['a subcooling table', valveBy(SUBCOOLING, { setup: all }), ['subcooling', 'superheat-window']],
    [
      'else the approach',
      valveBy(CURVE, { setup: { makersChart: null, ...all } }),
      ['superheat-window', 'liquid-line-approach'],
    ],
    [
      'else the curve',
      valveBy(CURVE, { setup: { makersCharts: [SUCTION_LINE] } }),
      ['superheat-window', 'liquid-pressure'],
    ],
    ['else the suction line', valveBy(SUCTION_LINE), ['superheat-window', 'suction-line-temperature']],
    ['superheat of a split orifice, by the printed chart', exactOrifice(15, { setup: all }), ['superheat']],
    [
      'on a packaged orifice the maker’s curve',
      exactOrifice(15, { setup: { kind: 'packaged', ...all } }),
      ['liquid-line-approach'],
    ],
    [
      'on a packaged orifice its table of superheat',
      orificeBy(SUPERHEAT, 18, { setup: { kind: 'packaged', ...all } }),
      ['superheat'],
    ],
  ])('%s', (_, request, decisive) => {
    expect(required(request)).toEqual(decisive);
  });

  it('the others are judged beside it and decide nothing', () => {
    const result = evaluate(valveRequest({ setup: { makersCharts: [{ ...APPROACH, cells: [[25]] }] } }));
    expect(criterionOf(result, 'liquid-line-approach')).toMatchObject({ required: false, finding: 'below' });
    expect(result.overall.finding).toBe('within');
  });
});

describe('heating', () => {
  it.each<[string, MakersChartInput, CriterionId]>([
    ['discharge pressure', HEATING_PRESSURE, 'heating-discharge-pressure'],
    ['discharge line', HEATING_TEMPERATURE, 'heating-discharge-temperature'],
  ])('is judged by the maker’s table of %s, and by no cooling target', (_, chart, id) => {
    const result = evaluate(heatingBy(chart));
    expect(result.criteria.map(({ criterion }) => criterion)).toEqual([id, 'conditions', 'instruments']);
    expect(criterionOf(result, id)).toMatchObject({ finding: 'within', required: true });
    expect([result.overall.finding, result.overall.nextStep.code]).toEqual(['within', 'record-heating']);
  });

  it('without the table is not verifiable, as ever, whatever cooling tables there are', () => {
    for (const chart of [SUBCOOLING, CURVE, SUPERHEAT]) {
      const result = evaluate(heatingBy(chart));
      expect(criterionOf(result, 'subcooling')).toMatchObject({ finding: 'not-verifiable', required: true });
      expect(result.overall.nextStep.code).toBe('cooling-season-or-weigh-in');
      expect(cautionCodes(result)).not.toContain('makers-chart-for-orifice');
    }
  });

  it('knows no limit of a cooling test, only the running time and those of the table', () => {
    const cold = { outdoorDryBulb: 38, returnDryBulb: 66, dischargePressure: 301 };
    expect(evaluate(heatingBy(HEATING_PRESSURE, { readings: cold })).overall.finding).toBe('within');
    const short = evaluate(heatingBy(HEATING_PRESSURE, { visit: { runningMinutes: 5 } }));
    expect(short.overall.nextStep.code).toBe('run-longer');
    const limited = { ...HEATING_PRESSURE, leastOutdoor: degF(40) };
    expect(foundOf(heatingBy(limited, { readings: cold }), limited.kind)).toEqual([
      'not-verifiable',
      'outdoor-too-cold',
    ]);
    expect(foundOf(heatingBy(limited, { readings: cold }), 'conditions')[1]).toBe('outdoor-too-cold');
  });

  it.each<[string, MakersChartInput, Changes['readings'], Finding]>([
    ['a pressure too low', HEATING_PRESSURE, { dischargePressure: 300 }, 'below'],
    ['a pressure too high', HEATING_PRESSURE, { dischargePressure: 360 }, 'above'],
    ['a line too hot', HEATING_TEMPERATURE, { dischargeLineTemperature: 160 }, 'above'],
    ['a line too cool', HEATING_TEMPERATURE, { dischargeLineTemperature: 138 }, 'below'],
  ])('with %s moves no refrigerant in steps', (_, chart, readings, finding) => {
    const { overall } = evaluate(heatingBy(chart, { readings: readings ?? {} }));
    expect(overall).toMatchObject({
      finding,
      nextStep: { code: 'weigh-in-after-heating', notYet: ['move-no-refrigerant'] },
    });
  });

  it('asks for the discharge reading', () => {
    const { overall } = evaluate(heatingBy(HEATING_PRESSURE, { readings: { dischargePressure: null } }));
    expect(overall.nextStep).toMatchObject({
      code: 'take-readings',
      figures: { readings: { value: ['dischargePressure'] } },
    });
  });

  it('is no test of a system that meters outdoors, runs at part stage or is not ready', () => {
    const heating = (changes: Changes) => evaluate(heatingBy(HEATING_PRESSURE, changes)).overall.nextStep.code;
    expect(heating({ setup: { kind: 'mini-split' } })).toBe('weigh-in');
    expect(heating({ setup: { stage: 'part' } })).toBe('bring-to-full-stage');
    expect(heating({ visit: { preflight: { panelsOn: 'not-ok' } } })).toBe('mend-before-test');
  });

  it('is stopped by a discharge line that is too hot', () => {
    expect(evaluate(heatingBy(HEATING_PRESSURE, { readings: { dischargeLineTemperature: 240 } })).overall.finding).toBe(
      'stop',
    );
  });
});

it('odd figures of a table are a caution, and it is judged by', () => {
  const odd = { ...SUBCOOLING, cells: [[13], [12], [100], [8]] };
  const result = evaluate(valveBy(odd));
  expect(result.overall.cautions).toContainEqual({
    code: 'makers-chart-odd',
    figures: { charts: { kind: 'makersCharts', value: ['subcooling'] } },
  });
  expect(criterionOf(result, 'subcooling').targetSource).toBe('makers-data');
  expect(cautionCodes(evaluate(valveBy(SUBCOOLING)))).not.toContain('makers-chart-odd');
});

it('age counts for the conditions a table is entered with', () => {
  const request = exactValve(10, 12, { setup: { targetSubcooling: null, makersChart: SUBCOOLING } });
  const outdoorDryBulb = { ...request.readings.outdoorDryBulb!, ageSeconds: 1000 };
  expect(foundOf({ ...request, readings: { ...request.readings, outdoorDryBulb } }, 'subcooling')[1]).toBe('stale');
});
