import { frameWords, lensWords, type LengthStyle, type NamedView } from '@settlewright/geometry';
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

/** What is said of a named view on paper. */
export const aboutView = ({ camera }: NamedView, style: LengthStyle): string[] =>
  camera.kind === 'lens'
    ? [lensWords(camera, style), frameWords(camera)]
    : [`View ${camera.letter}, ${VIEW_TITLES[camera.letter].toLowerCase()}`];
