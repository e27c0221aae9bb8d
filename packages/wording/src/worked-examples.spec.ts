import { WORKED_EXAMPLES, workCheck, workMoistAir, workWeighIn } from '@chargewright/engine/training';
import { describe, expect, it } from 'vitest';
import { workedExampleStories } from './english/worked-example-stories';
import { UNIT_SYSTEMS } from './unit-system';
import { airRows, exampleLines, figureRows, lineRows, readingRows, systemRows } from './worked-example-rows';

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

  it('have the standing pressures of the stopped system with them', () => {
    const check = example('overcharge-or-air');
    if (check.kind !== 'check') throw new Error('no check');
    expect(readingRows(check, 'F-psi').at(-1)?.own).toBe('290.8 psig, both coils at 85.0 °F');
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
  it('each say what they are held against', () => {
    for (const each of WORKED_EXAMPLES) {
      const { figures } =
        each.kind === 'check' ? workCheck(each) : each.kind === 'moist-air' ? workMoistAir(each) : workWeighIn(each);
      for (const row of figureRows(figures)) {
        expect(row.name).toMatch(/^[A-Z]/);
        expect(row.against).toMatch(
          /^(Printed: .|Computed: .|By hand|Rule of thumb: Common practice, no source|Table: .*from memory)/,
        );
        expect(`${row.printed} ${row.here}`).not.toMatch(/NaN|undefined|null/);
        expect(row.here).not.toBe('');
      }
    }
  });

  it('show a misprint as one', () => {
    const line = example('printed-sum');
    if (line.kind !== 'weigh-in') throw new Error('no weigh-in');
    const [row] = figureRows(workWeighIn(line).figures);
    expect(row).toMatchObject({
      name: 'Charge of the line, 5/16 in. line',
      printed: '9 oz',
      here: '18.0 oz',
      misprint: true,
    });
  });

  it('name every step of their math', () => {
    const [air, line] = [example('handbook-moist-air'), example('printed-sum')];
    if (air.kind !== 'moist-air' || line.kind !== 'weigh-in') throw new Error('no such kind');
    const steps = [...workMoistAir(air).steps, ...workWeighIn(line).parts.flatMap(({ result }) => result.steps)];
    for (const { name, id } of exampleLines(steps, 'F-psi')) expect(name, id).toMatch(/^[A-Z].+/);
  });
});
