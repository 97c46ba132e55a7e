import { classNames } from '@/components/class-names.ts';

/** Letter of a view in an eye: a drop whose tip points the way it looks. */
export function EyeMark({
  letter,
  chosen,
  turnDeg = 0,
}: {
  letter: string;
  chosen: boolean;
  turnDeg?: number;
}) {
  return (
    <svg
      viewBox="0 0 28 30"
      width="26"
      height="28"
      aria-hidden="true"
      className={classNames('tape shrink-0', chosen ? 'text-chalk' : 'text-ink')}
    >
      <path
        transform={`rotate(${turnDeg} 14 17)`}
        d="M14 3.5 21 9.4A10 10 0 1 1 7 9.4Z"
        fill={chosen ? 'currentColor' : 'var(--color-sheet)'}
        stroke="currentColor"
        strokeWidth="1.4"
        strokeLinejoin="round"
      />
      <text
        x="14"
        y="21.2"
        textAnchor="middle"
        fontSize="12"
        fontWeight="600"
        fill={chosen ? 'var(--color-on-chalk)' : 'currentColor'}
      >
        {letter}
      </text>
    </svg>
  );
}
