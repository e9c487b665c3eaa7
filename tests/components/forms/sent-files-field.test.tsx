import { render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { z } from 'zod';
import { FormFrame } from '@/components/forms/FormFrame';
import { SentFilesField } from '@/components/forms/SentFilesField';
import { useDraftForm } from '@/components/forms/use-draft-form';
import { App, serveWith, sessionReply } from '../support';

const id = (last: number) => `0b7c1c1e-6d1f-4d07-9d3a-1f0d0c6f7b${String(last).padStart(2, '0')}`;
const schema = z.object({
  files: z.array(z.object({ id: z.string(), name: z.string(), mediaType: z.string() })),
});
const paper = (name: string) => new File(['%PDF-1.4'], name, { type: 'application/pdf' });
const onSubmit = jest.fn(async (_values: z.output<typeof schema>) => undefined);

function Form() {
  const draft = useDraftForm({ name: 'papers', schema, defaultValues: { files: [] } });
  const [unsent, setUnsent] = useState(false);
  return (
    <FormFrame draft={draft} label="Papers" submitLabel="Send" onSubmit={onSubmit} disabled={unsent}>
      <SentFilesField name="files" label="Paper" onUnsent={setUnsent} />
    </FormFrame>
  );
}

const pick = (files: File[]) => userEvent.upload(screen.getByLabelText('+ paper: Paper'), files);

/** Answers each upload by its turn. */
function serve(answer: (turn: number) => { status?: number; body: unknown }) {
  let turn = 0;
  return serveWith(({ path, method }) => {
    if (path !== '/api/files' || method !== 'POST') return sessionReply;
    turn += 1;
    return answer(turn);
  });
}

const stored = (turn: number) => ({
  id: id(turn),
  name: `note ${turn}.pdf`,
  bytes: 8,
  mediaType: 'application/pdf',
});

beforeEach(() => {
  sessionStorage.clear();
  onSubmit.mockClear();
});

test('two files picked together are both kept and sent along', async () => {
  serve((turn) => ({ body: stored(turn) }));
  render(
    <App>
      <Form />
    </App>,
  );
  await pick([paper('a.pdf'), paper('b.pdf')]);
  expect(await screen.findByRole('link', { name: 'note 1.pdf' })).toBeInTheDocument();
  expect(await screen.findByRole('link', { name: 'note 2.pdf' })).toBeInTheDocument();
  await userEvent.click(screen.getByRole('button', { name: 'Send' }));
  await waitFor(() => expect(onSubmit).toHaveBeenCalledTimes(1));
  expect(onSubmit.mock.calls[0]?.[0].files.map((file) => file.id)).toEqual([id(1), id(2)]);
});

test('a file that did not arrive holds the form back until it is sent again or taken off', async () => {
  serve((turn) =>
    turn === 1
      ? { status: 503, body: { code: 'database away', status: 503, requestId: 'r1' } }
      : { body: stored(turn) },
  );
  render(
    <App>
      <Form />
    </App>,
  );
  await pick([paper('a.pdf')]);
  expect(await screen.findByText(/^a\.pdf was not sent\. Remove it or try again\./)).toBeInTheDocument();
  expect(screen.getByRole('button', { name: 'Send' })).toBeDisabled();
  await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
  expect(await screen.findByRole('link', { name: 'note 2.pdf' })).toBeInTheDocument();
  await waitFor(() => expect(screen.getByRole('button', { name: 'Send' })).toBeEnabled());
});
