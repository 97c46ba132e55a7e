import {
  formatLength,
  specSentence,
  type LengthStyle,
  type Piece,
  type SpecToken,
} from '@settlewright/geometry';
import { Fragment, useId, useRef, useState } from 'react';
import { Measure } from '@/components/measure.tsx';
import { styleFor } from '../numbers.ts';
import { useSurroundings } from '../room-context.tsx';
import { NumberFlag, type NumberAtHand } from './number-flag.tsx';
import { NumberSlip } from './number-slip.tsx';
import { numbersOf } from './piece-numbers.ts';

interface TokensProps {
  tokens: readonly SpecToken[];
  piece: Piece;
  look: 'main' | 'quiet';
  slipId: string;
  onHand: (hand: NumberAtHand | null) => void;
  onNext: (key: string, backwards: boolean) => boolean;
}

export function SpecTokens({ tokens, piece, look, slipId, onHand, onNext }: TokensProps) {
  const { style } = useSurroundings();
  const numbers = numbersOf(piece);
  return tokens.map((token, n) => {
    if (token.kind === 'text') return <Fragment key={n}>{token.text}</Fragment>;
    if (token.kind === 'derived') return <DerivedWords key={token.key} token={token} style={style} />;
    const parameter = numbers.get(token.key);
    return parameter ? (
      <NumberFlag
        key={token.key}
        pieceId={piece.id}
        parameter={parameter}
        look={look}
        slipId={slipId}
        onHand={onHand}
        onNext={(backwards) => onNext(token.key, backwards)}
      />
    ) : null;
  });
}

/** What follows from the numbers, in plain ink: "sinks ¾″ under the reference sitter". */
function DerivedWords({
  token,
  style,
}: {
  token: Extract<SpecToken, { kind: 'derived' }>;
  style: LengthStyle;
}) {
  if (token.valueMm === undefined) return token.text;
  const [verb, ...rest] = token.text.split(' ');
  return (
    <>
      {verb} <Measure text={formatLength(token.valueMm, styleFor(token, style))} /> {rest.join(' ')}
    </>
  );
}

/** The selected piece in one plain sentence, whose numbers are edited where they stand. */
export function SpecSentence({ piece }: { piece: Piece }) {
  const slipId = useId();
  const sentence = useRef<HTMLDivElement>(null);
  const [hand, setHand] = useState<NumberAtHand | null>(null);
  const { canEdit } = useSurroundings();
  const { main, more } = specSentence(piece);
  const order = [...main, ...more].flatMap((token) => (token.kind === 'number' ? [token.key] : []));

  function goOn(key: string, backwards: boolean): boolean {
    const next = order[order.indexOf(key) + (backwards ? -1 : 1)];
    if (next === undefined) return false;
    requestAnimationFrame(() => {
      sentence.current?.querySelector<HTMLButtonElement>(`[data-number="${CSS.escape(next)}"]`)?.focus();
    });
    return true;
  }

  const shared = { piece, slipId, onHand: setHand, onNext: goOn };
  const spoken = hand && hand.pieceId === piece.id ? hand : null;
  return (
    <div className="ruled relative grid gap-x-10 gap-y-3 pt-3 desk:grid-cols-[minmax(0,1fr)_13.5rem]">
      <div ref={sentence} role="group" aria-label={`${piece.name || piece.kind} ${piece.mark} in words`}>
        <p className="text-[1.625rem] leading-[2.625rem] max-tablet:text-[1.3125rem] max-tablet:leading-[2.1875rem]">
          <SpecTokens tokens={main} look="main" {...shared} />
        </p>
        {more.length > 0 && (
          <p className="mt-1 leading-[1.9rem] text-ink-2">
            <SpecTokens tokens={more} look="quiet" {...shared} />
          </p>
        )}
      </div>
      {/* The slip may be taller than its place: it then lies over the drawing, which must not change scale. */}
      <div className="desk:relative desk:min-h-[8.25rem]">
        {canEdit && spoken && (
          <div className="bg-paper tablet:absolute tablet:right-0 tablet:z-20 tablet:w-[13.5rem] tablet:max-desk:bottom-full tablet:max-desk:py-2 desk:bottom-0 desk:min-h-full">
            <NumberSlip
              id={slipId}
              pieceId={spoken.pieceId}
              parameter={spoken.parameter}
              reading={spoken.reading}
              editing={spoken.editing}
              onTake={spoken.take}
            />
          </div>
        )}
      </div>
    </div>
  );
}
