import { balanceParts, readBalance } from '@/shared/contracts/balances';
import { text } from '@/shared/text/catalogue';
import { formatDay } from '@/shared/text/format';
import { Problem } from '../data/Problem';
import { useRead } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import { useListState } from '../tables/use-list-state';
import { Box } from '../ui/Box';
import { DateInput } from '../ui/DateInput';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { MadeOf } from './MadeOf';
import { Movements } from './Movements';

const words = text.balances;

type Props = { company: string; type: string };

/** One type of one company: what the number is made of, and the movements behind each part. */
export function BalanceScreen({ company, type }: Props) {
  const signedIn = useSignedIn();
  const state = useListState({ filters: ['part', 'asOf', 'site'] });
  const asOf = state.filters['asOf'] || undefined;
  const site = state.filters['site'] || undefined;
  const part = balanceParts.find((each) => each === state.filters['part']) ?? 'atSites';
  const read = useRead(readBalance, {
    params: { company, type },
    query: asOf === undefined ? {} : { asOf },
  });
  const balance = read.data;
  return (
    <Page
      title={balance ? words.detailHead(balance.typeName) : words.head[signedIn.company.kind]}
      {...(balance ? { kicker: balance.company } : {})}
      lead={asOf === undefined ? words.now : words.asOf(formatDay(asOf))}
      back={{ href: '/balances', label: words.head[signedIn.company.kind] }}
      beside={
        <Box least={180}>
          <DateInput
            label={words.filter.asOf}
            value={asOf ?? ''}
            onChange={(day) => state.set('asOf', day)}
          />
        </Box>
      }
    >
      {read.error && !balance ? <Problem error={read.error} onRetry={() => void read.refetch()} /> : null}
      {read.isPending ? <Skeleton lines={5} tall /> : null}
      {balance ? (
        <>
          <MadeOf balance={balance} part={part} />
          <Movements company={company} type={type} part={part} asOf={asOf} site={site} />
        </>
      ) : null}
    </Page>
  );
}
