/** The equations of motion in Cartesian form: six numbers, position (km) and velocity (km/s), inertial equatorial frame. */
import type { Body } from '../bodies/body';
import type { Force } from '../forces/force';
import { secondsPerDay } from '../numerics/angles';
import type { Derivative } from '../numerics/dop853';
import type { ErrorScale } from '../numerics/ode';
import type { StateVector } from '../orbit/elements';

/** Derivative over time in s since the epoch (Julian date, UTC), under the central attraction and the forces. */
export function motionUnder(body: Body, forces: readonly Force[], epochJdUtc: number): Derivative {
  const mu = body.muKm3PerS2;
  const sum = new Float64Array(3);
  return (rates, timeS, motion) => {
    const x = motion[0] as number;
    const y = motion[1] as number;
    const z = motion[2] as number;
    const r2 = x * x + y * y + z * z;
    const pull = -mu / (r2 * Math.sqrt(r2));
    sum[0] = pull * x;
    sum[1] = pull * y;
    sum[2] = pull * z;
    const jd = epochJdUtc + timeS / secondsPerDay;
    for (const force of forces) force.add(sum, motion, jd);
    rates[0] = motion[3] as number;
    rates[1] = motion[4] as number;
    rates[2] = motion[5] as number;
    rates[3] = sum[0] as number;
    rates[4] = sum[1] as number;
    rates[5] = sum[2] as number;
  };
}

/** Position and velocity each as a whole: a component that passes through zero is no reason for small steps. */
export function motionScale(relative: number): ErrorScale {
  return (scale, motion) => {
    scale.fill(relative * radiusKm(motion), 0, 3);
    scale.fill(relative * Math.sqrt(speed2(motion)), 3, 6);
  };
}

export function radiusKm(motion: Float64Array): number {
  return Math.hypot(motion[0] as number, motion[1] as number, motion[2] as number);
}

function speed2(motion: Float64Array): number {
  return (motion[3] as number) ** 2 + (motion[4] as number) ** 2 + (motion[5] as number) ** 2;
}

/** r · v, km²/s: negative while falling. */
export function radialMotion(motion: Float64Array): number {
  return (
    (motion[0] as number) * (motion[3] as number) +
    (motion[1] as number) * (motion[4] as number) +
    (motion[2] as number) * (motion[5] as number)
  );
}

/** Two-body energy, km²/s²: at 0 the ellipse opens. */
export function twoBodyEnergy(muKm3PerS2: number, motion: Float64Array): number {
  return 0.5 * speed2(motion) - muKm3PerS2 / radiusKm(motion);
}

export function motionOf({ positionKm, velocityKmPerS }: StateVector): Float64Array {
  return Float64Array.of(...positionKm, ...velocityKmPerS);
}

export function stateOf(motion: Float64Array): StateVector {
  const at = (index: number) => motion[index] as number;
  return { positionKm: [at(0), at(1), at(2)], velocityKmPerS: [at(3), at(4), at(5)] };
}
