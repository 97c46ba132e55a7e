import { formsOf, ZERO_WIDTH_NON_JOINER } from './arabic-forms';
import { clusters } from './clusters';
import { faceOf, holdsAll } from './faces';
import { romanise } from './romanise';

const NO_BREAK = '\u00a0';

/** Stands behind what was romanised; drawn as an asterisk. Of the private area, so that nobody types it. */
export const ROMANISED = '\ue000';

/**
 * Text as it can stand on paper: on one line, a number held to its unit, and in letters that one of the faces
 * draws. What none of them draws is romanised, and marked as such.
 */
export function printable(text: string): string {
  const plain = text
    .normalize('NFC')
    .replace(/\t/g, ' ')
    .replace(/[\s\u2028\u2029]*[\n\r\u2028\u2029][\s\u2028\u2029]*/g, ' ')
    .replace(/(\d)[ \u2009\u202f](mm|cm|m|kg|lb|yd|ft|in|N|%)(?![\p{L}])/gu, `$1${NO_BREAK}$2`)
    .replace(/′ (?=[\d¼½¾⅛⅜⅝⅞⁰¹²³⁴⁵⁶⁷⁸⁹])/g, `′${NO_BREAK}`)
    .replace(/ × /g, `${NO_BREAK}×${NO_BREAK}`);
  return holdsAll('Work Sans', plain) ? plain : inFaces(plain);
}

/** Vowel points of Arabic and Hebrew, which names do without, and what a screen alone needs. */
function withoutPoints(text: string): string {
  return text
    .replace(/((?=\p{L})[\p{Script=Arabic}\p{Script=Hebrew}])\p{M}+/gu, '$1')
    .replace(/(?<!\p{Script=Arabic})\u200c|\u200c(?!\p{Script=Arabic})/gu, '')
    .replace(/(?!\u200c)[\p{Cc}\p{Cf}\ufe00-\ufe0f]/gu, '')
    .replace(/\u202f/g, NO_BREAK)
    .replace(/(?!\u00a0)\p{Zs}/gu, ' ');
}

function inFaces(plain: string): string {
  let out = '';
  let foreign = '';
  let gap = '';
  const close = () => {
    if (foreign !== '') out += romanise(foreign) + ROMANISED;
    out += gap;
    foreign = gap = '';
  };
  for (const cluster of clusters(withoutPoints(plain))) {
    const drawn = drawable(cluster) ?? stopOf(cluster);
    if (drawn === undefined) {
      foreign += gap + cluster;
      gap = '';
    } else if (cluster === ' ' && foreign !== '') gap += ' ';
    else {
      close();
      out += drawn;
    }
  }
  close();
  return out;
}

/** A full stop, a comma or the like of another script: as ours, without a mark. A dot within a name is none. */
function stopOf(cluster: string): string | undefined {
  return /^(?!・)[\p{Po}\p{Ps}\p{Pe}]$/u.test(cluster) ? romanise(cluster) : undefined;
}

/** A character with its marks, or the same more plainly; nothing when no face draws it. */
function drawable(cluster: string): string | undefined {
  if (cluster === ROMANISED || cluster === ZERO_WIDTH_NON_JOINER) return cluster;
  const plainer = [cluster, cluster.normalize('NFKC'), cluster.normalize('NFKD').replace(/\p{M}/gu, '')];
  return plainer.find((text) => text !== '' && clusters(text).every(isDrawn));
}

function isDrawn(cluster: string): boolean {
  if (faceOf(cluster) === undefined) return false;
  if (!/(?=\p{L})\p{Script=Arabic}/u.test(cluster)) return true;
  const forms = formsOf(cluster);
  return forms.length > 0 && forms.every((form) => faceOf(form) !== undefined);
}
