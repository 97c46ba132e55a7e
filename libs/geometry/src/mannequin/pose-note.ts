/** Something about the pose worth saying; `valueMm` where it has a size. */
export interface PoseNote {
  kind:
    | 'feet-hang'
    | 'feet-on-rail'
    | 'feet-drawn-back'
    | 'feet-aside'
    | 'ankles-crossed'
    | 'knees-crossed'
    /** Thighs or belly leave a knee no room to lie over the other. */
    | 'too-full-to-cross'
    | 'too-low-to-cross'
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
    /** Something was chosen; the checks answer for the posture without it. */
    | 'not-as-checked';
  valueMm?: number;
  /** Of one arm or leg alone; left out where it is true of both. Of feet that go aside, where to. */
  side?: 'left' | 'right';
}
