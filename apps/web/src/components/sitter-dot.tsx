/** A shoulder-shaped dot in the sitter's colour; the name always stands beside it. */
export function SitterDot({ colour, size = 13 }: { colour: number; size?: number }) {
  const index = ((Math.max(1, Math.round(colour)) - 1) % 6) + 1;
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
        fill={`var(--color-sitter-${index})`}
        stroke="var(--color-pen)"
        strokeWidth="1.25"
      />
    </svg>
  );
}
