/** Where a gauge or a wet bulb is read: elevation and barometer as typed, and the air pressure they mean. */
import { Injectable, computed, inject } from '@angular/core';
import { siteAtmosphere, type Amount, type LengthUnit, type PressureUnit } from '@chargewright/engine';
import { faultText } from '@chargewright/wording';
import type { TypedValue } from '../loose-checks/check-draft';
import { UnitPreference } from '../quantities/unit-preference';
import { RememberedElevation } from '../check-a-charge/remembered-elevation';
import { keptSignal } from './kept-signal';
import { isBlank, isTypedValue, readNumber, unitAmong } from './typed-number';

const ELEVATION_UNITS = ['ft', 'm'] as const satisfies readonly LengthUnit[];
const BAROMETER_UNITS = ['psia', 'kPaa', 'bara'] as const satisfies readonly PressureUnit[];

const typedOrNothing = (stored: unknown): TypedValue | undefined => (isTypedValue(stored) ? stored : undefined);

function amountOf<Unit extends string>(value: number | undefined, unit: Unit | undefined): Amount<Unit> | undefined {
  return value === undefined || unit === undefined ? undefined : { value, unit };
}

@Injectable({ providedIn: 'root' })
export class Place {
  private readonly preference = inject(UnitPreference);
  private readonly remembered = inject(RememberedElevation);
  private readonly keptElevation = keptSignal('place.elevation', this.remembered.recall(), typedOrNothing);
  private readonly keptBarometer = keptSignal<TypedValue | undefined>('place.barometer', undefined, typedOrNothing);

  readonly elevation = this.keptElevation.value;
  readonly barometer = this.keptBarometer.value;

  private readonly elevationRead = computed(() => readNumber(this.elevation()));
  private readonly barometerRead = computed(() => readNumber(this.barometer()));

  private readonly site = computed(() => {
    const elevation = amountOf(this.elevationRead().value, unitAmong(ELEVATION_UNITS, this.elevation()?.unit));
    const stationPressure = amountOf(this.barometerRead().value, unitAmong(BAROMETER_UNITS, this.barometer()?.unit));
    return siteAtmosphere({ ...(elevation && { elevation }), ...(stationPressure && { stationPressure }) });
  });

  /** Absolute; null while elevation or barometer cannot be, or are no numbers yet. */
  readonly atmospherePa = computed(() =>
    this.elevationRead().complaint || this.barometerRead().complaint ? null : this.site().pressurePa,
  );
  readonly isSeaLevelAssumed = computed(() => isBlank(this.elevation()) && isBlank(this.barometer()));
  readonly elevationComplaint = computed(() => this.elevationRead().complaint || this.faultAt('elevation'));
  readonly barometerComplaint = computed(() => this.barometerRead().complaint || this.faultAt('stationPressure'));

  typeElevation(typed: TypedValue): void {
    this.keptElevation.set(typed);
  }

  typeBarometer(typed: TypedValue): void {
    this.keptBarometer.set(typed);
  }

  /** A sound elevation is the one the next check starts with, too. */
  rememberElevation(): void {
    const elevation = this.elevation();
    if (elevation && !isBlank(elevation) && this.elevationComplaint() === '') this.remembered.remember(elevation);
  }

  private faultAt(path: string): string {
    const fault = this.site().faults.find((each) => each.path === path);
    return fault === undefined ? '' : faultText(fault, this.preference.system());
  }
}
