/**
 * The one control mesh of every mannequin: which section points it has and how quads join them.
 * Trunk and head are rings of twelve, legs and arms rings of eight; limbs grow out of loops of the
 * trunk, so the skin is one closed surface.
 */

/** Trunk columns run from the front (0) over the sitter's left (3) and the back (6) to the right (9). */
export const TRUNK_COLUMNS = 12;
export const TRUNK_RINGS = 15;
export const LIMB_COLUMNS = 8;
/** Rings of their own; ring 0 of a limb is a loop of the trunk. */
export const LEG_RINGS = 12;
export const ARM_RINGS = 9;
export const THUMB_RINGS = 2;

/** What a face belongs to. */
export type Region = 'trunk' | 'head' | 'arm' | 'hand' | 'leg' | 'shoe';

/** One quad of the cage. `strip` is the ring below it; corners run around first, then along. */
export interface CageFace {
  corners: readonly [number, number, number, number];
  region: Region;
  part: 'trunk' | 'leg' | 'arm' | 'cap';
  strip: number;
}

/** Loop of trunk points that an arm grows from: acromion first, then forwards, under the arm and back up. */
const ARMHOLE: readonly (readonly [ring: number, column: number])[] = [
  [7, 3],
  [7, 2],
  [6, 2],
  [5, 2],
  [5, 3],
  [5, 4],
  [6, 4],
  [7, 4],
];

/** Points and faces of the cage. Limbs come in pairs: the sitter's left first. */
export interface Cage {
  pointCount: number;
  faces: CageFace[];
  /** `trunk[ring][column]`; -1 inside an armhole. */
  trunk: number[][];
  crown: [number, number, number];
  crotch: number;
  /** `legs[side][ring][column]`, ring 0 shared with the trunk. Column 1 is the top or front, 3 the outside. */
  legs: [number[][], number[][]];
  toes: [number, number];
  /** `arms[side][ring][column]`, ring 0 shared. Column 0 is the outside, 2 the front, 4 the inside. */
  arms: [number[][], number[][]];
  fingers: [number, number];
  /** `thumbs[side][ring]`, six points. */
  thumbs: [number[][], number[][]];
}

const mirrorColumn = (column: number): number => (TRUNK_COLUMNS - column) % TRUNK_COLUMNS;

/** Lays out the cage; the result is the same on every call. */
export function buildCage(): Cage {
  let next = 0;
  const ring = (count: number): number[] => Array.from({ length: count }, () => next++);
  const trunk = Array.from({ length: TRUNK_RINGS }, (_, r) =>
    Array.from({ length: TRUNK_COLUMNS }, (_, c) => (r === 6 && (c === 3 || c === 9) ? -1 : next++)),
  );
  const crown: [number, number, number] = [next++, next++, next++];
  const crotch = next++;
  const faces: CageFace[] = [];
  const trunkAt = (r: number, c: number): number => trunk[r]![c % TRUNK_COLUMNS]!;

  for (let r = 0; r + 1 < TRUNK_RINGS; r++) {
    for (let c = 0; c < TRUNK_COLUMNS; c++) {
      const corners = [trunkAt(r, c), trunkAt(r, c + 1), trunkAt(r + 1, c + 1), trunkAt(r + 1, c)] as const;
      if (corners.includes(-1)) continue;
      faces.push({ corners, region: r >= 8 ? 'head' : 'trunk', part: 'trunk', strip: r });
    }
  }
  addCrown(faces, trunk[TRUNK_RINGS - 1]!, crown);

  const strips = (
    rings: number[][],
    part: 'leg' | 'arm',
    region: (strip: number) => Region,
    skip?: (r: number, c: number) => boolean,
  ): void => {
    for (let r = 0; r + 1 < rings.length; r++) {
      for (let c = 0; c < LIMB_COLUMNS; c++) {
        if (skip?.(r, c)) continue;
        const d = (c + 1) % LIMB_COLUMNS;
        const corners = [rings[r]![c]!, rings[r]![d]!, rings[r + 1]![d]!, rings[r + 1]![c]!] as const;
        faces.push({ corners, region: region(r), part, strip: r });
      }
    }
  };
  const cap = (loop: number[], middle: number, region: Region): void => {
    for (let c = 0; c < LIMB_COLUMNS; c += 2) {
      const before = loop[(c + LIMB_COLUMNS - 1) % LIMB_COLUMNS]!;
      faces.push({ corners: [loop[c]!, loop[c + 1]!, middle, before], region, part: 'cap', strip: 0 });
    }
  };

  const side = (mirrored: boolean) => {
    const column = (c: number): number => (mirrored ? mirrorColumn(c) : c);
    const hip = [0, 1, 2, 3, 4, 5, 6].map((c) => trunkAt(0, column(c)));
    const leg = [[...hip, crotch], ...Array.from({ length: LEG_RINGS }, () => ring(LIMB_COLUMNS))];
    const toe = next++;
    strips(leg, 'leg', (r) => (r >= 7 ? 'shoe' : 'leg'));
    cap(leg[LEG_RINGS]!, toe, 'shoe');

    const arm = [
      ARMHOLE.map(([r, c]) => trunkAt(r, column(c))),
      ...Array.from({ length: ARM_RINGS }, () => ring(LIMB_COLUMNS)),
    ];
    const finger = next++;
    strips(
      arm,
      'arm',
      (r) => (r >= 6 ? 'hand' : 'arm'),
      (r, c) => r === 7 && (c === 3 || c === 4),
    );
    cap(arm[ARM_RINGS]!, finger, 'hand');

    const thumb = Array.from({ length: THUMB_RINGS }, () => ring(6));
    const root = [arm[7]![3]!, arm[7]![4]!, arm[7]![5]!, arm[8]![5]!, arm[8]![4]!, arm[8]![3]!];
    const loops = [root, ...thumb];
    for (let r = 0; r < THUMB_RINGS; r++) {
      for (let c = 0; c < 6; c++) {
        const d = (c + 1) % 6;
        const corners = [loops[r]![c]!, loops[r]![d]!, loops[r + 1]![d]!, loops[r + 1]![c]!] as const;
        faces.push({ corners, region: 'hand', part: 'cap', strip: r });
      }
    }
    const tip = thumb[THUMB_RINGS - 1]!;
    faces.push({ corners: [tip[0]!, tip[1]!, tip[4]!, tip[5]!], region: 'hand', part: 'cap', strip: 0 });
    faces.push({ corners: [tip[1]!, tip[2]!, tip[3]!, tip[4]!], region: 'hand', part: 'cap', strip: 0 });
    return { leg, toe, arm, finger, thumb };
  };
  const left = side(false);
  const right = side(true);
  return {
    pointCount: next,
    faces,
    trunk,
    crown,
    crotch,
    legs: [left.leg, right.leg],
    toes: [left.toe, right.toe],
    arms: [left.arm, right.arm],
    fingers: [left.finger, right.finger],
    thumbs: [left.thumb, right.thumb],
  };
}

/** Closes the crown: the ring of twelve is the rim of a field two quads wide and four long, front to back. */
function addCrown(faces: CageFace[], rim: number[], crown: [number, number, number]): void {
  const [front, middle, back] = crown;
  const at = (c: number): number => rim[c]!;
  const quads: [number, number, number, number][] = [
    [at(0), at(1), at(2), front],
    [at(11), at(0), front, at(10)],
    [front, at(2), at(3), middle],
    [at(10), front, middle, at(9)],
    [middle, at(3), at(4), back],
    [at(9), middle, back, at(8)],
    [back, at(4), at(5), at(6)],
    [at(8), back, at(6), at(7)],
  ];
  for (const corners of quads) faces.push({ corners, region: 'head', part: 'cap', strip: 0 });
}
