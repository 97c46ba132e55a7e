/**
 * Ref of an option: bringing it into view scrolls its list and never the page. The list stands at the top left of the page for
 * a moment before it is put beside its field; the page would jump there, and the press that follows would miss.
 */
export function scrollInList(option: HTMLElement | null): void {
  if (option === null) return;
  option.scrollIntoView = () => {
    const list = option.closest('[role="listbox"]');
    if (list === null) return;
    const { offsetTop: top, offsetHeight } = option;
    if (top < list.scrollTop) list.scrollTop = top;
    else list.scrollTop = Math.max(list.scrollTop, top + offsetHeight - list.clientHeight);
  };
}
