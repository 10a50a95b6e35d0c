/** JSON with sorted keys and no spaces: the same content always gives the same text, and hash. */
export function canonicalJson(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map(canonicalJson).join(',')}]`;
  if (typeof value === 'object' && value !== null) {
    const entries = Object.entries(value)
      .filter(([, content]) => content !== undefined)
      .sort(([a], [b]) => (a < b ? -1 : 1))
      .map(([key, content]) => `${JSON.stringify(key)}:${canonicalJson(content)}`);
    return `{${entries.join(',')}}`;
  }
  return JSON.stringify(value);
}
