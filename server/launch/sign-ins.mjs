import { existsSync, readFileSync } from 'node:fs';

/**
 * The demo people, one line each, under their headings.
 * @param {string} file
 * @returns {string[]}
 */
export function signInLines(file) {
  if (!existsSync(file)) return [];
  /** @type {{ email: string, password: string, name: string, role: string, company: string }[]} */
  const people = JSON.parse(readFileSync(file, 'utf8'));
  const rows = people.map((person) => [
    person.email,
    person.password,
    `${person.name}, ${person.role}, ${person.company}`,
  ]);
  const widths = [0, 1].map((column) => Math.max(...rows.map((row) => row[column]?.length ?? 0)));
  return rows.map((row) =>
    row
      .map((cell, column) => cell.padEnd(widths[column] ?? 0))
      .join('  ')
      .trimEnd(),
  );
}
