import { describe, expect, it } from 'vitest';
import { bodies } from '../../../core/bodies/bodies';
import { radPerDeg } from '../../../core/numerics/angles';
import { heightsAlongOrbit } from '../../../core/orbit/heights';
import { roughHeights } from '../../../core/orbit/roughHeights';

/** Largest difference in km of least and greatest height from those along the osculating orbit. */
function worst(eccentricities: readonly number[], altitudesKm: readonly number[], body = bodies.earth): number {
  let largest = 0;
  for (const eccentricity of eccentricities) {
    for (const perigeeKm of altitudesKm) {
      for (let deg = 0; deg <= 180; deg += 15) {
        for (const perigeeRad of [0, 0.8, 1.6, 4.4]) {
          const semiMajorAxisKm = (body.equatorialRadiusKm + perigeeKm) / (1 - eccentricity);
          const angles = { inclinationRad: deg * radPerDeg, nodeRad: 0, perigeeRad, meanAnomalyRad: 0 };
          const mean = { semiMajorAxisKm, eccentricity, ...angles };
          const [rough, exact] = [roughHeights(body, mean), heightsAlongOrbit(body, mean)];
          largest = Math.max(largest, Math.abs(rough.leastKm - exact.leastKm));
          largest = Math.max(largest, Math.abs(rough.greatestKm - exact.greatestKm));
        }
      }
    }
  }
  return largest;
}

describe('rough heights', () => {
  it('are within 0.7 km of the heights along near-circular orbits', () => {
    expect(worst([0, 0.001, 0.02], [300, 700, 1400])).toBeLessThan(0.7);
  });

  it('are within two kilometres on ellipses', () => {
    expect(worst([0.1, 0.3, 0.7], [300, 1000])).toBeLessThan(2);
  });

  it('hold at a body with another shape', () => {
    expect(worst([0.001, 0.02], [400, 1000], bodies.mars)).toBeLessThan(1);
  });
});
