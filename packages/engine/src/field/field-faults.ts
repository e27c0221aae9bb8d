/** Faults of the values of an airflow, capacity or weigh-in request. */
import type { MessageOf } from '../check/codes';
import type { Amount } from '../check/request';
import { Faults } from '../check/value-faults';
import { fanTableFaults } from '../methods/airflow/fan-table';
import { flowToM3PerS, staticPressureToPa } from '../units';
import type { FieldFaultFigures } from './field-codes';
import type { FanTableInput, StatedAmount } from './field-request';

export class FieldFaults extends Faults<MessageOf<FieldFaultFigures>> {
  /** A figure above zero, with its ±. */
  positiveStated(path: string, amount: StatedAmount<string, string> | undefined): void {
    this.positive(path, amount);
    this.#accuracy(path, amount);
  }

  /** A figure of zero or more, with its ±. */
  notNegativeStated(path: string, amount: StatedAmount<string, string> | undefined): void {
    this.notNegative(path, amount?.value);
    this.#accuracy(path, amount);
  }

  /** In percent, above 0 to 100. */
  efficiency(path: string, amount: StatedAmount<'%', '%'> | undefined): void {
    if (amount === undefined) return;
    this.#accuracy(path, amount);
    if (!this.finite(path, amount.value) || (amount.value > 0 && amount.value <= 100)) return;
    this.add(path, { code: 'efficiency-outside-range', figures: {} });
  }

  /** A signed figure. */
  signed(path: string, amount: Amount<string> | undefined): void {
    if (amount !== undefined) this.finite(path, amount.value);
  }

  /** Each fault of the table once, at the table's own path; a cell that is no number at its own. */
  fanTable(path: string, table: FanTableInput | undefined): void {
    if (table === undefined) return;
    const sound = table.rows.map(({ staticPressure, airflow }, at) => {
      const statics = this.finite(`${path}.rows.${at}.staticPressure`, staticPressure);
      return (airflow === null || this.finite(`${path}.rows.${at}.airflow`, airflow)) && statics;
    });
    if (sound.includes(false)) return;
    for (const fault of fanTableFaults(fanTableInSi(table))) {
      // what is not finite was found cell by cell
      if (fault !== 'not-finite') this.add(path, { code: `fan-table-${fault}`, figures: {} });
    }
  }

  #accuracy(path: string, amount: StatedAmount<string, string> | undefined): void {
    this.notNegative(`${path}.plusMinus`, amount?.plusMinus?.value);
    this.notNegative(`${path}.resolution`, amount?.resolution);
  }
}

export const fanTableInSi = ({ source, blowerTap, staticPressureUnit, airflowUnit, rows }: FanTableInput) => ({
  source: source ?? '',
  blowerTap: blowerTap ?? '',
  rows: rows.map(({ staticPressure, airflow }) => ({
    staticPa: staticPressureToPa(staticPressure, staticPressureUnit),
    airflowM3PerS: airflow === null ? null : flowToM3PerS(airflow, airflowUnit),
  })),
});
