import { aDisputeScene, type DisputeScene } from './dispute-scene';

let scene: DisputeScene;
beforeAll(async () => {
  scene = await aDisputeScene('count-disputes');
});
afterAll(() => scene.product.close());

/** Kestrel sent fulls; the plant counted them. */
const counted = async (declared: number, units: number) => {
  const { tarnby, kestrelDock, tote } = scene;
  await scene.move({ from: tarnby, to: kestrelDock, declared: { [tote]: 500 }, counted: { [tote]: 500 } });
  return scene.move({
    from: kestrelDock,
    to: tarnby,
    on: '2026-03-10',
    declared: { [tote]: declared },
    counted: { [tote]: units },
  });
};

const claim = (shipmentId: string, claimed: number, more: Record<string, unknown> = {}) => ({
  subject: 'count',
  shipmentId,
  typeCode: scene.tote,
  claimed,
  reason: 'counted wrongly',
  text: 'The driver signed for all of them.',
  ...more,
});

const opened = async (declared = 200, units = 190, claimed = 200) => {
  const { shipmentId } = await counted(declared, units);
  const answer = await scene.clerk.post('/disputes', claim(shipmentId, claimed));
  expect(answer.status).toBe(200);
  return { shipmentId, id: String(answer.body.id) };
};

describe('a partner disputes a count', () => {
  it('with a paper; accepted in part, the event and the assessment are corrected and both read one thread', async () => {
    const { shipmentId } = await counted(200, 190);
    const before = await scene.assessed(scene.kestrel, '2026-03', scene.tote);
    const paper = await scene.aPaper(scene.clerk);
    const lettersBefore = (await scene.letters()).length;
    const answer = await scene.clerk.post('/disputes', claim(shipmentId, 200, { fileIds: [paper] }));
    expect(answer.body).toMatchObject({ state: 'open', amountHeld: '0' });
    const id = String(answer.body.id);
    const toOperator = (await scene.letters()).slice(lettersBefore);
    expect(toOperator.map((letter) => letter.toName)).toEqual(['Ane Ravn']);
    expect(toOperator[0]?.text).toContain(`/disputes/${id}`);

    const seen = await scene.read(scene.coordinator, id);
    expect(seen).toMatchObject({
      stated: 190,
      claimed: 200,
      waitingFor: 'operator',
      yourTurn: true,
      may: { answer: true, reply: false, withdraw: false },
    });
    const decided = await scene.answer(scene.coordinator, id, {
      step: 'accept in part',
      units: 6,
      text: 'Six stood behind the washing line.',
    });
    expect(decided.status).toBe(200);
    expect(decided.body).toMatchObject({ state: 'accepted in part', acceptedUnits: 6, acceptedAmount: null });

    expect((await scene.eventsOf(scene.kestrel)).at(-1)).toMatchObject({
      kind: 'corrected',
      date: '2026-03-10',
      quantity: 6,
    });
    const after = await scene.assessed(scene.kestrel, '2026-03', scene.tote);
    expect(after.units.returned - before.units.returned).toBe(6);
    expect(Number(after.payable) - Number(before.payable)).toBeLessThan(-6 * 4.5);
    expect(await scene.theDifference(shipmentId, scene.tote)).toMatchObject({ openUnits: -4, state: 'open' });
    expect((await scene.entriesOf(shipmentId)).at(-1)).toMatchObject({
      disputeId: id,
      reason: 'Six stood behind the washing line.',
    });

    const [partner, operator] = [await scene.read(scene.clerk, id), await scene.read(scene.coordinator, id)];
    expect(partner.messages).toEqual(operator.messages);
    expect(partner.messages.map(({ step, side, by }) => [step, side, by])).toEqual([
      ['opened', 'partner', 'Mila Torv'],
      ['accepted in part', 'operator', 'Ane Ravn'],
    ]);
    for (const caller of [scene.clerk, scene.coordinator]) {
      const file = await caller.get(`/disputes/${id}/files/${paper}`);
      expect(file.status).toBe(200);
      expect(file.headers['content-type']).toBe('application/pdf');
    }
    const toPartner = (await scene.letters()).slice(lettersBefore + 1);
    expect(toPartner.map((letter) => letter.toName)).toEqual(['Mila Torv']);
  });

  it('declined with a reason: nothing is posted, and the same can be disputed anew', async () => {
    const { shipmentId, id } = await opened();
    const entries = await scene.entriesOf(shipmentId);
    const unsaid = await scene.answer(scene.coordinator, id, { step: 'decline' });
    expect(unsaid.status).toBe(400);
    expect(unsaid.body.fields[0].path).toBe('text');
    const declined = await scene.answer(scene.coordinator, id, {
      step: 'decline',
      text: 'The camera says 190.',
    });
    expect(declined.body.state).toBe('declined');
    expect(await scene.entriesOf(shipmentId)).toEqual(entries);
    expect((await scene.clerk.post('/disputes', claim(shipmentId, 195))).status).toBe(200);
  });

  it('asked for more, answered, accepted in whole', async () => {
    const { shipmentId, id } = await opened();
    await scene.answer(scene.coordinator, id, { step: 'ask', text: 'Who signed?' });
    expect(await scene.read(scene.clerk, id)).toMatchObject({
      state: 'waiting for partner',
      waitingFor: 'partner',
      yourTurn: true,
      may: { reply: true, withdraw: true, answer: false },
    });
    const reply = await scene.clerk.post(`/disputes/${id}/replies`, { text: 'B. Holm, gate 4.' });
    expect(reply.body.state).toBe('open');
    expect((await scene.answer(scene.coordinator, id, { step: 'accept' })).body).toMatchObject({
      state: 'accepted',
      acceptedUnits: 10,
    });
    expect(await scene.theDifference(shipmentId, scene.tote)).toMatchObject({ state: 'settled' });
    expect(await scene.inTransit(shipmentId, scene.tote)).toBe(0);
    const { messages } = await scene.read(scene.clerk, id);
    expect(messages.map(({ step }) => step)).toEqual(['opened', 'asked', 'answered', 'accepted']);
  });

  it('withdrawn by the partner: nobody can answer it any more', async () => {
    const { id } = await opened();
    expect((await scene.clerk.post(`/disputes/${id}/withdrawal`, {})).body.state).toBe('withdrawn');
    const late = await scene.answer(scene.coordinator, id, { step: 'accept' });
    expect(late.status).toBe(409);
    expect(late.body).toMatchObject({
      code: 'already answered',
      data: { by: 'Mila Torv', state: 'withdrawn' },
    });
    expect((await scene.clerk.post(`/disputes/${id}/replies`, { text: 'Yet' })).status).toBe(409);
  });

  it('comes to what was agreed, though the difference was settled in between', async () => {
    const { shipmentId, id } = await opened();
    const difference = await scene.theDifference(shipmentId, scene.tote);
    await scene.coordinator.post(`/differences/${difference.id}/settlements`, {
      way: 'receiver miscounted',
      units: 7,
      reason: 'Found at the dock',
    });
    await scene.answer(scene.coordinator, id, { step: 'accept' });
    const subject = await scene.clerk.get(`/dispute-subjects/shipments/${shipmentId}`);
    expect(subject.body.lines).toEqual([
      expect.objectContaining({ typeCode: scene.tote, declared: 200, counted: 200, openDisputeId: null }),
    ]);
  });

  it('lets one of two answers at once stand', async () => {
    const { shipmentId, id } = await opened();
    const { messages } = await scene.read(scene.coordinator, id);
    const answers = await Promise.all(
      [scene.coordinator, scene.finance].map((caller) =>
        caller.post(`/disputes/${id}/answers`, { step: 'accept', seenMessageId: messages.at(-1)?.id }),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    expect(answers.find(({ status }) => status === 409)?.body.code).toBe('already answered');
    const corrected = (await scene.entriesOf(shipmentId)).filter((entry) => entry.disputeId === id);
    expect(corrected).toHaveLength(1);
  });

  it('refuses an answer to a thread that has gone on unseen', async () => {
    const { id } = await opened();
    const { messages } = await scene.read(scene.coordinator, id);
    await scene.clerk.post(`/disputes/${id}/replies`, { text: 'One more thing.' });
    const stale = await scene.coordinator.post(`/disputes/${id}/answers`, {
      step: 'accept',
      seenMessageId: messages.at(-1)?.id,
    });
    expect(stale.status).toBe(409);
    expect(stale.body.code).toBe('state changed');
  });

  it('accepts fewer than all in part only', async () => {
    const { id } = await opened();
    const answer = await scene.answer(scene.coordinator, id, {
      step: 'accept in part',
      units: 10,
      text: 'All',
    });
    expect(answer.status).toBe(400);
    expect(answer.body.fields[0].path).toBe('units');
  });
});

describe('what cannot be disputed', () => {
  it('refuses a second dispute over the same count and type', async () => {
    const { shipmentId } = await opened();
    const second = await scene.clerk.post('/disputes', claim(shipmentId, 199));
    expect(second.status).toBe(409);
    expect(second.body.code).toBe('already exists');
  });

  it.each([
    ['the number the book says already', 190],
    ['a negative number', -1],
    ['a fraction', 190.5],
  ])('refuses %s', async (_name, claimed) => {
    const { shipmentId } = await counted(200, 190);
    const answer = await scene.clerk.post('/disputes', claim(shipmentId, claimed));
    expect(answer.status).toBe(400);
    expect(answer.body.fields[0].path).toBe('claimed');
  });

  it('names everything that is missing at once, whatever else is sent', async () => {
    const { shipmentId } = await counted(200, 190);
    const answer = await scene.clerk.post('/disputes', { subject: 'count', shipmentId });
    expect(answer.status).toBe(400);
    expect(answer.body.fields.map(({ path }: { path: string }) => path).sort()).toEqual([
      'claimed',
      'reason',
      'text',
      'typeCode',
    ]);
    expect((await scene.clerk.post('/disputes', [])).status).toBe(400);
  });

  it('refuses a file of another company, and a file that is not what its name says', async () => {
    const { shipmentId } = await counted(200, 190);
    const foreign = await scene.aPaper(scene.otherClerk);
    const answer = await scene.clerk.post('/disputes', claim(shipmentId, 195, { fileIds: [foreign] }));
    expect(answer.status).toBe(400);
    expect(answer.body.fields[0].path).toBe('fileIds.0');
    const html = await scene.clerk
      .form('/files')
      .attach('file', Buffer.from('<html><script>1</script></html>'), {
        filename: 'note.pdf',
        contentType: 'application/pdf',
      });
    expect(html.status).toBe(415);
  });

  it('is not there for another partner, on any route', async () => {
    const { shipmentId, id } = await opened();
    const paper = await scene.aPaper(scene.clerk);
    await scene.clerk.post(`/disputes/${id}/replies`, { text: 'See this.', fileIds: [paper] });
    const { messages } = await scene.read(scene.clerk, id);
    const other = scene.otherClerk;
    const tried = await Promise.all([
      other.get(`/disputes/${id}`),
      other.get(`/disputes/${id}/files/${paper}`),
      other.get(`/dispute-subjects/shipments/${shipmentId}`),
      other.post('/disputes', claim(shipmentId, 200)),
      other.post(`/disputes/${id}/replies`, { text: 'Hello' }),
      other.post(`/disputes/${id}/withdrawal`, {}),
    ]);
    expect(tried.map(({ status }) => status)).toEqual([404, 404, 404, 404, 404, 404]);
    expect((await other.get('/disputes')).body.rows).toEqual([]);
    const answer = { step: 'accept', seenMessageId: messages[0]?.id };
    expect((await other.post(`/disputes/${id}/answers`, answer)).status).toBe(403);
    expect((await scene.auditor.post(`/disputes/${id}/answers`, answer)).status).toBe(403);
    expect((await scene.auditor.get(`/disputes/${id}`)).status).toBe(200);
  });

  it('keeps formulas and HTML as the text they are', async () => {
    const { shipmentId } = await counted(200, 190);
    const text = '=HYPERLINK("http://x")\n<script>alert(1)</script> & "so"';
    const { body } = await scene.clerk.post('/disputes', claim(shipmentId, 200, { text }));
    const { messages } = await scene.read(scene.coordinator, String(body.id));
    expect(messages[0]?.text).toBe(text);
  });
});

describe('letters', () => {
  it('go to a side at most once an hour; what follows waits for its end', async () => {
    const start = (await scene.letters()).length;
    scene.product.setClock('2026-03-20T16:00:00.000Z');
    const { id } = await opened();
    await scene.clerk.post(`/disputes/${id}/replies`, { text: 'One' });
    await scene.clerk.post(`/disputes/${id}/replies`, { text: 'Two' });
    const letters = (await scene.letters()).slice(start);
    expect(letters.map((letter) => letter.notBefore)).toEqual([
      '2026-03-20T16:00:00.000Z',
      '2026-03-20T17:00:00.000Z',
    ]);
    scene.product.setClock('2026-03-20T18:30:00.000Z');
    await scene.clerk.post(`/disputes/${id}/replies`, { text: 'Three' });
    expect((await scene.letters()).slice(start).map((letter) => letter.notBefore)).toEqual([
      '2026-03-20T16:00:00.000Z',
      '2026-03-20T17:00:00.000Z',
      '2026-03-20T18:30:00.000Z',
    ]);
    scene.product.setClock('2026-03-20T09:00:00.000Z');
  });
});

describe('the list of disputes', () => {
  it('shows who owes the next word and for how many days, page by page', async () => {
    scene.product.setClock('2026-03-26T09:00:00.000Z');
    const clerk = await scene.product.as(await scene.product.aPerson(scene.kestrel, ['clerk']));
    const whole = await clerk.get('/disputes');
    const rows = whole.body.rows as { id: string; days: number; waitingFor: string; yourTurn: boolean }[];
    expect(rows.length).toBeGreaterThan(2);
    expect(rows[0]).toMatchObject({ days: 6, waitingFor: 'operator', yourTurn: false });
    const seen: string[] = [];
    let after: string | null = null;
    do {
      const query: Record<string, string> = { limit: '2', ...(after ? { after } : {}) };
      const { body } = await clerk.get('/disputes', query);
      seen.push(...(body.rows as { id: string }[]).map(({ id }) => id));
      after = body.next as string | null;
    } while (after !== null && seen.length < 100);
    expect(seen).toEqual(rows.map(({ id }) => id));
    const ane = await scene.product.as(scene.ane);
    const decided = await ane.get('/disputes', { state: 'decided' });
    const states = (decided.body.rows as { state: string }[]).map(({ state }) => state);
    expect(new Set(states)).toEqual(new Set(['accepted', 'accepted in part', 'declined', 'withdrawn']));
  });
});
