/** Averages along integrated orbits: of a over one revolution, of the angle rates over many. */
import { type Integrands, integrateTo, type Motion, noIntegrands, startOf } from './integrate';
import { type AngleRates, angleRates, dot, semiMajorAxisKm } from './osculating';
import { perturbingAcceleration, type ZonalField } from './zonalField';

interface Start {
  readonly positionKm: readonly number[];
  readonly velocityKmPerS: readonly number[];
}

/** A quantity whose rising (or falling) zero marks a place on the revolution, with its rate. */
type Mark = (field: ZonalField, motion: Motion) => { readonly value: number; readonly rate: number };

export const atNode: Mark = (_, { positionKm, velocityKmPerS }) => ({ value: positionKm[2], rate: velocityKmPerS[2] });

/** r·v; falls through zero at apogee. */
export const atApogee: Mark = (field, { positionKm, velocityKmPerS }) => {
  const extra = perturbingAcceleration(field, ...positionKm);
  const pull = dot(positionKm, extra) - field.muKm3PerS2 / Math.hypot(...positionKm);
  return { value: dot(positionKm, velocityKmPerS), rate: dot(velocityKmPerS, velocityKmPerS) + pull };
};

/**
 * Time average of the osculating a (km) over the one revolution that begins nearest to `firstGuessS`.
 *
 * In a J2 field a returns to itself only when every angle in it does, and no revolution closes all of them: perigee
 * moves. Node to node closes the terms in twice the argument of latitude (9 km in low orbit, what is left of the others
 * goes with e); apogee to apogee closes the terms in the anomaly, and begins and ends where those in twice the
 * latitude are weakest. The first is right for small e, the second for large.
 */
export function revolutionAverageKm(field: ZonalField, state: Start, mark: Mark, firstGuessS: number): number {
  const a = semiMajorAxisKm(field.muKm3PerS2, startOf(state).positionKm, startOf(state).velocityKmPerS);
  const periodS = 2 * Math.PI * Math.sqrt(a ** 3 / field.muKm3PerS2);
  const integrands: Integrands = (_, position, velocity) => [semiMajorAxisKm(field.muKm3PerS2, position, velocity)];
  const first = settle(field, integrateTo(field, startOf(state), firstGuessS, noIntegrands), mark, noIntegrands);
  const begin = startOf(first, 1);
  const end = settle(field, integrateTo(field, begin, periodS, integrands), mark, integrands);
  return (end.integrals[0] ?? Number.NaN) / end.timeS;
}

/** Newton's steps to the zero of a mark, each integrated. */
function settle(field: ZonalField, from: Motion, mark: Mark, integrands: Integrands): Motion {
  let motion = from;
  for (let step = 0; step < 20; step += 1) {
    const { value, rate } = mark(field, motion);
    const shift = -value / rate;
    if (Math.abs(shift) < 1e-7) return motion;
    motion = integrateTo(field, motion, motion.timeS + shift, integrands);
  }
  throw new Error('no crossing found within 20 steps');
}

/**
 * Mean rates over `revolutions`, weighted by a window that leaves periodic terms no room.
 *
 * The weight (1 − cos 2πt/T)³ is smooth at both ends to the sixth order, so that a term of k turns within T leaks in by
 * about k⁻⁷: short-period terms of relative size 1 are left at 1e-11 after 60 revolutions, and what remains is the
 * secular rate with the long-period terms of that stretch. Without `perigee` its rate is left at 0: near the circle it
 * swings without bound and would only slow the integrator down.
 */
export function windowedRates(
  field: ZonalField,
  state: Start,
  { revolutions, perigee: withPerigee }: { readonly revolutions: number; readonly perigee: boolean },
): AngleRates {
  const start = startOf(state, 3);
  const a = semiMajorAxisKm(field.muKm3PerS2, start.positionKm, start.velocityKmPerS);
  const spanS = revolutions * 2 * Math.PI * Math.sqrt(a ** 3 / field.muKm3PerS2);
  const integrands: Integrands = (timeS, position, velocity, extra) => {
    const rates = angleRates(field.muKm3PerS2, position, velocity, extra);
    const weight = 0.4 * (1 - Math.cos((2 * Math.PI * timeS) / spanS)) ** 3;
    return [
      weight * rates.nodeRadPerS,
      withPerigee ? weight * rates.perigeeRadPerS : 0,
      weight * rates.latitudeRadPerS,
    ];
  };
  const [node, perigee, latitude] = integrateTo(field, start, spanS, integrands).integrals;
  if (node === undefined || perigee === undefined || latitude === undefined)
    throw new Error('three integrals expected');
  return { nodeRadPerS: node / spanS, perigeeRadPerS: perigee / spanS, latitudeRadPerS: latitude / spanS };
}
