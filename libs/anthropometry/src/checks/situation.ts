/**
 * What a set offers at each place, as numbers. Geometry measures these from the parts;
 * the checks read nothing else of the set. Lengths in millimetres above the finished floor or as
 * said, angles in radians. `undefined` means "no such thing here".
 */

/** Foam under the sitter, as its maker states it. */
export interface FoamSituation {
  thicknessMm: number;
  /** 25 % indentation force deflection, newtons on the 323 cm² foot (ASTM D3574). */
  ifd25N: number;
  /** 65 % IFD over 25 % IFD. */
  supportFactor: number;
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
  kind: 'between-tables' | 'behind-seat';
  pieceIds: string[];
  marks: string[];
  widthMm: number;
}

/** Everything the checks read of one set. */
export interface SetSituation {
  places: PlaceSituation[];
  benches: BenchSituation[];
  tables: TableSituation[];
  facing: FacingSituation[];
  corners: CornerSituation[];
  ways: WaySituation[];
}
