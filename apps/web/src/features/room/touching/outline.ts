interface Disc {
  x: number;
  y: number;
  r: number;
}

const ROUND = 16;

/** The tight line around discs on the screen, as the path of an SVG. */
export function outlineOf(discs: readonly Disc[]): string {
  const points = discs
    .flatMap(({ x, y, r }) =>
      Array.from({ length: ROUND }, (_, i) => {
        const angle = (2 * Math.PI * i) / ROUND;
        return [x + r * Math.cos(angle), y + r * Math.sin(angle)] as const;
      }),
    )
    .sort((a, b) => a[0] - b[0] || a[1] - b[1]);
  const chain = (all: readonly (readonly [number, number])[]) => {
    const kept: (readonly [number, number])[] = [];
    for (const p of all) {
      while (kept.length > 1) {
        const [a, b] = [kept[kept.length - 2]!, kept[kept.length - 1]!];
        if ((b[0] - a[0]) * (p[1] - a[1]) - (b[1] - a[1]) * (p[0] - a[0]) > 0) break;
        kept.pop();
      }
      kept.push(p);
    }
    return kept.slice(0, -1);
  };
  const around = [...chain(points), ...chain([...points].reverse())];
  return around.length === 0
    ? ''
    : `M${around.map(([x, y]) => `${x.toFixed(1)} ${y.toFixed(1)}`).join('L')}Z`;
}
