/** Orbits that are integrated for a year, by kind; mean elements in degrees, each with its own epoch. */
import type { MeanElements } from '../../../core/index';

export type YearKind = 'sunSynchronous' | 'low' | 'lowNearEquator' | 'nearCritical' | 'ellipse';

export interface YearOrbit {
  readonly name: string;
  readonly kind: YearKind;
  readonly epoch: string;
  readonly semiMajorAxisKm: number;
  readonly eccentricity: number;
  readonly inclinationDeg: number;
  readonly nodeDeg: number;
  readonly perigeeDeg: number;
  readonly meanAnomalyDeg: number;
}

const equatorKm = 6378.137;
const radPerDeg = Math.PI / 180;

type Row = readonly [a: number, e: number, i: number, node: number, perigee: number, anomaly: number];

/** Epochs a few years and seasons apart, so that the Moon's node and the Sun's place differ from orbit to orbit. */
const epochs = ['2024-01-10', '2027-04-21', '2030-07-30', '2033-11-08', '2036-02-16', '2039-05-27'];

function group(kind: YearKind, rows: readonly Row[]): readonly YearOrbit[] {
  return rows.map(([semiMajorAxisKm, eccentricity, inclinationDeg, nodeDeg, perigeeDeg, meanAnomalyDeg], index) => ({
    name: `${kind} ${index + 1}`,
    kind,
    epoch: `${epochs[index % epochs.length]}T00:00:00Z`,
    semiMajorAxisKm,
    eccentricity,
    inclinationDeg,
    nodeDeg,
    perigeeDeg,
    meanAnomalyDeg,
  }));
}

export const yearOrbits: readonly YearOrbit[] = [
  ...group('sunSynchronous', [
    [equatorKm + 450, 0.0012, 97.21, 30, 90, 10],
    [equatorKm + 500, 0.0005, 97.4, 100, 200, 130],
    [equatorKm + 550, 0.002, 97.59, 250, 300, 250],
    [equatorKm + 600, 0.0001, 97.79, 330, 45, 70],
    [equatorKm + 650, 0.0011, 97.99, 180, 90, 310],
    [equatorKm + 700, 0.001, 98.19, 60, 120, 190],
    [equatorKm + 785, 0.003, 98.54, 220, 20, 40],
    [equatorKm + 900, 0.0015, 99.03, 290, 270, 160],
  ]),
  ...group('low', [
    [equatorKm + 500, 0.001, 35, 10, 40, 200],
    [equatorKm + 700, 0.01, 42, 200, 310, 20],
    [equatorKm + 420, 0.001, 51.6, 120, 80, 300],
    [equatorKm + 1336, 0.0001, 66.04, 300, 90, 90],
    [equatorKm + 800, 0.005, 75, 45, 150, 10],
    [equatorKm + 550, 0.002, 87, 260, 220, 110],
    [equatorKm + 1200, 0.02, 105, 170, 10, 230],
    [equatorKm + 650, 0.004, 120, 80, 260, 340],
  ]),
  ...group('lowNearEquator', [
    [equatorKm + 600, 0.001, 5, 70, 30, 100],
    [equatorKm + 500, 0.003, 15, 190, 130, 220],
    [equatorKm + 900, 0.01, 28.5, 310, 250, 0],
  ]),
  ...group('nearCritical', [
    [equatorKm + 700, 0.01, 63.4, 20, 100, 60],
    [equatorKm + 900, 0.02, 116.2, 140, 330, 180],
    [26_554, 0.7, 63.43, 240, 270, 20],
  ]),
  ...group('ellipse', [
    [10_000, 0.3, 50, 110, 60, 280],
    [12_000, 0.42, 98, 230, 340, 150],
    [20_000, 0.62, 28, 350, 170, 30],
    [22_930, 0.695, 12, 40, 270, 330],
    [26_560, 0.01, 55, 160, 20, 120],
    [27_000, 0.5, 75, 280, 190, 240],
  ]),
];

/** As mean elements, km and rad. */
export function meanOf(orbit: YearOrbit): MeanElements {
  return {
    semiMajorAxisKm: orbit.semiMajorAxisKm,
    eccentricity: orbit.eccentricity,
    inclinationRad: orbit.inclinationDeg * radPerDeg,
    nodeRad: orbit.nodeDeg * radPerDeg,
    perigeeRad: orbit.perigeeDeg * radPerDeg,
    meanAnomalyRad: orbit.meanAnomalyDeg * radPerDeg,
  };
}
