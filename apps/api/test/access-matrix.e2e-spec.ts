import { afterAll, beforeAll, describe, expect, it, jest } from '@jest/globals';
import type { Response } from 'supertest';
import { ROLES, type Role } from '../src/common/access.decorator';
import { bodiesFor } from './access/bodies';
import { EXPECTED_ACCESS } from './access/expected-access';
import { fillPath, listRoutes, type Route } from './access/routes';
import { as, createPerson, type Person } from './factories/people';
import { createShop, type Shop } from './factories/shop';
import { startObjects, type StandIn, STORE_KEYS } from './factories/stand-ins';
import { startTestApp, type TestApp } from './test-app';

jest.setTimeout(300_000);

let test: TestApp;
let routes: Route[];
let shop: Shop;
let elsewhere: Shop;
let store: StandIn;
beforeAll(async () => {
  store = await startObjects();
  test = await startTestApp({ objectStore: { ...STORE_KEYS, endpoint: store.url } });
  routes = listRoutes(test);
  shop = await createShop(test, 'Ours');
  elsewhere = await createShop(test, 'Theirs');
});
afterAll(async () => {
  await test.close();
  await store.end();
});

const expectedOf = (route: Route): readonly string[] => EXPECTED_ACCESS[route.name] ?? [];
const hasRoles = (route: Route) => ROLES.some((role) => expectedOf(route).includes(role));
const inWorkshop = () => routes.filter(hasRoles);
const belowWorkshop = () => inWorkshop().filter(({ path }) => path.split('{').length > 2);

function ask(
  route: Route,
  who: Pick<Person, 'accessToken'> | null,
  parameters: Record<string, string>,
  from = shop,
): Promise<Response> {
  const sent = as(test, who)[route.method](fillPath(route.path, parameters));
  if (route.method === 'post' && route.path.endsWith('/files')) {
    return sent.attach('file', Buffer.from('%PDF-1.4'), 'paper.pdf').then((answer) => answer);
  }
  const body = bodiesFor(from)[route.name];
  return body ? sent.send(body).then((answer) => answer) : sent.then((answer) => answer);
}

/** `GET /x: 404` for each route that did not answer as it should, so that one run shows them all. */
async function wrongAnswers(
  asked: Route[],
  send: (route: Route) => Promise<Response>,
  isRight: (status: number, route: Route) => boolean,
): Promise<string[]> {
  const wrong: string[] = [];
  for (const route of asked) {
    const { status, text } = await send(route);
    if (!isRight(status, route)) wrong.push(`${route.name}: ${status} ${text?.slice(0, 200) ?? ''}`);
  }
  return wrong;
}

describe('the rule of each route', () => {
  it('is declared and written down, and nothing is written down that does not exist', () => {
    expect(routes.map(({ name }) => name).sort()).toEqual(Object.keys(EXPECTED_ACCESS).sort());
  });

  it('is the one that is written down', () => {
    const declared = Object.fromEntries(routes.map(({ name, rule }) => [name, rule]));
    expect(declared).toEqual(EXPECTED_ACCESS);
  });
});

describe('nobody', () => {
  it('gets 401 from every route that is not open', async () => {
    const closed = routes.filter((route) => !['public', 'link'].includes(expectedOf(route)[0] ?? ''));
    const send = (route: Route) => ask(route, null, shop.parameters);
    expect(await wrongAnswers(closed, send, (status) => status === 401)).toEqual([]);
  });
});

describe('anybody who is signed in', () => {
  it('may use the routes of an account', async () => {
    const own = routes.filter((route) => expectedOf(route)[0] === 'signed-in');
    const send = async (route: Route) => ask(route, await createPerson(test), {});
    const allowed = (status: number) => status < 500 && ![401, 403, 404].includes(status);
    expect(await wrongAnswers(own, send, allowed)).toEqual([]);
  });
});

describe('a member of another workshop', () => {
  it('finds nothing in this one', async () => {
    const send = (route: Route) => ask(route, elsewhere.people.owner, shop.parameters);
    expect(await wrongAnswers(inWorkshop(), send, (status) => status === 404)).toEqual([]);
  });

  it('finds nothing of this one under the own workshop, by any one id', async () => {
    const own = elsewhere.parameters;
    const foreign = Object.keys(own).filter((name) => name.endsWith('Id') && name !== 'workshopId');
    for (const name of foreign) {
      const mixed = { ...own, [name]: shop.parameters[name] ?? '' };
      const touched = belowWorkshop().filter(({ path }) => path.includes(`{${name}}`));
      const send = (route: Route) => ask(route, elsewhere.people.owner, mixed, elsewhere);
      expect([name, await wrongAnswers(touched, send, (status) => status === 404)]).toEqual([name, []]);
    }
  });
});

describe('another production of the same workshop', () => {
  it('does not lend its sets, people and orders', async () => {
    const { owner } = shop.people;
    const path = `/workshops/${shop.parameters.workshopId}/productions`;
    const made = await as(test, owner).post(path).send({ name: 'The day train' }).expect(201);
    const parameters = { ...shop.parameters, productionId: made.body.id as string };
    const touched = belowWorkshop().filter((route) => /\{(set|cast|order)Id\}/.test(route.path));
    const send = (route: Route) => ask(route, owner, parameters);
    expect(await wrongAnswers(touched, send, (status) => status === 404)).toEqual([]);
  });
});

describe('ids that are none', () => {
  it('answer 404 everywhere', async () => {
    for (const id of ['nothing', '00000000-0000-0000-0000-000000000000', "1' OR '1'='1"]) {
      const broken = Object.fromEntries(
        Object.keys(shop.parameters).map((name) => [name, encodeURIComponent(id)]),
      );
      const parameters = { ...broken, workshopId: shop.parameters.workshopId ?? '' };
      const send = (route: Route) => ask(route, shop.people.owner, parameters);
      expect(await wrongAnswers(belowWorkshop(), send, (status) => status === 404)).toEqual([]);
    }
  });
});

describe.each(ROLES)('the %s', (role: Role) => {
  let own: Shop;
  beforeAll(async () => {
    own = await createShop(test, `Shop of the ${role}`);
    const { workshopId, productionId, setId } = own.parameters;
    const notes = `/workshops/${workshopId}/productions/${productionId}/sets/${setId}/notes`;
    const note = { text: 'My own, which I may settle', kind: 'comment' };
    const made = await as(test, own.people[role]).post(notes).send(note).expect(201);
    own.parameters.noteId = made.body.id;
  });

  const may = (route: Route) => expectedOf(route).includes(role);

  it('is refused what the role does not include', async () => {
    const denied = inWorkshop().filter((route) => !may(route));
    const send = (route: Route) => ask(route, own.people[role], own.parameters, own);
    expect(await wrongAnswers(denied, send, (status) => status === 403)).toEqual([]);
  });

  it('reads and changes what the role includes', async () => {
    const order = (route: Route) => {
      if (route.method === 'get') return 0;
      if (route.path.endsWith('/members/{userId}') && route.method === 'delete') return 5;
      if (route.method === 'delete') return route.path.endsWith('}') ? 4 : 3;
      return /archive|restore|cancel|revoke/.test(route.path) ? 2 : 1;
    };
    const allowed = inWorkshop().filter(may);
    const inOrder = [...allowed].sort((one, other) => order(one) - order(other));
    const leaving = role === 'owner' ? own.people.spare : own.people[role];
    const send = (route: Route) =>
      ask(
        route,
        own.people[role],
        route.method === 'delete' ? { ...own.parameters, userId: leaving.id } : own.parameters,
        own,
      );
    const isRight = (status: number, route: Route) =>
      route.method === 'get' ? status === 200 : status < 500 && ![400, 401, 403, 404].includes(status);
    expect(await wrongAnswers(inOrder, send, isRight)).toEqual([]);
  });
});
