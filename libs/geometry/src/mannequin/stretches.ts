import type { Cage, CageFace } from './cage.ts';

/** Stretches of a body by the names that its simple solids carry; those of limbs once a side. */
const OF_TRUNK = ['pelvis', 'belly', 'chest', 'shoulders', 'neck', 'head'] as const;
const OF_LIMBS = ['thigh', 'shin', 'foot', 'shoulder', 'upper arm', 'forearm', 'hand'] as const;

/** The stretches of a skin, in the order in which faces count them. */
export const STRETCH_NAMES: readonly string[] = [
  ...OF_TRUNK,
  ...(['left', 'right'] as const).flatMap((side) => OF_LIMBS.map((name) => `${side} ${name}`)),
];

/** Highest strip of each stretch along the trunk, a leg and an arm. */
const UP_TO = {
  trunk: [
    [1, 'pelvis'],
    [3, 'belly'],
    [6, 'chest'],
    [7, 'shoulders'],
    [9, 'neck'],
  ],
  leg: [
    [3, 'thigh'],
    [6, 'shin'],
  ],
  arm: [
    [1, 'shoulder'],
    [3, 'upper arm'],
    [5, 'forearm'],
  ],
} as const;
const BEYOND = { trunk: 'head', leg: 'foot', arm: 'hand' } as const;

const limbOf = ({ region }: CageFace): 'trunk' | 'leg' | 'arm' =>
  region === 'arm' || region === 'hand' ? 'arm' : region === 'leg' || region === 'shoe' ? 'leg' : 'trunk';

/** For each face of the cage the place of its stretch in `STRETCH_NAMES`. */
export function stretchesOfFaces(cage: Cage): number[] {
  const left = new Set(
    [cage.legs[0], cage.arms[0]].flatMap((rings) => rings.slice(1).flat()).concat(cage.thumbs[0].flat()),
  );
  return cage.faces.map((face) => {
    const limb = limbOf(face);
    const found = face.part === 'cap' ? undefined : UP_TO[limb].find(([strip]) => face.strip <= strip);
    const name = found?.[1] ?? BEYOND[limb];
    const side = face.corners.some((corner) => left.has(corner)) ? 'left' : 'right';
    return STRETCH_NAMES.indexOf(limb === 'trunk' ? name : `${side} ${name}`);
  });
}
