/**
 * Pull of another body on the orbit, less its pull on the central body.
 *
 * With s to the other body, d = s − r and q = r·(r − 2s)/s²,
 *   μ₃ (d/d³ − s/s³) = −(μ₃/d³) (r + f(q) s),  f(q) = q (3 + 3q + q²) / (1 + (1 + q)^{3/2}),
 * in which nothing large is subtracted. Source: Battin, An Introduction to the Mathematics and Methods of Astrodynamics
 * (1987), equations 8.60 to 8.62 (from memory).
 */
import { moon } from '../bodies/moon';
import type { Vec3 } from '../numerics/vectors';
import type { Force } from './force';
import { moonPlace, type SkyPlace, sunPlace } from './skyPlaces';

/** Sun's μ, km³/s²: IAU 2015 resolution B3 rounds it to 1.3271244e20 m³/s²; these digits as in JPL's DE405. */
export const sunMuKm3PerS2 = 1.32712440018e11;

/** Nearest that each comes to the Earth, km: they set how fast the series in r/s falls. */
const nearestSunKm = 1.47e8;
const nearestMoonKm = 356_400;

export interface ThirdBody {
  readonly id: string;
  readonly muKm3PerS2: number;
  readonly place: SkyPlace;
  readonly nearestKm: number;
}

/** The pull of a body whose place is given in the orbit's frame. */
export function thirdBodyForce({ id, muKm3PerS2, place, nearestKm }: ThirdBody): Force {
  // The averaged level asks for one date many times over.
  let knownJd = Number.NaN;
  let known: Vec3 = [0, 0, 0];
  const add = (sum: Float64Array, motion: Float64Array, jd: number): void => {
    if (jd !== knownJd) {
      known = place(jd);
      knownJd = jd;
    }
    const [sx, sy, sz] = known;
    const x = motion[0] as number;
    const y = motion[1] as number;
    const z = motion[2] as number;
    const s2 = sx * sx + sy * sy + sz * sz;
    const q = (x * (x - 2 * sx) + y * (y - 2 * sy) + z * (z - 2 * sz)) / s2;
    const root = Math.sqrt(1 + q);
    const cube = (1 + q) * root;
    const f = (q * (3 + q * (3 + q))) / (1 + cube);
    // μ₃/d³, with d² = s² (1 + q).
    const unit = muKm3PerS2 / (s2 * Math.sqrt(s2) * cube);
    sum[0] = (sum[0] as number) - unit * (x + f * sx);
    sum[1] = (sum[1] as number) - unit * (y + f * sy);
    sum[2] = (sum[2] as number) - unit * (z + f * sz);
  };
  return { id, add, averagingPoints: (a, e) => pointsFor((a * (1 + e)) / nearestKm) };
}

/** Left of the series in r/s, relative to its first term. */
const tolerance = 1e-10;

/** Degree n of the series is a polynomial of degree n + 2 in E: the trapezoid takes it exactly with more points than that. */
function pointsFor(ratio: number): number {
  const degree = 2 + Math.log(tolerance) / Math.log(Math.min(ratio, 0.9));
  return 4 * Math.ceil((degree + 3) / 4);
}

/** Sun on an Earth orbit, in the frame of the epoch (Julian date, UTC). */
export function sunForce(epochJdUtc: number, place: SkyPlace = sunPlace(epochJdUtc)): Force {
  return thirdBodyForce({ id: 'sun', muKm3PerS2: sunMuKm3PerS2, place, nearestKm: nearestSunKm });
}

/** Moon on an Earth orbit, in the frame of the epoch (Julian date, UTC). */
export function moonForce(epochJdUtc: number, place: SkyPlace = moonPlace(epochJdUtc)): Force {
  return thirdBodyForce({ id: 'moon', muKm3PerS2: moon.muKm3PerS2, place, nearestKm: nearestMoonKm });
}
