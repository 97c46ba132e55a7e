import { randomUUID } from 'node:crypto';
import request, { type Test } from 'supertest';
import { SessionsService } from '../../src/auth/sessions.service';
import type { Role } from '../../src/common/access.decorator';
import { User } from '../../src/users/entities/user.entity';
import { WorkshopsService } from '../../src/workshops/workshops.service';
import type { TestApp } from '../test-app';

export interface Person {
  id: string;
  name: string;
  email: string;
  accessToken: string;
}

export interface WorkshopWithOwner {
  id: string;
  owner: Person;
}

/** Somebody with a confirmed address and an open session; the password of such a person is never asked. */
export async function createPerson(
  test: TestApp,
  given: Partial<{ name: string; email: string; emailConfirmed: boolean }> = {},
): Promise<Person> {
  const email = given.email ?? `${randomUUID()}@people.test`;
  const name = given.name ?? 'Ada Person';
  const { manager } = test.dataSource;
  const emailConfirmedAt = given.emailConfirmed === false ? null : new Date();
  const user = await manager.save(
    User,
    manager.create(User, { name, email, emailConfirmedAt, passwordHash: 'none' }),
  );
  const { accessToken } = await test.app.get(SessionsService).open(manager, user.id);
  return { id: user.id, name, email, accessToken };
}

export async function createWorkshop(test: TestApp, name = 'Bench and Sill'): Promise<WorkshopWithOwner> {
  const owner = await createPerson(test, { name: 'Olive Owner' });
  const workshop = await test.app.get(WorkshopsService).create(test.dataSource.manager, owner.id, { name });
  return { id: workshop.id, owner };
}

/** A further member of a workshop. */
export async function createMember(test: TestApp, workshopId: string, role: Role): Promise<Person> {
  const person = await createPerson(test, { name: `A ${role}` });
  await test.app.get(WorkshopsService).addMember(test.dataSource.manager, workshopId, person.id, role);
  return person;
}

type Method = 'get' | 'post' | 'put' | 'patch' | 'delete';

/** `as(test, person).get('/workshops/…')`: a request under /api with that person's token, or nobody's. */
export function as(
  test: TestApp,
  person: Pick<Person, 'accessToken'> | null,
): Record<Method, (path: string) => Test> {
  const send = (method: Method) => (path: string) => {
    const sent = request(test.app.getHttpServer())[method](`/api${path}`);
    return person ? sent.set('Authorization', `Bearer ${person.accessToken}`) : sent;
  };
  return {
    get: send('get'),
    post: send('post'),
    put: send('put'),
    patch: send('patch'),
    delete: send('delete'),
  };
}
