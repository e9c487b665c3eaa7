import { aProduct, type Product } from '../../support/app';
import type { Caller } from '../../support/caller';
import { aLane, counted, empties, fulls, type Lane, sentEmpties } from '../../support/lane';

let product: Product;
let lane: Lane;
beforeAll(async () => {
  product = await aProduct('balances');
});
beforeEach(async () => {
  lane = await aLane(product);
});
afterAll(() => product.close());

const figures = async (caller: Caller, company: { id: string }, query: Record<string, string> = {}) => {
  const { body } = await caller.get(`/balances/${company.id}/${lane.type.code}`, query);
  const { atSites, sent, sentDiffers, toIt, toItDiffers, inQuestion, held } = body;
  return { atSites, sent, sentDiffers, toIt, toItDiffers, inQuestion, held };
};
const none = { atSites: 0, sent: 0, sentDiffers: 0, toIt: 0, toItDiffers: 0, inQuestion: 0, held: 0 };
const load = (units: number) => ({ [lane.type.code]: units });

describe('balances', () => {
  it('follow a shipment from the plant over the road to the partner', async () => {
    const id = await sentEmpties(lane, load(400));
    expect(await figures(lane.coordinator, lane.operator)).toEqual({ ...none, atSites: -400, sent: 400 });
    expect(await figures(lane.clerk, lane.partner)).toEqual({ ...none, toIt: 400 });
    await lane.clerk.post(`/shipments/${id}/counts`, counted(load(392)));
    expect(await figures(lane.clerk, lane.partner)).toEqual({
      ...none,
      atSites: 392,
      held: 392,
      toItDiffers: 8,
      inQuestion: 8,
    });
    expect(await figures(lane.coordinator, lane.operator)).toEqual({
      ...none,
      atSites: -400,
      sentDiffers: 8,
      inQuestion: 8,
      held: -392,
    });
  });

  it('leave with the sender what it sent until that is counted, and what differs until that is settled', async () => {
    const first = await sentEmpties(lane, load(100));
    await lane.clerk.post(`/shipments/${first}/counts`, counted(load(100)));
    const { body } = await lane.clerk.post('/shipments', fulls(lane, load(60)));
    expect(await figures(lane.clerk, lane.partner)).toEqual({ ...none, atSites: 40, sent: 60, held: 100 });
    await lane.coordinator.post(`/shipments/${body.id}/counts`, counted(load(57)));
    expect(await figures(lane.clerk, lane.partner)).toEqual({
      ...none,
      atSites: 40,
      sentDiffers: 3,
      inQuestion: 3,
      held: 43,
    });
  });

  it('of an earlier day are as that day ended', async () => {
    const leave = async (leftOn: string, units: number): Promise<string> => {
      const form = { ...empties(lane, load(units)), leftOn };
      return (await lane.coordinator.post('/shipments', form)).body.id as string;
    };
    const id = await leave('2026-03-10', 50);
    await lane.clerk.post(`/shipments/${id}/counts`, counted(load(44)));
    await leave('2026-03-20', 7);
    const asOf = (day: string) => figures(lane.coordinator, lane.partner, { asOf: day });
    expect(await asOf('2026-03-09')).toEqual(none);
    expect(await asOf('2026-03-10')).toEqual({ ...none, toIt: 50 });
    expect(await asOf('2026-03-19')).toEqual({ ...none, toIt: 50 });
    expect(await asOf('2026-03-20')).toEqual(await figures(lane.coordinator, lane.partner));
  });

  it('of an earlier day know what was long on the way then', async () => {
    const form = { ...empties(lane, load(9)), leftOn: '2026-02-10' };
    const { body } = await lane.coordinator.post('/shipments', form);
    await lane.clerk.post(`/shipments/${body.id}/counts`, counted(load(9)));
    const asOf = (day: string) => figures(lane.coordinator, lane.partner, { asOf: day });
    expect(await asOf('2026-02-09')).toEqual(none);
    expect(await asOf('2026-03-01')).toEqual({ ...none, toIt: 9 });
    expect(await asOf('2026-03-19')).toEqual({ ...none, toIt: 9 });
    expect(await asOf('2026-03-20')).toEqual({ ...none, atSites: 9, held: 9 });
  });

  it('change from the value date on, and on no day before it, when an entry is dated back', async () => {
    const days = ['2026-03-04', '2026-03-05', '2026-03-06', '2026-03-20'];
    const all = () => Promise.all(days.map((asOf) => figures(lane.coordinator, lane.operator, { asOf })));
    const before = await all();
    const entry = { kind: 'bought', siteId: lane.plant.id, typeCode: lane.type.code, units: 30 };
    await lane.coordinator.post('/adjustments', { ...entry, on: '2026-03-05', reason: 'Invoice came late' });
    const after = await all();
    expect(after.map((now, index) => now.atSites - (before[index]?.atSites ?? 0))).toEqual([0, 30, 30, 30]);
  });

  it('are told as they were known at an instant, whatever was recorded later', async () => {
    // Entries carry the instant of the database itself, not that of the tests' clock.
    const instant = async () => {
      const [rows] = await product.deps.pool.query('SELECT UTC_TIMESTAMP(3) AS at, SLEEP(0.05)');
      return `${(rows as { at: string }[])[0]?.at.replace(' ', 'T')}Z`;
    };
    const before = await instant();
    const id = await sentEmpties(lane, load(50));
    const sent = await instant();
    await lane.clerk.post(`/shipments/${id}/counts`, counted(load(44)));
    const after = await instant();
    const known = (knownAt: string) => figures(lane.coordinator, lane.partner, { knownAt });
    expect(await known(before)).toEqual(none);
    expect(await known(sent)).toEqual({ ...none, toIt: 50 });
    expect(await known(after)).toEqual(await figures(lane.coordinator, lane.partner));
    const dated = { knownAt: after, asOf: '2026-03-19' };
    expect(await figures(lane.coordinator, lane.partner, dated)).toEqual(none);
  });

  it('are listed company by company, and a partner’s own only', async () => {
    const id = await sentEmpties(lane, load(10));
    const other = await product.aCompany({ name: 'Pallwick Fasteners' });
    const stranger = await product.as(await product.aPerson(other, ['manager']));
    const { body } = await lane.coordinator.get('/balances', { type: lane.type.code });
    expect(body.rows.map((row: { companyId: string }) => row.companyId)).toEqual([
      lane.operator.id,
      lane.partner.id,
    ]);
    expect((await stranger.get('/balances')).body.rows).toEqual([]);
    expect((await stranger.get('/balances', { company: lane.partner.id })).body.rows).toEqual([]);
    const paths = [
      `/balances/${lane.partner.id}/${lane.type.code}`,
      `/balances/${lane.partner.id}/${lane.type.code}/movements`,
      `/shipments/${id}`,
    ];
    const answers = await Promise.all(paths.map((path) => stranger.get(path)));
    expect(answers.map((answer) => answer.status)).toEqual([404, 404, 404]);
  });

  it('are paged by company without losing or repeating one', async () => {
    await sentEmpties(lane, load(10));
    const all = (await lane.coordinator.get('/balances', { limit: '200' })).body.rows;
    const paged: unknown[] = [];
    let after: string | null = null;
    do {
      const page: { rows: unknown[]; next: string | null } = (
        await lane.coordinator.get('/balances', { limit: '1', ...(after ? { after } : {}) })
      ).body;
      paged.push(...page.rows);
      after = page.next;
    } while (after);
    expect(paged).toEqual(all);
    expect(all.length).toBeGreaterThan(1);
  });

  it('open into their movements, each with its shipment', async () => {
    const id = await sentEmpties(lane, load(10));
    const path = `/balances/${lane.operator.id}/${lane.type.code}/movements`;
    const { body } = await lane.coordinator.get(path, { part: 'sent' });
    expect(body.rows).toEqual([
      expect.objectContaining({
        kind: 'sent',
        units: 10,
        from: { kind: 'site', name: 'Tarnby Assembly' },
        shipment: expect.objectContaining({ id }),
        by: 'Ane Ravn',
      }),
    ]);
  });
});
