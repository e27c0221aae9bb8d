import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { formatValue, propertiesWords, setupWords, type UnitSystem } from '@chargewright/wording';
import { Glyph } from '../layout/glyph';
import { UnitPreference } from '../quantities/unit-preference';
import { Place } from './place';
import { ValueRow } from './value-row';

const ELEVATION_UNITS: Readonly<Record<UnitSystem, readonly [string, ...string[]]>> = {
  'F-psi': ['ft'],
  'C-kPa': ['m'],
  'C-bar': ['m'],
};
const BAROMETER_UNITS: Readonly<Record<UnitSystem, readonly [string, ...string[]]>> = {
  'F-psi': ['psia'],
  'C-kPa': ['kPaa'],
  'C-bar': ['bara', 'kPaa'],
};

/** Elevation or barometer: what gauges count from, and what moist air stands under. */
@Component({
  selector: 'app-place-fields',
  imports: [Glyph, ValueRow],
  template: `
    <details #box [open]="opened() || isFaulty()" (toggle)="opened.set(box.open)">
      <summary>
        <span>
          <b>{{ words.title }}</b>
          <small role="status" [class.assumed]="place.isSeaLevelAssumed()">{{ atmosphere() }}</small>
        </span>
        <app-glyph name="chevron" />
      </summary>
      <p class="note">{{ words.note }}</p>
      <app-value-row
        fieldId="elevation"
        [label]="elevationWords.label"
        [value]="place.elevation()"
        [units]="elevationUnits()"
        [signed]="true"
        [complaint]="place.elevationComplaint()"
        (typed)="place.typeElevation($event)"
        (committed)="place.rememberElevation()"
      />
      <app-value-row
        fieldId="barometer"
        [label]="barometerWords.label"
        [note]="barometerWords.hint"
        [value]="place.barometer()"
        [units]="barometerUnits()"
        [complaint]="place.barometerComplaint()"
        (typed)="place.typeBarometer($event)"
      />
    </details>
  `,
  styles: `
    :host {
      display: block;
    }
    summary {
      display: flex;
      align-items: center;
      justify-content: space-between;
      gap: 12px;
      min-height: 56px;
      padding: 6px 14px;
      cursor: pointer;
      list-style: none;
    }
    b,
    small {
      display: block;
    }
    small,
    .note {
      color: var(--soft);
      font-size: 0.9375rem;
    }
    .assumed {
      color: var(--brass);
    }
    .note {
      padding: 0 14px;
    }
    app-glyph {
      flex: none;
      color: var(--plum);
    }
    [open] app-glyph {
      rotate: 180deg;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PlaceFields {
  private readonly preference = inject(UnitPreference);
  protected readonly place = inject(Place);

  protected readonly words = propertiesWords.place;
  protected readonly elevationWords = setupWords.numbers.elevation;
  protected readonly barometerWords = setupWords.numbers.stationPressure;
  protected readonly elevationUnits = computed(() => ELEVATION_UNITS[this.preference.system()]);
  protected readonly barometerUnits = computed(() => BAROMETER_UNITS[this.preference.system()]);
  /** Stays as the person left it: a fault that is mended must not shut the field in use. */
  protected readonly opened = signal(false);
  protected readonly isFaulty = computed(() => this.place.atmospherePa() === null);
  protected readonly atmosphere = computed(() => {
    const pressurePa = this.place.atmospherePa();
    if (pressurePa === null) return this.words.unknown;
    const { atmosphere, seaLevel } = this.words;
    const say = this.place.isSeaLevelAssumed() ? seaLevel : atmosphere;
    return say(formatValue('pressurePa', pressurePa, this.preference.system()));
  });
}
