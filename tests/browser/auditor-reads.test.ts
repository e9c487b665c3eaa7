import { counted, emptiesToKestrel } from './support/movements';
import { theatre } from './support/journey';

const { journey } = theatre('auditor_reads');

journey(
  'an auditor opens every place and is offered nothing that changes anything',
  async ({ at, stage, scene }) => {
    const shipment = await emptiesToKestrel({ stage, scene }, { 'TOTE-64': 400 });
    await counted(stage, { shipment, load: { 'TOTE-64': 392 } });
    const ida = await at('desk', scene.people.ida);
    const places = {
      '/shipments': 'Shipments',
      [`/shipments/${shipment.id}`]: `Empties ${shipment.reference}`,
      '/balances': 'Balances',
      '/differences': 'Differences',
      '/disputes': 'Disputes',
      '/statements': 'Statements',
      '/terms': 'Terms',
      '/months': 'Months',
      '/pool': 'Pool',
      '/parts': 'Parts and loops',
      '/partners': 'Partners',
      '/people': 'People',
      '/container-types': 'Container types',
      '/log': 'Log',
    };
    const changing =
      /^(Send|Announce|Count this|Settle|Adjust|Add a|Invite|Close the|Set |Issue|Approve|Change)/;
    for (const [address, head] of Object.entries(places)) {
      await ida.open(address);
      await ida.arrives(head);
      await ida.page.waitForLoadState('networkidle');
      for (const role of ['button', 'link'] as const) {
        const offered = await ida.page.getByRole(role, { name: changing }).allInnerTexts();
        expect({ address, offered }).toEqual({ address, offered: [] });
      }
    }
    await ida.isInOrder();
  },
);

journey(
  'an auditor who writes the address of a form is told what the role does not allow',
  async ({ at, scene }) => {
    const ida = await at('desk', scene.people.ida);
    const { request } = ida.context;
    const { csrfToken } = (await (await request.get('/api/session')).json()) as { csrfToken: string };
    const answer = await request.post('/api/adjustments', {
      headers: { 'x-csrf-token': csrfToken, 'idempotency-key': '0191d2a0-0000-4000-8000-000000000002' },
      data: {},
    });
    expect(answer.status()).toBe(403);
    await ida.open('/balances/adjust');
    await ida.sees('Your role does not allow this. Nothing was changed.');
    await ida.isInOrder();
  },
);
