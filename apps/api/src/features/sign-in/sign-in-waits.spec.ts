import { describe, expect, it } from 'vitest';
import { signInWaits } from './sign-in-waits';

function atClock() {
  const clock = { ms: 1_000_000 };
  const waits = signInWaits(() => clock.ms);
  const fail = (key: string, times: number) => {
    for (let i = 0; i < times; i++) waits.failed(key);
  };
  return { clock, waits, fail };
}

describe('a sign-in', () => {
  it('waits longer and longer from the fifth failure on, and at most a quarter of an hour', () => {
    const { waits, fail } = atClock();
    fail('ann 10.0.0.1', 4);
    expect(waits.secondsToWait('ann 10.0.0.1')).toBe(0);
    const seen = [];
    for (let i = 0; i < 12; i++) {
      fail('ann 10.0.0.1', 1);
      seen.push(waits.secondsToWait('ann 10.0.0.1'));
    }
    expect(seen).toEqual([1, 2, 4, 8, 16, 32, 64, 128, 256, 512, 900, 900]);
  });

  it('waits no longer than that, and starts again after an hour', () => {
    const { clock, waits, fail } = atClock();
    fail('ann', 6);
    clock.ms += 1_001;
    expect(waits.secondsToWait('ann')).toBe(1);
    clock.ms += 1_000;
    expect(waits.secondsToWait('ann')).toBe(0);
    clock.ms += 3_600_000;
    fail('ann', 1);
    expect(waits.secondsToWait('ann')).toBe(0);
  });

  it('is not held up by failures from another address, nor after a right password', () => {
    const { waits, fail } = atClock();
    fail('ann 10.0.0.1', 20);
    expect(waits.secondsToWait('ann 10.0.0.2')).toBe(0);
    waits.succeeded('ann 10.0.0.1');
    expect(waits.secondsToWait('ann 10.0.0.1')).toBe(0);
  });

  it('waits for the minute to end where too many fail everywhere', () => {
    const { clock, waits } = atClock();
    for (let i = 0; i < 1_000; i++) {
      waits.failed(`right ${i}`);
      waits.succeeded(`right ${i}`);
    }
    expect(waits.secondsToWait('ann')).toBe(0);
    for (let i = 0; i < 300; i++) waits.failed(`guess ${i}`);
    expect(waits.secondsToWait('ann')).toBe(60);
    clock.ms += 59_000;
    expect(waits.secondsToWait('ann')).toBe(1);
    clock.ms += 1_000;
    expect(waits.secondsToWait('ann')).toBe(0);
  });
});
