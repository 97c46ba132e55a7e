import type { MaterialKey, Part, Vec3 } from '@settlewright/geometry';
import type { SolidSink } from './solid-arrays.ts';
import { dot, partAxes } from './vectors.ts';

/** Materials that show a grain; walls are painted. */
const TIMBERS: ReadonlySet<MaterialKey> = new Set(['oak', 'walnut', 'ply']);

/** For a part: the axis its grain follows, then the two across it. */
const ORDERS = { x: [0, 1, 2], y: [1, 2, 0], z: [2, 0, 1] } as const;

/** Boards that can be told apart. */
const SEEDS = 4096;

/** A number over 0 and up to 1 that is the same for a part each time it is drawn. */
function seedOf(id: string): number {
  let hash = 0x811c9dc5;
  for (let n = 0; n < id.length; n++) hash = Math.imul(hash ^ id.charCodeAt(n), 0x01000193);
  // The last letters of keys differ by one: stirred, neighbours come out far apart.
  hash = Math.imul(hash ^ (hash >>> 15), 0x2c1b3c6d);
  return (((hash ^ (hash >>> 12)) >>> 0) % SEEDS) / SEEDS + 1 / SEEDS;
}

const hasGrain = (part: Part): part is Part & { grain: NonNullable<Part['grain']> } =>
  part.grain !== undefined && TIMBERS.has(part.material);

/**
 * Writes where the points of a part lie in their board: along its grain and across it in mm, and the seed of the board;
 * all 0 without a grain. `first` is the first point of the part.
 */
export function addGrains({ positions, grains }: SolidSink, part: Part, first: number): void {
  const end = positions.length / 3;
  const start = grains.take((end - first) * 4);
  if (!hasGrain(part)) {
    grains.memory.fill(0, start, grains.length);
    return;
  }
  const axes = partAxes(part.rotationRad);
  const order = ORDERS[part.grain];
  const seed = seedOf(part.id);
  const [x, y, z] = part.positionMm;
  const [along, across, over] = [axes[order[0]], axes[order[1]], axes[order[2]]];
  for (let n = 0; n < end - first; n++) {
    const [from, to] = [(first + n) * 3, start + n * 4];
    const { memory: points } = positions;
    const away: Vec3 = [points[from]! - x, points[from + 1]! - y, points[from + 2]! - z];
    grains.memory[to] = dot(along, away);
    grains.memory[to + 1] = dot(across, away);
    grains.memory[to + 2] = dot(over, away);
    grains.memory[to + 3] = seed;
  }
}

/**
 * Year rings of a log out of which each board is sawn: lines along the board, arcs on its ends. As a pen would draw
 * them, they keep their distance on the screen, not in the wood: from afar only every second, fourth, eighth is left.
 * Gives how dark a point is drawn, and how much the board as a whole is off the tone of its timber.
 */
export const TIMBER = /* glsl */ `
  varying vec4 vGrain;
  const float RING_MM = 5.0;
  const float APART_PX = 8.0;
  const float SEEDS = ${SEEDS.toFixed(1)};

  float scatter(float n) { return fract(sin(n * 12.9898) * 43758.5453); }
  float sway(float at, float seed) {
    float n = floor(at);
    float t = at - n;
    return mix(scatter(n + seed * 57.0), scatter(n + 1.0 + seed * 57.0), t * t * (3.0 - 2.0 * t));
  }
  float rings(float radius, float along, float seed, float apart, float pixel) {
    float at = radius / apart;
    float n = floor(at + 0.5);
    float line = 1.0 - smoothstep(0.25, 1.0, abs(at - n) * apart / pixel);
    // A line is strong here, faint there, and starts and ends within the board.
    float strength = 0.35 + 0.65 * scatter(n * 0.37 + seed * 7.0);
    return line * strength * smoothstep(0.1, 0.5, sway(along / 700.0 + n * 0.61, seed));
  }
  vec2 timber() {
    // Exactly the seed of the board: between corners it comes out a hair off, which scattering would blow up.
    float seed = floor(vGrain.w * SEEDS + 0.5) / SEEDS;
    vec2 heart = vec2(scatter(seed * 3.1) - 0.5, 0.35 + scatter(seed * 5.7)) * 170.0;
    float wander = (sway(vGrain.x / 640.0, seed) - 0.5) * 36.0 + (sway(vGrain.x / 230.0, seed + 3.0) - 0.5) * 5.0;
    float radius = length(vGrain.yz - heart + vec2(wander, wander * 0.4));
    float pixel = max(fwidth(radius), 1e-4);
    float octave = max(0.0, log2(APART_PX * pixel / RING_MM));
    float apart = RING_MM * exp2(floor(octave));
    float fine = rings(radius, vGrain.x, seed, apart, pixel);
    float coarse = rings(radius, vGrain.x, seed, apart * 2.0, pixel);
    return vec2(mix(fine, coarse, fract(octave)), scatter(seed * 9.3) - 0.5) * step(1e-6, seed);
  }`;
