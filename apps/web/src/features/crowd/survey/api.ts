import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { api } from '@/lib/api-client.ts';
import type {
  OpenSurveyMapping,
  OwnSurvey,
  SurveyMapping,
  SurveyPreview,
  SurveyUse,
} from '@/lib/contract.ts';
import { ownCrowdsKey, ownPath } from '@/lib/crowd/own-crowds.ts';

/** A table and which column of it holds what; what is guessed when the mapping is absent. */
export interface SurveyRead {
  csv: string;
  mapping?: OpenSurveyMapping;
}

export interface SurveyAdded {
  name: string;
  source: string;
  csv: string;
  mapping: SurveyMapping;
  keepRows: boolean;
}

export const usePreviewSurvey = (workshopId: string) =>
  useMutation({
    mutationFn: (read: SurveyRead) => api.post<SurveyPreview>(`${ownPath(workshopId)}/preview`, read),
  });

function useOwnMutation<Input, Output>(workshopId: string, send: (input: Input) => Promise<Output>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: send,
    onSuccess: () => client.invalidateQueries({ queryKey: ownCrowdsKey(workshopId) }),
  });
}

export const useAddSurvey = (workshopId: string) =>
  useOwnMutation(workshopId, (added: SurveyAdded) => api.post<OwnSurvey>(ownPath(workshopId), added));

export const useRemoveSurvey = (workshopId: string) =>
  useOwnMutation(workshopId, (id: string) => api.delete(`${ownPath(workshopId)}/${id}`));

/** Forgets the rows; the statistics stay. */
export const useForgetRows = (workshopId: string) =>
  useOwnMutation(workshopId, (id: string) => api.delete(`${ownPath(workshopId)}/${id}/rows`));

/** Sets whose studies drew from a survey; asked while somebody thinks of removing it. */
export const useSurveyUses = (workshopId: string, id: string, isAsked: boolean) =>
  useQuery({
    queryKey: [...ownCrowdsKey(workshopId), id, 'uses'],
    queryFn: async ({ signal }) =>
      (await api.get<{ items: SurveyUse[] }>(`${ownPath(workshopId)}/${id}/studies`, { signal })).items,
    enabled: isAsked,
    staleTime: 0,
    gcTime: 0,
  });
