import { ProblemNotice } from '../ui/ProblemNotice';
import { problemMessage } from './problem-message';

/** Whatever was thrown, in words. */
export function Problem({ error, onRetry }: { error: unknown; onRetry?: () => void }) {
  const { sentence, quote } = problemMessage(error);
  return <ProblemNotice sentence={sentence} quote={quote} onRetry={onRetry} />;
}
