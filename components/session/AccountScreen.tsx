import { changePassword, signOut } from '@/shared/contracts/session';
import { text } from '@/shared/text/catalogue';
import { callApi } from '../data/call-api';
import { ProblemError } from '../data/problem-error';
import { useSignedIn } from '../data/use-session';
import { dropAllDrafts } from '../forms/draft';
import { FormFrame } from '../forms/FormFrame';
import { TextField } from '../forms/text-fields';
import { useDraftForm } from '../forms/use-draft-form';
import { useTheme, type ThemeChoice } from '../theme/use-theme';
import { announce } from '../ui/Announcer';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { Card } from '../ui/Card';
import { Choice } from '../ui/Choice';
import { Page } from '../ui/Page';
import { Text } from '../ui/Text';

async function leave() {
  // Whoever is signed out already only has to leave.
  await callApi(signOut).catch((error: unknown) => {
    if (!(error instanceof ProblemError) || error.code !== 'not signed in') throw error;
  });
  dropAllDrafts();
  // A fresh page, so that nothing read before stays in memory.
  window.location.assign('/sign-in');
}

export function AccountScreen() {
  const { person, company } = useSignedIn();
  const { choice, choose } = useTheme();
  return (
    <Page title={text.session.accountHead} narrow>
      <Card title={person.name}>
        <Text>{person.email}</Text>
        <Text variant="soft">
          {company.name} · {person.roles.map((role) => text.session.role[role]).join(', ')}
        </Text>
        <Button kind="secondary" label={text.session.signOut} onPress={() => void leave()} />
      </Card>
      <Card>
        <Choice<ThemeChoice>
          label={text.session.theme}
          value={choice}
          onChange={choose}
          options={[
            { value: 'device', label: text.session.themeDevice },
            { value: 'light', label: text.session.themeLight },
            { value: 'dark', label: text.session.themeDark },
          ]}
        />
      </Card>
      <Card title={text.session.changeHead}>
        <ChangePassword />
      </Card>
    </Page>
  );
}

function ChangePassword() {
  const draft = useDraftForm({
    name: 'change-password',
    schema: changePassword.body!,
    keep: false,
    defaultValues: { current: '', password: '' },
  });
  const send = async (values: { current: string; password: string }) => {
    await callApi(changePassword, { body: values });
    draft.startFresh();
    announce(text.session.changed);
  };
  return (
    <Box gap="m">
      <FormFrame
        draft={draft}
        label={text.session.changeHead}
        submitLabel={text.session.changeSubmit}
        onSubmit={send}
      >
        <TextField
          name="current"
          label={text.session.currentPassword}
          type="password"
          autoComplete="current-password"
        />
        <TextField
          name="password"
          label={text.session.newPassword}
          type="password"
          autoComplete="new-password"
        />
      </FormFrame>
    </Box>
  );
}
