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
    [`${six.join('\n')}\n2027-03-21 10:30:00 UTC`, '2027-03-21T10:30:00Z'],
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

  it.each([
    ['ECEF', 'earthFixed'],
    ['Earth-fixed axes (ITRF2014)', 'earthFixed'],
    ['Earth fixed', 'earthFixed'],
    ['EME2000 (J2000)', 'j2000'],
    ['frame: J2000.0', 'j2000'],
    ['GCRF', 'j2000'],
    ['TEME', 'teme'],
    ['mean equator and equinox of date', 'meanOfDate'],
    ['mean of date', 'meanOfDate'],
  ])('takes the axes from “%s”', (words, frameGuess) => {
    expect(readStateText(`${words}\n${six.join('\n')}`)).toMatchObject({ ok: true, frameGuess, numbers: six });
  });

  it.each(['', 'ECI', 'true of date', 'converted from J2000 to TEME'])('leaves the axes open at “%s”', (words) => {
    const result = readStateText(`${words}\n${six.join('\n')}`);
    expect(result.ok).toBe(true);
    expect(result).not.toHaveProperty('frameGuess');
  });

  const labelled = 'X = 7078.1 km\nY = -12.5 km\nZ = 300 km\nVX = 0.01 km/s\nVY = -7.4 km/s\nVZ = 1.05 km/s';
  it.each([
    ['a mail', `Hi, separation vector (state 12), mass 512 kg, call +44 1234 567890:\n${labelled}\nbye, 2 of us`],
    ['speeds as vel x', 'No. 3 pos x 7078.1 pos y -12.5 pos z 300 vel x 0.01 vel y -7.4 vel z 1.05 of 7'],
    ['speeds as x-dot', '9: X 7078.1 Y -12.5 Z 300 x-dot 0.01 y-dot -7.4 z-dot 1.05'],
    ['an epoch before the labels', `On 2028-03-14 10:20 VX 0.01 VY -7.4 VZ 1.05 X 7078.1 Y -12.5 Z 300 of 8`],
    ['speeds as v x', 'of 7: x 7078.1 y -12.5 z 300 v x 0.01 v y -7.4 v z 1.05'],
    ['six lines', `State 12, mass 512.25 kg\n\n${six.join('\n')}\n\nTel. 030 123456`],
    ['two lines of three', 'State 12:\nr = [7078.1, -12.5, 300] km\nv = [0.01, -7.4, 1.05] km/s\nMass 500'],
    ['one line', `12 states follow\n${six.join(' ')}\n`],
    ['quoted lines', `Rev 3:\n> ${six.join('\n> ')}\n`],
  ])('finds them among other numbers: %s', (_, text) => {
    expect(numbersOf(text).map(Number)).toEqual(six.map(Number));
  });

  it('takes thousands as groups, the field reading them', () => {
    const groups = ['6 878 137.0', '-1 200.5', '0', '0', '7 612.6', '0'];
    expect(numbersOf(`x: ${groups.join('\n')}`)).toEqual(groups);
    expect(numbersOf('X 6,878,137.0 m Y -1,200.5 m Z 0 m VX 0 VY 7,612.6 VZ 0')).toEqual(
      groups.map((group) => group.replaceAll(' ', ',')),
    );
    expect(numbersOf('X 6,878 km Y 0 Z 0 VX 0 VY 7.6 VZ 0 rev 5')[0]).toBe('6,878');
  });

  it('takes the unit beside the numbers, not of a height elsewhere', () => {
    const metres = 'x 7078100 m y 0 m z 0 m vx 0 m/s vy 7500 m/s vz 10 m/s';
    expect(readStateText(`At 700 km:\n${metres}`)).toMatchObject({ unitGuess: 'm' });
    expect(readStateText("I'm at it: 7.0781e3 0 0 0 7.5 1")).toMatchObject({ unitGuess: 'km' });
  });

  it.each([
    ['14 Mar 2028 10:20:30 UTC', '2028-03-14T10:20:30Z'],
    ['14-March-2028 10:20:30.250', '2028-03-14T10:20:30.250'],
    ['14 Mar 2028 10:20:30 (UTC)', '2028-03-14T10:20:30Z'],
    ['March 14, 2028 at 9:20', '2028-03-14T09:20'],
    ['14/03/2028 10:20', '2028-03-14T10:20'],
    ['2028/03/14', '2028-03-14'],
    ['2028-074T10:20:30.5', '2028-03-14T10:20:30.5'],
    ['04.03.2028 10:20:30', '2028-03-04T10:20:30'],
    ['Sent: 2028-03-13 08:00\nEpoch: 2028-03-14T10:20:30Z', '2028-03-14T10:20:30Z'],
  ])('reads the epoch “%s”', (words, epochText) => {
    expect(readStateText(`${words}\n${six.join('\n')}`)).toMatchObject({ ok: true, epochText, numbers: six });
  });

  it.each([
    ['03/04/2028', /03\/04\/2028 can be read as 2028-04-03 or 2028-03-04/],
    ['2028-03-14 and 2028-03-15', /several dates/],
    ['2028-03-14 10:20:30 (CET)', /given in CET/],
    ['2028-03-14 10:20:30 CET', /given in CET.*UTC/],
    ['14 Mar 2028 10:20:30 TAI', /given in TAI/],
  ])('asks about the epoch “%s”', (words, message) => {
    expect(messageOf(`${words}\n${six.join('\n')}`)).toMatch(message);
  });

  it('does not choose between two states', () => {
    expect(messageOf(`${labelled}\n${labelled.replace('7078.1', '7079.1')}`)).toMatch(/more than one state vector/);
    expect(messageOf(`One\n${six.join('\n')}\nother 5\n${six.join('\n')}`)).toMatch(/more than one state vector/);
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
