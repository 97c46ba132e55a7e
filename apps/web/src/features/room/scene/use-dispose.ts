import { useEffect } from 'react';
import type { BufferGeometry } from 'three';

/** Frees what a memo made when it is made again. */
export function useDispose(geometries: Record<string, BufferGeometry>) {
  useEffect(() => () => Object.values(geometries).forEach((geometry) => geometry.dispose()), [geometries]);
}
