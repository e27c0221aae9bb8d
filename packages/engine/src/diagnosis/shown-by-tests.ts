/** What the separating tests and the look at the system have shown, cause by cause. */
import type { Known } from '../derivation/quantity';
import { isKnown } from '../derivation/quantity';
import type { AirTest, DrierTest } from '../methods/separating-tests';
import { CLEAR_FROM } from '../methods/separating-tests';
import { probabilityBetween } from '../numerics/normal-distribution';
import type { Cause, Evidence, EvidenceCode } from './diagnosis-codes';
import { measuredEvidence } from './read-symptoms';

export interface Observations {
  readonly metering: 'orifice' | 'valve';
  readonly drier: DrierTest;
  readonly air: AirTest;
  readonly bulb: 'right' | 'loose' | 'charge-lost' | null;
  readonly isHunting: boolean;
  readonly filterOrCoilDirty: boolean;
  /** The measured airflow, and what it is over the least there should be. */
  readonly airflow: { readonly measured: Known; readonly overLeast: Known } | null;
}

export interface Shown {
  readonly cause: Cause;
  /** `decides`: it is there. `fits`: it would explain this. `refutes`: it is not there. */
  readonly what: 'decides' | 'fits' | 'refutes';
  readonly evidence: Evidence;
}

export const shownByTests = (observed: Observations): readonly Shown[] => [
  ...drier(observed),
  ...air(observed),
  ...airflow(observed),
  ...looks(observed),
];

function drier({ drier: { finding, drop }, metering }: Observations): readonly Shown[] {
  if (!isKnown(drop)) return [];
  if (finding === 'drop') {
    return [{ cause: 'restriction', what: 'decides', evidence: measuredEvidence('drier-drop', 'difference', drop) }];
  }
  // what holds the liquid back behind the drier of an orifice is the orifice, a restriction too; that of a valve is a cause of its own
  if (finding !== 'small' || metering === 'orifice') return [];
  return [{ cause: 'restriction', what: 'refutes', evidence: measuredEvidence('no-drier-drop', 'difference', drop) }];
}

function air({ air: { finding, excess } }: Observations): readonly Shown[] {
  if (!isKnown(excess) || (finding !== 'found' && finding !== 'none')) return [];
  const [what, code] = finding === 'found' ? (['decides', 'air-found'] as const) : (['refutes', 'no-air'] as const);
  return [{ cause: 'air-in-system', what, evidence: measuredEvidence(code, 'difference', excess) }];
}

function airflow({ airflow: read }: Observations): readonly Shown[] {
  if (read === null) return [];
  const { measured, overLeast } = read;
  const low = probabilityBetween(overLeast.value, overLeast.u, -Infinity, 0);
  if (low < CLEAR_FROM && low > 1 - CLEAR_FROM) return [];
  const least = { kind: measured.kind, value: measured.value - overLeast.value };
  const figures = { airflow: { kind: measured.kind, value: measured.value }, least };
  return low >= CLEAR_FROM
    ? [{ cause: 'low-airflow', what: 'decides', evidence: { code: 'airflow-low', figures } }]
    : [{ cause: 'low-airflow', what: 'refutes', evidence: { code: 'airflow-enough', figures } }];
}

function looks({ metering, bulb, isHunting, filterOrCoilDirty }: Observations): readonly Shown[] {
  const shown: Shown[] = [];
  if (filterOrCoilDirty) shown.push(seen('low-airflow', 'fits', 'filter-or-coil-dirty'));
  if (metering === 'orifice') return shown;
  if (bulb === 'charge-lost') shown.push(seen('valve-closed', 'decides', 'bulb-charge-lost'));
  if (bulb === 'loose') shown.push(seen('valve-open', 'decides', 'bulb-loose'));
  if (isHunting) shown.push(seen('valve-open', 'fits', 'valve-hunting'));
  return shown;
}

type SeenCode = Extract<EvidenceCode, 'filter-or-coil-dirty' | 'bulb-loose' | 'bulb-charge-lost' | 'valve-hunting'>;

const seen = (cause: Cause, what: Shown['what'], code: SeenCode): Shown => ({
  cause,
  what,
  evidence: { code, figures: {} },
});
