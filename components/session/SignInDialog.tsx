import { useSyncExternalStore } from 'react';
import { text } from '@/shared/text/catalogue';
import { gaveUpSigningIn, isSignInAsked, signedInAgain, subscribeSignedOut } from '../data/signed-out';
import { useSession } from '../data/use-session';
import { Dialog } from '../ui/Dialog';
import { Text } from '../ui/Text';
import { SignInForm } from './SignInForm';

/** Over the page whose session has ended: what was typed stays, and what waited goes on after signing in. */
export function SignInDialog() {
  const asked = useSyncExternalStore(subscribeSignedOut, isSignInAsked);
  const { person } = useSession();
  return (
    <Dialog open={asked} title={text.session.again} onClose={gaveUpSigningIn}>
      <Text variant="soft">{text.session.againBody}</Text>
      <SignInForm
        name="sign-in-again"
        email={person?.email ?? ''}
        onSignedIn={(answer) => {
          // Someone else must not go on with what this person typed.
          if (person !== null && answer.signedIn.person.id !== person.id) window.location.assign('/');
          else signedInAgain();
        }}
      />
    </Dialog>
  );
}
