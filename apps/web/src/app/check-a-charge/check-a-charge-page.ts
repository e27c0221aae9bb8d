import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  ElementRef,
  inject,
  Injector,
  linkedSignal,
  signal,
  untracked,
} from '@angular/core';
import { Router } from '@angular/router';
import { checkPageWords, looseChecksWords, safetyWords } from '@chargewright/wording';
import type { TypedField } from '@chargewright/contract/typed-fields';
import type { DraftSetup, DraftVisit, FieldKey } from '../loose-checks/check-draft';
import { LooseChecks } from '../loose-checks/loose-checks';
import { StorageNote } from '../loose-checks/storage-note';
import { NOW } from '../loose-checks/time-and-ids';
import { InstallButton } from '../offline/install-button';
import { NetworkNote } from '../offline/network-note';
import { goToNextField } from '../quantities/next-field';
import { UnitPreference } from '../quantities/unit-preference';
import { exampleCheck } from './example-check';
import { readingKey, typedKey } from './field-key';
import { afterPaint } from '../loose-checks/after-paint';
import { DiagnosisCard } from '../diagnosis/diagnosis-card';
import { SeparatingTests } from '../diagnosis/separating-tests';
import { FirstSet } from './first-set';
import { FindingAnnouncer } from './finding-announcer';
import { goToControl, type StepPlace } from './next-step-place';
import { Glance } from './glance';
import { Judge } from './judge';
import { loadLaterParts } from './later-parts';
import { PageClock } from './page-clock';
import { sectionWords, setupFields, setupMoreFields, VISIT_FIELDS } from './page-fields';
import { Preflight } from './preflight';
import { ReadingHelpTexts } from './reading-help-texts';
import { ReadingRow } from './reading-row';
import { humidityShown, readingSections } from './reading-order';
import { fieldView, inputId, isOpen, type FieldView, type PageState } from './reading-rows';
import { RememberedElevation } from './remembered-elevation';
import { asksTargetPort, runningMinutes } from './request-from-draft';
import { ResultColumn } from './result-column';
import { ResultSheet } from './result-sheet';
import { bareSummary } from './result-summary';
import { settledDraft } from './settled-draft';
import { SetupForm, type FieldTyped } from './setup-form';
import { plateTitle, SetupPlate } from './setup-plate';
import { TargetPort } from './target-port';
import { VisitClock } from './visit-clock';

const MS_PER_MINUTE = 60_000;

/** Text fields bring the keyboard up, which takes the sheet's room. */
const isTextField = (target: EventTarget | null): boolean =>
  target instanceof HTMLInputElement && target.type === 'text';

/** Judges one system: setup first, then the readings in the order of the method, the finding growing beside them. */
@Component({
  selector: 'app-check-a-charge-page',
  imports: [
    DiagnosisCard,
    FindingAnnouncer,
    FirstSet,
    Glance,
    InstallButton,
    NetworkNote,
    Preflight,
    ReadingRow,
    ResultColumn,
    ResultSheet,
    SeparatingTests,
    SetupForm,
    SetupPlate,
    StorageNote,
    TargetPort,
    VisitClock,
  ],
  providers: [PageClock],
  templateUrl: './check-a-charge-page.html',
  styleUrl: './check-a-charge-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '(focusin)': 'notice($event.target)', '(focusout)': 'notice($event.relatedTarget)' },
})
export class CheckAChargePage {
  private readonly checks = inject(LooseChecks);
  private readonly units = inject(UnitPreference);
  private readonly elevation = inject(RememberedElevation);
  private readonly judge = inject(Judge);
  private readonly clock = inject(PageClock);
  private readonly now = inject(NOW);
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);
  private readonly injector = inject(Injector);
  private readonly router = inject(Router);

  protected readonly draft = this.checks.current;
  protected readonly isSetUp = computed(() => {
    const { refrigerant, meteringDevice } = this.draft().setup;
    return refrigerant !== undefined && meteringDevice !== undefined;
  });
  /** On its own, so that what hangs on the check is not reset by each change within it. */
  private readonly checkId = computed(() => this.draft().id);
  private readonly settled = settledDraft(this.draft);
  private readonly humidityChosen = linkedSignal<string, boolean | undefined>({
    source: this.checkId,
    computation: () => undefined,
  });
  /** Open from the start while a check is not set up; later when the person wants to change it. */
  private readonly setupWanted = linkedSignal({
    source: this.checkId,
    computation: () => !untracked(this.isSetUp),
  });
  protected readonly fieldInUse = signal(false);
  /** One number fills the screen. */
  protected readonly glancing = signal(false);
  private readonly exampleCleared = linkedSignal<string, string | undefined>({
    source: this.checkId,
    computation: () => undefined,
  });

  protected readonly words = checkPageWords;
  protected readonly checkWords = looseChecksWords;
  protected readonly standing = safetyWords.standing;
  protected readonly sectionWords = sectionWords;
  protected readonly system = this.units.system;
  protected readonly isLoading = computed(() => this.checks.state() === 'loading');
  protected readonly retaken = this.checks.retaken;
  protected readonly canUndoClear = computed(
    () => this.exampleCleared() !== undefined && this.exampleCleared() === this.checks.removed(),
  );
  protected readonly setupOpen = computed(() => this.setupWanted() || !this.isSetUp());
  protected readonly setupMissing = computed(() => {
    const { refrigerant, meteringDevice } = this.draft().setup;
    const words = this.words.setup;
    if (refrigerant === undefined && meteringDevice === undefined) return words.missingBoth;
    if (refrigerant === undefined) return words.missingRefrigerant;
    return meteringDevice === undefined ? words.missingMetering : '';
  });

  protected readonly evaluation = computed(() => this.judge.evaluate(this.settled(), this.clock.nowMs()));
  /** Input and result of one judgement, together or not at all. */
  protected readonly judged = computed(() => {
    const { input, result } = this.evaluation();
    return input && result && { input, result };
  });
  protected readonly pageState = computed<PageState>(() => ({
    draft: this.draft(),
    evaluation: this.evaluation(),
    system: this.system(),
    nowMs: this.clock.nowMs(),
  }));
  protected readonly nowMs = computed(() => this.clock.nowMs());
  protected readonly asksSecondSet = computed(
    () => this.evaluation().result?.overall.nextStep.code === 'read-twice' && this.hasReadings(),
  );
  protected readonly byHumidity = computed(() => humidityShown(this.draft(), this.humidityChosen()));
  protected readonly sections = computed(() => {
    const page = this.pageState();
    return readingSections(this.draft(), this.byHumidity()).map(({ id, fields }) => ({
      id,
      ...sectionWords[id],
      fields: fields.map((key) => fieldView(key, page)),
    }));
  });
  protected readonly asked = computed(() => this.sections().filter(({ id }) => id !== 'more'));
  protected readonly more = computed(() => this.sections().filter(({ id }) => id === 'more'));
  protected readonly setupFields = computed(() => this.viewsOf(setupFields(this.draft().setup)));
  protected readonly setupMoreFields = computed(() => this.viewsOf(setupMoreFields(this.draft().setup)));
  protected readonly visitFields = computed(() => this.viewsOf(VISIT_FIELDS));
  protected readonly minutes = computed(() => runningMinutes(this.draft(), this.clock.nowMs()));
  protected readonly hasExample = computed(() =>
    Object.values(this.draft().readings).some(({ source }) => source === 'example'),
  );
  protected readonly hasReadings = computed(
    () =>
      Object.keys(this.draft().readings).length > 0 ||
      Object.keys(this.settled().edits).some((key) => key.startsWith('reading:')),
  );
  protected readonly summary = computed(() => {
    const words = this.words.result;
    return (
      this.judge.part()?.summarise(this.evaluation(), this.hasReadings(), this.system()) ??
      bareSummary(this.judge.isMissing() ? words.notLoaded : words.loading)
    );
  });
  protected readonly sheetSummary = computed(() =>
    this.setupOpen() ? bareSummary(this.setupMissing() || plateTitle(this.draft())) : this.summary(),
  );
  protected readonly next = computed<FieldView | undefined>(() =>
    this.summary().isRefused
      ? undefined
      : this.asked()
          .flatMap(({ fields }) => fields)
          .find(isOpen),
  );
  /** A step in the setup comes before any reading, one among the readings after the last. */
  private readonly place = computed(() => {
    const { place } = this.summary();
    return place?.view === 'setup' || !this.next() ? place : null;
  });
  protected readonly mainButton = computed(() => {
    if (this.setupOpen()) return this.words.setup.done;
    const place = this.place();
    return place ? this.words.result.placeButton[place.view] : undefined;
  });

  constructor() {
    const help = inject(ReadingHelpTexts);
    afterNextRender(() =>
      afterPaint(this.host.nativeElement.ownerDocument, () => {
        void this.judge.load();
        void loadLaterParts();
        void help.load();
      }),
    );
  }

  protected choose(setup: Partial<DraftSetup>): void {
    this.recallElevation();
    this.checks.choose(setup);
  }

  protected changeVisit(patch: Partial<DraftVisit>): void {
    this.checks.visit(patch);
  }

  protected type({ key, value }: FieldTyped): void {
    this.checks.type(key, value);
  }

  protected commit(key: FieldKey): void {
    this.checks.commit(key);
    void this.judge.load();
    this.clock.tick();
    const { elevation } = this.draft().typed;
    if (key === 'typed:elevation' && elevation) this.elevation.remember(elevation);
  }

  protected fillWithExample(): void {
    this.checks.fillWithExample(exampleCheck(this.system(), this.now().getTime()));
    this.setupWanted.set(false);
    this.clock.tick();
    this.startAtTop();
  }

  protected async clearExample(): Promise<void> {
    const { id } = this.draft();
    await this.checks.remove(id);
    this.exampleCleared.set(id);
    this.startAtTop();
  }

  protected async undoClear(): Promise<void> {
    await this.checks.undoRemove();
    this.clock.tick();
    this.startAtTop();
  }

  protected startNew(): void {
    this.checks.startNew();
    this.startAtTop();
  }

  protected openSetup(): void {
    this.setupWanted.set(true);
    this.startAtTop();
  }

  protected closeSetup(): void {
    if (!this.isSetUp()) {
      this.goTo(`input[name="${this.draft().setup.refrigerant === undefined ? 'refrigerant' : 'meteringDevice'}"]`);
      return;
    }
    this.setupWanted.set(false);
    this.startAtTop();
  }

  protected startClock(minutesAgo: number): void {
    this.checks.visit({ runningSince: new Date(this.now().getTime() - minutesAgo * MS_PER_MINUTE).toISOString() });
    this.clock.tick();
  }

  /** After an adjustment nothing read before it counts. */
  protected restartAfterAdjustment(): void {
    this.checks.retakeAll();
    this.clock.tick();
  }

  protected undoRetake(): void {
    this.checks.undoRetake();
    this.clock.tick();
    this.goTo('app-visit-clock button');
  }

  protected keepFirstSet(): void {
    this.checks.keepFirstSet();
    this.clock.tick();
    this.goTo('app-number-field input');
  }

  protected forgetFirstSet(): void {
    this.checks.forgetFirstSet();
    this.clock.tick();
  }

  protected switchHumidity(): void {
    this.humidityChosen.set(!this.byHumidity());
    const id = this.byHumidity() ? 'returnRelativeHumidity' : 'returnWetBulb';
    this.goTo(`#${inputId(readingKey(id))}`);
  }

  protected isHumidity({ key }: FieldView): boolean {
    return key === 'reading:returnWetBulb' || key === 'reading:returnRelativeHumidity';
  }

  protected asksPort({ key }: FieldView): boolean {
    return key === 'typed:targetSubcooling' && asksTargetPort(this.draft().setup);
  }

  protected pressMain(): void {
    const place = this.place();
    if (this.setupOpen()) this.closeSetup();
    else if (place) this.goToPlace(place);
  }

  /** A control on this page, or a page of its own. */
  protected goToPlace(place: StepPlace): void {
    if (!('control' in place)) {
      void this.router.navigateByUrl(`/${place.view}`);
      return;
    }
    if (place.view === 'setup') this.openSetup();
    this.goTo(place.control);
  }

  protected goToNext(): void {
    const next = this.next();
    // Within the tap, or some phones do not bring up their keyboard.
    if (next) goToControl(this.host.nativeElement, `#${next.id}`);
  }

  protected advanceFrom(key: FieldKey): void {
    goToNextField(this.host.nativeElement, inputId(key));
  }

  protected notice(target: EventTarget | null): void {
    this.fieldInUse.set(isTextField(target));
  }

  private viewsOf(fields: readonly TypedField[]): readonly FieldView[] {
    return fields.map((field) => fieldView(typedKey(field), this.pageState()));
  }

  /** Once a check is begun it starts with the elevation of the last one. */
  private recallElevation(): void {
    const { typed, edits } = this.draft();
    const remembered = this.elevation.recall();
    if (!remembered || typed.elevation || edits['typed:elevation'] || this.isSetUp()) return;
    this.checks.type('typed:elevation', remembered);
    this.checks.commit('typed:elevation');
  }

  private goTo(control: string): void {
    this.onceShown(() => goToControl(this.host.nativeElement, control));
  }

  /** Another view of the page: from its top, and the keyboard's place with it, since the button pressed is gone. */
  private startAtTop(): void {
    this.host.nativeElement.ownerDocument.defaultView?.scrollTo({ top: 0 });
    this.onceShown(() => this.host.nativeElement.querySelector('h1')?.focus({ preventScroll: true }));
  }

  private onceShown(act: () => void): void {
    afterNextRender(act, { injector: this.injector });
  }
}
