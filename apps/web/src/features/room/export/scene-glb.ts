import type { Part, SetDocument } from '@settlewright/geometry';
import { Group, Mesh, MeshStandardMaterial, Scene, SRGBColorSpace } from 'three';
import { GLTFExporter } from 'three/examples/jsm/exporters/GLTFExporter.js';
import type { Palette } from '../scene/palette.ts';
import { MATERIALS, mergeParts, surfaceOf } from '../scene/solids.ts';

const METRES = 0.001;
/** Light, middle, dark: the middle one is what a thing is painted. */
const MIDDLE = 1;
const TONES = 3;

/** Pieces by mark, one mesh for each material; metres, y up. */
function sceneOf(
  document: SetDocument,
  parts: readonly Part[],
  tones: Palette['tones'],
  name: string,
): Scene {
  const scene = new Scene();
  scene.name = name;
  const materials = MATERIALS.map((key, n) => {
    const material = new MeshStandardMaterial({ name: key, roughness: 0.9, metalness: 0 });
    const tone = tones[n * TONES + MIDDLE];
    if (tone) material.color.setRGB(tone.x, tone.y, tone.z, SRGBColorSpace);
    return material;
  });
  for (const piece of document.pieces) {
    if (piece.hidden) continue;
    const group = new Group();
    group.name = piece.mark;
    MATERIALS.forEach((key, n) => {
      const own = parts.filter((part) => part.pieceId === piece.id && part.material === key);
      const material = materials[n];
      if (own.length === 0 || !material) return;
      const { positions, normals, indices } = mergeParts(own);
      const inMetres = positions.map((mm) => mm * METRES);
      const mesh = new Mesh(surfaceOf({ positions: inMetres, normals, indices }), material);
      mesh.name = `${piece.mark} ${key}`;
      group.add(mesh);
    });
    scene.add(group);
  }
  return scene;
}

/** The pieces of a set that are not hidden as a binary glTF, without bodies: those are personal. */
export async function glbOf(
  document: SetDocument,
  parts: readonly Part[],
  tones: Palette['tones'],
  name: string,
): Promise<ArrayBuffer> {
  const made = await new GLTFExporter().parseAsync(sceneOf(document, parts, tones, name), { binary: true });
  if (!(made instanceof ArrayBuffer)) throw new Error('The model could not be written.');
  return made;
}
