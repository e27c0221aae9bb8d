import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { RouterLink } from '@angular/router';
import {
  HIGH_SIDE_PORTS,
  METERING_DEVICES,
  MODES,
  PROCEDURE_IDS,
  STAGES,
  SYSTEM_KINDS,
  type SetupField,
} from '@chargewright/engine';
import { checkPageWords, procedureWords, setupWords, type SetupFieldWords } from '@chargewright/wording';
import { TickBox } from './tick-box';
import {
  AIRFLOW_PROOFS,
  CHARGE_MODES,
  type CheckDraft,
  type DraftSetup,
  type FieldKey,
  type TypedValue,
} from '../loose-checks/check-draft';
import { ChoiceGroup } from './choice-group';
import { choicesOf } from './choices';
import { ReadingRow } from './reading-row';
import type { FieldView } from './reading-rows';
import { RefrigerantChoice } from './refrigerant-choice';
import { asksAirflowProof, asksChargeMode, asksTargetPort } from './request-from-draft';
import { TargetPort } from './target-port';

export interface FieldTyped {
  readonly key: FieldKey;
  readonly value: TypedValue;
}

/** The engine's own assumptions when nothing is stated (design.md 4). */
const ASSUMED = { kind: 'split', mode: 'cooling', stage: 'full', highSidePort: 'liquid' } as const satisfies Required<
  Pick<DraftSetup, SetupField>
>;

const SYSTEM_FIELDS = [
  { field: 'kind', choices: choicesOf(SYSTEM_KINDS, setupWords.kind) },
  { field: 'mode', choices: choicesOf(MODES, setupWords.mode) },
  { field: 'stage', choices: choicesOf(STAGES, setupWords.stage) },
  { field: 'highSidePort', choices: choicesOf(HIGH_SIDE_PORTS, setupWords.highSidePort) },
] as const;

/** What must be right before any reading. */
@Component({
  selector: 'app-setup-form',
  imports: [ChoiceGroup, ReadingRow, RefrigerantChoice, RouterLink, TargetPort, TickBox],
  templateUrl: './setup-form.html',
  styleUrl: './setup-form.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SetupForm {
  readonly draft = input.required<CheckDraft>();
  readonly fields = input.required<readonly FieldView[]>();
  readonly moreFields = input.required<readonly FieldView[]>();

  readonly chose = output<Partial<DraftSetup>>();
  readonly typed = output<FieldTyped>();
  readonly committed = output<FieldKey>();
  readonly advanced = output<FieldKey>();

  protected readonly words = checkPageWords.setup;
  protected readonly metering = setupWords.meteringDevice;
  protected readonly meteringChoices = choicesOf(METERING_DEVICES, setupWords.meteringDevice, 'hinted');
  protected readonly chargeMode = setupWords.chargeMode;
  protected readonly chargeModes = choicesOf(CHARGE_MODES, setupWords.chargeMode);
  protected readonly procedureField = setupWords.procedure;
  protected readonly procedures = PROCEDURE_IDS.map((value) => ({ value, label: procedureWords[value].name }));
  protected readonly setup = computed(() => this.draft().setup);
  /** What is to be known about the chosen rules: which of their figures rest on memory. */
  protected readonly procedureHint = computed(() => procedureWords[this.setup().procedure ?? 'general-rules'].note);
  protected readonly asksTargetPort = computed(() => asksTargetPort(this.setup()));
  protected readonly asksChargeMode = computed(() => asksChargeMode(this.setup()));
  protected readonly airflowProof = setupWords.airflowProof;
  protected readonly airflowProofs = choicesOf(AIRFLOW_PROOFS, setupWords.airflowProof, 'hinted');
  protected readonly alteration = setupWords.alteration;
  protected readonly highVelocity = setupWords.highVelocity;
  protected readonly asksAirflowProof = computed(() => asksAirflowProof(this.setup()));
  protected readonly unconfirmed = computed(() =>
    SYSTEM_FIELDS.filter(({ field }) => this.setup()[field] === undefined),
  );
  protected readonly system = computed(() =>
    SYSTEM_FIELDS.map(({ field, choices }) => ({
      field,
      choices: choices,
      label: setupWords[field].label,
      chosen: this.setup()[field],
      assumed: ASSUMED[field],
      hint: this.hintOf(field),
    })),
  );

  protected confirmAssumed(): void {
    this.chose.emit({ ...ASSUMED, ...this.setup() });
  }

  /** The choices of the template come from the lists above, so the value belongs to the field. */
  protected choose(field: keyof DraftSetup, value: string): void {
    this.chose.emit({ [field]: value });
  }

  private hintOf(field: SetupField): string {
    const words: SetupFieldWords<string> = setupWords[field];
    const chosen = this.setup()[field];
    const hint = chosen === undefined ? '' : words.options[chosen]?.hint;
    return hint === '' || hint === undefined ? words.hint : hint;
  }
}
