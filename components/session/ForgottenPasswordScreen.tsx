import { useState } from 'react';
import { askForReset } from '@/shared/contracts/session';
import { text } from '@/shared/text/catalogue';
import { callApi } from '../data/call-api';
import { FormFrame } from '../forms/FormFrame';
import { TextField } from '../forms/text-fields';
import { useDraftForm } from '../forms/use-draft-form';
import { Card } from '../ui/Card';
import { Notice } from '../ui/Notice';
import { Page } from '../ui/Page';
import { BareFrame } from './BareFrame';

export function ForgottenPasswordScreen() {
  const [sent, setSent] = useState(false);
  return (
    <BareFrame>
      <Page
        title={text.session.resetHead}
        lead={text.session.resetBody}
        back={{ href: '/sign-in', label: text.session.head }}
        narrow
      >
        {sent ? (
          <Notice kind="success">{text.session.resetSent}</Notice>
        ) : (
          <ResetForm onSent={() => setSent(true)} />
        )}
      </Page>
    </BareFrame>
  );
}

function ResetForm({ onSent }: { onSent: () => void }) {
  const draft = useDraftForm({
    name: 'forgotten-password',
    schema: askForReset.body!,
    keep: false,
    defaultValues: { email: '' },
  });
  const send = async (values: { email: string }) => {
    await callApi(askForReset, { body: values });
    onSent();
  };
  return (
    <Card>
      <FormFrame
        draft={draft}
        label={text.session.resetHead}
        submitLabel={text.session.resetSubmit}
        onSubmit={send}
      >
        <TextField
          name="email"
          label={text.session.email}
          type="email"
          autoComplete="username"
          inputMode="email"
        />
      </FormFrame>
    </Card>
  );
}
