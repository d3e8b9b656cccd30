import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { radPerDeg } from '../../../core/numerics/angles';
import { entryFromOrbit } from '../../../core/record/entryFromOrbit';
import { fingerprint, fingerprintLine } from '../../../core/record/fingerprint';
import type { ResolvedOrbit } from '../../../core/record/resolved';
import { resolved } from './candidates';

const base = {
  epoch: '2027-03-20T10:30:00Z',
  inclination: '97.679',
  node: '123.4567',
  perigee: '90',
  meanAnomaly: '10',
};
const ellipse = { ...base, perigeeAltitude: '550', apogeeAltitude: '578.5' };
const letters = (orbit: ResolvedOrbit) => fingerprint(orbit);

describe('the fingerprint', () => {
  it('is three and four letters of the ten', () => {
    expect(letters(resolved(ellipse))).toMatch(/^[AHLMQRTWXY]{3} [AHLMQRTWXY]{4}$/);
  });

  it('is the same for altitudes and for a with e', () => {
    const a = 6378.137 + (550 + 578.5) / 2;
    const elements = { ...base, semiMajorAxis: String(a), eccentricity: String(14.25 / a) };
    expect(letters(resolved(elements, { form: 'elements' }))).toBe(letters(resolved(ellipse)));
  });

  it('is the same in km and nautical miles, with comma and with point', () => {
    const miles = { ...base, perigeeAltitude: String(550 / 1.852), apogeeAltitude: String(578.5 / 1.852) };
    expect(letters(resolved(miles, { lengthUnit: 'NM' }))).toBe(letters(resolved(ellipse)));
    expect(letters(resolved({ ...ellipse, apogeeAltitude: '578,5', node: '123,4567' }))).toBe(
      letters(resolved(ellipse)),
    );
  });

  it('is the same however the epoch is written', () => {
    expect(letters(resolved({ ...ellipse, epoch: '2027-03-20T11:30:00+01:00' }))).toBe(letters(resolved(ellipse)));
  });

  it('is the same for a local time and the node it stands for, and for either node', () => {
    const ascending = resolved({ ...ellipse, node: '22:30' }, { nodeForm: 'ltan' });
    const node = String(ascending.mean.nodeRad / radPerDeg);
    expect(letters(resolved({ ...ellipse, node }))).toBe(letters(ascending));
    expect(letters(resolved({ ...ellipse, node: '10:30' }, { nodeForm: 'ltdn' }))).toBe(letters(ascending));
  });

  it('is the same for the state, in any frame and unit, and the mean elements behind it', () => {
    const orbit = resolved({ ...ellipse, apogeeAltitude: '900' });
    const tags = { elementsAre: 'mean', nodeForm: 'raan', sun: 'mean', lengthUnit: 'km' } as const;
    for (const frame of ['meanOfDate', 'j2000', 'earthFixed'] as const) {
      for (const stateUnit of ['km', 'm'] as const) {
        const written = entryFromOrbit(orbit, 'state', { ...tags, frame, stateUnit });
        if (!written.ok) throw new Error(written.message);
        expect(letters(resolved(written.texts, { form: 'state', frame, stateUnit })), frame).toBe(letters(orbit));
      }
    }
  });

  it('does not split an orbit whose typed value sits on a rounding tie', () => {
    const tie = resolved({ ...ellipse, perigeeAltitude: '550.0005', apogeeAltitude: '550.0005' });
    const noisy = { ...tie, mean: { ...tie.mean, semiMajorAxisKm: tie.mean.semiMajorAxisKm * (1 - 2e-15) } };
    expect(letters(noisy)).toBe(letters(tie));
  });

  it('folds perigee into the anomaly on a circle, and the node into perigee in the equator', () => {
    const circle = { ...base, perigeeAltitude: '550', apogeeAltitude: '550' };
    expect(letters(resolved({ ...circle, perigee: '60', meanAnomaly: '40' }))).toBe(letters(resolved(circle)));
    const equator = { ...ellipse, inclination: '0', node: '100', perigee: '20' };
    expect(letters(resolved({ ...equator, node: '30', perigee: '90' }))).toBe(letters(resolved(equator)));
    const backwards = { ...ellipse, inclination: '180', node: '100', perigee: '120' };
    expect(letters(resolved({ ...backwards, node: '30', perigee: '50' }))).toBe(letters(resolved(backwards)));
  });

  it('wraps angles after rounding, so that 359.99999° is 0', () => {
    expect(letters(resolved({ ...ellipse, node: '359.99999' }))).toBe(letters(resolved({ ...ellipse, node: '0' })));
  });

  it('differs after one step in any element, in the epoch, and between gravity sets', () => {
    const orbit = resolved(ellipse);
    const step = 1e-4 * radPerDeg;
    const changed = (change: object) => ({ ...orbit, mean: { ...orbit.mean, ...change } });
    const { mean } = orbit;
    const others = [
      changed({ semiMajorAxisKm: mean.semiMajorAxisKm + 1e-3 }),
      changed({ eccentricity: mean.eccentricity + 1e-6 }),
      changed({ inclinationRad: mean.inclinationRad + step }),
      changed({ nodeRad: mean.nodeRad + step }),
      changed({ perigeeRad: mean.perigeeRad + step }),
      changed({ meanAnomalyRad: mean.meanAnomalyRad + step }),
      { ...orbit, epochJd: (orbit.epochJd ?? 0) + 1 / 86_400 },
      { ...orbit, epochJd: null },
      resolved(ellipse, { gravitySet: 'EGM96' }),
      resolved(ellipse, { gravitySet: 'WGS72' }),
    ];
    expect(new Set([orbit, ...others].map(letters)).size).toBe(11);
  });

  it('differs by one step for any orbit', () => {
    const orbit = resolved(ellipse);
    fc.assert(
      fc.property(fc.double({ min: 6500, max: 50_000, noNaN: true }), (semiMajorAxisKm) => {
        const one = { ...orbit, mean: { ...orbit.mean, semiMajorAxisKm } };
        const next = { ...orbit, mean: { ...orbit.mean, semiMajorAxisKm: semiMajorAxisKm + 1e-3 } };
        expect(fingerprintLine(next)).not.toBe(fingerprintLine(one));
        expect(letters(next)).not.toBe(letters(one));
      }),
    );
  });

  it('stays as it was published: the line and the letters of a known orbit', () => {
    const orbit = resolved({ ...ellipse }, { gravitySet: 'EGM2008' });
    const parts = fingerprintLine(orbit).split('|');
    expect(parts.slice(0, 3)).toEqual(['1', '3.98600441500e+5', '6.37813630000e+3']);
    expect(parts.slice(4, 8)).toEqual(['6.37813700000e+3', '3.35281066475e-3', '7.29211500000e-5', '3.65242200000e+2']);
    // The letters of this line were worked out by an independent FNV-1a that gives af63dc4c8601ec8c for "a".
    expect(letters(orbit)).toBe('AWA TAXA');
    expect(parts.slice(-7)).toEqual(['212672298600', '6942387', '2053', '976790', '1234567', '900000', '100000']);
  });
});
