import { aDisputeScene, type DisputeScene } from './dispute-scene';

let product: DisputeScene;
/** Each case has a Kestrel and a type of its own. */
let scene: DisputeScene;
beforeAll(async () => {
  product = await aDisputeScene('line-refusals');
});
beforeEach(async () => {
  scene = { ...product, ...(await product.afresh()) };
});
afterAll(() => product.product.close());

const issued = (given: Parameters<DisputeScene['anIssuedStatement']>[0]) =>
  scene.anIssuedStatement({ company: scene.kestrel, ...given });

const claim = (lineId: string, more: Record<string, unknown> = {}) => ({
  subject: 'statement line',
  lineId,
  claimed: 7,
  reason: 'arrived damaged',
  text: 'Three were broken when they came.',
  ...more,
});

describe('what cannot be disputed of a statement', () => {
  it.each([
    {
      name: 'after the days of objection',
      given: { objectionUntil: '2026-03-19' },
      code: 'objection over',
      blocked: 'objection over',
    },
    {
      name: 'once confirmed',
      given: { answer: 'confirmed' as const },
      code: 'already answered',
      blocked: 'confirmed',
    },
  ])('is refused $name, and the form says so before', async ({ given, code, blocked }) => {
    const { lineIds } = await issued({
      month: '2026-02',
      lines: [{ component: 'damage', typeCode: scene.tote, quantity: 10, amount: '20.00' }],
      ...given,
    });
    const subject = await scene.clerk.get(`/dispute-subjects/lines/${lineIds[0]}`);
    expect(subject.body.blocked).toBe(blocked);
    const answer = await scene.clerk.post('/disputes', claim(lineIds[0] ?? ''));
    expect(answer.status).toBe(409);
    expect(answer.body.code).toBe(code);
  });

  it('can still be on the last day of objection, once for each line, and only to fewer', async () => {
    const { lineIds } = await issued({
      month: '2026-02',
      objectionUntil: '2026-03-20',
      lines: [{ component: 'damage', typeCode: scene.tote, quantity: 10, amount: '20.00' }],
    });
    const lineId = lineIds[0] ?? '';
    expect((await scene.clerk.post('/disputes', claim(lineId, { claimed: 11 }))).body.fields[0].path).toBe(
      'claimed',
    );
    expect((await scene.clerk.post('/disputes', claim(lineId))).status).toBe(200);
    expect((await scene.clerk.post('/disputes', claim(lineId))).body.code).toBe('already exists');
    expect((await scene.clerk.get(`/dispute-subjects/lines/${lineId}`)).body.blocked).toBe('in dispute');
  });

  it('is not there for another partner, nor can a shipment of another be named', async () => {
    const { lineIds } = await issued({
      month: '2026-02',
      lines: [{ component: 'lost', typeCode: scene.tote, quantity: 10, amount: '20.00' }],
    });
    const lineId = lineIds[0] ?? '';
    expect((await scene.otherClerk.get(`/dispute-subjects/lines/${lineId}`)).status).toBe(404);
    expect((await scene.otherClerk.post('/disputes', claim(lineId))).status).toBe(404);
    const { orrinDock, tarnby, tote } = scene;
    const foreign = await scene.move({
      from: orrinDock,
      to: tarnby,
      declared: { [tote]: 5 },
      counted: { [tote]: 5 },
    });
    const named = await scene.clerk.post('/disputes', claim(lineId, { shipmentId: foreign.shipmentId }));
    expect(named.status).toBe(400);
    expect(named.body.fields[0].path).toBe('shipmentId');
  });
});
