/**
 * Reads the texts of an entry, one field at a time, and collects a message at each field that is
 * in the way. Each reader returns null where it could not read, so that every field is looked at
 * and all messages appear together.
 */
import type { FieldId } from './candidate';
import { type NumberResult, readNumber } from './numberText';
import type { FieldError, Notice } from './resolved';
import { typedUnit } from './typedUnit';

/** A field by its name on screen and what it expects, as an end to "type …". */
export interface FieldWords<Field extends string = FieldId> {
  readonly field: Field;
  readonly label: string;
  readonly expected: string;
  /** The unit of the field; with it, or another of its kind, typed behind the number, the number is read in that. */
  readonly unit?: string | undefined;
  /** Which values can be meant here: where only one reading of "97,679" can, it is taken. */
  readonly meant?: (value: number) => boolean;
}

export interface FieldReader<Field extends string = FieldId> {
  readonly errors: Partial<Record<Field, FieldError>>;
  readonly notices: Notice[];
  text(field: Field): string;
  /** The number in the field, or null with a message left at the field. */
  number(words: FieldWords<Field>): number | null;
  /** As `number`, but an empty field is no error and gives undefined. */
  optionalNumber(words: FieldWords<Field>): number | null | undefined;
  /** Leaves a message at a field, the first one only; null, to be returned. */
  fail(field: Field, message: string): null;
  notice(notice: Notice): void;
}

/** A paste beyond this is no number and is not looked at. */
const longest = 400;

/** Larger than any length, rate or anomaly a person means; keeps every formula finite. */
const largest = 1e12;

export function fieldReader<Field extends string>(texts: Readonly<Record<Field, string>>): FieldReader<Field> {
  const errors: Partial<Record<Field, FieldError>> = {};
  const notices: Notice[] = [];
  const leave = (field: Field, error: FieldError): null => {
    errors[field] ??= error;
    return null;
  };
  const number = (words: FieldWords<Field>): number | null => {
    const text = texts[words.field];
    if (text.length > longest) return leave(words.field, tooLong(text, words));
    const typed = typedUnit(text.trim(), words.unit);
    const result = meantReading(readNumber(typed.number), words);
    if (result.ok && Math.abs(result.value * typed.factor) <= largest) return result.value * typed.factor;
    return leave(words.field, result.ok ? tooLarge(words) : numberError(result, words, { text, unit: typed.unit }));
  };
  return {
    errors,
    notices,
    text: (field) => texts[field].trim(),
    number,
    optionalNumber: (words) => (texts[words.field].trim() === '' ? undefined : number(words)),
    fail: (field, message) => leave(field, { message }),
    notice: (notice) => {
      notices.push(notice);
    },
  };
}

/** A number that reads two ways is not in doubt where only one of them can be meant in this field. */
function meantReading(result: NumberResult, { meant }: Pick<FieldWords, 'meant'>): NumberResult {
  if (result.ok || meant === undefined) return result;
  const [only, ...others] = (result.readings ?? []).filter(({ value }) => meant(value));
  return only !== undefined && others.length === 0 ? { ok: true, value: only.value } : result;
}

type Words = Pick<FieldWords, 'label' | 'expected' | 'unit'>;
type Unread = Extract<NumberResult, { ok: false }>;

interface Typed {
  readonly text: string;
  /** The unit behind the number, if one was typed. */
  readonly unit: string | null;
}

/** Each reading in words: "1.234 km (decimal)". */
function choicesOf(result: Unread, words: Words, typed: Typed): NonNullable<FieldError['choices']> {
  const unit = typed.unit ?? words.unit ?? '';
  const shown = unit === '°' || unit === '' ? unit : ` ${unit}`;
  return (result.readings ?? []).map(({ text }) => ({
    text: typed.unit === null ? text : `${text} ${typed.unit}`,
    label: `${text.replace('-', '\u2212')}${shown} (${text.includes('.') ? 'decimal' : 'thousands'})`,
  }));
}

function numberError(result: Unread, words: Words, typed: Typed): FieldError {
  const { text } = typed;
  const { label, expected } = words;
  switch (result.problem) {
    case 'empty':
      return { message: `${label} is empty; type ${expected}.` };
    case 'ambiguous':
      return {
        message: `${label}: “${quoted(text)}” can be read two ways; choose which is meant.`,
        choices: choicesOf(result, words, typed),
      };
    case 'tooLarge':
      return tooLarge(words);
    case 'notANumber':
      return { message: `${label}: “${quoted(text)}” is not a number; type ${expected}.` };
  }
}

function tooLong({ length }: string, { label, expected }: Words): FieldError {
  return { message: `${label} holds ${length} characters, which is no number; type ${expected}.` };
}

function tooLarge({ label, expected }: Words): FieldError {
  return { message: `${label} is too large a number; type ${expected}.` };
}

/** A typed text as a message can quote it. */
export function quoted(text: string): string {
  const trimmed = text.trim();
  return trimmed.length > 24 ? `${trimmed.slice(0, 24)}…` : trimmed;
}
