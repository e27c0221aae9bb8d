import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { RouterLink } from '@angular/router';
import { WORKED_EXAMPLES, type WorkedExample } from '@chargewright/engine/training';
import { safetyWords, setupWords, workedExampleStories, workedExampleWords } from '@chargewright/wording';
import { UnitPreference } from '../quantities/unit-preference';

const words = workedExampleWords.list;

/** "R-22 · Fixed orifice" */
function aboutOf(example: WorkedExample): string {
  switch (example.kind) {
    case 'check': {
      const { refrigerant, meteringDevice } = example.request.setup;
      return `${refrigerant} · ${setupWords.meteringDevice.options[meteringDevice].label}`;
    }
    case 'moist-air':
      return words.air;
    case 'weigh-in':
      return words.weighIn;
  }
}

/** All worked examples, in the order of teaching. */
@Component({
  selector: 'app-examples-page',
  imports: [RouterLink],
  template: `
    <main id="main">
      <h1 tabindex="-1">{{ words.title }}</h1>
      <p class="intro">{{ words.intro }}</p>
      <ol>
        @for (each of examples(); track each.id) {
          <li>
            <a [routerLink]="['/examples', each.id]">
              <b>{{ each.title }}</b>
              <span>{{ each.teaches }}</span>
              <small>{{ each.about }}</small>
            </a>
          </li>
        }
      </ol>
    </main>
    <footer>
      <p>{{ standing }}</p>
    </footer>
  `,
  styleUrl: './examples-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ExamplesPage {
  private readonly units = inject(UnitPreference);

  protected readonly words = words;
  protected readonly standing = safetyWords.standing;
  protected readonly examples = computed(() => {
    const stories = workedExampleStories(this.units.system());
    return WORKED_EXAMPLES.map((example) => ({ id: example.id, about: aboutOf(example), ...stories[example.id] }));
  });
}
