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

  it.each([
    { body: earth, eccentricity: 0.74 },
    { body: earth, eccentricity: 0.93 },
    { body: earth, eccentricity: 0.99 },
    { body: saturn, eccentricity: 0.4 },
    { body: saturn, eccentricity: 0.9 },
  ])(
    'finds the extremes of steep ellipses, where perigee passes in a moment ($body.name, e $eccentricity)',
    ({ body, eccentricity }) => {
      for (const perigeeRad of [0.5, 1.8, 2.6, 5.4]) {
        const mean = {
          semiMajorAxisKm: (1.25 * body.radiusKm) / (1 - eccentricity),
          eccentricity,
          inclinationRad: 1.15,
          nodeRad: 1,
          perigeeRad,
          meanAnomalyRad: 0,
        };
        const walk = Array.from({ length: 4000 }, (_, k) => {
          const eccentric = (2 * Math.PI * k) / 4000;
          const meanAnomalyRad = eccentric - eccentricity * Math.sin(eccentric);
          return ellipsoidHeightKm(body, stateFromMean(body, { ...mean, meanAnomalyRad }).positionKm);
        });
        const { leastKm, greatestKm } = heightsAlongOrbit(body, mean);
        // A share of the height: the walk itself steps past the vertex by up to 1e-6 of the radius at e 0.99.
        expect(Math.abs(leastKm - Math.min(...walk)) / body.radiusKm).toBeLessThan(1e-5);
        expect(Math.abs(greatestKm / Math.max(...walk) - 1)).toBeLessThan(1e-6);
      }
    },
  );
});
