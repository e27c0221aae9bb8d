import type { MeteringDevice, ReadingId } from '@chargewright/engine';
import {
  checkPageWords,
  criterionName,
  findingWord,
  formatNumber,
  setupWords,
  type UnitSystem,
} from '@chargewright/wording';
import { describe, expect, it } from 'vitest';
import { HIGH_SUPERHEAT, type Readings } from './harness/check-page';
import { browserSuite } from './harness/suite';

const suite = browserSuite();

interface Case {
  readonly name: string;
  readonly system: UnitSystem;
  readonly refrigerant: string;
  readonly meteringDevice: MeteringDevice;
  readonly elevation: string;
  readonly targetSubcooling?: string;
  readonly readings: Readings;
}

const CASES: readonly Case[] = [
  {
    name: 'a fixed orifice, °F and psi',
    system: 'F-psi',
    refrigerant: 'R-410A',
    meteringDevice: 'fixed-orifice',
    elevation: '650',
    readings: HIGH_SUPERHEAT,
  },
  {
    name: 'a TXV with a glide, °F and psi, high up',
    system: 'F-psi',
    refrigerant: 'R-407C',
    meteringDevice: 'txv',
    elevation: '5280',
    targetSubcooling: '11',
    readings: {
      ...HIGH_SUPERHEAT,
      suctionPressure: '66',
      suctionLineTemperature: '58',
      liquidPressure: '238',
      liquidLineTemperature: '98.4',
    },
  },
  {
    name: 'a TXV, °C and kPa',
    system: 'C-kPa',
    refrigerant: 'R-32',
    meteringDevice: 'txv',
    elevation: '120',
    targetSubcooling: '6',
    readings: {
      suctionPressure: '850',
      suctionLineTemperature: '12.4',
      outdoorDryBulb: '34',
      liquidPressure: '2480',
      liquidLineTemperature: '36.1',
      returnDryBulb: '25.6',
      returnWetBulb: '18.2',
      supplyDryBulb: '14.3',
    },
  },
];

/** The page takes it from the digits typed; a JSON number cannot carry them. */
const resolutionOf = (text: string): number => 10 ** -(text.split('.')[1]?.length ?? 0);
const isPressure = (id: string) => id.endsWith('Pressure');

function requestOf({ system, refrigerant, meteringDevice, elevation, targetSubcooling, readings }: Case) {
  const metric = system !== 'F-psi';
  const unitOf = (id: string) => (isPressure(id) ? (metric ? 'kPag' : 'psig') : metric ? 'degC' : 'degF');
  return {
    setup: {
      refrigerant,
      meteringDevice,
      elevation: { value: Number(elevation), unit: metric ? 'm' : 'ft' },
      ...(targetSubcooling !== undefined && {
        targetSubcooling: { value: Number(targetSubcooling), unit: metric ? 'deltaC' : 'deltaF' },
      }),
    },
    visit: { runningMinutes: 22 },
    readings: Object.fromEntries(
      (Object.entries(readings) as [ReadingId, string][]).map(([id, text]) => [
        id,
        { value: Number(text), unit: unitOf(id), resolution: resolutionOf(text) },
      ]),
    ),
  };
}

interface Answer {
  readonly criteria: readonly {
    readonly criterion: 'superheat' | 'subcooling' | 'temperature-split' | 'superheat-window';
    readonly actual: { readonly value: number; readonly plusMinus: number } | null;
    readonly target: { readonly value: number } | null;
    readonly finding: 'within' | 'above' | 'below' | 'too-close-to-call' | 'not-verifiable' | 'not-judged';
  }[];
  readonly overall: { readonly nextStep: { readonly text: string } };
  readonly derivation: readonly { readonly id: string; readonly substitution: string }[];
}

describe('the same system by the API and on the page', () => {
  it.each(CASES)('$name: the same numbers, findings, next step and math', async (sample) => {
    const { page, check } = await suite.newPhone();
    const response = await fetch(`${suite.server().origin}/api/v1/evaluations`, {
      method: 'POST',
      headers: { 'Content-Type': 'application/json' },
      body: JSON.stringify(requestOf(sample)),
    });
    expect(response.status).toBe(200);
    const answer = (await response.json()) as Answer;

    await check.open();
    await page.getByLabel(checkPageWords.units.choose).selectOption(sample.system);
    await check.setUp(sample.refrigerant, sample.meteringDevice);
    await check.setElevation(sample.elevation);
    await check.setRunningMinutes('22');
    if (sample.targetSubcooling !== undefined) {
      await check.type(setupWords.numbers.targetSubcooling.label, sample.targetSubcooling);
    }
    await check.read(sample.readings);

    const judged = answer.criteria.filter(({ actual }) => actual !== null);
    expect(judged.length).toBeGreaterThanOrEqual(2);
    for (const { criterion, actual, target, finding } of judged) {
      if (!actual) continue;
      await expect
        .poll(() => check.card(criterionName(criterion)), { message: criterion })
        .toContain(findingWord(finding, criterion));
      const card = (await check.card(criterionName(criterion))).replace(/\s+/g, ' ');
      expect(card).toContain(`${formatNumber(actual.value, 1)} ± ${formatNumber(actual.plusMinus, 1)}`);
      if (target) expect(card).toMatch(new RegExp(`target ${Number(target.value.toFixed(1))}(\\.0)?\\b`));
    }
    const shown = (await page.getByRole('main').innerText()).replace(/\s+/g, ' ');
    for (const sentence of answer.overall.nextStep.text.split(/(?<=\.) /)) expect(shown).toContain(sentence);

    const [deciding] = judged;
    if (!deciding) throw new Error('nothing was judged');
    await check.button(checkPageWords.result.showMathOf(criterionName(deciding.criterion))).click();
    const step = answer.derivation.find(({ id }) => id === deciding.criterion);
    expect(step).toBeDefined();
    // the math is loaded when it is first opened
    await expect
      .poll(async () => (await check.card(criterionName(deciding.criterion))).replace(/\s+/g, ' '))
      .toContain(step?.substitution.replace(/\s+/g, ' '));
  });
});
