import { ChangeDetectionStrategy, Component, computed, input, output, signal } from '@angular/core';
import { COMMON_REFRIGERANT_IDS, REFRIGERANT_IDS, refrigerantFacts, type RefrigerantId } from '@chargewright/engine';
import { checkPageWords, safetyWords, setupWords } from '@chargewright/wording';
import { ChoiceGroup, type Choice } from './choice-group';
import { flammabilityOf } from './flammability';

const words = checkPageWords.setup;

const choiceOf = (id: RefrigerantId): Choice<RefrigerantId> => ({
  value: id,
  label: id,
  ...(refrigerantFacts(id).grade === 'C' && { hint: words.estimated }),
});

/** Digits and letters decide: "410", "r410a" and "R-410A" find the same. */
const plain = (text: string): string => text.toLowerCase().replace(/[^a-z0-9]/g, '');

const COMMON: ReadonlySet<string> = new Set(COMMON_REFRIGERANT_IDS);
const byNumber = new Intl.Collator('en', { numeric: true });
const OTHERS = REFRIGERANT_IDS.filter((id) => !COMMON.has(id)).toSorted(byNumber.compare);

/** No refrigerant is chosen for the person: the wrong one is the costliest slip. */
@Component({
  selector: 'app-refrigerant-choice',
  imports: [ChoiceGroup],
  template: `
    <app-choice-group
      name="refrigerant"
      [legend]="label"
      [hint]="hint"
      [choices]="common"
      [tabled]="true"
      [chosen]="chosen()"
      (chose)="chose.emit($event)"
    />
    @if (burns()) {
      <p class="safety">{{ safety }}</p>
    }
    <details [open]="chosenIsOther()">
      <summary>{{ words.otherRefrigerants }}</summary>
      <label class="search">
        {{ words.search }}
        <input
          #search
          type="text"
          inputmode="text"
          autocomplete="off"
          autocapitalize="characters"
          spellcheck="false"
          (input)="sought.set(search.value)"
        />
      </label>
      @if (found().length > 0) {
        <app-choice-group
          class="others"
          name="other-refrigerant"
          [legend]="words.otherRefrigerants"
          [legendHidden]="true"
          [choices]="found()"
          [tabled]="true"
          [chosen]="chosen()"
          (chose)="chose.emit($event)"
        />
      } @else {
        <p role="status">{{ words.noneFound }}</p>
      }
    </details>
  `,
  styleUrl: './refrigerant-choice.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RefrigerantChoice {
  readonly chosen = input<string>();

  readonly chose = output<string>();

  protected readonly sought = signal('');

  protected readonly words = words;
  protected readonly label = setupWords.refrigerant.label;
  protected readonly hint = setupWords.refrigerant.hint;
  protected readonly common: readonly Choice[] = COMMON_REFRIGERANT_IDS.map(choiceOf);
  protected readonly safety = safetyWords.flammable;
  protected readonly burns = computed(() => {
    const chosen = this.chosen();
    return chosen !== undefined && flammabilityOf(chosen) !== null;
  });
  protected readonly found = computed<readonly Choice[]>(() => {
    const sought = plain(this.sought());
    return OTHERS.filter((id) => plain(id).includes(sought)).map(choiceOf);
  });
  protected readonly chosenIsOther = computed(() => {
    const chosen = this.chosen();
    return chosen !== undefined && !COMMON.has(chosen);
  });
}
