import type { TestApp } from '../test-app';
import { as, createWorkshop, type WorkshopWithOwner } from './people';

export interface ProductionPlace {
  workshop: WorkshopWithOwner;
  productionId: string;
  /** Path of the production under /api. */
  path: string;
}

export async function createProduction(
  test: TestApp,
  body: Record<string, unknown> = {},
  given?: WorkshopWithOwner,
): Promise<ProductionPlace> {
  const workshop = given ?? (await createWorkshop(test));
  const base = `/workshops/${workshop.id}/productions`;
  const sent = { name: 'Supper at Larch Junction', units: 'millimetres', ...body };
  const { body: made } = await as(test, workshop.owner).post(base).send(sent).expect(201);
  return { workshop, productionId: made.id as string, path: `${base}/${made.id as string}` };
}

export async function createCastMember(
  test: TestApp,
  { workshop, path }: ProductionPlace,
  body: Record<string, unknown> = {},
): Promise<string> {
  const sent = { name: 'Ottilie Brandt', bodyData: 'women', statureMm: 1575, ...body };
  const { body: made } = await as(test, workshop.owner).post(`${path}/cast`).send(sent).expect(201);
  return made.id as string;
}

export interface SetPlace extends ProductionPlace {
  setId: string;
  setPath: string;
}

export async function createSet(
  test: TestApp,
  place: ProductionPlace,
  body: Record<string, unknown> = {},
): Promise<SetPlace> {
  const sent = { name: 'Dining car', arrangement: 'facing-benches', ...body };
  const { body: made } = await as(test, place.workshop.owner)
    .post(`${place.path}/sets`)
    .send(sent)
    .expect(201);
  const setId = made.id as string;
  return { ...place, setId, setPath: `${place.path}/sets/${setId}` };
}
