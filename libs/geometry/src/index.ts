export * from './units/result.ts';
export * from './units/length-style.ts';
export * from './units/parse-length.ts';
export { parseStature } from './units/parse-stature.ts';
export * from './units/format-length.ts';
export * from './units/spoken-length.ts';
export * from './units/angle.ts';
export * from './units/mass.ts';
export { foamNumber, foamText, foamUnit, fromFoamNumber } from './units/foam-units.ts';
export * from './units/phrase.ts';
export * from './parts/part.ts';
export * from './parts/placement.ts';
export * from './parts/boards.ts';
export * from './room/document.ts';
export type { PostureChoice } from './room/posture-choice.ts';
export * from './room/read-document.ts';
export * from './room/seating.ts';
export * from './room/edit-pieces.ts';
export * from './room/align-pieces.ts';
export * from './room/piece-groups.ts';
export * from './room/groups.ts';
export * from './room/mirror-pieces.ts';
export * from './room/array-pieces.ts';
export * from './room/carry-pieces.ts';
export * from './room/snap-piece.ts';
export { isSame } from './room/leaves.ts';
export type { DocumentDifference } from './room/document-difference.ts';
export * from './room/diff-documents.ts';
export * from './room/merge-documents.ts';
export * from './room/arrangements.ts';
export * from './room/footprint.ts';
export type { Envelope, Parameter, SpecSentence, SpecToken } from './pieces/kind.ts';
export * from './pieces/kinds.ts';
export * from './pieces/parameters.ts';
export { LEAF_WORDS, leavesOfTable, withLeaf, type LeafEdge, type TableLeaf } from './pieces/table-leaves.ts';
export * from './pieces/place-frames.ts';
export * from './pieces/bench-layout.ts';
export {
  cushionHeightMm,
  foamBuild,
  foamSituation,
  testedOf,
  untestedSituation,
  type FoamBuild,
} from './pieces/foam-situation.ts';
export { pressedSeatHeightMm, referenceSinkMm, unpressedSeatTopMm } from './pieces/seat-sink.ts';
export * from './situation/measure-set.ts';
export * from './situation/suggest-fixes.ts';
export * from './situation/room-for.ts';
export * from './situation/route-starts.ts';
export type { Spot } from './situation/clear-floor.ts';
export { FIGURE_KEYS, type FigureMeans } from './mannequin/figure.ts';
export type { MannequinJoints } from './mannequin/joints.ts';
export { MANNEQUIN_TAGS, mannequinMesh, type MannequinDetail, type MannequinMesh } from './mannequin/mesh.ts';
export { bodyRange, ghostPoses, type BodyRange } from './mannequin/body-range.ts';
export {
  poseMannequin,
  type MannequinPose,
  type PoseNote,
  type SeatPoint,
  type SeatPosture,
} from './mannequin/pose.ts';
export type { MannequinSegment, MannequinTag } from './mannequin/segments.ts';
export * from './mannequin/joint-angles.ts';
export * from './mannequin/joint-ranges.ts';
export { footRailOf } from './mannequin/foot-rail.ts';
export { haveMoved, type FootRail } from './mannequin/leg-posture.ts';
export { feetOutOfTheWay } from './mannequin/pose-note.ts';
export * from './distance/joint-envelopes.ts';
export { gapBetween, type Gap } from './distance/gap.ts';
export { partShape, segmentShape } from './distance/solids.ts';
export type { Shape } from './distance/shape.ts';
export { feetClear } from './distance/feet-clear.ts';
export { SEAT_ROLES, sitterDistances } from './distance/sitter-distances.ts';
export * from './distance/sitter-gap.ts';
export * from './drawing/drawing.ts';
export { leastWornColour, SITTER_COLOURS, type SitterColour } from './drawing/sitter-colours.ts';
export { planOf, type PlanOptions } from './drawing/plan.ts';
export { frontOf } from './drawing/front.ts';
export { askedShapes } from './drawing/asked.ts';
export { sectionOf } from './drawing/section.ts';
export { roomCutFaces, type RoomCutFace } from './drawing/room-cut-faces.ts';
export * from './drawing/drawing-scale.ts';
export { VIEW_DIRECTIONS, type SetView, type ViewDirection } from './drawing/set-view.ts';
export { cushionDrawing, type CushionDrawing } from './drawing/cushion-drawing.ts';
export { spacesBetween } from './drawing/dimension-chain.ts';
export { MOST_CHAINED_CORNERS, outlineStops } from './drawing/outline-stops.ts';
export { pictureFromAbove } from './drawing/picture-from-above.ts';
export { boardLines, type BoardLines } from './cushions/board-lines.ts';
export { cushionRuns, cushionRunsOf, runJointEnds, type CushionRun } from './cushions/cushion-runs.ts';
export * from './cushions/cushion-choice.ts';
export { cushionKey, cushionKeyParts } from './cushions/cushion-key.ts';
export * from './cushions/choice-words.ts';
export type { CushionWarning } from './cushions/cushion-warning.ts';
export * from './cushions/cushion-warnings.ts';
export { buildPhrase } from './cushions/build-phrase.ts';
export { foamOfCushion } from './cushions/foam-of-cushion.ts';
export { plainMake } from './cushions/made-of.ts';
export type { RunJoints } from './cushions/run-joints.ts';
export {
  TUFT_LINE_WORDS,
  TUFTING_WORDS,
  type TuftingChoice,
  type TuftLinesOf,
} from './cushions/tufting-choice.ts';
export { FULLNESS_RULES, type FullnessRule } from './cushions/tufting.ts';
export * from './cushions/cushion-settings.ts';
export * from './cushions/foam-grades.ts';
export { sitsOn, testedBySits, withTested, type KeptSit } from './cushions/tested-by-sits.ts';
export * from './cushions/workshop-cushions.ts';
export * from './cushions/wear.ts';
export { wearHatch, wearRectangle } from './cushions/wear-hatch.ts';
export { biasStripLength, weltStrips, zipPanel, type CushionSize } from './cushions/cushion-sizes.ts';
export { chooseCushion, mayHaveCushion, type CushionChange } from './room/cushion-choices.ts';
export type * from './cushions/cushion-spec.ts';
export * from './cushions/cushion-shape.ts';
export * from './cushions/making/cushion-make.ts';
export { closurePath } from './cushions/making/edge-strip.ts';
export { makeCushion, type MadeCushion } from './cushions/making/make-cushion.ts';
export type { CushionPanels, CutPanel, CutSlab } from './cushions/making/cut-panels.ts';
export { clothToBuy, CHART_DIFFERS, type ClothOrder, type ClothToBuy } from './cloth/cloth-to-buy.ts';
export { COVER_PARTS, type CoverCloth, type CoveredCushion, type CoverPart } from './cloth/cover-panels.ts';
export { layCloth, type ClothCost, type ClothOfOrder, type LaidCloth } from './orders/order-cloth.ts';
export * from './orders/order-cover.ts';
export { orderModel, type ButtonSheet, type OrderModel, type ScheduleRow } from './orders/order-model.ts';
export type { FoamTotal, OrderTotals } from './orders/order-totals.ts';
export { clothPhrase } from './orders/cloth-phrase.ts';
export * from './orders/order-words.ts';
export * from './orders/order-drop.ts';
export { saidOfCushion, SAID_OF_CUSHION, type SaidOfCushion } from './orders/said-of-cushion.ts';
export type { ClothLayout, ClothPanel, PlacedPanel } from './cloth/cloth.ts';
export { nestPanels } from './cloth/nest-panels.ts';
export * from './outlines/outline.ts';
export { halfOutline } from './outlines/half-outline.ts';
export { curveWords } from './cushions/curve-words.ts';
export { deriveCushions } from './cushions/derive-cushions.ts';
export { marksWords } from './orders/marks-words.ts';
export { groupCushions } from './cushions/group-cushions.ts';
export { HANDEDNESS_WORDS, handednessOf, type Handedness } from './cushions/handedness.ts';
export type { TapeLine } from './tapes/tape-line.ts';
export { tapeLines, type TapeBody } from './tapes/tape-lines.ts';
export type { Handle } from './handles/handle.ts';
export { valueUnder } from './handles/on-ray.ts';
export { pieceHandles, pullHandle, roomForPull } from './handles/piece-handles.ts';
export { snapPull, type SnappedPull } from './handles/snap-pull.ts';
export * from './situation/seat-height-bands.ts';
export type { Dimension } from './choices/dimension.ts';
export { dimensionIdOf, dimensionOf, dimensionsOf } from './choices/dimensions.ts';
export { isGain, isLoss, sheetChanges, type CellChange, type CellState } from './choices/sheet-changes.ts';
export { stickValues, storyStick } from './choices/story-stick.ts';
export type { StickClause, StickRow, StoryStick } from './choices/story-stick.ts';
export { whereAll, type Stretch } from './choices/stretches.ts';
export { compareSheets } from './choices/compare-sheets.ts';
export type { ComparedCell, ComparedSheets, ComparedSitter } from './choices/compare-sheets.ts';
export {
  documentAt,
  type FreeDimension,
  type Miss,
  type SuggestInput,
  type Tried,
} from './choices/candidates.ts';
export { bestPairs, castMap, gridValues } from './choices/cast-map.ts';
export type { BestPair, CastMap, MapRegion } from './choices/cast-map.ts';
export { changingPlaces, measuredPlaces } from './choices/places-along.ts';
export { stickBands, type StickBand } from './choices/stick-bands.ts';
export { orderedRows } from './choices/row-order.ts';
export {
  dimensionStep,
  dimensionValue,
  dimensionWords,
  exactValue,
  markWords,
} from './choices/dimension-words.ts';
export { clashOf, MOST_FREE, SEARCH_PEOPLE, SEARCH_SEED } from './choices/free-dimensions.ts';
export { judgeChoices, type Judging, type Served } from './choices/judge-choices.ts';
export { suggestDimensions } from './choices/suggest-dimensions.ts';
export type { Answer, AnswerKind, Blame, Suggestion } from './choices/suggest-dimensions.ts';
export { MAX_DIMENSIONS, type MeasureEnd, type PinnedDimension } from './measuring/dimension.ts';
export { pinDimension, unpinDimension } from './measuring/edit-dimensions.ts';
export { endWords } from './measuring/end-words.ts';
export { measureEnds, type MeasuredLine } from './measuring/measure-ends.ts';
export { measuringScene, type MeasuringScene } from './measuring/measuring-scene.ts';
export { endId, endsWords, namedPoints, type NamedPoint } from './measuring/named-points.ts';
export { refastenDimensions } from './measuring/refasten.ts';
export { snapEnd } from './measuring/snap-end.ts';
export * from './views/edit-views.ts';
export * from './views/lens.ts';
export { MAX_VIEWS, type LensCamera, type LetterCamera, type NamedView } from './views/named-view.ts';
export { frameWords, lensWords } from './views/view-words.ts';
export { findWaysIn, type Comer, type WaysIn } from './ways-in/find-ways-in.ts';
export type { FreerWay, Move, TightSpot, WayIn, WayStep } from './ways-in/way-in.ts';
export type { MayMove } from './ways-in/what-is-moved.ts';
export { wheelchairFloor, type FloorKind, type FloorShape } from './ways-in/wheelchair-floor.ts';
export { bandOutline } from './ways-in/bodies.ts';
export { standing } from './ways-in/walker.ts';
