import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MOIST_AIR_READINGS, type MoistAirReading } from '@chargewright/engine';
import { moistAirWords } from '@chargewright/wording';
import type { TypedValue } from '../../loose-checks/check-draft';
import { UnitPreference } from '../../quantities/unit-preference';
import { keptSignal } from '../kept-signal';
import { Place } from '../place';
import { PlaceFields } from '../place-fields';
import { isTypedValue } from '../typed-number';
import { ValueRow } from '../value-row';
import { airLines } from './air-lines';
import { airUnits, airView, type AirPair } from './air-view';
import { PsychrometricChart } from './psychrometric-chart';

interface AirTyped {
  readonly pair: AirPair;
  /** What was typed for a reading stays when another is chosen in its place. */
  readonly values: Readonly<Partial<Record<MoistAirReading, TypedValue>>>;
}

const START: AirTyped = { pair: ['dryBulbK', 'wetBulbK'], values: {} };

const isReading = (text: unknown): text is MoistAirReading => MOIST_AIR_READINGS.some((reading) => reading === text);

function readTyped(stored: unknown): AirTyped | undefined {
  if (typeof stored !== 'object' || stored === null || !('pair' in stored) || !('values' in stored)) return undefined;
  const { pair, values } = stored;
  if (!Array.isArray(pair) || typeof values !== 'object' || values === null) return undefined;
  const [first, second] = pair as readonly unknown[];
  if (!isReading(first) || !isReading(second) || first === second) return undefined;
  const sound = Object.entries(values).filter(([reading, value]) => isReading(reading) && isTypedValue(value));
  return { pair: [first, second], values: Object.fromEntries(sound) };
}

/** Moist air from any two readings that settle it: every property, and its place on the psychrometric chart. */
@Component({
  selector: 'app-air-properties',
  imports: [PlaceFields, PsychrometricChart, ValueRow],
  templateUrl: './air-properties.html',
  styleUrl: './air-properties.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AirProperties {
  private readonly preference = inject(UnitPreference);
  private readonly place = inject(Place);
  private readonly kept = keptSignal('properties.air', START, readTyped);

  protected readonly words = moistAirWords;
  protected readonly readings = MOIST_AIR_READINGS;
  protected readonly system = this.preference.system;

  protected readonly view = computed(() =>
    airView({ ...this.kept.value(), atmospherePa: this.place.atmospherePa(), system: this.system() }),
  );
  protected readonly rows = computed(() => {
    const { pair, values } = this.kept.value();
    const { complaints } = this.view();
    return pair.map((reading, place) => ({
      place,
      reading,
      id: `air-${place}`,
      choose: place === 0 ? this.words.choose.first : this.words.choose.second,
      other: pair[1 - place],
      value: values[reading],
      units: airUnits(reading, this.system()),
      signed: reading !== 'relativeHumidityRatio' && reading !== 'humidityRatio',
      complaint: complaints[reading] ?? '',
    }));
  });
  protected readonly isRefused = computed(() => {
    const { note, complaints } = this.view();
    return note !== '' || Object.values(complaints).some((complaint) => complaint !== '');
  });
  protected readonly lines = computed(() => {
    const { air } = this.view();
    return air ? airLines(air, this.system()) : [];
  });
  protected readonly zero = computed(() =>
    this.system() === 'F-psi' ? this.words.zero.inchPound : this.words.zero.metric,
  );

  protected choose(place: number, text: string): void {
    if (!isReading(text)) return;
    const { pair, values } = this.kept.value();
    const next: AirPair = place === 0 ? [text, pair[1]] : [pair[0], text];
    if (next[0] !== next[1]) this.kept.set({ pair: next, values });
  }

  protected type(reading: MoistAirReading, value: TypedValue): void {
    const { pair, values } = this.kept.value();
    this.kept.set({ pair, values: { ...values, [reading]: value } });
  }

  protected print(): void {
    window.print();
  }
}
