/** A limit as typed, in another of its reading's units. */
import type { LimitEntry } from './limits';
import { quantityOf } from './limitWords';
import { readNumber } from './numberText';
import { unitOf } from './units';

/** The same limit typed in another unit of its reading; a text that is no number stays as it is typed. */
export function limitInUnit(entry: LimitEntry, unitId: string): LimitEntry {
  const quantity = quantityOf(entry);
  const [from, to] = [unitOf(quantity, entry.unit), unitOf(quantity, unitId)];
  return { ...entry, unit: to.id, text: convertedText(entry.text, to.perCore / from.perCore) };
}

/** A typed number times a factor, with the decimal comma where it was typed with one; any other text as it is. */
export function convertedText(text: string, factor: number): string {
  const number = readNumber(text);
  if (!number.ok || factor === 1) return text;
  const plain = String(Number((number.value * factor).toPrecision(10)));
  return text.includes(',') && !text.includes('.') ? plain.replace('.', ',') : plain;
}
