import {
  ChangeDetectionStrategy,
  Component,
  computed,
  ElementRef,
  inject,
  Injector,
  input,
  output,
  signal,
  afterNextRender,
} from '@angular/core';
import {
  CHART_UNITS,
  DIMENSION_OF_CONDITION,
  MAKERS_CHART_FACTS,
  plausibilityOfMakersChart,
  type ChartOddity,
  type ChartPort,
  type ChartUnit,
} from '@chargewright/engine';
import { makersChartWords, makersDataWords, unitLabel, type UnitSystem } from '@chargewright/wording';
import { ChoiceGroup } from '../check-a-charge/choice-group';
import { TickBox } from '../check-a-charge/tick-box';
import { CHART_LIMITS, type ChartLimit, type TypedChart, type TypedValue } from '../loose-checks/check-draft';
import { NumberField } from '../quantities/number-field';
import { DASH } from '../quantities/printed-dash';
import { ChartPreview } from './chart-preview';
import { parsePaste } from './parse-paste';
import { readTypedChart } from './read-typed-chart';
import {
  emptyChart,
  widthOf,
  withAxisValue,
  withCell,
  withColumn,
  withOneFigure,
  withoutColumn,
  withoutRow,
  withRow,
} from './typed-chart';

type Limit = 'tolerance' | ChartLimit;

/** Types off one table: pasted at once, or row by row with one field under another, as a phone has room for. */
@Component({
  selector: 'app-chart-editor',
  imports: [ChartPreview, ChoiceGroup, NumberField, TickBox],
  templateUrl: './chart-editor.html',
  styleUrl: './chart-editor.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ChartEditor {
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);
  private readonly injector = inject(Injector);

  readonly chart = input.required<TypedChart>();
  readonly system = input.required<UnitSystem>();
  /** What the engine refuses in this table, as sentences. */
  readonly faults = input<readonly string[]>([]);

  readonly changed = output<TypedChart>();
  readonly finished = output<void>();

  protected readonly words = makersDataWords;
  protected readonly unitLabel = unitLabel;
  protected readonly DASH = DASH;
  protected readonly limits = CHART_LIMITS;
  protected readonly facts = computed(() => MAKERS_CHART_FACTS[this.chart().kind]);
  protected readonly name = computed(() => makersChartWords.kinds[this.chart().kind].label);
  protected readonly rowName = computed(() => makersChartWords.conditions[this.facts().rows]);
  protected readonly columnName = computed(() => {
    const { columns } = this.facts();
    return columns === null ? '' : makersChartWords.conditions[columns];
  });
  protected readonly ports = computed(() =>
    this.facts().ports.map((value) => ({ value, label: makersChartWords.ports[value] })),
  );
  protected readonly rowUnits = computed(() => CHART_UNITS[DIMENSION_OF_CONDITION[this.facts().rows]].units);
  protected readonly columnUnits = computed(() => {
    const { columns } = this.facts();
    return columns === null ? [] : CHART_UNITS[DIMENSION_OF_CONDITION[columns]].units;
  });
  protected readonly cellUnits = computed(() => CHART_UNITS[this.facts().cells].units);
  protected readonly toleranceUnits = computed((): readonly [string, ...string[]] => {
    if (this.facts().cells === 'pressure') return this.system() === 'F-psi' ? ['psi'] : ['kPa', 'bar'];
    return this.system() === 'F-psi' ? ['deltaF'] : ['deltaC'];
  });
  protected readonly temperatureUnits = computed((): readonly [string, ...string[]] =>
    this.system() === 'F-psi' ? ['degF'] : ['degC'],
  );
  protected readonly oneFigure = computed(() => this.chart().rows === undefined);

  private readonly row = signal(0);
  protected readonly rowCount = computed(() => this.chart().cells.length);
  /** The row under the hand, held inside the table. */
  protected readonly at = computed(() => Math.min(this.row(), this.rowCount() - 1));
  protected readonly cells = computed(() => {
    const { cells, columns } = this.chart();
    return (cells[this.at()] ?? []).map((text, column) => ({
      column,
      text,
      head: columns?.values[column] ?? '',
      id: `cell-${column}`,
    }));
  });

  protected readonly reading = computed(() => readTypedChart(this.chart()));
  protected readonly complete = computed(() => {
    const reading = this.reading();
    return reading.state === 'complete' ? reading.chart : undefined;
  });
  protected readonly status = computed(() => {
    const reading = this.reading();
    return reading.state === 'complete' ? this.words.complete : this.words.unfinished(reading.open);
  });
  protected readonly oddities = computed(() => {
    const chart = this.complete();
    return chart && this.faults().length === 0
      ? plausibilityOfMakersChart(chart).map((oddity) => this.say(oddity))
      : [];
  });

  protected readonly pasted = signal('');
  protected readonly pasteTold = signal<{ readonly text: string; readonly wrong: boolean } | undefined>(undefined);

  protected value(text: string, unit: string): TypedValue {
    return { text, unit };
  }

  protected setPort(port: ChartPort): void {
    this.changed.emit({ ...this.chart(), port });
  }

  protected setUnit(of: 'rows' | 'columns' | 'cells', text: string): void {
    const unit = text as ChartUnit;
    const chart = this.chart();
    if (of === 'cells') this.changed.emit({ ...chart, unit });
    else if (chart[of]) this.changed.emit({ ...chart, [of]: { ...chart[of], unit } });
  }

  protected setOneFigure(one: boolean): void {
    const chart = this.chart();
    if (one) this.changed.emit(withOneFigure(chart, this.system()));
    else
      this.changed.emit({
        ...emptyChart(chart.kind, this.system()),
        unit: chart.unit,
        ...(chart.port && { port: chart.port }),
      });
  }

  protected setLimit(limit: Limit, value: TypedValue): void {
    const { [limit]: _, ...rest } = this.chart();
    this.changed.emit(value.text.trim() === '' ? rest : { ...rest, [limit]: value });
  }

  protected setHead(axis: 'rows' | 'columns', at: number, text: string): void {
    this.changed.emit(withAxisValue(this.chart(), axis, at, text));
  }

  protected setCell(column: number, text: string): void {
    this.changed.emit(withCell(this.chart(), this.at(), column, text));
  }

  /** Enter leads down the column of fields, and from the last on to the next row. */
  protected advance(column: number): void {
    if (column + 1 < widthOf(this.chart())) this.focus(`cell-${column + 1}`);
    else if (this.at() + 1 < this.rowCount()) this.goToRow(this.at() + 1);
  }

  protected goToRow(row: number): void {
    this.row.set(row);
    this.focus('row-head');
  }

  protected addRow(): void {
    this.changed.emit(withRow(this.chart()));
    this.goToRow(this.rowCount());
  }

  protected removeRow(): void {
    this.changed.emit(withoutRow(this.chart(), this.at()));
  }

  protected addColumn(): void {
    this.changed.emit(withColumn(this.chart()));
  }

  protected removeColumn(column: number): void {
    this.changed.emit(withoutColumn(this.chart(), column));
  }

  protected takePaste(): void {
    const parsed = parsePaste(this.pasted(), this.facts().columns !== null);
    if (parsed.state === 'problem') {
      const text = this.words.pasteProblems[parsed.problem];
      this.pasteTold.set({
        text: parsed.place === undefined ? text : this.words.problemAt(text, parsed.place),
        wrong: true,
      });
      return;
    }
    const { rows, columns, cells } = parsed.table;
    const fresh = emptyChart(this.chart().kind, this.system());
    const chart = this.chart();
    this.changed.emit({
      ...chart,
      rows: { unit: (chart.rows ?? fresh.rows)!.unit, values: rows },
      ...(columns && { columns: { unit: (chart.columns ?? fresh.columns)!.unit, values: columns } }),
      cells,
    });
    this.row.set(0);
    this.pasted.set('');
    this.pasteTold.set({ text: this.words.pasted(rows.length, columns?.length ?? 1), wrong: false });
  }

  private focus(id: string): void {
    afterNextRender(() => this.host.nativeElement.querySelector<HTMLInputElement>(`#${id}`)?.focus(), {
      injector: this.injector,
    });
  }

  private say({ code, part, row, column, likelyUnit }: ChartOddity): string {
    const text = makersChartWords.oddities[code](likelyUnit === undefined ? '' : unitLabel(likelyUnit));
    if (part === 'cells' && row !== undefined && column !== undefined)
      return `${this.words.place(row + 1, column + 1)} ${text}`;
    if (row !== undefined) return `${this.words.wholeRow(row + 1)} ${text}`;
    if (column !== undefined) return `${this.words.wholeColumn(column + 1)} ${text}`;
    return `${part === 'cells' ? this.words.figures : part === 'rows' ? this.rowName() : this.columnName()}: ${text}`.replace(
      '::',
      ':',
    );
  }
}
