import { signIn, type SignedIn } from '@/shared/contracts/session';
import { text } from '@/shared/text/catalogue';
import { callApi } from '../data/call-api';
import { useSession } from '../data/use-session';
import { FormFrame } from '../forms/FormFrame';
import { TextField } from '../forms/text-fields';
import { useDraftForm } from '../forms/use-draft-form';

type Answer = { csrfToken: string; signedIn: SignedIn };
type Props = { name: string; email?: string; onSignedIn?: (answer: Answer) => void };

/** E-mail and password; the same form on the page and in the dialog over a page. */
export function SignInForm({ name, email = '', onSignedIn }: Props) {
  const { keep } = useSession();
  const draft = useDraftForm({
    name,
    schema: signIn.body!,
    keep: false,
    defaultValues: { email, password: '' },
  });
  return (
    <FormFrame
      draft={draft}
      label={text.session.head}
      submitLabel={text.session.submit}
      onSubmit={async (values) => {
        const answer = (await callApi(signIn, { body: values })) as Answer;
        keep(answer);
        onSignedIn?.(answer);
      }}
    >
      <TextField
        name="email"
        label={text.session.email}
        type="email"
        autoComplete="username"
        inputMode="email"
      />
      <TextField
        name="password"
        label={text.session.password}
        type="password"
        autoComplete="current-password"
      />
    </FormFrame>
  );
}
