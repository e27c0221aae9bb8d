import { provideRouter } from '@angular/router';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { checkPageWords, looseChecksWords, readingWords, setupWords } from '@chargewright/wording';
import { applyCommand } from '../loose-checks/check-draft-reducer';
import type { CheckState } from '../loose-checks/check-command';
import { OPEN_STORE, type LooseCheckStore } from '../loose-checks/loose-check-store';
import { NOW } from '../loose-checks/time-and-ids';
import { UnitPreference } from '../quantities/unit-preference';
import { CheckAChargePage } from './check-a-charge-page';

// A whole page is drawn anew at each step, which a busy machine takes seconds for.
vi.setConfig({ testTimeout: 30_000, hookTimeout: 30_000 });

/** A phone's store that keeps everything in memory. */
const memoryStore = (): LooseCheckStore => {
  const states = new Map<string, CheckState>();
  return {
    list: () => Promise.resolve({ summaries: [] }),
    read: (id) => Promise.resolve(states.get(id)),
    write: (id, commands) => {
      const state = commands.reduce<CheckState | undefined>(applyCommand, states.get(id));
      if (!state) throw new Error('nothing to write');
      states.set(id, state);
      return Promise.resolve(state);
    },
    tidy: () => Promise.resolve(0),
    close: () => undefined,
  };
};

let fixture: ComponentFixture<CheckAChargePage>;
let page: HTMLElement;
let now: Date;

/** Until the store has answered and a pause in typing is over. */
const settle = async () => {
  for (let turn = 0; turn < 3; turn++) {
    await vi.advanceTimersByTimeAsync(700);
    await fixture.whenStable();
  }
};

const all = <Found extends HTMLElement>(selector: string): Found[] => [...page.querySelectorAll<Found>(selector)];

const nameOf = (element: HTMLElement): string =>
  (element.getAttribute('aria-label') ?? element.textContent).replace(/\s+/g, ' ').trim();

const button = (name: string): HTMLButtonElement => {
  const found = all<HTMLButtonElement>('button').find((each) => nameOf(each) === name);
  if (!found) throw new Error(`no button "${name}"; there are: ${all('button').map(nameOf).join(' | ')}`);
  return found;
};

const field = (label: string): HTMLInputElement => {
  const found = all<HTMLLabelElement>('label[for]').find((each) => nameOf(each).startsWith(label));
  const input = found && page.querySelector<HTMLInputElement>(`#${found.htmlFor}`);
  if (!input) throw new Error(`no field "${label}"`);
  return input;
};

const radio = (label: string): HTMLInputElement => {
  const found = all<HTMLLabelElement>('label').find((each) => nameOf(each).startsWith(label));
  const input = found?.querySelector<HTMLInputElement>('input[type=radio]');
  if (!input) throw new Error(`no choice "${label}"`);
  return input;
};

const press = async (name: string) => {
  button(name).click();
  await settle();
};

const choose = async (label: string) => {
  radio(label).click();
  await settle();
};

const type = (label: string, text: string) => {
  const input = field(label);
  input.value = text;
  input.dispatchEvent(new Event('input', { bubbles: true }));
};

const enter = async (label: string, text: string) => {
  type(label, text);
  field(label).dispatchEvent(new KeyboardEvent('keydown', { key: 'Enter', bubbles: true }));
  await settle();
};

const described = (label: string): string =>
  (field(label).getAttribute('aria-describedby') ?? '')
    .split(' ')
    .map((id) => page.querySelector(`#${id}`)?.textContent ?? '')
    .join(' ');

const setUp = async (metering: string) => {
  await choose('R-410A');
  await choose(metering);
  await press(checkPageWords.setup.done);
};

beforeEach(async () => {
  vi.useFakeTimers();
  vi.spyOn(window, 'scrollTo').mockImplementation(() => undefined);
  localStorage.clear();
  now = new Date('2026-12-01T12:00:00Z');
  TestBed.configureTestingModule({
    imports: [CheckAChargePage],
    providers: [
      provideRouter([]),
      { provide: OPEN_STORE, useValue: () => Promise.resolve(memoryStore()) },
      { provide: NOW, useValue: () => now },
    ],
  });
  // Parts of the page come later in an import of their own.
  await TestBed.compileComponents();
  fixture = TestBed.createComponent(CheckAChargePage);
  page = fixture.nativeElement as HTMLElement;
  document.body.append(page);
  await settle();
});

afterEach(() => {
  vi.useRealTimers();
  page.remove();
});

describe('Check a charge', () => {
  it('asks the setup first, with nothing chosen for the person', () => {
    expect(page.textContent).toContain(checkPageWords.setup.missingBoth);
    expect(all<HTMLInputElement>('input[type=radio]').filter(({ checked }) => checked)).toEqual([]);
    expect(() => field(readingWords.suctionPressure.label)).toThrow();
  });

  it('stays in the setup until the person goes on, so that what is assumed is seen', async () => {
    await choose('R-410A');
    await choose('Fixed orifice');
    expect(page.textContent).toContain(checkPageWords.setup.assumedNote);
    await press(checkPageWords.setup.done);
    expect(page.textContent).toContain('Assumed: kind of system, mode, stage and high-side port');
  });

  it('reaches a finding from an example', async () => {
    await press(checkPageWords.example.button);
    expect(page.textContent).toContain('R-410A · fixed orifice');
    expect(page.textContent).toContain('Superheat is 9.5 °F above target');
    expect(page.textContent).toContain(checkPageWords.example.note);
  });

  it('reaches the same finding from readings typed in their order by keyboard', async () => {
    await setUp('Fixed orifice');
    await enter(readingWords.suctionPressure.label, '116.5');
    await enter(readingWords.suctionLineTemperature.label, '57,3');
    await enter(readingWords.outdoorDryBulb.label, '92.0');
    await enter(readingWords.returnDryBulb.label, '78.2');
    await enter(readingWords.returnWetBulb.label, '64.5');
    expect(page.textContent).toContain('above target');
    expect(field(readingWords.suctionLineTemperature.label).value).toBe('57,3');
  });

  it('moves on to the next reading with Enter', async () => {
    await setUp('Fixed orifice');
    field(readingWords.suctionPressure.label).focus();
    await enter(readingWords.suctionPressure.label, '116.5');
    expect(document.activeElement).toBe(field(readingWords.suctionLineTemperature.label));
  });

  it('answers bad input beside its field and keeps what was typed', async () => {
    await setUp('Fixed orifice');
    await enter(readingWords.outdoorDryBulb.label, '9x');
    expect(field(readingWords.outdoorDryBulb.label).value).toBe('9x');
    expect(field(readingWords.outdoorDryBulb.label).getAttribute('aria-invalid')).toBe('true');
    expect(described(readingWords.outdoorDryBulb.label)).toContain(checkPageWords.readings.notANumber);
  });

  it('names what cannot be and judges the rest', async () => {
    await press(checkPageWords.example.button);
    await enter(readingWords.returnWetBulb.label, '81');
    expect(described(readingWords.returnWetBulb.label)).toContain('81 °F');
    expect(field(readingWords.returnWetBulb.label).value).toBe('81');
    expect(page.textContent).toContain('18.3');
  });

  it('does not judge half a number while it is being typed', async () => {
    await press(checkPageWords.example.button);
    type(readingWords.suctionLineTemperature.label, '5');
    await vi.advanceTimersByTimeAsync(200);
    await fixture.whenStable();
    expect(page.textContent).toContain('Superheat is 9.5 °F above target');
  });

  it('keeps what was typed, with its unit, when the units change', async () => {
    await press(checkPageWords.example.button);
    TestBed.inject(UnitPreference).choose('C-kPa');
    await settle();
    expect(field(readingWords.outdoorDryBulb.label).value).toBe('92.0');
    expect(described(readingWords.outdoorDryBulb.label)).toContain('°F');
    expect(page.textContent).toContain('Superheat is 5.3 °C above target');
  });

  it('strikes a value that is ten minutes old', async () => {
    await press(checkPageWords.example.button);
    now = new Date(now.getTime() + 11 * 60_000);
    await vi.advanceTimersByTimeAsync(10_000);
    await settle();
    expect(described(readingWords.returnWetBulb.label)).toContain(checkPageWords.readings.staleAgo(11));
  });

  it('tells the age of a value that was typed and never committed, before and after it is', async () => {
    await setUp('Fixed orifice');
    type(readingWords.outdoorDryBulb.label, '92');
    await settle();
    expect(described(readingWords.outdoorDryBulb.label)).toContain(checkPageWords.readings.editing);
    now = new Date(now.getTime() + 11 * 60_000);
    await vi.advanceTimersByTimeAsync(10_000);
    await settle();
    expect(described(readingWords.outdoorDryBulb.label)).toContain(checkPageWords.readings.staleAgo(11));
    field(readingWords.outdoorDryBulb.label).dispatchEvent(new Event('blur'));
    await settle();
    expect(described(readingWords.outdoorDryBulb.label)).toContain(checkPageWords.readings.staleAgo(11));
  });

  it('brings a cleared example back where it was cleared', async () => {
    await press(checkPageWords.example.button);
    await press(checkPageWords.example.clear);
    expect(page.textContent).toContain(checkPageWords.setup.missingBoth);
    await press(looseChecksWords.undo);
    expect(page.textContent).toContain('Superheat is 9.5 °F above target');
  });

  it('asks which port the target holds for at a discharge port only', async () => {
    const port = setupWords.targetSubcoolingPort;
    await setUp('TXV');
    expect(page.textContent).not.toContain(port.label);
    await press(checkPageWords.setup.changeLabel);
    await choose(setupWords.highSidePort.options.discharge.label);
    expect(page.textContent).toContain(port.label);
    await press(checkPageWords.setup.done);
    expect(page.textContent).toContain(port.label);
  });

  it('says at once that heating is not judged, and why, asks for no reading and leads to the weigh-in', async () => {
    await choose('R-410A');
    await choose('TXV');
    await choose('Heating');
    await press(checkPageWords.setup.done);
    const sheet = page.querySelector('app-result-sheet')?.textContent;
    expect(sheet).toContain('Weigh the charge in');
    expect(sheet).toContain('In heating');
    expect(all('app-result-sheet button').map(nameOf)).toEqual([checkPageWords.result.placeButton['weigh-in']]);
  });

  it('leads to the setup when the next step is there', async () => {
    await choose('R-22');
    await choose('Fixed orifice');
    await choose('Packaged');
    await press(checkPageWords.setup.done);
    await press(checkPageWords.result.placeButton.setup);
    expect(document.activeElement?.getAttribute('name')).toBe('highSidePort');
  });

  it('leads to the leak search, folded in though it is', async () => {
    await press(checkPageWords.example.button);
    await press(checkPageWords.result.placeButton.readings);
    expect(document.activeElement?.getAttribute('name')).toBe('leakSearch');
    expect(document.activeElement?.closest('details')?.open).toBe(true);
  });

  it('asks every reading again after an adjustment, and brings them back if there was none', async () => {
    await press(checkPageWords.example.button);
    await press(checkPageWords.visit.restart);
    expect(page.textContent).toContain(checkPageWords.visit.confirmRestart);
    all<HTMLButtonElement>('button')
      .filter((each) => nameOf(each) === checkPageWords.visit.restart)
      .at(-1)
      ?.click();
    await settle();
    expect(field(readingWords.suctionPressure.label).value).toBe('');
    expect(page.textContent).toContain(checkPageWords.visit.runningFor(0));
    await press(looseChecksWords.undo);
    expect(field(readingWords.suctionPressure.label).value).toBe('116.5');
    expect(page.textContent).toContain(checkPageWords.visit.runningFor(22));
  });

  it('takes relative humidity in place of the wet bulb', async () => {
    await setUp('Fixed orifice');
    await press(checkPageWords.readings.useHumidity);
    expect(() => field(readingWords.returnWetBulb.label)).toThrow();
    await enter(readingWords.returnRelativeHumidity.label, '48');
    await press(checkPageWords.readings.useWetBulb);
    expect(field(readingWords.returnWetBulb.label).value).toBe('');
  });

  it('starts the next check with the elevation of the last', async () => {
    await choose('R-410A');
    await enter('Elevation', '5280');
    await choose('Fixed orifice');
    await press(checkPageWords.setup.done);
    await press('New check');
    await choose('R-22');
    expect(field('Elevation').value).toBe('5280');
  });
});
