import { describe, expect, it } from 'vitest';
import { bodies } from '../../../core/index';
import { equinoctialFromElements, senseOf } from '../../../core/mission/equinoctial';
import { couplingRates, zonalCoupling } from '../../../core/mission/zonalCoupling';
import { at } from './orbits';

const { earth } = bodies;
const degPerYear = (180 / Math.PI) * 86_400 * 365.25;

function shape(inclinationDeg: number, eccentricity = 0.001) {
  return { semiMajorAxisKm: 6978, eccentricity, inclinationRad: (inclinationDeg * Math.PI) / 180 };
}

describe('products of J2 with higher zonals', () => {
  it('go with J2 times the others', () => {
    const rates = couplingRates(earth, shape(10), 14);
    const half = { ...earth, zonals: earth.zonals.map((zonal, n) => (n >= 3 ? zonal / 2 : zonal)) };
    expect(couplingRates(half, shape(10), 14).nodeRadPerS / rates.nodeRadPerS).toBeCloseTo(0.5, 9);
    const lessJ2 = { ...earth, zonals: earth.zonals.map((zonal, n) => (n === 2 ? zonal / 2 : zonal)) };
    // First order in J2, with a second left over.
    expect(couplingRates(lessJ2, shape(10), 14).nodeRadPerS / rates.nodeRadPerS).toBeCloseTo(0.5, 2);
  });

  it('turn the node the other way round beyond 90°, and the perigee the same way', () => {
    const direct = couplingRates(earth, shape(30), 14);
    const reverse = couplingRates(earth, shape(150), 14);
    expect(reverse.nodeRadPerS / direct.nodeRadPerS).toBeCloseTo(-1, 6);
    expect(reverse.perigeeRadPerS / direct.perigeeRadPerS).toBeCloseTo(1, 6);
  });

  it('are finite and smooth at e = 0 and in the equator', () => {
    for (const inclinationDeg of [0, 0.01, 180]) {
      const exact = couplingRates(earth, shape(inclinationDeg, 0), 14);
      const near = couplingRates(earth, shape(inclinationDeg, 1e-3), 14);
      expect(Math.abs(exact.nodeRadPerS - near.nodeRadPerS) * degPerYear).toBeLessThan(1e-3);
      expect(Math.abs(exact.perigeeRadPerS - near.perigeeRadPerS) * degPerYear).toBeLessThan(0.02);
    }
  });

  it('are small on ellipses, where they are left out', () => {
    const ellipse = { semiMajorAxisKm: 10_000, eccentricity: 0.3, inclinationRad: 0.9 };
    expect(Math.abs(couplingRates(earth, ellipse, 14).nodeRadPerS) * degPerYear).toBeLessThan(0.001);
    const rates = new Float64Array(6);
    const mean = at(ellipse);
    const sense = senseOf(mean.inclinationRad);
    zonalCoupling(earth, 14, sense)(rates, equinoctialFromElements(mean, sense));
    expect([...rates]).toEqual([0, 0, 0, 0, 0, 0]);
  });
});
