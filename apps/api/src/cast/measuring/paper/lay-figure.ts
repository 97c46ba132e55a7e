import { PEN, type Point, type Sheet } from '../../../paper/sheet';

/** Puts a point of the figure, in millimetres of a middling body with y upwards from the floor, on the paper. */
export type Place = (point: Point) => Point;

export type View = 'side' | 'side-arm' | 'front' | 'front-arms' | 'standing';

/** Height of the hard seat under the figure; thighs level, feet on the floor. */
export const SEAT_MM = 420;

const SKIN = 238;
const WOOD = 222;

/** A jointed figure as turners make them: head, trunk and limbs as rounded tapers, seen from the side or in front. */
export function drawLayFigure(sheet: Sheet, view: View, place: Place, scale: number): void {
  const draw = drawer(sheet, place, scale);
  if (view === 'standing') return standing(draw);
  if (view === 'front' || view === 'front-arms') return front(draw, view === 'front-arms');
  side(draw, view === 'side-arm');
}

interface Drawer {
  box: (x1: number, y1: number, x2: number, y2: number) => void;
  limb: (a: Point, ra: number, b: Point, rb: number) => void;
  oval: (centre: Point, rx: number, ry: number) => void;
  dot: (centre: Point, radius: number) => void;
  floor: (from: number, to: number) => void;
  board: (x: number, y1: number, y2: number) => void;
}

function drawer(sheet: Sheet, place: Place, scale: number): Drawer {
  const shape = (points: Point[], fill: number) =>
    sheet.path(points.map(place), { pen: PEN.fine, fill, closed: true });
  return {
    box: (x1, y1, x2, y2) =>
      shape(
        [
          [x1, y1],
          [x2, y1],
          [x2, y2],
          [x1, y2],
        ],
        WOOD,
      ),
    limb: (a, ra, b, rb) => shape(taper(a, ra, b, rb), SKIN),
    oval: ([x, y], rx, ry) =>
      shape(
        turn(40).map((t): Point => [x + rx * Math.cos(t), y + ry * Math.sin(t)]),
        SKIN,
      ),
    dot: (centre, radius) => {
      const [x, y] = place(centre);
      sheet.circle(x, y, radius * scale, { fill: 0, bare: true });
    },
    floor: (from, to) => sheet.line(...place([from, 0]), ...place([to, 0]), { pen: PEN.edge }),
    board: (x, y1, y2) => sheet.line(...place([x, y1]), ...place([x, y2]), { pen: PEN.frame }),
  };
}

const turn = (steps: number): number[] => Array.from({ length: steps }, (_, i) => (2 * Math.PI * i) / steps);

/** Outline of two circles and the straight lines that touch both. */
function taper([ax, ay]: Point, ra: number, [bx, by]: Point, rb: number): Point[] {
  const length = Math.hypot(bx - ax, by - ay);
  const along = Math.atan2(by - ay, bx - ax);
  const open = Math.acos(Math.max(-1, Math.min(1, (ra - rb) / length)));
  const arc = (x: number, y: number, r: number, from: number, to: number): Point[] =>
    Array.from({ length: 13 }, (_, i) => {
      const t = from + ((to - from) * i) / 12;
      return [x + r * Math.cos(t), y + r * Math.sin(t)];
    });
  return [
    ...arc(bx, by, rb, along - open, along + open),
    ...arc(ax, ay, ra, along + open, along + 2 * Math.PI - open),
  ];
}

function side(draw: Drawer, arm: boolean): void {
  draw.floor(-60, 830);
  draw.box(0, 0, 400, SEAT_MM);
  draw.board(0, SEAT_MM, 1000);
  draw.limb([545, 90], 42, [545, 455], 55);
  draw.limb([540, 36], 36, [725, 22], 20);
  draw.limb([100, 505], 84, [540, 460], 54);
  draw.oval([132, 655], 118, 150);
  draw.limb([110, 640], 98, [118, 920], 92);
  draw.limb([128, 1000], 52, [140, 1100], 46);
  draw.oval([148, 1185], 92, 115);
  draw.dot([222, 1190], 9);
  if (!arm) return;
  draw.limb([122, 955], 52, [130, 702], 40);
  draw.limb([130, 700], 40, [370, 706], 28);
  draw.oval([415, 706], 55, 22);
}

function front(draw: Drawer, arms: boolean): void {
  draw.floor(-330, 330);
  draw.box(-300, 0, 300, SEAT_MM);
  for (const s of [-1, 1]) draw.limb([s * 95, 500], 95, [s * 62, 490], 90);
  draw.limb([0, 600], 135, [0, 880], 150);
  draw.limb([-110, 925], 70, [110, 925], 70);
  draw.limb([0, 1000], 50, [0, 1090], 48);
  draw.oval([0, 1185], 76, 115);
  for (const s of [-1, 1]) {
    const elbow: Point = [s * (arms ? 205 : 192), 700];
    draw.limb([s * 182, 930], 50, elbow, 38);
    if (arms) draw.limb(elbow, 42, [s * 165, 690], 34);
    else draw.limb(elbow, 36, [s * 150, 540], 26);
    draw.limb([s * 62, 70], 38, [s * 62, 470], 54);
    draw.limb([s * 62, 20], 30, [s * 70, 20], 30);
  }
}

function standing(draw: Drawer): void {
  draw.floor(-330, 330);
  for (const s of [-1, 1]) {
    draw.limb([s * 70, 70], 36, [s * 75, 450], 54);
    draw.limb([s * 75, 470], 52, [s * 85, 830], 84);
    draw.limb([s * 70, 24], 28, [s * 92, 22], 26);
    draw.limb([s * 190, 1330], 48, [s * 215, 1060], 38);
    draw.limb([s * 215, 1050], 36, [s * 225, 790], 24);
  }
  draw.limb([0, 900], 150, [0, 1280], 150);
  draw.limb([-115, 1340], 66, [115, 1340], 66);
  draw.limb([0, 1420], 48, [0, 1490], 46);
  draw.oval([0, 1590], 76, 115);
}
