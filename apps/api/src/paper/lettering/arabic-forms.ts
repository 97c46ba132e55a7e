const LAM = '\u0644';
const TATWEEL = '\u0640';
/** Keeps two letters apart, as Persian asks for; never drawn. */
export const ZERO_WIDTH_NON_JOINER = '\u200c';

/** Isolated, final, initial, medial: four for a letter that joins both ways, two for one that joins backwards. */
type Forms = readonly string[];

/** Unicode lists the presentation forms of each letter in that order (blocks FB50 and FE70). */
const FORMS: ReadonlyMap<string, Forms> = readForms();

function readForms(): Map<string, string[]> {
  const forms = new Map<string, string[]>([[TATWEEL, Array<string>(4).fill(TATWEEL)]]);
  for (const [from, to] of [
    [0xfb50, 0xfbe7],
    [0xfbfc, 0xfbff],
    [0xfe80, 0xfefc],
  ] as const) {
    for (let code = from; code <= to; code++) {
      const form = String.fromCharCode(code);
      const letters = form.normalize('NFKC');
      if (letters === form || !(letters.length === 1 || letters.startsWith(LAM))) continue;
      forms.set(letters, [...(forms.get(letters) ?? []), form]);
    }
  }
  return forms;
}

/** The forms of one letter, none when Unicode lists none. */
export function formsOf(letter: string): Forms {
  return FORMS.get(letter) ?? [];
}

/** Letters of the Arabic script in the forms they take beside their neighbours; all else stays as it is. */
export function joinArabic(text: string): string {
  const letters = text.match(/\u0644[\u0622\u0623\u0625\u0627]|[^]/g) ?? [];
  const forms = letters.map(formsOf);
  const meets = (n: number) => forms[n]?.length === 4 && (forms[n + 1]?.length ?? 0) >= 2;
  return letters
    .map((letter, n) => {
      if (letter === ZERO_WIDTH_NON_JOINER) return '';
      const position = (meets(n - 1) ? 1 : 0) + (meets(n) ? 2 : 0);
      return forms[n]?.[position] ?? letter;
    })
    .join('');
}
