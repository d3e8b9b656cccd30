import { describe, expect, it } from 'vitest';
import { knownLimits, type LimitEntry, limitMargins, readLimits } from '../../../core/record/limits';
import { limitInUnit } from '../../../core/record/limitUnits';
import { limitsSentence, limitText, marginText } from '../../../core/record/limitWords';
import { readingsOf } from '../../../core/record/readings/readings';
import { storedLimitText } from '../../../core/record/storedLimitText';
import { candidateWith, resolved } from './candidates';

const orbit = resolved({ perigeeAltitude: '575', apogeeAltitude: '603.2', inclination: '97.6' });
const readings = readingsOf(orbit);
type Stored = LimitEntry & Readonly<Record<string, unknown>>;
const limit = (entry: Partial<LimitEntry>): Stored =>
  ({ reading: 'perigeeAltitude', bound: 'atMost', text: '600', unit: 'km', ...entry }) as Stored;
const read = (...limits: Readonly<Record<string, unknown>>[]) => readLimits({ limits });
const margin = (entry: Partial<LimitEntry>) => {
  const [found] = limitMargins(read(limit(entry)), readings);
  if (!found) throw new Error('expected a margin');
  return found;
};
const message = (entry: Partial<LimitEntry>) => {
  const [found] = read(limit(entry));
  return found?.ok === false ? found.error.message : null;
};

describe('a limit', () => {
  it('says what is left of it, in the unit of the reading', () => {
    const left = margin({});
    expect(left).toMatchObject({ state: 'kept' });
    expect(left.margin).toBeCloseTo(25, 9);
    expect(marginText(left, 'km')).toBe('limit ≤ 600: 25.0 left');
    expect(marginText(left, 'NM')).toBe('limit ≤ 323.9741: 13.5 left');
  });

  it('says by how much it is broken, and on which side', () => {
    const over = margin({ reading: 'apogeeAltitude' });
    expect(over.state).toBe('broken');
    expect(marginText(over, 'km')).toBe('limit ≤ 600: over by 3.20');
    expect(marginText(margin({ bound: 'atLeast', text: '590' }), 'km')).toBe('limit ≥ 590: under by 15.0');
  });

  it('is said where something is wrong with it, and only there', () => {
    const said = (...limits: Readonly<Record<string, unknown>>[]) => {
      const stored = read(...limits);
      return limitsSentence({ read: stored, margins: limitMargins(stored, readings) }, readings);
    };
    expect(said(limit({}))).toBe('');
    expect(said(limit({ reading: 'apogeeAltitude' }), limit({ text: '500' }))).toBe(
      '2 limits broken: Apogee altitude, Perigee altitude.',
    );
    expect(
      said(limit({ text: 'x' }), limit({ reading: 'localTimeAscending', text: '10:30' }), { reading: 'betaAngle' }),
    ).toBe('3 limits not judged: Perigee altitude, Local time of the ascending node, a reading of another version.');
  });

  it('that the reading meets to the last digit shown is kept, and said', () => {
    for (const text of ['575', '575.0004', '574.9996']) {
      expect(margin({ text, bound: 'atLeast' }).state).toBe('atEdge');
    }
    expect(margin({ text: '575.001', bound: 'atLeast' }).state).toBe('broken');
    expect(marginText(margin({ text: '575', bound: 'atLeast' }), 'km')).toBe('at the limit ≥ 575');
  });

  it('is read in the unit it was typed in, with a decimal comma too', () => {
    expect(knownLimits({ limits: [limit({ text: '323,97', unit: 'NM' })] })[0]?.value).toBeCloseTo(599.99244, 9);
    const [rate] = knownLimits({ limits: [limit({ reading: 'nodeRate', text: '−0,9', unit: 'deg/day' })] });
    expect(rate?.value).toBeCloseTo((-0.9 * Math.PI) / 180 / 86400, 15);
  });

  it('that cannot be read has its message', () => {
    expect(message({ text: '' })).toBe('Limit is empty; type a number in km.');
    expect(message({ text: 'high', reading: 'nodeRate' })).toContain('is not a number; type a number in °/day');
    expect(message({ text: '1,234' })).toContain('can be read two ways');
    expect(message({ text: '25:00', reading: 'localTimeAscending' })).toContain('from 00:00 to 23:59');
    expect(message({ text: '9'.repeat(100_000) })).toContain('100000 characters');
  });

  it('of another version is kept and said', () => {
    const stored = { reading: 'betaAngle', bound: 'atMost', text: '30', unit: 'deg' };
    expect(read(stored)[0]).toMatchObject({ ok: false, entry: null });
    expect(read({}, { reading: 7 }, limit({ bound: 'near' as never })).map(({ ok }) => ok)).toEqual([
      false,
      false,
      false,
    ]);
    expect(storedLimitText(stored)).toBe('a limit of another version');
  });

  it('with a unit that its reading does not have is read in the usual one', () => {
    expect(knownLimits({ limits: [limit({ unit: 'furlong' })] })[0]?.value).toBe(600);
  });

  it('has no margin where the orbit lacks the reading', () => {
    expect(limitMargins(read(limit({ reading: 'localTimeAscending', text: '10:30' })), readings)).toEqual([]);
  });

  it('on a local time is a clock, its margin in minutes', () => {
    const morning = resolved({ node: '10:05', epoch: '2028-01-15' }, { nodeForm: 'ltan' });
    const entry = limit({ reading: 'localTimeAscending', text: '10:30', unit: 'clock' });
    const [left] = limitMargins(read(entry), readingsOf(morning));
    expect(left && marginText(left)).toBe('limit ≤ 10:30: 25.0 min left');
  });

  it('turns into another unit and back without a trace', () => {
    const inMiles = limitInUnit(limit({}), 'NM');
    expect(inMiles).toMatchObject({ text: '323.9740821', unit: 'NM' });
    expect(limitInUnit(inMiles, 'km').text).toBe('600');
    expect(limitInUnit(limit({ text: '600,5' }), 'NM').text).toBe('324,2440605');
    expect(limitInUnit(limit({ text: 'x' }), 'NM')).toMatchObject({ text: 'x', unit: 'NM' });
  });

  it('is written for the book, read or not', () => {
    expect(storedLimitText(limit({}))).toBe('Perigee altitude at most 600 km');
    expect(storedLimitText(limit({ text: '' }))).toBe('Perigee altitude at most empty km');
  });

  it('stands in the record without a change to the orbit', () => {
    expect(readLimits({ ...candidateWith({}), limits: [limit({})] })).toHaveLength(1);
    const [first] = read(limit({ reading: 'eccentricity', text: '0.0012' }));
    expect(first?.ok && limitText(first)).toBe('≤ 0.0012');
  });
});
