/** Enter in a field: the cursor goes to the next one on the page; after the last the keyboard goes and the result has the room. */
export function goToNextField(page: HTMLElement, id: string): void {
  const inputs = [...page.querySelectorAll<HTMLInputElement>('app-number-field input')].filter(
    (each) => each.checkVisibility?.() ?? true,
  );
  const at = inputs.findIndex((each) => each.id === id);
  const next = inputs[at + 1];
  if (next) next.focus();
  else inputs[at]?.blur();
}
