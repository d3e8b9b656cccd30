/** Stepping the number in a text: arrow keys, buttons and drags all go through here. */
import { readNumber } from '../../core/index';

const decimalsOf = (text: string): number => /[.,](\d+)\s*$/.exec(text)?.[1]?.length ?? 0;

/** A comma is kept where it is the decimal mark of the text. */
const usesComma = (text: string): boolean => text.includes(',') && !text.includes('.');

/**
 * The text one or more steps on, with as many decimals as the text or the step has; null where the text is no
 * number or the step would leave `within`. The text is the state, so that no step is lost to rounding.
 */
export function stepped(text: string, step: number, count: number, within?: readonly [number, number]): string | null {
  const number = readNumber(text);
  if (!number.ok) return null;
  const decimals = Math.max(decimalsOf(text), decimalsOf(String(step)));
  const next = (number.value + step * count).toFixed(decimals);
  if (within && (Number(next) < within[0] || Number(next) > within[1])) return null;
  const plain = Number(next) === 0 ? next.replace('-', '') : next;
  const typed = usesComma(text) ? plain.replace('.', ',') : plain;
  // "1,500" could be thousands; one more decimal leaves no doubt.
  return readNumber(typed).ok ? typed : `${typed}0`;
}

const clockPattern = /^\s*(\d{1,2})(?:\s*[:hH]\s*)?(\d{2})(?::(\d{2}(?:[.,]\d+)?))?\s*$/;

/** The same for a local time of day, by minutes, wrapping at midnight; decimal hours become a clock. */
export function steppedClock(text: string, minutes: number): string | null {
  const parts = clockPattern.exec(text);
  const decimal = parts ? null : readNumber(text);
  if (!parts && !decimal?.ok) return null;
  const [, hours = '0', minute = '0', second] = parts ?? [];
  const typed = decimal?.ok ? Math.round(decimal.value * 60) : Number(hours) * 60 + Number(minute);
  const total = (((typed + minutes) % 1440) + 1440) % 1440;
  const clock = [Math.floor(total / 60), total % 60].map((part) => String(part).padStart(2, '0'));
  return [...clock, ...(second === undefined ? [] : [second])].join(':');
}

/** The text with its sign turned; tablet keypads lack a minus. */
export function signTurned(text: string): string {
  const plain = text.trim();
  if (/^[-−]/.test(plain)) return plain.slice(1);
  return `-${plain.replace(/^\+/, '')}`;
}
