/** Which way each fault moves what is read, against the healthy system: the fault table of the trade. */
import type { Cause } from './diagnosis-codes';

export type Change = 'up' | 'little' | 'down';

/** A column of the table; superheat has one for each metering device. */
export const COLUMNS = [
  'suction',
  'head',
  'superheatOrifice',
  'superheatValve',
  'subcooling',
  'split',
  'current',
  'approach',
] as const;
export type Column = (typeof COLUMNS)[number];

/** By the standing of a cell. */
export const FAULT_PATTERN_SOURCES = {
  practice:
    'Common practice; accords with the rule tables of Rossi & Braun (HVAC&R Research 3(1), 1997), Breuker & Braun (HVAC&R Research 4(3), 1998) and Kim, Yoon, Payne & Domanski (NIST SP 1087, 2008), whose existence and method were read and whose tables were not opened',
  read: 'Trade article on restrictions',
} as const;

export interface Cell {
  /** Two for "little or …", for "slightly …", and for what a valve holds until it is wide open. */
  readonly changes: readonly Change[];
  readonly standing: keyof typeof FAULT_PATTERN_SOURCES;
  /** Without this sign the fault is not there: a reading clearly on its target contradicts it. */
  readonly leading: boolean;
}

export interface FaultPattern {
  readonly cause: Cause;
  readonly metering: 'any' | 'valve';
  /** `null`: the fault says nothing here, or the column does not exist for it. */
  readonly cells: Readonly<Record<Column, Cell | null>>;
}

const cell = (...changes: readonly Change[]): Cell => ({ changes, standing: 'practice', leading: false });
const leading = (...changes: readonly Change[]): Cell => ({ ...cell(...changes), leading: true });

const UP = cell('up');
const DOWN = cell('down');
const LITTLE = cell('little');
const LITTLE_OR_UP = cell('little', 'up');
const LITTLE_OR_DOWN = cell('little', 'down');

/** Approach is head less subcooling: its cells follow from theirs where those agree, else they are the makers' own charging rule. */
export const FAULT_PATTERNS: readonly FaultPattern[] = [
  {
    cause: 'low-charge',
    metering: 'any',
    cells: {
      suction: DOWN,
      head: DOWN,
      superheatOrifice: leading('up'),
      superheatValve: LITTLE_OR_UP,
      subcooling: leading('down'),
      split: DOWN,
      current: DOWN,
      approach: UP,
    },
  },
  {
    cause: 'overcharge',
    metering: 'any',
    cells: {
      suction: UP,
      head: UP,
      superheatOrifice: leading('down'),
      superheatValve: LITTLE,
      subcooling: leading('up'),
      split: LITTLE_OR_DOWN,
      current: UP,
      approach: DOWN,
    },
  },
  {
    cause: 'restriction',
    metering: 'any',
    cells: {
      suction: DOWN,
      head: LITTLE_OR_DOWN,
      superheatOrifice: leading('up'),
      superheatValve: leading('up'),
      subcooling: { ...UP, standing: 'read' },
      split: DOWN,
      current: DOWN,
      approach: DOWN,
    },
  },
  {
    cause: 'air-in-system',
    metering: 'any',
    cells: {
      suction: LITTLE_OR_UP,
      head: leading('up'),
      superheatOrifice: LITTLE,
      superheatValve: LITTLE,
      subcooling: UP,
      split: LITTLE,
      current: UP,
      approach: null,
    },
  },
  {
    cause: 'low-airflow',
    metering: 'any',
    cells: {
      suction: DOWN,
      head: LITTLE_OR_DOWN,
      superheatOrifice: DOWN,
      superheatValve: LITTLE_OR_DOWN,
      subcooling: LITTLE_OR_UP,
      split: leading('up'),
      current: DOWN,
      approach: null,
    },
  },
  {
    cause: 'condenser-air',
    metering: 'any',
    cells: {
      suction: UP,
      head: leading('up'),
      superheatOrifice: DOWN,
      superheatValve: LITTLE,
      subcooling: LITTLE_OR_DOWN,
      split: DOWN,
      current: UP,
      approach: UP,
    },
  },
  {
    cause: 'compressor',
    metering: 'any',
    cells: {
      suction: UP,
      head: DOWN,
      superheatOrifice: DOWN,
      superheatValve: LITTLE,
      subcooling: LITTLE_OR_DOWN,
      split: DOWN,
      current: leading('down'),
      approach: null,
    },
  },
  {
    cause: 'valve-closed',
    metering: 'valve',
    cells: {
      suction: DOWN,
      head: DOWN,
      superheatOrifice: null,
      superheatValve: leading('up'),
      subcooling: UP,
      split: DOWN,
      current: DOWN,
      approach: DOWN,
    },
  },
  {
    cause: 'valve-open',
    metering: 'valve',
    cells: {
      suction: UP,
      head: LITTLE_OR_UP,
      superheatOrifice: null,
      superheatValve: leading('down'),
      subcooling: DOWN,
      split: DOWN,
      current: UP,
      approach: UP,
    },
  },
];
