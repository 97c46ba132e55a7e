import { formatLength, type LengthStyle, type PoseNote } from '@settlewright/geometry';

/** How somebody sits, one note of the pose in words. */
export function sayNote({ kind, valueMm = 0, side }: PoseNote, style: LengthStyle): string {
  const size = formatLength(valueMm, style);
  const sided = (one: string, both = one) => (side ? `${side} ${one}` : both);
  switch (kind) {
    case 'feet-hang':
      return `${sided('foot hangs', 'feet hang')} ${size}`;
    case 'slides-forward':
      return `sits ${size} forward of the back to free the knees; the back is not supported`;
    case 'knees-lift':
      return 'the seat is low: the thighs lift off it';
    case 'forearms-on-table':
      return sided('forearm on the table', 'forearms on the table');
    case 'hands-on-lap':
      return sided('hand on the lap', 'hands on the lap');
    case 'feet-on-rail':
      return sided('foot on the rail', 'feet on the rail');
    case 'feet-drawn-back':
      return `feet drawn back ${size} from what is before them`;
    case 'feet-aside':
      return `feet ${size} to the sitter’s ${side}, past those opposite`;
    case 'ankles-crossed':
      return 'ankles crossed';
    case 'knees-crossed':
      return 'knees crossed, the left over the right';
    case 'knees-stay-apart':
      return 'crossed knees are not drawn for this build on this seat';
    case 'table-over-knees':
      return 'the table leaves no room for crossed knees';
    case 'rail-out-of-reach':
      return 'no rail in reach of the feet';
    case 'sits-upright':
      return 'sits upright, off the back';
    case 'slumps':
      return 'slumps';
    case 'forearms-level':
      return 'arms hanging, forearms level';
    case 'hand-to-cup':
      return 'right hand at a cup';
    case 'table-out-of-reach':
      return 'no table in reach';
    case 'forearm-on-sill':
      return sided('forearm on the sill');
    case 'sill-out-of-reach':
      return `no sill in reach on the ${side}`;
    case 'not-as-checked':
      return 'posture chosen by hand; the checks are for the usual one';
  }
}
