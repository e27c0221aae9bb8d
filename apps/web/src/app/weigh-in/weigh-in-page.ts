import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { RouterLink } from '@angular/router';
import {
  evaluateWeighIn,
  INSTALLED_LINE_SIZES,
  isKnown,
  isRefrigerantId,
  LINE_SET_KINDS,
  PROCEDURE_IDS,
  readWeighInRequest,
  refrigerantFacts,
  SHORTER_LINE_RULES,
  WEIGH_IN_METHODS,
} from '@chargewright/engine';
import type { FieldFault, WeighInResult as Result } from '@chargewright/engine';
import {
  fieldSafetyWords,
  formatStated,
  procedureWords,
  safetyWords,
  weighInPageWords,
  weighInSays,
  worksheetWords,
} from '@chargewright/wording';
import { ChoiceGroup } from '../check-a-charge/choice-group';
import { FindingAnnouncer } from '../check-a-charge/finding-announcer';
import { flammabilityOf } from '../check-a-charge/flammability';
import { RefrigerantChoice } from '../check-a-charge/refrigerant-choice';
import { checkName } from '../loose-checks/check-name';
import { LooseChecks } from '../loose-checks/loose-checks';
import { StorageNote } from '../loose-checks/storage-note';
import { EMPTY_WORKSHEET, type Worksheet } from '../loose-checks/worksheet';
import { injectWorksheet } from '../loose-checks/worksheets';
import { UnitPreference } from '../quantities/unit-preference';
import { readLeniently } from '../worksheets/read-leniently';
import { sheetRows, type FilledSheet, type SheetField } from '../worksheets/sheet-fields';
import { SheetRows, type SheetTyped } from '../worksheets/sheet-rows';
import { WeighInResult } from './weigh-in-result';
import { knownOfCheck, weighInChoices, weighInFields, weighInRequest } from './weigh-in-sheet';

const words = weighInPageWords;
const EMPTY: FilledSheet = { sheet: EMPTY_WORKSHEET, known: {} };
/** In place of another size: the one that is installed. */
const SAME = 'same';

const sizeChoice = (value: string) => ({
  value,
  label: value === 'other' ? words.size.other : words.size.inches(value),
});

interface Evaluation {
  readonly result: Result | null;
  readonly faults: readonly FieldFault[];
}

/** The charge by the scale, as a person works it out on paper. */
@Component({
  selector: 'app-weigh-in-page',
  imports: [ChoiceGroup, FindingAnnouncer, RefrigerantChoice, RouterLink, SheetRows, StorageNote, WeighInResult],
  templateUrl: './weigh-in-page.html',
  styleUrls: ['../worksheets/sheet-page.scss', './weigh-in-page.scss'],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class WeighInPage {
  private readonly checks = inject(LooseChecks);
  private readonly page = injectWorksheet('weigh-in');

  private readonly before = signal<Worksheet | undefined>(undefined);

  protected readonly words = words;
  protected readonly sheetWords = worksheetWords;
  protected readonly standing = safetyWords.standing;
  protected readonly safety = { nitrogen: fieldSafetyWords.nitrogen, flammable: safetyWords.flammable };
  protected readonly kinds = LINE_SET_KINDS.map((value) => ({ value, ...words.kind.options[value] }));
  protected readonly methods = WEIGH_IN_METHODS.map((value) => ({ value, ...words.method.options[value] }));
  protected readonly sizes = INSTALLED_LINE_SIZES.map(sizeChoice);
  protected readonly includedSizes = [
    { value: SAME, label: words.includedSize.same },
    ...INSTALLED_LINE_SIZES.map(sizeChoice),
  ];
  protected readonly shorter = SHORTER_LINE_RULES.map((value) => ({ value, label: words.shorter.options[value] }));
  protected readonly procedures = PROCEDURE_IDS.map((value) => ({ value, label: procedureWords[value].name }));

  protected readonly system = inject(UnitPreference).system;
  protected readonly filled = computed<FilledSheet | undefined>(() => {
    const sheet = this.page.sheet();
    return sheet && { sheet, known: knownOfCheck(this.checks.current()) };
  });
  private readonly now = computed(() => this.filled() ?? EMPTY);
  protected readonly choices = computed(() => weighInChoices(this.now(), this.checks.current()));
  protected readonly includedSize = computed(() => this.choices().includedLiquidLineSize ?? SAME);
  protected readonly evaluation = computed<Evaluation>(() => {
    const request = weighInRequest(this.now(), this.choices());
    if (request === null) return { result: null, faults: [] };
    const { input, faults } = readLeniently(request, readWeighInRequest);
    return { result: input && evaluateWeighIn(input), faults };
  });
  protected readonly rows = computed(() => {
    const fields = weighInFields(this.now(), this.choices());
    const state = { filled: this.now(), faults: this.evaluation().faults, system: this.system() };
    const rowsOf = (part: readonly SheetField[]) => sheetRows(part, state);
    return {
      nameplate: rowsOf(fields.nameplate),
      line: rowsOf(fields.line),
      includedRate: rowsOf(fields.includedRate),
      corrections: rowsOf(fields.corrections),
      vacuum: rowsOf(fields.vacuum),
      weighed: rowsOf(fields.weighed),
      scale: rowsOf(fields.scale),
      outdoor: rowsOf(fields.outdoor),
    };
  });
  protected readonly burns = computed(() => {
    const { refrigerant } = this.choices();
    return refrigerant !== undefined && flammabilityOf(refrigerant) !== null;
  });
  protected readonly charging = computed(() => {
    const { skin, scale, blend, throttle, recover } = fieldSafetyWords;
    const { refrigerant } = this.choices();
    const isBlend =
      refrigerant !== undefined && isRefrigerantId(refrigerant) && refrigerantFacts(refrigerant).kind === 'blend';
    return [skin, scale, isBlend ? blend : throttle, recover, safetyWords.breathing];
  });
  /** Which rate is taken where the maker's was not typed. */
  protected readonly rateNote = computed(() => {
    const { result } = this.evaluation();
    const { refrigerant = '' } = this.choices();
    if (!result) return '';
    if (result.reason?.code === 'rate-needed') return words.rate.none;
    const { rate } = result;
    if (!rate || rate.origin === 'maker' || !isKnown(rate.rate)) return '';
    const text = formatStated('chargeRateKgPerM', rate.rate.value, this.system());
    return rate.origin === 'liquid-density' ? words.rate.byDensity(text, refrigerant) : words.rate.printed(text);
  });
  protected readonly asksShorter = computed(() => {
    const { result } = this.evaluation();
    return result?.reason?.code === 'shorter-line-rule-needed' || this.choices().shorterLine !== undefined;
  });
  protected readonly procedureName = computed(() => procedureWords[this.choices().procedure].short);
  protected readonly forCheck = computed(() => {
    const { id, createdAt, updatedAt, setup } = this.checks.current();
    if (setup.refrigerant === undefined) return worksheetWords.noCheck;
    return worksheetWords.forCheck(checkName({ id, createdAt, updatedAt, ...setup, readingCount: 0 }));
  });
  protected readonly emptied = computed(() => this.before() !== undefined);
  protected readonly spoken = computed(() => {
    const { result } = this.evaluation();
    return result ? weighInSays(result, this.system()).headline : words.result.choose;
  });

  protected type({ key, value }: SheetTyped): void {
    this.before.set(undefined);
    this.page.type(key, value);
  }

  protected choose(name: string, value: string): void {
    this.before.set(undefined);
    this.page.choose(name, value);
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
