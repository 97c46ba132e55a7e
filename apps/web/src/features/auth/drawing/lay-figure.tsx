import { limbPath, type Point } from './limb.ts';

/** Joints of a seated lay figure seen from the side, facing right. */
export interface Seated {
  head: Point;
  neck: Point;
  shoulder: Point;
  chest: Point;
  belly: Point;
  hip: Point;
  knee: Point;
  ankle: Point;
  elbow: Point;
  wrist: Point;
  colour: number;
}

/** Draws shapes as one silhouette: all outlines first, then all fills over them. */
function Silhouette({ paths, fill }: { paths: string[]; fill: string }) {
  const all = paths.join('');
  return (
    <>
      <path
        d={all}
        fill="var(--color-pen)"
        stroke="var(--color-pen)"
        strokeWidth="9"
        strokeLinejoin="round"
      />
      {paths.map((path) => (
        <path key={path} d={path} fill={fill} />
      ))}
    </>
  );
}

const shade = (fill: string, by: number) => `color-mix(in oklab, ${fill}, var(--color-pen) ${by}%)`;
const lift = (fill: string, by: number) => `color-mix(in oklab, ${fill}, var(--color-china) ${by}%)`;

function shoePath(ankle: Point, sole: number): string {
  const [x] = ankle;
  return (
    `M${x - 58} ${sole}Q${x - 66} ${sole - 60} ${x - 34} ${sole - 78}L${x + 34} ${sole - 82}` +
    `Q${x + 80} ${sole - 64} ${x + 150} ${sole - 48}Q${x + 196} ${sole - 34} ${x + 192} ${sole}Z`
  );
}

/** A figure in a plain suit: no face, lighter head and hands, dark shoes. */
export function LayFigure(figure: Seated) {
  const { head, neck, shoulder, chest, belly, hip, knee, ankle, elbow, wrist, colour } = figure;
  const suit = `var(--color-sitter-${colour})`;
  const skin = lift(suit, 38);
  const sole = ankle[1] + 72;
  const back = (point: Point, dx: number, dy: number): Point => [point[0] + dx, point[1] + dy];
  return (
    <g strokeLinejoin="round">
      <Silhouette fill={shade(suit, 24)} paths={[limbPath(back(knee, 26, 4), 62, back(ankle, 62, -4), 44)]} />
      <Silhouette fill="var(--color-walnut-3)" paths={[shoePath(back(ankle, 62, -2), sole - 3)]} />
      <Silhouette fill="var(--color-walnut-3)" paths={[shoePath(ankle, sole)]} />
      <Silhouette
        fill={suit}
        paths={[
          limbPath(shoulder, 92, chest, 118),
          limbPath(chest, 118, belly, 122),
          limbPath(belly, 122, hip, 112),
          limbPath(hip, 112, knee, 70),
          limbPath(knee, 68, ankle, 42),
        ]}
      />
      <Silhouette fill={skin} paths={[limbPath(back(neck, -4, 70), 54, back(head, -26, 40), 42)]} />
      <g transform={`rotate(8 ${head[0]} ${head[1]})`}>
        <ellipse
          cx={head[0]}
          cy={head[1]}
          rx="88"
          ry="118"
          fill={skin}
          stroke="var(--color-pen)"
          strokeWidth="4.5"
        />
        <path
          d={`M${head[0] - 52} ${head[1] - 92}A88 118 0 0 0 ${head[0] - 40} ${head[1] + 104}A120 140 0 0 1 ${head[0] - 52} ${head[1] - 92}Z`}
          fill={shade(skin, 12)}
        />
      </g>
      <Silhouette fill={skin} paths={[limbPath(wrist, 34, [wrist[0] + 110, wrist[1] + 12], 20)]} />
      <Silhouette
        fill={suit}
        paths={[limbPath(back(shoulder, 6, 26), 70, elbow, 52), limbPath(elbow, 52, wrist, 36)]}
      />
    </g>
  );
}
