import type { WritableSignal } from '@angular/core';

/**
 * Keeps the screen on while something is only looked at, where the browser can; `awake` says whether it does. The system takes the lock away when the
 * page is hidden, so it is asked for again. Returns the way to let go.
 */
export function keepAwake(page: Document, awake: WritableSignal<boolean>): () => void {
  const wakeLock = (page.defaultView?.navigator as Partial<Navigator> | undefined)?.wakeLock;
  let lock: WakeLockSentinel | undefined;
  let released = false;

  const ask = async (): Promise<void> => {
    if (!wakeLock || released || page.visibilityState !== 'visible') return;
    try {
      lock = await wakeLock.request('screen');
    } catch {
      // A low battery, for one: the screen goes dark as it always does.
      return;
    }
    if (released) return void lock.release();
    awake.set(true);
    lock.addEventListener('release', () => awake.set(false));
  };
  const again = () => void ask();

  page.addEventListener('visibilitychange', again);
  void ask();
  return () => {
    released = true;
    page.removeEventListener('visibilitychange', again);
    void lock?.release();
  };
}
