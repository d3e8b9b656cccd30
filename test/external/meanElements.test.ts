/**
 * Mean elements against numerical averages of integrated orbits, in a field of J2 alone.
 *
 * The states come from osculating elements, so that nothing of the conversion under test makes them.
 */
import { describe, expect, it } from 'vitest';
import {
  type KeplerianElements,
  type StateVector,
  stateFromElements,
  stateFromMean,
  tryMeanFromState,
} from '../../core/index';
import { atApogee, atNode, revolutionAverageKm } from './truth/averages';
import { cutField } from './truth/fields';
import { integrateTo, noIntegrands, startOf } from './truth/integrate';
import { ellipses, highOrbits, lowOrbits, nearPolarOrbits, steepEllipses } from './truth/orbitList';
import { median, quantile, worst } from './truth/statistics';
import { energy } from './truth/zonalField';

const { body, field } = cutField(2);

/**
 * Metres. The first group's 30 m (95 %) is the promise: what first order leaves out of a in low orbit, and the few metres
 * by which an average of osculating a sits off Brouwer's mean. The other bounds are what was measured, rounded up by
 * about a third: they hold the theory to its known size there. Transfer ellipses are worst where the state is taken near
 * perigee, where the J2² terms that first order leaves out grow as (a/r)⁶.
 */
const tolerances = [
  { name: 'low, e < 0.03', orbits: lowOrbits(80), most95: 30, mostEver: 45 },
  { name: 'near-polar, e < 0.002', orbits: nearPolarOrbits(20), most95: 30, mostEver: 45 },
  { name: 'high, e < 0.03', orbits: highOrbits(30), most95: 2, mostEver: 3 },
  { name: 'ellipses, e 0.03 to 0.7', orbits: ellipses(40), most95: 12, mostEver: 16 },
  { name: 'transfer, e 0.6 to 0.7', orbits: steepEllipses(20), most95: 170, mostEver: 300 },
] as const;

/**
 * Round trip: 1 mm and 1 µm/s. A state may also be said not to converge, but every one of this list does, so that is
 * asked too.
 */
const roundTrip = { km: 1e-6, kmPerS: 1e-9 };

/** Terms in the anomaly overtake those in twice the latitude near here; the two averages differ by under 1 m. */
const apogeeFrom = 0.2;

function meanOf(state: StateVector): KeplerianElements {
  const result = tryMeanFromState(body, state);
  if (!result.ok) throw new Error(result.message);
  return result.mean;
}

function averageKm(elements: KeplerianElements, state: StateVector): number {
  const apogee = elements.eccentricity >= apogeeFrom;
  const ahead = (apogee ? Math.PI : 2 * Math.PI - elements.perigeeRad) - elements.meanAnomalyRad;
  const secondsPerRad = Math.sqrt(elements.semiMajorAxisKm ** 3 / field.muKm3PerS2);
  return revolutionAverageKm(field, state, apogee ? atApogee : atNode, ahead * secondsPerRad);
}

describe('integrated orbits', () => {
  it('keep energy and the axial momentum for a day of revolutions', () => {
    for (const elements of [...lowOrbits(3), ...steepEllipses(3)]) {
      const start = startOf(stateFromElements(field.muKm3PerS2, elements));
      const end = integrateTo(field, start, 86_400, noIntegrands);
      const [before, after] = [start, end].map((motion) => ({
        energy: energy(field, motion.positionKm, motion.velocityKmPerS),
        axial: motion.positionKm[0] * motion.velocityKmPerS[1] - motion.positionKm[1] * motion.velocityKmPerS[0],
      }));
      // 1e-11 of the energy is 0.07 mm of a.
      expect(Math.abs((after?.energy ?? 0) / (before?.energy ?? 1) - 1)).toBeLessThan(1e-11);
      expect(Math.abs((after?.axial ?? 0) / (before?.axial ?? 1) - 1)).toBeLessThan(1e-11);
    }
  });
});

describe('mean semi-major axis against the average over one revolution', () => {
  it.each(tolerances)('$name', ({ name, orbits, most95, mostEver }) => {
    const differencesM = orbits.map((elements) => {
      const state = stateFromElements(field.muKm3PerS2, elements);
      return 1000 * (averageKm(elements, state) - meanOf(state).semiMajorAxisKm);
    });
    const [middle, share95, most] = [median(differencesM), quantile(differencesM, 0.95), worst(differencesM)];
    console.log(
      `a, average over a revolution minus mean, m: ${name}: ${orbits.length} orbits, ` +
        `median ${middle.toFixed(1)}, 95 % ${share95.toFixed(1)}, worst ${most.toFixed(1)}`,
    );
    expect(share95).toBeLessThan(most95);
    expect(most).toBeLessThan(mostEver);
  });

  it.each(tolerances)('returns each state of: $name', ({ orbits }) => {
    for (const elements of orbits) {
      const state = stateFromElements(field.muKm3PerS2, elements);
      const back = stateFromMean(body, meanOf(state));
      const miss = (a: readonly number[], b: readonly number[]) => Math.hypot(...a.map((x, k) => x - (b[k] ?? 0)));
      expect(miss(back.positionKm, state.positionKm)).toBeLessThan(roundTrip.km);
      expect(miss(back.velocityKmPerS, state.velocityKmPerS)).toBeLessThan(roundTrip.kmPerS);
    }
  });
});
