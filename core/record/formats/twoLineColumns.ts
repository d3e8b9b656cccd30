/**
 * Two-line elements as text: finding the lines in a paste, and putting columns back in place.
 *
 * The format counts columns, so that a paste through a mail or a web page, which squeezes runs of
 * spaces, breaks it. The fields are laid out anew only where the decimal points have moved; the
 * checksum, which spaces do not change, then judges the result.
 */

export const lineLength = 69;

/** Name, line 1 and line 2 as far as found; every line trimmed, in capitals, with plain spaces. */
export interface FoundLines {
  readonly name: string | null;
  readonly line1: string | null;
  readonly line2: string | null;
  /** Lines beyond one set. */
  readonly surplus: number;
}

export function findLines(text: string): FoundLines {
  const lines = linesOfSet(splitLines(text));
  const first = lines[0] ?? '';
  const named = hasName(lines);
  const body = (named ? lines.slice(1) : lines).map((line) => restoreColumns(line.toUpperCase()));
  return {
    name: named && first !== '' ? first.replace(/^0 /, '').trim() : null,
    line1: body[0] ?? null,
    line2: body[1] ?? null,
    surplus: Math.max(0, body.length - 2),
  };
}

/** Number of the line, catalogue number, class or inclination, and most of a line. */
const beginnings = [/^1 +[\dA-Z]{1,5} ?[A-Z]? .{30}/i, /^2 +[\dA-Z]{1,5} +\d.{30}/i] as const;

/** With a text around the set, a mail, the two lines alone, where there is one set only; else all lines. */
function linesOfSet(lines: readonly string[]): readonly string[] {
  if (lines.length < 3) return lines;
  const [start, ...others] = setStarts(lines);
  if (start === undefined || others.length > 0) return lines;
  const isNamed = start === 1 && lines.length === 3;
  return isNamed ? lines : lines.slice(start, start + 2);
}

function setStarts(lines: readonly string[]): readonly number[] {
  return lines.flatMap((line, index) =>
    beginnings[0].test(line) && beginnings[1].test(lines[index + 1] ?? '') ? [index] : [],
  );
}

/** The two-line set in a text, without other lines around it; null where there is none. */
export function twoLineSetIn(text: string): string | null {
  const lines = splitLines(text);
  return setStarts(lines).length === 0 ? null : linesOfSet(lines).join('\n');
}

/** A set has a name line if its first two lines are not the numbered ones. */
function hasName([first = '', second = '', ...more]: readonly string[]): boolean {
  if (more.length > 0) return !(isNumbered(first, 1) && isNumbered(second, 2));
  return !/^[12] /.test(first) && !isNumbered(second, 2);
}

function isNumbered(line: string, number: 1 | 2): boolean {
  return line.startsWith(`${number} `);
}

function splitLines(text: string): readonly string[] {
  const lines = text
    .replace(/[\u2010-\u2013\u2212]/g, '-')
    .split(/[\r\n\u2028\u2029]+/)
    .map((line) => line.replace(/[\s\u200b\ufeff]/g, ' ').trim())
    // As mails quote.
    .map((line) => line.replace(/^(?:> ?)+/, ''))
    .filter((line) => line !== '');
  // Both lines run together, as some pages copy them.
  const joined = lines.length === 1 ? /^(1 .{67})\s*(2 .{67})$/.exec(lines[0] ?? '') : null;
  return joined ? [joined[1] ?? '', joined[2] ?? ''] : lines;
}

/** Columns, counted from 1, that hold a decimal point in a line that was not squeezed. */
const pointColumns = { 1: [24, 35], 2: [12, 21, 38, 47, 55] } as const;

function restoreColumns(line: string): string {
  const number = line.startsWith('1 ') ? 1 : 2;
  if (pointColumns[number].every((column) => line[column - 1] === '.')) return line;
  const fields = line.split(/ +/);
  return (number === 1 ? layLine1(fields) : layLine2(fields)) ?? line;
}

function layLine1(fields: readonly string[]): string | null {
  // The international designator may be blank.
  const [number, satellite, ...rest] = fields;
  const [designator, ...tail] = rest.length === 6 ? ['', ...rest] : rest;
  const [epoch, slope, curve, drag, type, count] = tail;
  if (!number || !satellite || tail.length !== 6 || designator === undefined) return null;
  if (!epoch || !slope || !curve || !drag || !type || !count) return null;
  const laid = [
    number.padEnd(2) + satellite.padStart(6),
    designator.padEnd(8),
    layEpoch(epoch),
    slope.padStart(10),
    curve.padStart(8),
    drag.padStart(8),
    `${type} ${count.padStart(5)}`,
  ].join(' ');
  return laid.length === lineLength ? laid : null;
}

/** Two digits of the year, then the day of the year with its point in column 24. */
function layEpoch(epoch: string): string {
  const point = epoch.indexOf('.');
  return epoch.slice(0, 2) + epoch.slice(2, point).padStart(3) + epoch.slice(point).padEnd(9);
}

function layLine2(fields: readonly string[]): string | null {
  const [number, satellite, inclination, node, eccentricity, perigee, anomaly, ...rest] = fields;
  if (!number || !satellite || !inclination || !node || !eccentricity || !perigee || !anomaly) return null;
  // Mean motion has eight decimals; the revolution number and the checksum may be joined to it.
  const motion = /^(\d{1,2}\.\d{8}) *(\d+)$/.exec(rest.join(' '));
  if (!motion) return null;
  const angles = [inclination, node].map((angle) => angle.padStart(8));
  const laid = [
    number,
    satellite.padStart(5),
    ...angles,
    eccentricity,
    perigee.padStart(8),
    anomaly.padStart(8),
    (motion[1] ?? '').padStart(11) + (motion[2] ?? '').padStart(6),
  ].join(' ');
  return laid.length === lineLength ? laid : null;
}

/** Sum of the digits of columns 1 to 68, a minus counting as 1, modulo 10; all else counts nothing. */
export function checksumOf(line: string): number {
  let sum = 0;
  for (const character of line.slice(0, lineLength - 1)) {
    if (character >= '0' && character <= '9') sum += Number(character);
    else if (character === '-') sum += 1;
  }
  return sum % 10;
}
