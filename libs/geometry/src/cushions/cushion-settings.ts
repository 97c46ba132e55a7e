/** Where a number comes from, in the words the sheets use. */
export type SettingSource = 'published source' | 'common practice' | 'shop rule' | 'from memory';

/** One number of the workshop's way of making cushions. */
export interface CushionSetting {
  valueMm: number;
  label: string;
  source: SettingSource;
}

const inches = (value: number, label: string, source: SettingSource): CushionSetting => ({
  valueMm: value * 25.4,
  label,
  source,
});

/** Allowances used when a workshop has set none of its own. */
export const CUSHION_SETTINGS = {
  wallGap: inches(1 / 8, 'gap to a wall, end wall or arm', 'from memory'),
  freeGap: inches(1 / 8, 'gap at a free end', 'from memory'),
  neighbourGap: inches(1 / 8, 'each cushion’s share of the gap to its neighbour', 'from memory'),
  backGap: inches(1 / 4, 'gap to the back pad', 'from memory'),
  frontGap: inches(0, 'gap at the front edge', 'shop rule'),
  foamOversize: inches(1 / 2, 'foam larger than finished, in width and in depth', 'published source'),
  seam: inches(1 / 2, 'seam allowance', 'published source'),
  zipWrap: inches(3, 'zip round each back corner', 'published source'),
  zipAllowance: inches(
    3 / 2,
    'added to the boxing width for both halves of the zip panel',
    'published source',
  ),
  weltJoin: inches(3, 'welt added for the join of each seam', 'shop rule'),
  weltStrip: inches(3 / 2, 'width of the welt strip', 'published source'),
  clothWidth: inches(54, 'width of the cloth', 'published source'),
  crown: inches(1 / 4, 'most that a cushion crowns over its edges', 'from memory'),
  knifeCrown: inches(
    1 / 2,
    'cut larger at each side of a knife edge for each inch it is thick',
    'from memory',
  ),
  boardSmaller: inches(1 / 2, 'board smaller than finished, in width and in depth', 'from memory'),
  tightBoxing: inches(1 / 4, 'tight boxing cut higher than the foam, seams included', 'published source'),
  boardThickness: inches(3 / 8, 'plywood of the board', 'from memory'),
  boardFoamOver: inches(3 / 8, 'foam larger than its board, on every side', 'published source'),
  pull: inches(5 / 2, 'cover pulled round and stapled under the board', 'published source'),
  buttonPull: inches(3 / 8, 'how far a button without fullness is pulled in', 'from memory'),
  wrapLost: inches(1 / 2, 'lost of each inch of wrap under a sitter', 'from memory'),
  buttonToEdge: inches(4, 'least distance of a button from the edge', 'from memory'),
} as const satisfies Record<string, CushionSetting>;

/** The allowances a set of cushions is made with. */
export type CushionSettings = Record<keyof typeof CUSHION_SETTINGS, CushionSetting>;
