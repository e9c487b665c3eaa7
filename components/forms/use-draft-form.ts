import { zodResolver } from '@hookform/resolvers/zod';
import { useEffect, useRef, useState } from 'react';
import {
  useForm,
  type DefaultValues,
  type FieldValues,
  type Resolver,
  type UseFormReturn,
} from 'react-hook-form';
import type { z } from 'zod';
import { fieldMessage } from '@/shared/text/field-message';
import { useSession } from '../data/use-session';
import { dropDraft, keepDraft, readDraft } from './draft';

type Typed<Schema extends z.ZodType> = z.input<Schema> & FieldValues;

export type DraftForm<Schema extends z.ZodType = z.ZodType> = {
  name: string;
  form: UseFormReturn<Typed<Schema>, unknown, z.output<Schema>>;
  /** Whether values typed earlier were put back. */
  restored: boolean;
  /** Back to the empty form; what was kept is dropped. */
  startFresh: () => void;
  /** After success: nothing is dirty and nothing is kept. */
  finish: () => void;
};

type Options<Schema extends z.ZodType> = {
  schema: Schema;
  /** Tells drafts apart: one per form and subject, e.g. "count EM-104233". */
  name: string;
  defaultValues: DefaultValues<Typed<Schema>>;
  /** False for passwords: nothing is kept. */
  keep?: boolean;
};

const checkedBy = <Schema extends z.ZodType>(schema: Schema) =>
  zodResolver(schema as never, { error: fieldMessage } as never) as unknown as Resolver<
    Typed<Schema>,
    unknown,
    z.output<Schema>
  >;

type Keeping<Schema extends z.ZodType> = {
  form: DraftForm<Schema>['form'];
  place: { name: string; person: string | undefined };
  defaultValues: DefaultValues<Typed<Schema>>;
};

/** Puts back what was typed earlier, then keeps every change until the form is finished. */
function useKept<Schema extends z.ZodType>({ form, place, defaultValues }: Keeping<Schema>) {
  const { name, person } = place;
  const [restored, setRestored] = useState(false);
  const finished = useRef(false);
  useEffect(() => {
    if (person === undefined) return undefined;
    finished.current = false;
    const draft = readDraft({ name, person });
    if (draft !== undefined) {
      form.reset({ ...(defaultValues as object), ...draft } as Typed<Schema>, { keepDefaultValues: true });
      setRestored(true);
    }
    const watching = form.watch((values) => {
      if (!finished.current) keepDraft({ name, person }, values);
    });
    return () => watching.unsubscribe();
    // The first default values count; later renders must not overwrite what is being typed.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [form, name, person]);

  /** Resets without keeping that as a change, and drops what was kept. */
  const dropAnd = (reset: () => void, { ended }: { ended: boolean }) => {
    finished.current = true;
    reset();
    finished.current = ended;
    if (person !== undefined) dropDraft({ name, person });
    setRestored(false);
  };
  return { restored, dropAnd };
}

/**
 * A form whose typed values survive an error, a reload and a new sign-in. Checked by the contract's own schema;
 * errors show after the first try to send, then as the person types.
 */
export function useDraftForm<Schema extends z.ZodType>({
  schema,
  name,
  defaultValues,
  keep = true,
}: Options<Schema>): DraftForm<Schema> {
  const { person } = useSession();
  const form = useForm<Typed<Schema>, unknown, z.output<Schema>>({
    resolver: checkedBy(schema),
    defaultValues,
    mode: 'onSubmit',
    reValidateMode: 'onChange',
    shouldFocusError: false,
  });
  const place = { name, person: keep ? person?.id : undefined };
  const { restored, dropAnd } = useKept<Schema>({ form, place, defaultValues });
  return {
    name,
    form,
    restored,
    startFresh: () => dropAnd(() => form.reset(defaultValues as Typed<Schema>), { ended: false }),
    finish: () => dropAnd(() => form.reset(form.getValues()), { ended: true }),
  };
}
