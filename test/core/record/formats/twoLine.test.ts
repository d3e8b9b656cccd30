import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseTle, type TwoLineElements } from '../../../../core/record/formats/twoLine';
import { twoLineSetIn } from '../../../../core/record/formats/twoLineColumns';
import { catalogText, twoLineSets, withChecksum } from '../../../external/twoLineSets';

const line1 = withChecksum('1 70001U 27001A   27080.43750000  .00016717  00000-0  10270-3 0    9');
const line2 = withChecksum('2 70001  97.6790 208.9163 0011650  90.0000 270.0000 14.57107008   12');
const set = `${line1}\n${line2}`;

function read(text: string): TwoLineElements {
  const result = parseTle(text);
  if (!result.ok) throw new Error(result.errors.map(({ message }) => message).join('\n'));
  return result;
}

function messages(text: string): string {
  const result = parseTle(text);
  if (result.ok) throw new Error('expected a refusal');
  return result.errors.map(({ message }) => message).join('\n');
}

/** Overwrites columns, counted from 1, and mends the checksum. */
function edit(line: string, from: number, text: string): string {
  return withChecksum((line.slice(0, from - 1) + text + line.slice(from - 1 + text.length)).slice(0, 68));
}

describe('a well-formed set', () => {
  it('gives epoch, elements and what they are', () => {
    const result = read(set);
    expect(result).toMatchObject({ kind: 'mean', theory: 'SGP4', frame: 'TEME', catalogNumber: 70001 });
    expect(result.epochIso).toBe('2027-03-21T10:30:00Z');
    expect(result.epochJd).toBeCloseTo(2461485.9375, 8);
    expect(result.bstar).toBeCloseTo(1.027e-4, 12);
    expect(result.elements.eccentricity).toBe(0.001165);
    expect((result.elements.inclinationRad * 180) / Math.PI).toBeCloseTo(97.679, 10);
    expect(result.elements.semiMajorAxisKm).toBeGreaterThan(7070);
    expect(result.elements.semiMajorAxisKm).toBeLessThan(7090);
    expect(result).not.toHaveProperty('name');
  });

  it.each([
    ['Windows line ends', `${line1}\r\n${line2}\r\n`],
    ['old line ends', `${line1}\r${line2}\r`],
    ['blank lines and stray spaces', `\n\n   ${line1}   \n\n \t${line2} \n\n`],
    ['lower case', set.toLowerCase()],
    ['no-break spaces', set.replaceAll(' ', '\u00a0')],
    ['true minus signs', set.replaceAll('-', '\u2212')],
    ['a byte-order mark', `\ufeff${set}`],
    ['both lines run together', `${line1} ${line2}`],
    ['runs of spaces squeezed to one', set.replace(/ +/g, ' ')],
  ])('reads the same with %s', (_, text) => {
    const { name: __, ...result } = read(text);
    expect(result).toEqual(read(set));
  });

  it.each([
    [`SKERRY 1\n${set}`, 'SKERRY 1'],
    [`0 Skerry 1\r\n${set}`, 'Skerry 1'],
    [`1 SKERRY\n${set}`, '1 SKERRY'],
  ])('takes a line above as the name', (text, name) => {
    expect(read(text).name).toBe(name);
  });

  it.each([
    [5, 5],
    [99_999, 99_999],
    [100_000, 100_000],
    [182_345, 182_345],
    [339_999, 339_999],
  ])('reads catalogue number %d, with a letter from 100 000', (number, expected) => {
    const text = catalogText(number);
    expect(read(`${edit(line1, 3, text)}\n${edit(line2, 3, text)}`).catalogNumber).toBe(expected);
  });

  it('reads a catalogue number padded with spaces', () => {
    expect(read(`${edit(line1, 3, '    5')}\n${edit(line2, 3, '    5')}`).catalogNumber).toBe(5);
  });

  it.each([
    ['57001.00000000', '1957-01-01T00:00:00Z'],
    ['99365.50000000', '1999-12-31T12:00:00Z'],
    ['00366.00000000', '2000-12-31T00:00:00Z'],
    ['56001.00000000', '2056-01-01T00:00:00Z'],
  ])('puts epoch %s at %s', (epoch, iso) => {
    expect(read(`${edit(line1, 19, epoch)}\n${line2}`).epochIso).toBe(iso);
  });

  it('reads generated sets squeezed as it reads them whole', () => {
    for (const { line1: one, line2: two } of twoLineSets(120, 7)) {
      // Spaces lost behind the last decimal point look like a cut, and are refused as one.
      if (!/ {2}.*\./.test(two)) continue;
      expect(read(`${one}\n${two}`.replace(/ +/g, ' '))).toEqual(read(`${one}\n${two}`));
    }
  });

  it('accepts blank drag fields and counts', () => {
    const blank = edit(edit(edit(line1, 45, '        '), 54, '        '), 63, '      ');
    expect(read(`${blank}\n${line2}`).bstar).toBe(0);
  });
});

describe('a set in a mail', () => {
  const mail = `Hi,\nhere it is, 2 lines:\n\n${set}\n\nbye, call 030 123456`;
  it('is found between the other lines, quoted or not', () => {
    expect(read(mail)).toEqual(read(set));
    expect(read(mail.replace(/^/gm, '> '))).toEqual(read(set));
    expect(twoLineSetIn(mail)).toBe(set);
  });

  it('keeps its name line where there is nothing else', () => {
    expect(read(`SKERRY 1\n${set}`).name).toBe('SKERRY 1');
    expect(twoLineSetIn(`SKERRY 1\n${set}`)).toBe(`SKERRY 1\n${set}`);
  });

  it('is not chosen among several, nor seen where there is none', () => {
    expect(messages(`One\n${set}\ntwo\n${set}`)).not.toBe('');
    expect(twoLineSetIn('1 7078.1\n2 -12.5\n3 300')).toBeNull();
  });
});

describe('a set with something wrong', () => {
  it.each([
    ['', /no two-line elements here; expected two lines of 69/],
    ['hello', /no two-line elements here/],
    [line1, /Only one line of the set/],
    [`SKERRY\n${line1}`, /Only one line of the set/],
    [`${line2}\n${line1}`, /swapped/],
    [`${set}\n${set}`, /more lines than one set/],
    [`${line1.slice(0, 60)}\n${line2}`, /Line 1 is cut short or has lost spaces: it has 60 characters, expected 69/],
    [`${line1}\n${line2.slice(0, 68)}`, /Line 2 is cut short.* 68 characters/],
    [`${line1}\n${line2}7`, /Line 2 is too long: it has 70/],
    [`3${line1.slice(1)}\n${line2}`, /Line 1 begins with “3 ”; expected “1 ”/],
    [`${line1}\n${line1}`, /Line 2 begins with “1 ”; expected “2 ”/],
  ])('says so: %j', (text, message) => {
    expect(messages(text)).toMatch(message);
  });

  it('names line, column and both checksums', () => {
    const wrong = line2.replace('97.6790', '97.6791');
    expect(messages(`${line1}\n${wrong}`)).toMatch(
      /Line 2, column 69: the checksum reads “\d”, but the line adds up to \d/,
    );
  });

  it('notices every single wrong digit', () => {
    const columns = [...line2].flatMap((c, index) => (/\d/.test(c) ? [index] : []));
    fc.assert(
      fc.property(fc.constantFrom(...columns), fc.integer({ min: 1, max: 9 }), (index, step) => {
        const digit = (Number(line2[index]) + step) % 10;
        expect(parseTle(`${line1}\n${line2.slice(0, index)}${digit}${line2.slice(index + 1)}`).ok).toBe(false);
      }),
    );
  });

  it('wants both lines to belong to one object', () => {
    expect(messages(`${line1}\n${edit(line2, 3, '70002')}`)).toMatch(
      /different objects: 70001 in line 1, 70002 in line 2/,
    );
  });

  it.each(['I0001', 'O0001', '7 001', 'AB001'])('refuses the catalogue number %s', (text) => {
    expect(messages(`${edit(line1, 3, text)}\n${edit(line2, 3, text)}`)).toMatch(
      /columns 3 to 7.*expected five digits/,
    );
  });

  it.each([
    ['27000.50000000', /no day 000.50000000 in 2027; expected 1 to 365/],
    ['27366.00000000', /no day 366/],
    ['28367.00000000', /expected 1 to 366/],
    ['2x080.50000000', /columns 19 to 20: the epoch year reads “2X”/],
    ['27 8x.50000000', /columns 21 to 32: the epoch day/],
  ])('refuses the epoch %s', (epoch, message) => {
    expect(messages(`${edit(line1, 19, epoch)}\n${line2}`)).toMatch(message);
  });

  it.each([
    [9, ' 181.000', /columns 9 to 16: the inclination reads “181.000”; expected degrees from 0 to 180/],
    [9, ' 97,6790', /inclination/],
    [18, '361.0000', /right ascension of the node.*0 to 360/],
    [27, '00 1650', /columns 27 to 33: the eccentricity reads “00 1650”; expected seven digits without a point/],
    [35, ' -1.0000', /argument of perigee/],
    [44, 'NaN     ', /mean anomaly reads “NAN”/],
    [53, ' 0.00000000', /mean motion.*revolutions a day above 0/],
    [64, '  x12', /revolution number/],
  ])('points at column %d of line 2 reading "%s"', (column, text, message) => {
    expect(messages(`${line1}\n${edit(line2, column, text)}`)).toMatch(message);
  });

  it.each([
    [34, ' .000x6717', /change of mean motion/],
    [45, ' 0000a-0', /second change of mean motion/],
    [54, ' 1027--3', /drag term/],
    [63, 'x', /column 63: the ephemeris type/],
    [65, '  x9', /element set number/],
  ])('points at column %d of line 1 reading "%s"', (column, text, message) => {
    expect(messages(`${edit(line1, column, text)}\n${line2}`)).toMatch(message);
  });

  it('gathers all faults of both lines', () => {
    const text = `${edit(line1, 54, ' 1027--3')}\n${edit(edit(line2, 9, ' 181.000'), 18, '361.0000')}`;
    const result = parseTle(text);
    expect(result.ok ? [] : result.errors.map(({ line }) => line)).toEqual([1, 2, 2]);
  });

  it('refuses a huge paste by its size, at once', () => {
    expect(messages('1 '.repeat(5_000_000))).toMatch(/has 10000000 characters; expected two lines of 69/);
  });

  it('is never taken for a whole set when cut anywhere', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: set.length - 1 }), (length) => {
        expect(parseTle(set.slice(0, length)).ok).toBe(false);
        expect(parseTle(set.slice(0, length).replace(/ +$/, '')).ok).toBe(false);
      }),
    );
  });

  it('never throws, whatever is pasted', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme', maxLength: 300 }), (text) => {
        expect(typeof parseTle(text).ok).toBe('boolean');
        expect(typeof parseTle(`1 ${text}\n2 ${text}`).ok).toBe('boolean');
      }),
    );
  });
});
