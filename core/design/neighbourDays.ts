/** After how many days a repeat cycle passes right beside its first track: a number of a list of many cycles. */
import { inverseModulo } from '../numerics/integers';
import type { Cycle } from './closingOrbit';

/**
 * Least number of nodal days d ≥ 1 after which a track lies one spacing from the first, d·N ≡ ±1 (mod D); 0 where D is 1 and the
 * very next revolution is the neighbour. N and D coprime. The same as the nearer of `trackPattern`'s two neighbours to
 * the whole day, without the pattern.
 */
export function neighbourDays({ revolutions, days }: Cycle): number {
  const ahead = inverseModulo(revolutions, days);
  return Math.min(ahead, days - ahead);
}
