import { useState } from 'react';
import { choosePassword } from '@/shared/contracts/session';
import { text } from '@/shared/text/catalogue';
import { callApi } from '../data/call-api';
import { FormFrame } from '../forms/FormFrame';
import { TextField } from '../forms/text-fields';
import { useDraftForm } from '../forms/use-draft-form';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { ButtonLink } from '../ui/Link';
import { Notice } from '../ui/Notice';
import { Page } from '../ui/Page';
import { BareFrame } from './BareFrame';

/** Where the links of an invitation and of a forgotten password lead. */
export function ChoosePasswordScreen({ token }: { token?: string | undefined }) {
  const [chosen, setChosen] = useState(false);
  return (
    <BareFrame>
      <Page title={text.session.chooseHead} lead={text.session.chooseBody} narrow>
        {chosen ? (
          <Chosen />
        ) : token ? (
          <ChooseForm token={token} onChosen={() => setChosen(true)} />
        ) : (
          <NoToken />
        )}
      </Page>
    </BareFrame>
  );
}

function Chosen() {
  return (
    <Box gap="m">
      <Notice kind="success">{text.session.chosen}</Notice>
      <ButtonLink href="/sign-in" label={text.session.toSignIn} />
    </Box>
  );
}

function NoToken() {
  return (
    <Box gap="m">
      <Notice kind="error">{text.session.noToken}</Notice>
      <ButtonLink href="/forgotten-password" label={text.session.forgot} kind="secondary" />
    </Box>
  );
}

function ChooseForm({ token, onChosen }: { token: string; onChosen: () => void }) {
  const draft = useDraftForm({
    name: 'choose-password',
    schema: choosePassword.body!,
    keep: false,
    defaultValues: { token, password: '' },
  });
  const send = async (values: { token: string; password: string }) => {
    await callApi(choosePassword, { body: values });
    onChosen();
  };
  return (
    <Card>
      <FormFrame
        draft={draft}
        label={text.session.chooseHead}
        submitLabel={text.session.chooseSubmit}
        onSubmit={send}
      >
        <TextField
          name="password"
          label={text.session.newPassword}
          type="password"
          autoComplete="new-password"
        />
      </FormFrame>
    </Card>
  );
}
