import { render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { z } from 'zod';
import { ProblemError } from '@/components/data/problem-error';
import { FormFrame } from '@/components/forms/FormFrame';
import { NumberField, TextField } from '@/components/forms/text-fields';
import { useDraftForm } from '@/components/forms/use-draft-form';
import { App, serveWith, sessionReply } from '../support';

const schema = z.object({ reference: z.string().trim().min(1).max(40), counted: z.int().min(0) });
type Values = z.output<typeof schema>;

function CountForm({ onSubmit }: { onSubmit: (values: Values) => Promise<unknown> }) {
  const draft = useDraftForm({
    name: 'count',
    schema,
    defaultValues: { reference: '', counted: null as never },
  });
  return (
    <FormFrame draft={draft} label="Count" submitLabel="Send count" onSubmit={onSubmit}>
      <TextField name="reference" label="Reference" />
      <NumberField name="counted" label="Counted" />
    </FormFrame>
  );
}

const show = (onSubmit: (values: Values) => Promise<unknown>) =>
  render(
    <App>
      <CountForm onSubmit={onSubmit} />
    </App>,
  );

const send = () => userEvent.click(screen.getByRole('button', { name: 'Send count' }));

beforeEach(() => {
  sessionStorage.clear();
  serveWith(() => sessionReply);
});

test('all bad fields show at once, each with a link that leads to it, and nothing is sent', async () => {
  const onSubmit = jest.fn(async () => undefined);
  show(onSubmit);
  await send();
  const summary = await screen.findByRole('alert');
  expect(summary).toHaveTextContent('2 things need another look');
  await userEvent.click(screen.getByRole('link', { name: /Counted:/ }));
  expect(screen.getByLabelText('Counted')).toHaveFocus();
  expect(screen.getByLabelText('Reference')).toHaveAccessibleDescription('This is needed.');
  expect(onSubmit).not.toHaveBeenCalled();
});

test('what was typed is there again after the page is left and opened anew, until it has been sent', async () => {
  const onSubmit = jest.fn(async () => undefined);
  const first = show(onSubmit);
  await userEvent.type(screen.getByLabelText('Reference'), 'DN-88013');
  await userEvent.type(screen.getByLabelText('Counted'), '392');
  first.unmount();
  const second = show(onSubmit);
  expect(await screen.findByDisplayValue('DN-88013')).toBeInTheDocument();
  expect(screen.getByLabelText('Counted')).toHaveValue('392');
  await send();
  await waitFor(() =>
    expect(onSubmit).toHaveBeenCalledWith({ reference: 'DN-88013', counted: 392 }, expect.anything()),
  );
  second.unmount();
  show(onSubmit);
  expect(screen.getByLabelText('Reference')).toHaveValue('');
});

test('pressed twice, it is sent once', async () => {
  let finish = () => undefined as void;
  const onSubmit = jest.fn(() => new Promise<void>((done) => (finish = done)));
  show(onSubmit);
  await userEvent.type(screen.getByLabelText('Reference'), 'DN-88013');
  await userEvent.type(screen.getByLabelText('Counted'), '392');
  await userEvent.dblClick(screen.getByRole('button', { name: 'Send count' }));
  await userEvent.type(screen.getByLabelText('Reference'), '{Enter}');
  finish();
  await waitFor(() => expect(screen.getByRole('button', { name: 'Send count' })).toBeEnabled());
  expect(onSubmit).toHaveBeenCalledTimes(1);
});

test('a field that the server refuses is marked at its place', async () => {
  const refused = new ProblemError('not valid', {
    status: 400,
    fields: [{ path: 'counted', message: 'Not above 400.' }],
  });
  show(async () => Promise.reject(refused));
  await userEvent.type(screen.getByLabelText('Reference'), 'DN-88013');
  await userEvent.type(screen.getByLabelText('Counted'), '500');
  await send();
  await waitFor(() => expect(screen.getByLabelText('Counted')).toHaveAccessibleDescription('Not above 400.'));
});

test('any other problem stands above the fields with its number to quote, and what was typed stays', async () => {
  show(async () => Promise.reject(new ProblemError('failed here', { status: 500, requestId: 'rq-20418' })));
  await userEvent.type(screen.getByLabelText('Reference'), 'DN-88013');
  await userEvent.type(screen.getByLabelText('Counted'), '392');
  await send();
  expect(await screen.findByRole('alert')).toHaveTextContent('rq-20418');
  expect(screen.getByLabelText('Reference')).toHaveValue('DN-88013');
});
