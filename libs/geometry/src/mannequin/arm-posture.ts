import type { PlaceSituation } from '@settlewright/anthropometry';
import type { Vec3 } from '../parts/part.ts';
import type { PostureChoice } from '../room/posture-choice.ts';
import { armLevel, armOnLap, armOnSill, armOnTable, armToCup } from './arm-stance.ts';
import type { Figure } from './figure.ts';
import type { PoseNote } from './pose-note.ts';
import { lapUnder } from './lap.ts';
import { kneesCross, type ArmStance, type Stance, type TrunkBend } from './stance.ts';

/** What the arms may lie on, in the body frame. */
export interface ArmRests {
  /** Near edge of the table: height of the top, forwards. */
  table?: { topMm: number; edgeMm: number } | undefined;
  sills: readonly { side: 'left' | 'right'; topMm: number; nearMm: number; depthMm: number }[];
}

type Sill = Pick<PlaceSituation['sills'][number], 'side' | 'topMm' | 'centreToEdgeMm' | 'usableDepthMm'>;

/** Sills beside a body, in its own frame. */
export function sillsOf(sills: readonly Sill[], seatMm: number, leftMm: number): ArmRests['sills'] {
  return sills.flatMap(({ side, topMm, centreToEdgeMm, usableDepthMm }) =>
    side === 'behind'
      ? []
      : [
          {
            side,
            topMm: topMm - seatMm,
            nearMm: centreToEdgeMm + (side === 'left' ? -leftMm : leftMm),
            depthMm: usableDepthMm,
          },
        ],
  );
}

/**
 * Both arms: on a table in reach or on the lap, one on a sill or at a cup when that is chosen. What is chosen and out of
 * reach is said, and the arms lie as without the choice.
 */
export function armsFor(
  f: Figure,
  bend: TrunkBend,
  legs: Stance['legs'],
  rests: ArmRests,
  up: Vec3,
  choice: PostureChoice['arms'],
): { arms: readonly [left: ArmStance, right: ArmStance]; notes: PoseNote[] } {
  const onLap = (side: 0 | 1): ArmStance => armOnLap(f, bend, lapUnder(f, legs, side));
  const lap = (): readonly [left: ArmStance, right: ArmStance] => {
    const left = onLap(0);
    return [left, kneesCross({ legs }) ? onLap(1) : left];
  };
  const level = choice === 'level';
  if (level) {
    const arm = armLevel(f, bend);
    return { arms: [arm, arm], notes: [{ kind: 'forearms-level' }] };
  }
  const table = choice === 'lap' ? undefined : rests.table && armOnTable(f, bend, rests.table, up);
  const [left, right] = table ? [table, table] : lap();
  const kind = table ? 'forearms-on-table' : 'hands-on-lap';
  const notes: PoseNote[] = [{ kind }];
  const without = { arms: [left, right] as const, notes };
  if (choice === 'table' && !table) notes.push({ kind: 'table-out-of-reach' });
  if (choice === 'cup') {
    const cup = rests.table && armToCup(f, bend, rests.table, up);
    if (!cup) return { ...without, notes: [...notes, { kind: 'table-out-of-reach' }] };
    return { arms: [left, cup], notes: [{ kind, side: 'left' }, { kind: 'hand-to-cup' }] };
  }
  if (choice === 'sill-left' || choice === 'sill-right') {
    const side = choice === 'sill-left' ? 'left' : 'right';
    const sill = rests.sills.find((one) => one.side === side);
    const arm = sill && armOnSill(f, bend, sill, up);
    if (!arm) return { ...without, notes: [...notes, { kind: 'sill-out-of-reach', side }] };
    return {
      arms: side === 'left' ? [arm, right] : [left, arm],
      notes: [
        { kind, side: side === 'left' ? 'right' : 'left' },
        { kind: 'forearm-on-sill', side },
      ],
    };
  }
  return without;
}
