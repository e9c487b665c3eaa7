import { render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import type { StatementPage } from '@/components/statements/StatementScreen';
import { StatementScreen } from '@/components/statements/StatementScreen';
import type { ContentLine } from '@/shared/domain/statement/content';
import { App, serveWith, sessionReply, widthOf } from '../support';

const id = (last: number) => `0b7c1c1e-6d1f-4d07-9d3a-1f0d0c6f7b${String(last).padStart(2, '0')}`;
const line = (given: Partial<ContentLine>): ContentLine => ({
  id: id(10),
  component: 'deposits asked',
  accountMonth: '2026-11',
  typeCode: 'TOTE-6428',
  quantity: 0,
  rate: null,
  amount: '0.00',
  parts: [],
  correction: null,
  credit: null,
  ...given,
});
const lines = [
  line({ id: id(11), quantity: 392, amount: '1764.00', parts: [{ quantity: 392, each: '4.5' }] }),
  line({
    id: id(12),
    typeCode: 'LID',
    quantity: 20,
    amount: '240.00',
    parts: [{ quantity: 20, each: '12' }],
  }),
  line({
    id: id(13),
    component: 'lost',
    quantity: 12,
    amount: '86.40',
    parts: [{ quantity: 12, each: '7.20', residual: '11.70', deposit: '4.50' }],
  }),
  line({
    id: id(14),
    component: 'daily fee',
    accountMonth: '2026-10',
    rate: '0.03',
    quantity: -24,
    amount: '-0.72',
    correction: {
      billed: '10.72',
      now: '10.00',
      causes: ['count of EM-1 put right to 392'],
      eventIds: ['9'],
    },
  }),
];

const page: StatementPage = {
  id: id(1),
  number: '2026-11-KESTREL',
  month: '2026-11',
  partner: { id: id(2), name: 'Kestrel Coil Works' },
  state: 'issued',
  answer: 'disputed',
  objectionUntil: '2026-12-15',
  issuedAt: '2026-12-01T08:00:00.000Z',
  currency: 'EUR',
  payable: '2089.68',
  tax: '13.32',
  total: '2103.00',
  held: '36.00',
  dueNow: '2067.00',
  sha256: 'a'.repeat(64),
  content: {
    version: 1,
    number: '2026-11-KESTREL',
    month: '2026-11',
    from: '2026-11-01',
    to: '2026-11-30',
    currency: 'EUR',
    operator: { name: 'Fennmark Heat Pumps' },
    partner: {
      id: id(2),
      code: 'KESTREL',
      name: 'Kestrel Coil Works',
      address: null,
      taxRate: '25',
      taxTreatment: 'excluded',
      objectionDays: 14,
    },
    types: [
      { code: 'TOTE-6428', name: 'Tote 600×400×280', kind: 'tote' },
      { code: 'LID', name: 'Lid 1200×800', kind: 'lid' },
    ],
    terms: [],
    assessment: {
      currency: 'EUR',
      from: '2026-11-01',
      to: '2026-11-30',
      lines: [
        {
          containerType: 'TOTE-6428',
          units: {
            opening: 1120,
            issued: 392,
            returned: 0,
            lost: 12,
            found: 0,
            closing: 1500,
            overReturned: 0,
          },
          deposit: {
            opening: '5040.00',
            charged: '1764.00',
            released: '0.00',
            forfeited: '54.00',
            reinstated: '0.00',
            closing: '6750.00',
          },
          charges: {
            dwell: { lines: [], unitDays: 0, amount: '0.00' },
            loss: { units: 12, recovered: '0.00', amount: '86.40' },
            damage: { units: 0, amount: '0.00' },
            cleaning: { units: 0, amount: '0.00' },
          },
          ages: { '0-14': 392, '31-60': 1108 },
        },
      ],
      totals: {
        depositChange: '1710.00',
        dwell: '0.00',
        loss: '86.40',
        damage: '0.00',
        cleaning: '0.00',
        payable: '2090.40',
      },
    },
    lines,
    forfeits: [],
    taxRows: [
      { rate: '25', treatment: 'excluded', fees: '-0.72', deposits: '54.00', base: '53.28', tax: '13.32' },
    ],
    payable: '2089.68',
    tax: '13.32',
    total: '2103.00',
  },
  stillOpen: [],
  disputes: [
    {
      id: id(20),
      lineId: id(13),
      state: 'open',
      undecided: true,
      stated: 12,
      claimed: 7,
      held: '36.00',
      reason: 'sent them back',
      by: 'Rasmus Toft',
      at: '2026-12-03T09:00:00.000Z',
      words: 'Five of the twelve came back.',
    },
  ],
  history: [{ step: 'issued', by: 'Mikkel Thorn', at: '2026-12-01T08:00:00.000Z' }],
  timeZone: 'Europe/Copenhagen',
  mayIssue: false,
  mayConfirm: false,
  mayDispute: false,
  firstOpening: false,
};

function show(given: Partial<StatementPage> = {}) {
  const requests = serveWith(({ method, path }) => {
    if (path === `/api/statements/${page.id}` && method === 'GET') return { body: { ...page, ...given } };
    if (path.startsWith(`/api/statements/${page.id}/`)) return { body: { id: page.id } };
    return sessionReply;
  });
  render(
    <App>
      <StatementScreen statement={page.id} />
    </App>,
  );
  return requests;
}

beforeEach(() => widthOf(1440));

test('the money stands by component with what it was reckoned from, corrections with month and cause', async () => {
  show();
  const money = within(await screen.findByRole('table', { name: 'Money' }));
  const rows = money.getAllByRole('row').map((row) => row.textContent?.replace(/\s/g, ' '));
  expect(rows.slice(1)).toEqual([
    'Deposits asked392 totes at 4.50, 20 lids at 12.002 004.00',
    'Lost5 of 12 disputed12 totes at 11.70 residual value less 4.50 deposit86.40',
    'Correction to October 2026: daily feecount of EM-1 put right to 392−0.72',
    'Payable2 089.68',
  ]);
});

test('every figure opens the movements behind it', async () => {
  show();
  const money = within(await screen.findByRole('table', { name: 'Money' }));
  const hrefs = money.getAllByRole('link').map((each) => each.getAttribute('href'));
  expect(hrefs).toEqual([
    `/statements/${page.id}/movements?component=deposits+asked`,
    `/statements/${page.id}/movements?component=lost`,
    `/statements/${page.id}/movements?component=daily+fee&corrects=2026-10`,
  ]);
  const containers = within(screen.getByRole('table', { name: 'Containers' }));
  expect(containers.getAllByRole('link').map((each) => each.textContent?.replace(/\s/g, ' '))).toEqual([
    '1 120',
    '392',
    '12',
    '1 500',
  ]);
});

test('what is disputed is held out of what is due now, and the tax notice stands by', async () => {
  show();
  expect(await screen.findByText(/EUR\s36\.00 held: disputed/)).toBeInTheDocument();
  expect(screen.getAllByText(/EUR\s2\s067\.00/)).toHaveLength(1);
  expect(screen.getByText('partly disputed')).toBeInTheDocument();
  expect(screen.getByText(/Ask a licensed adviser/)).toBeInTheDocument();
  expect(screen.queryByRole('button', { name: 'Confirm this statement' })).not.toBeInTheDocument();
});

test('the partner’s first look is noted once, and confirming sends once however often it is pressed', async () => {
  const requests = show({ firstOpening: true, mayConfirm: true, disputes: [], held: '0.00' });
  const button = await screen.findByRole('button', { name: 'Confirm this statement' });
  await userEvent.dblClick(button);
  const posts = () =>
    requests.filter(({ method }) => method === 'POST').map(({ path }) => path.split('/').at(-1));
  await waitFor(() => expect(posts().sort()).toEqual(['confirmations', 'openings']));
});

test('each line can be disputed by who may', async () => {
  show({ mayDispute: true });
  const link = await screen.findByRole('link', { name: 'Dispute Lost' });
  expect(link).toHaveAttribute('href', `/statements/${page.id}/dispute?line=${id(13)}`);
});
