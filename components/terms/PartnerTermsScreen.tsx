import type { AnswerOf } from '@/shared/contracts/operation';
import { readPartnerTerms } from '@/shared/contracts/terms';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { useRead } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { ButtonLink, Link } from '../ui/Link';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { Tag } from '../ui/Tag';
import { Text } from '../ui/Text';
import { SettingsCard } from './SettingsCard';
import { TypeTermsCard } from './TypeTermsCard';

const words = text.terms;
export type PartnerTermsPage = AnswerOf<typeof readPartnerTerms>;

/** All terms of a partner: what holds for it as a whole, then by type, newest first. */
export function PartnerTermsScreen({ partner }: { partner: string }) {
  const { company } = useSignedIn();
  const { data, error, refetch } = useRead(readPartnerTerms, { params: { partner } });
  const own = company.kind === 'partner';
  return (
    <Page
      title={own ? words.ownHead : data ? words.partnerHead(data.partner.name) : words.head}
      {...(own ? {} : { back: { href: '/terms', label: words.head } })}
      {...(data?.maySet ? { action: <ButtonLink href={`/terms/${partner}/set`} label={words.set} /> } : {})}
    >
      {data ? (
        <Body page={data} />
      ) : error ? (
        <Problem error={error} onRetry={() => void refetch()} />
      ) : (
        <Card>
          <Skeleton lines={8} tall />
        </Card>
      )}
    </Page>
  );
}

function Body({ page }: { page: PartnerTermsPage }) {
  return (
    <>
      <SettingsCard page={page} />
      {page.types.map((each) => (
        <TypeTermsCard key={each.type.code} page={page} terms={each} />
      ))}
      {page.otherTypes.length > 0 ? <OtherTypes page={page} /> : null}
    </>
  );
}

function OtherTypes({ page }: { page: PartnerTermsPage }) {
  return (
    <Card title={words.otherTypes}>
      {page.otherTypes.map(({ code, name, needed }) => (
        <Box key={code} row wrap spread="between">
          <Box gap="xs">
            <Text>{name}</Text>
            {needed ? <Tag tone="differs" label={words.noTermsNeeded} /> : null}
          </Box>
          {page.maySet ? (
            <Link
              href={`/terms/${page.partner.id}/set?type=${encodeURIComponent(code)}`}
              label={words.setFirst}
              name={words.setFor(name)}
            />
          ) : null}
        </Box>
      ))}
    </Card>
  );
}
