/**
 * Everything that the averaged level is judged by, as equations of motion for odex: central body, zonals to 14, Sun and
 * Moon, and drag in a rotating atmosphere. The tests' own force code: it shares constants with `core` and nothing else.
 */
import type { SkyTable } from './skyTable';
import { type ZonalConstants, zonalPolynomials } from './zonalPolynomials';

/** km³/s²: IAU 2015 nominal Sun (resolution B3 and DE405), Moon as in `core`'s gravity set. */
export const sunMuKm3PerS2 = 1.32712440018e11;
export const moonMuKm3PerS2 = 4902.80007;

export interface TruthDrag {
  /** kg/m³ at a height (km) above the ellipsoid. */
  readonly density: (heightKm: number) => number;
  /** Cd A/m, m²/kg. */
  readonly dragPerMass: number;
  readonly rotationRadPerS: number;
  readonly equatorialRadiusKm: number;
  readonly flattening: number;
}

export interface TruthField {
  readonly zonals: ZonalConstants;
  readonly degree: number;
  readonly sky: SkyTable | null;
  readonly drag: TruthDrag | null;
}

/** Rates of (position km, velocity km/s) at a time in seconds from the epoch. */
export type Motion = (timeS: number, y: readonly number[]) => number[];

export function equationsOfMotion({ zonals, degree, sky, drag }: TruthField): Motion {
  const addZonals = zonalPolynomials(zonals, degree);
  const place: number[] = [0, 0, 0];
  return (timeS, y) => {
    const [x = 0, py = 0, z = 0, vx = 0, vy = 0, vz = 0] = y;
    const r2 = x * x + py * py + z * z;
    const central = -zonals.muKm3PerS2 / (r2 * Math.sqrt(r2));
    const sum = [central * x, central * py, central * z];
    addZonals(sum, x, py, z);
    if (sky) {
      sky.sun(place, timeS / 86_400);
      addPull(sum, place, sunMuKm3PerS2, x, py, z);
      sky.moon(place, timeS / 86_400);
      addPull(sum, place, moonMuKm3PerS2, x, py, z);
    }
    if (drag) addDrag(sum, drag, [x, py, z], [vx, vy, vz]);
    return [vx, vy, vz, sum[0] as number, sum[1] as number, sum[2] as number];
  };
}

/**
 * Direct less indirect pull. 1/d³ − 1/s³ is written as a quotient without cancellation:
 * with k = d²/s² and m = (d² − s²)/s², k^(−3/2) − 1 = −m (1 + k + k²) / (k^(3/2) (1 + k^(3/2))).
 */
function addPull(sum: number[], body: readonly number[], mu: number, x: number, y: number, z: number): void {
  const [bx = 0, by = 0, bz = 0] = body;
  const s2 = bx * bx + by * by + bz * bz;
  const m = (x * x + y * y + z * z - 2 * (x * bx + y * by + z * bz)) / s2;
  const k = 1 + m;
  const k32 = k * Math.sqrt(k);
  const s3 = s2 * Math.sqrt(s2);
  const excess = (-m * (1 + k + k * k)) / (k32 * (1 + k32));
  const unit = mu / s3;
  sum[0] = (sum[0] as number) + unit * (excess * bx - x / k32);
  sum[1] = (sum[1] as number) + unit * (excess * by - y / k32);
  sum[2] = (sum[2] as number) + unit * (excess * bz - z / k32);
}

function addDrag(sum: number[], drag: TruthDrag, position: readonly number[], velocity: readonly number[]): void {
  const [x = 0, y = 0, z = 0] = position;
  const [vx = 0, vy = 0, vz = 0] = velocity;
  const wx = vx + drag.rotationRadPerS * y;
  const wy = vy - drag.rotationRadPerS * x;
  const speed = Math.hypot(wx, wy, vz);
  // kg/m³ · m²/kg · km²/s² is 1e3 km/s² per kilometre of the first two.
  const pull = -0.5e3 * drag.density(truthHeightKm(drag, x, y, z)) * drag.dragPerMass * speed;
  sum[0] = (sum[0] as number) + pull * wx;
  sum[1] = (sum[1] as number) + pull * wy;
  sum[2] = (sum[2] as number) + pull * vz;
}

/** Height above the ellipsoid, km, by Bowring's formula (1976, from memory): better than a millimetre here. */
export function truthHeightKm(
  { equatorialRadiusKm: a, flattening: f }: { readonly equatorialRadiusKm: number; readonly flattening: number },
  x: number,
  y: number,
  z: number,
): number {
  const b = a * (1 - f);
  const e2 = f * (2 - f);
  const across = Math.hypot(x, y);
  const beta = Math.atan2(z * a, across * b);
  const latitude = Math.atan2(z + (e2 / (1 - e2)) * b * Math.sin(beta) ** 3, across - e2 * a * Math.cos(beta) ** 3);
  const s = Math.sin(latitude);
  return across * Math.cos(latitude) + z * s - a * Math.sqrt(1 - e2 * s * s);
}
