import { Redirect } from 'expo-router';
import { text } from '@/shared/text/catalogue';
import { useSession } from '../data/use-session';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { Link } from '../ui/Link';
import { Page } from '../ui/Page';
import { BareFrame } from './BareFrame';
import { SignInForm } from './SignInForm';

/** Only a path of this app: an address from a link in a mail must not lead to another host. */
export const safePath = (to: string | undefined) => (to !== undefined && /^\/(?![/\\])/.test(to) ? to : '/');

export function SignInScreen({ to }: { to?: string | undefined }) {
  const { signedIn } = useSession();
  if (signedIn !== null) return <Redirect href={safePath(to)} />;
  return (
    <BareFrame>
      <Page title={text.session.head} lead={text.session.lead} narrow>
        <Card>
          <SignInForm name="sign-in" />
          <Box row>
            <Link href="/forgotten-password" label={text.session.forgot} />
          </Box>
        </Card>
      </Page>
    </BareFrame>
  );
}
