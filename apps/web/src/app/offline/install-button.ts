import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { offlineWords } from '@chargewright/wording';
import { Install } from './install';

/** Stands there only where the browser would install the page. */
@Component({
  selector: 'app-install-button',
  imports: [MatButton],
  template: `
    @if (install.offered()) {
      <button matButton type="button" [title]="words.installNote" (click)="install.ask()">{{ words.install }}</button>
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class InstallButton {
  protected readonly words = offlineWords;
  protected readonly install = inject(Install);
}
