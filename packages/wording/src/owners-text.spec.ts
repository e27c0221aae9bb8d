import { evaluateCheck, readRequest, type EvaluationRequest, type OverallFinding } from '@chargewright/engine';
import { describe, expect, it } from 'vitest';
import { ownersText } from './owners-text';

/** A fixed orifice at 95 °F outdoors and 67 °F wet bulb: chart A prints 12 °F; R-410A at 118 psig evaporates near 40 °F (makers’ tables). */
const orifice = (suctionLine: number, readings: EvaluationRequest['readings'] = {}): EvaluationRequest => ({
  setup: { refrigerant: 'R-410A', meteringDevice: 'fixed-orifice', elevation: { value: 0, unit: 'ft' } },
  visit: { runningMinutes: 20 },
  readings: {
    returnDryBulb: { value: 80, unit: 'degF' },
    returnWetBulb: { value: 67, unit: 'degF' },
    supplyDryBulb: { value: 61.7, unit: 'degF' },
    outdoorDryBulb: { value: 95, unit: 'degF' },
    suctionPressure: { value: 118, unit: 'psig' },
    suctionLineTemperature: { value: suctionLine, unit: 'degF' },
    ...readings,
  },
});

function told(request: EvaluationRequest) {
  const read = readRequest(request);
  if (!read.ok) throw new Error(JSON.stringify(read.faults));
  const result = evaluateCheck(read.input);
  return { finding: result.overall.finding, text: ownersText(result, { date: '1 December 2026', system: 'F-psi' }) };
}

const cases: readonly (readonly [finding: OverallFinding, request: EvaluationRequest, says: RegExp])[] = [
  ['within', orifice(52), /within its tolerance: superheat 12\.\d °F \(± \d\.\d °F\), target 12 °F\. The target comes/],
  ['above', orifice(72), /needs attention\. Superheat is \d+\.\d °F above target: 32\.\d °F/],
  ['too-close-to-call', orifice(57), /too close to the edge of its tolerance/],
  [
    'not-verifiable',
    orifice(52, { outdoorDryBulb: { value: 110, unit: 'degF' }, returnWetBulb: { value: 58, unit: 'degF' } }),
    /could not be verified today, which is neither a pass nor a fail\. There is no target/,
  ],
  [
    'stop',
    orifice(40.2),
    /The test was stopped, and the charge is not judged\. Liquid may be reaching the compressor\./,
  ],
];

describe('the text for the owner', () => {
  it.each(cases)('of a check that is %s', (finding, request, says) => {
    const { finding: found, text } = told(request);
    expect(found).toBe(finding);
    expect(text).toMatch(says);
    expect(text).toMatch(/^Your cooling system was checked on 1 December 2026 \(General rules\)\. /);
    expect(text).toMatch(/does not certify capacity, tightness or safety\.$/);
    expect(text).not.toMatch(/undefined|null|\s\s|\.\.|-[a-z]+-/);
  });

  it('of a check without an outdoor reading says that it is not finished', () => {
    const { outdoorDryBulb: _, ...readings } = orifice(52).readings;
    expect(told({ ...orifice(52), readings }).text).toMatch(/The check is not finished, so the charge is not judged\./);
  });

  it('says what may still hide behind a superheat that is within, and no longer once the liquid pair is read', () => {
    expect(told(orifice(52)).text).toContain('can hide each other');
    const liquid = { liquidPressure: { value: 340, unit: 'psig' }, liquidLineTemperature: { value: 95, unit: 'degF' } };
    expect(told(orifice(52, liquid as EvaluationRequest['readings'])).text).not.toContain('can hide each other');
  });

  it('says that the airflow was not measured where nothing shows it', () => {
    const { supplyDryBulb: _, ...readings } = orifice(52).readings;
    expect(told({ ...orifice(52), readings }).text).toContain('The airflow was not measured.');
  });
});
