/** The value below which the given share of the values lies. */
export function quantile(values: readonly number[], share: number): number {
  const sorted = values.map(Math.abs).sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.ceil(share * sorted.length) - 1)] ?? Number.NaN;
}

export const median = (values: readonly number[]): number => quantile(values, 0.5);
export const worst = (values: readonly number[]): number => quantile(values, 1);
