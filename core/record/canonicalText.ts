import type { Candidate } from './candidate';

/**
 * JSON with keys in alphabetical order at every level, two-space indents and a final newline, so
 * that the same candidate always gives the same bytes, whatever order it was built in.
 */
export function canonicalText(candidate: Candidate): string {
  return `${JSON.stringify(sorted(candidate), null, 2)}\n`;
}

function sorted(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(sorted);
  if (typeof value !== 'object' || value === null) return value;
  const entries = Object.entries(value).filter(([, inner]) => inner !== undefined);
  return Object.fromEntries(entries.sort(byKey).map(([key, inner]) => [key, sorted(inner)]));
}

/** By code unit, not by language: the order must not depend on the tablet's locale. */
function byKey([a]: [string, unknown], [b]: [string, unknown]): number {
  return a < b ? -1 : a > b ? 1 : 0;
}
