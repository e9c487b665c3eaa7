import { decideSuggestions, listImportMatches, type ImportMatch } from '@/shared/contracts/import-results';
import { text } from '@/shared/text/catalogue';
import { formatShare } from '@/shared/text/format';
import { Problem } from '../data/Problem';
import { usePost, useReadPages } from '../data/use-operation';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { Card } from '../ui/Card';
import { Checkbox } from '../ui/Checkbox';
import { Notice } from '../ui/Notice';
import { Page } from '../ui/Page';
import { Text } from '../ui/Text';
import { MatchSides, nameOfPapers } from './MatchSides';
import { PagedCards } from './PagedCards';
import { useChosen } from './use-chosen';

const words = text.imports.suggestions;
type Decided = { decided: number; skipped: { id: string }[] };

/** What the comparison offers, surest first; several can be decided at once. */
export function SuggestionsScreen({ id }: { id: string }) {
  const list = useReadPages(listImportMatches, { params: { import: id }, query: { state: 'offered' } });
  const chosen = useChosen();
  const decide = usePost(decideSuggestions, { refreshes: ['shipments', 'differences', 'balances'] });
  const send = (decision: 'accept' | 'refuse') =>
    decide.mutate({ body: { decision, suggestions: [...chosen.ids] } }, { onSuccess: chosen.clear });
  const count = chosen.ids.length;
  const off = count === 0 || decide.isPending;
  const isEmpty = list.data?.pages.every((page) => page.rows.length === 0) ?? true;
  const actions = (
    <Box row wrap gap="m">
      <Button label={words.accept(count)} disabled={off} onPress={() => send('accept')} />
      <Button kind="secondary" label={words.refuse(count)} disabled={off} onPress={() => send('refuse')} />
    </Box>
  );
  return (
    <Page
      title={words.head}
      lead={words.lead}
      back={{ href: `/imports/${id}`, label: text.imports.oneHead }}
      {...(isEmpty ? {} : { action: actions })}
    >
      {decide.error ? <Problem error={decide.error} /> : null}
      {decide.data ? <Outcome outcome={decide.data as Decided} /> : null}
      <PagedCards<ImportMatch>
        list={list}
        rowKey={(match) => match.id}
        empty={words.empty}
        card={(match) => (
          <Card
            title={text.imports.rule(match.rule)}
            beside={<Text strong>{words.score(formatShare(match.score))}</Text>}
          >
            <MatchSides match={match} />
            <Text variant="soft">{match.why}</Text>
            <Checkbox
              label={words.choose(nameOfPapers(match.shipments), nameOfPapers(match.receipts))}
              value={chosen.has(match.id)}
              onChange={(value) => chosen.set(match.id, value)}
            />
          </Card>
        )}
      />
    </Page>
  );
}

function Outcome({ outcome }: { outcome: Decided }) {
  return (
    <Notice kind={outcome.skipped.length > 0 ? 'caution' : 'success'}>
      <Text>{words.decided(outcome.decided)}</Text>
      {outcome.skipped.length > 0 ? <Text>{words.skipped(outcome.skipped.length)}</Text> : null}
    </Notice>
  );
}
