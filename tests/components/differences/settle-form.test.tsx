import { render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { SettleForm } from '@/components/differences/SettleForm';
import type { DifferenceDetail } from '@/shared/contracts/differences';
import { App, serveWith, sessionReply } from '../support';

const id = (last: number) => `0b7c1c1e-6d1f-4d07-9d3a-1f0d0c6f7b${String(last).padStart(2, '0')}`;
const difference: DifferenceDetail = {
  id: id(1),
  kind: 'fewer',
  shipmentId: id(2),
  importId: null,
  reference: 'EM-104101',
  from: { companyId: id(3), company: 'Fennmark Heat Pumps', site: 'Tarnby Assembly' },
  to: { companyId: id(4), company: 'Kestrel Coil Works', site: 'Kestrel dock' },
  lines: [{ typeCode: 'TOTE-6428', typeName: 'Tote 600×400×280', typeKind: 'tote', units: 8 }],
  units: 8,
  since: '2026-11-27',
  days: 4,
  atStake: '144.00',
  currency: 'EUR',
  state: 'open',
  ways: [],
  disputeId: null,
  declared: 400,
  counted: 392,
  openUnits: -8,
  count: {
    countedOn: '2026-11-27',
    countedAt: '2026-11-27T13:10:00.000Z',
    by: 'Mila Torv',
    source: 'person',
    note: '',
    photos: [],
  },
  matching: [],
  settlements: [],
  swaps: [],
  bearers: [
    { companyId: id(3), company: 'Fennmark Heat Pumps', kind: 'operator', side: 'sender' },
    { companyId: id(4), company: 'Kestrel Coil Works', kind: 'partner', side: 'receiver' },
  ],
  choices: ['sender miscounted', 'receiver miscounted', 'lost on the way', 'turned up later'],
  timeZone: 'Europe/Copenhagen',
};

const show = () =>
  render(
    <App>
      <SettleForm difference={difference} />
    </App>,
  );
const choose = (name: string) => userEvent.click(screen.getByRole('radio', { name }));
const settle = () => userEvent.click(screen.getByRole('button', { name: 'Settle' }));

beforeEach(() => sessionStorage.clear());

test('each way says what it does before it is sent', async () => {
  serveWith(() => sessionReply);
  show();
  expect(screen.queryByText('What this does')).toBeNull();
  await choose('The sender miscounted');
  expect(screen.getByText(/8 units go back to Fennmark Heat Pumps in the book, today/)).toBeInTheDocument();
  await choose('The receiver miscounted');
  expect(
    screen.getByText(/The count of 27 November is put right by 8 more, on that day/),
  ).toBeInTheDocument();
  await choose('Lost on the way');
  expect(screen.getByText(/Say who bears it\.$/)).toBeInTheDocument();
  await choose('Kestrel Coil Works, who received them');
  expect(screen.getByText(/Kestrel Coil Works forfeits the deposit/)).toBeInTheDocument();
});

test('who bears a loss and how it is known are asked together, and then sent once', async () => {
  const requests = serveWith(({ method }) =>
    method === 'POST'
      ? { body: { id: id(1), way: 'lost on the way', units: 8, openUnits: 0, entryId: 7 } }
      : sessionReply,
  );
  const posts = () => requests.filter(({ method }) => method === 'POST');
  show();
  await choose('Lost on the way');
  await settle();
  expect(await screen.findByText('2 things need another look')).toBeInTheDocument();
  expect(posts()).toEqual([]);
  await choose('Kestrel Coil Works, who received them');
  await userEvent.type(screen.getByLabelText('How do you know?'), 'Nobody has them');
  await settle();
  await waitFor(() => expect(posts()).toHaveLength(1));
  expect(posts()[0]?.body).toEqual({
    way: 'lost on the way',
    units: 8,
    reason: 'Nobody has them',
    bearerCompanyId: id(4),
  });
});
