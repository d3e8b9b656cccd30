/**
 * How wrong a rate by the closed form may be, as a rate now, from the zonals that its order leaves
 * out. Sun, Moon and drag are another matter and not in it; where Sun and Moon dominate no figure is given.
 *
 * Shares of the node rate: measured against numerical integrations in the field of the Earth to
 * degree 14, low orbits, 1.6e-4 near 98°, 4e-4 near 52°, 1–3e-3 within 15° of the equator, rounded up;
 * between 15° and 30° interpolated. Higher orbits do better. No rate is better known than 2e-5 of k, the size of
 * the J2 rate, however small it is itself, as at 90°. Perigee: odd zonals shift its rate by about e_frozen/e of
 * itself (6 % at 0.02 near 98°).
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
export const frozenEccentricity = 0.0012;

/** μ/r³ of the Sun and of the Moon together, 1/s², at their mean distances from the Earth. */
const tidePerS2 = 1.26e-13;

/**
 * True where Sun and Moon move an orbit of the Earth more than J2 does, from about 50 000 km on if it is round. Their
 * secular rates, to a factor of the inclination: 3/4 μ/r³ / n · (1 + 3/2 e²)/√(1 − e²) (Cook, Geophys. J. 6, 271
 * (1962), from memory).
 */
export function sunAndMoonDominate(point: Pick<ReadingPoint, 'body' | 'mean'>): boolean {
  const e2 = point.mean.eccentricity ** 2;
  const [, n] = scalesOf(point);
  const others = (((0.75 * tidePerS2) / n) * (1 + 1.5 * e2)) / Math.sqrt(1 - e2);
  return point.body.id === 'earth' && others > oblateRate(point);
}

const nodeFloor = 2e-5;

/** Null where no honest figure is known. */
export function doubtOf(id: ReadingId, point: ReadingPoint, theory: Theory): Doubt | null {
  if (sunAndMoonDominate(point)) return null;
  if (id === 'nodeRate') return rateDoubt(point, theory, 'nodeRadPerS');
  if (id === 'perigeeRate') return rateDoubt(point, theory, 'perigeeRadPerS');
  if (id === 'apsidalPeriod') return periodDoubt(point, theory);
  if (id !== 'localTimeDrift') return null;
  const { size, reason } = rateDoubt(point, theory, 'nodeRadPerS');
  return { size: (size * secondsPerDay) / twoPi, reason };
}

/** The perigee rate's share, of the period; null where the rate may be zero. */
function periodDoubt(point: ReadingPoint, theory: Theory): Doubt | null {
  const rate = Math.abs(secularRates(point.body, point.mean, theory).perigeeRadPerS);
  const { size, reason } = rateDoubt(point, theory, 'perigeeRadPerS');
  return size < rate ? { size: (twoPi / rate) * (size / rate), reason } : null;
}

/** Whether perigee may stand still, or turn the other way, for all that is known. */
export function perigeeRateInDoubt(point: ReadingPoint): boolean {
  return periodDoubt(point, 'second') === null;
}

function rateDoubt(point: ReadingPoint, theory: Theory, rate: 'nodeRadPerS' | 'perigeeRadPerS'): Doubt {
  const first = secularRates(point.body, point.mean, 'first');
  const second = secularRates(point.body, point.mean, 'second');
  const betweenOrders = Math.abs(second[rate] - first[rate]);
  if (point.body.id !== 'earth') {
    return {
      size: Math.max(betweenOrders, 0.1 * secondOrderSize(point)),
      reason: 'At least the difference between first and second order; the field beyond J4 is left out.',
    };
  }
  const left =
    rate === 'nodeRadPerS'
      ? Math.max(nodeShare(point) * Math.abs(second[rate]), nodeFloor * oblateRate(point))
      : perigeeSize(point, second[rate]);
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
function perigeeSize(point: ReadingPoint, radPerS: number): number {
  const e = point.mean.eccentricity;
  const share = e > frozenEccentricity ? frozenEccentricity / e : 1;
  return share * Math.abs(radPerS) + 5e-4 * oblateRate(point);
}

/** (R/p)² and the mean motion. */
function scalesOf({ body, mean }: Pick<ReadingPoint, 'body' | 'mean'>): readonly [ratio2: number, radPerS: number] {
  const { semiMajorAxisKm: a, eccentricity: e } = mean;
  return [(body.radiusKm / (a * (1 - e * e))) ** 2, Math.sqrt(body.muKm3PerS2 / a ** 3)];
}

/** k of first order, rad/s, whatever the sign of J2. */
function oblateRate(point: Pick<ReadingPoint, 'body' | 'mean'>): number {
  const [ratio2, n] = scalesOf(point);
  return 1.5 * n * Math.abs(point.body.zonals[2] ?? 0) * ratio2;
}

/** What J2² and J4 move at all, rad/s, where their terms do not happen to cancel. */
function secondOrderSize(point: ReadingPoint): number {
  const [ratio2, n] = scalesOf(point);
  const { zonals } = point.body;
  return 1.5 * n * ((zonals[2] ?? 0) ** 2 + Math.abs(zonals[4] ?? 0)) * ratio2 * ratio2;
}
