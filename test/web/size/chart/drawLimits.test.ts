import { describe, expect, it } from 'vitest';
import { bodies, type Limit, radPerDeg, violatesAt } from '../../../../core/index';
import { runsOutside } from '../../../../web/size/chart/drawLimits';
import { mappingOf } from '../../../../web/size/chart/plotBox';

const body = bodies.earth;
const mapping = mappingOf(
  { left: 50, top: 20, right: 650, bottom: 380 },
  { fromRad: 0, toRad: Math.PI, fromKm: -100, toKm: 1600 },
);
const angles = { nodeRad: 1, perigeeRad: 1.5, meanAnomalyRad: 0 };
const outside = (...limits: Limit[]) =>
  runsOutside({
    mapping,
    body,
    shape: { kind: 'eccentricity', eccentricity: 0.001 },
    ground: { limits, angles, epochJd: null },
  });

describe('the part of the chart outside the limits', () => {
  it('ends where the limit does, to a fraction of a pixel', () => {
    const runs = outside({ reading: 'inclination', bound: 'atMost', value: 90 * radPerDeg });
    expect(runs).toHaveLength(120);
    for (const { left, right } of runs) {
      expect(Math.abs(left - 350)).toBeLessThan(0.5);
      expect(right).toBe(650);
    }
  });

  it('is every orbit that breaks a limit, and no other', () => {
    const limits: Limit[] = [
      { reading: 'nodeRate', bound: 'atLeast', value: -6e-7 },
      { reading: 'perigeeAltitude', bound: 'atMost', value: 1000 },
    ];
    const runs = outside(...limits);
    for (let y = 21.5; y < 380; y += 3 * 13) {
      for (let x = 60; x < 650; x += 37) {
        const { inclinationRad, altitudeKm } = mapping.pointAt(x, y);
        const mean = {
          ...angles,
          semiMajorAxisKm: body.equatorialRadiusKm + altitudeKm,
          eccentricity: 0.001,
          inclinationRad,
        };
        const isDrawn = runs.some((run) => Math.abs(run.y - y) < 1 && x > run.left && x < run.right);
        expect(isDrawn, `${x} ${y}`).toBe(violatesAt(body, mean, null, limits));
      }
    }
  });

  it('is nothing where every orbit keeps the limits, and is found in little time', () => {
    const never: Limit = { reading: 'leastHeight', bound: 'atMost', value: 1e9 };
    expect(outside(never)).toEqual([]);
    let bestMs = Number.POSITIVE_INFINITY;
    for (let round = 0; round < 8; round += 1) {
      const start = performance.now();
      outside(never, { reading: 'nodeRate', bound: 'atMost', value: 1 });
      bestMs = Math.min(bestMs, performance.now() - start);
    }
    console.log(`Shading with two limits: ${bestMs.toFixed(2)} ms`);
    expect(bestMs).toBeLessThan(100);
  });
});
