/** Picks the form that English uses for a whole number. */
export function plural(count: number, forms: { one: string; other: string }): string {
  return Math.abs(count) === 1 ? forms.one : forms.other;
}
