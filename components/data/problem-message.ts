import { text } from '@/shared/text/catalogue';
import { ProblemError } from './problem-error';

/** The sentence for whatever was thrown, and the number to quote when the failure is ours. */
export function problemMessage(error: unknown): { sentence: string; quote: string | undefined } {
  if (!(error instanceof ProblemError))
    return { sentence: text.problems['failed here']({}), quote: undefined };
  return {
    sentence: text.problems[error.code](error.data),
    quote: error.requestId === undefined ? undefined : text.ui.quote(error.requestId),
  };
}
