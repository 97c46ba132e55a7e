import { CUT, ROOM } from './shader-chunks.ts';
import { TIMBER } from './timber.ts';

export const PIECE_VERTEX = /* glsl */ `
  attribute float tone;
  attribute vec4 grain;
  ${ROOM}
  varying vec3 vNormalRoom;
  varying float vTone;
  varying vec4 vGrain;
  void main() {
    vRoom = roomOf(position);
    vNormalRoom = mat3(modelMatrix) * normal;
    vTone = tone;
    vGrain = grain;
    gl_Position = projectionMatrix * modelViewMatrix * vec4(position, 1.0);
  }`;

/** Top light, front middle, side dark; what a section cuts open is dark inside. */
export const PIECE_FRAGMENT = /* glsl */ `
  uniform vec3 uTones[18];
  varying vec3 vNormalRoom;
  varying float vTone;
  ${CUT}
  ${TIMBER}
  void main() {
    cut();
    int m = int(vTone + 0.5) * 3;
    vec3 n = normalize(vNormalRoom);
    float top = smoothstep(0.5, 0.8, n.y);
    float side = smoothstep(0.55, 0.8, abs(n.x)) * (n.x > 0.0 ? 0.45 : 0.7);
    float under = smoothstep(0.3, 0.7, -n.y);
    vec3 colour = mix(uTones[m + 1], uTones[m + 2], max(side, under));
    colour = mix(colour, uTones[m], top);
    vec2 wood = timber();
    colour = mix(colour * (1.0 + 0.08 * wood.y), uTones[m + 2] * 0.86, wood.x * 0.28);
    if (!gl_FrontFacing) colour = mix(uTones[m + 2], vec3(0.0), 0.12);
    gl_FragColor = vec4(colour, 1.0);
  }`;
