/** Every figure of the worked examples: what it says is printed is printed, and the engine comes within its bound of it. */
import {
  workCheck,
  WORKED_EXAMPLE_IDS,
  WORKED_EXAMPLES,
  workMoistAir,
  workWeighIn,
  type CheckedFigure,
  type CheckExample,
  type WorkedExample,
  type WorkedFigure,
} from '@chargewright/engine/training';
import { describe, expect, it } from 'vitest';
import { onPaper } from './paper';

const figuresOf = (example: WorkedExample): readonly WorkedFigure[] => {
  switch (example.kind) {
    case 'check':
      return workCheck(example).figures;
    case 'moist-air':
      return workMoistAir(example).figures;
    case 'weigh-in':
      return workWeighIn(example).figures;
  }
};

const CHECKS = WORKED_EXAMPLES.filter((example): example is CheckExample => example.kind === 'check');

/** Half of the last digit that figures in °F are written with; metric ones are rounded to 0.1 °C after the pressure was rounded to 1 kPa. */
const ROUNDING = 0.0501;

/** From °F or psi, as on paper, to the unit of a figure. */
const FROM_PAPER: Readonly<Partial<Record<CheckedFigure['unit'], (paper: number) => number>>> = {
  degC: (paper) => (paper - 32) / 1.8,
  deltaC: (paper) => paper / 1.8,
  degF: (paper) => paper,
  deltaF: (paper) => paper,
  psia: (paper) => paper,
  psig: (paper) => paper,
};

function inFigureUnit({ unit, what }: CheckedFigure, paper: number): number {
  const convert = FROM_PAPER[unit];
  if (convert === undefined) throw new Error(`${what} in ${unit} is not worked on paper`);
  return convert(paper);
}

describe('the worked examples', () => {
  it('are at least twelve, in the order of their ids, of every kind', () => {
    expect(WORKED_EXAMPLES.map(({ id }) => id)).toEqual(WORKED_EXAMPLE_IDS);
    expect(WORKED_EXAMPLES.length).toBeGreaterThanOrEqual(12);
    expect(new Set(WORKED_EXAMPLES.map(({ kind }) => kind))).toEqual(new Set(['check', 'moist-air', 'weigh-in']));
  });

  it.each(WORKED_EXAMPLES)('$id: the engine comes within its bound of every figure', (example) => {
    expect(example.figures.length).toBeGreaterThanOrEqual(3);
    for (const { figure, computed } of figuresOf(example)) {
      const name = `${figure.what} ${figure.of ?? ''}`;
      expect(computed, name).not.toBeNull();
      const off = Math.abs(computed! - figure.value);
      if (figure.misprint) expect(off, name).toBeGreaterThan(figure.within);
      else expect(off, name).toBeLessThanOrEqual(figure.within + 1e-9);
    }
  });

  it.each(CHECKS)('$id: every figure is what the printed tables and paper give', (example) => {
    for (const figure of example.figures) {
      const paper = inFigureUnit(figure, onPaper(example, figure));
      expect(Math.abs(paper - figure.value), `${figure.what} ${figure.of ?? ''}: ${paper}`).toBeLessThan(ROUNDING);
    }
  });

  it('name a source for everything that was read, and no bound is wider than the difference known of its source', () => {
    // the largest differences of the sources from the model, as the refrigerant tests gate them; psig: at 85 °F
    const MOST = { degF: 0.4, deltaF: 0.4, degC: 0.11, deltaC: 0.11, psig: 1.5, psia: 0.02 } as const;
    for (const example of CHECKS) {
      for (const { what, unit, source, within, standing } of example.figures) {
        expect(source, what).not.toBe('');
        expect(within, `${example.id} ${what}`).toBeLessThanOrEqual(MOST[unit as keyof typeof MOST]);
        if (standing === 'practice') expect(source).toMatch(/no source/);
        if (standing === 'memory') expect(source).toMatch(/from memory/);
      }
    }
  });
});
