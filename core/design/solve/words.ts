import { formatNumber } from '../../numerics/numberWords';

export function kmText(km: number): string {
  return `${formatNumber(km, { digits: 0 })} km`;
}

export function eccentricityText(eccentricity: number): string {
  return eccentricity === 0 ? '0' : formatNumber(eccentricity, { digits: 4 });
}

/** A cosine beyond ±1, with as many digits as tell it from ±1. */
export function cosineText(cosine: number): string {
  const digits = Math.ceil(-Math.log10(Math.abs(cosine) - 1));
  return formatNumber(cosine, { digits: Math.min(12, Math.max(2, digits)) });
}
