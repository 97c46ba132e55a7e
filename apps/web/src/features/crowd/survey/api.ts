import { useMutation, useQueryClient } from '@tanstack/react-query';
import { api } from '@/lib/api-client.ts';
import type { OwnSurvey, SurveyMapping, SurveyPreview } from '@/lib/contract.ts';
import { ownCrowdsKey } from '@/lib/crowd/own-crowds.ts';
import { workshopPath } from '@/lib/workshop.ts';

/** A table and which column of it holds what; what is guessed when the mapping is absent. */
export interface SurveyRead {
  csv: string;
  mapping?: SurveyMapping;
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
    mutationFn: (read: SurveyRead) =>
      api.post<SurveyPreview>(`${workshopPath(workshopId)}/populations/preview`, read),
  });

export function useAddSurvey(workshopId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (added: SurveyAdded) => api.post<OwnSurvey>(`${workshopPath(workshopId)}/populations`, added),
    onSuccess: () => client.invalidateQueries({ queryKey: ownCrowdsKey(workshopId) }),
  });
}
