// Forty people at table: one bench is moved, and everything that the page says and poses follows.
import { createRequire } from 'node:module';
import { checkSet, createBodyModel, loadRuleBook } from '@settlewright/anthropometry';
import { deriveParts, measureSet, placeFrames, poseMannequin, tapeLines } from '@settlewright/geometry';
import { roomOfForty } from './lib/room-of-forty.mjs';
import { timesOf } from './lib/times.mjs';

const load = createRequire(import.meta.url);
const WARM_UP = 10;
const EDITS = 30;
const STEP_MM = 5;
const SHOE_MM = 25;
const SINK_MM = 10;

/** Runs the bench; the median of edits that nobody has seen before. Skins are left out: a worker makes them. */
export async function run() {
  const model = createBodyModel(load('@settlewright/seed-data/populations/ansur2.json'));
  const ruleBook = loadRuleBook(load('@settlewright/seed-data/fit-rules.json'));
  const room = roomOfForty();
  const [moved] = room.pieces;
  const sitters = room.seating.map(({ pieceId, place, sitter }) => ({
    id: `${pieceId}:${place}`,
    name: 'sitter',
    kind: 'mannequin',
    placeId: `${pieceId}:${place}`,
    person: model.mannequin(sitter),
  }));
  const personAt = new Map(sitters.map(({ placeId, person }) => [placeId, person]));
  const poses = new Map();

  function pose(frame, situation) {
    const means = model.predict(personAt.get(frame.placeId)).means();
    const input = { means, shoeMm: SHOE_MM, frame, situation, sinkMm: SINK_MM };
    const key = JSON.stringify(input);
    const last = poses.get(frame.placeId);
    const posed = last?.key === key ? last.posed : poseMannequin(input);
    poses.set(frame.placeId, { key, posed });
    return { placeId: frame.placeId, pose: posed };
  }

  function edit(n) {
    const at = { ...moved.at, zMm: moved.at.zMm + (n + 1) * STEP_MM };
    const document = {
      ...room,
      pieces: room.pieces.map((piece) => (piece === moved ? { ...piece, at } : piece)),
    };
    const situation = measureSet(document, ruleBook);
    const sheet = checkSet({ situation, sitters, ruleBook, model, settings: { ...document.asked } });
    deriveParts(document);
    const situations = new Map(situation.places.map((place) => [place.placeId, place]));
    const frames = document.pieces.flatMap((piece) => placeFrames(piece, document));
    const bodies = frames.map((frame) => pose(frame, situations.get(frame.placeId)));
    tapeLines(document, sheet, moved.id, bodies);
  }

  timesOf(WARM_UP, edit);
  const times = timesOf(EDITS, (n) => edit(WARM_UP + n));
  const value = times[EDITS / 2];
  return [{ name: 'room-40-derive', value, unit: 'ms', aim: 100, reference: null }];
}
