import { render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { DisputeLineScreen } from '@/components/disputes/DisputeLineScreen';
import type { LineSubject } from '@/shared/contracts/disputes';
import { App, serveWith, sessionReply } from '../support';

const id = (last: number) => `0b7c1c1e-6d1f-4d07-9d3a-1f0d0c6f7b${String(last).padStart(2, '0')}`;
const lost: LineSubject = {
  lineId: id(1),
  statementId: id(2),
  statementNumber: 'ST-2026-11-KES',
  statementMonth: '2026-11',
  accountMonth: '2026-11',
  component: 'lost',
  typeCode: 'TOTE-6428',
  typeName: 'Tote 600×400×280',
  typeKind: 'tote',
  quantity: 12,
  amount: '86.40',
  currency: 'EUR',
  way: 'fewer',
  objectionUntil: '2026-12-14',
  blocked: null,
  openDisputeId: null,
  shipments: [{ id: id(3), reference: 'DN-88013', leftOn: '2026-11-24' }],
};
const fee: LineSubject = {
  ...lost,
  component: 'daily fee',
  quantity: 2400,
  amount: '72.00',
  way: null,
  shipments: [],
};

function serve(subject: LineSubject) {
  return serveWith(({ method, path }) => {
    if (path.startsWith('/api/dispute-subjects/')) return { body: subject };
    if (path === '/api/disputes' && method === 'POST')
      return { body: { id: id(9), state: 'open', amountHeld: '36.00' } };
    return sessionReply;
  });
}

const show = () =>
  render(
    <App>
      <DisputeLineScreen statement={lost.statementId} line={lost.lineId} />
    </App>,
  );
const send = () => userEvent.click(screen.getByRole('button', { name: 'Send dispute' }));
const sent = (requests: ReturnType<typeof serveWith>) =>
  requests.find(({ method, path }) => method === 'POST' && path === '/api/disputes');

beforeEach(() => sessionStorage.clear());

test('a number is said in money at once, and goes out with reason, shipment and words', async () => {
  const requests = serve(lost);
  show();
  expect(await screen.findByText('Lost: 12 totes')).toBeInTheDocument();
  await userEvent.type(screen.getByLabelText('How many do you say it should be?'), '7');
  expect(
    screen.getByText(/^5 fewer\. EUR\s36\.00 is held back until this is decided\.$/),
  ).toBeInTheDocument();
  await userEvent.selectOptions(screen.getByLabelText('Why'), 'We sent them back');
  await userEvent.selectOptions(screen.getByLabelText('On which shipment?'), 'DN-88013, 24 November');
  await userEvent.type(screen.getByLabelText('What happened'), 'Under the foam trays.');
  await send();
  await waitFor(() => expect(sent(requests)).toBeDefined());
  expect(sent(requests)?.body).toEqual({
    subject: 'statement line',
    lineId: lost.lineId,
    claimed: 7,
    reason: 'sent them back',
    shipmentId: id(3),
    text: 'Under the foam trays.',
    fileIds: [],
  });
});

test('a number that is not fewer holds nothing back and says so', async () => {
  serve(lost);
  show();
  await userEvent.type(await screen.findByLabelText('How many do you say it should be?'), '12');
  expect(screen.getByText('Say a number below 12.')).toBeInTheDocument();
  expect(screen.queryByText(/is held back/)).toBeNull();
});

test('everything that is missing is told at once, and nothing is sent', async () => {
  const requests = serve(lost);
  show();
  await screen.findByText('Lost: 12 totes');
  await send();
  expect(await screen.findByText('3 things need another look')).toBeInTheDocument();
  expect(sent(requests)).toBeUndefined();
});

test('a daily fee is disputed in money, no more than the line', async () => {
  serve(fee);
  show();
  const field = await screen.findByLabelText('How much of it is too much? (EUR)');
  expect(screen.getByText(/^At most EUR\s72\.00\.$/)).toBeInTheDocument();
  await userEvent.type(field, '24');
  expect(screen.getByText(/^EUR\s24\.00 is held back until this is decided\.$/)).toBeInTheDocument();
  expect(screen.queryByLabelText('On which shipment?')).toBeNull();
});

test('after the days of objection the form is gone and what can still be done stands there', async () => {
  serve({ ...lost, blocked: 'objection over' });
  show();
  expect(await screen.findByText(/until 14 December 2026, so its lines stand/)).toBeInTheDocument();
  expect(screen.queryByRole('button', { name: 'Send dispute' })).toBeNull();
  expect(screen.getByRole('link', { name: 'Open shipments' })).toHaveAttribute('href', '/shipments');
});
