/** Which measurement would best separate a cause from the others that are listed. Common practice. */
import type { Cause, Measurement } from './diagnosis-codes';

interface Separation {
  readonly measurement: Measurement;
  /** Only while one of these is listed as well. */
  readonly from?: readonly Cause[];
}

const separate = (measurement: Measurement, ...from: readonly Cause[]): Separation =>
  from.length === 0 ? { measurement } : { measurement, from };

/** In the order in which they are worth the trouble; what has been measured, or cannot be, is passed over. */
const SEPARATIONS: Readonly<Record<Cause, readonly Separation[]>> = {
  'low-charge': [separate('liquid-pair'), separate('drier-drop', 'restriction'), separate('leak-search')],
  overcharge: [
    separate('liquid-pair'),
    separate('air-test', 'air-in-system'),
    separate('supply-and-wet-bulb', 'low-airflow'),
    separate('condenser-look', 'condenser-air'),
    separate('compressor-current', 'compressor'),
  ],
  restriction: [
    separate('liquid-pair'),
    separate('drier-drop'),
    separate('bulb-and-hunting', 'valve-closed'),
    separate('orifice-look'),
  ],
  'air-in-system': [separate('air-test')],
  'low-airflow': [separate('supply-and-wet-bulb'), separate('airflow')],
  'condenser-air': [separate('condenser-look'), separate('air-test', 'air-in-system')],
  compressor: [separate('compressor-current'), separate('liquid-pair')],
  'valve-closed': [separate('bulb-and-hunting'), separate('drier-drop', 'restriction')],
  'valve-open': [separate('bulb-and-hunting')],
};

export const nextMeasurement = (
  cause: Cause,
  listed: readonly Cause[],
  open: ReadonlySet<Measurement>,
): Measurement | null =>
  SEPARATIONS[cause].find(
    ({ measurement, from }) => open.has(measurement) && (from?.some((other) => listed.includes(other)) ?? true),
  )?.measurement ?? null;
