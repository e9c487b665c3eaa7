import { existsSync, readFileSync } from 'node:fs';

/**
 * The demo people, one line each, below a line that names the columns.
 * @param {string} file
 * @returns {string[]}
 */
export function signInLines(file) {
  if (!existsSync(file)) return [];
  /** @type {{ email: string, password: string, name: string, role: string, company: string }[]} */
  const people = JSON.parse(readFileSync(file, 'utf8'));
  const cells = people.map(({ email, password, name, role, company }) => [
    email,
    password,
    `${name}, ${role}, ${company}`,
  ]);
  const rows = [['E-mail', 'Password', 'Demo person'], ...cells];
  const widths = [0, 1].map((column) => Math.max(...rows.map((row) => row[column]?.length ?? 0)));
  return rows.map((row) =>
    row
      .map((cell, column) => cell.padEnd(widths[column] ?? 0))
      .join('   ')
      .trimEnd(),
  );
}
