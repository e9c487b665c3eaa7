import { useEffect, useMemo, useRef, useState, type ReactNode } from 'react';
import { FormProvider, type FieldValues, type Path } from 'react-hook-form';
import type { z } from 'zod';
import { text } from '@/shared/text/catalogue';
import { ProblemError } from '../data/problem-error';
import { Problem } from '../data/Problem';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { FormElement } from '../ui/FormElement';
import { ActionBar } from '../ui/Page';
import { Text } from '../ui/Text';
import { useIsWide } from '../theme/use-breakpoint';
import { ErrorSummary } from './ErrorSummary';
import { listErrors } from './field-errors';
import { FormPlaceContext } from './form-place';
import type { DraftForm } from './use-draft-form';

type Props<Schema extends z.ZodType> = {
  draft: DraftForm<Schema>;
  /** What the form is, for screen readers. */
  label: string;
  /** Sends the checked values; `typed` holds them as typed, files included. What it throws is shown, and nothing is lost. */
  onSubmit: (values: z.output<Schema>, typed: z.input<Schema>) => Promise<unknown>;
  submitLabel: string;
  children: ReactNode;
  /** Beside the main button: cancel, a second way. */
  more?: ReactNode;
  /** On a phone the button stands in the bar above the bottom bar. */
  inBar?: boolean;
  /** A line above the button: "1 of 3 lines left". */
  note?: ReactNode;
  disabled?: boolean;
};

function useWarnBeforeLeaving(dirty: boolean) {
  useEffect(() => {
    if (!dirty) return undefined;
    const warn = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', warn);
    return () => window.removeEventListener('beforeunload', warn);
  }, [dirty]);
}

/** Sends once however often it is pressed; a refused field is marked at its place, any other problem stands above. */
function useSending<Schema extends z.ZodType>({
  draft,
  onSubmit,
}: Pick<Props<Schema>, 'draft' | 'onSubmit'>) {
  const [busy, setBusy] = useState(false);
  const [problem, setProblem] = useState<unknown>();
  const [attempt, setAttempt] = useState(0);
  const underWay = useRef(false);
  const refuse = (error: unknown) => {
    if (!(error instanceof ProblemError) || error.fields.length === 0) return setProblem(error);
    for (const field of error.fields) {
      draft.form.setError(field.path as Path<z.input<Schema> & FieldValues>, {
        type: 'server',
        message: field.message,
      });
    }
    return undefined;
  };
  const send = async () => {
    if (underWay.current) return;
    underWay.current = true;
    setBusy(true);
    setProblem(undefined);
    try {
      await draft.form.handleSubmit(async (values) => {
        try {
          await onSubmit(values, draft.form.getValues());
          draft.finish();
        } catch (error) {
          refuse(error);
        }
      })();
    } finally {
      underWay.current = false;
      setBusy(false);
      setAttempt((count) => count + 1);
    }
  };
  return { busy, problem, attempt, send };
}

/** The frame of every form: summary of errors, fields, one button that posts once. */
export function FormFrame<Schema extends z.ZodType>({
  draft,
  label,
  onSubmit,
  children,
  ...actions
}: Props<Schema>) {
  const { busy, problem, attempt, send } = useSending({ draft, onSubmit });
  const labels = useRef(new Map<string, string>());
  const place = useMemo(
    () => ({
      name: draft.name,
      nameField: (path: string, words: string) => {
        labels.current.set(path, words);
      },
    }),
    [draft.name],
  );
  useWarnBeforeLeaving(draft.form.formState.isDirty && !busy);
  const errors = listErrors(draft.form.formState.errors);
  const labelOf = (path: string) => labels.current.get(path);
  return (
    <FormPlaceContext.Provider value={place}>
      <FormProvider {...draft.form}>
        <FormElement name={label} onSubmit={() => void send()}>
          <ErrorSummary form={draft.name} errors={errors} attempt={attempt} labelOf={labelOf} />
          {problem === undefined ? null : <Problem error={problem} />}
          {draft.restored ? <Restored draft={draft} /> : null}
          {children}
          <Actions {...actions} busy={busy} onSend={() => void send()} />
        </FormElement>
      </FormProvider>
    </FormPlaceContext.Provider>
  );
}

type ActionsProps = Pick<Props<z.ZodType>, 'submitLabel' | 'more' | 'inBar' | 'note' | 'disabled'> & {
  busy: boolean;
  onSend: () => void;
};

/** The one main button, and what stands beside it; on a phone below each other, in the bar if asked. */
function Actions({ submitLabel, more, inBar, note, disabled = false, busy, onSend }: ActionsProps) {
  const wide = useIsWide();
  const button = <Button label={submitLabel} busy={busy} disabled={disabled} full={!wide} onPress={onSend} />;
  if (inBar && !wide) {
    return (
      <ActionBar note={note}>
        {button}
        {more}
      </ActionBar>
    );
  }
  return (
    <Box gap="s">
      {note}
      <Box row={wide} wrap={wide} align={wide ? 'center' : 'stretch'} gap="m">
        {button}
        {more}
      </Box>
    </Box>
  );
}

function Restored({ draft }: { draft: Pick<DraftForm, 'startFresh'> }) {
  return (
    <Box row wrap gap="m">
      <Text variant="soft" role="status">
        {text.ui.draftKept}
      </Text>
      <Button kind="quiet" label={text.ui.startFresh} onPress={draft.startFresh} />
    </Box>
  );
}
