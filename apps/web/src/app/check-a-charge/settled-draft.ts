import { effect, signal, untracked, type Signal } from '@angular/core';
import type { CheckDraft } from '../loose-checks/check-draft';

/** A pause in typing after which half a number is taken for a whole one. */
const PAUSE_MS = 600;

/**
 * The draft as it is judged: at once when nothing is being typed, else after a pause. Otherwise the 5 of 57.3 °F would flash
 * "liquid may be reaching the compressor" at whoever types it. Call in an injection context.
 */
export function settledDraft(draft: Signal<CheckDraft>): Signal<CheckDraft> {
  const settled = signal(draft());
  effect((onCleanup) => {
    const now = draft();
    const isTyping = now.id === untracked(settled).id && Object.keys(now.edits).length > 0;
    if (!isTyping) {
      settled.set(now);
      return;
    }
    const timer = setTimeout(() => settled.set(now), PAUSE_MS);
    onCleanup(() => clearTimeout(timer));
  });
  return settled.asReadonly();
}
