import { aProduct, type Product } from '../../support/app';
import { aMonthEnd, type MonthEnd } from '../../support/month-end';

let product: Product;
let scene: MonthEnd;
let kestrel: Awaited<ReturnType<MonthEnd['aPartner']>>;
let other: Awaited<ReturnType<MonthEnd['aPartner']>>;

beforeAll(async () => {
  product = await aProduct('month-end');
  scene = await aMonthEnd(product);
  kestrel = await scene.aPartner({ name: 'Kestrel Coil Works', code: 'KESTREL' });
  other = await scene.aPartner({ name: 'Maren Electronics', code: 'MAREN' });
  for (const { code } of [scene.tote, scene.lid]) await product.someTerms(kestrel.company, code);
  await product.someTerms(other.company, scene.tote.code);
  await scene.issue(kestrel, '2026-02-03', [
    { typeCode: scene.tote.code, units: 400 },
    { typeCode: scene.lid.code, units: 50 },
  ]);
  await scene.giveBack(kestrel, '2026-02-20', [{ typeCode: scene.tote.code, units: 150, damaged: 4 }]);
  await scene.issue(other, '2026-02-10', [{ typeCode: scene.tote.code, units: 30 }]);
  product.setClock('2026-03-02T09:00:00.000Z');
});
afterAll(() => product.close());

const mailTo = async (email: string): Promise<{ subject: string; text: string }[]> => {
  const [rows] = await product.deps.pool.query(
    'SELECT subject, text FROM outbox WHERE to_address = ? ORDER BY id',
    [email],
  );
  return rows as { subject: string; text: string }[];
};
const idOf = async (month: string): Promise<string> => {
  const { body } = await scene.finance.get('/statements', { month, partner: kestrel.company.id });
  return body.rows[0].id as string;
};

describe('the end of a month, from the close to the answer', () => {
  it('refuses to close before the last day is over, counted in the zone of the operator', async () => {
    // 23:30 in Copenhagen on 28 February.
    product.setClock('2026-02-28T22:30:00.000Z');
    const early = await scene.finance.post('/months/2026-02/close', { reason: '' });
    expect(early.body.code).toBe('month not over');
    product.setClock('2026-03-02T09:00:00.000Z');
  });

  it('closes, and makes one draft for each partner with movements', async () => {
    const closed = await scene.finance.post('/months/2026-02/close', { reason: '' });
    expect(closed.status).toBe(200);
    await product.runJobs();
    const { body } = await scene.finance.get('/months/2026-02');
    expect(body).toMatchObject({
      state: 'closed',
      closedBy: 'Mikkel Thorn',
      statements: { drafts: 2, issued: 0 },
      jobs: [{ kind: 'drafts', state: 'done', done: 2, total: 2, refused: [] }],
      mayIssue: true,
    });
  });

  it('refuses the second close and says who was first', async () => {
    const again = await scene.finance.post('/months/2026-02/close', { reason: '' });
    expect(again.status).toBe(409);
    expect(again.body).toMatchObject({ code: 'already closed', data: { by: 'Mikkel Thorn' } });
  });

  it('shows each line with what it was reckoned from; payable is what the lines add up to', async () => {
    const { body } = await scene.finance.get(`/statements/${await idOf('2026-02')}`);
    const of = (component: string, typeCode = scene.tote.code) =>
      body.content.lines.find(
        (line: { component: string; typeCode: string }) =>
          line.component === component && line.typeCode === typeCode,
      );
    expect(of('deposits asked')).toMatchObject({
      amount: '1800.00',
      parts: [{ quantity: 400, each: '4.5' }],
    });
    expect(of('deposits released')).toMatchObject({ amount: '-675.00' });
    // 14 free days from 3 February: 400 totes on 17, 18, 19 February and 250 on the nine days to the 28th.
    expect(of('daily fee')).toMatchObject({ quantity: 3450, rate: '0.03', amount: '103.50' });
    expect(of('damage')).toMatchObject({ amount: '12.80' });
    expect(of('deposits asked', scene.lid.code)).toMatchObject({ amount: '225.00' });
    expect(body.payable).toBe(body.content.assessment.totals.payable);
    // Tax of 25 % on the fees: totes 103.50 + 12.80, lids 50 × 12 × 0.03 = 18.00.
    expect(body.tax).toBe('33.58');
    expect(body.dueNow).toBe(body.total);
  });

  it('hides a draft from the partner', async () => {
    const id = await idOf('2026-02');
    expect((await kestrel.caller.get(`/statements/${id}`)).status).toBe(404);
    expect((await kestrel.caller.get('/statements')).body.rows).toEqual([]);
  });

  it('issues: frozen, its file kept, a letter with the link to the manager', async () => {
    const id = await idOf('2026-02');
    expect((await scene.finance.post(`/statements/${id}/issue`)).status).toBe(200);
    const again = await scene.finance.post(`/statements/${id}/issue`);
    expect([again.status, again.body.code]).toEqual([409, 'already issued']);
    const [letter, ...more] = await mailTo(kestrel.manager.email);
    expect(more).toEqual([]);
    expect(letter?.subject).toBe('Statement for February 2026');
    expect(letter?.text).toContain(`/statements/${id}`);
    const { body } = await kestrel.caller.get(`/statements/${id}`);
    expect(body).toMatchObject({ state: 'issued', answer: 'awaited', objectionUntil: '2026-03-16' });
  });

  it('issues the rest of the month in one go, once', async () => {
    expect((await scene.finance.post('/months/2026-02/issue')).status).toBe(200);
    await product.runJobs();
    expect((await scene.finance.get('/months/2026-02')).body.statements).toMatchObject({
      drafts: 0,
      issued: 2,
    });
    const again = await scene.finance.post('/months/2026-02/issue');
    expect([again.status, again.body.code]).toEqual([409, 'already issued']);
    expect(await mailTo(kestrel.manager.email)).toHaveLength(1);
    expect(await mailTo(other.manager.email)).toHaveLength(1);
  });

  it('cannot be changed any more, by the server’s own database user', async () => {
    const id = await idOf('2026-02');
    const attempts = [
      `UPDATE statements SET payable = 1 WHERE id = '${id}'`,
      `UPDATE statements SET content = '{}' WHERE id = '${id}'`,
      `UPDATE statements SET state = 'draft' WHERE id = '${id}'`,
      `DELETE FROM statements WHERE id = '${id}'`,
      `UPDATE statement_lines SET amount = 1 WHERE statement_id = '${id}'`,
      `DELETE FROM statement_lines WHERE statement_id = '${id}'`,
      `DELETE FROM statement_steps WHERE statement_id = '${id}'`,
    ];
    for (const sql of attempts) await expect(product.deps.pool.query(sql)).rejects.toThrow();
  });

  it('is not there for another company, by whatever way', async () => {
    const id = await idOf('2026-02');
    const paths = [`/statements/${id}`, `/statements/${id}/movements`, `/statements/${id}/spreadsheet`];
    for (const path of paths) expect((await other.caller.get(path)).status).toBe(404);
    for (const what of ['openings', 'confirmations']) {
      expect((await other.caller.post(`/statements/${id}/${what}`)).status).toBe(404);
    }
    const { body } = await other.caller.get('/statements', { partner: kestrel.company.id });
    expect(body.rows).toEqual([]);
  });

  it('is opened and confirmed by the partner, each once in the history', async () => {
    const id = await idOf('2026-02');
    expect((await kestrel.caller.get(`/statements/${id}`)).body.firstOpening).toBe(true);
    for (let time = 0; time < 2; time += 1) await kestrel.caller.post(`/statements/${id}/openings`);
    expect((await kestrel.caller.post(`/statements/${id}/confirmations`)).status).toBe(200);
    const again = await kestrel.caller.post(`/statements/${id}/confirmations`);
    expect(again.body).toMatchObject({ code: 'already answered', data: { by: kestrel.manager.name } });
    const { body } = await scene.finance.get(`/statements/${id}`);
    expect(body.answer).toBe('confirmed');
    expect(body.history.map((step: { step: string }) => step.step)).toEqual([
      'drafted',
      'issued',
      'mailed',
      'opened',
      'confirmed',
    ]);
  });

  it('opens each number down to its movements', async () => {
    const id = await idOf('2026-02');
    const { body } = await kestrel.caller.get(`/statements/${id}`);
    const line = body.content.lines.find(
      (each: { component: string }) => each.component === 'deposits released',
    );
    const movements = await kestrel.caller.get(`/statements/${id}/movements`, { line: line.id });
    expect(movements.body.rows).toMatchObject([
      { kind: 'returned', quantity: 150, date: '2026-02-20', reference: expect.stringMatching(/^EM-/) },
    ]);
    const first = await kestrel.caller.get(`/statements/${id}/movements`, { limit: '2' });
    expect(first.body.rows).toHaveLength(2);
    const rest = await kestrel.caller.get(`/statements/${id}/movements`, {
      limit: '2',
      after: first.body.next,
    });
    // Two issues, a return, a damage.
    expect(rest.body.rows).toHaveLength(2);
    expect(rest.body.next).toBeNull();
  });
});
