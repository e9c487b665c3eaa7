import type { ReactNode } from 'react';

/** A column of a list as data; the same columns make the table from 900 px on and the cards below. */
export type Column<Row> = {
  key: string;
  head: string;
  cell: (row: Row) => ReactNode;
  /** Figures stand at the right. */
  align?: 'start' | 'end';
  sortable?: boolean;
  width?: number | `${number}%`;
  /** A reference, a day: never broken over two lines. */
  whole?: boolean;
  /**
   * Where it goes on a card: "title" names the record and opens it, "aside" stands at the right of the title, "tag"
   * below it, "line" is a line of head and value, "hidden" is left out. "line" unless said.
   */
  cardRole?: 'title' | 'aside' | 'tag' | 'line' | 'hidden';
};

export type SortDirection = 'ascending' | 'descending' | undefined;

export function directionOf(sort: string | undefined, key: string): SortDirection {
  if (sort === key) return 'ascending';
  return sort === `-${key}` ? 'descending' : undefined;
}

/** The sort after the head of this column is pressed. */
export const nextSort = (sort: string | undefined, key: string) => (sort === key ? `-${key}` : key);
