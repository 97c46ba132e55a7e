import { SITTER_COLOURS } from '@settlewright/geometry';
import { sitterColour, sitterFill } from '@/lib/sitter-colours.ts';

/** A shoulder-shaped dot in the sitter's colour, the later half barred; the name always stands beside it. */
export function SitterDot({ colour, size = 13 }: { colour: number; size?: number }) {
  const barred = sitterColour(colour) > SITTER_COLOURS.length / 2;
  return (
    <svg
      viewBox="0 0 14 14"
      width={size}
      height={size}
      aria-hidden="true"
      focusable="false"
      className="inline-block shrink-0"
    >
      <path
        d="M1 12.2V7a6 6 0 0 1 12 0v5.2a.8.8 0 0 1-.8.8H1.8a.8.8 0 0 1-.8-.8Z"
        fill={sitterFill(colour)}
        stroke="var(--color-pen)"
        strokeWidth="1.25"
      />
      {barred && <path d="M1 9.2h12" stroke="var(--color-pen)" strokeWidth="1.25" />}
    </svg>
  );
}
