/**
 * Text for a string cell. A string cell is never a formula, whatever it begins with. What XML cannot carry is left
 * out, and what would be read back as an escaped character ("_x0041_" as "A", ECMA-376 part 1, 22.9.2.19) is escaped.
 */
export function cellText(text: string): string {
  return text
    .replace(/[\u0000-\u0008\u000b\u000c\u000e-\u001f\ufffe\uffff]/g, '')
    .replace(/_(?=x[0-9A-Fa-f]{4}_)/g, '_x005F_');
}
