import {
  MAX_PIECES,
  middlePlane,
  mirrorCopies,
  mirrorPieces,
  wallPlane,
  type MirrorPlane,
  type Piece,
  type SetDocument,
} from '@settlewright/geometry';
import { useMemo, useState } from 'react';
import { LengthField } from '@/components/length-field.tsx';
import { entryOf, type QuantityEntry } from '@/components/quantity-entry.ts';
import { Select } from '@/components/select.tsx';
import { Toggle } from '../components/toggle.tsx';
import { sayLocked } from '../hooks/use-group-actions.ts';
import { useTakeStep } from '../hooks/use-take-step.ts';
import { HandFormFrame } from './hand-form-frame.tsx';

const FARTHEST_MM = 50_000;

interface Props {
  document: SetDocument;
  pieces: readonly Piece[];
  marks: string;
  choose: (ids: readonly string[]) => void;
}

/** Mirrors the chosen pieces, or adds their mirror images. */
export function MirrorForm({ document, pieces, marks, choose }: Props) {
  const take = useTakeStep();
  const walls = document.pieces.filter((piece) => piece.kind === 'bulkhead');
  const [about, setAbout] = useState('left-right');
  const [copies, setCopies] = useState(false);
  const [at, setAt] = useState<QuantityEntry>(entryOf(0));
  const ids = useMemo(() => pieces.map(({ id }) => id), [pieces]);
  const options = [
    { value: 'left-right', words: 'their middle, left and right' },
    { value: 'back-front', words: 'their middle, back and front' },
    ...walls.flatMap(({ id, mark }) => [
      { value: `along ${id}`, words: `${mark}, to its other side` },
      { value: `across ${id}`, words: `the middle of ${mark}, to its other end` },
    ]),
    { value: 'x', words: 'a line from back to front' },
    { value: 'z', words: 'a line from left to right' },
  ];
  const typed = about === 'x' || about === 'z';
  const plane = useMemo((): MirrorPlane | undefined => {
    if (about === 'left-right' || about === 'back-front') return middlePlane(document, ids, about);
    if (about === 'x' || about === 'z') {
      if (at.value === null || at.problem) return undefined;
      return about === 'x' ? { xMm: at.value, zMm: 0, alongDeg: 90 } : { xMm: 0, zMm: at.value, alongDeg: 0 };
    }
    const [which, id] = about.split(' ');
    const wall = document.pieces.find((piece) => piece.id === id);
    return wall?.kind === 'bulkhead' ? wallPlane(wall, which === 'along' ? 'along' : 'across') : undefined;
  }, [about, at, document, ids]);
  const full = copies && document.pieces.length + ids.length > MAX_PIECES;
  const made = useMemo(() => {
    if (!plane || full) return null;
    return copies
      ? mirrorCopies(document, ids, plane)
      : { document: mirrorPieces(document, ids, plane), pieceIds: ids };
  }, [plane, full, copies, document, ids]);
  const locked = copies ? undefined : sayLocked(pieces);
  const allLocked = !copies && pieces.every((piece) => piece.locked);
  const words = options.find(({ value }) => value === about)?.words ?? '';
  return (
    <HandFormFrame
      title={`Mirror ${marks}`}
      verb={copies ? 'Add mirrored copies' : 'Mirror'}
      next={allLocked ? null : (made?.document ?? null)}
      refusal={full ? `A set holds at most ${MAX_PIECES} pieces.` : locked && `${locked}.`}
      onTake={() => {
        if (!made) return;
        take(made.document, `${copies ? 'Mirrored copies of' : 'Mirror'} ${marks} about ${words}`, locked);
        choose(made.pieceIds);
      }}
    >
      <div className="grid items-end gap-x-8 gap-y-3 phone:grid-cols-2 tablet:grid-cols-3">
        <Select label="About" value={about} options={options} onChange={setAbout} />
        {typed && (
          <LengthField
            label={about === 'x' ? 'Line at, across the room' : 'Line at, along the room'}
            entry={at}
            onChange={setAt}
            minMm={-FARTHEST_MM}
            maxMm={FARTHEST_MM}
            feet
          />
        )}
        <div className="text-sm">
          <Toggle on={copies} onChange={setCopies}>
            Keep them and add copies
          </Toggle>
        </div>
      </div>
      <p className="text-sm text-ink-2">
        Left and right ends change sides. Whoever sits there goes with their seat; nobody sits on copies.
      </p>
    </HandFormFrame>
  );
}
