import { type ContainerType, readContainerType } from '@/shared/contracts/container-types';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { useRead } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import { Card } from '../ui/Card';
import { ButtonLink, Link } from '../ui/Link';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { Tag } from '../ui/Tag';
import { Text } from '../ui/Text';
import { LoadsCard } from './LoadsCard';
import { PackingCard } from './PackingCard';
import { TypeFacts } from './TypeFacts';

const words = text.containerTypes;
const back = { href: '/container-types', label: words.title };

export function ContainerTypeScreen({ type }: { type: string }) {
  const { data, error, refetch } = useRead(readContainerType, { params: { type } });
  if (data) return <Loaded type={data} />;
  return (
    <Page title={words.one} back={back}>
      {error ? <Problem error={error} onRetry={() => void refetch()} /> : <Skeleton lines={8} tall />}
    </Page>
  );
}

function Loaded({ type }: { type: ContainerType }) {
  const { may } = useSignedIn();
  return (
    <Page
      title={type.name}
      kicker={`${words.kinds[type.kind]} · ${type.code}`}
      back={back}
      beside={type.active ? undefined : <Tag tone="open" label={words.use['out of use']} />}
      action={
        may('keep container types') ? (
          <ButtonLink href={`/container-types/${type.code}/change`} label={words.change} />
        ) : undefined
      }
      aside={
        <>
          <PackingCard type={type} />
          {may('see pool') ? (
            <Card>
              <Link href={`/pool/${type.code}`} label={words.pool} />
            </Card>
          ) : null}
        </>
      }
    >
      <LoadsCard type={type} />
      <TypeFacts type={type} />
      {type.onPallets.length > 0 ? <LayersCard type={type} /> : null}
    </Page>
  );
}

function LayersCard({ type }: { type: ContainerType }) {
  return (
    <Card title={words.onPallet}>
      {type.onPallets.map((pallet) => (
        <Text key={pallet.code} strong>
          {words.perLayer(pallet.perLayer, pallet.name)}
        </Text>
      ))}
      <Text variant="soft">{words.onPalletLead}</Text>
    </Card>
  );
}
