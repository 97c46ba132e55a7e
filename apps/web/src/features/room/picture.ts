import {
  checkSet,
  REFERENCE_SITTER_KG,
  seatSinkMm,
  type Body,
  type FitSheet,
  type MeasureKey,
  type PlaceSituation,
  type SetSituation,
} from '@settlewright/anthropometry';
import {
  deriveParts,
  feetClear,
  footRailOf,
  haveMoved,
  measureSet,
  placeFrames,
  poseMannequin,
  type MannequinPose,
  type Part,
  type PlaceFrame,
  type PostureChoice,
  type SetDocument,
  type Vec3,
} from '@settlewright/geometry';
import type { CastMember } from '@/lib/contract';
import type { FitEngine } from './engine';
import { coloursOf, sitterName, sittersOf } from './sitters';

type PosedAt = Omit<Parameters<typeof poseMannequin>[0], 'means'>;

/** A body at its place; its skin is made from the pose, in a worker. */
export interface SeatedBody {
  placeId: string;
  pieceId: string;
  name: string;
  colour: number;
  statureMm: number;
  /** True when the height itself, or more, was predicted or told. */
  estimated: boolean;
  pose: MannequinPose;
  /** What the pose was made from beside the measures. */
  at: PosedAt;
  /** What is believed of the measures; absent for readers who may not see them, and for children. */
  belief?: Body;
  /** A child: drawn for scale, with measures that are borrowed of grown-ups. */
  forScale: boolean;
  /** Top of the head, where the leader of a name ends. */
  crownMm: Vec3;
}

/** Everything that follows from a document. */
export interface RoomPicture {
  document: SetDocument;
  parts: Part[];
  situation: SetSituation;
  sheet: FitSheet;
  bodies: SeatedBody[];
  /** Sitters whose measures make no body that can be drawn; their checks are made all the same. */
  undrawn: string[];
}

/** What the server makes for readers who may not see measures. */
export type ServerFitSheet = FitSheet & {
  detail: 'full' | 'verdicts';
  bodies?: { placeId: string; means: Record<MeasureKey, number>; shoeMm: number }[];
};

export interface PictureMaker {
  picture: (document: SetDocument) => RoomPicture;
  check: (document: SetDocument) => FitSheet;
  /** The same without the row of the public, for pages that try many sets. */
  tryOut: (document: SetDocument) => FitSheet;
}

interface BodyInput {
  means: Record<MeasureKey, number>;
  shoeMm: number;
  weightKg: number;
  estimated: boolean;
  belief?: Body;
}

function crownOf(pose: MannequinPose, frame: PlaceFrame): Vec3 {
  const head = pose.segments.find((segment) => segment.tag === 'head' && segment.kind === 'ellipsoid');
  const [x, , z] = head?.kind === 'ellipsoid' ? head.centreMm : frame.hipMm;
  return [x, pose.headTopMm, z];
}

/** Remembers the last body drawn at a place, so that a change elsewhere costs nothing. */
function createBodyMaker() {
  const kept = new Map<string, { key: string; pose: MannequinPose; at: PosedAt }>();
  return (
    frame: PlaceFrame,
    situation: PlaceSituation,
    body: BodyInput,
    parts: readonly Part[],
    choice: PostureChoice | undefined,
    feet?: PosedAt['feet'],
  ) => {
    // A slipped digit in one measure may put another below nothing: that person is named, the others are drawn.
    if (Object.values(body.means).some((value) => !(value > 0))) return undefined;
    const sinkMm = situation.foam ? seatSinkMm(situation.foam, body.weightKg).sinkMm : 0;
    const { means, shoeMm } = body;
    const around = { ...situation, footRail: footRailOf(parts, frame) };
    const at: PosedAt = { shoeMm, frame, situation: around, sinkMm, choice, ...(feet && { feet }) };
    const input = { means, ...at };
    const key = JSON.stringify(input);
    // Both stay known: how far feet go is asked of those that have not gone yet.
    const spot = `${frame.placeId} ${feet !== undefined}`;
    const last = kept.get(spot);
    if (last?.key === key) return last;
    const made = { key, pose: poseMannequin(input), at };
    kept.set(spot, made);
    return made;
  };
}

interface PictureOptions {
  /** The sheet as the server made it, for readers who may not see measures. */
  server?: ServerFitSheet | undefined;
  /** Probability that the workshop asks of a verdict; the rule book's when nothing is set. */
  confidence?: number | null | undefined;
}

export function createPictureMaker(
  engine: FitEngine,
  cast: readonly CastMember[],
  { server, confidence }: PictureOptions = {},
): PictureMaker {
  const situations = new WeakMap<SetDocument, SetSituation>();
  const sheets = new WeakMap<SetDocument, FitSheet>();
  const trials = new WeakMap<SetDocument, FitSheet>();
  const pictures = new WeakMap<SetDocument, RoomPicture>();
  const makeBody = createBodyMaker();

  function situationOf(document: SetDocument): SetSituation {
    const situation = situations.get(document) ?? measureSet(document, engine.ruleBook);
    situations.set(document, situation);
    return situation;
  }

  function made(document: SetDocument, kept: WeakMap<SetDocument, FitSheet>, sittersOnly: boolean): FitSheet {
    if (server) return server;
    const sheet =
      kept.get(document) ??
      checkSet({
        situation: situationOf(document),
        sitters: sittersOf(document, cast, engine.model),
        ruleBook: engine.ruleBook,
        model: engine.model,
        settings: { ...document.asked, ...(typeof confidence === 'number' && { confidence }) },
        sittersOnly,
      });
    kept.set(document, sheet);
    return sheet;
  }

  const check = (document: SetDocument): FitSheet => made(document, sheets, false);
  const tryOut = (document: SetDocument): FitSheet => made(document, trials, true);

  function inputs(document: SetDocument): Map<string, BodyInput> {
    if (server?.bodies) {
      return new Map(
        server.bodies.map(({ placeId, means, shoeMm }) => [
          placeId,
          { means, shoeMm, weightKg: REFERENCE_SITTER_KG, estimated: false },
        ]),
      );
    }
    return new Map(
      sittersOf(document, cast, engine.model).flatMap(
        ({ placeId, person, noBody }): [string, BodyInput][] => {
          if (noBody) return [];
          const body = engine.model.predict(person);
          const { weightKg } = body;
          const { shoeMm, exact, measured } = person;
          const known = { means: body.means(), shoeMm, weightKg };
          if (person.child) return [[placeId, { ...known, estimated: true }]];
          const estimated = !exact && Object.keys(measured).length === 0;
          return [[placeId, { ...known, estimated, belief: body }]];
        },
      ),
    );
  }

  function bodiesOf(
    document: SetDocument,
    situation: SetSituation,
    bodies: ReadonlyMap<string, BodyInput>,
    parts: readonly Part[],
  ): SeatedBody[] {
    const frames = new Map(
      document.pieces.flatMap((piece) => placeFrames(piece, document)).map((frame) => [frame.placeId, frame]),
    );
    const colourAt = coloursOf(document, cast);
    const sitting = document.seating.flatMap(({ pieceId, place, sitter, posture }) => {
      const placeId = `${pieceId}:${place}`;
      const frame = frames.get(placeId);
      const body = bodies.get(placeId);
      const measured = situation.places.find((candidate) => candidate.placeId === placeId);
      if (!frame || !body || !measured) return [];
      const sit = (feet?: PosedAt['feet']) => makeBody(frame, measured, body, parts, posture, feet);
      const alone = sit();
      return alone ? [{ placeId, pieceId, sitter, frame, body, sit, alone }] : [];
    });
    const feet = feetClear(
      sitting.map(({ alone }) => alone.pose),
      parts,
    );
    return sitting.map(({ placeId, pieceId, sitter, frame, body, sit, alone }, i): SeatedBody => {
      const moved = feet[i];
      const { pose, at } = (moved && haveMoved(moved) && sit(moved)) || alone;
      return {
        placeId,
        pieceId,
        name: sitterName(sitter, cast),
        colour: colourAt(placeId),
        statureMm: body.means.stature,
        estimated: body.estimated,
        pose,
        at,
        ...(body.belief && { belief: body.belief }),
        forScale: sitter.kind === 'child',
        crownMm: crownOf(pose, frame),
      };
    });
  }

  function picture(document: SetDocument): RoomPicture {
    const known = pictures.get(document);
    if (known) return known;
    const situation = situationOf(document);
    const inputsOf = inputs(document);
    const parts = deriveParts(document);
    const bodies = bodiesOf(document, situation, inputsOf, parts);
    const drawn = new Set(bodies.map(({ placeId }) => placeId));
    const whole: RoomPicture = {
      document,
      parts,
      situation,
      sheet: check(document),
      bodies,
      undrawn: document.seating
        .filter(
          ({ pieceId, place }) => inputsOf.has(`${pieceId}:${place}`) && !drawn.has(`${pieceId}:${place}`),
        )
        .map(({ sitter }) => sitterName(sitter, cast)),
    };
    pictures.set(document, whole);
    return whole;
  }

  return { picture, check, tryOut };
}
