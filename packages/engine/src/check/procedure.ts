/**
 * The rules a check is judged by: data, versioned, immutable once published. Every figure keeps how it was printed, its standing and its source.
 */
import type { DifferenceUnit, TemperatureUnit } from '../units';
import { differenceToK, temperatureToK } from '../units';

/** `read` in the named source, recalled from `memory`, common `practice` without a source, or our own `choice`, open to better evidence. */
export type Standing = 'read' | 'memory' | 'practice' | 'choice';

export interface Rule {
  /** SI, as the name of its place says. */
  readonly value: number;
  readonly printed: string;
  readonly standing: Standing;
  readonly source: string;
}

export interface Procedure {
  readonly id: string;
  readonly version: number;
  /** Guarded decision rule: outside `p` and `1 − p` the finding is clear (JCGM 106:2012, 8.3). */
  readonly guardProbability: Rule;
  readonly superheat: { readonly toleranceK: Rule; readonly floorK: Rule };
  readonly subcooling: {
    readonly toleranceK: Rule;
    readonly lowBelowK: Rule;
    readonly clearFromK: Rule;
    readonly highAboveK: Rule;
  };
  readonly temperatureSplit: { readonly toleranceK: Rule };
  readonly superheatWindow: { readonly lowK: Rule; readonly highK: Rule };
  readonly airflow: { readonly leastM3PerSPerW: Rule; readonly leastDesignFraction: Rule };
  readonly conditions: {
    readonly leastOutdoorK: Rule;
    readonly coolBelowK: Rule;
    readonly leastReturnK: Rule;
    readonly leastRunningMinutes: Rule;
  };
  readonly instruments: { readonly cautionAfterDays: Rule };
  readonly mostReadingAgeSeconds: Rule;
  /** Above this probability that no target exists, the criterion is not verifiable. */
  readonly mostProbabilityOfNoTarget: Rule;
}

type Basis = readonly [standing: Standing, source: string];

export const differenceRule = (value: number, unit: Exclude<DifferenceUnit, 'K'>, basis: Basis): Rule => ({
  value: differenceToK(value, unit),
  printed: `${value} ${unit === 'deltaF' ? '°F' : '°C'}`,
  standing: basis[0],
  source: basis[1],
});

export const temperatureRule = (value: number, unit: Exclude<TemperatureUnit, 'K'>, basis: Basis): Rule => ({
  value: temperatureToK(value, unit),
  printed: `${value} ${unit === 'degF' ? '°F' : '°C'}`,
  standing: basis[0],
  source: basis[1],
});

export const plainRule = (value: number, printed: string, basis: Basis): Rule => ({
  value,
  printed,
  standing: basis[0],
  source: basis[1],
});
