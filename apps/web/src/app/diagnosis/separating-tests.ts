import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import {
  BULB_STATES,
  VALVE_MOVES,
  type BulbState,
  type CheckInput,
  type CheckResult,
  type TestObservations,
  type ValveMove,
} from '@chargewright/engine';
import { separatingTestWords, type TestId } from '@chargewright/wording';
import { ChoiceGroup, type Choice } from '../check-a-charge/choice-group';
import { ReadingRow } from '../check-a-charge/reading-row';
import { fieldView, type PageState } from '../check-a-charge/reading-rows';
import type { FieldTyped } from '../check-a-charge/setup-form';
import { TickBox } from '../check-a-charge/tick-box';
import { Glyph } from '../layout/glyph';
import type { DraftVisit, FieldKey } from '../loose-checks/check-draft';
import { testOutcomes } from './test-outcomes';

const words = separatingTestWords;

const BULBS: readonly Choice<BulbState>[] = BULB_STATES.map((value) => ({ value, ...words.bulbs[value] }));
const VALVES: readonly Choice<ValveMove>[] = VALVE_MOVES.map((value) => ({ value, ...words.valves[value] }));

/** In the order of their trouble: what needs the system stopped comes late. */
const FIELDS: readonly (readonly [TestId, readonly FieldKey[]])[] = [
  ['drier', ['reading:drierInletTemperature', 'reading:drierOutletTemperature']],
  ['bulb', []],
  ['wetBulb', ['reading:returnWetBulbBefore']],
  ['current', ['reading:compressorCurrent', 'typed:expectedCompressorCurrent']],
  [
    'air',
    ['reading:standingPressure', 'reading:standingOutdoorCoilTemperature', 'reading:standingIndoorCoilTemperature'],
  ],
];

/** Guides for the tests that tell causes apart; each takes its readings down and shows what they say. */
@Component({
  selector: 'app-separating-tests',
  imports: [ChoiceGroup, Glyph, ReadingRow, TickBox],
  templateUrl: './separating-tests.html',
  styleUrl: './separating-tests.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SeparatingTests {
  readonly input = input.required<CheckInput>();
  readonly result = input.required<CheckResult>();
  readonly page = input.required<PageState>();

  readonly changed = output<Partial<DraftVisit>>();
  readonly typed = output<FieldTyped>();
  readonly committed = output<FieldKey>();
  readonly advanced = output<FieldKey>();

  protected readonly words = words;
  protected readonly bulbs = BULBS;
  protected readonly valves = VALVES;
  protected readonly seen = computed<TestObservations>(() => this.page().draft.visit.tests ?? {});
  protected readonly guides = computed(() => {
    const outcomes = testOutcomes(this.input(), this.result(), this.page().system);
    const hasValve = this.input().setup.meteringDevice !== 'fixed-orifice';
    return FIELDS.filter(([id]) => id !== 'bulb' || hasValve).map(([id, fields]) => ({
      id,
      ...words.guides[id],
      ...outcomes[id],
      fields: fields.map((key) => fieldView(key, this.page())),
    }));
  });

  protected see(seen: Partial<TestObservations>): void {
    this.changed.emit({ tests: { ...this.seen(), ...seen } });
  }
}
