import type { StatementContent } from '@/shared/domain/statement/content';

/** A statement on its way into a workbook; `issued` is null for a draft. Days of the operator. */
export type Sheeted = {
  content: StatementContent;
  sha256: string;
  issued: { on: string; answerBy: string } | null;
};
