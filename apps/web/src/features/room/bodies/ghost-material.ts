import { ShaderMaterial, type Vector3 } from 'three';
import { CUT } from '../scene/shader-chunks.ts';
import type { SharedUniforms } from '../scene/shaders.ts';

const VERTEX = /* glsl */ `
  uniform vec4 uEye;
  uniform float uNearerMm;
  varying vec3 vRoom;
  varying vec3 vNormalRoom;
  void main() {
    vRoom = position;
    vNormalRoom = normal;
    vec3 toward = normalize(uEye.xyz - position * uEye.w);
    vec4 at = projectionMatrix * modelViewMatrix * vec4(position, 1.0);
    vec4 nearer = projectionMatrix * modelViewMatrix * vec4(position + toward * uNearerMm, 1.0);
    at.z = nearer.z / nearer.w * at.w;
    gl_Position = at;
  }`;

/** A dashed line where the skin turns away, a breath of colour within it. */
const FRAGMENT = /* glsl */ `
  uniform vec3 uColour;
  uniform vec3 uInk;
  uniform vec4 uEye;
  uniform float uFill;
  uniform float uDashPx;
  varying vec3 vNormalRoom;
  ${CUT}
  void main() {
    cut();
    float facing = abs(dot(normalize(vNormalRoom), normalize(uEye.xyz - vRoom * uEye.w)));
    float line = 1.0 - smoothstep(1.4, 2.6, facing / max(fwidth(facing), 1e-5));
    line *= step(fract((gl_FragCoord.x - gl_FragCoord.y) / uDashPx), 0.6);
    gl_FragColor = vec4(mix(uColour, uInk, line), max(line, uFill));
  }`;

/**
 * The smaller body lies inside the drawn one: its line is drawn as if it stood this much before it. Of the larger one
 * only what looks out behind the drawn one is seen.
 */
const NEARER_MM = { smaller: 160, larger: -60 };
const FILL = { smaller: 0, larger: 0.3 };
const DASH_PX = 8;

/**
 * A thin shell round a body.
 *
 * @param colour - the sitter's
 * @param ink - of the dashed line
 * @param which - the larger one holds a little colour, the smaller one is a line
 * @param pixelRatio - pixels of the picture for one of the page
 */
export const createGhostMaterial = (
  shared: SharedUniforms,
  colour: Vector3,
  ink: Vector3,
  which: 'smaller' | 'larger',
  pixelRatio: number,
): ShaderMaterial =>
  new ShaderMaterial({
    vertexShader: VERTEX,
    fragmentShader: FRAGMENT,
    uniforms: {
      ...shared,
      uColour: { value: colour },
      uInk: { value: ink },
      uNearerMm: { value: NEARER_MM[which] },
      uFill: { value: FILL[which] },
      uDashPx: { value: DASH_PX * pixelRatio },
    },
    transparent: true,
    depthWrite: false,
  });
