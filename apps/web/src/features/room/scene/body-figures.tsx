import { MANNEQUIN_TAGS, type MannequinDetail, type MannequinMesh } from '@settlewright/geometry';
import { memo, useEffect, useMemo } from 'react';
import { BufferAttribute, BufferGeometry } from 'three';
import { useBodyMesh } from '../bodies/use-body-mesh.ts';
import type { DrawnPicture } from '../drawn-picture.ts';
import type { SeatedBody } from '../picture.ts';
import { linesOf } from './ink-lines.ts';
import type { Palette } from './palette.ts';
import { setDown } from './piece-solids.tsx';
import { createBodyMaterial, type SceneMaterials, type SharedUniforms } from './shaders.ts';

/** Tones of the body shader: suit, paler head and hands, dark shoes. */
const TONE_OF_TAG: Record<(typeof MANNEQUIN_TAGS)[number], number> = { suit: 0, head: 1, hand: 1, shoe: 2 };
const SEAM_WEIGHT = 0.28;
/** Up to so many people are drawn finely; beyond, each is small in the picture, and seams are left out. */
const FINE_SITTERS = 12;

function geometryOf(mesh: MannequinMesh): BufferGeometry {
  const geometry = new BufferGeometry();
  geometry.setAttribute('position', new BufferAttribute(mesh.positions, 3));
  geometry.setAttribute('normal', new BufferAttribute(mesh.normals, 3));
  const tones = Float32Array.from(mesh.tags, (tag) => TONE_OF_TAG[MANNEQUIN_TAGS[tag] ?? 'suit']);
  geometry.setAttribute('tone', new BufferAttribute(tones, 1));
  geometry.setIndex(new BufferAttribute(mesh.indices, 1));
  return geometry;
}

function seamsOf({ positions, seams }: MannequinMesh) {
  const ends = new Float32Array(seams.length * 3);
  seams.forEach((vertex, n) => ends.set(positions.subarray(vertex * 3, vertex * 3 + 3), n * 3));
  return linesOf(ends, new Float32Array(seams.length / 2).fill(SEAM_WEIGHT));
}

interface FigureProps {
  body: SeatedBody;
  detail: MannequinDetail;
  palette: Palette;
  shared: SharedUniforms;
  materials: SceneMaterials;
}

function Skin({ mesh, body, detail, palette, shared, materials }: FigureProps & { mesh: MannequinMesh }) {
  const geometry = useMemo(() => geometryOf(mesh), [mesh]);
  const seams = useMemo(() => (detail === 'near' ? seamsOf(mesh) : undefined), [mesh, detail]);
  const material = useMemo(() => {
    const colour = palette.sitters[body.colour - 1];
    return createBodyMaterial(shared, (colour ?? palette.pen).clone());
  }, [palette, body.colour, shared]);
  useEffect(() => () => geometry.dispose(), [geometry]);
  useEffect(() => () => seams?.dispose(), [seams]);
  useEffect(() => () => material.dispose(), [material]);
  return (
    <>
      <mesh geometry={geometry} material={material} frustumCulled={false} />
      {seams && <mesh geometry={seams} material={materials.edges} renderOrder={2} frustumCulled={false} />}
    </>
  );
}

/** Drawn again only for another body: a piece in the hand leaves them as they are. */
const Figure = memo(function Figure(props: FigureProps) {
  const mesh = useBodyMesh(props.body.pose, props.detail);
  return mesh && <Skin mesh={mesh} {...props} />;
});

interface Props extends Omit<FigureProps, 'body' | 'detail'> {
  picture: DrawnPicture;
}

/** Lay figures in a plain suit: two draw calls each while they are few, one in a large company. */
export function BodyFigures({ picture, ...rest }: Props) {
  const detail = picture.bodies.length > FINE_SITTERS ? 'far' : 'near';
  const { carried } = picture;
  return picture.bodies.map((body) => (
    <group key={body.placeId} {...setDown(carried?.before.has(body.pieceId) ? carried : undefined)}>
      <Figure body={body} detail={detail} {...rest} />
    </group>
  ));
}
