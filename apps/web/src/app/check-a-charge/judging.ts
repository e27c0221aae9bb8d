/** The part of the page that judges, as one download. */
export { evaluateDraft } from './evaluate-draft';
export { summarise } from './summarise';
