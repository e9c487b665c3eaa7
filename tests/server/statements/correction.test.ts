import { inTransaction } from '@/db/transaction';
import { settleDifference } from '@/server/modules/differences/settle-difference';
import { aProduct, type Product } from '../../support/app';
import { aMonthEnd, type MonthEnd } from '../../support/month-end';

let product: Product;
let scene: MonthEnd;
let kestrel: Awaited<ReturnType<MonthEnd['aPartner']>>;
let reference: string;

beforeAll(async () => {
  product = await aProduct('correction');
  scene = await aMonthEnd(product);
  kestrel = await scene.aPartner({ name: 'Kestrel Coil Works', code: 'KESTREL' });
  await product.someTerms(kestrel.company, scene.tote.code);
  const sent = await scene.issue(kestrel, '2026-02-03', [
    { typeCode: scene.tote.code, units: 392, declared: 400 },
  ]);
  reference = sent.reference;
  product.setClock('2026-03-02T09:00:00.000Z');
});
afterAll(() => product.close());

type Line = {
  component: string;
  accountMonth: string;
  amount: string;
  correction: { causes: string[]; eventIds: string[] } | null;
};
const statementOf = async (month: string) => {
  const { body } = await scene.finance.get('/statements', { month, partner: kestrel.company.id });
  return (await scene.finance.get(`/statements/${body.rows[0].id}`)).body;
};
const close = async (month: string, reason = '') => {
  // Months go by, and with them the sign-in.
  scene.finance = await product.as(scene.mikkel);
  const closed = await scene.finance.post(`/months/${month}/close`, { reason });
  expect(closed.body).toMatchObject({ month });
  await product.runJobs();
};

describe('a correction that reaches back into a closed month', () => {
  it('finds the difference among what stands open, and asks for a reason to close anyway', async () => {
    const { body } = await scene.finance.get('/months/2026-02');
    expect(body.openItems).toMatchObject([
      { kind: 'differences', count: 1, money: { currency: 'EUR', amount: '144.00' } },
    ]);
    const refused = await scene.finance.post('/months/2026-02/close', { reason: '' });
    expect(refused.body).toMatchObject({ code: 'not valid', fields: [{ path: 'reason' }] });
    await close('2026-02', 'Recount in the first week of March');
    expect((await statementOf('2026-02')).stillOpen).toMatchObject([{ openUnits: -8, atStake: '144.00' }]);
    await scene.finance.post('/months/2026-02/issue');
    await product.runJobs();
  });

  it('shows in the next statement by component, with its cause, and the issued one stays', async () => {
    const before = await statementOf('2026-02');
    const [rows] = await product.deps.pool.query('SELECT id FROM differences');
    await inTransaction(product.deps.db, (tx) =>
      settleDifference(tx, {
        differenceId: (rows as { id: string }[])[0]?.id ?? '',
        way: 'receiver miscounted',
        units: 8,
        reason: 'All 400 found on dock 2',
        personId: null,
        today: '2026-03-05',
        now: '2026-03-05T08:00:00.000Z',
      }),
    );
    product.setClock('2026-04-01T09:00:00.000Z');
    await close('2026-03');
    const { content, payable } = await statementOf('2026-03');
    const corrections = content.lines.filter((line: Line) => line.accountMonth === '2026-02');
    // 8 totes: a deposit of 4.50 each; 12 days beyond the 14 free ones, 17 to 28 February, at 0.03.
    const cause = `count of ${reference} put right to 400`;
    expect(corrections).toMatchObject([
      { component: 'deposits asked', amount: '36.00', correction: { causes: [cause] } },
      {
        component: 'daily fee',
        amount: '2.88',
        correction: { causes: [cause], billed: '141.12', now: '144.00' },
      },
    ]);
    // March itself: 400 totes on 31 days at 0.03.
    expect(payable).toBe('410.88');
    // Only what is open now has gone: the statement itself stays to the letter.
    expect(await statementOf('2026-02')).toEqual({ ...before, stillOpen: [] });
  });

  it('names the movement behind the correction', async () => {
    const { id, content } = await statementOf('2026-03');
    const line = content.lines.find((each: Line & { id: string }) => each.component === 'deposits asked');
    const { body } = await scene.finance.get(`/statements/${id}/movements`, { line: line.id });
    expect(body.rows).toMatchObject([{ kind: 'corrected', quantity: 8, reference, lateFor: '2026-02' }]);
  });

  it('must not go out before the statement it builds on', async () => {
    product.setClock('2026-05-01T09:00:00.000Z');
    await close('2026-04');
    const { id } = await statementOf('2026-04');
    const early = await scene.finance.post(`/statements/${id}/issue`);
    expect(early.body).toMatchObject({ code: 'earlier statement waits', data: { month: '2026-03' } });
    await scene.finance.post('/months/2026-03/issue');
    await product.runJobs();
    expect((await scene.finance.post(`/statements/${id}/issue`)).status).toBe(200);
  });

  it('is billed once: the statement after holds nothing of February', async () => {
    const { content } = await statementOf('2026-04');
    expect(content.lines.map((line: Line) => line.accountMonth)).toEqual(['2026-04']);
  });

  it('opens its opening figure down to what came before the month, corrections included', async () => {
    const { id, content } = await statementOf('2026-03');
    const asked = { type: scene.tote.code, before: 'yes' };
    const { body } = await scene.finance.get(`/statements/${id}/movements`, asked);
    const quantities = body.rows.map((row: { quantity: number }) => row.quantity);
    expect(quantities).toEqual([392, 8]);
    expect(content.assessment.lines[0].units.opening).toBe(400);
  });

  it('opens all lines of a component, of the month or of the month that is corrected', async () => {
    const { id } = await statementOf('2026-03');
    const path = `/statements/${id}/movements`;
    const own = await scene.finance.get(path, { component: 'daily fee' });
    expect(own.body.rows).toEqual([]);
    const corrected = await scene.finance.get(path, { component: 'daily fee', corrects: '2026-02' });
    expect(corrected.body.rows).toMatchObject([{ kind: 'corrected', quantity: 8 }]);
  });
});
