import { text } from '@/shared/text/catalogue';
import { ButtonLink } from '../ui/Link';
import { Main } from '../ui/Landmarks';
import { Page } from '../ui/Page';
import { Text } from '../ui/Text';

export function NotFoundScreen() {
  return (
    <Main>
      <Page title={text.shell.notFoundHead} narrow>
        <Text>{text.shell.notFoundBody}</Text>
        <ButtonLink href="/" label={text.shell.toToday} />
      </Page>
    </Main>
  );
}
