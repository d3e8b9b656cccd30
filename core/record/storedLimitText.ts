import { readingSpec } from './readings/readings';
import { unitOf } from './units';

/** A limit as it stands in the record, whether or not it can be read: "Perigee altitude at most 600 km". */
export function storedLimitText(stored: Readonly<Record<string, unknown>>): string {
  const { reading, bound, text, unit } = stored;
  const spec = readingSpec(reading);
  if (!spec) return 'a limit of another version';
  const { symbol } = unitOf(spec.quantity, String(unit));
  return `${spec.label} ${bound === 'atLeast' ? 'at least' : 'at most'} ${String(text) || 'empty'} ${symbol.replace(/^deg\b/, '°')}`.trim();
}
