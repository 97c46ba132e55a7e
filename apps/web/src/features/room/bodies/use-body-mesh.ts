import type { MannequinDetail, MannequinMesh, MannequinPose } from '@settlewright/geometry';
import { useEffect, useState } from 'react';
import { askBody, knownBody } from './ask-body.ts';

/** The skin of a pose. While a new one is made the one before stays; nothing until the first is there. */
export function useBodyMesh(pose: MannequinPose, detail: MannequinDetail): MannequinMesh | undefined {
  const [latest, setLatest] = useState<MannequinMesh>();
  const known = knownBody(pose, detail);
  useEffect(() => {
    let wanted = true;
    askBody(pose, detail, () => wanted).then(
      (mesh) => wanted && mesh && setLatest(mesh),
      // A body that cannot be made leaves the last one standing; what is written about it does not depend on it.
      () => undefined,
    );
    return () => {
      wanted = false;
    };
  }, [pose, detail]);
  return known ?? latest;
}
