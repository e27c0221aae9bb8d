/** Checks kept on this phone without an account. */
export const looseChecksWords = {
  title: 'Checks on this phone',
  open: 'Checks on this phone',
  openLabel: (count: number) => `Checks on this phone, ${count}`,
  newCheck: 'New check',
  newCheckNote: 'The present one stays in the list.',
  current: 'open now',
  openCheck: (name: string) => `Open ${name}`,
  deleteCheck: (name: string) => `Delete ${name}`,
  delete: 'Delete',
  deleted: 'Check deleted',
  undo: 'Undo',
  restored: 'Check restored',
  unnamed: 'No refrigerant chosen',
  readings: (count: number) => (count === 0 ? 'no readings yet' : count === 1 ? '1 reading' : `${count} readings`),
  started: 'Started',
  changed: 'Last change',
  empty: 'No checks yet. Set up the system and type the first reading: it is kept here by itself.',
  loading: 'Opening your checks',
  kept: 'Kept on this phone',
  memoryOnly:
    'This phone is not letting the page store anything: private browsing, or the storage is full. Keep the page open and note your readings; they are lost when it closes.',
  saveFailed: 'The last change could not be stored. It is still on the page.',
  tryAgain: 'Try again',
  setAside: (count: number) =>
    count === 1
      ? 'One stored entry was damaged. It was set aside; the others are untouched.'
      : `${count} stored entries were damaged. They were set aside; the others are untouched.`,
  openFailed: 'This check could not be opened. It was set aside.',
  otherTab: 'This check was changed in another tab. The newer readings are shown.',
};
