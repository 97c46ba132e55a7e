import { useQuery } from '@tanstack/react-query';
import { api } from '../api-client.ts';
import type { Page } from '../contract.ts';
import { useWorkshop, workshopPath } from '../workshop.ts';
import type { OwnCrowd } from './crowd-people.ts';
import type { CrowdOption } from './crowds.ts';

/** A workshop's own survey as it stands in the list. */
interface OwnPopulation {
  id: string;
  name: string;
  women: number;
  men: number;
}

/** A workshop has few of them, so one long page holds all. */
const LONG_PAGE = { pageSize: 200 };

/** Address of the workshop's own surveys on the server. */
const ownPath = (workshopId: string): string => `${workshopPath(workshopId)}/populations`;

/** The key of everything about them, for whoever adds or removes one. */
export const ownCrowdsKey = (workshopId: string) => ['workshops', workshopId, 'populations'] as const;

/** The workshop's own surveys for the list of populations; only for members who may read their statistics. */
export function useOwnCrowds(): readonly CrowdOption[] {
  const { id, canEdit } = useWorkshop();
  const own = useQuery({
    queryKey: ownCrowdsKey(id),
    queryFn: ({ signal }) => api.get<Page<OwnPopulation>>(ownPath(id), { query: LONG_PAGE, signal }),
    enabled: canEdit,
  });
  return (own.data?.items ?? []).map(({ id: of, name, women, men }) => ({
    id: of,
    words: name,
    kind: `your own, ${women + men} people`,
  }));
}

/** One of the workshop's own surveys with its statistics; asks nothing for a population that ships. */
export function useOwnCrowd(populationId: string): {
  own?: OwnCrowd;
  isPending: boolean;
  error: Error | null;
} {
  const { id } = useWorkshop();
  const isOwn = OWN_ID.test(populationId);
  const asked = useQuery({
    queryKey: [...ownCrowdsKey(id), populationId],
    queryFn: ({ signal }) => api.get<OwnCrowd>(`${ownPath(id)}/${populationId}`, { signal }),
    enabled: isOwn,
    staleTime: Infinity,
  });
  return {
    ...(isOwn && asked.data ? { own: asked.data } : {}),
    isPending: isOwn && asked.isPending,
    error: isOwn ? asked.error : null,
  };
}

const OWN_ID = /^[0-9a-f]{8}-[0-9a-f-]{27}$/;
