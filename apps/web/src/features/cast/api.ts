import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { TapeMeasureKey } from '@settlewright/anthropometry';
import { api } from '@/lib/api-client.ts';
import type {
  CastMember,
  ImportPreview,
  ImportResult,
  MeasureNext,
  NamedPlaces,
  Page,
  TapeReading,
} from '@/lib/contract.ts';
import { productionKey, productionPath } from '@/lib/production.ts';

/** What is sent to add or change a person; null clears a value. */
export interface CastInput {
  name: string;
  role: string;
  bodyData: NonNullable<CastMember['bodyData']>;
  statureMm: number | null;
  statureSource: NonNullable<CastMember['statureSource']>;
  weightKg: number | null;
  age: number | null;
  measured: Partial<Record<TapeMeasureKey, TapeReading>>;
  shoeMm?: number;
  clothing: NonNullable<CastMember['clothing']>;
  notes: string;
  colour?: number;
}

export interface CastPlace {
  workshopId: string;
  productionId: string;
}

const path = ({ workshopId, productionId }: CastPlace) => `${productionPath(workshopId, productionId)}/cast`;

export const castKey = ({ workshopId, productionId }: CastPlace) =>
  [...productionKey(workshopId, productionId), 'cast'] as const;

export function useCast(place: CastPlace) {
  return useQuery({
    queryKey: castKey(place),
    queryFn: ({ signal }) => api.get<Page<CastMember>>(path(place), { signal, query: { pageSize: 200 } }),
  });
}

/** A change to the cast alters verdicts, so everything of the production is read again. */
function useChange<Input, Answer>(place: CastPlace, change: (input: Input) => Promise<Answer>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: change,
    onSuccess: () =>
      client.invalidateQueries({ queryKey: productionKey(place.workshopId, place.productionId) }),
  });
}

export const useSaveCastMember = (place: CastPlace) =>
  useChange(place, ({ id, ...input }: CastInput & { id?: string }) =>
    id === undefined
      ? api.post<CastMember>(path(place), input)
      : api.patch<CastMember>(`${path(place)}/${id}`, input),
  );

/** Reads everything of the production again but what was asked of the person, who is gone. */
export function useErase(place: CastPlace) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (id: string) => api.delete(`${path(place)}/${id}`),
    onSuccess: (_, id) =>
      client.invalidateQueries({
        queryKey: productionKey(place.workshopId, place.productionId),
        predicate: ({ queryKey }) => !queryKey.includes(id),
      }),
  });
}

/** Which measures of whom settle most; slow for a large cast, so nothing waits for it. */
export const useMeasureNext = (place: CastPlace, enabled: boolean) =>
  useQuery({
    queryKey: [...castKey(place), 'measure-next'],
    queryFn: ({ signal }) => api.get<MeasureNext>(`${path(place)}/measure-next`, { signal }),
    enabled,
  });

/** Where the person's name was typed; looked up anew each time somebody is about to be erased. */
export const useNamedPlaces = (place: CastPlace, id: string | undefined) =>
  useQuery({
    queryKey: [...castKey(place), id, 'named'],
    queryFn: ({ signal }) => api.get<NamedPlaces>(`${path(place)}/${id}/named`, { signal }),
    enabled: id !== undefined,
    staleTime: 0,
    gcTime: 0,
  });

export const usePreviewImport = (place: CastPlace) =>
  useMutation({
    mutationFn: (csv: string) => api.post<ImportPreview>(`${path(place)}/import/preview`, { csv }),
  });

export const useImport = (place: CastPlace) =>
  useChange(place, (csv: string) => api.post<ImportResult>(`${path(place)}/import`, { csv }));

export const exportPath = (place: CastPlace, id: string) => `${path(place)}/${id}/export`;
export const csvPath = ({ workshopId, productionId }: CastPlace) =>
  `${productionPath(workshopId, productionId)}/cast.csv`;

export const measuringSheetPath = (place: CastPlace) => `${path(place)}/measuring-sheet.pdf`;
