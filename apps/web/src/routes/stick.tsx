import { useMemo } from 'react';
import { useParams } from 'react-router-dom';
import { ChoicesContext, StickPage } from '@/features/choices/index.ts';
import { SetSheet, useDraftPaper, useRoomForChoices } from '@/features/room/index.ts';

function Sheet({ roomTo }: { roomTo: string }) {
  const room = useRoomForChoices();
  const paper = useDraftPaper();
  const view = useMemo(() => ({ ...room, paper }), [room, paper]);
  return (
    <ChoicesContext value={view}>
      <StickPage roomTo={roomTo} fitTo={`${roomTo}/fit`} />
    </ChoicesContext>
  );
}

/** One dimension of a set's draft and everybody who sits there. */
export function Component() {
  const { workshopId = '', productionId = '', setId = '' } = useParams();
  const path = useMemo(() => ({ workshopId, productionId, setId }), [workshopId, productionId, setId]);
  return (
    <SetSheet key={setId} path={path}>
      <Sheet roomTo={`/w/${workshopId}/p/${productionId}/sets/${setId}`} />
    </SetSheet>
  );
}
