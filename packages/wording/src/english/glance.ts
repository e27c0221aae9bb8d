/** Glance: one number, to be read at arm's length. */
export const glanceWords = {
  open: 'Glance',
  openLabel: 'Glance: one number over the whole screen',
  close: 'Close',
  next: 'Next number',
  plusMinus: (value: string) => `± ${value}`,
  target: (value: string) => `target ${value}`,
  awake: 'The screen stays on.',
  nothing: 'No number yet.',
};
