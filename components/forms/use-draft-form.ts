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
  const owner = keep ? person?.id : undefined;
  const [restored, setRestored] = useState(false);
  const finished = useRef(false);
  const form = useForm<Typed<Schema>, unknown, z.output<Schema>>({
    resolver: zodResolver(schema as never, { error: fieldMessage } as never) as unknown as Resolver<
      Typed<Schema>,
      unknown,
      z.output<Schema>
    >,
    defaultValues,
    mode: 'onSubmit',
    reValidateMode: 'onChange',
    shouldFocusError: false,
  });

  useEffect(() => {
    if (owner === undefined) return undefined;
    const place = { name, person: owner };
    finished.current = false;
    const draft = readDraft(place);
    if (draft !== undefined) {
      form.reset({ ...(defaultValues as object), ...draft } as Typed<Schema>, { keepDefaultValues: true });
      setRestored(true);
    }
    const watching = form.watch((values) => {
      if (!finished.current) keepDraft(place, values);
    });
    return () => watching.unsubscribe();
    // The first default values count; later renders must not overwrite what is being typed.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [form, name, owner]);

  const forget = () => {
    if (owner !== undefined) dropDraft({ name, person: owner });
    setRestored(false);
  };
  return {
    name,
    form,
    restored,
    startFresh: () => {
      finished.current = true;
      form.reset(defaultValues as Typed<Schema>);
      finished.current = false;
      forget();
    },
    finish: () => {
      finished.current = true;
      form.reset(form.getValues());
      forget();
    },
  };
}
