import { formatNumber } from './units';

/** The time of a turn in words, to about three figures: as much as a rate of now is worth as a span. */
export function turnWords(days: number): string {
  if (days < 2) return shortTurn(days);
  if (days < 730) return `${formatNumber(days, { digits: days < 100 ? 1 : 0 })} days`;
  const years = days / 365.25;
  return `${formatNumber(years, { digits: years < 10 ? 1 : 0 })} years`;
}

function shortTurn(days: number): string {
  const [count, unit] = days * 24 < 2 ? [days * 1440, 'minutes'] : [days * 24, 'hours'];
  return `${formatNumber(count, { digits: Math.min(6, Math.max(0, 2 - Math.floor(Math.log10(count)))) })} ${unit}`;
}
