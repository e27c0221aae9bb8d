/** What cannot be in airflow, capacity and weigh-in, beyond what cannot be in a check. */
import type { FieldFaultFigures } from '@chargewright/engine';
import type { FaultWords } from '../language';
import { faultWords } from './faults';
import { fieldInputWords } from './field-inputs';

export const fieldFaultTexts: Readonly<Record<keyof FieldFaultFigures, (f: { readonly field: string }) => string>> = {
  'efficiency-outside-range': (f) => `${f.field} lies above 0 and not above 100 %.`,
  'fan-table-too-few-rows': (f) => `${f.field} needs at least two rows with an airflow.`,
  'fan-table-statics-not-ascending': (f) => `${f.field}: the static pressures must rise from row to row.`,
  'fan-table-airflow-not-above-zero': (f) => `${f.field}: an airflow must be more than zero; leave a dash empty.`,
  'scale-step-not-above-zero': (f) => `${f.field} must be more than zero.`,
};

const { naming } = faultWords;

export const fieldFaultNaming: FaultWords['naming'] = {
  ...naming,
  fields: { ...naming.fields, ...fieldInputWords },
};
