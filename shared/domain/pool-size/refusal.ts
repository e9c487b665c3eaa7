/** The closed list of what the sizing refuses (RULES 7 and the shape of its input). */
export type SizingRefusal =
  | 'input not understood'
  | 'nothing goes out'
  | 'no time in the loop'
  | 'no unit left to use'
  | 'loop time spreads too widely'
  | 'no whole containers a day'
  | 'figures too large';

/** What cannot be sized: the code to act on, and where in the input it was found. */
export class CannotSize extends Error {
  readonly code: SizingRefusal;
  /** Dotted path into the input such as "legs.2.days.mean"; empty where no single field is to blame. */
  readonly at: string;

  constructor(code: SizingRefusal, detail: { at: string; because: string }) {
    super(`Pool size: ${detail.at === '' ? '' : `${detail.at}: `}${detail.because}`);
    this.name = 'CannotSize';
    this.code = code;
    this.at = detail.at;
  }
}
