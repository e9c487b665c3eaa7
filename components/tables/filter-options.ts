/** Choices of a filter from the words of its values, in the words' order. */
export function optionsOf(labels: Record<string, string>): { value: string; label: string }[] {
  return Object.entries(labels).map(([value, label]) => ({ value, label }));
}
