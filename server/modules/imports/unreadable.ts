import { Problem } from '@/shared/problems/problems';

export type UnreadableWhy =
  | 'columns missing'
  | 'column twice'
  | 'no rows'
  | 'too many rows'
  | 'unpacks too large'
  | 'macros'
  | 'outside parts'
  | 'broken';

/** Refuses a file that is what its name says and still cannot be read. */
export function unreadable(why: UnreadableWhy, data: Record<string, string | number> = {}): Problem {
  return new Problem('file not readable', { data: { why, ...data } });
}

export function notAsNamed(): Problem {
  return new Problem('file not as named', { data: { wanted: 'sheet' } });
}
