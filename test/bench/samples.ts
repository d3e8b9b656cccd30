/** Orbits to measure with: seeded, so that every run measures the same ones. */
import type { Body, MeanElements } from '../../core/index';
import type { Columns, Field } from './inlined';

/** So few that they stay in the processor's cache: calls are compared, not objects' and arrays' use of memory. */
const count = 2000;

/** Lehmer's generator: x ← 48271 x mod (2³¹ − 1) (Park, Miller, Stockmeyer, CACM 36, 1993, from memory). */
function seeded(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state * 48_271) % 2_147_483_647;
    return state / 2_147_483_647;
  };
}

/** From 300 km upwards, e to 0.7, every inclination. */
export function randomOrbits(): readonly MeanElements[] {
  const random = seeded(1959);
  const turn = () => 2 * Math.PI * random();
  return Array.from({ length: count }, () => {
    const eccentricity = 0.7 * random();
    return {
      semiMajorAxisKm: (6678 + 4000 * random()) / (1 - eccentricity),
      eccentricity,
      inclinationRad: Math.PI * random(),
      nodeRad: turn(),
      perigeeRad: turn(),
      meanAnomalyRad: turn(),
    };
  });
}

export function columnsOf(orbits: readonly MeanElements[]): Columns {
  return {
    axisKm: Float64Array.from(orbits, (orbit) => orbit.semiMajorAxisKm),
    eccentricity: Float64Array.from(orbits, (orbit) => orbit.eccentricity),
    inclinationRad: Float64Array.from(orbits, (orbit) => orbit.inclinationRad),
    nodeRadPerS: new Float64Array(orbits.length),
    perigeeRadPerS: new Float64Array(orbits.length),
    meanAnomalyRadPerS: new Float64Array(orbits.length),
  };
}

export function fieldOf({ muKm3PerS2, radiusKm, zonals }: Body): Field {
  return { muKm3PerS2, radiusKm, j2: zonals[2] ?? 0, j4: zonals[4] ?? 0 };
}
