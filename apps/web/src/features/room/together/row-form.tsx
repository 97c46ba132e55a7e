import {
  arrayPieces,
  boardPitch,
  formatLength,
  lengthAlong,
  MAX_PIECES,
  pitchToFill,
  type Piece,
  type SetDocument,
} from '@settlewright/geometry';
import { useMemo, useState } from 'react';
import { Button } from '@/components/button.tsx';
import { LengthField } from '@/components/length-field.tsx';
import { Measure } from '@/components/measure.tsx';
import { entryOf, type QuantityEntry } from '@/components/quantity-entry.ts';
import { Select } from '@/components/select.tsx';
import { TextField } from '@/components/text-field.tsx';
import { useTakeStep } from '../hooks/use-take-step.ts';
import { useSurroundings } from '../room-context.tsx';
import { HandFormFrame } from './hand-form-frame.tsx';

const FARTHEST_MM = 50_000;
const ROOM_WAYS = [
  { value: '0', words: 'to the right' },
  { value: '180', words: 'to the left' },
  { value: '-90', words: 'to the front' },
  { value: '90', words: 'to the back' },
];

interface Props {
  document: SetDocument;
  pieces: readonly Piece[];
  marks: string;
  choose: (ids: readonly string[]) => void;
}

/** Sets the chosen pieces again and again in a row, along a wall or the room. */
export function RowForm({ document, pieces, marks, choose }: Props) {
  const { style } = useSurroundings();
  const take = useTakeStep();
  const walls = document.pieces.filter((piece) => piece.kind === 'bulkhead');
  const ids = useMemo(() => pieces.map(({ id }) => id), [pieces]);
  const [way, setWay] = useState(walls[0] ? `wall ${walls[0].id}` : '0');
  const [by, setBy] = useState<'pitch' | 'whole'>('pitch');
  const [countText, setCountText] = useState('3');
  const [, wallId, back] = way.split(' ');
  const wall = walls.find(({ id }) => id === wallId);
  const alongDeg = wall ? wall.at.turnDeg + (back ? 180 : 0) : Number(way);
  const lengthMm = lengthAlong(document, ids, alongDeg);
  const [pitch, setPitch] = useState<QuantityEntry>(() => entryOf(lengthMm));
  const [whole, setWhole] = useState<QuantityEntry>(() => entryOf(lengthMm * 3));
  const count = /^\d+$/.test(countText.trim()) ? Number(countText) : NaN;
  const most = Math.floor((MAX_PIECES - document.pieces.length) / Math.max(1, ids.length)) + 1;
  const pitchMm =
    by === 'pitch' ? pitch.value : whole.value === null ? null : pitchToFill(lengthMm, whole.value, count);
  const problem = by === 'pitch' ? pitch.problem : whole.problem;
  const countProblem = count >= 2 && count <= most ? undefined : `A whole number from 2 to ${most} is taken.`;
  const tooShort = pitchMm !== null && pitchMm < 0;
  const made = useMemo(() => {
    if (countProblem || problem || pitchMm === null || !(pitchMm >= 0)) return null;
    return arrayPieces(document, ids, { count, pitchMm, alongDeg });
  }, [document, ids, count, countProblem, problem, pitchMm, alongDeg]);
  const boards = wall && boardPitch(lengthMm, wall.boards);
  const show = (mm: number) => formatLength(mm, { ...style, feet: true });
  const refusal = tooShort
    ? 'Not even one fits into that length.'
    : made && pitchMm !== null && pitchMm < lengthMm - 0.05
      ? `Neighbours stand in each other: one takes ${show(lengthMm)}.`
      : undefined;
  return (
    <HandFormFrame
      title={`Repeat ${marks} in a row`}
      verb="Set the row"
      next={made?.document ?? null}
      refusal={refusal}
      onTake={() => {
        if (!made || pitchMm === null) return;
        take(made.document, `Row of ${count} of ${marks}, ${show(pitchMm)} apart`);
        choose([...ids, ...made.pieceIds]);
      }}
    >
      <div className="grid items-start gap-x-8 gap-y-3 phone:grid-cols-2 tablet:grid-cols-4">
        <Select
          label="Along"
          value={way}
          options={[
            ...walls.flatMap(({ id, mark }) => [
              { value: `wall ${id}`, words: `${mark}, to its right` },
              { value: `wall ${id} back`, words: `${mark}, to its left` },
            ]),
            ...ROOM_WAYS,
          ]}
          onChange={setWay}
        />
        <TextField
          label="How many in all"
          inputMode="numeric"
          autoComplete="off"
          value={countText}
          error={countProblem}
          onChange={(event) => setCountText(event.target.value)}
        />
        <Select
          label="Set by"
          value={by}
          options={[
            { value: 'pitch', words: 'pitch, one to the next' },
            { value: 'whole', words: 'length, end to end' },
          ]}
          onChange={setBy}
        />
        {by === 'pitch' ? (
          <LengthField label="Pitch" entry={pitch} onChange={setPitch} minMm={0} maxMm={FARTHEST_MM} feet />
        ) : (
          <LengthField
            label="End to end"
            entry={whole}
            onChange={setWhole}
            minMm={0}
            maxMm={FARTHEST_MM}
            feet
          />
        )}
      </div>
      {made && pitchMm !== null && (
        <p className="text-sm text-ink-2">
          <Measure text={show(pitchMm)} /> from one to the next,{' '}
          <Measure text={show(pitchMm * (count - 1) + lengthMm)} /> end to end.
          {boards && by === 'pitch' && Math.abs(boards.pitchMm - pitchMm) > 0.05 && (
            <>
              {' '}
              <Button look="word" onClick={() => setPitch(entryOf(boards.pitchMm))}>
                Take {boards.boards} whole boards of {wall?.mark}, {show(boards.pitchMm)}
              </Button>
            </>
          )}
        </p>
      )}
    </HandFormFrame>
  );
}
