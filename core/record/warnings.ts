/**
 * Where the closed form stops being true, each with what to do about it.
 *
 * Orbits that do not exist (e ≥ 1, an inclination outside 0–180°) are refused where they are
 * typed and have no row here.
 */
import { degPerRad } from '../numerics/angles';
import { apsidesAt, inSentence } from './bodyWords';
import { perigeeAltitudeKm } from './entry/shape';
import { frozenEccentricity, sunAndMoonDominate } from './readings/doubt';
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

/** Below this e the closed form says nothing about the drift of perigee. */
export const tinyEccentricity = 0.003;

/** How far off perigee drift is at a small e, in words. Odd zonals of the Earth; elsewhere they may be stronger. */
export function perigeeOffText({ body, mean }: Pick<ResolvedOrbit, 'body' | 'mean'>): string {
  if (body.id !== 'earth') return 'some per cent or more';
  return `up to ${Math.ceil((100 * frozenEccentricity) / mean.eccentricity)} %`;
}

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
    applies: ({ mean, frozen }) => !frozen && mean.eccentricity < smallEccentricity,
    text: ({ body, mean }) =>
      mean.eccentricity < tinyEccentricity
        ? `At e ${mean.eccentricity.toFixed(6)} the closed-form perigee drift means nothing: odd zonals move the eccentricity vector as much. Read the eccentricity vector instead.`
        : `At e ${mean.eccentricity.toFixed(4)} the closed-form perigee drift is off by ${perigeeOffText({ body, mean })}, more as e falls: read the eccentricity vector beside it.`,
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
      `At ${inSentence(body)} J2 does not dominate the field: the closed form is a first guess only. Integrate with a full field before choosing an orbit.`,
  },
  {
    id: 'sunAndMoon',
    severity: 'caution',
    applies: (orbit) => isEarth(orbit) && orbit.mean.semiMajorAxisKm > 20_000 && !sunAndMoonDominate(orbit),
    text: () =>
      'This high the Sun and the Moon move node, perigee and inclination as much as a good part of J2, or more: take the rates as the share of J2 alone.',
  },
  {
    id: 'sunAndMoonDominate',
    severity: 'caution',
    applies: sunAndMoonDominate,
    text: ({ mean }) =>
      mean.semiMajorAxisKm * (1 + mean.eccentricity) > farthestKm
        ? 'Beyond about 900 000 km the Sun takes an orbit away from the Earth: nothing here holds. Choose a smaller orbit.'
        : 'This far out the Sun and the Moon move node, perigee and inclination more than J2 does: these rates are the smaller share. Integrate with Sun and Moon before choosing an orbit.',
  },
  {
    id: 'noNode',
    severity: 'note',
    applies: ({ mean }) => isEquatorial(mean.inclinationRad),
    text: () =>
      'In the plane of the equator there is no node: the node given is only the direction that perigee is counted from, and its rate and local time mean nothing by themselves. Read node and perigee together.',
  },
  {
    id: 'sgp4Elements',
    severity: 'note',
    applies: ({ theory }) => theory === 'SGP4',
    text: () =>
      'Two-line elements are the mean elements of SGP4, here taken as Brouwer mean elements: good for rates, not for positions.',
  },
];

/** Where an orbit of the Earth ends, about: the radius within which it outweighs the Sun. */
const farthestKm = 900_000;

/** A plane within 1e-6° of the equator's has no node. */
export function isEquatorial(inclinationRad: number): boolean {
  return Math.abs(Math.sin(inclinationRad)) < 1e-6 / degPerRad;
}

function nearResonance(revolutionsADay: number | undefined): boolean {
  if (revolutionsADay === undefined) return false;
  return Math.abs(revolutionsADay - 1) < 0.06 || Math.abs(revolutionsADay - 2) < 0.06;
}

/** Every warning that applies, in the order of the table. `readings` as from `readingsOf`. */
export function warningsOf(orbit: ResolvedOrbit, readings: readonly Reading[]): Notice[] {
  const value: ReadingValues = (wanted) => readings.find(({ id }) => id === wanted)?.value;
  return warnings
    .filter(({ applies }) => applies(orbit, value))
    .map(({ id, severity, text }) => ({ id, severity, text: apsidesAt(text(orbit), orbit.body) }));
}
