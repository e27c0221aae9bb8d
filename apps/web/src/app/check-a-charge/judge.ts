import { computed, Injectable, signal } from '@angular/core';
import type { CheckDraft } from '../loose-checks/check-draft';
import type { evaluateDraft } from './evaluate-draft';
import { NOTHING, type Evaluation } from './evaluation';
import type { summarise } from './summarise';

/** What `judging.ts` passes on. */
interface Judging {
  readonly evaluateDraft: typeof evaluateDraft;
  readonly summarise: typeof summarise;
}

/** The engine's judgement and its sentences: half of the page's weight, and wanted only once a system is set up, so fetched after the first paint. */
@Injectable({ providedIn: 'root' })
export class Judge {
  private readonly loaded = signal<Judging | undefined>(undefined);
  private readonly failed = signal(false);

  readonly part = this.loaded.asReadonly();

  /** No network, and the app is not kept on the phone yet. Another call of `load` tries again. */
  readonly isMissing = computed(() => this.loaded() === undefined && this.failed());

  async load(): Promise<void> {
    if (this.loaded()) return;
    try {
      this.loaded.set(await import('./judging'));
    } catch {
      this.failed.set(true);
    }
  }

  evaluate(draft: CheckDraft, nowMs: number): Evaluation {
    return this.loaded()?.evaluateDraft(draft, nowMs) ?? NOTHING;
  }
}
