import { readNumber } from '../numberText';

/**
 * Hours of a local time typed as hh:mm, hh:mm:ss (seconds with a fraction), 10h30, 1030 or decimal hours; null if it
 * is none.
 */
export function readLocalTime(text: string): number | null {
  const clock =
    /^(\d{1,2})\s*[:hH]\s*(\d{1,2})(?:\s*[:mM'’]\s*(\d{1,2}(?:[.,]\d{1,9})?)(?:\s*[sS])?|\s*m(?:in)?)?$/.exec(
      text.trim(),
    ) ?? /^(\d{2})(\d{2})$/.exec(text.trim());
  if (clock) {
    const [, hours = '', minutes = '', seconds = '0'] = clock;
    const [h, m, s] = [Number(hours), Number(minutes), Number(seconds.replace(',', '.'))];
    return h < 24 && m < 60 && s < 60 ? h + m / 60 + s / 3600 : null;
  }
  const decimal = readNumber(text);
  return decimal.ok && decimal.value >= 0 && decimal.value < 24 ? decimal.value : null;
}

/**
 * Hours as hh:mm, with seconds and as few decimals of one as serve: within 1.5 ms of the value, and so that `keeps`
 * holds for the hours written.
 */
export function localTimeText(hours: number, keeps: (written: number) => boolean = () => true): string {
  const serves = (decimals: number) => {
    const written = Number((hours * 3600).toFixed(decimals)) / 3600;
    return decimals === finest || (Math.abs(written - hours) * 3600 <= 1.5e-3 && keeps(written));
  };
  const decimals = [0, 1, 2, 3, 4, 5, 6].find(serves) ?? finest;
  const unit = 10 ** decimals;
  const total = Math.round(hours * 3600 * unit) % (86_400 * unit);
  const seconds = (total / unit) % 60;
  const clock = [Math.floor(total / unit / 3600), Math.floor(total / unit / 60) % 60].map(two).join(':');
  return seconds === 0 ? clock : `${clock}:${two(Math.floor(seconds))}${seconds.toFixed(decimals).replace(/^\d+/, '')}`;
}

const finest = 6;
const two = (part: number): string => String(part).padStart(2, '0');
