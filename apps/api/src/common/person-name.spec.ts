import { describe, expect, it } from '@jest/globals';
import { PersonName } from './person-name';

const removed = (name: string, text: string) => new PersonName(name).removedFrom(text);

describe('a name in a text', () => {
  it.each([
    ['Ottilie Brandt', 'ask OTTILIE brandt.', 'ask a person erased.'],
    ['Ottilie Brandt', 'ask Ottilie\n  Brandt', 'ask a person erased'],
    ['Ottilie  Brandt ', '(Ottilie Brandt)', '(a person erased)'],
    ['Łucja Żak', 'pani łucja żak', 'pani a person erased'],
    ['Zoë', 'for Zoe\u0308', 'for a person erased'],
    ['Zoe\u0308', 'for ZOË', 'for a person erased'],
    ['Sean O’Hara', "Sean O'Hara sits", 'a person erased sits'],
    ['Ada (the 2nd)', 'Ada (the 2nd) sits', 'a person erased sits'],
    ['=A.*+?^${}|[x]\\', 'is =A.*+?^${}|[x]\\ here', 'is a person erased here'],
    ['王芳', '请 王芳 坐', '请 a person erased 坐'],
    ['$&', 'paid $& twice', 'paid a person erased twice'],
  ])('%j is taken out of %j', (name, text, expected) => {
    expect(removed(name, text)).toBe(expected);
  });

  it.each([
    ['Ann', 'Annex, Joann, Änn, Ann1'],
    ['Ann', 'Ann-Marie, Mary-Ann'],
    ['Ann', 'Ann\u0308a'],
    ['A.B', 'AxB'],
    ['Ottilie Brandt', 'Ottilie Brandtner, Ottilie, Brandt'],
  ])('%j is not in %j', (name, text) => {
    expect(removed(name, text)).toBe(text);
  });

  it('leaves a text without it as it was written', () => {
    expect(removed('Ann', 'cafe\u0301')).toBe('cafe\u0301');
  });

  it('shows what stands around it, shortened at words', () => {
    const text = `${'word '.repeat(40)}Ottilie Brandt ${'after '.repeat(40)}`;
    const [mention] = new PersonName('Ottilie Brandt').mentions(text);
    expect(mention!.before).toMatch(/^… word.* $/);
    expect(mention!.after).toMatch(/^ after.* …$/);
    expect(mention!.before.length).toBeLessThan(65);
  });

  it('finds parts of three letters or more by themselves', () => {
    const parts = (name: string, text: string) =>
      new PersonName(name).partMentions(text).map((mention) => mention.name);
    expect(parts('Jo de Witt', 'Jo, de, Witt, witt-made, Jo de Witt, Witty')).toEqual(['Witt', 'witt']);
    expect(parts('A Person', 'A Person')).toEqual([]);
    expect(parts('王芳', '王')).toEqual([]);
  });

  it('never offers a common short word of a name as that name', () => {
    const parts = (name: string, text: string) =>
      new PersonName(name).partMentions(text).map((mention) => mention.name);
    const text = 'The top of the table for THE van, and der Tisch des Bruno';
    expect(parts('Bruno the Van der Meer', text)).toEqual(['Bruno']);
    expect(parts('Van der The', text)).toEqual([]);
    // A word that only begins so is a name.
    expect(parts('Theo Vance', 'ask Theo, then Vance')).toEqual(['Theo', 'Vance']);
  });
});
