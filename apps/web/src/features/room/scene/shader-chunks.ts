/** Leaves out what a section has cut away. */
export const CUT = /* glsl */ `
  uniform vec4 uCut;
  varying vec3 vRoom;
  void cut() { if (dot(uCut.xyz, vRoom) > uCut.w) discard; }`;

/** Where a vertex stands in the room, mm: what is carried keeps its own vertices and is set down elsewhere. */
export const ROOM = /* glsl */ `
  varying vec3 vRoom;
  vec3 roomOf(vec3 at) { return (modelMatrix * vec4(at, 1.0)).xyz * 1000.0; }`;
