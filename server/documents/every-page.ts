type Page<Row> = { rows: readonly Row[]; next: string | null };

/** Reads a list to its end, a page by key at a time. */
export async function* everyPage<Row>(
  read: (asked: { limit: number; after?: string }) => Promise<Page<Row>>,
): AsyncGenerator<readonly Row[]> {
  let after: string | undefined;
  do {
    const page = await read({ limit: 200, ...(after === undefined ? {} : { after }) });
    yield page.rows;
    after = page.next ?? undefined;
  } while (after !== undefined);
}
