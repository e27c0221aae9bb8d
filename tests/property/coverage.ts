/** How often each code was met, against the list of all of them. */
import type { CheckResult, Fault } from '@chargewright/engine';
import { FINDINGS } from '@chargewright/engine';
import { CAUTIONS, CRITERIA, FAULTS, NEXT_STEPS, NOT_YET, OVERALL_FINDINGS, REASONS, STOPS } from './every-code';

const LISTS = {
  overall: OVERALL_FINDINGS,
  criterion: CRITERIA,
  finding: FINDINGS,
  reason: REASONS,
  stop: STOPS,
  caution: CAUTIONS,
  nextStep: NEXT_STEPS,
  notYet: NOT_YET,
  fault: FAULTS,
} as const;

type List = keyof typeof LISTS;

export class Coverage {
  private readonly counts = new Map<string, number>();

  addFaults(faults: readonly Fault[]): void {
    for (const { code } of faults) this.add('fault', code);
  }

  addResult({ criteria, overall }: CheckResult): void {
    this.add('overall', overall.finding);
    this.add('nextStep', overall.nextStep.code);
    for (const code of overall.nextStep.notYet) this.add('notYet', code);
    for (const { code } of overall.stops) this.add('stop', code);
    for (const { code } of overall.cautions) this.add('caution', code);
    for (const { criterion, finding, reason } of criteria) {
      this.add('criterion', criterion);
      this.add('finding', finding);
      if (reason !== null) this.add('reason', reason.code);
    }
  }

  /** Codes met fewer than `least` times, with their counts. */
  rarerThan(least: number): readonly string[] {
    return this.all().flatMap(([name, count]) => (count < least ? [`${name}: ${count}`] : []));
  }

  report(): string {
    const sorted = this.all().sort(([, a], [, b]) => a - b);
    return sorted.map(([name, count]) => `${name} ${count}`).join(', ');
  }

  private add(list: List, code: string): void {
    const key = `${list} ${code}`;
    this.counts.set(key, (this.counts.get(key) ?? 0) + 1);
  }

  private all(): [name: string, count: number][] {
    return (Object.keys(LISTS) as List[]).flatMap((list) =>
      LISTS[list].map((code): [string, number] => [`${list} ${code}`, this.counts.get(`${list} ${code}`) ?? 0]),
    );
  }
}
