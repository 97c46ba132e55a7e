import type { EntityManager } from 'typeorm';
import type { KeptRow } from '../common/kept-text';
import { textsOf, withTexts } from '../sets/document-texts';
import { KeptArrangement } from './kept-arrangement.entity';

const WHERE = 'Arrangement';

/** What people typed into the arrangements of a workshop, one by one, as documents may be large. */
export async function* arrangementTexts(manager: EntityManager, workshopId: string): AsyncGenerator<KeptRow> {
  const ids = await manager.find(KeptArrangement, {
    where: { workshopId },
    select: { id: true },
    order: { name: 'ASC', id: 'ASC' },
  });
  for (const { id } of ids) {
    const kept = await manager.findOneBy(KeptArrangement, { id });
    if (!kept) continue;
    const { name, document } = kept;
    yield {
      texts: [{ where: `${WHERE}, its name`, text: name }, ...textsOf(document, WHERE)],
      rewrite: (change) =>
        manager.update(
          KeptArrangement,
          { id },
          { name: change(name), document: withTexts(document, change) },
        ),
    };
  }
}
