import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { api } from '@/lib/api-client.ts';
import type { ServerStudy } from '@/lib/contract.ts';
import { onlySex, type CrowdChoice } from '@/lib/crowd/crowds.ts';

/** People of a study on the server. */
export const MILLION = 1_000_000;
const ASK_AGAIN_MS = 1500;

export const isOpen = ({ state }: Pick<ServerStudy, 'state'>): boolean =>
  state === 'queued' || state === 'running';

const keyOf = (setAt: string) => ['studies', setAt] as const;

/** The last studies of a set, newest first; asked again while one is not done. */
export const useStudies = (setAt: string) =>
  useQuery({
    queryKey: keyOf(setAt),
    queryFn: async ({ signal }) =>
      (await api.get<{ items: ServerStudy[] }>(`${setAt}/studies`, { signal })).items,
    refetchInterval: ({ state }) => (state.data?.some(isOpen) ? ASK_AGAIN_MS : false),
  });

function useStudyMutation<Input>(setAt: string, send: (input: Input) => Promise<unknown>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: send,
    onSettled: () => client.invalidateQueries({ queryKey: keyOf(setAt) }),
  });
}

interface StartInput {
  crowd: CrowdChoice;
  draftNumber: number;
  ruleIds?: string[];
}

export const useStartStudy = (setAt: string) =>
  useStudyMutation(setAt, ({ crowd, draftNumber, ruleIds }: StartInput) =>
    api.post(`${setAt}/studies`, {
      populationId: crowd.populationId,
      ...(onlySex(crowd.populationId) ? {} : { womenPercent: crowd.women }),
      people: MILLION,
      draftNumber,
      ...(ruleIds ? { ruleIds } : {}),
    }),
  );

export const useCancelStudy = (setAt: string) =>
  useStudyMutation(setAt, (id: string) => api.post(`${setAt}/studies/${id}/cancel`));
