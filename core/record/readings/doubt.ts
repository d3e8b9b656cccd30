/**
 * How wrong a rate by the closed form may be, as a rate now, from the zonals that its order leaves
 * out. Sun, Moon and drag are another matter and not in it.
 *
 * Shares of the node rate: measured against numerical integrations in the field of the Earth to
 * degree 14, low orbits, 1.6e-4 near 98°, 4e-4 near 52°, 1–3e-3 within 15° of the equator, rounded up;
 * between 15° and 30° interpolated. Higher orbits do better. Perigee: odd zonals shift its rate by
 * about e_frozen/e of itself (6 % at 0.02 near 98°).
 */
import { degPerRad, secondsPerDay, twoPi } from '../../numerics/angles';
import type { Theory } from '../../orbit/elements';
import { secularRates } from '../../orbit/secularRates';
import type { ReadingId, ReadingPoint } from './reading';

export interface Doubt {
  /** Plus or minus, in the reading's core unit. */
  readonly size: number;
  readonly reason: string;
}

/** Eccentricity at which odd zonals hold perigee still in low orbit; its usual size. */
const frozenEccentricity = 0.0012;

/** Null where no honest figure is known. */
export function doubtOf(id: ReadingId, point: ReadingPoint, theory: Theory): Doubt | null {
  if (id === 'nodeRate') return rateDoubt(point, theory, 'nodeRadPerS');
  if (id === 'perigeeRate') return rateDoubt(point, theory, 'perigeeRadPerS');
  if (id !== 'localTimeDrift') return null;
  const { size, reason } = rateDoubt(point, theory, 'nodeRadPerS');
  return { size: (size * secondsPerDay) / twoPi, reason };
}

function rateDoubt(point: ReadingPoint, theory: Theory, rate: 'nodeRadPerS' | 'perigeeRadPerS'): Doubt {
  const first = secularRates(point.body, point.mean, 'first');
  const second = secularRates(point.body, point.mean, 'second');
  const betweenOrders = Math.abs(second[rate] - first[rate]);
  if (point.body.id !== 'earth') {
    return {
      size: betweenOrders,
      reason: 'At least the difference between first and second order; the field beyond J4 is left out.',
    };
  }
  const left = rate === 'nodeRadPerS' ? nodeShare(point) * Math.abs(second[rate]) : perigeeSize(point, second[rate]);
  return theory === 'first'
    ? { size: betweenOrders + left, reason: 'First order leaves out J2², J4 and above.' }
    : { size: left, reason: 'Second order leaves out odd zonals, J6 and above.' };
}

function nodeShare({ mean }: ReadingPoint): number {
  const deg = mean.inclinationRad * degPerRad;
  const fromEquator = Math.min(deg, 180 - deg);
  if (fromEquator < 15) return 3e-3;
  if (fromEquator < 30) return 3e-3 - ((fromEquator - 15) / 15) * 2.5e-3;
  return deg > 90 && deg < 106 ? 2e-4 : 5e-4;
}

/** Odd zonals by e_frozen/e, at most the whole rate; J6 and above against the size of J2's own terms. */
function perigeeSize({ body, mean }: ReadingPoint, radPerS: number): number {
  const { semiMajorAxisKm: a, eccentricity: e } = mean;
  const oblate =
    1.5 *
    Math.sqrt(body.muKm3PerS2 / a ** 3) *
    Math.abs(body.zonals[2] ?? 0) *
    (body.radiusKm / (a * (1 - e * e))) ** 2;
  const share = e > frozenEccentricity ? frozenEccentricity / e : 1;
  return share * Math.abs(radPerS) + 5e-4 * oblate;
}
