import { Redirect } from 'expo-router';
import { useState, type ReactNode } from 'react';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { useSession } from '../data/use-session';
import { Shell } from '../shell/Shell';
import { Announcer } from '../ui/Announcer';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { SignInDialog } from './SignInDialog';

/** Lets signed-in people in; sends others to sign in and back to where they wanted to go. */
export function KeepGate({ children }: { children: ReactNode }) {
  const { isPending, error, retry, signedIn } = useSession();
  // Taken at once: as long as no screen is shown, the router forgets which one was asked for.
  const [wanted] = useState(() => window.location.pathname + window.location.search);
  if (signedIn === null) {
    if (isPending) return <Waiting />;
    if (error) return <Unreached error={error} onRetry={() => void retry()} />;
    return <Redirect href={wanted === '/' ? '/sign-in' : `/sign-in?to=${encodeURIComponent(wanted)}`} />;
  }
  return (
    <>
      <Shell>{children}</Shell>
      <SignInDialog />
      <Announcer />
    </>
  );
}

function Waiting() {
  return (
    <Page title={text.ui.loading}>
      <Skeleton lines={5} />
    </Page>
  );
}

function Unreached({ error, onRetry }: { error: unknown; onRetry: () => void }) {
  return (
    <Page title={text.shell.product} narrow>
      <Problem error={error} onRetry={onRetry} />
    </Page>
  );
}
