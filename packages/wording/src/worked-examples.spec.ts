import {
  WORKED_EXAMPLES,
  workCheck,
  workMoistAir,
  workWeighIn,
  type WorkedExample,
} from '@chargewright/engine/training';
import { describe, expect, it } from 'vitest';
import { workedExampleStories } from './english/worked-example-stories';
import { UNIT_SYSTEMS } from './unit-system';
import {
  airRows,
  checkedLines,
  furtherRows,
  lineRows,
  otherFigureRows,
  readingRows,
  stepsOfLesson,
  systemRows,
} from './worked-example-rows';

describe.each(UNIT_SYSTEMS)('the examples told in %s', (system) => {
  const stories = workedExampleStories(system);

  it.each(WORKED_EXAMPLES)('$id answers each of its questions, in sentences', ({ id }) => {
    const { title, teaches, story, questions, answers, point } = stories[id];
    expect(answers).toHaveLength(questions.length);
    expect(questions.length).toBeGreaterThanOrEqual(3);
    for (const text of [story, point, ...answers]) expect(text).toMatch(/^[A-Z0-9(].+\.$/);
    for (const text of questions) expect(text).toMatch(/^[A-Z].+[?.]$/);
    for (const text of [title, teaches]) expect(text).toMatch(/^[A-Z].+[^.]$/);
  });

  it('speaks of temperatures in that unit, but for the formula that only counts in °F', () => {
    const other = system === 'F-psi' ? /\d °C/ : /\d °F/;
    for (const [id, { story, questions, answers, point }] of Object.entries(stories)) {
      const texts = [story, ...questions, ...answers, point].filter((text) => !text.includes('÷'));
      for (const text of texts) expect(text, id).not.toMatch(other);
    }
  });
});

const example = (id: string) => WORKED_EXAMPLES.find((each) => each.id === id)!;

describe('givens', () => {
  it('stand in the units of the example, with others beside', () => {
    const check = example('healthy-orifice');
    if (check.kind !== 'check') throw new Error('no check');
    expect(readingRows(check, 'F-psi')[0]).toEqual({ name: 'Suction pressure', own: '76.0 psig', other: '524 kPag' });
    expect(readingRows(check, 'C-bar')[0]?.other).toBe('5.24 barg');
    expect(systemRows(check, 'F-psi').map(({ own }) => own)).toEqual(['R-22', 'Fixed orifice', '0 ft', '20 min']);
    const metric = example('healthy-valve-metric');
    if (metric.kind !== 'check') throw new Error('no check');
    expect(readingRows(metric, 'C-kPa')[0]).toEqual({ name: 'Liquid pressure', own: '2377 kPag', other: '344.8 psig' });
    expect(systemRows(metric, 'F-psi').find(({ name }) => name === 'Target subcooling')).toEqual({
      name: 'Target subcooling',
      own: '5.5 °C',
      other: '9.9 °F',
    });
  });

  it('have what was read further in a test that belongs to them', () => {
    const check = example('overcharge-or-air');
    if (check.kind !== 'check') throw new Error('no check');
    const [first, second] = furtherRows(check, 'F-psi');
    expect(first?.rows.map(({ own }) => own)).toEqual(['254.1 psig', '85.0 °F', '85.0 °F']);
    expect(second?.rows[0]).toEqual({ name: 'Standing pressure', own: '290.8 psig', other: '2005 kPag' });
    const plain = example('healthy-orifice');
    expect(plain.kind === 'check' && furtherRows(plain, 'F-psi')).toEqual([]);
  });

  it('of air and of a line set', () => {
    const [air, line] = [example('handbook-moist-air'), example('printed-sum')];
    if (air.kind !== 'moist-air' || line.kind !== 'weigh-in') throw new Error('no such kind');
    expect(airRows(air, 'F-psi').map(({ own }) => own)).toEqual(['100 °F', '65 °F', '14.696 psia']);
    expect(lineRows(line.parts[0]!, 'C-kPa').map(({ own, other }) => [own, other])).toEqual([
      ['96 oz', '2721.6 g'],
      ['15 ft', '4.6 m'],
      ['45 ft', '13.7 m'],
      ['0.4 oz/ft', '37.2 g/m'],
      ['9 oz, 4.5 oz', '255.1 g, 127.6 g'],
    ]);
  });
});

describe('the numbers of a key', () => {
  /** The math of an example, and its figures. */
  const worked = (each: WorkedExample) => {
    switch (each.kind) {
      case 'check': {
        const { result, figures } = workCheck(each);
        return { figures, steps: result.derivation };
      }
      case 'moist-air':
        return workMoistAir(each);
      case 'weigh-in':
        return { figures: workWeighIn(each).figures, steps: [] };
    }
  };

  it.each(WORKED_EXAMPLES)(
    '$id: each stands beside its step or among the others, with what it is held against',
    (each) => {
      const { figures, steps } = worked(each);
      const beside = checkedLines(steps, figures, 'F-psi').flatMap(({ check }) => (check === null ? [] : [check]));
      const others = otherFigureRows(figures, steps);
      expect(beside.length + others.length).toBe(figures.length);
      expect(beside.length > 0).toBe(each.kind !== 'weigh-in');
      for (const { printed, against } of [...beside, ...others]) {
        expect(against).toMatch(/^(printed: .|computed: .|by hand|rule of thumb: .*no source|table: .*from memory)/);
        expect(printed).toMatch(/^[\u22120-9]/);
      }
      for (const { name, here } of others) {
        expect(name).toMatch(/^[A-Z]/);
        expect(here).toMatch(/^[\u22120-9]/);
      }
    },
  );

  it('leave out of the math what the lesson is not about', () => {
    const { figures, steps } = worked(example('overcharge-or-air'));
    const ids = stepsOfLesson(steps, figures).map(({ id }) => id);
    expect(ids).toEqual([
      'liquidPressureAbsolute',
      'condensingBubbleTemperature',
      'subcooling',
      'subcoolingDeviation',
      'suctionPressureAbsolute',
      'evaporatingDewTemperature',
      'superheat',
    ]);
    expect(steps.map(({ id }) => id)).toContain('temperatureSplit');
  });

  it('show a misprint as one', () => {
    const { figures, steps } = worked(example('printed-sum'));
    expect(otherFigureRows(figures, steps)[0]).toMatchObject({
      name: 'Charge of the line, 5/16 in. line',
      printed: '9 oz',
      here: '18.0 oz',
      misprint: true,
    });
  });

  it('name every step of their math', () => {
    const { figures, steps } = worked(example('handbook-moist-air'));
    expect(checkedLines(steps, figures, 'F-psi').map(({ name }) => name)).toEqual([
      'Humidity ratio',
      'Relative humidity',
      'Dew point',
      'Enthalpy',
      'Specific volume',
    ]);
  });
});
