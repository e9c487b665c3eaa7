import { render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { z } from 'zod';
import { usePost } from '@/components/data/use-operation';
import { FormFrame } from '@/components/forms/FormFrame';
import { TextField } from '@/components/forms/text-fields';
import { useDraftForm } from '@/components/forms/use-draft-form';
import { SignInDialog } from '@/components/session/SignInDialog';
import { operation } from '@/shared/contracts/operation';
import { App, serveWith, sessionReply, signedIn } from '../support';

const schema = z.object({ reason: z.string().min(1) });
const settle = operation({
  name: 'settle',
  resource: 'differences',
  method: 'POST',
  path: '/differences',
  summary: 'Settle',
  body: schema,
  answer: z.object({ settled: z.literal(true) }),
});

function SettleForm() {
  const post = usePost(settle);
  const draft = useDraftForm({ name: 'settle', schema, defaultValues: { reason: '' } });
  return (
    <>
      <FormFrame
        draft={draft}
        label="Settle"
        submitLabel="Settle"
        onSubmit={(body) => post.mutateAsync({ body })}
      >
        <TextField name="reason" label="Reason" />
      </FormFrame>
      <SignInDialog />
    </>
  );
}

beforeAll(() => {
  // jsdom has the element, but not what it does.
  HTMLDialogElement.prototype.showModal = function showModal() {
    this.setAttribute('open', '');
  };
  HTMLDialogElement.prototype.close = function close() {
    this.removeAttribute('open');
  };
});

test('a session that ends in the middle of a form is signed in again over it, and the form goes once with the same key', async () => {
  let signedOut = true;
  const requests = serveWith(({ method, path }) => {
    if (path === '/api/session' && method === 'POST') {
      signedOut = false;
      return { body: { csrfToken: 'token-2', signedIn } };
    }
    if (path === '/api/session') return sessionReply;
    return signedOut
      ? { status: 401, body: { code: 'not signed in', status: 401, requestId: 'rq-1' } }
      : { body: { settled: true } };
  });
  render(
    <App>
      <SettleForm />
    </App>,
  );
  await userEvent.type(await screen.findByLabelText('Reason'), 'Counted twice by two people');
  await userEvent.click(screen.getByRole('button', { name: 'Settle' }));

  const dialog = await screen.findByRole('dialog', { name: 'Sign in again' });
  expect(screen.getByLabelText('Reason')).toHaveValue('Counted twice by two people');
  await userEvent.type(screen.getByLabelText('Password'), 'a long sentence');
  await userEvent.click(screen.getByRole('button', { name: 'Sign in' }));

  await waitFor(() => expect(dialog).not.toBeInTheDocument());
  const posts = requests.filter((request) => request.path === '/api/differences');
  await waitFor(() =>
    expect(requests.filter((request) => request.path === '/api/differences')).toHaveLength(2),
  );
  expect(posts[0]?.headers.get('idempotency-key')).toBeTruthy();
  const [first, second] = requests.filter((request) => request.path === '/api/differences');
  expect(second?.headers.get('idempotency-key')).toBe(first?.headers.get('idempotency-key'));
  expect(second?.headers.get('x-csrf-token')).toBe('token-2');
  expect(second?.body).toEqual({ reason: 'Counted twice by two people' });
});
