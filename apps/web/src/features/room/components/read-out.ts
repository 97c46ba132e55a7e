/**
 * Words that stand near the pointer, within the sheet; `undefined` takes them away. Their width is left to the page to
 * reckon with: asking for it would lay the page out in each frame of a drag.
 */
export function showReadOut(element: HTMLElement | null, words: string | undefined, x = 0, y = 0): void {
  if (!element) return;
  element.toggleAttribute('hidden', words === undefined);
  if (words === undefined) return;
  element.replaceChildren(words);
  const left = `max(4px, min(${(x + 14).toFixed(1)}px, 100cqw - 100% - 4px))`;
  element.style.setProperty('transform', `translate(${left}, ${Math.max(4, y - 34).toFixed(1)}px)`);
}
