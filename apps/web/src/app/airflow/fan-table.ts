import { ChangeDetectionStrategy, Component, computed, input, output, signal } from '@angular/core';
import type { FieldFault, FlowUnit, StaticPressureUnit } from '@chargewright/engine';
import { airflowPageWords, fieldFaultText, unitLabel } from '@chargewright/wording';
import { PROBLEM_TEXTS } from '../check-a-charge/reading-rows';
import { Glyph } from '../layout/glyph';
import type { Worksheet } from '../loose-checks/worksheet';
import { parseNumber } from '../quantities/parse-number';
import { isBlankOrDash, STATIC_UNITS, TABLE_FLOW_UNITS } from './airflow-sheet';

/** Rows shown before anything is typed. */
const FEWEST_ROWS = 4;
const COLUMNS = 2;

/** The maker's fan table, cell by cell or pasted. */
@Component({
  selector: 'app-fan-table',
  imports: [Glyph],
  templateUrl: './fan-table.html',
  styleUrl: './fan-table.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FanTable {
  readonly sheet = input.required<Worksheet>();
  readonly units = input.required<{
    readonly staticPressureUnit: StaticPressureUnit;
    readonly airflowUnit: FlowUnit;
  }>();
  readonly faults = input.required<readonly FieldFault[]>();

  readonly rowsChanged = output<Worksheet['rows']>();
  /** What is said of the table, by the name it has in the sheet. */
  readonly told = output<Readonly<Record<string, string>>>();

  protected readonly pasteNote = signal('');
  protected readonly words = airflowPageWords.table;
  protected readonly unitLabel = unitLabel;
  protected readonly staticUnits = STATIC_UNITS;
  protected readonly flowUnits = TABLE_FLOW_UNITS;
  protected readonly tap = computed(() => this.sheet().choices['blowerTap'] ?? '');
  protected readonly source = computed(() => this.sheet().choices['tableSource'] ?? '');
  private readonly rows = computed<readonly (readonly string[])[]>(() => {
    const { rows } = this.sheet();
    const empty = Array.from({ length: Math.max(0, FEWEST_ROWS - rows.length) }, () => ['', '']);
    return [...rows, ...empty];
  });
  protected readonly shown = computed(() =>
    this.rows().map((row, at) =>
      Array.from({ length: COLUMNS }, (_, column) => {
        const text = row[column] ?? '';
        const name = column === 0 ? this.words.staticPressure : this.words.airflow;
        return { row: at, text, label: `${name}, ${this.words.row(at + 1)}`, faulty: isFaulty(text, column) };
      }),
    ),
  );
  protected readonly complaints = computed(() => {
    const cells = this.rows().flatMap((row) =>
      row.flatMap((text, column) => {
        const parsed = parseNumber(text);
        return isFaulty(text, column) && parsed.state === 'problem' ? [PROBLEM_TEXTS[parsed.problem]] : [];
      }),
    );
    const faults = this.faults().filter(({ path }) => path.startsWith('fanTable'));
    return [...new Set([...cells, ...faults.map((fault) => fieldFaultText(fault, 'F-psi'))])];
  });

  protected typeCell(row: number, column: number, text: string): void {
    this.rowsChanged.emit(
      this.rows().map((cells, at) =>
        at === row ? Array.from({ length: COLUMNS }, (_, c) => (c === column ? text : (cells[c] ?? ''))) : cells,
      ),
    );
  }

  protected add(): void {
    this.rowsChanged.emit([...this.rows(), ['', '']]);
  }

  protected remove(row: number): void {
    this.rowsChanged.emit(this.rows().filter((_, at) => at !== row));
  }

  /** Several cells at once go into the table from its top; one cell goes where the cursor is. */
  protected pasteInto(event: ClipboardEvent): void {
    const text = event.clipboardData?.getData('text') ?? '';
    if (!/[\t\n]/.test(text.trim())) return;
    event.preventDefault();
    void this.takeOver(text);
  }

  protected async takeOver(text: string): Promise<void> {
    const { pastedRows } = await import('./paste-rows');
    const rows = pastedRows(text);
    this.pasteNote.set(rows.length === 0 ? this.words.nothing : this.words.taken(rows.length));
    if (rows.length > 0) this.rowsChanged.emit(rows);
  }
}

const isFaulty = (text: string, column: number): boolean =>
  parseNumber(text).state === 'problem' && !(column === 1 && isBlankOrDash(text));
