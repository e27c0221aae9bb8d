/** Which rules and tables gave an airflow, a capacity or a weigh-in. */
import { versionOf } from '../check/engine-version';
import { PROCEDURES } from '../check/procedure-catalogue';
import { FAN_TABLE_LIMIT } from '../methods/airflow/fan-table';
import { ASSUMED_FIELD_LIMITS } from '../methods/airflow/field-readings';
import { STANDARD_AIR_DENSITY } from '../methods/airflow/standard-air';
import { R410A_LINE_RATES } from '../methods/weigh-in/data/line-rates';
import { WEIGH_IN_FIGURES } from '../methods/weigh-in/data/weigh-in-figures';
import { LIQUID_DENSITY_AT_100F } from '../methods/weigh-in/generated/liquid-density';
import { WEIGH_IN_RULES } from './weigh-in-rules';

let version: string | undefined;

/** As `engineVersion`, of what airflow, capacity and weigh-in rest on. */
export function fieldVersion(): string {
  version ??= versionOf([
    STANDARD_AIR_DENSITY,
    ASSUMED_FIELD_LIMITS,
    FAN_TABLE_LIMIT,
    R410A_LINE_RATES,
    LIQUID_DENSITY_AT_100F,
    WEIGH_IN_FIGURES,
    WEIGH_IN_RULES,
    PROCEDURES.map(({ id, decision }) => ({ id, decision })),
  ]);
  return version;
}
