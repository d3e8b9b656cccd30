import { describe, expect, it } from 'vitest';
import { gravitySets } from '../../../core/bodies/earth';
import { radPerDeg } from '../../../core/numerics/angles';
import { stateFromMean } from '../../../core/orbit/meanState';
import { stateFromElements } from '../../../core/orbit/state';
import type { FieldId } from '../../../core/record/candidate';
import { resolveOrbit } from '../../../core/record/resolveOrbit';
import { candidateWith, messages, resolved } from './candidates';

const elements = { semiMajorAxis: '7178', eccentricity: '0.001' };
const state = { x: '7000', y: '0', z: '0', vx: '0', vy: '1', vz: '7.4' };
const ids = (texts: Partial<Record<FieldId, string>>, change = {}) =>
  resolveOrbit(candidateWith(texts, change)).notices.map(({ id }) => id);

describe('altitudes', () => {
  it('become a and e above the equatorial radius', () => {
    const { mean, body, epochJd } = resolved({ perigeeAltitude: '500', apogeeAltitude: '700' });
    expect(mean.semiMajorAxisKm).toBeCloseTo(6978.137, 9);
    expect(mean.eccentricity).toBeCloseTo(100 / 6978.137, 12);
    expect(mean.inclinationRad).toBeCloseTo(97.6 * radPerDeg, 14);
    expect(body.gravitySet).toBe('EGM2008');
    expect(epochJd).toBeNull();
  });

  it('in nautical miles are turned into km', () => {
    const { mean } = resolved({ perigeeAltitude: '100', apogeeAltitude: '100' }, { lengthUnit: 'NM' });
    expect(mean.semiMajorAxisKm).toBeCloseTo(6378.137 + 185.2, 9);
  });

  it('with apogee below perigee say so at the apogee', () => {
    expect(messages({ perigeeAltitude: '500', apogeeAltitude: '480' })).toEqual({
      apogeeAltitude: 'Apogee altitude 480 km is below the perigee altitude 500 km; type the larger one as apogee.',
    });
  });

  it('below the surface are allowed, with a caution', () => {
    expect(ids({ perigeeAltitude: '-100' })).toEqual(['perigeeBelowSurface']);
  });

  it('beyond the centre of the Earth are not', () => {
    expect(Object.keys(messages({ perigeeAltitude: '-6400' }))).toEqual(['perigeeAltitude']);
  });

  it('too far out for a closed orbit are refused', () => {
    expect(Object.keys(messages({ apogeeAltitude: '1e11' }))).toEqual(['apogeeAltitude']);
  });

  it('read with a decimal comma as with a decimal point', () => {
    expect(resolved({ apogeeAltitude: '561,5' }).mean).toEqual(resolved({ apogeeAltitude: '561.5' }).mean);
  });

  it('that read two ways are asked about, with both readings offered', () => {
    const result = resolveOrbit(candidateWith({ apogeeAltitude: '1,234' }));
    expect(result).toMatchObject({
      ok: false,
      errors: {
        apogeeAltitude: {
          choices: [
            { text: '1.234', label: '1.234 km (decimal)' },
            { text: '1234', label: '1234 km (thousands)' },
          ],
        },
      },
    });
    expect(resolveOrbit(candidateWith({ node: '1,234' }))).toMatchObject({ ok: true });
  });

  it('may carry their unit, or another of its kind', () => {
    const plain = resolved({ perigeeAltitude: '550', apogeeAltitude: '561', inclination: '97.4' }).mean;
    for (const apogeeAltitude of ['561 km', '561km', '561000 m', '561,0 km']) {
      const typed = { perigeeAltitude: '550', apogeeAltitude, inclination: '97.4°' };
      expect(resolved(typed).mean.semiMajorAxisKm).toBeCloseTo(plain.semiMajorAxisKm, 9);
    }
    for (const inclination of ['97.4°', '97.4 deg', '97.4 degrees']) {
      expect(resolved({ inclination }).mean.inclinationRad).toBe(plain.inclinationRad);
    }
    const miles = resolved({ perigeeAltitude: '300 NM', apogeeAltitude: '300 nmi' }).mean;
    expect(miles.semiMajorAxisKm).toBeCloseTo(6378.137 + 300 * 1.852, 9);
    expect(resolved({ perigeeAltitude: '300', apogeeAltitude: '555.6 km' }, { lengthUnit: 'NM' }).mean).toEqual(
      resolved({ perigeeAltitude: '300', apogeeAltitude: '300' }, { lengthUnit: 'NM' }).mean,
    );
  });

  it.each(['561 nm', '561 ft', '561 °', '561 km/s', 'km', '561 km 3'])('with another unit are refused: %s', (text) => {
    expect(Object.keys(messages({ apogeeAltitude: text }))).toEqual(['apogeeAltitude']);
  });

  it('that read two ways keep the unit typed', () => {
    expect(resolveOrbit(candidateWith({ apogeeAltitude: '1,234 NM' }))).toMatchObject({
      errors: { apogeeAltitude: { choices: [{ text: '1.234 NM', label: '1.234 NM (decimal)' }, { text: '1234 NM' }] } },
    });
  });
});

describe('every number field', () => {
  const cases: readonly [FieldId, object][] = [
    ['perigeeAltitude', { form: 'altitudes' }],
    ['apogeeAltitude', { form: 'altitudes' }],
    ['semiMajorAxis', { form: 'elements' }],
    ['eccentricity', { form: 'elements' }],
    ['inclination', { form: 'altitudes' }],
    ['node', { form: 'altitudes' }],
    ['perigee', { form: 'elements' }],
    ['meanAnomaly', { form: 'elements' }],
    ['x', { form: 'state' }],
    ['vz', { form: 'state' }],
  ];
  const bad = ['', 'abc', 'NaN', 'Infinity', '-Infinity', '1e400', '1 2 3', 'x'.repeat(20_000)];

  it.each(cases)('%s has a message of its own for empty, text, NaN, Infinity and 1e400', (field, change) => {
    for (const text of bad) {
      const found = messages({ ...elements, ...state, [field]: text }, change);
      expect(Object.keys(found), text.slice(0, 20)).toEqual([field]);
      expect(found[field]?.length).toBeLessThan(200);
    }
  });

  it('answers a paste of 10 MB by its size, at once', () => {
    const paste = '1 '.repeat(5_000_000);
    const start = performance.now();
    const found = messages({ perigeeAltitude: paste, node: paste, epoch: paste });
    expect(performance.now() - start).toBeLessThan(500);
    expect(found.perigeeAltitude).toContain('10000000 characters');
    expect(Object.keys(found).sort()).toEqual(['epoch', 'node', 'perigeeAltitude']);
  });

  it('all speak at once, so that nothing is found out one by one', () => {
    const found = messages({ inclination: 'a', node: '', perigee: 'NaN', apogeeAltitude: 'x', epoch: 'soon' });
    expect(Object.keys(found).sort()).toEqual(['apogeeAltitude', 'epoch', 'inclination', 'node', 'perigee']);
  });

  it('of another form is not looked at', () => {
    expect(messages({ x: 'abc', semiMajorAxis: 'abc', twoLine: 'abc', bodyMu: 'abc' })).toEqual({});
  });
});

describe('elements', () => {
  it.each(['-0.1', '1', '1.5'])('refuse e = %s', (eccentricity) => {
    expect(Object.keys(messages({ ...elements, eccentricity }, { form: 'elements' }))).toEqual(['eccentricity']);
  });

  it.each(['0', '-7000', '2e9'])('refuse a = %s', (semiMajorAxis) => {
    expect(Object.keys(messages({ ...elements, semiMajorAxis }, { form: 'elements' }))).toEqual(['semiMajorAxis']);
  });

  it.each(['-0.001', '180.01', '-98'])('refuse an inclination of %s', (inclination) => {
    expect(messages({ inclination }).inclination).toContain('0 to 180');
  });

  it.each(['0', '180'])('take an inclination of %s', (inclination) => {
    expect(messages({ inclination })).toEqual({});
  });

  it('take "97,679" as the only inclination it can be', () => {
    expect(resolved({ inclination: '97,679' }).mean.inclinationRad).toBeCloseTo(97.679 * radPerDeg, 14);
  });

  it('wrap angles of any size', () => {
    expect(resolved({ node: '-90' }).mean.nodeRad).toBeCloseTo(270 * radPerDeg, 12);
    expect(resolved({ perigee: '725' }).mean.perigeeRad).toBeCloseTo(5 * radPerDeg, 12);
  });

  it('typed as osculating become the mean elements of the same state', () => {
    const osculating = { ...elements, eccentricity: '0.05', meanAnomaly: '80' };
    const { mean, body, typedAs } = resolved(osculating, { form: 'elements', elementsAre: 'osculating' });
    const expected = stateFromElements(body.muKm3PerS2, {
      semiMajorAxisKm: 7178,
      eccentricity: 0.05,
      inclinationRad: 97.6 * radPerDeg,
      nodeRad: 0,
      perigeeRad: 0,
      meanAnomalyRad: 80 * radPerDeg,
    });
    const back = stateFromMean(body, mean);
    for (const [index, value] of back.positionKm.entries())
      expect(value).toBeCloseTo(expected.positionKm[index] ?? 0, 6);
    expect(typedAs).toBe('osculating');
    expect(Math.abs(mean.semiMajorAxisKm - 7178)).toBeGreaterThan(0.5);
  });
});

describe('the epoch', () => {
  it('may be absent where nothing needs it', () => {
    expect(resolved({}).epochJd).toBeNull();
  });

  it.each([
    [{ nodeForm: 'ltan' }, { node: '10:30' }],
    [{ nodeForm: 'ltdn' }, { node: '10:30' }],
    [{ frame: 'j2000' }, {}],
    [{ form: 'state', frame: 'earthFixed' }, state],
    [{ form: 'state', frame: 'j2000' }, state],
  ] as const)('is asked for at its own field only with %j', (change, texts) => {
    expect(Object.keys(messages(texts, change))).toEqual(['epoch']);
  });

  it('outside 1950 to 2100 is a caution, not an error', () => {
    expect(ids({ epoch: '1949-12-31T00:00:00Z' })).toEqual(['epochOutsideSeries']);
    expect(ids({ epoch: '2099-12-31T00:00:00Z' })).toEqual([]);
  });

  it.each(['2027-02-30', 'yesterday', '2027-13-01T00:00Z'])('%s is no date', (epoch) => {
    expect(Object.keys(messages({ epoch }))).toEqual(['epoch']);
  });
});

describe('a local time of the node', () => {
  const epoch = '2027-03-20T10:30:00Z';

  it('of 22:30 ascending is the same orbit as 10:30 descending', () => {
    const ascending = resolved({ epoch, node: '22:30' }, { nodeForm: 'ltan' });
    const descending = resolved({ epoch, node: '10.5' }, { nodeForm: 'ltdn' });
    expect(ascending.mean.nodeRad).toBeCloseTo(descending.mean.nodeRad, 10);
  });

  it.each(['24:00', '10:60', '-1', '25', 'noon', ''])('refuses %j', (node) => {
    expect(Object.keys(messages({ epoch, node }, { nodeForm: 'ltan' }))).toEqual(['node']);
  });

  it('is refused away from the Earth, at the node', () => {
    expect(messages({ node: '10:30' }, { nodeForm: 'ltan', body: 'mars' }).node).toContain('Earth only');
  });
});

describe('a state', () => {
  it('in metres is the same orbit as in km', () => {
    const metres = { x: '7000000', y: '0', z: '0', vx: '0', vy: '1000', vz: '7400' };
    expect(resolved(metres, { form: 'state', stateUnit: 'm' }).mean.semiMajorAxisKm).toBeCloseTo(
      resolved(state, { form: 'state' }).mean.semiMajorAxisKm,
      9,
    );
  });

  it.each([
    ['zero', { x: '0', y: '0', z: '0' }],
    ['zero speed', { vx: '0', vy: '0', vz: '0' }],
    ['rectilinear', { vx: '7', vy: '0', vz: '0' }],
    ['hyperbolic', { vy: '12' }],
  ])('that is %s has one message, at x', (_, change) => {
    expect(Object.keys(messages({ ...state, ...change }, { form: 'state' }))).toEqual(['x']);
  });

  it('in metres under the unit km is told so', () => {
    const metres = { x: '7000000', y: '0', z: '0', vx: '0', vy: '1000', vz: '7400' };
    expect(messages(metres, { form: 'state' }).x).toContain('metres');
  });

  it('in a frame of the Earth is refused at another body', () => {
    expect(messages(state, { form: 'state', frame: 'earthFixed', body: 'mars' })).toHaveProperty('x');
  });
});

describe("a body of the user's own", () => {
  const own = { bodyMu: '42828.4', bodyRadius: '3396', bodyJ2: '0.00196' };

  it('needs mu, radius and J2 alone', () => {
    const { body } = resolved(own, { body: 'custom' });
    expect(body).toMatchObject({ muKm3PerS2: 42828.4, radiusKm: 3396, rotationRadPerS: null, yearDays: null });
    expect(body.zonals[2]).toBe(0.00196);
  });

  it('takes a day in hours and a year in days', () => {
    const { body } = resolved({ ...own, bodyDay: '24.6229', bodyYear: '686.98' }, { body: 'custom' });
    expect(body.rotationRadPerS).toBeCloseTo(7.0882e-5, 8);
    expect(body.yearDays).toBe(686.98);
  });

  it('says at each of its fields what is wrong', () => {
    const wrong = {
      bodyMu: '',
      bodyRadius: '-1',
      bodyJ2: 'x',
      bodyJ3: '9',
      bodyDay: '0',
      bodyYear: '-1',
      bodyFlattening: '1',
    };
    expect(Object.keys(messages(wrong, { body: 'custom' })).sort()).toEqual(Object.keys(wrong).sort());
  });
});

describe('two-line elements', () => {
  // An invented set with right checksums.
  const twoLine = [
    '1 99999U 26001A   26032.50000000  .00000000  00000-0  00000-0 0    05',
    '2 99999  97.6000 120.0000 0012000  90.0000 270.0000 15.00000000    09',
  ].join('\r\n');

  it('bring their own epoch and keep the mean motion under another gravity set', () => {
    const own = resolved({ twoLine }, { form: 'twoLine', gravitySet: 'WGS72' });
    const other = resolved({ twoLine }, { form: 'twoLine' });
    const motion = (mu: number, a: number) => Math.sqrt(mu / a ** 3);
    expect(other.theory).toBe('SGP4');
    expect(other.epochJd).toBeCloseTo(2461073.0, 6);
    expect(motion(other.body.muKm3PerS2, other.mean.semiMajorAxisKm)).toBeCloseTo(
      motion(gravitySets.WGS72.muKm3PerS2, own.mean.semiMajorAxisKm),
      15,
    );
    expect(ids({ twoLine }, { form: 'twoLine' })).toContain('twoLineGravitySet');
    expect(ids({ twoLine }, { form: 'twoLine', gravitySet: 'WGS72' })).not.toContain('twoLineGravitySet');
  });

  it.each(['', 'abc', twoLine.slice(0, 60), twoLine.replace('97.6000', '97.6001')])(
    'refuse %j at their own field',
    (text) => {
      expect(Object.keys(messages({ twoLine: text }, { form: 'twoLine' }))).toEqual(['twoLine']);
    },
  );

  it('are refused at another body', () => {
    expect(messages({ twoLine }, { form: 'twoLine', body: 'mars' }).twoLine).toContain('Earth');
  });
});
