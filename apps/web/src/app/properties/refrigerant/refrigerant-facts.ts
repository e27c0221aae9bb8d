import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import {
  attempt,
  dewPressurePa,
  glideK,
  refrigerantFacts,
  refrigerantModel,
  saturationModelLimitK,
  saturationRange,
  temperatureToK,
  type RefrigerantId,
} from '@chargewright/engine';
import { formatShort, formatTrimmed, formatValue, propertiesWords, type UnitSystem } from '@chargewright/wording';

/** A usual evaporating temperature. */
const GLIDE_AT_K = temperatureToK(40, 'degF');

/** What a refrigerant is, and how well it is known. */
@Component({
  selector: 'app-refrigerant-facts',
  imports: [RouterLink],
  template: `
    <h2>{{ words.title }}</h2>
    <dl>
      @for (fact of facts(); track fact.name) {
        <dt>{{ fact.name }}</dt>
        <dd [class.doubt]="fact.doubt">{{ fact.value }}</dd>
      }
    </dl>
    <a routerLink="/sources" [queryParams]="{ search: refrigerant() }">{{ words.sources }}</a>
  `,
  styles: `
    :host {
      display: block;
    }
    h2 {
      margin-bottom: 6px;
      font-size: 1rem;
    }
    dl {
      display: grid;
      grid-template-columns: auto 1fr;
      gap: 6px 14px;
    }
    dt {
      color: var(--soft);
    }
    .doubt {
      padding-inline-start: 8px;
      border-inline-start: 3px solid var(--brass);
    }
    a {
      display: inline-flex;
      align-items: center;
      min-height: 48px;
      color: var(--plum);
      font-weight: 600;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RefrigerantFactsCard {
  readonly refrigerant = input.required<RefrigerantId>();
  readonly system = input.required<UnitSystem>();

  protected readonly words = propertiesWords.facts;
  protected readonly facts = computed(() => {
    const refrigerant = this.refrigerant();
    const system = this.system();
    const { safetyClass, grade, kind, doubtful, criticalTemperatureK, criticalPressurePa } =
      refrigerantFacts(refrigerant);
    const { composition } = refrigerantModel(refrigerant);
    const { minTemperatureK, maxTemperatureK } = saturationRange(refrigerant);
    const temperature = (kelvin: number) => formatValue('temperatureK', kelvin, system);
    const { words } = this;
    const fact = (name: string, value: string, doubt = false) => ({ name, value, doubt });
    return [
      fact(words.safetyClass, `${safetyClass} (${words.safetyClassNote})`),
      ...(kind === 'pure'
        ? []
        : [
            fact(
              words.composition,
              composition.map(({ id, massFraction }) => `${id} ${percent(massFraction)}`).join(', '),
            ),
            fact(words.glide, this.glide(refrigerant, system)),
          ]),
      fact(words.grade, words.grades[kind === 'pure' ? kind : grade], grade === 'C'),
      ...(doubtful ? [fact(words.doubt, words.doubtful, true)] : []),
      fact(words.plusMinus, words.plusMinusOf(formatValue('differenceK', saturationModelLimitK(refrigerant), system))),
      fact(words.range, words.rangeOf(temperature(minTemperatureK), temperature(maxTemperatureK))),
      fact(
        words.critical,
        words.criticalOf(temperature(criticalTemperatureK), formatValue('pressurePa', criticalPressurePa, system)),
      ),
    ];
  });

  private glide(refrigerant: RefrigerantId, system: UnitSystem): string {
    const glide = attempt(() =>
      glideK({ refrigerant, pressurePa: dewPressurePa({ refrigerant, temperatureK: GLIDE_AT_K }) }),
    );
    if (!glide.ok) return this.words.unknown;
    return this.words.glideAt(
      formatValue('differenceK', glide.value, system),
      formatShort('temperatureK', GLIDE_AT_K, system),
    );
  }
}

const percent = (fraction: number): string => `${formatTrimmed(100 * fraction, 2)} %`;
