import { listImportMatches, matchStates, type ImportMatch } from '@/shared/contracts/import-results';
import { text } from '@/shared/text/catalogue';
import { useReadPages } from '../data/use-operation';
import { useListState } from '../tables/use-list-state';
import { Card } from '../ui/Card';
import { Page } from '../ui/Page';
import { Text } from '../ui/Text';
import { MatchSides } from './MatchSides';
import { PagedCards } from './PagedCards';

const words = text.imports;
const titles: Partial<Record<string, string>> = {
  'not posted': words.result.notPosted,
  accepted: words.result.accepted,
  refused: words.result.refused,
};

/** Matches of one file in one state, or by one rule. */
export function MatchesScreen({ id }: { id: string }) {
  const { query } = useListState({ filters: ['state', 'rule'] });
  const state = matchStates.find((known) => known === query.state) ?? 'matched';
  const list = useReadPages(listImportMatches, { params: { import: id }, query: { ...query, state } });
  const title = query.rule ? words.rule(query.rule) : (titles[state] ?? words.matches.head);
  return (
    <Page title={title} back={{ href: `/imports/${id}`, label: words.oneHead }}>
      <PagedCards<ImportMatch>
        list={list}
        rowKey={(match) => match.id}
        empty={words.matches.empty}
        card={(match) => (
          <Card title={words.rule(match.rule)} level={2}>
            <MatchSides match={match} />
            {match.why === '' ? null : <Text variant="soft">{match.why}</Text>}
            {match.problem ? <Text>{text.problems[match.problem.code](match.problem.data)}</Text> : null}
            {match.decidedBy ? <Text variant="soft">{words.matches.decidedBy(match.decidedBy)}</Text> : null}
          </Card>
        )}
      />
    </Page>
  );
}
