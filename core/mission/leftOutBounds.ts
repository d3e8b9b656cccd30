/**
 * How much the effects that the averaged level leaves out may come to by the end of a span of an Earth orbit.
 *
 * Sizes from published constants through first-order formulas, or measured against integrated orbits; each says which. They
 * are meant to be too large rather than too small.
 */
import { radPerDeg, secondsPerDay } from '../numerics/angles';
import { secularRates } from '../orbit/secularRates';
import type { HistoryRequest } from './historyRequest';
import type { LedgerRow } from './ledger';
import type { LedgerEffect } from './ledgerStages';

export interface LeftOutBound {
  readonly effect: 'tesserals' | 'tides' | 'radiation' | 'density' | 'method';
  /** Where the size comes from. */
  readonly basis: 'published' | 'measured' | 'practice';
  readonly source: string;
  /** At most, either way. */
  readonly nodeRad: number;
  readonly inclinationRad: number;
  readonly eccentricity: number;
}

interface Setting {
  readonly request: HistoryRequest;
  readonly rows: readonly LedgerRow[];
  readonly endDays: number;
}

/** Bounds for an Earth orbit; for other bodies nothing is known, and none are given. */
export function leftOutBounds(setting: Setting): readonly LeftOutBound[] {
  if (setting.request.body.id !== 'earth') return [];
  const bounds = [tesserals(setting), tides(setting), radiation(setting), methodError(setting)];
  return setting.request.forces.drag ? [...bounds, density(setting)] : bounds;
}

/** Sizes of node and inclination by some rows together. */
function sizeOf(rows: readonly LedgerRow[], effects: readonly LedgerEffect[]) {
  const size = { nodeRad: 0, inclinationRad: 0, eccentricity: 0 };
  for (const { effect, change } of rows) {
    if (!effects.includes(effect)) continue;
    size.nodeRad += Math.abs(change.nodeRad);
    size.inclinationRad += Math.abs(change.inclinationRad);
    size.eccentricity += Math.abs(change.eccentricity);
  }
  return size;
}

/** Largest sectorial and tesseral coefficients, J22 and J31 (EGM96, unnormalised). */
const j22 = 1.816e-6;
const j31 = 2.209e-6;

/** Waves of half a day (J22) and of a day (J31): the force's size times revolutions a wave lasts. */
function tesserals({ request: { body, mean } }: Setting): LeftOutBound {
  const ratio = body.radiusKm / (mean.semiMajorAxisKm * (1 - mean.eccentricity ** 2));
  const motion = Math.sqrt(body.muKm3PerS2 / mean.semiMajorAxisKm ** 3);
  const revolutions = motion / Math.abs(body.rotationRadPerS ?? 1);
  const turn = 1.5 * j22 * ratio ** 2 * revolutions;
  return {
    effect: 'tesserals',
    basis: 'published',
    source: 'Waves of a day and half a day by J22 and J31 (EGM96), linear theory (Kaula 1966, §3.6); no resonance',
    nodeRad: turn / Math.max(Math.sin(mean.inclinationRad), 0.05),
    inclinationRad: turn,
    eccentricity: 1.5 * j31 * ratio ** 3 * revolutions,
  };
}

/** Love number, and the share of J2 by which a tide-free gravity set is short of the tide that never goes away. */
const loveNumber = 0.3;
const permanentTideShare = 8.6e-6;

/** The tide repeats the pull of Sun and Moon, k₂ (R/a)⁵ times as large. */
function tides({ request: { body, mean }, rows }: Setting): LeftOutBound {
  const share = loveNumber * (body.radiusKm / (mean.semiMajorAxisKm * (1 - mean.eccentricity ** 2))) ** 5;
  const sky = sizeOf(rows, ['sun', 'moon']);
  return {
    effect: 'tides',
    basis: 'published',
    source: 'Solid Earth, k₂ = 0.30, and permanent tide 8.6e-6 of J2: IERS Conventions 2010, ch. 6 (from memory)',
    nodeRad: share * sky.nodeRad + permanentTideShare * sizeOf(rows, ['j2']).nodeRad,
    inclinationRad: share * sky.inclinationRad,
    eccentricity: share * sky.eccentricity,
  };
}

/** Pressure of sunlight at one astronomical unit, N/m², and what a satellite is taken to be where nothing is known. */
const lightPressure = 4.56e-6;
const reflection = 1.3;
const usualAreaPerMass = 0.01;

/** Constant push over the span for the plane; for e the push until perigee has turned away from the Sun. */
function radiation({ request: { body, mean, forces }, endDays }: Setting): LeftOutBound {
  const { drag } = forces;
  const areaPerMass = drag && 'massKg' in drag ? drag.areaM2 / drag.massKg : usualAreaPerMass;
  const pushKmPerS2 = 1e-3 * lightPressure * reflection * areaPerMass;
  const speed = Math.sqrt(body.muKm3PerS2 / mean.semiMajorAxisKm);
  const { nodeRadPerS, perigeeRadPerS } = secularRates(body, mean, 'second');
  const sunRadPerS = (2 * Math.PI) / ((body.yearDays ?? 365) * secondsPerDay);
  const spanS = endDays * secondsPerDay;
  const slowest = Math.min(
    ...[1, -1].map((side) => Math.abs(perigeeRadPerS + side * nodeRadPerS - sunRadPerS)),
    Math.abs(perigeeRadPerS),
  );
  // 0.15 by the shadow, which never falls when the Sun stands across the plane; 1.5 e by the ellipse.
  const turn = ((0.15 + 1.5 * mean.eccentricity) * pushKmPerS2 * spanS) / speed;
  return {
    effect: 'radiation',
    basis: 'published',
    source: `4.56e-6 N/m², reflection 1.3, ${areaPerMass.toPrecision(2)} m²/kg; Montenbruck and Gill (2000), §3.4 (from memory)`,
    nodeRad: turn / Math.max(Math.sin(mean.inclinationRad), 0.05),
    inclinationRad: turn,
    eccentricity: ((1.5 * pushKmPerS2) / speed) * Math.min(spanS, 1 / slowest),
  };
}

/** What 28 integrated orbits showed after a year, rounded up (test/external/missionHistory.test.ts). */
const measured = { nodeShare: 2.5e-5, ellipseNodeDegPerYear: 0.01, inclinationDegPerYear: 0.0002, eccentricity: 2e-5 };

function methodError({ request: { mean }, rows, endDays }: Setting): LeftOutBound {
  const years = endDays / 365.25;
  const ellipse = mean.eccentricity > 0.1;
  const nodeDeg = ellipse ? measured.ellipseNodeDegPerYear * years : 0;
  return {
    effect: 'method',
    basis: 'measured',
    source:
      'Averaged against integrated orbits over a year, same forces: third order in J2, products with Sun and Moon',
    nodeRad: measured.nodeShare * sizeOf(rows, ['j2']).nodeRad + nodeDeg * radPerDeg,
    inclinationRad: measured.inclinationDegPerYear * (ellipse ? 3 : 1) * Math.max(years, 0.1) * radPerDeg,
    eccentricity: measured.eccentricity,
  };
}

/** A factor of two in density is once the row itself. */
function density({ rows }: Setting): LeftOutBound {
  return {
    effect: 'density',
    basis: 'practice',
    source: 'The density of the air is known to a factor of two at best (common practice, no source)',
    ...sizeOf(rows, ['drag']),
  };
}
