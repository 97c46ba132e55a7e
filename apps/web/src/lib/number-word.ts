const NUMBERS = [
  'no',
  'one',
  'two',
  'three',
  'four',
  'five',
  'six',
  'seven',
  'eight',
  'nine',
  'ten',
  'eleven',
  'twelve',
];

/** "four", or "13" from there on. */
export function numberWord(count: number): string {
  return NUMBERS[count] ?? String(count);
}
