/** What the owner of the building is told: plain words, no codes, nothing promised that was not measured. */
import type { OverallFinding } from '@chargewright/engine';

export interface OwnerParts {
  /** "1 December 2026" */
  readonly date: string;
  /** The criterion's own sentence, or what stopped the test. */
  readonly headline: string;
  /** Of what: "superheat". */
  readonly name: string;
  /** "11.2 °F (± 2.0 °F), target 12 °F"; empty without a number. */
  readonly numbers: string;
  readonly reason: string;
  readonly rules: string;
}

const named = ({ name, numbers }: OwnerParts): string => (numbers === '' ? '' : `: ${name} ${numbers}`);

const outside = ({ headline, numbers }: OwnerParts): string =>
  `The system needs attention. ${headline}${numbers === '' ? '' : `: ${numbers}`}.`;

const found: Readonly<Record<OverallFinding, (parts: OwnerParts) => string>> = {
  within: (parts) => `The refrigerant charge is within its tolerance${named(parts)}.`,
  above: outside,
  below: outside,
  'too-close-to-call': (parts) =>
    `The charge lies too close to the edge of its tolerance to be called right or wrong today${named(parts)}.`,
  'not-verifiable': ({ reason }) =>
    `The charge could not be verified today, which is neither a pass nor a fail. ${reason}`.trim(),
  'not-judged': ({ reason }) => `The check is not finished, so the charge is not judged. ${reason}`.trim(),
  stop: ({ headline }) => `The test was stopped, and the charge is not judged. ${headline}.`,
};

export const ownerWords = {
  opening: ({ date, rules }: OwnerParts) => `Your cooling system was checked on ${date} (${rules}).`,
  found: (finding: OverallFinding, parts: OwnerParts) => found[finding](parts),
  numbers: (actual: string, plusMinus: string, target: string | null) =>
    `${actual} (± ${plusMinus})${target === null ? '' : `, target ${target}`}`,
  faultsMayHide:
    'Still open: on this kind of system too little refrigerant and too little airflow can hide each other; further readings would tell.',
  airflowNotProven: 'The airflow was not measured.',
  publishedTable: 'The target comes from a published table, see sources.',
  limits: 'This says what was measured on that day; it does not certify capacity, tightness or safety.',
  // the page
  title: 'For the owner',
  open: 'Tell the owner',
  hide: 'Hide the owner’s text',
  share: 'Share',
  copy: 'Copy',
  copied: 'Copied.',
  notCopied: 'It could not be copied: select the text above.',
  subject: 'Your cooling system',
};
