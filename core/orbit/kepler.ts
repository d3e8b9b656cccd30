/**
 * Kepler's equation M = E − e sin E and the anomalies, for 0 ≤ e < 1.
 *
 * Source: Vallado, Fundamentals of Astrodynamics and Applications, 4th ed., ch. 2 (from memory).
 */
import { wrapPi } from '../numerics/angles';

/** Halving from a full bracket reaches machine precision well before this. */
const maxIterations = 120;

/**
 * Eccentric anomaly (rad) from mean anomaly (rad), on the same revolution.
 *
 * Newton's step, kept inside a shrinking bracket: E − M lies in [−e, e], and the residual rises with
 * E everywhere, so it converges for every e < 1. Near E = 0 and e = 1 the residual is summed as
 * (1 − e) E + e (E − sin E), which keeps its digits.
 *
 * @throws Error for e outside [0, 1) or an anomaly that is not finite.
 */
export function eccentricFromMean(meanAnomalyRad: number, eccentricity: number): number {
  if (!(eccentricity >= 0 && eccentricity < 1)) {
    throw new Error(`Kepler's equation needs 0 ≤ e < 1, got ${eccentricity}`);
  }
  if (!Number.isFinite(meanAnomalyRad)) throw new Error(`mean anomaly is ${meanAnomalyRad}`);
  const mean = wrapPi(meanAnomalyRad);
  const turns = meanAnomalyRad - mean;
  let low = mean - eccentricity;
  let high = mean + eccentricity;
  let anomaly = mean + eccentricity * Math.sin(mean);
  for (let iteration = 0; iteration < maxIterations; iteration += 1) {
    const residual = (1 - eccentricity) * anomaly + eccentricity * anomalyMinusSine(anomaly) - mean;
    if (residual === 0) break;
    if (residual > 0) high = anomaly;
    else low = anomaly;
    const slope = 1 - eccentricity + eccentricity * (1 - Math.cos(anomaly));
    let next = anomaly - residual / slope;
    if (!(next > low && next < high)) next = 0.5 * (low + high);
    if (Math.abs(next - anomaly) <= 2 * Number.EPSILON * Math.abs(anomaly)) return next + turns;
    anomaly = next;
  }
  return anomaly + turns;
}

/** x − sin x without cancellation near 0. */
function anomalyMinusSine(x: number): number {
  if (Math.abs(x) > 0.5) return x - Math.sin(x);
  const square = x * x;
  let term = (x * square) / 6;
  let sum = 0;
  for (let k = 4; Math.abs(term) > Math.abs(sum) * 1e-17 && k < 40; k += 2) {
    sum += term;
    term *= -square / (k * (k + 1));
  }
  return sum;
}

/** True anomaly (rad) from eccentric anomaly (rad), on the same revolution. */
export function trueFromEccentric(eccentricAnomalyRad: number, eccentricity: number): number {
  const beta = eccentricity / (1 + Math.sqrt(1 - eccentricity * eccentricity));
  const s = Math.sin(eccentricAnomalyRad);
  const c = Math.cos(eccentricAnomalyRad);
  return eccentricAnomalyRad + 2 * Math.atan2(beta * s, 1 - beta * c);
}

/** Eccentric anomaly (rad) from true anomaly (rad), on the same revolution. */
export function eccentricFromTrue(trueAnomalyRad: number, eccentricity: number): number {
  const beta = eccentricity / (1 + Math.sqrt(1 - eccentricity * eccentricity));
  const s = Math.sin(trueAnomalyRad);
  const c = Math.cos(trueAnomalyRad);
  return trueAnomalyRad - 2 * Math.atan2(beta * s, 1 + beta * c);
}

/** True anomaly (rad) from mean anomaly (rad), on the same revolution. */
export function trueFromMean(meanAnomalyRad: number, eccentricity: number): number {
  return trueFromEccentric(eccentricFromMean(meanAnomalyRad, eccentricity), eccentricity);
}

/** Mean anomaly (rad) from true anomaly (rad), on the same revolution. */
export function meanFromTrue(trueAnomalyRad: number, eccentricity: number): number {
  const eccentric = eccentricFromTrue(trueAnomalyRad, eccentricity);
  return eccentric - eccentricity * Math.sin(eccentric);
}
