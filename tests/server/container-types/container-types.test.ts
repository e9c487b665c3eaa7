import { aLane, counted, empties, type Lane } from '../../support/lane';
import { aProduct, type Product } from '../../support/app';
import type { Caller } from '../../support/caller';

let product: Product;
let lane: Lane;
let engineer: Caller;

beforeAll(async () => {
  product = await aProduct('container-types');
  lane = await aLane(product);
  engineer = await product.as(await product.aPerson(lane.operator, ['engineer']));
});
afterAll(() => product.close());

const form = (given: Record<string, unknown> = {}) => ({
  code: 'PALLET-128',
  name: 'Plastic pallet 1200×800',
  kind: 'pallet',
  lengthMm: 1200,
  widthMm: 800,
  heightMm: 150,
  tareKg: '15.5',
  payloadKg: '1000',
  stackLimit: 20,
  unitsPerStack: 20,
  graiAssetType: '',
  inServiceFrom: '2024-06-01',
  replacement: '62.00',
  usefulLifeMonths: 84,
  note: 'Three runners.',
  packedWith: [],
  ...given,
});

const { code: _code, ...withoutCode } = form();
const change = (given: Record<string, unknown> = {}) => ({ ...withoutCode, active: true, ...given });

describe('a container type', () => {
  it('is added by the engineer, packed with others, and read back as stated', async () => {
    const added = await engineer.post(
      '/container-types',
      form({
        packedWith: [
          { typeCode: lane.type.code, quantity: 20 },
          { typeCode: lane.lid.code, quantity: 1 },
        ],
      }),
    );
    expect([added.status, added.body]).toEqual([200, { id: 'PALLET-128' }]);
    const { body } = await engineer.get('/container-types/PALLET-128');
    expect(body).toMatchObject({
      tareKg: '15.5',
      payloadKg: '1000',
      inServiceFixed: false,
      graiAssetType: null,
    });
    expect(
      body.packedWith.map((each: { code: string; quantity: number }) => [each.code, each.quantity]),
    ).toEqual([
      [lane.lid.code, 1],
      [lane.type.code, 20],
    ]);
    const tote = await engineer.get(`/container-types/${lane.type.code}`);
    expect(tote.body.partOf).toEqual([{ code: 'PALLET-128', name: 'Plastic pallet 1200×800', quantity: 20 }]);
  });

  it('shows the loads of its stack and how many stand on a pallet, by arithmetic', async () => {
    await engineer.post('/container-types', form({ code: 'PALLET-1210', lengthMm: 1200, widthMm: 1000 }));
    const { body } = await engineer.get(`/container-types/${lane.type.code}`);
    // 2.1 + 25 kg, eight high; 5 of 600×400 on 1200×1000 need both directions.
    expect(body.loads).toEqual({ grossKg: '27.1', stackKg: '216.8', onLowestKg: '189.7' });
    const layers = body.onPallets.map((each: { code: string; perLayer: number }) => [
      each.code,
      each.perLayer,
    ]);
    expect(layers).toContainEqual(['PALLET-1210', 5]);
  });

  it('is refused with every bad field named', async () => {
    const { status, body } = await engineer.post(
      '/container-types',
      form({ code: 'pallet 9', tareKg: '-1', stackLimit: 0, lengthMm: 12.5, graiAssetType: '9501101530008' }),
    );
    expect([status, body.code]).toEqual([400, 'not valid']);
    expect(body.fields.map((field: { path: string }) => field.path).sort()).toEqual([
      'code',
      'graiAssetType',
      'lengthMm',
      'stackLimit',
      'tareKg',
    ]);
  });

  it('takes a GRAI asset type with its right check digit', async () => {
    const added = await engineer.post(
      '/container-types',
      form({ code: 'GRAI-1', graiAssetType: '9501101530003' }),
    );
    expect(added.status).toBe(200);
    expect((await engineer.get('/container-types/GRAI-1')).body.graiAssetType).toBe('9501101530003');
  });

  it('is refused under a code that is taken, packed with itself or with what is not there', async () => {
    const taken = await engineer.post('/container-types', form({ code: lane.type.code }));
    expect([taken.status, taken.body.fields[0].path]).toEqual([409, 'code']);
    const packed = await engineer.post(
      '/container-types',
      form({
        code: 'P-3',
        packedWith: [
          { typeCode: 'P-3', quantity: 1 },
          { typeCode: 'NOWHERE', quantity: 1 },
        ],
      }),
    );
    expect(packed.body.fields.map((field: { path: string }) => field.path)).toEqual([
      'packedWith.0.typeCode',
      'packedWith.1.typeCode',
    ]);
  });

  it('is refused a value finer than the currency', async () => {
    const { body } = await engineer.post('/container-types', form({ code: 'P-4', replacement: '62.005' }));
    expect(body.fields[0].path).toBe('replacement');
  });

  it('keeps its first day in service once a partner has had it in hand; all else can change', async () => {
    const stated = change({
      name: 'Tote, first name',
      kind: 'tote',
      lengthMm: 600,
      widthMm: 400,
      heightMm: 280,
      inServiceFrom: '2024-07-01',
    });
    expect((await engineer.put(`/container-types/${lane.type.code}`, stated)).status).toBe(200);
    const sent = await lane.coordinator.post('/shipments', empties(lane, { [lane.type.code]: 40 }));
    await lane.clerk.post(`/shipments/${sent.body.id}/counts`, counted({ [lane.type.code]: 40 }));
    const moved = { ...stated, inServiceFrom: '2023-01-01' };
    const refused = await engineer.put(`/container-types/${lane.type.code}`, moved);
    expect([refused.status, refused.body.fields[0].path]).toEqual([400, 'inServiceFrom']);
    const renamed = await engineer.put(`/container-types/${lane.type.code}`, {
      ...stated,
      name: 'Tote, second name',
    });
    expect(renamed.status).toBe(200);
    const { body } = await engineer.get(`/container-types/${lane.type.code}`);
    expect(body).toMatchObject({
      name: 'Tote, second name',
      inServiceFrom: '2024-07-01',
      inServiceFixed: true,
    });
  });

  it('is seen by a partner’s clerk, and changed by the engineer alone', async () => {
    expect((await lane.clerk.get('/container-types')).status).toBe(200);
    expect((await lane.clerk.post('/container-types', form({ code: 'X-1' }))).status).toBe(403);
    expect((await lane.coordinator.put(`/container-types/${lane.type.code}`, change())).status).toBe(403);
    expect((await engineer.put('/container-types/NOWHERE', change())).status).toBe(404);
  });

  it('is listed by name, by kind, by use, and page by page without a gap', async () => {
    await engineer.post('/container-types', form({ code: 'OLD-1', kind: 'box' }));
    await engineer.put('/container-types/OLD-1', change({ kind: 'box', active: false }));
    const old = await engineer.get('/container-types', { use: 'out of use' });
    expect(old.body.rows.map((row: { code: string }) => row.code)).toEqual(['OLD-1']);
    const small = await engineer.get('/container-types', { search: 'old-', use: 'out of use' });
    expect(small.body.rows).toEqual(old.body.rows);
    const lids = await engineer.get('/container-types', { kind: 'lid' });
    expect(lids.body.rows.map((row: { code: string }) => row.code)).toEqual([lane.lid.code]);
    const all = (await engineer.get('/container-types')).body.rows.map((row: { code: string }) => row.code);
    expect(await pagedCodes()).toEqual(all);
    const down = await pagedCodes({ sort: '-code' });
    expect(down).toEqual([...all].sort().reverse());
    const strange = await engineer.get('/container-types', { sort: 'colour' });
    expect([strange.status, strange.body.fields[0].path]).toEqual([400, 'sort']);
    expect(all.length).toBeGreaterThan(4);
  });
});

/** The list to its end, two at a time. */
async function pagedCodes(query: Record<string, string> = {}): Promise<string[]> {
  const codes: string[] = [];
  let after: string | null = '';
  while (after !== null) {
    const key: Record<string, string> = after === '' ? {} : { after };
    const { body } = await engineer.get('/container-types', { ...query, limit: '2', ...key });
    codes.push(...body.rows.map((row: { code: string }) => row.code));
    after = body.next as string | null;
  }
  return codes;
}
