export type RuleName =
  'same reference' | 'split delivery' | 'combined delivery' | 'other site' | 'near reference' | 'same load';

export interface LineDifference {
  type: string;
  declared: number;
  counted: number;
  /** Counted less declared: negative when fewer came. */
  difference: number;
}

export interface Match {
  shipments: string[];
  receipts: string[];
  rule: RuleName;
  differences: LineDifference[];
}

/** An offer about documents left over. `score` runs from 0 to 1; `why` is one plain sentence. */
export interface Suggestion {
  shipments: string[];
  receipts: string[];
  rule: RuleName;
  score: number;
  why: string;
}

export interface DoubleEntry {
  receipt: string;
  of: string;
}

export interface Reconciliation {
  matches: Match[];
  suggestions: Suggestion[];
  duplicates: DoubleEntry[];
  waiting: string[];
  overdue: string[];
  unannounced: string[];
}
