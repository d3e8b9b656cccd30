/** Numbers as people read them: the one place that knows signs, digits, thousands and powers of ten. */

const minus = '\u2212';
const thinSpace = '\u2009';

/** Fixed digits, true minus sign, thin spaces between thousands, on request a plus; never "−0.00". */
export function formatNumber(value: number, { digits, plus = false }: { digits: number; plus?: boolean }): string {
  if (Number.isNaN(value)) return '–';
  const size = Math.abs(value);
  const text = Number.isFinite(value) ? fixed(size, digits) : '∞';
  const isZero = !/[1-9∞]/.test(text);
  const sign = isZero ? '' : value < 0 ? minus : plus ? '+' : '';
  return sign + text;
}

function fixed(size: number, digits: number): string {
  if (size >= 1e15) return scientific(size, 10);
  const [whole = '', fraction] = size.toFixed(digits).split('.');
  const grouped = whole.length > 4 ? whole.replace(/\B(?=(\d{3})+$)/g, thinSpace) : whole;
  return fraction === undefined ? grouped : `${grouped}.${fraction}`;
}

/** A number of a formula: so many significant digits, a power of ten where it is very large or small. */
export function formatSignificant(value: number, digits = 10): string {
  if (!Number.isFinite(value)) return formatNumber(value, { digits: 0 });
  if (value === 0) return '0';
  const size = Math.abs(value);
  const sign = value < 0 ? minus : '';
  if (size < 1e-3 || size >= 1e9) return sign + scientific(size, digits);
  return sign + trimmed(size.toPrecision(digits));
}

/** Anything that stands where a number was expected, to be quoted: with a true minus where it is a number. */
export function quotedNumber(value: unknown): string {
  return typeof value === 'number' && !Number.isNaN(value) ? formatSignificant(value) : String(value);
}

const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';

function scientific(size: number, digits: number): string {
  const [mantissa = '', exponent = '0'] = size.toExponential(digits - 1).split('e');
  const power = exponent
    .replace('+', '')
    .replace('-', '⁻')
    .replace(/\d/g, (digit) => superscripts.charAt(Number(digit)));
  return `${trimmed(mantissa)} × 10${power}`;
}

function trimmed(text: string): string {
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
}
