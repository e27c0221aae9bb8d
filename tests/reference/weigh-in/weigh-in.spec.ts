/** What a weigh-in takes from print, and what it computes where nothing is printed. */
import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import {
  densityRows,
  generateLiquidDensity,
  GENERATED_LIQUID_DENSITY,
} from '../../../packages/engine/generators/generate-liquid-density';
import { isKnown } from '../../../packages/engine/src/derivation/quantity';
import { R410A_LINE_RATES } from '../../../packages/engine/src/methods/weigh-in/data/line-rates';
import type { LineSetKind, LiquidLineSize } from '../../../packages/engine/src/methods/weigh-in/data/line-rates';
import { LIQUID_DENSITY_AT_100F } from '../../../packages/engine/src/methods/weigh-in/generated/liquid-density';
import { lineRateOf } from '../../../packages/engine/src/methods/weigh-in/line-rate';
import { REFRIGERANT_IDS, refrigerantFacts } from '../../../packages/engine/src/refrigerants/catalogue';
import type { RefrigerantId } from '../../../packages/engine/src/refrigerants/catalogue';
import { temperatureToK } from '../../../packages/engine/src/units';
import { lineRateFromKgPerM, lineRateToKgPerM } from '../../../packages/engine/src/units/line-rate';

const printedRates = readFileSync(new URL('printed-line-rates.csv', import.meta.url), 'utf8')
  .split('\n')
  .filter((line) => line !== '' && !line.startsWith('#'))
  .slice(1)
  .map((line) => line.split(','))
  .map(([system, size, low, high]) => ({
    system: system as LineSetKind,
    size: size as LiquidLineSize,
    low: Number(low),
    high: Number(high),
  }));

describe('the printed rates of R-410A', () => {
  it.each(printedRates)(
    '$system, $size in.: within $low to $high oz/ft, and the ± reaches both',
    ({ system, size, low, high }) => {
      const { value, limit } = R410A_LINE_RATES[system][size]!;
      const [middle, reach] = [value, limit].map((kgPerM) => lineRateFromKgPerM(kgPerM, 'oz/ft'));
      expect(middle).toBeCloseTo((low + high) / 2, 9);
      expect(reach).toBeGreaterThanOrEqual((high - low) / 2 - 1e-9);
    },
  );

  it('are all of the data', () => {
    const sizes = Object.values(R410A_LINE_RATES).flatMap((rates) => Object.keys(rates));
    expect(sizes).toHaveLength(printedRates.length);
  });

  // bores: copper tube for refrigeration, ASTM B280, walls 0.030 in. (1/4) and 0.032 in., from memory
  it.each([
    ['1/4', 0.25 - 0.06],
    ['5/16', 0.3125 - 0.064],
    ['3/8', 0.375 - 0.064],
    ['1/2', 0.5 - 0.064],
  ] as const)('of %s in. hold 15 to 50 %% more than the liquid in the bore', (size, boreIn) => {
    const liquid = (Math.PI / 4) * (boreIn * 0.0254) ** 2 * LIQUID_DENSITY_AT_100F['R-410A']!;
    const ratio = R410A_LINE_RATES.ducted[size]!.value / liquid;
    expect(ratio).toBeGreaterThan(1.15);
    expect(ratio).toBeLessThan(1.5);
  });
});

describe('the liquid densities at 100 °F', () => {
  const rows = densityRows();

  it('are what the script makes of the committed table, byte for byte', () => {
    expect(readFileSync(GENERATED_LIQUID_DENSITY, 'utf8') === generateLiquidDensity()).toBe(true);
  });

  it.each(REFRIGERANT_IDS)(
    'of %s lies a little above the straight line between its neighbours, or does not exist',
    (id) => {
      const at = temperatureToK(100, 'degF');
      const density = LIQUID_DENSITY_AT_100F[id];
      if (density === null) {
        expect(refrigerantFacts(id).criticalTemperatureK).toBeLessThan(at);
        return;
      }
      const own = rows.get(id)!;
      const low = own.filter(([temperature]) => temperature <= at).at(-1)!;
      const high = own.find(([temperature]) => temperature > at)!;
      const straight = low[1] + ((at - low[0]) / (high[0] - low[0])) * (high[1] - low[1]);
      // liquid density curves down towards the critical point
      expect(density / straight - 1).toBeGreaterThan(-1e-6);
      expect(density / straight - 1).toBeLessThan(2e-4);
    },
  );

  // saturated liquid of R-22 and R-134a at 100 °F, from memory of ASHRAE Fundamentals' tables of refrigerant properties; R-410A of trade literature
  it.each<[RefrigerantId, number]>([
    ['R-22', 71.05],
    ['R-134a', 72.17],
    ['R-410A', 61.7],
  ])('agree with %s of printed tables, about %d lb/ft³', (id, poundsPerCubicFoot) => {
    expect(LIQUID_DENSITY_AT_100F[id]! / 16.018463 / poundsPerCubicFoot).toBeCloseTo(1, 2);
  });

  it('keep the order by density from one line size to the next: R-22 over R-410A over R-454B over R-32 over R-290', () => {
    const rate = (refrigerant: RefrigerantId): number => {
      const { rate } = lineRateOf({ id: 'lineRate', refrigerant, kind: 'ducted', size: '3/8' })!;
      if (!isKnown(rate)) throw new Error(`no rate for ${refrigerant}`);
      return rate.value;
    };
    const rates = (['R-22', 'R-410A', 'R-454B', 'R-32', 'R-290'] as const).map(rate);
    expect(rates[1]).toBeCloseTo(lineRateToKgPerM(0.6, 'oz/ft'), 12);
    expect([...rates].sort((a, b) => b - a)).toEqual(rates);
  });
});
