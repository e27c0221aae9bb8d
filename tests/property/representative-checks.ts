/** Checks that between them show every way an uncertainty comes about: charts, curves, elevation, humidity, shared instruments, edges. */
import type { EvaluationRequest, ReadingsInput, RefrigerantId, SetupInput } from '@chargewright/engine';
import {
  bubblePressurePa,
  dewPressurePa,
  pressureFromPa,
  standardAtmospherePressurePa,
  temperatureToK,
} from '@chargewright/engine';

export interface RepresentativeCheck {
  readonly name: string;
  readonly request: EvaluationRequest;
  /** `kink`: a reading stands on a node of a chart where its slope changes; `dash`: part of its ± has no target. */
  readonly at: 'smooth' | 'kink' | 'dash';
}

const degF = (value: number) => ({ value, unit: 'degF' }) as const;
const deltaF = (value: number) => ({ value, unit: 'deltaF' }) as const;
const feet = (value: number) => ({ value, unit: 'ft' }) as const;

const METRES_PER_FOOT = 0.3048;

interface Cycle {
  readonly refrigerant: RefrigerantId;
  readonly evaporatingF: number;
  readonly superheatF: number;
  readonly condensingF: number;
  readonly subcoolingF: number;
  readonly elevationFt?: number;
}

/** What gauges and clamps show on a system in this state. */
function cycleReadings(cycle: Cycle): ReadingsInput {
  const { refrigerant, evaporatingF, superheatF, condensingF, subcoolingF, elevationFt = 0 } = cycle;
  const atmospherePa = standardAtmospherePressurePa(elevationFt * METRES_PER_FOOT);
  const psig = (pa: number) => ({ value: pressureFromPa(pa, 'psig', atmospherePa), unit: 'psig' }) as const;
  return {
    suctionPressure: psig(dewPressurePa({ refrigerant, temperatureK: temperatureToK(evaporatingF, 'degF') })),
    suctionLineTemperature: degF(evaporatingF + superheatF),
    liquidPressure: psig(bubblePressurePa({ refrigerant, temperatureK: temperatureToK(condensingF, 'degF') })),
    liquidLineTemperature: degF(condensingF - subcoolingF),
  };
}

/** Off the nodes of both charts; away from their dashes. */
const AIR: ReadingsInput = {
  returnDryBulb: degF(77.5),
  returnWetBulb: degF(65),
  supplyDryBulb: degF(58.9),
  outdoorDryBulb: degF(87.5),
};

const USUAL = { evaporatingF: 41, superheatF: 15.5, condensingF: 106, subcoolingF: 9.2 } as const;

type Rest = Partial<Omit<SetupInput, 'refrigerant' | 'meteringDevice'>>;

function check(
  meteringDevice: SetupInput['meteringDevice'],
  cycle: Cycle,
  readings: ReadingsInput = {},
  setup: Rest = {},
): EvaluationRequest {
  const { refrigerant, elevationFt } = cycle;
  return {
    setup: {
      refrigerant,
      meteringDevice,
      targetSubcooling: deltaF(10),
      ...(elevationFt !== undefined && { elevation: feet(elevationFt) }),
      ...setup,
    },
    visit: { runningMinutes: 22 },
    readings: { ...AIR, ...cycleReadings(cycle), ...readings },
  };
}

function withHumidity(request: EvaluationRequest, percent: number): EvaluationRequest {
  const { returnWetBulb: _, ...readings } = request.readings;
  return { ...request, readings: { ...readings, returnRelativeHumidity: { value: percent, unit: '%' } } };
}

const poorTemperature = { plusMinus: { value: 2, unit: 'deltaF' } } as const;
const poorPressure = { plusMinus: { value: 7, unit: 'psi' } } as const;

export const REPRESENTATIVE_CHECKS: readonly RepresentativeCheck[] = [
  { name: 'R-22, orifice', at: 'smooth', request: check('fixed-orifice', { ...USUAL, refrigerant: 'R-22' }) },
  {
    name: 'R-410A, orifice, 5280 ft',
    at: 'smooth',
    request: check('fixed-orifice', { ...USUAL, refrigerant: 'R-410A', elevationFt: 5280 }),
  },
  {
    name: 'R-454B, TXV, analogue instruments',
    at: 'smooth',
    request: check('txv', { ...USUAL, refrigerant: 'R-454B' }, poorReadings({ ...USUAL, refrigerant: 'R-454B' })),
  },
  {
    name: 'R-407C, EEV, 8000 ft',
    at: 'smooth',
    request: check('eev', { ...USUAL, refrigerant: 'R-407C', elevationFt: 8000 }),
  },
  {
    name: 'R-410A, orifice, wet bulb from relative humidity',
    at: 'smooth',
    request: withHumidity(check('fixed-orifice', { ...USUAL, refrigerant: 'R-410A', elevationFt: 5280 }), 50.5),
  },
  {
    name: 'R-32, TXV, one probe for both air temperatures, ± with k = 2',
    at: 'smooth',
    request: check('txv', { ...USUAL, refrigerant: 'R-32' }, sharedProbe()),
  },
  {
    name: 'R-410A, orifice, on a node of the superheat chart',
    at: 'kink',
    request: check(
      'fixed-orifice',
      { ...USUAL, refrigerant: 'R-410A' },
      { outdoorDryBulb: degF(95), returnWetBulb: degF(66) },
    ),
  },
  {
    name: 'R-22, orifice, where the chart bends most',
    at: 'kink',
    request: check(
      'fixed-orifice',
      { ...USUAL, refrigerant: 'R-22' },
      { outdoorDryBulb: degF(100), returnWetBulb: degF(72) },
    ),
  },
  {
    name: 'R-410A, orifice, near a dash',
    at: 'dash',
    request: check(
      'fixed-orifice',
      { ...USUAL, superheatF: 9, refrigerant: 'R-410A' },
      { outdoorDryBulb: degF(94.2), returnWetBulb: degF(64.6) },
    ),
  },
];

function poorReadings(cycle: Cycle): ReadingsInput {
  const { suctionPressure, suctionLineTemperature, liquidPressure, liquidLineTemperature } = cycleReadings(cycle);
  return {
    suctionPressure: { ...suctionPressure!, ...poorPressure },
    suctionLineTemperature: { ...suctionLineTemperature!, ...poorTemperature },
    liquidPressure: { ...liquidPressure!, ...poorPressure },
    liquidLineTemperature: { ...liquidLineTemperature!, ...poorTemperature },
  };
}

function sharedProbe(): ReadingsInput {
  const shared = { instrumentId: 'probe', plusMinus: { value: 1, unit: 'deltaF', kind: 'k2' } } as const;
  return {
    returnDryBulb: { ...degF(77.5), ...shared },
    supplyDryBulb: { ...degF(58.9), ...shared },
  };
}
