import { Button } from './Button';
import { Notice } from './Notice';
import { Text } from './Text';
import { text } from '@/shared/text/catalogue';

type Props = { sentence: string; quote?: string | undefined; onRetry?: (() => void) | undefined };

/** What happened, what is safe, what to do, and a number to quote. */
export function ProblemNotice({ sentence, quote, onRetry }: Props) {
  return (
    <Notice kind="error">
      <Text>{sentence}</Text>
      {quote === undefined ? null : <Text variant="small">{quote}</Text>}
      {onRetry === undefined ? null : <Button kind="secondary" label={text.ui.tryAgain} onPress={onRetry} />}
    </Notice>
  );
}
