import {
  AlwaysStencilFunc,
  BackSide,
  DoubleSide,
  NotEqualStencilFunc,
  ReplaceStencilOp,
  ShaderMaterial,
  Vector2,
  Vector3,
  Vector4,
} from 'three';
import { PIECE_FRAGMENT, PIECE_VERTEX } from './piece-shader.ts';
import { CUT, ROOM } from './shader-chunks.ts';

/** Values shared by all materials of one scene; changed in place, so nothing is compiled twice. */
export function createSharedUniforms() {
  return {
    uTones: { value: Array.from({ length: 18 }, () => new Vector3()) },
    uPen: { value: new Vector3() },
    uShade: { value: new Vector3() },
    uSize: { value: new Vector2(1, 1) },
    /** Eye of a perspective with w 1; direction towards the viewer of a drawing to scale with w 0. */
    uEye: { value: new Vector4(0, 0, 1, 0) },
    /** Plane of the section: normal towards the viewer, and distance; w large cuts nothing. */
    uCut: { value: new Vector4(0, 0, 0, 1) },
  };
}

export type SharedUniforms = ReturnType<typeof createSharedUniforms>;

/** Of bodies. */
const SURFACE_VERTEX = /* glsl */ `
  attribute float tone;
  ${ROOM}
  varying vec3 vNormalRoom;
  varying float vTone;
  void main() {
    vRoom = roomOf(position);
    vNormalRoom = mat3(modelMatrix) * normal;
    vTone = tone;
    gl_Position = projectionMatrix * modelViewMatrix * vec4(position, 1.0);
  }`;

const SHADOW_VERTEX = /* glsl */ `
  ${ROOM}
  void main() {
    vRoom = roomOf(position);
    vec3 fallen = vec3(vRoom.x + vRoom.y * 0.10, 1.0, vRoom.z + vRoom.y * 0.16);
    gl_Position = projectionMatrix * viewMatrix * vec4(fallen * 0.001, 1.0);
  }`;

const FLAT_FRAGMENT = /* glsl */ `
  uniform vec3 uShade;
  ${CUT}
  void main() { cut(); gl_FragColor = vec4(uShade, 0.55); }`;

/** A face is set back by as much as it slopes over half the width of a line, which else would sink into it on one side. */
const LINE_HALF_PX = 0.6;
/** Lines lie so far before the faces they edge, and behind anything that stands further before them, m. */
const LINE_NEARER_M = 0.0025;

const LINE_VERTEX = /* glsl */ `
  attribute vec3 lineStart;
  attribute vec3 lineEnd;
  attribute float lineWeight;
  uniform vec2 uSize;
  uniform float uWidth;
  ${ROOM}
  varying float vWeight;
  void main() {
    vec4 a = projectionMatrix * modelViewMatrix * vec4(lineStart, 1.0);
    vec4 b = projectionMatrix * modelViewMatrix * vec4(lineEnd, 1.0);
    vec2 run = (b.xy / b.w - a.xy / a.w) * uSize;
    float len = length(run);
    vec2 along = len > 1e-4 ? run / len : vec2(1.0, 0.0);
    vec2 across = vec2(-along.y, along.x);
    #ifdef ALL_ALIKE
      float weight = 1.0;
    #else
      float weight = lineWeight;
    #endif
    float width = uWidth * (weight < 1.0 ? 0.75 : 1.0);
    vec4 at = position.y < 0.5 ? a : b;
    vec2 offset = across * position.x + along * (position.y * 2.0 - 1.0) * 0.8;
    at.xy += offset * width / uSize * at.w;
    vec4 seen = modelViewMatrix * vec4(position.y < 0.5 ? lineStart : lineEnd, 1.0);
    vec4 nearer = projectionMatrix * (seen + vec4(0.0, 0.0, ${LINE_NEARER_M}, 0.0));
    at.z = nearer.z / nearer.w * at.w;
    vRoom = roomOf(mix(lineStart, lineEnd, position.y));
    vWeight = weight;
    gl_Position = at;
  }`;

const LINE_FRAGMENT = /* glsl */ `
  uniform vec3 uInk;
  varying float vWeight;
  ${CUT}
  void main() { cut(); gl_FragColor = vec4(uInk, vWeight); }`;

/** One light from the upper front, softened at the two steps so that no blotch is drawn. */
const BODY_FRAGMENT = /* glsl */ `
  uniform vec3 uColour;
  uniform vec3 uPen;
  uniform vec4 uEye;
  varying vec3 vNormalRoom;
  varying float vTone;
  ${CUT}
  void main() {
    cut();
    vec3 n = normalize(vNormalRoom);
    vec3 base = uColour;
    if (vTone > 1.5) base = mix(uColour * 0.42, vec3(0.18, 0.14, 0.1), 0.35);
    else if (vTone > 0.5) base = mix(uColour, vec3(1.0, 0.97, 0.92), 0.26);
    float lit = dot(n, normalize(vec3(-0.3, 0.9, 0.4)));
    vec3 colour = mix(base * 0.84, base, smoothstep(-0.14, 0.0, lit));
    colour = mix(colour, mix(base, vec3(1.0), 0.13), smoothstep(0.6, 0.72, lit));
    // Ink where the skin turns away: so many pixels before the facing falls to nothing.
    float facing = abs(dot(n, normalize(uEye.xyz - vRoom * uEye.w)));
    float inside = facing / max(fwidth(facing), 1e-5);
    colour = mix(uPen, colour, smoothstep(1.2, 2.4, inside));
    // The inside of a body shows where a section has opened it: flat, as if it were solid.
    if (!gl_FrontFacing) colour = mix(uColour, uPen, 0.3);
    gl_FragColor = vec4(colour, 1.0);
  }`;

const HULL_VERTEX = /* glsl */ `
  uniform vec2 uSize;
  uniform float uWidth;
  ${ROOM}
  void main() {
    vRoom = roomOf(position);
    vec4 at = projectionMatrix * modelViewMatrix * vec4(position, 1.0);
    vec4 out4 = projectionMatrix * modelViewMatrix * vec4(position + normal, 1.0);
    vec2 push = (out4.xy / out4.w - at.xy / at.w) * uSize;
    float len = length(push);
    if (len > 1e-5) at.xy += push / len * uWidth * 2.0 / uSize * at.w;
    gl_Position = at;
  }`;

const INK_FRAGMENT = /* glsl */ `
  uniform vec3 uInk;
  ${CUT}
  void main() { cut(); gl_FragColor = vec4(uInk, 1.0); }`;

const FADE_VERTEX = /* glsl */ `
  varying vec2 vUv;
  void main() { vUv = uv; gl_Position = projectionMatrix * modelViewMatrix * vec4(position, 1.0); }`;

const FADE_FRAGMENT = /* glsl */ `
  uniform vec3 uInk;
  uniform float uBoards;
  varying vec2 vUv;
  void main() {
    vec2 edge = min(vUv, 1.0 - vUv);
    float alpha = smoothstep(0.0, 0.2, edge.x) * smoothstep(0.0, 0.24, edge.y);
    float seam = abs(fract(vUv.y * uBoards) - 0.5);
    float line = uBoards > 0.0 ? (1.0 - smoothstep(0.0, max(fwidth(vUv.y * uBoards), 1e-4) * 1.2, seam)) : 0.0;
    gl_FragColor = vec4(mix(uInk, uInk * 0.9, line), alpha * 0.85);
  }`;

const CHOSEN_STENCIL = 1;

export function createMaterials(shared: SharedUniforms) {
  const solid = { vertexShader: PIECE_VERTEX, fragmentShader: PIECE_FRAGMENT, uniforms: shared };
  const line = (width: number, ink: Vector3) => ({
    vertexShader: LINE_VERTEX,
    fragmentShader: LINE_FRAGMENT,
    uniforms: { ...shared, uWidth: { value: width }, uInk: { value: ink } },
    transparent: true,
    depthWrite: false,
    side: DoubleSide,
  });
  const fade = (boards: number, ink: Vector3) =>
    new ShaderMaterial({
      vertexShader: FADE_VERTEX,
      fragmentShader: FADE_FRAGMENT,
      uniforms: { uInk: { value: ink }, uBoards: { value: boards } },
      transparent: true,
      depthWrite: false,
      side: DoubleSide,
    });
  const [chosenInk, floorInk, wallInk] = [new Vector3(), new Vector3(), new Vector3()];
  return {
    inks: { chosen: chosenInk, floor: floorInk, wall: wallInk },
    surface: new ShaderMaterial({
      ...solid,
      side: DoubleSide,
      polygonOffset: true,
      polygonOffsetFactor: LINE_HALF_PX,
      polygonOffsetUnits: 1,
    }),
    chosenSurface: new ShaderMaterial({
      ...solid,
      side: DoubleSide,
      polygonOffset: true,
      polygonOffsetFactor: LINE_HALF_PX,
      polygonOffsetUnits: 1,
      stencilWrite: true,
      stencilRef: CHOSEN_STENCIL,
      stencilFunc: AlwaysStencilFunc,
      stencilZPass: ReplaceStencilOp,
    }),
    edges: new ShaderMaterial(line(1.1, shared.uPen.value)),
    cutEdges: new ShaderMaterial(line(3, shared.uPen.value)),
    /** Twice as wide as it shows: its inner half lies on the piece itself and is left out. */
    outline: new ShaderMaterial({
      ...line(6, chosenInk),
      // Seams between boards as well, or it would be broken where one ends at the rim.
      defines: { ALL_ALIKE: '' },
      stencilWrite: true,
      stencilRef: CHOSEN_STENCIL,
      stencilFunc: NotEqualStencilFunc,
    }),
    hull: new ShaderMaterial({
      vertexShader: HULL_VERTEX,
      fragmentShader: INK_FRAGMENT,
      uniforms: { ...shared, uWidth: { value: 1.3 }, uInk: { value: shared.uPen.value } },
      side: BackSide,
    }),
    shadow: new ShaderMaterial({
      vertexShader: SHADOW_VERTEX,
      fragmentShader: FLAT_FRAGMENT,
      uniforms: shared,
      transparent: true,
      depthWrite: false,
      side: DoubleSide,
      // A shadow lies once on the floor, however many boards throw it.
      stencilWrite: true,
      stencilRef: 2,
      stencilFunc: NotEqualStencilFunc,
      stencilZPass: ReplaceStencilOp,
    }),
    floor: fade(26, floorInk),
    wall: fade(0, wallInk),
  };
}

export type SceneMaterials = ReturnType<typeof createMaterials>;

export function createBodyMaterial(shared: SharedUniforms, colour: Vector3): ShaderMaterial {
  return new ShaderMaterial({
    vertexShader: SURFACE_VERTEX,
    fragmentShader: BODY_FRAGMENT,
    uniforms: { ...shared, uColour: { value: colour } },
    side: DoubleSide,
  });
}
