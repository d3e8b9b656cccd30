/**
 * Density of the Earth's atmosphere by height: exponential layers for moderate solar activity.
 *
 * ρ = ρ₀ exp(−(h − h₀)/H) within each layer. Source: Vallado, Fundamentals of Astrodynamics and Applications, 4th ed.,
 * table 8-4 (after the U.S. Standard Atmosphere 1976 and CIRA-72; from memory, four rows compared with a copy). The true
 * density differs by a factor of two and more with the Sun's activity, the hour and the season; at 500 km and above the
 * solar cycle alone spans a factor of about ten.
 */

/** Base height (km), density there (kg/m³), scale height (km). */
export type AtmosphereLayer = readonly [baseKm: number, densityKgPerM3: number, scaleHeightKm: number];

/** From the ground up. */
export const atmosphereLayers: readonly AtmosphereLayer[] = [
  [0, 1.225, 7.249],
  [25, 3.899e-2, 6.349],
  [30, 1.774e-2, 6.682],
  [40, 3.972e-3, 7.554],
  [50, 1.057e-3, 8.382],
  [60, 3.206e-4, 7.714],
  [70, 8.77e-5, 6.549],
  [80, 1.905e-5, 5.799],
  [90, 3.396e-6, 5.382],
  [100, 5.297e-7, 5.877],
  [110, 9.661e-8, 7.263],
  [120, 2.438e-8, 9.473],
  [130, 8.484e-9, 12.636],
  [140, 3.845e-9, 16.149],
  [150, 2.07e-9, 22.523],
  [180, 5.464e-10, 29.74],
  [200, 2.789e-10, 37.105],
  [250, 7.248e-11, 45.546],
  [300, 2.418e-11, 53.628],
  [350, 9.518e-12, 53.298],
  [400, 3.725e-12, 58.515],
  [450, 1.585e-12, 60.828],
  [500, 6.967e-13, 63.822],
  [600, 1.454e-13, 71.835],
  [700, 3.614e-14, 88.667],
  [800, 1.17e-14, 124.64],
  [900, 5.245e-15, 181.05],
  [1000, 3.019e-15, 268],
];

const ground: AtmosphereLayer = [0, 1.225, 7.249];

function layerAt(heightKm: number): AtmosphereLayer {
  for (let index = atmosphereLayers.length - 1; index >= 0; index -= 1) {
    const layer = atmosphereLayers[index] as AtmosphereLayer;
    if (heightKm >= layer[0]) return layer;
  }
  return ground;
}

/** Density (kg/m³) at a height (km) above the ellipsoid; below the ground as at the ground, above 1000 km the last layer goes on. */
export function airDensityKgPerM3(heightKm: number): number {
  const [baseKm, density, scaleHeightKm] = layerAt(heightKm);
  return density * Math.exp(-(Math.max(heightKm, 0) - baseKm) / scaleHeightKm);
}

/** Height (km) over which the density falls by a factor of e, at a height (km) above the ellipsoid. */
export function scaleHeightKm(heightKm: number): number {
  return layerAt(heightKm)[2];
}

/** How dense the air is taken to be: a level, or a factor on the table. */
export type DensityLevel = 'low' | 'mean' | 'high' | number;

/** Factor of two either way: common practice, no source. It covers neither solar minimum nor maximum above 500 km. */
const levelFactors = { low: 0.5, mean: 1, high: 2 } as const;

/** The factor on the table that a level means. */
export function densityFactor(level: DensityLevel): number {
  return typeof level === 'number' ? level : levelFactors[level];
}
