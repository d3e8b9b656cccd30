import { describe, expect, it } from 'vitest';
import { bodies } from '../../../core/bodies/bodies';
import { customBody } from '../../../core/bodies/customBody';
import { gravitySets } from '../../../core/bodies/earth';
import { rescaleZonals } from '../../../core/bodies/zonals';

const every = [...Object.values(gravitySets), ...Object.values(bodies)];

describe('bodies', () => {
  it.each(every)('$name, $gravitySet, is whole and plausible', (body) => {
    expect(body.zonals[0]).toBe(0);
    expect(body.zonals[1]).toBe(0);
    expect(body.zonals[2]).toBeGreaterThan(1e-6);
    expect(body.zonals[2]).toBeLessThan(0.02);
    expect(body.zonals.every(Number.isFinite)).toBe(true);
    expect(body.source.length).toBeGreaterThan(20);
    expect(Math.abs(body.equatorialRadiusKm / body.radiusKm - 1)).toBeLessThan(2e-3);
    expect(body.flattening).toBeGreaterThanOrEqual(0);
    expect(body.flattening).toBeLessThan(0.1);
    expect(body.yearDays).toBeGreaterThan(80);
  });

  it('makes EGM2008 the default of the Earth, with zonals to degree 14', () => {
    expect(bodies.earth).toBe(gravitySets.EGM2008);
    expect(bodies.earth.zonals).toHaveLength(15);
  });

  it('counts altitudes from the same ellipsoid under every gravity set of the Earth', () => {
    for (const body of Object.values(gravitySets)) {
      expect(body.equatorialRadiusKm).toBe(6378.137);
      expect(1 / body.flattening).toBeCloseTo(298.257223563, 9);
    }
  });

  it('turns Venus backwards and every other body forwards', () => {
    for (const body of Object.values(bodies)) {
      expect(Math.sign(body.rotationRadPerS ?? 0)).toBe(body.id === 'venus' ? -1 : 1);
    }
  });
});

describe('rescaleZonals', () => {
  it('returns to where it began when the scales are swapped', () => {
    const one = { muKm3PerS2: 398600.4415, radiusKm: 6378.1363 };
    const two = { muKm3PerS2: 398600.8, radiusKm: 6378.135 };
    const zonals = gravitySets.EGM2008.zonals;
    const back = rescaleZonals(rescaleZonals(zonals, one, two), two, one);
    back.forEach((value, n) => {
      expect(value).toBeCloseTo(zonals[n] ?? Number.NaN, 18);
    });
  });
});

describe('customBody', () => {
  const plain = { name: 'Skerry', muKm3PerS2: 1000, radiusKm: 500, zonals: [0, 0, 1e-3] };

  it('leaves an unknown rotation and year null and takes the datum from the radius', () => {
    expect(customBody(plain)).toMatchObject({
      id: 'custom',
      rotationRadPerS: null,
      yearDays: null,
      equatorialRadiusKm: 500,
      flattening: 0,
    });
  });

  it('keeps what is given, zero included', () => {
    const body = customBody({
      ...plain,
      equatorialRadiusKm: 501,
      flattening: 0.01,
      rotationRadPerS: -1e-6,
      yearDays: 9,
    });
    expect(body).toMatchObject({ equatorialRadiusKm: 501, flattening: 0.01, rotationRadPerS: -1e-6, yearDays: 9 });
  });

  it('sets degrees 0 and 1 to zero', () => {
    expect(customBody({ ...plain, zonals: [1, 5, 1e-3, 2e-6] }).zonals).toEqual([0, 0, 1e-3, 2e-6]);
  });

  it.each([0, -1, Number.NaN, Number.POSITIVE_INFINITY])('refuses a gravitational parameter of %s', (mu) => {
    expect(() => customBody({ ...plain, muKm3PerS2: mu })).toThrow(/muKm3PerS2 must be a positive number/);
  });
});
