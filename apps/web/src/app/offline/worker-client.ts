import {
  APP_INITIALIZER,
  createEnvironmentInjector,
  EnvironmentInjector,
  inject,
  Injectable,
  isDevMode,
  runInInjectionContext,
} from '@angular/core';
import { provideServiceWorker, SwUpdate } from '@angular/service-worker';

/**
 * The worker that keeps the app on the phone: made, and the worker registered by it, when it is first asked for. As a provider of the
 * application it would be in the first download, and nothing of it is needed to paint the page.
 */
@Injectable({ providedIn: 'root' })
export class WorkerClient {
  readonly updates: SwUpdate;

  constructor() {
    const injector = createEnvironmentInjector(
      [
        provideServiceWorker('worker.js', {
          enabled: !isDevMode(),
          registrationStrategy: 'registerImmediately',
          updateViaCache: 'none',
        }),
      ],
      inject(EnvironmentInjector),
    );
    // Only an application's own initializers run by themselves; Angular's registers the worker.
    for (const initialize of injector.get(APP_INITIALIZER)) runInInjectionContext(injector, () => void initialize());
    this.updates = injector.get(SwUpdate);
  }
}
