import { v7 as newId } from 'uuid';
import { aProduct, type Product } from '../../support/app';
import { aPoolScene, partForm, type PoolScene } from './scene';

let product: Product;
let scene: PoolScene;
beforeAll(async () => {
  product = await aProduct('parts');
  scene = await aPoolScene(product);
});
afterAll(() => product.close());

describe('a packing specification', () => {
  it('is added, read back with its containers a day, changed, and found by its number', async () => {
    const { engineer, partId, dock, plant } = scene;
    const { body } = await engineer.get(`/parts/${partId}`);
    expect(body).toMatchObject({
      number: 'HX-2210',
      unitsPerDayMean: '1760',
      supplierSite: { id: dock.id, company: 'Kestrel Coil Works' },
      plantSite: { id: plant.id },
      active: true,
    });
    expect(body.containersPerDay).toBeCloseTo(1760 / 12, 12);
    const added = await engineer.post('/parts', partForm(scene, { number: 'HX-9', name: 'header pipe' }));
    const changed = partForm(scene, { number: 'HX-9', name: 'header pipe', unitsPerContainer: 24 });
    expect((await engineer.put(`/parts/${added.body.id}`, { ...changed, active: false })).status).toBe(200);
    const found = await engineer.get('/parts', { search: 'header', use: 'out of use' });
    expect(found.body.rows.map((row: { unitsPerContainer: number }) => row.unitsPerContainer)).toEqual([24]);
    const small = await engineer.get('/parts', { search: 'hx-22' });
    expect(small.body.rows.map((row: { number: string }) => row.number)).toEqual(['HX-2210']);
    const down = await engineer.get('/parts', { sort: '-number', limit: '1' });
    const next = await engineer.get('/parts', { sort: '-number', limit: '1', after: down.body.next });
    expect([...down.body.rows, ...next.body.rows].map((row: { number: string }) => row.number)).toEqual([
      'HX-9',
      'HX-2210',
    ]);
  });

  it('is refused with every bad field named', async () => {
    const { body } = await scene.engineer.post(
      '/parts',
      partForm(scene, { number: '', unitsPerContainer: 0, unitsPerDayMean: '-5', supplierSiteId: 'x' }),
    );
    expect(body.fields.map((field: { path: string }) => field.path).sort()).toEqual([
      'number',
      'supplierSiteId',
      'unitsPerContainer',
      'unitsPerDayMean',
    ]);
  });

  it('is refused from a plant to a supplier, in a type that is not there, and twice between two sites', async () => {
    const { engineer, dock, plant } = scene;
    const turned = await engineer.post(
      '/parts',
      partForm(scene, { typeCode: 'NOWHERE', supplierSiteId: plant.id, plantSiteId: dock.id }),
    );
    expect(turned.body.fields.map((field: { path: string }) => field.path)).toEqual([
      'typeCode',
      'supplierSiteId',
      'plantSiteId',
    ]);
    const twice = await engineer.post('/parts', partForm(scene));
    expect([twice.status, twice.body.fields[0].path]).toEqual([409, 'number']);
  });

  it('is kept by the engineer, read by the coordinator, and no partner’s to see', async () => {
    const { clerk, coordinator, partId } = scene;
    expect((await coordinator.get('/parts')).status).toBe(200);
    expect((await coordinator.post('/parts', partForm(scene))).status).toBe(403);
    expect((await clerk.get('/parts')).status).toBe(403);
    expect((await clerk.get(`/parts/${partId}`)).status).toBe(403);
    expect((await scene.engineer.get(`/parts/${newId()}`)).status).toBe(404);
  });

  it('can be given the types in use, partners’ sites as suppliers and the operator’s as plants', async () => {
    const { body } = await scene.engineer.get('/part-choices');
    expect(body.supplierSites.map((site: { id: string }) => site.id)).toEqual([scene.dock.id]);
    expect(body.plantSites.map((site: { id: string }) => site.id)).toEqual([scene.plant.id]);
    expect(body.types.map((type: { code: string }) => type.code).sort()).toEqual(
      [scene.type.code, scene.lid.code].sort(),
    );
  });
});
