import { describe, expect, it } from 'vitest';
import { bodies, customBody, type IntegrationRequest, integrateOrbit, stateFromMean } from '../../../core/index';
import { at } from './orbits';

const { earth } = bodies;
const zonals = { zonalDegree: 2, sun: false, moon: false } as const;

function request(change: Partial<IntegrationRequest> = {}): IntegrationRequest {
  return {
    body: earth,
    state: stateFromMean(earth, at({})),
    epochJd: 2_461_193,
    spanDays: 2,
    forces: zonals,
    sampleDays: 0.5,
    ...change,
  };
}

describe('integrateOrbit', () => {
  it('gives samples that far apart, the start and the end among them', () => {
    const { samples, endedBy, endDays } = integrateOrbit(request({ spanDays: 1.2 }));
    expect(samples.map(({ days }) => days)).toEqual([0, 0.5, 1, 1.2]);
    expect(endedBy).toBe('span');
    expect(endDays).toBe(1.2);
    expect(samples[0]?.state).toEqual(request().state);
  });

  it('follows an ellipse without forces and comes back to where it started', () => {
    const mean = at({ eccentricity: 0.7, semiMajorAxisKm: 26_000 });
    const body = customBody({ name: 'point', muKm3PerS2: earth.muKm3PerS2, radiusKm: 6378, zonals: [] });
    const periodDays = (2 * Math.PI * Math.sqrt(26_000 ** 3 / body.muKm3PerS2)) / 86_400;
    const state = stateFromMean(body, mean);
    const { samples } = integrateOrbit(request({ body, state, spanDays: 3 * periodDays, sampleDays: 3 * periodDays }));
    samples.at(-1)?.state.positionKm.forEach((part, index) => {
      expect(Math.abs(part - (state.positionKm[index] ?? Number.NaN))).toBeLessThan(1e-6);
    });
  });

  it('lets node and perigee run on past a whole turn', () => {
    const state = stateFromMean(earth, at({ inclinationRad: 0.5, nodeRad: 0.05, perigeeRad: 6.2 }));
    const { samples } = integrateOrbit(request({ state, spanDays: 20, sampleDays: 5 }));
    const nodes = samples.map(({ mean }) => mean.nodeRad);
    const perigees = samples.map(({ mean }) => mean.perigeeRad);
    expect(nodes.at(-1)).toBeLessThan(-1);
    expect(nodes).toEqual([...nodes].sort((a, b) => b - a));
    expect(perigees.at(-1)).toBeGreaterThan(7);
    expect(perigees).toEqual([...perigees].sort((a, b) => a - b));
  });

  it('ends where the orbit meets the surface, at its height', () => {
    const state = stateFromMean(earth, at({ eccentricity: 0.2, meanAnomalyRad: Math.PI }));
    const { samples, endedBy, endDays } = integrateOrbit(request({ state }));
    expect(endedBy).toBe('decay');
    expect(endDays).toBeGreaterThan(0.01);
    expect(endDays).toBeLessThan(0.04);
    expect(Math.hypot(...(samples.at(-1)?.state.positionKm ?? []))).toBeCloseTo(earth.equatorialRadiusKm, 3);
  });

  it('sees a perigee dip below the surface between two steps', () => {
    // A coarse tolerance: steps leap over the few seconds below.
    const body = customBody({ name: 'point', muKm3PerS2: earth.muKm3PerS2, radiusKm: 6378, zonals: [] });
    const state = stateFromMean(body, at({ eccentricity: 1 - 6377.9 / 7000, meanAnomalyRad: Math.PI }));
    const { endedBy } = integrateOrbit(request({ body, state, relativeTolerance: 1e-6 }));
    expect(endedBy).toBe('decay');
  });

  it('decays at once where it starts below', () => {
    const state = stateFromMean(earth, at({ semiMajorAxisKm: 6300 }));
    expect(integrateOrbit(request({ state }))).toMatchObject({ endedBy: 'decay', endDays: 0 });
  });

  it('sinks with drag until drag has won', () => {
    const drag = { massKg: 100, areaM2: 1, dragCoefficient: 2.2, density: 'mean' } as const;
    const state = stateFromMean(earth, at({ semiMajorAxisKm: earth.equatorialRadiusKm + 200, eccentricity: 0.001 }));
    const { samples, endedBy } = integrateOrbit(request({ state, spanDays: 20, forces: { ...zonals, drag } }));
    expect(endedBy).toBe('decay');
    const heights = samples.map(({ mean }) => mean.semiMajorAxisKm);
    expect(heights).toEqual([...heights].sort((a, b) => b - a));
    expect(Math.hypot(...(samples.at(-1)?.state.positionKm ?? []))).toBeCloseTo(earth.equatorialRadiusKm + 120, 3);
  });

  it('escapes where the Moon opens the ellipse, and keeps the samples before', () => {
    // Apogee far beyond the Moon: energy is so near zero that its pull, and the Sun's, suffices within a few turns.
    const escaped = [0, 1, 2, 3, 4, 5].map((node) => {
      const state = stateFromMean(
        earth,
        at({ semiMajorAxisKm: 600_000, eccentricity: 0.988, inclinationRad: 0.4, nodeRad: node }),
      );
      const forces = { zonalDegree: 0, sun: true, moon: true };
      return integrateOrbit(request({ state, spanDays: 200, sampleDays: 5, forces }));
    });
    const gone = escaped.filter(({ endedBy }) => endedBy === 'escape');
    expect(gone.length).toBeGreaterThan(0);
    for (const { samples, endDays } of gone) {
      expect(samples.length).toBeGreaterThan(0);
      for (const { days, mean } of samples) {
        expect(days).toBeLessThanOrEqual(endDays);
        expect(mean.eccentricity).toBeLessThan(1);
      }
    }
  });

  it('tells of its progress, rising to nearly 1', () => {
    const shares: number[] = [];
    integrateOrbit(request({ spanDays: 5 }), { onProgress: (share) => shares.push(share) });
    expect(shares.length).toBeGreaterThan(50);
    expect(shares.length).toBeLessThanOrEqual(200);
    expect(shares).toEqual([...shares].sort((a, b) => a - b));
    expect(shares.at(-1)).toBeGreaterThan(0.98);
  });

  it('names the forces that a body has no model of', () => {
    const state = stateFromMean(bodies.mars, at({ semiMajorAxisKm: 3800 }));
    const forces = { zonalDegree: 4, sun: true, moon: true };
    const { leftOut } = integrateOrbit(request({ body: bodies.mars, state, forces, spanDays: 0.1 }));
    expect(leftOut.map(({ force }) => force)).toEqual(['sun', 'moon']);
  });

  it.each([
    [{ spanDays: 0 }, /span/],
    [{ spanDays: -1 }, /span/],
    [{ spanDays: 6000 }, /span/],
    [{ sampleDays: 0 }, /sample/],
    [{ epochJd: Number.NaN }, /epoch/],
    [{ forces: { ...zonals, zonalDegree: 15 } }, /zonal/],
    [{ relativeTolerance: 0 }, /tolerance/],
    [{ state: { positionKm: [7000, 0, 0], velocityKmPerS: [0, 12, 0] } }, /escape/],
    [{ state: { positionKm: [7000, 0, 0], velocityKmPerS: [0, Number.NaN, 0] } }, /finite/],
  ] as const)('refuses %o', (change, message) => {
    expect(() => integrateOrbit(request(change))).toThrow(message);
  });
});
