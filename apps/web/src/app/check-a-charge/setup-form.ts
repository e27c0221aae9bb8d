import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { HIGH_SIDE_PORTS, METERING_DEVICES, MODES, STAGES, SYSTEM_KINDS, type SetupField } from '@chargewright/engine';
import { checkPageWords, setupWords, type SetupFieldWords } from '@chargewright/wording';
import type { CheckDraft, DraftSetup, FieldKey, TypedValue } from '../loose-checks/check-draft';
import { ChoiceGroup, type Choice } from './choice-group';
import { ReadingRow } from './reading-row';
import type { FieldView } from './reading-rows';
import { RefrigerantChoice } from './refrigerant-choice';

export interface FieldTyped {
  readonly key: FieldKey;
  readonly value: TypedValue;
}

const choicesOf = <Option extends string>(
  options: readonly Option[],
  words: SetupFieldWords<Option>,
  hinted: boolean,
): readonly Choice<Option>[] =>
  options.map((value) => {
    const { label, hint } = words.options[value];
    return { value, label, ...(hinted && hint !== '' && { hint }) };
  });

/** The engine's own assumptions when nothing is stated (design.md 4). */
const ASSUMED = { kind: 'split', mode: 'cooling', stage: 'full', highSidePort: 'liquid' } as const satisfies Required<
  Pick<DraftSetup, SetupField>
>;

const SYSTEM_FIELDS = [
  { field: 'kind', choices: choicesOf(SYSTEM_KINDS, setupWords.kind, false) },
  { field: 'mode', choices: choicesOf(MODES, setupWords.mode, false) },
  { field: 'stage', choices: choicesOf(STAGES, setupWords.stage, false) },
  { field: 'highSidePort', choices: choicesOf(HIGH_SIDE_PORTS, setupWords.highSidePort, false) },
] as const;

/** What must be right before any reading. */
@Component({
  selector: 'app-setup-form',
  imports: [ChoiceGroup, ReadingRow, RefrigerantChoice],
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
  protected readonly meteringChoices = choicesOf(METERING_DEVICES, setupWords.meteringDevice, true);
  protected readonly setup = computed(() => this.draft().setup);
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
