/** A number as a message names it: no more digits than typed, true minus sign, no thousands separator. */
export function plainNumber(value: number): string {
  return String(Number(value.toPrecision(12))).replace(/-/g, '−');
}
