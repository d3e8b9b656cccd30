/** The cycles worth naming near an orbit, by days: each longer one only where it is nearer than all shorter ones. */
import { type NearestRepeat, type NearestResult, nearestRepeats, type ResolvedOrbit } from '../../../core/index';

const longestDays = 60;
const most = 8;

export function nearestCycles({ body, mean }: ResolvedOrbit, isSunSynchronous: boolean): NearestResult {
  const keep = isSunSynchronous ? 'sunSynchronous' : 'inclination';
  const result = nearestRepeats({ body, theory: 'second', mean, keep, maxDays: longestDays });
  return result.ok ? { ok: true, repeats: worthNaming(result.repeats) } : result;
}

export function worthNaming(repeats: readonly NearestRepeat[]): readonly NearestRepeat[] {
  const byDays = repeats.toSorted(
    (one, other) => one.days - other.days || Math.abs(one.axisChangeKm) - Math.abs(other.axisChangeKm),
  );
  let nearestKm = Number.POSITIVE_INFINITY;
  const named = byDays.filter(({ axisChangeKm }) => {
    if (Math.abs(axisChangeKm) >= nearestKm) return false;
    nearestKm = Math.abs(axisChangeKm);
    return true;
  });
  return named.slice(-most);
}
