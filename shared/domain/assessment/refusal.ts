/** The closed list of what an assessment refuses (RULES 3.14 and the shape of its input). */
export type RefusalCode =
  | 'input not understood'
  | 'unknown currency'
  | 'period ends before it begins'
  | 'not whole minor units'
  | 'two terms from the same day'
  | 'id used twice'
  | 'unknown container type'
  | 'quantity not whole and positive'
  | 'no terms in force'
  | 'more lost than held'
  | 'more found than lost'
  | 'correction of nothing'
  | 'correction of another type'
  | 'corrected below zero'
  | 'figures too large'
  | 'identity broken';

/** What cannot be: the code to act on, the event it was found at (null where no event is to blame). */
export class CannotAssess extends Error {
  readonly code: RefusalCode;
  readonly eventId: string | null;

  constructor(code: RefusalCode, detail: { eventId: string | null; because: string }) {
    super(`${detail.eventId === null ? 'Assessment' : `Event ${detail.eventId}`}: ${detail.because}`);
    this.name = 'CannotAssess';
    this.code = code;
    this.eventId = detail.eventId;
  }
}
