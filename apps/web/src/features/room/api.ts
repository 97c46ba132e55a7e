import type { Verdict } from '@settlewright/anthropometry';
import type { SetDocument } from '@settlewright/geometry';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { api, Problem, Unreachable } from '@/lib/api-client';
import type { CastMember, Draft, Page } from '@/lib/contract';
import type { ServerFitSheet } from './picture';
import type { DraftConflict, PutDraft } from './save/autosave';

/** Where a set lives. */
export interface SetPath {
  workshopId: string;
  productionId: string;
  setId: string;
}

export interface SetInfo {
  id: string;
  name: string;
  draftNumber: number;
  /** `number` is that of the draft it was issued from. */
  lastRevision?: { letter: string; number: number; issuedAt: string } | null;
}

export interface Approval {
  decision: 'approved' | 'changes-wanted';
  comment: string;
  decidedBy: { id: string; name: string };
  decidedAt: string;
}

export interface Revision {
  letter: string;
  number: number;
  issuedAt: string;
  issuedBy: { id: string; name: string };
  note: string;
  counts: Record<Verdict, number>;
  approval?: Approval;
}

export interface FullRevision extends Revision {
  document: SetDocument;
  fitSheet: ServerFitSheet;
  approvals: Approval[];
}

export interface Note {
  id: string;
  text: string;
  pieceId?: string;
  kind: 'comment' | 'mark';
  createdBy: { id: string; name: string };
  createdAt: string;
  resolved: boolean;
}

export interface BuiltPart {
  partId: string;
  builtAt: string;
  builtBy: { id: string; name: string };
}

const production = ({ workshopId, productionId }: SetPath): string =>
  `/workshops/${workshopId}/productions/${productionId}`;
export const setAddress = (path: SetPath): string => `${production(path)}/sets/${path.setId}`;

/** Lists that a page shows whole. */
export const LONG_PAGE = { pageSize: 200 };

export const keyOf = (path: SetPath, ...rest: string[]) => ['set', path.setId, ...rest];

export const useSetInfo = (path: SetPath) =>
  useQuery({ queryKey: keyOf(path), queryFn: () => api.get<SetInfo>(setAddress(path)) });

/** Everyone of the production; a cast is small, so one long page holds it. */
export const useCast = (path: SetPath) =>
  useQuery({
    queryKey: ['cast', path.productionId, 'room'],
    queryFn: async () =>
      (await api.get<Page<CastMember>>(`${production(path)}/cast`, { query: { ...LONG_PAGE, sort: 'name' } }))
        .items,
  });

/** Read once: from then on the page holds the document, and a refetch must not overwrite it. */
export const useDraft = (path: SetPath) =>
  useQuery({
    queryKey: keyOf(path, 'draft'),
    queryFn: () => api.get<Draft>(`${setAddress(path)}/draft`),
    staleTime: Infinity,
    gcTime: 0,
    refetchOnWindowFocus: false,
    refetchOnReconnect: false,
  });

export const useServerFitSheet = (path: SetPath, wanted: boolean) =>
  useQuery({
    queryKey: keyOf(path, 'fit-sheet'),
    queryFn: () => api.get<ServerFitSheet>(`${setAddress(path)}/draft/fit-sheet`),
    enabled: wanted,
  });

/** Sends a draft and sorts the answers by what the page has to do next. */
export const putDraft =
  (path: SetPath): PutDraft =>
  async (baseNumber, document) => {
    try {
      const saved = await api.put<{ number: number; savedAt: string }>(`${setAddress(path)}/draft`, {
        baseNumber,
        document,
      });
      return { kind: 'saved', ...saved };
    } catch (error) {
      if (error instanceof Unreachable) return { kind: 'unreachable' };
      if (!(error instanceof Problem)) throw error;
      if (error.status === 409 && error.code === 'draft-conflict') {
        return { kind: 'conflict', conflict: error.body as unknown as DraftConflict };
      }
      return error.status >= 500 || error.status === 401 || error.status === 429
        ? { kind: 'unreachable' }
        : { kind: 'refused', message: error.message };
    }
  };

export const useRevisions = (path: SetPath) =>
  useQuery({
    queryKey: keyOf(path, 'revisions'),
    queryFn: async () =>
      (await api.get<Page<Revision>>(`${setAddress(path)}/revisions`, { query: LONG_PAGE })).items,
  });

export const useRevision = (path: SetPath, letter: string | undefined) =>
  useQuery({
    queryKey: keyOf(path, 'revisions', letter ?? ''),
    queryFn: () => api.get<FullRevision>(`${setAddress(path)}/revisions/${letter}`),
    enabled: letter !== undefined,
    staleTime: Infinity,
  });

export function useSetMutation<Input, Output>(
  path: SetPath,
  send: (input: Input) => Promise<Output>,
  ...about: string[]
) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: send,
    onSuccess: async () => {
      await Promise.all([
        client.invalidateQueries({ queryKey: keyOf(path, ...about) }),
        client.invalidateQueries({ queryKey: keyOf(path), exact: true }),
      ]);
    },
  });
}

export const useIssueRevision = (path: SetPath) =>
  useSetMutation(
    path,
    (input: { baseNumber: number; note: string }) =>
      api.post<Revision>(`${setAddress(path)}/revisions`, input),
    'revisions',
  );

export const useApprove = (path: SetPath) =>
  useSetMutation(
    path,
    ({ letter, ...body }: { letter: string; decision: 'approved' | 'changes-wanted'; comment: string }) =>
      api.post<Revision>(`${setAddress(path)}/revisions/${letter}/approval`, body),
    'revisions',
  );

export const useNotes = (path: SetPath) =>
  useQuery({
    queryKey: keyOf(path, 'notes'),
    queryFn: async () => (await api.get<Page<Note>>(`${setAddress(path)}/notes`, { query: LONG_PAGE })).items,
  });

export const useAddNote = (path: SetPath) =>
  useSetMutation(
    path,
    (input: { text: string; pieceId?: string; kind: Note['kind'] }) =>
      api.post<Note>(`${setAddress(path)}/notes`, input),
    'notes',
  );

export const useResolveNote = (path: SetPath) =>
  useSetMutation(
    path,
    ({ id, resolved }: { id: string; resolved: boolean }) =>
      api.patch<Note>(`${setAddress(path)}/notes/${id}`, { resolved }),
    'notes',
  );

export const useBuilt = (path: SetPath) =>
  useQuery({
    queryKey: keyOf(path, 'built'),
    queryFn: async () => (await api.get<{ items: BuiltPart[] }>(`${setAddress(path)}/built`)).items,
  });

export const useMarkBuilt = (path: SetPath) =>
  useSetMutation(
    path,
    (input: { partId: string; built: boolean }) => api.put<void>(`${setAddress(path)}/built`, input),
    'built',
  );

/** Saves a document as a set of its own, for "Keep mine as a copy". */
export const copyAsSet = (path: SetPath, name: string, document: SetDocument) =>
  api.post<{ id: string }>(`${production(path)}/sets`, { name, document });
