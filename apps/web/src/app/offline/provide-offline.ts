import { type EnvironmentProviders, isDevMode } from '@angular/core';
import { provideServiceWorker } from '@angular/service-worker';

/** Registers the worker that keeps the app on the phone, once the first page stands still. */
export const provideOffline = (): EnvironmentProviders =>
  provideServiceWorker('worker.js', {
    enabled: !isDevMode(),
    registrationStrategy: 'registerWhenStable:10000',
    updateViaCache: 'none',
  });
