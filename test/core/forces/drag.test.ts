import { describe, expect, it } from 'vitest';
import { airDensityKgPerM3 } from '../../../core/bodies/atmosphere';
import { ballisticKgPerM2, dragForce } from '../../../core/forces/drag';
import { bodies, ellipsoidHeightKm, stateFromElements, stateFromMean } from '../../../core/index';
import { equinoctialFromElements } from '../../../core/mission/equinoctial';
import { gaussAverage } from '../../../core/mission/gaussAverage';
import { at } from '../mission/orbits';

const { earth } = bodies;
const drag = { massKg: 200, areaM2: 1, dragCoefficient: 2, density: 'mean' } as const;

function pullAt(along: 'true' | 'mean', motion: Float64Array): Float64Array {
  const sum = new Float64Array(3);
  dragForce(earth, drag, { along }).add(sum, motion, 0);
  return sum;
}

describe('drag', () => {
  it('is ½ ρ v²/(m/(Cd A)) against the motion through air that turns', () => {
    const motion = Float64Array.of(6878.137, 0, 0, 0, 7.6, 0);
    const speedMPerS = 7600 - 6878137 * 7.292115e-5;
    const expected = (-0.5 * airDensityKgPerM3(500) * speedMPerS ** 2) / 100 / 1000;
    const [x, y = 0, z] = pullAt('true', motion);
    expect(y / expected).toBeCloseTo(1, 9);
    expect([x, z].map((value) => Math.abs(value ?? 1))).toEqual([0, 0]);
    expect(ballisticKgPerM2(drag)).toBe(100);
  });

  it('scales with level and factor', () => {
    const motion = Float64Array.of(6878.137, 0, 0, 0, 7.6, 0);
    const at = (density: 'low' | 'mean' | 'high' | number) => {
      const sum = new Float64Array(3);
      dragForce(earth, { ballisticKgPerM2: 100, density }, { along: 'true' }).add(sum, motion, 0);
      return sum[1] ?? Number.NaN;
    };
    expect(at('low') / at('mean')).toBeCloseTo(0.5, 12);
    expect(at('high') / at('mean')).toBeCloseTo(2, 12);
    expect(at(0)).toBeCloseTo(0, 30);
  });

  it('on the mean orbit reads the density at the height of the true one', () => {
    for (const perigeeRad of [0, 1, 2.5, 4]) {
      for (const meanAnomalyRad of [0, 0.9, 2, 3.1, 5]) {
        const mean = at({ semiMajorAxisKm: 6850, eccentricity: 0.01, inclinationRad: 1.2, perigeeRad, meanAnomalyRad });
        const plain = stateFromElements(earth.muKm3PerS2, mean);
        const motion = Float64Array.of(...plain.positionKm, ...plain.velocityKmPerS);
        const ratio = Math.hypot(...pullAt('mean', motion)) / Math.hypot(...pullAt('true', motion));
        // The density alone differs, so that its ratio tells the shift of height.
        const trueKm = ellipsoidHeightKm(earth, stateFromMean(earth, mean).positionKm);
        const meanKm = ellipsoidHeightKm(earth, plain.positionKm);
        // Half a kilometre: what is left of the latitude's own shift, and of the second order.
        const shift = -Math.log(ratio) * 60;
        expect(Math.abs(shift - (trueKm - meanKm))).toBeLessThan(0.8);
      }
    }
  });

  it.each([
    [6728, 0],
    [6728, 0.001],
    [7253, 0.0862],
    [24_400, 0.73],
    [6900, 0.03],
  ])(
    'its average has points enough: twice as many change it by 1e-3 at most (a %d, e %d)',
    (semiMajorAxisKm, eccentricity) => {
      const force = dragForce(earth, drag, { along: 'mean' });
      const rateOf = (times: number) => {
        const rates = new Float64Array(6);
        const more = { ...force, averagingPoints: (a: number, e: number) => times * force.averagingPoints(a, e) };
        const values = equinoctialFromElements(at({ semiMajorAxisKm, eccentricity }), 1);
        gaussAverage(earth.muKm3PerS2, [more], 1)(rates, values, 0);
        return rates[0] ?? Number.NaN;
      };
      expect(Math.abs(rateOf(1) / rateOf(8) - 1)).toBeLessThan(1e-3);
    },
  );

  it('needs a rotation', () => {
    expect(() => dragForce({ ...earth, rotationRadPerS: null }, drag, { along: 'true' })).toThrow(/rotation/);
  });
});
