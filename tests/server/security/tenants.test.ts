import { v7 as newId } from 'uuid';
import { z } from 'zod';
import { mayWith, partnerRoles } from '@/shared/access/abilities';
import type { Response } from '../../support/caller';
import { callRoute, type Guarded, guardedOf, idsIn, paramsOf, told } from './route-calls';
import { canary, type Tenants, twoTenants } from './two-tenants';

let scene: Tenants;
let routes: Guarded[];
let idsOfA: string[];
beforeAll(async () => {
  scene = await twoTenants('tenants');
  routes = guardedOf(scene.product).filter(({ ability }) => mayWith(partnerRoles, ability));
  idsOfA = await onlyAs();
}, 120_000);
afterAll(() => scene?.product.close());

/** Params that are no id of one tenant: shared by all, or numbers. */
const shared = new Set(['type', 'month', 'entry']);
const idParams = (route: Guarded) => paramsOf(route).filter((name) => !shared.has(name));
const reads = () => routes.filter(({ operation }) => operation.method === 'GET');

/** The first id of its own that a tenant has for a param; a param that the scene does not know fails the test. */
const own =
  (ids: Record<string, string[]>) =>
  (name: string): string => {
    const id = ids[name]?.[0] ?? scene.ids[name]?.[0];
    if (!id) throw new Error(`the scene has no id for ":${name}"`);
    return id;
  };

/** Every id in everything that A's people get, without those that B is given too. */
async function onlyAs(): Promise<string[]> {
  const gathered = { a: new Set<string>(), b: new Set<string>() };
  for (const route of reads()) {
    const a = await callRoute(scene.asA, route, { params: own(scene.ids) });
    expect([route.operation.name, a.status]).toEqual([route.operation.name, 200]);
    for (const id of idsIn(a)) gathered.a.add(id);
    const b = await callRoute(scene.asB, route, { params: own(scene.idsOfB) });
    for (const id of idsIn(b)) gathered.b.add(id);
  }
  for (const name of Object.keys(scene.idsOfB)) for (const id of scene.ids[name] ?? []) gathered.a.add(id);
  return [...gathered.a].filter((id) => !gathered.b.has(id));
}

/** Bodies that are good by the schema, so that the answer is about the id and not about the body. */
const bodies: Record<string, unknown> = {
  get countShipment() {
    return { lines: [{ typeCode: scene.type.code, counted: 1 }] };
  },
  replyToDispute: { text: 'more' },
  withdrawDispute: { text: '' },
  changePerson: { name: 'Other', roles: ['clerk'], active: false },
};

describe('what belongs to another company', () => {
  it('is gathered whole: the scene holds ids of every kind', () => {
    expect(idsOfA.length).toBeGreaterThan(20);
    for (const kind of ['shipment', 'file', 'dispute', 'statement', 'line', 'person', 'difference'])
      expect(scene.ids[kind]?.every((id) => id.length === 36)).toBe(true);
  });

  it('answers by every id, on every route, as if it did not exist', async () => {
    const replay = async (route: Guarded, id: string): Promise<Response> =>
      callRoute(scene.asB, route, {
        params: (name) => (shared.has(name) ? own(scene.ids)(name) : id),
        body: bodies[route.operation.name] ?? {},
      });
    for (const route of routes.filter((each) => idParams(each).length > 0)) {
      const nobody = told(await replay(route, newId()));
      expect([route.operation.name, nobody.status]).toEqual([route.operation.name, 404]);
      for (const id of idsOfA)
        expect([route.operation.name, told(await replay(route, id))]).toEqual([route.operation.name, nobody]);
    }
  }, 120_000);

  it('is not reached by a file of a dispute either, nor by a mix of own and foreign', async () => {
    const [dispute, ownDispute] = [own(scene.ids)('dispute'), own(scene.idsOfB)('dispute')];
    const paper = scene.ids.file?.[0];
    for (const path of [`${dispute}/files/${paper}`, `${ownDispute}/files/${paper}`]) {
      const { status } = await scene.asB.get(`/disputes/${path}`);
      expect(status).toBe(404);
    }
  });

  it('stands in no list, search, choice or count of B', async () => {
    for (const route of reads()) {
      const query = queryOf(route);
      const asked: Record<string, string>[] = [{}];
      if (query.includes('search')) asked.push({ search: canary }, { search: 'zeph' });
      for (const name of query.filter((each) => isId(route, each)))
        asked.push(
          { [name]: scene.a.company.id },
          { [name]: scene.a.site.id },
          { [name]: scene.a.person.id },
        );
      for (const each of asked) {
        const answer = await callRoute(scene.asB, route, { params: own(scene.idsOfB), query: each });
        const said = answer.text ?? '';
        expect([route.operation.name, each, said.includes(canary)]).toEqual([
          route.operation.name,
          each,
          false,
        ]);
        expect([route.operation.name, idsIn(answer).filter((id) => idsOfA.includes(id))]).toEqual([
          route.operation.name,
          [],
        ]);
      }
    }
  });

  it('cannot be named in a body: the answer is that for an id of nobody', async () => {
    const { a, b, plant, type, ids, idsOfB } = scene;
    const dispute = {
      subject: 'count',
      typeCode: type.code,
      claimed: 3,
      reason: 'counted wrongly',
      text: 'x',
    };
    const load = {
      leftOn: '2026-04-20',
      expectedOn: '2026-03-20',
      lines: [{ typeCode: type.code, declared: 1 }],
    };
    const attempts: [string, (id: string) => Promise<Response>, string][] = [
      [
        'disputed shipment',
        (id) => scene.asB.post('/disputes', { ...dispute, shipmentId: id }),
        own(ids)('shipment'),
      ],
      [
        'disputed line',
        (id) => scene.asB.post('/disputes', { ...dispute, subject: 'statement line', lineId: id }),
        own(ids)('line'),
      ],
      [
        'paper',
        (id) =>
          scene.asB.post('/disputes', { ...dispute, shipmentId: own(idsOfB)('shipment'), fileIds: [id] }),
        own(ids)('file'),
      ],
      [
        'photo',
        (id) =>
          scene.asB.post(`/shipments/${idsOfB.shipment?.[1]}/counts`, {
            lines: [{ typeCode: type.code, counted: 1 }],
            photoIds: [id],
          }),
        own(ids)('file'),
      ],
      [
        'site left',
        (id) => scene.asB.post('/shipments', { ...load, fromSiteId: id, toSiteId: plant.id }),
        a.site.id,
      ],
      [
        'site reached',
        (id) =>
          scene.asB.post('/shipments', {
            ...load,
            leftOn: '2026-03-20',
            fromSiteId: b.site.id,
            toSiteId: id,
          }),
        a.site.id,
      ],
      [
        'company',
        (id) => scene.asB.post('/people', { name: 'X', email: 'x@x.example', roles: ['clerk'], company: id }),
        a.company.id,
      ],
    ];
    for (const [what, attempt, id] of attempts) {
      const foreign = told(await attempt(id));
      expect([what, foreign]).toEqual([what, told(await attempt(newId()))]);
      expect([what, foreign.status >= 400 && foreign.status < 500]).toEqual([what, true]);
    }
  });

  it('is refused with the next request when the role goes', async () => {
    const { product, b } = scene;
    const person = await product.aPerson(b.company, ['manager']);
    const caller = await product.as(person);
    expect((await caller.get('/people')).status).toBe(200);
    await product.deps.pool.query("UPDATE person_roles SET role = 'clerk' WHERE person_id = ?", [person.id]);
    expect((await caller.get('/people')).status).toBe(403);
  });
});

function queryOf({ operation }: Guarded): string[] {
  return Object.keys(propertiesOf(operation.query));
}

function isId({ operation }: Guarded, name: string): boolean {
  return propertiesOf(operation.query)[name]?.format === 'uuid';
}

function propertiesOf(schema: z.ZodType | undefined): Record<string, { format?: string }> {
  if (!schema) return {};
  const { properties = {} } = z.toJSONSchema(schema, { io: 'input', unrepresentable: 'any' });
  return properties as Record<string, { format?: string }>;
}
