import { useEffect, useMemo } from 'react';
import { BufferAttribute, BufferGeometry, type ShaderMaterial } from 'three';
import type { RoomPicture, SeatedBody } from '../picture';
import type { Palette } from './palette';
import { createBodyMaterial, type SharedUniforms } from './shaders';

/** Tones of the body shader: suit, skin of the lay figure, shoe. */
const TONE_OF_TAG: Partial<Record<string, number>> = { suit: 0, head: 1, hand: 1, shoe: 2 };

function geometryOf(mesh: SeatedBody['mesh']): BufferGeometry {
  const geometry = new BufferGeometry();
  geometry.setAttribute('position', new BufferAttribute(mesh.positions, 3));
  geometry.setAttribute('normal', new BufferAttribute(mesh.normals, 3));
  const tones = Float32Array.from(mesh.tags, (tag) => TONE_OF_TAG[tag] ?? 0);
  geometry.setAttribute('tone', new BufferAttribute(tones, 1));
  geometry.setIndex(new BufferAttribute(mesh.indices, 1));
  return geometry;
}

interface FigureProps {
  body: SeatedBody;
  palette: Palette;
  shared: SharedUniforms;
  hull: ShaderMaterial;
}

function Figure({ body, palette, shared, hull }: FigureProps) {
  const geometry = useMemo(() => geometryOf(body.mesh), [body.mesh]);
  const material = useMemo(() => {
    const colour = palette.sitters[body.colour - 1] ?? palette.sitters[5];
    return createBodyMaterial(shared, (colour ?? palette.pen).clone());
  }, [palette, body.colour, shared]);
  useEffect(() => () => geometry.dispose(), [geometry]);
  useEffect(() => () => material.dispose(), [material]);
  return (
    <>
      <mesh geometry={geometry} material={hull} frustumCulled={false} />
      <mesh geometry={geometry} material={material} frustumCulled={false} />
    </>
  );
}

interface Props extends Omit<FigureProps, 'body'> {
  picture: RoomPicture;
}

/** Lay figures in a plain suit, two draw calls each. */
export function BodyFigures({ picture, ...rest }: Props) {
  return picture.bodies.map((body) => <Figure key={body.placeId} body={body} {...rest} />);
}
