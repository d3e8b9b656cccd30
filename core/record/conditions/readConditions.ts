/** From the wishes in a candidate to the solver's conditions, or a message at each field that is in the way. */
import type { OrbitCondition } from '../../design/conditions/registry';
import type { Candidate } from '../candidate';
import { fieldReader } from '../readFields';
import type { FieldError } from '../resolved';
import { type ConditionEntry, type ConditionField, conditionFields, conditionWords, settledElements } from './kinds';

export type ConditionErrors = Partial<Record<ConditionField, FieldError>>;

export type ReadCondition =
  | { readonly ok: true; readonly entry: ConditionEntry; readonly condition: OrbitCondition }
  | {
      readonly ok: false;
      readonly entry: ConditionEntry | null;
      readonly errors: ConditionErrors;
      readonly message?: string;
    };

/** Each wish of the candidate in turn. One that this version does not know is kept and said. */
export function readConditions({ conditions, entry }: Pick<Candidate, 'conditions' | 'entry'>): ReadCondition[] {
  return conditions.map((stored) => {
    const wish = conditionEntry(stored);
    if (wish === null) {
      const kind = String(stored['kind'] ?? 'without a kind').slice(0, 40);
      return { ok: false, entry: null, errors: {}, message: `This version does not know the condition “${kind}”.` };
    }
    const texts = Object.fromEntries(conditionFields.map((field) => [field, wish.texts[field] ?? '']));
    const reader = fieldReader(texts as Record<ConditionField, string>);
    const condition = conditionWords[wish.kind].read(reader, entry);
    return condition === null
      ? { ok: false, entry: wish, errors: reader.errors }
      : { ok: true, entry: wish, condition };
  });
}

/** The stored wish as one that this version knows; null for any other. Texts that are no text count as empty. */
export function conditionEntry(stored: Readonly<Record<string, unknown>>): ConditionEntry | null {
  const { kind, settles, texts } = stored;
  const known = (Object.keys(conditionWords) as OrbitCondition['kind'][]).find((each) => each === kind);
  if (known === undefined) return null;
  const given = typeof texts === 'object' && texts !== null ? (texts as Record<string, unknown>) : {};
  const pairs = conditionFields.flatMap((field) => (typeof given[field] === 'string' ? [[field, given[field]]] : []));
  return {
    kind: known,
    settles: settledElements.find((element) => element === settles) ?? conditionWords[known].settles,
    texts: Object.fromEntries(pairs) as ConditionEntry['texts'],
  };
}

/** A new wish of a kind, settling what it usually does unless that is taken. */
export function newCondition(
  kind: ConditionEntry['kind'],
  others: readonly ConditionEntry[],
  texts: ConditionEntry['texts'] = {},
): ConditionEntry {
  const taken = new Set(others.map(({ settles }) => settles));
  const usual = conditionWords[kind].settles;
  const settles = taken.has(usual) ? (settledElements.find((element) => !taken.has(element)) ?? usual) : usual;
  return { kind, settles, texts };
}
