import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import type { HighSidePort, ProcedureId } from '@chargewright/engine';
import { checkPageWords, listWords, procedureWords, setupWords, unitLabel } from '@chargewright/wording';
import type { CheckDraft } from '../loose-checks/check-draft';
import { flammabilityOf } from './flammability';

const words = checkPageWords.setup;

/** The setup in two lines; the first, with the refrigerant, stays in sight while the page scrolls. */
@Component({
  selector: 'app-setup-plate',
  template: `
    <div class="title">
      <strong>{{ title() }}</strong>
      <button type="button" class="button plain" [attr.aria-label]="words.changeLabel" (click)="changed.emit()">
        {{ words.change }}
      </button>
    </div>
    <div class="details">
      <span>
        @if (flammable(); as text) {
          <b>{{ text }}</b> ·
        }
        {{ details() }}
      </span>
      @if (assumptions(); as text) {
        <span class="assumed">{{ text }}</span>
      }
    </div>
  `,
  styleUrl: './setup-plate.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SetupPlate {
  readonly draft = input.required<CheckDraft>();

  readonly changed = output<void>();

  protected readonly words = words;
  protected readonly title = computed(() => plateTitle(this.draft()));
  protected readonly flammable = computed(() => plateFlammability(this.draft()));
  protected readonly details = computed(() => plateDetails(this.draft()));
  protected readonly assumptions = computed(() => plateAssumptions(this.draft()));
}

/** "R-410A · fixed orifice" */
export function plateTitle({ setup }: CheckDraft): string {
  const { refrigerant, meteringDevice } = setup;
  const metering = meteringDevice && setupWords.meteringDevice.options[meteringDevice].label;
  const parts = [refrigerant, metering && inSentence(metering)].filter((part) => part !== undefined);
  return parts.length === 0 ? words.plateEmpty : parts.join(' · ');
}

/** "Split, cooling, full stage · 650 ft · general rules" */
export function plateDetails({ setup, typed }: CheckDraft): string {
  const { kind = 'split', mode = 'cooling', stage = 'full', highSidePort = 'liquid' } = setup;
  const system = [setupWords.kind.options[kind], setupWords.mode.options[mode], setupWords.stage.options[stage]];
  const [first, ...others] = system.map(({ label }) => label);
  const { elevation } = typed;
  return [
    [first, ...others.map(inSentence)].join(', '),
    ...(highSidePort === 'liquid' ? [] : [portText(highSidePort)]),
    elevation ? `${elevation.text} ${unitLabel(elevation.unit)}` : words.seaLevel,
    rulesText(setup.procedure),
  ].join(' · ');
}

/** "A2L: burns"; empty for a refrigerant that does not. */
export function plateFlammability({ setup: { refrigerant } }: CheckDraft): string {
  const safetyClass = refrigerant === undefined ? null : flammabilityOf(refrigerant);
  return safetyClass === null ? '' : words.burns(safetyClass);
}

const rulesText = (procedure: ProcedureId = 'general-rules'): string => inSentence(procedureWords[procedure].short);

const portText = (port: HighSidePort): string =>
  `${inSentence(setupWords.highSidePort.label)}: ${inSentence(setupWords.highSidePort.options[port].label)}`;

/** "Assumed: stage and high-side port"; empty when the person has said everything. By the maker's data alone nothing is assumed. */
export function plateAssumptions({ setup }: CheckDraft): string {
  const open = (['kind', 'mode', 'stage', 'highSidePort'] as const).filter((field) => setup[field] === undefined);
  if (open.length === 0) return '';
  const fields = listWords(open.map((field) => setupWords[field].name));
  return setup.procedure === 'manufacturer' ? words.unstatedFields(fields) : words.assumedFields(fields);
}

/** "Fixed orifice" inside a sentence; an abbreviation (TXV) keeps its capitals. */
const inSentence = (label: string): string =>
  /^[A-Z]{2}/.test(label) ? label : label.charAt(0).toLowerCase() + label.slice(1);
