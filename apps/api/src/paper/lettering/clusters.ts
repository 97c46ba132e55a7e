/** Characters of a text, each with the marks that stand on it. */
export function clusters(text: string): readonly string[] {
  return text.match(/\P{M}\p{M}*|\p{M}+/gu) ?? [];
}
