import { useMemo } from 'react';
import { Outlet, useParams } from 'react-router-dom';
import { NotFoundPage } from '@/app/not-found-page.tsx';
import { useUnsentSets } from '@/features/room/unsent-sets.ts';
import type { Membership } from '@/lib/contract.ts';
import { useSession } from '@/lib/session.ts';
import { type TitleCell, useTitleCells } from '@/lib/title-cells.ts';

function WorkshopCell({ workshop }: { workshop: Membership }) {
  const workshops = useSession((state) => state.workshops);
  const { productionId } = useParams();
  const cells = useMemo<TitleCell[]>(
    () => [
      {
        id: 'workshop',
        side: 'left',
        order: 10,
        label: workshop.isDemo ? 'Workshop, demonstration' : 'Workshop',
        value: workshop.name,
        name: `Workshop: ${workshop.name}, menu`,
        shortens: true,
        yields: productionId === undefined ? undefined : 50,
        menu: [
          { id: 'productions', words: 'Productions', to: `/w/${workshop.id}` },
          { id: 'settings', words: 'Workshop and people', to: `/w/${workshop.id}/workshop` },
          ...workshops
            .filter((other) => other.id !== workshop.id)
            .map((other) => ({ id: other.id, words: other.name, detail: other.role, to: `/w/${other.id}` })),
        ],
      },
    ],
    [workshop, workshops, productionId],
  );
  useTitleCells(cells);
  return null;
}

/** Pages of one workshop; somebody else's workshop reads like an address that leads nowhere. */
export function Component() {
  const { workshopId } = useParams();
  useUnsentSets(useSession((state) => state.user?.id ?? ''));
  const workshop = useSession((state) => state.workshops.find((candidate) => candidate.id === workshopId));
  if (workshop === undefined) return <NotFoundPage />;
  return (
    <>
      <WorkshopCell workshop={workshop} />
      <Outlet />
    </>
  );
}
