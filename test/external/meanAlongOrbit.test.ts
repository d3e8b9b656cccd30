/**
 * Mean elements taken at 24 places along one integrated revolution must tell one story, in a field of J2 alone.
 *
 * Shape and plane must be the same wherever they are taken, and node and argument of latitude, carried back to the
 * start by the secular rates, must too. What is left is second order; a slip in any short-period term is first
 * order, hundreds of times larger.
 */
import { describe, expect, it } from 'vitest';
import { type KeplerianElements, secularRates, stateFromElements, tryMeanFromState } from '../../core/index';
import { cutField } from './truth/fields';
import { integrateTo, noIntegrands, startOf } from './truth/integrate';
import { ellipses, lowOrbits } from './truth/orbitList';
import { median, worst } from './truth/statistics';

const { body, field } = cutField(2);
const places = 24;

interface Spread {
  readonly axis: number;
  readonly eccentricity: number;
  readonly plane: number;
  readonly latitude: number;
}

function meansAlong(elements: KeplerianElements): readonly (KeplerianElements & { readonly timeS: number })[] {
  const periodS = 2 * Math.PI * Math.sqrt(elements.semiMajorAxisKm ** 3 / field.muKm3PerS2);
  let motion = startOf(stateFromElements(field.muKm3PerS2, elements));
  return Array.from({ length: places }, (_, index) => {
    motion = integrateTo(field, motion, (index * periodS) / places, noIntegrands);
    const result = tryMeanFromState(body, motion);
    if (!result.ok) throw new Error(result.message);
    return { ...result.mean, timeS: motion.timeS };
  });
}

const average = (values: readonly number[]) => values.reduce((sum, value) => sum + value, 0) / values.length;
const halfRange = (values: readonly number[]) => 0.5 * (Math.max(...values) - Math.min(...values));
/** Near the first value, so that a spread is not cut by a full turn. */
const unwrapped = (angles: readonly number[]) =>
  angles.map((angle) => angle - 2 * Math.PI * Math.round((angle - (angles[0] ?? 0)) / (2 * Math.PI)));

/** Half of greatest minus least, m along the orbit or across it. */
function spreadOf(elements: KeplerianElements): Spread {
  const means = meansAlong(elements);
  const a = average(means.map((mean) => mean.semiMajorAxisKm));
  const rates = secularRates(
    body,
    {
      ...elements,
      semiMajorAxisKm: a,
      eccentricity: average(means.map((mean) => mean.eccentricity)),
      inclinationRad: average(means.map((mean) => mean.inclinationRad)),
    },
    'second',
  );
  const nodes = unwrapped(means.map((mean) => mean.nodeRad - rates.nodeRadPerS * mean.timeS));
  const perigees = means.map((mean) => mean.perigeeRad - rates.perigeeRadPerS * mean.timeS);
  const anomalies = means.map((mean) => mean.meanAnomalyRad - rates.meanAnomalyRadPerS * mean.timeS);
  const part = (wave: (angle: number) => number) =>
    halfRange(means.map((mean, index) => mean.eccentricity * wave(perigees[index] ?? Number.NaN)));
  const cosine = Math.cos(elements.inclinationRad);
  // Node and latitude trade places as the plane nears the equator: their sum along the orbit is what counts.
  const latitudes = unwrapped(
    nodes.map((node, index) => (perigees[index] ?? 0) + (anomalies[index] ?? 0) + cosine * node),
  );
  const metres = 1000 * a;
  return {
    axis: 1000 * halfRange(means.map((mean) => mean.semiMajorAxisKm)),
    eccentricity: metres * Math.hypot(part(Math.cos), part(Math.sin)),
    plane:
      metres *
      Math.hypot(
        halfRange(means.map((mean) => mean.inclinationRad)),
        Math.sin(elements.inclinationRad) * halfRange(nodes),
      ),
    latitude: metres * halfRange(latitudes),
  };
}

/** Metres, medians: what was measured, with room for a factor of about one and a half. */
const tolerances = [
  { name: 'low, e < 0.03', orbits: lowOrbits(32), axis: 5, eccentricity: 20, plane: 2.5, latitude: 35 },
  { name: 'ellipses, e 0.03 to 0.7', orbits: ellipses(32), axis: 6, eccentricity: 4, plane: 1.2, latitude: 6 },
] as const;

describe('mean elements along one integrated revolution', () => {
  it.each(tolerances)('stay the same, $name', ({ name, orbits, ...bounds }) => {
    const spreads = orbits.map(spreadOf);
    for (const key of ['axis', 'eccentricity', 'plane', 'latitude'] as const) {
      const values = spreads.map((spread) => spread[key]);
      console.log(
        `${key} along a revolution, ${name}: median ${median(values).toFixed(1)} m, worst ${worst(values).toFixed(1)} m`,
      );
      expect.soft(median(values)).toBeLessThan(bounds[key]);
    }
  });
});
