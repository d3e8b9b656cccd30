import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { gravitySets } from '../../../core/bodies/earth';
import { degPerRad, wrapPi } from '../../../core/numerics/angles';
import type { EntryForm } from '../../../core/record/candidate';
import { type EntryTags, entryFromOrbit } from '../../../core/record/entryFromOrbit';
import { fingerprint } from '../../../core/record/fingerprint';
import type { ResolvedOrbit } from '../../../core/record/resolved';
import { resolved } from './candidates';

const angle = fc.double({ min: 0, max: 6.28, noNaN: true });
const orbits: fc.Arbitrary<ResolvedOrbit> = fc
  .record({
    perigeeKm: fc.double({ min: 6700, max: 9000, noNaN: true }),
    eccentricity: fc.double({ min: 0.01, max: 0.7, noNaN: true }),
    inclinationRad: fc.double({ min: 0.05, max: 3.09, noNaN: true }),
    nodeRad: angle,
    perigeeRad: angle,
    meanAnomalyRad: angle,
  })
  .map(({ perigeeKm, ...mean }) => ({
    body: gravitySets.EGM2008,
    mean: { ...mean, semiMajorAxisKm: perigeeKm / (1 - mean.eccentricity) },
    epochJd: 2461485.9375,
    theory: 'Brouwer',
    origin: 'elements',
    typedAs: 'mean',
  }));
const tags: fc.Arbitrary<EntryTags> = fc.record({
  elementsAre: fc.constantFrom('mean', 'osculating'),
  nodeForm: fc.constantFrom('raan', 'ltan', 'ltdn'),
  sun: fc.constantFrom('mean', 'apparent'),
  frame: fc.constantFrom('meanOfDate', 'j2000', 'teme'),
  lengthUnit: fc.constantFrom('km', 'NM'),
  stateUnit: fc.constantFrom('km', 'm'),
});

function there(orbit: ResolvedOrbit, form: EntryForm, how: EntryTags): ResolvedOrbit {
  const written = entryFromOrbit(orbit, form, how);
  if (!written.ok) throw new Error(written.message);
  return resolved(written.texts, { form, ...how });
}

/** a to 0.1 m, e to 2e-8; angles to 1e-5°, where e and sin i leave perigee and node that well defined. */
function expectSame(back: ResolvedOrbit, orbit: ResolvedOrbit, form: EntryForm): void {
  const { mean } = orbit;
  const spread =
    form === 'elements' ? 1 : 1 / Math.min(mean.eccentricity, Math.sin(mean.inclinationRad)) / (1 - mean.eccentricity);
  expect(Math.abs(back.mean.semiMajorAxisKm - mean.semiMajorAxisKm)).toBeLessThan(1.5e-4);
  expect(Math.abs(back.mean.eccentricity - mean.eccentricity)).toBeLessThan(2e-8);
  for (const key of ['inclinationRad', 'nodeRad', 'perigeeRad', 'meanAnomalyRad'] as const) {
    expect(Math.abs(wrapPi(back.mean[key] - mean[key])) * degPerRad, key).toBeLessThan(1e-5 * Math.max(1, spread));
  }
}

describe('writing an orbit into another form', () => {
  it.each(['altitudes', 'elements', 'state'] as const)(
    '%s: reads back as the same orbit, whatever the tags',
    (form) => {
      fc.assert(
        fc.property(orbits, tags, (orbit, how) => {
          fc.pre(orbit.mean.eccentricity > 0.02);
          expectSame(there(orbit, form, how), orbit, form);
        }),
        { numRuns: 150 },
      );
    },
  );

  it('a state in Earth-fixed axes reads back as the same orbit', () => {
    fc.assert(
      fc.property(orbits, tags, (orbit, how) => {
        expectSame(there(orbit, 'state', { ...how, frame: 'earthFixed' }), orbit, 'state');
      }),
      { numRuns: 60 },
    );
  });

  const plain: EntryTags = {
    elementsAre: 'mean',
    nodeForm: 'raan',
    sun: 'mean',
    frame: 'meanOfDate',
    lengthUnit: 'km',
    stateUnit: 'km',
  };

  it('leaves round numbers round', () => {
    const written = entryFromOrbit(
      resolved({ perigeeAltitude: '550', apogeeAltitude: '561.5', node: '120' }),
      'altitudes',
      plain,
    );
    expect(written).toMatchObject({
      ok: true,
      texts: { perigeeAltitude: '550', apogeeAltitude: '561.5', inclination: '97.6', node: '120', perigee: '0' },
    });
  });

  it('keeps the fingerprint in mean elements, whatever the orbit', () => {
    fc.assert(
      fc.property(orbits, fc.constantFrom('altitudes', 'elements'), tags, (orbit, form, how) => {
        const direct: EntryTags = { ...how, elementsAre: 'mean', frame: 'meanOfDate' };
        expect(fingerprint(there(orbit, form, direct))).toBe(fingerprint(orbit));
      }),
      { numRuns: 300 },
    );
  });

  it('writes no noise of a conversion: a round orbit is round again after any walk through the forms', () => {
    const texts = {
      perigeeAltitude: '561',
      apogeeAltitude: '575.25',
      inclination: '97.679',
      node: '247.5',
      perigee: '90',
    };
    let orbit = resolved({ ...texts, meanAnomaly: '0', epoch: '2027-03-20T10:30:00Z' });
    for (const [form, how] of [
      ['state', {}],
      ['altitudes', { nodeForm: 'ltan' }],
      ['elements', { frame: 'j2000' }],
      ['altitudes', { elementsAre: 'osculating' }],
      ['elements', { nodeForm: 'ltdn', sun: 'apparent' }],
    ] as const) {
      orbit = there(orbit, form, { ...plain, ...how });
    }
    expect(entryFromOrbit(orbit, 'altitudes', plain)).toMatchObject({ texts: { ...texts, meanAnomaly: '0' } });
  });

  it('writes a round local time round', () => {
    const orbit = resolved({ node: '10:30', epoch: '2027-03-20T10:30:00Z' }, { nodeForm: 'ltdn' });
    const angle = there(orbit, 'elements', plain);
    expect(entryFromOrbit(angle, 'altitudes', { ...plain, nodeForm: 'ltdn' })).toMatchObject({
      texts: { node: '10:30' },
    });
  });

  it('keeps the epoch', () => {
    const epoch = '2027-03-20T10:30:00Z';
    expect(entryFromOrbit(resolved({ epoch }), 'elements', plain)).toMatchObject({ texts: { epoch } });
  });

  it('says why it cannot: no epoch for a local time, another body, two-line elements', () => {
    const orbit = resolved({});
    expect(entryFromOrbit(orbit, 'altitudes', { ...plain, nodeForm: 'ltan' })).toMatchObject({ reason: 'needsEpoch' });
    expect(entryFromOrbit(resolved({}, { body: 'mars' }), 'altitudes', { ...plain, nodeForm: 'ltan' })).toMatchObject({
      reason: 'earthOnly',
    });
    expect(entryFromOrbit(orbit, 'twoLine', plain)).toMatchObject({ reason: 'cannotWrite' });
  });
});
