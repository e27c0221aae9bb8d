import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  ElementRef,
  inject,
  Injector,
  signal,
} from '@angular/core';
import { RouterLink } from '@angular/router';
import { crossCheck, MAKERS_CHART_FACTS, MAKERS_CHART_KINDS, type MakersChartKind } from '@chargewright/engine';
import { checkPageWords, faultText, makersChartWords, makersDataWords } from '@chargewright/wording';
import type { DraftSetup, TypedChart } from '../loose-checks/check-draft';
import { LooseChecks } from '../loose-checks/loose-checks';
import { plateTitle } from '../check-a-charge/setup-plate';
import { UnitPreference } from '../quantities/unit-preference';
import { ChartEditor } from './chart-editor';
import { readTypedChart } from './read-typed-chart';
import { emptyChart } from './typed-chart';

/** Kinds that can serve this system first, the others after them: a person may type off the whole page of the manual. */
function kindsFor({ mode = 'cooling', meteringDevice }: DraftSetup): readonly MakersChartKind[] {
  const serves = (kind: MakersChartKind): boolean => {
    if (MAKERS_CHART_FACTS[kind].mode !== mode) return false;
    if (kind === 'superheat') return meteringDevice === 'fixed-orifice';
    return kind !== 'subcooling' || meteringDevice !== 'fixed-orifice';
  };
  return [...MAKERS_CHART_KINDS.filter(serves), ...MAKERS_CHART_KINDS.filter((kind) => !serves(kind))];
}

/** The maker's tables of the open check: what there is, what is missing in it, and one of them under the hand. */
@Component({
  selector: 'app-makers-data-page',
  imports: [ChartEditor, RouterLink],
  templateUrl: './makers-data-page.html',
  styleUrl: './makers-data-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MakersDataPage {
  private readonly checks = inject(LooseChecks);
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);
  private readonly injector = inject(Injector);

  protected readonly words = makersDataWords;
  protected readonly loadingText = checkPageWords.shell.loading;
  protected readonly kindWords = makersChartWords.kinds;
  protected readonly system = inject(UnitPreference).system;
  protected readonly isLoading = computed(() => this.checks.state() === 'loading');
  private readonly setup = computed(() => this.checks.current().setup);
  protected readonly title = computed(() =>
    this.setup().refrigerant === undefined
      ? this.words.noSystem
      : this.words.ofCheck(plateTitle(this.checks.current())),
  );
  protected readonly charts = computed(() => this.setup().makersCharts ?? []);
  protected readonly kinds = computed(() => kindsFor(this.setup()));
  protected readonly editing = signal<number | undefined>(undefined);
  protected readonly edited = computed(() => {
    const at = this.editing();
    return at === undefined ? undefined : this.charts()[at];
  });
  private readonly taken = signal<{ readonly chart: TypedChart; readonly at: number } | undefined>(undefined);
  protected readonly removedText = computed(() => {
    const taken = this.taken();
    return taken && this.words.removed(this.kindWords[taken.chart.kind].label);
  });
  protected readonly rows = computed(() =>
    this.charts().map((chart, at) => {
      const reading = readTypedChart(chart);
      const faults = this.faultsOf(chart);
      return {
        at,
        name: this.kindWords[chart.kind].label,
        status:
          reading.state === 'unfinished'
            ? this.words.unfinished(reading.open)
            : faults.length > 0
              ? `${this.words.faulty} ${faults[0]}`
              : this.words.complete,
      };
    }),
  );
  protected readonly faults = computed(() => {
    const chart = this.edited();
    return chart ? this.faultsOf(chart) : [];
  });

  protected add(kind: MakersChartKind): void {
    const charts = this.charts();
    this.keep([...charts, emptyChart(kind, this.system())]);
    this.edit(charts.length);
  }

  protected edit(at: number): void {
    this.editing.set(at);
    this.focus('app-chart-editor h2');
  }

  protected change(chart: TypedChart): void {
    const at = this.editing();
    this.keep(this.charts().map((each, index) => (index === at ? chart : each)));
  }

  protected finish(): void {
    this.editing.set(undefined);
    this.focus('h1');
  }

  protected remove(at: number): void {
    const chart = this.charts()[at];
    if (!chart) return;
    this.taken.set({ chart, at });
    this.keep(this.charts().filter((_, index) => index !== at));
  }

  protected undo(): void {
    const taken = this.taken();
    if (!taken) return;
    const charts = this.charts();
    this.keep([...charts.slice(0, taken.at), taken.chart, ...charts.slice(taken.at)]);
    this.taken.set(undefined);
  }

  private keep(makersCharts: readonly TypedChart[]): void {
    this.checks.choose({ makersCharts });
  }

  private faultsOf(chart: TypedChart): readonly string[] {
    const reading = readTypedChart(chart);
    if (reading.state === 'unfinished') return [];
    return crossCheck({ setup: { makersChart: reading.chart }, readings: {} })
      .filter(({ path }) => path.startsWith('setup.makersChart'))
      .map((fault) => faultText(fault, this.system()));
  }

  private focus(selector: string): void {
    afterNextRender(() => this.host.nativeElement.querySelector<HTMLElement>(selector)?.focus(), {
      injector: this.injector,
    });
  }
}
