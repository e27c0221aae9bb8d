import { read } from './figures';
import { HANDBOOK_EXAMPLE } from './sources';
import type { MoistAirExample } from './worked-example';

/** The Handbook's own example; its answers were read off a chart, and `within` is what the quoting tests allow for that (humidity ratio: of the SI twin). */
export const HANDBOOK_MOIST_AIR: MoistAirExample = {
  id: 'handbook-moist-air',
  kind: 'moist-air',
  given: { dryBulbF: 100, wetBulbF: 65, pressurePsia: 14.696 },
  figures: [
    read(HANDBOOK_EXAMPLE, { what: 'humidityRatio', value: 0.00523, unit: '1', within: 0.0001 }),
    read(HANDBOOK_EXAMPLE, { what: 'relativeHumidity', value: 13, unit: '%', within: 1 }),
    read(HANDBOOK_EXAMPLE, { what: 'dewPoint', value: 40, unit: 'degF', within: 1 }),
    read(HANDBOOK_EXAMPLE, { what: 'enthalpy', value: 29.8, unit: 'Btu/lb', within: 0.1 }),
    read(HANDBOOK_EXAMPLE, { what: 'specificVolume', value: 14.22, unit: 'ft3/lb', within: 0.1422 }),
  ],
};
