/** Saved candidates around the same body, each with its node rate once its conditions are settled. Pure. */
import {
  type Body,
  type Candidate,
  type ResolvedOrbit,
  resolveOrbit,
  secularRates,
  settleOrbit,
} from '../../core/index';

export type OtherOrbit =
  | { readonly kind: 'orbit'; readonly id: string; readonly name: string; readonly nodeRadPerS: number }
  | { readonly kind: 'noOrbit'; readonly id: string; readonly name: string };

/** Those around the same body as `body`; one that comes to no orbit yet is listed, but cannot be picked. */
export function otherOrbits(candidates: readonly Candidate[], body: Body): OtherOrbit[] {
  return candidates.flatMap((candidate): OtherOrbit[] => {
    const { id, name } = candidate;
    const orbit = orbitOf(candidate);
    if (!orbit) return candidate.body === body.id ? [{ kind: 'noOrbit', id, name }] : [];
    if (!isSameBody(orbit.body, body)) return [];
    return [{ kind: 'orbit', id, name, nodeRadPerS: secularRates(orbit.body, orbit.mean, 'second').nodeRadPerS }];
  });
}

function orbitOf(candidate: Candidate): ResolvedOrbit | null {
  const resolution = resolveOrbit(candidate);
  if (!resolution.ok) return null;
  if (candidate.conditions.length === 0) return resolution.orbit;
  const settlement = settleOrbit(candidate, resolution.orbit);
  return settlement.ok ? settlement.orbit : null;
}

/** Gravity sets of one body may differ; two bodies of the user's own are the same where their numbers are. */
function isSameBody(one: Body, other: Body): boolean {
  if (one.id !== other.id) return false;
  return one.id !== 'custom' || (one.muKm3PerS2 === other.muKm3PerS2 && one.radiusKm === other.radiusKm);
}
