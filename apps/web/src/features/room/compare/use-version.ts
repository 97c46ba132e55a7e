import type { SetDocument } from '@settlewright/geometry';
import { useQuery } from '@tanstack/react-query';
import { api } from '@/lib/api-client.ts';
import type { Draft, Page, SetSummary } from '@/lib/contract.ts';
import { productionPath } from '@/lib/production.ts';
import { setAddress, type FullRevision, type SetPath } from '../api.ts';
import type { ServerFitSheet } from '../picture.ts';

/** One side of a comparison: the draft, an issued revision by its letter, or the draft of another set. */
export interface Version {
  words: string;
  document: SetDocument;
  sheet: ServerFitSheet;
}

const OTHER_SET = 'set:';

/** Names of versions as they stand in the address. */
export const DRAFT = 'draft';
export const otherSet = (setId: string): string => `${OTHER_SET}${setId}`;

async function readDraft(path: SetPath, name: string): Promise<Version> {
  const [draft, sheet] = await Promise.all([
    api.get<Draft>(`${setAddress(path)}/draft`),
    api.get<ServerFitSheet>(`${setAddress(path)}/draft/fit-sheet`),
  ]);
  return { words: `${name} ${draft.number}`, document: draft.document, sheet };
}

async function readVersion(path: SetPath, name: string, sets: readonly SetSummary[]): Promise<Version> {
  if (name === DRAFT) return readDraft(path, 'Draft');
  if (name.startsWith(OTHER_SET)) {
    const setId = name.slice(OTHER_SET.length);
    const found = sets.find(({ id }) => id === setId);
    return readDraft({ ...path, setId }, `${found?.name ?? 'Another set'}, draft`);
  }
  const revision = await api.get<FullRevision>(`${setAddress(path)}/revisions/${name}`);
  return { words: `Revision ${revision.letter}`, document: revision.document, sheet: revision.fitSheet };
}

/** Reads one version with the fit sheet the server made of it. A draft is read afresh at each visit. */
export function useVersion(path: SetPath, name: string | undefined, sets: readonly SetSummary[] | undefined) {
  return useQuery({
    queryKey: ['set', path.setId, 'version', name],
    queryFn: () => readVersion(path, name ?? DRAFT, sets ?? []),
    enabled: name !== undefined && sets !== undefined,
    gcTime: 0,
  });
}

/** The sets in use of the production, to compare one with another. */
export function useSetsBeside({ workshopId, productionId }: SetPath) {
  return useQuery({
    queryKey: ['production', productionId, 'sets-to-compare'],
    queryFn: async () => {
      const address = `${productionPath(workshopId, productionId)}/sets`;
      return (await api.get<Page<SetSummary>>(address, { query: { pageSize: 200, sort: 'name' } })).items;
    },
  });
}
