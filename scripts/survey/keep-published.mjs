const GROUPS = ['men', 'women'];

/**
 * A summary made of rows, filled up with what the same survey published of the measures that the rows lack.
 * What the rows hold replaces the published figure; words and further blocks of the published file stay.
 */
export function keepPublished(summary, published) {
  const { measures } = published;
  const perGroup = (of) => Object.fromEntries(GROUPS.map((group) => [group, of(group)]));
  const merged = (block) => perGroup((group) => ({ ...published[block][group], ...summary[block][group] }));
  const corr = perGroup((group) =>
    measures.map((a, i) =>
      measures.slice(i).map((b, offset) => {
        const [row, column] = [summary.measures.indexOf(a), summary.measures.indexOf(b)];
        if (row < 0 || column < 0) return published.corr[group][i][offset];
        return summary.corr[group][Math.min(row, column)][Math.abs(column - row)];
      }),
    ),
  );
  return {
    ...published,
    stats: merged('stats'),
    corr,
    reg_stature: merged('reg_stature'),
    reg_stature_weight: merged('reg_stature_weight'),
    reg_stature_lnweight: merged('reg_stature_lnweight'),
    log: summary.log,
    spread: summary.spread,
  };
}
