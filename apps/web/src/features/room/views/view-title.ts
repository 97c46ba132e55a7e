import { frameWords, lensWords, type LengthStyle } from '@settlewright/geometry';
import { isToScale, VIEW_TITLES } from '../scene/views.ts';
import type { Seen } from './use-seen.ts';

/** The title of the drawing, and the quiet line under it. */
export function viewTitle({ letter, named }: Seen, style: LengthStyle): { name: string; about: string } {
  const name = named?.name ?? VIEW_TITLES[letter];
  if (named?.camera.kind === 'lens') {
    return { name, about: `${lensWords(named.camera, style)}; ${frameWords(named.camera)}` };
  }
  const about = isToScale(letter) ? 'to scale' : 'sizes on the tapes govern';
  return { name, about: named ? `${VIEW_TITLES[letter]}, ${about}` : about };
}
