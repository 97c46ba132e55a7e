import { SITTER_COLOURS } from '@settlewright/geometry';
import { Vector3 } from 'three';
import { MATERIALS } from './solids';

export interface Palette {
  /** Light, middle and dark of each material, in the order of `MATERIALS`. */
  tones: Vector3[];
  pen: Vector3;
  /** Outline of the selected piece. */
  chosen: Vector3;
  floor: Vector3;
  wall: Vector3;
  shade: Vector3;
  sitters: Vector3[];
}

const TONE_TOKENS: Record<(typeof MATERIALS)[number], readonly [string, string, string]> = {
  oak: ['oak-1', 'oak-2', 'oak-3'],
  walnut: ['walnut-1', 'walnut-2', 'walnut-3'],
  cloth: ['cloth-1', 'cloth-2', 'cloth-3'],
  wall: ['sheet', 'wall', 'shade'],
  glass: ['daylight', 'daylight', 'hill-1'],
  ply: ['oak-1', 'oak-1', 'oak-2'],
};

function channels(hex: string): Vector3 {
  const digits = hex.trim().replace('#', '');
  const full = digits.length === 3 ? [...digits].map((digit) => digit + digit).join('') : digits;
  const value = Number.parseInt(full, 16);
  return Number.isNaN(value)
    ? new Vector3(0.5, 0.5, 0.5)
    : new Vector3((value >> 16) / 255, ((value >> 8) & 255) / 255, (value & 255) / 255);
}

/** The tokens of the light theme, for what goes on paper: asked and put back before anything is painted. */
export function readPaperPalette(element: Element): Palette {
  const root = document.documentElement;
  const { theme } = root.dataset;
  root.dataset.theme = 'light';
  try {
    return readPalette(element);
  } finally {
    if (theme === undefined) delete root.dataset.theme;
    else root.dataset.theme = theme;
  }
}

/** Reads the tokens of the theme in force: the picture has no colours of its own. */
export function readPalette(element: Element): Palette {
  const style = getComputedStyle(element);
  const token = (name: string) => channels(style.getPropertyValue(`--color-${name}`));
  const dark = document.documentElement.dataset.theme === 'dark';
  return {
    tones: MATERIALS.flatMap((material) => TONE_TOKENS[material].map(token)),
    pen: token('pen'),
    chosen: token(dark ? 'ink' : 'pen'),
    floor: token('floor'),
    wall: token('wall'),
    shade: token('shade'),
    sitters: SITTER_COLOURS.map((n) => token(`sitter-${n}`)),
  };
}
