import { describe, expect, it } from 'vitest';
import { bodies } from '../../../core/bodies/bodies';
import { ellipsoidHeightKm, heightsAlongOrbit } from '../../../core/orbit/heights';
import { stateFromMean } from '../../../core/orbit/meanState';

const { earth, saturn } = bodies;

describe('height above the ellipsoid', () => {
  it.each([earth, saturn])('inverts the position of a geodetic point at $name', (body) => {
    const e2 = body.flattening * (2 - body.flattening);
    for (const latitude of [0, 0.4, -0.9, 1.2, Math.PI / 2]) {
      for (const heightKm of [-10, 0, 550, 35786]) {
        const normal = body.equatorialRadiusKm / Math.sqrt(1 - e2 * Math.sin(latitude) ** 2);
        const point = [
          (normal + heightKm) * Math.cos(latitude),
          0,
          (normal * (1 - e2) + heightKm) * Math.sin(latitude),
        ] as const;
        expect(ellipsoidHeightKm(body, point)).toBeCloseTo(heightKm, 6);
      }
    }
  });

  it('finds the extremes that a dense walk along the revolution finds', () => {
    for (const [eccentricity, perigeeRad] of [
      [0.0011, Math.PI / 2],
      [0.02, 0.4],
      [0, 0],
      [0.7, 4],
    ] as const) {
      const mean = {
        semiMajorAxisKm: eccentricity > 0.1 ? 26554 : 7000,
        eccentricity,
        inclinationRad: 1.7,
        nodeRad: 0.2,
        perigeeRad,
        meanAnomalyRad: 0,
      };
      const walk = Array.from({ length: 36_000 }, (_, k) => {
        const meanAnomalyRad = (2 * Math.PI * k) / 36_000;
        return ellipsoidHeightKm(earth, stateFromMean(earth, { ...mean, meanAnomalyRad }).positionKm);
      });
      const { leastKm, greatestKm } = heightsAlongOrbit(earth, mean);
      expect(Math.abs(leastKm - Math.min(...walk))).toBeLessThan(0.01);
      expect(Math.abs(greatestKm - Math.max(...walk))).toBeLessThan(0.01);
    }
  });
});
