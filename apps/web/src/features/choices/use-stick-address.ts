import { useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import { CROWDS, DEFAULT_CROWD, type CrowdChoice } from '@/lib/crowd/crowds.ts';

/** Stands for every check that a dimension moves. */
export const EVERY_CHECK = 'all';

export interface StickAddress {
  dimensionId: string | undefined;
  /** Rule whose bands are wanted; `EVERY_CHECK` for all that the dimension moves. */
  rule: string | undefined;
  /** The other dimension of the map. */
  second: string | undefined;
  /** The map asks every check that either number moves, not only the two numbers' own. */
  everyCheck: boolean;
  crowd: CrowdChoice;
  /** Changes the address; what is absent or empty goes. */
  go: (
    changes: Partial<Record<'d' | 'rule' | 'd2' | 'map' | 'people' | 'women', string | undefined>>,
  ) => void;
}

/** A population that ships, or the number of one of the workshop's own. */
const isCrowd = (id: string): boolean =>
  CROWDS.some((crowd) => crowd.id === id) || /^[0-9a-f-]{36}$/.test(id);

/** What others may want to see the same way stands in the address of the page. */
export function useStickAddress(): StickAddress {
  const [params, setParams] = useSearchParams();
  return useMemo(() => {
    const women = Number(params.get('women') ?? DEFAULT_CROWD.women);
    const people = params.get('people') ?? '';
    return {
      dimensionId: params.get('d') ?? undefined,
      rule: params.get('rule') ?? undefined,
      second: params.get('d2') ?? undefined,
      everyCheck: params.get('map') === EVERY_CHECK,
      crowd: {
        populationId: isCrowd(people) ? people : DEFAULT_CROWD.populationId,
        women: women >= 0 && women <= 100 ? Math.round(women) : DEFAULT_CROWD.women,
      },
      go: (changes) =>
        setParams(
          (before) => {
            const next = new URLSearchParams(before);
            for (const [key, value] of Object.entries(changes)) {
              if (value) next.set(key, value);
              else next.delete(key);
            }
            return next;
          },
          { replace: true, preventScrollReset: true },
        ),
    };
  }, [params, setParams]);
}
