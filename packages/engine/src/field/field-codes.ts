/** What cannot be in a request for airflow, capacity or a weigh-in, besides what cannot be in a check's. */
import type { FaultMessage, MessageOf } from '../check/codes';

export interface FieldFaultFigures {
  'efficiency-outside-range': never;
  'fan-table-too-few-rows': never;
  'fan-table-statics-not-ascending': never;
  'fan-table-airflow-not-above-zero': never;
  'scale-step-not-above-zero': never;
}

export type FieldFault = (FaultMessage | MessageOf<FieldFaultFigures>) & { readonly path: string };
