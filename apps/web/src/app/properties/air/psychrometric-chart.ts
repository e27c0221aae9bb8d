import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  DestroyRef,
  inject,
  input,
  signal,
  viewChild,
  type ElementRef,
} from '@angular/core';
import { humidityRatioFromKgPerKg, type MoistAir } from '@chargewright/engine';
import {
  formatAmount,
  formatNumber,
  formatValue,
  moistAirWords,
  unitLabel,
  type UnitSystem,
} from '@chargewright/wording';
import { drawChart } from './chart-drawing';
import { frameOf } from './chart-frames';
import { chartTable, TABLE_HUMIDITIES } from './chart-table';

const FIRST_WIDTH = 358;

/** The psychrometric chart of one state at its air pressure, drawn to the width there is, with the same as words and as a table. */
@Component({
  selector: 'app-psychrometric-chart',
  templateUrl: './psychrometric-chart.html',
  styleUrl: './psychrometric-chart.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PsychrometricChart {
  readonly air = input.required<MoistAir>();
  readonly system = input.required<UnitSystem>();

  private readonly box = viewChild.required<ElementRef<HTMLElement>>('box');
  private readonly width = signal(FIRST_WIDTH);

  protected readonly words = moistAirWords.chart;
  protected readonly humidities = TABLE_HUMIDITIES;
  protected readonly frame = computed(() => frameOf(this.air(), this.system()));
  protected readonly pressure = computed(() => formatValue('pressurePa', this.air().pressurePa, this.system()));
  protected readonly drawing = computed(() => {
    const frame = this.frame();
    return frame && drawChart(this.air(), frame, this.width());
  });
  protected readonly scaleUnit = computed(() => unitLabel(this.frame()?.scale ?? ''));
  protected readonly ratioUnit = computed(() => this.frame()?.ratioUnit ?? '');
  protected readonly rows = computed(() => {
    const frame = this.frame();
    return frame ? chartTable(frame, this.air().pressurePa) : [];
  });
  protected readonly tables = computed(() => [
    {
      caption: this.words.tableOf(moistAirWords.readings.humidityRatio, this.ratioUnit()),
      rows: this.rows().map(({ dryBulb, humidityRatios }) => ({ dryBulb, cells: humidityRatios })),
    },
    {
      caption: this.words.tableOf(moistAirWords.readings.wetBulbK, this.scaleUnit()),
      rows: this.rows().map(({ dryBulb, wetBulbs }) => ({ dryBulb, cells: wetBulbs })),
    },
  ]);
  /** What somebody who does not see it is told. */
  protected readonly label = computed(() => {
    const frame = this.frame();
    if (!frame) return '';
    const { label, axes, upwards, state } = this.words;
    const { scale, low, high, most, ratioUnit } = frame;
    const degrees = (value: number) => `${formatNumber(value, 0)} ${unitLabel(scale)}`;
    const { dryBulbK, humidityRatio } = this.air();
    return [
      label(this.pressure()),
      axes(degrees(low), degrees(high)),
      upwards(`${formatNumber(most, 0)} ${ratioUnit}`),
      state(
        formatValue('temperatureK', dryBulbK, this.system()),
        formatAmount(humidityRatioFromKgPerKg(humidityRatio, ratioUnit), ratioUnit),
      ),
    ].join(' ');
  });

  constructor() {
    const destroyed = inject(DestroyRef);
    afterNextRender(() => {
      const observer = new ResizeObserver(([entry]) => {
        const width = Math.round(entry?.contentRect.width ?? 0);
        if (width > 0) this.width.set(width);
      });
      observer.observe(this.box().nativeElement);
      destroyed.onDestroy(() => observer.disconnect());
    });
  }
}
