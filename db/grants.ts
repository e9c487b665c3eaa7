import type { Connection } from 'mysql2/promise';

/** Rows here are never changed or deleted by the server: its database user holds no right to. */
export const appendOnly = [
  'credits',
  'dispute_messages',
  'ledger_entries',
  'ledger_lines',
  'ledger_seals',
  'log',
  'partner_events',
  'settlements',
  'statement_steps',
] as const;

/** Gives the server's user what it needs on each table and no more. Repeatable. */
export async function grantToServer(owner: Connection, app: { user: string; host: string }): Promise<void> {
  const [rows] = await owner.query('SHOW FULL TABLES WHERE Table_type = "BASE TABLE"');
  const names = (rows as Record<string, string>[]).map((row) => Object.values(row)[0] ?? '');
  const grantee = `${owner.escape(app.user)}@${owner.escape(app.host)}`;
  for (const name of names) {
    if (name.startsWith('__')) continue;
    const rights = (appendOnly as readonly string[]).includes(name)
      ? 'SELECT, INSERT'
      : 'SELECT, INSERT, UPDATE, DELETE';
    await owner.query(`GRANT ${rights} ON ${owner.escapeId(name)} TO ${grantee}`);
  }
}
