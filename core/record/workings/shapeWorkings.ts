/** Workings of size and shape. */
import { heightsAlongOrbit } from '../../orbit/heights';
import { add, type Expr, fn, frac, group, mul, neg, sqrt } from '../formula';
import type { ReadingPoint } from '../readings/reading';
import { plainWorking } from './build';
import { noteOnly, type Working } from './working';

const meanNote =
  'A Brouwer mean element: the first-order short-period J2 terms are removed, so the orbit at one instant lies some kilometres off it.';
const heightNote =
  'Found along one revolution: short-period J2 terms put back, heights taken along the normal of the ellipsoid. No closed formula.';

export const shapeWorkings = {
  semiMajorAxis: ({ mean }: ReadingPoint) => noteOnly(mean.semiMajorAxisKm, meanNote),
  eccentricity: ({ mean }: ReadingPoint) => noteOnly(mean.eccentricity, meanNote),
  inclination: ({ mean }: ReadingPoint) => noteOnly(mean.inclinationRad, meanNote),
  perigeeAltitude: (point: ReadingPoint) => altitudeWorking(point, 'perigeeAltitude', group(1, neg('e'))),
  apogeeAltitude: (point: ReadingPoint) => altitudeWorking(point, 'apogeeAltitude', group(1, 'e')),
  leastHeight: ({ body, mean }: ReadingPoint) => noteOnly(heightsAlongOrbit(body, mean).leastKm, heightNote),
  greatestHeight: ({ body, mean }: ReadingPoint) => noteOnly(heightsAlongOrbit(body, mean).greatestKm, heightNote),
  speedAtPerigee: (point: ReadingPoint) =>
    plainWorking(point, {
      inputs: { a: point.mean.semiMajorAxisKm, e: point.mean.eccentricity },
      constants: ['mu'],
      lines: [['speed', sqrt(mul(frac('mu', 'a'), frac(group(1, 'e'), group(1, neg('e')))))]],
      result: 'speed',
      note: 'Of the mean ellipse, by the energy of two bodies, in inertial space.',
    }),
  eCos: (point: ReadingPoint) => vectorWorking(point, 'eCos', 'cos'),
  eSin: (point: ReadingPoint) => vectorWorking(point, 'eSin', 'sin'),
} as const;

function altitudeWorking(point: ReadingPoint, id: 'perigeeAltitude' | 'apogeeAltitude', share: Expr): Working {
  return plainWorking(point, {
    inputs: { a: point.mean.semiMajorAxisKm, e: point.mean.eccentricity },
    constants: ['Req'],
    lines: [[id, add(mul('a', share), neg('Req'))]],
    result: id,
    note: 'Of the mean ellipse, above the equatorial radius; the height along the orbit is a reading of its own.',
  });
}

function vectorWorking(point: ReadingPoint, id: 'eCos' | 'eSin', name: 'cos' | 'sin'): Working {
  return plainWorking(point, {
    inputs: { e: point.mean.eccentricity, perigee: point.mean.perigeeRad },
    lines: [[id, mul('e', fn(name, 'perigee'))]],
    result: id,
    note: 'By definition, of the mean elements.',
  });
}
