/**
 * What a set offers at each place, as numbers. Geometry measures these from the parts;
 * the checks read nothing else of the set. Lengths in millimetres above the finished floor or as
 * said, angles in radians. `undefined` means "no such thing here".
 */

/** What test sits say of the estimate of a drop. */
export interface SinkCalibration {
  /** By what the estimate is multiplied. */
  factor: number;
  /** Half the 90 % range of the outcome, of its value. */
  error: number;
  /** How many sits it rests on. */
  sits: number;
}

/** One layer of a laminated foam. */
export interface FoamLayer {
  /** Of the foam's thickness, wrap apart; all layers together 1. */
  share: number;
  /** 25 % indentation force deflection, newtons. */
  ifd25N: number;
}

/** Polyester round the foam, both faces together. */
export interface FoamWrap {
  /** Of the cushion's thickness, 0 to 1. */
  share: number;
  /** Part of it that is lost under anybody who sits, 0 to 1. */
  lost: number;
}

/** Foam under the sitter, as its maker states it. */
export interface FoamSituation {
  /** Before anybody sits, the wrap included. */
  thicknessMm: number;
  /** 25 % indentation force deflection, newtons on the 323 cm² foot (ASTM D3574). */
  ifd25N: number;
  /** 65 % IFD over 25 % IFD. */
  supportFactor: number;
  /** From the top down, where it is made of several; then `ifd25N` is that of the whole and is not read. */
  layers?: readonly FoamLayer[] | undefined;
  /** Soft wrap, counted in the thickness; absent where there is none. */
  wrap?: FoamWrap | undefined;
  /** From test sits on it; absent where nobody tried it. */
  tested?: SinkCalibration | undefined;
}

/** A sill near a place. */
export interface SillSituation {
  pieceId: string;
  mark: string;
  /** Which hand of the sitter; `behind` gives information only. */
  side: 'left' | 'right' | 'behind';
  topMm: number;
  usableDepthMm: number;
  /** Seat centreline to the near edge, level, sideways. */
  centreToEdgeMm: number;
}

/** The table that covers most of the strip over the lap. */
export interface PlaceTableSituation {
  pieceId: string;
  mark: string;
  topMm: number;
  /** Lowest point inside the strip over the lap, apron and lip included. */
  undersideMm: number;
  /** How far the edge lies over the seat front; negative for a gap. */
  overlapMm: number;
  /** Table edge to the nearest obstruction at knee level; `undefined` when nothing is in the way. */
  kneeDepthMm?: number;
  /** Table edge to the nearest obstruction at foot level; `undefined` when nothing is in the way. */
  footDepthMm?: number;
  topThicknessMm: number;
}

/** Something overhead. */
export interface OverheadSituation {
  pieceId: string;
  mark: string;
  undersideMm: number;
}

/** One place on a bench or loose seat. */
export interface PlaceSituation {
  /** `${pieceId}:${place}`, place counted from 1, from the left as seen from in front. */
  placeId: string;
  pieceId: string;
  mark: string;
  place: number;
  /** Unpressed seat top at the front edge: foot rules. */
  seatTopFrontMm: number;
  /** Unpressed seat top under the hip, 135 mm before the back: sill, table, eye and head rules. */
  seatTopHipMm: number;
  deckHeightMm: number;
  foam: FoamSituation | undefined;
  /** Face of the unpressed back cushion to the seat front, level. */
  effectiveDepthMm: number;
  /** Width this place claims. */
  widthMm: number;
  /** Set-back of the riser at the floor behind the front edge; `undefined` for an open base. */
  heelRoomMm: number | undefined;
  seatTiltRad: number;
  backLeanRad: number;
  /** Top of the back above the floor; `undefined` for a backless seat. */
  backTopMm: number | undefined;
  /** Seat centreline to a wall or end wall on that hand, if one is near. */
  wallMm: { left?: number; right?: number };
  sills: SillSituation[];
  table: PlaceTableSituation | undefined;
  overhead: OverheadSituation | undefined;
  /** The lowest thing over the floor just before the seat, where one stands up; absent under an open ceiling. */
  overheadAhead?: OverheadSituation | undefined;
}

/** A bench as a whole. */
export interface BenchSituation {
  pieceId: string;
  mark: string;
  lengthMm: number;
  /** Deck depth between front edge and back face. */
  effectiveDepthMm: number;
  placeIds: string[];
  unpressedSeatTopMm: number;
  accessible: boolean;
  back:
    | {
        bottomAboveSeatMm: number;
        topAboveSeatMm: number;
        gapToSeatMm: number;
        lengthMm: number;
        fixedToWall: boolean;
      }
    | undefined;
  /** Curve of the back: its apex over the pressed seat, 0 for a flat back, and how far the back gives way below. */
  lumbar?: { apexMm: number; recessMm: number } | undefined;
  /**
   * Most people that somebody on the bench slides past to get out; `undefined` when there is no way out at either end
   * or forwards.
   */
  slidePast?: number | undefined;
  /** Clear floor beside the end of the bench that has more of it: across, away from the end, and along the end. */
  endSpace?: { widthMm: number; lengthMm: number } | undefined;
}

/** A table as a whole. */
export interface TableSituation {
  pieceId: string;
  mark: string;
  topMm: number;
  accessible: boolean;
  /** Width of the top between diners who face each other across it; absent when nobody does. */
  betweenFacingMm?: number;
  /** One entry per edge that somebody sits at. */
  edges: {
    name: 'front' | 'back' | 'left' | 'right';
    lengthMm: number;
    placeIds: string[];
    clearBetweenLegsMm: number;
  }[];
  /** Knee and toe space below the front edge, per height: depth from the edge. */
  kneeSpace: {
    clearHeightMm: number;
    widthMm: number;
    depthAt: { heightMm: number; depthMm: number }[];
    toeDepthMm: number;
  };
}

/** Two benches that face each other. */
export interface FacingSituation {
  pieceIds: [string, string];
  marks: [string, string];
  /** Seat front to seat front. */
  gapMm: number;
  /** Places that sit opposite each other. */
  pairs: [string, string][];
}

/** The first place beyond an inside corner. */
export interface CornerSituation {
  pieceIds: [string, string];
  marks: [string, string];
  placeId: string;
  /** Place centre from the other leg's front edge, along this leg. */
  centreFromFrontMm: number;
  widthMm: number;
  effectiveDepthMm: number;
}

/** A way people go through. */
export interface WaySituation {
  kind: 'between-tables' | 'behind-seat' | 'chairs-both-sides';
  pieceIds: string[];
  marks: string[];
  widthMm: number;
}

/** The lane between a row of seats and the row ahead of it. */
export interface RowSituation {
  pieceIds: [string, string];
  marks: [string, string];
  /** Seat front to the back of the row ahead. */
  clearMm: number;
  seats: number;
  /** Ends of the row from which one can leave it. */
  openEnds: 0 | 1 | 2;
}

/** A stretch of a way with one clear width. */
export interface RouteStretch {
  widthMm: number;
  lengthMm: number;
}

/** Clear floor around the spot that the set keeps for turning round. */
export interface TurningSituation {
  /** Largest circle around the spot that nothing stands in. */
  circleMm: number;
  /** Widest arm of a T within a square around the spot, base and arms of one width; 0 where there is none. */
  teeArmMm: number;
}

/** Everything the checks read of one set. */
export interface SetSituation {
  places: PlaceSituation[];
  benches: BenchSituation[];
  tables: TableSituation[];
  facing: FacingSituation[];
  corners: CornerSituation[];
  ways: WaySituation[];
  /** Rows of seats one behind another. */
  rows?: RowSituation[];
  /** The route that the set marks, from its start to its end; absent where none is marked. */
  route?: RouteStretch[] | undefined;
  /** Absent where no spot is marked. */
  turning?: TurningSituation | undefined;
}
