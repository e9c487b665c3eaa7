import { aProduct, type Product } from '../../support/app';
import { aMonthEnd, type MonthEnd } from '../../support/month-end';

let product: Product;
let scene: MonthEnd;
let kestrel: Awaited<ReturnType<MonthEnd['aPartner']>>;
let other: Awaited<ReturnType<MonthEnd['aPartner']>>;

beforeAll(async () => {
  product = await aProduct('terms');
  scene = await aMonthEnd(product);
  kestrel = await scene.aPartner({ name: 'Kestrel Coil Works' });
  other = await scene.aPartner({ name: 'Maren Electronics' });
});
afterAll(() => product.close());

const version = (given: Record<string, unknown> = {}) => ({
  typeCode: scene.tote.code,
  validFrom: '2026-01-01',
  deposit: '4.50',
  replacement: '18.00',
  freeDays: 14,
  dailyFee: '0.0335',
  lostAfterDays: 90,
  usefulLifeMonths: 60,
  residualFloorPct: '20',
  damageFee: '3.20',
  cleaningFee: '0.40',
  recoveryDays: 60,
  ...given,
});
const settings = (given: Record<string, unknown> = {}) => ({
  currency: 'EUR',
  taxRate: '25',
  taxTreatment: 'excluded',
  objectionDays: 14,
  autoCountDays: 10,
  toleranceUnits: 2,
  tolerancePct: '0.5',
  ...given,
});
const set = (given: Record<string, unknown> = {}) =>
  scene.finance.post(`/terms/${kestrel.company.id}/versions`, version(given));
const put = (given: Record<string, unknown>) =>
  scene.finance.put(`/terms/${kestrel.company.id}`, settings(given));

describe('terms', () => {
  it('are set by partner, type and day, and shown to the partner as they apply to it', async () => {
    expect((await set()).status).toBe(200);
    expect((await set({ validFrom: '2026-06-01', deposit: '5' })).status).toBe(200);
    const { body } = await kestrel.caller.get(`/terms/${kestrel.company.id}`);
    expect(body.types[0].versions).toMatchObject([
      { validFrom: '2026-06-01', deposit: '5.00', standing: 'ahead' },
      { validFrom: '2026-01-01', deposit: '4.50', dailyFee: '0.0335', standing: 'in force' },
    ]);
    expect(body.maySet).toBe(false);
    expect((await kestrel.caller.get('/terms')).body.rows).toHaveLength(1);
  });

  it('are nobody else’s to see, and only finance sets them', async () => {
    expect((await other.caller.get(`/terms/${kestrel.company.id}`)).status).toBe(404);
    expect((await kestrel.caller.post(`/terms/${kestrel.company.id}/versions`, version())).status).toBe(403);
    expect((await scene.coordinator.put(`/terms/${kestrel.company.id}`, settings())).status).toBe(403);
  });

  it.each([
    ['a deposit finer than the cent', { deposit: '4.505' }, 'deposit'],
    ['a fee finer than six decimals', { dailyFee: '0.0000001' }, 'dailyFee'],
    ['a negative fee', { damageFee: '-1' }, 'damageFee'],
    ['a floor above 100 percent', { residualFloorPct: '100.5' }, 'residualFloorPct'],
    ['a fractional number of days', { freeDays: 1.5 }, 'freeDays'],
    ['an unknown type', { typeCode: 'NO-SUCH' }, 'typeCode'],
    ['a day that is none', { validFrom: '2026-02-30' }, 'validFrom'],
    ['a start that is taken', {}, 'validFrom'],
  ])('refuse %s at its field', async (_what, given, path) => {
    const refused = await set(given);
    expect(refused.status).toBe(400);
    expect(refused.body.fields.map((field: { path: string }) => field.path)).toEqual([path]);
  });

  it('name all bad fields at once', async () => {
    const refused = await set({ deposit: '4.505', replacement: '18.001', typeCode: 'NO-SUCH' });
    expect(refused.body.fields.map((field: { path: string }) => field.path).sort()).toEqual([
      'deposit',
      'replacement',
      'typeCode',
    ]);
  });

  it('for a partner as a whole change what they may, and the currency only before anything moved', async () => {
    expect((await put({ currency: 'SEK', objectionDays: 21 })).status).toBe(200);
    expect((await put({ currency: 'JPY' })).body.fields).toMatchObject([{ path: 'currency' }]);
    expect(
      (await put({ currency: 'EUR', objectionDays: 21, toleranceUnits: 0, tolerancePct: '0' })).status,
    ).toBe(200);
    await scene.issue(kestrel, '2026-02-03', [{ typeCode: scene.tote.code, units: 10 }]);
    const refused = await put({ currency: 'SEK', taxTreatment: 'included' });
    expect(refused.body.fields.map((field: { path: string }) => field.path)).toEqual([
      'currency',
      'taxTreatment',
    ]);
    const { body } = await scene.finance.get(`/terms/${kestrel.company.id}`);
    expect(body).toMatchObject({ currencyFixed: true, settings: { currency: 'EUR', objectionDays: 21 } });
  });

  it('never start in a closed month, save where there were none before', async () => {
    product.setClock('2026-03-02T09:00:00.000Z');
    await scene.finance.post('/months/2026-02/close', { reason: '' });
    await product.runJobs();
    expect((await set({ validFrom: '2026-02-28' })).body.fields).toMatchObject([{ path: 'validFrom' }]);
    expect((await set({ validFrom: '2026-03-01' })).status).toBe(200);
    expect((await set({ typeCode: scene.lid.code, validFrom: '2026-01-01' })).status).toBe(200);
  });

  it('leave what was drafted before as it is, and govern what comes in from their day on', async () => {
    await scene.issue(kestrel, '2026-03-01', [{ typeCode: scene.tote.code, units: 10 }]);
    const { body } = await scene.finance.get('/statements', { month: '2026-02' });
    const before = (await scene.finance.get(`/statements/${body.rows[0].id}`)).body;
    await scene.finance.post('/months/2026-02/drafts');
    await product.runJobs();
    const after = (await scene.finance.get(`/statements/${body.rows[0].id}`)).body;
    expect(after.content.assessment).toEqual(before.content.assessment);
    expect(after.payable).toBe(before.payable);
  });
});
