import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { setupWords } from '@chargewright/wording';
import { TARGET_PORTS, type TargetPort as Port } from '../loose-checks/check-draft';
import { ChoiceGroup } from './choice-group';
import { choicesOf } from './choices';

/** Which port the entered target subcooling holds for; asked where the gauge is at the discharge port. */
@Component({
  selector: 'app-target-port',
  imports: [ChoiceGroup],
  template: `
    <app-choice-group
      name="targetSubcoolingPort"
      assumed="liquid"
      [legend]="words.label"
      [hint]="words.hint"
      [choices]="choices"
      [chosen]="chosen()"
      (chose)="chose.emit($event)"
    />
  `,
  styles: `
    :host {
      display: block;
      padding: 4px 0 8px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TargetPort {
  readonly chosen = input<Port>();

  readonly chose = output<Port>();

  protected readonly words = setupWords.targetSubcoolingPort;
  protected readonly choices = choicesOf(TARGET_PORTS, setupWords.targetSubcoolingPort);
}
