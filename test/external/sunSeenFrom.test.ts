/**
 * The Sun in the sky of each body against astronomy-engine 2.1.19 (full theories of the planets, poles of the IAU 2015).
 *
 * The angle between Sun and equator, and the Sun's distance, need no common origin of right ascension.
 */
import { Body as Celestial, GeoMoon, HelioVector, MakeTime, RotationAxis } from 'astronomy-engine';
import { describe, expect, it } from 'vitest';
import { bodies, sunSeenFrom } from '../../core/index';
import { julianDateOf, spreadDates, type Vec3 } from './skyOracle';

const astronomicalUnitKm = 149_597_870.7;
const degPerRad = 180 / Math.PI;
const dates = spreadDates(400);

/** Worst angle between the directions and worst declination above the body's equator (degrees), worst share of distance. */
const rows = [
  { body: bodies.mercury, celestial: Celestial.Mercury, directionDeg: 0.01, declinationDeg: 0.02, distanceShare: 1e-4 },
  { body: bodies.venus, celestial: Celestial.Venus, directionDeg: 0.015, declinationDeg: 0.02, distanceShare: 1e-4 },
  // The 2015 pole of Mars carries nodding terms that 2009 folded into its constants.
  { body: bodies.mars, celestial: Celestial.Mars, directionDeg: 0.03, declinationDeg: 0.05, distanceShare: 2e-4 },
  { body: bodies.jupiter, celestial: Celestial.Jupiter, directionDeg: 0.3, declinationDeg: 0.02, distanceShare: 2e-3 },
  { body: bodies.saturn, celestial: Celestial.Saturn, directionDeg: 0.3, declinationDeg: 0.15, distanceShare: 4e-3 },
  { body: bodies.moon, celestial: Celestial.Moon, directionDeg: 0.25, declinationDeg: 0.1, distanceShare: 3e-3 },
] as const;

/** The Sun from the body, in au, equator of J2000. */
function sunFrom(celestial: Celestial, date: Date): Vec3 {
  const time = MakeTime(date);
  if (celestial === Celestial.Moon) {
    const earth = HelioVector(Celestial.Earth, time);
    const moon = GeoMoon(time);
    return [-earth.x - moon.x, -earth.y - moon.y, -earth.z - moon.z];
  }
  const { x, y, z } = HelioVector(celestial, time);
  return [-x, -y, -z];
}

/** The body's own frame by the oracle's pole: z along it, x where the equator rises through that of J2000. */
function inFrame([x, y, z]: Vec3, celestial: Celestial, date: Date): Vec3 {
  const { north } = RotationAxis(celestial, MakeTime(date));
  const across = Math.hypot(north.x, north.y);
  const node: Vec3 = [-north.y / across, north.x / across, 0];
  const ahead: Vec3 = [-north.z * node[1], north.z * node[0], north.x * node[1] - north.y * node[0]];
  return [
    x * node[0] + y * node[1],
    x * ahead[0] + y * ahead[1] + z * ahead[2],
    x * north.x + y * north.y + z * north.z,
  ];
}

describe('the Sun seen from', () => {
  it.each(rows)('$body.name', ({ body, celestial, ...limits }) => {
    const model = sunSeenFrom(body);
    if (!model.ok) throw new Error(model.message);
    const worst = { directionDeg: 0, declinationDeg: 0, distanceShare: 0 };
    for (const date of dates) {
      const truth = inFrame(sunFrom(celestial, date), celestial, date);
      const distance = Math.hypot(...truth);
      const seen = model.sunAt(julianDateOf(date));
      const chord = Math.hypot(...truth.map((part, index) => part / distance - (seen.direction[index] ?? Number.NaN)));
      const declination = Math.asin(truth[2] / distance) - Math.asin(seen.direction[2]);
      worst.directionDeg = Math.max(worst.directionDeg, 2 * Math.asin(chord / 2) * degPerRad);
      worst.declinationDeg = Math.max(worst.declinationDeg, Math.abs(declination) * degPerRad);
      const share = Math.abs(seen.distanceKm / (distance * astronomicalUnitKm) - 1);
      worst.distanceShare = Math.max(worst.distanceShare, share);
    }
    console.log(
      `${body.name}: direction ${worst.directionDeg.toFixed(4)}°, declination ${worst.declinationDeg.toFixed(4)}°, ` +
        `distance ${worst.distanceShare.toExponential(1)}`,
    );
    for (const key of ['directionDeg', 'declinationDeg', 'distanceShare'] as const) {
      expect.soft(worst[key]).toBeLessThan(limits[key]);
    }
  });
});
