import { jobs } from '@/db/schema/work';
import { draftMonth } from '@/server/modules/statements/draft-month';
import { eq } from 'drizzle-orm';
import { aProduct, type Product } from '../../support/app';
import { aMonthEnd, type MonthEnd } from '../../support/month-end';

let product: Product;
let scene: MonthEnd;
let partners: Awaited<ReturnType<MonthEnd['aPartner']>>[];

beforeAll(async () => {
  product = await aProduct('drafts-job');
  scene = await aMonthEnd(product);
  partners = [];
  for (const code of ['A', 'B', 'C', 'D']) {
    const partner = await scene.aPartner({ code, name: `Partner ${code}` });
    partners.push(partner);
    if (code !== 'C') await product.someTerms(partner.company, scene.tote.code);
    await scene.issue(partner, '2026-02-05', [{ typeCode: scene.tote.code, units: 20 }]);
  }
  product.setClock('2026-03-02T09:00:00.000Z');
});
afterAll(() => product.close());

const counts = async () => {
  const [rows] = await product.deps.pool.query(
    `SELECT (SELECT COUNT(*) FROM statements) AS statements, (SELECT COUNT(*) FROM statement_lines) AS \`lines\`,
      (SELECT COUNT(*) FROM statement_steps) AS steps`,
  );
  return (rows as Record<string, number>[])[0];
};

describe('making the drafts of a month', () => {
  it('names a partner and type without terms before the close', async () => {
    const { body } = await scene.finance.get('/months/2026-02');
    expect(body.openItems).toEqual([
      expect.objectContaining({
        kind: 'terms missing',
        partner: { id: partners[2]?.company.id, name: 'Partner C' },
        typeCode: scene.tote.code,
      }),
    ]);
  });

  it('begins again after a kill in the middle and leaves no draft twice', async () => {
    await scene.finance.post('/months/2026-02/close', { reason: 'Terms of C follow' });
    const [job] = await product.deps.db.select().from(jobs).where(eq(jobs.kind, 'draft statements'));
    if (!job) throw new Error('no job was queued');
    const killed = draftMonth(product.deps, job, async (done) => {
      if (done === 2) throw new Error('killed');
    });
    await expect(killed).rejects.toThrow('killed');
    expect(await counts()).toMatchObject({ statements: 2, steps: 2 });
    await product.runJobs();
    expect(await counts()).toEqual({ statements: 3, lines: 6, steps: 3 });
  });

  it('leaves out the partner that cannot be assessed and says why', async () => {
    const { body } = await scene.finance.get('/months/2026-02');
    expect(body.jobs[0]).toMatchObject({
      state: 'done',
      refused: [{ partner: { name: 'Partner C' }, why: expect.stringContaining('no terms') }],
    });
    expect(body.statements.drafts).toBe(3);
  });

  it('makes them again once the terms are there, over the drafts that stand', async () => {
    const c = partners[2]?.company ?? { id: '' };
    await product.someTerms(c, scene.tote.code, { deposit: '5.00' });
    expect((await scene.finance.post('/months/2026-02/drafts')).status).toBe(200);
    await product.runJobs();
    expect(await counts()).toEqual({ statements: 4, lines: 8, steps: 4 });
    expect((await scene.finance.get('/months/2026-02')).body.jobs[0].refused).toEqual([]);
  });

  it('makes one draft for each partner when two workers draft at once', async () => {
    const [job] = await product.deps.db.select().from(jobs).where(eq(jobs.kind, 'draft statements'));
    if (!job) throw new Error('no job was queued');
    await product.deps.pool.query('DELETE FROM statement_lines');
    const quiet = async () => undefined;
    await Promise.all([draftMonth(product.deps, job, quiet), draftMonth(product.deps, job, quiet)]);
    expect(await counts()).toEqual({ statements: 4, lines: 8, steps: 4 });
  });

  it('closes months in their order', async () => {
    product.setClock('2026-05-02T09:00:00.000Z');
    scene.finance = await product.as(scene.mikkel);
    const early = await scene.finance.post('/months/2026-04/close', { reason: '' });
    expect(early.body).toMatchObject({ code: 'earlier month open', data: { month: '2026-03' } });
  });

  it('refuses an ordinary posting into the closed month', async () => {
    const [first] = partners;
    if (!first) throw new Error('no partner');
    const late = scene.issue(first, '2026-02-20', [{ typeCode: scene.tote.code, units: 1 }]);
    await expect(late).rejects.toMatchObject({ code: 'month closed' });
  });

  it('lets neither coordinator nor partner close', async () => {
    product.setClock('2026-03-20T09:00:00.000Z');
    expect((await scene.coordinator.post('/months/2026-03/close', { reason: '' })).status).toBe(403);
    expect((await partners[0]?.caller.get('/months'))?.status).toBe(403);
  });
});
