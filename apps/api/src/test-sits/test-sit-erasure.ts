import type { EntityManager } from 'typeorm';
import type { KeptRow } from '../common/kept-text';
import { PersonName } from '../common/person-name';
import { TestSitRow } from './test-sit.entity';

const sitsOf = (manager: EntityManager, productionId: string): Promise<TestSitRow[]> =>
  manager
    .createQueryBuilder(TestSitRow, 'sit')
    .innerJoinAndSelect('sit.set', 'set')
    .where('set.productionId = :productionId', { productionId })
    .orderBy('sit.createdAt')
    .addOrderBy('sit.id')
    .getMany();

/** Part of the caller's transaction: every sit of a person goes, also where only the name says who it was. */
export async function removeTestSits(
  manager: EntityManager,
  productionId: string,
  person: { id: string; name: string },
): Promise<number> {
  const said = new PersonName(person.name);
  const own = (await sitsOf(manager, productionId)).filter(
    ({ castId, name }) => castId === person.id || (name !== null && said.isIn(name)),
  );
  if (own.length > 0)
    await manager.delete(
      TestSitRow,
      own.map(({ id }) => id),
    );
  return own.length;
}

/** What people typed about the sits of others. */
export async function testSitTexts(manager: EntityManager, productionId: string): Promise<KeptRow[]> {
  return (await sitsOf(manager, productionId)).map(({ id, set, name, grade, note }) => {
    const where = `${set?.name ?? 'A set'}, test sit`;
    return {
      texts: [
        ...(name === null ? [] : [{ where: `${where}, who sat`, text: name }]),
        { where: `${where}, foam`, text: grade },
        { where: `${where}, note`, text: note },
      ],
      rewrite: (change) =>
        manager.update(
          TestSitRow,
          { id },
          { name: name === null ? null : change(name), grade: change(grade), note: change(note) },
        ),
    };
  });
}
