/**
 * Brings a record of any older schema version to the one this code reads.
 *
 * Each step turns version n into n + 1. A record of a newer version is refused as it stands, so
 * that an older app never cuts off what it does not know.
 */
import { candidateSchema } from './candidate';

type RawRecord = Readonly<Record<string, unknown>>;
type Step = (record: RawRecord) => RawRecord;

/** `steps[0]` turns version 1 into version 2, and so on; none is needed yet. */
const steps: readonly Step[] = [];

export type Migration =
  | { readonly ok: true; readonly record: RawRecord }
  | { readonly ok: false; readonly reason: 'notARecord' | 'noVersion' | 'newer'; readonly message: string };

/** The record at the current schema version, or the reason why it cannot be brought there. */
export function migrateCandidate(input: unknown): Migration {
  return migrateThrough(input, steps, candidateSchema);
}

/** The chain itself, with its steps given, so that it can be tried before a second version exists. */
export function migrateThrough(input: unknown, chain: readonly Step[], target: number): Migration {
  if (typeof input !== 'object' || input === null || Array.isArray(input)) {
    return { ok: false, reason: 'notARecord', message: 'Expected a candidate: an object with a schema number.' };
  }
  let record = input as RawRecord;
  const version = record.schema;
  if (typeof version !== 'number' || !Number.isInteger(version) || version < 1) {
    return { ok: false, reason: 'noVersion', message: 'Expected a schema number, 1 or above.' };
  }
  if (version > target) {
    const message = `This candidate was written by a newer Driftbook (schema ${version}; this one reads up to ${target}). Update the app to open it; the record has not been changed.`;
    return { ok: false, reason: 'newer', message };
  }
  for (let from = version; from < target; from++) {
    const step = chain[from - 1];
    if (!step) throw new Error(`No migration step from schema ${from}; expected one up to ${target}`);
    record = { ...step(record), schema: from + 1 };
  }
  return { ok: true, record };
}
