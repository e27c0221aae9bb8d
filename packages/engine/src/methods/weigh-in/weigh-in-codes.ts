/** What a weigh-in can say besides its numbers. The engine writes no sentences. */

/** As in a check; *too close to call* where scale or rate cannot tell. */
export type WeighInFinding = 'within' | 'above' | 'below' | 'too-close-to-call' | 'not-verifiable' | 'not-judged';

export type WeighInInputId =
  | 'factoryCharge'
  | 'installedLength'
  | 'includedLength'
  | 'liquidLineSize'
  | 'includedLiquidLineSize'
  | 'actualCharge'
  | 'outdoorDryBulb';

export type WeighInReason =
  /** Not judged: something is missing. */
  | { readonly code: 'inputs-missing'; readonly inputs: readonly WeighInInputId[] }
  | {
      readonly code:
        /** Not judged: no rate for this refrigerant, size or system; the maker's is needed. */
        | 'rate-needed'
        /** Not judged: less line than the factory charge covers, and nobody said whether this maker subtracts. */
        | 'shorter-line-rule-needed'
        /** Not judged: a length, rate or charge that cannot be. */
        | 'outside-range'
        /** Not verifiable: gates. */
        | 'vacuum-failed'
        | 'vacuum-not-proven'
        | 'vacuum-not-recorded'
        | 'above-label-maximum'
        /** Not verifiable: by these rules this person never weighs in, nor counts somebody else's. */
        | 'weigh-in-not-permitted'
        /** Not verifiable: warm enough to test this system by its readings, so watching a weigh-in does not count. */
        | 'too-warm-to-observe';
    };

export type WeighInCaution =
  /** The rate is the one several makers print for R-410A, not this maker's. */
  | 'rate-not-this-makers'
  /** The rate is that of R-410A by the ratio of the liquid densities. */
  | 'rate-by-density'
  /** The scale's step or ± was not stated. */
  | 'scale-assumed'
  /** The scale's step or ± is coarser than wanted in the field. */
  | 'scale-coarse'
  | 'adjustment-unusual'
  | 'vacuum-not-recorded'
  | 'vacuum-not-proven'
  /** A flammable refrigerant without the label's maximum. */
  | 'label-maximum-not-recorded'
  /** Not above the label's maximum, but within the uncertainty of it. */
  | 'near-label-maximum'
  /** Weighed in only because it is cold: whoever did it promises to come back if a later test fails. */
  | 'promise-to-return'
  /** The person judging watches somebody else weigh in. */
  | 'observe-only';
