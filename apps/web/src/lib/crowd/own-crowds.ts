import { useQuery } from '@tanstack/react-query';
import { api } from '../api-client.ts';
import type { OwnSurvey, Page } from '../contract.ts';
import { Problem } from '../problem.ts';
import { useWorkshop, workshopPath } from '../workshop.ts';
import type { OwnCrowd } from './crowd-people.ts';
import type { CrowdOption } from './crowds.ts';

/** A workshop has few of them, so one long page holds all. */
const LONG_PAGE = { pageSize: 200 };

/** Address of the workshop's own surveys on the server. */
export const ownPath = (workshopId: string): string => `${workshopPath(workshopId)}/populations`;

/** The key of everything about them, for whoever adds or removes one. */
export const ownCrowdsKey = (workshopId: string) => ['workshops', workshopId, 'populations'] as const;

/** The workshop's own surveys; `undefined` until they are known, and for members who may not read their statistics. */
export function useOwnSurveys(): readonly OwnSurvey[] | undefined {
  const { id, canEdit } = useWorkshop();
  const own = useQuery({
    queryKey: ownCrowdsKey(id),
    queryFn: ({ signal }) => api.get<Page<OwnSurvey>>(ownPath(id), { query: LONG_PAGE, signal }),
    enabled: canEdit,
  });
  return own.data?.items;
}

/** The same for the list of populations. */
export function useOwnCrowds(): readonly CrowdOption[] {
  return (useOwnSurveys() ?? []).map(({ id: of, name, women, men }) => ({
    id: of,
    words: name,
    kind: `your own, ${women + men} people`,
    ...(men === 0 && { only: 'women' }),
    ...(women === 0 && { only: 'men' }),
  }));
}

/** One of the workshop's own surveys with its statistics; asks nothing for a population that ships. */
export function useOwnCrowd(populationId: string): {
  own?: OwnCrowd;
  isPending: boolean;
  error: Error | null;
} {
  const { id, canEdit } = useWorkshop();
  const isOwn = OWN_ID.test(populationId);
  const asked = useQuery({
    queryKey: [...ownCrowdsKey(id), populationId],
    queryFn: ({ signal }) => api.get<OwnCrowd>(`${ownPath(id)}/${populationId}`, { signal }),
    enabled: isOwn && canEdit,
    staleTime: Infinity,
  });
  if (!isOwn) return { isPending: false, error: null };
  if (!canEdit) return { isPending: false, error: NOT_FOR_READERS };
  if (asked.error instanceof Problem && asked.error.status === 404)
    return { isPending: false, error: REMOVED };
  return { ...(asked.data ? { own: asked.data } : {}), isPending: asked.isPending, error: asked.error };
}

const REMOVED = new Error(
  'This survey was removed from the workshop. Choose other people. What was counted with it stays in the list of counts.',
);
const NOT_FOR_READERS = new Error(
  'These people are a survey of the workshop’s own. Its statistics are for the owner and the designers; what they counted with it is in the list of counts.',
);

const OWN_ID = /^[0-9a-f]{8}-[0-9a-f-]{27}$/;
