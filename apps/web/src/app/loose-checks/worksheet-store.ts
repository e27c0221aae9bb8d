import { InjectionToken } from '@angular/core';
import type { WorksheetPage } from '@chargewright/contract/stored-check';
import type { Worksheet, WorksheetPatch } from './worksheet';

export interface WorksheetPlace {
  readonly checkId: string;
  readonly page: WorksheetPage;
  /** Of the row, where there is none yet. */
  readonly rowId: string;
  /** ISO 8601 in UTC. */
  readonly at: string;
}

/** Where the sheets are kept on the phone. */
export interface WorksheetStore {
  read(checkId: string, page: WorksheetPage): Promise<Worksheet | undefined>;
  /** Applies changes to the sheet as it stands in the store, which another tab may have changed. */
  write(place: WorksheetPlace, patches: readonly WorksheetPatch[]): Promise<void>;
  close(): void;
}

export const OPEN_WORKSHEETS = new InjectionToken<() => Promise<WorksheetStore>>('OPEN_WORKSHEETS', {
  factory: () => async () => (await import('./loose-check-database')).openWorksheetDatabase(),
});
