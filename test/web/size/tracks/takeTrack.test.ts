import { describe, expect, it } from 'vitest';
import { bodies, newCondition, repeatTracks } from '../../../../core/index';
import { takeTrack } from '../../../../web/size/tracks/takeTrack';
import { candidateOf, documentOf } from '../../state/support';

const entry = { perigeeAltitude: '600', apogeeAltitude: '600', inclination: '97.8', node: '0', perigee: '0' };
const [track] = repeatTracks({
  body: bodies.earth,
  theory: 'second',
  eccentricity: 0,
  inclination: { kind: 'sunSynchronous' },
  minAltitudeKm: 500,
  maxAltitudeKm: 600,
  maxDays: 12,
}).filter(({ revolutions, days }) => revolutions === 151 && days === 10);
if (!track) throw new Error('151/10 was expected among the tracks');

const kindsOf = (document: ReturnType<typeof documentOf>) =>
  document.draft.value.conditions.map(({ kind, settles }) => `${kind} ${settles}`);

describe('taking a track', () => {
  it('writes a and i into the entry and holds the cycle', async () => {
    const document = documentOf(candidateOf(entry, { nodeForm: 'raan' }));
    expect(takeTrack(document, track, true)).toEqual({ taken: true, dropped: [] });
    expect(kindsOf(document)).toEqual(['repeat semiMajorAxisKm', 'sunSynchronous inclinationRad']);
    const entered = document.entered.value;
    if (!entered.ok) throw new Error('an orbit was expected');
    expect(entered.orbit.mean.semiMajorAxisKm).toBeCloseTo(track.semiMajorAxisKm, 3);
    await expect.poll(() => document.conditions.settlement.value?.ok).toBe(true);
    expect(document.orbit.value?.mean.semiMajorAxisKm).toBeCloseTo(track.semiMajorAxisKm, 6);
    expect(document.orbit.value?.mean.inclinationRad).toBeCloseTo(track.inclinationRad, 9);
  });

  it('replaces what settled a or i, names what gave way, and keeps the rest', () => {
    const rate = newCondition('nodeRate', [], { rate: '0.98' });
    const frozen = newCondition('frozen', []);
    const altitude = newCondition('perigeeAltitude', [], { altitude: '600' });
    const conditions = [rate, frozen, altitude].map((each) => ({ ...each }));
    const document = documentOf(candidateOf(entry, { nodeForm: 'raan' }, { conditions }));
    const { dropped } = takeTrack(document, track, true);
    expect(dropped).toEqual(['Node rate', 'Perigee altitude']);
    expect(kindsOf(document)).toEqual([
      'frozen eccentricity',
      'repeat semiMajorAxisKm',
      'sunSynchronous inclinationRad',
    ]);
  });

  it('says no where there is no orbit to write into, and changes nothing', () => {
    const document = documentOf(candidateOf({ perigeeAltitude: 'half' }));
    const before = document.draft.value;
    expect(takeTrack(document, track, false).taken).toBe(false);
    expect(document.draft.value).toBe(before);
  });
});
