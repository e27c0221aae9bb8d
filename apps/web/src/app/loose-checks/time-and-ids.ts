import { InjectionToken } from '@angular/core';
import { uuidv7 } from 'uuidv7';

/** The wall clock, so that a test can hold it. */
export const NOW = new InjectionToken<() => Date>('NOW', { factory: () => () => new Date() });

/** A new UUIDv7: sorted by the time it was made. */
export const NEW_ID = new InjectionToken<() => string>('NEW_ID', { factory: () => uuidv7 });
