import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { zonalForce } from '../../../core/forces/zonal';
import { type Body, bodies, type MeanElements, secularRates } from '../../../core/index';
import { at, keplerian, orbits, type Rates } from './orbits';

const { earth } = bodies;
const mu = earth.muKm3PerS2;

function cut(...degrees: readonly number[]): Body {
  return { ...earth, zonals: earth.zonals.map((value, n) => (degrees.includes(n) ? value : 0)) };
}

/** The disturbing function, averaged, in Delaunay's variables. */
type Hamiltonian = (at: { L: number; G: number; H: number; g: number }) => number;

/** Delaunay's equations: rates by central differences of an explicit disturbing function. */
function lagrange(force: Hamiltonian, mean: MeanElements): Rates {
  const { semiMajorAxisKm: a, eccentricity: e, inclinationRad: i, perigeeRad: g } = mean;
  const eta = Math.sqrt(1 - e * e);
  const L = Math.sqrt(mu * a);
  const [G, H] = [L * eta, L * eta * Math.cos(i)];
  const place = { L, G, H, g };
  const slope = (key: 'L' | 'G' | 'H' | 'g') => {
    const step = key === 'g' ? 1e-3 : 1e-4 * L * Math.min(1, e * e);
    const value = (times: number) => force({ ...place, [key]: place[key] + times * step });
    return (8 * (value(1) - value(-1)) - (value(2) - value(-2))) / (12 * step);
  };
  const gRate = slope('g');
  return {
    axis: 0,
    eccentricity: (-(eta * eta) / (e * G)) * gRate,
    inclination: (Math.cos(i) / (G * Math.sin(i))) * gRate,
    node: -slope('H'),
    perigee: -slope('G'),
    anomaly: -slope('L'),
  };
}

const J = (n: number) => earth.zonals[n] ?? Number.NaN;

/** Each rate to `share` of the largest angle rate. */
function expectAlike(found: Rates, expected: Rates, share: number): void {
  const largest = Math.max(Math.abs(expected.node), Math.abs(expected.perigee), Math.abs(expected.anomaly));
  for (const key of ['eccentricity', 'inclination', 'node', 'perigee', 'anomaly'] as const) {
    expect(Math.abs(found[key] - expected[key]) / largest, key).toBeLessThan(share);
  }
}

describe('averaged rates, beside the closed form,', () => {
  it('of J2 are those of the first order, to rounding', () => {
    const body = cut(2);
    const model = { body, oblateness: 'none', forces: [zonalForce(body, { from: 2, to: 2 })] } as const;
    fc.assert(
      fc.property(orbits(1e-3), (mean) => {
        const found = keplerian(mean, model);
        const expected = secularRates(earth, mean, 'first');
        const n = Math.sqrt(mu / mean.semiMajorAxisKm) / mean.semiMajorAxisKm;
        const unit = 1.5 * n * J(2) * (earth.radiusKm / (mean.semiMajorAxisKm * (1 - mean.eccentricity ** 2))) ** 2;
        expect(Math.abs(found.node - expected.nodeRadPerS) / unit).toBeLessThan(1e-11);
        expect(Math.abs(found.perigee - expected.perigeeRadPerS) / unit).toBeLessThan(1e-10);
        expect(Math.abs(found.anomaly - expected.meanAnomalyRadPerS) / unit).toBeLessThan(1e-10);
        expect(Math.abs(found.axis / mean.semiMajorAxisKm) / unit).toBeLessThan(1e-12);
        expect(Math.abs(found.eccentricity) / unit).toBeLessThan(1e-12);
        expect(Math.abs(found.inclination) / unit).toBeLessThan(1e-12);
      }),
      { numRuns: 300, seed: 1959 },
    );
  });

  it('of J4, averaged over the perigee too, are its secular terms in the second order', () => {
    const body = cut(4);
    const model = { body, oblateness: 'none', forces: [zonalForce(body, { from: 3, to: 4 })] } as const;
    fc.assert(
      fc.property(orbits(1e-2), (mean) => {
        // With J2 left out, the second order holds J4 alone.
        const expected = secularRates(body, mean, 'second');
        const sum = { node: 0, perigee: 0, anomaly: 0 };
        for (const quarter of [0, 1, 2, 3]) {
          const found = keplerian({ ...mean, perigeeRad: mean.perigeeRad + (quarter * Math.PI) / 4 }, model);
          sum.node += 0.25 * found.node;
          sum.perigee += 0.25 * found.perigee;
          sum.anomaly += 0.25 * found.anomaly;
        }
        const a = mean.semiMajorAxisKm;
        const n = Math.sqrt(mu / a) / a;
        const unit = n * Math.abs(J(4)) * (earth.radiusKm / (a * (1 - mean.eccentricity ** 2))) ** 4;
        expect(Math.abs(sum.node - expected.nodeRadPerS) / unit).toBeLessThan(1e-10);
        expect(Math.abs(sum.perigee - expected.perigeeRadPerS) / unit).toBeLessThan(1e-9);
        // The mean motion is in both and leaves its rounding.
        expect(Math.abs(sum.anomaly - expected.meanAnomalyRadPerS)).toBeLessThan(1e-9 * unit + 1e-15 * n);
      }),
      { numRuns: 200, seed: 1959 },
    );
  });

  it('of J3 are its long-period rates, by Lagrange from Kaula’s function', () => {
    const body = cut(3);
    const model = { body, oblateness: 'none', forces: [zonalForce(body, { from: 3, to: 3 })] } as const;
    // (3/8) J3 (μR³/a⁴) e η⁻⁵ sin i (4 − 5 sin² i) sin ω: Kaula (1966), §3, F301 and G310 = e η⁻⁵ (from memory).
    const force: Hamiltonian = ({ L, G, H, g }) => {
      const eta = G / L;
      const sine = Math.sqrt(1 - (H / G) ** 2);
      const size = (0.375 * J(3) * mu * earth.radiusKm ** 3) / ((L * L) / mu) ** 4;
      return size * Math.sqrt(1 - eta * eta) * eta ** -5 * sine * (4 - 5 * sine * sine) * Math.sin(g);
    };
    for (const eccentricity of [0.1, 0.4, 0.7]) {
      for (const inclinationRad of [0.3, 1, 1.7, 2.5]) {
        const mean = at({ semiMajorAxisKm: 7000 / (1 - eccentricity), eccentricity, inclinationRad, perigeeRad: 0.7 });
        const found = keplerian(mean, model);
        const n = Math.sqrt(mu / mean.semiMajorAxisKm) / mean.semiMajorAxisKm;
        expectAlike({ ...found, anomaly: found.anomaly - n }, lagrange(force, mean), 1e-7);
      }
    }
  });

  it('of J2² have Brouwer’s secular and long-period terms, by Lagrange from his function', () => {
    const body = cut(2);
    // (3/16) (μ²/L³) L γ2² (η⁻⁷ − η⁻⁵)(1 − 16θ² + 15θ⁴) cos 2ω, γ2 = (J2/2)(R/a)².
    const force: Hamiltonian = ({ L, G, H, g }) => {
      const [eta, theta] = [G / L, H / G];
      const gamma = 0.5 * J(2) * (earth.radiusKm / ((L * L) / mu)) ** 2;
      const inner = 1 - 16 * theta ** 2 + 15 * theta ** 4;
      return 0.1875 * (mu / L) ** 2 * gamma ** 2 * (eta ** -7 - eta ** -5) * inner * Math.cos(2 * g);
    };
    for (const eccentricity of [0.1, 0.4, 0.7]) {
      for (const inclinationRad of [0.3, 1, 1.7, 2.9]) {
        const mean = at({ semiMajorAxisKm: 7000 / (1 - eccentricity), eccentricity, inclinationRad, perigeeRad: 0.7 });
        const found = keplerian(mean, { body, oblateness: 'second', forces: [] });
        const secular = secularRates(body, mean, 'second');
        const rest = {
          ...found,
          node: found.node - secular.nodeRadPerS,
          perigee: found.perigee - secular.perigeeRadPerS,
          anomaly: found.anomaly - secular.meanAnomalyRadPerS,
        };
        expectAlike(rest, lagrange(force, mean), 1e-6);
      }
    }
  });
});
