import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import {
  LEAK_SEARCHES,
  PREFLIGHT_ITEMS,
  PREFLIGHT_STATES,
  type LeakSearch,
  type PreflightItem,
  type PreflightState,
} from '@chargewright/engine';
import { checkPageWords, safetyWords, setupWords } from '@chargewright/wording';
import { Glyph } from '../layout/glyph';
import type { DraftVisit, FieldKey } from '../loose-checks/check-draft';
import { ChoiceGroup, type Choice } from './choice-group';
import { ReadingRow } from './reading-row';
import type { FieldView } from './reading-rows';
import type { FieldTyped } from './setup-form';
import { TickBox } from './tick-box';

const words = checkPageWords.preflight;

const STATE_CHOICES: readonly Choice<PreflightState>[] = PREFLIGHT_STATES.map((value) => ({
  value,
  label: words.states[value],
}));

const LEAK_CHOICES: readonly Choice<LeakSearch>[] = LEAK_SEARCHES.map((value) => ({
  value,
  label: setupWords.leakSearch.options[value].label,
}));

/** What is looked at before a reading counts: one tap each, all of it optional. */
@Component({
  selector: 'app-preflight',
  imports: [ChoiceGroup, Glyph, ReadingRow, TickBox],
  templateUrl: './preflight.html',
  styleUrl: './preflight.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Preflight {
  readonly visit = input.required<DraftVisit>();
  readonly fields = input.required<readonly FieldView[]>();

  readonly changed = output<Partial<DraftVisit>>();
  readonly typed = output<FieldTyped>();
  readonly committed = output<FieldKey>();
  readonly advanced = output<FieldKey>();

  protected readonly words = words;
  protected readonly visitWords = checkPageWords.visit;
  protected readonly safety = safetyWords.electricity;
  protected readonly leak = setupWords.leakSearch;
  protected readonly states = STATE_CHOICES;
  protected readonly leakChoices = LEAK_CHOICES;
  protected readonly items = computed(() => {
    const { preflight } = this.visit();
    return PREFLIGHT_ITEMS.map((id) => ({ id, ...setupWords.preflight[id], state: preflight[id] }));
  });
  protected readonly progress = computed(() => {
    const looked = this.items().filter(({ state }) => state === 'ok' || state === 'not-ok');
    return this.words.progress(looked.length, PREFLIGHT_ITEMS.length);
  });

  protected setState(item: PreflightItem, state: PreflightState): void {
    this.changed.emit({ preflight: { [item]: state } });
  }
}
