/**
 * Where the closed form stops being true, each with what to do about it.
 *
 * Orbits that do not exist (e ≥ 1, an inclination outside 0–180°) are refused where they are
 * typed and have no row here.
 */
import { degPerRad } from '../numerics/angles';
import { perigeeAltitudeKm } from './entry/shape';
import type { Reading, ReadingId } from './readings/reading';
import type { Notice, ResolvedOrbit } from './resolved';

type ReadingValues = (id: ReadingId) => number | undefined;

interface Warning {
  readonly id: string;
  readonly severity: Notice['severity'];
  readonly applies: (orbit: ResolvedOrbit, value: ReadingValues) => boolean;
  readonly text: (orbit: ResolvedOrbit) => string;
}

/** Below this e perigee drift by the closed form is off by about e_frozen/e, 6 % and more. */
export const smallEccentricity = 0.02;

const perigeeKm = ({ body, mean }: ResolvedOrbit) => perigeeAltitudeKm(body, mean);
const isEarth = ({ body }: ResolvedOrbit) => body.id === 'earth';
const inclinationDeg = ({ mean }: ResolvedOrbit) => mean.inclinationRad * degPerRad;
const criticalDeg = Math.acos(Math.sqrt(1 / 5)) * degPerRad;
const nearCritical = (deg: number) => Math.min(Math.abs(deg - criticalDeg), Math.abs(180 - deg - criticalDeg)) < 3;
/** Distance of the plane from the equator, prograde or retrograde. */
const fromEquatorDeg = (deg: number) => Math.min(deg, 180 - deg);

const warnings: readonly Warning[] = [
  {
    id: 'perigeeBelowSurface',
    severity: 'caution',
    applies: (orbit) => perigeeKm(orbit) < 0,
    text: (orbit) =>
      `Perigee lies ${(-perigeeKm(orbit)).toFixed(1)} km below the surface: the numbers are worked out, but nothing can fly there. Raise the perigee.`,
  },
  {
    id: 'denseAtmosphere',
    severity: 'caution',
    applies: (orbit) => isEarth(orbit) && perigeeKm(orbit) >= 0 && perigeeKm(orbit) < 160,
    text: (orbit) =>
      `Perigee at ${perigeeKm(orbit).toFixed(0)} km is inside the dense atmosphere, where an orbit lasts hours: raise the perigee before using any rate.`,
  },
  {
    id: 'drag',
    severity: 'caution',
    applies: (orbit) => isEarth(orbit) && perigeeKm(orbit) >= 160 && perigeeKm(orbit) < 500,
    text: () =>
      'Below about 500 km drag changes the orbit within months, and the rates with it: use these rates for the days around the epoch only.',
  },
  {
    id: 'smallEccentricity',
    severity: 'note',
    applies: ({ mean }) => mean.eccentricity < smallEccentricity,
    text: ({ mean }) =>
      mean.eccentricity < 0.003
        ? `At e ${mean.eccentricity.toFixed(6)} the closed-form perigee drift means nothing: odd zonals move the eccentricity vector as much. Read the eccentricity vector instead.`
        : `At e ${mean.eccentricity.toFixed(4)} the closed-form perigee drift is off by some per cent, more as e falls: read the eccentricity vector beside it.`,
  },
  {
    id: 'nearCriticalInclination',
    severity: 'caution',
    applies: (orbit) => nearCritical(inclinationDeg(orbit)),
    text: () =>
      `Within 3° of a critical inclination (${criticalDeg.toFixed(2)}° or ${(180 - criticalDeg).toFixed(2)}°) long-period terms grow: trust the perigee rate as a rate now, and check perigee by integration before relying on it.`,
  },
  {
    id: 'nearEquator',
    severity: 'note',
    applies: (orbit) => fromEquatorDeg(inclinationDeg(orbit)) < 15,
    text: () =>
      'Within 15° of the equator the second-order node rate is off by 0.1 to 0.3 % of itself, because J6 and above are left out: allow for that in any node angle.',
  },
  {
    id: 'tesseralResonance',
    severity: 'caution',
    applies: (_, value) => nearResonance(value('revolutionsPerNodalDay')),
    text: () =>
      'The orbit turns about once or twice a day with the body, where the same bumps of its field pull again and again: that resonance is left out, so take the rates as a first guess and integrate with a full field.',
  },
  {
    id: 'weakOblateness',
    severity: 'caution',
    applies: ({ body }) => Math.abs(body.zonals[2] ?? 0) < 5e-4,
    text: ({ body }) =>
      `At ${body.name} J2 does not dominate the field: the closed form is a first guess only. Integrate with a full field before choosing an orbit.`,
  },
  {
    id: 'sunAndMoon',
    severity: 'caution',
    applies: (orbit) => isEarth(orbit) && orbit.mean.semiMajorAxisKm > 20_000,
    text: () =>
      'This high the Sun and the Moon move node, perigee and inclination as much as a good part of J2, or more: take the rates as the share of J2 alone.',
  },
  {
    id: 'sgp4Elements',
    severity: 'note',
    applies: ({ theory }) => theory === 'SGP4',
    text: () =>
      'Two-line elements are the mean elements of SGP4, here taken as Brouwer mean elements: good for rates, not for positions.',
  },
];

function nearResonance(revolutionsADay: number | undefined): boolean {
  if (revolutionsADay === undefined) return false;
  return Math.abs(revolutionsADay - 1) < 0.06 || Math.abs(revolutionsADay - 2) < 0.06;
}

/** Every warning that applies, in the order of the table. `readings` as from `readingsOf`. */
export function warningsOf(orbit: ResolvedOrbit, readings: readonly Reading[]): Notice[] {
  const value: ReadingValues = (wanted) => readings.find(({ id }) => id === wanted)?.value;
  return warnings
    .filter(({ applies }) => applies(orbit, value))
    .map(({ id, severity, text }) => ({ id, severity, text: text(orbit) }));
}
