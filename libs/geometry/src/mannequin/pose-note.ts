/** Something about the pose worth saying; `valueMm` where it has a size. */
export interface PoseNote {
  kind:
    | 'feet-hang'
    | 'feet-on-rail'
    | 'feet-drawn-back'
    | 'feet-aside'
    | 'ankles-crossed'
    | 'knees-crossed'
    /** No way was found to draw one knee over the other: a full build, or too little height over the floor. */
    | 'knees-stay-apart'
    | 'table-over-knees'
    | 'rail-out-of-reach'
    | 'slides-forward'
    | 'knees-lift'
    | 'sits-upright'
    | 'slumps'
    | 'forearms-on-table'
    | 'forearms-level'
    | 'hands-on-lap'
    | 'hand-to-cup'
    | 'table-out-of-reach'
    | 'forearm-on-sill'
    | 'sill-out-of-reach'
    /** Something was chosen, or feet are out of the way of others; the checks answer for the posture without it. */
    | 'not-as-checked';
  valueMm?: number;
  /** Of one arm or leg alone; left out where it is true of both. Of feet that go aside, where to. */
  side?: 'left' | 'right';
}

const PLACED: readonly PoseNote['kind'][] = ['feet-on-rail', 'ankles-crossed', 'knees-crossed'];

/** Whether feet lie where somebody put them, or on a rail. */
export const feetPlaced = (notes: readonly PoseNote[]): boolean =>
  notes.some(({ kind }) => PLACED.includes(kind));

/** Whether feet are shown out of the way of others. */
export const feetOutOfTheWay = (notes: readonly PoseNote[]): boolean =>
  notes.some(({ kind }) => kind === 'feet-drawn-back' || kind === 'feet-aside');
