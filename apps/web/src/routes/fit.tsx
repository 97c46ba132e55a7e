import { useMemo } from 'react';
import { useParams } from 'react-router-dom';
import { FitPage, FitViewContext } from '@/features/fit/index.ts';
import { SetSheet, useRoomForFit } from '@/features/room/index.ts';
import { productionPath } from '@/lib/production.ts';

function Sheet({ roomTo, papersAt }: { roomTo: string; papersAt: string }) {
  const room = useRoomForFit();
  return (
    <FitViewContext value={room}>
      <FitPage roomTo={roomTo} papersAt={papersAt} />
    </FitViewContext>
  );
}

/** The fit sheet of a set's draft as a page of its own. */
export function Component() {
  const { workshopId = '', productionId = '', setId = '' } = useParams();
  const path = useMemo(() => ({ workshopId, productionId, setId }), [workshopId, productionId, setId]);
  const roomTo = `/w/${workshopId}/p/${productionId}/sets/${setId}`;
  const papersAt = `${productionPath(workshopId, productionId)}/sets/${setId}/draft/fit-sheet`;
  return (
    <SetSheet key={setId} path={path}>
      <Sheet roomTo={roomTo} papersAt={papersAt} />
    </SetSheet>
  );
}
