import { formatLength, type Piece, type SetDocument } from '@settlewright/geometry';
import {
  lazy,
  Suspense,
  useMemo,
  useState,
  type KeyboardEvent,
  type MouseEvent,
  type ReactNode,
} from 'react';
import { Button } from '@/components/button.tsx';
import { classNames } from '@/components/class-names.ts';
import { MarkTag, timberOf } from '@/components/mark-tag.tsx';
import { Measure } from '@/components/measure.tsx';
import { Menu } from '@/components/menu.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import type { Clipboard } from '../clipboard/use-clipboard.ts';
import { adds, type Choosing } from '../hooks/use-choosing.ts';
import { KIND_WORDS, type PieceActions } from '../hooks/use-piece-actions.ts';
import { useSurroundings } from '../room-context.tsx';
import { GroupsList } from '../together/groups-list.tsx';
import { PieceDetails } from './piece-details.tsx';

const PutArrangement = lazy(() => import('../together/put-arrangement.tsx'));

const KINDS = ['bench', 'table', 'loose-seat', 'sill', 'bulkhead', 'overhead'] as const;

/** The length of a piece as its row shows it. */
function lengthOf(piece: Piece): number {
  return piece.kind === 'loose-seat' ? piece.widthMm : piece.lengthMm;
}

interface Props {
  document: SetDocument;
  selectedPieceId: string | undefined;
  onSelect: (pieceId: string | undefined) => void;
  actions: PieceActions;
  /** Left out where only one piece can be looked at. */
  several?: { choosing: Choosing; clipboard: Clipboard };
  /** Filled by the page: the order that a piece's cushions are in. */
  aboutPiece?: (piece: Piece) => ReactNode;
}

/** The schedule of pieces: mark, name, length; the selected one opens. */
export function PiecesPanel({
  document,
  selectedPieceId,
  onSelect,
  actions,
  several: hand,
  aboutPiece,
}: Props) {
  const choosing = hand?.choosing;
  const { canEdit, style } = useSurroundings();
  const [puttingIn, setPuttingIn] = useState(false);
  const entries = useMemo(
    () => [
      ...KINDS.map((kind) => ({
        id: kind,
        words: KIND_WORDS[kind].replace(/^./, (letter) => letter.toUpperCase()),
        onPress: () => actions.add(kind),
      })),
      { id: 'arrangement', words: 'Kept arrangement', onPress: () => setPuttingIn(true) },
    ],
    [actions],
  );
  const several = (choosing?.pieces.length ?? 0) > 1;

  function press(piece: Piece, event: MouseEvent) {
    if (choosing && (choosing.several || adds(event))) choosing.toggle(piece.id);
    else onSelect(!several && piece.id === selectedPieceId ? undefined : piece.id);
  }

  /** Space or Enter with Shift adds a piece, as a press with Shift does; Ctrl A chooses all. */
  function keys(event: KeyboardEvent) {
    if (!choosing || !(event.target instanceof HTMLElement)) return;
    const mark = event.target.closest('[data-piece]')?.getAttribute('data-piece');
    const piece = document.pieces.find((one) => one.mark === mark);
    if (!piece) return;
    if (event.key === 'a' && (event.ctrlKey || event.metaKey)) choosing.chooseAll();
    else if ((event.key === ' ' || event.key === 'Enter') && adds(event)) choosing.toggle(piece.id);
    else if (event.key === 'Escape' && several) choosing.choose([]);
    else return;
    event.preventDefault();
  }

  return (
    <section aria-labelledby="pieces-heading">
      <RuleHeading
        id="pieces-heading"
        aside={
          canEdit && (
            <Menu
              name="Add a piece, menu"
              button="Add"
              buttonClassName="link reach text-sm"
              entries={entries}
              side="end"
            />
          )
        }
      >
        Pieces
      </RuleHeading>
      {document.pieces.length === 0 && <p className="text-sm text-ink-2">None yet.</p>}
      <ul className="border-t-[1.25px] border-ink" onKeyDown={keys}>
        {document.pieces.map((piece) => {
          const chosen = several ? choosing?.pieces.includes(piece) === true : piece.id === selectedPieceId;
          const selected = piece.id === selectedPieceId;
          return (
            <li
              key={piece.id}
              className={classNames('border-b', chosen ? 'border-b-[1.5px] border-ink' : 'border-rule')}
            >
              <button
                type="button"
                aria-current={selected || undefined}
                aria-pressed={choosing ? chosen : undefined}
                data-piece={piece.mark}
                onClick={(event) => press(piece, event)}
                className="quick flex min-h-9 w-full max-tablet:min-h-11 items-center gap-3 py-1 text-left hover:bg-sunk"
              >
                <MarkTag mark={piece.mark} timber={timberOf(piece.kind)} selected={chosen} />
                <span
                  title={piece.name || KIND_WORDS[piece.kind]}
                  className={classNames(
                    'min-w-0 flex-1 truncate text-[0.94rem]',
                    chosen && 'font-semibold',
                    piece.hidden && 'text-ink-3',
                  )}
                >
                  {piece.name || KIND_WORDS[piece.kind]}
                </span>
                {(piece.hidden === true || piece.locked) && (
                  <span className="text-xs text-ink-2">{piece.hidden ? 'hidden' : 'locked'}</span>
                )}
                <span className={classNames('pr-1 text-sm', chosen && 'font-semibold')}>
                  <Measure text={formatLength(lengthOf(piece), { ...style, feet: true })} />
                </span>
              </button>
              {piece.hidden && choosing && (
                <p className="pb-1 pl-1 text-xs text-ink-2">
                  Not drawn, still measured.{' '}
                  <Button
                    look="word"
                    className="text-xs!"
                    onClick={() => actions.setFlag(piece, 'hidden', false)}
                  >
                    Show {piece.mark}
                  </Button>
                </p>
              )}
              {selected && !several && (
                <div className="pb-2.5 pl-1">
                  <PieceDetails
                    piece={piece}
                    document={document}
                    actions={actions}
                    onChoose={choosing?.choose}
                    onCopy={hand?.clipboard.copy}
                  />
                  {aboutPiece?.(piece)}
                </div>
              )}
            </li>
          );
        })}
      </ul>
      {puttingIn && choosing && (
        <Suspense fallback={null}>
          <PutArrangement onChoose={choosing.choose} onClose={() => setPuttingIn(false)} />
        </Suspense>
      )}
      {choosing && <GroupsList document={document} choosing={choosing} />}
      {hand?.clipboard.words && (
        <Button look="word" className="mt-2 text-sm" onClick={hand.clipboard.paste}>
          {hand.clipboard.words}
        </Button>
      )}
    </section>
  );
}
