import { computed, inject, type Signal } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { ActivatedRoute } from '@angular/router';
import { findWorkedExample, WORKED_EXAMPLES, type WorkedExample } from '@chargewright/engine/training';
import { workedExampleStories, type WorkedExampleStory } from '@chargewright/wording';
import { UnitPreference } from '../quantities/unit-preference';

export interface ChosenExample {
  readonly example: WorkedExample;
  readonly story: WorkedExampleStory;
  /** From 1, in the order of teaching. */
  readonly number: number;
}

/** The example that the address names, told in the reader's units; `undefined` where there is none. */
export function chosenExample(): Signal<ChosenExample | undefined> {
  const params = toSignal(inject(ActivatedRoute).paramMap, { requireSync: true });
  const units = inject(UnitPreference);
  return computed(() => {
    const example = findWorkedExample(params().get('id') ?? '');
    if (example === undefined) return undefined;
    return {
      example,
      story: workedExampleStories(units.system())[example.id],
      number: WORKED_EXAMPLES.indexOf(example) + 1,
    };
  });
}
