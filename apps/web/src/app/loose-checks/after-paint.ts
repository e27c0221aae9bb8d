/** Runs work once the browser has painted what is rendered now; at once where it does not paint, as in a hidden tab. */
export function afterPaint({ visibilityState }: Document, work: () => void): void {
  const soon = () => setTimeout(work);
  if (visibilityState === 'visible') requestAnimationFrame(soon);
  else soon();
}
