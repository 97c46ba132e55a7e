import type { EntityManager } from 'typeorm';
import type { KeptRow } from '../common/kept-text';
import { Production } from './entities/production.entity';

/** What people typed about a production itself. */
export async function productionTexts(manager: EntityManager, productionId: string): Promise<KeptRow> {
  const { id, name, summary } = await manager.findOneByOrFail(Production, { id: productionId });
  return {
    texts: [
      { where: 'This production, its name', text: name },
      { where: 'This production, its summary', text: summary },
    ],
    rewrite: (change) => manager.update(Production, { id }, { name: change(name), summary: change(summary) }),
  };
}
