/** Checks kept on this phone without an account. */
export const looseChecksWords = {
  title: 'Checks on this phone',
  open: 'Checks on this phone',
  openLabel: (count: number) => `Checks on this phone, ${count}`,
  newCheck: 'New check',
  current: 'open now',
  deleteCheck: (name: string) => `Delete ${name}`,
  delete: 'Delete',
  deleted: 'Check deleted',
  undo: 'Undo',
  unnamed: 'No refrigerant chosen',
  readings: (count: number) => (count === 0 ? 'no readings yet' : count === 1 ? '1 reading' : `${count} readings`),
  changed: 'Last change',
  empty: 'No checks yet. Set up the system and type the first reading: it is kept here by itself.',
  loading: 'Opening your checks',
  memoryOnly:
    'This phone is not letting the page store anything: private browsing, or the storage is full. Keep the page open and note your readings; they are lost when it closes.',
  setAside: (count: number) =>
    count === 1
      ? 'One stored entry was damaged. It was set aside; the others are untouched.'
      : `${count} stored entries were damaged. They were set aside; the others are untouched.`,
};
