/** Heat given to the air: by resistance elements, or by a gas furnace whose meter is clocked. */
import { formula } from '../../derivation/formula';
import { EngineError } from '../../errors';
import { assertPositive } from './assert-positive';

/**
 * Electric power in W of single-phase resistance elements, volts × amps as measured while they run: power factor 1. Where the amps were measured on the
 * wire that feeds the blower too, its heat is inside and is not added again.
 */
export const electricHeat = formula({
  id: 'electricHeat',
  gives: 'electricPowerW',
  text: 'U × I',
  symbols: { voltageV: 'U', currentA: 'I' },
  source: 'Electric power at power factor 1 (resistance heat, single phase); 1 W = 3.412 Btu/h',
  of: ({ voltageV, currentA }) => {
    assertPositive(voltageV, 'voltageV');
    assertPositive(currentA, 'currentA');
    return voltageV * currentA;
  },
});

/**
 * Heat input in W of a clocked gas meter: volume of one revolution of the dial over the seconds it takes, times the heating value of the gas *as the
 * meter counts it* (the supplier's figure for the delivery pressure and the elevation). All other gas appliances are off.
 */
export const gasInput = formula({
  id: 'gasInput',
  gives: 'heatRateW',
  text: 'V_dial / t × H_gas',
  symbols: { dialVolumeM3: 'V_dial', revolutionS: 't', heatingValueJPerM3: 'H_gas' },
  source: 'Clocking the gas meter: 3600 / seconds × dial size × heating value; common practice, no source',
  of: ({ dialVolumeM3, revolutionS, heatingValueJPerM3 }) => {
    assertPositive(dialVolumeM3, 'dialVolumeM3');
    assertPositive(revolutionS, 'revolutionS');
    assertPositive(heatingValueJPerM3, 'heatingValueJPerM3');
    return (dialVolumeM3 / revolutionS) * heatingValueJPerM3;
  },
});

/** Heat in W that reaches the air from a gas input, by the efficiency as a fraction; outside 0 to 1: `EngineError` `out-of-range`, reason `outside-0-to-1`. */
export const gasHeat = formula({
  id: 'gasHeat',
  gives: 'heatRateW',
  text: 'Q_gas × eta',
  symbols: { gasInputW: 'Q_gas', efficiencyFraction: 'eta' },
  source: 'Efficiency as the nameplate states it: steady state (output over input), or AFUE in its place',
  of: ({ gasInputW, efficiencyFraction }) => {
    if (!(efficiencyFraction > 0 && efficiencyFraction <= 1)) {
      throw new EngineError('out-of-range', {
        quantity: 'efficiencyFraction',
        value: efficiencyFraction,
        min: 0,
        max: 1,
        reason: 'outside-0-to-1',
      });
    }
    return gasInputW * efficiencyFraction;
  },
});

/** Heat of the elements or the furnace and of the blower's motor in the air stream, W. */
export const totalHeat = formula({
  id: 'totalHeat',
  gives: 'heatRateW',
  text: 'Q_heater + Q_blower',
  symbols: { heaterW: 'Q_heater', blowerW: 'Q_blower' },
  source: 'Heat balance; all power of a blower inside the air stream becomes heat in it',
  of: ({ heaterW, blowerW }) => heaterW + blowerW,
});
