/** Where on the page a next step can be done, so that its button leads there. */
import type { AssumedField, CriterionResult, NextStepCode } from '@chargewright/engine';

export type StepPlace =
  | {
      readonly view: 'setup' | 'readings';
      /** Selects the control on the page; the first that it finds is meant. */
      readonly control: string;
    }
  /** A page of its own, at the path of this name. */
  | { readonly view: 'airflow' | 'weigh-in' | 'makers-data' };

const choice = (view: 'setup' | 'readings', name: string): StepPlace => ({ view, control: `input[name="${name}"]` });

/** Steps that are not here are done at the unit. */
const PLACES: Readonly<Partial<Record<NextStepCode, StepPlace>>> = {
  'bring-to-full-stage': choice('setup', 'stage'),
  'bring-to-charge-mode': choice('setup', 'chargeMode'),
  'state-the-port': choice('setup', 'highSidePort'),
  'find-nameplate-target': { view: 'readings', control: '#typed-targetSubcooling' },
  'record-conditions': { view: 'readings', control: 'app-visit-clock button' },
  'read-twice': { view: 'readings', control: 'app-first-set button' },
  'leak-first': choice('readings', 'leakSearch'),
  'measure-airflow': { view: 'airflow' },
  'weigh-in': { view: 'weigh-in' },
  'cooling-season-or-weigh-in': { view: 'weigh-in' },
  'wait-for-warmer-weather': { view: 'weigh-in' },
  'mend-recover-weigh-in': { view: 'weigh-in' },
  'locate-mend-weigh-in': { view: 'weigh-in' },
  'recover-and-weigh-in': { view: 'weigh-in' },
  'bracket-wet-bulb-again': { view: 'readings', control: '#reading-returnWetBulbBefore' },
  'measure-drier-drop': { view: 'readings', control: '#reading-drierInletTemperature' },
  'check-bulb-screen-drier': { view: 'readings', control: '#reading-drierInletTemperature' },
  'find-restriction-recover-nothing': { view: 'readings', control: '#reading-drierInletTemperature' },
  'air-test-then-recover': { view: 'readings', control: '#reading-standingPressure' },
  'check-bulb-and-valve': choice('readings', 'bulb'),
  'check-bulb-and-airflow': choice('readings', 'bulb'),
  'check-bulb-then-recover': choice('readings', 'bulb'),
  'check-bulb-and-screen': choice('readings', 'bulb'),
  'mend-bulb': choice('readings', 'bulb'),
};

/** Where a page of its own is; null for a place on this one. */
export const pathOfPlace = (place: StepPlace | null): string | null =>
  place === null || 'control' in place ? null : `/${place.view}`;

/** Nothing read here can judge such a system, so no reading is asked for. */
const REFUSALS: ReadonlySet<NextStepCode> = new Set(['cooling-season-or-weigh-in', 'weigh-in']);

export const isRefusal = (code: NextStepCode): boolean => REFUSALS.has(code);

/**
 * Where the step is done, by why the deciding criterion is not judged. A target for another port is not sought anew before its port is stated; that of
 * an orifice is entered as the maker's table.
 */
export function placeOfStep(code: NextStepCode, deciding: CriterionResult | null): StepPlace | null {
  const reason = deciding?.reason;
  if (reason?.code === 'target-for-other-port') return choice('readings', 'targetSubcoolingPort');
  if (reason?.code === 'setup-not-stated' && reason.figures.fields.kind === 'setup') {
    return placeOfField(reason.figures.fields.value[0]);
  }
  if (code === 'find-nameplate-target' && deciding?.criterion === 'superheat') return { view: 'makers-data' };
  return PLACES[code] ?? null;
}

const placeOfField = (field: AssumedField | undefined): StepPlace =>
  field === undefined || field === 'elevation'
    ? { view: 'setup', control: '#typed-elevation' }
    : choice('setup', field);

/** Brings a control into sight and gives it the focus, whatever it is folded into. */
export function goToControl(page: HTMLElement, control: string): void {
  const found = page.querySelector<HTMLElement>(control);
  for (let fold = found?.closest('details'); fold; fold = fold.parentElement?.closest('details')) fold.open = true;
  found?.focus();
}
