/** Text for LIKE: what the person typed stands for itself, anywhere in the value. */
export function likeText(typed: string): string {
  return `%${typed.replace(/[\\%_]/g, '\\$&')}%`;
}
