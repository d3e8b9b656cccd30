/**
 * Orbits that the external tests go through: a fixed list that fills its ranges evenly.
 *
 * Additive recurrences with irrational steps (Weyl) spread better than random draws and are the same on every machine.
 */
import type { KeplerianElements } from '../../../core/index';

const twoPi = 2 * Math.PI;
const radPerDeg = Math.PI / 180;
const equatorKm = 6378.137;

/** Places in [0, 1) of the k-th orbit along the d-th quantity: fractions of k √prime. */
function spread(index: number, dimension: number): number {
  const steps = [Math.SQRT2, Math.sqrt(3), Math.sqrt(5), Math.sqrt(7), Math.sqrt(11), Math.sqrt(13)];
  const along = 0.5 + (index + 1) * (steps[dimension] ?? Number.NaN);
  return along - Math.floor(along);
}

function orbit(
  index: number,
  semiMajorAxisKm: number,
  eccentricity: number,
  inclinationDeg: number,
): KeplerianElements {
  return {
    semiMajorAxisKm,
    eccentricity,
    inclinationRad: inclinationDeg * radPerDeg,
    nodeRad: twoPi * spread(index, 3),
    perigeeRad: twoPi * spread(index, 4),
    meanAnomalyRad: twoPi * spread(index, 5),
  };
}

const numbered = (count: number) => Array.from({ length: count }, (_, index) => index);
const anyInclinationDeg = (index: number) => 2 + 176 * spread(index, 2);

/** Low orbits: mean height 400 to 1500 km, e below 0.03 and a perigee that clears the air, i 2° to 178°. */
export function lowOrbits(count: number): readonly KeplerianElements[] {
  return numbered(count).map((index) => {
    const a = equatorKm + 400 + 1100 * spread(index, 0);
    const mostE = Math.min(0.03, 1 - (equatorKm + 200) / a);
    return orbit(index, a, mostE * spread(index, 1), anyInclinationDeg(index));
  });
}

/** Sun-synchronous and its neighbourhood: 500 to 900 km, nearly circular. */
export function nearPolarOrbits(count: number): readonly KeplerianElements[] {
  return numbered(count).map((index) =>
    orbit(index, equatorKm + 500 + 400 * spread(index, 0), 0.002 * spread(index, 1), 97 + 3 * spread(index, 2)),
  );
}

/** Nearly circular from 1500 to 30 000 km. */
export function highOrbits(count: number): readonly KeplerianElements[] {
  return numbered(count).map((index) =>
    orbit(index, equatorKm + 1500 + 28_500 * spread(index, 0), 0.03 * spread(index, 1), anyInclinationDeg(index)),
  );
}

/** Ellipses: e from 0.03 to 0.7, perigee at 400 km or above, apogee at 30 000 km or below. */
export function ellipses(count: number): readonly KeplerianElements[] {
  return numbered(count).map((index) => {
    const mostE = Math.min(0.7, 29_600 / (2 * equatorKm + 30_400));
    const eccentricity = 0.03 + (mostE - 0.03) * spread(index, 1);
    const leastA = (equatorKm + 400) / (1 - eccentricity);
    const mostA = (equatorKm + 30_000) / (1 + eccentricity);
    return orbit(index, leastA + (mostA - leastA) * spread(index, 0), eccentricity, anyInclinationDeg(index));
  });
}

/** Transfer ellipses with e at its greatest, 0.6 to 0.7: perigee at 400 to 1000 km, a up to 24 000 km. */
export function steepEllipses(count: number): readonly KeplerianElements[] {
  return numbered(count).map((index) => {
    const eccentricity = 0.6 + 0.1 * spread(index, 1);
    const perigeeKm = equatorKm + 400 + 600 * spread(index, 0);
    return orbit(index, perigeeKm / (1 - eccentricity), eccentricity, anyInclinationDeg(index));
  });
}
