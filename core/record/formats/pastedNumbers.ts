/**
 * Six numbers of a state vector among the other numbers of a text: by their labels; else the six there are; else the
 * one run of lines that holds six. Numbers stay the texts they are, signs and exponents made plain.
 */

export type NumbersFound =
  | {
      readonly ok: true;
      readonly numbers: readonly string[];
      /** The part of the text they stand in, for the units beside them. */
      readonly among: string;
    }
  | { readonly ok: false; readonly count: number; readonly severalStates: boolean };

export function sixNumbersIn(text: string): NumbersFound {
  const labelled = labelledNumbers(text);
  if (labelled !== null) return labelled;
  const plain = numbersIn(text);
  if (plain.length === 6) return { ok: true, numbers: plain, among: text };
  const runs = runsOfSix(text);
  const [run, ...others] = runs;
  if (run !== undefined && others.length === 0) return run;
  return { ok: false, count: plain.length, severalStates: runs.length > 1 };
}

const space = "[ \\u00a0\\u2009\\u202f'’]";
const grouped = `\\d{1,3}(?:${space}\\d{3})+(?!\\d)(?:[.,]\\d+)?|\\d{1,3}(?:,\\d{3}){2,}(?!\\d)(?:\\.\\d+)?|\\d{1,3}(?:,\\d{3})+\\.\\d+`;
const exponent = '(?:[eEdD][+-]?\\d+)?';
const labelledNumber = `[+-]? ?(?:${grouped}|\\d+[.,]?\\d*|[.,]\\d+)${exponent}`;
const unit = 'k?m(?:\\s*/\\s*s(?:ec)?|\\s*s\\^?-1)?';

/** `x`, `pos x`, `r_x`; `vx`, `vel x`, `v_x`, `x-dot`, `dx/dt`; then a unit, a sign of equality and the number. */
function labelPattern(axis: string, isSpeed: boolean): RegExp {
  const names = isSpeed
    ? `v[ _]?${axis}|vel(?:ocity)?[ _.-]?${axis}|${axis}[ _-]?dot|d${axis}/dt|${axis}'|${axis}\\u0307`
    : `(?<!(?:vel(?:ocity)?|\\bv)[ _.-]?)(?:pos(?:ition)?[ _.-]?|r[ _]?)?${axis}`;
  const unitBeside = `(?:\\s*[\\[(,]\\s*${unit}\\s*[\\])]?|\\s*${unit}(?=\\s*[:=]))?`;
  return new RegExp(
    `(?<![\\p{L}\\d_])(?:${names})["'|]?${unitBeside}[\\s|]*[:=]?[\\s|]*(${labelledNumber})(?!\\d)`,
    'giu',
  );
}

const labels = [false, true].flatMap((isSpeed) => ['x', 'y', 'z'].map((axis) => labelPattern(axis, isSpeed)));

/** Null where a label is missing; a label with two different numbers belongs to two states. */
function labelledNumbers(text: string): NumbersFound | null {
  const found = labels.map((label) => [...text.matchAll(label)]);
  if (found.some((matches) => matches.length === 0)) return null;
  const numbers = found.map((matches) => [...new Set(matches.map((match) => plain(match[1] ?? '')))]);
  if (numbers.some((texts) => texts.length > 1)) return { ok: false, count: 12, severalStates: true };
  const places = found.flatMap((matches) =>
    matches.map(({ index, 0: { length } }) => [index, index + length] as const),
  );
  const from = Math.min(...places.map(([start]) => start));
  const to = Math.max(...places.map(([, end]) => end));
  return { ok: true, numbers: numbers.map(([only = '']) => only), among: text.slice(from, to + 10) };
}

/** A number as a field can hold it: no space after a sign, E for D. */
function plain(number: string): string {
  return number
    .replace(/^([+-]) /, '$1')
    .replace(/d/i, 'e')
    .replace(/[.,]$/, '');
}

const pointNumber = /[+-]?(?:\d+\.?\d*|\.\d+)(?:[eEdD][+-]?\d+)?/g;
const commaNumber = /[+-]?(?:\d+(?:,\d+)?|,\d+)(?:[eEdD][+-]?\d+)?/g;

function numbersIn(text: string): readonly string[] {
  const bare = withoutLabels(text)
    .replace(/,(?=\s|$)/g, ' ')
    .replace(/([+-])\s+(?=[\d.,])/g, '$1');
  const pattern = hasDecimalCommas(bare) ? commaNumber : pointNumber;
  return (bare.match(pattern) ?? []).map((number) => number.replace(/d/i, 'e'));
}

/** Names and units out of the way, digits in them included: `r_1 =`, `X2:`, `km/s`, `km/s^2`. */
function withoutLabels(text: string): string {
  return text
    .replace(/k?m\s*\/\s*s(?:ec)?\b|k?m\s*[·*]?\s*s(?:\^?-1|⁻¹)/gi, ' ')
    .replace(/[[(]\s*\d\s*[\])]\s*(?=[=:])/g, ' ')
    .replace(/(^|[^\d.,\p{L}])\p{L}[\p{L}\d_]*(?:\s*\([^()\d]*\))?/gu, '$1 ')
    .replace(/(\d)\s*(?![eEdD][+-]?\d)\p{L}+/gu, '$1 ');
}

/**
 * Commas are decimal where no point is and each comma stands between two digits, with something
 * else to separate the numbers. "1,2,3" without a space is a list.
 */
function hasDecimalCommas(text: string): boolean {
  if (text.includes('.')) return false;
  const commas = text.match(/,/g)?.length ?? 0;
  const between = text.match(/\d,\d/g)?.length ?? 0;
  return commas > 0 && commas === between && (text.match(commaNumber) ?? []).length === 6 && !/\d,\d+,/.test(text);
}

const lineLabel =
  /(?<![\p{L}\d])(?:[rv]_?[xyz123]|[xyz]|pos(?:ition)?|vel(?:ocity)?|[rv])(?:\[\d\])?(?![\p{L}\d])\s*[:=]?/giu;
const lineUnit = new RegExp(`[\\[(]?(?<![\\p{L}])${unit}(?![\\p{L}])[\\])]?`, 'giu');

/** The numbers of a line that holds nothing else but labels and units; null where there are other words. */
function numericLine(line: string): readonly string[] | null {
  const bare = line
    .replace(lineUnit, ' ')
    .replace(lineLabel, ' ')
    .replace(/^[\s>|*[({]+|[\s|*\])}.,;]+$/g, '');
  if (bare === '') return [];
  const pieces = bare.split(/\s*[;|\t]\s*|,\s+|[\])}]\s*,?\s*[[({]|\s{2,}/).filter((piece) => piece !== '');
  const wholes = pieces.every((piece) => wholeNumber.test(piece)) ? pieces : bare.split(/[\s,;|]+/);
  return wholes.every((piece) => wholeNumber.test(piece)) ? wholes.map(plain) : null;
}

const wholeNumber = new RegExp(`^[+-]? ?(?:${grouped}|\\d+[.,]?\\d*|[.,]\\d+)${exponent}$`);

/** Runs of neighbouring lines of numbers alone that come to six; empty lines do not part them. */
function runsOfSix(text: string): Extract<NumbersFound, { ok: true }>[] {
  const runs: { numbers: string[]; lines: string[] }[] = [{ numbers: [], lines: [] }];
  for (const line of text.split(/[\r\n]+/)) {
    const numbers = numericLine(line);
    const run = runs.at(-1);
    if (numbers === null) runs.push({ numbers: [], lines: [] });
    else {
      run?.numbers.push(...numbers);
      run?.lines.push(line);
    }
  }
  return runs
    .filter(({ numbers }) => numbers.length === 6)
    .map(({ numbers, lines }) => ({ ok: true, numbers, among: lines.join('\n') }));
}
