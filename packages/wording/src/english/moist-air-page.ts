/** The page of moist air: two readings in, every property and the psychrometric chart out. */
import type { MoistAirReading } from '@chargewright/engine';

const readings: Readonly<Record<MoistAirReading, string>> = {
  dryBulbK: 'Dry bulb',
  wetBulbK: 'Wet bulb',
  dewPointK: 'Dew point',
  relativeHumidityRatio: 'Relative humidity',
  humidityRatio: 'Humidity ratio',
  enthalpyJPerKg: 'Enthalpy',
};

export const moistAirWords = {
  title: 'Two readings of the air',
  note: 'Choose which two you have. They settle all the others.',
  choose: { first: 'First reading', second: 'Second reading' },
  readings,
  result: 'Moist air',
  typeFirst: 'Type both values.',
  noAnswer: 'These two give no answer yet.',
  vaporPressure: 'Vapor pressure',
  specificVolume: 'Specific volume',
  airPressure: 'Air pressure',
  icedBulb: 'iced bulb',
  tooDry: 'none: too dry',
  perDryAir: 'Humidity ratio, enthalpy and volume are per mass of dry air.',
  zero: {
    inchPound: 'Enthalpy counts from dry air at 0 °F.',
    metric: 'Enthalpy counts from dry air at 0 °C.',
  },
  print: 'Print',
  chart: {
    title: 'Psychrometric chart',
    at: (pressure: string) => `At ${pressure}. Lines: relative humidity, and dashed, wet bulb.`,
    dryBulb: (unit: string) => `Dry bulb, ${unit}`,
    humidityRatio: (unit: string) => `Humidity ratio, ${unit}`,
    label: (pressure: string) => `Psychrometric chart at an air pressure of ${pressure}.`,
    axes: (low: string, high: string) => `Dry bulb runs from ${low} to ${high} across.`,
    upwards: (most: string) => `Humidity ratio runs from 0 to ${most} upwards.`,
    state: (dryBulb: string, humidityRatio: string) =>
      `The air is marked at dry bulb ${dryBulb} and humidity ratio ${humidityRatio}.`,
    outside: 'This air lies beyond what a chart shows.',
    table: 'The chart as a table',
    tableOf: (quantity: string, unit: string) => `${quantity}, ${unit}, by dry bulb and relative humidity`,
  },
};
