import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readStateText } from '../../../../core/record/formats/stateText';

const six = ['7078.1', '-12.5', '300', '0.01', '-7.4', '1.05'];

function numbersOf(text: string): readonly string[] {
  const result = readStateText(text);
  if (!result.ok) throw new Error(result.message);
  return result.numbers;
}

function messageOf(text: string): string {
  const result = readStateText(text);
  if (result.ok) throw new Error(`expected a refusal, got ${result.numbers.join(' ')}`);
  return result.message;
}

describe('readStateText', () => {
  it.each([
    ['spaces', '7078.1 -12.5 300 0.01 -7.4 1.05'],
    ['lines', '7078.1\r\n-12.5\r\n300\r\n0.01\r\n-7.4\r\n1.05\r\n'],
    ['commas', '7078.1,-12.5,300,0.01,-7.4,1.05'],
    ['commas and spaces', '7078.1, -12.5, 300, 0.01, -7.4, 1.05,'],
    ['semicolons and tabs', '7078.1;\t-12.5;300;0.01;\t-7.4;1.05'],
    ['brackets', '[7078.1, -12.5, 300], [0.01, -7.4, 1.05]'],
    ['labels', 'x= 7078.1 y = -12.5 z:300 vx: 0.01, vy=-7.4 vz=1.05'],
    ['labels with digits', 'r_1 = 7078.1; r_2 = -12.5; r_3 = 300; v1 = 0.01; v2 = -7.4; v3 = 1.05'],
    ['indices', 'r[0] = 7078.1 r[1] = -12.5 r[2] = 300 v(0) = 0.01 v(1) = -7.4 v(2) = 1.05'],
    ['units', 'X 7078.1 km, Y -12.5km, Z 300 km, VX 0.01 km/s VY -7.4km/s VZ 1.05 km s^-1'],
    ['units in brackets', 'X [km] 7078.1 Y (km) -12.5 Z 300 VX [km/s] 0.01 VY -7.4 VZ 1.05'],
    ['true minus signs', '7078.1 \u221212.5 300 0.01 \u22127.4 1.05'],
    ['a space after the sign', 'x = 7078.1 y = - 12.5 z = + 300 vx = 0.01 vy = \u2212 7.4 vz = 1.05'],
    ['named keys', '{"x": 7078.1, "y": -12.5, "z": 300, "vx": 0.01, "vy": -7.4, "vz": 1.05}'],
  ])('reads %s', (_, text) => {
    expect(numbersOf(text).map(Number)).toEqual(six.map(Number));
  });

  it('keeps decimal commas as typed where nothing else can be meant', () => {
    expect(numbersOf('7078,1 -12,5 300 0,01 -7,4 1,05')).toEqual(['7078,1', '-12,5', '300', '0,01', '-7,4', '1,05']);
    expect(numbersOf('7078,1; -12,5; 300; 0,01; -7,4; 1,05')).toHaveLength(6);
    expect(numbersOf('7078,1, -12,5, 300,0, 0,01, -7,4, 1,05')).toHaveLength(6);
  });

  it('takes commas without spaces as a list', () => {
    expect(numbersOf('7078,0,300,0,7,1')).toEqual(['7078', '0', '300', '0', '7', '1']);
  });

  it('reads exponents, a D for E among them', () => {
    expect(numbersOf('7.0781E+03 -1.25D1 3e2 1e-2 -7.4 1.05').map(Number)).toEqual(six.map(Number));
  });

  it.each([
    [`Epoch 2027-03-21T10:30:00.250Z ${six.join(' ')}`, '2027-03-21T10:30:00.250Z'],
    [`${six.join('\n')}\n2027-03-21 10:30:00 UTC`, '2027-03-21 10:30:00Z'],
    [`2027-03-21 ${six.join(' ')}`, '2027-03-21'],
    [`2027-03-21T10:30:00+02:00 ${six.join(' ')}`, '2027-03-21T10:30:00+02:00'],
  ])('finds the epoch in "%s"', (text, epochText) => {
    expect(readStateText(text)).toMatchObject({ ok: true, epochText, numbers: six });
  });

  it('guesses the unit from what is written, else from the size', () => {
    expect(readStateText(six.join(' '))).toMatchObject({ unitGuess: 'km' });
    expect(readStateText('7078100 -12500 300000 10 -7400 1050')).toMatchObject({ unitGuess: 'm' });
    expect(readStateText('x 1 m y 2 m z 3 m vx 4 m/s vy 5 m/s vz 6 m/s')).toMatchObject({ unitGuess: 'm' });
    expect(readStateText('0 0 0 0 0 0')).not.toHaveProperty('unitGuess');
  });

  it.each([
    ['', /no numbers here; expected six numbers/],
    ['hello', /no numbers here/],
    ['1', /is 1 number here/],
    ['1 2 3 4 5', /are 5 numbers here/],
    ['1 2 3 4 5 6 7', /are 7 numbers here/],
    ['7.'.repeat(5_000_000), /paste has 10000000 characters/],
  ])('refuses a paste and says what was expected', (text, message) => {
    expect(messageOf(text)).toMatch(message);
  });

  it('finds six numbers again between any of the usual separators', () => {
    const number = fc.double({ min: -1e5, max: 1e5, noNaN: true }).map((value) => value.toFixed(4));
    const separator = fc.constantFrom(' ', ', ', '; ', '\n', '\t', ',', ' | ');
    fc.assert(
      fc.property(fc.array(number, { minLength: 6, maxLength: 6 }), separator, (numbers, between) => {
        expect(numbersOf(numbers.join(between))).toEqual(numbers);
      }),
    );
  });

  it('never throws, whatever is pasted', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme' }), (text) => {
        expect(typeof readStateText(text).ok).toBe('boolean');
      }),
    );
  });
});
