import { useMemo } from 'react';
import type { CrowdRequest } from '@/lib/crowd/crowd-people.ts';
import { CROWDS, type CrowdChoice, type CrowdOption } from '@/lib/crowd/crowds.ts';
import { useOwnCrowd, useOwnCrowds } from '@/lib/crowd/own-crowds.ts';

export interface AskedCrowd {
  /** The workshop's own surveys, and every population to choose from. */
  own: readonly CrowdOption[];
  options: readonly CrowdOption[];
  /** Whom to ask; `undefined` while a survey of the workshop's own is fetched. */
  request: CrowdRequest | undefined;
  fault: string | undefined;
}

/** The people of the address, with the statistics of a survey of the workshop's own. */
export function useCrowd({ populationId, women }: CrowdChoice): AskedCrowd {
  const surveys = useOwnCrowds();
  const { own, isPending, error } = useOwnCrowd(populationId);
  const options = useMemo(() => [...surveys, ...CROWDS], [surveys]);
  const request = useMemo(
    () => (isPending || error ? undefined : { populationId, women, ...(own ? { own } : {}) }),
    [populationId, women, own, isPending, error],
  );
  return { own: surveys, options, request, fault: error?.message };
}
