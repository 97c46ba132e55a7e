/** Numbers that spread like bodies do, the same each time. */
function* spread(): Generator<number, never> {
  let state = 7;
  for (;;) {
    let sum = 0;
    for (let n = 0; n < 12; n += 1) {
      state = (state * 16807) % 2147483647;
      sum += state / 2147483647;
    }
    yield sum - 6;
  }
}

interface Given {
  each?: number;
  /** Between the columns. */
  delimiter?: ',' | ';';
  decimal?: '.' | ',';
  /** Changes the cells of one person, counted from 1. */
  change?: (cells: string[], row: number) => string[];
}

/** A table of invented people: name, sex, height and sitting height in centimetres, weight, knee-back height. */
export function surveyCsv({
  each = 40,
  delimiter = ',',
  decimal = '.',
  change = (cells) => cells,
}: Given = {}) {
  const draws = spread();
  const next = () => draws.next().value;
  const rows = Array.from({ length: 2 * each }, (_, n) => {
    const woman = n % 2 === 0;
    const size = next();
    const stature = (woman ? 163 : 176) + 7 * size;
    const values = [
      stature,
      (woman ? 86 : 92) + 0.4 * 7 * size + 1.5 * next(),
      Math.exp(Math.log(woman ? 66 : 82) + 0.1 * size + 0.15 * next()),
      (woman ? 38.5 : 42.5) + 0.25 * 7 * size + next(),
    ];
    const cells = values.map((value) => value.toFixed(1).replace('.', decimal));
    return change([`Person ${n + 1}`, woman ? 'F' : 'M', ...cells], n + 1);
  });
  const head = ['Name', 'Sex', 'Height (cm)', 'Sitting height (cm)', 'Weight', 'popliteal_height'];
  return [head, ...rows].map((cells) => cells.join(delimiter)).join('\n');
}

/** What the columns of such a table hold. */
export const SURVEY_MAPPING = {
  sex: { column: 'Sex' },
  measures: [
    { key: 'stature', column: 'Height (cm)', unit: 'cm' },
    { key: 'sitting_height', column: 'Sitting height (cm)', unit: 'cm' },
    { key: 'weight_kg', column: 'Weight', unit: 'kg' },
    { key: 'popliteal_height', column: 'popliteal_height', unit: 'cm' },
  ],
  decimalComma: false,
};

export const surveyBody = (given: Record<string, unknown> = {}) => ({
  name: 'Our colleagues',
  source: 'measured in the shop, autumn 2026',
  csv: surveyCsv(),
  mapping: SURVEY_MAPPING,
  ...given,
});
