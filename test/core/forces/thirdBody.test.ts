import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type ThirdBody, thirdBodyForce } from '../../../core/forces/thirdBody';

const place = [3e5, -2e5, 1e5] as const;
const moonLike: ThirdBody = { id: 'x', muKm3PerS2: 4902.8, place: () => place, nearestKm: 356_400 };

function pullAt(body: ThirdBody, position: readonly number[]): Float64Array {
  const sum = new Float64Array(3);
  thirdBodyForce(body).add(sum, Float64Array.of(...position, 0, 0, 0), 0);
  return sum;
}

describe('pull of a third body', () => {
  it('is the direct pull less that on the centre', () => {
    const coordinate = fc.double({ min: -5e4, max: 5e4, noNaN: true });
    fc.assert(
      fc.property(coordinate, coordinate, coordinate, (x, y, z) => {
        const found = pullAt(moonLike, [x, y, z]);
        const d = [place[0] - x, place[1] - y, place[2] - z];
        const [d3, s3] = [Math.hypot(...d) ** 3, Math.hypot(...place) ** 3];
        found.forEach((value, axis) => {
          const plain = 4902.8 * ((d[axis] ?? 0) / d3 - (place[axis] ?? 0) / s3);
          // The plain difference is good to rounding of its terms, 4e-8 km/s².
          expect(Math.abs(value - plain)).toBeLessThan(1e-22);
        });
      }),
      { seed: 1987, numRuns: 200 },
    );
  });

  it('keeps its digits where the plain difference loses them: a metre from the centre it is the tide', () => {
    const far: ThirdBody = { ...moonLike, muKm3PerS2: 1.327e11, place: () => [1.496e8, 0, 0] };
    const tide = 1.327e11 / 1.496e8 ** 3;
    const [x = 0, y = 0] = pullAt(far, [1e-3, 1e-3, 0]);
    expect(x / (2 * tide * 1e-3)).toBeCloseTo(1, 9);
    expect(y / (-tide * 1e-3)).toBeCloseTo(1, 9);
  });

  it('asks for the place once a date', () => {
    let asked = 0;
    const force = thirdBodyForce({
      ...moonLike,
      place: () => {
        asked += 1;
        return place;
      },
    });
    for (const jd of [1, 1, 1, 2, 2]) force.add(new Float64Array(3), Float64Array.of(7000, 0, 0, 0, 0, 0), jd);
    expect(asked).toBe(2);
  });
});
