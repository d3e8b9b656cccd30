/** Size and shape: the elements themselves and what follows from them without a theory. */
import { apogeeAltitudeKm, perigeeAltitudeKm } from '../entry/shape';
import { add, fn, frac, group, mul, neg, sqrt } from '../formula';
import { plainWorking } from '../workings/build';
import { noteOnly } from '../workings/working';
import { heightReading } from './heights';
import type { ReadingSpec } from './reading';

const meanNote =
  'A Brouwer mean element: the first-order short-period J2 terms are removed, so the orbit at one instant lies some kilometres off it.';

const element = { mark: 'none', ordered: false } as const;

export const shapeReadings: readonly ReadingSpec[] = [
  {
    ...element,
    id: 'semiMajorAxis',
    label: 'Mean semi-major axis',
    symbol: 'a',
    quantity: 'length',
    evaluate: ({ mean }) => mean.semiMajorAxisKm,
    working: ({ mean }) => noteOnly(mean.semiMajorAxisKm, meanNote),
  },
  {
    ...element,
    id: 'eccentricity',
    label: 'Mean eccentricity',
    symbol: 'e',
    quantity: 'ratio',
    evaluate: ({ mean }) => mean.eccentricity,
    working: ({ mean }) => noteOnly(mean.eccentricity, meanNote),
  },
  {
    ...element,
    id: 'inclination',
    label: 'Mean inclination',
    symbol: 'i',
    quantity: 'angle',
    evaluate: ({ mean }) => mean.inclinationRad,
    working: ({ mean }) => noteOnly(mean.inclinationRad, meanNote),
  },
  {
    ...element,
    id: 'perigeeAltitude',
    label: 'Perigee altitude',
    symbol: 'hₚ',
    quantity: 'length',
    evaluate: ({ body, mean }) => perigeeAltitudeKm(body, mean),
    working: (point) =>
      plainWorking(point, {
        inputs: { a: point.mean.semiMajorAxisKm, e: point.mean.eccentricity },
        constants: ['Req'],
        lines: [['perigeeAltitude', add(mul('a', group(1, neg('e'))), neg('Req'))]],
        result: 'perigeeAltitude',
        note: 'Of the mean ellipse, above the equatorial radius; the height along the orbit is a reading of its own.',
      }),
  },
  {
    ...element,
    id: 'apogeeAltitude',
    label: 'Apogee altitude',
    symbol: 'hₐ',
    quantity: 'length',
    evaluate: ({ body, mean }) => apogeeAltitudeKm(body, mean),
    working: (point) =>
      plainWorking(point, {
        inputs: { a: point.mean.semiMajorAxisKm, e: point.mean.eccentricity },
        constants: ['Req'],
        lines: [['apogeeAltitude', add(mul('a', group(1, 'e')), neg('Req'))]],
        result: 'apogeeAltitude',
        note: 'Of the mean ellipse, above the equatorial radius; the height along the orbit is a reading of its own.',
      }),
  },
  heightReading('leastHeight', 'Least height above the ellipsoid'),
  heightReading('greatestHeight', 'Greatest height above the ellipsoid'),
  {
    ...element,
    id: 'speedAtPerigee',
    label: 'Speed at perigee',
    symbol: 'vₚ',
    quantity: 'speed',
    evaluate: ({ body, mean: { semiMajorAxisKm: a, eccentricity: e } }) =>
      Math.sqrt(((body.muKm3PerS2 / a) * (1 + e)) / (1 - e)),
    working: (point) =>
      plainWorking(point, {
        inputs: { a: point.mean.semiMajorAxisKm, e: point.mean.eccentricity },
        constants: ['mu'],
        lines: [['speed', sqrt(mul(frac('mu', 'a'), frac(group(1, 'e'), group(1, neg('e')))))]],
        result: 'speed',
        note: 'Of the mean ellipse, by the energy of two bodies, in inertial space.',
      }),
  },
  vectorReading('eCos', 'Eccentricity vector, e cos ω', 'cos'),
  vectorReading('eSin', 'Eccentricity vector, e sin ω', 'sin'),
];

/** At small e the vector is what drifts steadily; e and ω apart mean little. */
function vectorReading(id: 'eCos' | 'eSin', label: string, name: 'cos' | 'sin'): ReadingSpec {
  return {
    id,
    label,
    symbol: `e ${name} ω`,
    quantity: 'ratio',
    mark: 'perigee',
    ordered: false,
    evaluate: ({ mean }) => mean.eccentricity * Math[name](mean.perigeeRad),
    working: (point) =>
      plainWorking(point, {
        inputs: { e: point.mean.eccentricity, perigee: point.mean.perigeeRad },
        lines: [[id, mul('e', fn(name, 'perigee'))]],
        result: id,
        note: 'By definition, of the mean elements.',
      }),
  };
}
