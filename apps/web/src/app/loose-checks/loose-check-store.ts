import { InjectionToken } from '@angular/core';
import type { CheckCommand, CheckState } from './check-command';
import type { CheckSummary } from './check-draft';

/** What the phone holds when the page starts. */
export interface StoredChecks {
  /** All checks in which something was entered and that are not deleted. */
  readonly summaries: readonly CheckSummary[];
  /** The check that was open last; it may be empty. */
  readonly lastOpened?: string;
}

/** Where loose checks are kept on the phone. */
export interface LooseCheckStore {
  list(): Promise<StoredChecks>;
  read(id: string): Promise<CheckState | undefined>;
  /** Applies commands to the check as it stands in the store, which another tab may have changed, and answers the outcome. */
  write(checkId: string, commands: readonly CheckCommand[]): Promise<CheckState>;
  /** Puts damaged rows aside, drops what was deleted long ago; answers how many rows were put aside until now. */
  tidy(now: Date): Promise<number>;
  close(): void;
}

/** Opens the store and says whenever another tab has written a check; loaded late, since the page works without it. */
export type OpenStore = (onOtherTab: (checkId: string) => void) => Promise<LooseCheckStore>;

export const OPEN_STORE = new InjectionToken<OpenStore>('OPEN_STORE', {
  factory: () => async (onOtherTab) => (await import('./loose-check-database')).openLooseCheckDatabase(onOtherTab),
});
