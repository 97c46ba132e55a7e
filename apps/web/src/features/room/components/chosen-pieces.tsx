import {
  MAX_PIECES,
  spaceable,
  type AlignEdge,
  type Piece,
  type RoomAxis,
  type SetDocument,
} from '@settlewright/geometry';
import { lazy, Suspense, useState, type ReactNode } from 'react';
import { Button } from '@/components/button.tsx';
import { MarkTag, timberOf } from '@/components/mark-tag.tsx';
import type { Choosing } from '../hooks/use-choosing.ts';
import { AXIS_WORDS, type GroupActions } from '../hooks/use-group-actions.ts';
import { openHandForm } from '../together/hand-form.ts';
import { KeepGroup } from '../together/keep-group.tsx';
import { SharedNumbersDialog } from './shared-numbers-dialog.tsx';

const KeepArrangement = lazy(() => import('../together/keep-arrangement.tsx'));

const EDGES: readonly [AlignEdge, string][] = [
  ['left', 'Left'],
  ['right', 'Right'],
  ['back', 'Back'],
  ['front', 'Front'],
  ['middle-across', 'Middles, left to right'],
  ['middle-along', 'Middles, back to front'],
];
const AXES: readonly RoomAxis[] = ['across', 'along'];

interface Props {
  document: SetDocument;
  choosing: Choosing;
  actions: GroupActions;
  onCopy: (pieces: readonly Piece[]) => void;
}

/** Several pieces in the hand: which one stays, and what can be done to all. */
export function ChosenPieces({ document, choosing, actions, onCopy }: Props) {
  const [numbersOpen, setNumbersOpen] = useState(false);
  const [keeping, setKeeping] = useState(false);
  const { pieces } = choosing;
  const [first] = pieces;
  if (!first) return null;
  const ids = pieces.map(({ id }) => id);
  const free = pieces.filter(({ locked }) => !locked);
  const canSpace = spaceable(document, ids).length >= 3;
  const allHidden = pieces.every(({ hidden }) => hidden);
  const alike = pieces.every(({ kind }) => kind === first.kind);
  const full = document.pieces.length + pieces.length > MAX_PIECES;
  return (
    <section aria-labelledby="chosen-heading" className="ruled grid gap-3 pt-3 pb-4">
      <div className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1">
        <h2 id="chosen-heading" className="text-lg">
          {pieces.length} pieces chosen
        </h2>
        <Button look="word" onClick={() => choosing.choose([])}>
          Let go of them
        </Button>
      </div>
      <div className="flex flex-wrap items-center gap-2">
        {pieces.map((piece) => (
          <ChosenMark key={piece.id} piece={piece} stays={piece === first} choosing={choosing} />
        ))}
        <p className="text-sm text-ink-2">
          {first.mark} stays where it is when the others line up with it. Press another mark to let that one
          stay.
        </p>
      </div>
      <div className="flex flex-wrap gap-x-8 gap-y-3">
        <Row title="Line up">
          {EDGES.map(([edge, words]) => (
            <Button key={edge} size="small" onClick={() => actions.lineUp(pieces, edge)}>
              {words}
            </Button>
          ))}
        </Row>
        <Row title={canSpace ? 'Space evenly' : 'Space evenly: takes three that are not locked'}>
          {AXES.map((axis) => (
            <Button key={axis} size="small" disabled={!canSpace} onClick={() => actions.space(pieces, axis)}>
              {AXIS_WORDS[axis].replace(/^./, (letter) => letter.toUpperCase())}
            </Button>
          ))}
        </Row>
        <Row title="All together">
          <Button size="small" disabled={free.length === 0} onClick={() => actions.turn(pieces, 15)}>
            Turn 15° left
          </Button>
          <Button size="small" disabled={free.length === 0} onClick={() => actions.turn(pieces, -15)}>
            Turn 15° right
          </Button>
          <Button size="small" disabled={full} onClick={() => actions.copy(pieces)}>
            Copy
          </Button>
          <Button size="small" disabled={free.length === 0} onClick={() => actions.remove(pieces)}>
            Remove
          </Button>
          {alike && (
            <Button size="small" onClick={() => setNumbersOpen(true)}>
              Their numbers
            </Button>
          )}
        </Row>
      </div>
      <div className="flex flex-wrap gap-x-8 gap-y-3">
        <Row title="Again">
          <Button size="small" onClick={() => openHandForm('mirror', ids)}>
            Mirror
          </Button>
          <Button size="small" disabled={full} onClick={() => openHandForm('row', ids)}>
            Repeat in a row
          </Button>
          <Button size="small" onClick={() => onCopy(pieces)}>
            Copy for another set
          </Button>
        </Row>
        <Row title="Keep">
          <KeepGroup pieces={pieces} />
          <Button size="small" onClick={() => setKeeping(true)}>
            Keep as an arrangement
          </Button>
          <Button size="small" onClick={() => actions.mark(pieces, 'hidden', !allHidden)}>
            {allHidden ? 'Show' : 'Hide'}
          </Button>
          <Button size="small" onClick={() => actions.mark(pieces, 'locked', free.length > 0)}>
            {free.length > 0 ? 'Lock' : 'Unlock'}
          </Button>
        </Row>
      </div>
      {!alike && (
        <p className="text-sm text-ink-2">
          Numbers are changed for pieces of one kind: choose those alone, or one piece.
        </p>
      )}
      {keeping && (
        <Suspense fallback={null}>
          <KeepArrangement pieces={pieces} onClose={() => setKeeping(false)} />
        </Suspense>
      )}
      {alike && (
        <SharedNumbersDialog pieces={pieces} open={numbersOpen} onClose={() => setNumbersOpen(false)} />
      )}
    </section>
  );
}

function ChosenMark({ piece, stays, choosing }: { piece: Piece; stays: boolean; choosing: Choosing }) {
  const others = choosing.pieces.filter(({ id }) => id !== piece.id).map(({ id }) => id);
  return (
    <button
      type="button"
      aria-pressed={stays}
      aria-label={`${piece.mark} stays`}
      onClick={() => choosing.choose([piece.id, ...others])}
      className="quick min-h-8 rounded-sm px-0.5"
    >
      <MarkTag mark={piece.mark} timber={timberOf(piece.kind)} selected={stays} />
    </button>
  );
}

function Row({ title, children }: { title: string; children: ReactNode }) {
  return (
    <div role="group" aria-label={title}>
      <p aria-hidden="true" className="mb-1 text-sm text-ink-2">
        {title}
      </p>
      <div className="flex flex-wrap gap-2">{children}</div>
    </div>
  );
}
