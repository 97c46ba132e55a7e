import { classNames } from './class-names.ts';

interface PaleBarsProps {
  /** "Loading people": read once by a screen reader. */
  words: string;
  rows?: number;
  className?: string;
}

/** Pale bars where rows will be; they stay away for the first 300 ms. */
export function PaleBars({ words, rows = 4, className }: PaleBarsProps) {
  return (
    <div role="status" className={classNames('late', className)}>
      <span className="sr-only">{words}</span>
      {Array.from({ length: rows }, (_, row) => (
        <div
          key={row}
          aria-hidden="true"
          className="flex items-center justify-between border-b border-rule py-4"
        >
          <div className="h-2.5 bg-sunk" style={{ width: `${58 - ((row * 17) % 24)}%` }} />
          <div className="h-2.5 w-14 bg-sunk" />
        </div>
      ))}
    </div>
  );
}

/** A short tape with the name of what is being done. */
export function LoadingLine({ words }: { words: string }) {
  return (
    <p role="status" className="late flex items-center gap-3 font-medium">
      <svg viewBox="0 0 60 14" width="60" height="14" aria-hidden="true" className="tape">
        <path
          d="M1 1v12M59 1v12M1 7h58M15.5 4.5v5M30 4.5v5M44.5 4.5v5"
          stroke="currentColor"
          strokeWidth="1.5"
          fill="none"
        />
      </svg>
      {words}
    </p>
  );
}
