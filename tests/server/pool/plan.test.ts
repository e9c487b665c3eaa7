import { sizePool } from '@/shared/domain/pool-size';
import { aProduct, type Product } from '../../support/app';
import { aPoolScene, plan, type PoolScene, sizingInput } from './scene';

let product: Product;
let scene: PoolScene;
beforeAll(async () => {
  product = await aProduct('pool-plan');
  scene = await aPoolScene(product);
});
afterAll(() => product.close());

describe('the plan of a type', () => {
  it('is asked for before anything is reckoned', async () => {
    const { engineer, type, lid } = scene;
    expect((await engineer.get(`/pool/${type.code}`)).body).toMatchObject({
      reckoned: null,
      whyNot: 'no loop',
    });
    expect((await engineer.get(`/pool/${lid.code}`)).body).toMatchObject({
      reckoned: null,
      whyNot: 'no parts',
    });
    const preview = await engineer.post(`/pool/${lid.code}/preview`, plan());
    expect([preview.status, preview.body.code]).toEqual([409, 'cannot be reckoned']);
  });

  it('previews exactly what sizePool gives for the same figures, and stores nothing', async () => {
    const { engineer, type } = scene;
    const { status, body } = await engineer.post(`/pool/${type.code}/preview`, plan());
    expect(status).toBe(200);
    expect(body.result).toEqual(JSON.parse(JSON.stringify(sizePool(sizingInput))));
    expect(body.input).toEqual(sizingInput);
    expect((await engineer.get(`/pool/${type.code}`)).body.plan).toBeNull();
  });

  it('gives a curve that rises in cover, falls in fall-back share, and holds the needed size', async () => {
    const { engineer, type } = scene;
    const { curve, result, atNeeded, atToday } = (await engineer.post(`/pool/${type.code}/preview`, plan()))
      .body;
    expect(curve.length).toBeGreaterThan(30);
    for (let at = 1; at < curve.length; at += 1) {
      expect(curve[at].poolSize).toBeGreaterThanOrEqual(curve[at - 1].poolSize);
      expect(curve[at].cover).toBeGreaterThanOrEqual(curve[at - 1].cover);
      expect(curve[at].fallbackShare).toBeLessThanOrEqual(curve[at - 1].fallbackShare);
    }
    expect(curve[0].poolSize).toBeLessThan(result.poolSize);
    expect(curve.at(-1).poolSize).toBeGreaterThan(result.poolSize);
    expect(atNeeded).toMatchObject({ poolSize: result.poolSize, containers: result.needed });
    expect(atNeeded.cover).toBeGreaterThanOrEqual(0.98);
    expect(atNeeded.fallbackShare).toBeCloseTo(result.fallbackShareAtNeeded, 12);
    expect(atToday).toBeNull();
  });

  it('is stored, read back as stated, and changed in place', async () => {
    const { engineer, type } = scene;
    expect((await engineer.put(`/pool/${type.code}/plan`, plan())).status).toBe(200);
    const first = (await engineer.get(`/pool/${type.code}`)).body;
    expect(first.plan).toEqual(plan());
    expect(first.planChanged.by).toBe('Sif Holm');
    expect(first.reckoned.result.poolSize).toBe(sizePool(sizingInput).poolSize);
    await engineer.put(
      `/pool/${type.code}/plan`,
      plan({ bufferDays: '3', travel: 'together', coverPct: '99.5' }),
    );
    const second = (await engineer.get(`/pool/${type.code}`)).body;
    expect(second.plan).toEqual(plan({ bufferDays: '3', travel: 'together', coverPct: '99.5' }));
    await engineer.put(`/pool/${type.code}/plan`, plan());
  });

  it('is refused with every bad field named', async () => {
    const { engineer, type } = scene;
    const bad = plan({ coverPct: '100', bufferDays: '-1', travel: 'by air', workingDaysPerYear: 400 });
    bad.legs[1] = { name: 'on the way', stretch: 'to the plant', days: { mean: '0', sd: '0.5' } };
    const { status, body } = await engineer.put(`/pool/${type.code}/plan`, bad);
    expect(status).toBe(400);
    expect(body.fields.map((field: { path: string }) => field.path).sort()).toEqual([
      'bufferDays',
      'coverPct',
      'legs.1.days.sd',
      'travel',
      'workingDaysPerYear',
    ]);
  });

  it('is refused where held and repair leave nothing, naming the field', async () => {
    const { engineer, type } = scene;
    const none = plan({ heldPct: '60', repairPct: '40' });
    for (const answer of [
      await engineer.post(`/pool/${type.code}/preview`, none),
      await engineer.put(`/pool/${type.code}/plan`, none),
    ]) {
      expect([answer.status, answer.body.fields[0].path]).toEqual([400, 'heldPct']);
    }
    const still = plan({ legs: [{ name: 'none', stretch: 'back', days: { mean: '0', sd: '0' } }] });
    const noLoop = await engineer.post(`/pool/${type.code}/preview`, still);
    expect([noLoop.status, noLoop.body.fields[0].path]).toEqual([400, 'legs']);
  });

  it('is the engineer’s to change, the coordinator’s to read, and no partner’s to see', async () => {
    const { clerk, coordinator, type } = scene;
    expect((await coordinator.get(`/pool/${type.code}`)).status).toBe(200);
    expect((await coordinator.put(`/pool/${type.code}/plan`, plan())).status).toBe(403);
    for (const answer of [
      await clerk.get('/pool'),
      await clerk.get(`/pool/${type.code}`),
      await clerk.post(`/pool/${type.code}/preview`, plan()),
      await clerk.get(`/pool/${type.code}/approvals`),
    ]) {
      expect([answer.status, answer.body.code]).toEqual([403, 'not allowed']);
    }
    expect((await scene.engineer.get('/pool/NOWHERE')).status).toBe(404);
    expect((await scene.engineer.put('/pool/NOWHERE/plan', plan())).status).toBe(404);
  });
});
