import { render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { CountScreen } from '@/components/shipments/CountScreen';
import type { ShipmentDetail } from '@/shared/contracts/shipments';
import { App, serveWith, sessionReply } from '../support';

const id = (last: number) => `0b7c1c1e-6d1f-4d07-9d3a-1f0d0c6f7b${String(last).padStart(2, '0')}`;
const end = (site: string, company: string) => ({
  siteId: id(1),
  site,
  companyId: id(2),
  company,
  timeZone: 'Europe/Copenhagen',
});
const line = (typeCode: string, typeName: string, declared: number) => ({
  typeCode,
  typeName,
  unitsPerStack: 8,
  declared,
  counted: null,
  damaged: 0,
  dirty: 0,
  countedNow: null,
  openUnits: 0,
});
const shipment: ShipmentDetail = {
  id: id(3),
  reference: 'EM-104233',
  contents: 'empties',
  from: end('Tarnby Assembly', 'Fennmark Heat Pumps'),
  to: end('Kestrel dock', 'Kestrel Coil Works'),
  leftOn: '2026-11-30',
  expectedOn: '2026-12-01',
  state: 'on the way',
  countedOn: null,
  lines: [line('TOTE-6428', 'Tote 600×400×280', 400), line('LID-1208', 'Lid 1200×800', 20)],
  direction: 'in',
  mayCount: true,
  note: '',
  origin: 'form',
  sentBy: 'Ane Ravn',
  counts: [],
  differences: [],
  entries: [],
  timeZone: 'Europe/Copenhagen',
};
const choices = {
  contents: 'fulls',
  today: '2026-12-01',
  from: [],
  to: [],
  types: [
    { code: 'TOTE-6428', name: 'Tote 600×400×280', unitsPerStack: 8 },
    { code: 'PAL-1208', name: 'Pallet 1200×800', unitsPerStack: 1 },
  ],
  atSites: [],
};
const done = { id: id(4), shipmentId: id(3), reference: 'EM-104233', countedAt: '2026-12-01T13:10:00.000Z' };

/** The server as the count screen meets it; `counts` answers what is sent. */
function serve(counts: () => { status?: number; body: unknown }) {
  return serveWith(({ method, path }) => {
    if (path.endsWith('/counts') && method === 'POST') return counts();
    if (path.startsWith('/api/shipments/')) return { body: shipment };
    if (path === '/api/shipment-choices') return { body: choices };
    return sessionReply;
  });
}

const show = () =>
  render(
    <App>
      <CountScreen shipment={shipment.id} />
    </App>,
  );
const press = async (name: string) => userEvent.click(await screen.findByRole('button', { name }));
const tote = 'Tote 600×400×280';
const isSent = (request: { method: string; path: string }) =>
  request.method === 'POST' && request.path.endsWith('/counts');

beforeEach(() => sessionStorage.clear());

test('one tap takes a line as declared, and the bar says how many are left', async () => {
  const requests = serve(() => ({ body: { ...done, differences: [] } }));
  show();
  expect(await screen.findByText('2 of 2 lines left')).toBeInTheDocument();
  expect(screen.getByText('declared 400 · 50 stacks of 8')).toBeInTheDocument();
  await press(`As declared: ${tote}`);
  expect(screen.getByText('1 of 2 lines left')).toBeInTheDocument();
  expect(screen.getByRole('button', { name: 'Send count' })).toBeDisabled();
  await press('As declared: Lid 1200×800');
  await press('Send count');
  expect(await screen.findByText('Everything came as declared.')).toBeInTheDocument();
  expect(requests.find(isSent)?.body).toEqual({
    lines: [
      { typeCode: 'TOTE-6428', counted: 400, damaged: 0, dirty: 0 },
      { typeCode: 'LID-1208', counted: 20, damaged: 0, dirty: 0 },
    ],
    note: '',
    photoIds: [],
  });
});

test('a number that differs is said in words before it is sent', async () => {
  serve(() => ({ body: { ...done, differences: [] } }));
  show();
  await press(`Other number, or damaged: ${tote}`);
  const counted = screen.getByLabelText(`${tote}, counted`);
  await userEvent.clear(counted);
  await userEvent.type(counted, '392');
  expect(screen.getByText('8 fewer than declared')).toBeInTheDocument();
  await press(`One more: ${tote}, counted`);
  expect(screen.getByText('7 fewer than declared')).toBeInTheDocument();
  await userEvent.clear(counted);
  await userEvent.type(counted, '403');
  expect(screen.getByText('3 more than declared')).toBeInTheDocument();
});

test('more damaged than counted stays on the page and is marked', async () => {
  const requests = serve(() => ({ body: { ...done, differences: [] } }));
  show();
  await press('As declared: Lid 1200×800');
  await press(`Other number, or damaged: ${tote}`);
  await userEvent.type(screen.getByLabelText(`${tote}, of these damaged`), '{backspace}401');
  await press('Send count');
  await waitFor(() =>
    expect(screen.getByLabelText(`${tote}, of these damaged`)).toHaveAccessibleDescription(
      'More damaged than counted.',
    ),
  );
  expect(requests.some(isSent)).toBe(false);
});

test('a type that was not declared can be added, and counts as a line', async () => {
  serve(() => ({ body: { ...done, differences: [] } }));
  show();
  await screen.findByRole('option', { name: 'Pallet 1200×800', hidden: true });
  await userEvent.selectOptions(screen.getByLabelText('Which container type'), 'PAL-1208');
  await press('Add to the count');
  expect(await screen.findByText('3 of 3 lines left')).toBeInTheDocument();
  await userEvent.type(screen.getByLabelText('Pallet 1200×800, counted'), '4');
  expect(screen.getByText('4 more than declared')).toBeInTheDocument();
});

test('without a connection nothing is lost, also over a reload, and it goes again under the same key', async () => {
  let isAway = true;
  const requests = serve(() => {
    if (isAway) throw new TypeError('Failed to fetch');
    return { body: { ...done, differences: [{ typeCode: 'TOTE-6428', typeName: tote, by: -8 }] } };
  });
  const first = show();
  await press('As declared: Lid 1200×800');
  await press(`Other number, or damaged: ${tote}`);
  await userEvent.clear(screen.getByLabelText(`${tote}, counted`));
  await userEvent.type(screen.getByLabelText(`${tote}, counted`), '392');
  await press('Send count');
  expect(
    await screen.findByText('Not sent: no connection. Everything you typed is kept here.'),
  ).toBeInTheDocument();
  first.unmount();

  isAway = false;
  show();
  expect(await screen.findByDisplayValue('392')).toBeInTheDocument();
  await press('Send count');
  expect(await screen.findByText('Your count of EM-104233 is in the book.')).toBeInTheDocument();
  expect(screen.getByText('8 fewer than declared')).toBeInTheDocument();
  const keys = requests.filter(isSent).map((request) => request.headers.get('idempotency-key'));
  expect(keys).toHaveLength(2);
  expect(keys[0]).toBe(keys[1]);
});

test('whoever comes second is told who counted and when, and keeps what was typed', async () => {
  serve(() => ({
    status: 409,
    body: {
      code: 'already counted',
      status: 409,
      requestId: 'rq-1',
      data: { by: 'I. Madsen', at: '2026-11-27T13:10:00.000Z' },
    },
  }));
  show();
  await press(`As declared: ${tote}`);
  await press('As declared: Lid 1200×800');
  await press('Send count');
  expect(await screen.findByText('Counted by I. Madsen, 27 November 2026, 14:10')).toBeInTheDocument();
  expect(screen.getByText('All lines counted')).toBeInTheDocument();
});
