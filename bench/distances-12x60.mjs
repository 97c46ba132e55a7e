import { createRequire } from 'node:module';
import { createBodyModel } from '@settlewright/anthropometry';
import {
  deriveParts,
  mannequinMesh,
  measureSet,
  placeFrames,
  poseMannequin,
  sitterDistances,
} from '@settlewright/geometry';
import { roomOfTwelve } from './lib/room-of-twelve.mjs';
import { middleTime } from './lib/times.mjs';

const load = createRequire(import.meta.url);
const PARTS = 60;
const WARM_UP = 30;
const RUNS = 60;

const SKIN_RUNS = 15;

/**
 * Time to find contacts, overlaps and the smallest gap of twelve sitters among the sixty parts nearest to them: on simple
 * solids, and on the skins that the page measures on once the hand rests, bodies made anew each time.
 */
export async function run() {
  const model = createBodyModel(load('@settlewright/seed-data/populations/ansur2.json'));
  const document = roomOfTwelve();
  const situation = measureSet(document);
  const frames = document.pieces.flatMap((piece) => placeFrames(piece, document));
  const bodies = document.seating.map(({ pieceId, place, sitter }) => {
    const placeId = `${pieceId}:${place}`;
    const means = model.predict(model.mannequin(sitter)).means();
    const frame = frames.find((one) => one.placeId === placeId);
    const measured = situation.places.find((one) => one.placeId === placeId);
    return {
      placeId,
      pieceId,
      pose: poseMannequin({ means, shoeMm: 25, frame, situation: measured, sinkMm: 10 }),
    };
  });
  const away = ({ positionMm: [x, , z] }) =>
    Math.min(...bodies.map(({ pose }) => Math.hypot(x - pose.joints.pelvis[0], z - pose.joints.pelvis[2])));
  const parts = deriveParts(document)
    .sort((a, b) => away(a) - away(b))
    .slice(0, PARTS);
  const measure = () => sitterDistances(bodies, parts);
  middleTime(WARM_UP, measure);
  const skins = bodies.map(({ pose }) => mannequinMesh(pose));
  const measureSkins = () =>
    sitterDistances(
      bodies.map((body, i) => ({ ...body, mesh: { ...skins[i] } })),
      parts,
    );
  const figure = (name, value, aim) => ({ name, value, unit: 'ms', aim, reference: null });
  return [
    figure('distances-12x60', middleTime(RUNS, measure), 5),
    figure('distances-12x60-skin', middleTime(SKIN_RUNS, measureSkins), 100),
  ];
}
