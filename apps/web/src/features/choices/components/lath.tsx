import type { StickRow, Stretch } from '@settlewright/geometry';
import { useId } from 'react';

interface LathProps {
  row: StickRow;
  x: (value: number) => number;
  /** Middle of the lath. */
  y: number;
}

const FULL = 24;
const TONGUE = 13;

/** An oak lath over what fits, thinner tongues over what is tight; doubt has no hard ends. */
export function Lath({ row, x, y }: LathProps) {
  if (row.estimated)
    return row.tight.map((band, n) => <Doubtful key={n} row={row} band={band} x={x} y={y} />);
  return (
    <g stroke="var(--color-pen)" strokeWidth={1.3}>
      {row.tight.map(({ from, to }, n) => (
        <rect
          key={n}
          x={x(from)}
          y={y - TONGUE / 2}
          width={Math.max(x(to) - x(from), 1)}
          height={TONGUE}
          fill="var(--color-oak-2)"
        />
      ))}
      {row.fits.map(({ from, to }, n) => (
        <g key={n}>
          <rect
            x={x(from)}
            y={y - FULL / 2}
            width={Math.max(x(to) - x(from), 1)}
            height={FULL}
            fill="var(--color-oak-1)"
          />
          <Grain from={x(from)} to={x(to)} y={y} />
        </g>
      ))}
    </g>
  );
}

function Grain({ from, to, y }: { from: number; to: number; y: number }) {
  const room = to - from - 14;
  if (room < 24) return null;
  const third = room / 3;
  return (
    <path
      d={`M${from + 7} ${y - 4}q${third / 2} 4 ${third} 0t${third} 1 ${third} -1M${from + 7} ${y + 5}q${room / 3} -4 ${room} 0`}
      fill="none"
      stroke="var(--color-oak-3)"
      strokeWidth={1}
    />
  );
}

/** Fades over the range that holds 90 in 100 for each check by itself; the best guess is dashed. */
function Doubtful({ row, band, x, y }: LathProps & { band: Stretch }) {
  const id = useId();
  const outer = holding(row.perhapsTight, band) ?? band;
  const inner = holding(row.surelyTight, band);
  const [from, to] = [x(outer.from), x(outer.to)];
  const width = Math.max(to - from, 1);
  const middle = (band.from + band.to) / 2;
  const [a, b] = inner ? [inner.from, inner.to] : [middle, middle];
  const share = (value: number) => Math.min(1, Math.max(0, (x(value) - from) / width));
  const full = inner ? 1 : 0.7;
  const [top, foot] = [y - FULL / 2, y + FULL / 2];
  // An end that the tape cuts off is no doubt about the sitter.
  const cut = { left: outer.from >= a, right: outer.to <= b };
  return (
    <g>
      <defs>
        <linearGradient id={id} x1={from} x2={to} y1="0" y2="0" gradientUnits="userSpaceOnUse">
          <stop offset="0" stopColor="var(--color-oak-2)" stopOpacity={cut.left ? full : 0} />
          <stop offset={share(a)} stopColor="var(--color-oak-1)" stopOpacity={full} />
          <stop offset={share(b)} stopColor="var(--color-oak-1)" stopOpacity={full} />
          <stop offset="1" stopColor="var(--color-oak-2)" stopOpacity={cut.right ? full : 0} />
        </linearGradient>
        <linearGradient id={`${id}-edge`} x1={from} x2={to} y1="0" y2="0" gradientUnits="userSpaceOnUse">
          <stop offset="0" stopColor="var(--color-rule-strong)" stopOpacity={cut.left ? 1 : 0} />
          <stop offset={share(a)} stopColor="var(--color-rule-strong)" />
          <stop offset={share(b)} stopColor="var(--color-rule-strong)" />
          <stop offset="1" stopColor="var(--color-rule-strong)" stopOpacity={cut.right ? 1 : 0} />
        </linearGradient>
      </defs>
      <rect x={from} y={top} width={width} height={FULL} fill={`url(#${id})`} />
      <rect x={from} y={top} width={width} height={1.1} fill={`url(#${id}-edge)`} />
      <rect x={from} y={foot - 1.1} width={width} height={1.1} fill={`url(#${id}-edge)`} />
      <path
        d={`M${x(band.from)} ${top}V${foot}M${x(band.to)} ${top}V${foot}`}
        stroke="var(--color-ink)"
        strokeWidth={1.4}
        strokeDasharray="3 3"
      />
    </g>
  );
}

/** The stretch of a list that overlaps a band. */
const holding = (list: readonly Stretch[], { from, to }: Stretch): Stretch | undefined =>
  list.find((one) => one.from <= to && one.to >= from);
