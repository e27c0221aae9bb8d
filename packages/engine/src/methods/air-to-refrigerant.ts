/** Differences between refrigerant and air, and the compressor's current: what a diagnosis looks at besides the criteria. */
import { formula } from '../derivation/formula';

export const returnOverEvaporating = formula({
  id: 'returnOverEvaporating',
  gives: 'differenceK',
  text: 'T_return − T_mean',
  symbols: { returnDryBulbK: 'T_return', evaporatingK: 'T_mean' },
  source: 'Definition; common practice, no source',
  of: ({ returnDryBulbK, evaporatingK }) => returnDryBulbK - evaporatingK,
});

export const liquidLineApproach = formula({
  id: 'liquidLineApproach',
  gives: 'differenceK',
  text: 'T_liquid − T_outdoor',
  symbols: { liquidLineK: 'T_liquid', outdoorK: 'T_outdoor' },
  source: 'Definition; common practice, no source',
  of: ({ liquidLineK, outdoorK }) => liquidLineK - outdoorK,
});

/** The expected current is positive: the request is refused without. */
export const currentOffExpected = formula({
  id: 'currentOffExpected',
  gives: 'fraction',
  text: '(I − I_expected) / I_expected',
  symbols: { currentA: 'I', expectedA: 'I_expected' },
  source: 'Definition',
  of: ({ currentA, expectedA }) => (currentA - expectedA) / expectedA,
});
