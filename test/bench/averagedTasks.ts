/** The averaged level: one acceleration, one set of rates, one frozen orbit. */
import {
  averagedRates,
  bodies,
  equinoctialFromElements,
  frozenOrbit,
  type MeanElements,
  senseOf,
  zonalForce,
} from '../../core/index';
import type { Task } from './measure';

const { earth } = bodies;

const nearCircular: MeanElements = {
  semiMajorAxisKm: 7000,
  eccentricity: 0.001,
  inclinationRad: 1.7,
  nodeRad: 1,
  perigeeRad: 1.5,
  meanAnomalyRad: 0,
};

function accelerations(): number {
  const force = zonalForce(earth, { from: 2, to: 14 });
  const sum = new Float64Array(3);
  const motion = Float64Array.of(5000, 3000, 4000, 0, 0, 0);
  for (let call = 0; call < accelerationCalls; call += 1) {
    motion[2] = -4000 + 0.4 * call;
    force.add(sum, motion, 0);
  }
  return sum[0] ?? Number.NaN;
}

const accelerationCalls = 20_000;
const ratesCalls = 1000;

function rates(orbit: MeanElements): number {
  const sense = senseOf(orbit.inclinationRad);
  const forces = [zonalForce(earth, { from: 3, to: 14 })];
  const fill = averagedRates({ body: earth, sense, oblateness: 'second', forces });
  const values = equinoctialFromElements(orbit, sense);
  const out = new Float64Array(6);
  let sum = 0;
  for (let call = 0; call < ratesCalls; call += 1) {
    fill(out, values, call);
    sum += out[1] ?? Number.NaN;
  }
  return sum;
}

const frozenCalls = 180;

/** Every inclination in turn, refusals near the critical one included. */
function frozenOrbits(): number {
  let sum = 0;
  for (let call = 0; call < frozenCalls; call += 1) {
    const found = frozenOrbit(earth, {
      semiMajorAxisKm: 6700 + 20 * call,
      inclinationRad: (call * Math.PI) / frozenCalls,
    });
    if (found.ok) sum += found.eccentricity;
  }
  return sum;
}

export function averagedTasks(): readonly Task[] {
  const ellipse = { ...nearCircular, semiMajorAxisKm: 26_554, eccentricity: 0.74 };
  return [
    { name: 'zonals to 14, at a point', calls: accelerationCalls, run: accelerations },
    { name: 'averagedRates, e 0.001', calls: ratesCalls, run: () => rates(nearCircular) },
    { name: 'averagedRates, e 0.74', calls: ratesCalls, run: () => rates(ellipse) },
    { name: 'frozenOrbit', calls: frozenCalls, run: frozenOrbits },
  ];
}
