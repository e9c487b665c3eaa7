import { watchSilence } from '@/server/modules/statements/silence';
import { v7 as newId } from 'uuid';
import { disputes } from '@/db/schema/differences';
import { aProduct, type Product } from '../../support/app';
import { aMonthEnd, type MonthEnd } from '../../support/month-end';

let product: Product;
let scene: MonthEnd;
let quiet: Awaited<ReturnType<MonthEnd['aPartner']>>;
let cross: Awaited<ReturnType<MonthEnd['aPartner']>>;

beforeAll(async () => {
  product = await aProduct('silence');
  scene = await aMonthEnd(product);
  quiet = await scene.aPartner({ name: 'Brightwash', code: 'BRIGHT' });
  cross = await scene.aPartner({ name: 'Orrin Sheet Metal', code: 'ORRIN' });
  for (const partner of [quiet, cross]) {
    await product.someTerms(partner.company, scene.tote.code);
    await scene.issue(partner, '2026-02-03', [{ typeCode: scene.tote.code, units: 10 }]);
  }
  product.setClock('2026-03-01T09:00:00.000Z');
  await scene.finance.post('/months/2026-02/close', { reason: '' });
  await product.runJobs();
  await scene.finance.post('/months/2026-02/issue');
  await product.runJobs();
});
afterAll(() => product.close());

type Partner = typeof quiet;
const statementOf = async (partner: Partner) => {
  const { body } = await partner.caller.get('/statements');
  return (await partner.caller.get(`/statements/${body.rows[0].id}`)).body;
};
const subjects = async (partner: Partner) => {
  const [rows] = await product.deps.pool.query(
    'SELECT subject FROM outbox WHERE to_address = ? ORDER BY id',
    [partner.manager.email],
  );
  return (rows as { subject: string }[]).map((row) => row.subject);
};

describe('a statement without an answer', () => {
  it('is held by a dispute: due now is less, and the partner cannot confirm', async () => {
    const { id, content, total } = await statementOf(cross);
    const line = content.lines[0];
    await product.deps.db.insert(disputes).values({
      id: newId(),
      companyId: cross.company.id,
      subject: 'statement line',
      statementId: id,
      statementLineId: line.id,
      typeCode: line.typeCode,
      stated: 10,
      claimed: 8,
      reason: 'counted wrongly',
      state: 'open',
      amountHeld: '9.00',
      openedBy: cross.manager.id,
      openedAt: '2026-03-02T09:00:00.000Z',
      lastWordAt: '2026-03-02T09:00:00.000Z',
    });
    const after = await statementOf(cross);
    expect(after).toMatchObject({ held: '9.00', mayConfirm: false });
    expect(Number(after.dueNow)).toBeCloseTo(Number(total) - 9, 6);
    const refused = await cross.caller.post(`/statements/${id}/confirmations`);
    expect([refused.status, refused.body.code]).toEqual([409, 'dispute open']);
  });

  it('is called to mind three days before the objection days end, once', async () => {
    product.setClock('2026-03-11T09:00:00.000Z');
    await watchSilence(product.deps);
    expect(await subjects(quiet)).toHaveLength(1);
    product.setClock('2026-03-12T09:00:00.000Z');
    await watchSilence(product.deps);
    await watchSilence(product.deps);
    expect(await subjects(quiet)).toEqual([
      'Statement for February 2026',
      'Statement for February 2026 waits for your answer',
    ]);
  });

  it('still waits on the last day and counts as confirmed the day after', async () => {
    product.setClock('2026-03-15T20:00:00.000Z');
    await watchSilence(product.deps);
    expect((await statementOf(quiet)).answer).toBe('awaited');
    // Half past midnight in Copenhagen.
    product.setClock('2026-03-15T23:30:00.000Z');
    await watchSilence(product.deps);
    const { answer, history } = await statementOf(quiet);
    expect(answer).toBe('confirmed by silence');
    expect(history.at(-1)).toMatchObject({ step: 'confirmed by silence', by: null });
  });

  it('does not count as confirmed while a dispute is undecided', async () => {
    expect((await statementOf(cross)).answer).not.toBe('confirmed by silence');
  });
});
