import { v7 as newId } from 'uuid';
import { companies } from '@/db/schema/companies';
import { parts, poolApprovals } from '@/db/schema/containers';
import { months, statements } from '@/db/schema/statements';
import { outbox } from '@/db/schema/work';
import { aProduct, type Product } from '../../support/app';
import { aLane, counted, fulls, type Lane, sentEmpties } from '../../support/lane';

const now = '2026-03-20T09:00:00.000Z';
let product: Product;
let lane: Lane;
beforeAll(async () => {
  product = await aProduct('today');
});
beforeEach(async () => {
  product.setClock(now);
  lane = await aLane(product);
});
afterAll(() => product.close());

const load = (units: number) => ({ [lane.type.code]: units });

describe('Today', () => {
  it('gives a clerk what is to be counted, what the company holds and what differs', async () => {
    const first = await sentEmpties(lane, load(400));
    await lane.clerk.post(`/shipments/${first}/counts`, counted(load(392)));
    const second = await sentEmpties(lane, load(48));
    await lane.clerk.post('/shipments', fulls(lane, load(60)));
    await product.deps.db.insert(parts).values({
      id: newId(),
      number: 'KC-1',
      name: 'Coil',
      typeCode: lane.type.code,
      supplierSiteId: lane.dock.id,
      plantSiteId: lane.plant.id,
      unitsPerContainer: 2,
      unitsPerDayMean: '200',
      unitsPerDaySd: '0',
      createdAt: now,
    });
    const { status, body } = await lane.clerk.get('/today');
    expect(status).toBe(200);
    expect(body.toCount).toMatchObject({ total: 1, rows: [{ id: second, mayCount: true }] });
    expect(body.holding).toEqual({ held: 392, atSites: 332, sent: 60, sentDiffers: 0, toIt: 48 });
    expect(body.ownDifferences).toEqual([expect.objectContaining({ shipmentId: first, openUnits: -8 })]);
    // 332 at the dock, 200 ÷ 2 containers a day.
    expect(body.runningShort).toEqual([expect.objectContaining({ there: 332, days: 3.3 })]);
    const others = ['pool', 'differences', 'levels', 'months', 'administration', 'overdue'];
    expect(others.map((part) => body[part])).toEqual(others.map(() => null));
  });

  it('gives the coordinator the circuit, adding up to the pool, and what is to be settled', async () => {
    const stock = { siteId: lane.plant.id, typeCode: lane.type.code, on: '2026-03-20', reason: 'Start' };
    await lane.coordinator.post('/adjustments', { ...stock, kind: 'opening', units: 1000 });
    const first = await sentEmpties(lane, load(400));
    await lane.clerk.post(`/shipments/${first}/counts`, counted(load(392)));
    await sentEmpties(lane, load(48));
    await lane.clerk.post('/shipments', fulls(lane, load(60)));
    const { body } = await lane.coordinator.get('/today');
    const pool = body.pool.types.find((each: { typeCode: string }) => each.typeCode === lane.type.code);
    expect(pool).toMatchObject({
      plants: 552,
      partners: 332,
      empties: 48,
      fulls: 60,
      inQuestion: 8,
      total: 1000,
      atStake: [{ currency: 'EUR', amount: '144.00' }],
    });
    expect(body.differences.rows).toContainEqual(
      expect.objectContaining({
        shipmentId: first,
        openUnits: -8,
        atStake: { currency: 'EUR', amount: '144.00' },
      }),
    );
    expect(body.toCount.rows.map((row: { contents: string }) => row.contents)).toEqual(['fulls']);
    expect(body.holding).toBeNull();
  });

  it('names as overdue what nobody counted in the partner’s days, and no day sooner', async () => {
    const id = await sentEmpties(lane, load(5));
    const overdueOn = async (instant: string) => {
      product.setClock(instant);
      const { body } = await (await product.as(lane.ane)).get('/today');
      return body.overdue.rows.map((row: { id: string }) => row.id);
    };
    expect(await overdueOn('2026-03-27T09:00:00.000Z')).not.toContain(id);
    expect(await overdueOn('2026-03-28T09:00:00.000Z')).toContain(id);
  });

  it('gives the engineer what is under or over its approved size or level', async () => {
    const stock = { siteId: lane.plant.id, on: '2026-03-20', kind: 'opening', reason: 'Start' };
    await lane.coordinator.post('/adjustments', { ...stock, typeCode: lane.type.code, units: 90 });
    await lane.coordinator.post('/adjustments', { ...stock, typeCode: lane.lid.code, units: 20 });
    const engineer = await product.aPerson(lane.operator, ['engineer']);
    const approve = (typeCode: string, size: number, minimum: number) => ({
      id: newId(),
      typeCode,
      size,
      input: {},
      result: {},
      levels: [{ siteId: lane.plant.id, minimum, maximum: 500 }],
      approvedBy: engineer.id,
      approvedAt: now,
    });
    await product.deps.db.insert(poolApprovals).values(approve(lane.type.code, 80, 0));
    await product.deps.db.insert(poolApprovals).values(approve(lane.type.code, 100, 91));
    await product.deps.db.insert(poolApprovals).values(approve(lane.lid.code, 20, 20));
    const { body } = await (await product.as(engineer)).get('/today');
    expect(body.levels).toEqual([
      expect.objectContaining({ site: null, there: 90, minimum: 100, maximum: 100 }),
      expect.objectContaining({ site: 'Tarnby Assembly', there: 90, minimum: 91, maximum: 500 }),
    ]);
  });

  it('gives finance the months to close, statements not issued and answers awaited; a partner its own', async () => {
    const { db } = product.deps;
    await db.insert(months).values({ month: '2026-02', state: 'open' });
    await db.insert(months).values({ month: '2026-01', state: 'closed' });
    const other = await product.aCompany();
    const statement = (companyId: string, state: 'draft' | 'issued') => ({
      id: newId(),
      companyId,
      month: '2026-01',
      number: `N-${companyId}`,
      currency: 'EUR',
      state,
      payable: '400.00',
      tax: '12.60',
      content: {},
      sha256: '0'.repeat(64),
      objectionUntil: '2026-04-01',
      answer: 'awaited' as const,
      createdAt: now,
    });
    await db.insert(statements).values(statement(lane.partner.id, 'issued'));
    await db.insert(statements).values(statement(other.id, 'draft'));
    const finance = await product.as(await product.aPerson(lane.operator, ['finance']));
    const { body } = await finance.get('/today');
    expect(body.months).toEqual({
      toClose: ['2026-02'],
      drafts: [{ month: '2026-01', statements: 1 }],
      disputed: { disputes: 0, held: [] },
    });
    const awaited = {
      total: 1,
      rows: [expect.objectContaining({ due: { currency: 'EUR', amount: '412.60' } })],
    };
    expect(body.awaited).toEqual(awaited);
    const manager = await product.as(await product.aPerson(lane.partner, ['manager']));
    expect((await manager.get('/today')).body.awaited).toEqual(awaited);
    const stranger = await product.as(await product.aPerson(other, ['manager']));
    expect((await stranger.get('/today')).body.awaited).toEqual({ total: 0, rows: [] });
  });

  it('gives the administrator who has not come in and which letters failed', async () => {
    const administrator = await product.aPerson(lane.operator, ['administrator']);
    await product.aPerson(lane.partner, ['clerk'], { name: 'New Clerk', passwordHash: null });
    await product.deps.db.insert(outbox).values({
      id: newId(),
      kind: 'test',
      toName: 'X',
      toAddress: 'x@tarekeep.example',
      subject: 's',
      text: 't',
      messageId: '<1@tarekeep>',
      state: 'failed',
      notBefore: now,
      createdAt: now,
    });
    const { body } = await (await product.as(administrator)).get('/today');
    expect(body.administration).toMatchObject({
      invited: [{ name: 'New Clerk', company: 'Kestrel Coil Works' }],
      failedLetters: 1,
      bookDiffers: false,
    });
  });

  it('shows a partner nothing of another', async () => {
    const id = await sentEmpties(lane, load(400));
    await lane.clerk.post(`/shipments/${id}/counts`, counted(load(392)));
    const other = await product.aCompany();
    const stranger = await product.as(await product.aPerson(other, ['clerk', 'manager']));
    const { text } = await stranger.get('/today');
    const names = (await product.deps.db.select().from(companies)).map((company) => company.name);
    expect(names.filter((name) => text.includes(name))).toEqual([other.name]);
    expect(text).not.toContain(id);
  });
});
