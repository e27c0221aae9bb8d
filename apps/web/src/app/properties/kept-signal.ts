import { signal, type Signal } from '@angular/core';

/** A value of a page that outlives a reload and a look at another page, for as long as the tab is open. */
export interface KeptSignal<Value> {
  readonly value: Signal<Value>;
  set(value: Value): void;
}

/** `read` takes what was stored, whatever it is, and gives undefined for what is not sound. */
export function keptSignal<Value>(
  name: string,
  initial: Value,
  read: (stored: unknown) => Value | undefined,
): KeptSignal<Value> {
  const key = `chargewright.${name}`;
  const value = signal(recall(key, read) ?? initial);
  return {
    value: value.asReadonly(),
    set(next) {
      value.set(next);
      try {
        sessionStorage.setItem(key, JSON.stringify(next));
      } catch {
        // Storage forbidden: the value then lasts as long as the page.
      }
    },
  };
}

function recall<Value>(key: string, read: (stored: unknown) => Value | undefined): Value | undefined {
  try {
    return read(JSON.parse(sessionStorage.getItem(key) ?? 'null'));
  } catch {
    // Storage forbidden or its content damaged: the page starts empty.
    return undefined;
  }
}
