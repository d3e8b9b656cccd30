/**
 * What stays the same over a chart of inclination and mean altitude: the eccentricity, or the altitude of perigee.
 *
 * Altitudes are counted from the body's equatorial radius; mean altitude is a − R, perigee altitude a(1 − e) − R.
 */
import type { Body } from '../bodies/body';
import type { MeanElements } from '../orbit/elements';

export type ChartShape =
  | { readonly kind: 'eccentricity'; readonly eccentricity: number }
  | { readonly kind: 'perigeeAltitude'; readonly km: number };

/** The shape of this orbit (a in km), held as the chart is to hold it. */
export function chartShapeOf(
  body: Body,
  { semiMajorAxisKm: a, eccentricity }: Pick<MeanElements, 'semiMajorAxisKm' | 'eccentricity'>,
  held: ChartShape['kind'],
): ChartShape {
  if (held === 'eccentricity') return { kind: held, eccentricity };
  return { kind: held, km: a * (1 - eccentricity) - body.equatorialRadiusKm };
}

/** Eccentricity at a mean altitude (km); null where perigee would stand above the mean altitude, or no ellipse is left. */
export function eccentricityAt(body: Body, shape: ChartShape, altitudeKm: number): number | null {
  const axisKm = body.equatorialRadiusKm + altitudeKm;
  if (!(axisKm > 0)) return null;
  if (shape.kind === 'eccentricity') return shape.eccentricity;
  const eccentricity = 1 - (body.equatorialRadiusKm + shape.km) / axisKm;
  // Rounding at the circle itself.
  if (Math.abs(eccentricity) < 1e-14) return 0;
  return eccentricity >= 0 && eccentricity < 1 ? eccentricity : null;
}

export interface ChartFloor {
  /** The lowest mean altitude that has an orbit, km. */
  readonly altitudeKm: number;
  /** `surface`: below it perigee is underground. `circle`: below it the held perigee would stand above the mean altitude. */
  readonly because: 'surface' | 'circle';
}

/** Where the chart's orbits end downwards; with a held perigee underground, nowhere: the floor is then infinite. */
export function chartFloor({ equatorialRadiusKm: radiusKm }: Body, shape: ChartShape): ChartFloor {
  if (shape.kind === 'eccentricity') {
    const { eccentricity: e } = shape;
    return { altitudeKm: (radiusKm * e) / (1 - e), because: 'surface' };
  }
  if (shape.km < 0) return { altitudeKm: Number.POSITIVE_INFINITY, because: 'surface' };
  return { altitudeKm: shape.km, because: 'circle' };
}
