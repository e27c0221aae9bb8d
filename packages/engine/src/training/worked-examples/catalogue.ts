import { FORMULA_IN_A_DASH, SEA_LEVEL_CHART } from './chart-examples';
import { WIDE_GLIDE_WRONG_COLUMN, WRONG_COLUMN, WRONG_SCALE } from './column-examples';
import { DRY_HOUSE, HEALTHY_ORIFICE, HEALTHY_VALVE_METRIC } from './healthy-examples';
import { LOW_AIRFLOW_FLOODS, OVERCHARGE_OR_AIR, RESTRICTION_WITH_ICE } from './look-alike-examples';
import { UNDERCHARGE_LOW_SPLIT, VALVE_HIDES_LOW_CHARGE } from './low-charge-examples';
import { HANDBOOK_MOIST_AIR } from './moist-air-example';
import { PRINTED_SUM } from './printed-sum-example';
import { TOO_CLOSE_TO_CALL } from './too-close-example';
import type { WorkedExample } from './worked-example';

/** In the order of teaching, as `WORKED_EXAMPLE_IDS`. */
export const WORKED_EXAMPLES: readonly WorkedExample[] = [
  HANDBOOK_MOIST_AIR,
  HEALTHY_ORIFICE,
  HEALTHY_VALVE_METRIC,
  LOW_AIRFLOW_FLOODS,
  VALVE_HIDES_LOW_CHARGE,
  UNDERCHARGE_LOW_SPLIT,
  RESTRICTION_WITH_ICE,
  OVERCHARGE_OR_AIR,
  FORMULA_IN_A_DASH,
  SEA_LEVEL_CHART,
  WRONG_COLUMN,
  WIDE_GLIDE_WRONG_COLUMN,
  WRONG_SCALE,
  TOO_CLOSE_TO_CALL,
  DRY_HOUSE,
  PRINTED_SUM,
];

/** The example with this id, or `undefined` for any other text. */
export const findWorkedExample = (id: string): WorkedExample | undefined =>
  WORKED_EXAMPLES.find((example) => example.id === id);
