import { useEffect, useRef } from 'react';
import { View } from 'react-native';
import { text } from '@/shared/text/catalogue';
import { Notice } from '../ui/Notice';
import { JumpLink } from '../ui/JumpLink';
import { fieldId, type ListedError } from './field-errors';

type Props = {
  form: string;
  errors: readonly ListedError[];
  labelOf: (path: string) => string | undefined;
  attempt: number;
};

/** At the top after a failed try: what needs another look, each a link to its field; it takes the focus and is read out. */
export function ErrorSummary({ form, errors, labelOf, attempt }: Props) {
  const box = useRef<View>(null);
  const some = errors.length > 0;
  useEffect(() => {
    if (attempt > 0 && some) (box.current as unknown as HTMLElement | null)?.focus();
  }, [attempt, some]);
  if (!some) return null;
  return (
    <View ref={box} tabIndex={-1}>
      <Notice kind="error" title={text.ui.errorsHead(errors.length)}>
        {errors.map((error) => {
          const label = labelOf(error.path);
          const words = label === undefined ? error.message : `${label}: ${error.message}`;
          return <JumpLink key={error.path} to={fieldId(form, error.path)} label={words} />;
        })}
      </Notice>
    </View>
  );
}
