import fc from 'fast-check';
import { MOST_UNITS } from '@/shared/domain/quantity';
import { partForm } from '../pool/scene';
import { asOwner } from '../../support/database';
import type { Caller, Response } from '../../support/caller';
import { callRoute, type Given, type Guarded, guardedOf, routesOf } from './route-calls';
import { hostileKeys, hostileText, illWilled, nodesOf, plainKeys, schemaOf } from './hostile-values';
import { type Tenants, twoTenants } from './two-tenants';

let scene: Tenants;
let known: Record<string, string[]>;
beforeAll(async () => {
  scene = await twoTenants('hostile');
  const { ids, idsOfB } = scene;
  // What could be taken out of use by chance belongs to B, who is not asked here.
  const spared = {
    person: [idsOfB.person?.[1] ?? ''],
    partner: [scene.b.company.id],
    site: [scene.b.site.id],
  };
  known = { ...ids, ...spared, company: spared.partner };
}, 120_000);
afterAll(() => scene?.product.close());

const seed = 20260320;
const drawn = <T>(arbitrary: fc.Arbitrary<T>, numRuns: number): T[] =>
  fc.sample(arbitrary, { numRuns, seed });

/** Nothing, or what an answer shows that it must not: a failure of ours, a stack, a statement. */
function harmOf({ status, text }: Response): string | undefined {
  if (status >= 500) return `answered ${status}: ${text}`;
  return /\\n {4}at |node_modules|\bselect `|\bER_[A-Z]|\\nparams:/.exec(text ?? '')?.[0];
}

/** What a route could be asked with ill will: real things, broken addresses, odd bodies and page keys. */
function illWilledCall({ operation }: Guarded): fc.Arbitrary<Given> {
  const ids = Object.values(known)
    .flat()
    .filter((id) => id.length === 36);
  const broken = hostileText.filter((text) => text !== '' && text !== '\ud800').map(encodeURIComponent);
  const param = (name: string) =>
    fc.oneof(
      { arbitrary: fc.constantFrom(...(known[name] ?? ids)), weight: 6 },
      fc.constantFrom('%E0%A4%A', '%00', ...broken),
    );
  const names = [...operation.path.matchAll(/:([A-Za-z]+)/g)].map((match) => match[1] ?? '');
  const after = fc.constantFrom(...hostileKeys, ...plainKeys);
  const query = operation.query
    ? fc.tuple(illWilled(schemaOf(operation.query), ids), fc.option(after, { freq: 2 }))
    : fc.constant([{}, null] as const);
  return fc
    .tuple(
      fc.record(Object.fromEntries(names.map((name) => [name, param(name)]))),
      query,
      operation.body ? illWilled(schemaOf(operation.body), ids) : fc.constant({}),
    )
    .map(([params, [asked, key], body]) => ({
      params: (name: string) => String((params as Record<string, string>)[name]),
      query: { ...textual(asked), ...(key === null ? {} : { after: key }) },
      body,
    }));
}

function textual(query: unknown): Record<string, string> {
  if (typeof query !== 'object' || query === null) return {};
  const parts = Object.entries(query).filter(([name]) => name !== 'after' && name !== 'companyId');
  return Object.fromEntries(parts.map(([name, value]) => [name, String(value).replace('\ud800', '?')]));
}

describe('requests of ill will', () => {
  it('break nothing on any route, as staff or as a partner', async () => {
    const statuses = new Map<number, number>();
    const harms: unknown[] = [];
    const attack = async (caller: Caller, route: Guarded, given: Given) => {
      const answer = await callRoute(caller, route, given).catch(
        (error: unknown) => ({ status: 599, text: String(error) }) as Response,
      );
      const harm = harmOf(answer);
      if (harm) harms.push({ name: route.operation.name, harm, ...given });
      statuses.set(answer.status, (statuses.get(answer.status) ?? 0) + 1);
    };
    for (const route of guardedOf(scene.product))
      for (const given of drawn(illWilledCall(route), 5)) {
        await attack(scene.staff, route, given);
        await attack(scene.asA, route, given);
      }
    expect(harms).toEqual([]);
    // Not all bounced off the first wall, and both are still who they were.
    expect(statuses.get(200)).toBeGreaterThan(100);
    for (const caller of [scene.staff, scene.asA])
      expect((await caller.get('/session')).body.signedIn).not.toBeNull();
  }, 120_000);

  it('break nothing on the routes that are open to everyone', async () => {
    const stranger = await scene.product.stranger();
    for (const route of routesOf(scene.product).filter((each) => each.ability === null)) {
      const { body, name } = route.operation;
      if (!body) continue;
      for (const given of drawn(illWilled(schemaOf(body), ['x']), 20))
        expect([name, given, harmOf(await callRoute(stranger, route, { body: given }))]).toEqual([
          name,
          given,
          undefined,
        ]);
    }
  });

  it('find no body that lets through a field the contract does not name', () => {
    for (const { operation } of routesOf(scene.product)) {
      if (!operation.body) continue;
      const open = nodesOf(schemaOf(operation.body, 'output')).filter(
        ({ node }) => node.type === 'object' && !node.propertyNames && node.additionalProperties !== false,
      );
      expect([operation.name, open.map(({ path }) => path.join('.'))]).toEqual([operation.name, []]);
    }
  });

  it('cannot choose who made a thing, whose it is or how it stands', async () => {
    const planted = '0190aaaa-aaaa-7aaa-8aaa-aaaaaaaaaaaa';
    const extra = {
      id: planted,
      companyId: planted,
      company: undefined,
      personId: planted,
      createdBy: planted,
      role: 'administrator',
      state: planted,
      status: planted,
      openUnits: 0,
    };
    for (const [name, body] of Object.entries(goodBodies())) {
      const route = guardedOf(scene.product).find(({ operation }) => operation.name === name);
      if (!route) throw new Error(`no route "${name}"`);
      for (const caller of [scene.staff, scene.asA])
        await callRoute(caller, route, { params, body: { ...(body as object), ...extra } });
    }
    expect(await tablesWith(planted)).toEqual([]);
  });
});

const params = (name: string): string => known[name]?.[0] ?? '';

/** Bodies that the contract takes; every operation that takes a quantity stands here. */
function goodBodies(): Record<string, unknown> {
  const { plant, type, a } = scene;
  const typeCode = type.code;
  const day = '2026-03-20';
  return {
    sendShipment: {
      fromSiteId: plant.id,
      toSiteId: a.site.id,
      leftOn: day,
      expectedOn: day,
      lines: [{ typeCode, declared: 5 }],
    },
    countShipment: { lines: [{ typeCode, counted: 5, damaged: 1, dirty: 1 }] },
    adjustStock: { kind: 'found', siteId: plant.id, typeCode, units: 5, on: day, reason: 'x' },
    settleDifference: { way: 'sender miscounted', units: 1, reason: 'x' },
    openDispute: {
      subject: 'count',
      shipmentId: known.shipment?.[0],
      typeCode,
      claimed: 3,
      reason: 'other',
      text: 'x',
    },
    answerDispute: { step: 'accept in part', units: 1, text: 'x', seenMessageId: known.shipment?.[0] },
    approvePool: { size: 5, reckoned: 5, levels: [{ siteId: plant.id, minimum: 1, maximum: 2 }], note: '' },
    invitePerson: { name: 'New', email: 'planted@orrin.example', roles: ['clerk'] },
    addPart: partForm({ type, plant, dock: a.site }, { number: 'HX-1' }),
    replyToDispute: { text: 'x' },
  };
}

async function tablesWith(value: string): Promise<string[]> {
  return asOwner(scene.product.database.name, async (owner) => {
    const [tables] = await owner.query('SHOW FULL TABLES WHERE Table_type = "BASE TABLE"');
    const names = (tables as Record<string, string>[]).map((row) => Object.values(row)[0] ?? '');
    const holding: string[] = [];
    for (const name of names) {
      const [rows] = await owner.query(`SELECT * FROM ${owner.escapeId(name)}`);
      if (JSON.stringify(rows).includes(value)) holding.push(name);
    }
    return holding;
  });
}

describe('a quantity that is none', () => {
  const raw = [
    '2147483648',
    '1000000001',
    '9007199254740993',
    '-0',
    '-1',
    '1e308',
    '"1e3"',
    '"5"',
    '0.1',
    'null',
    '[5]',
  ];
  const isQuantity = ({ node }: ReturnType<typeof nodesOf>[number]) =>
    node.type === 'integer' && node.maximum === MOST_UNITS;

  it('is refused by its name wherever a quantity is taken, and nothing is posted', async () => {
    const lines = async () =>
      (await scene.product.deps.pool.query('SELECT COUNT(*) AS n FROM ledger_lines'))[0];
    const before = await lines();
    let tried = 0;
    for (const route of guardedOf(scene.product)) {
      const { body, name } = route.operation;
      for (const { path } of body ? nodesOf(schemaOf(body)).filter(isQuantity) : []) {
        const good = goodBodies()[name];
        if (!good) throw new Error(`no good body for "${name}"`);
        for (const value of raw) {
          const sent = withRaw(good, path, value);
          const headers = { 'content-type': 'application/json' };
          const answer = await callRoute(scene.staff, route, { params, body: sent, headers });
          const refused =
            answer.status === 403
              ? await callRoute(scene.asA, route, { params, body: sent, headers })
              : answer;
          expect([name, value, refused.status]).toEqual([name, value, 400]);
          expect(refused.body.fields.map((field: { path: string }) => field.path)).toContain(path.join('.'));
          tried += 1;
        }
        const nan = await callRoute(scene.staff, route, {
          params,
          body: withRaw(good, path, 'NaN'),
          headers: { 'content-type': 'application/json' },
        });
        expect([400, 403]).toContain(nan.status);
      }
    }
    expect(tried).toBeGreaterThanOrEqual(11 * raw.length);
    expect(await lines()).toEqual(before);
  });
});

/** The body as JSON text with one value in it written as given. */
function withRaw(body: unknown, path: readonly string[], value: string): string {
  const copy = structuredClone(body) as Record<string, unknown>;
  let at: Record<string, unknown> = copy;
  for (const name of path.slice(0, -1)) at = at[name] as Record<string, unknown>;
  at[path.at(-1) ?? ''] = '@@';
  return JSON.stringify(copy).replace('"@@"', value);
}
