import { readFileSync } from 'node:fs';
import { evaluateCheck, isKnown, readRequest } from '@chargewright/engine';
import type { CheckResult, EvaluationRequest, Known } from '@chargewright/engine';
import { derivationLines, formatValue, nextStepText } from '@chargewright/wording';
import { describe, expect, it } from 'vitest';

const README = readFileSync(new URL('../../../README.md', import.meta.url), 'utf8');

function exampleRequest(): EvaluationRequest {
  const block = /```json\n([\s\S]*?)```/.exec(README)?.[1];
  if (block === undefined) throw new Error('the README has no JSON example');
  return JSON.parse(block) as EvaluationRequest;
}

function evaluated(): CheckResult {
  const read = readRequest(exampleRequest());
  if (!read.ok) throw new Error(JSON.stringify(read.faults));
  return evaluateCheck(read.input);
}

const rows = README.split('\n').filter((line) => line.startsWith('| '));
const cellsOf = (firstCell: string): readonly string[] => {
  const row = rows.find((line) => line.startsWith(`| ${firstCell}`));
  if (row === undefined) throw new Error(`the README has no row ${firstCell}`);
  return row.split('|').map((cell) => cell.trim());
};

describe('the example of the README', () => {
  const result = evaluated();
  const lines = derivationLines(result.derivation, 'F-psi');

  it.each([
    ['suction pressure, absolute', 'suctionPressureAbsolute'],
    ['dew point of R-410A', 'evaporatingDewTemperature'],
    ['superheat', 'superheat'],
    ['target from the makers', 'targetSuperheat'],
    ['deviation', 'superheatDeviation'],
    ['temperature split', 'temperatureSplit'],
  ])('prints the sum and the result of %s as the engine and the wording give them', (row, id) => {
    const line = lines.find((candidate) => candidate.id === id);
    const cells = cellsOf(row);
    expect(cells[2]).toBe(line?.substitution);
    expect(cells[3]).toContain(line?.result);
  });

  it('prints the expanded uncertainty of the superheat', () => {
    const superheat = result.derived.superheat as Known;
    expect(isKnown(superheat)).toBe(true);
    expect(cellsOf('superheat')[3]).toContain(`± ${formatValue('differenceK', 2 * superheat.u, 'F-psi')}`);
  });

  it('tells the same finding and next step', () => {
    expect(result.overall.finding).toBe('above');
    const superheat = result.criteria.find(({ criterion }) => criterion === 'superheat');
    expect(superheat?.probabilityWithin).toBeLessThan(0.01);
    expect(result.criteria.find(({ criterion }) => criterion === 'temperature-split')?.finding).toBe('within');
    const [first = ''] = nextStepText(result.overall.nextStep, 'F-psi').split(' They ');
    expect(README).toContain(first);
  });
});
