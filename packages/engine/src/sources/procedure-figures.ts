/** Figures of the procedures, by their place in the data. What several procedures share is one entry. */
import type { Procedure, Rule } from '../check/procedure';
import type { ProcedureId } from '../check/procedure-ids';
import { PROCEDURES } from '../check/procedure-catalogue';
import type { QuantityKind } from '../derivation/quantity';
import type { WeighInRules } from '../field/weigh-in-rules';
import { WEIGH_IN_RULES } from '../field/weigh-in-rules';
import type { SourcedFigure } from '../methods/sourced-figure';
import { citation } from './citation';
import { SOURCE_STANDINGS } from './source-entry';
import type { OrderId, SourceEntry, SourceStanding, SourceSubject } from './source-entry';

/** What each is. A new figure of a procedure is refused until it has its line here. */
const KINDS = {
  'decision.clearFrom': 'fraction',
  'superheat.toleranceK': 'differenceK',
  'superheat.floorK': 'differenceK',
  'subcooling.toleranceK': 'differenceK',
  'subcooling.leastK': 'differenceK',
  'subcooling.lowBelowK': 'differenceK',
  'subcooling.clearFromK': 'differenceK',
  'subcooling.highAboveK': 'differenceK',
  'temperatureSplit.toleranceK': 'differenceK',
  'makersMethods.liquidLineApproachK': 'differenceK',
  'makersMethods.suctionLineTemperatureK': 'differenceK',
  'makersMethods.heatingDischargeTemperatureK': 'differenceK',
  'makersMethods.pressureAsSaturationK': 'differenceK',
  'superheatWindow.lowK': 'differenceK',
  'superheatWindow.highK': 'differenceK',
  'airflow.leastM3PerSPerW': 'flowPerCapacityM3PerSPerW',
  'airflow.leastOfAlterationM3PerSPerW': 'flowPerCapacityM3PerSPerW',
  'airflow.leastOfHighVelocityM3PerSPerW': 'flowPerCapacityM3PerSPerW',
  'airflow.leastDesignFraction': 'fraction',
  'conditions.leastOutdoorK': 'temperatureK',
  'conditions.mostOutdoorForSuperheatK': 'temperatureK',
  'conditions.coolBelowK': 'temperatureK',
  'conditions.leastReturnK': 'temperatureK',
  'conditions.leastRunningMinutes': 'minutes',
  'instruments.mostDays': 'days',
  // printed in minutes, which say it better than 600 s
  mostReadingAgeSeconds: null,
  mostProbabilityOfNoTarget: 'fraction',
} as const satisfies Readonly<Record<string, QuantityKind | null>>;
export type ProcedureFigureId = keyof typeof KINDS;

const isFigureId = (place: string): place is ProcedureFigureId => Object.hasOwn(KINDS, place);
const isRule = (value: object): value is Rule => 'printed' in value;

/** Every figure of a procedure, at any depth. */
function rulesIn(value: object, place = ''): readonly (readonly [ProcedureFigureId, Rule])[] {
  return Object.entries(value).flatMap(([key, inner]: [string, unknown]) => {
    if (typeof inner !== 'object' || inner === null) return [];
    const here = place === '' ? key : `${place}.${key}`;
    if (!isRule(inner)) return rulesIn(inner, here);
    if (!isFigureId(here)) throw new RangeError(`no kind is stated for ${here}`);
    return [[here, inner]];
  });
}

type Found = Omit<SourceEntry, 'id' | 'procedures'>;

const figure = (id: ProcedureFigureId, { value, printed, standing, source }: Rule): Found => ({
  group: 'procedures',
  subject: { type: 'procedure-figure', id },
  figure: { kind: KINDS[id], value, printed },
  standing,
  citations: [citation(source)],
  places: ['check'],
});

const order = (
  id: OrderId,
  { standing, source, ...rest }: Pick<SourcedFigure, 'standing' | 'source'> & Partial<SourcedFigure>,
): Found => ({
  group: id === 'airflow-evidence' ? 'procedures' : 'weigh-in',
  subject: { type: 'order', id },
  figure:
    rest.value === undefined || rest.printed === undefined
      ? null
      : { kind: 'temperatureK', value: rest.value, printed: rest.printed },
  standing,
  citations: [citation(source)],
  places: [id === 'airflow-evidence' ? 'check' : 'weigh-in'],
});

function ordersIn({ airflow }: Procedure, weighIn: WeighInRules): readonly Found[] {
  const [standing, source] = airflow.evidenceBasis;
  const { observesBelow, promisesBelow } = weighIn;
  return [
    order('airflow-evidence', { standing, source }),
    order('weigh-in', { standing: weighIn.standing, source: weighIn.source }),
    ...(observesBelow === null ? [] : [order('weigh-in-watched-below', observesBelow)]),
    ...(promisesBelow === null ? [] : [order('weigh-in-promised-below', promisesBelow)]),
  ];
}

const placeOf = (subject: SourceSubject): string => ('id' in subject ? subject.id : '');

/** Every figure and order of every procedure; those that differ in nothing but the procedure are one entry. */
export function procedureEntries(): readonly SourceEntry[] {
  const entries = new Map<string, Found & { readonly procedures: ProcedureId[] }>();
  for (const procedure of PROCEDURES) {
    const found = [
      ...rulesIn(procedure).map(([id, rule]) => figure(id, rule)),
      ...ordersIn(procedure, WEIGH_IN_RULES[procedure.id]),
    ];
    for (const each of found) {
      const key = JSON.stringify(each);
      const known = entries.get(key);
      if (known === undefined) entries.set(key, { ...each, procedures: [procedure.id] });
      else known.procedures.push(procedure.id);
    }
  }
  const order = [...Object.keys(KINDS), ''];
  return [...entries.values()]
    .map((entry) => ({ ...entry, id: `${entry.subject.type}:${placeOf(entry.subject)}:${entry.procedures.join('+')}` }))
    .sort((a, b) => rank(order, placeOf(a.subject)) - rank(order, placeOf(b.subject)));
}

/** In the order of the kinds, so that one figure of several procedures stands together; orders come last. */
const rank = (order: readonly string[], place: string): number => {
  const index = order.indexOf(place);
  return index === -1 ? order.length : index;
};

export interface ProcedureSummary {
  readonly id: ProcedureId;
  readonly version: number;
  /** How many of its figures and orders stand on what; standings that none has are left out. */
  readonly standings: readonly { readonly standing: SourceStanding; readonly count: number }[];
}

export const procedureSummaries = (entries: readonly SourceEntry[]): readonly ProcedureSummary[] =>
  PROCEDURES.map(({ id, version }) => {
    const own = entries.filter(({ procedures }) => procedures.includes(id));
    const counts = SOURCE_STANDINGS.map((standing) => ({
      standing,
      count: own.filter((entry) => entry.standing === standing).length,
    }));
    return { id, version, standings: counts.filter(({ count }) => count > 0) };
  });
