/** "settles about 3 of 4 checks in doubt": what measurements are expected to make sure. */
export function settlesWords(order: readonly { settles: number }[], uncertain: number): string {
  const settled = Math.round(order.reduce((sum, { settles }) => sum + settles, 0));
  const of = `${uncertain} ${uncertain === 1 ? 'check' : 'checks'} in doubt`;
  return settled === 0 ? `may settle one of ${of}` : `settles about ${Math.min(settled, uncertain)} of ${of}`;
}
