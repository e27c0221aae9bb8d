import {
  CRITERION_IDS,
  FINDINGS,
  leaf,
  type CriterionResult,
  type DerivedStep,
  type Known,
  type Reason,
} from '@chargewright/engine';
import { describe, expect, it } from 'vitest';
import {
  criterionDetail,
  criterionHeadline,
  criterionName,
  findingWord,
  overallHeadline,
  rulerText,
} from './sentences';
import { UNIT_SYSTEMS } from './unit-system';

const K_PER_F = 5 / 9;
/** ± at k = 2, both in °F. */
const known = (degrees: number, plusMinus = 0): Known => ({
  ...leaf({ id: 'x', kind: 'differenceK', value: degrees * K_PER_F, origin: 'reading' }),
  u: (plusMinus / 2) * K_PER_F,
});

const chartTarget: Known = {
  ...known(8.8),
  step: {
    type: 'derived',
    parts: [],
    from: {
      wetBulbK: leaf({
        id: 'returnWetBulb',
        kind: 'temperatureK',
        value: (64.5 + 459.67) * K_PER_F,
        origin: 'reading',
      }),
      outdoorK: leaf({ id: 'outdoorDryBulb', kind: 'temperatureK', value: (92 + 459.67) * K_PER_F, origin: 'reading' }),
    },
    formula: {
      id: 'targetSuperheat',
      gives: 'differenceK',
      text: 'chart(T_wb, T_outdoor)',
      symbols: {},
      source: '',
      of: () => 0,
    },
  },
};

/** The study of the page: 18.3 °F against 8.8 °F. */
const superheat: CriterionResult = {
  criterion: 'superheat',
  required: true,
  actual: known(18.3, 1.8),
  target: chartTarget,
  targetSource: 'makers-chart-a',
  deviation: known(9.5),
  tolerance: { low: -3.8 * K_PER_F, high: 5 * K_PER_F, floored: true, source: 'procedure' },
  byRule: 'fails',
  probabilityWithin: 0.01,
  onlyJust: false,
  finding: 'above',
  reason: null,
};

const unjudged = (reason: Reason, more: Partial<CriterionResult> = {}): CriterionResult => ({
  criterion: 'subcooling',
  required: true,
  actual: null,
  target: null,
  targetSource: null,
  deviation: null,
  tolerance: null,
  byRule: null,
  probabilityWithin: null,
  onlyJust: false,
  finding: 'not-judged',
  reason,
  ...more,
});

const missingPair: Reason = {
  code: 'readings-missing',
  figures: { readings: { kind: 'readings', value: ['liquidPressure', 'liquidLineTemperature'] } },
};

const window: CriterionResult = {
  ...superheat,
  criterion: 'superheat-window',
  target: null,
  targetSource: 'procedure-window',
  deviation: null,
  tolerance: { low: 4 * K_PER_F, high: 25 * K_PER_F, floored: false, source: 'procedure' },
};

const airflow: CriterionResult = {
  ...superheat,
  criterion: 'airflow',
  actual: { ...leaf({ id: 'airflow', kind: 'flowM3PerS', value: 0.42, origin: 'reading' }), u: 0.0147 },
  target: leaf({ id: 'leastAirflow', kind: 'flowM3PerS', value: 0.5, origin: 'entered' }),
  targetSource: 'airflow-per-capacity',
  deviation: leaf({ id: 'd', kind: 'flowM3PerS', value: -0.08, origin: 'entered' }),
  tolerance: { low: 0, high: null, floored: false, source: 'procedure' },
  finding: 'below',
};

describe('criterionHeadline', () => {
  it('is a sentence a customer could read', () => {
    expect(criterionHeadline(superheat, 'F-psi')).toBe('Superheat is 9.5 °F above target');
    expect(criterionHeadline(superheat, 'C-bar')).toBe('Superheat is 5.3 °C above target');
    expect(criterionHeadline({ ...superheat, finding: 'below', deviation: known(-6) }, 'F-psi')).toBe(
      'Superheat is 6.0 °F below target',
    );
    expect(criterionHeadline({ ...superheat, finding: 'within', deviation: known(-1.2) }, 'F-psi')).toBe(
      'Superheat is within its band, 1.2 °F below target',
    );
    expect(criterionHeadline({ ...superheat, finding: 'within', deviation: known(0.02) }, 'F-psi')).toBe(
      'Superheat is within its band, on target',
    );
    expect(criterionHeadline({ ...superheat, finding: 'too-close-to-call' }, 'F-psi')).toBe(
      'Superheat: too close to call',
    );
  });

  it('does not contradict itself when the floor lies above the target', () => {
    const nearFloor = { ...superheat, finding: 'below', deviation: known(0.4) } as const;
    expect(criterionHeadline(nearFloor, 'F-psi')).toBe('Superheat is below its band');
  });

  it('names the readings it waits for', () => {
    expect(criterionHeadline(unjudged(missingPair), 'F-psi')).toBe(
      'Subcooling needs the liquid pressure and the liquid line temperature',
    );
  });

  it('speaks of a window and of a least airflow without a target', () => {
    expect(criterionHeadline({ ...window, finding: 'within' }, 'F-psi')).toBe(
      'Superheat is inside the window of 4 to 25 °F',
    );
    expect(criterionHeadline({ ...window, actual: known(28) }, 'F-psi')).toBe(
      'Superheat 28.0 °F is above the window of 4 to 25 °F',
    );
    expect(criterionHeadline(airflow, 'C-bar')).toBe('Airflow 420 L/s is too low: at least 500 L/s');
  });

  it('exists for every criterion and finding, in every unit system', () => {
    for (const criterion of CRITERION_IDS) {
      for (const finding of FINDINGS) {
        for (const result of [{ ...superheat, criterion, finding }, unjudged(missingPair, { criterion, finding })]) {
          for (const system of UNIT_SYSTEMS) {
            for (const say of [criterionHeadline, criterionDetail, rulerText]) {
              expect(say(result, system), `${criterion} ${finding}`).not.toMatch(/undefined|NaN|null|\s\s|\s[.,]/);
            }
            expect(criterionHeadline(result, system)).not.toBe('');
          }
        }
        expect(findingWord(finding, criterion)).toBeTruthy();
      }
      expect(criterionName(criterion)).toBeTruthy();
    }
  });
});

describe('criterionDetail', () => {
  it('says against what and how sure', () => {
    expect(criterionDetail(superheat, 'F-psi')).toBe(
      'Target 8.8 °F from the makers’ chart at 64.5 °F wet bulb, 92 °F outdoors · 99 % sure it is above the band',
    );
    expect(criterionDetail({ ...window, finding: 'within', probabilityWithin: 0.9999 }, 'F-psi')).toBe(
      '4 to 25 °F by these rules · over 99 % sure it is inside the band',
    );
    expect(criterionDetail({ ...airflow, probabilityWithin: 0.02 }, 'C-bar')).toBe(
      'At least 500 L/s from the nominal capacity · 98 % sure it is below the band',
    );
  });

  it('says of a maker’s table at what it was looked up, and whose the ± is', () => {
    const psi = 6894.757293168;
    const gauge = (value: number): Known =>
      leaf({ id: 'x', kind: 'gaugePressurePa', value: value * psi, origin: 'reading' });
    const liquidLineK = leaf({
      id: 'liquidLineTemperature',
      kind: 'temperatureK',
      value: (98.5 + 459.67) * K_PER_F,
      origin: 'reading',
    });
    const formula = { ...(chartTarget.step as DerivedStep).formula, id: 'x', gives: 'pressurePa' } as const;
    const lookedUp: Known = {
      ...leaf({ id: 'x', kind: 'pressurePa', value: 362.7 * psi, origin: 'entered' }),
      step: { type: 'derived', parts: [], from: { liquidLineK }, formula },
    };
    const target: Known = {
      ...gauge(348),
      step: { type: 'derived', parts: [], from: { pressurePa: lookedUp, atmospherePa: lookedUp }, formula },
    };
    const pressure: CriterionResult = {
      ...superheat,
      criterion: 'liquid-pressure',
      actual: { ...gauge(361), u: 2 * psi },
      target,
      targetSource: 'makers-data',
      deviation: leaf({ id: 'd', kind: 'pressureDifferencePa', value: 13 * psi, origin: 'entered' }),
      tolerance: { low: -9 * psi, high: 9 * psi, floored: false, source: 'choice' },
    };
    expect(criterionHeadline(pressure, 'F-psi')).toBe('Liquid pressure is 13.0 psi above target');
    expect(criterionDetail(pressure, 'F-psi')).toBe(
      'Target 348 psig from the maker’s table as entered at 98.5 °F liquid line, with a ± of our choice: the maker’s was not entered · 99 % sure it is above the band',
    );
    expect(rulerText(pressure, 'F-psi')).toBe(
      'Liquid pressure 361 plus or minus 4.0 psi, target 348, tolerance 339 to 357',
    );
    expect(rulerText(pressure, 'C-bar')).toBe(
      'Liquid pressure 24.89 plus or minus 0.28 bar, target 23.99, tolerance 23.37 to 24.61',
    );
    const stated = { ...superheat, tolerance: { ...superheat.tolerance!, source: 'makers-data' } } as const;
    expect(criterionDetail(stated, 'F-psi')).toContain('92 °F outdoors, with the maker’s ±');
  });

  it('says only just, and what would settle it, where the rule alone decided', () => {
    const passes = {
      ...superheat,
      finding: 'within',
      byRule: 'passes',
      probabilityWithin: 0.62,
      onlyJust: true,
    } as const;
    expect(criterionDetail(passes, 'F-psi')).toMatch(
      / · only just: 62 % sure it is inside the band; a better instrument .+ would settle it$/,
    );
    const fails = { ...passes, finding: 'above', byRule: 'fails', probabilityWithin: 0.4 } as const;
    expect(criterionDetail(fails, 'F-psi')).toContain('only just: 60 % sure it is above the band');
    expect(criterionDetail({ ...passes, onlyJust: false }, 'F-psi')).not.toContain('only just');
  });

  it('says of the finer table that it is from memory', () => {
    expect(criterionDetail({ ...superheat, targetSource: 'finer-table' }, 'F-psi')).toContain(
      'Target 8.8 °F from the published table, from memory, at 64.5 °F wet bulb, 92 °F outdoors',
    );
  });

  it('names the window and the maker’s range where both must hold', () => {
    expect(criterionDetail({ ...window, targetSource: 'window-and-range' }, 'F-psi')).toContain(
      '4 to 25 °F by these rules and the maker’s range together',
    );
  });

  it('keeps the line by the rule when the finding is held back', () => {
    const tooClose = { ...superheat, finding: 'too-close-to-call', byRule: 'passes', probabilityWithin: 0.62 } as const;
    expect(criterionDetail(tooClose, 'F-psi')).toContain('62 % sure it is inside the band · by the rule it passes');
    const gated = {
      ...superheat,
      finding: 'not-verifiable',
      reason: { code: 'airflow-too-low', figures: {} },
    } as const;
    expect(criterionDetail(gated, 'F-psi')).toMatch(/^The airflow is too low.+ · by the rule it fails$/);
  });

  it('does not say twice what is missing', () => {
    expect(criterionDetail(unjudged(missingPair), 'F-psi')).toBe('');
  });

  it('guides a subcooling without a target, and never judges it', () => {
    const noTarget = unjudged({ code: 'target-missing', figures: {} }, { actual: known(9.5, 1.7) });
    expect(criterionDetail(noTarget, 'F-psi')).toBe(
      'There is no target yet: take it from the nameplate or the maker’s data. So far 9.5 °F ± 1.7 °F. 8 °F to 14 °F is common on nameplates: guidance, never a limit.',
    );
  });
});

describe('rulerText', () => {
  it('tells what the ruler draws', () => {
    expect(rulerText(superheat, 'F-psi')).toBe(
      'Superheat 18.3 plus or minus 1.8 °F, target 8.8, tolerance 5 (floor) to 13.8',
    );
    expect(rulerText(window, 'F-psi')).toBe('Superheat 18.3 plus or minus 1.8 °F, tolerance 4 to 25');
    expect(rulerText(airflow, 'C-bar')).toBe('Airflow 420 plus or minus 29 L/s, target 500, tolerance at least 500');
    expect(rulerText(unjudged(missingPair), 'F-psi')).toBe('Subcooling not known yet');
  });
});

describe('findingWord', () => {
  it('fits the criterion', () => {
    expect(findingWord('above')).toBe('above target');
    expect(findingWord('above', 'superheat-window')).toBe('above the window');
    expect(findingWord('below', 'airflow')).toBe('too low');
    expect(findingWord('stop')).toBe('stop');
  });
});

describe('overallHeadline', () => {
  const nextStep = { code: 'record', figures: {}, notYet: [] } as const;
  const overall = (finding: CriterionResult['finding'] | 'stop') =>
    ({ finding, nextStep, stops: [], cautions: [] }) as const;

  it('is that of the required criterion which decides', () => {
    const optional = { ...superheat, criterion: 'temperature-split', required: false } as const;
    expect(overallHeadline({ overall: overall('above'), criteria: [optional, superheat] }, 'F-psi')).toBe(
      'Superheat is 9.5 °F above target',
    );
  });

  it('is the stop when there is one', () => {
    const figures = { evaporating: { kind: 'temperatureK', value: 270 } } as const;
    const stopped = { ...overall('stop'), stops: [{ code: 'freezing', figures }] } as const;
    expect(overallHeadline({ overall: stopped, criteria: [superheat] }, 'F-psi')).toBe('Stop: the coil is freezing');
  });

  it('falls back to the finding alone', () => {
    expect(overallHeadline({ overall: overall('not-judged'), criteria: [] }, 'F-psi')).toBe('Not judged yet');
  });
});
