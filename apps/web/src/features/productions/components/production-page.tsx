import type { ReactNode } from 'react';
import { useState } from 'react';
import { Button, LinkButton } from '@/components/button.tsx';
import { AddIcon } from '@/components/icons.tsx';
import { PageHeading } from '@/components/page-heading.tsx';
import { usePageTitle } from '@/lib/page-title.ts';
import { useProduction } from '@/lib/production.ts';
import { useWorkshop } from '@/lib/workshop.ts';
import { AddSetDialog } from './add-set-dialog.tsx';
import { Orders } from './orders.tsx';
import { ProductionDialog } from './production-dialog.tsx';
import { type ColourOf, Sets } from './sets.tsx';

interface ProductionPageProps {
  colourOf: ColourOf;
  /** Who sits here, at the right of the sets. */
  people: ReactNode;
  /** Starts an order, at the right of their heading. */
  orderAction?: ReactNode;
}

/** Sets, people and orders of one production on one sheet. */
export function ProductionPage({ colourOf, people, orderAction }: ProductionPageProps) {
  const workshop = useWorkshop();
  const production = useProduction();
  usePageTitle(production.name);
  const [adding, setAdding] = useState(false);
  const [changing, setChanging] = useState(false);
  return (
    <div className="page">
      <PageHeading
        above={
          <>
            {production.summary}
            {workshop.canEdit && (
              <>
                {production.summary && ' '}
                <Button look="word" onClick={() => setChanging(true)}>
                  Change
                </Button>
              </>
            )}
          </>
        }
        title={production.name}
        actions={
          workshop.canEdit && (
            <>
              <LinkButton to={`/w/${workshop.id}/p/${production.id}/people?add=1`}>Add people</LinkButton>
              <Button look="main" icon={<AddIcon />} onClick={() => setAdding(true)}>
                Add a set
              </Button>
            </>
          )
        }
      />
      <div className="grid grid-cols-[minmax(0,1fr)] items-start gap-x-14 gap-y-10 desk:grid-cols-[minmax(0,1fr)_26rem]">
        <Sets colourOf={colourOf} onAdd={() => setAdding(true)} />
        {people}
      </div>
      <div className="mt-8">
        <Orders action={orderAction} />
      </div>
      <AddSetDialog open={adding} onClose={() => setAdding(false)} />
      <ProductionDialog
        workshopId={workshop.id}
        production={production}
        open={changing}
        onClose={() => setChanging(false)}
      />
    </div>
  );
}
