import { useQuery } from '@tanstack/react-query';
import { useMemo, type ReactNode } from 'react';
import { Button } from '@/components/button.tsx';
import { LoadingLine } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { usePageTitle } from '@/lib/page-title.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useSession } from '@/lib/session.ts';
import { useUnitStyle } from '@/lib/unit-choice.ts';
import { useWorkshop, useWorkshopSettings } from '@/lib/workshop.ts';
import { useCast, useServerFitSheet, useSetInfo, type SetPath } from '../api.ts';
import { loadFitEngine } from '../engine.ts';
import { useOpenedSet } from '../hooks/use-opened-set.ts';
import { createPictureMaker } from '../picture.ts';
import { AutosaveContext, RoomContext, type RoomSurroundings } from '../room-context.tsx';
import { RoomStoreProvider } from '../room-store-provider.tsx';

interface OpenRoomProps {
  path: SetPath;
  children: ReactNode;
}

/** Opens a set: its draft, its people, the rules and body data, and the unsent work of this device. */
export function OpenRoom({ path, children }: OpenRoomProps) {
  const { canEdit } = useWorkshop();
  const userId = useSession((state) => state.user?.id ?? '');
  const style = useUnitStyle();
  const info = useSetInfo(path);
  const cast = useCast(path);
  const engine = useQuery({ queryKey: ['fit-engine'], queryFn: loadFitEngine, staleTime: Infinity });
  const settings = useWorkshopSettings(path.workshopId);
  const server = useServerFitSheet(path, !canEdit);
  const opened = useOpenedSet(path, userId, canEdit);
  usePageTitle(info.data?.name);

  const maker = useMemo(
    () =>
      engine.data && (canEdit ? settings.data : server.data)
        ? createPictureMaker(engine.data, cast.data ?? [], {
            confidence: settings.data?.confidence,
            server: canEdit ? undefined : server.data,
          })
        : undefined,
    [engine.data, cast.data, canEdit, server.data, settings.data],
  );
  const surroundings = useMemo<RoomSurroundings | undefined>(
    () =>
      engine.data && maker && opened.kind === 'open'
        ? {
            path,
            setName: info.data?.name ?? 'Set',
            canEdit,
            detail: canEdit ? 'full' : 'verdicts',
            style,
            cast: cast.data ?? [],
            engine: engine.data,
            maker,
            confidenceSetAt: settings.data?.confidenceSetAt ?? null,
          }
        : undefined,
    [path, info.data, canEdit, style, cast.data, engine.data, maker, opened, settings.data],
  );

  const trouble =
    opened.kind === 'failed'
      ? opened.error
      : (engine.error ?? server.error ?? (settings.data ? null : settings.error));
  if (trouble) {
    return (
      <div className="page">
        <Notice tone="wont" title="The set cannot be opened">
          {sayProblem(trouble)}
          <p className="mt-3">
            <Button onClick={() => location.reload()}>Try again</Button>
          </p>
        </Notice>
      </div>
    );
  }
  if (!surroundings || opened.kind !== 'open' || cast.isPending) {
    return (
      <div className="page">
        <LoadingLine words={`Laying out ${info.data?.name ?? 'the set'}`} />
      </div>
    );
  }
  return (
    <RoomContext value={surroundings}>
      <RoomStoreProvider store={opened.store}>
        <AutosaveContext value={opened.autosave}>{children}</AutosaveContext>
      </RoomStoreProvider>
    </RoomContext>
  );
}
