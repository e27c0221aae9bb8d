/**
 * An example worked as on paper, without the engine: saturation from the published tables beside the refrigerant tests, targets from the transcribed
 * charts, the rest by subtraction. Temperatures in °F, pressures in psi. The tables keep their provenance in their files.
 */
import { readFileSync } from 'node:fs';
import type { CheckedFigure, CheckExample, WorkedFigureId } from '@chargewright/engine/training';
import type { EvaluationRequest, ReadingId } from '@chargewright/engine';
import { evaluate } from 'mathjs';

/** Which published table of a refrigerant an example counts on, by side; E1 is computed, where no print was found. */
type Side = 'suction' | 'high';
const TABLES: Readonly<Record<string, Readonly<Record<Side, readonly string[]>>>> = {
  'R-410A': { suction: ['S1'], high: ['S1'] },
  'R-22': { suction: ['S5', 'S6'], high: ['S6'] },
  'R-32': { suction: ['S11'], high: ['S11'] },
  'R-454B': { suction: ['E1'], high: ['E1'] },
  'R-407C': { suction: ['E1'], high: ['E1'] },
};

interface Point {
  readonly refrigerant: string;
  readonly source: string;
  readonly temperatureF: number;
  readonly bubblePsig: number;
  readonly dewPsig: number;
}

const rowsOf = (path: string): readonly (readonly string[])[] =>
  readFileSync(new URL(path, import.meta.url), 'utf8')
    .split('\n')
    .filter((line) => line !== '' && !line.startsWith('#'))
    .map((line) => line.split(','));

const POINTS: readonly Point[] = rowsOf('../refrigerants/saturation-tables.csv')
  .slice(1)
  .map(([refrigerant = '', temperature, bubble, dew, source = '']) => ({
    refrigerant,
    source,
    temperatureF: Number(temperature),
    bubblePsig: Number(bubble),
    dewPsig: Number(dew),
  }));

const SEA_LEVEL_PSIA = 14.696;
const KPA_PER_PSI = 6.894757;

/** Saturation temperature by the printed table: a printed row as it stands; between two rows straight in the logarithm of the absolute pressure. */
export function temperatureByTable(refrigerant: string, side: Side, column: 'bubble' | 'dew', psig: number): number {
  const sources = TABLES[refrigerant]?.[side] ?? [];
  for (const source of sources) {
    const points = POINTS.filter((point) => point.refrigerant === refrigerant && point.source === source)
      .map(({ temperatureF, bubblePsig, dewPsig }) => ({
        temperatureF,
        at: column === 'bubble' ? bubblePsig : dewPsig,
      }))
      .sort((a, b) => a.at - b.at);
    const above = points.findIndex(({ at }) => at >= psig);
    if (above < 0) continue;
    const [high, low] = [points[above]!, points[above - 1]];
    if (high.at === psig) return high.temperatureF;
    if (low === undefined || high.temperatureF - low.temperatureF > 10) continue;
    const log = (gauge: number) => Math.log(gauge + SEA_LEVEL_PSIA);
    const fraction = (log(psig) - log(low.at)) / (log(high.at) - log(low.at));
    return low.temperatureF + fraction * (high.temperatureF - low.temperatureF);
  }
  throw new Error(`${refrigerant} at ${psig} psig stands in none of ${sources.join()}`);
}

/** A printed cell of a chart at one of its own rows and columns: a number, or `null` for a dash. Between them the chart is not asked. */
function cell(path: string, copy: string | undefined, row: number, column: number): number | null {
  const [header = [], ...rows] = rowsOf(path);
  const skip = copy === undefined ? 0 : 1;
  const at = header.indexOf(`wb${column}`);
  const text = rows.find((cells) => (copy === undefined || cells[0] === copy) && Number(cells[skip]) === row)?.[at];
  if (at < 0 || text === undefined) throw new Error(`${path} prints nothing at ${row}/${column}`);
  return text === '-' ? null : Number(text);
}

export const superheatChart = (outdoorF: number, wetBulbF: number, copy: 'A' | 'B' = 'A'): number | null =>
  cell('../charts/target-superheat-maker-chart.csv', copy, outdoorF, wetBulbF);
export const finerSuperheatTable = (outdoorF: number, wetBulbF: number): number | null =>
  cell('../charts/target-superheat.csv', undefined, outdoorF, wetBulbF);
export const splitTable = (returnF: number, wetBulbF: number): number | null =>
  cell('../charts/target-temperature-split.csv', undefined, returnF, wetBulbF);

/** ICAO standard atmosphere: 14.696 psia (1 − 6.8754e-6 ft⁻¹ H)^5.2559 (ASHRAE Handbook - Fundamentals (2017), ch. 1, eq. 3). */
export const standardAtmospherePsia = (feet: number): number => SEA_LEVEL_PSIA * (1 - 6.8754e-6 * feet) ** 5.2559;

/** A reading in °F, or in psig at sea level: what a printed table is entered with. */
export function readingOf({ setup, readings }: EvaluationRequest, id: ReadingId): number {
  const reading = readings[id];
  if (reading === undefined) throw new Error(`${id} was not read`);
  const { value, unit } = reading;
  const feet = setup.elevation?.unit === 'ft' ? setup.elevation.value : 0;
  if (unit === 'degF') return value;
  if (unit === 'degC') return 1.8 * value + 32;
  // absolute here, and back to a gauge at sea level
  if (unit === 'psig') return feet === 0 ? value : value + standardAtmospherePsia(feet) - SEA_LEVEL_PSIA;
  if (unit === 'kPag') return value / KPA_PER_PSI;
  throw new Error(`${id} in ${unit} is not worked on paper`);
}

export const requestOf = (example: CheckExample, of: string | undefined): EvaluationRequest =>
  example.slips.find(({ id }) => id === of)?.request ?? example.request;

const targetF = (amount: { value: number; unit: string } | undefined): number => {
  if (amount === undefined) throw new Error('no target was entered');
  return amount.unit === 'deltaC' ? 1.8 * amount.value : amount.value;
};

/** What paper works a figure out from. */
interface Sheet {
  readonly request: EvaluationRequest;
  read(id: ReadingId): number;
  figure(what: WorkedFigureId): number;
}

const saturation =
  (side: Side, column: 'bubble' | 'dew') =>
  ({ request, read }: Sheet): number =>
    temperatureByTable(
      request.setup.refrigerant,
      side,
      column,
      read(side === 'suction' ? 'suctionPressure' : 'liquidPressure'),
    );

function notADash(target: number | null): number {
  if (target === null) throw new Error('a dash');
  return target;
}

const WORKINGS: Readonly<Partial<Record<WorkedFigureId, (sheet: Sheet) => number>>> = {
  evaporatingDewTemperature: saturation('suction', 'dew'),
  evaporatingBubbleTemperature: saturation('suction', 'bubble'),
  condensingBubbleTemperature: saturation('high', 'bubble'),
  condensingDewTemperature: saturation('high', 'dew'),
  superheat: ({ read, figure }) => read('suctionLineTemperature') - figure('evaporatingDewTemperature'),
  superheatFromBubble: ({ read, figure }) => read('suctionLineTemperature') - figure('evaporatingBubbleTemperature'),
  subcooling: ({ read, figure }) => figure('condensingBubbleTemperature') - read('liquidLineTemperature'),
  subcoolingFromDew: ({ read, figure }) => figure('condensingDewTemperature') - read('liquidLineTemperature'),
  condensingOverAmbient: ({ read, figure }) => figure('condensingBubbleTemperature') - read('outdoorDryBulb'),
  temperatureSplit: ({ read }) => read('returnDryBulb') - read('supplyDryBulb'),
  targetSuperheat: ({ request: { setup }, read }) =>
    setup.targetSuperheat === undefined
      ? notADash(superheatChart(read('outdoorDryBulb'), read('returnWetBulb')))
      : targetF(setup.targetSuperheat),
  targetTemperatureSplit: ({ read }) => notADash(splitTable(read('returnDryBulb'), read('returnWetBulb'))),
  superheatDeviation: ({ figure }) => figure('superheat') - figure('targetSuperheat'),
  subcoolingDeviation: ({ request, figure }) => figure('subcooling') - targetF(request.setup.targetSubcooling),
  splitDeviation: ({ figure }) => figure('temperatureSplit') - figure('targetTemperatureSplit'),
  shortFormula: ({ read }) =>
    evaluate('(3 * wb - 80 - db) / 2', { wb: read('returnWetBulb'), db: read('outdoorDryBulb') }) as number,
  atmosphere: ({ request }) => standardAtmospherePsia(request.setup.elevation?.value ?? 0),
  standingBubblePressure: ({ request, read }) => {
    const temperatureF = read('standingOutdoorCoilTemperature');
    const { refrigerant } = request.setup;
    const point = POINTS.find(
      (each) => each.refrigerant === refrigerant && each.source === 'S1' && each.temperatureF === temperatureF,
    );
    if (point === undefined) throw new Error(`${temperatureF} °F is not printed`);
    return point.bubblePsig;
  },
  standingExcess: ({ request, read }) =>
    temperatureByTable(request.setup.refrigerant, 'high', 'bubble', read('standingPressure')) -
    read('standingOutdoorCoilTemperature'),
};

/** The figure by paper, in °F or psi. */
export function onPaper(example: CheckExample, { what, of }: Pick<CheckedFigure, 'what' | 'of'>): number {
  const request = requestOf(example, of);
  const working = WORKINGS[what];
  if (working === undefined) throw new Error(`${what} is not of a check`);
  return working({
    request,
    read: (id) => readingOf(request, id),
    figure: (other) => onPaper(example, { what: other, ...(of && { of }) }),
  });
}
