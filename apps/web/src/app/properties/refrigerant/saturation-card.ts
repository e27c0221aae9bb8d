import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { engineVersion, refrigerantFacts, type RefrigerantId } from '@chargewright/engine';
import {
  formatValue,
  gaugeUnit,
  propertiesWords,
  safetyWords,
  unitLabel,
  type UnitSystem,
} from '@chargewright/wording';
import { Place } from '../place';
import { cardRows } from './saturation-rows';
import { isPure } from './saturation-view';

const COLUMNS = 3;

/** The whole pressure-temperature table of a refrigerant on one page of paper. */
@Component({
  selector: 'app-saturation-card',
  templateUrl: './saturation-card.html',
  styleUrl: './saturation-card.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SaturationCard {
  private readonly place = inject(Place);

  readonly refrigerant = input.required<RefrigerantId>();
  readonly atmospherePa = input.required<number>();
  readonly system = input.required<UnitSystem>();

  protected readonly words = propertiesWords.card;
  protected readonly tableWords = propertiesWords.table;
  protected readonly standing = safetyWords.standing;
  protected readonly facts = computed(() => refrigerantFacts(this.refrigerant()));
  protected readonly pure = computed(() => isPure(this.refrigerant()));
  protected readonly temperatureUnit = computed(() => unitLabel(this.system() === 'F-psi' ? 'degF' : 'degC'));
  protected readonly pressureUnit = computed(() => gaugeUnit(this.system()));
  protected readonly grade = computed(() => {
    const { grade, kind, doubtful } = this.facts();
    const { grades, doubt, doubtful: doubtfulText } = propertiesWords.facts;
    const text = grades[kind === 'pure' ? kind : grade];
    return doubtful ? `${text} ${doubt}: ${doubtfulText}` : text;
  });
  protected readonly where = computed(() => {
    const gauge = this.words.gauge(formatValue('pressurePa', this.atmospherePa(), this.system()));
    const elevation = this.place.elevation();
    if (!elevation || elevation.text.trim() === '') return gauge;
    return `${gauge} ${this.words.elevation(`${elevation.text} ${unitLabel(elevation.unit)}`)}`;
  });
  protected readonly origin = computed(() => this.words.origin(engineVersion()));

  /** Read downwards, then across, as a printed chart is. */
  protected readonly blocks = computed(() => {
    const rows = cardRows({
      refrigerant: this.refrigerant(),
      atmospherePa: this.atmospherePa(),
      system: this.system(),
    });
    const length = Math.ceil(rows.length / COLUMNS);
    return Array.from({ length: COLUMNS }, (_, k) => rows.slice(k * length, (k + 1) * length));
  });
}
