/** What could not be taken offers its ways out in the slip; Tab leads from the field to the first of them. */
export function focusWayOut(slipId: string): void {
  document.getElementById(slipId)?.querySelector('button')?.focus();
}
