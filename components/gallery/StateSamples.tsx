import { text } from '@/shared/text/catalogue';
import { ProblemError } from '../data/problem-error';
import { Problem } from '../data/Problem';
import type { Column } from '../tables/column';
import { RecordList } from '../tables/RecordList';
import { useListState } from '../tables/use-list-state';
import { Card } from '../ui/Card';
import { EmptyState } from '../ui/EmptyState';
import { Figure } from '../ui/Figure';
import { LazyLineChart } from '../ui/LazyLineChart';
import { ButtonLink } from '../ui/Link';
import { Notice } from '../ui/Notice';
import { Skeleton } from '../ui/Skeleton';
import { Tag } from '../ui/Tag';

type Row = { id: string; between: string; units: number; stake: string };
const rows: Row[] = [
  { id: 'EM-104101', between: 'Tarnby → Kestrel', units: 8, stake: '144' },
  { id: 'DN-88120', between: 'Orrin → Tarnby', units: 60, stake: '5700' },
];
const columns: Column<Row>[] = [
  { key: 'shipment', head: 'Shipment', cell: (row) => row.id, cardRole: 'title', sortable: true },
  { key: 'between', head: 'Between', cell: (row) => row.between },
  {
    key: 'differs',
    head: 'What differs',
    cell: (row) => <Tag tone="differs" label={`${row.units} fewer`} />,
    cardRole: 'tag',
  },
  {
    key: 'stake',
    head: 'At stake',
    align: 'end',
    cell: (row) => <Figure money={row.stake} currency="EUR" plain />,
    cardRole: 'aside',
    sortable: true,
  },
];

const curve = (middle: number, falling: boolean) =>
  Array.from({ length: 31 }, (_, at) => {
    const x = 500 + at * 10;
    const share = 1 / (1 + Math.exp((middle - x) / 22));
    return { x, y: falling ? 1 - share : share };
  });

export function StateSamples() {
  const state = useListState({ filters: ['state'] });
  return (
    <>
      <Card title={text.gallery.chart}>
        <LazyLineChart
          label="What a pool of this size does"
          summary="A pool of 708 covers 98 % of the days; today's 640 covers 62 %."
          xHead="Pool size"
          formatY={(share) => `${Math.round(share * 100)} %`}
          series={[
            { key: 'cover', label: 'days with enough empties', tone: 'done', points: curve(640, false) },
            {
              key: 'cartons',
              label: 'loads in one-way cartons',
              tone: 'differs',
              dashed: true,
              points: curve(560, true),
            },
          ]}
          markers={[
            { key: 'today', x: 640, label: 'today 640', tone: 'open' },
            { key: 'needed', x: 708, label: 'needed 708', tone: 'done' },
          ]}
        />
      </Card>
      <RecordList
        label={text.gallery.list}
        list={{ data: { pages: [{ rows }] } }}
        columns={columns}
        rowKey={(row) => row.id}
        rowHref={() => '/gallery'}
        state={state}
        searchLabel="Shipment or partner"
        filters={[{ key: 'state', label: 'State', options: [{ value: 'open', label: 'open' }] }]}
        empty={{ title: 'No differences' }}
        downloads={[{ href: '/api/differences.xlsx', label: text.ui.download }]}
      />
      <Card title={text.gallery.notices}>
        <Notice kind="info" live={false}>
          The price list of March starts on the 1st.
        </Notice>
        <Notice kind="success" live={false}>
          Counted. The sender has been told.
        </Notice>
        <Notice kind="caution" title="Stacking" live={false}>
          {'Check the maker’s plate and local rules.'}
        </Notice>
        <Problem
          error={new ProblemError('database away', { requestId: 'rq-20418' })}
          onRetry={() => undefined}
        />
        <EmptyState
          title="Nothing on its way"
          hint="Shipments that partners announce stand here."
          action={<ButtonLink href="/gallery" label="Send empties" />}
        />
        <Skeleton />
      </Card>
    </>
  );
}
