/**
 * What the page shows once a system is set up. Fetched right after the first paint, not when it is first shown: the network may be gone by then.
 * A part that could not be fetched is asked for again by the block that shows it.
 */
export const loadLaterParts = (): Promise<unknown> =>
  Promise.allSettled([
    import('../diagnosis/diagnosis-card'),
    import('../diagnosis/separating-tests'),
    import('./first-set'),
    import('./glance'),
    import('./preflight'),
    import('./result-column'),
    import('./tolerance-ruler'),
    import('./visit-clock'),
  ]);
