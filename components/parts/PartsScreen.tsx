import type { ReactNode } from 'react';
import { listPool, type PoolRow } from '@/shared/contracts/pool';
import { downloadParts, listPartChoices, listParts, type PartRow } from '@/shared/contracts/parts';
import { text } from '@/shared/text/catalogue';
import { urlOf } from '../data/url-of';
import { useRead, useReadPages } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import { RecordList } from '../tables/RecordList';
import { useListState } from '../tables/use-list-state';
import { Box } from '../ui/Box';
import { ButtonLink } from '../ui/Link';
import { Page } from '../ui/Page';
import { Text } from '../ui/Text';
import { loopColumns, partColumns } from './part-columns';

const words = text.parts;

export function PartsScreen() {
  const { may } = useSignedIn();
  const add = may('plan pool') ? <ButtonLink href="/parts/new" label={words.add} /> : undefined;
  return (
    <Page title={words.title} action={add}>
      <Box gap="s">
        <Text variant="title">{words.partsHead}</Text>
        <Parts add={add} />
      </Box>
      <Box gap="s">
        <Text variant="title">{words.loopsHead}</Text>
        <Text variant="soft">{words.loopsLead}</Text>
        <Loops />
      </Box>
    </Page>
  );
}

function Parts({ add }: { add: ReactNode }) {
  const state = useListState({ filters: ['type', 'use'], sort: 'number' });
  const list = useReadPages(listParts, { query: state.query });
  const { data: choices } = useRead(listPartChoices);
  const { may } = useSignedIn();
  const filters = [
    {
      key: 'type',
      label: words.filter.type,
      options: (choices?.types ?? []).map(({ code, name }) => ({ value: code, label: name })),
    },
    {
      key: 'use',
      label: words.filter.use,
      options: (['in use', 'out of use'] as const).map((use) => ({ value: use, label: words.use[use] })),
    },
  ];
  return (
    <RecordList<PartRow>
      label={words.partsHead}
      list={list}
      columns={partColumns}
      rowKey={(row) => row.id}
      {...(may('plan pool') ? { rowHref: (row: PartRow) => `/parts/${row.id}` } : {})}
      state={state}
      filters={filters}
      searchLabel={words.search}
      downloads={[{ href: urlOf(downloadParts, { query: state.query }), label: text.ui.download }]}
      empty={{ ...words.empty, action: add }}
    />
  );
}

function Loops() {
  const { may } = useSignedIn();
  const list = useReadPages(listPool);
  return (
    <RecordList<PoolRow>
      label={words.loopsHead}
      list={list}
      columns={loopColumns}
      rowKey={(row) => row.type.code}
      rowHref={(row) => (may('plan pool') ? `/parts/loops/${row.type.code}` : `/pool/${row.type.code}`)}
      empty={text.pool.empty}
    />
  );
}
