import { TAPE_MEASURE_KEYS } from '@settlewright/anthropometry';
import { z } from 'zod';
import { cushionChoiceSchema } from '../cushions/cushion-choice.ts';
import { CUSHION_KEY } from '../cushions/cushion-key.ts';
import { runJointsSchema } from '../cushions/run-joints.ts';
import { dimensionSchema, MAX_DIMENSIONS } from '../measuring/dimension.ts';
import { MAX_VIEWS, namedViewSchema } from '../views/named-view.ts';
import { postureChoiceSchema } from './posture-choice.ts';

/** Number of the document layout; raised with an upgrade in `upgrades.ts`. */
export const SCHEMA_VERSION = 1;

/** Most pieces one set may hold. */
export const MAX_PIECES = 300;

const length = (min: number, max: number) => z.number().min(min).max(max);
const text = (max: number) => z.string().trim().max(max);

/** What a foam goes down by: firmness, layers and wrap. */
const foamBuild = {
  /** 25 % indentation force deflection in newtons (ASTM D3574). */
  ifd25N: length(20, 600),
  supportFactor: length(1.2, 4),
  /** From the top down, where it is laminated: its share of the foam's thickness, and its firmness as times that of the whole. */
  layers: z
    .array(z.strictObject({ share: length(0.003, 1), times: length(0.03, 30) }))
    .min(2)
    .max(4)
    .optional(),
  /** Polyester round it, both faces together, over the cushion's thickness, and how much of that is lost under a sitter. */
  wrap: z.strictObject({ thicknessMm: length(1, 60), lostMm: length(0, 60) }).optional(),
};

const foam = z.strictObject({
  /** Shop name of the grade, for example "firm seat". */
  grade: text(60),
  densityKgM3: length(10, 200),
  ...foamBuild,
  /** What test sits say of it. Whoever sat, and how heavy they are, is not in the document. */
  tested: z
    .strictObject({
      /** By what the estimate of the drop is multiplied. */
      factor: length(0.1, 10),
      /** Half the 90 % range, of the drop. */
      error: length(0, 1),
      sits: z.number().int().min(1).max(1000),
      /** Day of the last sit. */
      on: z.iso.date(),
      /** The cushion that was sat on: another thickness, firmness or build-up is not tested by it. */
      of: z.strictObject({ thicknessMm: length(1, 250), ...foamBuild }),
    })
    .optional(),
});

const cushion = z.strictObject({ thicknessMm: length(0, 250), foam });

const boardModule = z.strictObject({ faceMm: length(10, 600), revealMm: length(0, 50) });

const common = {
  id: z.string().min(1).max(40),
  mark: z.string().regex(/^[A-Z]{1,2}[0-9]{1,3}$/),
  name: text(80),
  /** Place of the piece's own origin on the floor and its turn about the vertical, anticlockwise from above. */
  at: z.strictObject({ xMm: length(-50000, 50000), zMm: length(-50000, 50000), turnDeg: length(-360, 360) }),
  accessible: z.boolean(),
  /** Not moved, turned, shaped or taken out until it is unlocked. */
  locked: z.boolean(),
  /** Left out of the drawing on the screen; measured all the same. */
  hidden: z.boolean().optional(),
  note: text(2000),
};

/** Wall of boards. Origin: middle of its front face at the floor; the face looks along +z. */
const bulkhead = z.strictObject({
  kind: z.literal('bulkhead'),
  ...common,
  lengthMm: length(100, 20000),
  heightMm: length(100, 6000),
  thicknessMm: length(6, 400),
  boards: boardModule,
  boardDirection: z.enum(['vertical', 'horizontal']),
});

const benchEnd = z.strictObject({
  kind: z.enum(['open', 'arm', 'wall']),
  thicknessMm: length(0, 200),
  /** Top of an arm or end wall above the pressed seat. */
  heightMm: length(0, 1500),
});

/** Bench. Origin: middle of the rear face of its back at the floor; the sitter looks along +z. */
const bench = z.strictObject({
  kind: z.literal('bench'),
  ...common,
  lengthMm: length(300, 12000),
  deckHeightMm: length(100, 1000),
  /** Effective depth: face of the unpressed back cushion to the seat front. */
  seatDepthMm: length(200, 1000),
  /** Front edge up. */
  seatTiltDeg: length(-5, 15),
  /** Top of the back above the pressed seat; 0 for a backless bench. */
  backHeightMm: length(0, 1800),
  /** From the vertical, leaning away from the sitter. */
  backLeanDeg: length(0, 30),
  backThicknessMm: length(10, 200),
  seatCushion: cushion,
  backCushion: cushion,
  /** Curve of the back: its apex above the pressed seat, and how far the back gives way below it. Absent: a flat back. */
  lumbar: z.strictObject({ apexMm: length(0, 400), recessMm: length(0, 150) }).optional(),
  base: z.enum(['box', 'open']),
  kick: z.strictObject({ depthMm: length(0, 400), heightMm: length(0, 400) }),
  /** Deck and lip stand out before the riser by this much. */
  lipMm: length(0, 150),
  ends: z.strictObject({ left: benchEnd, right: benchEnd }),
  boards: boardModule,
  places: z.discriminatedUnion('by', [
    z.strictObject({ by: z.literal('count'), count: z.number().int().min(1).max(40) }),
    z.strictObject({ by: z.literal('width'), widthMm: length(300, 1500) }),
  ]),
  upholstery: z.strictObject({
    /** A run longer than this is split near equal parts, on board joints where one is close. */
    longestCushionMm: length(300, 3000),
    /** Joints of the runs that somebody chose. */
    joints: z.strictObject({ seat: runJointsSchema.optional(), back: runJointsSchema.optional() }).optional(),
    buttons: z.strictObject({
      rows: z.number().int().min(0).max(8),
      everyBoards: z.number().int().min(1).max(40),
      alignTo: z.enum(['joints', 'board-centres']),
      on: z.enum(['back', 'seat', 'both']),
    }),
  }),
});

const tableBase = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('legs'), sizeMm: length(20, 200), insetMm: length(0, 500) }),
  z.strictObject({ kind: z.literal('trestles'), insetMm: length(0, 1000), thicknessMm: length(20, 200) }),
  z.strictObject({
    kind: z.literal('columns'),
    count: z.union([z.literal(1), z.literal(2)]),
    diameterMm: length(40, 500),
    footLengthMm: length(100, 1500),
    footHeightMm: length(10, 200),
  }),
]);

/** A leaf hinged to an edge of a table's top: its width, and whether it hangs. */
const tableLeaf = z.strictObject({ widthMm: length(50, 900), down: z.boolean() });

/** Table. Origin: middle of the fixed top, at the floor; length along x, width along z. */
const table = z.strictObject({
  kind: z.literal('table'),
  ...common,
  lengthMm: length(200, 8000),
  widthMm: length(200, 3000),
  /** Top of the table above the floor. */
  heightMm: length(300, 1300),
  topThicknessMm: length(6, 120),
  /** How far an edge lip hangs below the top's underside; 0 for none. */
  edgeLipMm: length(0, 150),
  apron: z.strictObject({ heightMm: length(0, 300), insetMm: length(0, 500) }),
  base: tableBase,
  /** Leaves at both ends or along both sides, or at one of them; left as seen from in front. Absent: none. */
  leaves: z
    .strictObject({
      left: tableLeaf.optional(),
      right: tableLeaf.optional(),
      front: tableLeaf.optional(),
      back: tableLeaf.optional(),
    })
    .optional(),
});

/** Window sill. Origin: middle of its rear edge at the floor; it stands out along +z. */
const sill = z.strictObject({
  kind: z.literal('sill'),
  ...common,
  lengthMm: length(100, 20000),
  /** Top of the sill above the floor. */
  heightMm: length(100, 2500),
  depthMm: length(10, 1000),
  thicknessMm: length(6, 150),
  opening: z.strictObject({ widthMm: length(0, 20000), heightMm: length(0, 4000), frameMm: length(0, 300) }),
});

/** Beam or soffit. Origin: its middle, at the floor. */
const overhead = z.strictObject({
  kind: z.literal('overhead'),
  ...common,
  lengthMm: length(50, 20000),
  depthMm: length(20, 5000),
  thicknessMm: length(10, 1000),
  undersideMm: length(600, 6000),
});

/** Chair or stool. Origin: middle of the rear of the seat at the floor; the sitter looks along +z. */
const looseSeat = z.strictObject({
  kind: z.literal('loose-seat'),
  ...common,
  widthMm: length(200, 1000),
  seatDepthMm: length(200, 800),
  deckHeightMm: length(200, 1000),
  seatCushion: cushion,
  /** Top of the back above the pressed seat; 0 for a stool. */
  backHeightMm: length(0, 1200),
  backLeanDeg: length(0, 30),
  /** Top of the arms above the pressed seat; 0 for an armless seat. */
  armHeightMm: length(0, 500),
});

/** Any piece of a set. */
export const pieceSchema = z.discriminatedUnion('kind', [bulkhead, bench, table, sill, overhead, looseSeat]);

const sitterRef = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('cast'), castId: z.uuid() }),
  z.strictObject({
    kind: z.literal('mannequin'),
    bodyData: z.enum(['women', 'men']),
    measure: z.enum(['stature', ...TAPE_MEASURE_KEYS]),
    percentile: z.number().gt(0).lt(100),
  }),
  /** A child of a size of school furniture, drawn for scale. */
  z.strictObject({ kind: z.literal('child'), sizeMark: z.number().int().min(1).max(6) }),
]);

const spot = z.strictObject({ xMm: length(-50000, 50000), zMm: length(-50000, 50000) });
const boxes = z.number().int().min(0).max(20);

/** The set document: what the designer draws, and nothing that can be derived from it. */
export const setDocumentSchema = z.strictObject({
  schemaVersion: z.literal(SCHEMA_VERSION),
  pieces: z.array(pieceSchema).max(MAX_PIECES),
  seating: z.array(
    z.strictObject({
      pieceId: z.string().max(40),
      place: z.number().int().min(1).max(40),
      sitter: sitterRef,
      /** How the sitter sits, where somebody chose it. */
      posture: postureChoiceSchema.optional(),
    }),
  ),
  asked: z.strictObject({
    backPosture: z.enum(['dining', 'lounge']),
    /** Who passes behind loose seats (EGRESS-02). */
    trafficBehind: z.enum(['none', 'edge-past', 'walk-past', 'wheelchair']),
    /** Height of the lens (HEAD-05). What is absent from here on is not asked. */
    lensHeightMm: length(0, 4000).optional(),
    /** Apple boxes at hand (HEAD-04). */
    appleBoxes: z.strictObject({ full: boxes, half: boxes, quarter: boxes, pancake: boxes }).optional(),
    /** Where people come in, when that is not the start of the route. */
    entrance: spot.optional(),
    /** Corners of the route that is kept clear, from its start to its end (EGRESS-03). */
    route: z.array(spot).min(2).max(40).optional(),
    /** Middle of the floor that is kept clear for turning round (ACC-08). */
    turningAt: spot.optional(),
    /** Clear width of the door on the way in, and depth of its opening (ACC-09). */
    door: z.strictObject({ clearWidthMm: length(0, 5000), depthMm: length(0, 2000) }).optional(),
    /** Spaces kept among fixed seats (ACC-10). */
    wheelchairSpaces: z.number().int().min(0).max(500).optional(),
  }),
  knownDifferences: z
    .array(
      z.strictObject({
        id: z.string().min(1).max(40),
        text: text(1000),
        /** Why it is kept, who said so, and on which day (YYYY-MM-DD); absent where nobody wrote it down. */
        reason: text(1000).optional(),
        by: text(120).optional(),
        on: z.iso.date().optional(),
      }),
    )
    .max(200),
  /** Pieces that are chosen by one press and handled together. */
  groups: z
    .array(
      z.strictObject({
        id: z.string().min(1).max(40),
        name: text(80).min(1),
        pieceIds: z.array(z.string().max(40)).min(1).max(MAX_PIECES),
      }),
    )
    .max(100)
    .optional(),
  /** Views that somebody gave a name to, in the order they were kept. */
  views: z.array(namedViewSchema).max(MAX_VIEWS).optional(),
  /** Dimension lines that stay with the set, between pieces or from a piece to whoever sits at a place. */
  dimensions: z.array(dimensionSchema).max(MAX_DIMENSIONS).optional(),
  /** What was chosen of single cushions, by their keys. One that its piece does not have now waits for it. */
  cushions: z.record(z.string().regex(CUSHION_KEY), cushionChoiceSchema).optional(),
});

export type SetDocument = z.infer<typeof setDocumentSchema>;
export type Piece = z.infer<typeof pieceSchema>;
export type PieceKind = Piece['kind'];
export type PieceOf<K extends PieceKind> = Extract<Piece, { kind: K }>;
export type PieceGroup = NonNullable<SetDocument['groups']>[number];
export type SitterRef = z.infer<typeof sitterRef>;
export type Foam = z.infer<typeof foam>;
export type BoardModule = z.infer<typeof boardModule>;
