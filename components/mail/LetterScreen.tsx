import { readLetter } from '@/shared/contracts/log';
import { text } from '@/shared/text/catalogue';
import { formatInstant } from '@/shared/text/format';
import { Problem } from '../data/Problem';
import { useRead } from '../data/use-operation';
import { Card } from '../ui/Card';
import { Link } from '../ui/Link';
import { Notice } from '../ui/Notice';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { Tag } from '../ui/Tag';
import { Text } from '../ui/Text';
import { letterTones } from './MailScreen';

const words = text.letters;

export function LetterScreen({ letter }: { letter: string }) {
  const { data, error, refetch } = useRead(readLetter, { params: { letter } });
  const back = { href: '/mail', label: words.title };
  if (!data) {
    return (
      <Page title={words.title} back={back} narrow>
        {error ? <Problem error={error} onRetry={() => void refetch()} /> : <Skeleton lines={6} tall />}
      </Page>
    );
  }
  const paragraphs = data.text === '' ? [words.gone] : data.text.split('\n\n');
  return (
    <Page
      title={data.subject}
      kicker={formatInstant(data.createdAt, 'UTC')}
      lead={words.to(data.toName, data.toAddress)}
      back={back}
      beside={<Tag tone={letterTones[data.state]} label={words.states[data.state]} />}
      narrow
    >
      {data.problem ? (
        <Notice kind="error" title={words.problem}>
          {data.problem}
        </Notice>
      ) : null}
      <Card>
        {paragraphs.map((paragraph, index) => (
          <Paragraph key={index} words={paragraph} />
        ))}
      </Card>
    </Page>
  );
}

/** A line that is an address leads to that page of this app, whatever host the reader's own letter names. */
function Paragraph({ words: said }: { words: string }) {
  if (!/^https?:\/\/\S+$/.test(said) || !URL.canParse(said)) return <Text>{said}</Text>;
  const { pathname, search } = new URL(said);
  return <Link href={`${pathname}${search}`} label={said} />;
}
