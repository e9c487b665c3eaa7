import { render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import type { Column } from '@/components/tables/column';
import { RecordList } from '@/components/tables/RecordList';
import type { ListState } from '@/components/tables/use-list-state';
import { widthOf } from '../support';

type Row = { id: string; from: string; units: number };
const rows: Row[] = [
  { id: 'EM-104101', from: 'Tarnby', units: 400 },
  { id: 'EM-104102', from: 'Ostrel', units: 48 },
];
const columns: Column<Row>[] = [
  { key: 'id', head: 'Shipment', cell: (row) => row.id, cardRole: 'title', sortable: true },
  { key: 'from', head: 'From', cell: (row) => row.from },
  { key: 'units', head: 'Units', cell: (row) => row.units, align: 'end', cardRole: 'aside' },
];
const state = (over: Partial<ListState> = {}): ListState => ({
  search: '',
  sort: undefined,
  filters: {},
  query: {},
  isFiltered: false,
  set: jest.fn(),
  clear: jest.fn(),
  ...over,
});

const list = (over: object = {}) => (
  <RecordList
    label="Shipments"
    list={{ data: { pages: [{ rows }] } }}
    columns={columns}
    rowKey={(row) => row.id}
    rowHref={(row) => `/shipments/${row.id}`}
    empty={{ title: 'Nothing on its way', hint: 'Announced shipments stand here.' }}
    {...over}
  />
);

test('from 900 px a list is a table with named columns, each row a link', () => {
  widthOf(1440);
  render(list());
  const table = screen.getByRole('table', { name: 'Shipments' });
  expect(
    within(table)
      .getAllByRole('columnheader')
      .map((head) => head.textContent),
  ).toEqual(['Shipment', 'From', 'Units']);
  expect(within(table).getByRole('link', { name: 'EM-104101' })).toHaveAttribute(
    'href',
    '/shipments/EM-104101',
  );
});

test('below 900 px the same columns are cards', () => {
  widthOf(390);
  render(list());
  expect(screen.queryByRole('table')).not.toBeInTheDocument();
  const [first] = within(screen.getByRole('list', { name: 'Shipments' })).getAllByRole('listitem');
  expect(first).toHaveTextContent('EM-104101');
  expect(first).toHaveTextContent('FromTarnby');
});

test('pressing the head of a sorted column turns its order round', async () => {
  widthOf(1440);
  const sorted = state({ sort: 'id' });
  render(list({ state: sorted }));
  expect(screen.getByRole('columnheader', { name: /Shipment/ })).toHaveAttribute('aria-sort', 'ascending');
  await userEvent.click(screen.getByRole('button', { name: 'Sort by Shipment, last to first' }));
  expect(sorted.set).toHaveBeenCalledWith('sort', '-id');
});

test('an empty list says what will stand there; an empty search how to widen it', async () => {
  const nothing = { data: { pages: [{ rows: [] }] } };
  const shown = render(list({ list: nothing }));
  expect(screen.getByText('Announced shipments stand here.')).toBeInTheDocument();
  const searched = state({ search: 'zzz', isFiltered: true });
  shown.rerender(list({ list: nothing, state: searched }));
  await userEvent.click(screen.getAllByRole('button', { name: 'Clear search and filters' })[0]!);
  expect(searched.clear).toHaveBeenCalled();
});

test('more is asked for only when there is more', async () => {
  const fetchNextPage = jest.fn();
  const shown = render(list({ list: { data: { pages: [{ rows }] }, hasNextPage: true, fetchNextPage } }));
  await userEvent.click(screen.getByRole('button', { name: 'Show more' }));
  expect(fetchNextPage).toHaveBeenCalledTimes(1);
  shown.rerender(list());
  expect(screen.queryByRole('button', { name: 'Show more' })).not.toBeInTheDocument();
});
