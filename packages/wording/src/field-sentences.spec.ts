import type {
  AirflowRequest,
  AirflowReason,
  DerivationStep,
  FieldFault,
  WeighInCaution,
  WeighInReason,
  WeighInRequest,
} from '@chargewright/engine';
import {
  crossCheckAirflow,
  crossCheckWeighIn,
  evaluateAirflow,
  evaluateCapacity,
  evaluateWeighIn,
  readAirflowRequest,
  readCapacityRequest,
  readWeighInRequest,
} from '@chargewright/engine';
import { describe, expect, it } from 'vitest';
import { airflowWords } from './english/airflow';
import { fieldFaultTexts } from './english/field-faults';
import { weighInWords } from './english/weigh-in';
import {
  airflowCautionText,
  airflowReasonText,
  capacityCautionText,
  capacityReasonText,
  fieldDerivationLines,
  fieldFaultText,
  fieldStructureFaultText,
  weighInCautionText,
  weighInReasonText,
  weighInSays,
} from './field-sentences';
import { UNIT_SYSTEMS } from './unit-system';

const SENTENCE = /^[A-Z“].{10,}[.?]$/;

describe('a code', () => {
  it('of every kind has its sentence', () => {
    const { reasons, cautions, capacityReasons, capacityCautions } = airflowWords;
    const texts = [
      ...Object.keys(reasons).map((code) => airflowReasonText({ code } as AirflowReason)),
      ...Object.keys(cautions).map((code) => airflowCautionText(code as keyof typeof cautions)),
      ...Object.keys(capacityReasons).map((code) => capacityReasonText({ code: code as 'outside-range' })),
      ...Object.keys(capacityCautions).map((code) => capacityCautionText(code as keyof typeof capacityCautions)),
      ...Object.keys(weighInWords.reasons).map((code) => weighInReasonText({ code } as WeighInReason)),
      ...Object.keys(weighInWords.cautions).map((code) => weighInCautionText(code as WeighInCaution)),
    ];
    expect(texts.length).toBeGreaterThan(30);
    for (const text of texts) expect(text).toMatch(SENTENCE);
  });

  it('of what is missing names it as the page does', () => {
    const reason = { code: 'inputs-missing', inputs: ['returnDryBulb', 'heaterCurrent', 'nominalCapacity'] } as const;
    expect(airflowReasonText(reason)).toBe('Not entered yet: return dry bulb, heater current and nominal capacity.');
    expect(capacityReasonText(reason)).toBe(airflowReasonText(reason));
    expect(weighInReasonText({ code: 'inputs-missing', inputs: ['factoryCharge', 'liquidLineSize'] })).toBe(
      'Not entered yet: factory charge and size of the liquid line.',
    );
  });
});

describe('what cannot be', () => {
  it('is said with the name of its field', () => {
    const say = (fault: FieldFault): string => fieldFaultText(fault, 'F-psi');
    const [efficiency] = crossCheckAirflow({ furnaceEfficiency: { value: 800, unit: '%' } });
    expect(say(efficiency!)).toBe('Efficiency of the furnace lies above 0 and not above 100 %.');
    const [wet] = crossCheckAirflow({
      returnDryBulb: { value: 70, unit: 'degF' },
      returnWetBulb: { value: 75, unit: 'degF' },
    });
    expect(say(wet!)).toBe('Return wet bulb 75 °F is above return dry bulb 70 °F');
    const [length] = crossCheckWeighIn({ line: { installedLength: { value: -4, unit: 'ft' } } });
    expect(say(length!)).toBe('Installed length must not be less than zero.');
    const [step] = crossCheckWeighIn({ scale: { resolution: { value: 0, unit: 'oz' } } });
    expect(say(step!)).toBe('Scale, resolution must be more than zero.');
  });

  it('has a sentence for every code, in every unit system', () => {
    for (const system of UNIT_SYSTEMS) {
      for (const code of Object.keys(fieldFaultTexts)) {
        const fault = { code, figures: {}, path: 'fanTable' } as unknown as FieldFault;
        expect(fieldFaultText(fault, system)).toMatch(/^The maker’s fan table|^Fan table/);
      }
    }
  });

  it('in the shape of a request is said with the same names', () => {
    expect(fieldStructureFaultText({ kind: 'wrong-unit', field: 'dialVolume', allowed: ['ft3', 'm3'] })).toBe(
      'Size of the test dial has a unit that does not fit: give ft3 or m3.',
    );
  });
});

const ELECTRIC: AirflowRequest = {
  method: 'temperature-rise-electric',
  nominalCapacity: { value: 3, unit: 'ton' },
  returnDryBulb: { value: 70, unit: 'degF' },
  returnRelativeHumidity: { value: 40, unit: '%' },
  supplyDryBulb: { value: 95, unit: 'degF' },
  lineVoltage: { value: 240, unit: 'V' },
  heaterCurrent: { value: 41.7, unit: 'A' },
  blowerHeat: { value: 400, unit: 'W' },
};

function everyStep(): readonly DerivationStep[] {
  const airflows = [
    ELECTRIC,
    { ...ELECTRIC, statedAt: 'supply' } as const,
    {
      ...ELECTRIC,
      method: 'temperature-rise-gas',
      dialVolume: { value: 1, unit: 'ft3' },
      gasRevolution: { value: 36, unit: 's' },
      gasHeatingValue: { value: 1000, unit: 'Btu/ft3' },
      furnaceEfficiency: { value: 80, unit: '%' },
    } as const,
    {
      ...ELECTRIC,
      method: 'static-pressure',
      returnStaticPressure: { value: 0.2, unit: 'inH2O' },
      supplyStaticPressure: { value: 0.3, unit: 'inH2O' },
      fanTable: {
        staticPressureUnit: 'inH2O',
        airflowUnit: 'cfm',
        rows: [
          { staticPressure: 0.3, airflow: 1300 },
          { staticPressure: 0.7, airflow: 1000 },
        ],
      },
    } as const,
  ].flatMap((request) => {
    const read = readAirflowRequest(request);
    return read.ok ? evaluateAirflow(read.input).steps : [];
  });
  const capacities = (['neglected', 'counted'] as const).flatMap((condensate) =>
    (['standard', 'supply'] as const).flatMap((airflowIn) => {
      const read = readCapacityRequest({
        condensate,
        airflowIn,
        airflow: { value: 1200, unit: 'cfm' },
        nominalCapacity: { value: 3, unit: 'ton' },
        returnDryBulb: { value: 80, unit: 'degF' },
        returnWetBulb: { value: 67, unit: 'degF' },
        supplyDryBulb: { value: 58, unit: 'degF' },
        supplyRelativeHumidity: { value: 94, unit: '%' },
      });
      return read.ok ? evaluateCapacity(read.input).steps : [];
    }),
  );
  return [...airflows, ...capacities, ...weighIn({ corrections: { drier: { value: 6, unit: 'oz' } } }).steps];
}

const WEIGH_IN: WeighInRequest = {
  refrigerant: 'R-454B',
  kind: 'ducted',
  method: 'adjustment',
  factoryCharge: { value: 6, unit: 'lb' },
  labelMaximum: { value: 10, unit: 'lb' },
  line: {
    installedLength: { value: 45, unit: 'ft' },
    liquidLineSize: '1/2',
    includedLength: { value: 15, unit: 'ft' },
    includedLiquidLineSize: '3/8',
  },
  actualCharge: { value: 40, unit: 'oz' },
};

function weighIn(change: Partial<WeighInRequest>) {
  const read = readWeighInRequest({ ...WEIGH_IN, ...change });
  if (!read.ok) throw new Error(JSON.stringify(read.faults));
  return evaluateWeighIn(read.input);
}

describe('the math', () => {
  it('has a name for every step there is', () => {
    const lines = fieldDerivationLines(everyStep(), 'F-psi');
    expect(new Set(lines.map(({ id }) => id)).size).toBeGreaterThan(30);
    for (const { id, name } of lines) {
      expect(name, id).not.toBe(id);
      expect(name, id).toMatch(/^[A-Z]/);
    }
  });

  it('is written as on paper', () => {
    const read = readAirflowRequest(ELECTRIC);
    if (!read.ok) throw new Error('faulty');
    const lines = fieldDerivationLines(evaluateAirflow(read.input).steps, 'F-psi');
    expect(lines.find(({ id }) => id === 'electricHeat')).toMatchObject({
      name: 'Heat of the elements',
      substitution: '240.0 V × 41.7 A',
      result: '10008 W',
    });
    expect(lines.find(({ id }) => id === 'temperatureRise')).toMatchObject({
      substitution: '95.0 °F − 70.0 °F',
      result: '25.0 °F',
    });
  });

  it('says lengths and rates to the digit they were entered with', () => {
    const line = {
      installedLength: { value: 45.5, unit: 'ft' },
      makersRate: { value: 0.285, unit: 'oz/ft' },
      includedLength: { value: 15, unit: 'ft' },
    } as const;
    const lines = fieldDerivationLines(weighIn({ line }).steps, 'F-psi');
    expect(lines[0]).toMatchObject({ substitution: '(45.5 ft − 15 ft) × 0.285 oz/ft', result: '8.69 oz' });
  });
});

describe('a weigh-in', () => {
  const makersRate = { value: 0.6, unit: 'oz/ft' } as const;
  const base: Partial<WeighInRequest> = {
    refrigerant: 'R-410A',
    line: {
      installedLength: { value: 45, unit: 'ft' },
      liquidLineSize: '3/8',
      makersRate,
      includedLength: { value: 15, unit: 'ft' },
    },
    scale: { resolution: { value: 0.5, unit: 'oz' }, plusMinus: { value: 0.5, unit: 'oz' } },
  };
  const says = (change: Partial<WeighInRequest>) => weighInSays(weighIn({ ...base, ...change }), 'F-psi');
  function before(change: Partial<WeighInRequest>) {
    const { actualCharge: _, ...request } = { ...WEIGH_IN, ...base, ...change };
    const read = readWeighInRequest(request);
    if (!read.ok) throw new Error(JSON.stringify(read.faults));
    return weighInSays(evaluateWeighIn(read.input), 'F-psi');
  }
  const oz = (value: number) => ({ actualCharge: { value, unit: 'oz' } }) as const;

  it('says what to put in before anything is', () => {
    expect(before({}).headline).toBe('Put in 1 lb 2 oz (18 oz)');
    expect(before({}).next).toContain('throttled into the suction side');
    expect(before({ method: 'total' }).headline).toBe('Weigh in 7 lb 2 oz (114 oz) altogether');
    const shorter = { ...base.line, installedLength: { value: 10, unit: 'ft' }, shorterLine: 'subtract' } as const;
    expect(before({ line: shorter }).headline).toBe('Recover 3 oz');
    expect(before({ line: shorter }).next).toMatch(/recovery cylinder .*never into the air/);
    expect(before({ line: { ...shorter, shorterLine: 'keep' } }).headline).toBe('Nothing to add for the line set');
  });

  it('says how it came out and what is left to do', () => {
    expect(says(oz(18)).headline).toBe('The charge weighed in is what this installation takes');
    expect(says(oz(22))).toEqual({
      headline: 'Too much, by 4 oz',
      next: expect.stringMatching(/^Recover 4 oz into a proper recovery cylinder .*never into the air/) as unknown,
    });
    expect(says(oz(10))).toEqual({
      headline: 'Too little, by 8 oz',
      next: expect.stringMatching(/^Add 8 oz, liquid throttled/) as unknown,
    });
    const coarse = { resolution: { value: 4, unit: 'oz' }, plusMinus: { value: 4, unit: 'oz' } } as const;
    expect(says({ ...oz(20), scale: coarse }).headline).toBe('Too close to call: 2 oz over');
    expect(says({ ...oz(16), scale: coarse }).headline).toBe('Too close to call: 2 oz under');
  });

  it('never asks for refrigerant where none may go in', () => {
    const vacuum = { deepest: { value: 900, unit: 'micron' } } as const;
    const closed = [
      before({ vacuum }),
      before({ refrigerant: 'R-32', labelMaximum: { value: 7, unit: 'lb' } }),
      before({ procedure: 'cec-ra3.2-2008-rater' }),
      says({ ...oz(18), procedure: 'cec-ra3.2-2019-installer' }),
      before({ line: {} }),
    ];
    expect(closed.map(({ headline }) => headline)).toEqual([
      'No refrigerant yet: the vacuum did not pass',
      'Stop: more than the label allows',
      'Cannot be verified',
      'Cannot be verified',
      'Not judged yet',
    ]);
    for (const { next } of closed) expect(next).not.toMatch(/^Add /);
  });
});
