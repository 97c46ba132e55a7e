/** Said once where people are listed: "2 places have no body behind them: …". Nothing where every place has one. */
export function noBodyWords(places: number): string {
  if (places === 0) return '';
  return places === 1
    ? '1 place has no body behind it: who sat there was removed. It is left out here and never counts as served.'
    : `${places} places have no body behind them: who sat there was removed. They are left out here and never count as served.`;
}
