/** `A`, `A and D`, `A, D and G`; past `most` the rest is counted: `A, D and 3 more`. */
export function listWords(words: readonly string[], joiner: 'and' | 'or' = 'and', most = Infinity): string {
  const rest = words.length - most;
  const shown = rest > 1 ? [...words.slice(0, most), `${rest} more`] : [...words];
  const last = shown.pop() ?? '';
  return shown.length === 0 ? last : `${shown.join(', ')} ${joiner} ${last}`;
}
