import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { Router, RouterLink } from '@angular/router';
import { AIR_STATED_IN, AIRFLOW_METHODS, COOLING_SPEED_ANSWERS, EFFICIENCY_KINDS, isKnown } from '@chargewright/engine';
import type { AirflowMethod } from '@chargewright/engine';
import {
  airflowPageWords,
  airflowReasonText,
  airflowWords,
  fieldSafetyWords,
  safetyWords,
  worksheetWords,
} from '@chargewright/wording';
import { ChoiceGroup } from '../check-a-charge/choice-group';
import { FindingAnnouncer } from '../check-a-charge/finding-announcer';
import { checkName } from '../loose-checks/check-name';
import { LooseChecks } from '../loose-checks/loose-checks';
import { StorageNote } from '../loose-checks/storage-note';
import { EMPTY_WORKSHEET, type Worksheet } from '../loose-checks/worksheet';
import { injectWorksheet } from '../loose-checks/worksheets';
import { UnitPreference } from '../quantities/unit-preference';
import { shownFigure } from '../worksheets/figure-list';
import { sheetRows, type FilledSheet } from '../worksheets/sheet-fields';
import { SheetRows, type SheetTyped } from '../worksheets/sheet-rows';
import { AirflowResult } from './airflow-result';
import { airflowChoices, methodFields, SITE_FIELDS } from './airflow-sheet';
import { broughtAirflow } from './bring-airflow';
import { CapacityResult } from './capacity-result';
import { capacityFields, HUMIDITY_BY, humidityBy } from './capacity-sheet';
import { evaluateAirflowSheet, evaluateCapacitySheet, tableUnits } from './evaluate-sheet';
import { FanTable } from './fan-table';
import { knownFromCheck } from './known-from-check';

const words = airflowPageWords;

const { electric, gas, blower, drilling } = fieldSafetyWords;

/** Before any reading is taken, where the hazard arises. */
const SAFETY: Readonly<Record<AirflowMethod, readonly string[]>> = {
  measured: [blower],
  'temperature-rise-electric': [electric, blower],
  'temperature-rise-gas': [gas, blower],
  'static-pressure': [drilling, blower],
};

const HEADINGS: Readonly<Record<AirflowMethod, string>> = {
  measured: words.readings.measured,
  'temperature-rise-electric': words.readings.electric,
  'temperature-rise-gas': words.readings.gas,
  'static-pressure': words.readings.static,
};

const EMPTY: FilledSheet = { sheet: EMPTY_WORKSHEET, known: {} };

/** Finds the airflow by one of the methods, below it the capacity, and brings the airflow into the check. */
@Component({
  selector: 'app-airflow-page',
  imports: [AirflowResult, CapacityResult, ChoiceGroup, FanTable, FindingAnnouncer, RouterLink, SheetRows, StorageNote],
  templateUrl: './airflow-page.html',
  styleUrl: '../worksheets/sheet-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AirflowPage {
  private readonly checks = inject(LooseChecks);
  private readonly router = inject(Router);
  private readonly preference = inject(UnitPreference);
  protected readonly page = injectWorksheet('airflow');

  private readonly before = signal<Worksheet | undefined>(undefined);

  protected readonly words = words;
  protected readonly sheetWords = worksheetWords;
  protected readonly standing = safetyWords.standing;
  protected readonly safety = SAFETY;
  protected readonly headings = HEADINGS;
  protected readonly methods = AIRFLOW_METHODS.map((value) => ({ value, ...airflowWords.methods[value] }));
  protected readonly speeds = COOLING_SPEED_ANSWERS.map((value) => ({ value, label: words.speed.answers[value] }));
  protected readonly airs = AIR_STATED_IN.map((value) => ({ value, label: words.shows.options[value] }));
  protected readonly efficiencies = EFFICIENCY_KINDS.map((value) => ({
    value,
    label: words.efficiency.options[value],
  }));
  protected readonly humidities = HUMIDITY_BY.map((value) => ({ value, label: words.capacity.byOptions[value] }));

  protected readonly system = this.preference.system;
  protected readonly filled = computed<FilledSheet | undefined>(() => {
    const sheet = this.page.sheet();
    return sheet && { sheet, known: knownFromCheck(this.checks.current()) };
  });
  private readonly now = computed(() => this.filled() ?? EMPTY);
  protected readonly choices = computed(() => airflowChoices(this.now().sheet));
  protected readonly units = computed(() => tableUnits(this.now(), this.system()));
  protected readonly evaluation = computed(() => evaluateAirflowSheet(this.now(), this.system()));
  protected readonly capacity = computed(() => evaluateCapacitySheet(this.now(), this.evaluation().result));
  private readonly state = computed(() => ({
    filled: this.now(),
    faults: this.evaluation().faults,
    system: this.system(),
  }));
  protected readonly rows = computed(() => sheetRows(methodFields(this.choices()), this.state()));
  protected readonly siteRows = computed(() => sheetRows(SITE_FIELDS, this.state()));
  protected readonly by = computed(() => humidityBy(this.now()));
  protected readonly capacityRows = computed(() =>
    sheetRows(capacityFields(this.by()), { ...this.state(), faults: this.capacity().faults }),
  );
  protected readonly forCheck = computed(() => {
    const { setup } = this.checks.current();
    if (setup.refrigerant === undefined) return worksheetWords.noCheck;
    const { id, createdAt, updatedAt } = this.checks.current();
    return worksheetWords.forCheck(checkName({ id, createdAt, updatedAt, ...setup, readingCount: 0 }));
  });
  protected readonly emptied = computed(() => this.before() !== undefined);
  protected readonly spoken = computed(() => {
    const { result } = this.evaluation();
    if (!result) return words.result.none;
    const figure = shownFigure('', result.airflow, this.system());
    if (figure) return `${words.result.flow(figure.value)} ${figure.plusMinus}`;
    return result.reason ? airflowReasonText(result.reason) : '';
  });

  protected type({ key, value }: SheetTyped): void {
    this.before.set(undefined);
    this.page.type(key, value);
  }

  protected tell(said: Readonly<Record<string, string>>): void {
    for (const [name, value] of Object.entries(said)) this.page.choose(name, value);
  }

  protected useInCheck(): void {
    const { result } = this.evaluation();
    if (!result || !isKnown(result.airflow)) return;
    const { value, workedOut } = broughtAirflow(result.airflow, result.method, this.system());
    this.checks.bringAirflow(value, workedOut);
    void this.router.navigateByUrl('/');
  }

  protected startOver(): void {
    this.before.set(this.now().sheet);
    this.page.replace(EMPTY_WORKSHEET);
  }

  protected putBack(): void {
    const before = this.before();
    if (before) this.page.replace(before);
    this.before.set(undefined);
  }
}
