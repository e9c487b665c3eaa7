import { render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { ImportScreen } from '@/components/imports/ImportScreen';
import type { ImportDetail, ImportFileRow } from '@/shared/contracts/imports';
import { App, serveWith, sessionReply, widthOf } from '../support';

const id = '0b7c1c1e-6d1f-4d07-9d3a-1f0d0c6f7c01';
const held: ImportDetail = {
  id,
  fileName: 'march.csv',
  state: 'preview',
  rowsGood: 3,
  rowsBad: 1,
  by: 'Ane Ravn',
  createdAt: '2026-03-20T09:00:00.000Z',
  totals: {
    shipments: 1,
    receipts: 1,
    declared: 420,
    counted: 392,
    firstDay: '2026-03-02',
    lastDay: '2026-03-03',
  },
  progress: null,
  broken: false,
  confirmedBy: null,
  confirmedAt: null,
  endedAt: null,
  numbers: null,
};
const bad: ImportFileRow = {
  rowNo: 5,
  cells: {
    side: 'shipment',
    reference: 'EM-2',
    from: 'TARNBY',
    to: 'NOWHERE',
    date: '2026-03-02',
    type: 'TOTE-64',
    units: '12.5',
    damaged: '',
    dirty: '',
  },
  problems: [
    { column: 'to', reason: 'site unknown', data: { value: 'NOWHERE' } },
    { column: 'units', reason: 'fraction', data: { value: '12.5' } },
  ],
};

function show(given: Partial<ImportDetail> = {}) {
  let state = given.state ?? held.state;
  const requests = serveWith(({ method, path }) => {
    if (path.startsWith('/api/session')) return sessionReply;
    if (method === 'POST') {
      state = 'running';
      return { body: { id, state } };
    }
    if (path.includes('/rows')) return { body: { rows: [bad], next: null } };
    return { body: { ...held, ...given, state } };
  });
  render(
    <App>
      <ImportScreen id={id} />
    </App>,
  );
  return requests;
}

describe('the preview of a file', () => {
  it.each([390, 1440])('names each bad row by row, column and reason at %i px', async (width) => {
    widthOf(width);
    show();
    expect(await screen.findByText('1 row cannot be posted, 3 rows can.')).toBeVisible();
    expect(await screen.findByText('Row 5')).toBeVisible();
    expect(screen.getByText('To site: “NOWHERE” is no site of the book.')).toBeVisible();
    expect(screen.getByText('Units: 12.5 is not whole.')).toBeVisible();
  });

  it('posts nothing until it is said that the bad rows are left out', async () => {
    const requests = show();
    const post = await screen.findByRole('button', { name: 'Post 3 rows' });
    await userEvent.click(post);
    expect(await screen.findByText('Say first that you leave out 1 row.')).toBeVisible();
    expect(requests.some(({ method }) => method === 'POST')).toBe(false);
    await userEvent.click(screen.getByRole('checkbox', { name: 'Leave out 1 row' }));
    await userEvent.click(post);
    await waitFor(() =>
      expect(requests.find(({ method }) => method === 'POST')?.body).toEqual({ leaveOut: 1 }),
    );
    expect(await screen.findByText('Waits for its turn. It begins by itself.')).toBeVisible();
  });

  it('offers nothing to post when no row is good', async () => {
    show({ rowsGood: 0, rowsBad: 4 });
    expect(await screen.findByText(/No row of this file can be posted/)).toBeVisible();
    expect(screen.queryByRole('button', { name: /^Post/ })).toBeNull();
  });
});
