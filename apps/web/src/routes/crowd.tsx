import { useMemo } from 'react';
import { useParams } from 'react-router-dom';
import { CrowdContext, CrowdPage } from '@/features/crowd/index.ts';
import { SetSheet, useRoomForSuggest } from '@/features/room/index.ts';

function Page({ roomTo }: { roomTo: string }) {
  const room = useRoomForSuggest();
  return (
    <CrowdContext value={room}>
      <CrowdPage roomTo={roomTo} fitTo={`${roomTo}/fit`} />
    </CrowdContext>
  );
}

/** What share of a population a set's draft fits. */
export function Component() {
  const { workshopId = '', productionId = '', setId = '' } = useParams();
  const path = useMemo(() => ({ workshopId, productionId, setId }), [workshopId, productionId, setId]);
  return (
    <SetSheet key={setId} path={path}>
      <Page roomTo={`/w/${workshopId}/p/${productionId}/sets/${setId}`} />
    </SetSheet>
  );
}
