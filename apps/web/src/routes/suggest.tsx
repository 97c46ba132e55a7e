import { useMemo } from 'react';
import { useParams } from 'react-router-dom';
import { SetSheet, useRoomForSuggest } from '@/features/room/index.ts';
import { SuggestContext, SuggestPage } from '@/features/suggest/index.ts';

function Page({ roomTo }: { roomTo: string }) {
  const room = useRoomForSuggest();
  return (
    <SuggestContext value={room}>
      <SuggestPage roomTo={roomTo} />
    </SuggestContext>
  );
}

/** Dimensions suggested for a set's draft. */
export function Component() {
  const { workshopId = '', productionId = '', setId = '' } = useParams();
  const path = useMemo(() => ({ workshopId, productionId, setId }), [workshopId, productionId, setId]);
  return (
    <SetSheet key={setId} path={path}>
      <Page roomTo={`/w/${workshopId}/p/${productionId}/sets/${setId}`} />
    </SetSheet>
  );
}
