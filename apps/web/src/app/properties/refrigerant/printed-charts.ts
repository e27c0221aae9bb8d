import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { printedComparisons, type PrintedPoint, type RefrigerantId } from '@chargewright/engine';
import { formatGauge, formatShift, formatValue, propertiesWords, type UnitSystem } from '@chargewright/wording';

/** What gauge pressures of the printed tables count from. */
const SEA_LEVEL_PA = 101_325;

/** How far printed tables lie from what this page gives: a choice of chart can eat a third of a tolerance. */
@Component({
  selector: 'app-printed-charts',
  template: `
    <h2>{{ words.title }}</h2>
    @if (charts().length === 0) {
      <p>{{ words.none }}</p>
    } @else {
      <p class="note">{{ words.note }}</p>
    }
    @for (chart of charts(); track chart.id) {
      <section>
        <p class="source">{{ chart.source }}</p>
        <p>{{ chart.summary }}</p>
        <details>
          <summary>
            {{ words.showRows }} <span class="seen-by-readers-only">{{ chart.id }}</span>
          </summary>
          <table>
            <thead>
              <tr>
                <th scope="col">{{ words.chartTemperature }}</th>
                <th scope="col">{{ words.chartPressure }}</th>
                <th scope="col">{{ words.here }}</th>
                <th scope="col">{{ words.difference }}</th>
              </tr>
            </thead>
            <tbody>
              @for (row of chart.rows; track $index) {
                <tr>
                  <th scope="row">{{ row.temperature }}</th>
                  <td>{{ row.pressure }}</td>
                  <td>{{ row.here }}</td>
                  <td>{{ row.difference }}</td>
                </tr>
              }
            </tbody>
          </table>
          <p class="note">{{ words.atSeaLevel }}</p>
        </details>
      </section>
    }
  `,
  styleUrl: './printed-charts.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PrintedCharts {
  readonly refrigerant = input.required<RefrigerantId>();
  readonly system = input.required<UnitSystem>();

  protected readonly words = propertiesWords.printed;
  protected readonly charts = computed(() => {
    const system = this.system();
    const row = ({ point, temperatureK, pressurePa, differenceK }: PrintedPoint) => ({
      temperature: formatValue('temperatureK', temperatureK, system),
      pressure: `${formatGauge(pressurePa, SEA_LEVEL_PA, system)}${point === 'dew' ? ` ${this.words.dew}` : ''}`,
      here: formatValue('temperatureK', temperatureK + differenceK, system),
      difference: formatShift(differenceK, system),
    });
    return printedComparisons(this.refrigerant()).map(({ table, points, largest, meanAbsoluteK }) => ({
      id: table.id,
      source: `${sentenceCase(table.source)} (${this.words.how[table.how]})`,
      summary: [
        this.words.largest(
          formatShift(largest.differenceK, system),
          formatValue('temperatureK', largest.temperatureK, system),
        ),
        this.words.mean(formatShift(meanAbsoluteK, system).replace('+', '')),
      ].join(' '),
      rows: points.map(row),
    }));
  });
}

const sentenceCase = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
