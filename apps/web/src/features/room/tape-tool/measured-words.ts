import { formatLength, type LengthStyle, type MeasuredLine } from '@settlewright/geometry';

/** The unit that the set is not shown in. */
export const otherStyle = ({ system }: LengthStyle): LengthStyle =>
  system === 'millimetres' ? { system: 'feet-inches', roundTo: 16 } : { system: 'millimetres', roundTo: 8 };

/** "27½″ (699 mm)": a length in both units. */
const inBoth = (mm: number, style: LengthStyle): string =>
  `${formatLength(mm, style)} (${formatLength(mm, otherStyle(style))})`;

/** How long a measured line is, and where two things reach into each other, how deep. */
export function sayDistance({ distanceMm }: MeasuredLine, style: LengthStyle): string {
  if (distanceMm >= 0) return inBoth(distanceMm, style);
  return `they reach into each other by ${inBoth(-distanceMm, style)}`;
}

/** The three shares of a measured line, along the room. */
export function sayShares({ acrossMm, upMm, alongMm }: MeasuredLine, style: LengthStyle): string {
  const [across, up, along] = [acrossMm, upMm, alongMm].map((mm) => formatLength(mm, style));
  return `across ${across}, up ${up}, along ${along}`;
}
