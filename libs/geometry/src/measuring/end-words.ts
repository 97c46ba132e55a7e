import { mixPoints } from '../mannequin/vector.ts';
import { partEdges } from '../drawing/solid-outline.ts';
import { toPiece } from '../parts/placement.ts';
import type { Part, PartRole, Vec3 } from '../parts/part.ts';
import { bodyPointWords } from './body-points.ts';
import type { MeasureEnd } from './dimension.ts';
import type { MeasuringScene } from './measuring-scene.ts';
import { partFrame } from './part-frame.ts';

const ROLE_WORDS: Partial<Record<PartRole, string>> = {
  'seat-cushion': 'seat',
  'back-cushion': 'back cushion',
  'back-board': 'back board',
  'back-frame': 'back frame',
  'end-wall': 'end wall',
  'edge-lip': 'edge lip',
  'sill-board': 'sill board',
  'wall-board': 'wall board',
  'wall-panel': 'wall panel',
};

/** How far from the middle a point lies along an axis before the side is named, in parts of the half size. */
const TO_A_SIDE = 0.3;
const SIDES = [
  ['left', 'right'],
  ['lower', 'upper'],
  ['back', 'front'],
] as const;
/** Front or back is said first, then left or right, then the height. */
const SAID = [2, 0, 1] as const;

/**
 * What a part of a set is called: mark and role, numbered where the piece has several of it.
 *
 * @param part - of the set
 * @param scene - the set
 */
export function partWords(part: Part, scene: MeasuringScene): string {
  const mark = scene.pieces.get(part.pieceId)?.mark ?? part.pieceId;
  const role = ROLE_WORDS[part.role] ?? part.role;
  const alike = scene.alike(part);
  return alike.length > 1 ? `${mark} ${role} ${alike.indexOf(part.id) + 1}` : `${mark} ${role}`;
}

/** "front left upper": on which sides of a part a point lies, as seen from in front of its piece. */
function sideWords(part: Part, point: Vec3, scene: MeasuringScene): string {
  const piece = scene.pieces.get(part.pieceId);
  if (!piece) return '';
  const frame = partFrame(part);
  const { corners } = partEdges(part);
  const own = corners.map(frame.toPart);
  const at = frame.toPart(point);
  const origin = toPiece(piece.at, [0, 0, 0]);
  const signs: Record<0 | 1 | 2, number> = { 0: 0, 1: 0, 2: 0 };
  for (const n of [0, 1, 2] as const) {
    const values = own.map((corner) => corner[n]);
    const [low, high] = [Math.min(...values), Math.max(...values)];
    const side = (at[n] - (low + high) / 2) / Math.max((high - low) / 2, 1e-6);
    if (Math.abs(side) < TO_A_SIDE) continue;
    const axis = toPiece(piece.at, frame.axes[n]);
    const along: Vec3 = [axis[0] - origin[0], axis[1] - origin[1], axis[2] - origin[2]];
    const main = ([0, 1, 2] as const).reduce((a, b) => (Math.abs(along[b]) > Math.abs(along[a]) ? b : a));
    signs[main] = side * Math.sign(along[main]);
  }
  return SAID.flatMap((n) => (signs[n] === 0 ? [] : [SIDES[n][signs[n] < 0 ? 0 : 1]])).join(' ');
}

const spaced = (...words: readonly string[]): string => words.filter((word) => word !== '').join(' ');

/** Which way a face of a part looks. */
function faceWords(part: Part, point: Vec3, scene: MeasuringScene): string {
  const frame = partFrame(part);
  const centre = partEdges(part).corners.map(frame.toPart);
  const at = frame.toPart(point);
  let [best, nearest]: [Vec3, number] = [point, Infinity];
  for (const n of [0, 1, 2] as const) {
    for (const pick of [Math.min, Math.max]) {
      const face = pick(...centre.map((corner) => corner[n]));
      const away = Math.abs(at[n] - face);
      if (away >= nearest) continue;
      nearest = away;
      const middle = [0, 1, 2].map((m) => {
        const values = centre.map((corner) => corner[m]!);
        return (Math.min(...values) + Math.max(...values)) / 2;
      });
      middle[n] = face;
      best = frame.toRoom([middle[0]!, middle[1]!, middle[2]!]);
    }
  }
  return sideWords(part, best, scene);
}

/**
 * What an end of a measured line is called: "front left upper corner of T1 top", "Ottilie, top of the left knee".
 *
 * @param end - of a line
 * @param scene - the set and who sits in it
 * @returns words; an end whose part is gone says so
 */
export function endWords(end: MeasureEnd, scene: MeasuringScene): string {
  if (end.on === 'body') {
    const mark = scene.pieces.get(end.pieceId)?.mark ?? end.pieceId;
    const who = scene.body(end.pieceId, end.place)?.name ?? `whoever sits at place ${end.place} of ${mark}`;
    return end.point === 'whole' ? `${who}, whole body` : `${who}, ${bodyPointWords(end.point)}`;
  }
  const part = scene.parts.get(end.partId);
  if (!part) return `a part of ${scene.pieces.get(end.pieceId)?.mark ?? 'a piece'} that is gone`;
  const name = partWords(part, scene);
  if (end.on === 'part') return `the whole of ${name}`;
  const { corners, edges } = partEdges(part);
  if (end.on === 'spot') {
    const point = scene.pieces.get(end.pieceId) && scene.spot(end.pieceId, end.atMm);
    return point ? spaced(faceWords(part, point, scene), `face of ${name}`) : `face of ${name}`;
  }
  if (part.solid.shape === 'cylinder') return `rim of ${name}`;
  if (end.on === 'corner') {
    const point = corners[end.corner];
    return spaced(point ? sideWords(part, point, scene) : '', `corner of ${name}`);
  }
  const [a, b] = (edges[end.edge] ?? []).map((n) => corners[n]);
  const middle = a && b && mixPoints(a, b, 0.5);
  const halfway = Math.abs(end.along - 0.5) < 1e-6 ? 'middle of the' : '';
  return spaced(halfway, middle ? sideWords(part, middle, scene) : '', `edge of ${name}`);
}
