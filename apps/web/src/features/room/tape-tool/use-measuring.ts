import {
  endsWords,
  measureEnds,
  measuringScene,
  type MeasuredLine,
  type MeasureEnd,
  type MeasuringScene,
  type TapeLine,
} from '@settlewright/geometry';
import { useMemo } from 'react';
import { bodyNow } from '../bodies/ask-body.ts';
import type { RoomPicture } from '../picture.ts';
import { useSurroundings } from '../room-context.tsx';
import { useLaidTapes } from './tape-store.ts';

const placeOf = (placeId: string): number => Number(placeId.slice(placeId.lastIndexOf(':') + 1));

/** A measured line as lists and the drawing show it. */
export interface ShownMeasure {
  id: string;
  ends: readonly [MeasureEnd, MeasureEnd];
  words: string;
  /** Absent where an end is not there now: nobody sits there, or the part is gone. */
  line: MeasuredLine | undefined;
}

/** What can be measured in a picture; whoever sees verdicts alone measures no bodies. */
export function useMeasuringScene(picture: RoomPicture): MeasuringScene {
  const { detail } = useSurroundings();
  return useMemo(() => {
    const bodies = detail === 'full' ? picture.bodies : [];
    return measuringScene(
      picture.document,
      picture.parts,
      bodies.map(({ placeId, pieceId, name, pose }) => ({
        place: placeOf(placeId),
        pieceId,
        name,
        pose,
        // Made when somebody measures: most pages are never measured.
        get mesh() {
          return bodyNow(pose, 'near');
        },
      })),
    );
  }, [picture, detail]);
}

/** The tapes of this page and the lines that stay with the set. */
export function useMeasures(
  picture: RoomPicture,
  scene: MeasuringScene,
): { laid: ShownMeasure[]; pinned: ShownMeasure[] } {
  const { path } = useSurroundings();
  const tapes = useLaidTapes(path.setId);
  const { dimensions } = picture.document;
  return useMemo(() => {
    const shown = ({ id, ends }: { id: string; ends: [MeasureEnd, MeasureEnd] }): ShownMeasure => ({
      id,
      ends,
      words: endsWords(ends, scene),
      line: measureEnds(ends, scene),
    });
    return { laid: tapes.map(shown), pinned: dimensions?.map(shown) ?? [] };
  }, [scene, tapes, dimensions]);
}

/** The same as lines over the drawing, in ink: nobody edits them there. */
export function linesOnScene({ laid, pinned }: { laid: ShownMeasure[]; pinned: ShownMeasure[] }): TapeLine[] {
  const lines = (measures: readonly ShownMeasure[], name: string): TapeLine[] =>
    measures.flatMap(({ id, line, words }) =>
      line
        ? [
            {
              id: `${name} ${id}`,
              kind: 'fixed',
              name,
              fromMm: line.fromMm,
              toMm: line.toMm,
              valueMm: line.distanceMm,
              describes: words,
            },
          ]
        : [],
    );
  return [...lines(laid, 'tape'), ...lines(pinned, 'pinned')];
}
