/** Size and shape: the elements themselves and what follows from them without a theory. */
import { apogeeAltitudeKm, perigeeAltitudeKm } from '../entry/shape';
import { heightReading } from './heights';
import type { ReadingSpec } from './reading';

const element = { mark: 'none', ordered: false } as const;

export const shapeReadings: readonly ReadingSpec[] = [
  {
    ...element,
    id: 'semiMajorAxis',
    label: 'Mean semi-major axis',
    symbol: 'a',
    quantity: 'length',
    evaluate: ({ mean }) => mean.semiMajorAxisKm,
  },
  {
    ...element,
    id: 'eccentricity',
    label: 'Mean eccentricity',
    symbol: 'e',
    quantity: 'ratio',
    evaluate: ({ mean }) => mean.eccentricity,
  },
  {
    ...element,
    id: 'inclination',
    label: 'Mean inclination',
    symbol: 'i',
    quantity: 'angle',
    evaluate: ({ mean }) => mean.inclinationRad,
  },
  {
    ...element,
    id: 'perigeeAltitude',
    label: 'Perigee altitude',
    symbol: 'hₚ',
    quantity: 'length',
    evaluate: ({ body, mean }) => perigeeAltitudeKm(body, mean),
  },
  {
    ...element,
    id: 'apogeeAltitude',
    label: 'Apogee altitude',
    symbol: 'hₐ',
    quantity: 'length',
    evaluate: ({ body, mean }) => apogeeAltitudeKm(body, mean),
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
  };
}
