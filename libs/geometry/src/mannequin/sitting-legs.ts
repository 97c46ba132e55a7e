import type { PostureChoice } from '../room/posture-choice.ts';
import type { BodyPlacement } from './body-placement.ts';
import { crossedAnkles, sideBySide } from './crossed-legs.ts';
import type { Figure } from './figure.ts';
import { crossedKnees, type TableOver } from './knee-over-knee.ts';
import {
  haveMoved,
  legsFor,
  legsMoved,
  legsOnRail,
  type FeetMoved,
  type FootRail,
  type Legs,
} from './leg-posture.ts';
import { feetPlaced, type PoseNote } from './pose-note.ts';
import type { Stance } from './stance.ts';

/** What of a place bends the legs, as the body has it. */
interface Before {
  placement: BodyPlacement;
  shoe: Pick<Stance, 'shoeMm' | 'forefootMm'>;
  footRail: FootRail | undefined;
  /** Front of the seat before the rearmost buttock. */
  seatFrontMm: number;
  table: TableOver | undefined;
  /** How far feet that stand or hang keep away from what is before them. */
  feet: FeetMoved | undefined;
}

/**
 * Both legs: on the floor, hanging or on a rail, crossed where that is chosen. What is chosen and cannot be had here is
 * said, and the legs are as without the choice.
 */
export function sittingLegs(
  f: Figure,
  { placement, shoe, footRail, seatFrontMm, table, feet }: Before,
  choice: PostureChoice['feet'],
): { legs: Stance['legs']; heelGapMm: number; notes: PoseNote[] } {
  const tiltRad = placement.tiltRad;
  const notes: PoseNote[] = [];
  const standing = legsFor(f, placement, shoe.shoeMm);
  const hangs = standing.heelGapMm > 0.5;
  const wantsRail = choice === 'rail' || ((choice === undefined || choice === 'knees-crossed') && hangs);
  const railed = wantsRail && footRail ? legsOnRail(f, placement, shoe.shoeMm, footRail) : undefined;
  const bends: Legs = railed ?? standing;
  const knees = choice === 'knees-crossed' ? crossedKnees(f, bends, { placement, shoe, table }) : undefined;
  const crossed = knees && 'legs' in knees ? knees.legs : undefined;
  if (knees) notes.push({ kind: 'why' in knees ? knees.why : 'knees-crossed' });
  // Of crossed legs only the right one has its foot where both would be.
  const ofRight = crossed && { side: 'right' as const };
  if (railed) notes.push({ kind: 'feet-on-rail', ...ofRight });
  else if (choice === 'rail') notes.push({ kind: 'rail-out-of-reach' });
  const ankles = choice === 'ankles-crossed';
  if (ankles) notes.push({ kind: 'ankles-crossed' });
  const going = feet && haveMoved(feet) && !feetPlaced(notes) ? feet : undefined;
  if (going && going.backMm > 0) notes.push({ kind: 'feet-drawn-back', valueMm: going.backMm });
  if (going && going.leftMm !== 0) {
    const side = going.leftMm > 0 ? 'left' : 'right';
    notes.push({ kind: 'feet-aside', valueMm: Math.abs(going.leftMm), side });
  }
  if (bends.heelGapMm > 0.5) notes.push({ kind: 'feet-hang', valueMm: bends.heelGapMm, ...ofRight });
  if (bends.kneesLift) notes.push({ kind: 'knees-lift' });
  const uncrossed = (): Stance['legs'] => {
    if (ankles) return crossedAnkles(f, bends, tiltRad, seatFrontMm);
    if (!going) return sideBySide(bends);
    const { leftRad, ...moved } = legsMoved(f, placement, shoe.shoeMm, bends, going);
    const [left, right] = sideBySide(moved);
    return [
      { ...left, inwardRad: -leftRad },
      { ...right, inwardRad: leftRad },
    ];
  };
  return { legs: crossed ?? uncrossed(), heelGapMm: bends.heelGapMm, notes };
}
