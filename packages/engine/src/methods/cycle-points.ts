/**
 * Superheat, subcooling and the saturation temperatures they rest on. Superheat counts from the dew point, subcooling from the bubble point of the
 * charged composition (for a blend they differ by the glide); CEC Reference Residential Appendices, RA3.2 (2008), defines both at the service valves.
 */
import type { ErrorPart } from '../derivation/quantity';
import type { Formula } from '../derivation/formula';
import { formula } from '../derivation/formula';
import { EngineError } from '../errors';
import { bubbleTemperatureK, dewTemperatureK } from '../refrigerants/saturation';
import type { RefrigerantId } from '../refrigerants/catalogue';
import { saturationModelLimitK } from '../refrigerants/model-limit';

/** Part of the glide left at the evaporator's inlet, where some vapour has flashed already; common practice, no source. */
const INLET_GLIDE_FRACTION = 0.2;

/** The model's own error, added to a saturation temperature of this refrigerant. */
export function saturationModelError(refrigerant: RefrigerantId, point: 'bubble' | 'dew'): ErrorPart {
  const u = saturationModelLimitK(refrigerant) / Math.sqrt(3);
  return { key: `model:${point}`, u, shape: 'rectangular' };
}

/** Absolute pressure of a gauge reading; `reading` keeps the steps of several gauges apart. */
export const absolutePressure = (reading: string): Formula<'gaugePa' | 'atmospherePa'> =>
  formula({
    id: `${reading}Absolute`,
    gives: 'pressurePa',
    text: 'p_gauge + p_atmosphere',
    symbols: { gaugePa: 'p_gauge', atmospherePa: 'p_atmosphere' },
    source: 'Definition of gauge pressure; the sensor was zeroed to the local atmosphere',
    of: ({ gaugePa, atmospherePa }) => gaugePa + atmospherePa,
  });

export type SaturationFormula = Formula<'pressurePa'>;

const saturationSource = (refrigerant: RefrigerantId): string =>
  `Curve through the published equation of state of ${refrigerant}, see sources`;

/** Evaporating temperature: dew point at the suction pressure. */
export const evaporatingDewTemperature = (refrigerant: RefrigerantId): SaturationFormula =>
  formula({
    id: 'evaporatingDewTemperature',
    gives: 'temperatureK',
    text: 'T_dew(p_suction)',
    symbols: { pressurePa: 'p_suction' },
    source: saturationSource(refrigerant),
    of: ({ pressurePa }) => dewTemperatureK({ refrigerant, pressurePa: abovePerfectVacuum(pressurePa) }),
  });

/** Condensing temperature: bubble point at the pressure of the high-side port. */
export const condensingBubbleTemperature = (refrigerant: RefrigerantId): SaturationFormula =>
  formula({
    id: 'condensingBubbleTemperature',
    gives: 'temperatureK',
    text: 'T_bubble(p_high)',
    symbols: { pressurePa: 'p_high' },
    source: saturationSource(refrigerant),
    of: ({ pressurePa }) => bubbleTemperatureK({ refrigerant, pressurePa: abovePerfectVacuum(pressurePa) }),
  });

/** Mean temperature of the evaporating refrigerant: what the coil's surface, and so its ice, follows. */
export const meanEvaporatingTemperature = (refrigerant: RefrigerantId): SaturationFormula =>
  formula({
    id: 'meanEvaporatingTemperature',
    gives: 'temperatureK',
    text: 'T_mean(p_suction)',
    symbols: { pressurePa: 'p_suction' },
    source: 'Half way between the inlet (bubble + 0.2 glide) and the dew point; common practice, no source',
    of: ({ pressurePa }) => {
      const dewK = dewTemperatureK({ refrigerant, pressurePa: abovePerfectVacuum(pressurePa) });
      const bubbleK = bubbleTemperatureK({ refrigerant, pressurePa });
      return 0.5 * (bubbleK + INLET_GLIDE_FRACTION * (dewK - bubbleK) + dewK);
    },
  });

/** A secant over a wide ± may ask for less than vacuum: that is a refusal of that side, not of the reading. */
function abovePerfectVacuum(pressurePa: number): number {
  if (pressurePa > 0) return pressurePa;
  throw new EngineError('out-of-range', { quantity: 'pressurePa', value: pressurePa, min: 0, reason: 'outside-curve' });
}

export const superheat = formula({
  id: 'superheat',
  gives: 'differenceK',
  text: 'T_suction − T_dew',
  symbols: { suctionLineK: 'T_suction', dewPointK: 'T_dew' },
  source: 'CEC Reference Residential Appendices, RA3.2 (2008)',
  of: ({ suctionLineK, dewPointK }) => suctionLineK - dewPointK,
});

export const subcooling = formula({
  id: 'subcooling',
  gives: 'differenceK',
  text: 'T_bubble − T_liquid',
  symbols: { bubblePointK: 'T_bubble', liquidLineK: 'T_liquid' },
  source: 'CEC Reference Residential Appendices, RA3.2 (2008)',
  of: ({ bubblePointK, liquidLineK }) => bubblePointK - liquidLineK,
});

/** What a gauge shows of an absolute pressure at this site. */
export const siteGaugePressure = (name: string): Formula<'pressurePa' | 'atmospherePa'> =>
  formula({
    id: `${name}Gauge`,
    gives: 'gaugePressurePa',
    text: 'p_absolute − p_atmosphere',
    symbols: { pressurePa: 'p_absolute', atmospherePa: 'p_atmosphere' },
    source: 'Definition of gauge pressure',
    of: ({ pressurePa, atmospherePa }) => pressurePa - atmospherePa,
  });

export const condensingOverAmbient = formula({
  id: 'condensingOverAmbient',
  gives: 'differenceK',
  text: 'T_bubble − T_outdoor',
  symbols: { bubblePointK: 'T_bubble', outdoorK: 'T_outdoor' },
  source: 'Definition; common practice, no source',
  of: ({ bubblePointK, outdoorK }) => bubblePointK - outdoorK,
});
