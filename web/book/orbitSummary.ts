/** The one line by which an orbit is known in a list. */
import { type Candidate, fingerprint, formatNumber, resolveOrbit, settleOrbit, unitOf } from '../../core/index';

export interface SummarisedOrbit {
  readonly kind: 'orbit';
  /** Mean altitudes above the equatorial radius. */
  readonly perigeeAltitudeKm: number;
  readonly apogeeAltitudeKm: number;
  readonly inclinationRad: number;
  readonly fingerprint: string;
  readonly bodyName: string;
  readonly isEarth: boolean;
}
/** The entry does not come to an orbit yet; the message is that of its first field in the way. */
export interface UnsettledOrbit {
  readonly kind: 'unsettled';
  readonly message: string;
}
export type OrbitSummary = SummarisedOrbit | UnsettledOrbit;

export function orbitSummary(candidate: Candidate): OrbitSummary {
  const resolution = resolveOrbit(candidate);
  if (!resolution.ok) {
    const [first] = Object.values(resolution.errors);
    return { kind: 'unsettled', message: first?.message ?? 'The entry does not come to an orbit yet.' };
  }
  const settlement = candidate.conditions.length > 0 ? settleOrbit(candidate, resolution.orbit) : null;
  if (settlement?.ok === false) {
    return { kind: 'unsettled', message: settlement.message || 'A condition cannot be read yet.' };
  }
  const orbit = settlement?.orbit ?? resolution.orbit;
  const { body, mean } = orbit;
  return {
    kind: 'orbit',
    perigeeAltitudeKm: mean.semiMajorAxisKm * (1 - mean.eccentricity) - body.equatorialRadiusKm,
    apogeeAltitudeKm: mean.semiMajorAxisKm * (1 + mean.eccentricity) - body.equatorialRadiusKm,
    inclinationRad: mean.inclinationRad,
    fingerprint: fingerprint(orbit),
    bodyName: body.name,
    isEarth: candidate.body === 'earth',
  };
}

export interface OrbitFigure {
  readonly label: string;
  readonly number: string;
  readonly unit: string;
}

/** Perigee altitude, apogee altitude and inclination, as written everywhere in the book. */
export function orbitFigures(orbit: SummarisedOrbit, lengthUnit: 'km' | 'NM'): [OrbitFigure, OrbitFigure, OrbitFigure] {
  const { symbol: unit, perCore } = unitOf('length', lengthUnit);
  const altitude = (km: number) => formatNumber(km * perCore, { digits: 1 });
  const inclination = formatNumber((orbit.inclinationRad * 180) / Math.PI, { digits: 3 });
  return [
    { label: 'Perigee', number: altitude(orbit.perigeeAltitudeKm), unit },
    { label: 'Apogee', number: altitude(orbit.apogeeAltitudeKm), unit },
    { label: 'Inclination', number: inclination, unit: '°' },
  ];
}

/** Such as `561.0 × 575.0 km, 97.680°`, with the body in front where it is not the Earth. */
export function orbitLine(summary: OrbitSummary, lengthUnit: 'km' | 'NM'): string {
  if (summary.kind === 'unsettled') return 'No orbit yet';
  const [perigee, apogee, inclination] = orbitFigures(summary, lengthUnit);
  const numbers = `${perigee.number} × ${apogee.number} ${apogee.unit}, ${inclination.number}${inclination.unit}`;
  return summary.isEarth ? numbers : `${summary.bodyName}: ${numbers}`;
}

export const meanAltitudeKm = (orbit: SummarisedOrbit): number =>
  (orbit.perigeeAltitudeKm + orbit.apogeeAltitudeKm) / 2;

/** Keeps the summaries of saved revisions, which never change, from one reading of the book to the next. */
export function createSummaryKeeper(): (key: string, candidate: Candidate) => OrbitSummary {
  const kept = new Map<string, OrbitSummary>();
  return (key, candidate) => {
    const found = kept.get(key) ?? orbitSummary(candidate);
    kept.set(key, found);
    return found;
  };
}
