/**
 * Gauss's equations averaged over one revolution of the mean orbit, for any sum of forces.
 *
 * Equally spaced points of eccentric longitude, weight r/a. The sums are kept in a frame of the orbit plane that does
 * not turn about its normal; how that frame turns into equinoctial rates is linear and done once, after the loop.
 *
 * Sources: Walker, Ireland and Owens, Celest. Mech. 36, 409 (1985), equation 9, for the rates in longitude; Battin, An
 * Introduction to the Mathematics and Methods of Astrodynamics (1987), ch. 10, for that of the mean longitude; both from
 * memory. Checked against the closed form and against integrated orbits.
 */
import type { Force } from '../forces/force';
import type { Sense } from './equinoctial';
import { fillOrbitBasis } from './orbitBasis';

/** Cosines, then sines, of so many equally spaced angles. */
type Circle = Float64Array;

function circleOf(points: number): Circle {
  const circle = new Float64Array(2 * points);
  for (let j = 0; j < points; j += 1) {
    circle[j] = Math.cos((2 * Math.PI * j) / points);
    circle[points + j] = Math.sin((2 * Math.PI * j) / points);
  }
  return circle;
}

/** Adds averaged rates (km/s, 1/s, rad/s) of equinoctial elements to `rates`; the mean motion itself is not in them. */
export type AddGaussAverage = (rates: Float64Array, values: Float64Array, jd: number) => void;

/**
 * The average of these forces about a body of this μ (km³/s²).
 *
 * The call throws an Error for elements with e outside [0, 1) or not finite.
 */
export function gaussAverage(muKm3PerS2: number, forces: readonly Force[], sense: Sense): AddGaussAverage {
  const circles = new Map<number, Circle>();
  const basis = new Float64Array(9);
  const sums = new Float64Array(6);
  const motion = new Float64Array(6);
  const pull = new Float64Array(3);
  const circleFor = (points: number): Circle => {
    const known = circles.get(points);
    if (known) return known;
    const made = circleOf(points);
    circles.set(points, made);
    return made;
  };
  return (rates, values, jd) => {
    const a = values[0] as number;
    const eccentricity = Math.hypot(values[1] as number, values[2] as number);
    let points = 0;
    for (const force of forces) points = Math.max(points, force.averagingPoints(a, eccentricity));
    if (points === 0) return;
    fillOrbitBasis(basis, values, sense);
    sums.fill(0);
    sumOver({ muKm3PerS2, forces, circle: circleFor(points), basis, sums, motion, pull }, values, jd);
    addRates(rates, values, { sums, sense, muKm3PerS2 });
  };
}

interface Workspace {
  readonly muKm3PerS2: number;
  readonly forces: readonly Force[];
  readonly circle: Circle;
  readonly basis: Float64Array;
  /** 0 a, 1 h, 2 k without the plane's turn, 3 r R, 4 and 5 turn of the plane about f and g. */
  readonly sums: Float64Array;
  readonly motion: Float64Array;
  readonly pull: Float64Array;
}

function sumOver(work: Workspace, values: Float64Array, jd: number): void {
  const { muKm3PerS2, forces, circle, motion, pull } = work;
  const a = values[0] as number;
  const h = values[1] as number;
  const k = values[2] as number;
  const beta = 1 / (1 + Math.sqrt(1 - h * h - k * k));
  const xc = 1 - h * h * beta;
  const yc = h * k * beta;
  const ys = 1 - k * k * beta;
  const speed = Math.sqrt(muKm3PerS2 / a);
  const points = circle.length / 2;
  for (let j = 0; j < points; j += 1) {
    const c = circle[j] as number;
    const s = circle[points + j] as number;
    const share = 1 - h * s - k * c;
    const x = xc * c + yc * s - k;
    const y = ys * s + yc * c - h;
    place(work, a * x, a * y, 0);
    place(work, (speed * (yc * c - xc * s)) / share, (speed * (ys * c - yc * s)) / share, 3);
    pull[0] = 0;
    pull[1] = 0;
    pull[2] = 0;
    for (const force of forces) force.add(pull, motion, jd);
    gather(work, values, x / share, y / share, share / points);
  }
}

/** Writes a vector of the orbit plane into `motion`, in inertial components. */
function place({ motion, basis }: Workspace, alongF: number, alongG: number, from: number): void {
  motion[from] = alongF * (basis[0] as number) + alongG * (basis[3] as number);
  motion[from + 1] = alongF * (basis[1] as number) + alongG * (basis[4] as number);
  motion[from + 2] = alongF * (basis[2] as number) + alongG * (basis[5] as number);
}

/** Adds one point's part; `c`, `s` of its true longitude, `weight` = (r/a)/points. */
function gather(work: Workspace, values: Float64Array, c: number, s: number, weight: number): void {
  const { basis, pull, sums } = work;
  const a = values[0] as number;
  const h = values[1] as number;
  const k = values[2] as number;
  const px = pull[0] as number;
  const py = pull[1] as number;
  const pz = pull[2] as number;
  const alongF = px * (basis[0] as number) + py * (basis[1] as number) + pz * (basis[2] as number);
  const alongG = px * (basis[3] as number) + py * (basis[4] as number) + pz * (basis[5] as number);
  const normal = px * (basis[6] as number) + py * (basis[7] as number) + pz * (basis[8] as number);
  const radial = c * alongF + s * alongG;
  const transverse = c * alongG - s * alongF;
  // w = p/r; T/w is T r/p.
  const w = 1 + h * s + k * c;
  const overW = transverse / w;
  sums[0] = (sums[0] as number) + weight * ((k * s - h * c) * radial + w * transverse);
  sums[1] = (sums[1] as number) + weight * (((w + 1) * s + h) * overW - c * radial);
  sums[2] = (sums[2] as number) + weight * (((w + 1) * c + k) * overW + s * radial);
  sums[3] = (sums[3] as number) + (weight * radial * a * (1 - h * h - k * k)) / w;
  sums[4] = (sums[4] as number) + (weight * c * normal) / w;
  sums[5] = (sums[5] as number) + (weight * s * normal) / w;
}

interface Gathered {
  readonly sums: Float64Array;
  readonly sense: Sense;
  readonly muKm3PerS2: number;
}

function addRates(rates: Float64Array, values: Float64Array, { sums, sense, muKm3PerS2 }: Gathered): void {
  const [a, h, k] = [values[0] as number, values[1] as number, values[2] as number];
  const [p, q] = [values[3] as number, values[4] as number];
  const eta2 = 1 - h * h - k * k;
  // √(p/μ), with p the semi-latus rectum.
  const scale = Math.sqrt((a * eta2) / muKm3PerS2);
  const aboutF = scale * (sums[4] as number);
  const aboutG = scale * (sums[5] as number);
  const hRate = scale * (sums[1] as number);
  const kRate = scale * (sums[2] as number);
  // What the turn of the plane adds to the longitudes: (sense − cos i) times the node's rate.
  const turn = sense * (q * aboutG - sense * p * aboutF);
  const half = 0.5 * (1 + p * p + q * q);
  const fromShape = (k * hRate - h * kRate) / (1 + Math.sqrt(eta2));
  const fromRadius = (-2 * (sums[3] as number)) / Math.sqrt(muKm3PerS2 * a);
  rates[0] = (rates[0] as number) + ((2 * a * scale) / eta2) * (sums[0] as number);
  rates[1] = (rates[1] as number) + hRate + k * turn;
  rates[2] = (rates[2] as number) + kRate - h * turn;
  rates[3] = (rates[3] as number) + half * aboutG;
  rates[4] = (rates[4] as number) + half * sense * aboutF;
  rates[5] = (rates[5] as number) + fromShape + fromRadius + turn;
}
