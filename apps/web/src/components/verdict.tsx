import type { Verdict as VerdictKey } from '@settlewright/anthropometry';
import type { ReactNode } from 'react';
import { classNames } from './class-names.ts';

const WORDS: Record<VerdictKey, string> = {
  fits: 'fits',
  tight: 'tight',
  wontFit: 'won’t fit',
  notKnown: 'not known',
};

const TONES: Record<VerdictKey, string> = {
  fits: 'text-fits',
  tight: 'text-tight',
  wontFit: 'text-wont',
  notKnown: 'text-unknown',
};

export const VERDICT_ORDER: readonly VerdictKey[] = ['fits', 'tight', 'wontFit', 'notKnown'];

/** The word of a verdict, as it is written everywhere. */
export function verdictWord(verdict: VerdictKey): string {
  return WORDS[verdict];
}

/** Text colour of a verdict. */
export function verdictTone(verdict: VerdictKey): string {
  return TONES[verdict];
}

/** The check in small: two uprights are the gap, the block is the body. Never stands without its word. */
export function GapMark({ verdict, estimated = false }: { verdict: VerdictKey; estimated?: boolean }) {
  const dash = estimated ? '2.4 1.9' : undefined;
  return (
    <svg
      viewBox="0 0 26 14"
      width="26"
      height="14"
      aria-hidden="true"
      focusable="false"
      className="gap-mark shrink-0"
      stroke="currentColor"
      strokeWidth="1.5"
      fill="none"
    >
      <path d="M3 0v14" strokeDasharray={dash} />
      {verdict === 'wontFit' ? (
        // The right upright is cut where the body goes through it.
        <path d="M21.5 0v2.5M21.5 11.5v2.5" strokeDasharray={estimated ? '1.2 0.9' : undefined} />
      ) : (
        <path d="M23 0v14" strokeDasharray={dash} />
      )}
      {verdict === 'fits' && <rect x="9.5" y="4" width="7" height="6" fill="currentColor" stroke="none" />}
      {verdict === 'tight' && <rect x="10.5" y="4" width="12" height="6" fill="currentColor" stroke="none" />}
      {verdict === 'wontFit' && <rect x="9" y="4" width="17" height="6" fill="currentColor" stroke="none" />}
      {verdict === 'notKnown' && (
        <g fill="currentColor" stroke="none">
          <circle cx="8.5" cy="7" r="1.15" />
          <circle cx="13" cy="7" r="1.15" />
          <circle cx="17.5" cy="7" r="1.15" />
        </g>
      )}
    </svg>
  );
}

interface VerdictProps {
  verdict: VerdictKey;
  estimated?: boolean;
  /** What follows the word: ", seat height". */
  more?: ReactNode;
  className?: string;
}

/** Mark, word and colour in one line. */
export function Verdict({ verdict, estimated = false, more, className }: VerdictProps) {
  return (
    <span className={classNames('inline-flex items-center gap-2 font-medium', TONES[verdict], className)}>
      <GapMark verdict={verdict} estimated={estimated} />
      <span>
        {WORDS[verdict]}
        {estimated && ', est.'}
        {more}
      </span>
    </span>
  );
}

interface VerdictCellProps extends Pick<VerdictProps, 'verdict' | 'estimated'> {
  /** The signed margin, already in the reader's units. */
  margin: ReactNode;
  className?: string;
}

/** A verdict in a table: the margin over its word, the mark before both. */
export function VerdictCell({ verdict, estimated = false, margin, className }: VerdictCellProps) {
  return (
    <span className={classNames('inline-flex items-center gap-2', TONES[verdict], className)}>
      <GapMark verdict={verdict} estimated={estimated} />
      <span className="grid text-left leading-[1.125rem] whitespace-nowrap">
        <span className={estimated ? undefined : 'font-semibold'}>{margin}</span>
        <span className="text-xs leading-[0.875rem]">
          {WORDS[verdict]}
          {estimated && ', est.'}
        </span>
      </span>
    </span>
  );
}

const COUNT_WORDS: Record<VerdictKey, string> = { ...WORDS, fits: 'fit' };

interface VerdictCountsProps {
  counts: Record<VerdictKey, number>;
  className?: string;
}

/** "31 fit, 10 tight, 2 won’t fit, 2 not known"; what does not occur is left out. */
export function VerdictCounts({ counts, className }: VerdictCountsProps) {
  const present = VERDICT_ORDER.filter((verdict) => counts[verdict] > 0);
  return (
    <ul className={classNames('flex flex-wrap gap-x-4 gap-y-1.5', className)}>
      {present.map((verdict) => (
        <li
          key={verdict}
          className={classNames(
            'inline-flex items-center gap-2 font-medium whitespace-nowrap',
            TONES[verdict],
          )}
        >
          <GapMark verdict={verdict} />
          {counts[verdict]} {verdict === 'fits' && counts.fits === 1 ? 'fits' : COUNT_WORDS[verdict]}
        </li>
      ))}
    </ul>
  );
}
