import { readNumber } from '../numberText';

/** Hours of a local time typed as hh:mm, hh:mm:ss (seconds with a fraction) or decimal hours; null if it is none. */
export function readLocalTime(text: string): number | null {
  const clock = /^(\d{1,2})\s*:\s*(\d{1,2})(?:\s*:\s*(\d{1,2}(?:[.,]\d{1,9})?))?$/.exec(text.trim());
  if (clock) {
    const [, hours = '', minutes = '', seconds = '0'] = clock;
    const [h, m, s] = [Number(hours), Number(minutes), Number(seconds.replace(',', '.'))];
    return h < 24 && m < 60 && s < 60 ? h + m / 60 + s / 3600 : null;
  }
  const decimal = readNumber(text);
  return decimal.ok && decimal.value >= 0 && decimal.value < 24 ? decimal.value : null;
}

/** Hours as hh:mm:ss with as much of a fraction as is not zero; a microsecond is 4e-9 of a degree. */
export function localTimeText(hours: number): string {
  const total = Math.round(hours * 3.6e9) % (24 * 3.6e9);
  const seconds = (total / 1e6) % 60;
  const minutes = Math.floor(total / 6e7) % 60;
  const [whole = '0', fraction = ''] = seconds.toFixed(6).split('.');
  const tail = fraction.replace(/0+$/, '');
  const parts = [Math.floor(total / 3.6e9), minutes, whole].map((part) => String(part).padStart(2, '0'));
  return parts.join(':') + (tail === '' ? '' : `.${tail}`);
}
