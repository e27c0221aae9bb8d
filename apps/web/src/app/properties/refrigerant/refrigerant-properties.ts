import { afterNextRender, ChangeDetectionStrategy, Component, computed, inject, Injector, signal } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { ActivatedRoute, Router } from '@angular/router';
import { isRefrigerantId, refrigerantFacts, type RefrigerantId } from '@chargewright/engine';
import {
  checkPageWords,
  formatValue,
  gaugeUnit,
  propertiesWords,
  safetyWords,
  setupWords,
  unitLabel,
} from '@chargewright/wording';
import { flammabilityOf } from '../../check-a-charge/flammability';
import { RefrigerantChoice } from '../../check-a-charge/refrigerant-choice';
import type { TypedValue } from '../../loose-checks/check-draft';
import { UnitPreference } from '../../quantities/unit-preference';
import { keptSignal } from '../kept-signal';
import { Place } from '../place';
import { PlaceFields } from '../place-fields';
import { isBlank, isTypedValue } from '../typed-number';
import { ValueRow } from '../value-row';
import { PrintedCharts } from './printed-charts';
import { RefrigerantFactsCard } from './refrigerant-facts';
import { SaturationCard } from './saturation-card';
import { nearestDegrees, rowsAround } from './saturation-rows';
import {
  isPure,
  PRESSURE_FIELD_UNITS,
  saturationView,
  TEMPERATURE_FIELD_UNITS,
  type SaturationSide,
} from './saturation-view';

/** Both fields; one of them is empty, since only one is what the person said. */
interface SaturationTyped {
  readonly side: SaturationSide;
  readonly pressure?: TypedValue;
  readonly temperature?: TypedValue;
}

const PARAMETER = 'refrigerant';

function readTyped(stored: unknown): SaturationTyped | undefined {
  if (typeof stored !== 'object' || stored === null || !('side' in stored)) return undefined;
  const { side } = stored;
  if (side !== 'pressure' && side !== 'temperature') return undefined;
  const value = (stored as Record<string, unknown>)[side];
  return isTypedValue(value) ? { side, [side]: value } : undefined;
}

/** Pressure and temperature of a saturated refrigerant, both ways, with what a technician has to know of its curves. */
@Component({
  selector: 'app-refrigerant-properties',
  imports: [PlaceFields, PrintedCharts, RefrigerantChoice, RefrigerantFactsCard, SaturationCard, ValueRow],
  templateUrl: './refrigerant-properties.html',
  styleUrl: './refrigerant-properties.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RefrigerantProperties {
  private readonly router = inject(Router);
  private readonly route = inject(ActivatedRoute);
  private readonly injector = inject(Injector);
  private readonly preference = inject(UnitPreference);
  private readonly place = inject(Place);

  private readonly parameters = toSignal(this.route.queryParamMap, { requireSync: true });
  private readonly keptRefrigerant = keptSignal('properties.refrigerant', '', (stored) =>
    typeof stored === 'string' ? stored : undefined,
  );
  private readonly kept = keptSignal<SaturationTyped>('properties.saturation', { side: 'pressure' }, readTyped);

  protected readonly words = propertiesWords.saturation;
  protected readonly tableWords = propertiesWords.table;
  protected readonly cardWords = propertiesWords.card;
  protected readonly factsWords = propertiesWords.facts;
  protected readonly choiceLabel = setupWords.refrigerant.name;
  protected readonly setupWords = checkPageWords.setup;
  protected readonly flammableText = safetyWords.flammable;

  protected readonly typed = this.kept.value;
  protected readonly system = this.preference.system;
  protected readonly atmospherePa = this.place.atmospherePa;
  protected readonly choosing = signal(false);
  protected readonly cardShown = signal(false);

  protected readonly refrigerant = computed((): RefrigerantId | undefined => {
    const named = this.parameters().get(PARAMETER) ?? this.keptRefrigerant.value();
    return isRefrigerantId(named) ? named : undefined;
  });
  protected readonly facts = computed(() => {
    const refrigerant = this.refrigerant();
    return refrigerant && refrigerantFacts(refrigerant);
  });
  protected readonly burns = computed(() => flammabilityOf(this.refrigerant() ?? ''));
  protected readonly pure = computed(() => {
    const refrigerant = this.refrigerant();
    return refrigerant !== undefined && isPure(refrigerant);
  });
  protected readonly pressureUnits = computed(() => PRESSURE_FIELD_UNITS[this.system()]);
  protected readonly temperatureUnits = computed(() => TEMPERATURE_FIELD_UNITS[this.system()]);
  protected readonly temperatureUnit = computed(() => unitLabel(this.temperatureUnits()[0]));
  protected readonly gaugeUnit = computed(() => gaugeUnit(this.system()));

  protected readonly view = computed(() => {
    const refrigerant = this.refrigerant();
    const { side, [side]: typed } = this.typed();
    if (refrigerant === undefined) return null;
    return saturationView({ refrigerant, side, typed, atmospherePa: this.atmospherePa(), system: this.system() });
  });
  protected readonly table = computed(() => {
    const refrigerant = this.refrigerant();
    const atmospherePa = this.atmospherePa();
    const temperatureK = this.view()?.temperatureK ?? null;
    if (refrigerant === undefined || atmospherePa === null || temperatureK === null) return null;
    const system = this.system();
    return {
      caption: this.tableWords.caption(refrigerant, formatValue('pressurePa', atmospherePa, system)),
      nearest: nearestDegrees(system, temperatureK),
      rows: rowsAround({ refrigerant, atmospherePa, system }, temperatureK),
    };
  });

  protected note(side: SaturationSide): string {
    return this.typed().side === side ? '' : (this.view()?.workedOut ?? '');
  }

  protected complaint(side: SaturationSide): string {
    return this.typed().side === side ? (this.view()?.complaint ?? '') : '';
  }

  protected type(side: SaturationSide, value: TypedValue): void {
    const { side: typedSide, [typedSide]: typed } = this.typed();
    // a unit chosen for the empty field beside a typed one is no new question
    if (side !== typedSide && isBlank(value) && !isBlank(typed)) return;
    this.kept.set({ side, [side]: value });
  }

  protected choose(refrigerant: string): void {
    this.choosing.set(false);
    this.keptRefrigerant.set(refrigerant);
    void this.router.navigate([], {
      relativeTo: this.route,
      queryParams: { [PARAMETER]: refrigerant },
      replaceUrl: true,
    });
  }

  protected print(): void {
    this.cardShown.set(true);
    afterNextRender(() => window.print(), { injector: this.injector });
  }
}
