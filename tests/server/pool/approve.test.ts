import { randomUUID } from 'node:crypto';
import { sitesOutOfLevel } from '@/server/modules/pool/levels';
import { sizePool } from '@/shared/domain/pool-size';
import { aProduct, type Product } from '../../support/app';
import { counted, empties } from '../../support/lane';
import { aPoolScene, plan, type PoolScene, sizingInput } from './scene';

let product: Product;
let scene: PoolScene;
const reckoned = sizePool(sizingInput).poolSize;

beforeEach(async () => {
  product = await aProduct('pool-approve');
  scene = await aPoolScene(product);
  await scene.engineer.put(`/pool/${scene.type.code}/plan`, plan());
});
afterEach(() => product.close());

const form = (given: Record<string, unknown> = {}) => ({
  size: reckoned,
  reckoned,
  levels: [
    { siteId: scene.dock.id, minimum: 200, maximum: 500 },
    { siteId: scene.plant.id, minimum: 0, maximum: 2000 },
  ],
  note: '',
  ...given,
});
const approve = (given: Record<string, unknown> = {}, sent: { key?: string } = {}) =>
  scene.engineer.post(`/pool/${scene.type.code}/approvals`, form(given), sent);

describe('an approved size', () => {
  it('is kept with what it was reckoned from; earlier ones stay, newest first', async () => {
    const first = await approve({ size: reckoned - 40, note: 'Until the new moulds come.' });
    expect(first.status).toBe(200);
    product.setClock('2026-03-20T09:20:00.000Z');
    const second = await approve();
    const { body } = await scene.engineer.get(`/pool/${scene.type.code}/approvals`);
    expect(body.rows.map((row: { id: string }) => row.id)).toEqual([second.body.id, first.body.id]);
    expect(body.rows[1]).toMatchObject({
      size: reckoned - 40,
      note: 'Until the new moulds come.',
      by: 'Sif Holm',
      at: '2026-03-20T09:00:00.000Z',
    });
    expect(body.rows[0].result.poolSize).toBe(reckoned);
    expect(body.rows[0].levels[0]).toEqual({
      site: { id: scene.dock.id, name: 'Kestrel, dock 2', company: 'Kestrel Coil Works' },
      minimum: 200,
      maximum: 500,
    });
    const page = await scene.engineer.get(`/pool/${scene.type.code}/approvals`, { limit: '1' });
    const rest = await scene.engineer.get(`/pool/${scene.type.code}/approvals`, {
      limit: '1',
      after: page.body.next,
    });
    expect(rest.body.rows.map((row: { id: string }) => row.id)).toEqual([first.body.id]);
    expect((await scene.engineer.get(`/pool/${scene.type.code}`)).body.approved.id).toBe(second.body.id);
  });

  it('keeps its figures when the plan changes afterwards', async () => {
    await approve();
    await scene.engineer.put(`/pool/${scene.type.code}/plan`, plan({ bufferDays: '9' }));
    const { body } = await scene.engineer.get(`/pool/${scene.type.code}`);
    expect(body.approved.result.poolSize).toBe(reckoned);
    expect(body.reckoned.result.poolSize).toBeGreaterThan(reckoned);
  });

  it('is there once however often the same request is sent', async () => {
    const key = randomUUID();
    const [first, second] = [await approve({}, { key }), await approve({}, { key })];
    expect(second.body).toEqual(first.body);
    const { body } = await scene.engineer.get(`/pool/${scene.type.code}/approvals`);
    expect(body.rows).toHaveLength(1);
    expect((await approve({ size: 1 }, { key })).status).toBe(422);
  });

  it('is refused when plan or parts have changed since it was seen', async () => {
    await scene.engineer.put(`/pool/${scene.type.code}/plan`, plan({ bufferDays: '9' }));
    const refused = await approve();
    expect([refused.status, refused.body.code]).toEqual([409, 'state changed']);
  });

  it('is refused for a type without a loop, saying what to do', async () => {
    const refused = await scene.engineer.post(`/pool/${scene.lid.code}/approvals`, form({ levels: [] }));
    expect([refused.status, refused.body.code]).toEqual([409, 'cannot be reckoned']);
    expect(refused.body.data.why).toContain('State the loop');
  });

  it('is refused with bad levels named: a maximum below the minimum, a strange site, one site twice', async () => {
    const bad = await approve({ size: 0, levels: [{ siteId: scene.dock.id, minimum: 9, maximum: 8 }] });
    expect(bad.body.fields.map((field: { path: string }) => field.path).sort()).toEqual([
      'levels.0.maximum',
      'size',
    ]);
    const level = { siteId: scene.dock.id, minimum: 1, maximum: 2 };
    const sites = await approve({ levels: [level, { ...level, siteId: randomUUID() }, level] });
    expect(sites.body.fields.map((field: { path: string }) => field.path)).toEqual([
      'levels.1.siteId',
      'levels.2.siteId',
    ]);
  });

  it('is the engineer’s alone', async () => {
    const { coordinator, clerk, type } = scene;
    expect((await coordinator.post(`/pool/${type.code}/approvals`, form())).status).toBe(403);
    expect((await clerk.post(`/pool/${type.code}/approvals`, form())).status).toBe(403);
  });

  it('says from then on which site stands under its minimum or over its maximum', async () => {
    await approve();
    const under = await sitesOutOfLevel(product.deps.db);
    expect(under).toMatchObject([
      {
        site: { id: scene.dock.id, company: 'Kestrel Coil Works' },
        units: 0,
        minimum: 200,
        standing: 'under',
        by: 200,
      },
    ]);
    const sent = await scene.coordinator.post('/shipments', empties(scene, { [scene.type.code]: 640 }));
    await scene.clerk.post(`/shipments/${sent.body.id}/counts`, counted({ [scene.type.code]: 640 }));
    const after = await sitesOutOfLevel(product.deps.db, { companyId: scene.partner.id });
    expect(after).toMatchObject([{ units: 640, maximum: 500, standing: 'over', by: 140 }]);
    expect(await sitesOutOfLevel(product.deps.db, { typeCode: scene.lid.code })).toEqual([]);
    const { body } = await scene.engineer.get('/pool');
    const row = body.rows.find((each: { type: { code: string } }) => each.type.code === scene.type.code);
    expect(row).toMatchObject({ poolSize: reckoned, approved: { size: reckoned }, sitesOver: 1 });
  });
});
