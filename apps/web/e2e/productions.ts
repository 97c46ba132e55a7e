import { unique, type Member } from './account.ts';

/** Where a production stands: for requests, and in the browser. */
interface ProductionPlace {
  at: string;
  home: string;
}

const placeOf = ({ workshopId }: Member, id: string): ProductionPlace => ({
  at: `/workshops/${workshopId}/productions/${id}`,
  home: `/w/${workshopId}/p/${id}`,
});

/** Starts an empty production for one story. */
export async function startProduction(member: Member, word: string): Promise<ProductionPlace> {
  const { id } = await member.post<{ id: string }>(`/workshops/${member.workshopId}/productions`, {
    name: unique(word),
    summary: '',
    units: 'feet-inches',
    roundTo: 8,
  });
  return placeOf(member, id);
}

/** Finds the production that the demonstration workshop came with. */
export async function demoProduction(member: Member): Promise<ProductionPlace> {
  const { items } = await member.get<{ items: { id: string; name: string }[] }>(
    `/workshops/${member.workshopId}/productions?search=${encodeURIComponent('Larch Junction')}`,
  );
  const found = items.find(({ name }) => name.includes('Larch Junction'));
  if (found === undefined) throw new Error('The production of the demonstration is gone.');
  return placeOf(member, found.id);
}
